import type { CalculatorDefinition, Inputs, Outputs, Quantity, Step } from './definition.ts'
import { fill, speak, spoken, type Aside, type Formula } from './formula.ts'
import { format, formatNumber, unitFor } from './units/format.ts'
import { quantities } from './units/quantities.ts'

/** A step of a working, printed: TeX with symbols, TeX with this calculation's numbers, and words. */
export interface PrintedStep {
  say: string
  symbols?: string
  numbers?: string
  speech?: string
  gives?: string
}

const digitsPutIn = 4

const superscript: Record<string, string> = {
  '⁻': '-',
  '⁰': '0',
  '¹': '1',
  '²': '2',
  '³': '3',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
  '⁷': '7',
  '⁸': '8',
  '⁹': '9',
}

const texOf = (formatted: string): string => {
  const text = formatted.replace('−', '-').replace(/\u00a0/g, '{\\,}')
  const power = /^(.*) ×(?:\u00a0| )?10([⁻⁰¹²³⁴-⁹]+)$/.exec(
    text.replace('{\\,}×{\\,}', ' ×').replace(/{\\,}/g, '\u00a0'),
  )
  if (!power) return text
  return `${power[1]!.trim()}\\times 10^{${[...power[2]!].map((c) => superscript[c]).join('')}}`
}

/** A number put in for a symbol: as short as it is exact, at most four digits, in brackets where it would not stand alone. */
const putIn = (value: number, digits = digitsPutIn): string => {
  const short = Number(value.toPrecision(digits))
  const exact = String(Math.abs(short))
  const figures = short.toExponential().split('e')[0]!.replace(/\D/g, '').length
  const tex =
    /e/.test(exact) || Math.abs(short) >= 10_000 || (short !== 0 && Math.abs(short) < 1e-4)
      ? texOf(formatNumber(short, figures))
      : exact
  return value < 0 || tex.includes('times') ? `(${value < 0 ? '-' : ''}${tex.replace('-', value < 0 ? '' : '-')})` : tex
}

const texUnit = (unit: string): string =>
  unit === ''
    ? ''
    : unit === '°'
      ? '^\\circ'
      : `\\;\\mathrm{${unit.replace('°', '^\\circ ').replace(/³/g, '^3').replace(/²/g, '^2').replace(/·/g, '\\,').replace('%', '\\%').replace(/ /g, '\\ ')}}`

/** A result in SI and, where people would say it otherwise, in that unit too. */
const result = (value: number, quantity: Quantity, digits: number, unit?: string): string => {
  const si = quantities[quantity].si.name
  const natural = unitFor(quantity, value, unit).name
  const inUnit = (name: string) => `= ${texOf(format(value, quantity, { digits, unit: name }).text)}${texUnit(name)}`
  return natural === si ? inUnit(si) : `${inUnit(si)} ${inUnit(natural)}`
}

/**
 * `\,` stands for an unwritten "times": a thin space between symbols, a sign between numbers. Only the formula's own: a number put in
 * groups its thousands by the same space.
 */
const timesBetweenNumbers = (formula: Formula): Formula => ({
  parts: formula.parts.map((part) => part.replace(/\\,/g, '\\times ')),
  holes: formula.holes,
})

/** Prints a calculator's working for one calculation. */
export const printWorking = (
  definition: CalculatorDefinition,
  steps: readonly Step[],
  given: Inputs,
  found: Outputs,
): PrintedStep[] =>
  steps.map(({ say, formula, gives }) => {
    if (!formula) return { say, ...(gives === undefined ? {} : { gives }) }
    const said = (key: string) => definition.outputs[key] ?? definition.inputs[key]!
    const symbol = (hole: string | Aside) =>
      typeof hole === 'string' ? (said(hole).symbol ?? `\\text{${said(hole).label}}`) : hole.symbol
    const number = (hole: string | Aside) => {
      if (typeof hole !== 'string') return putIn(hole.value, hole.digits) + texUnit(hole.unit ?? '')
      const value = hole === gives ? undefined : (found[hole] ?? given[hole])
      return typeof value === 'number' ? putIn(value) : symbol(hole)
    }
    const word = (hole: string | Aside) =>
      spoken(typeof hole === 'string' ? said(hole).label.replace(/^[A-Z](?![A-Z])/, (c) => c.toLowerCase()) : hole.say)
    const output = gives === undefined ? undefined : definition.outputs[gives]
    const value = gives === undefined ? undefined : found[gives]
    const end =
      output?.kind === 'scalar' && typeof value === 'number'
        ? ` ${result(value, output.quantity, output.digits ?? 3, output.unit)}`
        : ''
    return {
      say,
      symbols: fill(formula, symbol),
      numbers: fill(timesBetweenNumbers(formula), number) + end,
      speech: speak(fill(formula, word)),
      ...(gives === undefined ? {} : { gives }),
    }
  })
