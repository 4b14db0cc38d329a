import { z } from 'zod'

/** A lesson that the caller may read; one that they may not is refused with the reason. */
export const lessonSchema = z.object({
  slug: z.string(),
  course: z.string(),
  number: z.int(),
  title: z.string(),
  minutes: z.int(),
  /** The names of its `<CheckYourself>` blocks. */
  blocks: z.array(z.string()),
})
export type Lesson = z.infer<typeof lessonSchema>
