import type { ReactNode } from 'react'
import type { Caution } from '#calc/index.ts'
import { Working } from '../components/Working.tsx'
import { Figures, Lists } from '../features/calculators/Results.tsx'
import { useCalculator } from '../lib/load-calculator.ts'
import type { Attributes } from './attributes.ts'
import { ExampleFrame } from './ExampleFrame.tsx'
import { workOut } from './example.ts'

interface WorkedExampleProps {
  id: string
  children?: ReactNode
  [input: string]: Attributes[string] | ReactNode
}

/** The live calculator beside it shows the cautions. */
const none: ReadonlyMap<string, readonly Caution[]> = new Map()

/** The whole working of a calculator for the numbers that the lesson gives. */
export default function WorkedExample({ id, children, ...attributes }: WorkedExampleProps) {
  const definition = useCalculator(id)
  const { given, working, outputs } = workOut(definition, attributes as Attributes, children)
  const keys = [...new Set(working.flatMap(({ gives }) => gives ?? []))]
  return (
    <ExampleFrame kind="Worked example" title={definition.title} given={given}>
      <Working steps={working} />
      <Figures definition={definition} outputs={outputs} keys={keys} cautions={none} />
      <Lists definition={definition} outputs={outputs} keys={Object.keys(definition.outputs)} />
    </ExampleFrame>
  )
}
