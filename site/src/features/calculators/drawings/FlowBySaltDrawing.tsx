import { scaleLinear } from 'd3-scale'
import { area, line } from 'd3-shape'
import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { rowsOf, scalar, type DrawingProps } from './Drawing.tsx'

const top = 52

/** The readings over time, and what stands over the background: the smaller that area, the larger the flow. */
export function FlowBySaltDrawing({ given, found }: DrawingProps) {
  const background = scalar(given, 'background')!
  const peak = scalar(found, 'peakConductivity')!
  const points = rowsOf(given, 'readings').map((row): [number, number] => [
    row.time as number,
    row.conductivity as number,
  ])
  const times: [number, number] = [points[0]![0], points.at(-1)![0]]
  const lowest = Math.min(background, ...points.map(([, conductivity]) => conductivity))
  const words = {
    flow: join(format(scalar(found, 'flow')!, 'flow')),
    peak: `peak ${say(peak, 'conductivity')}`,
    background: `background ${say(background, 'conductivity')}`,
    read: `${join(format(scalar(found, 'recovered')!, 'fraction'))} of the curve read`,
    time: `${join(format(times[1] - times[0], 'time'))}`,
  }
  const at = points.find(([, conductivity]) => conductivity === peak)![0]

  return (
    <Framed
      name={`Conductivity after the salt: ${words.peak} over a ${words.background}, ${words.read}: ${words.flow}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const bottom = narrow ? 176 : 216
        const x = scaleLinear(times, [8, width - 8])
        const y = scaleLinear([lowest, peak], [bottom, top])
        const dots = points.length <= 40
        return {
          height: bottom + (narrow ? 70 : 50),
          lines: (
            <g fill="none">
              <path
                d={area<[number, number]>(
                  ([time]) => x(time),
                  () => y(background),
                  ([, conductivity]) => y(conductivity),
                )(points)!}
                fill="var(--water-fill)"
              />
              <path d={`M0 ${y(background)}H${width}`} stroke="var(--ink-2)" strokeWidth="1.5" strokeDasharray="3 6" />
              <path
                d={line<[number, number]>(
                  ([time]) => x(time),
                  ([, conductivity]) => y(conductivity),
                )(points)!}
                stroke="var(--water)"
                strokeWidth="2"
                strokeLinejoin="round"
              />
              {dots &&
                points.map(([time, conductivity], i) => (
                  <circle key={i} cx={x(time)} cy={y(conductivity)} r="3" fill="var(--ink)" />
                ))}
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--water)">
                {words.flow}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="15" fill="var(--ink)">
                {words.peak}
              </text>
              <path d={`M${x(at)} ${top - 8}V${top - 24}`} stroke="var(--ink-2)" strokeWidth="1.5" />
              <text x="0" y={bottom + 24} fontSize="15" fill="var(--ink-2)">
                {words.background}
              </text>
              <text
                x={narrow ? 0 : width}
                y={bottom + (narrow ? 44 : 24)}
                textAnchor={narrow ? 'start' : 'end'}
                fontSize="15"
                fill="var(--ink-2)"
              >
                {words.read}
              </text>
              <text x="0" y={bottom + (narrow ? 64 : 44)} fontSize="14" fill="var(--ink-2)">
                over {words.time}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
