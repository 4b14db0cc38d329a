import { z } from 'zod'
import { printedStepSchema } from '../../common/dto/printed-step.schema.ts'

/** A number field of a question: what is asked for and the units that are offered (any unit of the quantity is taken). */
const numberField = {
  say: z.string(),
  quantity: z.string(),
  units: z.array(z.string()),
  /** Significant figures asked for. */
  figures: z.int().optional(),
  marks: z.number(),
}
const choice = z.object({ id: z.string(), say: z.string() })

/** What a learner may see of a drawn question: no answer, no mistake, no reason. */
export const questionViewSchema = z.discriminatedUnion('kind', [
  z.object({ id: z.string(), kind: z.literal('number'), ...numberField }),
  z.object({
    id: z.string(),
    kind: z.literal('parts'),
    say: z.string(),
    marks: z.number(),
    parts: z.array(z.object({ id: z.string(), ...numberField })),
  }),
  z.object({
    id: z.string(),
    kind: z.literal('choose-one'),
    say: z.string(),
    marks: z.number(),
    choices: z.array(choice),
  }),
  z.object({
    id: z.string(),
    kind: z.literal('choose-several'),
    say: z.string(),
    marks: z.number(),
    choices: z.array(choice),
  }),
  z.object({ id: z.string(), kind: z.literal('order'), say: z.string(), marks: z.number(), items: z.array(choice) }),
  z.object({
    id: z.string(),
    kind: z.literal('match'),
    say: z.string(),
    marks: z.number(),
    left: z.array(choice),
    right: z.array(choice),
  }),
])
export type QuestionView = z.infer<typeof questionViewSchema>

const text = z.string().max(200)
const id = z.string().max(100)
/** What a learner gives, kept as it was typed; a number is a text such as "9,5 l/s". */
export const answerSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('number'), text }),
  z.object({ kind: z.literal('parts'), texts: z.record(id, text) }),
  z.object({ kind: z.literal('choose-one'), choice: id }),
  z.object({ kind: z.literal('choose-several'), choices: z.array(id).max(20) }),
  z.object({ kind: z.literal('order'), order: z.array(id).max(20) }),
  z.object({ kind: z.literal('match'), pairs: z.record(id, id) }),
])
export type Answer = z.infer<typeof answerSchema>

export const partResultSchema = z.object({
  /** The part's id; a question of one part has the one id "answer". */
  id: z.string(),
  /** `partial`: some of several choices, places or pairs are right. */
  verdict: z.enum(['full', 'carried-forward', 'partial', 'none']),
  marks: z.number(),
  outOf: z.number(),
  /** How the answer was understood: "read as 0.0125 m³/s". */
  readAs: z.string().optional(),
  /** Why it earned no marks when it could not be read or worked with. */
  problem: z.string().optional(),
  /** The reason of a usual mistake, or of a wrong choice, that was recognised. */
  reasons: z.array(z.string()),
  /** What is said without costing marks, such as too few figures. */
  notes: z.array(z.string()),
  /** The right answer in words; of ordered or matched things, one line each. */
  answer: z.array(z.string()),
  working: z.array(printedStepSchema),
})
export type PartResult = z.infer<typeof partResultSchema>

export const attemptResultSchema = z.object({
  marks: z.number(),
  outOf: z.number(),
  passed: z.boolean(),
  questions: z.record(z.string(), z.object({ marks: z.number(), outOf: z.number(), parts: z.array(partResultSchema) })),
})
export type AttemptResult = z.infer<typeof attemptResultSchema>

export const attemptSchema = z.object({
  id: z.uuid(),
  lesson: z.string(),
  block: z.string(),
  createdAt: z.iso.datetime(),
  submittedAt: z.iso.datetime().nullable(),
  questions: z.array(questionViewSchema),
  answers: z.record(z.string(), answerSchema),
  result: attemptResultSchema.nullable(),
})
export type Attempt = z.infer<typeof attemptSchema>

/** Which `<CheckYourself>` block of the lesson to draw; `again` draws a new round after one was handed in. */
export const startAttemptSchema = z.object({ block: z.string().max(100), again: z.boolean().default(false) })
export type StartAttempt = z.infer<typeof startAttemptSchema>

export const saveAnswerSchema = z.object({ answer: answerSchema })
export type SaveAnswer = z.infer<typeof saveAnswerSchema>
