import fc from 'fast-check'

/** How often a property is tried: 200 times, or 10 000 with `DEEP` set. */
export const runs = { numRuns: process.env.DEEP ? 10_000 : 200 }

/** Numbers that fall as often between 1 and 10 as between 10 and 100. */
export const logUniform = (low: number, high: number): fc.Arbitrary<number> =>
  fc
    .double({ min: Math.log(low), max: Math.log(high), noNaN: true })
    .map((x) => Math.min(high, Math.max(low, Math.exp(x))))

export const uniform = (low: number, high: number): fc.Arbitrary<number> =>
  fc.double({ min: low, max: high, noNaN: true })
