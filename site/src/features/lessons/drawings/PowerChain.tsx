import { useState } from 'react'
import { power } from '#calc/water/power.ts'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const flow = 0.008
const grossHead = 26
const rowHeight = 46

const percent = (share: number) => join(format(share, 'fraction', { digits: 2 }))

/** The power left after each link from the forebay to the house, as bars that grow shorter. */
export function PowerChain() {
  const [alternator, setAlternator] = useState(0.78)
  const narrow = useNarrow()
  const width = narrow ? 288 : 560
  const links = [
    { name: 'in the fall', keeps: 1 },
    { name: 'after the pipe', keeps: 0.92 },
    { name: 'after the nozzle', keeps: 0.94 },
    { name: 'after the buckets', keeps: 0.8 },
    { name: 'after the alternator', keeps: alternator },
    { name: 'at the house', keeps: 0.95 },
  ]
  const shares = links.map((_, i) => links.slice(0, i + 1).reduce((share, { keeps }) => share * keeps, 1))
  const rows = links.map(({ name, keeps }, i) => {
    const { outputPower } = figures(power, { flow, netHead: grossHead, efficiency: shares[i]! })
    return { name, keeps, share: shares[i]!, power: join(format(outputPower, 'power')) }
  })

  return (
    <MovingDrawing
      label="What the alternator keeps"
      from={0.5}
      to={0.9}
      step={0.01}
      value={alternator}
      onChange={setAlternator}
      said={percent(alternator)}
      shows={`Six bars, each shorter than the one before: ${rows.map(({ name, power }) => `${name} ${power}`).join(', ')}. ${percent(rows.at(-1)!.share)} of the fall reaches the house.`}
      width={width}
      height={links.length * rowHeight}
      caption="Eight litres a second, twenty-six metres from forebay to jet. Each link hands on its share of what it was given."
    >
      {rows.map(({ name, keeps, share, power }, i) => (
        <g key={name}>
          <text x="0" y={i * rowHeight + 16}>
            {name}
            {i > 0 && !narrow && `, which keeps ${percent(keeps)}`}
          </text>
          <text className={i > 3 ? 'electric' : 'water'} x={width - 2} y={i * rowHeight + 16} textAnchor="end">
            {power}
          </text>
          <path d={`M1 ${i * rowHeight + 31}H${width - 1}`} stroke="var(--rule)" strokeWidth="14" />
          <rect
            x="1"
            y={i * rowHeight + 24}
            width={(width - 2) * share}
            height="14"
            fill={i > 3 ? 'var(--brass-fill)' : 'var(--water-fill)'}
            stroke={i > 3 ? 'var(--brass)' : 'var(--water)'}
            strokeWidth="2"
          />
        </g>
      ))}
    </MovingDrawing>
  )
}
