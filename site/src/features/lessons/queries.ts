import { queryOptions } from '@tanstack/react-query'
import { z } from 'zod'
import { apiClient } from '../../lib/api-client.ts'
import { loadLesson } from './lesson-files.ts'

const lessonAccessSchema = z.object({
  slug: z.string(),
  course: z.string(),
  number: z.int(),
  title: z.string(),
  access: z.literal('open'),
})

export const lessonQueries = {
  /** Whether this reader may have the lesson; refused with the reason otherwise. */
  access: (lesson: string) =>
    queryOptions({
      queryKey: ['lessons', lesson, 'access'],
      queryFn: () => apiClient.get(`/api/lessons/${lesson}`, lessonAccessSchema),
    }),
  text: (course: string, lesson: string) =>
    queryOptions({
      queryKey: ['lessons', lesson, 'text'],
      queryFn: () => loadLesson(course, lesson),
      staleTime: Infinity,
    }),
}
