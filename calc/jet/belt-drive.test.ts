import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const belt = (driverDiameter: number, drivenDiameter: number, centreDistance: number, driverSpeed = 600) =>
  calculate('belt-drive', {
    driverSpeed,
    ratio: driverDiameter / drivenDiameter,
    driverDiameter,
    centreDistance,
  }) as Record<string, number>

describe('belt-drive', () => {
  outside('published', 'expertsmind.com, Find length of belt: worked problem', '1.6 m to 0.5 m at 12 m', () =>
    expectNear(belt(1.6, 0.5, 12).beltLength, 27.32, { absolute: 0.006 }),
  )
  outside(
    'published',
    'Theory of Machines, example 11.1 (as recomputed in tbc-python.fossee.in)',
    'two drives from 150 to 1500 rev/min',
    () => {
      const { drivenSpeed } = belt(0.75, 0.45, 3, 150)
      expectNear(belt(0.9, 0.15, 3, drivenSpeed).drivenSpeed, 1500, { absolute: 1e-9 })
    },
  )
  outside(
    'published',
    'Theory of Machines, example 11.2 (as recomputed in tbc-python.fossee.in)',
    '200 rev/min from 1 m to 2.25 m',
    () => expectNear(belt(1, 2.25, 4, 200).drivenSpeed, 88.9, { absolute: 0.05 }),
  )
  outside(
    'derived',
    'a tight string around two circles: its length is the integral of its support function max(r₁, r₂ + a·cos θ) over a turn (Cauchy)',
    'length of the belt',
    () => {
      for (const [d1, d2, a] of [
        [0.25, 0.125, 0.6],
        [0.1, 0.9, 0.55],
        [0.4, 0.4, 0.41],
      ] as const) {
        const parts = 200_000
        let length = 0
        for (let i = 0; i < parts; i++)
          length += Math.max(d1 / 2, d2 / 2 + a * Math.cos((2 * Math.PI * (i + 0.5)) / parts)) * ((2 * Math.PI) / parts)
        expectNear(belt(d1, d2, a).beltLength, length, { relative: 1e-7 })
      }
    },
  )
  outside(
    'derived',
    'wrap of the smaller and of the larger pulley make a full turn: arcs and straights add up',
    'wrap',
    () => {
      const [d1, d2, a] = [0.56, 0.14, 0.5]
      const { wrapAngle, beltLength } = belt(d1, d2, a)
      const small = (wrapAngle! * Math.PI) / 180
      const straight = Math.sqrt(a ** 2 - ((d1 - d2) / 2) ** 2)
      expectNear(beltLength, (d2 / 2) * small + (d1 / 2) * (2 * Math.PI - small) + 2 * straight, { relative: 1e-12 })
    },
  )

  test('equal pulleys have half a turn of belt each', () => {
    const { beltLength, wrapAngle, drivenSpeed, beltSpeed } = belt(0.2, 0.2, 1, 900)
    expect(beltLength).toBeCloseTo(2 + Math.PI * 0.2, 12)
    expect(wrapAngle).toBe(180)
    expect(drivenSpeed).toBe(900)
    expect(beltSpeed).toBeCloseTo(Math.PI * 0.2 * 15, 12)
  })
  test('a drive turned around has the same belt', () => {
    fc.assert(
      fc.property(logUniform(0.05, 1), uniform(0.2, 5), uniform(1.01, 10), (d1, ratio, apart) => {
        const d2 = d1 / ratio
        const a = (apart * (d1 + d2)) / 2
        const [there, back] = [belt(d1, d2, a), belt(d2, d1, a)]
        expectNear(back.beltLength, there.beltLength!, { relative: 1e-9 })
        expectNear(back.wrapAngle, there.wrapAngle!, { relative: 1e-9 })
        expect(belt(d1, d2, a * 1.1).beltLength).toBeGreaterThan(there.beltLength!)
      }),
      runs,
    )
  })
  test('refuses pulleys that touch', () => {
    expectRefusal('inconsistent', 'centreDistance', () => belt(0.5, 0.25, 0.375))
    expect(belt(0.5, 0.25, 0.38).beltLength).toBeGreaterThan(0)
  })
  test('warns of little wrap and of a fast belt', () => {
    const about = (ratio: number, driverSpeed: number, centreDistance: number) =>
      solve('belt-drive', { driverSpeed, ratio, driverDiameter: 0.5, centreDistance }).cautions.flatMap(
        ({ about, level }) => (level === 'check' ? about : []),
      )
    expect(about(1, 600, 0.8)).toEqual([])
    expect(about(6, 600, 0.4)).toContain('wrapAngle')
    expect(about(1, 1500, 0.8)).toContain('beltSpeed')
  })
})
