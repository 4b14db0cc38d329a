import { useSyncExternalStore } from 'react'

export const themeChoices = ['device', 'light', 'dark'] as const
type ThemeChoice = (typeof themeChoices)[number]

/** public/theme.js reads the same name, before the first paint. */
const storageKey = 'theme'

const isChoice = (value: unknown): value is ThemeChoice => themeChoices.includes(value as ThemeChoice)

function readChoice(): ThemeChoice {
  const stored = localStorage.getItem(storageKey)
  return isChoice(stored) ? stored : 'device'
}

export function chooseTheme(choice: ThemeChoice) {
  localStorage.setItem(storageKey, choice)
  window.dispatchEvent(new Event('themechoice'))
}

function subscribe(onChange: () => void) {
  window.addEventListener('themechoice', onChange)
  window.addEventListener('storage', onChange)
  return () => {
    window.removeEventListener('themechoice', onChange)
    window.removeEventListener('storage', onChange)
  }
}

export const useThemeChoice = () => useSyncExternalStore(subscribe, readChoice, () => 'device' as const)
