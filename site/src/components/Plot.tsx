import { scaleLinear } from 'd3-scale'
import { line } from 'd3-shape'
import { memo } from 'react'
import { calculate, CalculationError, calculator, type Inputs } from '#calc/index.ts'
import { fieldText, format, join, unitFor } from '#calc/units/format.ts'
import { Framed, isNarrow, type Sheet } from './Framed.tsx'
import './plot.css'

export interface PlotProps {
  /** A calculator. */
  id: string
  /** SI. */
  inputs: Inputs
  /** A scalar output. */
  of: string
  /** A scalar input that is given. */
  against: string
  /** The plot runs from this part of the number given to that multiple. */
  from?: number
  to?: number
}

interface Point {
  x: number
  y: number
}

const samples = 80
const tableRows = 9

const isScalar = <K extends { kind: string }>(said: K | undefined): said is Extract<K, { kind: 'scalar' }> =>
  said?.kind === 'scalar'

/** A curve of one output over one input, the others staying as they are; where there is no answer there is no point. */
const curveOf = (id: string, inputs: Inputs, of: string, against: string, xs: readonly number[]): Point[] =>
  xs.flatMap((x) => {
    try {
      const y = calculate(id, { ...inputs, [against]: x })[of]
      return typeof y === 'number' ? [{ x, y }] : []
    } catch (error) {
      if (error instanceof CalculationError) return []
      throw error
    }
  })

const steps = (from: number, to: number, count: number) =>
  Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count)

/** How one output of a calculator goes with one of its inputs, the point of these inputs marked. */
export const Plot = memo(function Plot({ id, inputs, of, against, from = 0.3, to = 2 }: PlotProps) {
  const { inputs: asked, outputs: found } = calculator(id)
  const xSaid = asked[against]
  const ySaid = found[of]
  const now = inputs[against]
  if (!isScalar(xSaid) || !isScalar(ySaid) || typeof now !== 'number' || now === 0) return null
  const least = Math.max(xSaid.range[0], now * from)
  const most = Math.min(xSaid.range[1], now * to)
  const points = curveOf(id, inputs, of, against, steps(least, most, samples))
  const here = curveOf(id, inputs, of, against, [now])[0]
  if (!here || points.length < 2) return null

  // One unit for a whole axis: that of its point.
  const xUnit = unitFor(xSaid.quantity, now, xSaid.unit).name
  const yUnit = unitFor(ySaid.quantity, here.y, ySaid.unit).name
  const inUnits = ({ x, y }: Point): Point => ({
    x: Number(fieldText(x, xSaid.quantity, xUnit)),
    y: Number(fieldText(y, ySaid.quantity, yUnit)),
  })
  const say = ({ x, y }: Point) => ({
    x: join(format(x, xSaid.quantity, { unit: xUnit })),
    y: join(format(y, ySaid.quantity, { digits: ySaid.digits, unit: yUnit })),
  })
  const axis = (label: string, unit: string) => (unit === '' ? label : `${label}, ${unit}`)
  const xLabel = axis(xSaid.label, xUnit)
  const yLabel = axis(ySaid.label, yUnit)
  const [first, last] = [say(points[0]!), say(points.at(-1)!)]
  const name = `${ySaid.label} against ${xSaid.label.toLowerCase()}: ${first.y} at ${first.x}, ${last.y} at ${last.x}; here ${say(here).y} at ${say(here).x}.`

  return (
    <figure className="plot">
      <figcaption>
        {ySaid.label} against {xSaid.label.toLowerCase()}, the rest as it is
      </figcaption>
      <Framed
        name={name}
        draw={(width) =>
          curveSheet(width, {
            points: points.map(inUnits),
            here: inUnits(here),
            hereWords: say(here).y,
            xLabel,
            yLabel,
            startsAtZero: from === 0,
          })
        }
      />
      <details>
        <summary>The same as a table</summary>
        <table>
          <thead>
            <tr>
              <th scope="col">{xLabel}</th>
              <th scope="col">{yLabel}</th>
            </tr>
          </thead>
          <tbody>
            {curveOf(id, inputs, of, against, steps(least, most, tableRows - 1)).map((point) => (
              <tr key={point.x}>
                <td>{format(point.x, xSaid.quantity, { unit: xUnit }).text}</td>
                <td>{format(point.y, ySaid.quantity, { digits: ySaid.digits, unit: yUnit }).text}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </figure>
  )
})

interface Curve {
  points: readonly Point[]
  here: Point
  hereWords: string
  xLabel: string
  yLabel: string
  startsAtZero: boolean
}

const top = 34
const foot = 48
const right = 14

function curveSheet(width: number, { points, here, hereWords, xLabel, yLabel, startsAtZero }: Curve): Sheet {
  const [height, ticks] = isNarrow(width) ? [250, 4] : [290, 7]
  const highest = Math.max(...points.map(({ y }) => y))
  const ys = scaleLinear([0, highest], [height - foot, top]).nice(5)
  const yTicks = ys.ticks(5)
  const sayTick = ys.tickFormat(5)
  const left = 12 + 8.4 * Math.max(...yTicks.map((tick) => sayTick(tick).length))
  const xs = scaleLinear([startsAtZero ? 0 : points[0]!.x, points.at(-1)!.x], [left, width - right])
  const curve = line<Point>(
    ({ x }) => xs(x),
    ({ y }) => ys(y),
  )(points)
  const at = { x: xs(here.x), y: ys(here.y) }
  // Above the curve, on the side where the curve is lower.
  const falls = points[0]!.y > points.at(-1)!.y
  const lines = (
    <>
      <text x="0" y="16" fontSize="14" fill="var(--ink-2)">
        {yLabel}
      </text>
      {yTicks.map((tick) => (
        <g key={tick}>
          <path d={`M${left} ${ys(tick)}H${width - right}`} stroke="var(--rule)" />
          <text x={left - 7} y={ys(tick) + 5} textAnchor="end" fontSize="14" fill="var(--ink-2)">
            {sayTick(tick)}
          </text>
        </g>
      ))}
      <path d={`M${left} ${height - foot}H${width - right}`} stroke="var(--ink)" strokeWidth="1.5" />
      {xs.ticks(ticks).map((tick) => (
        <g key={tick}>
          <path d={`M${xs(tick)} ${height - foot}v6`} stroke="var(--ink)" strokeWidth="1.5" />
          <text x={xs(tick)} y={height - foot + 21} textAnchor="middle" fontSize="14" fill="var(--ink-2)">
            {xs.tickFormat(ticks)(tick)}
          </text>
        </g>
      ))}
      <text x={width - right} y={height - 6} textAnchor="end" fontSize="14" fill="var(--ink-2)">
        {xLabel}
      </text>
      <path d={curve ?? undefined} fill="none" stroke="var(--water)" strokeWidth="2.5" />
      <path d={`M${at.x} ${at.y}V${height - foot}`} stroke="var(--ink)" strokeWidth="1.5" strokeDasharray="2 5" />
      <circle cx={at.x} cy={at.y} r="6" fill="var(--paper)" stroke="var(--ink)" strokeWidth="2.5" />
      <text
        x={at.x + (falls ? 10 : -10)}
        y={at.y - 10}
        textAnchor={falls ? 'start' : 'end'}
        fontSize="15"
        fontWeight="600"
        fill="var(--ink)"
        className="plot-here"
      >
        {hereWords}
      </text>
    </>
  )
  return { height, lines }
}
