import { useSyncExternalStore, type ReactNode } from 'react'
import './until-ready.css'

const never = () => () => undefined

/**
 * Fields of a page that was rendered at build time: shut until its script is there, since what is typed or sent before that would be lost.
 */
export function UntilReady({ children }: { children: ReactNode }) {
  const isReady = useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
  return (
    <fieldset className="until-ready" disabled={!isReady}>
      {children}
    </fieldset>
  )
}
