import { useMutation } from '@tanstack/react-query'
import { Link, NavLink, useLocation } from 'react-router-dom'
import { useMe, useSignOutOptions } from '../lib/session-queries.ts'
import { withReturnPath } from '../lib/return-path.ts'
import { BarMenu } from './BarMenu.tsx'
import { Mark } from './Mark.tsx'
import './top-bar.css'

/** The course's own pages are under `/courses`, but its way in is the long section at `/`. */
function CourseLink() {
  const { pathname } = useLocation()
  const here = pathname === '/' || pathname.startsWith('/courses')
  return (
    <Link to="/" aria-current={here ? 'page' : undefined}>
      The course
    </Link>
  )
}

function Places({ signedIn }: { signedIn: boolean }) {
  return (
    <>
      <CourseLink />
      <NavLink to="/calculators">Calculators</NavLink>
      <NavLink to="/tables">Tables</NavLink>
      {signedIn && <NavLink to="/my-learning">My learning</NavLink>}
    </>
  )
}

function AccountLinks({ name }: { name: string | undefined }) {
  const { pathname } = useLocation()
  const signOut = useMutation(useSignOutOptions())
  const comesBack = /^\/(courses|calculators|tables|my-learning)/.test(pathname) ? pathname : undefined
  if (name === undefined) {
    return <NavLink to={withReturnPath('/sign-in', comesBack)}>Sign in</NavLink>
  }
  return (
    <>
      <p className="bar-name">{name}</p>
      <button type="button" onClick={() => signOut.mutate()} disabled={signOut.isPending}>
        Sign out
      </button>
      {signOut.isError && <p role="alert">Not signed out yet: {signOut.error.message}</p>}
    </>
  )
}

export function TopBar() {
  const me = useMe().data
  return (
    <header className="bar">
      <div className="bar-inside">
        <Link className="mark" to="/">
          <Mark />
          Leatwright
        </Link>
        <nav className="bar-wide" aria-label="Main">
          <Places signedIn={Boolean(me)} />
          {me ? (
            <BarMenu id="account-menu" label="Account">
              <AccountLinks name={me.name} />
            </BarMenu>
          ) : (
            <AccountLinks name={undefined} />
          )}
        </nav>
        <nav className="bar-narrow" aria-label="Main">
          <BarMenu id="main-menu" label="Menu">
            <Places signedIn={Boolean(me)} />
            <AccountLinks name={me?.name} />
          </BarMenu>
        </nav>
      </div>
    </header>
  )
}
