import { expect, type Page } from '@playwright/test'

/** The demo accounts that the server prints at its start. */
export const demoPassword = 'harrowgill-yard'
export type DemoRole = 'learner' | 'instructor' | 'admin'
const emails: Record<DemoRole, string> = {
  learner: 'apprentice@leatwright.test',
  instructor: 'instructor@leatwright.test',
  admin: 'office@leatwright.test',
}

export const signIn = async (page: Page, email: string, password: string) => {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('main').getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { name: 'My learning' })).toBeVisible()
}

export const signInAs = (page: Page, role: DemoRole) => signIn(page, emails[role], demoPassword)

export const signOut = async (page: Page) => {
  await page.getByRole('button', { name: 'Account' }).click()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await expect(page.getByRole('banner').getByRole('link', { name: 'Sign in' })).toBeVisible()
}
