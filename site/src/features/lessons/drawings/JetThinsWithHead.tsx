import { useState } from 'react'
import { jet } from '#calc/jet/jet.ts'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const nozzle = { velocityCoefficient: 0.97, jetCount: 1, flow: 0.0063 }
/** Half a pixel for each pixel of width on either side of the middle: the jet is drawn 2.5 times as thick as it is. */
const halfPixelsPerMetre = 1250
const pipeHalf = 62
const middle = 100

/** A nozzle cut open and its jet: the same water under more head leaves faster and thinner. */
export function JetThinsWithHead() {
  const [netHead, setNetHead] = useState(37)
  const narrow = useNarrow()
  const { jetVelocity, jetDiameter, jetPower } = figures(jet, {
    ...nozzle,
    netHead,
  })
  const speed = join(format(jetVelocity, 'velocity'))
  const thickness = join(format(jetDiameter, 'length', { unit: 'mm' }))
  const power = join(format(jetPower, 'power'))

  const width = narrow ? 288 : 640
  const half = jetDiameter * halfPixelsPerMetre
  const taper = narrow ? 60 : 150
  const mouth = narrow ? 140 : 290
  const words = narrow ? 8 : 320
  const wall = (side: 1 | -1) =>
    `M0 ${middle + side * pipeHalf}H${taper}L${mouth - 14} ${middle + side * half}H${mouth}` +
    `V${middle + side * (half + 9)}H${mouth - 14}L${taper} ${middle + side * (pipeHalf + 11)}H0Z`

  return (
    <MovingDrawing
      label="Net head"
      from={10}
      to={80}
      step={1}
      value={netHead}
      onChange={setNetHead}
      said={`${netHead} m`}
      shows={`A nozzle cut open. Under ${netHead} m of net head, 6.3 L/s leave at ${speed} in a jet ${thickness} thick that carries ${power}.`}
      width={width}
      height={narrow ? 240 : 216}
      caption="One tapered nozzle, always 6.3 L/s. The nozzle is bored anew for each head, so that the same water passes."
    >
      <path
        d={`M0 ${middle - pipeHalf}H${taper}L${mouth - 14} ${middle - half}H${width}V${middle + half}H${mouth - 14}L${taper} ${middle + pipeHalf}H0Z`}
        fill="var(--water-fill)"
      />
      <path
        d={`M${mouth} ${middle - half}H${width}M${mouth} ${middle + half}H${width}`}
        stroke="var(--water)"
        strokeWidth="2.5"
      />
      <path
        d={`M${mouth + 10} ${middle}H${width}`}
        stroke="var(--water)"
        strokeWidth="2"
        strokeDasharray={`${jetVelocity} ${jetVelocity / 2}`}
      />
      {([1, -1] as const).map((side) => (
        <path key={side} d={wall(side)} fill="var(--paper-2)" stroke="var(--ink)" strokeWidth="2.5" />
      ))}
      <text x="6" y={middle - pipeHalf - 20}>
        pipe
      </text>
      <text x={mouth} y={middle - pipeHalf - 20} textAnchor="middle">
        nozzle
      </text>
      <g transform={`translate(${words} ${narrow ? 206 : 176})`}>
        <text className="water">{speed}</text>
        <text className="water" x={narrow ? 100 : 110}>
          {thickness} thick
        </text>
        <text className="figure" y={24}>
          carries {power}
        </text>
      </g>
    </MovingDrawing>
  )
}
