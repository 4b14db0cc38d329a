import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const bar = 1e5
type Output =
  | 'minimumFullScale'
  | 'chosenFullScale'
  | 'shareOfScale'
  | 'readingUncertainty'
  | 'readingUncertaintyHead'
  | 'standardUncertainty'
const gauge = (inputs: object) =>
  calculate('gauge-range', {
    staticPressure: 4 * bar,
    surgePressure: 0,
    service: 'steady',
    accuracyClass: 1.6,
    ...inputs,
  }) as Record<Output, number>

describe('gauge-range', () => {
  const dybbs = 'EN 837-1:1996, table 11, as copied at dybbs8.com'
  for (const accuracyClass of [0.1, 0.25, 0.6, 1, 1.6, 2.5, 4])
    outside('published', dybbs, `class ${accuracyClass} errs by ${accuracyClass} % of the span`, () => {
      const { readingUncertainty, chosenFullScale } = gauge({ accuracyClass })
      expectNear((100 * readingUncertainty) / chosenFullScale, accuracyClass, { relative: 1e-12 })
    })
  outside(
    'published',
    'a gauge maker’s sheet to EN 837-1, by its formula',
    'class 1.0 on a span of 6 bar: 0.06 bar',
    () => {
      const found = gauge({ accuracyClass: 1 })
      expect(found.chosenFullScale).toBe(6 * bar)
      expectNear(found.readingUncertainty, 0.06 * bar, { relative: 1e-9 })
    },
  )
  outside('derived', 'the conventional metre of water, 1000 kg/m³ and 9.80665 m/s²', '1 bar is 10.19716 m', () => {
    const { readingUncertainty, readingUncertaintyHead } = gauge({ waterTemperature: 4 })
    expectNear(readingUncertaintyHead / readingUncertainty, 10.19716 / bar, { relative: 5e-5 })
  })
  outside('derived', 'second moment of an even spread between −1 and 1', 'standard uncertainty', () => {
    const points = 1e5
    let sum = 0
    for (let i = 0; i < points; i++) sum += (-1 + (2 * (i + 0.5)) / points) ** 2 / points
    const { standardUncertainty, readingUncertainty } = gauge({})
    expectNear(standardUncertainty / readingUncertainty, Math.sqrt(sum), { relative: 1e-9 })
  })
  outside('memory', 'EN 837-2:1997', 'three quarters steady, 65 % fluctuating', () => {
    expect(gauge({ staticPressure: 7.5 * bar }).chosenFullScale).toBe(10 * bar)
    expect(gauge({ staticPressure: 7.51 * bar }).chosenFullScale).toBe(16 * bar)
    expect(gauge({ staticPressure: 6.5 * bar, service: 'fluctuating' }).chosenFullScale).toBe(10 * bar)
    expect(gauge({ staticPressure: 6.51 * bar, service: 'fluctuating' }).chosenFullScale).toBe(16 * bar)
  })

  test('the scale chosen is the next one: static and surge fit, and on the one before they would not', () => {
    const series = [0.6, 1, 1.6, 2.5, 4, 6, 10, 16, 25, 40, 60, 100, 160, 250, 400].map((scale) => scale * bar)
    fc.assert(
      fc.property(logUniform(1e3, 2e7), uniform(0, 0.4), (staticPressure, surge) => {
        const { minimumFullScale, chosenFullScale, shareOfScale } = gauge({
          staticPressure,
          surgePressure: surge * staticPressure,
        })
        expectNear(minimumFullScale, (staticPressure * (1 + surge)) / 0.75, { relative: 1e-12 })
        const place = series.indexOf(chosenFullScale)
        expect(place).toBeGreaterThanOrEqual(0)
        expect(minimumFullScale).toBeLessThanOrEqual(chosenFullScale * (1 + 1e-9))
        if (place > 0) expect(minimumFullScale).toBeGreaterThan(series[place - 1]!)
        expectNear(shareOfScale, staticPressure / chosenFullScale, { relative: 1e-12 })
      }),
      runs,
    )
  })

  test('refuses what no gauge of the series carries', () => {
    expect(gauge({ staticPressure: 300 * bar }).chosenFullScale).toBe(400 * bar)
    expectRefusal('no-solution', 'staticPressure', () => gauge({ staticPressure: 301 * bar }))
  })

  test('doubts a gauge that may err by over a third of the loss', () => {
    const doubts = (inputs: object) =>
      solve('gauge-range', {
        staticPressure: 4e5,
        surgePressure: 0,
        service: 'steady',
        accuracyClass: 1.6,
        ...inputs,
      }).cautions.some(({ about }) => about.includes('predictedLoss'))
    // 1.6 % of 6 bar is 0.98 m.
    expect(doubts({ predictedLoss: 2.9 })).toBe(true)
    expect(doubts({ predictedLoss: 3 })).toBe(false)
    expect(doubts({})).toBe(false)
  })
})
