import { useState } from 'react'
import { gaugeReading } from '#calc/pipe/gauge-reading.ts'
import type { PlainRow } from '#calc/index.ts'
import { calculateDefinition } from '#calc/solve-definition.ts'
import { DialGauge } from '../../../components/DialGauge.tsx'
import { WithSlider } from './MovingDrawing.tsx'

/** Bar and kilowatts of one scheme, the first day's first. */
const readings = [
  { at: 'the first day', static: 4.35, running: 4.02, power: 1.62 },
  { at: 'late October', static: 4.35, running: 3.71, power: 1.43 },
  { at: 'after a flood', static: 4.35, running: 4.24, power: 0.94 },
  { at: 'in the third year', static: 4.35, running: 3.85, power: 1.78 },
  { at: 'after a hard frost', static: 4.12, running: 3.78, power: 1.49 },
] as const
const first = readings[0]
/** The loss of the first day, by its own two readings. */
const pipe = { insideDiameter: 0.09, flow: 0.0076 }

const pressures = (reading: (typeof readings)[number]) => ({
  ...pipe,
  staticPressure: reading.static * 1e5,
  runningPressure: reading.running * 1e5,
})

/** What the readings point to: causes and why, without those that only a moving needle shows. */
const causesFor = (reading: (typeof readings)[number]): string[] => {
  const { findings } = calculateDefinition(gaugeReading, {
    ...pressures(reading),
    predictedLoss: calculateDefinition(gaugeReading, pressures(first)).headLoss,
    predictedStatic: first.static * 1e5,
    expectedPower: first.power * 1000,
    measuredPower: reading.power * 1000,
  })
  return (findings as readonly PlainRow[])
    .filter(({ why }) => !String(why).startsWith('If '))
    .map(({ cause }) => String(cause))
}

/** Five days of one scheme: gauge and power together point to the fault. */
export function FiveReadings() {
  const [number, setNumber] = useState(1)
  const reading = readings[number - 1]!
  const causes = causesFor(reading)
  const shows = `A dial gauge ${reading.at}: ${reading.static.toFixed(2)} bar at rest, ${reading.running.toFixed(2)} bar running, ${reading.power} kW. On the first day it ran at ${first.running.toFixed(2)} bar and ${first.power} kW.`

  return (
    <WithSlider
      label="Reading"
      from={1}
      to={readings.length}
      step={1}
      value={number}
      onChange={setNumber}
      said={`${number} of ${readings.length}: ${reading.at}`}
      shows={`${shows} ${causes.length > 0 ? `It points to: ${causes.join(', ')}.` : 'Nothing is wrong.'}`}
      caption="One scheme, always at the same opening of the nozzle. The outlined needle is the running pressure of the first day."
    >
      <div className="gauge-drawing">
        <DialGauge
          name={shows}
          fullScale={6}
          unit="bar"
          needles={[
            { value: first.running, words: `first day ${first.running.toFixed(2)} bar`, line: 'outline' },
            { value: reading.running, words: `running ${reading.running.toFixed(2)} bar` },
          ]}
        />
        <div className="gauge-drawing-words">
          <dl>
            <dt>at rest</dt>
            <dd>{reading.static.toFixed(2)} bar</dd>
            <dt>power</dt>
            <dd>{reading.power} kW</dd>
          </dl>
          {causes.length === 0 ? (
            <p>This is what the others are judged by.</p>
          ) : (
            <>
              <p>It points to:</p>
              <ul>
                {causes.map((cause) => (
                  <li key={cause}>{cause}</li>
                ))}
              </ul>
            </>
          )}
        </div>
      </div>
    </WithSlider>
  )
}
