import { format, join, say } from '#calc/units/format.ts'
import { Framed } from '../../../components/Framed.tsx'
import { Dimension, scalar, type DrawingProps } from './Drawing.tsx'

const still = 30
/** The most that the grade line falls in the picture; it never gets there, however steep the loss. */
const deepest = 84
/** The loss along the pipe that is drawn as half of that. */
const halfway = 0.03

/** A length of pipe, the water at rest above it, and the grade line that falls with the loss. Heights are not to scale. */
export function FrictionDrawing({ given, found }: DrawingProps) {
  const bore = scalar(given, 'insideDiameter')!
  const loss = scalar(found, 'headLoss')!
  const gradient = scalar(found, 'gradient')!
  const lost = `${join(format(loss, 'head'))} lost`
  const size = `${say(scalar(given, 'length')!, 'length', 'm')} of ${say(bore, 'length', 'mm')} bore`
  const fall = (deepest * gradient) / (gradient + halfway)
  const thickness = 8 + (24 * bore) / (bore + 0.15)

  return (
    <Framed
      name={`Pipe, ${size}: the grade line falls from the water at rest; ${lost}`}
      draw={(width) => {
        const end = width - 22
        const top = still + fall + 24
        const drop = width * 0.15
        const pipe = `M0 ${top + 12}L${width} ${top + 12 + drop}`
        return {
          height: Math.ceil(top + drop + 74),
          lines: (
            <g fill="none">
              <path d={`M0 ${still}H${width}`} stroke="var(--water)" strokeWidth="1.5" strokeDasharray="3 6" />
              <path d={`M0 ${still}L${end} ${still + fall}`} stroke="var(--water)" strokeWidth="2.5" />
              <Dimension x={end + 7} from={still} to={still + fall} colour="var(--rust)" />
              <path d={pipe} stroke="var(--ink)" strokeWidth={thickness + 5} />
              <path d={pipe} stroke="var(--water-fill)" strokeWidth={thickness} />
              <text x="0" y={still - 12} fontSize="14" fill="var(--ink-2)">
                water at rest
              </text>
              <text x={width} y={still - 12} textAnchor="end" fontSize="15" fontWeight="600" fill="var(--rust)">
                {lost}
              </text>
              <text x="0" y={top + 12 + drop * 0.5 + thickness / 2 + 34} fontSize="15" fill="var(--ink-2)">
                {size}
              </text>
              <text x="0" y={top + 12 + drop * 0.5 + thickness / 2 + 54} fontSize="14" fill="var(--ink-2)">
                heights not to scale
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
