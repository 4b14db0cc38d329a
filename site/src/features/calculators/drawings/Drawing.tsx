import type { Inputs, Outputs, PlainRow } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'

/** What a calculator's drawing is made from: the inputs as they were given, and what was found. */
export interface DrawingProps {
  given: Inputs
  found: Outputs
}

export const scalar = (values: Inputs | Outputs | PlainRow, key: string): number | undefined => {
  const value = values[key]
  return typeof value === 'number' ? value : undefined
}

export const rowsOf = (values: Inputs | Outputs, key: string): readonly PlainRow[] => {
  const value = values[key]
  return Array.isArray(value) ? (value as readonly PlainRow[]) : []
}

/** A number that was given, for a label: no longer than four digits. */
export const short = (value: number): number => Number(value.toPrecision(4))

/** About how wide a text of the label face is. */
export const textWidth = (text: string, size = 15): number => text.length * size * 0.54

interface DimensionProps {
  x: number
  from: number
  to: number
}

/** A dimension line that stands upright, in the colour of losses or of ink. */
export function Dimension({ x, from, to, colour = 'var(--ink-2)' }: DimensionProps & { colour?: string }) {
  return <path d={`M${x} ${from}V${to}M${x - 5} ${from}h10M${x - 5} ${to}h10`} stroke={colour} strokeWidth="1.5" />
}

/** Two arrows that point at the edges of something thin from outside. */
export function Pinch({ x, from, to }: DimensionProps) {
  const head = (y: number, way: number) => `M${x} ${y}l-4 ${-8 * way}h8z`
  return (
    <>
      <path d={`M${x} ${from - 22}V${from - 6}M${x} ${to + 6}V${to + 22}`} stroke="var(--ink)" strokeWidth="1.5" />
      <path d={head(from, 1) + head(to, -1)} fill="var(--ink)" />
    </>
  )
}

/** A straight arrow to the right. */
export function Arrow({ x, y, length, colour }: { x: number; y: number; length: number; colour: string }) {
  return (
    <>
      <path d={`M${x} ${y}H${x + Math.max(length - 10, 0)}`} stroke={colour} strokeWidth="4" />
      <path d={`M${x + length} ${y}l-12 -7v14z`} fill={colour} />
    </>
  )
}

interface Point {
  x: number
  y: number
}

/** An arrow from one point to another, however they lie. */
export function Push({ from, to, colour }: { from: Point; to: Point; colour: string }) {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (length < 1) return null
  const degrees = (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
  const head = Math.min(12, length)
  return (
    <g transform={`translate(${from.x} ${from.y}) rotate(${degrees})`}>
      <path d={`M0 0H${length - head}`} stroke={colour} strokeWidth="3" />
      <path d={`M${length} 0l${-head} -6v12z`} fill={colour} />
    </g>
  )
}

/** The same heights, from above down, moved apart where labels would lie on one another. */
export const apart = (heights: readonly number[], least = 19): number[] => {
  let below = -Infinity
  return heights.map((height) => (below = Math.max(height, below + least)))
}

/** The largest of 1, 2, 5, 10, 20 … that is not above a value. */
export const niceBelow = (value: number): number => {
  const decade = 10 ** Math.floor(Math.log10(value))
  const part = value / decade
  return (part >= 5 ? 5 : part >= 2 ? 2 : 1) * decade
}

interface ScaleBarProps {
  x: number
  y: number
  pixelsPerMetre: number
  longest: number
}

/** A bar that says how large the drawing is. */
export function ScaleBar({ x, y, pixelsPerMetre, longest }: ScaleBarProps) {
  const metres = niceBelow(longest / pixelsPerMetre)
  const length = metres * pixelsPerMetre
  return (
    <>
      <path d={`M${x} ${y - 5}v10M${x} ${y}h${length}m0 -5v10`} stroke="var(--ink-2)" strokeWidth="1.5" fill="none" />
      <text x={x + length + 8} y={y + 5} fontSize="14" fill="var(--ink-2)">
        {say(metres, 'length')}
      </text>
    </>
  )
}
