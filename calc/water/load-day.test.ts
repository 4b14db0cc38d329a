import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

interface Found {
  dayEnergy: number
  averageLoad: number
  peakPower: number
  surgePower: number
  spareForDump: number
  batteryHours?: number
}
const day = (inputs: object) => calculate('load-day', inputs) as unknown as Found
const many = (count: number, load: object) => Array.from({ length: count }, () => load)

const house =
  'example 1.1 of a textbook of power generation and its utilisation, as recomputed in a public collection of textbook companions (book not named there)'

describe('load-day', () => {
  outside('published', house, '8 bulbs of 100 W, 2 fans of 60 W, 2 lights of 100 W: connected, and on all day', () => {
    const allDay = [
      ...many(8, { power: 100, hoursPerDay: 24 }),
      ...many(2, { power: 60, hoursPerDay: 24 }),
      ...many(2, { power: 100, hoursPerDay: 24 }),
    ]
    const { peakPower, dayEnergy, averageLoad } = day({ loads: allDay, generatorPower: 2000 })
    expectNear(peakPower, 1120, { relative: 1e-12 })
    expectNear(dayEnergy / 3.6e6, 26.88, { relative: 1e-12 })
    expectNear(averageLoad, 1120, { relative: 1e-12 })
  })
  outside('published', house, 'a fan from midnight, both by day, four bulbs in the evening: 4.94 kWh', () => {
    // One fan runs 5 + 2 + 9 + 6 h, the other not in the first five; a light 2 h; four bulbs 6 h.
    const loads = [
      { power: 60, hoursPerDay: 22 },
      { power: 60, hoursPerDay: 17 },
      { power: 100, hoursPerDay: 2 },
      ...many(4, { power: 100, hoursPerDay: 6 }),
    ]
    expectNear(day({ loads, generatorPower: 2000 }).dayEnergy / 3.6e6, 4.94, { relative: 1e-12 })
  })
  outside(
    'published',
    'V. K. Mehta & R. Mehta, Principles of Power System, 4th ed. 2005, example 3.4, as recomputed in a public collection of textbook companions',
    'a mean of 15 MW makes 360 MWh a day',
    () => {
      // 25 MW at a load factor of 0.6: the day as 14.4 hours of all of it.
      const { averageLoad, dayEnergy } = day({
        loads: [{ power: 5e6, hoursPerDay: 14.4 }, ...many(2, { power: 1e7, hoursPerDay: 14.4 })],
        generatorPower: 3e7,
      })
      expectNear(averageLoad, 15e6, { relative: 1e-12 })
      expectNear(dayEnergy / 3.6e9, 360, { relative: 1e-12 })
    },
  )
  outside(
    'published',
    'howtousesolar.com, Calculating your load',
    'a lamp of 60 W all day is 1440 Wh, a coffee maker of 900 W for a third of an hour 300 Wh',
    () => {
      const { dayEnergy } = day({
        loads: [
          { power: 60, hoursPerDay: 24 },
          { power: 900, hoursPerDay: 1 / 3 },
        ],
        generatorPower: 500,
      })
      expectNear(dayEnergy / 3600, 1440 + 300, { relative: 1e-12 })
    },
  )
  outside(
    'derived',
    'balance of a day: what the generator makes is what the loads take, what the inverter loses and what is spare',
    'joule by joule',
    () => {
      const { dayEnergy, spareForDump } = day({
        loads: [
          { power: 70, hoursPerDay: 5 },
          { power: 450, hoursPerDay: 1.5 },
        ],
        generatorPower: 400,
        inverterEfficiency: 0.9,
      })
      const lost = dayEnergy * (1 / 0.9 - 1)
      expectNear(dayEnergy + lost + spareForDump * 86_400, 400 * 86_400, { relative: 1e-12 })
    },
  )
  outside(
    'derived',
    'a battery drained hour by hour through the inverter until its depth of discharge is reached',
    'lasts as long',
    () => {
      const { averageLoad, batteryHours } = day({
        loads: [{ power: 120, hoursPerDay: 12 }],
        generatorPower: 400,
        batteryEnergy: 4800 * 3600,
        depthOfDischarge: 0.5,
        inverterEfficiency: 0.8,
      })
      let left = 0.5 * 4800
      let hours = 0
      for (; left > 1e-6; hours++) left -= averageLoad / 0.8
      expect(hours).toBe(32)
      expectNear(batteryHours, hours, { relative: 1e-12 })
    },
  )

  test('everything runs and the hardest to start comes last', () => {
    const { peakPower, surgePower } = day({
      loads: [
        { power: 90, hoursPerDay: 8, surgeFactor: 6 },
        { power: 450, hoursPerDay: 1, surgeFactor: 3 },
        { power: 1200, hoursPerDay: 1 },
      ],
      generatorPower: 2000,
    })
    expect(peakPower).toBe(1740)
    // 450 W more twice is harder than 90 W more five times.
    expect(surgePower).toBe(1740 + 900)
  })
  test('a battery without a depth of discharge counts whole, with a caution; without loads it has no hours', () => {
    const loads = [{ power: 100, hoursPerDay: 24 }]
    const whole = solve('load-day', { loads, generatorPower: 200, batteryEnergy: 3.6e6 })
    expectNear(whole.outputs.batteryHours as number, 10, { relative: 1e-12 })
    expect(whole.cautions.map(({ say }) => say).join()).toMatch(/ages quickly/)
    expect(day({ loads, generatorPower: 200 })).not.toHaveProperty('batteryHours')
    const nothingOn = { loads: [{ power: 100, hoursPerDay: 0 }], generatorPower: 200, batteryEnergy: 3.6e6 }
    expect(day(nothingOn)).not.toHaveProperty('batteryHours')
  })
  test('loads beyond the generator leave less than nothing, and stop', () => {
    const { outputs, cautions } = solve('load-day', {
      loads: [{ power: 300, hoursPerDay: 24 }],
      generatorPower: 250,
    })
    expectNear(outputs.spareForDump as number, -50, { relative: 1e-12 })
    expect(cautions[0]).toMatchObject({ level: 'stop' })
  })
  const said = (inputs: object) =>
    solve('load-day', { generatorPower: 1000, ...inputs })
      .cautions.map(({ say }) => say)
      .join(' ')
  test('says what starts and peaks ask for', () => {
    const motor = [{ power: 400, hoursPerDay: 1, surgeFactor: 5 }]
    const all = [{ power: 1400, hoursPerDay: 1 }]
    expect(said({ loads: motor })).toMatch(/worst start/)
    expect(said({ loads: all })).toMatch(/All on at once is more/)
    expect(said({ loads: all, batteryEnergy: 1e7, depthOfDischarge: 0.5 })).toMatch(/maker’s data/)
    expect(said({ loads: [{ power: 400, hoursPerDay: 1 }] })).not.toMatch(/worst start|All on at once/)
    expect(said({ loads: motor })).toMatch(/with everything off the dump load gets all 1.00\u00a0kW/)
  })
  test('the parts add up, whatever the loads', () => {
    const loads = fc.array(
      fc.record({ power: logUniform(1, 1e4), hoursPerDay: uniform(0.01, 24), surgeFactor: uniform(1, 7) }),
      { minLength: 1, maxLength: 20 },
    )
    fc.assert(
      fc.property(loads, logUniform(10, 1e5), uniform(0.5, 1), (loads, generatorPower, inverterEfficiency) => {
        const { dayEnergy, averageLoad, peakPower, surgePower, spareForDump } = day({
          loads,
          generatorPower,
          inverterEfficiency,
        })
        expectNear(averageLoad * 86_400, dayEnergy, { relative: 1e-12 })
        expect(averageLoad).toBeLessThanOrEqual(peakPower * (1 + 1e-12))
        expect(surgePower).toBeGreaterThanOrEqual(peakPower)
        expect(surgePower).toBeLessThanOrEqual(
          loads.reduce((sum, { power, surgeFactor }) => sum + power * surgeFactor, 0) * (1 + 1e-12),
        )
        expectNear(spareForDump + averageLoad / inverterEfficiency, generatorPower, { relative: 1e-9 })
      }),
      runs,
    )
  })
  test('refuses a day of 25 hours', () => {
    expectRefusal('out-of-range', 'loads[0].hoursPerDay', () =>
      day({ loads: [{ power: 1, hoursPerDay: 25 }], generatorPower: 1 }),
    )
    expectRefusal('missing', 'loads', () => day({ loads: [], generatorPower: 1 }))
  })
})
