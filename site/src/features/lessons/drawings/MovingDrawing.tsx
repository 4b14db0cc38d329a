import { useId, type ReactNode } from 'react'
import './drawings.css'

interface Props {
  /** What the slider changes. */
  label: string
  from: number
  to: number
  step: number
  value: number
  onChange: (value: number) => void
  /** The value as people say it: "6 m". */
  said: string
  /** What the drawing shows at this value, in one or two sentences: its name for those who cannot see it. */
  shows: string
  width: number
  height: number
  /** Lines and words. */
  children: ReactNode
  caption: string
}

/** A line drawing that one slider moves. */
export function MovingDrawing({
  label,
  from,
  to,
  step,
  value,
  onChange,
  said,
  shows,
  width,
  height,
  children,
  caption,
}: Props) {
  const id = useId()
  return (
    <div className="moving-drawing">
      <svg viewBox={`0 0 ${width} ${height}`} style={{ maxWidth: width * 1.25 }} role="img" aria-label={shows}>
        {children}
      </svg>
      <div className="moving-drawing-slider">
        <label htmlFor={id}>{label}</label>
        <output htmlFor={id}>{said}</output>
        <input
          id={id}
          type="range"
          min={from}
          max={to}
          step={step}
          value={value}
          aria-valuetext={`${said}. ${shows}`}
          onChange={(event) => onChange(event.currentTarget.valueAsNumber)}
        />
      </div>
      <p className="moving-drawing-caption">{caption}</p>
    </div>
  )
}

/** Slanted strokes for ground and cut metal; `id` is the drawing's own. */
export function Hatch({ id, colour = 'var(--earth)' }: { id: string; colour?: string }) {
  return (
    <pattern id={id} width="9" height="9" patternUnits="userSpaceOnUse" patternTransform="rotate(52)">
      <path d="M0 0V9" stroke={colour} opacity=".45" />
    </pattern>
  )
}
