import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'

const paste = async (page: Page, text: string) => {
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
  await page.evaluate((text) => navigator.clipboard.writeText(text), text)
  await page.keyboard.press('Control+V')
}

test('a list takes a block from a spreadsheet, and gives back what was there', async ({ page }) => {
  await page.goto('/calculators/penstock')
  const sections = page.locator('form').getByRole('group', { name: 'Sections of pipe' })
  const length = (number: number) =>
    sections.getByRole('textbox', { name: new RegExp(`^Length ?, section ${number}$`) })
  await length(1).focus()
  await paste(page, 'Length\tBore\tRoughness\n120\t96,8 mm\t0.05\n90 m\t8.1 cm\t0.05\n')
  await expect(sections.getByRole('row')).toHaveCount(3)
  await expect(length(2)).toHaveValue('90 m')
  await expect(sections.getByText('Pasted: 2 sections. The first line was taken for a heading.')).toBeVisible()
  await expect(page).toHaveURL(/sections\.1\.insideDiameter=8\.1\+cm/)

  await sections.getByRole('button', { name: 'Put back what was there' }).click()
  await expect(sections.getByRole('row')).toHaveCount(2)
  await expect(length(1)).toHaveValue('240')

  await length(1).focus()
  await paste(page, Array.from({ length: 60 }, (_, i) => `${i + 1}\t96.8`).join('\n'))
  await expect(sections.getByText('10 sections did not fit: there may be 50.')).toBeVisible()
})

test('the keys go down a column, and Enter adds a row at its end', async ({ page }) => {
  await page.goto('/calculators/flow-by-bucket')
  const timings = page.getByRole('group', { name: 'Timings' })
  const timing = (number: number) => timings.getByRole('textbox', { name: `Timing ${number}`, exact: true })
  await timing(1).focus()
  const count = await timings.getByRole('textbox').count()
  for (let i = 1; i < count; i++) await page.keyboard.press(i % 2 ? 'Enter' : 'ArrowDown')
  await expect(timing(count)).toBeFocused()
  await page.keyboard.press('ArrowDown')
  await expect(timing(count)).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(timing(count + 1)).toBeFocused()
  await page.keyboard.type('eight')
  await expect(timings.getByText(/Start with a number/)).toBeVisible()
  await expect(timing(count + 1)).toHaveAttribute('aria-invalid', 'true')
  await page.keyboard.press('ArrowUp')
  await expect(timing(count)).toBeFocused()
  await timings.getByRole('button', { name: `Take out timing ${count + 1}` }).click()
  await expect(timings.getByRole('textbox')).toHaveCount(count)
})

test('a field book of levels is pasted with a run in each column', async ({ page }) => {
  await page.goto('/calculators/head-by-levels')
  const run = (number: number) => page.getByRole('textbox', { name: `Run ${number}`, exact: true })
  await run(1).focus()
  await paste(page, 'out\tback\n4,1\t4,0\n3,9\t4,1\n')
  await expect(run(1)).toHaveValue('4,1  3,9')
  await expect(run(2)).toHaveValue('4,0  4,1')
  // The runs rise 8.0 and 8.1 m: 8.05 in the mean.
  await expect(page.getByText('8.050 m').filter({ visible: true }).first()).toBeVisible()
  await run(2).fill('4,0 4,x')
  await expect(page.getByText(/^Rise 2/)).toBeVisible()
})

test('a fitting asks for what its kind has', async ({ page }) => {
  await page.goto('/calculators/fittings')
  const fittings = page.getByRole('group', { name: 'Fittings' })
  await expect(fittings.getByRole('textbox', { name: /^Bend angle ?, fitting 2/ })).toHaveValue('45')
  await fittings.getByRole('combobox', { name: /^Fitting ?, fitting 2/ }).selectOption({ label: '90° elbow' })
  await expect(fittings.getByRole('textbox', { name: /^Bend angle ?, fitting 2/ })).toHaveCount(0)
  await expect(fittings.getByText(/Joint is wanted for a 90° elbow/)).toBeVisible()
  await fittings.getByRole('combobox', { name: /^Joint ?, fitting 2/ }).selectOption('flanged')
  await expect(fittings.getByText(/is wanted/)).toHaveCount(0)
})

test('a number is written with its ±, which a button brings', async ({ page }) => {
  await page.goto('/calculators/jet')
  const head = page.getByRole('textbox', { name: /^Net head/ })
  const button = page.locator('.quantity', { has: head }).getByRole('button', { name: /^Add ±/, includeHidden: true })
  await expect(button).toBeHidden()
  await head.fill('31.4')
  await button.click()
  await expect(head).toBeFocused()
  await page.keyboard.type('0.2')
  await expect(head).toHaveValue('31.4 ± 0.2')
  await expect(page.getByRole('heading', { name: 'How sure the results are' })).toBeVisible()
  await page.getByRole('combobox', { name: 'Unit of net head' }).selectOption('ft')
  await expect(head).toHaveValue('103 ± 0.66')
  await expect(page).toHaveURL(/netHead=103\+%C2%B1\+0\.66\+ft/)
})

test('a record of years comes from a file, and stays in this browser', async ({ page }) => {
  const sent: string[] = []
  page.on('request', (request) => request.method() !== 'GET' && sent.push(request.url()))
  await page.goto('/calculators/flow-duration')
  await expect(page.getByText('An invented year: 365 days')).toBeVisible()
  const days = Array.from({ length: 730 }, (_, i) => {
    const date = new Date(Date.UTC(2023, 0, 1 + i)).toISOString().slice(0, 10)
    return `${date};${(0.02 + 0.01 * Math.sin(i / 58)).toFixed(4).replace('.', ',')}`
  })
  days[99] = days[99]!.replace(/;.*/, ';')
  const buffer = Buffer.from(['Date;Flow m3/s', ...days].join('\n'))
  await page.getByLabel(/^Choose a file/).setInputFiles({ name: 'weir.csv', mimeType: 'text/csv', buffer })
  await expect(page.getByText('weir.csv: 729 days, 1 January 2023 to 30 December 2024, 1 day missing')).toBeVisible()
  await page.getByText(/no flow: those days are gaps/).click()
  await expect(page.getByText(/^Row 101, column 2/)).toBeVisible()
  await expect(page.getByText(/A link does not carry the daily flows/)).toBeVisible()
  expect(sent).toEqual([])

  await page.getByRole('button', { name: 'Back to the invented year' }).click()
  await expect(page.getByText('An invented year: 365 days')).toBeVisible()
  await expect(page.getByText(/A link does not carry/)).toHaveCount(0)
})

test('fields nobody wrote in turn into the other units; what was written stays', async ({ page }) => {
  await page.goto('/calculators/jet')
  await page.getByRole('textbox', { name: /^Net head/ }).fill('45 m')
  await page.getByLabel('imperial').check()
  await expect(page.getByRole('textbox', { name: /^Net head/ })).toHaveValue('45 m')
  // 9.5 L/s = 150.6 US gal/min; 0.97 √(2 g 45 m) = 28.82 m/s = 94.5 ft/s
  await expect(page.getByRole('textbox', { name: /^Flow/ })).toHaveValue('150.6')
  await expect(page.getByText('94.5 ft/s').filter({ visible: true }).first()).toBeVisible()
  await page.goto('/calculators/jet')
  await expect(page.getByLabel('imperial')).toBeChecked()
  await expect(page.getByRole('textbox', { name: /^Net head/ })).toHaveValue('147.6')
})

for (const id of ['fittings', 'penstock', 'flow-duration'])
  for (const colorScheme of ['light', 'dark'] as const)
    test(`the fields of ${id} fit a small phone and can be read out, ${colorScheme}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme })
      await page.setViewportSize({ width: 320, height: 700 })
      await page.goto(`/calculators/${id}`)
      await expect(page.getByRole('button', { name: 'Copy link' })).toBeEnabled()
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
      const { violations } = await new AxeBuilder({ page }).analyze()
      expect(violations).toEqual([])
      const small = await page.locator('.calculator-fields').evaluate((fields) =>
        [...fields.querySelectorAll('button, select, input:not([type=radio], [type=file])')]
          .map((element) => element.closest('.quantity, .cell') ?? element)
          .filter((element) => element.getClientRects().length > 0 && element.getBoundingClientRect().height < 43.9)
          .map((element) => element.outerHTML.slice(0, 120)),
      )
      expect(small).toEqual([])
    })
