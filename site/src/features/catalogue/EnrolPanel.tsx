import { Button, Skeleton } from '@radix-ui/themes'
import { useMutation, type UseQueryResult } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import type { Course } from '#api/courses/dto/course.schema.ts'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { formatPrice } from '../../lib/money.ts'
import { withReturnPath } from '../../lib/return-path.ts'
import { useMe } from '../../lib/session-queries.ts'
import { courses } from '../../lib/course-structure.ts'
import { nextLesson } from './next-lesson.ts'
import { useEnrolOptions } from './queries.ts'

/** Price and place, and the one next thing to press. */
export function EnrolPanel({ query }: { query: UseQueryResult<Course, Error> }) {
  const me = useMe()
  if (query.isError) {
    return (
      <ErrorCallout
        title="The price and your place did not arrive."
        error={query.error}
        retry={() => void query.refetch()}
      />
    )
  }
  if (!query.data || me.isPending) {
    return (
      <div className="enrol-panel" aria-busy="true">
        <p className="enrol-price">
          <Skeleton>Price</Skeleton>
        </p>
        <Skeleton width="10rem" height="44px" />
      </div>
    )
  }
  const course = query.data
  if (course.enrolled) return <Place course={course} />
  if (course.price.amount > 0) return <NotOnSale course={course} />
  return <FreePlace course={course} signedIn={Boolean(me.data)} />
}

function Place({ course }: { course: Course }) {
  const next = nextLesson(course)
  return (
    <div className="enrol-panel">
      <p className="enrol-price">You are enrolled</p>
      {next ? (
        <Button asChild size="3">
          <Link to={`/courses/${course.slug}/${next.slug}`}>
            {course.lessons.some(({ done }) => done) ? 'Go on' : 'Begin'}: {next.title}
          </Link>
        </Button>
      ) : (
        <p>Every lesson that is open is done.</p>
      )}
    </div>
  )
}

function FreePlace({ course, signedIn }: { course: Course; signedIn: boolean }) {
  const enrol = useMutation(useEnrolOptions(course.slug))
  return (
    <div className="enrol-panel">
      <p className="enrol-price">{formatPrice(course.price)}</p>
      {signedIn ? (
        <Button size="3" loading={enrol.isPending} onClick={() => enrol.mutate()}>
          Enrol, free
        </Button>
      ) : (
        <Button asChild size="3">
          <Link to={withReturnPath('/sign-up', `/courses/${course.slug}`)}>Enrol, free</Link>
        </Button>
      )}
      <p className="quiet">
        Anyone may read its lessons. A place keeps what you have done and has your answers marked.
      </p>
      {enrol.isError && <ErrorCallout title="You are not enrolled yet." error={enrol.error} />}
    </div>
  )
}

function NotOnSale({ course }: { course: Course }) {
  const free = courses[0]!
  return (
    <div className="enrol-panel">
      <p className="enrol-price">{formatPrice(course.price)}</p>
      <p>
        <strong>Places on this course are not on sale yet.</strong> Until they are,{' '}
        <Link to={`/courses/${free.slug}`}>{free.title}</Link> is open to all and free.
      </p>
    </div>
  )
}
