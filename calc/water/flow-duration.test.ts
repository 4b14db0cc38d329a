import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { exampleYear, flashyYear } from './example-record.ts'

interface Found {
  meanFlow: number
  q10: number
  q50: number
  q80: number
  q95: number
  q95OverMean: number
  curve: readonly { exceedance: number; flow: number }[]
}
const duration = (dailyFlows: readonly number[]) => calculate('flow-duration', { dailyFlows }) as unknown as Found

describe('flow-duration', () => {
  outside(
    'published',
    'Solutions to a hydrology laboratory (CEIE 340), yearly flows 1955–1973 with their Weibull plotting positions, coursehero.com/file/5662332',
    'nineteen flows fall on whole twentieths',
    () => {
      const { q10, q50, q80, q95, curve } = duration([
        10.2, 26, 31, 3.7, 6.8, 3.2, 3.1, 28.7, 6.3, 10.4, 51.2, 4.7, 14.9, 3.6, 20.2, 11.3, 9.4, 50, 11.5,
      ])
      // The print ranks from the least: 90, 50, 20 and 5 % are not passed.
      expectNear(q10, 50, { relative: 1e-12 })
      expectNear(q50, 10.4, { relative: 1e-12 })
      expectNear(q80, 3.7, { relative: 1e-12 })
      expectNear(q95, 3.1, { relative: 1e-12 })
      expect(curve.map(({ flow }) => flow)).toEqual([
        51.2, 50, 31, 28.7, 26, 20.2, 14.9, 11.5, 11.3, 10.4, 10.2, 9.4, 6.8, 6.3, 4.7, 3.7, 3.6, 3.2, 3.1,
      ])
      curve.forEach(({ exceedance }, i) => expectNear(exceedance, 0.05 * (i + 1), { relative: 1e-12 }))
    },
  )

  const sampled = [
    105, 129, 87, 86, 111, 111, 89, 81, 108, 92, 110, 100, 75, 105, 103, 109, 76, 119, 99, 91, 103, 129, 106, 101, 84,
    111, 74, 87, 86, 103, 103, 106, 86, 111, 75, 87, 102, 121, 111, 88, 89, 101, 106, 95, 103, 107, 101, 81, 109, 104,
  ]
  outside(
    'library',
    'Python 3.11 statistics.quantiles(data, n=20), method “exclusive” (i/(n + 1), linear), on the fifty data of its manual',
    'cut points 18, 10, 4 and 1 of 20',
    () => {
      const { meanFlow, q10, q50, q80, q95, q95OverMean } = duration(sampled)
      expectNear(meanFlow, 99.12, { relative: 1e-12 })
      expectNear(q10, 111, { relative: 1e-12 })
      expectNear(q50, 102.5, { relative: 1e-12 })
      expectNear(q80, 86.2, { relative: 1e-12 })
      expectNear(q95, 75, { relative: 1e-12 })
      expectNear(q95OverMean, 75 / 99.12, { relative: 1e-12 })
    },
  )
  outside(
    'derived',
    'flows that fall evenly with their rank: the curve must be the straight line itself',
    'ten years of them, at every whole per cent',
    () => {
      const days = 3653
      const { curve, q95, meanFlow } = duration(Array.from({ length: days }, (_, i) => i + 1))
      // Rank m from the top has the flow n + 1 − m, so that Q(p) = (n + 1)(1 − p).
      for (const { exceedance, flow } of curve) expectNear(flow, (days + 1) * (1 - exceedance), { relative: 1e-9 })
      expectNear(q95, (days + 1) * 0.05, { relative: 1e-9 })
      expectNear(meanFlow, (days + 1) / 2, { relative: 1e-12 })
    },
  )
  outside(
    'derived',
    'counting, as the words say it: so many days reach or pass the flow',
    'no more than share × (n + 1) days are above, no fewer reach it',
    () => {
      for (const year of [exampleYear, flashyYear])
        for (const { exceedance, flow } of duration(year).curve) {
          const rank = exceedance * (year.length + 1)
          expect(year.filter((day) => day > flow).length).toBeLessThanOrEqual(rank + 1e-9)
          expect(year.filter((day) => day >= flow).length).toBeGreaterThanOrEqual(Math.floor(rank - 1e-9))
        }
    },
  )

  const records = fc.array(logUniform(1e-5, 10), { minLength: 19, maxLength: 150 })
  test('neither the order of the days nor their unit changes the curve', () => {
    fc.assert(
      fc.property(records, logUniform(0.1, 10), (flows, unit) => {
        const here = duration(flows)
        expect(duration(flows.toReversed()).curve).toEqual(here.curve)
        const there = duration(flows.map((flow) => flow * unit))
        for (const key of ['q10', 'q50', 'q80', 'q95', 'meanFlow'] as const)
          expectNear(there[key], here[key] * unit, { relative: 1e-12 })
        expectNear(there.q95OverMean, here.q95OverMean, { relative: 1e-12 })
      }),
      runs,
    )
  })
  test('the curve never rises, starts at the greatest and ends at the least day', () => {
    fc.assert(
      fc.property(records, (flows) => {
        const { curve, q10, q50, q80, q95 } = duration(flows)
        const isFalling = curve
          .slice(1)
          .every(({ exceedance, flow }, i) => exceedance > curve[i]!.exceedance && flow <= curve[i]!.flow)
        expect(isFalling).toBe(true)
        expect(curve[0]).toEqual({ exceedance: 1 / (flows.length + 1), flow: Math.max(...flows) })
        expect(curve.at(-1)).toEqual({ exceedance: flows.length / (flows.length + 1), flow: Math.min(...flows) })
        expect(q10 >= q50 && q50 >= q80 && q80 >= q95).toBe(true)
      }),
      runs,
    )
  })
  test('a short record is drawn day by day, a long one at whole per cents', () => {
    const curveOf = (days: number) => duration(Array.from({ length: days }, (_, i) => 1 + (i % 7))).curve
    expect(curveOf(19)).toHaveLength(19)
    expect(curveOf(99).map(({ exceedance }) => exceedance)).toEqual(Array.from({ length: 99 }, (_, i) => (i + 1) / 100))
    expect(curveOf(100)).toHaveLength(101)
    expect(curveOf(40_000)).toHaveLength(101)
  })

  test('refuses what has no Q95', () => {
    expectRefusal('no-solution', 'dailyFlows', () => duration(exampleYear.slice(0, 18)))
    expectRefusal('no-solution', 'dailyFlows', () => duration([0.01]))
    expectRefusal('no-solution', 'dailyFlows', () => duration(Array.from({ length: 365 }, () => 0)))
    expectRefusal('missing', 'dailyFlows', () => duration([]))
    expectRefusal('out-of-range', 'dailyFlows[1]', () => duration([0.1, -0.1]))
  })

  const said = (dailyFlows: readonly number[]) =>
    solve('flow-duration', { dailyFlows })
      .cautions.map(({ say }) => say)
      .join(' ')
  test('says what a short record is worth, and when a stream is flashy', () => {
    expect(said(exampleYear.slice(0, 364))).toMatch(/less than a year/)
    expect(said(exampleYear)).toMatch(/One dry or wet year/)
    expect(said(exampleYear)).not.toMatch(/less than a year|flashy/)
    expect(said(Array.from({ length: 10 }, () => exampleYear).flat())).not.toMatch(/One dry or wet year/)
    expect(said(flashyYear)).toMatch(/flashy/)
  })
})
