import { queryOptions } from '@tanstack/react-query'
import { lessonSchema } from '#api/lessons/dto/lesson.schema.ts'
import { apiClient } from '../../lib/api-client.ts'
import { loadLesson } from './lesson-files.ts'

export const lessonQueries = {
  /** Whether this reader may have the lesson; refused with the reason otherwise. */
  access: (lesson: string) =>
    queryOptions({
      queryKey: ['lessons', lesson, 'access'],
      queryFn: () => apiClient.get(`/api/lessons/${lesson}`, lessonSchema),
    }),
  text: (course: string, lesson: string) =>
    queryOptions({
      queryKey: ['lessons', lesson, 'text'],
      queryFn: () => loadLesson(course, lesson),
      staleTime: Infinity,
    }),
}
