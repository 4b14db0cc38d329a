import type { ReactNode } from 'react'
import './caution.css'

const words = { note: 'Note', check: 'Check', stop: 'Stop' }

/** A danger or a thing to look at, named in a word before it is told: the colour is never the only sign. */
export function Caution({ level, children }: { level: keyof typeof words; children: ReactNode }) {
  return (
    <div className={`caution caution-${level}`} role="note">
      <strong>{words[level]}</strong>
      <div>{children}</div>
    </div>
  )
}
