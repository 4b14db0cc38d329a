import { lessonIndex } from 'virtual:lesson-index'
import { courseList } from '#content/course-list.ts'

/** The courses as far as they are known without the server: order, titles, and which lessons are open. */
export const courses = courseList.map((course, courseIndex) => ({
  ...course,
  number: courseIndex + 1,
  lessons: course.lessons.map((lesson, lessonPosition) => {
    const written = lessonIndex.find(({ course: of, slug }) => of === course.slug && slug === lesson.slug)
    return {
      slug: lesson.slug,
      number: lessonPosition + 1,
      title: written?.title ?? lesson.title,
      minutes: written?.minutes,
      hazards: written?.hazards ?? [],
      open: written !== undefined,
    }
  }),
}))

export type CourseOutline = (typeof courses)[number]
export type LessonOutline = CourseOutline['lessons'][number]

export const findCourse = (slug: string | undefined) => courses.find((course) => course.slug === slug)

/** Free by its first price: its lessons are public files. */
export const isPublic = (course: CourseOutline) => course.firstPrice.amount === 0
