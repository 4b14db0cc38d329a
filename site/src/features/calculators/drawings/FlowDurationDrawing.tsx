import { scaleLinear, scaleSqrt } from 'd3-scale'
import { area } from 'd3-shape'
import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { apart, scalar, type DrawingProps } from './Drawing.tsx'

const top = 34

/** Of the days that share a place in the picture, the highest. */
const highestOf = (flows: readonly number[], most: number): number[] => {
  const places = Math.min(most, flows.length)
  const dayAt = (place: number) => Math.floor((place * flows.length) / places)
  return Array.from({ length: places }, (_, i) => Math.max(...flows.slice(dayAt(i), dayAt(i + 1))))
}

/** The stream day by day, and the flows that it reaches for so much of the time. Heights are not to scale, or low water could not be seen. */
export function FlowDurationDrawing({ given, found }: DrawingProps) {
  const flows = given.dailyFlows as readonly number[]
  const greatest = flows.reduce((most, flow) => Math.max(most, flow), 0)
  const levels = (['q10', 'q50', 'q95'] as const).map((key) => ({
    key,
    flow: scalar(found, key)!,
    words: `${key.toUpperCase()} ${join(format(scalar(found, key)!, 'flow'))}`,
  }))
  const days = `${flows.length} days, the highest ${join(format(greatest, 'flow'))}`

  return (
    <Framed
      name={`The stream over ${days}: ${levels.map(({ words }) => words).join(', ')}`}
      draw={(width) => {
        const bottom = isNarrow(width) ? 164 : 204
        const end = width - 118
        const shown = highestOf(flows, end)
        const x = scaleLinear([0, Math.max(shown.length - 1, 1)], [0, end])
        const y = scaleSqrt([0, greatest], [bottom, top])
        const labels = apart(levels.map(({ flow }) => y(flow)))
        return {
          height: Math.max(bottom, labels.at(-1)!) + 46,
          lines: (
            <g fill="none">
              <path
                d={area<number>(
                  (_, i) => x(i),
                  bottom,
                  (flow) => y(flow),
                )(shown)!}
                fill="var(--water-fill)"
                stroke="var(--water)"
                strokeWidth="1"
              />
              {levels.map(({ key, flow, words }, i) => (
                <g key={key}>
                  <path
                    d={`M0 ${y(flow)}H${end}L${end + 10} ${labels[i]!}`}
                    stroke="var(--ink)"
                    strokeWidth="1.5"
                    strokeDasharray="3 5"
                  />
                  <text x={end + 14} y={labels[i]! + 5} fontSize="15" fill="var(--ink)">
                    {words}
                  </text>
                </g>
              ))}
              <path d={`M0 ${bottom}H${end}`} stroke="var(--earth)" strokeWidth="2.5" />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--water)">
                {days}
              </text>
              <text x="0" y={bottom + 24} fontSize="14" fill="var(--ink-2)">
                heights not to scale
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
