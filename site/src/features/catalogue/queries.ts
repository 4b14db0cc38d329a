import { mutationOptions, useQueryClient } from '@tanstack/react-query'
import { courseSchema } from '#api/courses/dto/course.schema.ts'
import { apiClient } from '../../lib/api-client.ts'
import { courseQueries } from '../../lib/course-queries.ts'

export function useEnrolOptions(slug: string) {
  const queryClient = useQueryClient()
  return mutationOptions({
    mutationFn: () => apiClient.post(`/api/courses/${slug}/enrolment`, undefined, courseSchema),
    onSuccess: async (course) => {
      queryClient.setQueryData(courseQueries.detail(slug).queryKey, course)
      await queryClient.invalidateQueries({ queryKey: courseQueries.list().queryKey })
    },
  })
}
