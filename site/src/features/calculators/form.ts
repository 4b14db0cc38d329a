import type { CalculatorDefinition, Cell, Input, Inputs, InputValue, PlainRow, PlainValue } from '#calc/index.ts'
import { CalculationError } from '#calc/errors.ts'
import { solveDefinition, type Solution } from '#calc/solve-definition.ts'
import { shownSystem, type UnitSystem } from '#calc/units/system.ts'
import {
  columnsOf,
  columnsOfRow,
  isList,
  isMany,
  isRecord,
  pathOf,
  type ListInput,
  type ManyInput,
  type ScalarCell,
} from './columns.ts'
import { changeUnit, isBlank, readField, splitUnit, startCell, startText, type FieldText } from './field-text.ts'
import { changeLineUnit, lineText, readLine, splitLine } from './line-text.ts'

/**
 * What stands in the fields of a calculator, as it was written, and what that means. A field's path is its key, the key and a column's
 * name for a group (`nozzles.diameter`), and the row's number between or behind them for a list (`sections.0.length`, `times.0`).
 */

export type RowTexts = Readonly<Record<string, FieldText>>
/** A record that was read from a file or a paste, and what it is. */
export interface FlowRecord {
  values: readonly number[]
  /** "An invented year", or the file's name. */
  from: string
}
/** What the definition starts with is called. */
export const inventedRecord = 'An invented year'
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

const startRow = (input: ManyInput, key: string, row: number, texts: Texts, initial?: PlainRow): RowTexts =>
  Object.fromEntries(
    Object.entries(columnsOf(input)).map(([name, cell]) => {
      const text = texts[pathOf(input, key, row, name)]
      return [
        name,
        input.kind === 'runs'
          ? splitLine(String(text ?? ''), cell as ScalarCell)
          : startCell(cell, text, initial?.[name]),
      ]
    }),
  )

/** A row with nothing in it, in the units of the one before. */
export const emptyRow = (input: ListInput, like?: RowTexts): RowTexts =>
  Object.fromEntries(
    Object.entries(columnsOf(input)).map(([name, cell]) => [
      name,
      {
        text: cell.kind === 'choice' && !cell.optional && !cell.free ? cell.of[0]! : '',
        unit: like?.[name]?.unit ?? startText(cell, undefined).unit,
      },
    ]),
  )

const blankRows = ({ optional, least }: ListInput): PlainRow[] =>
  Array.from({ length: optional ? 0 : least }, () => ({}))

const initialRows = (input: ManyInput): readonly PlainRow[] => {
  switch (input.kind) {
    case 'group':
      return [input.initial ?? {}]
    case 'rows':
      return input.initial ?? blankRows(input)
    case 'series':
      return input.initial?.map((value) => ({ '': value })) ?? blankRows(input)
    case 'runs':
      return input.initial?.map(() => ({})) ?? blankRows(input)
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
    ? initial.map((row, i) =>
        input.kind === 'runs' && input.initial
          ? { '': lineText(columnsOf(input)[''] as ScalarCell, input.initial[i]!) }
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
    if (isRecord(input)) taken[key] = records[key] ?? { values: input.initial ?? [], from: inventedRecord }
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

/** The labels of the records that are others than the form starts with: no address carries them. */
export const recordsTaken = ({ inputs }: CalculatorDefinition, { records }: Form): string[] =>
  Object.entries(records).flatMap(([key, { values }]) => {
    const input = inputs[key]!
    return isRecord(input) && values !== input.initial ? [input.label.toLowerCase()] : []
  })

const starts = (input: Input): boolean => input.initial !== undefined

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
      const rows = form.rows[key]!
      if (rows.length === 0 && input.optional) continue
      inputs[key] = rows.map((row, i) => {
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

/** A form is worked out once, however many ask: when it is written, and when it is drawn. What is said of it goes with the units shown. */
const attempts = new WeakMap<Form, { system: UnitSystem; attempt: Attempt }>()

/** Works the form out, or says by path what stands in the way. */
export const solveForm = (definition: CalculatorDefinition, form: Form): Attempt => {
  const system = shownSystem()
  const known = attempts.get(form)
  if (known?.system === system) return known.attempt
  const attempt = workOut(definition, form)
  attempts.set(form, { system, attempt })
  return attempt
}

const workOut = (definition: CalculatorDefinition, form: Form): Attempt => {
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

/** What nobody wrote in, as it would start now, such as in other units; what was written stays as it is. */
export const startAgainUntouched = (form: Form, started: Form, again: Form): Form => {
  const turn = (field: FieldText, was: FieldText | undefined, now: FieldText | undefined) =>
    now && was?.text === field.text && was.unit === field.unit ? now : field
  const turnAll = (texts: RowTexts, was: RowTexts = {}, now: RowTexts = {}): RowTexts =>
    Object.fromEntries(Object.entries(texts).map(([name, field]) => [name, turn(field, was[name], now[name])]))
  const rows: Record<string, readonly RowTexts[]> = {}
  for (const [key, list] of Object.entries(form.rows))
    rows[key] = list.map((row, i) => turnAll(row, started.rows[key]?.[i], again.rows[key]?.[i]))
  return { ...form, fields: turnAll(form.fields, started.fields, again.fields), rows }
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
