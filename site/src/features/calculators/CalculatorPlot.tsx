import type { Inputs, Outputs } from '#calc/index.ts'
import { Plot, type PlotProps } from '../../components/Plot.tsx'

type Shape = Pick<PlotProps, 'of' | 'against' | 'from' | 'to'>

/** Where the shape of the answer matters: what against what, and over which part and multiple of the number given. */
const shapes: Readonly<Record<string, readonly Shape[]>> = {
  power: [
    { of: 'outputPower', against: 'netHead', from: 0, to: 2 },
    { of: 'outputPower', against: 'flow', from: 0, to: 2 },
  ],
  friction: [{ of: 'headLoss', against: 'insideDiameter', from: 0.75, to: 1.6 }],
  jet: [{ of: 'jetDiameter', against: 'netHead', from: 0.2, to: 2.5 }],
  runner: [{ of: 'speed', against: 'pitchDiameter', from: 0.4, to: 2.5 }],
}

interface CalculatorPlotProps {
  id: string
  inputs: Inputs
  outputs: Outputs
}

/** The first plot of a calculator whose numbers are there. */
export function CalculatorPlot({ id, inputs, outputs }: CalculatorPlotProps) {
  const shape = shapes[id]?.find(
    ({ of, against }) => typeof inputs[against] === 'number' && typeof outputs[of] === 'number',
  )
  return shape ? <Plot id={id} inputs={inputs} {...shape} /> : null
}
