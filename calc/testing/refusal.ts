import { expect } from 'vitest'
import { CalculationError, type CalculationErrorCode } from '../errors.ts'

/** Expects the calculation to be refused for this reason at this field. */
export const expectRefusal = (code: CalculationErrorCode, field: string, calculation: () => unknown): void => {
  try {
    calculation()
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error
    expect({ code: error.code, field: error.field }).toEqual({ code, field })
    return
  }
  expect.fail(`should be refused: ${code} at ${field}`)
}
