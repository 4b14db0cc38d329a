import { scaleLinear } from 'd3-scale'
import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { apart, scalar, type DrawingProps } from './Drawing.tsx'

const top = 26
const chart = 170
/** Swings after the valve is shut; how they die away is drawn, not worked out. */
const swings = 3
const eachDiesTo = 0.62

/** The pressure at the valve as it shuts: from rest up to the peak, down to the lowest, and to and fro until it is still. */
export function SurgeDrawing({ given, found }: DrawingProps) {
  const still = scalar(given, 'staticPressure')!
  const surge = scalar(found, 'surgePressure')!
  const peak = scalar(found, 'peakPressure')!
  const lowest = scalar(found, 'minimumPressure')!
  const worst = still + scalar(found, 'worstSurge')!
  const said = (pressure: number) => join(format(pressure, 'pressure'))
  const rapid = scalar(found, 'rapid') === 1
  const marks = [
    ...(rapid ? [] : [{ at: worst, words: `worst ${said(worst)}`, colour: 'var(--rust)' }]),
    { at: peak, words: `peak ${said(peak)}`, colour: 'var(--rust)' },
    { at: still, words: `at rest ${said(still)}`, colour: 'var(--ink)' },
    { at: lowest, words: `lowest ${said(lowest)}`, colour: 'var(--water)' },
    { at: 0, words: 'air', colour: 'var(--ink-2)' },
  ].sort((a, b) => b.at - a.at)

  return (
    <Framed
      name={`Pressure at the valve: ${marks.map(({ words }) => words).join(', ')}; ${rapid ? 'shut before the wave is back' : 'shut slower than the wave'}`}
      draw={(width) => {
        const right = width - (isNarrow(width) ? 158 : 190)
        const most = Math.max(worst, peak)
        const least = Math.min(lowest, 0)
        const y = scaleLinear([most === least ? least + 1 : most, least], [top, top + chart])
        const labels = apart(marks.map(({ at }) => y(at)))
        const step = (right - 30) / (2 * swings)
        const swing = Array.from({ length: 2 * swings }, (_, i) => {
          const height = surge * eachDiesTo ** i * (i % 2 === 0 ? 1 : -1)
          return { x: 30 + step * (i + 0.5), y: y(i === 1 ? lowest : still + height) }
        })
        const trace = swing.reduce(
          (path, point, i) => {
            const before = i === 0 ? { x: 30, y: y(still) } : swing[i - 1]!
            const middle = (before.x + point.x) / 2
            return `${path}C${middle} ${before.y} ${middle} ${point.y} ${point.x} ${point.y}`
          },
          `M0 ${y(still)}H30`,
        )
        return {
          height: Math.max(top + chart, labels.at(-1)! + 6) + 30,
          lines: (
            <g fill="none">
              {marks.map(({ at, words, colour }, i) => (
                <g key={words}>
                  <path
                    d={`M0 ${y(at)}H${right}L${right + 14} ${labels[i]!}`}
                    stroke={colour}
                    strokeWidth={at === 0 ? 2 : 1.2}
                    strokeDasharray={at === 0 ? undefined : '3 5'}
                  />
                  <text x={right + 18} y={labels[i]! + 5} fontSize={isNarrow(width) ? 14 : 15} fill={colour}>
                    {words}
                  </text>
                </g>
              ))}
              <path d={trace} stroke="var(--water)" strokeWidth="2.5" />
              <path d={`M30 ${top - 12}V${top + chart}`} stroke="var(--ink-2)" strokeWidth="1.2" />
              <text x="36" y={top - 8} fontSize="14" fill="var(--ink-2)">
                valve shuts
              </text>
              <text x="0" y={Math.max(top + chart, labels.at(-1)! + 6) + 22} fontSize="14" fill="var(--ink-2)">
                how it dies away is not worked out
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
