import { memo } from 'react'

const width = 300
const height = 56

/** The run of a record at a glance: of each stretch that falls on one pixel, from its least to its most. */
export const SparkLine = memo(function SparkLine({ values }: { values: readonly number[] }) {
  if (values.length < 2) return null
  const highest = values.reduce((most, value) => Math.max(most, value), 0)
  const columns = Math.min(width, values.length)
  const y = (value: number) => (height - 2 - ((height - 6) * value) / (highest || 1)).toFixed(1)
  const path = Array.from({ length: columns }, (_, i) => {
    const part = values.slice(
      Math.floor((i * values.length) / columns),
      Math.max(Math.floor(((i + 1) * values.length) / columns), Math.floor((i * values.length) / columns) + 1),
    )
    const x = ((i + 0.5) * width) / columns
    return `${i === 0 ? 'M' : 'L'}${x.toFixed(1)} ${y(Math.min(...part))}L${x.toFixed(1)} ${y(Math.max(...part))}`
  }).join('')
  return (
    <svg className="spark-line" viewBox={`0 0 ${width} ${height}`} preserveAspectRatio="none" aria-hidden="true">
      <path d={path} fill="none" stroke="var(--water)" strokeWidth="1.5" vectorEffect="non-scaling-stroke" />
    </svg>
  )
})
