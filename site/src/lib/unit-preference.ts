import { useSyncExternalStore } from 'react'
import { showUnitsOf, type UnitSystem } from '#calc/units/system.ts'

const key = 'units'
const listeners = new Set<() => void>()

const read = (): UnitSystem => {
  try {
    return localStorage.getItem(key) === 'imperial' ? 'imperial' : 'metric'
  } catch {
    // Storage may be forbidden: then the choice holds for this page.
    return here
  }
}
let here: UnitSystem = 'metric'

const subscribe = (listener: () => void) => {
  listeners.add(listener)
  window.addEventListener('storage', listener)
  return () => {
    listeners.delete(listener)
    window.removeEventListener('storage', listener)
  }
}

export const preferUnits = (system: UnitSystem): void => {
  here = system
  try {
    localStorage.setItem(key, system)
  } catch {
    // As above.
  }
  for (const listener of listeners) listener()
}

/**
 * The system that this person reads units in. From here on the library says results, ranges and cautions in it: what shows them must be drawn
 * anew when it changes (`key={system}`).
 */
export const useUnits = (): UnitSystem => {
  const system = useSyncExternalStore(subscribe, read, () => 'metric' as const)
  showUnitsOf(system)
  return system
}
