import { useSyncExternalStore } from 'react'

const query = '(max-width: 48rem)'

const subscribe = (changed: () => void) => {
  const list = window.matchMedia(query)
  list.addEventListener('change', changed)
  return () => list.removeEventListener('change', changed)
}

/** Whether a drawing takes its narrow arrangement. Pages rendered at build time start with the wide one. */
export const useNarrow = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => window.matchMedia(query).matches,
    () => false,
  )
