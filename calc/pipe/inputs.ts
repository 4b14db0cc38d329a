import type { Scalar } from '../definition.ts'

/** What every calculator of a full pipe asks, said once. Spread it to give it a start value or to make it optional. */

export const flow = {
  kind: 'scalar',
  symbol: 'Q',
  label: 'Flow',
  quantity: 'flow',
  range: [0, 1000],
} as const satisfies Scalar

export const insideDiameter = {
  kind: 'scalar',
  symbol: 'D',
  label: 'Inside diameter',
  quantity: 'length',
  help: 'the bore: outside diameter less two walls',
  range: [0.001, 20],
  usual: [0.02, 2],
  pick: { table: 'pe-pipe', column: 'insideDiameter' },
} as const satisfies Scalar

export const pipeLength = {
  kind: 'scalar',
  symbol: 'L',
  label: 'Length',
  quantity: 'length',
  help: 'along the pipe, not along the map',
  range: [0.001, 1e6],
  unit: 'm',
} as const satisfies Scalar

export const roughness = {
  kind: 'scalar',
  symbol: '\\varepsilon',
  label: 'Roughness',
  quantity: 'length',
  help: 'of the wall in service, with joints and film: polyethylene 0.05 mm',
  range: [0, 0.05],
  usual: [1.5e-6, 3e-3],
  unit: 'mm',
  pick: { table: 'roughness', column: 'roughness' },
} as const satisfies Scalar
