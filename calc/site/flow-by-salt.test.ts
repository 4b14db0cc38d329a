import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

type Pairs = readonly (readonly [time: number, conductivity: number])[]
const given = (pairs: Pairs, more: object = {}) => ({
  saltMass: 1,
  readings: pairs.map(([time, conductivity]) => ({ time, conductivity })),
  background: 100,
  calibration: 0.5,
  ...more,
})
const salt = (pairs: Pairs, more: object = {}) =>
  calculate('flow-by-salt', given(pairs, more)) as { flow: number; peakConductivity: number; recovered: number }
const cautions = (pairs: Pairs, more: object = {}) =>
  solve('flow-by-salt', given(pairs, more))
    .cautions.map(({ say }) => say)
    .join(' ')

const triangle: Pairs = [
  [0, 100],
  [100, 100],
  [140, 300],
  [240, 100],
  [300, 100],
]
/** t·e^(−t/τ): area H·τ² under the whole curve, H·τ·(T + τ)·e^(−T/τ) of it after T. */
const hump = (height: number, tau: number, until: number, step: number): Pairs =>
  Array.from({ length: Math.floor(until / step) + 1 }, (_, i) => {
    const t = i * step
    return [t, 100 + height * t * Math.exp(-t / tau)]
  })

describe('flow-by-salt', () => {
  outside(
    'published',
    'N. A. Chappell, Lancaster University, dilution gauging example worksheet: 900 g, White Scar, 4 February 1995 (its columns; the sum by its own rule is made here)',
    'seventeen readings at half minutes',
    () => {
      const read = [125, 125, 125, 125, 250, 417, 369, 274, 202, 163, 145, 135, 130, 128, 127, 126, 126]
      const concentration = [0, 0, 0, 0, 87, 204, 170, 104, 53, 26, 14, 7, 3, 2, 1, 0, 0]
      const theirs = 0.9 / ((30 * concentration.reduce((sum, c) => sum + c, 0)) / 1000)
      const found = salt(
        read.map((conductivity, i) => [30 * i, conductivity] as const),
        { saltMass: 0.9, background: 125, calibration: 0.7 },
      )
      // Its concentrations are rounded to the milligram.
      expectNear(found.flow, theirs, { relative: 0.012 })
      expectNear(theirs, 0.0447, { absolute: 5e-5 })
      expect(found.peakConductivity).toBe(417)
      expect(found.recovered).toBeGreaterThan(0.99)
    },
  )
  outside('derived', 'a triangle’s area by hand', '140 s long, 200 µS/cm high', () => {
    // 1 kg over 0.5 mg/L per µS/cm × 14 000 µS·s/cm.
    const { flow, recovered } = salt(triangle)
    expect(flow).toBeCloseTo(1e6 / (0.5 * 14_000) / 1000, 12)
    expect(recovered).toBe(1)
  })
  outside('derived', 'the integral of t·exp(−t/τ) in closed form', 'read to the end', () => {
    const tau = 60
    expectNear(salt(hump(5, tau, 1200, 2)).flow, 1000 / (0.5 * 5 * tau ** 2), { relative: 2e-3 })
  })
  outside('derived', 'a pure exponential limb: the tail is its last height over its decay', 'cut at a tenth', () => {
    const decay = 0.02
    const times = Array.from({ length: 24 }, (_, i) => 10 + 5 * i)
    const limb = times.map((t) => [t, 100 + 200 * Math.exp(-decay * (t - 10))] as const)
    const pairs: Pairs = [[0, 100], ...limb]
    const last = limb.at(-1)![1] - 100
    const area = (i: number) => ((pairs[i]![1] + pairs[i - 1]![1] - 200) / 2) * (pairs[i]![0] - pairs[i - 1]![0])
    const read = pairs.slice(1).reduce((sum, _, i) => sum + area(i + 1), 0)
    expectNear(salt(pairs).recovered, read / (read + last / decay), { relative: 1e-9 })
  })

  test('the clock does not matter, nor where the background lies', () => {
    fc.assert(
      fc.property(uniform(1, 1e5), uniform(-90, 500), logUniform(0.01, 10), (later, raised, mass) => {
        const there = salt(hump(5, 60, 400, 10), { saltMass: mass })
        const elsewhere = salt(
          hump(5, 60, 400, 10).map(([t, c]) => [t + later, c + raised] as const),
          { saltMass: mass, background: 100 + raised },
        )
        expectNear(elsewhere.flow, there.flow, { relative: 1e-6 })
        expectNear(elsewhere.recovered, there.recovered, { relative: 1e-6 })
      }),
      runs,
    )
  })
  test('what is read later adds to what is recovered, and lowers the flow', () => {
    fc.assert(
      fc.property(uniform(150, 500), uniform(20, 200), (until, more) => {
        const [early, late] = [salt(hump(5, 60, until, 5)), salt(hump(5, 60, until + more, 5))]
        expect(late.recovered).toBeGreaterThan(early.recovered)
        expect(late.flow).toBeLessThan(early.flow)
      }),
      runs,
    )
  })
  test('noise under the background counts minus', () => {
    const noisy = triangle.map(([t, c]) => [t, t === 0 ? c - 1 : c] as const)
    expect(salt(noisy).flow).toBeGreaterThan(salt(triangle).flow)
    expect(cautions(noisy)).not.toMatch(/under the background/)
    expect(cautions(triangle, { background: 108 })).toMatch(/under the background/)
  })
  test('refuses times that do not rise, at the first', () => {
    const swapped: Pairs = [triangle[0]!, triangle[2]!, triangle[1]!, triangle[3]!]
    expectRefusal('inconsistent', 'readings[2].time', () => salt(swapped))
    expectRefusal('inconsistent', 'readings[1].time', () => salt([triangle[0]!, triangle[0]!, triangle[2]!]))
  })
  test.each<[string, Pairs, object]>([
    ['flat', triangle.map(([t]) => [t, 100] as const), {}],
    ['still rising', triangle.slice(0, 3), {}],
    ['falling from the first', triangle.slice(2), {}],
    ['all under the background', triangle, { background: 400 }],
  ])('refuses readings that are %s', (_, pairs, more) => {
    expectRefusal('no-solution', 'readings', () => salt(pairs, more))
  })
  test('says that the dose must be harmless and allowed, and what it does', () => {
    expect(cautions(triangle)).toMatch(/harmless.*allowed.*100 mg\/L.*local code/s)
  })
  test('warns of a curve cut short and of a faint peak', () => {
    expect(cautions(hump(5, 60, 200, 5))).toMatch(/stop too soon/)
    expect(cautions(hump(5, 60, 900, 5))).not.toMatch(/stop too soon|less than half/)
    expect(cautions(hump(1, 60, 900, 5))).toMatch(/less than half/)
  })
})
