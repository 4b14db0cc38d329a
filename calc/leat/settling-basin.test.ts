import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../index.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { waterKinematicViscosity } from '../water/properties.ts'
import { settlingSpeed } from './settling-basin.ts'

const basin = (more: object) =>
  calculate('settling-basin', { flow: 0.455, grainDiameter: 3e-4, width: 2.5, depth: 0.76, ...more }) as {
    settlingVelocity: number
    length: number
    forwardVelocity: number
  }
const nepal = 'Civil Works Guidelines for Micro-Hydropower in Nepal, example 5.1 (Galkot)'

describe('settling-basin', () => {
  outside('published', nepal, '0.3 mm at 15 °C sinks at 0.037 m/s, read off a figure', () =>
    expectNear(basin({ waterTemperature: 15 }).settlingVelocity, 0.037, { relative: 0.03 }),
  )
  outside('published', nepal, 'basin of 2.5 m width, twice the bare length', () =>
    expectNear(basin({ waterTemperature: 15, safetyFactor: 2 }).length, 9.8, { relative: 0.03 }),
  )
  outside('published', nepal, 'forward speed 0.24 m/s at 0.76 m depth, the most that 0.3 mm bears', () => {
    expectNear(basin({}).forwardVelocity, 0.24, { absolute: 0.005 })
    const say = (depth: number) =>
      solve('settling-basin', { flow: 0.455, grainDiameter: 3e-4, width: 2.5, depth }).cautions.map(({ say }) => say)
    expect(say(0.77).join(' ')).not.toMatch(/pick such grains up/)
    expect(say(0.73).join(' ')).toMatch(/pick such grains up/)
  })
  outside(
    'published',
    'Settling basin calculation of a rehabilitation in Nepal, fall speeds at 20 °C for 2600 kg/m³ (scribd.com/document/462276628)',
    '0.2 to 0.5 mm',
    () => {
      // Read off Rouse’s diagram for spheres and rounded; natural grains differ by their shape.
      for (const [millimetres, speed] of [
        [0.2, 0.02],
        [0.3, 0.035],
        [0.4, 0.05],
        [0.5, 0.067],
      ] as const)
        expectNear(settlingSpeed(millimetres / 1000, waterKinematicViscosity(20)), speed, { relative: 0.17 })
    },
  )
  outside('derived', 'Stokes’s law, R·g·d²/(18ν)', 'two microns', () => {
    const viscosity = waterKinematicViscosity(10)
    expectNear(settlingSpeed(2e-6, viscosity), (1.65 * g * 2e-6 ** 2) / (18 * viscosity), { relative: 1e-3 })
  })
  outside(
    'derived',
    'balance of weight and drag with the drag coefficient that belongs to the formula, (2·18ν/√(3·R·g·d³) + 1)²',
    'sand and gravel',
    () => {
      const viscosity = waterKinematicViscosity(10)
      for (const d of [1e-4, 2.5e-4, 1e-3, 2e-2]) {
        const drag = ((2 * 18 * viscosity) / Math.sqrt(3 * 1.65 * g * d ** 3) + 1) ** 2
        expectNear(settlingSpeed(d, viscosity), Math.sqrt((4 * 1.65 * g * d) / (3 * drag)), { relative: 1e-12 })
      }
    },
  )

  test('a larger grain and warmer water sink faster, and want less floor', () => {
    fc.assert(
      fc.property(logUniform(1e-6, 0.05), uniform(0, 39), uniform(1.01, 1.5), (d, temperature, more) => {
        const found = basin({ grainDiameter: d, waterTemperature: temperature })
        const larger = basin({ grainDiameter: d * more, waterTemperature: temperature })
        const warmer = basin({ grainDiameter: d, waterTemperature: temperature + 1 })
        expect(larger.settlingVelocity).toBeGreaterThan(found.settlingVelocity)
        expect(larger.length).toBeLessThan(found.length)
        expect(warmer.settlingVelocity).toBeGreaterThanOrEqual(found.settlingVelocity)
      }),
      runs,
    )
  })
  test('the flow is found again from floor, settling speed and factor', () => {
    fc.assert(
      fc.property(logUniform(1e-3, 10), logUniform(0.2, 20), uniform(1, 3), (flow, width, safetyFactor) => {
        const { length, settlingVelocity } = basin({ flow, width, safetyFactor })
        expectNear((length * width * settlingVelocity) / safetyFactor, flow, { relative: 1e-12 })
      }),
      runs,
    )
  })
  test('the factor is 1.5 unless it is told', () =>
    expectNear(basin({}).length, basin({ safetyFactor: 1.5 }).length, { relative: 1e-15 }))
  test('warns of a basin shorter than four widths', () => {
    const words = (width: number) =>
      solve('settling-basin', { flow: 0.0095, grainDiameter: 2.5e-4, width, depth: 0.5 })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(words(0.3)).not.toMatch(/shorter than four widths/)
    expect(words(0.8)).toMatch(/shorter than four widths/)
  })
})
