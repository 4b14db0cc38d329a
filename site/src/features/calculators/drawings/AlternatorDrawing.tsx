import { scaleLinear } from 'd3-scale'
import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { scalar, short, type DrawingProps } from './Drawing.tsx'

const rowHeight = 21

/** Runner and alternator on their shaft, and along the runner's speed where the controller starts, runs, breaks, and how far it runs away. */
export function AlternatorDrawing({ given, found }: DrawingProps) {
  const speed = scalar(given, 'speed')!
  const gear = scalar(given, 'gearRatio') ?? 1
  const starts = scalar(found, 'speedAtMinimum')
  const breaks = scalar(found, 'speedAtMaximum')!
  const loaded = scalar(found, 'directVoltageLoaded')
  const runaway = scalar(found, 'runawayVoltage')
  const frequency = scalar(found, 'frequency')
  const volts = (value: number) => join(format(value, 'voltage'))
  const turns = (value: number) => join(format(value, 'rotation'))
  const marks = [
    ...(starts === undefined ? [] : [{ at: starts, words: `starts at ${turns(starts)}`, colour: 'var(--ink-2)' }]),
    {
      at: speed,
      words: `runs at ${turns(speed)}: ${loaded === undefined ? `${volts(scalar(found, 'directVoltageOpen')!)} open` : volts(loaded)}`,
      colour: 'var(--water)',
    },
    {
      at: breaks,
      words: `limit ${volts(scalar(given, 'controllerMaximum')!)} open at ${turns(breaks)}`,
      colour: 'var(--rust)',
    },
    ...(runaway === undefined
      ? []
      : [
          {
            at: speed * scalar(given, 'runawayRatio')!,
            words: `running away ${volts(runaway)}`,
            colour: 'var(--ink)',
          },
        ]),
  ].sort((a, b) => a.at - b.at)
  // The working band in full; what lies far beyond stands at the edge.
  const most = 1.08 * Math.min(Math.max(...marks.map(({ at }) => at)), 5 * speed)

  return (
    <Framed
      name={`Alternator${gear === 1 ? '' : `, geared ${say(short(gear), 'ratio')} to 1`}: ${marks.map(({ words }) => words).join('; ')}`}
      draw={(width) => {
        const x = scaleLinear([0, most], [4, width - 12]).clamp(true)
        const shaft = 52
        const line = 150
        const first = line + 58
        const labels = marks.map((_, i) => first + i * rowHeight)
        const machine = isNarrow(width) ? 130 : 190
        return {
          height: labels.at(-1)! + 12,
          lines: (
            <g fill="none">
              <path d={`M78 ${shaft}H${machine}`} stroke="var(--ink)" strokeWidth="5" />
              <circle cx="44" cy={shaft} r="34" stroke="var(--ink)" strokeWidth="2.5" />
              <circle cx="44" cy={shaft} r="26" stroke="var(--brass)" strokeWidth="1.5" strokeDasharray="5 4" />
              {gear !== 1 && (
                <text x={(78 + machine) / 2} y={shaft - 12} textAnchor="middle" fontSize="14" fill="var(--ink-2)">
                  × {say(short(gear), 'ratio')}
                </text>
              )}
              <path
                d={`M${machine} ${shaft - 30}h70v60h-70z`}
                fill="var(--paper-2)"
                stroke="var(--ink)"
                strokeWidth="2.5"
              />
              <path
                d={`M${machine + 16} ${shaft}c6 -20 13 -20 19 0s13 20 19 0`}
                stroke="var(--water)"
                strokeWidth="2.5"
              />
              <text x={machine + 80} y={shaft + 5} fontSize="14" fill="var(--ink-2)">
                {frequency === undefined ? '' : join(format(frequency, 'frequency'))}
              </text>
              <path d={`M4 ${line}H${width - 10}`} stroke="var(--ink)" strokeWidth="1.5" />
              <path d={`M${width - 2} ${line}l-9 -5v10z`} fill="var(--ink)" />
              <text x={width - 2} y={line - 46} textAnchor="end" fontSize="14" fill="var(--ink-2)">
                speed of the runner
              </text>
              {starts !== undefined && starts < breaks && (
                <path
                  d={`M${x(starts)} ${line - 14}H${x(breaks)}v28H${x(starts)}z`}
                  fill="var(--water-fill)"
                  stroke="var(--water)"
                  strokeWidth="1.5"
                />
              )}
              {marks.map(({ at, words, colour }, i) => (
                <g key={words}>
                  <path d={`M${x(at)} ${line - 18}V${line + 18}`} stroke={colour} strokeWidth="3" />
                  <circle
                    cx={x(at)}
                    cy={line + (i % 2 === 0 ? -26 : 26)}
                    r="9"
                    fill="var(--paper)"
                    stroke={colour}
                    strokeWidth="1.5"
                  />
                  <text
                    x={x(at)}
                    y={line + (i % 2 === 0 ? -21.5 : 30.5)}
                    textAnchor="middle"
                    fontSize="13"
                    fill={colour}
                  >
                    {i + 1}
                  </text>
                  <text x="0" y={labels[i]! + 5} fontSize={isNarrow(width) ? 13 : 15} fill={colour}>
                    {i + 1}: {words}
                  </text>
                </g>
              ))}
            </g>
          ),
        }
      }}
    />
  )
}
