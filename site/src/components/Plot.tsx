import { memo } from 'react'
import type { CalculatorDefinition, Inputs } from '#calc/index.ts'
import { CalculationError } from '#calc/errors.ts'
import { calculateDefinition } from '#calc/solve-definition.ts'
import { unitFor } from '#calc/units/format.ts'
import { Curves, saidOn, type Axis, type Point } from './Curves.tsx'

export interface PlotProps {
  definition: CalculatorDefinition
  /** SI. */
  inputs: Inputs
  /** A scalar output. */
  of: string
  /** A scalar input that is given. */
  against: string
  /** The plot runs from this part of the number given to that multiple. */
  from?: number
  to?: number
  /** What its shape teaches. */
  say?: string
}

const samples = 80
const tableRows = 9

const isScalar = <K extends { kind: string }>(said: K | undefined): said is Extract<K, { kind: 'scalar' }> =>
  said?.kind === 'scalar'

const steps = (from: number, to: number, count: number) =>
  Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count)

/** How one output of a calculator goes with one of its inputs, the point of these inputs marked; where there is no answer there is no point. */
export const Plot = memo(function Plot({ definition, inputs, of, against, from = 0.3, to = 2, say }: PlotProps) {
  const xSaid = definition.inputs[against]
  const ySaid = definition.outputs[of]
  const now = inputs[against]
  if (!isScalar(xSaid) || !isScalar(ySaid) || typeof now !== 'number' || now === 0) return null
  const pointAt = (x: number): Point[] => {
    try {
      const y = calculateDefinition(definition, { ...inputs, [against]: x })[of]
      return typeof y === 'number' ? [{ x, y }] : []
    } catch (error) {
      if (error instanceof CalculationError) return []
      throw error
    }
  }
  const least = Math.max(xSaid.range[0], now * from)
  const most = Math.min(xSaid.range[1], now * to)
  const points = steps(least, most, samples).flatMap(pointAt)
  const [here] = pointAt(now)
  if (!here || points.length < 2) return null

  const x: Axis = { label: xSaid.label, quantity: xSaid.quantity, unit: unitFor(xSaid.quantity, now, xSaid.unit).name }
  const y: Axis = {
    label: ySaid.label,
    quantity: ySaid.quantity,
    unit: unitFor(ySaid.quantity, here.y, ySaid.unit).name,
    digits: ySaid.digits,
  }
  const words = (point: Point) => `${saidOn(point.y, y)} at ${saidOn(point.x, x)}`
  const title = `${y.label} against ${x.label.toLowerCase()}`
  return (
    <Curves
      caption={say ?? `${title}, the rest as it is`}
      name={`${title}: ${words(points[0]!)}, ${words(points.at(-1)!)}; here ${words(here)}.`}
      x={x}
      y={y}
      curves={[{ label: y.label, points }]}
      here={here}
      startsAtZero={from === 0}
      rows={steps(points[0]!.x, points.at(-1)!.x, tableRows - 1)}
    />
  )
})
