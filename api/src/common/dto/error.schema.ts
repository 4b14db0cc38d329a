import { z } from 'zod'

/** The one shape of every refusal: `code` is for programs, `message` for people, `fields` says where to put it right. */
export const errorSchema = z.object({
  code: z.string(),
  message: z.string(),
  fields: z.array(z.object({ field: z.string(), code: z.string(), message: z.string() })),
})
export type ErrorBody = z.infer<typeof errorSchema>
