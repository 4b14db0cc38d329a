import fc from 'fast-check'
import { describe, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'

const found = (flow: number, insideDiameter: number, length: number, hazenWilliamsC: number) =>
  calculate('hazen-williams', { flow, insideDiameter, length, hazenWilliamsC }) as Record<
    'velocity' | 'headLoss' | 'gradient',
    number
  >

describe('hazen-williams', () => {
  outside(
    'published',
    'N. Shammas & L. Wang, Water Engineering, Wiley, example 5.36, p. 142',
    '43.8 L/s in 12 inches at C 100 lose 2.1 m in a kilometre',
    () => expectNear(found(0.0438, 0.3048, 1000, 100).headLoss, 2.1, { absolute: 0.02 }),
  )
  outside(
    'published',
    'N. Shammas & L. Wang, Water Engineering, Wiley, example 5.36 in US units: 2.07 ft in 1000 ft',
    'a million US gallons a day in 12 inches',
    () => {
      const flow = (1e6 * 0.003785411784) / 86_400
      expectNear(found(flow, 12 * 0.0254, 304.8, 100).headLoss / 0.3048, 2.07, { absolute: 0.06 })
    },
  )
  outside('library', 'npm epanet-js 0.9.0, Hazen–Williams head loss', '8 L/s in 100 mm, 70 L/s in 300 mm', () => {
    expectNear(found(0.008, 0.1, 100, 150).headLoss, 0.96701, { relative: 1.5e-3 })
    expectNear(found(0.07, 0.3, 1000, 100).headLoss, 5.39629, { relative: 1.5e-3 })
  })

  test('the loss goes with the powers that the formula has', () => {
    fc.assert(
      fc.property(logUniform(1e-4, 1), logUniform(0.02, 1), (flow, bore) => {
        const { headLoss } = found(flow, bore, 100, 140)
        expectNear(found(2 * flow, bore, 100, 140).headLoss, headLoss * 2 ** 1.852, { relative: 1e-9 })
        expectNear(found(flow, 2 * bore, 100, 140).headLoss, headLoss * 2 ** -4.8704, { relative: 1e-9 })
        expectNear(found(flow, bore, 100, 70).headLoss, headLoss * 2 ** 1.852, { relative: 1e-9 })
      }),
      runs,
    )
  })
})
