export type CalculationErrorCode =
  'missing' | 'unknown-key' | 'not-finite' | 'out-of-range' | 'inconsistent' | 'no-solution'

/** Why a calculation was refused: `field` is an input's key, or that key followed by `[i]`, `[i].name` or `.name`. */
export class CalculationError extends Error {
  override readonly name = 'CalculationError'
  constructor(
    readonly code: CalculationErrorCode,
    readonly field: string,
    message: string,
  ) {
    super(message)
  }
}
