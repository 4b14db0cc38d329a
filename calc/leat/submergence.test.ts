import fc from 'fast-check'
import { compile, unit } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs } from '../testing/properties.ts'

type Keys = 'velocity' | 'minimumSubmergence' | 'vortexSubmergence' | 'entranceSubmergence'
const found = (inputs: object) => calculate('submergence', inputs) as Record<Keys, number>

describe('submergence', () => {
  outside(
    'derived',
    'Gordon’s own form in feet, S = 0.3·v·√D and 0.4·v·√D (1970, from memory), worked in feet and turned into metres at the end',
    'both approaches',
    () => {
      // 8 ft of pipe at 12 ft/s: 0.3·12·√8 = 10.182 ft, 0.4·12·√8 = 13.576 ft.
      const [velocity, diameter] = [12 * 0.3048, 8 * 0.3048]
      const flow = (velocity * Math.PI * diameter ** 2) / 4
      const at = (approach: string) => found({ flow, pipeDiameter: diameter, approach }).vortexSubmergence / 0.3048
      expectNear(at('symmetrical'), 10.18234, { relative: 1e-6 })
      expectNear(at('lateral'), 13.57645, { relative: 1e-6 })
    },
  )

  outside('library', 'mathjs 15, the formulas evaluated with units', 'speed, velocity head and mouth', () => {
    const velocity = compile('Q / (pi * D^2 / 4)').evaluate({ Q: unit('17.2 L/s'), D: unit('132.2 mm') }) as {
      toNumber(unit: string): number
    }
    const head = compile('(1 + K) * v^2 / (2 * g)').evaluate({ K: 0.8, v: velocity, g: unit('9.80665 m/s^2') }) as {
      toNumber(unit: string): number
    }
    const inputs = { flow: 0.0172, pipeDiameter: 0.1322, approach: 'lateral', entranceK: 0.8 }
    expectNear(found(inputs).velocity, velocity.toNumber('m/s'), { relative: 1e-12 })
    expectNear(found(inputs).entranceSubmergence, head.toNumber('m'), { relative: 1e-12 })
  })

  outside(
    'derived',
    'the energy equation from still water to the mouth: a surface just so high stands the pressure at the crown at that of the air',
    'what drives the water in',
    () => {
      const { velocity, entranceSubmergence } = found({ flow: 0.02, pipeDiameter: 0.1, approach: 'symmetrical' })
      const pressureHead = entranceSubmergence - velocity ** 2 / (2 * 9.80665) - (0.5 * velocity ** 2) / (2 * 9.80665)
      expect(pressureHead).toBeCloseTo(0, 12)
    },
  )

  test('the greater rules, and it grows with the flow', () => {
    fc.assert(
      fc.property(logUniform(1e-4, 10), logUniform(0.03, 2), fc.boolean(), (flow, pipeDiameter, side) => {
        const inputs = { flow, pipeDiameter, approach: side ? 'lateral' : 'symmetrical' }
        const { minimumSubmergence, vortexSubmergence, entranceSubmergence } = found(inputs)
        expect(minimumSubmergence).toBe(Math.max(vortexSubmergence, entranceSubmergence))
        expect(found({ ...inputs, flow: flow * 1.2 }).minimumSubmergence).toBeGreaterThan(minimumSubmergence)
      }),
      runs,
    )
  })

  test('asks for one diameter where the formula would do with less', () => {
    const said = (flow: number) =>
      solve('submergence', { flow, pipeDiameter: 0.1, approach: 'symmetrical' })
        .cautions.map(({ say }) => say)
        .join(' ')
    expect(said(0.002)).toMatch(/one diameter/)
    expect(said(0.02)).not.toMatch(/one diameter/)
  })
})
