import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const arasu = `A. V. Arasu, Turbomachines, 2009, ${recomputed}`
const sarkar = `B. K. Sarkar, Fluid Mechanics and Hydraulic Machines, 1999, ${recomputed}`
const subramanya = `K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, ${recomputed}`
const munson = `B. R. Munson, D. F. Young & T. H. Okiishi, Fundamentals of Fluid Mechanics, 5th ed. 2007, ${recomputed}`

// The books take 9.81 m/s², 0.02 % on a speed, and 3.142 for pi.
const booksGravity = 5e-4

const runner = (inputs: object) =>
  calculate('runner', { speedRatio: 0.46, ...inputs }) as Record<
    'bucketSpeed' | 'speed' | 'pitchDiameter' | 'diameterRatio' | 'bucketCount' | 'specificSpeed' | 'runawaySpeed',
    number
  >

describe('runner', () => {
  outside('published', arasu, 'example 9.2, pitch circle', () => {
    expectNear(runner({ netHead: 500, velocityCoefficient: 0.98, speed: 430 }).pitchDiameter, 1.98, { absolute: 5e-3 })
  })
  outside('published', arasu, 'example 9.6, pitch circle and buckets', () => {
    // The book's speed ratio is over √(2gH): over the jet's speed it is 0.45/Cv.
    const found = runner({
      netHead: 60,
      velocityCoefficient: 0.98,
      speedRatio: 0.45 / 0.98,
      speed: 200,
      jetDiameter: 0.087,
    })
    expectNear(found.pitchDiameter, 1.47, { absolute: 6e-3 })
    expect(runner({ jetVelocity: 33.6, pitchDiameter: 1.474, jetDiameter: 0.087 }).bucketCount).toBe(23)
    // 15 + 8.47 = 23.47, to the nearest 23; the recomputation adds 1 and cuts to 24.
    expectNear(found.bucketCount, 24, { absolute: 1 })
  })
  outside('published', sarkar, 'example 11.1, pitch circle', () => {
    const { pitchDiameter } = runner({ netHead: 500, velocityCoefficient: 0.97, speed: 600 })
    expectNear(pitchDiameter, 1.4066, { relative: booksGravity })
  })
  outside('published', sarkar, 'example 11.3, pitch circle', () => {
    const { pitchDiameter } = runner({ netHead: 340, velocityCoefficient: 0.97, speedRatio: 0.45, speed: 500 })
    expectNear(pitchDiameter, 1.3616, { relative: booksGravity })
  })
  outside('published', subramanya, 'example 16.13, specific speed and bucket circle', () => {
    // The book's speed ratio is over √(2gH): over the jet's speed it is 0.46/Cv.
    const found = runner({
      netHead: 380,
      velocityCoefficient: 0.98,
      speedRatio: 0.46 / 0.98,
      speed: 1050,
      powerPerJet: 500e3,
    })
    expectNear(found.specificSpeed, 14, { absolute: (14 * 1.5) / 1050 })
    expectNear(found.pitchDiameter, 0.722, { absolute: 1e-3 })
  })
  outside('published', munson, 'example 12.6, speed at half of the jet’s', () => {
    const foot = 0.3048
    // Two thirds of 200 ft are left at the nozzle, which is without loss.
    const found = runner({
      netHead: (200 * foot * 2) / 3,
      velocityCoefficient: 1,
      speedRatio: 0.5,
      pitchDiameter: 3 * foot,
    })
    expectNear(found.speed, 295, { absolute: 2 })
  })
  outside('derived', 'the rim’s way in a second', 'is the jet’s speed at runaway, the bucket’s at speed', () => {
    const { speed, runawaySpeed, bucketSpeed } = runner({ jetVelocity: 26.4, pitchDiameter: 0.21 })
    expectNear((Math.PI * 0.21 * speed) / 60, bucketSpeed, { relative: 1e-12 })
    expectNear((Math.PI * 0.21 * runawaySpeed) / 60, 26.4, { relative: 1e-12 })
  })

  test('pitch circle and speed give each other back', () => {
    fc.assert(
      fc.property(
        logUniform(0.5, 250),
        uniform(0.05, 0.95),
        logUniform(0.02, 10),
        (jetVelocity, speedRatio, pitchDiameter) => {
          const there = runner({ jetVelocity, speedRatio, pitchDiameter })
          if (there.speed < 1 || there.speed > 30_000) return
          const back = runner({ jetVelocity, speedRatio, speed: there.speed })
          expectNear(back.pitchDiameter, pitchDiameter, { relative: 1e-12 })
          expectNear(back.runawaySpeed, there.runawaySpeed, { relative: 1e-12 })
          expect(there.speed).toBeLessThan(there.runawaySpeed)
        },
      ),
      runs,
    )
  })

  test('without a jet diameter or a power their outputs are absent', () => {
    expect(Object.keys(runner({ jetVelocity: 26.4, pitchDiameter: 0.21 })).sort()).toEqual([
      'bucketSpeed',
      'pitchDiameter',
      'runawaySpeed',
      'speed',
    ])
  })

  test('refuses what decides itself, and a power without its head', () => {
    const given = { netHead: 40, velocityCoefficient: 0.97, pitchDiameter: 0.2 }
    expectRefusal('missing', 'jetVelocity', () => runner({ pitchDiameter: 0.2 }))
    expectRefusal('inconsistent', 'netHead', () => runner({ ...given, jetVelocity: 26 }))
    expectRefusal('missing', 'velocityCoefficient', () => runner({ netHead: 40, pitchDiameter: 0.2 }))
    expectRefusal('inconsistent', 'velocityCoefficient', () =>
      runner({ jetVelocity: 26, velocityCoefficient: 0.97, pitchDiameter: 0.2 }),
    )
    expectRefusal('missing', 'pitchDiameter', () => runner({ jetVelocity: 26 }))
    expectRefusal('inconsistent', 'speed', () => runner({ ...given, speed: 1500 }))
    expectRefusal('missing', 'netHead', () => runner({ jetVelocity: 26, pitchDiameter: 0.2, powerPerJet: 2000 }))
  })

  test('warns of a jet too thick for the wheel, and of a specific speed off the usual', () => {
    const about = (inputs: object) =>
      solve('runner', {
        netHead: 40,
        velocityCoefficient: 0.97,
        speedRatio: 0.46,
        pitchDiameter: 0.2,
        ...inputs,
      }).cautions.flatMap(({ about }) => about)
    expect(about({ jetDiameter: 0.02 })).not.toContain('diameterRatio')
    expect(about({ jetDiameter: 0.026 })).toContain('diameterRatio')
    expect(about({ powerPerJet: 2500 })).not.toContain('specificSpeed')
    expect(about({ powerPerJet: 100 })).toContain('specificSpeed')
    expect(about({ powerPerJet: 20_000 })).toContain('specificSpeed')
  })
})
