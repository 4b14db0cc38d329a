import { rightSides, type Draw } from './draw.ts'
import { markNumbers } from './mark-numbers.ts'
import type { ChoiceQuestion, MatchQuestion, OrderQuestion } from './question.ts'
import { nothingGiven, roundMarks, type QuestionResult } from './result.ts'
import { leftId, marksOf, placeId } from './view.ts'

/** What a learner gives, kept as it was typed. */
export type Answer =
  | { kind: 'number'; text: string }
  | { kind: 'parts'; texts: Record<string, string> }
  | { kind: 'choose-one'; choice: string }
  | { kind: 'choose-several'; choices: string[] }
  | { kind: 'order'; order: string[] }
  | { kind: 'match'; pairs: Record<string, string> }

const field = (answer: unknown, name: string): unknown =>
  typeof answer === 'object' && answer !== null && Object.hasOwn(answer, name)
    ? (answer as Record<string, unknown>)[name]
    : undefined

/** The ids in a list, each once; anything else in it is passed over. */
const idsIn = (list: unknown): string[] =>
  Array.isArray(list) ? [...new Set(list.filter((id): id is string => typeof id === 'string'))] : []

interface Given {
  share: number
  isEmpty: boolean
  reasons: string[]
  notes?: string[]
  answer: string[]
  mistakes: string[]
}

/** The result of a question without numbers. */
const result = (draw: Draw, { share, isEmpty, reasons, notes = [], answer, mistakes }: Given): QuestionResult => {
  const outOf = marksOf(draw.question)
  const marks = roundMarks(share * outOf)
  return {
    marks,
    outOf,
    parts: [
      {
        id: 'answer',
        verdict: share === 1 ? 'full' : share > 0 ? 'partial' : 'none',
        marks,
        outOf,
        ...(isEmpty ? { problem: nothingGiven } : {}),
        reasons,
        notes,
        answer,
        working: [],
      },
    ],
    mistakes,
  }
}

const markChoices = (draw: Draw, { id, kind, choices }: ChoiceQuestion, given: string[]): QuestionResult => {
  const chosen = draw.shuffle.filter((_, place) => given.includes(placeId(place)))
  const right = choices.flatMap((choice, i) => (choice.right ? [i] : []))
  const wrong = chosen.filter((i) => !choices[i]!.right)
  const found = chosen.length - wrong.length
  const missed = right.length - found
  const share =
    kind === 'choose-one' ? Number(found === 1 && wrong.length === 0) : (found - wrong.length) / right.length
  return result(draw, {
    share: Math.max(0, share),
    isEmpty: chosen.length === 0,
    reasons: wrong.flatMap((i) => choices[i]!.because ?? []),
    notes:
      kind === 'choose-several' && missed > 0 && chosen.length > 0
        ? [missed === 1 ? 'One right choice was left out.' : `${missed} right choices were left out.`]
        : [],
    answer: right.map((i) => choices[i]!.say),
    mistakes: wrong.map((i) => `${id}/choice/${i}`),
  })
}

/** Full for the right order, else the share of neighbours that follow each other rightly, rounded down to tenths. */
const markOrder = (draw: Draw, { id, items, because }: OrderQuestion, given: string[]): QuestionResult => {
  const places = given.flatMap((one) => {
    const place = draw.shuffle.findIndex((_, i) => placeId(i) === one)
    return place === -1 ? [] : [draw.shuffle[place]!]
  })
  const neighbours = places.filter((item, i) => i > 0 && item === places[i - 1]! + 1).length
  const isRight = neighbours === items.length - 1
  const isEmpty = places.length === 0
  return result(draw, {
    share: isRight ? 1 : Math.floor((neighbours / (items.length - 1)) * 10) / 10,
    isEmpty,
    reasons: isRight || isEmpty ? [] : [because],
    answer: items,
    mistakes: isRight || isEmpty ? [] : [`${id}/order`],
  })
}

const markMatch = (draw: Draw, { id, pairs }: MatchQuestion, given: unknown): QuestionResult => {
  const right = rightSides(pairs)
  const matched = pairs.map((_, i) => {
    const chosen = field(given, leftId(i))
    const place = draw.shuffle.findIndex((_, place) => placeId(place) === chosen)
    return place === -1 ? undefined : right[draw.shuffle[place]!]
  })
  const wrong = pairs.flatMap((pair, i) => (matched[i] !== undefined && matched[i] !== pair.right ? [i] : []))
  return result(draw, {
    share: pairs.filter((pair, i) => matched[i] === pair.right).length / pairs.length,
    isEmpty: matched.every((one) => one === undefined),
    reasons: wrong.map((i) => pairs[i]!.because),
    answer: pairs.map((pair) => `${pair.left}: ${pair.right}`),
    mistakes: wrong.map((i) => `${id}/pair/${i}`),
  })
}

/**
 * Marks what was answered to a drawn question. An answer of another kind, with ids that there are not, or of any other shape counts as far
 * as it can be understood; it never throws.
 */
export const mark = (draw: Draw, answer: unknown): QuestionResult => {
  const { question } = draw
  const given = field(answer, 'kind') === question.kind ? answer : undefined
  switch (question.kind) {
    case 'number':
      return markNumbers(draw, question, () => field(given, 'text'))
    case 'parts':
      return markNumbers(draw, question, (part) => field(field(given, 'texts'), part))
    case 'choose-one':
      return markChoices(draw, question, idsIn([field(given, 'choice')]))
    case 'choose-several':
      return markChoices(draw, question, idsIn(field(given, 'choices')))
    case 'order':
      return markOrder(draw, question, idsIn(field(given, 'order')))
    case 'match':
      return markMatch(draw, question, field(given, 'pairs'))
  }
}
