import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { scalar, type DrawingProps } from './Drawing.tsx'

const surface = 58
const grains = 7

/** The basin in long section, and the way of the smallest grain that is to be caught. Lengths and depths are not to one scale. */
export function SettlingBasinDrawing({ given, found }: DrawingProps) {
  const depth = scalar(given, 'depth')!
  const length = scalar(found, 'length')!
  const reserve = scalar(given, 'safetyFactor') ?? 1.5
  const words = {
    length: `${join(format(length, 'length', { unit: 'm' }))} long`,
    depth: `${say(depth, 'length', 'm')} deep`,
    grain: `grain ${say(scalar(given, 'grainDiameter')!, 'length', 'mm')}`,
    sinks: `sinks at ${join(format(scalar(found, 'settlingVelocity')!, 'velocity'))}`,
    forward: `water ${join(format(scalar(found, 'forwardVelocity')!, 'velocity'))}`,
  }
  const floor = surface + 36 + (60 * depth) / (depth + 0.6)

  return (
    <Framed
      name={`Settling basin ${words.length} and ${words.depth}: ${words.grain} ${words.sinks} while the ${words.forward} goes on`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const start = narrow ? 28 : 70
        const end = start + 90 + ((width - 2 * start - 90) * length) / (length + 6)
        const reached = start + (end - start) / reserve
        const way = (i: number) => i / (grains - 1)
        return {
          height: Math.ceil(floor + (narrow ? 74 : 54)),
          lines: (
            <g fill="none">
              <path
                d={`M0 ${surface}H${width}V${surface + 18}H${end}V${floor}H${start}V${surface + 18}H0Z`}
                fill="var(--water-fill)"
              />
              <path d={`M0 ${surface}H${width}`} stroke="var(--water)" strokeWidth="1.5" />
              <path
                d={`M0 ${surface + 18}H${start}V${floor}H${end}V${surface + 18}H${width}`}
                stroke="var(--ink)"
                strokeWidth="2.5"
                strokeLinejoin="round"
              />
              <path
                d={`M${start} ${surface + 3}L${reached} ${floor - 5}`}
                stroke="var(--brass)"
                strokeWidth="1.5"
                strokeDasharray="4 5"
              />
              {Array.from({ length: grains }, (_, i) => (
                <circle
                  key={i}
                  cx={start + (reached - start) * way(i)}
                  cy={surface + 3 + (floor - surface - 8) * way(i)}
                  r="3"
                  fill="var(--ink)"
                />
              ))}
              <path
                d={`M${start} ${floor + 16}H${end}M${start} ${floor + 11}v10M${end} ${floor + 11}v10`}
                stroke="var(--ink-2)"
                strokeWidth="1.5"
              />
              <text x="0" y="16" fontSize="15" fill="var(--water)">
                {words.forward}
              </text>
              <text
                x={narrow ? 0 : width}
                y={narrow ? 38 : 16}
                textAnchor={narrow ? 'start' : 'end'}
                fontSize="15"
                fill="var(--ink)"
              >
                {words.grain} {words.sinks}
              </text>
              <text x="0" y={floor + 42} fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.length}
              </text>
              <text x={width} y={floor + 42} textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.depth}
              </text>
              <text
                x={narrow ? 0 : width / 2}
                y={floor + (narrow ? 63 : 42)}
                textAnchor={narrow ? 'start' : 'middle'}
                fontSize="13"
                fill="var(--ink-2)"
              >
                length and depth not to one scale
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
