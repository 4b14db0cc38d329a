import { useState } from 'react'
import { format, join } from '#calc/units/format.ts'
import { figures } from './figures.ts'
import { MovingDrawing } from './MovingDrawing.tsx'
import { useNarrow } from './use-narrow.ts'

const bucket = { deflectionAngle: 165, bucketFriction: 0.95 }

const percent = (share: number) => join(format(share, 'fraction', { digits: 2 }))

/** A bucket cut open, seen from above: what the jet pushes and what work it does as the bucket runs faster. */
export function BucketAndJet() {
  const [speedRatio, setSpeedRatio] = useState(0.46)
  const narrow = useNarrow()
  const { efficiency, torqueRatio } = figures<'efficiency' | 'torqueRatio'>('bucket', { ...bucket, speedRatio })

  const width = narrow ? 288 : 600
  const x = narrow ? 186 : 240
  const y = 104
  const bars = narrow ? { x: 1, y: 222, width: 286 } : { x: 360, y: 52, width: 238 }
  /** What the water still carries when it leaves. */
  const left = 14 + 90 * (1 - efficiency)
  const cup = (side: 1 | -1) =>
    `M${x} ${y}C${x + 8} ${y + side * 4} ${x + 44} ${y + side * 8} ${x + 44} ${y + side * 34}C${x + 44} ${y + side * 58} ${x + 14} ${y + side * 62} ${x - 4} ${y + side * 58}`
  const water = (side: 1 | -1) =>
    `M${x - 6} ${y + side * 4}C${x + 6} ${y + side * 9} ${x + 36} ${y + side * 14} ${x + 36} ${y + side * 34}C${x + 36} ${y + side * 50} ${x + 12} ${y + side * 53} ${x - 6} ${y + side * 50}l${-left} ${side * left * 0.27}`
  const rows = [
    { name: 'push on the bucket', share: torqueRatio, fill: 'var(--earth-fill)', stroke: 'var(--earth)' },
    { name: 'share of the jet’s power taken', share: efficiency, fill: 'var(--water-fill)', stroke: 'var(--water)' },
  ]

  return (
    <MovingDrawing
      label="Bucket speed over jet speed"
      from={0}
      to={1}
      step={0.02}
      value={speedRatio}
      onChange={setSpeedRatio}
      said={speedRatio.toFixed(2)}
      shows={`A jet is split by a bucket and turned back on both sides. At ${speedRatio.toFixed(2)} of the jet’s speed the push is ${percent(torqueRatio)} of the push at standstill, and the bucket takes ${percent(efficiency)} of the jet’s power.`}
      width={width}
      height={narrow ? 320 : 208}
      caption="A bucket that turns the jet back by 165 degrees, with a little rubbing. The longer the water that leaves, the more it still carries away."
    >
      <g fill="none" strokeWidth="2.5">
        <path d={`M0 ${y - 7}H${x - 6}V${y + 7}H0Z`} fill="var(--water-fill)" stroke="none" />
        <path d={`M0 ${y - 7}H${x - 8}M0 ${y + 7}H${x - 8}`} stroke="var(--water)" />
        {([1, -1] as const).map((side) => (
          <g key={side}>
            <path d={water(side)} stroke="var(--water)" strokeWidth="5" opacity=".75" strokeLinecap="round" />
            <path d={cup(side)} stroke="var(--ink)" strokeWidth="3.5" />
          </g>
        ))}
        <path
          d={`M${x + 52} ${y}h${44 * speedRatio}${speedRatio > 0.1 ? 'l-8 -6m8 6l-8 6' : ''}`}
          stroke="var(--brass)"
          strokeWidth="3"
        />
      </g>
      <text className="water" x="2" y={y - 16}>
        jet
      </text>
      <text x={x + 40} y={y - 66} textAnchor={narrow ? 'middle' : 'start'}>
        bucket
      </text>
      {rows.map(({ name, share, fill, stroke }, i) => (
        <g key={name} transform={`translate(${bars.x} ${bars.y + i * 52})`}>
          <text y="0">{name}</text>
          <text className="figure" x={bars.width - 1} y="0" textAnchor="end">
            {percent(share)}
          </text>
          <path d={`M0 15H${bars.width}`} stroke="var(--rule)" strokeWidth="14" />
          <rect y="8" width={bars.width * share} height="14" fill={fill} stroke={stroke} strokeWidth="2" />
        </g>
      ))}
    </MovingDrawing>
  )
}
