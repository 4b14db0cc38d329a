import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Push, scalar, type DrawingProps } from './Drawing.tsx'

const thickness = 22

/** The pipe down the hill twice: while it fills and its air leaves, and while it runs empty and air comes in. */
export function FillAndVentDrawing({ given, found }: DrawingProps) {
  const drain = scalar(found, 'drainTime')
  const time = (seconds: number) => join(format(seconds, 'time', { unit: seconds < 120 ? 's' : 'min' }))
  const outflow = scalar(given, 'burstOutflow')
  const pictures = [
    {
      title: `fills in ${time(scalar(found, 'fillTime')!)}`,
      air: `air out ${join(format(scalar(found, 'fillAirVelocity')!, 'velocity'))}`,
      isFilling: true,
    },
    {
      title: drain === undefined ? 'running empty' : `empty in ${time(drain)}`,
      air: `vent lets in ${join(format(scalar(found, 'ventAirFlow')!, 'flow'))}`,
      water: outflow === undefined || outflow === 0 ? undefined : `${join(format(outflow, 'flow'))} out`,
      isFilling: false,
    },
  ]

  return (
    <Framed
      name={`Pipe with a vent at its top: ${pictures.map(({ title, air, water }) => [title, air, water].filter(Boolean).join(', ')).join('; ')}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const wide = narrow ? width : width / 2 - 16
        const step = narrow ? { x: 0, y: 226 } : { x: width / 2 + 16, y: 0 }
        return {
          height: narrow ? 2 * 226 : 226,
          lines: (
            <g fill="none">
              {pictures.map(({ title, air, water, isFilling }, i) => {
                const topOfPipe = { x: 46, y: 104 }
                const foot = { x: wide - 60, y: 190 }
                const middle = { x: (topOfPipe.x + foot.x) / 2, y: (topOfPipe.y + foot.y) / 2 }
                const whole = `M0 ${topOfPipe.y}H${topOfPipe.x}L${foot.x} ${foot.y}H${wide - 8}`
                const wet = `M${middle.x} ${middle.y}L${foot.x} ${foot.y}H${wide - 8}`
                const vent = { x: topOfPipe.x - 6, y: topOfPipe.y - thickness / 2 }
                return (
                  <g key={title} transform={`translate(${i * step.x} ${i * step.y})`}>
                    <path d={`M${vent.x} ${vent.y}V${vent.y - 26}`} stroke="var(--ink)" strokeWidth="10" />
                    <path d={whole} stroke="var(--ink)" strokeWidth={thickness + 5} strokeLinejoin="round" />
                    <path d={whole} stroke="var(--paper)" strokeWidth={thickness} strokeLinejoin="round" />
                    <path d={wet} stroke="var(--water-fill)" strokeWidth={thickness} strokeLinejoin="round" />
                    <path d={`M${vent.x} ${vent.y + 4}V${vent.y - 28}`} stroke="var(--paper)" strokeWidth="5" />
                    <Push
                      from={{ x: vent.x, y: isFilling ? vent.y - 30 : vent.y - 64 }}
                      to={{ x: vent.x, y: isFilling ? vent.y - 64 : vent.y - 30 }}
                      colour="var(--ink-2)"
                    />
                    {!isFilling && (
                      <Push from={{ x: wide - 56, y: foot.y }} to={{ x: wide, y: foot.y }} colour="var(--water)" />
                    )}
                    <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                      {title}
                    </text>
                    <text x={vent.x + 18} y={vent.y - 40} fontSize="15" fill="var(--ink-2)">
                      {air}
                    </text>
                    {water && (
                      <text x={wide} y={foot.y + 32} textAnchor="end" fontSize="15" fill="var(--water)">
                        {water}
                      </text>
                    )}
                  </g>
                )
              })}
            </g>
          ),
        }
      }}
    />
  )
}
