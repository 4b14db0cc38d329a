import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { initialInputs } from '../initial.ts'
import { calculate, calculator, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { solverHeadLoss } from '../testing/network-solver.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterKinematicViscosity } from '../water/properties.ts'
import {
  fittingK,
  fittingKinds,
  joints,
  kindsOfFitting,
  roundedEntranceK,
  sweptBendK,
  taperContractionK,
  taperExpansionK,
  type Fitting,
  type Shape,
} from './fitting-losses.ts'
import { pipeLoss } from './friction-factor.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const tables = 'tables of Munson, Young & Okiishi and others, as copied in lecture notes'
const fluids = 'fluids 1.3.1 for Python'
const usualFriction = 0.018

const shape: Required<Pick<Fitting, Shape>> = {
  bendAngle: 45,
  radiusRatio: 3,
  diameterRatio: 0.6,
  coneAngle: 20,
  joint: 'flanged',
}
/** A fitting of this kind with what it needs. */
const whole = (kind: Fitting['kind']): Fitting => ({
  kind,
  ...Object.fromEntries(kindsOfFitting[kind].needs.map((key) => [key, shape[key]])),
})
const pipe = { flow: 0.0095, insideDiameter: 0.0968 }
const found = (fittings: readonly object[], more: object = {}) =>
  calculate('fittings', { ...pipe, fittings, ...more }) as Record<string, number>
const kOf = (fitting: Fitting) => found([{ ...fitting, count: 1 }]).totalK!

describe('K of fittings', () => {
  for (const [fitting, k] of [
    [{ kind: 'globe-valve' }, 10],
    [{ kind: 'gate-valve' }, 0.15],
    [{ kind: 'ball-valve' }, 0.05],
    [{ kind: 'check-valve' }, 2],
    [{ kind: 'elbow-90', joint: 'flanged' }, 0.3],
    [{ kind: 'elbow-90', joint: 'threaded' }, 1.5],
    [{ kind: 'long-elbow-90', joint: 'threaded' }, 0.7],
    [{ kind: 'elbow-45', joint: 'threaded' }, 0.4],
    [{ kind: 'tee-through', joint: 'flanged' }, 0.2],
    [{ kind: 'tee-through', joint: 'threaded' }, 0.9],
    [{ kind: 'tee-branch', joint: 'flanged' }, 1],
    [{ kind: 'tee-branch', joint: 'threaded' }, 2],
  ] as const)
    outside('published', tables, Object.values(fitting).join(', '), () =>
      // Books differ by as much.
      expectNear(kOf(fitting), k, { relative: 0.3 }),
    )

  for (const [fitting, low, high] of [
    [{ kind: 'entrance-sharp' }, 0.48, 0.52],
    [{ kind: 'entrance-projecting' }, 0.8, 1],
    [{ kind: 'entrance-rounded', radiusRatio: 0.2 }, 0.03, 0.05],
    [{ kind: 'exit' }, 0.98, 1.02],
    [{ kind: 'mitre-bend', bendAngle: 90 }, 1.1, 1.3],
    [{ kind: 'butterfly-valve' }, 0.3, 1.2],
  ] as const)
    outside('published', tables, `${fitting.kind} between ${low} and ${high}`, () => {
      expect(kOf(fitting)).toBeGreaterThanOrEqual(low)
      expect(kOf(fitting)).toBeLessThanOrEqual(high)
    })

  for (const [kind, bores] of [
    ['elbow-90', 30],
    ['elbow-45', 16],
  ] as const)
    outside('library', `${fluids}, its test of Crane TP-410, A-29`, `${kind} is ${bores} bores long`, () =>
      expectNear(fittingK({ kind, joint: 'fused' }, 0.0163), bores * 0.0163, { relative: 1e-12 }),
    )
  outside('library', `${fluids}, Crane TP-410`, 'rounding of a tenth of the bore', () =>
    expectNear(roundedEntranceK(0.1), 0.09, { absolute: 1e-12 }),
  )
  outside('library', `${fluids}, bend_rounded by Crane TP-410`, 'long fused elbow', () =>
    expectNear(fittingK({ kind: 'long-elbow-90', joint: 'fused' }, 0.016288), 0.229, { relative: 0.15 }),
  )

  for (const [radiusRatio, k] of [
    [1, 0.31343],
    [1.5, 0.2254],
    [2, 0.20378],
    [3, 0.20651],
    [5, 0.24999],
    [10, 0.38584],
    [20, 0.6672],
  ] as const)
    outside('library', `${fluids}, bend_rounded by Rennels & Hudson 2012`, `90° at R/D ${radiusRatio}`, () =>
      expectNear(kOf({ kind: 'swept-bend', bendAngle: 90, radiusRatio }), k, { relative: 5e-5 }),
    )
  outside(
    'library',
    `${fluids}, bend_rounded by Rennels & Hudson 2012, its own test`,
    '30° at five nominal bores',
    () => expectNear(sweptBendK(30, (4 * 5) / 4.02, 0.0163), 0.10680196344492195, { relative: 1e-12 }),
  )
  outside('library', `${fluids}, bend_miter by Rennels & Hudson 2012, its own test`, '150°', () =>
    expectNear(kOf({ kind: 'mitre-bend', bendAngle: 150 }), 2.7128147734758103, { relative: 1e-12 }),
  )

  for (const [kind, diameterRatio, k] of [
    ['sudden-expansion', 0.25, 0.87890625],
    ['sudden-expansion', 0.75, 0.19140625],
    ['sudden-contraction', 0.25, 0.46875],
    ['sudden-contraction', 0.5, 0.375],
  ] as const)
    outside('library', `${fluids}, Borda–Carnot and Crane TP-410`, `${kind}, ratio ${diameterRatio}`, () =>
      expectNear(kOf({ kind, diameterRatio }), k, { relative: 1e-12 }),
    )
  for (const [kind, coneAngle, k] of [
    ['taper-expansion', 10, 0.069828],
    ['taper-expansion', 60, 0.30815],
    ['taper-contraction', 10, 0.038705],
    ['taper-contraction', 20, 0.077115],
  ] as const)
    // The library's bores, 0.1 and 0.15 m or so, are told as 0.667.
    outside('library', `${fluids}, Crane TP-410, A-26`, `${kind}, ${coneAngle}°`, () =>
      expectNear(kOf({ kind, diameterRatio: 0.667, coneAngle }), k, { relative: 0.002 }),
    )

  test('a taper of 180° is a step', () => {
    expect(taperExpansionK(0.6, 180)).toBe(kOf({ kind: 'sudden-expansion', diameterRatio: 0.6 }))
    expectNear(taperContractionK(0.6, 180), kOf({ kind: 'sudden-contraction', diameterRatio: 0.6 }), {
      relative: 1e-12,
    })
  })

  test('a rounded entrance runs from sharp to flat', () => {
    expect([0, 0.01, 0.15, 5].map(roundedEntranceK)).toEqual([0.5, 0.39, 0.04, 0.04])
  })
})

describe('fittings', () => {
  outside(
    'published',
    `K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, ${recomputed}`,
    'example 11.1, pressure after a step to a larger bore',
    () => {
      const flow = 0.45 / 60
      const { headLoss, velocityHead } = calculate('fittings', {
        flow,
        insideDiameter: 0.06,
        fittings: [{ kind: 'sudden-expansion', count: 1, diameterRatio: 0.06 / 0.09 }],
      }) as Record<string, number>
      const after = velocityHead! * (0.06 / 0.09) ** 4
      // The book's γ is 9.79 kN/m³ and its g 9.81 m/s².
      expectNear(20 + 9.79 * (velocityHead! - after - headLoss!), 21.73, { absolute: 0.02 })
    },
  )
  outside(
    'published',
    `J. F. Douglas, Fluid Mechanics, 5th ed. 2005, ${recomputed}`,
    'example 10.7, larger bore against smaller, 0.14 and 0.25 m',
    () => {
      // Turned round, the head between the pipes differs by 0.6 m; the book's contraction has K = 0.33.
      const velocity = 9.13
      const { velocityHead, headLoss } = calculate('fittings', {
        flow: (velocity * Math.PI * 0.14 ** 2) / 4,
        insideDiameter: 0.14,
        fittings: [{ kind: 'sudden-expansion', count: 1, diameterRatio: 0.14 / 0.25 }],
      }) as Record<string, number>
      expectNear(headLoss! - 0.33 * velocityHead!, 0.6, { absolute: 0.02 })
    },
  )
  outside('library', 'EPANET 2.3 in npm epanet-js 0.9.0', 'loss of all K on one velocity head', async () => {
    const rows = [
      { kind: 'entrance-sharp', count: 1 },
      { kind: 'elbow-90', count: 3, joint: 'threaded' },
      { kind: 'globe-valve', count: 1 },
    ]
    const { totalK, headLoss } = found(rows)
    const length = 1
    const kinematicViscosity = waterKinematicViscosity(10)
    const bare = { ...pipe, length, roughness: 5e-5, kinematicViscosity }
    const theirs = (await solverHeadLoss({ ...bare, totalK })) - (await solverHeadLoss(bare))
    expect(totalK).toBe(15)
    // Its g is 32.2 ft/s².
    expectNear(headLoss, theirs, { relative: 1.5e-3 })
  })
  outside('derived', 'Darcy and Weisbach turned round', 'the equivalent length loses as much as the fittings', () => {
    const straight = { insideDiameter: pipe.insideDiameter, roughness: 5e-5 }
    const { frictionFactor } = pipeLoss(pipe.flow, { ...straight, length: 1 }, waterKinematicViscosity(10))
    const { equivalentLength, headLoss } = found([{ kind: 'check-valve', count: 1 }], { frictionFactor })
    const alone = pipeLoss(pipe.flow, { ...straight, length: equivalentLength! }, waterKinematicViscosity(10))
    expectNear(alone.headLoss, headLoss!, { relative: 1e-12 })
  })

  test('each row and all rows together', () => {
    const { outputs } = solve('fittings', {
      ...pipe,
      fittings: [
        { kind: 'gate-valve', count: 2 },
        { kind: 'exit', count: 1 },
      ],
    })
    const velocityHead = ((4 * pipe.flow) / (Math.PI * pipe.insideDiameter ** 2)) ** 2 / (2 * g)
    expectNear(outputs.velocityHead as number, velocityHead, { relative: 1e-12 })
    expectNear(outputs.totalK as number, 1.3, { relative: 1e-12 })
    expectNear(outputs.headLoss as number, 1.3 * velocityHead, { relative: 1e-12 })
    expect(outputs.rows).toMatchObject([
      { kind: 'gate-valve', count: 2, k: 0.15 },
      { kind: 'exit', count: 1, k: 1 },
    ])
    expectNear((outputs.rows as { headLoss: number }[])[0]!.headLoss, 0.3 * velocityHead, { relative: 1e-12 })
  })

  test('no fittings lose nothing', () => {
    expect(found([])).toMatchObject({ totalK: 0, headLoss: 0, equivalentLength: 0, rows: [] })
  })

  test('tells what each kind needs, and refuses what it has not', () => {
    for (const kind of fittingKinds) {
      const { needs, takes = [] } = kindsOfFitting[kind]
      const rows = (fitting: object) => [{ kind: 'exit', count: 1 }, fitting]
      expect(Number.isFinite(found(rows({ ...whole(kind), count: 1 })).totalK)).toBe(true)
      for (const key of Object.keys(shape) as Shape[]) {
        const field = `fittings[1].${key}`
        if (needs.includes(key))
          expectRefusal('missing', field, () => found(rows({ ...whole(kind), count: 1, [key]: undefined })))
        else if (!takes.includes(key))
          expectRefusal('inconsistent', field, () => found(rows({ ...whole(kind), count: 1, [key]: shape[key] })))
      }
    }
  })

  test('refuses bends outside of their formulas, unknown kinds and parts of fittings', () => {
    const one = (fitting: object) => () => found([{ count: 1, ...fitting }])
    expectRefusal('out-of-range', 'fittings[0].bendAngle', one({ kind: 'mitre-bend', bendAngle: 151 }))
    expectRefusal(
      'out-of-range',
      'fittings[0].radiusRatio',
      one({ kind: 'swept-bend', bendAngle: 90, radiusRatio: 0.4 }),
    )
    expectRefusal('out-of-range', 'fittings[0].kind', one({ kind: 'hosepipe' }))
    expectRefusal('out-of-range', 'fittings[0].count', one({ kind: 'exit', count: 1.5 }))
    expectRefusal('out-of-range', 'fittings[0].diameterRatio', one({ kind: 'sudden-expansion', diameterRatio: 1.2 }))
  })

  test('losses go with the square of the flow and add up', () => {
    const fitting = fc.constantFrom(...fittingKinds).map((kind) => ({ ...whole(kind), count: 2 }))
    fc.assert(
      fc.property(fc.array(fitting, { maxLength: 8 }), logUniform(1e-5, 1), logUniform(0.01, 2), (rows, flow, bore) => {
        const at = (change: object = {}) => found(rows, { flow, insideDiameter: bore, ...change })
        const { headLoss, rows: each } = at() as unknown as { headLoss: number; rows: { headLoss: number }[] }
        expectNear(at({ flow: 2 * flow }).headLoss, 4 * headLoss, { relative: 1e-12 })
        expectNear(
          each.reduce((sum, row) => sum + row.headLoss, 0),
          headLoss,
          { relative: 1e-12 },
        )
      }),
      runs,
    )
  })

  test('bends lose more as they turn further, changes of bore as the bores differ more', () => {
    fc.assert(
      fc.property(uniform(0, 140), uniform(1, 20), uniform(0, 0.9), uniform(1, 180), (angle, radius, r, cone) => {
        expect(sweptBendK(angle + 10, radius, usualFriction)).toBeGreaterThan(sweptBendK(angle, radius, usualFriction))
        expect(kOf({ kind: 'mitre-bend', bendAngle: angle + 10 })).toBeGreaterThan(
          kOf({ kind: 'mitre-bend', bendAngle: angle }),
        )
        for (const kind of ['sudden-expansion', 'sudden-contraction'] as const)
          expect(kOf({ kind, diameterRatio: r })).toBeGreaterThan(kOf({ kind, diameterRatio: r + 0.1 }))
        for (const taper of [taperExpansionK, taperContractionK])
          expect(taper(r, cone)).toBeGreaterThan(taper(r + 0.1, cone))
      }),
      runs,
    )
  })

  test('warns of valves, tees and exits where there are any', () => {
    const said = (...kinds: Fitting['kind'][]) =>
      solve('fittings', { ...pipe, fittings: kinds.map((kind) => ({ ...whole(kind), count: 1 })) }).cautions
    const initial = solve('fittings', initialInputs(calculator('fittings'))).cautions
    for (const cautions of [said('ball-valve'), initial])
      expect(cautions.find(({ hazard }) => hazard === 'pressure')?.say).toContain('local code')
    expect(said('swept-bend')).toEqual([])
    expect(said('tee-branch').some(({ say }) => say.includes('divides'))).toBe(true)
    expect(said('exit').some(({ say }) => say.includes('nozzle'))).toBe(true)
    expect(said('sudden-expansion').some(({ about }) => about.includes('insideDiameter'))).toBe(true)
  })

  test('every kind names its source, in every joint, and writes its sum', () => {
    const rows = fittingKinds.flatMap((kind) =>
      kindsOfFitting[kind].needs.includes('joint')
        ? joints.map((joint) => ({ ...whole(kind), joint, count: 1 }))
        : [{ ...whole(kind), count: 1 }],
    )
    const { working } = solve('fittings', { ...pipe, fittings: rows })
    const steps = working.filter(({ say }) => say.startsWith('Fitting '))
    expect(steps).toHaveLength(rows.length)
    for (const { say } of steps) expect(say).toMatch(/Crane|Munson|Rennels|Borda/)
  })

  test('the formula written in the working gives the K found', () => {
    const { working } = solve('fittings', {
      ...pipe,
      fittings: [{ kind: 'taper-contraction', count: 1, diameterRatio: 0.5, coneAngle: 60 }],
    })
    expect(working[1]!.numbers).toMatch(/^0\.2652 = 0\.5 .*\\sqrt\{0\.5\}$/)
  })
})
