import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { waterDensity } from '../water/properties.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const subramanya = `K. Subramanya, 1000 Solved Problems in Fluid Mechanics, 2005, ${recomputed}`
const daugherty = `R. L. Daugherty & J. B. Franzini, Fluid Mechanics with Engineering Applications, 8th ed. 1985, ${recomputed}`

/** The book's 998 kg/m³. */
const waterTemperature = 20
const rigid = { insideDiameter: 0.001, wallThickness: 5, pipeModulus: 1e12 }
const surge = (inputs: object) =>
  calculate('surge', {
    length: 1000,
    ...rigid,
    velocityChange: 0,
    closureTime: 0,
    staticPressure: 1e6,
    waterTemperature,
    ...inputs,
  }) as Record<
    'waveSpeed' | 'criticalTime' | 'surgePressure' | 'worstSurge' | 'peakPressure' | 'minimumPressure' | 'rapid',
    number
  > & { closureParameter?: number }
const thin = (ratio: number) => ({ insideDiameter: ratio / 100, wallThickness: 0.01 })
/** Water stands in for the book's oil of 798.4 kg/m³: the same K/ρ gives the same wave. */
const likeOil = (bulkModulus: number) => (bulkModulus * waterDensity(waterTemperature)) / 798.4

const anyPipe = fc.record({
  length: logUniform(1, 1e5),
  insideDiameter: logUniform(0.01, 5),
  wallThickness: logUniform(1e-3, 0.2),
  pipeModulus: logUniform(1e8, 1e12),
  velocityChange: logUniform(0.01, 20),
  staticPressure: logUniform(1e4, 1e7),
})

describe('surge', () => {
  outside('published', subramanya, 'example 14.11, wave in a rigid pipe', () =>
    expectNear(surge({ bulkModulus: 2.22e9 }).waveSpeed, 1491.5, { relative: 2e-4 }),
  )
  outside('published', subramanya, 'example 14.12, wave of oil in a steel pipe', () => {
    // K/E of the oil stays that of the book when E goes with K.
    const bulkModulus = likeOil(1.43e9)
    const pipeModulus = (207e9 * bulkModulus) / 1.43e9
    expectNear(surge({ ...thin(125), bulkModulus, pipeModulus }).waveSpeed, 980.4, { relative: 1e-4 })
  })
  outside('published', subramanya, 'example 14.13, Joukowsky', () => {
    const { worstSurge, surgePressure, rapid } = surge({ bulkModulus: 2.2e9, velocityChange: 3 })
    expectNear(worstSurge, 4.445e6, { relative: 4e-4 })
    expect(surgePressure).toBe(worstSurge)
    expect(rapid).toBe(1)
  })
  outside('published', subramanya, 'example 14.15, rigid and elastic pipe', () => {
    const water = { bulkModulus: 2.1e9, velocityChange: 2.1 }
    expectNear(surge(water).worstSurge, 3.04e6, { absolute: 2e3 })
    expectNear(surge({ ...water, ...thin(50), pipeModulus: 210e9 }).worstSurge, 2.482e6, { absolute: 1e3 })
  })
  outside('published', subramanya, 'example 14.16, time of the wave', () => {
    const bulkModulus = likeOil(1.43e9)
    const pipeModulus = (210e9 * bulkModulus) / 1.43e9
    expectNear(surge({ ...thin(10), bulkModulus, pipeModulus }).criticalTime, 1.544, { absolute: 1e-3 })
  })
  outside('published', subramanya, 'example 14.20, length under the full surge', () => {
    // Shut in 4 s, all but the last a·t/2 of 3500 m from the valve feels the full surge.
    const { waveSpeed, criticalTime, worstSurge } = surge({ length: 3500, bulkModulus: 2.2e9, velocityChange: 0.8 })
    expectNear(3500 - (waveSpeed * 4) / 2, 530.6, { absolute: 0.5 })
    expect(criticalTime).toBeGreaterThan(4)
    expectNear(worstSurge, 1.185e6, { absolute: 1e3 })
  })
  outside('published', daugherty, 'example 13.4, stopped at once', () => {
    const foot = 0.3048
    const psi = 6894.757
    const bulkModulus = waterDensity(waterTemperature) * (3200 * foot) ** 2
    const velocityChange = (30 / (Math.PI * 2 ** 2)) * foot
    // The book's water has 1.94 slug/ft³, 0.17 % more than ours.
    expectNear(surge({ bulkModulus, velocityChange }).worstSurge / psi, 102.9, { relative: 0.003 })
  })
  outside('memory', 'usual figures for polyethylene', 'waves run at 200 to 350 m/s in it', () => {
    for (const [insideDiameter, wallThickness] of [
      [0.09, 0.01],
      [0.0968, 0.0066],
    ] as const) {
      const { waveSpeed } = surge({ insideDiameter, wallThickness, pipeModulus: 1e9 })
      expect(waveSpeed).toBeGreaterThan(200)
      expect(waveSpeed).toBeLessThan(350)
    }
  })
  outside(
    'derived',
    'the water that one wave stops',
    'its momentum is the push of the surge over the wave’s time',
    () => {
      fc.assert(
        fc.property(anyPipe, (pipe) => {
          const { waveSpeed, worstSurge, criticalTime } = surge(pipe)
          const area = (Math.PI / 4) * pipe.insideDiameter ** 2
          const momentum = waterDensity(waterTemperature) * area * pipe.length * pipe.velocityChange
          expectNear((worstSurge * area * criticalTime) / 2, momentum, { relative: 1e-9 })
          expectNear(waveSpeed * criticalTime, 2 * pipe.length, { relative: 1e-12 })
        }),
        runs,
      )
    },
  )

  test('the two rules meet at the time of the wave; slower is milder, never over the worst', () => {
    fc.assert(
      fc.property(anyPipe, logUniform(1.001, 100), (pipe, times) => {
        const { criticalTime, worstSurge } = surge(pipe)
        if (criticalTime * times > 1e5) return
        const slow = surge({ ...pipe, closureTime: criticalTime * times })
        expect(slow.rapid).toBe(0)
        expectNear(slow.surgePressure, worstSurge / times, { relative: 1e-9 })
        expectNear(slow.peakPressure + slow.minimumPressure, 2 * pipe.staticPressure, { relative: 1e-9 })
        expectNear(slow.closureParameter, worstSurge / (2 * pipe.staticPressure), { relative: 1e-9 })
      }),
      runs,
    )
  })

  test('a stiffer or thicker wall makes a faster wave, never as fast as in a rigid pipe', () => {
    fc.assert(
      fc.property(anyPipe, uniform(1.01, 3), (pipe, times) => {
        const { waveSpeed } = surge({ ...pipe, pipeModulus: pipe.pipeModulus / 3 })
        const stiffer = surge({ ...pipe, pipeModulus: (pipe.pipeModulus / 3) * times })
        expect(stiffer.waveSpeed).toBeGreaterThan(waveSpeed)
        expect(stiffer.waveSpeed).toBeLessThan(Math.sqrt(2.1e9 / waterDensity(waterTemperature)))
        const held = surge({ ...pipe, pipeModulus: pipe.pipeModulus / 3, restraint: 0.9 })
        expect(held.waveSpeed).toBeGreaterThan(waveSpeed)
      }),
      runs,
    )
  })

  test('without static pressure there is no closure parameter', () => {
    expect(surge({ velocityChange: 1, staticPressure: 0 })).not.toHaveProperty('closureParameter')
  })

  const pipe = { length: 240, insideDiameter: 0.0968, wallThickness: 0.0066, pipeModulus: 1e9, staticPressure: 4.7e5 }
  const cautions = (inputs: object) => solve('surge', { ...pipe, ...inputs }).cautions
  test('stops where the low wave parts the water', () => {
    const stops = (inputs: object) => cautions(inputs).filter(({ level }) => level === 'stop')
    expect(stops({ velocityChange: 3, closureTime: 0 })).toHaveLength(1)
    expect(stops({ velocityChange: 2, closureTime: 0 })).toHaveLength(0)
    expect(stops({ velocityChange: 3, closureTime: 20 })).toHaveLength(0)
  })
  test('doubts Michaud’s rule where the closure parameter is large, and only with slow closure', () => {
    const doubts = (inputs: object) => cautions(inputs).some(({ about }) => about.includes('closureParameter'))
    expect(doubts({ velocityChange: 1.3, closureTime: 6, staticPressure: 5e4 })).toBe(true)
    expect(doubts({ velocityChange: 1.3, closureTime: 0, staticPressure: 5e4 })).toBe(false)
    expect(doubts({ velocityChange: 1.3, closureTime: 6 })).toBe(false)
  })
  test('says of plastic that it stiffens in the cold, and not of steel', () => {
    const speaksOfCold = (pipeModulus: number) =>
      cautions({ pipeModulus, velocityChange: 1, closureTime: 5 }).some(({ about }) => about.includes('pipeModulus'))
    expect(speaksOfCold(1e9)).toBe(true)
    expect(speaksOfCold(207e9)).toBe(false)
  })
})
