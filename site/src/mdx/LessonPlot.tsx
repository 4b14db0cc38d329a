import type { ReactNode } from 'react'
import { Plot } from '../components/Plot.tsx'
import type { Attributes } from './attributes.ts'
import { workOut } from './example.ts'

interface LessonPlotProps {
  id: string
  /** An output, and the input that it is drawn against. */
  of: string
  against: string
  /** From this part of the number given to that multiple. */
  from?: number
  to?: number
  children?: ReactNode
  [input: string]: Attributes[string] | ReactNode
}

/** How one output of a calculator goes with one input, around the lesson's numbers. */
export default function LessonPlot({ id, of, against, from, to, children, ...attributes }: LessonPlotProps) {
  const { inputs } = workOut(id, attributes as Attributes, children)
  return <Plot id={id} inputs={inputs} of={of} against={against} from={from} to={to} />
}
