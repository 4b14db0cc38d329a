/**
 * `npm run sheet -- [folder] [--only friction,jet]`: pictures of the calculators' pages with the numbers of their examples, wide and narrow,
 * light and dark, and one sheet of them all. The site is built afresh into the folder, so that `dist/` is left as it is. Ends with an error
 * where a page broke, complained of the example or was wider than its window.
 */
import { mkdir, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'
import { parseArgs } from 'node:util'
import { chromium, type Browser, type Page } from '@playwright/test'
import { build, preview } from 'vite'
import { calculator, calculators, type CalculatorDefinition } from '#calc/index.ts'
import { chromiumFlags, chromiumPath, ensureChromium } from '../../.config/scripts/chromium.ts'

const { values, positionals } = parseArgs({ options: { only: { type: 'string' } }, allowPositionals: true })
const folder = path.resolve(positionals[0] ?? path.join(tmpdir(), 'leatwright-sheet'))
const definitions = values.only?.split(',').map(calculator) ?? Object.values<CalculatorDefinition>(calculators)

const widths = [1280, 320] as const
const schemes = ['light', 'dark'] as const
const fileOf = (id: string, width: number, scheme: string) => `${id}-${width}-${scheme}.png`

const findings: string[] = []

async function showExample(page: Page, origin: string, { id }: CalculatorDefinition) {
  await page.emulateMedia({ colorScheme: 'light', reducedMotion: 'reduce' })
  await page.goto(`${origin}/calculators/${id}`, { waitUntil: 'networkidle' })
  await page.getByRole('button', { name: 'Try an example' }).click()
  // The results are there at once; the address and what is said to those who listen follow when the typing stops.
  await page.waitForTimeout(1000)
  await page.evaluate(() => document.fonts.ready)
}

async function lookOver(page: Page, definition: CalculatorDefinition): Promise<string[]> {
  const { title, invalid, wide } = await page.evaluate(() => ({
    title: document.querySelector('h1')?.textContent ?? '',
    invalid: [...document.querySelectorAll('[aria-invalid="true"]')].map(({ id }) => id),
    wide: document.documentElement.scrollWidth - window.innerWidth,
  }))
  return [
    ...(title === definition.title ? [] : [`the heading is “${title}”`]),
    ...(invalid.length === 0 ? [] : [`the example is complained of at ${invalid.join(', ')}`]),
    ...(wide <= 0 ? [] : [`${wide} px wider than the window`]),
  ]
}

async function takePictures(page: Page, origin: string, width: number, definition: CalculatorDefinition) {
  const found = new Set<string>()
  const listeners = {
    pageerror: (error: Error) => found.add(error.message),
    console: (message: { type(): string; text(): string }) => message.type() === 'error' && found.add(message.text()),
  }
  page.on('pageerror', listeners.pageerror).on('console', listeners.console)
  try {
    await showExample(page, origin, definition)
    for (const scheme of schemes) {
      await page.emulateMedia({ colorScheme: scheme, reducedMotion: 'reduce' })
      await page.screenshot({ path: path.join(folder, fileOf(definition.id, width, scheme)), fullPage: true })
    }
    for (const finding of await lookOver(page, definition)) found.add(finding)
  } catch (error) {
    // One page that does not come must not keep the others from their pictures.
    found.add(String(error))
  }
  page.off('pageerror', listeners.pageerror).off('console', listeners.console)
  for (const finding of found) findings.push(`${definition.id} at ${width} px: ${finding}`)
}

/** Each width has a page of its own: the two work side by side. */
const takeAll = (browser: Browser, origin: string) =>
  Promise.all(
    widths.map(async (width) => {
      const page = await browser.newPage({ viewport: { width, height: 900 } })
      for (const definition of definitions) await takePictures(page, origin, width, definition)
    }),
  )

const sheetMarkup = () => `<!doctype html>
<html lang="en-GB">
<meta charset="utf-8" />
<title>Calculators</title>
<style>
  body { margin: 16px; display: grid; grid-template-columns: repeat(auto-fill, 906px); gap: 24px; font: 14px sans-serif; background: #ccc; }
  h2 { margin: 0 0 4px; font-size: 16px; }
  div { display: flex; gap: 4px; }
  a { height: 760px; overflow: hidden; }
  .w1280 { width: 316px; }
  .w320 { width: 130px; }
</style>
${definitions
  .map(({ id }) => {
    const pictures = widths.flatMap((width) => schemes.map((scheme) => ({ width, file: fileOf(id, width, scheme) })))
    const images = pictures.map(
      ({ width, file }) => `<a href="${file}"><img class="w${width}" src="${file}" alt="${file}" /></a>`,
    )
    return `<section><h2>${id}</h2><div>${images.join('')}</div></section>`
  })
  .join('\n')}
</html>
`

async function makeSheet(browser: Browser) {
  const file = path.join(folder, 'sheet.html')
  await writeFile(file, sheetMarkup())
  const columns = Math.min(3, definitions.length)
  const page = await browser.newPage({ viewport: { width: 32 + columns * 906 + (columns - 1) * 24, height: 900 } })
  await page.goto(pathToFileURL(file).href, { waitUntil: 'load' })
  await page.screenshot({ path: path.join(folder, 'sheet.png'), fullPage: true })
}

ensureChromium()
await mkdir(folder, { recursive: true })
// Built to be served, whatever NODE_ENV this runs with.
process.env.NODE_ENV = 'production'
const root = fileURLToPath(new URL('..', import.meta.url))
const outDir = path.join(folder, 'site')
await build({ root, logLevel: 'error', build: { outDir } })
const server = await preview({ root, logLevel: 'error', build: { outDir }, preview: { port: 0, host: 'localhost' } })
const origin = server.resolvedUrls!.local[0]!.replace(/\/$/, '')
const browser = await chromium.launch({ executablePath: chromiumPath, args: chromiumFlags })
try {
  await takeAll(browser, origin)
  await makeSheet(browser)
} finally {
  await browser.close()
  await server.close()
}

for (const finding of findings) console.error(finding)
console.log(
  `${definitions.length} calculators: ${path.join(folder, 'sheet.png')}, and sheet.html with each picture whole.`,
)
process.exit(findings.length === 0 ? 0 : 1)
