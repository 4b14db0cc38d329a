import { Button } from '@radix-ui/themes'
import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom'
import { ApiError } from '../lib/api-error.ts'
import { Notice } from './Notice.tsx'

const statusOf = (error: unknown) =>
  error instanceof ApiError || isRouteErrorResponse(error) ? error.status : undefined

export function NotFound({ children = 'Nothing stands at this address.' }: { children?: string }) {
  return (
    <Notice title="Not on the plan">
      <p>{children} The address may be mistyped, or the page may have moved.</p>
      <p>
        <Link to="/">Go to the long section</Link>
      </p>
    </Notice>
  )
}

/** For someone who is signed in, but may not see this. */
export function Forbidden({ children }: { children: string }) {
  return (
    <Notice title="Not open to you">
      <p>{children}</p>
      <p>
        <Link to="/my-learning">Go to my learning</Link>
      </p>
    </Notice>
  )
}

export function RouteError() {
  const error = useRouteError()
  const status = statusOf(error)
  if (status === 404) return <NotFound />
  if (status === 403) return <Forbidden>This page is for people with another part in the yard.</Forbidden>
  return (
    <Notice title="This page did not load">
      <p>
        A part of it did not arrive, or did not work. What you wrote on other pages is not lost. Check the signal, then
        try again.
      </p>
      <div className="actions">
        <Button size="3" onClick={() => window.location.reload()}>
          Try again
        </Button>
      </div>
    </Notice>
  )
}
