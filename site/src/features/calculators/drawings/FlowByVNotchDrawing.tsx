import { format, join, say } from '#calc/units/format.ts'
import { Framed } from '../../../components/Framed.tsx'
import { Dimension, niceBelow, scalar, ScaleBar, type DrawingProps } from './Drawing.tsx'

const top = 32
const bottom = 172
/** The point of the notch, and the most that the water stands over it, in pixels. */
const point = 146
const deepest = 84

/** The plate seen from below the weir, the notch and the water in it to one scale. */
export function FlowByVNotchDrawing({ given, found }: DrawingProps) {
  const head = scalar(given, 'head')!
  const angle = scalar(given, 'notchAngle')!
  const words = {
    flow: join(format(scalar(found, 'flow')!, 'flow')),
    head: `head ${say(head, 'length')}`,
    angle: `notch of ${say(angle, 'angle')}`,
  }
  const pixelsPerMetre = niceBelow(deepest / head)
  const surface = point - head * pixelsPerMetre
  const slope = Math.tan((angle * Math.PI) / 360)

  return (
    <Framed
      name={`Plate with a ${words.angle}, ${words.head}: ${words.flow}`}
      draw={(width) => {
        const middle = width / 2
        const half = (y: number) => (point - y) * slope
        return {
          height: bottom + 34,
          lines: (
            <g fill="none">
              <path
                d={`M${middle} ${point}L${middle - half(surface)} ${surface}H${middle + half(surface)}Z`}
                fill="var(--water-fill)"
                stroke="var(--water)"
                strokeWidth="1.5"
              />
              <path
                d={`M2 ${bottom}V${top + 14}H${middle - half(top + 14)}L${middle} ${point}L${middle + half(top + 14)} ${top + 14}H${width - 2}V${bottom}`}
                stroke="var(--ink)"
                strokeWidth="2.5"
                strokeLinejoin="round"
              />
              <path
                d={`M${middle + half(surface)} ${surface}H${width - 8}M${middle} ${point}H${width - 8}`}
                stroke="var(--ink-2)"
                strokeDasharray="3 6"
              />
              <Dimension x={width - 14} from={surface} to={point} />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--water)">
                {words.flow}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.angle}
              </text>
              <text x={width} y={bottom + 26} textAnchor="end" fontSize="15" fill="var(--ink)">
                {words.head}
              </text>
              <ScaleBar x={2} y={bottom + 21} pixelsPerMetre={pixelsPerMetre} longest={60} />
            </g>
          ),
        }
      }}
    />
  )
}
