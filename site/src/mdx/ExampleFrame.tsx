import { useId, type ReactNode } from 'react'
import type { GivenValue } from '../features/calculators/given-values.ts'
import './example.css'

interface ExampleFrameProps {
  /** What sort of example it is. */
  kind: string
  title: string
  given: readonly GivenValue[]
  children: ReactNode
}

/** An example's name and what is given. */
export function ExampleFrame({ kind, title, given, children }: ExampleFrameProps) {
  const id = useId()
  return (
    <div className="example" role="group" aria-labelledby={id}>
      <h3 id={id}>
        <span className="aside-name">{kind}</span> {title}
      </h3>
      <dl className="example-given">
        {given.map(({ label, text }) => (
          <div key={label}>
            <dt>{label}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
      {children}
    </div>
  )
}
