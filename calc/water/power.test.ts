import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterDensity } from './properties.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
// The books take 1000 kg/m³ and 9.81 m/s²; the calculator's weight of water is 0.06 % less.
const booksWeight = 1e-3

describe('power', () => {
  outside(
    'published',
    `Y. A. Çengel & J. M. Cimbala, Fluid Mechanics, 2nd ed. 2010, ${recomputed}`,
    'example 5-13',
    () => {
      const { outputPower } = calculate('power', { flow: 100, netHead: 85, efficiency: 0.8 })
      expectNear(outputPower as number, 66.7e6, { relative: booksWeight })
    },
  )
  outside('published', `A. V. Arasu, Turbomachines, 2009, ${recomputed}`, 'example 9.2, flow for 13 MW', () => {
    const { outputPower } = calculate('power', { flow: 3.12, netHead: 500, efficiency: 0.85 })
    // The flow is printed to 3 digits.
    expectNear(outputPower as number, 13e6, { relative: booksWeight + 0.005 / 3.12 })
  })
  outside(
    'published',
    `B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, ${recomputed}`,
    'example 11.1',
    () => {
      const { outputPower } = calculate('power', { flow: 2.115488, netHead: 500, efficiency: 0.85 })
      expectNear(outputPower as number, 8.82e6, { relative: booksWeight })
    },
  )
  outside('derived', 'kinetic energy of the loss-free jet', 'power of the water', () => {
    const { hydraulicPower } = calculate('power', { flow: 0.02, netHead: 60, efficiency: 1, waterTemperature: 4 })
    expectNear(hydraulicPower as number, 0.5 * waterDensity(4) * 0.02 * (2 * g * 60), { relative: 1e-12 })
  })
  outside('derived', 'a kilowatt all year', 'is 8760 kWh', () => {
    const { outputPower, energyPerYear } = calculate('power', { flow: 0.01, netHead: 50, efficiency: 0.5 })
    expectNear((energyPerYear as number) / 3.6e6, 8760 * ((outputPower as number) / 1000), { relative: 1e-12 })
  })

  test('grows with flow, head and efficiency, and never beats the water', () => {
    fc.assert(
      fc.property(logUniform(1e-5, 500), logUniform(0.01, 1000), uniform(0.01, 0.99), (flow, netHead, efficiency) => {
        const at = (change: object) =>
          calculate('power', { flow, netHead, efficiency, ...change }) as Record<string, number>
        const { hydraulicPower, outputPower } = at({})
        expect(outputPower).toBeLessThan(hydraulicPower!)
        expect(at({ flow: flow * 1.01 }).outputPower).toBeGreaterThan(outputPower!)
        expect(at({ netHead: netHead * 1.01 }).outputPower).toBeGreaterThan(outputPower!)
        expect(at({ efficiency: efficiency * 1.01 }).outputPower).toBeGreaterThan(outputPower!)
      }),
      runs,
    )
  })

  test('no water gives no power', () => {
    expect(calculate('power', { flow: 0, netHead: 50, efficiency: 0.5 })).toEqual({
      hydraulicPower: 0,
      outputPower: 0,
      energyPerYear: 0,
    })
  })

  test('an efficiency in per cent is refused', () => {
    expectRefusal('out-of-range', 'efficiency', () => calculate('power', { flow: 0.01, netHead: 50, efficiency: 55 }))
    expectRefusal('missing', 'netHead', () => calculate('power', { flow: 0.01, efficiency: 0.5 }))
  })

  test('says that a year is not all like this', () => {
    const { cautions } = solve('power', { flow: 0.01, netHead: 50, efficiency: 0.5 })
    expect(cautions.find(({ about }) => about.includes('energyPerYear'))?.say).toContain('annual-energy')
  })
})
