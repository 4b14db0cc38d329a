import { z } from 'zod'

/** A step of a working, printed with one calculation's numbers: formulas as TeX, and as speech. */
export const printedStepSchema = z.object({
  say: z.string(),
  symbols: z.string().optional(),
  numbers: z.string().optional(),
  speech: z.string().optional(),
  gives: z.string().optional(),
})
