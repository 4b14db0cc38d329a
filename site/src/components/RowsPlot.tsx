import { memo } from 'react'
import type { CalculatorDefinition, Outputs } from '#calc/index.ts'
import { unitFor } from '#calc/units/format.ts'
import { Curves, saidOn, type Axis, type Point } from './Curves.tsx'

interface RowsPlotProps {
  definition: CalculatorDefinition
  outputs: Outputs
  /** An output of rows, the column along, and the columns up. */
  rows: string
  x: string
  y: readonly string[]
  /** What its shape teaches. */
  say: string
}

const tableRows = 11

/** Of many places so many that a table stays short, the first and the last among them. */
const some = (places: readonly number[]) =>
  places.length <= tableRows
    ? places
    : Array.from({ length: tableRows }, (_, i) => places[Math.round((i * (places.length - 1)) / (tableRows - 1))]!)

/** Columns of rows that were found, over another column of theirs. */
export const RowsPlot = memo(function RowsPlot({ definition, outputs, rows, x, y, say }: RowsPlotProps) {
  const output = definition.outputs[rows]
  const found = outputs[rows]
  if (output?.kind !== 'rows' || typeof found !== 'object') return null
  const across = output.columns[x]
  const up = y.flatMap((name) => {
    const column = output.columns[name]
    if (across?.kind !== 'scalar' || column?.kind !== 'scalar') return []
    const points = found.flatMap((row): Point[] => {
      const [along, value] = [row[x], row[name]]
      return typeof along === 'number' && typeof value === 'number' ? [{ x: along, y: value }] : []
    })
    return points.length < 2 ? [] : [{ column, curve: { label: column.label, points } }]
  })
  if (across?.kind !== 'scalar' || up.length === 0) return null

  const curves = up.map(({ curve }) => curve)
  const points = curves.flatMap((curve) => curve.points)
  const axis = ({ label, quantity, unit, digits }: typeof across, values: readonly number[]): Axis => {
    const most = values.reduce((largest, value) => Math.max(largest, Math.abs(value)), 0)
    return { label, quantity, unit: unitFor(quantity, most, unit).name, digits }
  }
  const xAxis = axis(
    across,
    points.map((point) => point.x),
  )
  const yAxis = axis(
    up[0]!.column,
    points.map((point) => point.y),
  )
  const words = ({ x, y }: Point) => `${saidOn(y, yAxis)} at ${saidOn(x, xAxis)}`
  return (
    <Curves
      caption={say}
      name={`${curves.map(({ label, points }) => `${label}: ${words(points[0]!)}, ${words(points.at(-1)!)}`).join('; ')}.`}
      x={xAxis}
      y={yAxis}
      curves={curves}
      startsAtZero={false}
      rows={some(curves[0]!.points.map((point) => point.x))}
    />
  )
})
