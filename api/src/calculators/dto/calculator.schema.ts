import { z } from 'zod'
import { printedStepSchema } from '../../common/dto/printed-step.schema.ts'

/** Unknown to this schema: `calc/` checks inputs, and its refusal names the key, which would only be said less well here. */
const inputs = z.unknown()

export const solveRequestSchema = z.object({ inputs })
export type SolveRequest = z.infer<typeof solveRequestSchema>

export const solveItemSchema = z.strictObject({ id: z.string(), inputs })
/** Each item is checked by itself, so that a bad one does not spoil the others. */
export const solveBatchSchema = z.object({ items: z.array(z.unknown()) })
export type SolveBatch = z.infer<typeof solveBatchSchema>

export const plainRowSchema = z.record(z.string(), z.union([z.number(), z.string()]).optional())
export const outputsSchema = z.record(z.string(), z.union([z.number(), z.string(), z.array(plainRowSchema)]).optional())

export const cautionSchema = z.object({
  level: z.enum(['note', 'check', 'stop']),
  about: z.array(z.string()),
  hazard: z.string().optional(),
  say: z.string(),
})

export const solutionSchema = z.object({
  /** SI, under the keys of the calculator's outputs; what cannot be worked out is absent. */
  outputs: outputsSchema,
  working: z.array(printedStepSchema),
  cautions: z.array(cautionSchema),
})

export const troubleSchema = z.object({ field: z.string(), code: z.string(), message: z.string() })
export type Trouble = z.infer<typeof troubleSchema>

const plotSchema = z.union([
  z.object({ say: z.string(), of: z.string(), against: z.string(), from: z.number(), to: z.number() }),
  z.object({ say: z.string(), rows: z.string(), x: z.string(), y: z.array(z.string()) }),
])

/** A calculator without its sums: what it takes, what it gives, what it rests on. */
export const calculatorSchema = z.object({
  id: z.string(),
  station: z.string(),
  title: z.string(),
  summary: z.string(),
  hazards: z.array(z.string()),
  inputs: z.record(z.string(), z.looseObject({ kind: z.string(), label: z.string() })),
  outputs: z.record(z.string(), z.looseObject({ kind: z.string(), label: z.string() })),
  doesNotCheck: z.array(z.string()),
  sources: z.array(z.object({ author: z.string(), title: z.string(), year: z.number(), where: z.string().optional() })),
  /** Numbers to try, other than those a form starts with; SI. */
  example: z.object({ say: z.string(), inputs: z.record(z.string(), z.unknown()) }),
  /** Plots whose shape teaches: an output over an input, or columns of found rows over another. */
  plots: z.array(plotSchema).optional(),
})
