import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { pePipe } from '../tables/pe-pipe.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { logUniform, runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'

const bar = 1e5
const pe80 = 8e6
const pe100 = 10e6
const atRest = { temperature: 20, workingPressure: 0, surgePressure: 0 }
const pressureClass = (inputs: object) =>
  calculate('pressure-class', { ...atRest, ...inputs }) as Record<
    'nominalPressure' | 'allowedPressure' | 'margin' | 'surgeMargin' | 'surgeAllowed',
    number
  >

describe('pressure-class', () => {
  const iso = 'ISO 4427-2:2007, table of PN and SDR, as printed by a pipe maker (rotorwandatanks.com)'
  // The printed PN is rounded to the series R10.
  for (const [name, minimumRequiredStrength, sdr, pn] of [
    ['PE 80 SDR 11', pe80, 11, 12.5],
    ['PE 80 SDR 26', pe80, 26, 5],
    ['PE 100 SDR 11', pe100, 11, 16],
    ['PE 100 SDR 17', pe100, 17, 10],
    ['PE 100 SDR 26', pe100, 26, 6],
  ] as const)
    outside('published', iso, `${name} is PN ${pn}`, () =>
      expectNear(pressureClass({ minimumRequiredStrength, sdr }).nominalPressure, pn * bar, { absolute: 0.45 * bar }),
    )

  const wavin = 'allowed pressures to EN 12201-1 Annex A in a pipe maker’s manual, p. 7'
  for (const [celsius, allowed] of [
    [20, 16],
    [30, 13.9],
    [40, 11.8],
  ] as const)
    outside('published', wavin, `PE 100 SDR 11 at ${celsius} °C: ${allowed} bar`, () => {
      const found = pressureClass({ minimumRequiredStrength: pe100, sdr: 11, temperature: celsius })
      expectNear(found.allowedPressure, allowed * bar, { absolute: 0.05 * bar })
    })
  // These two start from the rounded PN and are cut to a tenth of a bar: the factor is what can be compared.
  for (const [name, minimumRequiredStrength, sdr, warm, hot, printed] of [
    ['PE 80 SDR 11', pe80, 11, 10.8, 9.2, 12.5],
    ['PE 100 SDR 26', pe100, 26, 5.2, 4.4, 6],
  ] as const)
    outside('published', wavin, `${name}, factors at 30 and 40 °C`, () => {
      for (const [temperature, allowed] of [
        [30, warm],
        [40, hot],
      ] as const) {
        const found = pressureClass({ minimumRequiredStrength, sdr, temperature })
        expectNear(found.allowedPressure / found.nominalPressure, allowed / printed, { absolute: 0.08 / printed })
      }
    })

  test('common practice, no source: pipe rated 12 bar on a couple of bar has margin enough for a shallow heat mark', () => {
    const row = pePipe.rows.find(({ nominal, sdr }) => nominal === 110 && sdr === 11)!
    const rated = pressureClass({ minimumRequiredStrength: pe80, sdr: row.outsideDiameter / row.wallThickness })
    expectNear(rated.nominalPressure, 12.5 * bar, { absolute: 0.45 * bar })
    // A tenth of the wall gone, the wall warmed to 40 °C, and a surge as large as the pressure at rest.
    const marked = solve('pressure-class', {
      minimumRequiredStrength: pe80,
      sdr: row.outsideDiameter / (0.9 * row.wallThickness),
      temperature: 40,
      workingPressure: 2.2 * bar,
      surgePressure: 2.2 * bar,
    })
    expect(marked.outputs.surgeMargin).toBeGreaterThan(3 * bar)
    expect(marked.cautions.some(({ level }) => level === 'stop')).toBe(false)
  })

  test('allowed pressure falls with the temperature and with the SDR, and never passes the nominal one', () => {
    fc.assert(
      fc.property(uniform(0, 39), uniform(0, 1), logUniform(4, 90), uniform(1.001, 1.1), (t, warmer, sdr, thinner) => {
        const pipe = { minimumRequiredStrength: pe100, sdr, temperature: t }
        const found = pressureClass(pipe)
        const warm = pressureClass({ ...pipe, temperature: t + warmer })
        expect(warm.allowedPressure).toBeLessThanOrEqual(found.allowedPressure)
        expect(found.allowedPressure).toBeLessThanOrEqual(found.nominalPressure)
        expect(pressureClass({ ...pipe, sdr: sdr * thinner }).allowedPressure).toBeLessThan(found.allowedPressure)
      }),
      runs,
    )
  })

  test('a surge of the size allowed leaves nothing over', () => {
    fc.assert(
      fc.property(uniform(0, 5e5), uniform(1, 2), (workingPressure, surgeFactor) => {
        const pipe = { minimumRequiredStrength: pe100, sdr: 17, workingPressure, surgeFactor }
        const { surgeAllowed, margin, allowedPressure } = pressureClass(pipe)
        expectNear(margin, allowedPressure - workingPressure, { absolute: 1e-6 })
        const { surgeMargin } = pressureClass({ ...pipe, surgePressure: surgeAllowed })
        expectNear(surgeMargin, 0, { absolute: 1e-6 })
      }),
      runs,
    )
  })

  test('refuses a design coefficient under 1.25, hot walls, and PVC', () => {
    const pipe = { minimumRequiredStrength: pe100, sdr: 11, ...atRest }
    expectRefusal('out-of-range', 'designCoefficient', () =>
      calculate('pressure-class', { ...pipe, designCoefficient: 1.2 }),
    )
    expectRefusal('out-of-range', 'temperature', () => calculate('pressure-class', { ...pipe, temperature: 45 }))
    expectRefusal('out-of-range', 'minimumRequiredStrength', () =>
      calculate('pressure-class', { ...pipe, minimumRequiredStrength: 25e6 }),
    )
  })

  test('stops where a margin is below zero', () => {
    const stops = (inputs: object) =>
      solve('pressure-class', { minimumRequiredStrength: pe100, sdr: 17, ...atRest, ...inputs })
        .cautions.filter(({ level }) => level === 'stop')
        .flatMap(({ about }) => about)
    expect(stops({ workingPressure: 9 * bar })).toEqual([])
    expect(stops({ workingPressure: 9 * bar, surgePressure: 2 * bar })).toEqual(['surgeMargin', 'surgePressure'])
    expect(stops({ workingPressure: 11 * bar })).toContain('margin')
  })
})
