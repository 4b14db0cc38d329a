import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const weir = (head: number, crestWidth: number, channelWidth: number, crestHeight: number) =>
  calculate('flow-by-rectangular-weir', { head, crestWidth, channelWidth, crestHeight }) as {
    flow: number
    effectiveCoefficient: number
  }

/** √(2·32.17) · 2/3: what a coefficient in feet holds besides Ce. */
const inFeet = (2 / 3) * Math.sqrt(2 * 32.174)

describe('flow-by-rectangular-weir', () => {
  for (const [share, slope, constant] of [
    [0.2, -0.0087, 3.152],
    [0.4, 0.0317, 3.164],
    [0.5, 0.0612, 3.173],
    [0.6, 0.0995, 3.178],
    [0.7, 0.1602, 3.182],
    [0.8, 0.2376, 3.189],
    [0.9, 0.3447, 3.205],
    [1, 0.4, 3.22],
  ] as const)
    outside(
      'published',
      'US Bureau of Reclamation, Water Measurement Manual, 2001, constants of Kindsvater and Carter in feet, as printed in US EPA report EPA/600/R-17/111, table 6-2',
      `b/B ${share}`,
      () => {
        for (const headOverHeight of [0.2, 1, 2])
          expectNear(
            weir(0.2, share * 2, 2, 0.2 / headOverHeight).effectiveCoefficient,
            (constant + slope * headOverHeight) / inFeet,
            { relative: 0.004 },
          )
      },
    )
  outside(
    'published',
    'J. D. Fenton, Calculating flow over rectangular sharp-edged weirs, 2015, eq. (24), as quoted in a public repository',
    'a fit to the same experiments, all widths',
    () => {
      for (const share of [0.1, 0.3, 0.5, 0.7, 0.8, 1])
        for (const ratio of [0.1, 0.5, 1, 1.5])
          expectNear(
            weir(0.15, share, 1, 0.15 / ratio).effectiveCoefficient,
            0.589 - 0.008 * ratio + share ** 2 * (0.013 + 0.083 * ratio),
            { relative: 0.012 },
          )
    },
  )
  outside(
    'library',
    'fluids 1.3.1 for Python, Q_weir_rectangular_full_Kindsvater_Carter',
    '0.3 m over 0.4 m, 2 m',
    () =>
      // It takes 1 mm off the width where the standard takes 0.9 mm.
      expectNear(weir(0.3, 2, 2, 0.4).flow, 0.641560300081563, { relative: 1e-4 }),
  )
  outside('derived', 'speed √(2gz) summed over thin strips of the corrected opening', 'half of the channel', () => {
    const [head, width] = [0.114 + 0.001, 1 + (0.0027 + 0.0036) / 2]
    const strips = 20_000
    let sum = 0
    for (let i = 0; i < strips; i++) sum += Math.sqrt(2 * g * ((i + 0.5) / strips) * head) * width * (head / strips)
    const { flow, effectiveCoefficient } = weir(0.114, 1, 2, 0.4)
    expectNear(flow, effectiveCoefficient * sum, { relative: 1e-5 })
  })
  outside(
    'published',
    'B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, example 5.9 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions)',
    '4 m full width at 0.2 m, with a textbook’s coefficient of 0.62',
    // A high crest: the standard’s coefficient is 0.61 there.
    () => expectNear(weir(0.2, 4, 4, 1.5).flow, 0.655, { relative: 0.015 }),
  )

  test('more head, a wider crest and a lower one give more flow', () => {
    fc.assert(
      fc.property(
        logUniform(0.03, 1),
        uniform(0.35, 0.7),
        logUniform(0.1, 5),
        uniform(1.01, 1.3),
        (head, share, height, more) => {
          const { flow } = weir(head, share * 3, 3, height)
          expect(weir(head * more, share * 3, 3, height).flow).toBeGreaterThan(flow)
          expect(weir(head, share * 3 * more, 3, height).flow).toBeGreaterThan(flow)
          expect(weir(head, share * 3, 3, height / more).flow).toBeGreaterThan(flow)
        },
      ),
      runs,
    )
  })
  test('refuses a crest wider than its channel', () => {
    expectRefusal('inconsistent', 'channelWidth', () => weir(0.1, 1.2, 1, 0.3))
    expect(weir(0.1, 1, 1, 0.3).flow).toBeGreaterThan(0)
  })
  test.each([
    [{ head: 0.02 }, /under 30 mm/],
    [{ head: 0.8 }, /over 2.5 times/],
    [{ crestWidth: 0.1 }, /narrower than 0.15 m/],
    [{ crestHeight: 0.08 }, /less than 0.1 m over the bed/],
    [{ crestWidth: 0.9 }, /less than 0.1 m at each side/],
    [{ crestWidth: 1 }, /let it in below/],
  ])('names the limit that %o passes', (inputs, said) => {
    const given = { head: 0.1, crestWidth: 0.5, channelWidth: 1, crestHeight: 0.3 }
    const words = (more: object) =>
      solve('flow-by-rectangular-weir', { ...given, ...more })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(words({})).not.toMatch(/Outside the limits|let it in below/)
    expect(words(inputs)).toMatch(said)
  })
})
