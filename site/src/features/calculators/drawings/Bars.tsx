import { textWidth } from './Drawing.tsx'

export type Tone = 'water' | 'rust' | 'ink'

export interface Bar {
  words: string
  /** One after another; a bar of `ink` is an outline: what is there to be filled. */
  parts: readonly { value: number; tone: Tone }[]
}

const rowHeight = 54
const fills: Record<Tone, string> = { water: 'var(--water-fill)', rust: 'var(--rust-fill)', ink: 'none' }

export const barsHeight = (bars: readonly Bar[]): number => bars.length * rowHeight

const sum = ({ parts }: Bar): number => parts.reduce((total, { value }) => total + Math.max(value, 0), 0)

/** Amounts of one kind under one another, all to one scale, each with its words above it. */
export function Bars({ bars, x, y, width }: { bars: readonly Bar[]; x: number; y: number; width: number }) {
  const most = Math.max(...bars.map(sum))
  const scale = most > 0 ? width / most : 0
  return bars.map((bar, i) => {
    const top = y + i * rowHeight
    let start = x
    return (
      <g key={i} fill="none">
        <text x={x} y={top + 15} fontSize={textWidth(bar.words) > width ? 13 : 15} fill="var(--ink)">
          {bar.words}
        </text>
        {bar.parts.map(({ value, tone }, j) => {
          const length = Math.max(value, 0) * scale
          const from = start
          start += length
          return (
            <path
              key={j}
              d={`M${from} ${top + 24}h${length}v18h${-length}z`}
              fill={fills[tone]}
              stroke={`var(--${tone})`}
              strokeWidth={tone === 'ink' ? 2 : 1.5}
            />
          )
        })}
      </g>
    )
  })
}
