import { useState } from 'react'
import { Link } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { ForgottenPasswordForm } from '../features/account/ForgottenPasswordForm.tsx'
import { MailSent } from '../features/account/MailSent.tsx'

export function Component() {
  const [mailedTo, setMailedTo] = useState<string>()
  return (
    <div className="page narrow-page">
      <Page title="Forgotten password" description="Have a link sent to set a new password." />
      {mailedTo === undefined ? (
        <>
          <h1>Forgotten password</h1>
          <p>Write the address you signed up with. A mail with a link lets you set a new password.</p>
          <ForgottenPasswordForm onDone={setMailedTo} />
          <p>
            <Link to="/sign-in">Back to sign in</Link>
          </p>
        </>
      ) : (
        <MailSent email={mailedTo}>If the address has an account, the link in it sets a new password.</MailSent>
      )}
    </div>
  )
}
