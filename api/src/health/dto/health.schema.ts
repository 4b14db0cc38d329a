import { z } from 'zod'

export const healthSchema = z.object({
  status: z.enum(['ok', 'unready']),
  /** The process answers. */
  live: z.boolean(),
  /** The database answers too. */
  ready: z.boolean(),
  version: z.string(),
})
export type Health = z.infer<typeof healthSchema>
