import { useState } from 'react'
import { runner } from '#calc/jet/runner.ts'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const jet = { jetVelocity: 24.5, speedRatio: 0.46, jetDiameter: 0.018 }
const pixelsPerMillimetre = 0.72
const jetWidth = jet.jetDiameter * 1000 * pixelsPerMillimetre

/** A runner seen along its shaft, with the circle that the middle of the jet touches. */
export function PitchCircle() {
  const [millimetres, setMillimetres] = useState(185)
  const narrow = useNarrow()
  const { speed, diameterRatio, bucketCount } = figures(runner, {
    ...jet,
    pitchDiameter: millimetres / 1000,
  })
  const turns = join(format(speed, 'rotation'))
  const jetsWide = join(format(diameterRatio, 'ratio'))

  const width = narrow ? 288 : 600
  const radius = (millimetres / 2) * pixelsPerMillimetre
  const x = narrow ? 150 : 220
  /** The jet stays where it is; the wheel grows away from it. */
  const jetY = 252
  const y = jetY - radius
  const words = narrow ? { x: 4, y: 304 } : { x: 384, y: 96 }
  const cup = jetWidth * 1.15

  return (
    <MovingDrawing
      label="Pitch circle diameter"
      from={150}
      to={280}
      step={5}
      value={millimetres}
      onChange={setMillimetres}
      said={`${millimetres} mm`}
      shows={`A runner of ${bucketCount} buckets seen along its shaft. The middle of the jet touches its pitch circle, ${millimetres} mm wide, ${jetsWide} times the jet. It turns at ${turns}.`}
      width={width}
      height={narrow ? 392 : 284}
      caption="The same jet, 24.5 m/s and 18 mm thick, on wheels of different width. The dotted circle is the pitch circle; the tips stand outside it."
    >
      <g fill="none" strokeWidth="2.5">
        <path d={`M0 ${jetY - jetWidth / 2}H${x}v${jetWidth}H0Z`} fill="var(--water-fill)" stroke="none" />
        <path d={`M0 ${jetY - jetWidth / 2}H${x}M0 ${jetY + jetWidth / 2}H${x}`} stroke="var(--water)" />
        <circle cx={x} cy={y} r={radius - cup - 3} stroke="var(--ink)" fill="var(--paper)" />
        {Array.from({ length: bucketCount }, (_, i) => (
          <path
            key={i}
            d={`M${x} ${jetY + cup}C${x + 12} ${jetY + cup} ${x + 12} ${jetY - cup} ${x} ${jetY - cup}Z`}
            transform={`rotate(${(i * 360) / bucketCount} ${x} ${y})`}
            fill="var(--paper-2)"
            stroke="var(--ink)"
            strokeWidth="2"
          />
        ))}
        <circle cx={x} cy={y} r={radius} stroke="var(--brass)" strokeWidth="2" strokeDasharray="2 5" />
        <circle cx={x} cy={y} r="7" fill="var(--ink)" />
      </g>
      <text className="water" x="2" y={jetY - jetWidth / 2 - 10}>
        jet
      </text>
      <g transform={`translate(${words.x} ${words.y})`}>
        <text className="electric">dotted circle {millimetres} mm</text>
        <text className="figure" y="26">
          turns at {turns}
        </text>
        <text y="52">{jetsWide} jets wide</text>
        <text y="78">{bucketCount} buckets by Tygun’s rule</text>
      </g>
    </MovingDrawing>
  )
}
