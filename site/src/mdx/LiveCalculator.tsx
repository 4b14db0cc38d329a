import type { ReactNode } from 'react'
import { Plot } from '../components/Plot.tsx'
import { Calculator } from '../features/calculators/Calculator.tsx'
import { useCalculator } from '../lib/load-calculator.ts'
import { textsFrom, type Attributes } from './attributes.ts'

interface LiveCalculatorProps {
  id: string
  /** The outputs shown, apart by spaces; all unless told. */
  show?: string
  /** An output against an input: `speed-against-pitch-diameter`. */
  plot?: string
  children?: ReactNode
  [input: string]: Attributes[string] | ReactNode
}

const key = (words: string) => words.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())

/** A calculator in a lesson, set to the lesson's numbers. */
export default function LiveCalculator({ id, show, plot, children, ...attributes }: LiveCalculatorProps) {
  const definition = useCalculator(id)
  const [of, against] = plot?.split('-against-').map(key) ?? []
  return (
    <Calculator
      definition={definition}
      preset={textsFrom(definition, attributes as Attributes, children)}
      show={show}
      headingLevel={3}
      plot={
        of && against
          ? ({ inputs }) => <Plot definition={definition} inputs={inputs} of={of} against={against} />
          : undefined
      }
    />
  )
}
