import { scaleLinear } from 'd3-scale'
import { area, line } from 'd3-shape'
import { useId } from 'react'
import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { rowsOf, scalar, type DrawingProps } from './Drawing.tsx'

const top = 34

/** The stream's curve, what stays in it at its foot, what the plant draws on above that while it runs, and what goes by over the top. */
export function AnnualEnergyDrawing({ given, found }: DrawingProps) {
  const id = useId()
  const residual = scalar(given, 'residualFlow')!
  const share = scalar(given, 'takeShare') ?? 1
  const running = scalar(found, 'runningFraction')!
  const curve = rowsOf(found, 'curve').map((row): [number, number] => [row.exceedance as number, row.flow as number])
  // The flow of the stream from which the plant runs full; out of the picture where the licence lets nothing be taken.
  const full = share === 0 ? residual : residual + scalar(given, 'designFlow')! / share
  const highest = Math.max(1.15 * full, Math.min(curve[0]![1], 2 * full))
  const words = {
    foot: share === 1 ? 'from wet days to dry' : `${join(format(share, 'fraction'))} of that band is taken`,
    energy: `${join(format(scalar(found, 'energyPerYear')!, 'energy'))} a year`,
    running: `runs ${join(format(running, 'fraction'))} of the days`,
    full: `full from ${join(format(full, 'flow'))}`,
    residual: `${join(format(residual, 'flow'))} stays in the stream`,
  }

  return (
    <Framed
      name={`The stream’s flow over the share of the time: ${words.residual}, the plant ${words.running}, ${words.full}, ${words.energy}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const bottom = narrow ? 190 : 230
        const x = scaleLinear([0, 1], [0, width - 2])
        const y = scaleLinear([0, highest], [bottom, top]).clamp(true)
        const whole = [[0, curve[0]![1]] as [number, number], ...curve]
        const below = area<[number, number]>(
          ([share]) => x(share),
          bottom,
          ([, flow]) => y(flow),
        )(whole)!
        const clip = `${id}-${narrow ? 'narrow' : 'wide'}`
        return {
          height: bottom + (narrow ? 106 : 66),
          lines: (
            <g fill="none">
              <clipPath id={clip}>
                <path d={below} />
              </clipPath>
              <path d={below} fill="var(--water-fill)" />
              <path
                clipPath={`url(#${clip})`}
                d={`M0 ${y(full)}H${x(running)}V${y(residual)}H0z`}
                fill="var(--brass-fill)"
                stroke="var(--brass)"
                strokeWidth="2"
              />
              <path
                d={line<[number, number]>(
                  ([share]) => x(share),
                  ([, flow]) => y(flow),
                )(whole)!}
                stroke="var(--water)"
                strokeWidth="2"
              />
              <path
                d={`M0 ${y(residual)}H${width}M0 ${y(full)}H${width}`}
                stroke="var(--ink-2)"
                strokeWidth="1.5"
                strokeDasharray="3 6"
              />
              <path d={`M0 ${bottom}H${width}`} stroke="var(--earth)" strokeWidth="2.5" />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.energy}
              </text>
              <text x={width} y={y(full) - 7} textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.full}
              </text>
              {[
                { words: words.running, fill: 'var(--brass-fill)', line: 'var(--brass)' },
                { words: words.residual, fill: 'var(--water-fill)', line: 'var(--water)' },
              ].map(({ words, fill, line }, i) => (
                <g
                  key={words}
                  transform={`translate(${narrow ? 0 : (i * width) / 2} ${bottom + 18 + (narrow ? i * 26 : 0)})`}
                >
                  <path d="M1 1h16v14h-16z" fill={fill} stroke={line} strokeWidth="1.5" />
                  <text x="26" y="14" fontSize="15" fill="var(--ink)">
                    {words}
                  </text>
                </g>
              ))}
              <text x="0" y={bottom + (narrow ? 92 : 58)} fontSize="14" fill="var(--ink-2)">
                {words.foot}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
