import type { ReactNode } from 'react'
import type { CalculatorDefinition } from '#calc/index.ts'
import { parse } from '#calc/units/parse.ts'
import { Plot } from '../components/Plot.tsx'
import { useCalculator } from '../lib/load-calculator.ts'
import type { Attributes } from './attributes.ts'
import { workOut } from './example.ts'

interface LessonPlotProps {
  id: string
  /** An output, and the input that it is drawn against. */
  output: string
  input: string
  /** Where the plot begins and ends, as quantities of the input. */
  from?: string
  to?: string
  children?: ReactNode
  [input: string]: Attributes[string] | ReactNode
}

/** A quantity as a multiple of the number that the plot is drawn around. */
const multiple = ({ inputs }: CalculatorDefinition, key: string, text: string | undefined, of: unknown) => {
  const input = inputs[key]
  if (text === undefined || input?.kind !== 'scalar' || typeof of !== 'number') return undefined
  const reading = parse(text, input.quantity)
  return reading.ok ? reading.value / of : undefined
}

/** How one output of a calculator goes with one input, around the lesson's numbers. */
export default function LessonPlot({ id, output, input, from, to, children, ...attributes }: LessonPlotProps) {
  const definition = useCalculator(id)
  const { inputs } = workOut(definition, attributes as Attributes, children)
  const now = inputs[input]
  return (
    <Plot
      definition={definition}
      inputs={inputs}
      of={output}
      against={input}
      from={multiple(definition, input, from, now)}
      to={multiple(definition, input, to, now)}
    />
  )
}
