import type { Quantity } from '../definition.ts'
import { conversion, quantities, type UnitName } from './quantities.ts'
import { shownUnit } from './system.ts'

const superscripts: Record<string, string> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
}

/** Space that groups thousands from 10 000 up, as ISO 80000-1 writes them. */
const thinSpace = '\u00a0'

const group = (whole: string): string => (whole.length < 5 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, thinSpace))

/** A number to so many significant digits: 3.84, 95 700, 1.5 × 10⁻⁶. */
export const formatNumber = (value: number, digits: number): string => {
  if (value === 0) return '0'
  const rounded = Number(value.toPrecision(digits))
  const size = Math.abs(rounded)
  if (size < 1e-4 || size >= 1e8) {
    const [mantissa, exponent] = rounded.toExponential(digits - 1).split('e')
    return `${mantissa!.replace('-', '−')} × 10${[...String(Number(exponent))].map((c) => superscripts[c]).join('')}`
  }
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(size)))
  const [whole, fraction] = size.toFixed(decimals).split('.')
  return `${rounded < 0 ? '−' : ''}${group(whole!)}${fraction ? `.${fraction}` : ''}`
}

const unitNamed = (quantity: Quantity, name: string): UnitName => {
  const { units, si } = quantities[quantity]
  const named = [...units, si].find((unit) => unit.name === name)
  if (!named) throw new RangeError(`no unit "${name}" for ${quantity}`)
  return named
}

/** The unit in which a value of this quantity reads best, or the one that is asked for by name; in the system that is shown. */
export const unitFor = (quantity: Quantity, value: number, name?: string): UnitName => {
  const { units } = quantities[quantity]
  const best =
    name ??
    units.reduce((best, unit) => (unit.from !== undefined && Math.abs(value) >= unit.from ? unit : best), units[0]!)
      .name
  return unitNamed(quantity, shownUnit(quantity, best))
}

export interface Shown {
  text: string
  unit: string
}

/** An SI value as it is shown: digits and unit apart. */
export const format = (
  value: number,
  quantity: Quantity,
  { digits = 3, unit }: { digits?: number; unit?: string } = {},
): Shown => {
  const shownIn = unitFor(quantity, value, unit)
  const number = conversion(quantity, shownIn)!.fromSi(value)
  return {
    text: quantity === 'count' ? group(String(Number(number.toPrecision(6)))) : formatNumber(number, digits),
    unit: shownIn.name,
  }
}

/** Digits and unit as one text; ° stands close to its number. */
export const join = ({ text, unit }: Shown): string =>
  unit === '' || unit === '°' ? text + unit : `${text}\u00a0${unit}`

/** An SI value without more digits than it has: for ranges, fields and questions ("12 m", "0.05 mm"). */
export const say = (value: number, quantity: Quantity, unit?: string): string => {
  const shownIn = unitFor(quantity, value, unit)
  return join({ text: fieldText(value, quantity, shownIn.name), unit: shownIn.name })
}

/** An SI value as a field starts with it, in the unit named; every digit that matters and no more. */
export const fieldText = (value: number, quantity: Quantity, unit: string): string => {
  const number = Number(conversion(quantity, unitNamed(quantity, unit))!.fromSi(value).toPrecision(12))
  const size = Math.abs(number)
  return size !== 0 && (size < 1e-6 || size >= 1e15) ? number.toExponential() : String(number)
}
