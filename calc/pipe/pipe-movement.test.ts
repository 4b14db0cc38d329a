import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const movement = (inputs: object) =>
  calculate('pipe-movement', { length: 100, temperatureChange: 20, material: 'PE', ...inputs }) as {
    movement?: number
    force?: number
  }
const foot = 0.3048
const inch = 0.0254
const perFahrenheit = 5 / 9

describe('pipe-movement', () => {
  const bhandari =
    'V. B. Bhandari, Design of Machine Elements, example 4.22, as recomputed in github.com/FOSSEE/Scilab-TBC-Uploads (764)'
  outside('published', bhandari, 'steel tube that meets a stop after 0.15 mm', () => {
    const tube = { length: 0.2, temperatureChange: 225, material: 'steel', expansionCoefficient: 10.8e-6 }
    const free = movement(tube).movement!
    const { force } = movement({ ...tube, restrained: 'yes', crossSection: 300e-6, modulus: 207e9 })
    // The gap takes a part of the growth, and of the force.
    expectNear(force! * (1 - 0.15e-3 / free), 104_328, { relative: 1e-9 })
  })
  outside(
    'published',
    'Asahi/America, rule of thumb for polyethylene: 1 inch, 100 feet, 10 °F',
    'within a quarter',
    () => {
      const found = movement({ length: 100 * foot, temperatureChange: 10 * perFahrenheit })
      expectNear(found.movement, inch, { relative: 0.25 })
    },
  )
  outside('published', 'Asahi/America, PE 100 RC by ISO 11359-2: 1.8 × 10⁻⁴ for each K', 'within 5 %', () =>
    expectNear(movement({ length: 1, temperatureChange: 1 }).movement, 1.8e-4, { relative: 0.05 }),
  )
  outside(
    'published',
    'duraplastics.com after R. Bliesner 1987: 1000 ft of PVC shrink 20 in by 50 °F',
    'within a quarter',
    () => {
      const found = movement({ material: 'PVC-U', length: 1000 * foot, temperatureChange: -50 * perFahrenheit })
      expectNear(found.movement, -20 * inch, { relative: 0.25 })
    },
  )
  for (const [material, coefficient] of [
    ['steel', 12.2e-6],
    ['stainless-steel', 16.3e-6],
    ['cast-iron', 11e-6],
    ['copper', 16.4e-6],
  ] as const)
    // Means over other spans of temperature differ by some per cent.
    outside('published', 'coefficients at piping-world.com/thermal-expansion', material, () =>
      expectNear(movement({ material, length: 1, temperatureChange: 1 }).movement, coefficient, { relative: 0.08 }),
    )
  outside('derived', 'Hooke’s law', 'the force presses out just what the pipe would have grown', () => {
    fc.assert(
      fc.property(logUniform(0.1, 1e4), uniform(-50, 50), logUniform(1e-6, 0.1), (length, change, crossSection) => {
        const pipe = { length, temperatureChange: change, material: 'steel', modulus: 200e9, crossSection }
        const { force } = movement({ ...pipe, restrained: 'yes' })
        const free = movement({ length, temperatureChange: change, material: 'steel' }).movement!
        expectNear((force! * length) / (200e9 * crossSection), free, { relative: 1e-9, absolute: 1e-15 })
      }),
      runs,
    )
  })

  test('gives the way or the force, never both', () => {
    expect(Object.keys(movement({}))).toEqual(['movement'])
    expect(Object.keys(movement({ restrained: 'no' }))).toEqual(['movement'])
    expect(Object.keys(movement({ restrained: 'yes', crossSection: 0.002 }))).toEqual(['force'])
  })

  test('polyethylene moves more than ten times as far as steel, and pushes less', () => {
    const held = { restrained: 'yes', crossSection: 0.002 }
    expect(movement({}).movement).toBeGreaterThan(10 * movement({ material: 'steel' }).movement!)
    expect(movement(held).force).toBeLessThan(movement({ ...held, material: 'steel' }).force! / 10)
  })

  test('a section belongs to a pipe that is held', () => {
    expectRefusal('missing', 'crossSection', () => movement({ restrained: 'yes' }))
    expectRefusal('inconsistent', 'crossSection', () => movement({ crossSection: 0.002 }))
  })

  test('says where handbooks differ, unless the maker’s figure is given', () => {
    const asks = (inputs: object) =>
      solve('pipe-movement', { length: 100, temperatureChange: 20, material: 'PE', ...inputs }).cautions.some(
        ({ about }) => about.includes('expansionCoefficient'),
      )
    expect(asks({})).toBe(true)
    expect(asks({ expansionCoefficient: 1.8e-4 })).toBe(false)
    expect(asks({ material: 'copper' })).toBe(false)
  })
})
