import { useEffect, useRef, type ReactNode } from 'react'
import { Outlet, ScrollRestoration, useLocation } from 'react-router-dom'
import { Foot } from './Foot.tsx'
import { TopBar } from './TopBar.tsx'

/** Bar, page, foot. */
export function Shell({ children = <Outlet /> }: { children?: ReactNode }) {
  const main = useRef<HTMLElement>(null)
  const { pathname } = useLocation()
  const shown = useRef(pathname)

  // A new page without a page load: a screen reader and the tab key start at its top, as they would after one.
  useEffect(() => {
    if (shown.current === pathname) return
    shown.current = pathname
    main.current?.focus({ preventScroll: true })
  }, [pathname])

  return (
    <>
      <a className="skip-link" href="#main">
        Skip to the page
      </a>
      <TopBar />
      <main id="main" ref={main} tabIndex={-1}>
        {children}
      </main>
      <Foot />
      <ScrollRestoration />
    </>
  )
}
