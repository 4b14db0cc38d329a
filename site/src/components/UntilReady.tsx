import type { ReactNode } from 'react'
import { useIsLive } from '../lib/use-is-live.ts'
import './until-ready.css'

/**
 * Fields of a page that was rendered at build time: shut until its script is there, since what is typed or sent before that would be lost.
 */
export function UntilReady({ children }: { children: ReactNode }) {
  const isReady = useIsLive()
  return (
    <fieldset className="until-ready" disabled={!isReady}>
      {children}
    </fieldset>
  )
}
