import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs, uniform } from '../testing/properties.ts'

type Keys = 'openingArea' | 'flow' | 'fullFlowFraction'
const found = (inputs: object) => calculate('needle', inputs) as Record<Keys, number>
const usual = { seatDiameter: 0.03, needleHalfAngle: 25, stroke: 0.008, netHead: 45, velocityCoefficient: 0.97 }

describe('needle', () => {
  outside(
    'derived',
    'the frustum’s side, π(r₁ + r₂)·slant, between the seat’s edge and where a line square to the cone meets it',
    'opening of a needle',
    () => {
      for (const [diameter, degrees, stroke] of [
        [0.03, 25, 0.008],
        [0.05, 32, 0.01],
      ] as const) {
        const angle = (degrees * Math.PI) / 180
        const slant = stroke * Math.sin(angle)
        const [outer, inner] = [diameter / 2, diameter / 2 - slant * Math.cos(angle)]
        const { openingArea } = found({ ...usual, seatDiameter: diameter, needleHalfAngle: degrees, stroke })
        expectNear(openingArea, Math.PI * (outer + inner) * slant, { relative: 1e-9 })
      }
    },
  )
  outside(
    'derived',
    'numerical sum of rings along the line square to the cone (ten thousand of them)',
    'opening of a needle, integrated',
    () => {
      const angle = (25 * Math.PI) / 180
      const slant = 0.008 * Math.sin(angle)
      const steps = 10_000
      let area = 0
      for (let i = 0; i < steps; i++) {
        const along = ((i + 0.5) / steps) * slant
        area += 2 * Math.PI * (0.015 - along * Math.cos(angle)) * (slant / steps)
      }
      expectNear(found(usual).openingArea, area, { relative: 1e-9 })
    },
  )
  outside('derived', 'Torricelli through the opening, Q = Cv·A·√(2gH), by hand', 'flow of a needle', () => {
    const { flow, openingArea } = found(usual)
    expectNear(flow, 0.97 * openingArea * Math.sqrt(2 * 9.80665 * 45), { relative: 1e-12 })
  })

  test('drawn back it never gives less, and never more than the bore', () => {
    fc.assert(
      fc.property(uniform(0, 0.04), uniform(0, 0.04), uniform(10, 60), (a, b, needleHalfAngle) => {
        const at = (stroke: number) => found({ ...usual, needleHalfAngle, stroke })
        const [less, more] = [at(Math.min(a, b)), at(Math.max(a, b))]
        expect(more.flow).toBeGreaterThanOrEqual(less.flow - 1e-15)
        expect(more.openingArea).toBeLessThanOrEqual((Math.PI / 4) * 0.03 ** 2 * (1 + 1e-12))
        expect(more.fullFlowFraction).toBeLessThanOrEqual(1 + 1e-12)
      }),
      runs,
    )
    expect(found({ ...usual, stroke: 0 }).flow).toBe(0)
  })
})
