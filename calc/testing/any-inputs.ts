import fc from 'fast-check'
import type { CalculatorDefinition, Cell, Columns, Input, Inputs, InputValue, PlainRow, Scalar } from '../definition.ts'
import { hasPlace } from '../check.ts'
import { initialInputs } from '../initial.ts'
import { logUniform, uniform } from './properties.ts'

/** Lists are drawn short: what a list holds matters more than how long it is. */
const longest = 8

const between = (low: number, high: number, whole?: true): fc.Arbitrary<number> => {
  if (whole) return fc.integer({ min: Math.ceil(low), max: Math.floor(high) })
  if (low > 0) return logUniform(low, high)
  if (low === 0) return fc.oneof({ arbitrary: logUniform(high * 1e-9, high), weight: 9 }, fc.constant(0))
  return uniform(low, high)
}

const anyNumber = ({ range, usual, whole }: Pick<Scalar, 'range' | 'usual' | 'whole'>): fc.Arbitrary<number> =>
  usual ? fc.oneof(between(...range, whole), between(...usual, whole)) : between(...range, whole)

const anyCell = (cell: Cell): fc.Arbitrary<number | string> =>
  cell.kind === 'choice' ? fc.constantFrom(...cell.of) : anyNumber(cell)

const anyRow = (columns: Columns): fc.Arbitrary<PlainRow> =>
  fc
    .record(Object.fromEntries(Object.entries(columns).map(([key, cell]) => [key, anyCell(cell)])), {
      requiredKeys: Object.keys(columns).filter(
        (key) => !columns[key]!.optional && columns[key]!.fallback === undefined,
      ),
    })
    .map((row) => Object.fromEntries(Object.entries(row).filter(([key]) => hasPlace(columns[key]!, columns, row))))

const anyValue = (input: Input): fc.Arbitrary<InputValue> => {
  switch (input.kind) {
    case 'scalar':
    case 'choice':
      return anyCell(input)
    case 'group':
      return anyRow(input.columns)
    case 'rows':
      return fc.array(anyRow(input.columns), {
        minLength: input.least,
        maxLength: Math.min(input.most, input.least + longest),
      })
    case 'series':
      return fc.array(anyNumber(input), {
        minLength: input.least,
        maxLength: Math.min(input.most, input.least + longest),
      })
    case 'runs':
      return fc.array(
        fc.array(anyNumber(input), {
          minLength: input.leastEach,
          maxLength: Math.min(input.mostEach, input.leastEach + longest),
        }),
        { minLength: input.least, maxLength: Math.min(input.most, input.least + longest) },
      )
  }
}

/**
 * Keeps one of each two alternatives, the first named where its coin says so, and what may stay away only where its own coin says so.
 */
export const choose = (
  { inputs }: CalculatorDefinition,
  values: Inputs,
  coins: Readonly<Record<string, boolean>>,
): Inputs => {
  const keys = Object.keys(inputs)
  const isGiven = (key: string): boolean => {
    const { or, goesWith, needs, optional, ...input } = inputs[key]!
    const first = or === undefined ? undefined : [key, or].sort((a, b) => keys.indexOf(a) - keys.indexOf(b))[0]!
    const byAlternative = first === undefined || (first === key) === coins[first]
    const byCompany = (goesWith === undefined || isGiven(goesWith)) && (needs === undefined || isGiven(needs))
    const mayMiss = optional === true || needs !== undefined || ('fallback' in input && input.fallback !== undefined)
    return (
      byAlternative &&
      byCompany &&
      hasPlace(inputs[key]!, inputs, values) &&
      (or !== undefined || !mayMiss || coins[key]!)
    )
  }
  return Object.fromEntries(keys.filter(isGiven).map((key) => [key, values[key]]))
}

/** Inputs anywhere in their ranges, shaped as the definition wants them. */
const anywhere = (definition: CalculatorDefinition): fc.Arbitrary<Inputs> => {
  const keys = Object.keys(definition.inputs)
  const values = fc.tuple(...keys.map((key) => anyValue(definition.inputs[key]!)))
  const coins = fc.tuple(...keys.map(() => fc.boolean()))
  const byKey = <T>(list: readonly T[]): Record<string, T> => Object.fromEntries(keys.map((key, i) => [key, list[i]!]))
  return fc.tuple(values, coins).map(([values, coins]) => choose(definition, byKey(values), byKey(coins)))
}

/** Inputs near what the form shows first: each number by up to a third off. */
const nearby = (definition: CalculatorDefinition): fc.Arbitrary<Inputs> =>
  fc.array(uniform(-0.3, 0.3), { minLength: 64, maxLength: 64 }).map((shifts): Inputs => {
    let at = 0
    const shift = (value: number, { range: [low, high], whole }: Pick<Scalar, 'range' | 'whole'>) =>
      whole ? value : Math.min(high, Math.max(low, value * Math.exp(shifts[at++ % shifts.length]!)))
    const shiftCell = (cell: Cell, value: number | string | undefined) =>
      cell.kind === 'scalar' && typeof value === 'number' ? shift(value, cell) : value
    const shiftRow = (columns: Columns, row: PlainRow): PlainRow =>
      Object.fromEntries(Object.entries(row).map(([key, value]) => [key, shiftCell(columns[key]!, value)]))
    const initial = initialInputs(definition)
    return Object.fromEntries(
      Object.entries(initial).map(([key, value]): [string, Inputs[string]] => {
        const input = definition.inputs[key]!
        switch (input.kind) {
          case 'scalar':
          case 'choice':
            return [key, shiftCell(input, value as number | string)]
          case 'group':
            return [key, shiftRow(input.columns, value as PlainRow)]
          case 'rows':
            return [key, (value as readonly PlainRow[]).map((row) => shiftRow(input.columns, row))]
          case 'series':
            return [key, (value as readonly number[]).map((item) => shift(item, input))]
          case 'runs':
            return [key, (value as readonly (readonly number[])[]).map((run) => run.map((item) => shift(item, input)))]
        }
      }),
    )
  })

/** Inputs in range for a calculator: half of them anywhere, half of them near what its form shows first. */
export const anyInputs = (definition: CalculatorDefinition): fc.Arbitrary<Inputs> =>
  fc.oneof(anywhere(definition), nearby(definition))
