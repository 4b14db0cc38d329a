import { scaleLinear } from 'd3-scale'
import { line } from 'd3-shape'
import type { Quantity } from '#calc/index.ts'
import { fieldText, format, join } from '#calc/units/format.ts'
import { Framed, isNarrow, type Sheet } from './Framed.tsx'
import './plot.css'
import './table-box.css'

export interface Axis {
  label: string
  quantity: Quantity
  /** One unit for the whole axis. */
  unit: string
  digits?: number
}

/** SI. */
export interface Point {
  x: number
  y: number
}

export interface Curve {
  label: string
  points: readonly Point[]
}

interface CurvesProps {
  caption: string
  /** What the plot says, numbers and all. */
  name: string
  x: Axis
  y: Axis
  curves: readonly Curve[]
  /** The point of the numbers that are given. */
  here?: Point
  startsAtZero: boolean
  /** The rows of the table beside it; every curve has a number there, or a dash. */
  rows: readonly number[]
}

const said = (value: number, { quantity, unit, digits }: Axis) => format(value, quantity, { unit, digits })
export const saidOn = (value: number, axis: Axis) => join(said(value, axis))
const axisWords = ({ label, unit }: Axis) => (unit === '' ? label : `${label}, ${unit}`)
const inUnit = (value: number, { quantity, unit }: Axis) => Number(fieldText(value, quantity, unit))

/** The value of a curve at a place between its points; undefined beyond them. */
const at = (points: readonly Point[], x: number): number | undefined => {
  const after = points.findIndex((point) => point.x >= x)
  if (after < 0) return undefined
  const [b, a] = [points[after]!, points[after - 1]]
  if (!a) return b.x === x ? b.y : undefined
  return a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x)
}

/** Curves over one axis, with the same as a table. */
export function Curves({ caption, name, x, y, curves, here, startsAtZero, rows }: CurvesProps) {
  return (
    <figure className="plot">
      <figcaption>{caption}</figcaption>
      <Framed
        name={name}
        draw={(width) =>
          sheet(width, {
            curves: curves.map(({ label, points }) => ({
              label,
              points: points.map((point) => ({ x: inUnit(point.x, x), y: inUnit(point.y, y) })),
            })),
            here: here && { x: inUnit(here.x, x), y: inUnit(here.y, y) },
            hereWords: here && saidOn(here.y, y),
            xLabel: axisWords(x),
            yLabel: axisWords(y),
            startsAtZero,
          })
        }
      />
      <details>
        <summary>The same as a table</summary>
        <div className="table-box" role="group" aria-label={`${caption}, as a table`} tabIndex={0}>
          <table>
            <thead>
              <tr>
                <th scope="col">{axisWords(x)}</th>
                {curves.map(({ label }) => (
                  <th scope="col" key={label}>
                    {axisWords({ ...y, label })}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {rows.map((place) => (
                <tr key={place}>
                  <td>{said(place, x).text}</td>
                  {curves.map(({ label, points }) => {
                    const value = at(points, place)
                    return <td key={label}>{value === undefined ? '–' : said(value, y).text}</td>
                  })}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </details>
    </figure>
  )
}

interface Drawn {
  curves: readonly Curve[]
  here: Point | undefined
  hereWords: string | undefined
  xLabel: string
  yLabel: string
  startsAtZero: boolean
}

const top = 34
const foot = 48
const right = 14
/** Of several curves each has its own stroke, and its name at its end. */
const dashes = [undefined, '9 5', '2 5', '12 4 2 4']

function sheet(width: number, { curves, here, hereWords, xLabel, yLabel, startsAtZero }: Drawn): Sheet {
  const [height, ticks] = isNarrow(width) ? [250, 4] : [290, 7]
  const all = curves.flatMap(({ points }) => points)
  const lowest = Math.min(0, ...all.map(({ y }) => y))
  const highest = Math.max(...all.map(({ y }) => y))
  const ys = scaleLinear([lowest, highest === lowest ? lowest + 1 : highest], [height - foot, top]).nice(5)
  const yTicks = ys.ticks(5)
  const sayTick = ys.tickFormat(5)
  const left = 12 + 8.4 * Math.max(...yTicks.map((tick) => sayTick(tick).length))
  const first = Math.min(...all.map(({ x }) => x))
  const last = Math.max(...all.map(({ x }) => x))
  const xs = scaleLinear([startsAtZero ? 0 : first, last], [left, width - right])
  const path = line<Point>(
    ({ x }) => xs(x),
    ({ y }) => ys(y),
  )
  const points = curves[0]!.points
  // Above the curve, on the side where the curve is lower.
  const falls = points[0]!.y > points.at(-1)!.y
  const lines = (
    <>
      <text x="0" y="16" fontSize="14" fill="var(--ink-2)">
        {yLabel}
      </text>
      {yTicks.map((tick) => (
        <g key={tick}>
          <path d={`M${left} ${ys(tick)}H${width - right}`} stroke="var(--rule)" strokeWidth="1" />
          <text x={left - 8} y={ys(tick) + 5} textAnchor="end" fontSize="14" fill="var(--ink-2)">
            {sayTick(tick)}
          </text>
        </g>
      ))}
      <path d={`M${left} ${ys(0)}H${width - right}`} stroke="var(--ink)" strokeWidth="1.5" />
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
      {curves.map((curve, i) => (
        <path
          key={curve.label}
          d={path(curve.points) ?? undefined}
          fill="none"
          stroke={i % 2 === 0 ? 'var(--water)' : 'var(--rust)'}
          strokeWidth="2.5"
          strokeDasharray={dashes[i % dashes.length]}
        />
      ))}
      {curves.length > 1 &&
        curves.map((curve, i) => (
          <g key={curve.label}>
            <path
              d={`M${width - right - 150} ${top + 8 + i * 20}h26`}
              stroke={i % 2 === 0 ? 'var(--water)' : 'var(--rust)'}
              strokeWidth="2.5"
              strokeDasharray={dashes[i % dashes.length]}
            />
            <text x={width - right - 118} y={top + 13 + i * 20} fontSize="14" fill="var(--ink)" className="plot-here">
              {curve.label}
            </text>
          </g>
        ))}
      {here && (
        <>
          <path
            d={`M${xs(here.x)} ${ys(here.y)}V${height - foot}`}
            stroke="var(--ink)"
            strokeWidth="1.5"
            strokeDasharray="2 5"
          />
          <circle cx={xs(here.x)} cy={ys(here.y)} r="6" fill="var(--paper)" stroke="var(--ink)" strokeWidth="2.5" />
          <text
            x={xs(here.x) + (falls ? 10 : -10)}
            y={ys(here.y) - 10}
            textAnchor={falls ? 'start' : 'end'}
            fontSize="15"
            fontWeight="600"
            fill="var(--ink)"
            className="plot-here"
          >
            {hereWords}
          </text>
        </>
      )}
    </>
  )
  return { height, lines }
}
