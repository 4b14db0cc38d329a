import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const sheet = readFileSync(new URL('./palette.css', import.meta.url), 'utf8')

/** The tokens of one rule, as sRGB channels from 0 to 1. */
function tokens(selector: string) {
  const body = sheet.split(`${selector} {`)[1]!.split('}')[0]!
  const pairs = [...body.matchAll(/--([a-z0-9-]+): #([0-9a-f]{6});/g)]
  return Object.fromEntries(
    pairs.map(([, name, hex]) => [name!, [0, 2, 4].map((at) => parseInt(hex!.slice(at, at + 2), 16) / 255)]),
  )
}

/** Relative luminance and contrast ratio: Web Content Accessibility Guidelines 2.2, definitions. */
const luminance = (channels: number[]) => {
  const [red, green, blue] = channels.map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4))
  return 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!
}
const contrast = (one: number[], other: number[]) => {
  const [light, dark] = [luminance(one), luminance(other)].sort((a, b) => b - a)
  return (light! + 0.05) / (dark! + 0.05)
}

const inks = ['ink', 'ink-2', 'water', 'brass', 'rust', 'moss']
const textPairs = [
  ...inks.flatMap((ink) => [`${ink} on paper`, `${ink} on paper-2`]),
  ...['ink on earth-fill', 'ink on water-fill', 'ink on brass-fill', 'ink on rust-fill', 'ink on moss-fill'],
  ...['brass on brass-fill', 'rust on rust-fill', 'moss on moss-fill'],
  ...['paper on brass', 'paper on rust', 'paper on water', 'paper on moss', 'paper on ink-2'],
]
const linePairs = [
  'water on water-fill',
  'earth on paper',
  'earth on earth-fill',
  'water on earth-fill',
  'brass on earth-fill',
]

describe.each([
  ['light', ':root'],
  ['dark', '.dark'],
])('the %s palette', (_, selector) => {
  const palette = tokens(selector)
  const ratio = (pair: string) => {
    const [over, under] = pair.split(' on ')
    return contrast(palette[over!]!, palette[under!]!)
  }
  it.each(textPairs)('reads: %s', (pair) => expect(ratio(pair)).toBeGreaterThanOrEqual(4.5))
  it.each(linePairs)('shows: %s', (pair) => expect(ratio(pair)).toBeGreaterThanOrEqual(3))
})
