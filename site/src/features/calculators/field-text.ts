import type { Cell, PlainValue } from '#calc/index.ts'
import { fieldText } from '#calc/units/format.ts'
import { parse, type Reading } from '#calc/units/parse.ts'
import { quantities } from '#calc/units/quantities.ts'
import { shownUnit } from '#calc/units/system.ts'
import type { ScalarCell } from './columns.ts'

/** One field as written. Of a choice, `text` is the value. */
export interface FieldText {
  text: string
  /** The unit that a number without one takes. */
  unit: string
  /** What was written before the unit was changed: going back brings exactly that back. */
  written?: { text: string; unit: string }
}

export const firstUnit = (cell: ScalarCell): string =>
  shownUnit(cell.quantity, cell.unit ?? quantities[cell.quantity].units[0]!.name)

const valueOfOne = (cell: ScalarCell, unit: string) => {
  const one = parse('1', cell.quantity, unit)
  return one.ok ? one.value : undefined
}

/** The offered name of a unit that was written another way: l/min is L/min, m3/s is m³/s. */
export const offeredName = (cell: ScalarCell, unit: string): string => {
  const names = quantities[cell.quantity].units.map(({ name }) => name)
  if (names.includes(unit)) return unit
  return names.find((name) => valueOfOne(cell, name) === valueOfOne(cell, unit)) ?? unit
}

/** The number alone, where a text is a number and its unit. */
const numberPart = /^\s*([+\-−]?[\d.,\s\u00a0\u202f'’]*\d(?:\s*(?:e|[×x]\s*10\s*\^?)\s*[+\-−]?\d+)?)\s*(?=\D)/i

/** Of "31.4 ± 0.2 m" the unit too; where it does not stand at the end it stays in the text. */
const splitUncertain = (
  text: string,
  cell: ScalarCell,
  { value, uncertainty, unit }: Extract<Reading, { ok: true }>,
) => {
  const alone = text.replace(/(\d|%)\s*[^\d%]*$/, '$1')
  const again = parse(alone, cell.quantity, unit)
  const isSame = again.ok && again.value === value && again.uncertainty === uncertainty
  return { text: isSame ? alone : text, unit: offeredName(cell, unit) }
}

/** Puts the unit of "9.5 L/s" where the unit is chosen; a text that cannot be read stays as it is. */
export const splitUnit = (text: string, cell: ScalarCell): FieldText => {
  const unit = firstUnit(cell)
  const reading = parse(text, cell.quantity, unit)
  if (!reading.ok) return { text, unit }
  if (reading.uncertainty !== undefined) return splitUncertain(text, cell, reading)
  const number = numberPart.exec(text)?.[1]
  if (number === undefined) return { text, unit }
  const alone = parse(number, cell.quantity, reading.unit)
  return alone.ok && alone.value === reading.value
    ? { text: number, unit: offeredName(cell, reading.unit) }
    : { text, unit }
}

/** A number as it was set; in a unit that it was not set in, no longer than it needs to be. */
const startNumber = (value: number, cell: ScalarCell, unit: string): string => {
  const text = fieldText(value, cell.quantity, unit)
  return unit === (cell.unit ?? quantities[cell.quantity].units[0]!.name)
    ? text
    : String(Number(Number(text).toPrecision(4)))
}

export const startText = (cell: Cell, initial: PlainValue | undefined): FieldText => {
  if (cell.kind === 'choice') {
    const start = initial ?? cell.initial ?? cell.fallback ?? (cell.optional ? '' : cell.of[0]!)
    return { text: String(start), unit: '' }
  }
  const unit = firstUnit(cell)
  const start = initial ?? cell.initial
  return { text: typeof start === 'number' ? startNumber(start, cell, unit) : '', unit }
}

export const startCell = (cell: Cell, text: string | number | undefined, initial?: PlainValue): FieldText => {
  if (text === undefined) return startText(cell, initial)
  return cell.kind === 'choice' ? { text: String(text), unit: '' } : splitUnit(String(text), cell)
}

export const isBlank = (field: FieldText | undefined): boolean => field === undefined || field.text.trim() === ''

/** A field that was not written in is the same object, of the same quantity, with every key: it is read once. */
const readings = new WeakMap<FieldText, Reading>()

/** What a number field means as it stands. */
export const readField = (cell: ScalarCell, field: FieldText): Reading => {
  const known = readings.get(field)
  if (known) return known
  const reading = parse(field.text, cell.quantity, field.unit)
  readings.set(field, reading)
  return reading
}

/** The unit that a field's number has: one written in the text goes before the one chosen. */
export const unitOf = (cell: ScalarCell, field: FieldText): string => {
  const reading = readField(cell, field)
  return reading.ok ? offeredName(cell, reading.unit) : field.unit
}

/** The units to choose from, and the one in use where it is another. */
export const unitsOf = (cell: ScalarCell, field: FieldText): string[] => {
  const offered = quantities[cell.quantity].units.map(({ name }) => name)
  const used = unitOf(cell, field)
  return offered.includes(used) ? offered : [...offered, used]
}

/** One digit more than was written, and never fewer than four: changing the unit shows the same quantity. */
const digitsAfterChange = (figures: number): number => Math.max(figures + 1, 4)

/** The ± of a reading, in another unit. */
const uncertaintyText = (
  cell: ScalarCell,
  { value, uncertainty }: Extract<Reading, { ok: true }>,
  unit: string,
): string => {
  if (uncertainty === undefined) return ''
  const end = (at: number) => Number(fieldText(at, cell.quantity, unit))
  return ` ± ${Number((end(value + uncertainty) - end(value)).toPrecision(2))}`
}

/** Another unit for the same quantity: the number is converted. What cannot be read stays as it is. */
export const changeUnit = (cell: ScalarCell, field: FieldText, unit: string): FieldText => {
  const written = field.written ?? { text: field.text, unit: unitOf(cell, field) }
  if (written.unit === unit) return written
  const reading = readField(cell, written)
  if (!reading.ok) return { text: field.text, unit }
  const exact = Number(fieldText(reading.value, cell.quantity, unit))
  const text = String(Number(exact.toPrecision(digitsAfterChange(reading.figures))))
  return { text: text + uncertaintyText(cell, reading, unit), unit, written }
}
