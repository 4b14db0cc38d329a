import { format, join, say } from '#calc/units/format.ts'
import { Framed } from '../../../components/Framed.tsx'
import { Dimension, scalar, type DrawingProps } from './Drawing.tsx'

/** The top of the plate. */
const brink = 48

/** The plate in its channel, seen from below the weir. Widths are to scale; heights grow with the numbers. */
export function FlowByRectangularWeirDrawing({ given, found }: DrawingProps) {
  const [head, crestWidth, channelWidth, crestHeight] = [
    scalar(given, 'head')!,
    scalar(given, 'crestWidth')!,
    scalar(given, 'channelWidth')!,
    scalar(given, 'crestHeight')!,
  ]
  const words = {
    flow: join(format(scalar(found, 'flow')!, 'flow')),
    head: `head ${say(head, 'length')}`,
    widths: `crest ${say(crestWidth, 'length', 'm')} of ${say(channelWidth, 'length', 'm')}`,
    height: `crest ${say(crestHeight, 'length', 'm')} over the bed`,
  }
  const surface = brink + 12
  const crest = surface + 10 + (60 * head) / (head + 0.12)
  const bed = crest + 24 + (70 * crestHeight) / (crestHeight + 0.4)

  return (
    <Framed
      name={`Weir with its ${words.widths} of channel, ${words.height}, ${words.head}: ${words.flow}`}
      draw={(width) => {
        const [left, right] = [4, width - 34]
        const middle = (left + right) / 2
        const half = Math.max(((right - left) * crestWidth) / channelWidth, 2) / 2
        return {
          height: Math.ceil(bed + 50),
          lines: (
            <g fill="none">
              <rect x={middle - half} y={surface} width={2 * half} height={crest - surface} fill="var(--water-fill)" />
              <path d={`M${middle - half} ${surface}h${2 * half}`} stroke="var(--water)" strokeWidth="1.5" />
              <path
                d={`M${left} ${brink}H${middle - half}V${crest}H${middle + half}V${brink}H${right}`}
                stroke="var(--ink)"
                strokeWidth="2.5"
              />
              <path d={`M${left} ${brink - 14}V${bed}H${right}V${brink - 14}`} stroke="var(--ink)" strokeWidth="2.5" />
              <path
                d={`M${middle + half} ${surface}H${width - 6}M${middle + half} ${crest}H${width - 6}`}
                stroke="var(--ink-2)"
                strokeDasharray="3 6"
              />
              <Dimension x={width - 14} from={surface} to={crest} />
              <Dimension x={width - 14} from={crest} to={bed} />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--water)">
                {words.flow}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="15" fill="var(--ink)">
                {words.head}
              </text>
              <text x="0" y={bed + 22} fontSize="15" fill="var(--ink-2)">
                {words.widths}
              </text>
              <text x="0" y={bed + 43} fontSize="15" fill="var(--ink-2)">
                {words.height}
              </text>
              <text x={width} y={bed + 22} textAnchor="end" fontSize="13" fill="var(--ink-2)">
                not to scale
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
