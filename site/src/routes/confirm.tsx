import { Button } from '@radix-ui/themes'
import { useMutation } from '@tanstack/react-query'
import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { ErrorCallout } from '../components/ErrorCallout.tsx'
import { Page } from '../components/Page.tsx'
import { useConfirmationOptions } from '../features/account/queries.ts'
import { dropReturnPath, keptReturnPath } from '../lib/return-path.ts'

/** The token is used by a press, not by the opening of the page: mail scanners open links too. */
export function Component() {
  const navigate = useNavigate()
  const token = useSearchParams()[0].get('token')
  const confirmation = useMutation(useConfirmationOptions())

  const confirm = (token: string) =>
    confirmation.mutate(
      { token },
      {
        onSuccess: () => {
          const next = keptReturnPath() ?? '/my-learning'
          dropReturnPath()
          void navigate(next, { replace: true })
        },
      },
    )

  return (
    <div className="page narrow-page">
      <Page title="Confirm your address" />
      <h1>Confirm your address</h1>
      {token ? (
        <>
          <p>One press, and your account is open.</p>
          {confirmation.isError && (
            <ErrorCallout title="The address is not confirmed." error={confirmation.error}>
              <p>
                A link works once, and for a limited time. <Link to="/sign-up">Sign up again</Link> to have a new one
                sent.
              </p>
            </ErrorCallout>
          )}
          <div className="actions">
            <Button size="3" loading={confirmation.isPending} onClick={() => confirm(token)}>
              Confirm this address
            </Button>
          </div>
        </>
      ) : (
        <p>The link is not whole. Open it again from the mail, or copy all of it into the address bar.</p>
      )}
    </div>
  )
}
