/** `npm run picture`: the README's picture, taken of a running server (PORT, 4310 unless told). */
import { mkdirSync } from 'node:fs'
import { chromium } from '@playwright/test'
import { chromiumFlags, chromiumPath, ensureChromium } from '../../.config/scripts/chromium.ts'

ensureChromium()
const address = `http://localhost:${process.env.PORT ?? 4310}`
const browser = await chromium.launch({ executablePath: chromiumPath, args: chromiumFlags })
const page = await browser.newPage({ viewport: { width: 1280, height: 1060 } })
await page.goto(`${address}/`, { waitUntil: 'networkidle' })
await page.evaluate(() => document.fonts.ready)
mkdirSync('.github', { recursive: true })
await page.screenshot({ path: '.github/leatwright.png' })
await browser.close()
console.log('.github/leatwright.png')
