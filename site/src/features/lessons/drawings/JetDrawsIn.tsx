import { useState } from 'react'
import { jet as freeJet } from '#calc/jet/jet.ts'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const nozzleDiameter = 0.018
const least = 0.62
const pixelsPerMetre = 4000
const middle = 104
const wallTop = 14

const mouthWords = (coefficient: number) =>
  coefficient < 0.66 ? 'hole in a flat plate' : coefficient < 0.98 ? 'mouth partly rounded' : 'well shaped taper'

/** The same hole with a mouth from sharp to well shaped, and how far the jet draws in after it. */
export function JetDrawsIn() {
  const [coefficient, setCoefficient] = useState(least)
  const narrow = useNarrow()
  const { jetDiameter, flow } = figures(freeJet, {
    netHead: 37,
    velocityCoefficient: 0.97,
    contractionCoefficient: coefficient,
    jetCount: 1,
    nozzleDiameter,
  })
  const thickness = join(format(jetDiameter, 'length', { unit: 'mm' }))
  const litres = join(format(flow, 'flow', { unit: 'L/s' }))

  const width = narrow ? 288 : 560
  const face = narrow ? 84 : 190
  const hole = (nozzleDiameter / 2) * pixelsPerMetre
  const jet = (jetDiameter / 2) * pixelsPerMetre
  const thick = 16
  /** How far the metal leads the water in, from a sharp edge to a full taper. */
  const lead = ((coefficient - least) / (1 - least)) * 54
  const metal = (side: 1 | -1) => {
    const edge = middle + side * hole
    const outer = middle + side * (middle - wallTop)
    return `M${face} ${edge}Q${face - lead} ${edge} ${face - lead} ${edge + side * lead * 0.7}L${face - lead} ${outer}H${face + thick}V${edge + side * 5}L${face + 4} ${edge}Z`
  }
  const skin = (side: 1 | -1) =>
    `${face} ${middle + side * hole}C${face + 22} ${middle + side * (hole - (hole - jet) * 0.75)} ${face + 36} ${middle + side * jet} ${face + 64} ${middle + side * jet}L${width} ${middle + side * jet}`

  return (
    <MovingDrawing
      label="Contraction coefficient"
      from={least}
      to={1}
      step={0.01}
      value={coefficient}
      onChange={setCoefficient}
      said={coefficient.toFixed(2)}
      shows={`A ${mouthWords(coefficient)}, 18 mm wide. The jet behind it is ${thickness} thick and carries ${litres}.`}
      width={width}
      height={narrow ? 240 : 246}
      caption="A mouth 18 mm wide under 37 m of net head. Only the way the metal leads the water in is changed."
    >
      <path d={`M0 ${wallTop}H${face}V${2 * middle - wallTop}H0Z`} fill="var(--water-fill)" />
      <path
        d={`M${skin(-1)}V${middle + jet}H${face + 64}C${face + 36} ${middle + jet} ${face + 22} ${middle + hole - (hole - jet) * 0.75} ${face} ${middle + hole}Z`}
        fill="var(--water-fill)"
      />
      {([1, -1] as const).map((side) => (
        <g key={side} fill="none" strokeWidth="2.5">
          <path d={`M${skin(side)}`} stroke="var(--water)" />
          <path d={metal(side)} fill="var(--paper-2)" stroke="var(--ink)" />
        </g>
      ))}
      <text x={face + 26} y={wallTop + 14}>
        {mouthWords(coefficient)}
      </text>
      <text x={face + 26} y={wallTop + 34}>
        18 mm wide
      </text>
      <g transform={`translate(${face + 26} ${2 * middle - wallTop + 10})`}>
        <text className="water">jet {thickness} thick</text>
        <text className="figure" y={24}>
          passes {litres}
        </text>
      </g>
    </MovingDrawing>
  )
}
