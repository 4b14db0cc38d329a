import { Skeleton } from '@radix-ui/themes'
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { SectionSlice } from '../../components/LongSection.tsx'
import { courseQueries } from '../../lib/course-queries.ts'
import type { CourseOutline } from '../../lib/course-structure.ts'
import { formatPrice } from '../../lib/money.ts'
import './course-legend.css'

/** The five courses under the long section; on a narrow screen down the page, each with its slice. */
export function CourseLegend({ courses }: { courses: readonly CourseOutline[] }) {
  const { data, isError, error, refetch } = useQuery(courseQueries.list())
  return (
    <>
      <ol className="course-legend">
        {courses.map((course) => {
          const known = data?.find(({ slug }) => slug === course.slug)
          return (
            <li key={course.slug}>
              <span className="course-legend-mark" aria-hidden="true">
                {course.number}
              </span>
              <SectionSlice course={course.number} />
              <h2>
                <Link to={`/courses/${course.slug}`}>
                  <span className="course-legend-number">{course.number} · </span>
                  {course.title}
                </Link>
              </h2>
              <p>{course.summary}</p>
              <p className="course-legend-price">
                {known ? (
                  <>
                    {known.enrolled ? 'Enrolled' : formatPrice(known.price)}
                    {' · '}
                  </>
                ) : (
                  !isError && (
                    <>
                      <Skeleton>Price</Skeleton>
                      {' · '}
                    </>
                  )
                )}
                {course.lessons.length} lessons
              </p>
            </li>
          )
        })}
      </ol>
      {isError && <ErrorCallout title="The prices did not arrive." error={error} retry={() => void refetch()} />}
    </>
  )
}
