import type { CalculatorDefinition, Cell, Input, Inputs, InputValue, PlainRow, PlainValue } from '#calc/index.ts'
import { CalculationError } from '#calc/errors.ts'
import { solveDefinition, type Solution } from '#calc/solve-definition.ts'
import { fieldText } from '#calc/units/format.ts'
import { parse, type Reading } from '#calc/units/parse.ts'
import { quantities } from '#calc/units/quantities.ts'
import {
  columnsOf,
  columnsOfRow,
  isList,
  isMany,
  pathOf,
  type ListInput,
  type ManyInput,
  type ScalarCell,
} from './columns.ts'

/**
 * What stands in the fields of a calculator, as it was written, and what that means. A field's path is its key, the key and a column's
 * name for a group (`nozzles.diameter`), and the row's number between or behind them for a list (`sections.0.length`, `times.0`).
 */

/** One field as written. Of a choice, `text` is the value. */
export interface FieldText {
  text: string
  /** The unit that a number without one takes. */
  unit: string
  /** What was written before the unit was changed: going back brings exactly that back. */
  written?: { text: string; unit: string }
}
export type RowTexts = Readonly<Record<string, FieldText>>
export interface Form {
  fields: Readonly<Record<string, FieldText>>
  /** The rows of each list; a group is a list of one, and a row of a series has one field, without a name. */
  rows: Readonly<Record<string, readonly RowTexts[]>>
  /** Of two alternatives, the key that is known. */
  known: readonly string[]
}
/** Texts by path: what a lesson presets, and what an address carries. */
export type Texts = Readonly<Record<string, string | number | undefined>>

const firstUnit = (cell: ScalarCell): string => cell.unit ?? quantities[cell.quantity].units[0]!.name

const valueOfOne = (cell: ScalarCell, unit: string) => {
  const one = parse('1', cell.quantity, unit)
  return one.ok ? one.value : undefined
}

/** The offered name of a unit that was written another way: l/min is L/min, m3/s is m³/s. */
const offeredName = (cell: ScalarCell, unit: string): string => {
  const names = quantities[cell.quantity].units.map(({ name }) => name)
  if (names.includes(unit)) return unit
  return names.find((name) => valueOfOne(cell, name) === valueOfOne(cell, unit)) ?? unit
}

/** The number alone, where a text is a number and its unit. */
const numberPart = /^\s*([+\-−]?[\d.,\s\u00a0\u202f'’]*\d(?:\s*(?:e|[×x]\s*10\s*\^?)\s*[+\-−]?\d+)?)\s*(?=\D)/i

/** Puts the unit of "9.5 L/s" where the unit is chosen; a text that cannot be read stays as it is. */
const splitUnit = (text: string, cell: ScalarCell): FieldText => {
  const unit = firstUnit(cell)
  const reading = parse(text, cell.quantity, unit)
  const number = numberPart.exec(text)?.[1]
  if (!reading.ok || number === undefined) return { text, unit }
  const alone = parse(number, cell.quantity, reading.unit)
  return alone.ok && alone.value === reading.value
    ? { text: number, unit: offeredName(cell, reading.unit) }
    : { text, unit }
}

const startText = (cell: Cell, initial: PlainValue | undefined): FieldText => {
  if (cell.kind === 'choice') {
    const start = initial ?? cell.initial ?? cell.fallback ?? (cell.optional ? '' : cell.of[0]!)
    return { text: String(start), unit: '' }
  }
  const unit = firstUnit(cell)
  const start = initial ?? cell.initial
  return { text: typeof start === 'number' ? fieldText(start, cell.quantity, unit) : '', unit }
}

const startCell = (cell: Cell, text: string | number | undefined, initial?: PlainValue): FieldText => {
  if (text === undefined) return startText(cell, initial)
  return cell.kind === 'choice' ? { text: String(text), unit: '' } : splitUnit(String(text), cell)
}

const startRow = (input: ManyInput, key: string, row: number, texts: Texts, initial?: PlainRow): RowTexts =>
  Object.fromEntries(
    Object.entries(columnsOf(input)).map(([name, cell]) => [
      name,
      startCell(cell, texts[pathOf(input, key, row, name)], initial?.[name]),
    ]),
  )

const initialRows = (input: ManyInput): readonly PlainRow[] => {
  switch (input.kind) {
    case 'group':
      return [input.initial ?? {}]
    case 'rows':
      return input.initial ?? Array.from({ length: input.optional ? 0 : input.least }, () => ({}))
    case 'series':
      return input.initial?.map((value) => ({ '': value })) ?? Array.from({ length: input.least }, () => ({}))
  }
}

const rowNumber = /^\d{1,4}$/

/** How many rows the texts speak of; undefined where they are silent. */
const rowsToldOf = (input: ListInput, key: string, texts: Texts): number | undefined => {
  const numbers = Object.keys(texts).flatMap((path) => {
    const [of, number = ''] = path.split('.')
    return of === key && rowNumber.test(number) ? [Number(number)] : []
  })
  if (numbers.length > 0) return Math.min(Math.max(...numbers) + 1, input.most)
  return texts[key] === '' ? 0 : undefined
}

const startRows = (input: ManyInput, key: string, texts: Texts): RowTexts[] => {
  const initial = initialRows(input)
  const told = isList(input) ? rowsToldOf(input, key, texts) : undefined
  return told === undefined
    ? initial.map((row, i) => startRow(input, key, i, texts, row))
    : Array.from({ length: told }, (_, i) => startRow(input, key, i, texts))
}

/** The fields as a form starts with them: the texts given, and for the others what the definition starts with. */
export const startForm = ({ inputs }: CalculatorDefinition, texts: Texts = {}): Form => {
  const fields: Record<string, FieldText> = {}
  const rows: Record<string, readonly RowTexts[]> = {}
  const known: string[] = []
  const isGiven = (key: string) => Object.keys(texts).some((path) => path === key || path.startsWith(`${key}.`))
  for (const [key, input] of Object.entries(inputs)) {
    if (isMany(input)) rows[key] = startRows(input, key, texts)
    else fields[key] = startCell(input, texts[key])

    const other = input.or
    if (other === undefined || known.includes(other)) continue
    const otherFirst = isGiven(other) ? !isGiven(key) : !isGiven(key) && !starts(input) && starts(inputs[other]!)
    if (!otherFirst) known.push(key)
    else known.push(other)
  }
  return { fields, rows, known: [...new Set(known)] }
}

const starts = (input: Input): boolean => input.initial !== undefined

const isBlank = (field: FieldText | undefined): boolean => field === undefined || field.text.trim() === ''

/** Whether an input has its place in the form as it stands: not the alternative that is not known, nor what goes with it. */
export const isShown = (definition: CalculatorDefinition, form: Form, key: string): boolean => {
  const { inputs } = definition
  const input = inputs[key]!
  if (input.or !== undefined) return form.known.includes(key)
  const partner = input.goesWith ?? input.needs
  if (partner === undefined || inputs[partner] === undefined) return true
  if (!isShown(definition, form, partner)) return false
  return input.goesWith === undefined || !inputs[partner].optional || !isBlank(form.fields[partner])
}

export const shownKeys = (definition: CalculatorDefinition, form: Form): string[] =>
  Object.keys(definition.inputs).filter((key) => isShown(definition, form, key))

/** What a number field means as it stands. */
export const readField = (cell: ScalarCell, field: FieldText): Reading => parse(field.text, cell.quantity, field.unit)

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

/** Another unit for the same quantity: the number is converted. What cannot be read stays as it is. */
export const changeUnit = (cell: ScalarCell, field: FieldText, unit: string): FieldText => {
  const written = field.written ?? { text: field.text, unit: unitOf(cell, field) }
  if (written.unit === unit) return written
  const reading = readField(cell, written)
  if (!reading.ok) return { text: field.text, unit }
  const exact = Number(fieldText(reading.value, cell.quantity, unit))
  return { text: String(Number(exact.toPrecision(digitsAfterChange(reading.figures)))), unit, written }
}

export interface FormReading {
  inputs: Inputs
  /** What to write instead, by path. */
  errors: Readonly<Record<string, string>>
}

const readCell = (cell: Cell, field: FieldText): { value?: PlainValue; error?: string } => {
  if (cell.optional && isBlank(field)) return {}
  if (cell.kind === 'choice') return { value: field.text }
  const reading = readField(cell, field)
  return reading.ok ? { value: reading.value } : { error: reading.message }
}

/** What the fields say, for `solve`. */
export const readForm = (definition: CalculatorDefinition, form: Form): FormReading => {
  const inputs: Record<string, InputValue> = {}
  const errors: Record<string, string> = {}
  const read = (cell: Cell, field: FieldText, path: string) => {
    const { value, error } = readCell(cell, field)
    if (error !== undefined) errors[path] = error
    return value
  }
  const readRow = (input: ManyInput, key: string, row: RowTexts, i: number): PlainRow =>
    Object.fromEntries(
      Object.entries(columnsOfRow(definition, input, row)).flatMap(([name, cell]) => {
        const value = read(cell, row[name]!, pathOf(input, key, i, name))
        return value === undefined ? [] : [[name, value]]
      }),
    )
  for (const key of shownKeys(definition, form)) {
    const input = definition.inputs[key]!
    if (isMany(input)) {
      const rows = form.rows[key]!.map((row, i) => readRow(input, key, row, i))
      if (input.kind === 'group') inputs[key] = rows[0]!
      else if (rows.length > 0 || !input.optional)
        inputs[key] = input.kind === 'series' ? rows.map((row) => row[''] as number) : rows
    } else {
      const mayMiss = input.needs !== undefined && isBlank(form.fields[key])
      const value = mayMiss ? undefined : read(input, form.fields[key]!, key)
      if (value !== undefined) inputs[key] = value
    }
  }
  return { inputs, errors }
}

/** `sections[0].length` → `sections.0.length`. */
export const pathOfField = (field: string): string => field.replace(/\[(\d+)\]/g, '.$1')

export interface Solved {
  inputs: Inputs
  solution: Solution
}
export type Attempt = Solved | { solution?: undefined; errors: Readonly<Record<string, string>> }

/** Works the form out, or says by path what stands in the way. */
export const solveForm = (definition: CalculatorDefinition, form: Form): Attempt => {
  const { inputs, errors } = readForm(definition, form)
  if (Object.keys(errors).length > 0) return { errors }
  try {
    return { inputs, solution: solveDefinition(definition, inputs) }
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error
    return { errors: { [pathOfField(error.field)]: error.message } }
  }
}

const setField = (form: Form, path: string, change: (field: FieldText) => FieldText): Form => {
  const [key, second, third] = path.split('.') as [string, string?, string?]
  if (second === undefined) return { ...form, fields: { ...form.fields, [key]: change(form.fields[key]!) } }
  const [number, name] = rowNumber.test(second) ? [Number(second), third ?? ''] : [0, second]
  const rows = form.rows[key]!.map((row, i) => (i === number ? { ...row, [name]: change(row[name]!) } : row))
  return { ...form, rows: { ...form.rows, [key]: rows } }
}

export type FormAction =
  | { do: 'write'; path: string; text: string }
  | { do: 'change-unit'; path: string; cell: ScalarCell; unit: string }
  | { do: 'know'; key: string; instead: string }
  | { do: 'add-row'; key: string }
  | { do: 'remove-row'; key: string; number: number }

export const changeForm = (definition: CalculatorDefinition, form: Form, action: FormAction): Form => {
  switch (action.do) {
    case 'write':
      return setField(form, action.path, ({ unit }) => ({ text: action.text, unit }))
    case 'change-unit':
      return setField(form, action.path, (field) => changeUnit(action.cell, field, action.unit))
    case 'know':
      return { ...form, known: [...form.known.filter((key) => key !== action.instead), action.key] }
    case 'add-row': {
      const input = definition.inputs[action.key]!
      if (!isList(input)) return form
      const rows = form.rows[action.key]!
      // A new row is most often like the one before it; the next of a series is another number.
      const like = input.kind === 'rows' ? rows.at(-1) : undefined
      const added =
        like ?? startRow(input, action.key, rows.length, {}, input.kind === 'rows' ? input.initial?.[0] : {})
      return { ...form, rows: { ...form.rows, [action.key]: [...rows, added] } }
    }
    case 'remove-row':
      return {
        ...form,
        rows: { ...form.rows, [action.key]: form.rows[action.key]!.filter((_, i) => i !== action.number) },
      }
  }
}
