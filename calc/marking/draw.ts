import type { Input, Quantity } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { seededRandom } from '../numeric/random.ts'
import { calculator } from '../solve.ts'
import { say } from '../units/format.ts'
import { parse } from '../units/parse.ts'
import { quantities } from '../units/quantities.ts'
import {
  allowance,
  answerOf,
  askedOutput,
  mistakenAnswer,
  partsOf,
  unfold,
  wiring,
  type Named,
  type NumbersQuestion,
} from './calculation.ts'
import type { Drawn, Literal, Part, Question } from './question.ts'

export interface DrawnValue {
  /** SI. */
  value: number
  quantity: Quantity
  /** As it stands in the question. */
  text: string
}

/**
 * A question drawn for one learner: plain data, the key and the question itself in it, so that a bank mended later changes nothing. It
 * stays on the server.
 */
export interface Draw {
  question: Question
  /** The drawn variables of numbers and parts. */
  values: Record<string, DrawnValue>
  /** The right numbers in SI, by part. */
  answers: Record<string, number>
  /** Which choice, item or right side of the bank stands in each place. */
  shuffle: number[]
}

type Random = () => number

const mostTries = 400

/** A draw that will not do and is made again. */
class Redraw extends Error {}

/** The quantity that a variable has where it is put into an input. */
const quantityIn = (input: Input | undefined, literal: Literal | undefined, name: string): Quantity | undefined => {
  if (input === undefined || input.kind === 'choice' || input.kind === 'runs' || literal === undefined) return undefined
  if (input.kind === 'scalar') return literal === name ? input.quantity : undefined
  const rows: Literal[] = Array.isArray(literal) ? literal : [literal]
  if (input.kind === 'series') return rows.includes(name) ? input.quantity : undefined
  return rows
    .flatMap((row) => (typeof row === 'object' ? Object.entries(row) : []))
    .map(([column, value]) => quantityIn(input.columns[column], value as Literal, name))
    .find((quantity) => quantity !== undefined)
}

/** The quantity of the first input that a variable goes into, or is called after. */
const quantityInUse = (question: NumbersQuestion, name: string): Quantity | undefined =>
  partsOf(question)
    .flatMap((part) => {
      const { inputs } = calculator(part.calculator)
      const mistaken = (part.mistakes ?? []).flatMap((mistake) => Object.entries(mistake.with ?? {}))
      return [[name, name] as const, ...Object.entries(wiring(question, part)), ...mistaken].map(([key, literal]) =>
        quantityIn(Object.hasOwn(inputs, key) ? inputs[key] : undefined, unfold(question, literal), name),
      )
    })
    .find((quantity) => quantity !== undefined)

const quantityOfDrawn = (question: NumbersQuestion, name: string, drawn: Drawn): Quantity => {
  const quantity =
    drawn.quantity ??
    quantityInUse(question, name) ??
    ('of' in drawn ? quantityOfDrawn(question, drawn.of, question.draw![drawn.of]!) : undefined)
  if (!quantity) throw new RangeError(`Nothing says what “${name}” measures: give it a quantity.`)
  return quantity
}

/** Takes floating noise away: 5.5 L/s is 0.0055 m³/s. */
const clean = (value: number): number => Number(value.toPrecision(12))

const drawValue = (
  drawn: Drawn,
  quantity: Quantity,
  before: Record<string, DrawnValue>,
  random: Random,
): DrawnValue => {
  const read = (written: number | string) => {
    const reading = parse(String(written), quantity)
    if (!reading.ok) throw new RangeError(reading.message)
    return reading
  }
  const step = read(drawn.step)
  if (step.value <= 0) throw new RangeError('A step must be more than nothing.')
  const value = (() => {
    if ('of' in drawn) {
      const [least, most] = drawn.times
      const exact = before[drawn.of]!.value * (least + (most - least) * random())
      return clean(Math.round(exact / step.value) * step.value)
    }
    const from = read(drawn.from).value
    const steps = Math.floor((read(drawn.to).value - from) / step.value + 1e-9)
    if (steps < 0) throw new RangeError('“to” must not be less than “from”.')
    return clean(from + Math.floor(random() * (steps + 1)) * step.value)
  })()
  const isOffered = quantities[quantity].units.some(({ name }) => name === step.unit)
  return { value, quantity, text: say(value, quantity, isOffered ? step.unit : undefined) }
}

const drawValues = (question: NumbersQuestion, random: Random): Record<string, DrawnValue> => {
  const values: Record<string, DrawnValue> = {}
  for (const [name, drawn] of Object.entries(question.draw ?? {})) {
    try {
      values[name] = drawValue(drawn, quantityOfDrawn(question, name, drawn), values, random)
    } catch (error) {
      if (error instanceof RangeError) throw new RangeError(`draw ${name}: ${error.message}`)
      throw error
    }
  }
  return values
}

/** A learner must be able to tell, and the marker too, which of these numbers was meant. */
const checkDistinct = (part: Part, quantity: Quantity, numbers: readonly number[]): void => {
  const name = (i: number) => (i === 0 ? 'the answer' : `mistake ${i}`)
  const reach = numbers.map((number) => allowance(part.tolerance, number, quantity))
  if (reach[0]! <= 0) throw new Redraw('a relative tolerance of an answer of nothing leaves no room')
  for (let i = 0; i < numbers.length; i++)
    for (let j = 0; j < i; j++)
      if (Math.abs(numbers[i]! - numbers[j]!) <= reach[i]! + reach[j]!)
        throw new Redraw(`${name(j)} and ${name(i)} of part “${part.id}” cannot be told apart`)
}

const checkUnits = ({ units = [] }: Part, quantity: Quantity): void => {
  for (const unit of units)
    if (!parse(`1 ${unit}`, quantity).ok)
      throw new RangeError(`“${unit}” is no unit of ${quantities[quantity].words.replace(/^an? /, '')}.`)
}

/** The answers of the parts, those of each part being known to the ones after it. */
export const namedBy = (
  question: NumbersQuestion,
  values: Record<string, DrawnValue>,
  answers: Record<string, number>,
): Named => {
  const named: Record<string, { value: number; quantity: Quantity }> = { ...values }
  if (question.kind === 'parts')
    for (const part of question.parts)
      if (Object.hasOwn(answers, part.id))
        named[part.id] = { value: answers[part.id]!, quantity: askedOutput(part).quantity }
  return named
}

const tryNumbers = (question: NumbersQuestion, random: Random): Draw => {
  const values = drawValues(question, random)
  const answers: Record<string, number> = {}
  for (const part of partsOf(question)) {
    const { quantity } = askedOutput(part)
    checkUnits(part, quantity)
    const named = namedBy(question, values, answers)
    const answer = answerOf(question, part, named)
    const mistaken = (part.mistakes ?? []).map((mistake) => mistakenAnswer(question, part, mistake, named))
    checkDistinct(part, quantity, [answer, ...mistaken])
    answers[part.id] = answer
  }
  return { question, values, answers, shuffle: [] }
}

const drawNumbers = (question: NumbersQuestion, random: Random): Draw => {
  let reason = ''
  for (let i = 0; i < mostTries; i++) {
    try {
      return tryNumbers(question, random)
    } catch (error) {
      if (!(error instanceof Redraw || error instanceof CalculationError)) throw error
      reason = error.message
    }
  }
  throw new RangeError(`none of ${mostTries} draws would do; the last: ${reason}`)
}

/** Fisher and Yates. */
const shuffled = (count: number, random: Random): number[] => {
  const places = Array.from({ length: count }, (_, i) => i)
  for (let i = count - 1; i > 0; i--) {
    const j = Math.floor(random() * (i + 1))
    ;[places[i], places[j]] = [places[j]!, places[i]!]
  }
  return places
}

/** The right sides of a match, each once. */
export const rightSides = (pairs: readonly { right: string }[]): string[] => [
  ...new Set(pairs.map(({ right }) => right)),
]

const shuffleOf = (question: Exclude<Question, NumbersQuestion>, random: Random): number[] => {
  switch (question.kind) {
    case 'choose-one':
    case 'choose-several':
      return shuffled(question.choices.length, random)
    case 'match':
      return shuffled(rightSides(question.pairs).length, random)
    case 'order': {
      const places = shuffled(question.items.length, random)
      // Never in order already: then everything moves on by one.
      return places.every((item, i) => item === i) ? [...places.slice(1), places[0]!] : places
    }
  }
}

/**
 * Draws a question: the same for the same question and seed. Numbers whose calculation is refused, or whose usual mistakes cannot be told
 * apart, are drawn again. Throws a RangeError naming the question where the bank asks for what cannot be.
 */
export const draw = (question: Question, seed: string): Draw => {
  const random = seededRandom(`${seed} ${question.id}`)
  if (question.kind !== 'number' && question.kind !== 'parts')
    return { question, values: {}, answers: {}, shuffle: shuffleOf(question, random) }
  try {
    return drawNumbers(question, random)
  } catch (error) {
    if (error instanceof RangeError) throw new RangeError(`Question “${question.id}”: ${error.message}`)
    throw error
  }
}
