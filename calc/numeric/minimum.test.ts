import fc from 'fast-check'
import { expect, test } from 'vitest'
import { expectNear } from '../testing/near.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { bracketedMinimum } from './minimum.ts'

test('finds minima that are known in closed form', () => {
  // x ln x is least at 1/e; x + 1/x at 1; the parabola at its vertex.
  expectNear(
    bracketedMinimum((x) => x * Math.log(x), 0.01, 3),
    1 / Math.E,
    { relative: 1e-7 },
  )
  expectNear(
    bracketedMinimum((x) => x + 1 / x, 0.1, 10),
    1,
    { relative: 1e-7 },
  )
  expectNear(
    bracketedMinimum((x) => (x - 0.3) ** 2, 0, 1),
    0.3,
    { relative: 1e-7 },
  )
})

test('finds the minimum of a sum of powers, as of pipe and of loss', () => {
  fc.assert(
    fc.property(logUniform(1e-2, 1e2), logUniform(1e-2, 1e2), uniform(1, 2), (a, b, exponent) => {
      // a·x^n + b/x⁵ is least at (5b/(a·n))^(1/(n+5)).
      const least = ((5 * b) / (a * exponent)) ** (1 / (exponent + 5))
      const found = bracketedMinimum((x) => a * x ** exponent + b / x ** 5, least / 20, least * 20)
      expectNear(found, least, { relative: 1e-6 })
    }),
    runs,
  )
})

test('stays at the end where the function falls to', () => {
  expectNear(
    bracketedMinimum((x) => x, 1, 2),
    1,
    { absolute: 1e-6 },
  )
  expectNear(
    bracketedMinimum((x) => -x, 1, 2),
    2,
    { absolute: 1e-6 },
  )
  expect(bracketedMinimum(() => 7, 1, 2)).toBeGreaterThanOrEqual(1)
})
