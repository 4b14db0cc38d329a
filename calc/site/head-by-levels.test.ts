import fc from 'fast-check'
import { mean, std } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs as deep, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const levels = (runs: readonly (readonly number[])[]) => calculate('head-by-levels', { runs })

describe('head-by-levels', () => {
  outside(
    'published',
    'Papua New Guinea University of Technology, Department of Surveying and Land Studies, lecture on level books',
    'from mark to mark by three set-ups',
    () => {
      // Back sights 6.482, 5.844, 4.298; fore sights 2.159, 7.318, 4.264; printed difference 2.883.
      const rises = [6.482 - 2.159, 5.844 - 7.318, 4.298 - 4.264]
      expect(levels([rises]).grossHead).toBeCloseTo(2.883, 9)
    },
  )
  outside('library', 'mathjs 15.2.0, mean and std of the sums', 'five runs', () => {
    const sums = [41.32, 41.18, 41.41, 41.26, 41.05]
    const { grossHead, standardUncertainty } = levels(sums.map((sum) => [sum - 20, 20]))
    expect(grossHead).toBeCloseTo(mean(sums), 10)
    expect(standardUncertainty).toBeCloseTo(Number(std(sums)) / Math.sqrt(5), 10)
  })
  outside('derived', 'standard deviation of the mean written out by hand from JCGM 100:2008, 4.2.3', 'two runs', () => {
    // Deviations of half the difference: s = d/√2, and d/2 of the mean.
    const { grossHead, standardUncertainty, misclosure } = levels([
      [10, 10.1],
      [10, 10, -0.1, 0.4],
    ])
    expect(grossHead).toBeCloseTo(20.2, 10)
    expect(misclosure).toBeCloseTo(0.2, 10)
    expect(standardUncertainty).toBeCloseTo(0.1, 10)
  })

  test('one run has no uncertainty, and is told so', () => {
    const { outputs, cautions } = solve('head-by-levels', { runs: [[4, 5, 6]] })
    expect(outputs).toEqual({ grossHead: 15, misclosure: 0 })
    expect(cautions.map(({ say }) => say).join(' ')).toMatch(/measure it again/)
  })
  test('refuses runs of opposite direction, at the first that contradicts', () => {
    expectRefusal('inconsistent', 'runs[2]', () => levels([[30], [29.8], [-30.1]]))
    expect(levels([[-30], [-30.2]]).grossHead).toBeCloseTo(-30.1, 9)
    expect(solve('head-by-levels', { runs: [[-30]] }).cautions[0]).toMatchObject({ level: 'stop' })
  })
  test('tells runs that differ by a slip', () => {
    const about = (second: number) =>
      solve('head-by-levels', { runs: [[40], [second]] }).cautions.flatMap(({ about }) => about)
    expect(about(40.7)).not.toContain('misclosure')
    expect(about(41.3)).toContain('misclosure')
  })
  test('neither the order of the rises nor that of the runs counts', () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(uniform(0.1, 6), { minLength: 1, maxLength: 8 }), { minLength: 2, maxLength: 6 }),
        (runs) => {
          const there = levels(runs)
          const back = levels(runs.toReversed().map((run) => run.toReversed()))
          expectNear(back.grossHead as number, there.grossHead as number, { relative: 1e-12 })
          expectNear(back.misclosure as number, there.misclosure as number, { absolute: 1e-9 })
          expectNear(back.standardUncertainty as number, there.standardUncertainty as number, { absolute: 1e-9 })
        },
      ),
      deep,
    )
  })
})
