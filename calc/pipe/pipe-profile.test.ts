import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { expectRefusal } from '../testing/refusal.ts'

interface Found {
  minimumRunningHead: number
  itsDistance: number
  points: { distance: number; staticHead: number; runningHead: number }[]
  airValvePoints: { distance: number }[]
}
const found = (inputs: object) => calculate('pipe-profile', inputs) as unknown as Found
const pipe = { length: 200, insideDiameter: 0.1, roughness: 5e-5 }
const inputs = {
  profile: [
    { distance: 0, elevation: 100 },
    { distance: 50, elevation: 92 },
    { distance: 100, elevation: 96 },
    { distance: 200, elevation: 60 },
  ],
  sections: [pipe],
  flow: 0.01,
  intakeLevel: 101,
}

describe('pipe-profile', () => {
  outside(
    'derived',
    'the energy equation written out by hand at one point: level − friction to there − v²/2g − height',
    'pressure in the middle of a pipe',
    () => {
      const { headLoss, velocity } = calculate('friction', { ...pipe, length: 100, flow: 0.01 }) as Record<
        string,
        number
      >
      const there = found(inputs).points.find(({ distance }) => distance === 100)!
      expectNear(there.staticHead, 5, { relative: 1e-12 })
      expectNear(there.runningHead, 101 - headLoss! - velocity! ** 2 / (2 * 9.80665) - 96, { relative: 1e-9 })
    },
  )
  outside(
    'derived',
    'the penstock’s grade line, worked out for heights over the nozzle: the same pressures from another datum',
    'two calculators of one pipe',
    () => {
      const { gradeLine } = calculate('penstock', {
        grossHead: 41,
        sections: [pipe],
        flow: 0.01,
        profile: inputs.profile.map(({ distance, elevation }) => ({ distance, elevation: elevation - 60 })),
      }) as unknown as { gradeLine: { distance: number; pressureHead: number }[] }
      for (const { distance, runningHead } of found(inputs).points) {
        const other = gradeLine.find((point) => point.distance === distance)
        if (other) expectNear(runningHead, other.pressureHead, { absolute: 1e-9 })
      }
    },
  )
  outside(
    'published',
    'ISO 2533:1975, standard atmosphere: 1013.25 hPa at the sea and 795.01 hPa at 2000 m; IAPWS-IF97: 1.2282 kPa over water at 10 °C',
    'how far water can be lifted before it boils: 10.21 m at the sea, 7.98 m at 2000 m',
    () => {
      const lifted = (height: number, altitude: number) =>
        solve('pipe-profile', {
          profile: [
            { distance: 0, elevation: 0 },
            { distance: 20, elevation: height },
            { distance: 60, elevation: -20 },
          ],
          sections: [{ ...pipe, length: 60 }],
          flow: 1e-5,
          intakeLevel: 0,
          altitude,
        }).cautions.filter(({ level }) => level === 'stop').length
      const limit = (pascal: number) => (pascal - 1228.2) / (999.7026 * 9.80665)
      for (const [altitude, pascal] of [
        [0, 101_325],
        [2000, 79_501],
      ] as const)
        expect(lifted(limit(pascal) + 0.02, altitude)).toBeGreaterThan(lifted(limit(pascal) - 0.02, altitude))
    },
  )

  test('finds the least pressure and the high points', () => {
    const { minimumRunningHead, itsDistance, points, airValvePoints } = found(inputs)
    expect(minimumRunningHead).toBe(Math.min(...points.map(({ runningHead }) => runningHead)))
    expect(points.find(({ distance }) => distance === itsDistance)?.runningHead).toBe(minimumRunningHead)
    expect(airValvePoints.map(({ distance }) => distance)).toContain(100)
  })

  test('refuses profiles that do not follow the pipe', () => {
    expectRefusal('inconsistent', 'profile[0].distance', () =>
      found({
        ...inputs,
        profile: [
          { distance: 5, elevation: 1 },
          { distance: 10, elevation: 0 },
        ],
      }),
    )
  })
})
