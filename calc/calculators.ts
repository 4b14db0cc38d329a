import type { CalculatorDefinition } from './definition.ts'
import { jet } from './jet/jet.ts'

/** Every calculator by its id, in the order of the water. */
export const calculators = {
  jet,
} as const satisfies Record<string, CalculatorDefinition>

export type CalculatorId = keyof typeof calculators
