import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Push, scalar, short, textWidth, type DrawingProps } from './Drawing.tsx'

const radius = 92
const arrows = [-60, -30, 0, 30, 60]

/** Half of the pipe, cut lengthwise: the pressure lifts it, and the two cut walls hold it down. */
export function HoopStressDrawing({ given, found }: DrawingProps) {
  const outside = scalar(given, 'outsideDiameter')!
  const thickness = scalar(given, 'wallThickness')!
  const wall = Math.min(Math.max((2 * radius * thickness) / outside, 2), radius - 2)
  const words = {
    pressure: join(format(scalar(given, 'pressure')!, 'pressure')),
    stress: `wall pulled by ${join(format(scalar(found, 'hoopStressThick')!, 'pressure', { unit: 'MPa' }))}`,
    size: `${say(short(outside), 'length')} × ${say(short(thickness), 'length', 'mm')}`,
  }

  return (
    <Framed
      name={`Half of a pipe of ${words.size} under ${words.pressure}: ${words.stress} at its inside face`}
      draw={(width) => {
        const centre = { x: isNarrow(width) ? width / 2 : 150, y: radius + 8 }
        const inside = radius - wall
        const around = (r: number, sweep: number) => `A${r} ${r} 0 0 ${sweep} `
        const ring = `M${centre.x - radius} ${centre.y}${around(radius, 1)}${centre.x + radius} ${centre.y}H${centre.x + inside}${around(inside, 0)}${centre.x - inside} ${centre.y}Z`
        const reach = { from: inside * 0.45, to: Math.max(inside - 4, inside * 0.6) }
        const textAt = isNarrow(width) ? { x: 0, y: centre.y + 74 } : { x: 300, y: 60 }
        return {
          height: isNarrow(width) ? textAt.y + 50 : centre.y + 54,
          lines: (
            <g fill="none">
              <path
                d={`M${centre.x - inside} ${centre.y}${around(inside, 1)}${centre.x + inside} ${centre.y}Z`}
                fill="var(--water-fill)"
              />
              <path d={ring} fill="var(--rule)" stroke="var(--ink)" strokeWidth="2" />
              {arrows.map((degrees) => {
                const [s, c] = [Math.sin((degrees * Math.PI) / 180), Math.cos((degrees * Math.PI) / 180)]
                return (
                  <Push
                    key={degrees}
                    from={{ x: centre.x + reach.from * s, y: centre.y - reach.from * c }}
                    to={{ x: centre.x + reach.to * s, y: centre.y - reach.to * c }}
                    colour="var(--water)"
                  />
                )
              })}
              {[-1, 1].map((way) => {
                const x = centre.x + way * (radius - wall / 2)
                return (
                  <Push key={way} from={{ x, y: centre.y + 2 }} to={{ x, y: centre.y + 46 }} colour="var(--rust)" />
                )
              })}
              <text x={centre.x} y={centre.y - 8} textAnchor="middle" fontSize="15" fill="var(--water)">
                {textWidth(words.pressure) < 2 * inside - 10 ? words.pressure : ''}
              </text>
              <text x={textAt.x} y={textAt.y} fontSize="15" fontWeight="600" fill="var(--rust)">
                {words.stress}
              </text>
              <text x={textAt.x} y={textAt.y + 22} fontSize="15" fill="var(--ink-2)">
                {words.size}, {words.pressure}
              </text>
              <text x={textAt.x} y={textAt.y + 42} fontSize="14" fill="var(--ink-2)">
                wall true to the pipe
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
