import type { Aside } from './formula.ts'

/** A fixed figure: its value in SI, its unit and where it stands. */
export interface Constant {
  value: number
  unit: string
  source: string
}

/** Standard acceleration of free fall. */
export const standardGravity = {
  value: 9.80665,
  unit: 'm/s²',
  source: 'ISO 80000-3 (CGPM 1901)',
} as const satisfies Constant

/** Standard gravity, shortened for formulas. */
export const g = standardGravity.value

/** Standard gravity as a hole in a formula: printed as g, or as its value. */
export const gravity: Aside = { symbol: 'g', value: g, say: 'gravity', digits: 4 }

export const hoursPerYear = { value: 8760, unit: 'h', source: '365 days of 24 hours' } as const satisfies Constant

export const secondsPerHour = 3600

/** Seconds in a year of 365 days. */
export const secondsPerYear = hoursPerYear.value * secondsPerHour

/** Joules in a kilowatt-hour. */
export const joulesPerKilowattHour = 1000 * secondsPerHour
