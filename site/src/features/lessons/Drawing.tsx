import { Suspense } from 'react'
import { drawings } from './drawings/index.ts'

export function Drawing({ name }: { name: string }) {
  const Shown = drawings[name]
  if (!Shown) return <p className="quiet">The drawing “{name}” is not there.</p>
  return (
    <figure className="drawing">
      <Suspense fallback={<p className="quiet">The drawing is on its way.</p>}>
        <Shown />
      </Suspense>
    </figure>
  )
}
