import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { exampleYear, flashyYear } from './example-record.ts'
import { waterDensity } from './properties.ts'

interface Found {
  energyPerYear: number
  capacityFactor: number
  runningFraction: number
  curve: readonly { exceedance: number; flow: number }[]
}
const year = (inputs: object) => calculate('annual-energy', inputs) as unknown as Found

const secondsPerYear = 365 * 86_400
const plant = {
  residualFlow: 0.003,
  designFlow: 0.0095,
  minimumFlow: 0.002,
  grossHead: 48,
  lossAtDesign: 2.9,
  peakEfficiency: 0.55,
}
const mehta =
  'V. K. Mehta & R. Mehta, Principles of Power System, 4th ed. 2005, as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
// The book takes 1000 kg/m³ and 9.81 m/s²; the calculator’s weight of water is 0.06 % less.
const booksWeight = 1e-3
const noPipe = { residualFlow: 0, minimumFlow: 0, lossAtDesign: 0 }

describe('annual-energy', () => {
  outside('published', mehta, 'example 2.7, a steady river of 94 m³/s', () => {
    const { energyPerYear, capacityFactor } = year({
      ...noPipe,
      dailyFlows: [94, 94, 94],
      designFlow: 94,
      grossHead: 39,
      peakEfficiency: 0.8,
    })
    expectNear(energyPerYear / 3.6e6, 28_770.768 * 8760, { relative: booksWeight })
    expectNear(capacityFactor, 1, { relative: 1e-12 })
  })
  outside('published', mehta, 'example 2.11, four months of 10 m³/s, two of 6, six of 1.5', () => {
    const months = [10, 10, 10, 10, 6, 6, 1.5, 1.5, 1.5, 1.5, 1.5, 1.5]
    const { energyPerYear } = year({
      ...noPipe,
      dailyFlows: months,
      designFlow: 10,
      grossHead: 25,
      peakEfficiency: 0.8,
    })
    // A mean of 400 kW for the factory and 597.4 kW above it.
    expectNear(energyPerYear / secondsPerYear, 997.4e3, { relative: booksWeight })
  })
  outside(
    'published',
    mehta,
    'example 2.13, a week of 500 … 900 m³/s, and its capacity at a load factor of 0.4',
    () => {
      const dailyFlows = [500, 520, 850, 800, 875, 900, 546]
      const { energyPerYear } = year({ ...noPipe, dailyFlows, designFlow: 900, grossHead: 15, peakEfficiency: 0.85 })
      expectNear(energyPerYear / secondsPerYear / 0.4, 223e6, { relative: booksWeight + 0.5 / 223 })
    },
  )
  outside(
    'derived',
    'four days worked by hand: one too dry, one at part flow, two at design flow',
    'energy, capacity factor, running days',
    () => {
      const { energyPerYear, capacityFactor, runningFraction } = year({
        ...plant,
        dailyFlows: [0.0045, 0.0085, 0.0125, 0.04],
      })
      const power = (take: number) =>
        waterDensity(10) * g * take * (48 - 2.9 * (take / 0.0095) * (take / 0.0095)) * 0.55
      const mean = (0 + power(0.0055) + power(0.0095) + power(0.0095)) / 4
      expectNear(energyPerYear, mean * secondsPerYear, { relative: 1e-12 })
      expectNear(capacityFactor, mean / power(0.0095), { relative: 1e-12 })
      expect(runningFraction).toBe(0.75)
    },
  )
  outside(
    'derived',
    'integral of a straight flow-duration curve: Q falls from 2Q_d to 0, so that half of the time is full and half falls to nothing',
    'mean take 3/4 Q_d, mean cube of it (1/2 + 1/8) Q_d³',
    () => {
      const days = 20_000
      const dailyFlows = Array.from({ length: days }, (_, i) => (0.02 * (i + 0.5)) / days)
      const { energyPerYear } = year({ ...plant, residualFlow: 0, minimumFlow: 0, designFlow: 0.01, dailyFlows })
      const weight = waterDensity(10) * g * 0.55
      // ∫(H·q − h_d·q³/Q_d²) over the year.
      const mean = weight * 0.01 * (48 * 0.75 - 2.9 * 0.625)
      expectNear(energyPerYear, mean * secondsPerYear, { relative: 1e-7 })
    },
  )
  outside('derived', 'the same record through flow-duration', 'one curve of the stream', () => {
    expect(year({ ...plant, dailyFlows: flashyYear }).curve).toEqual(
      calculate('flow-duration', { dailyFlows: flashyYear }).curve,
    )
  })

  const oneDay = (flow: number, change: object = {}) => {
    const { energyPerYear } = year({ ...plant, dailyFlows: [flow], ...change })
    return energyPerYear / secondsPerYear
  }
  test('takes a share of what is above the residual flow, down to what it runs on', () => {
    // 0.004 above the residual flow, half of it may be taken: just enough.
    expectNear(oneDay(0.007, { takeShare: 0.5 }), oneDay(0.005), { relative: 1e-12 })
    expect(oneDay(0.00699, { takeShare: 0.5 })).toBe(0)
    expect(oneDay(0.0029)).toBe(0)
    // 0.013 − 0.003 misses 0.01 by a last bit.
    expect(oneDay(0.013, { minimumFlow: 0.01, designFlow: 0.012 })).toBeGreaterThan(0)
  })
  test('fixed nozzles pass their own flows only', () => {
    const nozzleSteps = [0.008, 0.004]
    expectNear(oneDay(0.0109, { nozzleSteps }), oneDay(0.007), { relative: 1e-12 })
    expectNear(oneDay(0.02, { nozzleSteps }), oneDay(0.011), { relative: 1e-12 })
    expect(oneDay(0.0065, { nozzleSteps })).toBe(0)
  })
  test('the efficiency at part flow is a share of the best, linear between points and flat outside', () => {
    const partFlowEfficiency = [
      { flowFraction: 0.8, efficiency: 1 },
      { flowFraction: 0.4, efficiency: 0.6 },
    ]
    const shares = [0.3, 0.4, 0.6, 0.8, 1].map((share) => {
      const flow = 0.003 + share * 0.0095
      return oneDay(flow, { partFlowEfficiency }) / oneDay(flow)
    })
    ;[0.6, 0.6, 0.8, 1, 1].forEach((expected, i) => expectNear(shares[i], expected, { relative: 1e-9 }))
  })

  /** Every fifth day: the properties are tried often. */
  const fewDays = exampleYear.filter((_, day) => day % 5 === 0)
  const plants = fc.record({
    residualFlow: logUniform(1e-4, 0.02),
    designFlow: logUniform(1e-3, 0.1),
    minimumFlow: logUniform(1e-4, 0.01),
    grossHead: logUniform(2, 400),
    // Up to a third of the least head: beyond, less flow would give more power.
    lossAtDesign: uniform(0, 0.66),
    peakEfficiency: uniform(0.05, 1),
    takeShare: uniform(0.05, 1),
    availability: uniform(0.05, 1),
  })
  test('never more than the water, nor than a year at design flow', () => {
    fc.assert(
      fc.property(plants, (drawn) => {
        const { energyPerYear, capacityFactor, runningFraction } = year({ ...drawn, dailyFlows: fewDays })
        const above = fewDays.reduce((sum, flow) => sum + Math.max(0, flow - drawn.residualFlow), 0) / fewDays.length
        const water = waterDensity(10) * g * above * drawn.takeShare * drawn.grossHead * secondsPerYear
        expect(energyPerYear).toBeLessThanOrEqual(water * drawn.peakEfficiency * drawn.availability * (1 + 1e-12))
        expect(capacityFactor).toBeLessThanOrEqual(drawn.availability * (1 + 1e-12))
        expect(capacityFactor).toBeGreaterThanOrEqual(0)
        expect(runningFraction === 0).toBe(energyPerYear === 0)
      }),
      runs,
    )
  })
  test('more head, less loss and a lower least flow never bring less', () => {
    fc.assert(
      fc.property(plants, (drawn) => {
        const at = (change: object) => year({ ...drawn, dailyFlows: fewDays, ...change }).energyPerYear
        const more = at({}) * (1 - 1e-12)
        expect(at({ grossHead: drawn.grossHead * 1.1 })).toBeGreaterThanOrEqual(more)
        expect(at({ lossAtDesign: drawn.lossAtDesign * 0.9 })).toBeGreaterThanOrEqual(more)
        expect(at({ availability: 1 })).toBeGreaterThanOrEqual(more)
        expect(at({ minimumFlow: drawn.minimumFlow / 2 })).toBeGreaterThanOrEqual(more)
      }),
      runs,
    )
  })
  test('order of days counts for nothing, and a year twice is that year', () => {
    const once = year({ ...plant, dailyFlows: exampleYear })
    for (const dailyFlows of [exampleYear.toReversed(), [...exampleYear, ...exampleYear]]) {
      const again = year({ ...plant, dailyFlows })
      expectNear(again.energyPerYear, once.energyPerYear, { relative: 1e-12 })
      expectNear(again.runningFraction, once.runningFraction, { relative: 1e-12 })
    }
  })

  test('refuses a loss that eats the head, and efficiencies that cannot be', () => {
    const at = (change: object) => () => year({ ...plant, dailyFlows: exampleYear, ...change })
    expectRefusal('inconsistent', 'lossAtDesign', at({ lossAtDesign: 48 }))
    const twice = [
      { flowFraction: 0.5, efficiency: 0.9 },
      { flowFraction: 0.5, efficiency: 0.8 },
    ]
    expectRefusal('inconsistent', 'partFlowEfficiency[1].flowFraction', at({ partFlowEfficiency: twice }))
    const nothing = [{ flowFraction: 0.5, efficiency: 0 }]
    expectRefusal('no-solution', 'partFlowEfficiency', at({ partFlowEfficiency: nothing }))
    expectRefusal('out-of-range', 'takeShare', at({ takeShare: 50 }))
    expectRefusal('missing', 'dailyFlows', at({ dailyFlows: [] }))
  })
  const said = (change: object) =>
    solve('annual-energy', { ...plant, dailyFlows: exampleYear, ...change })
      .cautions.map(({ say }) => say)
      .join(' ')
  test('says when the record is no whole year, when the stream is flashy, when nothing runs', () => {
    expect(said({})).not.toMatch(/not whole years|flashy|never water enough|more than a third/)
    expect(said({})).toMatch(/licence/)
    for (const days of [200, 363, 500])
      expect(said({ dailyFlows: [...exampleYear, ...exampleYear].slice(0, days) })).toMatch(/not whole years/)
    for (const years of [1, 2, 4, 10]) {
      const days = Math.floor(years * 365.25)
      const dailyFlows = Array.from({ length: days }, (_, i) => exampleYear[i % 365]!)
      expect(said({ dailyFlows }), `${years} years`).not.toMatch(/not whole years/)
    }
    expect(said({ dailyFlows: flashyYear })).toMatch(/flashy/)
    expect(said({ minimumFlow: 0.02 })).toMatch(/never water enough/)
    expect(said({ lossAtDesign: 17 })).toMatch(/more than a third/)
    expect(said({ nozzleSteps: [0.004, 0.008] })).toMatch(/All nozzles open pass less/)
  })
})
