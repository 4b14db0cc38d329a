import { expect } from 'vitest'

/** Expects a number within a share of the expected one, or within an absolute distance where that is larger. */
export const expectNear = (
  actual: number | undefined,
  expected: number,
  { relative = 0, absolute = 0 }: { relative?: number; absolute?: number },
): void => {
  const allowed = Math.max(relative * Math.abs(expected), absolute)
  const off = actual === undefined ? Infinity : Math.abs(actual - expected)
  expect(off, `${actual} should be ${expected} within ${allowed}`).toBeLessThanOrEqual(allowed)
}
