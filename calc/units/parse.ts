import type { Quantity } from '../definition.ts'
import { conversion, isUnit, quantities, quantityOf, type UnitName } from './quantities.ts'

export type Reading =
  | { ok: true; value: number; unit: string; figures: number }
  | {
      ok: false
      code: 'empty' | 'no-number' | 'two-ways' | 'no-unit' | 'unknown-unit' | 'wrong-quantity'
      message: string
    }

type Refusal = Extract<Reading, { ok: false }>
const refuse = (code: Refusal['code'], message: string): Refusal => ({ ok: false, code, message })

/** Ways of writing a unit that the unit library does not know, lower case and without spaces. */
const otherSpellings = new Map<string, string>(
  Object.entries({
    lps: 'L/s',
    ltr: 'L',
    ltrs: 'L',
    litre: 'L',
    litres: 'L',
    liter: 'L',
    liters: 'L',
    lpm: 'L/min',
    cumecs: 'm³/s',
    cumec: 'm³/s',
    rpm: 'rev/min',
    'r/min': 'rev/min',
    'rev/min': 'rev/min',
    'revs/min': 'rev/min',
    '1/min': 'rev/min',
    deg: '°',
    degree: '°',
    degrees: '°',
    c: '°C',
    degc: '°C',
    celsius: '°C',
    f: '°F',
    degf: '°F',
    percent: '%',
    pct: '%',
    metre: 'm',
    metres: 'm',
    meters: 'm',
    watts: 'W',
    bars: 'bar',
    inch: 'in',
    '"': 'in',
  }),
)

/** As the unit library spells it: m³/s and m3/s become m^3/s, sec becomes s. */
const librarySpelling = (text: string): string =>
  text
    .replace(/³/g, '^3')
    .replace(/²/g, '^2')
    .replace(/([a-zA-Z])([23])(?![0-9])/g, '$1^$2')
    .replace(/[·⋅*]/g, ' ')
    .replace(/[µμ]/g, 'u')
    .replace(/\/(sec|second|seconds)$/i, '/s')
    .replace(/\/(min|mins|minutes)$/i, '/minute')
    .replace(/\/(h|hr|hrs|hours)$/i, '/hour')
    .replace(/^(litres?|liters?|ltrs?)(?=\/)/i, 'L')
    .replace(/ per /i, '/')

const squeeze = (text: string): string => text.toLowerCase().replace(/\s+/g, '')

const findUnit = (text: string, quantity: Quantity): UnitName | undefined => {
  const { units, si } = quantities[quantity]
  const known = [...units, si]
  const written = text.replace(/\s*\/\s*/g, '/').trim()
  const exact = known.find((unit) => unit.name === written)
  if (exact) return exact
  const spelling = otherSpellings.get(squeeze(written)) ?? written
  const loosely = known.find((unit) => squeeze(unit.name) === squeeze(spelling))
  const mathjs = librarySpelling(spelling)
  // "mW" and "MW" differ: an exact spelling of the unit library goes before one that is right but for capitals.
  if (isUnit(mathjs) && conversion(quantity, { name: spelling, mathjs })) return { name: spelling, mathjs }
  if (loosely) return loosely
  const byLibrary = known.find((unit) => unit.mathjs !== undefined && squeeze(unit.mathjs) === squeeze(mathjs))
  if (byLibrary) return byLibrary
  return isUnit(mathjs.toLowerCase()) && conversion(quantity, { name: spelling, mathjs: mathjs.toLowerCase() })
    ? { name: spelling, mathjs: mathjs.toLowerCase() }
    : undefined
}

const digit = /[0-9]/

/**
 * The number at the start of a text, however its writer groups and points it: 9,5 · 9.5 · 1 450 · 1,450.5 · 1.450,5 · 2e-3.
 * A lone comma before three digits can be read two ways and is refused.
 */
const readNumber = (text: string, example: string): { value: number; figures: number; rest: string } | Refusal => {
  const found =
    /^([+\-−]?)\s*((?:\d[\d \u00a0\u202f\u2009'’]*)?(?:[.,]?\d[\d \u00a0\u202f\u2009]*)*)((?:\s*[e×x]\s*(?:10\s*\^?\s*)?[+\-−]?\s*\d+)?)/i.exec(
      text,
    )
  const body = found?.[2]?.trim() ?? ''
  if (!found || !digit.test(body)) return refuse('no-number', `Start with a number, for example ${example}.`)
  const compact = body.replace(/[\s\u00a0\u202f\u2009'’]/g, '')
  const commas = compact.split(',').length - 1
  const dots = compact.split('.').length - 1
  let plain: string
  if (commas === 0 && dots <= 1) plain = compact
  else if (commas === 1 && dots === 0) {
    if (/^[1-9]\d{0,2},\d{3}$/.test(compact))
      return refuse(
        'two-ways',
        `“${body}” can be read as ${compact.replace(',', '.')} or as ${compact.replace(',', '')}: write it without the comma.`,
      )
    plain = compact.replace(',', '.')
  } else if (/^\d{1,3}(,\d{3})+(\.\d*)?$/.test(compact)) plain = compact.replace(/,/g, '')
  else if (/^\d{1,3}(\.\d{3})+(,\d*)?$/.test(compact)) plain = compact.replace(/\./g, '').replace(',', '.')
  else return refuse('no-number', `“${body}” is not one number: write it like ${example}.`)
  const power = /[+\-−]?\s*\d+$/.exec(found[3]!)?.[0].replace('−', '-').replace(/\s/g, '') ?? '0'
  const value = Number(`${plain}e${power}`) * (found[1] === '-' || found[1] === '−' ? -1 : 1)
  return { value, figures: figuresIn(plain), rest: text.slice(found[0].length).trim() }
}

/** Significant figures of a number as it was written; zeros at the end of a whole number are counted. */
const figuresIn = (plain: string): number => plain.replace('.', '').replace(/^0+/, '').length || 1

/**
 * Reads what a person typed for a quantity: "9,5 l/s", "0.0095 m3/s", "110mm", "1 450 rpm". A number without a unit takes `unit`;
 * without one it is refused, unless the quantity has none. Never throws.
 */
export const parse = (text: string, quantity: Quantity, unit?: string): Reading => {
  const { words, example } = quantities[quantity]
  const trimmed = text.trim()
  if (trimmed === '') return refuse('empty', `Write ${words}, for example ${example}.`)
  const number = readNumber(trimmed, example)
  if ('ok' in number) return number
  if (!Number.isFinite(number.value))
    return refuse('no-number', `That number is too large to work with. Write ${words} like ${example}.`)

  const unitText = number.rest === '' ? unit : number.rest
  const chosen = unitText === undefined ? unitless(quantity) : findUnit(unitText, quantity)
  if (chosen) {
    const value = conversion(quantity, chosen)!.toSi(number.value)
    return { ok: true, value, unit: chosen.name, figures: number.figures }
  }
  if (unitText === undefined) return refuse('no-unit', `Say the unit too, for example ${example}.`)
  const spelling = librarySpelling(otherSpellings.get(squeeze(unitText)) ?? unitText)
  if (isUnit(spelling)) {
    const meant = quantityOf(spelling)
    return refuse(
      'wrong-quantity',
      `${meant ? `“${unitText}” measures ${quantities[meant].words.replace(/^an? /, '')}` : `“${unitText}” does not measure this`}; ${words} is wanted, for example ${example}.`,
    )
  }
  return refuse('unknown-unit', `The unit “${unitText}” is not known here; write ${words} like ${example}.`)
}

const unitless = (quantity: Quantity): UnitName | undefined =>
  quantities[quantity].units.find((unit) => unit.name === '')
