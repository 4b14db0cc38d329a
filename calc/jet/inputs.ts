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
