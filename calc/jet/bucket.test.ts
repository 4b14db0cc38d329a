import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs, uniform } from '../testing/properties.ts'

type Keys = 'efficiency' | 'bestSpeedRatio' | 'torqueRatio' | 'force'
const found = (inputs: object) => calculate('bucket', inputs) as Record<Keys, number>
const companions = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const g = 9.81

describe('bucket', () => {
  outside(
    'published',
    `A. V. Arasu, Turbomachines, 2009, example 9.3 (${companions})`,
    '97.7 % at a speed ratio of 0.46 with 15 degrees of side clearance and no friction',
    () => {
      const { efficiency } = found({ speedRatio: 0.46, deflectionAngle: 165, bucketFriction: 1 })
      expectNear(efficiency, 0.977, { absolute: 5e-4 })
    },
  )
  outside(
    'published',
    `B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, example 11.2 (${companions}): 421.42 kW with the velocity coefficient that the text states`,
    'power of a jet of 1 m³/s under 46 m on buckets of 15 m/s',
    () => {
      const jetVelocity = 0.975 * Math.sqrt(2 * g * 46)
      const { force } = found({
        speedRatio: 15 / jetVelocity,
        deflectionAngle: 165,
        bucketFriction: 1,
        flow: 1,
        jetVelocity,
      })
      expectNear((force * 15) / 1000, 421.42, { relative: 1e-3 })
    },
  )
  outside(
    'published',
    `B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, example 11.5 (${companions}): 479.376 kW`,
    '1.2 m³/s under 50 m, velocity coefficient 0.94, turned by 160 degrees at 18 m/s',
    () => {
      const jetVelocity = 0.94 * Math.sqrt(2 * g * 50)
      const { force } = found({
        speedRatio: 18 / jetVelocity,
        deflectionAngle: 160,
        bucketFriction: 1,
        flow: 1.2,
        jetVelocity,
      })
      expectNear((force * 18) / 1000, 479.376, { relative: 1e-3 })
    },
  )
  outside(
    'memory',
    'Euler’s turbine equation, any text: (1 + cos 15°)/2 at a half',
    'the best that 165 degrees can do',
    () => {
      expectNear(found({ speedRatio: 0.5, deflectionAngle: 165, bucketFriction: 1 }).efficiency, 0.98296, {
        absolute: 1e-5,
      })
    },
  )

  test('it is best at a half whatever the bucket, pushes hardest at rest, and never gives more than the jet brings', () => {
    fc.assert(
      fc.property(
        uniform(0.01, 0.99),
        uniform(90, 180),
        uniform(0, 1),
        (speedRatio, deflectionAngle, bucketFriction) => {
          const at = (ratio: number) => found({ speedRatio: ratio, deflectionAngle, bucketFriction })
          const { efficiency, bestSpeedRatio, torqueRatio } = at(speedRatio)
          expectNear(bestSpeedRatio, 0.5, { absolute: 1e-9 })
          expect(efficiency).toBeLessThanOrEqual(at(0.5).efficiency + 1e-12)
          expect(efficiency).toBeLessThanOrEqual(1)
          expectNear(torqueRatio, 1 - speedRatio, { absolute: 1e-12 })
          const power = efficiency * 0.5 * 999.7026 * 0.01 * 30 ** 2
          const { force } = found({ speedRatio, deflectionAngle, bucketFriction, flow: 0.01, jetVelocity: 30 })
          expectNear(force * speedRatio * 30, power, { relative: 1e-6 })
        },
      ),
      runs,
    )
  })
})
