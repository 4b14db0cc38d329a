import type { PrintedStep } from '../print.ts'

/** `partial`: some of several choices, places or pairs are right. */
export type Verdict = 'full' | 'carried-forward' | 'partial' | 'none'

export interface PartResult {
  /** The part's id; a question of one part has the one id "answer". */
  id: string
  verdict: Verdict
  marks: number
  outOf: number
  /** How the answer was understood: "read as 0.0125 m³/s". */
  readAs?: string
  /** Why it earned no marks when it could not be read or worked with. */
  problem?: string
  /** The reasons of the usual mistakes, or of the wrong choices, that were recognised. */
  reasons: string[]
  /** What is said without costing marks, such as too few figures. */
  notes: string[]
  /** The right answer in words; of ordered or matched things, one line each. */
  answer: string[]
  working: PrintedStep[]
}

export interface QuestionResult {
  marks: number
  outOf: number
  parts: PartResult[]
  /**
   * Which mistakes were made, for the server only: the question's id, the part's, and the place of the mistake in the bank, such as
   * "jet-speed/answer/1".
   */
  mistakes: string[]
}

export const nothingGiven = 'No answer was given.'

/** Takes the noise of thirds and tenths away. */
export const roundMarks = (marks: number): number => Number(marks.toFixed(6))
