import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { solverHeadLoss } from '../testing/network-solver.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterKinematicViscosity } from '../water/properties.ts'
import { frictionFactor, laminarTo, pipeLoss, turbulentFrom } from './friction-factor.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const cengel = `Y. A. Çengel & J. M. Cimbala, Fluid Mechanics, 2nd ed. 2010, ${recomputed}`
const massey = `B. S. Massey & A. J. Ward-Smith, Mechanics of Fluids, 8th ed., ${recomputed}`
const douglas = `J. F. Douglas, Fluid Mechanics, 5th ed. 2005, ${recomputed}`
const fluids = 'fluids 1.3.1 for Python, friction.Colebrook'

/** Darcy f by Reynolds number, at the relative roughnesses of the head. */
const colebrookPoints: readonly (readonly [reynolds: number, relativeRoughness: number, f: number])[] = [
  [4e3, 0, 0.03990701],
  [4e3, 1e-5, 0.03991717],
  [4e3, 1e-4, 0.04000843],
  [4e3, 1e-3, 0.04091039],
  [4e3, 1e-2, 0.04908227],
  [4e3, 5e-2, 0.07698683],
  [1e4, 0, 0.03088295],
  [1e4, 1e-4, 0.03103721],
  [1e4, 5e-2, 0.07380128],
  [1e5, 1e-5, 0.0180438],
  [1e5, 1e-4, 0.01851387],
  [1e5, 5e-2, 0.07178093],
  [1e6, 0, 0.01164504],
  [1e6, 1e-3, 0.01994347],
  [1e6, 1e-2, 0.03796474],
  [1e6, 5e-2, 0.07157375],
  [1e7, 0, 0.008102669],
  [1e7, 1e-5, 0.008995712],
  [1e7, 1e-4, 0.01216608],
  [1e7, 1e-3, 0.01966705],
  [1e7, 1e-2, 0.03790983],
  [1e7, 5e-2, 0.07155298],
  [1e8, 0, 0.005940466],
  [1e8, 1e-5, 0.008187559],
  [1e8, 1e-4, 0.01199905],
  [1e8, 1e-3, 0.01963863],
  [1e8, 1e-2, 0.03790432],
  [1e8, 5e-2, 0.0715509],
]

const reynoldsInJoin = uniform(laminarTo, turbulentFrom)
const relativeRoughness = fc.oneof(fc.constant(0), logUniform(1e-7, 0.05))
const pipes = fc.record({
  flow: logUniform(1e-7, 10),
  insideDiameter: logUniform(0.005, 3),
  length: logUniform(0.1, 1e4),
  relativeRoughness,
})
const headLoss = (inputs: object): number => calculate('friction', inputs).headLoss as number

describe('friction factor', () => {
  for (const [reynolds, roughness, f] of colebrookPoints)
    outside('library', fluids, `Re ${reynolds}, ε/D ${roughness}`, () =>
      // The library's values are kept to 7 digits.
      expectNear(frictionFactor(reynolds, roughness), f, { relative: 1e-6 }),
    )
  outside('library', 'fluids 1.3.1 for Python, its own test', 'Re 1e5, ε/D 1e-4, to all digits', () =>
    expectNear(frictionFactor(1e5, 1e-4), 0.018513866077471648, { relative: 1e-12 }),
  )
  outside('library', 'fluids 1.3.1 for Python, its own test', 'laminar at Re 128', () =>
    expectNear(frictionFactor(128, 0), 0.5, { relative: 1e-15 }),
  )
  outside('derived', 'Colebrook and White’s formula put into itself', 'is solved to 1e-12', () => {
    fc.assert(
      fc.property(logUniform(turbulentFrom, 1e11), fc.oneof(fc.constant(0), logUniform(1e-9, 0.49)), (re, rough) => {
        const x = 1 / Math.sqrt(frictionFactor(re, rough))
        expectNear(-2 * Math.log10(rough / 3.7 + (2.51 * x) / re), x, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('meets both sides of the join in value and in slope', () => {
    fc.assert(
      fc.property(relativeRoughness, fc.constantFrom(laminarTo, turbulentFrom), (rough, at) => {
        const loss = (re: number) => frictionFactor(re, rough) * re ** 2
        const step = at * 1e-6
        expectNear(loss(at + step) / loss(at - step), 1, { absolute: 1e-5 })
        const before = (loss(at) - loss(at - step)) / step
        const after = (loss(at + step) - loss(at)) / step
        expectNear(after, before, { relative: 1e-4 })
      }),
      runs,
    )
  })

  test('head loss rises all through the join, with the flow and with the roughness', () => {
    fc.assert(
      fc.property(reynoldsInJoin, uniform(1e-6, 0.5), relativeRoughness, uniform(1.001, 2), (re, up, rough, more) => {
        const higher = re * (1 + up)
        expect(frictionFactor(higher, rough) * higher ** 2).toBeGreaterThan(frictionFactor(re, rough) * re ** 2)
        expect(frictionFactor(re, rough * more)).toBeGreaterThanOrEqual(frictionFactor(re, rough))
      }),
      runs,
    )
  })
})

describe('friction', () => {
  outside('published', cengel, 'example 8-2, laminar', () => {
    const { reynolds, frictionFactor, headLoss } = pipeLoss(
      (0.9 * Math.PI * 0.003 ** 2) / 4,
      { insideDiameter: 0.003, length: 9, roughness: 0 },
      1.519e-6,
    )
    expectNear(reynolds, 1777, { absolute: 0.5 })
    expectNear(frictionFactor, 0.036, { absolute: 5e-5 })
    // The book's g is 9.81, by 0.03 % more than ours.
    expectNear(headLoss, 4.46, { absolute: 0.005 + 4.46 * 5e-4 })
  })
  outside('published', massey, 'example 7.1, galvanised steel', () => {
    // 1.14 mm²/s is water of 15 °C. The book reads Fanning's 0.00515 off its chart.
    const celsius = bracketedRoot((t) => waterKinematicViscosity(t) - 1.14e-6, 0, 40)!
    const pipe = { flow: 0.05, insideDiameter: 0.15, length: 300, roughness: 1.5e-4, waterTemperature: celsius }
    expectNear(headLoss(pipe), 16.811, { relative: 0.01 })
    expectNear(calculate('friction', pipe).frictionFactor as number, 4 * 0.00515, { relative: 0.01 })
  })
  outside('published', massey, 'example 7.2, flow of a thick liquid by a head of 5 m', () => {
    const pipe = { insideDiameter: 0.1, length: 120, roughness: 2.5e-4 }
    const flow = bracketedRoot((q) => pipeLoss(q, pipe, 1e-5).headLoss - 5, 1e-3, 0.1)
    expectNear(flow, 0.0126, { absolute: 1e-4 })
  })
  outside('published', douglas, 'example 10.3(a), laminar', () => {
    const pipe = { insideDiameter: 0.04, length: 750, roughness: 0 }
    // Printed to 4 digits with g = 9.81.
    expectNear(pipeLoss(4 / 60000, pipe, 1.14e-6).headLoss, 0.0925, { absolute: 1e-4 + 0.0925 * 5e-4 })
  })

  for (const [name, pipe] of Object.entries({
    'new polyethylene': { flow: 0.012, insideDiameter: 0.0968, length: 250, roughness: 7e-6 },
    'polyethylene in service': { flow: 0.0095, insideDiameter: 0.0968, length: 120, roughness: 5e-5 },
    'galvanised steel': { flow: 0.025, insideDiameter: 0.1476, length: 600, roughness: 1.5e-4 },
    'steel penstock': { flow: 0.06, insideDiameter: 0.2204, length: 800, roughness: 4.5e-5 },
    'cast iron': { flow: 0.09, insideDiameter: 0.3, length: 1000, roughness: 2.6e-4 },
  }))
    outside('library', 'EPANET 2.3 in npm epanet-js 0.9.0', name, async () => {
      const kinematicViscosity = waterKinematicViscosity(10)
      // The solver's friction factor is Swamee and Jain's: see there.
      expectNear(headLoss(pipe), await solverHeadLoss({ ...pipe, kinematicViscosity }), { relative: 0.015 })
    })
  outside('library', 'EPANET 2.3 in npm epanet-js 0.9.0', 'laminar', async () => {
    const pipe = { flow: 5e-5, insideDiameter: 0.05, length: 100, roughness: 1.5e-6 }
    const theirs = await solverHeadLoss({ ...pipe, kinematicViscosity: waterKinematicViscosity(10) })
    // g = 32.2 ft/s² there; heads come in single precision from a level of 1000 m.
    expectNear(headLoss(pipe), theirs, { relative: 1e-3, absolute: 1e-5 })
  })
  outside('derived', 'Hagen and Poiseuille, 128νLQ/(πgD⁴)', 'laminar', () => {
    const [Q, D, L] = [2e-5, 0.04, 300]
    expectNear(
      headLoss({ flow: Q, insideDiameter: D, length: L, roughness: 1e-4 }),
      (128 * waterKinematicViscosity(10) * L * Q) / (Math.PI * g * D ** 4),
      { relative: 1e-12 },
    )
  })

  test('rises with flow, length and roughness, falls with the bore', () => {
    fc.assert(
      fc.property(pipes, uniform(1.0001, 3), ({ relativeRoughness, ...pipe }, more) => {
        const inputs = { ...pipe, roughness: Math.min(0.05, relativeRoughness * pipe.insideDiameter) }
        const loss = headLoss(inputs)
        expect(loss).toBeGreaterThan(0)
        expect(headLoss({ ...inputs, flow: inputs.flow * more })).toBeGreaterThan(loss)
        expect(headLoss({ ...inputs, length: inputs.length * more })).toBeGreaterThan(loss)
        expect(headLoss({ ...inputs, insideDiameter: inputs.insideDiameter * more })).toBeLessThan(loss)
        expect(headLoss({ ...inputs, roughness: Math.min(0.05, inputs.roughness * more) })).toBeGreaterThanOrEqual(loss)
      }),
      runs,
    )
  })

  test('head loss, gradient and length agree', () => {
    fc.assert(
      fc.property(pipes, ({ relativeRoughness, ...pipe }) => {
        const found = calculate('friction', {
          ...pipe,
          roughness: Math.min(0.05, relativeRoughness * pipe.insideDiameter),
        })
        expectNear((found.gradient as number) * pipe.length, found.headLoss as number, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('a flow is found again from the head that it loses', () => {
    fc.assert(
      fc.property(pipes, ({ relativeRoughness, flow, ...pipe }) => {
        const inputs = { ...pipe, roughness: Math.min(0.05, relativeRoughness * pipe.insideDiameter) }
        const loss = headLoss({ ...inputs, flow })
        const back = bracketedRoot((q) => headLoss({ ...inputs, flow: q }) - loss, flow / 7, flow * 5)
        expectNear(back, flow, { relative: 1e-9 })
      }),
      runs,
    )
  })

  const pipe = { insideDiameter: 0.1, length: 100, roughness: 5e-5 }

  test('standing water loses nothing and has no friction factor', () => {
    for (const flow of [0, Number.MIN_VALUE]) {
      const { outputs, working } = solve('friction', { ...pipe, flow })
      expect(outputs).toMatchObject({ headLoss: 0, gradient: 0, regime: 'laminar' })
      expect(outputs).not.toHaveProperty('frictionFactor')
      expect(working.map(({ say }) => say).join(' ')).toContain('stands still')
    }
  })

  test('a smooth wall is allowed; one as rough as the bore is not', () => {
    expect(headLoss({ ...pipe, flow: 0.01, roughness: 0 })).toBeLessThan(headLoss({ ...pipe, flow: 0.01 }))
    expectRefusal('inconsistent', 'roughness', () =>
      calculate('friction', { ...pipe, insideDiameter: 0.02, flow: 0.01, roughness: 0.01 }),
    )
    expectRefusal('out-of-range', 'roughness', () => calculate('friction', { ...pipe, flow: 0.01, roughness: -1e-5 }))
    expectRefusal('out-of-range', 'flow', () => calculate('friction', { ...pipe, flow: -0.01 }))
    expectRefusal('missing', 'length', () => calculate('friction', { ...pipe, length: undefined, flow: 0.01 }))
  })

  const says = (flow: number, about: string, change: object = {}) =>
    solve('friction', { ...pipe, ...change, flow }).cautions.filter((caution) => caution.about.includes(about))

  test('cautions: the label, the join, the roughness, the speed', () => {
    expect(says(0.01, 'insideDiameter')).toHaveLength(1)
    expect(says(2.5e-4, 'frictionFactor').map(({ level }) => level)).toEqual(['check'])
    expect(says(0.01, 'frictionFactor')).toEqual([])
    expect(says(0.01, 'velocity')).toEqual([])
    expect(says(0.03, 'velocity').map(({ level }) => level)).toEqual(['check'])
    expect(says(0.003, 'velocity').map(({ level }) => level)).toEqual(['note'])
    expect(says(0.01, 'roughness', { roughness: 0.006 }).some(({ say }) => say.includes('twentieth'))).toBe(true)
  })

  test('each kind of flow has its working', () => {
    const formula = (flow: number) =>
      solve('friction', { ...pipe, flow }).working.find(({ gives }) => gives === 'frictionFactor')!
    expect(formula(1e-4).symbols).toBe('f = \\frac{64}{\\mathrm{Re}}')
    expect(formula(2.5e-4).say).toContain('no formula holds')
    expect(formula(0.01).speech).toContain('logarithm to ten')
    expect(formula(0.01).numbers).toMatch(/= 0\.0\d{3}$/)
  })
})
