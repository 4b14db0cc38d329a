import type { Scalar } from '../definition.ts'

/** The water's temperature, wherever its density or viscosity counts. Cold stream water is what the default means. */
export const waterTemperature = {
  kind: 'scalar',
  symbol: 't',
  label: 'Water temperature',
  quantity: 'temperature',
  range: [0, 40],
  fallback: 10,
  optional: true,
} as const satisfies Scalar
