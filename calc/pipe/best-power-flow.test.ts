import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'

type Keys = 'flow' | 'headLoss' | 'lossFraction' | 'hydraulicPower'
const found = (inputs: object) => calculate('best-power-flow', inputs) as Record<Keys, number>
const rough = { grossHead: 48, insideDiameter: 0.1, length: 400, roughness: 0.01 }

describe('best-power-flow', () => {
  outside(
    'published',
    'F. M. White, Fluid Mechanics, problem 11.95: the power is greatest when friction takes a third of the head, for a loss ∝ Q²',
    'very rough pipe, in which the loss goes with the square',
    () => expectNear(found(rough).lossFraction, 1 / 3, { relative: 1e-3 }),
  )
  outside('derived', 'laminar flow, h = 128νLQ/(πgD⁴): Q(H − kQ) is greatest at h = H/2', 'a capillary', () => {
    const thin = { grossHead: 1, insideDiameter: 0.002, length: 50, roughness: 0 }
    expectNear(found(thin).lossFraction, 0.5, { relative: 1e-6 })
  })
  outside(
    'derived',
    'a search by hand: a thousand flows through the penstock, the best of them taken',
    'none of them gives more power',
    () => {
      const pipe = { length: 240, insideDiameter: 0.0968, roughness: 5e-5 }
      const { flow, hydraulicPower } = found({ grossHead: 48, ...pipe })
      let best = { flow: 0, power: 0 }
      for (let i = 1; i <= 1000; i++) {
        const tried = (i / 1000) * 2 * flow
        let netHead: number
        try {
          netHead = calculate('penstock', { grossHead: 48, sections: [pipe], flow: tried }).netHead as number
        } catch {
          continue
        }
        const power = tried * netHead
        if (power > best.power) best = { flow: tried, power }
      }
      expectNear(best.flow, flow, { relative: 3e-3 })
      expect(best.power * 9.80665 * 999.703).toBeLessThanOrEqual(hydraulicPower * (1 + 1e-6))
    },
  )

  test('the best loss lies between a third and a half of the head, and the balance of heads holds', () => {
    fc.assert(
      fc.property(
        logUniform(10, 500),
        logUniform(0.05, 1),
        logUniform(20, 2000),
        (grossHead, insideDiameter, length) => {
          const { lossFraction, headLoss } = found({ grossHead, insideDiameter, length, roughness: 5e-5 })
          expect(lossFraction).toBeGreaterThan(0.3)
          expect(lossFraction).toBeLessThan(0.5 + 1e-9)
          expectNear(headLoss, lossFraction * grossHead, { relative: 1e-9 })
        },
      ),
      runs,
    )
  })

  test('says that this is the most, and no loss to design for', () => {
    expect(
      solve('best-power-flow', rough)
        .cautions.map(({ say }) => say)
        .join(' '),
    ).toMatch(/most .*pipe can give.*never/s)
  })
})
