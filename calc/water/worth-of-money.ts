import type { Scalar } from '../definition.ts'

/** What every calculator of money over years asks and uses, said once. Money is in whatever currency the prices are. */

export const price = {
  kind: 'scalar',
  symbol: 'c',
  label: 'Price of a kilowatt-hour',
  quantity: 'pricePerKwh',
  help: 'what you would pay for it otherwise, or what you are paid',
  range: [0, 1e6],
  initial: 0.24,
} as const satisfies Scalar

export const lifeYears = {
  kind: 'scalar',
  symbol: 'n',
  label: 'Years counted',
  quantity: 'years',
  range: [1, 200],
  usual: [5, 60],
  whole: true,
  initial: 25,
} as const satisfies Scalar

export const discountRate = {
  kind: 'scalar',
  symbol: 'i',
  label: 'Discount rate',
  quantity: 'fraction',
  help: 'what the money would bring elsewhere, less inflation where prices are today’s',
  range: [0, 1],
  usual: [0, 0.15],
  initial: 0.05,
} as const satisfies Scalar

/**
 * What one unit of money at each year's end for so many years is worth today: (1 − (1 + r)⁻ⁿ)/r, and n itself without interest. Written so
 * that a rate close to nothing loses no digits.
 */
export const presentWorthOfYearly = (rate: number, years: number): number =>
  rate === 0 ? years : -Math.expm1(-years * Math.log1p(rate)) / rate
