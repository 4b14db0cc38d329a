/**
 * Formulas of a working. A formula is written once, in a small part of TeX, with holes; each hole is a key of the
 * calculator or an aside. It is then printed with symbols, with this calculation's numbers, or as speech.
 */

/** A quantity that a formula needs but that is neither an input nor an output: gravity, the pipe's open area. */
export interface Aside {
  symbol: string
  value: number
  say: string
  digits?: number
  /** Printed after the number: for a result that is no output. */
  unit?: string
}

/** A formula whose holes are keys or asides; there is one part more than holes. */
export interface Formula<K extends string = string> {
  parts: readonly string[]
  holes: readonly (K | Aside)[]
}

/** The tag that writes a formula: write`v = ${'velocityCoefficient'}\sqrt{2 ${gravity} ${'netHead'}}`. */
export type WriteFormula<K extends string> = (parts: TemplateStringsArray, ...holes: (K | Aside)[]) => Formula<K>

/** Keeps the backslashes of TeX as they were written. */
export const writeFormula = <K extends string>(parts: TemplateStringsArray, ...holes: (K | Aside)[]): Formula<K> => ({
  parts: parts.raw,
  holes,
})

/** Puts a text into every hole. */
export const fill = <K extends string>(formula: Formula<K>, text: (hole: K | Aside) => string): string =>
  formula.parts.reduce((whole, part, i) => whole + part + (i < formula.holes.length ? text(formula.holes[i]!) : ''), '')

const words: Record<string, string> = {
  '\\pi': 'pi',
  '\\rho': 'rho',
  '\\eta': 'eta',
  '\\nu': 'nu',
  '\\mu': 'mu',
  '\\lambda': 'lambda',
  '\\varepsilon': 'epsilon',
  '\\alpha': 'alpha',
  '\\beta': 'beta',
  '\\theta': 'theta',
  '\\Delta': 'change of',
  '\\sum': 'the sum of',
  '\\sin': 'the sine of',
  '\\cos': 'the cosine of',
  '\\tan': 'the tangent of',
  '\\log_{10}': 'the logarithm to ten of',
  '\\ln': 'the natural logarithm of',
  '\\cdot': 'times',
  '\\times': 'times',
  '\\approx': 'is about',
  '\\,': 'times',
  '\\;': ' ',
  '\\left': ' ',
  '\\right': ' ',
  '=': 'equals',
  '+': 'plus',
  '-': 'minus',
  '/': 'over',
  '(': 'open bracket',
  ')': 'close bracket',
}
const powers: Record<string, string> = { '2': 'squared', '3': 'cubed' }

/** A reading cursor over TeX tokens. */
class Reader {
  private at = 0
  private readonly tokens: string[]
  constructor(tex: string) {
    // «…» holds words put in for a hole: they are one token.
    this.tokens = tex.match(/«[^»]*»|\\log_\{10\}|\\[a-zA-Z]+|\\[,;]|[0-9.]+|[a-zA-Z]+|[^\s]/g) ?? []
  }
  get next(): string | undefined {
    return this.tokens[this.at]
  }
  take(): string {
    return this.tokens[this.at++] ?? ''
  }
  group(): string {
    if (this.next !== '{') return this.word()
    this.take()
    const spoken = this.until('}')
    this.take()
    return spoken
  }
  until(end?: string): string {
    const said: string[] = []
    while (this.next !== undefined && this.next !== end) said.push(this.word())
    return said.join(' ')
  }
  private word(): string {
    const token = this.take()
    if (token.startsWith('«')) return token.slice(1, -1)
    if (token === '\\frac') return `${this.group()}, over ${this.group()},`
    if (token === '\\sqrt') return `the square root of ${this.group()},`
    if (token === '\\text' || token === '\\mathrm') return this.group()
    if (token === '{') {
      const spoken = this.until('}')
      this.take()
      return spoken
    }
    if (token === '^') {
      const power = this.group()
      return powers[power] ?? `to the power ${power}`
    }
    if (token === '_') return `sub ${this.group()}`
    return words[token] ?? token
  }
}

/** TeX of the kind that workings are written in, as a sentence for a screen reader. */
export const speak = (tex: string): string =>
  new Reader(tex)
    .until()
    .replace(/\s+/g, ' ')
    .replace(/ ,/g, ',')
    .replace(/,+/g, ',')
    .replace(/,(\s*)$/, '')
    .trim()

/** Words as one token of `speak`. */
export const spoken = (text: string): string => `«${text.replace(/[«»]/g, '')}»`
