import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { notchCoefficient, notchHeadCorrection } from './flow-by-v-notch.ts'

const flow = (head: number, notchAngle = 90) => calculate('flow-by-v-notch', { head, notchAngle }).flow as number

const foot = 0.3048

describe('flow-by-v-notch', () => {
  for (const [head, litres] of [
    [0.06, 1.247],
    [0.15, 12.066],
    [0.2, 24.682],
  ] as const)
    outside(
      'published',
      'V. M. Ponce, San Diego State University, laboratory on the V-notch weir: Ce 0.578 and kh 0.0029 ft at 90°, worked out here with 0.85 mm (ISO 1438)',
      `90°, ${head} m`,
      () => expectNear(flow(head), litres / 1000, { relative: 1e-3 }),
    )
  // The tables take one coefficient for all heads and are printed as good to 2 to 5 %.
  for (const [angle, factor] of [
    [60, 796.7],
    [45, 571.4],
  ] as const)
    outside(
      'published',
      'V-notch weir discharge tables after ASTM D 5242 and Skrentner’s handbook, L/s = factor·H^2.5',
      `${angle}°`,
      () => {
        for (const head of [0.12, 0.2, 0.3])
          expectNear(flow(head, angle), (factor * head ** 2.5) / 1000, { relative: 0.025 })
      },
    )
  outside(
    'published',
    'J. Shen’s points as R. D. Blevins prints them, Applied Fluid Dynamics Handbook, 1984 (rounded to 0.005), quoted in the documentation of fluids for Python',
    'coefficient at 40°, 60°, 80° and 100°',
    () => {
      for (const [angle, coefficient] of [
        [40, 0.58],
        [60, 0.575],
        [80, 0.575],
        [100, 0.58],
      ] as const)
        expectNear(notchCoefficient(angle), coefficient, { absolute: 0.0025 })
    },
  )
  outside(
    'published',
    'G. Kulin and P. R. Compton, NBS Special Publication 421, 1975, figure 4-3, as digitised in a public repository',
    'head correction from 25° to 100°',
    () => {
      for (const [angle, millimetres] of [
        [25, 2.44],
        [40, 1.67],
        [60, 1.16],
        [80, 0.91],
        [90, 0.86],
        [100, 0.88],
      ] as const)
        expectNear(notchHeadCorrection(angle) * 1000, millimetres, { absolute: 0.1 })
    },
  )
  outside('derived', 'speed √(2gz) summed over thin strips of the notch, by the effective head', '60°', () => {
    const head = 0.187
    const effective = head + notchHeadCorrection(60)
    const strips = 20_000
    let sum = 0
    for (let i = 0; i < strips; i++) {
      const z = ((i + 0.5) / strips) * effective
      sum += Math.sqrt(2 * g * z) * 2 * (effective - z) * Math.tan(Math.PI / 6) * (effective / strips)
    }
    expectNear(flow(head, 60), notchCoefficient(60) * sum, { relative: 1e-5 })
  })
  outside('memory', 'USBR, Water Measurement Manual, ch. 7: Q = 2.49·h^2.48 in feet (from memory)', '90°', () => {
    for (const feet of [0.25, 0.5, 0.8, 1.2])
      expectNear(flow(feet * foot), 2.49 * feet ** 2.48 * foot ** 3, { relative: 0.01 })
  })

  test('the coefficient at 90° is the standard’s', () => {
    expectNear(notchCoefficient(90), 0.578, { absolute: 1e-4 })
    expectNear(notchHeadCorrection(90), 0.85e-3, { absolute: 5e-6 })
  })
  test('more head and a wider notch give more flow', () => {
    fc.assert(
      fc.property(logUniform(0.01, 2), uniform(25, 99), uniform(1.001, 1.4), (head, angle, more) => {
        expect(flow(head * more, angle)).toBeGreaterThan(flow(head, angle))
        expect(flow(head, Math.min(angle * more, 100))).toBeGreaterThan(flow(head, angle))
      }),
      runs,
    )
  })
  test('the head is found again from its flow', () => {
    fc.assert(
      fc.property(logUniform(0.01, 2), uniform(25, 100), (head, angle) => {
        const wanted = flow(head, angle)
        expectNear(
          bracketedRoot((h) => flow(h, angle) - wanted, 0.001, 3),
          head,
          { relative: 1e-9 },
        )
      }),
      runs,
    )
  })
  test.each([
    [{ head: 0.05 }, /under 60 mm/],
    [{ head: 0.4, crestHeight: 1.5, approachWidth: 3 }, /over 0.38 m/],
    [{ crestHeight: 0.4 }, /less than 0.45 m/],
    [{ head: 0.21, crestHeight: 0.5, approachWidth: 2 }, /over 0.4 of the height/],
    [{ approachWidth: 0.8 }, /narrower than 0.9 m/],
    [{ head: 0.2, crestHeight: 0.6, approachWidth: 0.95 }, /over 0.2 of the width/],
  ])('names the limit that %o passes', (inputs, said) => {
    const given = { head: 0.14, notchAngle: 90, crestHeight: 0.5, approachWidth: 1.2 }
    const words = (more: object) =>
      solve('flow-by-v-notch', { ...given, ...more })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(words({})).not.toMatch(/Outside the limits/)
    expect(words(inputs)).toMatch(said)
  })
  test('says what it could not check', () => {
    expect(
      solve('flow-by-v-notch', { head: 0.14, notchAngle: 90 })
        .cautions.map(({ say }) => say)
        .join(' '),
    ).toMatch(/not checked whether the notch is fully contracted/)
  })
})
