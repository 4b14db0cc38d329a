import AxeBuilder from '@axe-core/playwright'
import { expect, test } from '@playwright/test'

test('a size is found in all tables, and its address finds it again', async ({ page }) => {
  await page.goto('/')
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Tables' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Tables' })).toBeVisible()

  await page.getByLabel('Find in all tables').fill('pe 110')
  await expect(page.getByText('6 rows in 1 table')).toBeVisible()
  // 110 less two walls of 10 mm.
  await expect(page.getByRole('row', { name: '110 11 110 10 90' })).toBeVisible()
  await expect(page).toHaveURL(/\/tables\?find=pe\+110$/)
  await page.reload()
  await expect(page.getByLabel('Find in all tables')).toHaveValue('pe 110')
  await expect(page.getByText('6 rows in 1 table')).toBeVisible()

  await page.getByLabel('Find in all tables').fill('pe 110 unicorn')
  await expect(page.getByText('No row has all of “pe 110 unicorn”.', { exact: false })).toBeVisible()

  // The way in from the bar starts again.
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Tables' }).click()
  await expect(page.getByLabel('Find in all tables')).toHaveValue('')
  await page.getByRole('link', { name: 'Roughness of pipe walls' }).click()
  await expect(page).toHaveURL(/\/tables\/roughness$/)
  await expect(page.getByText('Idelchik', { exact: false })).toBeVisible()
})

test('the rows shown are copied with their sources', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  await page.goto('/tables/conductors?find=16')
  await expect(page.getByRole('row')).toHaveCount(2)
  await page.getByRole('button', { name: 'Copy as CSV' }).click()
  await expect(page.getByText('The rows shown are copied as CSV', { exact: false })).toBeVisible()
  const copied = await page.evaluate(() => navigator.clipboard.readText())
  expect(copied.split('\r\n')).toEqual([
    '"Cross-section, mm²","Copper, plain, Ω/km","Aluminium, Ω/km",Source',
    '16,1.15,1.91,"IEC 60228:2004, table 2"',
  ])
})

test('a long table keeps its heads in sight, and a wide one moves in its own box', async ({ page }) => {
  await page.goto('/tables/pe-pipe')
  await page.getByRole('rowheader', { name: '250' }).last().scrollIntoViewIfNeeded()
  await expect(page.getByRole('columnheader', { name: 'Inside diameter, mm' })).toBeInViewport()

  await page.setViewportSize({ width: 320, height: 700 })
  await page.goto('/tables/gauges')
  const box = page.getByRole('group', { name: 'Pressure gauges' })
  expect(await box.evaluate((element) => element.scrollWidth > element.clientWidth)).toBe(true)
  await expect(page.getByRole('columnheader').last()).not.toBeInViewport()
  await box.focus()
  for (let i = 0; i < 12; i++) await page.keyboard.press('ArrowRight')
  await expect(page.getByRole('columnheader').last()).toBeInViewport()
})

test('there is no table of another name', async ({ page }) => {
  await page.goto('/tables/perpetual-motion')
  await expect(page.getByText('There is no table here.', { exact: false })).toBeVisible()
})

test('a calculator takes a figure from a table, by keyboard alone', async ({ page }) => {
  await page.goto('/tables/roughness')
  await expect(page.getByLabel('Find in this table')).toBeEnabled()
  await page.getByRole('link', { name: 'Friction in a pipe' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Friction in a pipe' })).toBeVisible()
  const way = page.getByRole('button', { name: 'From a table' }).last()
  await way.focus()
  await page.keyboard.press('Enter')
  const dialog = page.getByRole('dialog', { name: 'Roughness of pipe walls' })
  await expect(dialog).toBeVisible()
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect(violations).toEqual([])

  await dialog.getByLabel('Find').fill('welded good')
  await dialog.getByRole('button', { name: /^Most 0\.1\smm, welded steel, in good condition/ }).focus()
  await page.keyboard.press('Enter')
  await expect(dialog).toBeHidden()
  await expect(way).toBeFocused()
  await expect(page.getByLabel(/^Roughness/)).toHaveValue(/^0\.1( mm)?$/)

  await page.keyboard.press('Enter')
  await expect(dialog).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(dialog).toBeHidden()
  await expect(way).toBeFocused()
})

test('figures turn into the other units, and stay so', async ({ page }) => {
  await page.goto('/tables/pe-pipe?find=110+13.6')
  await expect(page.getByRole('row', { name: '110 13.6 110 8.1 93.8' })).toBeVisible()
  await page.getByLabel('imperial').check()
  // 110 ÷ 25.4, 8.1 ÷ 25.4, 93.8 ÷ 25.4
  await expect(page.getByRole('row', { name: '110 13.6 4.331 0.3189 3.693' })).toBeVisible()
  await page.reload()
  await expect(page.getByRole('columnheader', { name: 'Inside diameter, in' })).toBeVisible()
})
