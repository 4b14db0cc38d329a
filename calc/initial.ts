import type { CalculatorDefinition, Inputs } from './definition.ts'

/** What a calculator's form shows first: the initial values of its inputs, SI. */
export const initialInputs = ({ inputs }: CalculatorDefinition): Inputs =>
  Object.fromEntries(
    Object.entries(inputs).flatMap(([key, { initial }]) => (initial === undefined ? [] : [[key, initial]])),
  )
