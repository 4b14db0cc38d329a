import type { Rows, Scalar } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { say } from '../units/format.ts'

/** What every calculator of a full pipe asks, said once. Spread it to give it a start value or to make it optional. */

export const grossHead = {
  kind: 'scalar',
  symbol: 'H_g',
  label: 'Gross head',
  quantity: 'head',
  help: 'from the water at the intake to the jet’s centre line',
  range: [0.1, 2000],
  usual: [5, 500],
} as const satisfies Scalar

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

/** Where the pipe lies, from the intake down; heights are above any one level, the same for all. */
export const profile = {
  kind: 'rows',
  label: 'Profile of the pipe',
  row: 'point',
  columns: {
    distance: {
      kind: 'scalar',
      symbol: 's',
      label: 'Distance',
      quantity: 'length',
      range: [0, 200_000],
      unit: 'm',
    },
    elevation: {
      kind: 'scalar',
      symbol: 'z',
      label: 'Height of the pipe',
      quantity: 'head',
      range: [-2000, 9000],
    },
  },
  least: 2,
  most: 500,
} as const satisfies Rows

/** Throws where a wall's roughness would fill the bore. */
export const checkRoughness = (roughness: number, insideDiameter: number): void => {
  if (roughness >= insideDiameter / 2)
    throw new CalculationError(
      'inconsistent',
      'roughness',
      `A roughness of half the inside diameter leaves no pipe. Give the height of the grains on the wall, such as ${say(0.00005, 'length')}.`,
    )
}
