import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../index.ts'
import { outside } from '../testing/outside-check.ts'

const gallon = 3.785411784e-3

describe('flow-by-bucket', () => {
  outside(
    'published',
    'Y. A. Çengel & J. M. Cimbala, Fluid Mechanics, 2nd ed., 2010, example 5-1 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions)',
    '10 US gallons in 50 s',
    () => expect(calculate('flow-by-bucket', { volume: 10 * gallon, times: [50] }).flow).toBeCloseTo(0.757e-3, 6),
  )

  outside(
    'derived',
    'standard deviation of the mean written out by hand from JCGM 100:2008, 4.2.3',
    '10, 11 and 12 s',
    () => {
      // Mean 11, deviations −1, 0, 1: s = 1, and 1/√3 of the mean.
      const { flow, meanTime, standardUncertainty } = calculate('flow-by-bucket', { volume: 0.11, times: [10, 11, 12] })
      expect(meanTime).toBeCloseTo(11, 12)
      expect(flow).toBeCloseTo(0.01, 12)
      expect(standardUncertainty).toBeCloseTo(0.01 / (11 * Math.sqrt(3)), 12)
    },
  )

  outside(
    'derived',
    'law of propagation for a quotient, JCGM 100:2008, 5.1.6',
    'the volume’s share joins by squares',
    () => {
      const timings = calculate('flow-by-bucket', { volume: 0.09, times: [14.1, 14.4, 13.9, 14.2] })
      const both = calculate('flow-by-bucket', {
        volume: 0.09,
        times: [14.1, 14.4, 13.9, 14.2],
        volumeUncertainty: 0.0018,
      })
      const [flow, a, ab] = [both.flow, timings.standardUncertainty, both.standardUncertainty] as [
        number,
        number,
        number,
      ]
      expect((ab / flow) ** 2).toBeCloseTo((a / flow) ** 2 + 0.02 ** 2, 12)
    },
  )

  test('one timing has no uncertainty of its own', () => {
    const { outputs, cautions } = solve('flow-by-bucket', { volume: 0.02, times: [3.2], volumeUncertainty: 0.001 })
    expect(outputs).not.toHaveProperty('standardUncertainty')
    expect(cautions.map(({ say }) => say).join(' ')).toMatch(/larger vessel.*three times/s)
  })

  test.each([
    [{ volume: 0.02, times: [] }, 'missing', 'times'],
    [{ volume: 0.02, times: [10, -1] }, 'out-of-range', 'times[1]'],
    [{ volume: 0.02, times: [10, Number.NaN] }, 'not-finite', 'times[1]'],
    [{ volume: 0.02, times: 10 }, 'not-finite', 'times'],
  ])('refuses %o', (inputs, code, field) => {
    expect(() => calculate('flow-by-bucket', inputs)).toThrowError(expect.objectContaining({ code, field }) as Error)
  })

  test('the flow does not depend on the order of the timings', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 1, max: 500, noNaN: true }), { minLength: 1, maxLength: 20 }), (times) => {
        const there = calculate('flow-by-bucket', { volume: 0.05, times }).flow as number
        const back = calculate('flow-by-bucket', { volume: 0.05, times: times.toReversed() }).flow as number
        expect(back / there).toBeCloseTo(1, 12)
      }),
    )
  })
})
