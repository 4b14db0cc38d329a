import { expect, test } from 'vitest'
import { expectNear } from '../testing/near.ts'
import { normalPair, seededRandom } from './random.ts'

const draws = 20_000
const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
const list = (random: () => number, length = draws) => Array.from({ length }, random)

test('the same seed gives the same numbers, another seed others', () => {
  expect(list(seededRandom('leat'), 5)).toEqual(list(seededRandom('leat'), 5))
  expect(list(seededRandom('leat'), 5)).not.toEqual(list(seededRandom('leaT'), 5))
  expect(list(seededRandom(''), 5)).not.toEqual(list(seededRandom('0'), 5))
})

test('numbers are even over [0, 1), also across seeds that are near', () => {
  for (const values of [list(seededRandom('even')), Array.from({ length: draws }, (_, i) => seededRandom(`${i}`)())]) {
    expect(values.every((value) => value >= 0 && value < 1)).toBe(true)
    // Five standard deviations of the mean of that many even numbers.
    expectNear(mean(values), 0.5, { absolute: 5 / Math.sqrt(12 * draws) })
    const counts = Array.from({ length: 16 }, () => 0)
    for (const value of values) counts[Math.floor(value * 16)]!++
    const expected = draws / 16
    const chiSquared = counts.reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0)
    // 99.99 % point of chi-squared with 15 degrees of freedom.
    expect(chiSquared).toBeLessThan(44.3)
  }
})

test('pairs are standard normal and independent', () => {
  const random = seededRandom('normal')
  const pairs = Array.from({ length: draws }, () => normalPair(random))
  const of = (value: (pair: [number, number]) => number) => mean(pairs.map(value))
  const five = 5 / Math.sqrt(draws)
  for (const i of [0, 1] as const) {
    expectNear(
      of((pair) => pair[i]),
      0,
      { absolute: five },
    )
    expectNear(
      of((pair) => pair[i] ** 2),
      1,
      { absolute: five * Math.SQRT2 },
    )
    // Within one standard deviation: 68.27 %.
    expectNear(
      of((pair) => (Math.abs(pair[i]) < 1 ? 1 : 0)),
      0.6827,
      { absolute: five / 2 },
    )
  }
  expectNear(
    of(([a, b]) => a * b),
    0,
    { absolute: five },
  )
})

test('no draw is infinite, though the random number be nought', () => {
  expect(normalPair(() => 0).every(Number.isFinite)).toBe(true)
  expect(normalPair(() => 1 - 2 ** -32).every(Number.isFinite)).toBe(true)
})
