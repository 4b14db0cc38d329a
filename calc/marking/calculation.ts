import type { Cell, Columns, Input, Inputs, InputValue, PlainRow, PlainValue, Quantity, Series } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { calculate, calculator } from '../solve.ts'
import { parse } from '../units/parse.ts'
import { conversion, quantities } from '../units/quantities.ts'
import type { Asked, Literal, Mistake, NumberQuestion, Part, PartsQuestion, Tolerance } from './question.ts'

export type NumbersQuestion = NumberQuestion | PartsQuestion

/** Numbers in SI that a question's texts may name: its drawn variables, and the answers of its earlier parts. */
export type Named = Readonly<Record<string, { value: number; quantity: Quantity }>>

/** A question of one number has one part, with this id. */
const onePart = 'answer'

export const partsOf = (question: NumbersQuestion): Part[] =>
  question.kind === 'parts' ? question.parts : [{ ...question, id: onePart }]

/** The output that is asked for; throws a RangeError where it is no number. */
export const askedOutput = ({ calculator: id, ask }: Pick<Asked, 'calculator' | 'ask'>) => {
  const { outputs, title } = calculator(id)
  const output = Object.hasOwn(outputs, ask) ? outputs[ask] : undefined
  if (output?.kind !== 'scalar') throw new RangeError(`${title} has no number “${ask}” to ask for.`)
  return output
}

/** Whether numbers of two quantities may stand for each other, as those of a head and a length. */
const sameDimension = (a: Quantity, b: Quantity): boolean => {
  const [one, other] = [quantities[a].si, quantities[b].si]
  return one.mathjs === undefined || other.mathjs === undefined
    ? one.name === other.name
    : conversion(a, other) !== undefined
}

/** Reads what is written for a number or a choice of a calculator. Throws a RangeError that says what to write instead. */
export const readCell = (cell: Cell, written: PlainValue): PlainValue => {
  if (cell.kind === 'choice') return written
  const reading = parse(String(written), cell.quantity)
  if (!reading.ok) throw new RangeError(`${cell.label}: ${reading.message}`)
  return reading.value
}

/** What each input of a part gets, as the bank writes it. */
export const wiring = (question: NumbersQuestion, part: Asked): Record<string, Literal> => {
  if (part.inputs) return part.inputs
  const { inputs } = calculator(part.calculator)
  const names = [...Object.keys(question.draw ?? {}), ...Object.keys(question.fixed ?? {})]
  return Object.fromEntries(names.filter((name) => Object.hasOwn(inputs, name)).map((name) => [name, name]))
}

/** A fixed value by its name, any other literal as it stands. */
export const unfold = (question: NumbersQuestion, literal: Literal): Literal =>
  typeof literal === 'string' && Object.hasOwn(question.fixed ?? {}, literal) ? question.fixed![literal]! : literal

const resolveCell = (question: NumbersQuestion, cell: Cell, literal: Literal, named: Named): PlainValue => {
  const written = unfold(question, literal)
  if (typeof written === 'object') throw new RangeError(`${cell.label} wants one value, not a list.`)
  if (typeof written !== 'string' || !Object.hasOwn(named, written)) return readCell(cell, written)
  const { value, quantity } = named[written]!
  if (cell.kind === 'choice' || !sameDimension(cell.quantity, quantity))
    throw new RangeError(`“${written}” is ${quantities[quantity].words} and cannot stand for ${cell.label}.`)
  return value
}

const isSet = (written: Literal | undefined): written is Record<string, PlainValue> =>
  typeof written === 'object' && !Array.isArray(written)

/** One number of a series, as a cell. */
export const seriesCell = (input: Series): Cell => ({ ...input, kind: 'scalar', initial: undefined })

const resolveInput = (question: NumbersQuestion, input: Input, literal: Literal, named: Named): InputValue => {
  if (input.kind === 'scalar' || input.kind === 'choice') return resolveCell(question, input, literal, named)
  const row = (columns: Columns, written: Literal): PlainRow => {
    if (!isSet(written)) throw new RangeError(`${input.label} wants its values by name.`)
    return Object.fromEntries(
      Object.entries(written).map(([name, value]) => {
        if (!Object.hasOwn(columns, name)) throw new RangeError(`${input.label} has no value called “${name}”.`)
        return [name, resolveCell(question, columns[name]!, value, named)]
      }),
    )
  }
  const written = unfold(question, literal)
  if (input.kind === 'group') return row(input.columns, written)
  if (!Array.isArray(written)) throw new RangeError(`${input.label} wants a list.`)
  if (input.kind === 'rows') return written.map((one) => row(input.columns, one))
  if (input.kind === 'runs')
    throw new RangeError(`${input.label} cannot be asked in a question: it takes lists of lists.`)
  const cell = seriesCell(input)
  return written.map((one) => resolveCell(question, cell, one, named) as number)
}

/**
 * The inputs of a part's calculation, in SI; `changed` replaces some of them. Throws a RangeError where the bank names what there is not
 * or writes what cannot be read.
 */
export const inputsOf = (
  question: NumbersQuestion,
  part: Asked,
  named: Named,
  changed: Record<string, Literal> = {},
): Inputs => {
  const { inputs, title } = calculator(part.calculator)
  return Object.fromEntries(
    Object.entries({ ...wiring(question, part), ...changed }).map(([key, literal]) => {
      if (!Object.hasOwn(inputs, key)) throw new RangeError(`${title} has no input called “${key}”.`)
      return [key, resolveInput(question, inputs[key]!, literal, named)]
    }),
  )
}

const workOut = (part: Asked, output: string, inputs: Inputs): number => {
  const value = calculate(part.calculator, inputs)[output]
  if (typeof value !== 'number')
    throw new CalculationError('no-solution', output, `${part.calculator} gives no ${output} for these numbers.`)
  return value
}

/** The number that is asked for. Throws `CalculationError`. */
export const answerOf = (question: NumbersQuestion, part: Asked, named: Named): number =>
  workOut(part, part.ask, inputsOf(question, part, named))

/** What comes out when a usual mistake is made. Throws `CalculationError`. */
export const mistakenAnswer = (question: NumbersQuestion, part: Asked, mistake: Mistake, named: Named): number => {
  const output = mistake.output ?? part.ask
  const asked = askedOutput(part).quantity
  const other = askedOutput({ calculator: part.calculator, ask: output }).quantity
  if (!sameDimension(asked, other))
    throw new RangeError(`“${output}” is ${quantities[other].words}, so it cannot be mistaken for “${part.ask}”.`)
  return workOut(part, output, inputsOf(question, part, named, mistake.with)) * (mistake.times ?? 1)
}

/** How far from a value an answer may lie, in SI. */
export const allowance = (tolerance: Tolerance, value: number, quantity: Quantity): number => {
  if ('relative' in tolerance) return tolerance.relative * Math.abs(value)
  const reading = parse(String(tolerance.absolute), quantity)
  if (!reading.ok) throw new RangeError(`The tolerance cannot be read. ${reading.message}`)
  return reading.value
}
