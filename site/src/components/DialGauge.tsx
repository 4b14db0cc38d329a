import { scaleLinear } from 'd3-scale'
import './dial-gauge.css'

interface Needle {
  value: number
  /** What is said of it below the dial; a gauge that is to be read says nothing. */
  words?: string
  line?: 'solid' | 'outline'
}

interface DialGaugeProps {
  /** What the drawing says; for a gauge that is to be read, what is needed to read it. */
  name: string
  /** In `unit`, as the needles are. */
  fullScale: number
  unit: string
  needles: readonly Needle[]
}

/** From half past seven round to half past four, as pressure gauges go. */
const sweep = 270
const face = 104
const numbersAt = 66
const size = 224

const point = (radius: number, degrees: number) => {
  const angle = (degrees * Math.PI) / 180
  return { x: radius * Math.sin(angle), y: -radius * Math.cos(angle) }
}
const tick = (degrees: number, length: number) => {
  const [outer, inner] = [point(face - 8, degrees), point(face - 8 - length, degrees)]
  return `M${outer.x} ${outer.y}L${inner.x} ${inner.y}`
}

/** A running needle is filled with water, a second one is an outline: never told apart by colour alone. */
function NeedleShape({ degrees, line }: { degrees: number; line: Needle['line'] }) {
  return (
    <path
      d="M0 14L-5 0L0 -86L5 0Z"
      transform={`rotate(${degrees})`}
      fill={line === 'outline' ? 'var(--paper)' : 'var(--ink)'}
      stroke={line === 'outline' ? 'var(--water)' : 'var(--ink)'}
      strokeWidth={line === 'outline' ? 2 : 1}
      className="gauge-needle"
    />
  )
}

/** A pressure gauge's dial, with one needle or with one for each reading. */
export function DialGauge({ name, fullScale, unit, needles }: DialGaugeProps) {
  const degrees = scaleLinear([0, fullScale], [-sweep / 2, sweep / 2]).clamp(true)
  const numbers = degrees.ticks(6)
  const sayNumber = degrees.tickFormat(6)
  const step = numbers[1]! - numbers[0]!
  const fine = Array.from({ length: Math.round((fullScale / step) * 10) + 1 }, (_, i) => (i * step) / 10)
  return (
    <figure className="dial-gauge">
      <svg
        viewBox={`${-size / 2} ${-size / 2} ${size} ${size}`}
        width={size}
        height={size}
        role="img"
        aria-label={name}
      >
        <circle r={face} fill="var(--paper)" stroke="var(--ink)" strokeWidth="2.5" />
        <path d={fine.map((value) => tick(degrees(value), 7)).join('')} stroke="var(--ink)" strokeWidth="1.2" />
        <path d={numbers.map((value) => tick(degrees(value), 14)).join('')} stroke="var(--ink)" strokeWidth="2.5" />
        {numbers.map((value) => {
          const { x, y } = point(numbersAt, degrees(value))
          return (
            <text key={value} x={x} y={y + 5} textAnchor="middle" fontSize="16" fontWeight="600" fill="var(--ink)">
              {sayNumber(value)}
            </text>
          )
        })}
        <text y="62" textAnchor="middle" fontSize="15" fill="var(--ink-2)">
          {unit}
        </text>
        {needles.map(({ value, line = 'solid' }) => (
          <NeedleShape key={line} degrees={degrees(value)} line={line} />
        ))}
        <circle r="7" fill="var(--ink)" />
      </svg>
      {needles.some(({ words }) => words) && (
        <figcaption>
          {needles.map(
            ({ words, line = 'solid' }) =>
              words && (
                <span key={line}>
                  <svg width="16" height="26" viewBox="-8 -21 16 26" aria-hidden="true">
                    <path
                      d="M0 4L-5 0L0 -19L5 0Z"
                      fill={line === 'outline' ? 'var(--paper)' : 'var(--ink)'}
                      stroke={line === 'outline' ? 'var(--water)' : 'var(--ink)'}
                      strokeWidth="2"
                    />
                  </svg>
                  {words}
                </span>
              ),
          )}
        </figcaption>
      )}
    </figure>
  )
}
