import { courses, isPublic } from './lib/course-structure.ts'

/** The calculators, once there are any. */
const calculation = Object.values(
  import.meta.glob<{ calculators?: Record<string, unknown> }>('../../calc/index.ts', { eager: true }),
)[0]

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
  ...Object.keys(calculation?.calculators ?? {}).map((id) => `/calculators/${id}`),
  '/sign-in',
  '/sign-up',
  '/forgotten-password',
]
