import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { niceBelow, Pinch, scalar, ScaleBar, type DrawingProps } from './Drawing.tsx'

const centre = 92
const height = 204
/** The thickest jet drawn, in pixels; the scale steps down by nice numbers to keep it within. */
const thickest = 64

/** The nozzle and its jet, both to one scale. */
export function JetDrawing({ given, found }: DrawingProps) {
  const nozzle = scalar(found, 'nozzleDiameter')!
  const jet = scalar(found, 'jetDiameter')!
  const jets = scalar(given, 'jetCount') ?? 1
  const words = {
    nozzle: join(format(nozzle, 'length')),
    jet: join(format(jet, 'length')),
    speed: join(format(scalar(found, 'jetVelocity')!, 'velocity')),
  }
  const pixelsPerMetre = niceBelow(thickest / nozzle)
  const bore = (nozzle * pixelsPerMetre) / 2
  const half = (jet * pixelsPerMetre) / 2
  const pipe = Math.min(bore * 2.4, 66)

  return (
    <Framed
      name={`Nozzle of ${words.nozzle}, jet ${words.jet} thick at ${words.speed}, drawn to one scale`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const shoulder = narrow ? 34 : 120
        const mouth = narrow ? 96 : 262
        const between = (shoulder + mouth) / 2
        /** The wall of the nozzle above (−1) or below (1) the centre line, from the pipe to the mouth. */
        const wall = (way: number) =>
          `M0 ${centre + way * pipe}H${shoulder}C${between} ${centre + way * pipe} ${between} ${centre + way * bore} ${mouth} ${centre + way * bore}`
        /** The jet draws in over half a bore behind the mouth. */
        const drawnIn = mouth + bore
        const side = (way: number) =>
          `C${mouth + bore / 2} ${centre + way * half} ${mouth + bore / 2} ${centre + way * half} ${drawnIn} ${centre + way * half}H${width}`
        const upper = `${wall(-1)}${side(-1)}V${centre}H0Z`
        const lower = `${wall(1)}${side(1)}V${centre}H0Z`
        const pinch = narrow ? 190 : 420
        return {
          height,
          lines: (
            <g fill="none">
              <path d={upper + lower} fill="var(--water-fill)" />
              <path
                d={`M${mouth} ${centre - bore}${side(-1)}M${mouth} ${centre + bore}${side(1)}`}
                stroke="var(--water)"
                strokeWidth="2"
              />
              <path d={wall(-1) + wall(1)} stroke="var(--ink)" strokeWidth="5" />
              <Pinch x={pinch} from={centre - half - 1} to={centre + half + 1} />
              <text
                x={pinch}
                y={centre - half - 30}
                textAnchor="middle"
                fontSize="15"
                fontWeight="600"
                fill="var(--ink)"
              >
                jet {words.jet}
              </text>
              <text x={pinch} y={centre + half + 40} textAnchor="middle" fontSize="15" fill="var(--water)">
                {words.speed}
                {jets > 1 && `, one of ${jets}`}
              </text>
              <text
                x={narrow ? 0 : mouth}
                y={182}
                textAnchor={narrow ? 'start' : 'end'}
                fontSize="15"
                fill="var(--ink-2)"
              >
                nozzle {words.nozzle}
              </text>
              <ScaleBar
                x={narrow ? 170 : pinch - 40}
                y={177}
                pixelsPerMetre={pixelsPerMetre}
                longest={narrow ? 44 : 90}
              />
            </g>
          ),
        }
      }}
    />
  )
}
