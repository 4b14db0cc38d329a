import type { Quantity } from '../definition.ts'
import { conversion, isUnit, quantities, quantityOf, type UnitName } from './quantities.ts'

export type Reading =
  | {
      ok: true
      value: number
      unit: string
      figures: number
      /** One standard uncertainty, SI. */ uncertainty?: number
    }
  | {
      ok: false
      code: 'empty' | 'no-number' | 'two-ways' | 'no-unit' | 'unknown-unit' | 'wrong-quantity'
      message: string
    }

type Refusal = Extract<Reading, { ok: false }>
const refuse = (code: Refusal['code'], message: string): Refusal => ({ ok: false, code, message })

/** Names and short forms that the unit library does not know, lower case and without spaces. */
const otherSpellings = new Map<string, string>(
  Object.entries({
    lps: 'L/s',
    lpm: 'L/min',
    cumec: 'm³/s',
    cumecs: 'm³/s',
    cfs: 'ft³/s',
    cusec: 'ft³/s',
    cusecs: 'ft³/s',
    mps: 'm/s',
    kph: 'km/h',
    kmh: 'km/h',
    rpm: 'rev/min',
    'r/min': 'rev/min',
    'revs/min': 'rev/min',
    'turns/min': 'rev/min',
    '/min': 'rev/min',
    '1/min': 'rev/min',
    'revs/s': 'rev/s',
    'turns/s': 'rev/s',
    '/s': 'rev/s',
    '1/s': 'rev/s',
    deg: '°',
    degree: '°',
    degrees: '°',
    º: '°',
    c: '°C',
    degc: '°C',
    ºc: '°C',
    celsius: '°C',
    f: '°F',
    degf: '°F',
    ºf: '°F',
    fahrenheit: '°F',
    percent: '%',
    pct: '%',
    barg: 'bar',
    'bar(g)': 'bar',
    'lb/in2': 'psi',
    'lbf/in2': 'psi',
    "'": 'ft',
    '’': 'ft',
    '′': 'ft',
    '"': 'in',
    '”': 'in',
    '″': 'in',
    cp: 'mPa·s',
    cst: 'mm²/s',
    kwhr: 'kWh',
    kwhrs: 'kWh',
    'm/100m': 'm per 100 m',
    usgpm: 'US gal/min',
    'usgal/min': 'US gal/min',
    usgal: 'US gal',
    usgals: 'US gal',
    kilo: 'kg',
    kilos: 'kg',
    kelvin: 'K',
    kelvins: 'K',
    'mm/m/k': 'mm/(m·K)',
    'mm/mk': 'mm/(m·K)',
    'mm/(mk)': 'mm/(m·K)',
    amp: 'A',
    amps: 'A',
    ω: 'Ω',
    mω: 'mΩ',
    ohm: 'Ω',
    ohms: 'Ω',
    milliohm: 'mΩ',
    milliohms: 'mΩ',
    'ω/km': 'Ω/km',
    'ohm/km': 'Ω/km',
    'ohms/km': 'Ω/km',
    'ω/m': 'Ω/m',
    'ohm/m': 'Ω/m',
    'ohms/m': 'Ω/m',
    'v/1000rpm': 'V per 1000 rev/min',
    'v/1000rev/min': 'V per 1000 rev/min',
    'us/cm': 'µS/cm',
    'μs/cm': 'µS/cm',
    'mg/l/us/cm': 'mg/L per µS/cm',
    'mg/l/μs/cm': 'mg/L per µS/cm',
    year: 'years',
    yr: 'years',
    yrs: 'years',
    '/kwh': 'per kWh',
    '/m': 'per m',
  }),
)

const prefixes: Record<string, string> = { '': '', milli: 'm', centi: 'c', deci: 'd', kilo: 'k', mega: 'M' }
const unitWords: Record<string, string> = {
  metre: 'm',
  meter: 'm',
  mtr: 'm',
  litre: 'L',
  liter: 'L',
  ltr: 'L',
  watt: 'W',
  pascal: 'Pa',
  newton: 'N',
  volt: 'V',
  ampere: 'A',
  gram: 'g',
  bar: 'bar',
  second: 's',
  sec: 's',
  minute: 'min',
  min: 'min',
  hour: 'h',
  hr: 'h',
  inch: 'in',
  inche: 'in',
  foot: 'ft',
  feet: 'ft',
}
const unitWord = new RegExp(`\\b(milli|centi|deci|kilo|mega|)(${Object.keys(unitWords).join('|')})s?\\b`, 'gi')

/** Words as signs: "litres per second" is L/s, "square metres" m^2, "m s-1" m/s. */
const asSigns = (text: string): string =>
  text
    .replace(/ℓ/g, 'L')
    .replace(/\bper\s+cent\b/gi, '%')
    .replace(
      unitWord,
      (_, prefix: string, word: string) => prefixes[prefix.toLowerCase()]! + unitWords[word.toLowerCase()]!,
    )
    .replace(/\b(?:square|sq\.?)\s+([a-z]+)/gi, '$1^2')
    .replace(/\b(?:cubic|cu\.?)\s+([a-z]+)/gi, '$1^3')
    .replace(/\s*[·⋅]?\s*(min|s|h)(?:\^?-1|⁻¹)$/, '/$1')
    .replace(/\s*(?:\bper\b|\/)\s*/gi, '/')

/** As the unit library spells it: m³/s and m3/s become m^3/s, min becomes minute. */
const librarySpelling = (text: string): string =>
  text
    .replace(/³/g, '^3')
    .replace(/²/g, '^2')
    .replace(/([a-zA-Z])([23])(?![0-9])/g, '$1^$2')
    .replace(/[·⋅*]/g, ' ')
    .replace(/[µμ]/g, 'u')
    .replace(/\bmin\b/gi, 'minute')
    .replace(/\bh\b/g, 'hour')

const squeeze = (text: string): string => text.toLowerCase().replace(/\s+/g, '')

/** How a unit is spelled here, whichever way it was written. */
const spell = (written: string): string => {
  const signs = asSigns(written)
  return otherSpellings.get(squeeze(written)) ?? otherSpellings.get(squeeze(signs)) ?? signs
}

const isSameUnit = (quantity: Quantity, one: UnitName, other: UnitName): boolean => {
  const [a, b] = [conversion(quantity, one), conversion(quantity, other)]
  return a !== undefined && b !== undefined && a.toSi(1) === b.toSi(1) && a.toSi(0) === b.toSi(0)
}

const findUnit = (written: string, quantity: Quantity): UnitName | undefined => {
  const { units, si } = quantities[quantity]
  const known = [...units, si]
  const spelling = spell(written)
  const exact = known.find(({ name }) => name === written) ?? known.find(({ name }) => name === spelling)
  if (exact) return exact
  /** The unit library's, under the name that it has here, if it has one. */
  const fromLibrary = (mathjs: string): UnitName | undefined => {
    const unit = { name: spelling, mathjs }
    if (!isUnit(mathjs) || !conversion(quantity, unit)) return undefined
    return known.find((one) => isSameUnit(quantity, one, unit)) ?? unit
  }
  const mathjs = librarySpelling(spelling)
  // "mW" and "MW" differ: an exact spelling goes before one that is right but for capitals.
  return (
    fromLibrary(mathjs) ??
    known.find(({ name }) => squeeze(name) === squeeze(spelling)) ??
    known.find((unit) => unit.mathjs !== undefined && squeeze(unit.mathjs) === squeeze(mathjs)) ??
    fromLibrary(mathjs.toLowerCase())
  )
}

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** 10⁻³ as 10^-3. */
const plainPowers = (text: string): string =>
  text.replace(
    /10(⁻?)([⁰¹²³⁴-⁹]+)/,
    (_, minus: string, power: string) => `10^${minus && '-'}${[...power].map((c) => superscripts.indexOf(c)).join('')}`,
  )

/** Sign; digits, perhaps grouped in threes by spaces or apostrophes, with points and commas; perhaps a power of ten. */
const numberPattern =
  /^[=~≈]?\s*([+\-−]?)\s*((?:\d{1,3}(?:[ \u00a0\u202f\u2009'’]\d{3})+(?!\d)|\d*)(?:[.,]\d+)*[.,]?)(?:\s*(?:e|[×x·*]\s*10\s*(?:\^|(?=[+\-−])))\s*([+\-−]?\s*\d+))?/i

/** What cannot follow a number: more of it, or the rest of a fraction, a clock time, feet and inches. */
const moreNumber = /^\s*['’′/:x×]?\s*\d(?!\s*\/\s*[a-z])/i

/**
 * The number at the start of a text, however its writer groups and points it: 9,5 · 9.5 · 1 450 · 1,450.5 · 1.450,5 · 2e-3.
 * A lone comma before three digits can be read two ways and is refused.
 */
const readNumber = (text: string, example: string): { value: number; figures: number; rest: string } | Refusal => {
  const [whole, sign, body = '', power = '0'] = numberPattern.exec(text) ?? ['']
  if (!/\d/.test(body)) return refuse('no-number', `Start with a number, for example ${example}.`)
  const notOne = refuse('no-number', `“${text.slice(0, 40)}” is not one number: write it like ${example}.`)
  const rest = text.slice(whole.length)
  if (moreNumber.test(rest)) return notOne
  const compact = body.replace(/[ \u00a0\u202f\u2009'’]/g, '')
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
  else return notOne
  const size = Number(`${plain}e${power.replace('−', '-').replace(/\s/g, '')}`)
  return { value: sign === '-' || sign === '−' ? -size : size, figures: figuresIn(plain), rest }
}

/** Significant figures of a number as it was written; zeros at the end of a whole number are counted. */
const figuresIn = (plain: string): number => plain.replace('.', '').replace(/^0+/, '').length || 1

/** A gallon is a US or an imperial one; the unit library would take the first without asking. */
const gallons = /\b(gal|gals|gallons?|gpm|gpd)\b/i
/** Said with their country they are clear. */
const usGallons = /^US\s?(gal|gpm)/i

const plusMinus = /\s*(?:±|\+\s*\/\s*[-−]|\+[-−])\s*/
const perCent = /^(.*\d)\s*(?:%|per\s*cent\b|percent\b)\s*(\D*)$/i

/**
 * Reads what a person typed for a quantity: "9,5 l/s", "0.0095 m3/s", "110mm", "1 450 rpm". A number without a unit takes `unit`;
 * without one it is refused, unless the quantity has none. What follows a ± is one standard uncertainty, in the same unit, in its own, or
 * in per cent of the number: "31.4 ± 0.2 m", "31.4 m ± 2 %". Never throws.
 */
export const parse = (text: string, quantity: Quantity, unit?: string): Reading => {
  const [body = '', spread, ...more] = text.split(plusMinus)
  if (spread === undefined) return parseOne(text, quantity, unit)
  const { example } = quantities[quantity]
  const badSpread = (what: string) => refuse('no-number', `${what} Write it like ${example}, or ${example} ± 2 %.`)
  if (more.length > 0 || !/\d/.test(spread)) return badSpread('After ± comes one number, the standard uncertainty.')
  const share = quantities[quantity].units.some(({ name }) => name === '%') ? null : perCent.exec(spread)
  if (share) {
    const value = parseOne(body, quantity, share[2] || unit)
    const part = readNumber(share[1]!, '2')
    if (!value.ok) return value
    if ('ok' in part || part.rest !== '' || part.value < 0) return badSpread('The uncertainty cannot be read.')
    return { ...value, uncertainty: (Math.abs(value.value) * part.value) / 100 }
  }
  // "31.4 ± 0.2 m": the one unit is that of both.
  const behind = parseOne(spread, quantity)
  const alone = parseOne(body, quantity)
  const value = alone.ok ? alone : parseOne(body, quantity, behind.ok ? behind.unit : unit)
  if (!value.ok) return value
  const part = behind.ok ? behind : parseOne(spread, quantity, value.unit)
  if (!part.ok) return part
  const zero = parseOne('0', quantity, part.unit)
  const uncertainty = part.value - (zero.ok ? zero.value : 0)
  return uncertainty < 0 ? badSpread('The uncertainty is never below zero.') : { ...value, uncertainty }
}

const parseOne = (text: string, quantity: Quantity, unit?: string): Reading => {
  const { words, example } = quantities[quantity]
  const trimmed = plainPowers(text.trim())
  if (trimmed === '') return refuse('empty', `Write ${words}, for example ${example}.`)
  const number = readNumber(trimmed, example)
  if ('ok' in number) return number
  if (!Number.isFinite(number.value))
    return refuse('no-number', `That number is too large to work with. Write ${words} like ${example}.`)

  const rest = number.rest.replace(/[.,;]?\s*$/, '').trim()
  const written = rest === '' ? unit : rest
  const chosen = written === undefined ? unitless(quantity) : findUnit(written, quantity)
  const isUnclear = written !== undefined && gallons.test(written) && !usGallons.test(written)
  if (chosen && !isUnclear) {
    const value = conversion(quantity, chosen)!.toSi(number.value)
    return { ok: true, value, unit: chosen.name, figures: number.figures }
  }
  if (written === undefined) return refuse('no-unit', `Say the unit too, for example ${example}.`)
  if (isUnclear)
    return refuse(
      'unknown-unit',
      `A gallon is 3.785 L in one country and 4.546 L in another: write ${words} like ${example}.`,
    )
  const spelling = librarySpelling(spell(written))
  if (!isUnit(spelling))
    return refuse(
      'unknown-unit',
      `The unit “${written.slice(0, 40)}” is not known here; write ${words} like ${example}.`,
    )
  const meant = quantityOf(spelling)
  const measures = meant
    ? `“${written}” measures ${quantities[meant].words.replace(/^an? /, '')}`
    : `“${written}” does not measure this`
  return refuse('wrong-quantity', `${measures}; ${words} is wanted, for example ${example}.`)
}

const unitless = (quantity: Quantity): UnitName | undefined =>
  quantities[quantity].units.find((unit) => unit.name === '')
