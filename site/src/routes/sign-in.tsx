import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { SignInForm } from '../features/account/SignInForm.tsx'
import { safePath, withReturnPath } from '../lib/return-path.ts'

export function Component() {
  const navigate = useNavigate()
  const next = safePath(useSearchParams()[0].get('next'))
  return (
    <div className="page narrow-page">
      <Page title="Sign in" description="Sign in to go on where you left." />
      <h1>Sign in</h1>
      <SignInForm onDone={() => void navigate(next ?? '/my-learning', { replace: true })} />
      <p>
        <Link to="/forgotten-password">Forgotten your password?</Link>
      </p>
      <p>
        New here? <Link to={withReturnPath('/sign-up', next)}>Sign up</Link>. The first course is free.
      </p>
    </div>
  )
}
