import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Bars, barsHeight } from './Bars.tsx'
import { scalar, short, type DrawingProps } from './Drawing.tsx'

const radius = 62

/** The pipe cut across, its wall true to its SDR, and what it may carry beside what it has to. */
export function PressureClassDrawing({ given, found }: DrawingProps) {
  const sdr = scalar(given, 'sdr')!
  const working = scalar(given, 'workingPressure')!
  const surge = scalar(given, 'surgePressure')!
  const allowed = scalar(found, 'allowedPressure')!
  const inSurge = allowed * (scalar(given, 'surgeFactor') ?? 1)
  const said = (pressure: number) => join(format(pressure, 'pressure'))
  const wall = Math.max((2 * radius) / sdr, 1.5)
  const bars = [
    { words: `may carry ${said(allowed)}`, parts: [{ value: allowed, tone: 'ink' as const }] },
    ...(inSurge === allowed
      ? []
      : [{ words: `in a surge ${said(inSurge)}`, parts: [{ value: inSurge, tone: 'ink' as const }] }]),
    {
      words: `static ${said(working)}, surge ${said(surge)}`,
      parts: [
        { value: working, tone: 'water' as const },
        { value: surge, tone: 'rust' as const },
      ],
    },
  ]

  return (
    <Framed
      name={`Pipe of SDR ${say(short(sdr), 'ratio')}, cut across: ${bars.map(({ words }) => words).join('; ')}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const centre = { x: radius + 2, y: radius + 4 }
        const at = narrow ? { x: 2, y: 2 * radius + 34 } : { x: 2 * radius + 64, y: 6 }
        return {
          height: narrow ? at.y + barsHeight(bars) : Math.max(2 * radius + 34, at.y + barsHeight(bars)),
          lines: (
            <g fill="none">
              <circle cx={centre.x} cy={centre.y} r={radius} fill="var(--ink)" />
              <circle cx={centre.x} cy={centre.y} r={radius - wall} fill="var(--paper)" />
              <circle cx={centre.x} cy={centre.y} r={radius - wall} fill="var(--water-fill)" />
              <text x={centre.x} y={2 * radius + 24} textAnchor="middle" fontSize="15" fill="var(--ink-2)">
                SDR {say(short(sdr), 'ratio')}
              </text>
              <Bars bars={bars} x={at.x} y={at.y} width={width - at.x - 2} />
            </g>
          ),
        }
      }}
    />
  )
}
