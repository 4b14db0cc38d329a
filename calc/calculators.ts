import type { CalculatorDefinition } from './definition.ts'
import { jet } from './jet/jet.ts'
import { friction } from './pipe/friction.ts'
import { power } from './water/power.ts'
import { water } from './water/water.ts'

/** Every calculator by its id, in the order of the water. */
export const calculators = {
  water,
  power,
  friction,
  jet,
} as const satisfies Record<string, CalculatorDefinition>

export type CalculatorId = keyof typeof calculators
