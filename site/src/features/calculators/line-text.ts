import { fieldText } from '#calc/units/format.ts'
import { parse } from '#calc/units/parse.ts'
import { capital, type ScalarCell } from './columns.ts'
import { changeUnit, firstUnit, offeredName, type FieldText } from './field-text.ts'

/** A run of numbers in one field: "1.42 1.38 0.96 m". The unit behind the last is that of all, unless others say their own. */

const between = /(?:\s*[,;](?=\s)|\s|;)[;\s]*(?=[+\-−]?(?:\d|[.,]\d))/

const parts = (text: string): string[] => {
  const line = text.replace(/[,;\s]+$/, '').trim()
  return line === '' ? [] : line.split(between)
}

/** The one unit of a line, and the line without it; undefined where several are written, or none. */
const unitBehind = (cell: ScalarCell, text: string): { numbers: string; unit: string } | undefined => {
  const all = parts(text)
  const last = all.at(-1) ?? ''
  const reading = parse(last, cell.quantity)
  const number = /^[+\-−]?[\d.,]+/.exec(last)?.[0]
  if (!reading.ok || reading.unit === '' || number === undefined) return undefined
  if (all.slice(0, -1).some((part) => parse(part, cell.quantity).ok)) return undefined
  const unit = offeredName(cell, reading.unit)
  const alone = parse(number, cell.quantity, unit)
  return alone.ok && alone.value === reading.value
    ? { numbers: [...all.slice(0, -1), number].join('  '), unit }
    : undefined
}

/** Puts the unit of "1.42 1.38 m" where the unit is chosen. */
export const splitLine = (text: string, cell: ScalarCell): FieldText => {
  const behind = unitBehind(cell, text)
  return behind ? { text: behind.numbers, unit: behind.unit } : { text, unit: firstUnit(cell) }
}

/** A run as a line of numbers. */
export const lineText = (cell: ScalarCell, run: readonly number[]): FieldText => {
  const unit = firstUnit(cell)
  return { text: run.map((value) => fieldText(value, cell.quantity, unit)).join('  '), unit }
}

/** The unit that a line's numbers have where they say none. */
export const unitOfLine = (cell: ScalarCell, { text, unit }: FieldText): string => unitBehind(cell, text)?.unit ?? unit

/** A line as one text, with its unit. */
export const lineWithUnit = (cell: ScalarCell, { text, unit }: FieldText): string =>
  parts(text).some((part) => parse(part, cell.quantity).ok) || text.trim() === ''
    ? text
    : `${text.trim()} ${unit}`.trim()

/** Each number of a line in another unit; going back brings what was written back. */
export const changeLineUnit = (cell: ScalarCell, field: FieldText, unit: string): FieldText => {
  const before = unitOfLine(cell, field)
  const written = field.written ?? { text: field.text, unit: before }
  if (written.unit === unit) return written
  const text = parts(written.text)
    .map((text) => changeUnit(cell, { text, unit: written.unit }, unit).text)
    .join('  ')
  return { text, unit, written }
}

/** The numbers of a line, apart by spaces, semicolons, or commas with a space behind. */
export const readLine = (cell: ScalarCell, row: string, field: FieldText): { values: number[]; error?: string } => {
  const unit = unitOfLine(cell, field)
  const values: number[] = []
  for (const [i, part] of parts(field.text).entries()) {
    const said = `${capital(row)} ${i + 1}`
    if (/±|\+\s*\/\s*[-−]/.test(part))
      return { values, error: `${said}: leave the ± out; the spread of the ${row}s between the runs tells it.` }
    const reading = parse(part, cell.quantity, unit)
    if (!reading.ok) {
      const { message } = reading
      return { values, error: message.includes(part) ? `${said}: ${message}` : `${said}, “${part}”: ${message}` }
    }
    values.push(reading.value)
  }
  return { values }
}
