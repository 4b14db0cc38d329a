import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { kelvin, vapourPressure, waterDensity, waterDynamicViscosity, waterKinematicViscosity } from './properties.ts'

const celsius = (absolute: number) => absolute - kelvin(0)

describe('water', () => {
  const sr6 = 'IAPWS SR6-08(2011), table 8, as asserted in github.com/jjgomera/iapws'
  // Both lie outside of 0–40 °C: they check the bare correlation.
  outside('published', sr6, 'dynamic viscosity at 260 K', () =>
    expectNear(waterDynamicViscosity(celsius(260)), 3058.36075e-6, { absolute: 5e-12 }),
  )
  outside('published', sr6, 'dynamic viscosity at 375 K', () =>
    expectNear(waterDynamicViscosity(celsius(375)), 276.207245e-6, { absolute: 5e-13 }),
  )

  const library = 'iapws 1.5.3 for Python, SR6-08(2011)'
  for (const [t, density, dynamic, kinematic] of [
    [0, 999.842, 1.79178e-3, 1.7921e-6],
    [10, 999.702, 1.3059e-3, 1.3063e-6],
    [20, 998.207, 1.00157e-3, 1.0034e-6],
    [30, 995.649, 0.79721e-3, 0.80069e-6],
    [40, 992.216, 0.65273e-3, 0.65785e-6],
  ] as const)
    outside('library', library, `${t} °C`, () => {
      const { outputs } = solve('water', { waterTemperature: t })
      // Tanaka's density is of another measurement than the library's; they differ by a few parts in a million.
      expectNear(outputs.density as number, density, { absolute: 0.02 })
      expectNear(outputs.dynamicViscosity as number, dynamic, { relative: 1e-5 })
      expectNear(outputs.kinematicViscosity as number, kinematic, { relative: 1e-4 })
    })

  outside('library', 'iapws for Python, IAPWS-IF97', 'saturation pressure at 20 °C', () =>
    expectNear(solve('water', { waterTemperature: 20 }).outputs.vapourPressure as number, 2339.2, { absolute: 0.05 }),
  )
  for (const [t, pressure] of [
    [300, 3536.58941],
    [500, 2638897.76],
    [600, 12344314.6],
  ] as const)
    outside('memory', 'IAPWS R7-97(2012), table 35', `saturation pressure at ${t} K`, () =>
      expectNear(vapourPressure(celsius(t)), pressure, { relative: 2e-9 }),
    )

  const cengel =
    'Y. A. Çengel & J. M. Cimbala, Fluid Mechanics, 2nd ed. 2010, as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
  outside('published', cengel, 'viscosity at 5 °C, example 8-2', () =>
    expectNear(waterDynamicViscosity(5), 1.519e-3, { absolute: 1.5e-6 }),
  )
  outside('published', cengel, 'viscosity at 10 °C, example 8-8', () =>
    expectNear(waterDynamicViscosity(10), 1.307e-3, { absolute: 1.5e-6 }),
  )

  test('is at 10 °C unless told', () => {
    expect(solve('water', {}).outputs).toEqual(solve('water', { waterTemperature: 10 }).outputs)
  })

  test('is heaviest near 4 °C', () => {
    fc.assert(
      fc.property(uniform(0, 40), (t) => {
        expect(waterDensity(t)).toBeLessThanOrEqual(waterDensity(3.983035))
      }),
      runs,
    )
  })

  test('grows thinner and boils sooner as it warms', () => {
    fc.assert(
      fc.property(uniform(0, 39.9), uniform(0.01, 0.1), (t, step) => {
        expect(waterKinematicViscosity(t + step)).toBeLessThan(waterKinematicViscosity(t))
        expect(vapourPressure(t + step)).toBeGreaterThan(vapourPressure(t))
      }),
      runs,
    )
  })

  test('ice and hot water are refused', () => {
    expectRefusal('out-of-range', 'waterTemperature', () => solve('water', { waterTemperature: -0.1 }))
    expectRefusal('out-of-range', 'waterTemperature', () => solve('water', { waterTemperature: 40.1 }))
    expectRefusal('not-finite', 'waterTemperature', () => solve('water', { waterTemperature: NaN }))
    expectRefusal('unknown-key', 'temperature', () => solve('water', { temperature: 10 }))
  })

  test('the working ends in the values found', () => {
    const { working } = solve('water', { waterTemperature: 20 })
    const numbers = working.map(({ numbers }) => numbers ?? '').join('\n')
    expect(numbers).toContain('= 998.21')
    expect(numbers).toContain('1.003')
    expect(numbers).toContain('2.339\\;\\mathrm{kPa}')
  })
})
