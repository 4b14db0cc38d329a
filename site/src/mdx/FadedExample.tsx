import { useState, type ReactNode } from 'react'
import type { PrintedStep } from '#calc/index.ts'
import { Working } from '../components/Working.tsx'
import { saidOutput } from '../features/calculators/results.ts'
import { useCalculator } from '../lib/load-calculator.ts'
import type { Attributes } from './attributes.ts'
import { Blank } from './Blank.tsx'
import { ExampleFrame } from './ExampleFrame.tsx'
import { workOut } from './example.ts'

interface FadedExampleProps {
  id: string
  /** The outputs that the learner fills in. */
  blank: string
  children?: ReactNode
  [input: string]: Attributes[string] | ReactNode
}

/** The working of a calculator with steps left blank. A step's numbers are shown once every blank up to it is filled. */
export default function FadedExample({ id, blank, children, ...attributes }: FadedExampleProps) {
  const definition = useCalculator(id)
  const { given, working, outputs } = workOut(definition, attributes as Attributes, children)
  const [filled, setFilled] = useState<readonly string[]>([])
  const blanks = blank.split(/\s+/)
  const isBlank = ({ gives }: PrintedStep) => gives !== undefined && blanks.includes(gives)
  const firstOpen = working.findIndex((step) => isBlank(step) && !filled.includes(step.gives!))
  const steps = working.map((step, i) => {
    return firstOpen === -1 || i < firstOpen ? step : { ...step, numbers: undefined }
  })

  const below = (step: PrintedStep) => {
    const output = step.gives === undefined ? undefined : definition.outputs[step.gives]
    const answer = step.gives === undefined ? undefined : outputs[step.gives]
    if (!isBlank(step) || output?.kind !== 'scalar' || typeof answer !== 'number') return null
    return (
      <Blank
        label={output.label}
        symbol={output.symbol}
        quantity={output.quantity}
        answer={answer}
        shown={saidOutput(output, answer)}
        onFilled={() => setFilled((filled) => [...filled, step.gives!])}
      />
    )
  }

  return (
    <ExampleFrame kind="Now you: fill the blanks" title={definition.title} given={given}>
      <Working steps={steps} after={below} />
      <p className="quiet" role="status">
        {firstOpen === -1 ? 'Every blank is filled.' : ''}
      </p>
    </ExampleFrame>
  )
}
