import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { NewPasswordForm } from '../features/account/NewPasswordForm.tsx'

export function Component() {
  const navigate = useNavigate()
  const token = useSearchParams()[0].get('token')
  return (
    <div className="page narrow-page">
      <Page title="New password" />
      <h1>New password</h1>
      {token ? (
        <>
          <p>All other places where you are signed in are signed out by this.</p>
          <NewPasswordForm token={token} onDone={() => void navigate('/my-learning', { replace: true })} />
        </>
      ) : (
        <p>The link is not whole. Open it again from the mail, or copy all of it into the address bar.</p>
      )}
      <p>
        Link too old? <Link to="/forgotten-password">Have a new one sent</Link>
      </p>
    </div>
  )
}
