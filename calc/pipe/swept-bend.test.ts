import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

type Output =
  | 'arcLength'
  | 'setback'
  | 'outerFibreStrain'
  | 'bendRadiusOverOutside'
  | 'overBendAngle'
  | 'fillVolume'
  | 'thinnedWall'
const pipe = { outsideDiameter: 0.11, wallThickness: 0.0066, bendAngle: 60, bendRadius: 0.66, springBack: 0.1 }
const sweptBend = (inputs: object) =>
  calculate('swept-bend', { ...pipe, ...inputs }) as Record<Output, number> & {
    headLoss?: number
    elbowHeadLoss?: number
    saving?: number
  }
const anyBend = fc.record({
  outsideDiameter: logUniform(0.02, 1),
  bendAngle: uniform(1, 170),
  times: logUniform(0.6, 100),
})

describe('swept-bend', () => {
  const b169 = 'ASME B16.9, long-radius 90° elbows of 1.5 nominal diameters, as tabulated at alloysteelfittings.com'
  for (const [inches, millimetres] of [
    [4, 152],
    [6, 229],
    [8, 305],
    [12, 457],
  ] as const)
    outside('published', b169, `${inches} in from corner to end ${millimetres} mm`, () => {
      const nominal = inches * 0.0254
      const { setback } = sweptBend({ outsideDiameter: nominal, bendAngle: 90, bendRadius: 1.5 * nominal })
      expectNear(setback, millimetres / 1000, { absolute: 0.0005 })
    })
  outside(
    'derived',
    'a chain of a thousand short straight pieces',
    'length, setback and stretch of the outer side',
    () => {
      fc.assert(
        fc.property(anyBend, ({ outsideDiameter, bendAngle, times }) => {
          const R = outsideDiameter * times
          const found = sweptBend({ outsideDiameter, wallThickness: outsideDiameter / 17, bendAngle, bendRadius: R })
          const turn = (bendAngle * Math.PI) / 180
          const pieces = 1000
          const chain = (radius: number) => {
            let length = 0
            for (let i = 0; i < pieces; i++) {
              const [a, b] = [(turn * i) / pieces, (turn * (i + 1)) / pieces]
              length += Math.hypot(radius * (Math.cos(b) - Math.cos(a)), radius * (Math.sin(b) - Math.sin(a)))
            }
            return length
          }
          expectNear(found.arcLength, chain(R), { relative: 1e-5 })
          const outer = chain(R + outsideDiameter / 2)
          expectNear(1 + found.outerFibreStrain, outer / chain(R), { relative: 1e-9 })
          expectNear(found.thinnedWall * outer, (outsideDiameter / 17) * chain(R), { relative: 1e-9 })
          // Tangents at the ends (R, 0) and R(cos, sin) meet at (R, setback).
          const [x, y] = [R - R * Math.cos(turn), found.setback - R * Math.sin(turn)]
          expectNear(Math.hypot(x, y), found.setback, { relative: 1e-9 })
          expectNear(x * Math.cos(turn) + y * Math.sin(turn), 0, { absolute: 1e-9 * R })
        }),
        runs,
      )
    },
  )
  outside('derived', 'sum of thin rings', 'the fill', () => {
    // Pappus: a ring at distance x from the centre line, 2√(r² − x²) high, goes (R + x)·θ around.
    const { fillVolume } = sweptBend({ bendAngle: 90 })
    const r = (0.11 - 2 * 0.0066) / 2
    const rings = 20_000
    let volume = 0
    for (let i = 0; i < rings; i++) {
      const x = -r + ((i + 0.5) * 2 * r) / rings
      volume += ((2 * r) / rings) * 2 * Math.sqrt(r * r - x * x) * (0.66 + x) * (Math.PI / 2)
    }
    expectNear(fillVolume, volume, { relative: 1e-5 })
  })
  outside('derived', 'the fittings calculator', 'losses of this bend and of the elbows', () => {
    const flow = 0.0095
    const frictionFactor = calculate('friction', { flow, insideDiameter: 0.0968, length: 1, roughness: 5e-5 })
      .frictionFactor as number
    const loss = (fitting: object) =>
      calculate('fittings', { flow, insideDiameter: 0.0968, frictionFactor, fittings: [{ count: 1, ...fitting }] })
        .headLoss as number
    const found = sweptBend({ flow, roughness: 5e-5 })
    expectNear(found.headLoss, loss({ kind: 'swept-bend', bendAngle: 60, radiusRatio: 0.66 / 0.0968 }), {
      relative: 1e-9,
    })
    const half = loss({ kind: 'elbow-45', joint: 'fused' })
    const right = loss({ kind: 'elbow-90', joint: 'fused' })
    expectNear(found.elbowHeadLoss, half + (right - half) / 3, { relative: 1e-9 })
    expectNear(found.saving, found.elbowHeadLoss! - found.headLoss!, { relative: 1e-9 })
    expectNear(sweptBend({ flow, roughness: 5e-5, bendAngle: 90 }).elbowHeadLoss, right, { relative: 1e-9 })
  })

  test('what springs back is bent on top', () => {
    fc.assert(
      fc.property(uniform(1, 170), uniform(0, 0.9), (bendAngle, springBack) => {
        const { overBendAngle } = sweptBend({ bendAngle, springBack })
        expectNear(overBendAngle * (1 - springBack), bendAngle, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('losses need a flow, and an elbow needs an angle that is made', () => {
    expect(sweptBend({})).not.toHaveProperty('headLoss')
    for (const bendAngle of [44, 91]) {
      const found = sweptBend({ flow: 0.0095, bendAngle })
      expect(found.headLoss).toBeGreaterThan(0)
      expect(found).not.toHaveProperty('elbowHeadLoss')
      expect(found).not.toHaveProperty('saving')
    }
  })

  test('refuses what cannot be bent', () => {
    expectRefusal('inconsistent', 'bendRadius', () => sweptBend({ bendRadius: 0.05 }))
    expectRefusal('inconsistent', 'wallThickness', () => sweptBend({ wallThickness: 0.055 }))
    expectRefusal('inconsistent', 'roughness', () => sweptBend({ flow: 0.01, roughness: 0.05 }))
    expectRefusal('missing', 'flow', () => sweptBend({ roughness: 5e-5 }))
  })

  test('warns of steam, burns, fumes and of being left alone, and cites least radii as a range', () => {
    const says = solve('swept-bend', pipe)
      .cautions.map(({ say }) => say)
      .join(' ')
    for (const word of ['bone-dry', 'steam', 'burn', 'fumes', 'PVC', 'galvanised', 'unattended', 'rating'])
      expect(says).toContain(word)
    expect(says).toContain('SDR 17 at 20 °C makers and handbooks give 20 to 27 outside diameters')
    const thin = solve('swept-bend', { ...pipe, wallThickness: 0.002 })
      .cautions.map(({ say }) => say)
      .join(' ')
    expect(thin).toContain('no maker’s figure')
  })
})
