import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

interface Found {
  smallestMeeting?: number
  rows: { crossSection: number; voltageDrop: number; voltageDropFraction: number; powerLoss: number }[]
}
const found = (inputs: object) => calculate('cable-choice', inputs) as unknown as Found
const line = {
  system: 'dc',
  power: 960,
  voltage: 48,
  length: 60,
  material: 'copper',
  conductorTemperature: 20,
  dropTarget: 0.05,
}

describe('cable-choice', () => {
  outside(
    'published',
    'IEC 60228:2004, table 2, class 2, read at uecables.com: 0.727 and 0.524 Ω/km for 25 and 35 mm² of copper',
    'the drop of 20 A over 60 m there and back, size by size',
    () => {
      const at = (size: number) => found(line).rows.find(({ crossSection }) => crossSection === size)!.voltageDrop
      expectNear(at(25), 20 * 0.12 * 0.727, { relative: 1e-12 })
      expectNear(at(35), 20 * 0.12 * 0.524, { relative: 1e-12 })
    },
  )

  outside(
    'published',
    'IEC 60228:2004, table 2, read at kabelmetal-indonesia.com: class 2 of aluminium begins at 10 mm² and has 3.08 Ω/km there',
    'aluminium',
    () => {
      const { rows } = found({ ...line, material: 'aluminium' })
      expect(rows[0]!.crossSection).toBe(10)
      expectNear(rows[0]!.voltageDrop, 20 * 0.12 * 3.08, { relative: 1e-12 })
    },
  )

  outside(
    'derived',
    'the size that the drop allows, A = 2·I·L·ρ/ΔU with the resistivity of IEC 60287 (1.7241·10⁻⁸ Ωm), taken up to the next that is made',
    'the smallest that meets a target',
    () => {
      for (const [dropTarget, power] of [
        [0.05, 960],
        [0.03, 960],
        [0.04, 400],
        [0.02, 300],
      ] as const) {
        const least = (2 * (power / 48) * 60 * 1.7241e-8 * 1e6) / (dropTarget * 48)
        const next = found(line)
          .rows.map(({ crossSection }) => crossSection)
          .find((size) => size >= least)
        expect(found({ ...line, power, dropTarget }).smallestMeeting).toBe(next)
      }
    },
  )

  test('each size is worked out as one cable is', () => {
    const one = Object.fromEntries(Object.entries(line).filter(([key]) => key !== 'dropTarget'))
    for (const { crossSection, voltageDrop, powerLoss } of found(line).rows) {
      expect(calculate('cable', { ...one, crossSection })).toMatchObject({ voltageDrop, powerLoss })
    }
  })

  test('the thinner ones do not meet it, and a stricter target never asks for less', () => {
    fc.assert(
      fc.property(logUniform(0.001, 0.5), logUniform(1, 2000), (dropTarget, length) => {
        const { smallestMeeting, rows } = found({ ...line, dropTarget, length })
        for (const { crossSection, voltageDropFraction } of rows)
          expect(voltageDropFraction <= dropTarget).toBe(
            smallestMeeting !== undefined && crossSection >= smallestMeeting,
          )
        const stricter = found({ ...line, dropTarget: dropTarget / 2, length }).smallestMeeting
        if (stricter !== undefined) expect(stricter).toBeGreaterThanOrEqual(smallestMeeting!)
      }),
      runs,
    )
  })

  test('where none meets it none is named, and it is said', () => {
    const { outputs, cautions } = solve('cable-choice', { ...line, length: 5000 })
    expect(outputs).not.toHaveProperty('smallestMeeting')
    expect(cautions).toContainEqual(expect.objectContaining({ level: 'check', about: ['dropTarget', 'voltage'] }))
  })

  test('refuses a power factor of direct current', () => {
    expectRefusal('inconsistent', 'powerFactor', () => found({ ...line, powerFactor: 0.8 }))
  })
})
