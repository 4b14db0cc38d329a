import {
  numberOf,
  type CalculatorDefinition,
  type Cell,
  type Input,
  type Inputs,
  type Outputs,
  type PlainRow,
} from './definition.ts'
import { CalculationError } from './errors.ts'
import { normalPair, seededRandom } from './numeric/random.ts'
import { calculateDefinition } from './solve-definition.ts'

/** Standard uncertainties by field: `flow`, `sections[0].length`, `nozzles.diameter`. SI. */
export type StandardUncertainties = Readonly<Record<string, number>>

/** A number among the inputs that is not quite known. */
export interface UncertainField {
  name: string
  key: string
  index?: number
  column?: string
  cell: Extract<Cell, { kind: 'scalar' }>
  value: number
  uncertainty: number
}

const pattern = /^([A-Za-z]\w*)(?:\[(\d+)\])?(?:\.([A-Za-z]\w*))?$/

export const uncertainField = (
  definition: Pick<CalculatorDefinition, 'title' | 'inputs'>,
  inputs: Inputs,
  name: string,
  uncertainty: number,
): UncertainField => {
  const unknown = () => new CalculationError('unknown-key', name, `${definition.title} has no number called “${name}”.`)
  const [, key = '', index, column] = pattern.exec(name) ?? []
  const input = Object.hasOwn(definition.inputs, key) ? definition.inputs[key]! : undefined
  if (!input) throw unknown()
  const cell = cellOf(input, index === undefined ? undefined : Number(index), column)
  if (cell?.kind !== 'scalar' || (input.kind === 'rows' || input.kind === 'series') !== (index !== undefined))
    throw unknown()
  if (!(uncertainty >= 0) || !Number.isFinite(uncertainty))
    throw new CalculationError('not-finite', name, `${cell.label}: give a standard uncertainty that is not negative.`)
  const field: Omit<UncertainField, 'value'> = {
    name,
    key,
    ...(index === undefined ? {} : { index: Number(index) }),
    ...(column === undefined ? {} : { column }),
    cell,
    uncertainty,
  }
  if (cell.whole && uncertainty > 0)
    throw new CalculationError(
      'inconsistent',
      name,
      `${cell.label} is counted, so it has no uncertainty: leave it out.`,
    )
  const value = read(inputs, field)
  if (typeof value !== 'number')
    throw new CalculationError('missing', name, `${cell.label} is not given, so it can have no uncertainty.`)
  return { ...field, value }
}

/** The number that a column names, or the input itself where it has none. */
const cellOf = (input: Input, index: number | undefined, column: string | undefined): Cell | undefined => {
  switch (input.kind) {
    case 'rows':
    case 'group':
      return column !== undefined && Object.hasOwn(input.columns, column) ? input.columns[column] : undefined
    case 'series':
      return column === undefined ? numberOf(input, index ?? 0) : undefined
    case 'runs':
      // Their spread is their uncertainty.
      return undefined
    default:
      return column === undefined ? input : undefined
  }
}

/** The number as given, or the fallback where its place is there but left empty. */
const read = (inputs: Inputs, { key, index, column, cell }: Omit<UncertainField, 'value'>): unknown => {
  const value = inputs[key]
  if (index === undefined && column === undefined) return value ?? cell.fallback
  const item = index === undefined ? value : (value as readonly unknown[] | undefined)?.[index]
  if (column === undefined) return item
  return item === undefined ? undefined : ((item as PlainRow)[column] ?? cell.fallback)
}

export const replaceField = (inputs: Inputs, { key, index, column }: UncertainField, value: number): Inputs => {
  if (column === undefined)
    return {
      ...inputs,
      [key]:
        index === undefined ? value : (inputs[key] as readonly number[]).map((old, i) => (i === index ? value : old)),
    }
  if (index === undefined) return { ...inputs, [key]: { ...(inputs[key] as PlainRow), [column]: value } }
  return {
    ...inputs,
    [key]: (inputs[key] as readonly PlainRow[]).map((row, i) => (i === index ? { ...row, [column]: value } : row)),
  }
}

const findFields = (
  definition: CalculatorDefinition,
  inputs: Inputs,
  uncertainties: StandardUncertainties,
): UncertainField[] =>
  Object.entries(uncertainties).map(([name, uncertainty]) => uncertainField(definition, inputs, name, uncertainty))

const scalarKeys = (outputs: Outputs): string[] =>
  Object.keys(outputs).filter((key) => typeof outputs[key] === 'number')

/** Small against what matters, large against the roots' tolerance. */
const relativeStep = 1e-4

/** All outputs with another value in one field. */
type Evaluate = (field: UncertainField, value: number) => Outputs

/** How much each scalar output changes with one field: a central difference, one-sided at the end of a range or of what has a solution. */
const sensitivities = (
  field: UncertainField,
  outputs: Outputs,
  keys: readonly string[],
  evaluate: Evaluate,
): Map<string, number> => {
  const [low, high] = field.cell.range
  const step = relativeStep * Math.max(Math.abs(field.value), field.uncertainty)
  const here = { value: field.value, outputs }
  const at = (value: number) => {
    try {
      return { value, outputs: evaluate(field, value) }
    } catch (error) {
      if (error instanceof CalculationError) return here
      throw error
    }
  }
  const below = at(Math.max(low, field.value - step))
  const above = at(Math.min(high, field.value + step))
  if (below.value === above.value)
    throw new CalculationError(
      'no-solution',
      field.name,
      `${field.cell.label} cannot differ from the value given, so nothing is known of its uncertainty.`,
    )
  return new Map(
    keys.flatMap((key) => {
      const [a, b] = [below.outputs[key], above.outputs[key]]
      return typeof a === 'number' && typeof b === 'number'
        ? [[key, (b - a) / (above.value - below.value)] as const]
        : []
    }),
  )
}

export interface Uncertain {
  value: number
  standardUncertainty: number
  /** Each field's part of the variance, 0–1; they sum to 1 unless the uncertainty is 0. */
  shares: Record<string, number>
}

/**
 * Combined standard uncertainty of each scalar output by the law of propagation of uncertainty for independent inputs
 * (JCGM 100:2008, 5.1.2), with numerical sensitivities.
 */
export const propagate = (
  fields: readonly UncertainField[],
  outputs: Outputs,
  evaluate: Evaluate,
): Record<string, Uncertain> => {
  const keys = scalarKeys(outputs)
  const parts = fields
    .filter(({ uncertainty }) => uncertainty > 0)
    .map((field) => ({ field, slopes: sensitivities(field, outputs, keys, evaluate) }))
  return Object.fromEntries(
    keys.map((key) => {
      const variances = parts.map(
        ({ field, slopes }) => [field.name, ((slopes.get(key) ?? 0) * field.uncertainty) ** 2] as const,
      )
      const variance = variances.reduce((sum, [, part]) => sum + part, 0)
      return [
        key,
        {
          value: outputs[key] as number,
          standardUncertainty: Math.sqrt(variance),
          shares: Object.fromEntries(variances.map(([name, part]) => [name, variance === 0 ? 0 : part / variance])),
        },
      ]
    }),
  )
}

/** The combined standard uncertainties of one calculator. Throws `CalculationError` for bad inputs or unknown fields. */
export const uncertaintyOf = (
  definition: CalculatorDefinition,
  inputs: Inputs,
  standardUncertainties: StandardUncertainties,
): { outputs: Record<string, Uncertain> } => ({
  outputs: propagate(
    findFields(definition, inputs, standardUncertainties),
    calculateDefinition(definition, inputs),
    (field, value) => calculateDefinition(definition, replaceField(inputs, field, value)),
  ),
})

export interface SampledOutput {
  mean: number
  standardUncertainty: number
  /** Probabilistically symmetric (JCGM 101:2008, 7.7). */
  interval95: [number, number]
}
export interface Sampled {
  outputs: Record<string, SampledOutput>
  /** Draws that lay outside what can be worked out. */
  redrawn: number
}
export interface Sampling {
  trials: number
  seed: string | number
  /** Told now and then how many trials are done. */
  onProgress?: (done: number) => void
}
const progressEvery = 500

/**
 * Propagation of distributions by Monte Carlo (JCGM 101:2008): every field normal about its value. Draws that the calculator refuses, or
 * that lie outside a range, are drawn again and counted in `redrawn`. The same seed gives the same result.
 */
export const monteCarloOf = (
  definition: CalculatorDefinition,
  inputs: Inputs,
  standardUncertainties: StandardUncertainties,
  { trials, seed, onProgress }: Sampling,
): Sampled => {
  const keys = scalarKeys(calculateDefinition(definition, inputs))
  const fields = findFields(definition, inputs, standardUncertainties)
  const random = seededRandom(String(seed))
  const samples = new Map(keys.map((key) => [key, [] as number[]]))
  const mostRedraws = 100 * trials
  let redrawn = 0
  for (let trial = 0; trial < trials;) {
    let drawn = inputs
    for (const field of fields)
      drawn = replaceField(drawn, field, field.value + field.uncertainty * normalPair(random)[0])
    let outputs: Outputs
    try {
      outputs = calculateDefinition(definition, drawn)
    } catch (error) {
      if (!(error instanceof CalculationError)) throw error
      if (++redrawn > mostRedraws)
        throw new CalculationError(
          'no-solution',
          fields[0]?.name ?? keys[0]!,
          'Nearly all draws lie outside what can be worked out.',
        )
      continue
    }
    for (const key of keys) {
      const value = outputs[key]
      if (typeof value === 'number') samples.get(key)!.push(value)
    }
    trial++
    if (trial % progressEvery === 0) onProgress?.(trial)
  }
  return {
    outputs: Object.fromEntries(
      [...samples].filter(([, values]) => values.length > 1).map(([key, values]) => [key, summary(values)]),
    ),
    redrawn,
  }
}

const summary = (values: number[]): SampledOutput => {
  const n = values.length
  const mean = values.reduce((sum, value) => sum + value, 0) / n
  const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (n - 1)
  const sorted = values.toSorted((a, b) => a - b)
  const at = (share: number) => sorted[Math.min(n - 1, Math.max(0, Math.round(share * n) - 1))]!
  return { mean, standardUncertainty: Math.sqrt(variance), interval95: [at(0.025), at(0.975)] }
}
