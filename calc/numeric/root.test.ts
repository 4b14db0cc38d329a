import fc from 'fast-check'
import { expect, test } from 'vitest'
import { expectNear } from '../testing/near.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { bracketedRoot } from './root.ts'

test('finds roots that are known in closed form', () => {
  expectNear(
    bracketedRoot((x) => x * x - 2, 0, 2),
    Math.SQRT2,
    { relative: 1e-12 },
  )
  expectNear(
    bracketedRoot((x) => Math.cos(x), 1, 2),
    Math.PI / 2,
    { relative: 1e-12 },
  )
  expectNear(
    bracketedRoot((x) => Math.exp(x) - 10, -5, 5),
    Math.LN10,
    { relative: 1e-12 },
  )
  // The Dottie number, cos x = x (OEIS A003957).
  expectNear(
    bracketedRoot((x) => Math.cos(x) - x, 0, 1),
    0.7390851332151607,
    { relative: 1e-12 },
  )
})

test('takes flat and steep functions, either way up, and ends in either order', () => {
  fc.assert(
    fc.property(
      logUniform(1e-3, 1e3),
      fc.constantFrom(1, 2, 3, 5, 9),
      uniform(0.1, 5),
      fc.constantFrom(1, -1),
      fc.boolean(),
      (root, power, width, sign, turned) => {
        const f = (x: number) => sign * Math.sign(x - root) * Math.abs(x - root) ** power
        const ends = [root * (1 - width * 0.2), root * (1 + width)] as const
        const found = turned ? bracketedRoot(f, ends[1], ends[0]) : bracketedRoot(f, ends[0], ends[1])
        expectNear(found, root, { relative: 1e-10 })
      },
    ),
    runs,
  )
})

test('keeps within a few evaluations on a smooth function', () => {
  let calls = 0
  bracketedRoot(
    (x) => {
      calls++
      return x ** 3 - 2 * x - 5
    },
    2,
    3,
  )
  expect(calls).toBeLessThan(12)
})

test('gives an end that is the root, and nothing without a change of sign', () => {
  expect(bracketedRoot((x) => x - 1, 1, 4)).toBe(1)
  expect(bracketedRoot((x) => x - 4, 1, 4)).toBe(4)
  expect(bracketedRoot((x) => x * x + 1, -1, 1)).toBeUndefined()
  expect(bracketedRoot(() => NaN, -1, 1)).toBeUndefined()
})
