import { pipeMovement } from '#calc/pipe/pipe-movement.ts'
import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Push, scalar, short, type DrawingProps } from './Drawing.tsx'

const names: Readonly<Record<string, string>> = pipeMovement.inputs.material.words
/** A movement is drawn from this short to this long, whatever it is: pipes move too little to be seen. */
const shown = { least: 6, most: 60 }
const drawnFull = 0.01

/** The pipe that grows or shrinks at its free end, or that pushes or pulls at both ends where it is held. */
export function PipeMovementDrawing({ given, found }: DrawingProps) {
  const movement = scalar(found, 'movement')
  const force = scalar(found, 'force')
  const length = scalar(given, 'length')!
  const change = scalar(given, 'temperatureChange')!
  const grows = change >= 0
  const material = typeof given['material'] === 'string' ? given['material'] : ''
  const words = {
    pipe: `${say(short(length), 'length', 'm')} of ${names[material] ?? material}, ${grows ? 'warmed' : 'cooled'} by ${say(short(Math.abs(change)), 'temperatureDifference')}`,
    does:
      movement === undefined
        ? `${grows ? 'pushes' : 'pulls'} with ${join(format(Math.abs(force ?? 0), 'force'))}`
        : `${grows ? 'grows' : 'shrinks'} by ${join(format(Math.abs(movement), 'length'))}`,
  }
  const share = movement === undefined ? 0 : Math.abs(movement) / length
  const seen = share === 0 ? 0 : shown.least + (shown.most - shown.least) * (share / (share + drawnFull))

  return (
    <Framed
      name={`${words.pipe}: ${words.does}`}
      draw={(width) => {
        const isHeld = movement === undefined
        const y = 74
        const end = isHeld ? width - 22 : width - (isNarrow(width) ? 76 : 140)
        const ends = { before: end, after: isHeld ? end : end + (grows ? seen : -seen) }
        const post = (x: number, way: number) =>
          `M${x} ${y - 34}V${y + 34}` + [-28, -12, 4, 20].map((at) => `M${x} ${y + at}l${way * 14} 12`).join('')
        const arrow = (x: number, way: number) => {
          const [near, far] = [x - way * 14, x - way * 66]
          // A push goes to the post, a pull away from it.
          return { from: { x: grows ? far : near, y }, to: { x: grows ? near : far, y } }
        }
        return {
          height: 162,
          lines: (
            <g fill="none">
              <path
                d={`M22 ${y - 14}H${ends.before}V${y + 14}H22Z`}
                fill="var(--paper-2)"
                stroke="var(--ink-2)"
                strokeWidth="1.5"
                strokeDasharray="4 4"
              />
              <path
                d={`M22 ${y - 14}H${ends.after}V${y + 14}H22Z`}
                fill="var(--brass-fill)"
                stroke="var(--ink)"
                strokeWidth="2"
              />
              <path d={post(22, -1)} stroke="var(--ink)" strokeWidth="2" />
              {isHeld && <path d={post(end, 1)} stroke="var(--ink)" strokeWidth="2" />}
              {isHeld && change !== 0 && (
                <>
                  <Push {...arrow(22, -1)} colour="var(--rust)" />
                  <Push {...arrow(end, 1)} colour="var(--rust)" />
                </>
              )}
              {!isHeld && seen > 0 && (
                <Push from={{ x: ends.before, y: y - 26 }} to={{ x: ends.after, y: y - 26 }} colour="var(--rust)" />
              )}
              <text x="0" y="16" fontSize={isNarrow(width) ? 13 : 15} fill="var(--ink-2)">
                {words.pipe}
              </text>
              <text x="0" y="134" fontSize="15" fontWeight="600" fill="var(--rust)">
                {words.does}
              </text>
              <text x="0" y="156" fontSize="14" fill="var(--ink-2)">
                {isHeld ? 'held at both ends' : 'the movement is drawn larger than it is'}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
