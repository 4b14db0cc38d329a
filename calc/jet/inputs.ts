import type { Scalar } from '../definition.ts'

/** The whole head at the nozzle, as every calculator of a jet takes it. */
export const netHead = {
  kind: 'scalar',
  symbol: 'H',
  label: 'Net head',
  quantity: 'head',
  help: 'all the head at the nozzle: gauge, speed and height over the jet',
  range: [0.1, 2000],
  usual: [5, 500],
} as const satisfies Scalar

/** The usual range is common practice (no source); worked examples in textbooks go from 0.92 to 0.985. */
export const velocityCoefficient = {
  kind: 'scalar',
  symbol: 'C_v',
  label: 'Velocity coefficient',
  quantity: 'ratio',
  help: 'the share of the ideal speed that a smooth nozzle keeps',
  range: [0.9, 1],
  usual: [0.95, 0.99],
} as const satisfies Scalar

/** Of a nozzle, for the flow that it passes. */
export const dischargeCoefficient = {
  kind: 'scalar',
  symbol: 'C_d',
  label: 'Discharge coefficient',
  quantity: 'ratio',
  help: 'velocity coefficient times contraction coefficient; a hole in a flat plate about 0.6',
  range: [0.3, 1],
  usual: [0.59, 0.99],
} as const satisfies Scalar

/** The bore at a nozzle's mouth. */
export const nozzleDiameter = {
  kind: 'scalar',
  symbol: 'd_n',
  label: 'Nozzle diameter',
  quantity: 'length',
  range: [0.001, 1],
} as const satisfies Scalar
