import { checkInputs } from './check.ts'
import {
  numberOf,
  type CalculatorDefinition,
  type Caution,
  type Cell,
  type Inputs,
  type InputValue,
  type Outputs,
  type OutputValue,
  type PlainRow,
  type Runs,
  type Series,
} from './definition.ts'
import { CalculationError } from './errors.ts'
import { writeFormula } from './formula.ts'
import { printWorking, type PrintedStep } from './print.ts'
import { say } from './units/format.ts'

export interface Solution {
  outputs: Outputs
  working: PrintedStep[]
  cautions: Caution[]
}

const isBadNumber = (value: unknown): boolean => typeof value === 'number' && !Number.isFinite(value)

const isBad = (value: OutputValue | undefined): boolean =>
  Array.isArray(value)
    ? (value as readonly PlainRow[]).some((row) => Object.values(row).some(isBadNumber))
    : isBadNumber(value)

/** Solves what was checked already; no output is ever NaN or infinite. */
export const solveChecked = (definition: CalculatorDefinition, given: Inputs): Outputs => {
  const outputs = definition.solve(given)
  for (const key of Object.keys(outputs))
    if (isBad(outputs[key]))
      throw new CalculationError(
        'no-solution',
        Object.keys(definition.inputs)[0]!,
        `${definition.outputs[key]?.label ?? key} cannot be worked out from these numbers.`,
      )
  return outputs
}

/** Checks and solves, without working or cautions: for roots, plots, uncertainties and marking. Throws `CalculationError` for bad input. */
export const calculateDefinition = (definition: CalculatorDefinition, inputs: unknown): Outputs =>
  solveChecked(definition, checkInputs(definition, inputs))

const unusual = (cell: Cell, key: string, name: string, value: unknown): Caution[] =>
  cell.kind === 'scalar' && cell.usual && typeof value === 'number' && (value < cell.usual[0] || value > cell.usual[1])
    ? [
        {
          level: 'check',
          about: [key],
          say: `${name} of ${say(value, cell.quantity, cell.unit)} is unusual: it mostly lies between ${say(cell.usual[0], cell.quantity, cell.unit)} and ${say(cell.usual[1], cell.quantity, cell.unit)}.`,
        },
      ]
    : []

const runsOf = (value: InputValue | undefined): readonly (readonly number[])[] =>
  (value ?? []) as readonly (readonly number[])[]

const rowsOf = (value: InputValue | undefined): readonly PlainRow[] =>
  Array.isArray(value) ? (value as readonly PlainRow[]) : typeof value === 'object' ? [value as PlainRow] : []

const numbersOf = (value: InputValue | undefined): readonly unknown[] => (Array.isArray(value) ? value : [])

/** Of many numbers one caution: by its place where it is one, else by how many. */
const unusualNumbers = (input: Series | Runs, key: string, values: readonly unknown[]): Caution[] => {
  const odd = values.flatMap((value, i) => unusual(numberOf(input, i), key, numberOf(input, i).label, value))
  if (odd.length < 2 || !input.usual) return odd
  const [low, high] = input.usual
  const { row, quantity, unit } = input
  const words = `${odd.length} of the ${row}s are unusual: they mostly lie between ${say(low, quantity, unit)} and ${say(high, quantity, unit)}.`
  return [{ level: 'check', about: [key], say: words }]
}

/** One caution for each given value outside its usual range. */
const unusualValues = (definition: CalculatorDefinition, given: Inputs): Caution[] =>
  Object.entries(definition.inputs).flatMap(([key, input]) =>
    input.kind === 'scalar' || input.kind === 'choice'
      ? unusual(input, key, input.label, given[key])
      : input.kind === 'series'
        ? unusualNumbers(input, key, numbersOf(given[key]))
        : input.kind === 'runs'
          ? unusualNumbers(input, key, runsOf(given[key]).flat())
          : rowsOf(given[key]).flatMap((row, i) =>
              Object.entries(input.columns).flatMap(([name, cell]) =>
                unusual(
                  cell,
                  key,
                  input.kind === 'rows' ? `${cell.label} in ${input.row} ${i + 1}` : cell.label,
                  row[name],
                ),
              ),
            ),
  )

const worstFirst = { stop: 0, check: 1, note: 2 }

/** Solves one calculator: outputs in SI, the printed working, the cautions, worst first. Throws `CalculationError` for bad input. */
export const solveDefinition = (definition: CalculatorDefinition, inputs: unknown): Solution => {
  const given = checkInputs(definition, inputs)
  const outputs = solveChecked(definition, given)
  return {
    outputs,
    working: printWorking(definition, definition.working(writeFormula, given, outputs), given, outputs),
    cautions: [...definition.cautions(given, outputs), ...unusualValues(definition, given)].sort(
      (a, b) => worstFirst[a.level] - worstFirst[b.level],
    ),
  }
}
