import { expect, test } from '@playwright/test'
import { signIn, signInAs, signOut, type DemoRole } from './accounts.ts'
import { linkFromMail } from './mail.ts'

for (const role of ['learner', 'instructor', 'admin'] satisfies DemoRole[])
  test(`the demo ${role} signs in and out`, async ({ page }) => {
    await signInAs(page, role)
    await signOut(page)
    await page.goto('/my-learning')
    await expect(page.getByRole('main').getByRole('link', { name: 'Sign in' })).toBeVisible()
  })

test('a forgotten password is set anew by mail, and the old one no longer opens', async ({
  page,
  request,
  baseURL,
}) => {
  const email = `forgetful-${Date.now()}@leatwright.test`
  await page.goto('/sign-up')
  await page.getByLabel('Name', { exact: true }).fill('Forgetful')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill('the first password')
  await page.getByRole('button', { name: 'Sign up' }).click()
  await page.goto(await linkFromMail(request, baseURL!, email))
  await page.getByRole('button', { name: 'Confirm this address' }).click()
  await expect(page.getByRole('heading', { name: 'My learning' })).toBeVisible()
  await signOut(page)

  const confirmed = await linkFromMail(request, baseURL!, email)
  await page.goto('/forgotten-password')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByRole('main').getByRole('button').click()
  await expect(page.getByRole('heading', { name: 'Look in your mail' })).toBeVisible()
  await expect.poll(() => linkFromMail(request, baseURL!, email)).not.toBe(confirmed)
  await page.goto(await linkFromMail(request, baseURL!, email))
  await page.getByLabel(/password/i).fill('the second password')
  await page.getByRole('main').getByRole('button').click()
  await expect(page.getByRole('heading', { name: 'My learning' })).toBeVisible()
  await signOut(page)

  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill('the first password')
  await page.getByRole('main').getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('alert')).toBeVisible()
  await signIn(page, email, 'the second password')
})

test('a paid lesson says what is missing: signed out, and without a place', async ({ page }) => {
  await page.goto('/courses/leat-intake-and-pipe/friction')
  await expect(page.getByRole('main').getByRole('link', { name: 'Sign in' })).toBeVisible()
  await signInAs(page, 'instructor')
  await page.goto('/courses/leat-intake-and-pipe/friction')
  await expect(page.getByRole('main')).toContainText('You have no place on this course yet')
  await expect(page.getByText('What rubs, and what it costs')).toHaveCount(0)
})
