import { z } from 'zod'
import { printedStepSchema } from '../../common/dto/printed-step.schema.ts'
import { cautionSchema, outputsSchema, plainRowSchema, troubleSchema } from './calculator.schema.ts'

/** Unknown to this schema, as those of the calculators are: the library checks them and names what is wrong. */
export const schemeRequestSchema = z.object({
  inputs: z.unknown(),
  /** By field, `penstock.sections[0].length`, SI. */
  standardUncertainties: z.record(z.string(), z.number()).optional(),
})
export type SchemeRequest = z.infer<typeof schemeRequestSchema>

const stationSchema = z.union([
  z.object({ outputs: outputsSchema }),
  z.object({ waitsFor: z.array(z.string()) }),
  z.object({ refused: troubleSchema }),
])

/** One stream through the whole chain. */
export const schemeSolutionSchema = z.object({
  stations: z.record(z.string(), stationSchema),
  figures: outputsSchema,
  energyBalance: z
    .array(
      z.object({
        part: z.string(),
        station: z.string(),
        label: z.string(),
        head: z.number(),
        power: z.number(),
        share: z.number(),
      }),
    )
    .optional(),
  gradeLine: z.array(plainRowSchema).optional(),
  working: z.array(z.object({ station: z.string(), title: z.string(), steps: z.array(printedStepSchema) })),
  cautions: z.array(cautionSchema.extend({ station: z.string() })),
  /** Of each figure, where standard uncertainties were given. */
  uncertainties: z
    .record(
      z.string(),
      z.object({ value: z.number(), standardUncertainty: z.number(), shares: z.record(z.string(), z.number()) }),
    )
    .optional(),
})
