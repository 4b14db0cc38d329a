import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { scalar, short, type DrawingProps } from './Drawing.tsx'

const straight = 0.16
const largest = 212

/** The bend to scale: its straight ends, the corner that it rounds, and where it starts. */
export function SweptBendDrawing({ given, found }: DrawingProps) {
  const outside = scalar(given, 'outsideDiameter')!
  const radius = scalar(given, 'bendRadius')!
  const angle = scalar(given, 'bendAngle')!
  const words = {
    bend: `${say(short(angle), 'angle')} at a radius of ${say(short(radius), 'length')}`,
    arc: `takes ${join(format(scalar(found, 'arcLength')!, 'length'))} of pipe`,
    setback: `starts ${join(format(scalar(found, 'setback')!, 'length'))} before the corner`,
    over: `bend it to ${join(format(scalar(found, 'overBendAngle')!, 'angle'))}`,
    fill: `dry fill ${join(format(scalar(found, 'fillVolume')!, 'volume'))}`,
  }
  const lines = [words.bend, words.arc, words.setback, words.over, words.fill]
  const turn = (angle * Math.PI) / 180
  // In radii: along the pipe from the left, turned down the page.
  const setback = Math.tan(turn / 2)
  const start = { x: 0, y: 0 }
  const end = { x: Math.sin(turn), y: 1 - Math.cos(turn) }
  const corner = { x: Math.min(setback, 3), y: 0 }
  const tail = { x: end.x + straight * Math.cos(turn), y: end.y + straight * Math.sin(turn) }
  const thick = outside / radius
  const left = Math.min(start.x - straight, tail.x) - thick / 2
  const right = Math.max(end.x, tail.x, corner.x, end.x > 0 && angle > 90 ? 1 : 0) + thick / 2
  const top = -thick / 2
  const bottom = Math.max(end.y, tail.y) + thick / 2

  return (
    <Framed
      name={`Pipe of ${say(short(outside), 'length')} swept by ${words.bend}: ${lines.slice(1).join(', ')}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const room = { width: narrow ? width - 8 : 330, height: largest }
        const scale = Math.min(room.width / (right - left), room.height / (bottom - top))
        const at = ({ x, y }: { x: number; y: number }) => `${4 + (x - left) * scale} ${8 + (y - top) * scale}`
        const arc = `A${scale} ${scale} 0 0 1 ${at(end)}`
        const pipe = `M${at({ x: -straight, y: 0 })}L${at(start)}${arc}L${at(tail)}`
        const drawn = 16 + (bottom - top) * scale
        const textAt = narrow ? { x: 0, y: drawn + 22 } : { x: 380, y: 40 }
        return {
          height: Math.max(drawn, textAt.y + 24 * (lines.length - 1) + 12),
          lines: (
            <g fill="none">
              <path d={pipe} stroke="var(--ink)" strokeWidth={Math.max(thick * scale, 4)} />
              <path d={pipe} stroke="var(--paper-2)" strokeWidth={Math.max(thick * scale - 5, 1.5)} />
              {setback <= 3 && (
                <path
                  d={`M${at(start)}L${at(corner)}L${at(end)}`}
                  stroke="var(--brass)"
                  strokeWidth="1.5"
                  strokeDasharray="5 4"
                />
              )}
              <path d={`M${at(start)}${arc}`} stroke="var(--brass)" strokeWidth="1.5" />
              {lines.map((line, i) => (
                <text
                  key={line}
                  x={textAt.x}
                  y={textAt.y + 24 * i}
                  fontSize={narrow ? 14 : 15}
                  fontWeight={i === 0 ? 600 : 400}
                  fill={i === 0 ? 'var(--ink)' : 'var(--ink-2)'}
                >
                  {line}
                </text>
              ))}
            </g>
          ),
        }
      }}
    />
  )
}
