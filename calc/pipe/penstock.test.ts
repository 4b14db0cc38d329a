import { FlowUnits, HeadLossType, LinkType, NodeProperty, NodeType, Option, Project, Workspace } from 'epanet-js'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { CalculationError } from '../errors.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { frictionFactor } from './friction-factor.ts'

interface Found {
  flow: number
  netHead: number
  headLoss: number
  lossFraction: number
  sections: {
    velocity: number
    reynolds: number
    frictionFactor?: number
    frictionLoss: number
    fittingsLoss: number
  }[]
  gradeLine: { distance: number; energyHead: number; hydraulicGrade: number; pressureHead?: number }[]
}
const penstock = (inputs: object) => calculate('penstock', inputs) as unknown as Found

const foot = 0.3048
const inch = 0.0254
const gallonPerMinute = 231 * inch ** 3 * (1 / 60)
const horsepower = 745.7

const two = [
  { length: 90, insideDiameter: 0.1308, roughness: 5e-5, totalK: 0.9 },
  { length: 150, insideDiameter: 0.0968, roughness: 5e-5, totalK: 1.1 },
]

describe('penstock', () => {
  outside(
    'published',
    'B. R. Munson, D. F. Young & T. H. Okiishi, Fundamentals of Fluid Mechanics, 5th ed. 2007, as recomputed in ' +
      'github.com/FOSSEE/Python-Textbook-Companions',
    'example 12.6, nozzle for the most power',
    () => {
      // The book takes f = 0.02 whatever the flow: the roughness that gives it at the flow of the optimum, by Colebrook and White.
      const diameter = 8 * inch
      const nozzle = 0.24 * foot
      const viscosity = waterKinematicViscosity(10)
      const reynolds = (Math.sqrt((2 * g * 200 * foot * 2) / 3) * (nozzle / diameter) ** 2 * diameter) / viscosity
      const relativeRoughness = bracketedRoot((ratio) => frictionFactor(reynolds, ratio) - 0.02, 1e-5, 0.05)!
      const pipe = { length: 1000 * foot, insideDiameter: diameter, roughness: relativeRoughness * diameter }
      const at = (nozzleDiameter: number) =>
        penstock({
          grossHead: 200 * foot,
          sections: [pipe],
          nozzles: { count: 1, diameter: nozzleDiameter, dischargeCoefficient: 1 },
        })
      const best = at(nozzle)
      expectNear(best.sections[0]!.frictionFactor, 0.02, { relative: 1e-3 })
      expectNear(best.headLoss, (200 * foot) / 3, { relative: 0.01 })
      // The wheel of the example turns the jet by 150° at half of its speed.
      const wheel = (1 - Math.cos((150 * Math.PI) / 180)) / 2
      const power = (nozzleDiameter: number) => {
        const { flow, netHead } = at(nozzleDiameter)
        return waterDensity(10) * g * flow * netHead * wheel
      }
      expectNear(power(nozzle) / horsepower, 59, { absolute: 0.7 })
      expect(power(nozzle)).toBeGreaterThan(power(0.22 * foot))
      expect(power(nozzle)).toBeGreaterThan(power(0.26 * foot))
    },
  )

  outside(
    'published',
    'Crane TP-410, example 7-19, as recomputed in github.com/CalebBell/fluids (docs/Examples)',
    'two pipes in series out of a reservoir',
    () => {
      // 3" and 2" schedule 40. K by the recomputation: sharp entrance 0.5, mitre bend 60 f_T, gate valve 8 f_T, with f_T = 0.0173 for 3";
      // sudden contraction 0.5 (1 − β²). The exit's K of 1 is the velocity head of an open end: the net head of a nozzle as wide as the pipe.
      const [wide, narrow] = [3.068 * inch, 2.067 * inch]
      const { flow } = penstock({
        grossHead: 11.5 * foot,
        sections: [
          { length: 10 * foot, insideDiameter: wide, roughness: 0.0018 * inch, totalK: 0.5 + 68 * 0.0173 },
          {
            length: 20 * foot,
            insideDiameter: narrow,
            roughness: 0.0018 * inch,
            totalK: 0.5 * (1 - (narrow / wide) ** 2),
          },
        ],
        nozzles: { count: 1, diameter: narrow, dischargeCoefficient: 1 },
        waterTemperature: 15.6,
      })
      // 137 gal/min by hand, 136.7 recomputed. Both carry K from pipe to pipe by the nominal bores, (2/3)⁴ for (2.067/3.068)⁴: 2 % of the flow.
      expectNear(flow / gallonPerMinute, 137, { relative: 0.025 })
    },
  )

  outside('library', 'epanet-js 0.9.0 (EPANET 2.3)', 'flow through two pipes and an opening', async () => {
    const workspace = new Workspace()
    await workspace.loadModule()
    const nozzle = { count: 2, diameter: 0.016, dischargeCoefficient: 0.94 }
    const area = nozzle.count * nozzle.dischargeCoefficient * (Math.PI / 4) * nozzle.diameter ** 2
    for (const grossHead of [12, 48, 130]) {
      const network = new Project(workspace)
      network.init('report', 'out', FlowUnits.LPS, HeadLossType.DW)
      network.addNode('joint', NodeType.Junction)
      network.addNode('nozzle', NodeType.Junction)
      network.addNode('forebay', NodeType.Reservoir)
      const set = (node: string, property: NodeProperty, value: number) =>
        network.setNodeValue(network.getNodeIndex(node), property, value)
      set('forebay', NodeProperty.Elevation, grossHead)
      // An emitter passes coefficient × √head, in L/s and m.
      set('nozzle', NodeProperty.Emitter, 1000 * area * Math.sqrt(2 * g))
      for (const [name, from, to, pipe] of [
        ['upper', 'forebay', 'joint', two[0]!],
        ['lower', 'joint', 'nozzle', two[1]!],
      ] as const)
        network.setPipeData(
          network.addLink(name, LinkType.Pipe, from, to),
          pipe.length,
          pipe.insideDiameter * 1000,
          pipe.roughness * 1000,
          pipe.totalK,
        )
      // Its viscosity is a multiple of 1.1·10⁻⁵ ft²/s; its default accuracy is loose.
      network.setOption(Option.SpViscos, waterKinematicViscosity(10) / 1.02193e-6)
      network.setOption(Option.Accuracy, 1e-8)
      network.solveH()
      const netHead = network.getNodeValue(network.getNodeIndex('nozzle'), NodeProperty.Head)
      network.close()
      const found = penstock({ grossHead, sections: two, nozzles: nozzle })
      // Swamee and Jain's friction factor is within 1.5 % of Colebrook and White's.
      expectNear(found.headLoss, grossHead - netHead, { relative: 0.015 })
      expectNear(found.flow, area * Math.sqrt(2 * g * netHead), { relative: 0.005 })
    }
  })

  outside('derived', 'fixed point by hand: f from Colebrook–White in turn with the flow', 'flow of a nozzle', () => {
    const viscosity = waterKinematicViscosity(10)
    const pipe = { length: 240, insideDiameter: 0.0968, roughness: 5e-5, totalK: 1.5 }
    const area = 0.95 * (Math.PI / 4) * 0.02 ** 2
    const bore = (Math.PI / 4) * pipe.insideDiameter ** 2
    let flow = area * Math.sqrt(2 * g * 48)
    let root = 0.02 ** -0.5
    for (let i = 0; i < 100; i++) {
      const reynolds = ((flow / bore) * pipe.insideDiameter) / viscosity
      root = -2 * Math.log10(pipe.roughness / (3.7 * pipe.insideDiameter) + (2.51 * root) / reynolds)
      const k = root ** -2 * (pipe.length / pipe.insideDiameter) + pipe.totalK
      flow = Math.sqrt((2 * g * 48) / (1 / area ** 2 + k / bore ** 2))
    }
    const found = penstock({
      grossHead: 48,
      sections: [pipe],
      nozzles: { count: 1, diameter: 0.02, dischargeCoefficient: 0.95 },
    })
    expectNear(found.flow, flow, { relative: 1e-9 })
  })

  outside('derived', 'two like pipes', 'carry half of the flow each', () => {
    const [pipe] = two
    const both = penstock({ grossHead: 48, sections: [{ ...pipe, parallel: 2 }], flow: 0.02 })
    const half = penstock({ grossHead: 48, sections: [pipe], flow: 0.01 })
    expectNear(both.headLoss, half.headLoss, { relative: 1e-12 })
    expect(both.sections).toEqual(half.sections)
  })

  const section = fc
    .record({
      length: logUniform(0.1, 2000),
      insideDiameter: logUniform(0.02, 1),
      relativeRoughness: uniform(0, 0.03),
      totalK: uniform(0, 20),
      parallel: fc.integer({ min: 1, max: 3 }),
    })
    .map(({ relativeRoughness, ...rest }) => ({ ...rest, roughness: relativeRoughness * rest.insideDiameter }))
  const sections = fc.array(section, { minLength: 1, maxLength: 4 })
  const nozzles = fc.record({
    count: fc.integer({ min: 1, max: 4 }),
    diameter: logUniform(0.002, 0.3),
    dischargeCoefficient: uniform(0.5, 1),
  })

  test('gross head is net head and losses; the nozzles pass the flow; that flow gives the same back', () => {
    fc.assert(
      fc.property(logUniform(1, 1000), sections, nozzles, (grossHead, sections, nozzles) => {
        const there = penstock({ grossHead, sections, nozzles })
        const lost = there.sections.reduce(
          (sum, { frictionLoss, fittingsLoss }) => sum + frictionLoss + fittingsLoss,
          0,
        )
        expectNear(there.netHead + lost, grossHead, { relative: 1e-9 })
        const area = nozzles.count * nozzles.dischargeCoefficient * (Math.PI / 4) * nozzles.diameter ** 2
        expectNear(there.flow, area * Math.sqrt(2 * g * there.netHead), { relative: 1e-10 })
        if (there.lossFraction > 0.999) return
        const back = penstock({ grossHead, sections, flow: there.flow })
        expectNear(back.headLoss, there.headLoss, { relative: 1e-9 })
        expectNear(back.netHead, there.netHead, { relative: 1e-6 })
        expectNear(back.netHead + back.headLoss, grossHead, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('more flow, length or roughness loses more; a wider pipe or a smaller nozzle less', () => {
    fc.assert(
      fc.property(logUniform(10, 1000), section, nozzles, (grossHead, pipe, nozzles) => {
        const loss = (change: object) => penstock({ grossHead, sections: [{ ...pipe, ...change }], nozzles }).headLoss
        const now = loss({})
        expect(loss({ length: pipe.length * 1.1 })).toBeGreaterThan(now)
        expect(loss({ roughness: pipe.roughness * 1.1 })).toBeGreaterThanOrEqual(now * (1 - 1e-9))
        expect(loss({ insideDiameter: pipe.insideDiameter * 1.1 })).toBeLessThan(now)
        const smaller = { ...nozzles, diameter: nozzles.diameter * 0.9 }
        expect(penstock({ grossHead, sections: [pipe], nozzles: smaller }).headLoss).toBeLessThan(now)
      }),
      runs,
    )
  })

  test('the grade line falls from the gross head to the net head, with a point at each end and each profile point', () => {
    const profile = [
      { distance: 0, elevation: 46 },
      { distance: 60, elevation: 30 },
      { distance: 200, elevation: 12 },
    ]
    const found = penstock({ grossHead: 48, sections: two, flow: 0.0095, profile })
    const [start, hump, joint, low, end] = found.gradeLine
    expect(found.gradeLine.map(({ distance }) => distance)).toEqual([0, 60, 90, 200, 240])
    expect(start!.energyHead).toBe(48)
    expectNear(end!.energyHead, found.netHead, { relative: 1e-12 })
    const [upper, lower] = found.sections
    const lost = (i: number) => found.sections[i]!.frictionLoss + found.sections[i]!.fittingsLoss
    expectNear(hump!.energyHead, 48 - (lost(0) * 60) / 90, { relative: 1e-12 })
    expectNear(joint!.energyHead, 48 - lost(0), { relative: 1e-12 })
    expectNear(low!.energyHead, 48 - lost(0) - (lost(1) * 110) / 150, { relative: 1e-12 })
    expectNear(joint!.hydraulicGrade, joint!.energyHead - upper!.velocity ** 2 / (2 * g), { relative: 1e-12 })
    expectNear(low!.hydraulicGrade, low!.energyHead - lower!.velocity ** 2 / (2 * g), { relative: 1e-12 })
    expectNear(hump!.pressureHead, hump!.hydraulicGrade - 30, { relative: 1e-12 })
    // 30 m of the 140 m from the second point to the third.
    expectNear(joint!.pressureHead, joint!.hydraulicGrade - (30 - (18 * 30) / 140), { relative: 1e-12 })
    // The profile ends before the pipe does.
    expect(end).not.toHaveProperty('pressureHead')
    const bare = penstock({ grossHead: 48, sections: two, flow: 0.0095 })
    expect(bare.gradeLine.map(({ distance }) => distance)).toEqual([0, 90, 240])
    expect(bare.gradeLine.every((point) => point.pressureHead === undefined)).toBe(true)
  })

  test('standing water loses nothing', () => {
    const found = penstock({ grossHead: 48, sections: two, flow: 0 })
    expect(found).toMatchObject({ netHead: 48, headLoss: 0, lossFraction: 0 })
    expect(found.sections[0]).not.toHaveProperty('frictionFactor')
    expect(() => solve('penstock', { grossHead: 48, sections: two, flow: 0 })).not.toThrow()
  })

  test('a nozzle as wide as a river on a straw still has an answer', () => {
    const found = penstock({
      grossHead: 100,
      sections: [{ length: 5000, insideDiameter: 0.005, roughness: 1e-5 }],
      nozzles: { count: 12, diameter: 1, dischargeCoefficient: 1 },
    })
    expect(found.netHead).toBeGreaterThan(0)
    expectNear(found.headLoss, 100, { relative: 1e-9 })
  })

  const given = { grossHead: 48, sections: two, flow: 0.0095 }

  test('a flow that eats the head has no solution, and says so', () => {
    expectRefusal('no-solution', 'flow', () => penstock({ ...given, flow: 0.05 }))
    try {
      penstock({ ...given, flow: 0.05 })
    } catch (error) {
      expect((error as CalculationError).message).toContain('the gross head is only 48')
    }
  })

  test('refuses a profile that cannot be, and a wall without a pipe', () => {
    const withProfile = (...points: [number, number][]) =>
      penstock({ ...given, profile: points.map(([distance, elevation]) => ({ distance, elevation })) })
    expectRefusal('inconsistent', 'profile[0].distance', () => withProfile([1, 46], [240, 0]))
    expectRefusal('inconsistent', 'profile[2].distance', () => withProfile([0, 46], [100, 20], [100, 10]))
    expectRefusal('inconsistent', 'profile[1].distance', () => withProfile([0, 46], [241, 0]))
    expectRefusal('out-of-range', 'profile', () => withProfile([0, 46]))
    expectRefusal('inconsistent', 'sections[1].roughness', () =>
      penstock({ ...given, sections: [two[0], { ...two[1], insideDiameter: 0.05, roughness: 0.03 }] }),
    )
    expectRefusal('missing', 'sections', () => penstock({ ...given, sections: [] }))
    expectRefusal('missing', 'sections[1].length', () =>
      penstock({ ...given, sections: [two[0], { insideDiameter: 0.1, roughness: 0 }] }),
    )
    expectRefusal('unknown-key', 'sections[0].bore', () => penstock({ ...given, sections: [{ ...two[0], bore: 1 }] }))
  })

  test('wants exactly one of flow and nozzles, and the nozzles whole', () => {
    const nozzles = { count: 1, diameter: 0.02, dischargeCoefficient: 0.95 }
    expectRefusal('missing', 'flow', () => penstock({ grossHead: 48, sections: two }))
    expectRefusal('inconsistent', 'nozzles', () => penstock({ ...given, nozzles }))
    expectRefusal('missing', 'nozzles.dischargeCoefficient', () =>
      penstock({ grossHead: 48, sections: two, nozzles: { count: 1, diameter: 0.02 } }),
    )
  })

  test('warns of a heavy loss, of speed, of a hump above the grade line, and of the pressure at the bottom', () => {
    const cautions = (inputs: object) => solve('penstock', { ...given, ...inputs }).cautions
    const levels = (inputs: object, key: string) =>
      cautions(inputs)
        .filter(({ about }) => about.includes(key))
        .map(({ level }) => level)
    expect(levels({}, 'lossFraction')).toEqual([])
    expect(levels({ flow: 0.013 }, 'lossFraction')).toEqual(['check'])
    expect(levels({ flow: 0.025 }, 'lossFraction')).toEqual(['stop'])
    expect(cautions({ flow: 0.025 }).some(({ say }) => say.includes('faster than 3'))).toBe(true)
    const hump = [
      { distance: 0, elevation: 46 },
      { distance: 60, elevation: 49 },
      { distance: 240, elevation: -3 },
    ]
    expect(levels({ profile: hump }, 'gradeLine')).toEqual(['stop'])
    // 48 m above a nozzle and 3 m below it: 51 m of water.
    expect(cautions({ profile: hump }).find(({ about }) => about.includes('grossHead'))?.say).toMatch(/5\.00\sbar/)
    expect(cautions({}).find(({ hazard }) => hazard === 'pressure')?.say).toMatch(/4\.71\sbar.*local code/)
    expect(levels({}, 'profile')).toEqual(['note'])
  })
})
