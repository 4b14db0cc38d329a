/** Numbers of a record as they are written, with a decimal point or a decimal comma, and thousands grouped or not. */

export type DecimalMark = '.' | ','

const grouped = "\\d{1,3}(?:[ \\u00a0\\u202f'’]\\d{3})+"
const numberWith = (mark: string, group: string) =>
  new RegExp(
    `^[+-]?(?:(?:${grouped}|\\d{1,3}(?:${group}\\d{3})+|\\d+)(?:${mark}\\d*)?|${mark}\\d+)(?:e[+-]?\\d+)?$`,
    'i',
  )
const written: Record<DecimalMark, RegExp> = { '.': numberWith('\\.', ','), ',': numberWith(',', '\\.') }

const withHyphen = (text: string): string => text.replace(/^[−–]/, '-')

/** Whether a text is a number with either mark. */
export const isNumber = (text: string): boolean => {
  const cell = withHyphen(text)
  return written['.'].test(cell) || written[','].test(cell)
}

/** The number that a text writes with this mark; undefined where it is none. */
export const readNumber = (text: string, mark: DecimalMark): number | undefined => {
  const cell = withHyphen(text)
  if (!written[mark].test(cell)) return undefined
  const plain = cell.replace(mark === '.' ? /[, \u00a0\u202f'’]/g : /[. \u00a0\u202f'’]/g, '')
  const value = Number(plain.replace(',', '.'))
  return Number.isFinite(value) ? value : undefined
}

export interface ChosenMark {
  mark: DecimalMark
  /** Set where the other mark fits as well: "1,234" is a thousand or a little more than one. */
  isOpen: boolean
}

/** The decimal mark of a column of numbers: the one under which more of them are numbers, none of them with a thousand that starts with 0. */
export const chooseMark = (cells: readonly string[]): ChosenMark => {
  let point = 0
  let comma = 0
  let mark: DecimalMark | undefined
  for (const text of cells) {
    const hasPoint = text.includes('.')
    const hasComma = text.includes(',')
    if (!hasPoint && !hasComma) continue
    if (!hasPoint) mark = ','
    if (!hasComma) mark = '.'
    const cell = withHyphen(text)
    // No one writes a thousand as 0,125 or 0.125.
    const startsWithNought = /^[+-]?0+[.,]/.test(cell)
    const asPoint = written['.'].test(cell) && !(startsWithNought && !hasPoint)
    const asComma = written[','].test(cell) && !(startsWithNought && !hasComma)
    if (asPoint && !asComma) point++
    if (asComma && !asPoint) comma++
  }
  if (point !== comma) return { mark: point > comma ? '.' : ',', isOpen: false }
  // Only groups of three: 1,234 and 1.234 are then taken with a decimal mark, for daily flows seldom reach thousands.
  return { mark: mark ?? '.', isOpen: mark !== undefined }
}
