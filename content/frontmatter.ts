import type { Hazard, Station } from '#calc/index.ts'
import { z } from 'zod'

const stations = [
  'stream',
  'intake',
  'leat',
  'forebay',
  'pipe',
  'valve',
  'jet',
  'runner',
  'alternator',
  'cable',
  'load',
  'scheme',
] as const satisfies readonly Station[]

const hazards = [
  'pressure',
  'electricity',
  'stream',
  'hot-work',
  'rotating',
  'lifting',
  'digging',
] as const satisfies readonly Hazard[]

/** The head of a lesson's file. */
export const frontmatterSchema = z.strictObject({
  title: z.string().min(3).max(80),
  station: z.enum(stations),
  minutes: z.int().min(8).max(15),
  /** What can hurt in this lesson; each wants its caution there. */
  hazards: z.array(z.enum(hazards)),
})
export type Frontmatter = z.infer<typeof frontmatterSchema>
