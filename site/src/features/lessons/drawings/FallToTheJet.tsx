import { useId, useState } from 'react'
import { power as powerOfWater } from '#calc/water/power.ts'
import { format, join, say } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { Hatch, MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

/** From the water in the forebay down to the stream, metres; and the flow, m³/s. */
const wholeFall = 30
const flow = 0.006

const top = 44
const pixelsPerMetre = 8
const stream = top + wholeFall * pixelsPerMetre

const metres = (value: number) => say(value, 'head')

/** A shed on a hillside that can be set higher or lower: only the fall down to its jet counts. */
export function FallToTheJet() {
  const [over, setOver] = useState(6)
  const narrow = useNarrow()
  const hatch = useId()
  const head = wholeFall - over
  const { hydraulicPower } = figures(powerOfWater, { flow, netHead: head, efficiency: 1 })
  const power = join(format(hydraulicPower, 'power'))

  const width = narrow ? 288 : 640
  const crest = narrow ? 64 : 130
  const foot = narrow ? 164 : 420
  const rule = narrow ? 180 : 470
  const jetY = stream - over * pixelsPerMetre
  /** Where the hillside is as low as this. */
  const hillX = (y: number) => crest + ((y - top - 26) / (stream - top - 26)) * (foot - crest)
  /** Dug into the bank, its front where the ground is. */
  const shed = hillX(jetY + 14) - 38

  return (
    <MovingDrawing
      label="Height of the jet over the stream"
      from={2}
      to={15}
      step={0.5}
      value={over}
      onChange={setOver}
      said={metres(over)}
      shows={`A forebay, a pipe down a hillside and a shed with a jet. The water falls ${metres(wholeFall)} to the stream. The jet is ${metres(over)} over the stream, so ${metres(head)} counts as head and ${metres(over)} is lost. At 6 L/s that head is worth ${power}.`}
      width={width}
      height={330}
      caption="Six litres a second fall thirty metres from forebay to stream. The sums are for the water alone, before the pipe takes its share."
    >
      <defs>
        <Hatch id={hatch} />
      </defs>
      <g fill="none" stroke="var(--ink)" strokeWidth="2.5">
        <g stroke="none">
          {['var(--earth-fill)', `url(#${hatch})`].map((fill) => (
            <path key={fill} d={`M0 ${top + 20}H${crest}L${foot} ${stream}V330H0Z`} fill={fill} />
          ))}
        </g>
        <path d={`M0 ${top + 20}H${crest}L${foot} ${stream}`} stroke="var(--earth)" />
        <rect x={crest - 42} y={top} width="40" height="20" fill="var(--water-fill)" stroke="none" />
        <path d={`M${crest - 42} ${top - 8}V${top + 20}H${crest - 2}V${top - 8}`} />
        <path d={`M${crest - 42} ${top}H${crest - 2}`} stroke="var(--water)" />
        <path d={`M${foot} ${stream}H${width}V330H${foot}Z`} fill="var(--water-fill)" stroke="none" />
        <path d={`M${foot} ${stream}H${width}`} stroke="var(--water)" />
        <path d={`M${crest - 2} ${top + 12}L${crest + 6} ${top + 22}L${shed - 6} ${jetY}`} strokeWidth="8" />
        <path
          d={`M${crest - 2} ${top + 12}L${crest + 6} ${top + 22}L${shed - 6} ${jetY}`}
          stroke="var(--water-fill)"
          strokeWidth="4"
        />
        <path d={`M${shed + 38} ${jetY + 12}L${foot} ${stream}`} stroke="var(--water)" strokeDasharray="3 5" />
        <g fill="var(--paper)">
          <path
            d={`M${shed - 10} ${jetY + 14}V${jetY - 22}L${shed + 14} ${jetY - 36}L${shed + 38} ${jetY - 22}V${jetY + 14}Z`}
          />
        </g>
        <path d={`M${shed - 8} ${jetY}H${shed + 10}`} stroke="var(--water)" strokeWidth="3" />
        <circle cx={shed + 16} cy={jetY - 7} r="9" />
        <g strokeWidth="1.5">
          <path d={`M${crest + 2} ${top}H${rule + 6}`} stroke="var(--water)" strokeDasharray="3 6" />
          <path d={`M${shed + 38} ${jetY}H${rule + 6}`} stroke="var(--water)" strokeDasharray="3 6" />
          <path
            d={`M${rule} ${top}V${jetY}M${rule - 6} ${top}H${rule + 6}M${rule - 6} ${jetY}H${rule + 6}`}
            stroke="var(--water)"
          />
          <path d={`M${rule} ${jetY}V${stream}M${rule - 6} ${stream}H${rule + 6}`} stroke="var(--rust)" />
        </g>
      </g>
      <text x={crest - 44} y={top - 16}>
        forebay
      </text>
      <text x={width - 8} y={stream + 24} textAnchor="end">
        stream
      </text>
      <text className="water" x={rule + 12} y={(top + jetY) / 2 - 24}>
        {metres(head)}
      </text>
      <text className="water" x={rule + 12} y={(top + jetY) / 2 - 5}>
        is the head
      </text>
      <text className="figure" x={rule + 12} y={(top + jetY) / 2 + 18}>
        {power}
      </text>
      <text className="loss" x={rule + 12} y={over < 5 ? jetY - 9 : (jetY + stream) / 2 + 5}>
        {metres(over)} lost
      </text>
    </MovingDrawing>
  )
}
