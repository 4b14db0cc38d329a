import { calculate, type CalculatorId, type Inputs } from '#calc/index.ts'

/** A calculator's scalar results, for a drawing: its numbers come from nowhere else. */
export const figures = <K extends string>(id: CalculatorId, inputs: Inputs): Record<K, number> =>
  calculate(id, inputs) as Record<K, number>
