import {
  numberOf,
  type CalculatorDefinition,
  type Cell,
  type Columns,
  type Input,
  type Inputs,
  type InputValue,
  type PlainRow,
  type PlainValue,
  type Scalar,
} from './definition.ts'
import { CalculationError } from './errors.ts'
import { say } from './units/format.ts'

const between = (cell: Scalar): string =>
  `between ${say(cell.range[0], cell.quantity, cell.unit)} and ${say(cell.range[1], cell.quantity, cell.unit)}`

/** Of words that may be any. */
export const longestWords = 80

const checkCell = (cell: Cell, field: string, value: unknown): PlainValue => {
  if (cell.kind === 'choice') {
    if (cell.free) {
      if (typeof value === 'string' && value.trim() !== '' && value.length <= longestWords) return value
      throw new CalculationError(
        'out-of-range',
        field,
        `${cell.label}: write a few words, ${longestWords} letters at most.`,
      )
    }
    if (typeof value === 'string' && cell.of.includes(value)) return value
    throw new CalculationError('out-of-range', field, `${cell.label}: choose one of ${cell.of.join(', ')}.`)
  }
  return checkNumber(cell, field, value)
}

const checkNumber = (cell: Scalar, field: string, value: unknown): number => {
  if (typeof value !== 'number' || !Number.isFinite(value))
    throw new CalculationError('not-finite', field, `${cell.label}: give a number ${between(cell)}.`)
  if (value < cell.range[0] || value > cell.range[1])
    throw new CalculationError('out-of-range', field, `${cell.label} must lie ${between(cell)}.`)
  if (cell.whole && !Number.isInteger(value))
    throw new CalculationError('out-of-range', field, `${cell.label}: give a whole number ${between(cell)}.`)
  return value
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** Whether a value has its place beside the choice that it depends on; what is not chosen counts as its fallback. */
export const hasPlace = (
  { when }: Input | Cell,
  beside: Readonly<Record<string, Input | Cell>>,
  raw: Readonly<Record<string, unknown>>,
): boolean => {
  if (when === undefined) return true
  const other = beside[when.key]
  const chosen = raw[when.key] ?? (other?.kind === 'choice' ? other.fallback : undefined)
  return typeof chosen === 'string' && when.is.includes(chosen)
}

const outOfPlace = (said: Input | Cell, field: string, beside: Readonly<Record<string, Input | Cell>>) => {
  const { key, is } = said.when!
  const other = beside[key]
  const words = other?.kind === 'choice' ? other.words : undefined
  return new CalculationError(
    'inconsistent',
    field,
    `${said.label} belongs to ${is.map((value) => words?.[value] ?? value).join(' or ')}: leave it out otherwise.`,
  )
}

const checkColumns = (columns: Columns, label: string, field: string, value: unknown): PlainRow => {
  if (!isRecord(value)) throw new CalculationError('not-finite', field, `${label}: give its values by name.`)
  for (const key of Object.keys(value))
    if (!Object.hasOwn(columns, key))
      throw new CalculationError('unknown-key', `${field}.${key}`, `${label} has no value called “${key}”.`)
  const row: Record<string, PlainValue> = {}
  for (const key of Object.keys(columns)) {
    const cell = columns[key]!
    const cellValue = value[key]
    if (cell.when !== undefined && !hasPlace(cell, columns, value)) {
      if (cellValue !== undefined) throw outOfPlace(cell, `${field}.${key}`, columns)
      continue
    }
    if (cellValue !== undefined) row[key] = checkCell(cell, `${field}.${key}`, cellValue)
    else if (cell.fallback !== undefined) row[key] = cell.fallback
    else if (!cell.optional) throw new CalculationError('missing', `${field}.${key}`, `${cell.label} is wanted.`)
  }
  return row
}

export const checkInput = (input: Input, key: string, value: unknown): InputValue => {
  switch (input.kind) {
    case 'scalar':
    case 'choice':
      return checkCell(input, key, value)
    case 'group':
      return checkColumns(input.columns, input.label, key, value)
    case 'rows':
      return checkList(input, key, value).map((row, i) =>
        checkColumns(input.columns, `${input.label}, ${input.row} ${i + 1}`, `${key}[${i}]`, row),
      )
    case 'series': {
      const { label, row, quantity, range, usual, unit } = input
      // One description serves all places: a record of ten years is long.
      const cell: Scalar = { kind: 'scalar', label, quantity, range, usual, unit }
      return checkList(input, key, value).map((item, i) =>
        typeof item === 'number' && item >= range[0] && item <= range[1]
          ? item
          : checkNumber({ ...cell, label: `${label}, ${row} ${i + 1}` }, `${key}[${i}]`, item),
      )
    }
    case 'runs':
      return checkList({ ...input, row: input.run }, key, value).map((run, i) => {
        const name = `${input.label}, ${input.run} ${i + 1}`
        const each = { label: name, row: input.row, least: input.leastEach, most: input.mostEach }
        return checkList(each, `${key}[${i}]`, run).map((item, j) =>
          checkNumber({ ...numberOf(input, j), label: `${name}, ${input.row} ${j + 1}` }, `${key}[${i}]`, item),
        )
      })
  }
}

const checkList = (
  { label, row, least, most }: { label: string; row: string; least: number; most: number },
  key: string,
  value: unknown,
) => {
  if (!Array.isArray(value)) throw new CalculationError('not-finite', key, `${label}: give a list.`)
  if (value.length < least)
    throw new CalculationError(
      value.length === 0 ? 'missing' : 'out-of-range',
      key,
      `${label}: give at least ${least} ${row}${least === 1 ? '' : 's'}.`,
    )
  if (value.length > most) throw new CalculationError('out-of-range', key, `${label}: give at most ${most} ${row}s.`)
  // A copy without holes: whatever goes through a list passes over them, and they would not be checked.
  return Array.from<unknown>(value)
}

/**
 * Checks raw inputs against a definition, once, for everyone: shape, unknown keys, alternatives, missing keys, finiteness and range.
 * Fallbacks are filled in. Throws `CalculationError` naming the field; never changes a value.
 */
export const checkInputs = (definition: Pick<CalculatorDefinition, 'title' | 'inputs'>, raw: unknown): Inputs => {
  if (!isRecord(raw))
    throw new CalculationError('missing', Object.keys(definition.inputs)[0]!, 'Give the inputs by name.')
  const { inputs } = definition
  for (const key of Object.keys(raw))
    if (!Object.hasOwn(inputs, key))
      throw new CalculationError('unknown-key', key, `${definition.title} has no input called “${key}”.`)

  const given: Record<string, InputValue> = {}
  const isGiven = (key: string) => raw[key] !== undefined
  const label = (key: string) => inputs[key]?.label ?? key
  const namedFirst = new Set<string>()

  for (const key of Object.keys(inputs)) {
    const input = inputs[key]!
    if (input.or !== undefined && !namedFirst.has(input.or)) {
      namedFirst.add(key)
      if (isGiven(key) && isGiven(input.or))
        throw new CalculationError(
          'inconsistent',
          input.or,
          `Give ${label(key)} or ${label(input.or)}, not both: the one decides the other.`,
        )
      if (!isGiven(key) && !isGiven(input.or))
        throw new CalculationError('missing', key, `Give ${label(key)} or ${label(input.or)}.`)
    }
    if (input.goesWith !== undefined && isGiven(key) !== isGiven(input.goesWith))
      throw isGiven(key)
        ? new CalculationError(
            'inconsistent',
            key,
            `${input.label} goes with ${label(input.goesWith)}; leave it out without that.`,
          )
        : new CalculationError('missing', key, `${input.label} is wanted with ${label(input.goesWith)}.`)
    if (input.needs !== undefined && isGiven(key) && !isGiven(input.needs))
      throw new CalculationError('missing', input.needs, `${label(input.needs)} is wanted with ${input.label}.`)

    if (input.when !== undefined && !hasPlace(input, inputs, raw)) {
      if (isGiven(key)) throw outOfPlace(input, key, inputs)
      continue
    }
    if (isGiven(key)) given[key] = checkInput(input, key, raw[key])
    else if ('fallback' in input && input.fallback !== undefined) given[key] = input.fallback
    else if (!input.optional && input.or === undefined && input.goesWith === undefined && input.needs === undefined)
      throw new CalculationError('missing', key, `${input.label} is wanted.`)
  }
  return given
}

/** The inputs that are still wanted before there can be an answer: those by name that are not there, of two alternatives the first named. */
export const missingInputs = (
  { inputs }: Pick<CalculatorDefinition, 'inputs'>,
  given: Readonly<Record<string, unknown>>,
): string[] => {
  const isGiven = (key: string) => given[key] !== undefined
  return Object.entries(inputs).flatMap(([key, input]) => {
    const { or, goesWith, needs } = input
    if (!hasPlace(input, inputs, given)) return []
    if (isGiven(key)) return needs !== undefined && !isGiven(needs) ? [needs] : []
    if (or !== undefined) {
      const isFirst = Object.keys(inputs).indexOf(key) < Object.keys(inputs).indexOf(or)
      return isFirst && !isGiven(or) ? [key] : []
    }
    if (goesWith !== undefined) return isGiven(goesWith) ? [key] : []
    const mayMiss = input.optional ?? needs ?? ('fallback' in input ? input.fallback : undefined)
    return mayMiss === undefined ? [key] : []
  })
}
