import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Bars, barsHeight } from './Bars.tsx'
import { Push, scalar, short, type DrawingProps } from './Drawing.tsx'

const radius = 56
const around = Array.from({ length: 8 }, (_, i) => i * 45)
/** Beyond this the picture is not pressed flatter. */
const flattest = 0.45

/** The pipe cut across, as far out of round as it is, the air pressing on it, and what it holds beside the whole of the air. */
export function CollapseDrawing({ given, found }: DrawingProps) {
  const sdr = scalar(given, 'sdr')!
  const critical = scalar(found, 'criticalPressure')!
  const brief = scalar(found, 'criticalPressureShort')
  const margin = scalar(found, 'fullVacuumMargin')!
  const held = critical / (scalar(given, 'safetyFactor') ?? 2)
  const air = held - margin
  const ovality = Math.min(scalar(given, 'ovality') ?? 0, flattest)
  const said = (pressure: number) => join(format(pressure, 'pressure'))
  const wall = Math.max((2 * radius) / sdr, 1.5)
  // Against a pipe that holds a hundred times the air, the air's bar would be a hair.
  const most = 4 * air
  const bar = (name: string, pressure: number, tone: 'ink' | 'water' | 'rust') => ({
    words: `${name} ${said(pressure)}`,
    parts: [{ value: Math.min(pressure, most), tone }],
  })
  const bars = [
    bar('full vacuum', air, 'rust'),
    bar('lasting, with safety', held, 'ink'),
    bar('lasting', critical, 'ink'),
    ...(brief === undefined ? [] : [bar('for minutes', brief, 'ink')]),
  ]

  return (
    <Framed
      name={`Pipe of SDR ${say(short(sdr), 'ratio')} pressed from outside: ${bars.map(({ words }) => words).join('; ')}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const centre = { x: narrow ? width / 2 : 120, y: 106 }
        const half = { x: radius * (1 + ovality), y: radius * (1 - ovality) }
        const at = narrow ? { x: 2, y: 236 } : { x: 270, y: 2 }
        return {
          height: Math.max(236, at.y + barsHeight(bars)),
          lines: (
            <g fill="none">
              {around.map((degrees) => {
                const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)]
                const point = (away: number) => ({
                  x: centre.x + (half.x + away) * c,
                  y: centre.y + (half.y + away) * s,
                })
                return <Push key={degrees} from={point(40)} to={point(6)} colour="var(--rust)" />
              })}
              <ellipse cx={centre.x} cy={centre.y} rx={half.x} ry={half.y} fill="var(--ink)" />
              <ellipse
                cx={centre.x}
                cy={centre.y}
                rx={Math.max(half.x - wall, 1)}
                ry={Math.max(half.y - wall, 1)}
                fill="var(--paper)"
              />
              <text x={centre.x} y={centre.y + 5} textAnchor="middle" fontSize="15" fill="var(--ink-2)">
                {half.y - wall > 30 ? `SDR ${say(short(sdr), 'ratio')}` : ''}
              </text>
              <text x={centre.x} y={224} textAnchor="middle" fontSize="14" fill="var(--ink-2)">
                {ovality > 0 ? `${say(short(ovality), 'fraction')} out of round` : 'quite round'}
              </text>
              <Bars bars={bars} x={at.x} y={at.y} width={width - at.x - 2} />
            </g>
          ),
        }
      }}
    />
  )
}
