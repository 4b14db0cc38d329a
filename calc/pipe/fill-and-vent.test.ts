import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'

const pipe = { pipeVolume: 2, fillFlow: 0.002, ventDiameter: 0.025, allowedVacuum: 15_000 }
const vent = (inputs: object) =>
  calculate('fill-and-vent', { ...pipe, ...inputs }) as Record<
    'fillTime' | 'fillAirVelocity' | 'ventAirFlow',
    number
  > & {
    drainTime?: number
  }
const airAt = (allowedVacuum: number) => vent({ allowedVacuum }).ventAirFlow

describe('fill-and-vent', () => {
  const m51 = 'AWWA M51:2001, ch. 4 (quoted at standards.biao-zhun.cn)'
  outside('published', m51, 'from about 7 psi (48 kPa) of vacuum on the air runs at the speed of sound', () => {
    expect(airAt(47_000)).toBeLessThan(airAt(47_500))
    expectNear(airAt(60_000), airAt(48_300), { relative: 1e-4 })
    expectNear(airAt(100_000), airAt(60_000), { relative: 1e-12 })
  })
  outside('derived', 'Bernoulli’s equation, air of one density', 'is met where the vacuum is small', () => {
    // Less than half of the vacuum's share of the air's pressure is lost to its expansion on the way.
    fc.assert(
      fc.property(logUniform(10, 5000), logUniform(0.005, 1), (allowedVacuum, ventDiameter) => {
        const plain = 0.7 * (Math.PI / 4) * ventDiameter ** 2 * Math.sqrt((2 * allowedVacuum) / 1.225)
        const { ventAirFlow } = vent({ allowedVacuum, ventDiameter })
        expect(ventAirFlow).toBeLessThan(plain)
        expectNear(ventAirFlow, plain, { relative: (0.6 * allowedVacuum) / 101_325 + 1e-9 })
      }),
      runs,
    )
  })
  outside(
    'derived',
    'energy of air that expands without heat, summed in small steps',
    'speed and density in the opening',
    () => {
      for (const allowedVacuum of [2000, 15_000, 30_000, 45_000]) {
        // v dv = −dp/ρ, with p/ρ^1.4 kept: summed from the outside pressure down.
        const steps = 20_000
        let energy = 0
        for (let i = 0; i < steps; i++) {
          const p = 101_325 - ((i + 0.5) * allowedVacuum) / steps
          energy += allowedVacuum / steps / (1.225 * (p / 101_325) ** (1 / 1.4))
        }
        const inside = 1.225 * ((101_325 - allowedVacuum) / 101_325) ** (1 / 1.4)
        const free = (Math.sqrt(2 * energy) * inside) / 1.225
        expectNear(airAt(allowedVacuum), 0.7 * (Math.PI / 4) * 0.025 ** 2 * free, { relative: 1e-6 })
      }
    },
  )
  outside('derived', 'a bucket that fills', 'water in and air out are the same volume', () => {
    fc.assert(
      fc.property(
        logUniform(1e-3, 1e4),
        logUniform(1e-5, 1),
        logUniform(0.005, 1),
        (pipeVolume, fillFlow, ventDiameter) => {
          const { fillTime, fillAirVelocity } = vent({ pipeVolume, fillFlow, ventDiameter })
          expectNear((fillAirVelocity * fillTime * Math.PI * ventDiameter ** 2) / 4, pipeVolume, { relative: 1e-9 })
        },
      ),
      runs,
    )
  })
  outside('memory', 'AWWA M51 for 5 psi', 'an expansion factor near 0.8 stays for the flow', () => {
    const plain = 0.7 * (Math.PI / 4) * 0.025 ** 2 * Math.sqrt((2 * 34_500) / 1.225)
    expectNear(airAt(34_500) / plain, 0.8, { absolute: 0.03 })
  })

  test('a deeper vacuum never draws less, a wider vent draws with its area', () => {
    fc.assert(
      fc.property(uniform(10, 1e5), uniform(0, 900), uniform(1, 3), (allowedVacuum, more, times) => {
        // Up to the last bit.
        expect(airAt(allowedVacuum + more)).toBeGreaterThanOrEqual(airAt(allowedVacuum) * (1 - 1e-12))
        const wide = vent({ allowedVacuum, ventDiameter: 0.025 * times })
        expectNear(wide.ventAirFlow, airAt(allowedVacuum) * times ** 2, { relative: 1e-9 })
      }),
      runs,
    )
  })

  test('without a burst, or with none running out, there is no time to run empty', () => {
    expect(vent({})).not.toHaveProperty('drainTime')
    expect(vent({ burstOutflow: 0 })).not.toHaveProperty('drainTime')
    expectNear(vent({ burstOutflow: 0.04 }).drainTime, 50, { relative: 1e-12 })
  })

  test('stops where more runs out than the vent lets in', () => {
    const stops = (burstOutflow: number) =>
      solve('fill-and-vent', { ...pipe, burstOutflow }).cautions.some(({ level }) => level === 'stop')
    const { ventAirFlow } = vent({})
    expect(stops(ventAirFlow * 1.01)).toBe(true)
    expect(stops(ventAirFlow * 0.99)).toBe(false)
  })
})
