import { Button, Skeleton } from '@radix-ui/themes'
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import type { Course } from '#api/courses/dto/course.schema.ts'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { StaffGauge } from '../../components/StaffGauge.tsx'
import { courseQueries } from '../../lib/course-queries.ts'
import { courses } from '../../lib/course-structure.ts'
import { nextLesson } from './next-lesson.ts'
import './my-courses.css'

export function MyCourses() {
  const { data, isError, error, refetch } = useQuery(courseQueries.list())
  if (isError) return <ErrorCallout title="Your courses did not arrive." error={error} retry={() => void refetch()} />
  if (!data) return <Skeleton height="12rem" aria-label="Your courses are on their way" />
  const mine = data.filter(({ enrolled }) => enrolled)
  if (mine.length === 0) {
    return (
      <>
        <p>You have no place on a course yet. The first is free.</p>
        <div className="actions">
          <Button asChild size="3">
            <Link to={`/courses/${courses[0]!.slug}`}>See {courses[0]!.title}</Link>
          </Button>
        </div>
      </>
    )
  }
  return (
    <ul className="my-courses">
      {mine.map((course) => (
        <li key={course.slug}>
          <MyCourse course={course} />
        </li>
      ))}
    </ul>
  )
}

function MyCourse({ course }: { course: Course }) {
  const next = nextLesson(course)
  const done = course.lessons.filter((lesson) => lesson.done).length
  return (
    <>
      <StaffGauge done={done} of={course.lessons.length} lies />
      <div>
        <p className="kicker">Course {course.number}</p>
        <h2>
          <Link to={`/courses/${course.slug}`}>{course.title}</Link>
        </h2>
        <p>
          {done} of {course.lessons.length} lessons done.
        </p>
        {next ? (
          <div className="actions">
            <Button asChild size="3">
              <Link to={`/courses/${course.slug}/${next.slug}`}>
                {done > 0 ? 'Go on' : 'Begin'}: {next.title}
              </Link>
            </Button>
          </div>
        ) : (
          <p>Every lesson that is open is done.</p>
        )}
      </div>
    </>
  )
}
