import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'
import { signInAs } from './accounts.ts'

/** Every page of the learner's way, for strangers and for the apprentice; no rule and no element is left out. */
const forAnyone = [
  '/',
  '/courses/reading-the-stream',
  '/courses/jet-and-runner',
  '/courses/reading-the-stream/power',
  '/courses/leat-intake-and-pipe/friction',
  '/calculators',
  '/calculators/penstock',
  '/calculators/runner?jetVelocity=fast',
  '/tables',
  '/tables?find=steel',
  '/tables/pe-pipe',
  '/tables/manning?find=rock',
  '/sign-in',
  '/sign-up',
  '/forgotten-password',
  '/confirm?token=spent',
  '/nowhere',
]
const forTheApprentice = [
  '/my-learning',
  '/courses/jet-and-runner',
  '/courses/reading-the-stream/power',
  '/courses/leat-intake-and-pipe/friction',
  '/courses/jet-and-runner/runner-speed',
  '/courses/commission-and-keep/static-and-running',
]

const settle = async (page: Page) => {
  await page.waitForLoadState('networkidle')
  await page.evaluate(() => document.fonts.ready)
  await expect(page.getByText('on its way', { exact: false })).toHaveCount(0)
}

const check = async (page: Page, path: string) => {
  await page.goto(path)
  await settle(page)
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect
    .soft(
      violations.map(({ id, nodes }) => `${path}: ${id}: ${nodes.map(({ target }) => target.join(' ')).join(' | ')}`),
    )
    .toEqual([])
  const sideways = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  )
  expect.soft(sideways, `${path} scrolls sideways`).toBe(0)
}

for (const colorScheme of ['light', 'dark'] as const)
  for (const width of [1280, 320]) {
    test.describe(`${colorScheme}, ${width} px`, () => {
      test.use({ colorScheme, viewport: { width, height: 900 } })
      test.setTimeout(240_000)

      test('pages for anyone', async ({ page }) => {
        const errors: string[] = []
        page.on('pageerror', (error) => errors.push(error.message))
        for (const path of forAnyone) await check(page, path)
        expect(errors).toEqual([])
      })

      test('pages for the apprentice', async ({ page }) => {
        const errors: string[] = []
        page.on('pageerror', (error) => errors.push(error.message))
        await signInAs(page, 'learner')
        for (const path of forTheApprentice) await check(page, path)
        expect(errors).toEqual([])
      })
    })
  }
