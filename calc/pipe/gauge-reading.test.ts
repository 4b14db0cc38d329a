import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterDensity } from '../water/properties.ts'

interface Found {
  pressureDrop: number
  velocityHead?: number
  headLoss?: number
  lossFraction?: number
  flowEstimate?: number
  findings: { cause: string; why: string; check: string }[]
}
const reading = (inputs: object) => calculate('gauge-reading', inputs) as unknown as Found

const bar = 1e5
/** A pipe that loses 2.8 m of 4.7 bar at 9.5 L/s, as predicted; each case changes what it reads. */
const asPredicted = {
  staticPressure: 4.7 * bar,
  runningPressure: 4.7 * bar - 2.9 * waterDensity(10) * g,
  insideDiameter: 0.0968,
  flow: 0.0095,
  predictedLoss: 2.8,
  predictedStatic: 4.7 * bar,
  expectedPower: 2000,
  measuredPower: 2000,
}
const low = { runningPressure: 4 * bar }
const high = { runningPressure: 4.65 * bar }
const causes = (change: object) => reading({ ...asPredicted, ...change }).findings.map(({ cause }) => cause)
const whileWatching = ['Air in the pipe', 'Forebay emptying']
const heldBack = ['Screen blocked', 'Air in the pipe', 'Valve part shut', 'Slime in the pipe']

describe('gauge-reading', () => {
  outside('derived', 'the penstock calculator, its nozzle end read as two gauges', 'loss and velocity head', () => {
    const inputs = {
      grossHead: 48,
      sections: [{ length: 240, insideDiameter: 0.0968, roughness: 5e-5, totalK: 1.5 }],
      flow: 0.0095,
      profile: [
        { distance: 0, elevation: 46 },
        { distance: 240, elevation: 0 },
      ],
    }
    const { headLoss, lossFraction, gradeLine } = calculate('penstock', inputs) as unknown as {
      headLoss: number
      lossFraction: number
      gradeLine: { pressureHead: number }[]
    }
    const weight = waterDensity(10) * g
    const found = reading({
      staticPressure: 48 * weight,
      runningPressure: gradeLine.at(-1)!.pressureHead * weight,
      insideDiameter: 0.0968,
      flow: 0.0095,
      predictedLoss: headLoss,
    })
    expectNear(found.headLoss, headLoss, { relative: 1e-10 })
    expectNear(found.lossFraction, lossFraction, { relative: 1e-10 })
    expectNear(found.flowEstimate, 0.0095, { relative: 1e-10 })
  })
  outside('derived', 'rough pipe, where loss goes with the square of the flow', 'flow from the fall', () => {
    // Two readings of one pipe: at half of the flow the fall is a quarter.
    const weight = waterDensity(10) * g
    const velocity = 0.01 / ((Math.PI / 4) * 0.1 ** 2)
    const predictedLoss = 4
    const fall = (predictedLoss + velocity ** 2 / (2 * g)) / 4
    const { flowEstimate } = reading({
      staticPressure: 40 * weight,
      runningPressure: (40 - fall) * weight,
      insideDiameter: 0.1,
      flow: 0.01,
      predictedLoss,
    })
    expectNear(flowEstimate, 0.005, { relative: 1e-12 })
  })
  outside(
    'published',
    'conventional water, 1000 kg/m³ at 9.80665 m/s² (ISO 80000-4 remark)',
    '1 bar is 10.197 m',
    () => {
      const { pressureDrop } = reading({ staticPressure: 3 * bar, runningPressure: 2 * bar, insideDiameter: 0.1 })
      // Water at 10 °C is 0.03 % lighter.
      expectNear(pressureDrop, 10.19716, { relative: 4e-4 })
    },
  )
  outside('derived', 'Bernoulli with the loss at nought', 'the whole fall is velocity head', () => {
    const velocity = 2
    const flow = velocity * (Math.PI / 4) * 0.1 ** 2
    const dynamic = (waterDensity(10) * velocity ** 2) / 2
    const found = reading({
      staticPressure: 2 * bar,
      runningPressure: 2 * bar - dynamic,
      insideDiameter: 0.1,
      flow: flow * (1 - 1e-9),
    })
    expectNear(found.velocityHead, found.pressureDrop, { relative: 1e-8 })
    expectNear(found.headLoss, 0, { absolute: 1e-8 })
  })

  test('the fall is the loss and the velocity head, whatever is read', () => {
    fc.assert(
      fc.property(
        logUniform(1e4, 1e7),
        uniform(0, 1),
        logUniform(0.02, 1),
        logUniform(1e-4, 1),
        (staticPressure, share, insideDiameter, flow) => {
          const found = reading({ staticPressure, runningPressure: share * staticPressure, insideDiameter, flow })
          if (found.headLoss === undefined) expect(found.velocityHead).toBeGreaterThan(found.pressureDrop)
          else expectNear(found.headLoss + found.velocityHead!, found.pressureDrop, { relative: 1e-12 })
        },
      ),
      runs,
    )
  })

  test('without a flow there is no velocity head, no loss and no estimate, and a caution says so', () => {
    const inputs = { staticPressure: 4.7 * bar, runningPressure: 4.4 * bar, insideDiameter: 0.1, predictedLoss: 2.8 }
    expect(Object.keys(reading(inputs)).sort()).toEqual(['findings', 'pressureDrop'])
    expect(solve('gauge-reading', inputs).cautions.find(({ about }) => about.includes('flow'))?.say).toContain(
      'Without a flow',
    )
  })

  test('a fall smaller than the velocity head gives no loss, and a caution says so', () => {
    const inputs = { ...asPredicted, runningPressure: asPredicted.staticPressure }
    expect(reading(inputs)).toMatchObject({ pressureDrop: 0, flowEstimate: 0 })
    expect(reading(inputs)).not.toHaveProperty('headLoss')
    expect(solve('gauge-reading', inputs).cautions.some(({ about }) => about.includes('velocityHead'))).toBe(true)
  })

  test('a gauge that stands at nought gives no share', () => {
    const found = reading({ staticPressure: 0, runningPressure: 0, insideDiameter: 0.1, flow: 0 })
    expect(found).not.toHaveProperty('lossFraction')
    expect(found.headLoss).toBe(0)
  })

  test('running above static is refused; equal is not', () => {
    expectRefusal('inconsistent', 'runningPressure', () => reading({ ...asPredicted, runningPressure: 4.7 * bar + 1 }))
    expect(() => reading({ ...asPredicted, runningPressure: 4.7 * bar })).not.toThrow()
  })

  test('as predicted, nothing is found but what the needle would show', () => {
    expect(causes({})).toEqual(whileWatching)
  })

  test('static right, running low, power low: screen, air, part-shut valve, slime', () => {
    expect(causes({ ...low, measuredPower: 1600 })).toEqual([...heldBack, ...whileWatching])
    expect(reading({ ...asPredicted, ...low, measuredPower: 1600 }).findings[0]!.why).toBe(
      'Static right, running low, power low.',
    )
  })

  test('running low, power the same or higher: nozzle worn or too large', () => {
    for (const measuredPower of [1950, 2000, 2300])
      expect(causes({ ...low, measuredPower })).toEqual(['Nozzle worn or too large', ...whileWatching])
  })

  test('running high, power low: nozzle blocked', () => {
    expect(causes({ ...high, measuredPower: 1600 })).toEqual(['Nozzle blocked', ...whileWatching])
    expect(causes({ ...high, measuredPower: 2000 })).toEqual(whileWatching)
  })

  test('static low: forebay, leak, valve passing, air in a hump, gauge; a blocked screen does not do that', () => {
    const down = { staticPressure: 4.4 * bar, runningPressure: asPredicted.runningPressure - 0.3 * bar }
    const found = causes({ ...down, measuredPower: 1600 })
    expect(found).toEqual([
      'Forebay down',
      'Leak in the pipe',
      'Valve passing',
      'Air locked in a hump',
      'The gauge',
      ...whileWatching,
    ])
    expect(causes({ ...down, runningPressure: 3.8 * bar, measuredPower: 1600 })).not.toContain('Screen blocked')
  })

  test('without powers the causes stand side by side, with what parts them', () => {
    const found = reading({ ...asPredicted, ...low, expectedPower: undefined, measuredPower: undefined }).findings
    expect(found.map(({ cause }) => cause)).toEqual([...heldBack, 'Nozzle worn or too large', ...whileWatching])
    expect(found[0]!.why).toContain('if the power is low too')
    expect(causes({ ...high, measuredPower: undefined })).toEqual(['Nozzle blocked', ...whileWatching])
  })

  test('readings within 3 % of the static pressure and powers within 5 % count as right', () => {
    const running = (change: number) => ({ runningPressure: asPredicted.runningPressure + change * 4.7 * bar })
    expect(causes({ ...running(-0.025), measuredPower: 1000 })).toEqual(whileWatching)
    expect(causes({ ...running(-0.035), measuredPower: 1000 })).toEqual([...heldBack, ...whileWatching])
    expect(causes({ ...low, measuredPower: 1910 })).toContain('Nozzle worn or too large')
    expect(causes({ ...low, measuredPower: 1890 })).not.toContain('Nozzle worn or too large')
  })
})
