import { UntilReady } from '../../../components/UntilReady.tsx'
import { useId, type ReactNode } from 'react'
import './drawings.css'

interface SliderProps {
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
  caption: string
}

interface Props extends SliderProps {
  width: number
  height: number
  /** Lines and words. */
  children: ReactNode
}

/** A line drawing that one slider moves. */
export function MovingDrawing({ width, height, children, ...slider }: Props) {
  return (
    <WithSlider {...slider}>
      <svg viewBox={`0 0 ${width} ${height}`} style={{ maxWidth: width * 1.1 }} role="img" aria-label={slider.shows}>
        {children}
      </svg>
    </WithSlider>
  )
}

/** Any picture that one slider moves; the picture brings its own name. */
export function WithSlider({
  label,
  from,
  to,
  step,
  value,
  onChange,
  said,
  shows,
  caption,
  children,
}: SliderProps & { children: ReactNode }) {
  const id = useId()
  return (
    <div className="moving-drawing">
      {children}
      <div className="moving-drawing-slider">
        <label htmlFor={id}>{label}</label>
        <output htmlFor={id}>{said}</output>
        <UntilReady>
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
        </UntilReady>
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
