import { useQuery } from '@tanstack/react-query'
import type { LessonFile } from './lesson-files.ts'
import { lessonQueries } from './queries.ts'

/**
 * The text of a lesson. One that came with the page needs no question; for any other the server is asked first, because a file that is
 * refused does not say why.
 */
export function useLessonText(course: string, lesson: string, withPage: LessonFile | undefined) {
  const access = useQuery({ ...lessonQueries.access(lesson), enabled: !withPage })
  const text = useQuery({ ...lessonQueries.text(course, lesson), enabled: access.isSuccess })
  return {
    text: withPage ?? text.data,
    error: access.error ?? text.error,
    // Browsers may remember that a file did not load; a new page has forgotten.
    retry: () => (text.isError ? window.location.reload() : void access.refetch()),
  }
}
