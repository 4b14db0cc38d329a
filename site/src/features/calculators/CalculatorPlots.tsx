import type { CalculatorDefinition } from '#calc/index.ts'
import { Plot } from '../../components/Plot.tsx'
import { RowsPlot } from '../../components/RowsPlot.tsx'
import type { Solved } from './form.ts'

/** The plots of a calculator whose numbers are there: each output and each input once. */
export function CalculatorPlots({
  definition,
  inputs,
  solution: { outputs },
}: Solved & { definition: CalculatorDefinition }) {
  return definition.plots?.map((plot) =>
    'of' in plot ? (
      <Plot key={plot.say} definition={definition} inputs={inputs} {...plot} />
    ) : (
      <RowsPlot key={plot.say} definition={definition} outputs={outputs} {...plot} />
    ),
  )
}
