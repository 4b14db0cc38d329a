import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Push, scalar, short, type DrawingProps } from './Drawing.tsx'

const leg = 120
const thickness = 26
const ways: Readonly<Record<string, string>> = { horizontal: 'sideways', up: 'upwards', down: 'downwards' }

/** The bend seen square to its plane, or the shut end, with the push on it and the block that holds it. */
export function ThrustDrawing({ given, found }: DrawingProps) {
  const isEnd = given['kind'] === 'dead-end'
  const angle = isEnd ? 0 : (scalar(given, 'bendAngle') ?? 0)
  const area = scalar(found, 'bearingArea')
  const mass = scalar(found, 'blockMass')
  const towards = ways[typeof given['direction'] === 'string' ? given['direction'] : 'horizontal']
  const force = scalar(found, 'thrust')!
  const words = {
    thrust: join(format(force, 'force')),
    fitting: isEnd ? 'shut end' : `bend of ${say(short(angle), 'angle')}`,
    block: [
      ...(area === undefined ? [] : [`face ${join(format(area, 'area', { unit: 'm²' }))}`]),
      ...(mass === undefined ? [] : [`by weight ${join(format(mass, 'mass'))}`]),
    ],
  }

  return (
    <Framed
      name={`A ${words.fitting}, pushed ${towards} with ${words.thrust}${words.block.length > 0 ? `; block: ${words.block.join(', or ')}` : ''}`}
      draw={(width) => {
        const upwards = isEnd ? 0 : Math.cos((angle * Math.PI) / 360)
        const corner = { x: isNarrow(width) ? 118 : 200, y: 52 + 62 * upwards }
        const turn = (angle * Math.PI) / 180
        // The water comes from the left and is turned down the page; the push points away from both legs.
        const end = isEnd ? corner : { x: corner.x + leg * Math.cos(turn), y: corner.y + leg * Math.sin(turn) }
        const push = isEnd ? { x: 1, y: 0 } : { x: Math.sin(turn / 2), y: -Math.cos(turn / 2) }
        const pipe = `M${corner.x - leg} ${corner.y}L${corner.x} ${corner.y}L${end.x} ${end.y}`
        const foot = { x: corner.x + push.x * (thickness / 2 + 4), y: corner.y + push.y * (thickness / 2 + 4) }
        const block = Math.atan2(push.y, push.x) * (180 / Math.PI)
        const from = { x: foot.x + push.x * 28, y: foot.y + push.y * 28 }
        const drawn = Math.max(corner.y + 46, end.y + 22)
        const textAt = isNarrow(width) ? { x: 0, y: drawn + 18 } : { x: 400, y: 40 }
        return {
          height: Math.max(drawn, textAt.y + 24 * (words.block.length + 1) + 10),
          lines: (
            <g fill="none">
              <g transform={`translate(${foot.x} ${foot.y}) rotate(${block})`}>
                <path d="M0 -26L26 -40V40L0 26Z" fill="var(--earth-fill)" stroke="var(--earth)" strokeWidth="1.5" />
              </g>
              <path d={pipe} stroke="var(--ink)" strokeWidth={thickness + 5} strokeLinejoin="round" />
              <path d={pipe} stroke="var(--water-fill)" strokeWidth={thickness} strokeLinejoin="round" />
              {isEnd && (
                <path
                  d={`M${corner.x} ${corner.y - 20}v40`}
                  stroke="var(--ink)"
                  strokeWidth="6"
                  strokeLinecap="round"
                />
              )}
              <Push
                from={{ x: corner.x - leg + 8, y: corner.y }}
                to={{ x: corner.x - leg + 56, y: corner.y }}
                colour="var(--water)"
              />
              {force > 0 && (
                <Push from={from} to={{ x: from.x + push.x * 54, y: from.y + push.y * 54 }} colour="var(--rust)" />
              )}
              <text x={textAt.x} y={textAt.y} fontSize="15" fontWeight="600" fill="var(--rust)">
                pushed {towards} with {words.thrust}
              </text>
              <text x={textAt.x} y={textAt.y + 24} fontSize="15" fill="var(--ink-2)">
                {words.fitting}
              </text>
              {words.block.map((line, i) => (
                <text key={line} x={textAt.x} y={textAt.y + 48 + 24 * i} fontSize="15" fill="var(--ink)">
                  {i === 0 ? 'block: ' : 'or '}
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
