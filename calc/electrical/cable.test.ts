import fc from 'fast-check'
import { complex, multiply, subtract, abs, type Complex } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { anyInputs } from '../testing/any-inputs.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { CalculationError } from '../errors.ts'
import { cable } from './cable.ts'

type Keys = 'current' | 'resistancePerMetre' | 'voltageDrop' | 'voltageDropFraction' | 'powerLoss' | 'lossFraction'
const found = (inputs: object) => calculate('cable', inputs) as Record<Keys, number>
const companions = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'

/** Volts that a stretch of d.c. cable loses at so many amperes. */
const dcDrop = (amperes: number, length: number, resistancePerKm: number) =>
  found({ system: 'dc', power: 300 * amperes, voltage: 300, length, resistancePerKm }).voltageDrop

describe('cable', () => {
  outside(
    'published',
    `V. K. Mehta & R. Mehta, Principles of Power System, 4th ed., 2005, example 13.1 (${companions})`,
    'a two-wire d.c. distributor, so many amperes in each of four stretches: 287.6 V at its end',
    () => {
      const lengths = [500, 500, 600, 400]
      const amperes = [500, 400, 250, 50]
      // 0.02 Ω for 1000 m of both conductors.
      const drops = lengths.map((length, i) => dcDrop(amperes[i]!, length, 0.01))
      expectNear(300 - drops.reduce((sum, drop) => sum + drop, 0), 287.6, { absolute: 0.01 })
    },
  )

  outside(
    'published',
    `V. K. Mehta & R. Mehta, Principles of Power System, 4th ed., 2005, example 13.4 (${companions})`,
    'd.c. cable of 27 mm² and 1.78·10⁻⁸ Ωm in three stretches: 239.41 V at the end',
    () => {
      const amperes = [47, 35, 20]
      const drops = [75, 100, 50].map((length, i) => dcDrop(amperes[i]!, length, (1.78e-8 / 27e-6) * 1000))
      expectNear(250 - drops.reduce((sum, drop) => sum + drop, 0), 239.41, { absolute: 0.05 })
    },
  )

  outside(
    'published',
    'IEC 60228:2004, table B.1, read at uecables.com: factor 0.893 from 50 °C and 0.833 from 70 °C to 20 °C',
    'a warm conductor',
    () => {
      const at = (conductorTemperature: number) =>
        found({
          system: 'dc',
          power: 100,
          voltage: 48,
          length: 10,
          crossSection: 16,
          material: 'copper',
          conductorTemperature,
        }).resistancePerMetre
      expectNear(at(20), 1.15e-3, { relative: 1e-12 })
      // The table rounds the coefficient to 0.004 per kelvin for both metals.
      expectNear(at(20) / at(50), 0.893, { relative: 3e-3 })
      expectNear(at(20) / at(70), 0.833, { relative: 4e-3 })
    },
  )

  outside(
    'derived',
    '√3·I·L·(R·cos φ + X·sin φ) written out for 35 mm² aluminium at 20 °C, 0.868 + j0.08 Ω/km, 30 A, 300 m, cos φ 0.9: 12.72 V',
    'three phases',
    () => {
      const power = Math.sqrt(3) * 400 * 30 * 0.9
      const { voltageDrop, current } = found({
        ...{ system: 'three-phase', power, voltage: 400, powerFactor: 0.9, length: 300, crossSection: 35 },
        ...{ material: 'aluminium', reactancePerKm: 0.08, conductorTemperature: 20 },
      })
      expectNear(current, 30, { relative: 1e-12 })
      expectNear(voltageDrop, 12.72, { absolute: 0.02 })
    },
  )

  outside(
    'library',
    'mathjs 15, complex phasors: |U at the source| − |U at the load| of one phase, there and back',
    'the usual short form leaves out only the part across, which is small',
    () => {
      const [current, powerFactor, R, X] = [20, 0.85, 0.3, 0.05]
      const line = {
        system: 'single-phase',
        power: 230 * current * powerFactor,
        voltage: 230,
        powerFactor,
        length: 1000,
      }
      const { voltageDrop } = found({ ...line, resistancePerKm: R, reactancePerKm: X })
      const phasor = complex(current * powerFactor, -current * Math.sqrt(1 - powerFactor ** 2))
      const lost = multiply(phasor, complex(2 * R, 2 * X)) as Complex
      const source = subtract(complex(230, 0), multiply(lost, -1)) as Complex
      expectNear(voltageDrop, Number(abs(source)) - 230, { relative: 0.005 })
    },
  )

  test('what is lost is what the drop takes, at a power factor of 1', () => {
    fc.assert(
      fc.property(anyInputs(cable), (inputs) => {
        const one = { ...inputs, powerFactor: undefined, reactancePerKm: undefined }
        let result: Record<Keys, number>
        try {
          result = found(one)
        } catch (error) {
          if (error instanceof CalculationError) return
          throw error
        }
        expectNear(result.lossFraction, result.voltageDropFraction, { relative: 1e-9 })
      }),
      runs,
    )
  })

  test('twice the voltage loses a quarter', () => {
    const at = (voltage: number) =>
      found({ system: 'single-phase', power: 2000, voltage, length: 180, crossSection: 10, material: 'copper' })
    expect(at(230).powerLoss / at(460).powerLoss).toBeCloseTo(4, 12)
  })

  test('refuses sizes that are not made, and what direct current has not', () => {
    const line = { system: 'dc', power: 100, voltage: 48, length: 10, crossSection: 16, material: 'copper' }
    expectRefusal('out-of-range', 'crossSection', () => found({ ...line, crossSection: 12 }))
    expectRefusal('out-of-range', 'crossSection', () => found({ ...line, crossSection: 4, material: 'aluminium' }))
    expectRefusal('inconsistent', 'powerFactor', () => found({ ...line, powerFactor: 0.9 }))
    expectRefusal('inconsistent', 'reactancePerKm', () => found({ ...line, reactancePerKm: 0.08 }))
  })

  test('tells of a drop that is large, and of one that is hopeless', () => {
    const said = (length: number) =>
      solve('cable', { system: 'dc', power: 480, voltage: 48, length, crossSection: 10, material: 'copper' })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(said(5)).not.toMatch(/per cent|quarter of the voltage/)
    expect(said(60)).toMatch(/More than 5 per cent/)
    expect(said(600)).toMatch(/More than a quarter of the voltage/)
    expect(said(5)).toMatch(/rated for direct current/)
  })
})
