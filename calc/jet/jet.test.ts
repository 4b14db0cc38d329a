import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { g } from '../constants.ts'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { waterDensity } from '../water/properties.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const cengel = `Y. A. Çengel & J. M. Cimbala, Fluid Mechanics, 2nd ed. 2010, ${recomputed}`
const subramanya = `K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, ${recomputed}`
const arasu = `A. V. Arasu, Turbomachines, 2009, ${recomputed}`
const sarkar = `B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, ${recomputed}`

// The books take 9.81 m/s² and 1000 kg/m³: 0.02 % on a speed, 0.1 % on a power.
const booksGravity = 3e-4
const booksWeight = 1e-3

const jet = (inputs: object) =>
  calculate('jet', { velocityCoefficient: 1, jetCount: 1, ...inputs }) as Record<
    'jetVelocity' | 'jetDiameter' | 'nozzleDiameter' | 'flow' | 'jetPower' | 'nozzleEfficiency',
    number
  >

describe('jet', () => {
  outside('published', cengel, 'example 5-6, speed out of a tank', () => {
    expectNear(jet({ netHead: 5, nozzleDiameter: 0.01 }).jetVelocity, 9.9, { absolute: 0.05 })
  })
  outside('published', subramanya, 'example 13.1, flow through an orifice that contracts', () => {
    // The book gives 0.2 m lost of 2 m: Cv = √(1.8/2).
    const { flow } = jet({
      netHead: 2,
      velocityCoefficient: Math.sqrt(1.8 / 2),
      contractionCoefficient: 0.63,
      nozzleDiameter: 0.04,
    })
    expectNear(flow, 4.707e-3, { absolute: 1e-5 })
  })
  outside('published', arasu, 'example 9.2, jet diameter', () => {
    const { jetDiameter } = jet({ netHead: 500, velocityCoefficient: 0.98, flow: 3.12 })
    expectNear(jetDiameter, 0.202, { absolute: 1e-3 })
  })
  outside('published', arasu, 'example 9.6, jet diameter for 100 kW at 85 %', () => {
    const flow = 100e3 / (0.85 * 1000 * 9.81 * 60)
    expectNear(jet({ netHead: 60, velocityCoefficient: 0.98, flow }).jetDiameter, 0.087, { absolute: 5e-4 })
  })
  outside('published', arasu, 'example 9.3, power of the jet', () => {
    // The book gives the speed of the wheel: 0.46 of the jet's, 1000 rev/min on 0.8 m.
    const velocity = (Math.PI * 0.8 * 1000) / 60 / 0.46
    const { jetPower } = jet({ netHead: velocity ** 2 / (2 * g), flow: 0.15 })
    expectNear(jetPower, 621.867e3, { relative: booksWeight })
  })
  outside('published', subramanya, 'example 16.13, jet diameter for 500 kW at 85 %', () => {
    const flow = 500e3 / (0.85 * 9790 * 380)
    const { jetDiameter } = jet({ netHead: 380, velocityCoefficient: 0.98, flow })
    expectNear(jetDiameter, 0.0488, { absolute: 1e-4 })
  })
  outside('published', sarkar, 'example 11.3, area of the jet', () => {
    const flow = 4410e3 / (0.86 * 9810 * 340)
    const { jetDiameter } = jet({ netHead: 340, velocityCoefficient: 0.97, flow })
    expectNear((Math.PI / 4) * jetDiameter ** 2, 0.0194058, { relative: booksGravity })
  })
  outside('derived', 'energy of the nozzle', 'what reaches it is the jet’s power and the nozzle’s loss', () => {
    const { jetPower, nozzleEfficiency } = jet({ netHead: 45, velocityCoefficient: 0.96, flow: 0.02 })
    expectNear(jetPower, nozzleEfficiency * waterDensity(10) * g * 0.02 * 45, { relative: 1e-12 })
  })

  test('flow and nozzle diameter give each other back, and the jet has no more power than the water', () => {
    fc.assert(
      fc.property(
        logUniform(0.1, 2000),
        uniform(0.9, 1),
        uniform(0.5, 1),
        fc.integer({ min: 1, max: 6 }),
        logUniform(0.001, 1),
        (netHead, velocityCoefficient, contractionCoefficient, jetCount, nozzleDiameter) => {
          const given = { netHead, velocityCoefficient, contractionCoefficient, jetCount }
          const there = jet({ ...given, nozzleDiameter })
          if (there.flow < 1e-6 || there.flow > 100) return
          const back = jet({ ...given, flow: there.flow })
          expectNear(back.nozzleDiameter, nozzleDiameter, { relative: 1e-12 })
          expectNear(back.jetPower, there.jetPower, { relative: 1e-12 })
          expect(there.jetPower).toBeLessThanOrEqual(waterDensity(10) * g * there.flow * netHead * (1 + 1e-12))
        },
      ),
      runs,
    )
  })

  test('jets share the flow', () => {
    const [one, two] = [1, 2].map((jetCount) => jet({ netHead: 45, jetCount, flow: 0.02 }))
    expectNear(two!.jetDiameter, one!.jetDiameter / Math.SQRT2, { relative: 1e-12 })
    expect(two!.jetPower).toBe(one!.jetPower)
  })

  test('wants exactly one of flow and nozzle diameter', () => {
    expectRefusal('missing', 'flow', () => jet({ netHead: 45 }))
    expectRefusal('inconsistent', 'nozzleDiameter', () => jet({ netHead: 45, flow: 0.01, nozzleDiameter: 0.02 }))
    expectRefusal('out-of-range', 'velocityCoefficient', () =>
      jet({ netHead: 45, flow: 0.01, velocityCoefficient: 97 }),
    )
    expectRefusal('out-of-range', 'jetCount', () => jet({ netHead: 45, flow: 0.01, jetCount: 1.5 }))
  })

  test('warns of counting a maker’s coefficient twice, and of a jet that is too thick', () => {
    const about = (inputs: object) =>
      solve('jet', { netHead: 45, velocityCoefficient: 0.97, jetCount: 1, ...inputs }).cautions.flatMap(
        ({ about }) => about,
      )
    expect(about({ nozzleDiameter: 0.02, contractionCoefficient: 0.62 })).not.toContain('contractionCoefficient')
    expect(about({ nozzleDiameter: 0.02, contractionCoefficient: 0.62, velocityCoefficient: 0.99 })).toContain(
      'contractionCoefficient',
    )
    expect(about({ nozzleDiameter: 0.02 })).not.toContain('jetDiameter')
    expect(about({ nozzleDiameter: 0.2 })).toContain('jetDiameter')
    expect(about({ nozzleDiameter: 0.2, jetCount: 2 })).not.toContain('jetDiameter')
  })
})
