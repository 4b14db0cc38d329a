import { expect, test } from '@playwright/test'

test('a calculator takes what people type, says what is wrong, and its address carries the sums', async ({ page }) => {
  await page.goto('/calculators')
  await page.getByRole('link', { name: /^Friction in a pipe/ }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Friction in a pipe' })).toBeVisible()

  // By hand, cold water: v = Q/A = 0.0125/(π·0.1022²/4) = 1.524 m/s.
  await page.getByLabel(/^Flow/).fill('12,5 l/s')
  await page.getByLabel(/^Inside diameter/).fill('102.2mm')
  await expect(page.getByText('1.52 m/s').filter({ visible: true }).first()).toBeVisible()
  await expect(page).toHaveURL(/flow=12/)

  await page.getByLabel(/^Inside diameter/).fill('-102.2')
  await expect(page.getByText(/Inside diameter must lie between/).first()).toBeVisible()
  await expect(page.getByLabel(/^Inside diameter/)).toHaveAttribute('aria-invalid', 'true')
  await page.getByLabel(/^Inside diameter/).fill('102.2')

  await expect(page).toHaveURL(/insideDiameter=102\.2/)
  await page.goto(page.url())
  await expect(page.getByText('1.52 m/s').filter({ visible: true }).first()).toBeVisible()

  await page.getByRole('button', { name: 'Start again' }).click()
  await expect(page.getByLabel(/^Flow/)).toHaveValue('9.5')
})

test('a calculator works by keyboard alone', async ({ page }) => {
  await page.goto('/calculators/jet')
  await page.getByLabel(/^Net head/).focus()
  await page.keyboard.press('Control+A')
  await page.keyboard.type('80')
  // √(2 · 9.80665 · 80) · 0.97 = 38.42 m/s
  await expect(page.getByText('38.4 m/s').filter({ visible: true }).first()).toBeVisible()
  await page.keyboard.press('Tab')
  await expect(page.getByRole('combobox', { name: 'Unit of net head' })).toBeFocused()
})

test('there is no calculator of another name', async ({ page }) => {
  await page.goto('/calculators/perpetual-motion')
  await expect(page.getByRole('heading', { level: 1 })).toContainText(/not|no /i)
})
