import { describe, expect, test } from 'vitest'
import { calculate, monteCarlo, withUncertainty } from './solve.ts'
import { expectNear } from './testing/near.ts'
import { outside } from './testing/outside-check.ts'
import { expectRefusal } from './testing/refusal.ts'

const power = { flow: 0.0095, netHead: 43, efficiency: 0.55 }
const powerUncertainty = { flow: 0.03 * 0.0095, netHead: 0.01 * 43, efficiency: 0.02 * 0.55 }
const penstock = {
  grossHead: 48,
  sections: [
    { length: 90, insideDiameter: 0.1308, roughness: 5e-5, totalK: 0.9 },
    { length: 150, insideDiameter: 0.0968, roughness: 5e-5 },
  ],
  nozzles: { count: 1, diameter: 0.02, dischargeCoefficient: 0.95 },
}

describe('law of propagation', () => {
  outside('derived', 'JCGM 100:2008, equation (12), product of powers', 'power from flow, head and efficiency', () => {
    const { outputPower } = withUncertainty('power', power, powerUncertainty).outputs
    // √(0.03² + 0.01² + 0.02²)
    expectNear(outputPower!.standardUncertainty / outputPower!.value, 0.0374166, { absolute: 1e-7 })
    expectNear(outputPower!.shares.flow, 9 / 14, { absolute: 1e-6 })
    expectNear(outputPower!.shares.netHead, 1 / 14, { absolute: 1e-6 })
    expectNear(outputPower!.shares.efficiency, 4 / 14, { absolute: 1e-6 })
  })
  outside(
    'derived',
    'JCGM 100:2008, equation (12), product of powers',
    'jet from head to the half, nozzle squared',
    () => {
      const inputs = { netHead: 45, velocityCoefficient: 0.97, jetCount: 1, nozzleDiameter: 0.02 }
      const { flow, jetVelocity, jetPower } = withUncertainty('jet', inputs, {
        netHead: 0.45,
        velocityCoefficient: 0.0097,
        nozzleDiameter: 2e-4,
      }).outputs
      const of = (output: { value: number; standardUncertainty: number } | undefined) =>
        output!.standardUncertainty / output!.value
      expectNear(of(jetVelocity), 0.01 * Math.hypot(0.5, 1), { relative: 1e-6 })
      expectNear(of(flow), 0.01 * Math.hypot(0.5, 1, 2), { relative: 1e-6 })
      expectNear(of(jetPower), 0.01 * Math.hypot(1.5, 3, 2), { relative: 1e-6 })
    },
  )
  outside('derived', 'JCGM 100:2008, equation (11a), sum of independent parts', 'fall of a gauge', () => {
    const inputs = { staticPressure: 4.7e5, runningPressure: 4.4e5, insideDiameter: 0.1 }
    const { pressureDrop } = withUncertainty('gauge-reading', inputs, {
      staticPressure: 4000,
      runningPressure: 3000,
    }).outputs
    const perPascal = pressureDrop!.value / 30_000
    expectNear(pressureDrop!.standardUncertainty, 5000 * perPascal, { relative: 1e-9 })
    expectNear(pressureDrop!.shares.staticPressure, 0.64, { absolute: 1e-9 })
  })

  test('reaches into rows, groups and lists', () => {
    const { flow } = withUncertainty('penstock', penstock, {
      grossHead: 0.2,
      'sections[1].insideDiameter': 2e-4,
      'sections[1].totalK': 0.1,
      'nozzles.diameter': 1e-4,
    }).outputs
    expect(Object.values(flow!.shares).every((share) => share > 0)).toBe(true)
    expectNear(
      Object.values(flow!.shares).reduce((sum, share) => sum + share, 0),
      1,
      { absolute: 1e-12 },
    )
    // The flow goes nearly with the square of the nozzle: most of what is not known.
    expect(flow!.shares['nozzles.diameter']).toBeGreaterThan(0.5)
    const bucket = { volume: 0.02, times: [9.8, 10.1, 10.2] }
    const each = withUncertainty('flow-by-bucket', bucket, { 'times[2]': 0.1 }).outputs.flow!
    const all = withUncertainty('flow-by-bucket', bucket, { volume: 1e-4 }).outputs.flow!
    // A third of one timing's 1 %, beside the volume's 0.5 %.
    expectNear(each.standardUncertainty / each.value, 0.1 / 30.1, { relative: 1e-3 })
    expectNear(all.standardUncertainty / all.value, 0.005, { relative: 1e-6 })
  })

  test('of nothing there is none, and the values are the calculator’s own', () => {
    const { outputs } = withUncertainty('power', power, { flow: 0 })
    expect(outputs.outputPower).toEqual({
      value: calculate('power', power).outputPower,
      standardUncertainty: 0,
      shares: {},
    })
    expect(withUncertainty('power', power, {}).outputs.hydraulicPower!.standardUncertainty).toBe(0)
  })

  test('takes a one-sided step at the end of a range', () => {
    const inputs = { netHead: 45, velocityCoefficient: 1, jetCount: 1, flow: 0.01 }
    const { jetVelocity } = withUncertainty('jet', inputs, { velocityCoefficient: 0.01 }).outputs
    expectNear(jetVelocity!.standardUncertainty, 0.01 * jetVelocity!.value, { relative: 1e-6 })
  })

  test('takes a one-sided step where the other side is refused', () => {
    const inputs = { staticPressure: 4.4e5, runningPressure: 4.4e5, insideDiameter: 0.1 }
    const { pressureDrop } = withUncertainty('gauge-reading', inputs, { runningPressure: 3000 }).outputs
    expectNear(pressureDrop!.standardUncertainty, 3000 / (999.7 * 9.80665), { relative: 1e-4 })
  })

  test('an input left to its default may be uncertain too', () => {
    const { outputs } = withUncertainty('penstock', penstock, { waterTemperature: 3 })
    expect(outputs.headLoss!.standardUncertainty).toBeGreaterThan(0)
  })
})

describe('both ways of propagating', () => {
  const seed = 'agreement'
  const trials = 4000
  /** Five standard deviations of a standard deviation from that many normal draws. */
  const tolerance = 5 / Math.sqrt(2 * trials)

  test.each([
    ['power', power, powerUncertainty],
    ['penstock', penstock, { grossHead: 0.2, 'nozzles.diameter': 1e-4, 'sections[1].insideDiameter': 3e-4 }],
    [
      'runner',
      { netHead: 45, velocityCoefficient: 0.97, speedRatio: 0.46, pitchDiameter: 0.21 },
      { netHead: 0.5, velocityCoefficient: 0.003, pitchDiameter: 1e-3 },
    ],
  ])('agree where a calculator is nearly straight: %s', (id, inputs, uncertainties) => {
    const first = withUncertainty(id, inputs, uncertainties).outputs
    const second = monteCarlo(id, inputs, uncertainties, { trials, seed }).outputs
    expect(Object.keys(second).sort()).toEqual(Object.keys(first).sort())
    for (const [key, { value, standardUncertainty }] of Object.entries(first)) {
      const drawn = second[key]!
      expectNear(drawn.standardUncertainty, standardUncertainty, { relative: tolerance, absolute: 1e-9 })
      expectNear(drawn.mean, value, {
        absolute: (5 / Math.sqrt(trials)) * standardUncertainty + 2e-3 * Math.abs(value),
      })
      // 95 % of a normal quantity lies within 1.96 standard deviations.
      const [low, high] = drawn.interval95
      expectNear(high - low, 2 * 1.96 * standardUncertainty, { relative: 0.1, absolute: 1e-9 })
    }
  })
})

describe('propagation of distributions', () => {
  const jet = { netHead: 45, velocityCoefficient: 0.99, jetCount: 1, flow: 0.01 }

  test('the same seed gives the same result, another seed another', () => {
    const run = (seed: string | number) => monteCarlo('power', power, powerUncertainty, { trials: 50, seed })
    expect(run(1)).toEqual(run('1'))
    expect(run(1)).not.toEqual(run(2))
  })

  test('draws outside a range are drawn again, and counted', () => {
    const half = monteCarlo(
      'jet',
      { ...jet, velocityCoefficient: 1 },
      { velocityCoefficient: 0.01 },
      { trials: 400, seed: 1 },
    )
    // Half of all draws lie above 1.
    expectNear(half.redrawn, 400, { absolute: 150 })
    expect(half.outputs.nozzleEfficiency!.interval95[1]).toBeLessThanOrEqual(1)
    expect(monteCarlo('power', power, powerUncertainty, { trials: 50, seed: 1 }).redrawn).toBe(0)
  })

  test('ends where hardly a draw can be worked out', () => {
    expectRefusal('no-solution', 'velocityCoefficient', () =>
      monteCarlo('jet', jet, { velocityCoefficient: 1e9 }, { trials: 2, seed: 1 }),
    )
  })
})

describe('both refuse', () => {
  const either = [
    (inputs: object, uncertainties: Record<string, number>) =>
      withUncertainty('penstock', { ...penstock, ...inputs }, uncertainties),
    (inputs: object, uncertainties: Record<string, number>) =>
      monteCarlo('penstock', { ...penstock, ...inputs }, uncertainties, { trials: 2, seed: 1 }),
  ]
  test.each(either)('bad inputs, unknown fields and uncertainties that are none', (run) => {
    expectRefusal('out-of-range', 'grossHead', () => run({ grossHead: -1 }, {}))
    for (const field of [
      'head',
      'sections',
      'sections.length',
      'grossHead[0]',
      'sections[0].bore',
      '__proto__',
      'nozzles',
    ])
      expectRefusal('unknown-key', field, () => run({}, Object.fromEntries([[field, 1]])))
    expectRefusal('not-finite', 'grossHead', () => run({}, { grossHead: -1 }))
    expectRefusal('not-finite', 'grossHead', () => run({}, { grossHead: NaN }))
  })
  test.each(either)('the uncertainty of what is not there, or is counted', (run) => {
    expectRefusal('missing', 'flow', () => run({}, { flow: 1e-4 }))
    expectRefusal('missing', 'sections[2].length', () => run({}, { 'sections[2].length': 1 }))
    expectRefusal('missing', 'sections[2].totalK', () => run({}, { 'sections[2].totalK': 1 }))
    expectRefusal('missing', 'profile[0].elevation', () => run({}, { 'profile[0].elevation': 1 }))
    expectRefusal('inconsistent', 'nozzles.count', () => run({}, { 'nozzles.count': 1 }))
  })
})
