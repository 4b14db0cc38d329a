import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

type Keys = 'resistance' | 'current' | 'powerAtHighest' | 'sizeMargin' | 'heatingTime'
const found = (inputs: object) => calculate('dump-load', inputs) as Record<Keys, number>
const byMathjs = (text: string) => evaluate(text) as number

describe('dump-load', () => {
  outside('library', 'mathjs 15, with units', 'resistance and current of 3 kW at 230 V', () => {
    const { resistance, current } = found({ power: 3000, voltage: 230 })
    expectNear(resistance, byMathjs('number((230 V)^2 / (3 kW), ohm)'), { relative: 1e-12 })
    expectNear(current, byMathjs('number(3 kW / (230 V), A)'), { relative: 1e-12 })
  })

  outside('library', 'mathjs 15, with units', 'what a 48 V heater of 1 kW takes at 58.4 V', () => {
    const { powerAtHighest } = found({ power: 1000, voltage: 48, highestVoltage: 58.4 })
    expectNear(powerAtHighest, byMathjs('number((58.4 V)^2 / ((48 V)^2 / (1 kW)), W)'), { relative: 1e-12 })
  })

  outside(
    'published',
    'NIST Special Publication 811 (2008), appendix B.8: 1 kW·h = 3.6 MJ and 1 kcal (mean) = 4.19002 kJ',
    'one kilowatt-hour warms 85.9 kg of water by 10 K',
    () => {
      const kilograms = 3.6e6 / (10 * 4190.02)
      const { heatingTime } = found({ power: 1000, voltage: 230, waterVolume: kilograms / 999.7, temperatureRise: 10 })
      // The calculator's specific heat is that of the 15 °C calorie.
      expectNear(heatingTime, 3600, { relative: 2e-3 })
    },
  )

  test('what is not told stays away', () => {
    expect(
      Object.keys(calculate('dump-load', { power: 3000, voltage: 230 }))
        .filter((key) => key in { powerAtHighest: 0, sizeMargin: 0, heatingTime: 0 })
        .filter((key) => found({ power: 3000, voltage: 230 })[key as Keys] !== undefined),
    ).toEqual([])
    expectRefusal('missing', 'temperatureRise', () => found({ power: 3000, voltage: 230, waterVolume: 0.1 }))
  })

  test('its resistance gives the power back', () => {
    fc.assert(
      fc.property(logUniform(1, 1e5), logUniform(6, 1000), (power, voltage) => {
        const { resistance, current, powerAtHighest } = found({ power, voltage, highestVoltage: voltage })
        expectNear(powerAtHighest, power, { relative: 1e-12 })
        expectNear(current * resistance, voltage, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('a heater smaller than the generator is a stop, one with little to spare a check', () => {
    const levels = (power: number) =>
      solve('dump-load', { power, voltage: 230, generatorGreatest: 2300 })
        .cautions.filter(({ about }) => about.includes('sizeMargin'))
        .map(({ level }) => level)
    expect(levels(2000)).toEqual(['stop'])
    expect(levels(2500)).toEqual(['check'])
    expect(levels(2800)).toEqual([])
  })
})
