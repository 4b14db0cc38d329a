import { z } from 'zod'
import { printedStepSchema } from '../../common/dto/printed-step.schema.ts'

/** Inputs as `calc/` checks them: its refusal names the key, which a schema here would only say less well. */
export const solveRequestSchema = z.object({ inputs: z.record(z.string(), z.unknown()) })
export type SolveRequest = z.infer<typeof solveRequestSchema>

const plainRow = z.record(z.string(), z.union([z.number(), z.string()]))
const outputs = z.record(z.string(), z.union([z.number(), z.string(), z.array(plainRow)]))

export const solutionSchema = z.object({
  /** SI, under the keys of the calculator's outputs; what cannot be worked out is absent. */
  outputs,
  working: z.array(printedStepSchema),
  cautions: z.array(
    z.object({
      level: z.enum(['note', 'check', 'stop']),
      about: z.array(z.string()),
      hazard: z.string().optional(),
      say: z.string(),
    }),
  ),
})

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
})
export const calculatorsSchema = z.array(calculatorSchema)
