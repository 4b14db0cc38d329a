import { graduations, waterLevel } from './staff-gauge.ts'
import './staff-gauge.css'

interface StaffGaugeProps {
  done: number
  of: number
  /** It lies on a wide screen too, where several stand in a list. */
  lies?: boolean
}

/** Progress as the graduated plate in a stream. It stands on a wide screen and lies along the top of a narrow one. */
export function StaffGauge({ done, of, lies = false }: StaffGaugeProps) {
  return (
    <div className={lies ? 'staff-gauge lies' : 'staff-gauge'} role="img" aria-label={`${done} of ${of} lessons done`}>
      {!lies && <Standing done={done} of={of} />}
      <Lying done={done} of={of} />
    </div>
  )
}

const foot = 14

function Standing({ done, of }: StaffGaugeProps) {
  const length = of * 46
  const height = length + 2 * foot
  const { long, short } = graduations(of, length)
  const fromBottom = (at: number) => height - foot - at
  const surface = fromBottom(waterLevel(done, of) * length)
  return (
    <svg className="gauge-standing" width="92" height={height} viewBox={`0 0 92 ${height}`}>
      <g className="gauge-water" style={{ transform: `translateY(${surface}px)` }}>
        <rect width="92" height={height} />
        <path d="M0 0H92" />
      </g>
      <rect className="gauge-plate" x="34" y="2" width="44" height={height - 4} />
      {short.map((at) => (
        <path key={at} className="gauge-short" d={`M78 ${fromBottom(at)}H66`} />
      ))}
      {long.map(({ lesson, at }) => (
        <g key={lesson}>
          <path className="gauge-long" d={`M78 ${fromBottom(at)}H34`} />
          {lesson > 0 && (
            <text x="50" y={fromBottom(at) + 19} textAnchor="middle">
              {lesson}
            </text>
          )}
        </g>
      ))}
    </svg>
  )
}

function Lying({ done, of }: StaffGaugeProps) {
  const length = 272
  const { long, short } = graduations(of, length)
  const fromLeft = (at: number) => 8 + at
  const surface = fromLeft(waterLevel(done, of) * length)
  return (
    <svg className="gauge-lying" viewBox="0 0 288 44">
      <g className="gauge-water" style={{ transform: `translateX(${surface}px)` }}>
        <rect x="-288" width="288" height="44" />
        <path d="M0 0V44" />
      </g>
      <rect className="gauge-plate" x="1" y="6" width="286" height="32" />
      {short.map((at) => (
        <path key={at} className="gauge-short" d={`M${fromLeft(at)} 38V32`} />
      ))}
      {long.map(({ lesson, at }) => (
        <g key={lesson}>
          <path className="gauge-long" d={`M${fromLeft(at)} 38V6`} />
          {lesson > 0 && (
            <text x={fromLeft(at) - length / of / 2} y="25" textAnchor="middle">
              {lesson}
            </text>
          )}
        </g>
      ))}
    </svg>
  )
}
