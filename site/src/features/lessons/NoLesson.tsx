import { Button, Skeleton } from '@radix-ui/themes'
import { Link } from 'react-router-dom'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { hasCode } from '../../lib/api-error.ts'
import type { CourseOutline, LessonOutline } from '../../lib/course-structure.ts'
import { withReturnPath } from '../../lib/return-path.ts'

interface NoLessonProps {
  course: CourseOutline
  lesson: LessonOutline
  /** Why the text is not there; absent while it is on its way. */
  error: Error | null
  retry: () => void
}

/** What stands in the place of a lesson's text that is not there: on its way, refused, or lost. */
export function NoLesson({ course, lesson, error, retry }: NoLessonProps) {
  if (!error) return <LessonSkeleton />
  if (hasCode(error, 'not-signed-in')) {
    const back = `/courses/${course.slug}/${lesson.slug}`
    return (
      <section className="lesson-refused">
        <h2>This lesson is for those on the course</h2>
        <p>Sign in to go on, and you come back here. A place on “{course.title}” opens all of its lessons.</p>
        <div className="actions">
          <Button asChild size="3">
            <Link to={withReturnPath('/sign-in', back)}>Sign in</Link>
          </Button>
          <Button asChild size="3" variant="outline">
            <Link to={`/courses/${course.slug}`}>What the course holds</Link>
          </Button>
        </div>
      </section>
    )
  }
  if (hasCode(error, 'not-enrolled')) {
    return (
      <section className="lesson-refused">
        <h2>You have no place on this course yet</h2>
        <p>This lesson belongs to “{course.title}”. A place on it opens all of its lessons.</p>
        <div className="actions">
          <Button asChild size="3">
            <Link to={`/courses/${course.slug}`}>See the course and its price</Link>
          </Button>
        </div>
      </section>
    )
  }
  if (hasCode(error, 'not-found')) {
    return (
      <section className="lesson-refused">
        <h2>This lesson is not here any more</h2>
        <p>
          It may have moved: <Link to={`/courses/${course.slug}`}>look through “{course.title}”</Link>.
        </p>
      </section>
    )
  }
  return <ErrorCallout title="The lesson did not arrive." error={error} retry={retry} />
}

function LessonSkeleton() {
  return (
    <div className="reading" aria-busy="true">
      <p className="out-of-sight" role="status">
        The lesson is on its way.
      </p>
      {[3, 2, 3].map((lines, paragraph) => (
        <p key={paragraph} aria-hidden="true">
          <Skeleton>{'Water finds its own level, given time and a clear way down. '.repeat(lines)}</Skeleton>
        </p>
      ))}
    </div>
  )
}
