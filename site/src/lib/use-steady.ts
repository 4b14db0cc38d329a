import { useCallback, useLayoutEffect, useRef } from 'react'

/** The same function at every drawing, which does what the one given last does: what is handed it need not be drawn anew for its sake. */
export function useSteady<A extends unknown[], R>(call: (...args: A) => R): (...args: A) => R {
  const latest = useRef(call)
  useLayoutEffect(() => {
    latest.current = call
  })
  return useCallback((...args: A) => latest.current(...args), [])
}
