import { queryOptions } from '@tanstack/react-query'
import { courseSchema, coursesSchema } from '#api/courses/dto/course.schema.ts'
import { apiClient } from './api-client.ts'

/** Prices, enrolment and what is done. Invalidate `courseQueries.all()` after anything that changes them. */
export const courseQueries = {
  all: () => ['courses'] as const,
  list: () =>
    queryOptions({
      queryKey: [...courseQueries.all(), 'list'],
      queryFn: () => apiClient.get('/api/courses', coursesSchema),
    }),
  detail: (slug: string) =>
    queryOptions({
      queryKey: [...courseQueries.all(), slug],
      queryFn: () => apiClient.get(`/api/courses/${slug}`, courseSchema),
    }),
}
