import type { Table } from './table.ts'

const bar = 1e5

/** Full scales in bar, in the steps 1, 1.6, 2.5, 4, 6: EN 837-1:1996, recalled and not read. */
const fullScales = [0.6, 1, 1.6, 2.5, 4, 6, 10, 16, 25, 40, 60, 100, 160, 250, 400] as const

/** Greatest error, as a share of the span: EN 837-1:1996, table 11. */
export const accuracyClasses = [0.1, 0.25, 0.6, 1, 1.6, 2.5, 4] as const

/** Highest working pressure, as a share of the full scale: EN 837-2:1997, recalled and not read. */
export const shareOfFullScale = { steady: 0.75, fluctuating: 0.65 } as const

const errorOf = (scale: number, accuracyClass: (typeof accuracyClasses)[number]): number =>
  Number(((scale * bar * accuracyClass) / 100).toFixed(3))

export const gauges = {
  id: 'gauges',
  title: 'Pressure gauges',
  say: `Full scales of dial gauges, what they may carry all day, and how far each accuracy class may be wrong anywhere on the scale. Classes are ${accuracyClasses.join(', ')}: per cent of the full scale. Choose so that the static pressure with its surge stays within the limit; what the dial and the maker say rules.`,
  columns: {
    fullScale: { label: 'Full scale', quantity: 'pressure', unit: 'bar' },
    steady: { label: 'Steady, up to', quantity: 'pressure', unit: 'bar' },
    fluctuating: { label: 'Fluctuating, up to', quantity: 'pressure', unit: 'bar' },
    error1: { label: 'Class 1.0 error', quantity: 'pressure', unit: 'bar' },
    error16: { label: 'Class 1.6 error', quantity: 'pressure', unit: 'bar' },
    error25: { label: 'Class 2.5 error', quantity: 'pressure', unit: 'bar' },
  },
  rows: fullScales.map((scale) => ({
    fullScale: scale * bar,
    steady: Number((scale * bar * shareOfFullScale.steady).toFixed(3)),
    fluctuating: Number((scale * bar * shareOfFullScale.fluctuating).toFixed(3)),
    error1: errorOf(scale, 1),
    error16: errorOf(scale, 1.6),
    error25: errorOf(scale, 2.5),
    source:
      'classes: EN 837-1:1996, table 11; full scales: EN 837-1, from memory; working limits: EN 837-2:1997, from memory',
  })),
} as const satisfies Table
