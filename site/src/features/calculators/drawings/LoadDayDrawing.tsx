import { scaleLinear } from 'd3-scale'
import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { rowsOf, scalar, type DrawingProps } from './Drawing.tsx'

const top = 40
const hoursPerDay = 24

/** Each load as wide as its hours and as high as its power, the longest at the foot, under the line of the generator. */
export function LoadDayDrawing({ given, found }: DrawingProps) {
  const power = (key: 'peakPower' | 'surgePower' | 'spareForDump') => scalar(found, key)!
  const generator = scalar(given, 'generatorPower')!
  const spare = power('spareForDump')
  const said = (watts: number) => join(format(watts, 'power'))
  const words = {
    generator: `generator ${said(generator)}`,
    day: `${join(format(scalar(found, 'dayEnergy')!, 'energy'))} a day`,
    peak: `all on ${said(power('peakPower'))}`,
    surge: `worst start ${said(power('surgePower'))}`,
    spare: spare < 0 ? `${said(-spare)} short on the mean` : `${said(spare)} spare on the mean`,
  }
  const stacked = rowsOf(given, 'loads')
    .map((row) => ({ power: row.power as number, hours: row.hoursPerDay as number }))
    .sort((a, b) => b.hours - a.hours)
    .reduce<{ hours: number; from: number; to: number }[]>((stack, { power, hours }) => {
      const from = stack.at(-1)?.to ?? 0
      return [...stack, { hours, from, to: from + power }]
    }, [])

  return (
    <Framed
      name={`A day’s loads, ${words.day}, ${words.peak}, ${words.surge}, under a ${words.generator}: ${words.spare}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const bottom = narrow ? 190 : 216
        const x = scaleLinear([0, hoursPerDay], [2, width - 2])
        const y = scaleLinear([0, Math.max(power('surgePower'), generator, 1e-9)], [bottom, top])
        const below = [words.peak, words.surge, words.spare]
        return {
          height: bottom + (narrow ? 92 : 52),
          lines: (
            <g fill="none">
              <path
                d={`M${x(0)} ${bottom}V${y(power('surgePower'))}h10V${bottom}`}
                stroke="var(--rust)"
                strokeWidth="2"
              />
              {stacked.map(({ hours, from, to }, i) => (
                <path
                  key={i}
                  d={`M${x(0)} ${y(from)}V${y(to)}H${x(hours)}V${y(from)}z`}
                  fill="var(--brass-fill)"
                  stroke="var(--ink)"
                  strokeWidth="1.5"
                />
              ))}
              <path d={`M0 ${bottom}H${width}`} stroke="var(--earth)" strokeWidth="2.5" />
              <path d={`M0 ${y(generator)}H${width}`} stroke="var(--water)" strokeWidth="2" strokeDasharray="8 5" />
              <text x={width} y={y(generator) - 8} textAnchor="end" fontSize="15" fill="var(--water)">
                {words.generator}
              </text>
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.day}
              </text>
              <text x="0" y={bottom + 20} fontSize="14" fill="var(--ink-2)">
                0 h
              </text>
              <text x={width} y={bottom + 20} textAnchor="end" fontSize="14" fill="var(--ink-2)">
                24 h
              </text>
              {below.map((text, i) => (
                <text
                  key={text}
                  x={narrow ? 0 : [0, width / 2, width][i]}
                  y={bottom + 44 + (narrow ? i * 20 : 0)}
                  textAnchor={narrow ? 'start' : (['start', 'middle', 'end'] as const)[i]}
                  fontSize="15"
                  fill={i === 1 ? 'var(--rust)' : 'var(--ink)'}
                >
                  {text}
                </text>
              ))}
            </g>
          ),
        }
      }}
    />
  )
}
