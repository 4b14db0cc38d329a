import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { flowByFloat } from './flow-by-float.ts'

const given = { verticals: [{ width: 1, depth: 0.2 }], distance: 10, times: [20], surfaceFactor: 0.66 }
const float = (more: object) => calculate('flow-by-float', { ...given, ...more }) as Record<string, number>
const cautions = (more: object) =>
  solve('flow-by-float', { ...given, ...more })
    .cautions.map(({ say }) => say)
    .join(' ')

describe('flow-by-float', () => {
  outside(
    'published',
    'C. E. Boyd, Measuring water flow, Responsible Seafood Advocate',
    'channel of 8 m by 1.5 m',
    () => {
      const found = float({
        verticals: [{ width: 8, depth: 1.5 }],
        times: [85],
        surfaceFactor: 0.74,
      })
      expect(found.area).toBeCloseTo(12, 12)
      expect(found.surfaceVelocity).toBeCloseTo(0.118, 3)
      // Printed 1.04 from a speed rounded down.
      expectNear(found.flow, 1.04, { absolute: 0.006 })
    },
  )
  outside(
    'published',
    'FAO Training Series 4, Water for freshwater fish culture, float example (as copied at allwayfluid.com)',
    'mean of 50, 47, 51, 48 and 54 s is 50 s',
    () => expect(float({ times: [50, 47, 51, 48, 54] }).surfaceVelocity).toBeCloseTo(10 / 50, 12),
  )
  outside(
    'published',
    'C. E. Boyd, Measuring water flow, Responsible Seafood Advocate, table 1: 0.64 at 0.25 m, 0.67 at 0.5 m',
    'the factor that a form starts with',
    () => {
      const { surfaceFactor } = flowByFloat.inputs
      expect(surfaceFactor.initial).toBeGreaterThan(0.64)
      expect(surfaceFactor.initial).toBeLessThan(0.67)
    },
  )
  outside('derived', 'a parabolic bed, area two thirds of width times depth, cut into 40 strips', 'area', () => {
    const strips = Array.from({ length: 40 }, (_, i) => {
      const x = (i + 0.5) / 40
      return { width: 2 / 40, depth: 0.5 * 4 * x * (1 - x) }
    })
    const found = float({ verticals: strips })
    expectNear(found.area, (2 / 3) * 2 * 0.5, { relative: 1e-3 })
    expectNear(found.meanDepth, (2 / 3) * 0.5, { relative: 1e-3 })
  })

  test('a strip cut in two leaves the flow as it is', () => {
    fc.assert(
      fc.property(logUniform(0.1, 10), logUniform(0.01, 3), uniform(0.1, 0.9), (width, depth, cut) => {
        const whole = float({ verticals: [{ width, depth }] })
        const parts = float({
          verticals: [
            { width: width * cut, depth },
            { width: width * (1 - cut), depth },
          ],
        })
        expectNear(parts.flow, whole.flow!, { relative: 1e-12 })
        expectNear(parts.meanDepth, whole.meanDepth!, { relative: 1e-12 })
      }),
      runs,
    )
  })
  test('takes a strip that is dry at the bank, refuses a dry stream', () => {
    expect(
      float({
        verticals: [
          { width: 1, depth: 0 },
          { width: 1, depth: 0.2 },
        ],
      }).meanDepth,
    ).toBeCloseTo(0.1, 12)
    expectRefusal('no-solution', 'verticals', () => float({ verticals: [{ width: 1, depth: 0 }] }))
  })
  test('says how rough it is, and where the factor is too hopeful', () => {
    expect(cautions({})).toMatch(/about 20 per cent/)
    expect(cautions({})).not.toMatch(/stony bed/)
    expect(cautions({ surfaceFactor: 0.85 })).toMatch(/stony bed/)
    expect(cautions({ surfaceFactor: 0.85, verticals: [{ width: 1, depth: 0.5 }] })).not.toMatch(/stony bed/)
  })
})
