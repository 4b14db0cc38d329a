import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const recomputed = 'as recomputed in github.com/FOSSEE/Python-Textbook-Companions'
const set = {
  voltsPerThousandRpm: 40,
  output: 'three-phase-line',
  speed: 1000,
  controllerMinimum: 20,
  controllerMaximum: 200,
}
const alternator = (inputs: object) =>
  calculate('alternator', { ...set, ...inputs }) as {
    openCircuitVoltage: number
    directVoltageOpen: number
    directVoltageLoaded?: number
    frequency?: number
    runawayVoltage?: number
    speedAtMinimum?: number
    speedAtMaximum?: number
  }
const outputs = ['dc', 'three-phase-line', 'single-phase'] as const
const load = { current: 5, effectiveResistance: 0.4, diodeDrop: 1.5 }

/** Mean and peak of what a bridge passes of these waves, each of one volt rms between its lines. */
const rectified = (waves: readonly number[]) => {
  const steps = 36_000
  let sum = 0
  let peak = 0
  for (let i = 0; i < steps; i++) {
    const angle = (2 * Math.PI * (i + 0.5)) / steps
    const most = Math.max(...waves.map((shift) => Math.abs(Math.SQRT2 * Math.sin(angle + shift))))
    sum += most / steps
    peak = Math.max(peak, most)
  }
  return { mean: sum, peak }
}
const third = (2 * Math.PI) / 3

describe('alternator', () => {
  outside(
    'published',
    `I. L. Kosow, Electric Machinery and Transformers, 2nd ed. 2007, example 2.7, ${recomputed}`,
    '6 poles at 1200 rev/min',
    () => expectNear(alternator({ polePairs: 3, speed: 1200 }).frequency, 60, { relative: 1e-12 }),
  )
  outside(
    'published',
    `D. C. Kulshreshtha, Basic Electrical Engineering, 2012, example 14.1, ${recomputed}`,
    '60 Hz of 6 poles is 1200 rev/min',
    () => {
      // By half of the speed and a gear of two.
      expectNear(alternator({ polePairs: 3, speed: 600, gearRatio: 2 }).frequency, 60, { relative: 1e-12 })
    },
  )
  outside(
    'published',
    'answers on rectified mains (newbedev.com)',
    '400 V between lines is about 565 V at the peak',
    () =>
      expectNear(alternator({ voltsPerThousandRpm: 400, controllerMaximum: 900 }).directVoltageOpen, 565, {
        absolute: 2,
      }),
  )
  outside(
    'published',
    'theory of rectifiers, as worked at askfilo.com',
    'one phase: mean about 0.9 of the rms volts',
    () => {
      const { directVoltageLoaded } = alternator({
        output: 'single-phase',
        current: 0,
        effectiveResistance: 0,
        diodeDrop: 0,
      })
      expectNear(directVoltageLoaded! / 40, 0.9, { absolute: 0.0005 })
    },
  )
  outside(
    'derived',
    'the waves between the lines, rectified step by step',
    'three phases: peak open, mean under load',
    () => {
      const { mean, peak } = rectified([0, third, -third])
      const found = alternator({ current: 0, effectiveResistance: 1, diodeDrop: 0 })
      expectNear(found.directVoltageOpen / found.openCircuitVoltage, peak, { relative: 1e-6 })
      // 1.35 for 3√2/π.
      expectNear(found.directVoltageLoaded! / found.openCircuitVoltage, mean, { relative: 4e-4 })
    },
  )
  outside('derived', 'one wave, rectified step by step', 'one phase: peak open, mean under load', () => {
    const { mean, peak } = rectified([0])
    const found = alternator({ output: 'single-phase', current: 0, effectiveResistance: 1, diodeDrop: 0 })
    expectNear(found.directVoltageOpen / found.openCircuitVoltage, peak, { relative: 1e-6 })
    expectNear(found.directVoltageLoaded! / found.openCircuitVoltage, mean, { relative: 1e-6 })
  })

  test('direct volts are taken as measured, without diodes', () => {
    const found = alternator({ ...load, output: 'dc' })
    expect(found.openCircuitVoltage).toBe(40)
    expect(found.directVoltageOpen).toBe(40)
    expectNear(found.directVoltageLoaded, 38, { relative: 1e-12 })
    expectNear(alternator(load).directVoltageLoaded, 1.35 * 40 - 1.5 - 2, { relative: 1e-12 })
    // Two volts stay in the diodes where nothing is said of them.
    const { directVoltageLoaded } = alternator({ ...load, diodeDrop: undefined })
    expectNear(directVoltageLoaded, 1.35 * 40 - 2 - 2, { relative: 1e-12 })
  })

  test('at the speeds found the volts are the controller’s own', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...outputs),
        logUniform(10, 200),
        uniform(0.5, 4),
        fc.boolean(),
        (output, voltsPerThousandRpm, gearRatio, isLoaded) => {
          const given = { output, voltsPerThousandRpm, gearRatio, ...(isLoaded ? load : {}) }
          const { speedAtMinimum, speedAtMaximum } = alternator(given)
          const least = alternator({ ...given, speed: speedAtMinimum })
          expectNear(isLoaded ? least.directVoltageLoaded : least.directVoltageOpen, 20, { relative: 1e-9 })
          if (speedAtMaximum! < 30_000)
            expectNear(alternator({ ...given, speed: speedAtMaximum }).directVoltageOpen, 200, { relative: 1e-9 })
        },
      ),
      runs,
    )
  })

  test('volts and frequency go with the speed and with the gear', () => {
    fc.assert(
      fc.property(fc.constantFrom(...outputs), logUniform(10, 3000), uniform(1, 5), (output, speed, times) => {
        const slow = alternator({ output, speed, polePairs: 4 })
        for (const fast of [
          alternator({ output, speed: speed * times, polePairs: 4 }),
          alternator({ output, speed, gearRatio: times, polePairs: 4 }),
        ]) {
          expectNear(fast.openCircuitVoltage, slow.openCircuitVoltage * times, { relative: 1e-9 })
          expectNear(fast.directVoltageOpen, slow.directVoltageOpen * times, { relative: 1e-9 })
          expectNear(fast.frequency, slow.frequency! * times, { relative: 1e-9 })
        }
      }),
      runs,
    )
  })

  test('running away multiplies the open volts', () => {
    const { directVoltageOpen, runawayVoltage } = alternator({ runawayRatio: 2.1 })
    expectNear(runawayVoltage, 2.1 * directVoltageOpen, { relative: 1e-12 })
  })

  test('what cannot be worked out is absent', () => {
    expect(Object.keys(alternator({})).sort()).toEqual([
      'directVoltageOpen',
      'openCircuitVoltage',
      'speedAtMaximum',
      'speedAtMinimum',
    ])
    const noResistance = alternator({ current: 5 })
    expect(noResistance).not.toHaveProperty('directVoltageLoaded')
    expect(noResistance).not.toHaveProperty('speedAtMinimum')
    expect(alternator({ effectiveResistance: 0.4 })).not.toHaveProperty('directVoltageLoaded')
    const tooMuch = alternator({ current: 500, effectiveResistance: 0.4 })
    expect(tooMuch).not.toHaveProperty('directVoltageLoaded')
    expect(tooMuch.speedAtMinimum).toBeGreaterThan(1000)
  })

  test('refuses a controller whose greatest voltage is not over its least', () => {
    expectRefusal('inconsistent', 'controllerMaximum', () => alternator({ controllerMaximum: 20 }))
  })

  test('stops where running away comes within a tenth of the controller’s limit', () => {
    const stops = (runawayRatio: number) =>
      solve('alternator', { ...set, runawayRatio }).cautions.some(
        ({ level, about }) => level === 'stop' && about.includes('runawayVoltage'),
      )
    const edge = 200 / 1.1 / (Math.SQRT2 * 40)
    expect(stops(edge * 1.001)).toBe(true)
    expect(stops(edge * 0.999)).toBe(false)
  })
})
