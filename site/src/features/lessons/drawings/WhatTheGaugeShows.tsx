import { useState } from 'react'
import type { PlainRow } from '#calc/index.ts'
import { calculateDefinition } from '#calc/solve-definition.ts'
import { g } from '#calc/constants.ts'
import { penstock } from '#calc/pipe/penstock.ts'
import { format, join } from '#calc/units/format.ts'
import { waterDensity } from '#calc/water/properties.ts'
import { DialGauge } from '../../../components/DialGauge.tsx'
import { WithSlider } from './MovingDrawing.tsx'

const grossHead = 44.4
const sections = [{ length: 196, insideDiameter: 0.09, roughness: 5e-5 }]

const bar = (head: number) => (head * waterDensity(10) * g) / 1e5
const sayBar = (head: number) => `${bar(head).toFixed(2)} bar`
const metres = (value: number) => join(format(value, 'head', { digits: value < 1 ? 2 : 3 }))

/** A gauge above the valve while the nozzle opens: the reading falls by what the pipe takes and by the head in the water's speed. */
export function WhatTheGaugeShows() {
  const [litres, setLitres] = useState(7.6)
  const { headLoss, gradeLine } = calculateDefinition(penstock, { grossHead, sections, flow: litres / 1000 })
  const { energyHead, hydraulicGrade } = (gradeLine as readonly PlainRow[]).at(-1) as Record<string, number>
  const rows = [
    { name: 'the pipe takes', head: headLoss as number },
    { name: 'in the water’s speed', head: energyHead! - hydraulicGrade! },
    { name: 'the gauge still shows', head: hydraulicGrade! },
  ]
  const shows = `A dial gauge. At rest it reads ${sayBar(grossHead)}; with ${litres} L/s running it reads ${sayBar(hydraulicGrade!)}. The pipe takes ${metres(rows[0]!.head)}.`

  return (
    <WithSlider
      label="Water running"
      from={0}
      to={12}
      step={0.2}
      value={litres}
      onChange={setLitres}
      said={`${litres} L/s`}
      shows={shows}
      caption="A drop of 44.4 m through 196 m of pipe with a bore of 90 mm. The gauge sits uphill of the valve, level with the jet."
    >
      <div className="gauge-drawing">
        <DialGauge
          name={shows}
          fullScale={6}
          unit="bar"
          needles={[
            { value: bar(grossHead), words: `at rest ${sayBar(grossHead)}`, line: 'outline' },
            { value: bar(hydraulicGrade!), words: `running ${sayBar(hydraulicGrade!)}` },
          ]}
        />
        <div className="gauge-drawing-words">
          <p>Of the {metres(grossHead)} at rest:</p>
          <dl>
            {rows.map(({ name, head }) => (
              <Line key={name} name={name} value={metres(head)} />
            ))}
          </dl>
        </div>
      </div>
    </WithSlider>
  )
}

const Line = ({ name, value }: { name: string; value: string }) => (
  <>
    <dt>{name}</dt>
    <dd>{value}</dd>
  </>
)
