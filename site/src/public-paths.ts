import { calculatorIndex } from 'virtual:calculator-index'
import { tables } from '#calc/tables/tables.ts'
import { courses, isPublic } from './lib/course-structure.ts'

/** Pages that say the same to everyone, rendered at build. A paid lesson is not among them. */
export const publicPaths = () => [
  '/',
  ...courses.map(({ slug }) => `/courses/${slug}`),
  ...courses
    .filter(isPublic)
    .flatMap((course) =>
      course.lessons.filter(({ open }) => open).map(({ slug }) => `/courses/${course.slug}/${slug}`),
    ),
  '/calculators',
  ...calculatorIndex.map(({ id }) => `/calculators/${id}`),
  '/tables',
  ...Object.keys(tables).map((id) => `/tables/${id}`),
  '/sign-in',
  '/sign-up',
  '/forgotten-password',
]
