import type { Quantity } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import type { PrintedStep } from '../print.ts'
import { solve } from '../solve.ts'
import { format, join, say, unitFor } from '../units/format.ts'
import { parse, type Reading } from '../units/parse.ts'
import { conversion, quantities } from '../units/quantities.ts'
import {
  allowance,
  answerOf,
  askedOutput,
  inputsOf,
  mistakenAnswer,
  partsOf,
  type Named,
  type NumbersQuestion,
} from './calculation.ts'
import { namedBy, type Draw } from './draw.ts'
import type { Part } from './question.ts'
import { nothingGiven, roundMarks, type PartResult, type QuestionResult } from './result.ts'
import { fillText, marksOf } from './view.ts'

const longestText = 200

/** A calculation's result, or why it was refused. */
const attempt = <T>(calculation: () => T): T | CalculationError => {
  try {
    return calculation()
  } catch (error) {
    if (error instanceof CalculationError) return error
    throw error
  }
}

/** Undefined where nothing is written. */
const readText = (text: unknown, quantity: Quantity): Reading | undefined => {
  if (typeof text !== 'string' || text.trim() === '') return undefined
  if (text.length <= longestText) return parse(text, quantity)
  const { words, example } = quantities[quantity]
  return { ok: false, code: 'no-number', message: `That is too long to read: write ${words}, for example ${example}.` }
}

/** The unit that a part asks for, where it is one that numbers are printed in. */
const askedUnit = (part: Part, quantity: Quantity): string | undefined => {
  const { units, si } = quantities[quantity]
  return [...units, si].find(({ name }) => name === part.units?.[0])?.name
}

/** A number said back in the unit asked for, else in SI. */
const readAs = (part: Part, quantity: Quantity, value: number, figures: number): string => {
  const { si, units } = quantities[quantity]
  const digits = Math.min(12, Math.max(4, figures))
  const unit = askedUnit(part, quantity) ?? (si.name || units[0]!.name)
  return `read as ${say(Number(value.toPrecision(digits)), quantity, unit)}`
}

/** The right answer with as many digits as its tolerance needs. */
const answerText = (part: Part, answer: number): string => {
  const { quantity, unit: usual, digits: usualDigits = 3 } = askedOutput(part)
  const unit = unitFor(quantity, answer, askedUnit(part, quantity) ?? usual)
  const inUnit = conversion(quantity, unit)!
  const rounded = (digits: number) => inUnit.toSi(Number(inUnit.fromSi(answer).toPrecision(digits)))
  const room = allowance(part.tolerance, answer, quantity) / 2
  let digits = part.figures ?? usualDigits
  while (digits < 12 && Math.abs(rounded(digits) - answer) > room) digits++
  return join(format(answer, quantity, { digits, unit: unit.name }))
}

/** The working with this draw's numbers, as far as the step that gives the answer. */
const workingOf = (question: NumbersQuestion, part: Part, named: Named): PrintedStep[] => {
  const solution = attempt(() => solve(part.calculator, inputsOf(question, part, named)))
  if (solution instanceof CalculationError) return []
  const last = solution.working.findIndex(({ gives }) => gives === part.ask)
  return last === -1 ? solution.working : solution.working.slice(0, last + 1)
}

const isNear = (part: Part, quantity: Quantity, given: number, wanted: number): boolean =>
  Math.abs(given - wanted) <= allowance(part.tolerance, wanted, quantity) * (1 + 1e-9)

const powersOfTen = new Map([
  [10, '10'],
  [100, '100'],
  [1000, '1000'],
  [1e6, 'a million'],
])

interface Judgement {
  verdict: 'full' | 'carried-forward' | 'none'
  problem?: string
  reasons?: string[]
  notes?: string[]
  mistakes?: string[]
}

/** What a number that was read is worth: right, right by the learner's own earlier figures, a usual mistake, or none of these. */
const judge = (
  draw: Draw,
  question: NumbersQuestion,
  part: Part,
  given: number,
  own: Named,
  right: Named,
): Judgement => {
  const { quantity } = askedOutput(part)
  const near = (wanted: number | CalculationError) =>
    !(wanted instanceof CalculationError) && isNear(part, quantity, given, wanted)
  const answer = draw.answers[part.id]!
  if (near(answer)) return { verdict: 'full' }

  const carried = attempt(() => answerOf(question, part, own))
  if (near(carried)) return { verdict: 'carried-forward' }
  const problem =
    carried instanceof CalculationError
      ? `Your own earlier figure cannot be carried forward: ${carried.message}`
      : undefined

  for (const [i, mistake] of (part.mistakes ?? []).entries())
    if ([right, own].some((named) => near(attempt(() => mistakenAnswer(question, part, mistake, named)))))
      return {
        verdict: 'none',
        problem,
        reasons: [fillText(mistake.because, draw)],
        mistakes: [`${question.id}/${part.id}/${i}`],
      }

  const power = [...powersOfTen.keys()].find((power) =>
    [answer, carried].some(
      (wanted) => !(wanted instanceof CalculationError) && [power, 1 / power].some((by) => near(wanted * by)),
    ),
  )
  return power === undefined
    ? { verdict: 'none', problem }
    : {
        verdict: 'none',
        problem,
        notes: [`Right but for a factor of ${powersOfTen.get(power)}: look at the unit.`],
        mistakes: [`${question.id}/${part.id}/power-of-ten`],
      }
}

/** Marks numbers, each with what the learner wrote in the parts before it. */
export const markNumbers = (
  draw: Draw,
  question: NumbersQuestion,
  textOf: (part: string) => unknown,
): QuestionResult => {
  const parts = partsOf(question)
  const outOf = marksOf(question) / parts.length
  const right = namedBy(question, draw.values, draw.answers)
  let own: Named = right
  const results: PartResult[] = []
  const mistakes: string[] = []

  for (const part of parts) {
    const { quantity } = askedOutput(part)
    const reading = readText(textOf(part.id), quantity)
    const judged: Judgement = !reading
      ? { verdict: 'none', problem: nothingGiven }
      : !reading.ok
        ? { verdict: 'none', problem: reading.message }
        : judge(draw, question, part, reading.value, own, right)
    const { verdict, problem, reasons = [], notes = [] } = judged
    const earned = verdict !== 'none'
    const fewFigures = earned && reading?.ok && part.figures !== undefined && reading.figures < part.figures
    results.push({
      id: part.id,
      verdict,
      marks: earned ? roundMarks(outOf) : 0,
      outOf: roundMarks(outOf),
      ...(reading?.ok ? { readAs: readAs(part, quantity, reading.value, reading.figures) } : {}),
      ...(problem === undefined ? {} : { problem }),
      reasons,
      notes: fewFigures ? [...notes, `Give ${part.figures} significant figures.`] : notes,
      answer: [answerText(part, draw.answers[part.id]!)],
      working: workingOf(question, part, right),
    })
    mistakes.push(...(judged.mistakes ?? []))
    if (reading?.ok && question.kind === 'parts') own = { ...own, [part.id]: { value: reading.value, quantity } }
  }
  const earned = results.filter(({ verdict }) => verdict !== 'none').length
  return { marks: roundMarks(earned * outOf), outOf: marksOf(question), parts: results, mistakes }
}
