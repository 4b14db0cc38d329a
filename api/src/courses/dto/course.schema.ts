import { z } from 'zod'

export const lessonSummarySchema = z.object({
  slug: z.string(),
  number: z.int(),
  title: z.string(),
  /** Absent until the lesson is open. */
  minutes: z.int().optional(),
  open: z.boolean(),
  done: z.boolean(),
})
export type LessonSummary = z.infer<typeof lessonSummarySchema>

export const courseSchema = z.object({
  slug: z.string(),
  number: z.int(),
  title: z.string(),
  summary: z.string(),
  station: z.string(),
  /** In minor units; `amount` 0 is a free course. */
  price: z.object({ amount: z.int().nonnegative(), currency: z.string().length(3) }),
  enrolled: z.boolean(),
  lessons: z.array(lessonSummarySchema),
})
export type Course = z.infer<typeof courseSchema>

export const coursesSchema = z.array(courseSchema)
