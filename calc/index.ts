/** The library's public entry. */
export { calculators, type CalculatorId } from './calculators.ts'
export { CalculationError, type CalculationErrorCode } from './errors.ts'
export { calculate, calculator, monteCarlo, solve, withUncertainty } from './solve.ts'
export {
  calculateScheme,
  schemeUncertainty,
  solveScheme,
  type SchemeInputs,
  type SchemeSolution,
} from './scheme/scheme.ts'
export type { Solution } from './solve-definition.ts'
export type { StandardUncertainties } from './uncertainty.ts'
export type { PrintedStep } from './print.ts'
export type {
  CalculatorDefinition,
  Caution,
  Cell,
  Columns,
  Hazard,
  Input,
  Inputs,
  InputValue,
  Output,
  Outputs,
  PlainRow,
  PlainValue,
  Quantity,
  Station,
} from './definition.ts'
