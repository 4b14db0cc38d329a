import { Button, Callout } from '@radix-ui/themes'
import type { ReactNode } from 'react'

interface ErrorCalloutProps {
  /** What could not be done, in the reader's words. */
  title: string
  error?: Error | null
  retry?: () => void
  children?: ReactNode
}

/** What went wrong, what the server says of it, and a way to try again. */
export function ErrorCallout({ title, error, retry, children }: ErrorCalloutProps) {
  return (
    <Callout.Root color="tomato" role="alert" size="2" my="4" className="error-callout">
      <div>
        <Callout.Text weight="bold">{title}</Callout.Text>
        {error && <p>{error.message}</p>}
        {children}
        {retry && (
          <Button variant="outline" color="tomato" size="3" onClick={retry}>
            Try again
          </Button>
        )}
      </div>
    </Callout.Root>
  )
}
