import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { solverHeadLoss } from '../testing/network-solver.ts'
import { outside } from '../testing/outside-check.ts'
import { expectRefusal } from '../testing/refusal.ts'

interface Row {
  label: string
  insideDiameter: number
  velocity: number
  headLoss: number
  netPower?: number
  ratingMargin: number
  meetsTarget: number
}
const found = (inputs: object) =>
  calculate('pipe-choice', inputs) as unknown as { rows: Row[]; smallestMeeting?: string }
const usual = { flow: 0.0095, grossHead: 48, length: 240, roughness: 5e-5, lossTarget: 0.06 }

describe('pipe-choice', () => {
  outside(
    'published',
    'ISO 4427-2:2007 / EN 12201-2, least walls: 10.0 mm at 110 SDR 11 and 6.6 mm at 110 SDR 17',
    'bores of the default pipes',
    () => {
      const bore = (label: string) => found(usual).rows.find((row) => row.label === label)?.insideDiameter
      expectNear(bore('PE100 SDR 11, 110 mm'), 0.09, { absolute: 1e-9 })
      expectNear(bore('PE100 SDR 17, 110 mm'), 0.0968, { absolute: 1e-9 })
    },
  )
  outside(
    'published',
    'EN 12201-1 / ISO 4427: PE 100 of SDR 11, 17 and 26 is PN 16, 10 and 6 (6.4 by the formula); factor 0.87 at 30 °C',
    'what 48 m of water leaves of the rating, cold and warm',
    () => {
      const atRest = 999.7026 * 9.80665 * 48
      const margin = (label: string, temperature: number) =>
        found({ ...usual, temperature }).rows.find((row) => row.label === label)?.ratingMargin
      for (const [label, rating] of [
        ['PE100 SDR 11, 110 mm', 16e5],
        ['PE100 SDR 17, 110 mm', 10e5],
        ['PE100 SDR 26, 110 mm', 6.4e5],
      ] as const) {
        expectNear(margin(label, 20), rating - atRest, { absolute: 10 })
        expectNear(margin(label, 30), 0.87 * rating - atRest, { absolute: 10 })
      }
    },
  )
  outside(
    'library',
    'npm epanet-js 0.9.0, Darcy–Weisbach head loss (within 1.5 % of Colebrook–White)',
    'the loss of every default pipe that the flow goes through',
    async () => {
      for (const { insideDiameter, headLoss } of found(usual).rows.filter(
        ({ insideDiameter }) => insideDiameter > 0.06,
      )) {
        const loss = await solverHeadLoss({
          flow: 0.0095,
          insideDiameter,
          length: 240,
          roughness: 5e-5,
          kinematicViscosity: 1.3063e-6,
        })
        expectNear(headLoss, loss, { relative: 0.015 })
      }
    },
  )

  test('the narrowest that is within both bounds is named, and none before it is', () => {
    for (const lossTarget of [0.02, 0.06, 0.12]) {
      const { rows, smallestMeeting } = found({ ...usual, lossTarget, surgeAllowance: 2e5 })
      const place = rows.findIndex(({ label }) => label === smallestMeeting)
      expect(place).toBeGreaterThan(0)
      expect(rows[place]!.headLoss).toBeLessThanOrEqual(lossTarget * 48)
      expect(rows[place]!.ratingMargin).toBeGreaterThanOrEqual(0)
      for (const { headLoss, ratingMargin, meetsTarget } of rows.slice(0, place)) {
        expect(meetsTarget).toBe(0)
        expect(headLoss > lossTarget * 48 || ratingMargin < 0).toBe(true)
      }
    }
  })

  test('pipes of one’s own, by name', () => {
    const catalogue = [
      { label: 'wide', insideDiameter: 0.2, pressureRating: 10e5 },
      { label: 'weak', insideDiameter: 0.15, pressureRating: 2e5 },
    ]
    const { rows, smallestMeeting } = found({ ...usual, catalogue })
    expect(rows.map(({ label }) => label)).toEqual(['weak', 'wide'])
    expect(smallestMeeting).toBe('wide')
    expectRefusal('out-of-range', 'catalogue[0].label', () =>
      found({ ...usual, catalogue: [{ ...catalogue[0], label: ' ' }] }),
    )
  })

  test('where none will do, none is named, and that is a stop', () => {
    const { outputs, cautions } = solve('pipe-choice', { ...usual, flow: 5 })
    expect(outputs).not.toHaveProperty('smallestMeeting')
    expect(cautions[0]).toMatchObject({ level: 'stop' })
    // A pipe that would lose more than there is leaves no power.
    expect((outputs['rows'] as readonly object[])[0]).toMatchObject({ netPower: undefined })
  })
})
