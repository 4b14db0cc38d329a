/** The library by the calculators' ids: it holds them all, so that what needs only one in a browser takes its definition instead. */
import { calculators, type CalculatorId } from './calculators.ts'
import type { CalculatorDefinition, Inputs, Outputs } from './definition.ts'
import { calculateDefinition, solveDefinition, type Solution } from './solve-definition.ts'
import {
  monteCarloOf,
  uncertaintyOf,
  type Sampled,
  type Sampling,
  type StandardUncertainties,
  type Uncertain,
} from './uncertainty.ts'

const isKnown = (id: string): id is CalculatorId => Object.hasOwn(calculators, id)

/** The definition with this id; throws a RangeError for an id that there is not. */
export const calculator = (id: string): CalculatorDefinition => {
  if (!isKnown(id)) throw new RangeError(`There is no calculator “${id}”.`)
  return calculators[id]
}

/** Checks and solves, without working or cautions. Throws `CalculationError` for bad input. */
export const calculate = (id: string, inputs: unknown): Outputs => calculateDefinition(calculator(id), inputs)

/**
 * Solves a calculator by its id: outputs in SI under the keys of its definition, the printed working, the cautions (worst first).
 * Throws `CalculationError` for bad input.
 */
export const solve = (id: string, inputs: unknown): Solution => solveDefinition(calculator(id), inputs)

/** As `uncertaintyOf`, by id. */
export const withUncertainty = (
  id: string,
  inputs: Inputs,
  standardUncertainties: StandardUncertainties,
): { outputs: Record<string, Uncertain> } => uncertaintyOf(calculator(id), inputs, standardUncertainties)

/** As `monteCarloOf`, by id. */
export const monteCarlo = (
  id: string,
  inputs: Inputs,
  standardUncertainties: StandardUncertainties,
  sampling: Sampling,
): Sampled => monteCarloOf(calculator(id), inputs, standardUncertainties, sampling)
