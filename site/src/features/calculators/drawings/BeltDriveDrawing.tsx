import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { scalar, type DrawingProps } from './Drawing.tsx'

const top = 34

/** Both pulleys and the belt around them, to one scale. */
export function BeltDriveDrawing({ given, found }: DrawingProps) {
  const driver = scalar(given, 'driverDiameter')!
  const driven = scalar(found, 'drivenDiameter')!
  const apart = scalar(given, 'centreDistance')!
  const wrap = scalar(found, 'wrapAngle')!
  const turns = (speed: number) => join(format(speed, 'rotation'))
  const words = {
    belt: `belt ${join(format(scalar(found, 'beltLength')!, 'length', { digits: 4 }))}`,
    wrap: `wrap ${join(format(wrap, 'angle'))}`,
    driver: [`driver ${say(driver, 'length')}`, turns(scalar(given, 'driverSpeed')!)],
    driven: [`driven ${join(format(driven, 'length'))}`, turns(scalar(found, 'drivenSpeed')!)],
  }
  /** The straight parts touch the pulleys this far off the upright, towards the smaller one. */
  const lean = ((180 - wrap) / 2) * (Math.PI / 180) * (driver > driven ? 1 : -1)

  return (
    <Framed
      name={`Belt drive: ${words.driver.join(' at ')}, ${words.driven.join(' at ')}; ${words.belt}, ${words.wrap} of the smaller pulley`}
      draw={(width) => {
        const tallest = isNarrow(width) ? 130 : 190
        const pixelsPerMetre = Math.min(
          (width - 12) / (apart + (driver + driven) / 2),
          tallest / Math.max(driver, driven),
        )
        const [r1, r2] = [(driver * pixelsPerMetre) / 2, (driven * pixelsPerMetre) / 2]
        const half = Math.max(r1, r2)
        const y = top + half + 4
        const x1 = (width - apart * pixelsPerMetre - r1 - r2) / 2 + r1
        const x2 = x1 + apart * pixelsPerMetre
        const touch = (x: number, r: number, way: number) => `${x + r * Math.sin(lean)} ${y + way * r * Math.cos(lean)}`
        const foot = y + half + 30
        return {
          height: Math.ceil(foot + 28),
          lines: (
            <g fill="none">
              <path
                d={`M${touch(x1, r1, -1)}L${touch(x2, r2, -1)}A${r2} ${r2} 0 ${lean < 0 ? 1 : 0} 1 ${touch(x2, r2, 1)}L${touch(x1, r1, 1)}A${r1} ${r1} 0 ${lean > 0 ? 1 : 0} 1 ${touch(x1, r1, -1)}Z`}
                stroke="var(--ink)"
                strokeWidth="5"
                strokeLinejoin="round"
              />
              {[
                { x: x1, r: r1 },
                { x: x2, r: r2 },
              ].map(({ x, r }) => (
                <g key={x}>
                  <circle cx={x} cy={y} r={Math.max(r - 5, 1)} stroke="var(--ink-2)" strokeWidth="1.5" />
                  <circle cx={x} cy={y} r={Math.min(4, Math.max(r / 3, 1))} fill="var(--ink)" />
                </g>
              ))}
              <path d={`M${x1} ${y}H${x2}`} stroke="var(--ink-2)" strokeDasharray="3 6" />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.belt}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.wrap}
              </text>
              {[0, 1].map((i) => (
                <g key={i} fontSize="15" fill={i === 0 ? 'var(--ink-2)' : 'var(--ink)'}>
                  <text x="0" y={foot + 21 * i}>
                    {words.driver[i]}
                  </text>
                  <text x={width} y={foot + 21 * i} textAnchor="end">
                    {words.driven[i]}
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
