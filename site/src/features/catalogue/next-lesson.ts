import type { Course } from '#api/courses/dto/course.schema.ts'

/** Where to go on: the first lesson in the order of the water that is open and not done. */
export const nextLesson = ({ lessons }: Pick<Course, 'lessons'>) => lessons.find(({ open, done }) => open && !done)
