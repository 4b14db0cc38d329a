import { useState } from 'react'
import { Link, useSearchParams } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { MailSent } from '../features/account/MailSent.tsx'
import { SignUpForm } from '../features/account/SignUpForm.tsx'
import { keepReturnPath, safePath, withReturnPath } from '../lib/return-path.ts'

export function Component() {
  const next = safePath(useSearchParams()[0].get('next'))
  const [mailedTo, setMailedTo] = useState<string>()
  const head = (
    <Page title="Sign up" description="Sign up to keep what you have done, and to have your answers marked." />
  )
  if (mailedTo !== undefined) {
    return (
      <div className="page narrow-page">
        {head}
        <MailSent email={mailedTo}>Follow its link to confirm the address, and you are in.</MailSent>
      </div>
    )
  }
  return (
    <div className="page narrow-page">
      {head}
      <h1>Sign up</h1>
      <p>An account keeps what you have done and has your answers marked. The first course is free.</p>
      <SignUpForm
        onDone={(email) => {
          if (next) keepReturnPath(next)
          setMailedTo(email)
        }}
      />
      <p>
        Signed up before? <Link to={withReturnPath('/sign-in', next)}>Sign in</Link>
      </p>
    </div>
  )
}
