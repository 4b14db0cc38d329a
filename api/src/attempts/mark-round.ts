import { mark } from '#calc/marking/mark.ts'
import type { AttemptRow, RoundResult } from '../database/schema/attempts.ts'

/** A block handed in with this share of its marks counts as done. */
const passShare = 0.6

/** Marks every question of a round as it was answered; one that was not gets no marks. */
export function markRound({ questions, answers }: Pick<AttemptRow, 'questions' | 'answers'>): RoundResult {
  const marked = questions.map((one) => [one.question.id, mark(one, answers[one.question.id])] as const)
  const sum = (of: 'marks' | 'outOf') => marked.reduce((total, [, result]) => total + result[of], 0)
  const [marks, outOf] = [sum('marks'), sum('outOf')]
  return { marks, outOf, passed: marks >= passShare * outOf, questions: Object.fromEntries(marked) }
}
