import { Button, Skeleton } from '@radix-ui/themes'
import { useQuery } from '@tanstack/react-query'
import { useId, useRef, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { hasCode } from '../../lib/api-error.ts'
import { courseQueries } from '../../lib/course-queries.ts'
import { withReturnPath } from '../../lib/return-path.ts'
import { useMe } from '../../lib/session-queries.ts'
import { attemptQueries } from './queries.ts'
import './questions.css'
import { Round } from './Round.tsx'

interface CheckYourselfProps {
  course: string
  lesson: string
  block: string
  /** How many questions a round has. */
  count: number
}

/** A block of marked questions in a lesson. */
export function CheckYourself(props: CheckYourselfProps) {
  const headingId = useId()
  const heading = useRef<HTMLHeadingElement>(null)
  const { count } = props
  return (
    <section className="check-yourself" aria-labelledby={headingId}>
      <h3 id={headingId} ref={heading} tabIndex={-1}>
        {count} {count === 1 ? 'question' : 'questions'}, drawn for you
      </h3>
      <Questions {...props} toTop={() => heading.current?.focus()} />
    </section>
  )
}

function Questions({ course, lesson, block, toTop }: CheckYourselfProps & { toTop: () => void }) {
  const me = useMe()
  const place = useQuery({ ...courseQueries.detail(course), enabled: Boolean(me.data) })
  const mayAnswer = Boolean(me.data) && place.data?.enrolled === true
  const round = useQuery({ ...attemptQueries.current(lesson, block), enabled: mayAnswer })

  const path = `/courses/${course}/${lesson}`
  if (me.data === null || hasCode(round.error, 'not-signed-in')) {
    return (
      <Invitation what="Sign in to have your answers marked and kept.">
        <Button asChild size="3">
          <Link to={withReturnPath('/sign-in', path)}>Sign in</Link>
        </Button>
        <Button asChild size="3" variant="outline">
          <Link to={withReturnPath('/sign-up', path)}>Sign up</Link>
        </Button>
      </Invitation>
    )
  }
  if (place.data?.enrolled === false || hasCode(round.error, 'not-enrolled')) {
    return (
      <Invitation what="Enrol in the course to have your answers marked and kept.">
        <Button asChild size="3">
          <Link to={`/courses/${course}`}>Go to the course</Link>
        </Button>
      </Invitation>
    )
  }
  const failed = [me, place, round].find(({ isError }) => isError)
  if (failed) {
    return (
      <ErrorCallout title="The questions did not arrive." error={failed.error} retry={() => void failed.refetch()} />
    )
  }
  if (!round.data) return <QuestionsSkeleton />
  return <Round key={round.data.id} attempt={round.data} onAgain={toTop} />
}

function Invitation({ what, children }: { what: string; children: ReactNode }) {
  return (
    <div className="no-print">
      <p>
        The numbers in these questions are drawn for you alone. A wrong answer is met with the reason for the usual
        mistakes, and with the working. {what}
      </p>
      <div className="actions">{children}</div>
    </div>
  )
}

function QuestionsSkeleton() {
  return (
    <div aria-busy="true">
      <p className="out-of-sight" role="status">
        The questions are on their way.
      </p>
      <div aria-hidden="true">
        <p>
          <Skeleton>A question about this lesson, drawn with numbers of its own.</Skeleton>
        </p>
        <Skeleton width="16rem" height="46px" />
      </div>
    </div>
  )
}
