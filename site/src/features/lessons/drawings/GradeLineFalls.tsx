import { useId, useState } from 'react'
import { friction } from '#calc/pipe/friction.ts'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { Hatch, MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const grossHead = 30
const pipe = { insideDiameter: 0.09, length: 185, roughness: 5e-5 }

const top = 66
const pixelsPerMetre = 7
const jet = top + grossHead * pixelsPerMetre

const metres = (value: number) => join(format(value, 'head'))

/** A pipe down a hill and the grade line over it, which falls as the flow grows. */
export function GradeLineFalls() {
  const [litres, setLitres] = useState(8)
  const narrow = useNarrow()
  const hatch = useId()
  const { headLoss } = figures(friction, { ...pipe, flow: litres / 1000 })
  const share = join(format(headLoss / grossHead, 'fraction', { digits: 2 }))

  const width = narrow ? 288 : 640
  const start = narrow ? 54 : 110
  const end = narrow ? 178 : 470
  const rule = end + 18
  const lineEnd = top + headLoss * pixelsPerMetre
  const hill = `M0 ${top + 18}H${start}L${end} ${jet}H${width}`
  const pipeLine = `M${start - 4} ${top + 10}L${start + 6} ${top + 12}L${end - 4} ${jet - 8}`

  return (
    <MovingDrawing
      label="Flow"
      from={0}
      to={16}
      step={0.5}
      value={litres}
      onChange={setLitres}
      said={`${litres} L/s`}
      shows={`A pipe down a hill with its grade line. At ${litres} L/s the line falls ${metres(headLoss)} from forebay to nozzle, ${share} of the head, and ${metres(grossHead - headLoss)} is left.`}
      width={width}
      height={320}
      caption="A pipe of 90 mm bore, 185 m long, with a drop of 30 m. The full line that falls from the dotted one is the grade line. Set the slider to 4, then 8, then 16 litres a second, and read off the loss each time."
    >
      <defs>
        <Hatch id={hatch} />
      </defs>
      <g fill="none" stroke="var(--ink)" strokeWidth="2.5">
        <path d={`${hill}V320H0Z`} fill="var(--earth-fill)" stroke="none" />
        <path d={`${hill}V320H0Z`} fill={`url(#${hatch})`} stroke="none" />
        <path d={hill} stroke="var(--earth)" />
        <rect x={start - 40} y={top} width="38" height="18" fill="var(--water-fill)" stroke="none" />
        <path d={`M${start - 40} ${top - 8}V${top + 18}H${start - 2}V${top - 8}`} />
        <path d={`M${start - 40} ${top}H${start - 2}`} stroke="var(--water)" />
        <path d={pipeLine} strokeWidth="9" />
        <path d={pipeLine} stroke="var(--water-fill)" strokeWidth="5" />
        <path d={`M${end - 6} ${jet - 14}l12 4v6l-12 4z`} fill="var(--ink)" stroke="none" />
        <path d={`M${start} ${top}H${rule + 6}`} stroke="var(--water)" strokeWidth="1.5" strokeDasharray="3 6" />
        <path d={`M${start} ${top}L${end} ${lineEnd}`} stroke="var(--water)" />
        <g strokeWidth="1.5">
          <path
            d={`M${rule} ${top}V${lineEnd}M${rule - 6} ${top}H${rule + 6}M${rule - 6} ${lineEnd}H${rule + 6}`}
            stroke="var(--rust)"
          />
          <path d={`M${rule} ${lineEnd}V${jet - 8}M${rule - 6} ${jet - 8}H${rule + 6}`} stroke="var(--water)" />
        </g>
      </g>
      <text x={start - 42} y={top - 16}>
        forebay
      </text>
      <text x={narrow ? width : end} y={top - (narrow ? 38 : 10)} textAnchor="end">
        water at rest
      </text>
      <text className="loss" x={rule + 12} y={Math.max((top + lineEnd) / 2 + 5, top + 18)}>
        {metres(headLoss)} lost
      </text>
      <text className="water" x={rule + 12} y={(lineEnd + jet) / 2}>
        {metres(grossHead - headLoss)}
      </text>
      <text className="water" x={rule + 12} y={(lineEnd + jet) / 2 + 19}>
        left
      </text>
    </MovingDrawing>
  )
}
