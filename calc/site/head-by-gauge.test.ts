import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { unit } from 'mathjs'
import { calculate, solve } from '../index.ts'
import { outside } from '../testing/outside-check.ts'

const head = (staticPressure: number, more = {}) =>
  calculate('head-by-gauge', { staticPressure, ...more }).grossHead as number

describe('head-by-gauge', () => {
  outside('library', 'conventional metre of water, 9806.65 Pa, at 1000 kg/m³', '1 bar is 10.197 16 m', () => {
    // Cold water is lighter than 1000 kg/m³ by 0.03 %.
    expect(head(1e5) / 10.19716).toBeCloseTo(1000 / 999.702, 5)
  })

  outside('library', 'mathjs 15.2.0, unit mmH2O (conventional, 1000 kg/m³)', '37 psi in metres of water', () => {
    const metres = unit(37, 'psi').toNumber('mmH2O') / 1000
    expect(head(37 * 6894.757293) / metres).toBeCloseTo(1000 / 999.702, 4)
  })

  outside('published', 'IAPWS SR6-08(2011), density at 30 °C 995.649 kg/m³', 'warm water stands taller', () => {
    expect(head(2e5, { waterTemperature: 30 })).toBeCloseTo(2e5 / (995.649 * 9.80665), 3)
  })

  outside('derived', 'two gauges on one hose, one 4 m above the other', 'they find the same head', () => {
    const weight = 999.702 * 9.80665
    expect(head(3.1e5 - 4 * weight, { gaugeHeightAboveDatum: 4 })).toBeCloseTo(head(3.1e5), 4)
  })

  test('a gauge higher than the water is told', () => {
    const { cautions } = solve('head-by-gauge', { staticPressure: 1000, gaugeHeightAboveDatum: -3 })
    expect(cautions[0]).toMatchObject({ level: 'stop', about: ['gaugeHeightAboveDatum'] })
  })

  test('twice the pressure is twice the head', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 4e6, noNaN: true }), (pressure) => {
        expect(head(2 * pressure) / head(pressure)).toBeCloseTo(2, 10)
      }),
    )
  })
})
