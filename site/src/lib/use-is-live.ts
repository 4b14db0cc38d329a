import { useSyncExternalStore } from 'react'

const never = () => () => undefined

/** False in a page rendered at build, and until the browser has taken it over: only then are the address and this device known. */
export const useIsLive = () =>
  useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
