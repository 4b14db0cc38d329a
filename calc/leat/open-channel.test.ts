import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

type Keys = 'normalDepth' | 'velocity' | 'topWidth' | 'wettedPerimeter' | 'hydraulicRadius' | 'froude'
const found = (inputs: object) => calculate('open-channel', inputs) as Record<Keys, number>

describe('open-channel', () => {
  outside(
    'published',
    'K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, example 12.3 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions)',
    '100 m³/s stand 3 m deep in a trapezoidal channel at the slope that the book finds',
    () => {
      const { normalDepth } = found({
        flow: 100,
        bottomWidth: 10,
        sideSlope: 1.5,
        bedSlope: 0.0004451,
        manningN: 0.015,
      })
      expectNear(normalDepth, 3, { relative: 1e-3 })
    },
  )

  outside(
    'published',
    'B. S. Massey & A. J. Ward-Smith, Mechanics of Fluids, 8th ed., example 10.4 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions)',
    '8.75 m³/s in a rectangular channel 5 m wide: about 1.8 m, as the book reads it from trial',
    () => {
      const { normalDepth } = found({ flow: 8.75, bottomWidth: 5, sideSlope: 0, bedSlope: 0.0002, manningN: 0.015 })
      expectNear(normalDepth, 1.8, { absolute: 0.05 })
    },
  )

  outside(
    'published',
    'github.com/CalebBell/fluids 1.3.1, tests/test_open_flow.py, Manning velocity',
    'a hydraulic radius of 5 m, slope 0.001 and n 0.05 run at 1.84931 m/s',
    () => {
      // A triangle of sides 1:1 has R = y/(2·√2): R = 5 m at y = 14.142 m, and its area is y².
      const depth = 10 * Math.SQRT2
      const flow = 1.8493111942973235 * depth ** 2
      const { velocity, hydraulicRadius } = found({
        flow,
        bottomWidth: 0,
        sideSlope: 1,
        bedSlope: 0.001,
        manningN: 0.05,
      })
      expectNear(hydraulicRadius, 5, { relative: 1e-9 })
      expectNear(velocity, 1.8493111942973235, { relative: 1e-9 })
    },
  )

  outside(
    'derived',
    'closed form for a triangular channel, y = (n·Q·(2√(1+z²))^(2/3)/(z^(5/3)·√S))^(3/8), evaluated by mathjs',
    'triangular channels',
    () => {
      for (const [Q, z, S, n] of [
        [0.02, 1, 0.003, 0.025],
        [1.4, 2.5, 0.0008, 0.03],
      ] as const) {
        const depth = evaluate('(n * Q * (2 * sqrt(1 + z^2))^(2/3) / (z^(5/3) * sqrt(S)))^(3/8)', {
          Q,
          z,
          S,
          n,
        }) as number
        expectNear(found({ flow: Q, bottomWidth: 0, sideSlope: z, bedSlope: S, manningN: n }).normalDepth, depth, {
          relative: 1e-9,
        })
      }
    },
  )

  outside(
    'derived',
    'critical flow in a rectangular channel has y = (q²/g)^(1/3), by the least energy',
    'the Froude number is 1 there',
    () => {
      const [q, b] = [0.4, 1.2]
      const depth = Math.cbrt(q ** 2 / 9.80665)
      const velocity = q / depth
      const radius = (b * depth) / (b + 2 * depth)
      const bedSlope = ((0.02 * velocity) / Math.cbrt(radius) ** 2) ** 2
      const { froude, normalDepth } = found({ flow: q * b, bottomWidth: b, sideSlope: 0, bedSlope, manningN: 0.02 })
      expectNear(normalDepth, depth, { relative: 1e-9 })
      expectNear(froude, 1, { relative: 1e-9 })
    },
  )

  const channel = fc.record({
    flow: logUniform(1e-4, 100),
    bottomWidth: uniform(0.05, 10),
    sideSlope: uniform(0, 4),
    bedSlope: logUniform(1e-5, 0.1),
    manningN: logUniform(0.008, 0.1),
  })
  test('the depth gives the flow back, and grows with flow and roughness', () => {
    fc.assert(
      fc.property(channel, (inputs) => {
        const { normalDepth, hydraulicRadius, topWidth } = found(inputs)
        const area = ((inputs.bottomWidth + topWidth) / 2) * normalDepth
        const flow = (area * hydraulicRadius ** (2 / 3) * inputs.bedSlope ** 0.5) / inputs.manningN
        expectNear(flow, inputs.flow, { relative: 1e-9 })
        expect(found({ ...inputs, flow: inputs.flow * 1.1 }).normalDepth).toBeGreaterThan(normalDepth)
        expect(found({ ...inputs, manningN: inputs.manningN * 1.1 }).normalDepth).toBeGreaterThan(normalDepth)
        expect(found({ ...inputs, bedSlope: inputs.bedSlope * 1.1 }).normalDepth).toBeLessThan(normalDepth)
      }),
      runs,
    )
  })

  test('refuses a channel that is none', () => {
    const none = { flow: 0.02, bottomWidth: 0, sideSlope: 0, bedSlope: 0.003, manningN: 0.025 }
    expectRefusal('inconsistent', 'sideSlope', () => found(none))
  })

  test('tells of silt, of scour and of standing waves', () => {
    const said = (change: object) =>
      solve('open-channel', { flow: 0.02, bottomWidth: 0.3, sideSlope: 1, bedSlope: 0.003, manningN: 0.025, ...change })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(said({ bedSlope: 0.0002 })).toMatch(/silt settles/)
    expect(said({ bedSlope: 0.02 })).toMatch(/bare earth/)
    expect(said({ bedSlope: 0.2 })).toMatch(/carries stones/)
    expect(said({ bedSlope: 0.02 })).toMatch(/stands in waves/)
    expect(said({})).not.toMatch(/silt settles|bare earth|waves/)
  })
})
