import { describe, expect, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'

type Keys = 'diameter' | 'headLoss' | 'yearlyCostOfPipe' | 'yearlyCostOfLoss'
const found = (inputs: object) => calculate('economic-diameter', inputs) as Record<Keys, number>
const usual = {
  flow: 0.02,
  grossHead: 60,
  length: 400,
  roughness: 1e-4,
  efficiency: 0.6,
  hoursPerYear: 7000,
  price: 0.2,
  lifeYears: 25,
  discountRate: 0.05,
  costCoefficient: 900,
  costExponent: 1.5,
}

describe('economic-diameter', () => {
  outside(
    'published',
    'B. S. Massey & A. J. Ward-Smith, Mechanics of Fluids, 8th ed., example 7.4 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions): capital over energy 2.5 times dearer takes 600 mm to 672.8 mm, by the eighth root, at a cost ∝ D³ and a loss ∝ D⁻⁵',
    'very rough pipe, whose friction factor hardly changes: the dearer energy widens the pipe by 2.5^(1/8)',
    () => {
      const of = (price: number) =>
        found({ ...usual, flow: 0.5, roughness: 1e-4, length: 2000, costExponent: 3, costCoefficient: 3000, price })
          .diameter
      // The friction factor falls a little with the bore, which Massey leaves out.
      expectNear(of(0.5) / of(0.2), 672.8 / 600, { relative: 6e-3 })
    },
  )
  outside(
    'derived',
    'at the least of a·D^b + c·D^−m the yearly costs stand as m : b, with m the slope of the loss taken from two friction sums',
    'the balance of the two costs',
    () => {
      const { diameter, yearlyCostOfPipe, yearlyCostOfLoss } = found(usual)
      const loss = (insideDiameter: number) =>
        calculate('friction', { flow: usual.flow, insideDiameter, length: usual.length, roughness: usual.roughness })
          .headLoss as number
      const slope = Math.log(loss(diameter * 0.999) / loss(diameter * 1.001)) / Math.log(1.001 / 0.999)
      expectNear(yearlyCostOfPipe / yearlyCostOfLoss, slope / usual.costExponent, { relative: 1e-3 })
    },
  )
  outside(
    'derived',
    'capital recovery factor written out, i/(1 − (1 + i)^−n): 7.0952 % for 25 years at 5 %',
    'a year’s share of the pipe, and the worth of what is lost',
    () => {
      const { diameter, headLoss, yearlyCostOfPipe, yearlyCostOfLoss } = found(usual)
      expectNear(yearlyCostOfPipe, 0.0709524573 * 900 * diameter ** 1.5 * 400, { relative: 1e-8 })
      const kilowattHours = (999.7026 * 9.80665 * 0.02 * headLoss * 0.6 * 7000) / 1000
      expectNear(yearlyCostOfLoss, kilowattHours * 0.2, { relative: 1e-4 })
    },
  )

  test('no other bore costs less, and dearer energy wants a wider one', () => {
    const { diameter, yearlyCostOfPipe, yearlyCostOfLoss } = found(usual)
    const total = (insideDiameter: number) => {
      const loss = calculate('friction', { flow: 0.02, insideDiameter, length: 400, roughness: 1e-4 })
        .headLoss as number
      return yearlyCostOfPipe * (insideDiameter / diameter) ** 1.5 + (yearlyCostOfLoss * loss) / found(usual).headLoss
    }
    for (const factor of [0.8, 0.95, 1.05, 1.3])
      expect(total(diameter * factor)).toBeGreaterThan(yearlyCostOfPipe + yearlyCostOfLoss)
    expect(found({ ...usual, price: 0.4 }).diameter).toBeGreaterThan(diameter)
    expect(found({ ...usual, discountRate: 0 }).diameter).toBeGreaterThan(diameter)
  })
})
