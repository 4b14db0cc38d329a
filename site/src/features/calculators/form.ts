import type { CalculatorDefinition, Cell, Input, Inputs, InputValue, PlainRow, PlainValue } from '#calc/index.ts'
import { CalculationError } from '#calc/errors.ts'
import { solveDefinition, type Solution } from '#calc/solve-definition.ts'
import { fieldText } from '#calc/units/format.ts'
import { parse, type Reading } from '#calc/units/parse.ts'
import { quantities } from '#calc/units/quantities.ts'
import { shownUnit } from '#calc/units/system.ts'
import {
  columnsOf,
  columnsOfRow,
  capital,
  isList,
  isMany,
  isRecord,
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
/** A record that was read from a file or a paste, and what it is. */
export interface FlowRecord {
  values: readonly number[]
  /** "An invented year", or the file's name. */
  from: string
}
export interface Form {
  fields: Readonly<Record<string, FieldText>>
  /** What was taken as a whole: years of flows, SI. */
  records: Readonly<Record<string, FlowRecord>>
  /** The rows of each list; a group is a list of one, and a row of a series has one field, without a name. */
  rows: Readonly<Record<string, readonly RowTexts[]>>
  /** Of two alternatives, the key that is known. */
  known: readonly string[]
}
/** Texts by path: what a lesson presets, and what an address carries. */
export type Texts = Readonly<Record<string, string | number | undefined>>

const firstUnit = (cell: ScalarCell): string =>
  shownUnit(cell.quantity, cell.unit ?? quantities[cell.quantity].units[0]!.name)

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
const splitUnit = (text: string, cell: ScalarCell): FieldText => {
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

const startText = (cell: Cell, initial: PlainValue | undefined): FieldText => {
  if (cell.kind === 'choice') {
    const start = initial ?? cell.initial ?? cell.fallback ?? (cell.optional ? '' : cell.of[0]!)
    return { text: String(start), unit: '' }
  }
  const unit = firstUnit(cell)
  const start = initial ?? cell.initial
  return { text: typeof start === 'number' ? startNumber(start, cell, unit) : '', unit }
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

/** A row with nothing in it, in the units of the one before. */
export const emptyRow = (input: ListInput, like?: RowTexts): RowTexts =>
  Object.fromEntries(
    Object.entries(columnsOf(input)).map(([name, cell]) => [
      name,
      {
        text: cell.kind === 'choice' ? (cell.optional ? '' : cell.of[0]!) : '',
        unit: like?.[name]?.unit ?? startText(cell, undefined).unit,
      },
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
    case 'runs':
      return Array.from({ length: input.initial?.length ?? input.least }, () => ({}))
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

/** A run as a line of numbers. */
export const lineText = (input: Extract<Input, { kind: 'runs' }>, run: readonly number[]): FieldText => {
  const unit = firstUnit(columnsOf(input)[''] as ScalarCell)
  return { text: run.map((value) => fieldText(value, input.quantity, unit)).join('  '), unit }
}

const startRows = (input: ManyInput, key: string, texts: Texts): RowTexts[] => {
  const initial = initialRows(input)
  const told = isList(input) ? rowsToldOf(input, key, texts) : undefined
  return told === undefined
    ? initial.map((row, i) =>
        input.kind === 'runs' && input.initial
          ? { '': lineText(input, input.initial[i]!) }
          : startRow(input, key, i, texts, row),
      )
    : Array.from({ length: told }, (_, i) => startRow(input, key, i, texts))
}

/** The fields as a form starts with them: the texts given, and for the others what the definition starts with. */
export const startForm = ({ inputs }: CalculatorDefinition, texts: Texts = {}, records: Form['records'] = {}): Form => {
  const fields: Record<string, FieldText> = {}
  const rows: Record<string, readonly RowTexts[]> = {}
  const taken: Record<string, FlowRecord> = {}
  const known: string[] = []
  const isGiven = (key: string) => Object.keys(texts).some((path) => path === key || path.startsWith(`${key}.`))
  for (const [key, input] of Object.entries(inputs)) {
    if (isRecord(input)) taken[key] = records[key] ?? { values: input.initial ?? [], from: 'An invented record' }
    else if (isMany(input)) rows[key] = startRows(input, key, texts)
    else fields[key] = startCell(input, texts[key])

    const other = input.or
    if (other === undefined || known.includes(other)) continue
    const otherFirst = isGiven(other) ? !isGiven(key) : !isGiven(key) && !starts(input) && starts(inputs[other]!)
    if (!otherFirst) known.push(key)
    else known.push(other)
  }
  return { fields, rows, records: taken, known: [...new Set(known)] }
}

const starts = (input: Input): boolean => input.initial !== undefined

const isBlank = (field: FieldText | undefined): boolean => field === undefined || field.text.trim() === ''

/** Whether an input has its place in the form as it stands: not the alternative that is not known, nor what goes with it. */
export const isShown = (definition: CalculatorDefinition, form: Form, key: string): boolean => {
  const { inputs } = definition
  const input = inputs[key]!
  if (input.when && !input.when.is.includes(form.fields[input.when.key]?.text ?? '')) return false
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

/** Each number of a line in another unit. */
const changeLineUnit = (cell: ScalarCell, field: FieldText, unit: string): FieldText => ({
  text: lineParts(field.text)
    .map((text) => changeUnit(cell, { text, unit: field.unit }, unit).text)
    .join('  '),
  unit,
})

export interface FormReading {
  inputs: Inputs
  /** Standard uncertainties that were written with the numbers, by field as `calc/uncertainty.ts` names them. */
  uncertainties: Readonly<Record<string, number>>
  /** What to write instead, by path. */
  errors: Readonly<Record<string, string>>
}

interface CellReading {
  value?: PlainValue
  uncertainty?: number
  error?: string
}

const readCell = (cell: Cell, field: FieldText): CellReading => {
  if (cell.optional && isBlank(field)) return {}
  if (cell.kind === 'choice') return { value: field.text }
  const reading = readField(cell, field)
  if (!reading.ok) return { error: reading.message }
  const { value, uncertainty } = reading
  if (uncertainty === undefined) return { value }
  return cell.whole
    ? { error: `${cell.label} is counted, so it has no ±: write the number alone.` }
    : { value, uncertainty }
}

/** `sections.0.length` → `sections[0].length`. */
const fieldOfPath = (path: string): string => path.replace(/\.(\d+)/, '[$1]')

const lineParts = (text: string): string[] => (text.trim() === '' ? [] : text.trim().split(/[;\s]+(?=[+\-−]?[\d.,])/))

/** The numbers of a line, apart by spaces or semicolons; each may have its unit. */
const readLine = (cell: ScalarCell, row: string, { text, unit }: FieldText): { values: number[]; error?: string } => {
  const values: number[] = []
  for (const [i, part] of lineParts(text).entries()) {
    const reading = parse(part, cell.quantity, unit)
    const said = `${capital(row)} ${i + 1}, “${part}”`
    if (!reading.ok) return { values, error: `${said}: ${reading.message}` }
    if (reading.uncertainty !== undefined)
      return { values, error: `${said}: leave the ± out; the spread of the ${row}s between the runs tells it.` }
    values.push(reading.value)
  }
  return { values }
}

/** What the fields say, for `solve`. */
export const readForm = (definition: CalculatorDefinition, form: Form): FormReading => {
  const inputs: Record<string, InputValue> = {}
  const errors: Record<string, string> = {}
  const uncertainties: Record<string, number> = {}
  const read = (cell: Cell, field: FieldText, path: string) => {
    const { value, error, uncertainty } = readCell(cell, field)
    if (error !== undefined) errors[path] = error
    if (uncertainty !== undefined) uncertainties[fieldOfPath(path)] = uncertainty
    return value
  }
  const readRow = (input: ManyInput, key: string, row: RowTexts, i: number): PlainRow =>
    Object.fromEntries(
      Object.entries(columnsOfRow(input, row)).flatMap(([name, cell]) => {
        const value = read(cell, row[name]!, pathOf(input, key, i, name))
        return value === undefined ? [] : [[name, value]]
      }),
    )
  for (const key of shownKeys(definition, form)) {
    const input = definition.inputs[key]!
    if (isRecord(input)) {
      const { values } = form.records[key]!
      if (values.length > 0) inputs[key] = values
      else if (!input.optional) errors[key] = `${input.label}: choose a file, or paste the record.`
    } else if (input.kind === 'runs') {
      const cell = columnsOf(input)[''] as ScalarCell
      inputs[key] = form.rows[key]!.map((row, i) => {
        const { values, error } = readLine(cell, input.row, row['']!)
        if (error !== undefined) errors[pathOf(input, key, i, '')] = error
        return values
      })
    } else if (isMany(input)) {
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
  return { inputs, uncertainties, errors }
}

/** `sections[0].length` → `sections.0.length`. */
export const pathOfField = (field: string): string => field.replace(/\[(\d+)\]/g, '.$1')

export interface Solved {
  inputs: Inputs
  uncertainties: FormReading['uncertainties']
  solution: Solution
}
export type Attempt = Solved | { solution?: undefined; errors: Readonly<Record<string, string>> }

/** Works the form out, or says by path what stands in the way. */
export const solveForm = (definition: CalculatorDefinition, form: Form): Attempt => {
  const { inputs, uncertainties, errors } = readForm(definition, form)
  if (Object.keys(errors).length > 0) return { errors }
  try {
    return { inputs, uncertainties, solution: solveDefinition(definition, inputs) }
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
  | { do: 'take-record'; key: string; record: FlowRecord }
  | { do: 'know'; key: string; instead: string }
  | { do: 'change-column-unit'; key: string; name: string; cell: ScalarCell; unit: string }
  | { do: 'fill'; texts: readonly { path: string; text: string; cell: ScalarCell }[] }
  | { do: 'put-rows'; key: string; rows: readonly RowTexts[] }
  | { do: 'add-row'; key: string }
  | { do: 'remove-row'; key: string; number: number }

export const changeForm = (definition: CalculatorDefinition, form: Form, action: FormAction): Form => {
  switch (action.do) {
    case 'write':
      return setField(form, action.path, ({ unit }) => ({ text: action.text, unit }))
    case 'change-unit':
      return setField(form, action.path, (field) => changeUnit(action.cell, field, action.unit))
    case 'take-record':
      return { ...form, records: { ...form.records, [action.key]: action.record } }
    case 'know':
      return { ...form, known: [...form.known.filter((key) => key !== action.instead), action.key] }
    case 'change-column-unit': {
      const change = definition.inputs[action.key]!.kind === 'runs' ? changeLineUnit : changeUnit
      const rows = form.rows[action.key]!.map((row) => ({
        ...row,
        [action.name]: change(action.cell, row[action.name]!, action.unit),
      }))
      return { ...form, rows: { ...form.rows, [action.key]: rows } }
    }
    case 'fill':
      return action.texts.reduce(
        (filled, { path, text, cell }) => setField(filled, path, () => splitUnit(text, cell)),
        form,
      )
    case 'put-rows':
      return { ...form, rows: { ...form.rows, [action.key]: action.rows } }
    case 'add-row': {
      const input = definition.inputs[action.key]!
      if (!isList(input)) return form
      const rows = form.rows[action.key]!
      // A new row is most often like the one before it; the next of a series is another number.
      const like = input.kind === 'rows' ? rows.at(-1) : undefined
      const added =
        like ??
        (input.kind === 'rows' && input.initial?.[0]
          ? startRow(input, action.key, 0, {}, input.initial[0])
          : emptyRow(input, rows.at(-1)))
      return { ...form, rows: { ...form.rows, [action.key]: [...rows, added] } }
    }
    case 'remove-row':
      return {
        ...form,
        rows: { ...form.rows, [action.key]: form.rows[action.key]!.filter((_, i) => i !== action.number) },
      }
  }
}
