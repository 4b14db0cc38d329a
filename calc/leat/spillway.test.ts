import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'

const spill = (floodFlow: number, crestLength: number, coefficient: number, freeboard = 0.3) =>
  calculate('spillway', { floodFlow, crestLength, coefficient, freeboard }) as { crestHead: number; margin: number }

const foot = 0.3048

describe('spillway', () => {
  outside(
    'published',
    'indmicrohydro.blogspot.com, Calculation of flood spillway, 2010: worked example',
    '0.12 m³/s over 1.46 m, coefficient 1.6',
    () => expectNear(spill(0.12, 1.46, 1.6).crestHead, 0.138, { absolute: 0.0005 }),
  )
  outside(
    'published',
    'V. M. Ponce, San Diego State University, CIVE 530, mid-term 2005, solution',
    '44.22 ft³/s over 20 ft, coefficient 3.09 in feet',
    () =>
      expectNear(spill(44.22 * foot ** 3, 20 * foot, 3.09 * Math.sqrt(foot)).crestHead, 0.8 * foot, { relative: 5e-4 }),
  )
  outside(
    'published',
    'K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, example 13.31 (as recomputed in github.com/FOSSEE/Python-Textbook-Companions)',
    '25 L/s over 0.4 m at 0.1 m, Cd 0.669',
    () => expectNear(spill(0.025, 0.4, (2 / 3) * 0.669 * Math.sqrt(2 * g)).crestHead, 0.1, { relative: 1e-3 }),
  )
  outside(
    'derived',
    'critical depth on a broad crest: two thirds of the head, speed √(g·y)',
    'coefficient 1.705',
    () => {
      const depth = 0.14
      const flow = Math.sqrt(g * depth) * depth * 2
      expectNear(spill(flow, 2, (2 / 3) ** 1.5 * Math.sqrt(g)).crestHead, 1.5 * depth, { relative: 1e-12 })
    },
  )

  test('the flow is found again from the head over the crest', () => {
    fc.assert(
      fc.property(logUniform(1e-4, 100), logUniform(0.1, 100), logUniform(0.5, 3), (flow, length, coefficient) => {
        const { crestHead } = spill(flow, length, coefficient)
        expectNear(coefficient * length * crestHead ** 1.5, flow, { relative: 1e-12 })
        expect(spill(flow, length * 1.2, coefficient).crestHead).toBeLessThan(crestHead)
      }),
      runs,
    )
  })
  test('a dry spillway leaves all of the bank', () =>
    expect(spill(0, 1, 1.6, 0.4)).toEqual({ crestHead: 0, margin: 0.4 }))
  test('stops where the bank is overtopped, and warns where half of the freeboard is used', () => {
    const levels = (freeboard: number) =>
      solve('spillway', { floodFlow: 0.1, crestLength: 1, coefficient: 1.6, freeboard })
        .cautions.filter(({ about }) => about.includes('margin'))
        .map(({ level }) => level)
    expect(levels(0.4)).toEqual([])
    expect(levels(0.25)).toEqual(['check'])
    expect(levels(0.12)).toEqual(['stop'])
  })
})
