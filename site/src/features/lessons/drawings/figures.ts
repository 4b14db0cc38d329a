import type { CalculatorDefinition, Inputs, Output } from '#calc/index.ts'
import { calculateDefinition } from '#calc/solve-definition.ts'

/** A calculator's scalar results, for a drawing: its numbers come from nowhere else. */
export const figures = <O extends Record<string, Output>>(
  definition: CalculatorDefinition & { outputs: O },
  inputs: Inputs,
): Record<Extract<keyof O, string>, number> =>
  calculateDefinition(definition, inputs) as Record<Extract<keyof O, string>, number>
