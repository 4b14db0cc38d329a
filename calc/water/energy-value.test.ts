import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

interface Found {
  yearlyValue: number
  simplePayback?: number
  netPresentValue: number
  levelisedCost: number
}
const value = (inputs: object) => calculate('energy-value', inputs) as unknown as Found
const kilowattHours = (amount: number) => amount * 3.6e6

const financing =
  'Energy Project Financing: Resources and Strategies for Success (ed. A. Thumann, E. A. Woodroof), p. 258'
const insulation = { price: 0.08, yearlyCost: 0, lifeYears: 20, discountRate: 0.1 }
const plant = {
  energyPerYear: kilowattHours(14_000),
  price: 0.24,
  capitalCost: 18_000,
  yearlyCost: 420,
  lifeYears: 25,
  discountRate: 0.05,
}

describe('energy-value', () => {
  outside('published', financing, 'example 35, 400 kWh a year for 150', () => {
    const { yearlyValue, netPresentValue } = value({
      ...insulation,
      energyPerYear: kilowattHours(400),
      capitalCost: 150,
    })
    expectNear(yearlyValue, 32, { relative: 1e-12 })
    // The book takes the factor as 8.5136, to a twentieth of a thousandth, and prints 32 times it to the cent.
    expectNear(netPresentValue, 122.44, { absolute: 0.005 + 32 * 5e-5 })
  })
  outside('published', financing, 'example 36, 250 kWh a year more for 200', () => {
    const { netPresentValue } = value({ ...insulation, energyPerYear: kilowattHours(250), capitalCost: 200 })
    expectNear(netPresentValue, -29.73, { absolute: 0.005 + 20 * 5e-5 })
  })
  outside(
    'published',
    'Microsoft, manual of the PMT function (support.microsoft.com): 10 payments for 10 000 at 8 %/12',
    'the yearly sum of a cost, 1037.03',
    () => {
      const { levelisedCost } = value({
        ...plant,
        energyPerYear: kilowattHours(1),
        capitalCost: 10_000,
        yearlyCost: 0,
        lifeYears: 10,
        discountRate: 0.08 / 12,
      })
      expectNear(levelisedCost, 1037.03, { absolute: 0.005 })
    },
  )
  outside(
    'published',
    'University of Dayton, Energy Economics (studylib.net/doc/6670397): a retrofit of 1000 that saves 250 a year',
    'simple payback of 4 years',
    () => {
      const { simplePayback } = value({
        ...plant,
        energyPerYear: kilowattHours(2500),
        price: 0.1,
        yearlyCost: 0,
        capitalCost: 1000,
      })
      expectNear(simplePayback, 4, { relative: 1e-12 })
    },
  )
  outside('derived', 'year by year: each end of year discounted by itself and added up', 'net present value', () => {
    for (const discountRate of [0, 1e-9, 0.013, 0.05, 0.4, 1])
      for (const lifeYears of [1, 2, 25, 80]) {
        let sum = -18_000
        for (let n = 1; n <= lifeYears; n++) sum += (14_000 * 0.24 - 420) / (1 + discountRate) ** n
        expectNear(value({ ...plant, discountRate, lifeYears }).netPresentValue, sum, { relative: 1e-9 })
      }
  })
  outside(
    'derived',
    'definition of the levelised cost: at that price the plant is worth nothing',
    'sold at it, the net present value is nil',
    () => {
      const { levelisedCost } = value(plant)
      expectNear(value({ ...plant, price: levelisedCost }).netPresentValue, 0, { absolute: 1e-8 })
    },
  )

  test('without interest the sums are plain', () => {
    const { simplePayback, netPresentValue, levelisedCost } = value({ ...plant, discountRate: 0 })
    expectNear(netPresentValue, 25 * (3360 - 420) - 18_000, { relative: 1e-12 })
    expectNear(levelisedCost, (18_000 / 25 + 420) / 14_000, { relative: 1e-12 })
    expectNear(simplePayback, 18_000 / 2940, { relative: 1e-12 })
  })
  test('a rate close to nothing is close to none', () => {
    const none = value({ ...plant, discountRate: 0 })
    const little = value({ ...plant, discountRate: 1e-12 })
    expectNear(little.netPresentValue, none.netPresentValue, { relative: 1e-9 })
  })
  test('worth less at a higher rate, more at a higher price; at its levelised cost it just pays', () => {
    fc.assert(
      fc.property(
        logUniform(1e9, 1e14),
        logUniform(0.01, 10),
        logUniform(1, 1e6),
        logUniform(0.1, 1e5),
        fc.integer({ min: 1, max: 200 }),
        uniform(0, 0.9),
        (energyPerYear, price, capitalCost, yearlyCost, lifeYears, discountRate) => {
          const inputs = { energyPerYear, price, capitalCost, yearlyCost, lifeYears, discountRate }
          const here = value(inputs)
          const size = here.yearlyValue * lifeYears + capitalCost + yearlyCost * lifeYears
          expect(value({ ...inputs, price: price * 1.1 }).netPresentValue).toBeGreaterThan(here.netPresentValue)
          const dearer = value({ ...inputs, discountRate: discountRate + 0.05 })
          expect(dearer.levelisedCost).toBeGreaterThan(here.levelisedCost)
          expect(value({ ...inputs, price: here.levelisedCost }).netPresentValue / size).toBeCloseTo(0, 9)
          expect(here.netPresentValue > 0).toBe(price > here.levelisedCost)
          if (here.simplePayback === undefined) expect(here.yearlyValue).toBeLessThanOrEqual(yearlyCost)
        },
      ),
      runs,
    )
  })

  const said = (change: object) =>
    solve('energy-value', { ...plant, ...change })
      .cautions.map(({ say }) => say)
      .join(' ')
  test('a year that costs more than it brings has no payback, and says so', () => {
    expect(value({ ...plant, yearlyCost: 3360 })).not.toHaveProperty('simplePayback')
    expect(said({ yearlyCost: 3360 })).toMatch(/never pays back/)
    expect(said({ capitalCost: 90_000 })).toMatch(/longer than the years counted/)
    expect(said({ capitalCost: 45_000 })).toMatch(/levelised cost/)
    expect(said({})).not.toMatch(/never|longer than the years|costs more than it brings/)
  })
  test('refuses parts of years, no energy, a rate in per cent', () => {
    expectRefusal('out-of-range', 'lifeYears', () => value({ ...plant, lifeYears: 12.5 }))
    expectRefusal('out-of-range', 'energyPerYear', () => value({ ...plant, energyPerYear: 0 }))
    expectRefusal('out-of-range', 'discountRate', () => value({ ...plant, discountRate: 5 }))
  })
})
