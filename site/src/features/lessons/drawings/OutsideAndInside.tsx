import { useId, useState } from 'react'
import { friction } from '#calc/pipe/friction.ts'
import { format, join, say } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { Hatch, MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const outside = 110
const run = { flow: 0.0084, length: 185, roughness: 5e-5 }
const longestBar = 8

const millimetres = (value: number) => say(value / 1000, 'length', 'mm')

/** A pipe end-on: the number on its side stays, the wall grows inwards, the loss climbs. */
export function OutsideAndInside() {
  const [wall, setWall] = useState(6.6)
  const narrow = useNarrow()
  const hatch = useId()
  const inside = outside - 2 * wall
  const { headLoss } = figures(friction, { ...run, insideDiameter: inside / 1000 })
  const loss = join(format(headLoss, 'head'))

  const width = narrow ? 288 : 600
  const x = narrow ? 144 : 130
  const y = 128
  const left = narrow ? 8 : 290
  const first = narrow ? 286 : 66
  const barWidth = narrow ? 272 : 300

  return (
    <MovingDrawing
      label="Thickness of the wall"
      from={4.2}
      to={14}
      step={0.2}
      value={wall}
      onChange={setWall}
      said={millimetres(wall)}
      shows={`The cut end of a pipe marked 110. Its wall is ${millimetres(wall)} thick, so its bore is ${millimetres(inside)}. It takes ${loss} of head.`}
      width={width}
      height={narrow ? 400 : 256}
      caption="The same flow of 8.4 L/s over the same 185 m, in pipes that all carry the number 110."
    >
      <defs>
        <Hatch id={hatch} colour="var(--ink)" />
      </defs>
      <circle cx={x} cy={y} r={outside} fill="var(--paper)" />
      <circle cx={x} cy={y} r={outside} fill={`url(#${hatch})`} stroke="var(--ink)" strokeWidth="2.5" />
      <circle cx={x} cy={y} r={inside} fill="var(--water-fill)" stroke="var(--ink)" strokeWidth="2.5" />
      <path
        d={`M${x - inside} ${y + 14}H${x + inside}M${x - inside} ${y + 7}v14M${x + inside} ${y + 7}v14`}
        stroke="var(--water)"
        strokeWidth="1.5"
      />
      <text className="water" x={x} y={y + 4} textAnchor="middle">
        bore {millimetres(inside)}
      </text>
      <text x={left} y={first}>
        marked 110: outside {millimetres(outside)}
      </text>
      <text x={left} y={first + 24}>
        wall {millimetres(wall)}, on both sides
      </text>
      <text className="loss" x={left} y={first + 58}>
        takes {loss} of head
      </text>
      <rect
        x={left}
        y={first + 70}
        width={barWidth * Math.min(headLoss / longestBar, 1)}
        height="16"
        fill="var(--rust-fill)"
        stroke="var(--rust)"
        strokeWidth="2"
      />
    </MovingDrawing>
  )
}
