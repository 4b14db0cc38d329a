import type { ReactNode } from 'react'
import './framed.css'

/** A drawing for one width: a unit is a pixel, so that its texts are as large as they say. */
export interface Sheet {
  height: number
  lines: ReactNode
}

const widths = { narrow: 272, wide: 640 }

/** Whether a sheet is the narrow one. */
export const isNarrow = (width: number): boolean => width === widths.narrow

interface FramedProps {
  /** What the drawing says, numbers and all. */
  name: string
  draw: (width: number) => Sheet
}

/** Draws twice, for a narrow place and for a wide one; the style sheet shows the one that fits the nearest size container. */
export function Framed({ name, draw }: FramedProps) {
  return Object.entries(widths).map(([place, width]) => {
    const { height, lines } = draw(width)
    return (
      <svg
        key={place}
        className={`framed framed-${place}`}
        viewBox={`0 0 ${width} ${height}`}
        role="img"
        aria-label={name}
      >
        {lines}
      </svg>
    )
  })
}
