import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Arrow, Dimension, scalar, type DrawingProps } from './Drawing.tsx'

/** Drawn where the number of buckets is not worked out. */
const anyBuckets = 18
const largestRadius = 104

/** The runner on its pitch circle with the jet on it, to one scale, and the speeds of jet and bucket as arrows to another. */
export function RunnerDrawing({ given, found }: DrawingProps) {
  const bucketSpeed = scalar(found, 'bucketSpeed')!
  const jetSpeed = bucketSpeed / scalar(given, 'speedRatio')!
  const pitch = scalar(found, 'pitchDiameter')!
  const jet = scalar(given, 'jetDiameter')
  const buckets = scalar(found, 'bucketCount') ?? anyBuckets
  const words = {
    jet: `jet ${join(format(jetSpeed, 'velocity'))}`,
    bucket: `bucket ${join(format(bucketSpeed, 'velocity'))}`,
    pitch: join(format(pitch, 'length')),
    turns: join(format(scalar(found, 'speed')!, 'rotation')),
  }
  // A wheel of 0.2 m is drawn at half of the largest; however large, it keeps its place.
  const radius = 34 + ((largestRadius - 34) * pitch) / (pitch + 0.2)
  const thickness = jet === undefined ? 4 : Math.max((jet / pitch) * 2 * radius, 2)
  // A usual bucket is about three jets wide (common practice, no source).
  const depth = Math.min(Math.max(1.4 * thickness, 9), radius * 0.35)

  return (
    <Framed
      name={`Runner with a pitch circle of ${words.pitch} at ${words.turns}; ${words.jet}, ${words.bucket}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const centre = { x: narrow ? 150 : 220, y: largestRadius + 26 }
        const strike = centre.y + radius
        const foot = centre.y + largestRadius + 22
        const speedsAt = narrow ? { x: 0, y: foot + 24 } : { x: 400, y: 96 }
        const longest = width - speedsAt.x
        return {
          height: narrow ? foot + 116 : foot + 10,
          lines: (
            <g fill="none">
              <path d={`M0 ${strike}H${centre.x - depth / 2}`} stroke="var(--water-fill)" strokeWidth={thickness} />
              <path
                d={`M0 ${strike - thickness / 2}H${centre.x - depth / 2}M0 ${strike + thickness / 2}H${centre.x - depth / 2}`}
                stroke="var(--water)"
                strokeWidth="1.5"
              />
              {Array.from({ length: Math.min(buckets, 60) }, (_, i) => (
                <path
                  key={i}
                  d={`M${centre.x} ${strike - depth}C${centre.x + depth * 0.7} ${strike - depth} ${centre.x + depth * 0.7} ${strike + depth} ${centre.x} ${strike + depth}`}
                  transform={`rotate(${(360 / buckets) * i} ${centre.x} ${centre.y})`}
                  stroke="var(--ink)"
                  strokeWidth="2"
                />
              ))}
              <circle
                cx={centre.x}
                cy={centre.y}
                r={Math.max(radius - depth - 4, 4)}
                fill="var(--paper)"
                stroke="var(--ink)"
                strokeWidth="2.5"
              />
              <circle
                cx={centre.x}
                cy={centre.y}
                r={radius}
                stroke="var(--brass)"
                strokeWidth="1.5"
                strokeDasharray="6 5"
              />
              <circle cx={centre.x} cy={centre.y} r="4" fill="var(--ink)" />
              <Dimension x={centre.x + radius + depth + 12} from={centre.y - radius} to={centre.y + radius} />
              <text x="0" y="16" fontSize="15" fill="var(--ink-2)">
                pitch circle {words.pitch}
              </text>
              <text x={width} y={16} textAnchor="end" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.turns}
              </text>
              <text x={speedsAt.x} y={speedsAt.y} fontSize="15" fill="var(--water)">
                {words.jet}
              </text>
              <Arrow x={speedsAt.x} y={speedsAt.y + 18} length={longest} colour="var(--water)" />
              <text x={speedsAt.x} y={speedsAt.y + 60} fontSize="15" fill="var(--ink)">
                {words.bucket}
              </text>
              <Arrow
                x={speedsAt.x}
                y={speedsAt.y + 78}
                length={(longest * bucketSpeed) / jetSpeed}
                colour="var(--ink)"
              />
            </g>
          ),
        }
      }}
    />
  )
}
