import { Button, Skeleton } from '@radix-ui/themes'
import { Link } from 'react-router-dom'
import { ErrorCallout } from '../components/ErrorCallout.tsx'
import { Page } from '../components/Page.tsx'
import { MyCourses } from '../features/catalogue/MyCourses.tsx'
import { useMe } from '../lib/session-queries.ts'
import { withReturnPath } from '../lib/return-path.ts'

export function Component() {
  return (
    <div className="page">
      <Page title="My learning" />
      <h1>My learning</h1>
      <Mine />
    </div>
  )
}

function Mine() {
  const { data: me, isError, error, refetch } = useMe()
  if (isError) return <ErrorCallout title="Who you are did not arrive." error={error} retry={() => void refetch()} />
  if (me === undefined) return <Skeleton height="12rem" />
  if (me === null) {
    return (
      <>
        <p>Sign in to see your courses and to go on where you left.</p>
        <div className="actions">
          <Button asChild size="3">
            <Link to={withReturnPath('/sign-in', '/my-learning')}>Sign in</Link>
          </Button>
          <Button asChild size="3" variant="outline">
            <Link to={withReturnPath('/sign-up', '/my-learning')}>Sign up</Link>
          </Button>
        </div>
      </>
    )
  }
  return <MyCourses />
}
