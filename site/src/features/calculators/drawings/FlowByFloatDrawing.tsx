import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Arrow, rowsOf, scalar, type DrawingProps } from './Drawing.tsx'

const surface = 44

/** The stream cut across, strip by strip, and below it from above with the float on its way. */
export function FlowByFloatDrawing({ given, found }: DrawingProps) {
  const strips = rowsOf(given, 'verticals').map((row) => ({ width: row.width as number, depth: row.depth as number }))
  const across = strips.reduce((sum, strip) => sum + strip.width, 0)
  const deepest = Math.max(...strips.map(({ depth }) => depth))
  const meanDepth = scalar(found, 'meanDepth')!
  const speed = scalar(found, 'surfaceVelocity')!
  const words = {
    flow: `about ${join(format(scalar(found, 'flow')!, 'flow', { digits: 2 }))}`,
    area: `${join(format(scalar(found, 'area')!, 'area', { unit: 'm²' }))} of stream`,
    depth: `mean depth ${join(format(meanDepth, 'length', { unit: 'm' }))}`,
    float: `float ${say(scalar(given, 'distance')!, 'length', 'm')} at ${join(format(speed, 'velocity'))}`,
  }
  const bedAt = 26 + (64 * deepest) / (deepest + 0.4)

  return (
    <Framed
      name={`Stream of ${words.area}, ${words.depth}; ${words.float}: ${words.flow}`}
      draw={(width) => {
        const bank = isNarrow(width) ? 14 : 40
        const scale = (width - 2 * bank) / across
        const bed = strips
          .map((strip) => `V${surface + (bedAt * strip.depth) / deepest}h${strip.width * scale}`)
          .join('')
        const plan = surface + bedAt + 48
        return {
          height: Math.ceil(plan + 82),
          lines: (
            <g fill="none">
              <path d={`M${bank} ${surface}${bed}V${surface}Z`} fill="var(--water-fill)" />
              <path
                d={`M0 ${surface - 10}H${bank}V${surface}${bed}V${surface - 10}H${width}`}
                stroke="var(--ink)"
                strokeWidth="2.5"
                strokeLinejoin="round"
              />
              <path d={`M${bank} ${surface}H${width - bank}`} stroke="var(--water)" strokeWidth="1.5" />
              <circle cx={width / 2} cy={surface} r="5" fill="var(--paper)" stroke="var(--brass)" strokeWidth="2.5" />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--water)">
                {words.flow}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="15" fill="var(--ink)">
                {words.area}
              </text>
              <text x={width} y={surface + bedAt + 22} textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.depth}
              </text>
              <rect x="0" y={plan} width={width} height="44" fill="var(--water-fill)" />
              <path d={`M0 ${plan}H${width}M0 ${plan + 44}H${width}`} stroke="var(--ink)" strokeWidth="2.5" />
              <path
                d={`M24 ${plan - 6}v56M${width - 24} ${plan - 6}v56`}
                stroke="var(--ink-2)"
                strokeWidth="1.5"
                strokeDasharray="4 4"
              />
              <circle cx="24" cy={plan + 22} r="5" fill="var(--paper)" stroke="var(--brass)" strokeWidth="2.5" />
              <Arrow x={34} y={plan + 22} length={24 + ((width - 100) * speed) / (speed + 0.5)} colour="var(--water)" />
              <text x="0" y={plan + 70} fontSize="15" fill="var(--ink-2)">
                {words.float}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
