import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { runs, uniform } from '../testing/properties.ts'
import { expectRefusal } from '../testing/refusal.ts'
import { sorrelthwaite, sorrelthwaiteUncertainties } from './example-scheme.ts'
import { calculateScheme, schemeUncertainty, solveScheme, type SchemeInputs, type SchemeNumbers } from './scheme.ts'
import { stationKeys } from './stations.ts'

const resultsOf = ({ stations }: SchemeNumbers, station: (typeof stationKeys)[number]) => {
  const result = stations[station]
  if (!result || !('outputs' in result)) throw new Error(`${station}: ${JSON.stringify(result)}`)
  return result.outputs
}

describe('a whole scheme', () => {
  test('every station is worked out, by the calculators themselves', () => {
    const scheme = calculateScheme(sorrelthwaite)
    expect(Object.keys(scheme.stations).sort()).toEqual([...stationKeys].sort())
    for (const station of stationKeys) resultsOf(scheme, station)
    const { flow, netHead } = resultsOf(scheme, 'penstock')
    const jet = calculate('jet', { ...sorrelthwaite.jet, netHead, flow, waterTemperature: 10 })
    expect(resultsOf(scheme, 'jet')).toEqual(jet)
    const { speedRatio, pitchDiameter } = sorrelthwaite.runner
    expect(resultsOf(scheme, 'runner')['speed']).toBe(
      calculate('runner', { jetVelocity: jet['jetVelocity'], speedRatio, pitchDiameter })['speed'],
    )
    expect(scheme.gradeLine).toEqual(resultsOf(scheme, 'penstock')['gradeLine'])
  })

  test('what the fall is worth is lost station by station, and what is left reaches the load', () => {
    const { energyBalance, figures } = calculateScheme(sorrelthwaite)
    const sum = (key: 'head' | 'power' | 'share') => energyBalance!.reduce((total, part) => total + part[key], 0)
    expectNear(sum('power'), figures['grossPower'] as number, { relative: 1e-9 })
    expectNear(sum('head'), sorrelthwaite.penstock.grossHead, { relative: 1e-9 })
    expectNear(sum('share'), 1, { relative: 1e-9 })
    expect(energyBalance!.map(({ part }) => part)).toEqual([
      ...['pipe', 'fittings', 'nozzle', 'runner', 'alternator', 'cable', 'left'],
    ])
    for (const { power } of energyBalance!) expect(power).toBeGreaterThan(0)
    expect(energyBalance!.at(-1)).toMatchObject({ label: 'Reaches the load', power: figures['outputPower'] })
  })

  test('the balance closes whatever the numbers, and nobody gives back what was lost', () => {
    const some = fc.record({
      flow: uniform(0.001, 0.014),
      bore: uniform(0.08, 0.3),
      head: uniform(20, 200),
      efficiency: uniform(0.3, 1),
      ratio: uniform(0.3, 0.7),
      length: uniform(1, 400),
    })
    fc.assert(
      fc.property(some, ({ flow, bore, head, efficiency, ratio, length }) => {
        const { energyBalance, figures } = calculateScheme({
          ...sorrelthwaite,
          flow: { flow },
          penstock: { grossHead: head, sections: [{ length: 240, insideDiameter: bore, roughness: 5e-5 }] },
          runner: { ...sorrelthwaite.runner, speedRatio: ratio },
          alternator: { ...sorrelthwaite.alternator, efficiency },
          cable: { ...sorrelthwaite.cable, length },
        })
        if (!energyBalance) return
        const total = energyBalance.reduce((sum, { power }) => sum + power, 0)
        expectNear(total, figures['grossPower'] as number, { relative: 1e-9 })
        for (const { part, power } of energyBalance) if (part !== 'left') expect(power).toBeGreaterThanOrEqual(-1e-9)
      }),
      runs,
    )
  })

  test('a nozzle of known size decides the flow, and the jet has that size', () => {
    const scheme = calculateScheme({
      penstock: sorrelthwaite.penstock,
      jet: { velocityCoefficient: 0.97, jetCount: 2, nozzleDiameter: 0.013 },
    })
    const alone = calculate('penstock', {
      ...sorrelthwaite.penstock,
      nozzles: { count: 2, diameter: 0.013, dischargeCoefficient: 0.97 },
    })
    expect(scheme.figures['flow']).toBe(alone['flow'])
    expectNear(resultsOf(scheme, 'jet')['nozzleDiameter'] as number, 0.013, { relative: 1e-9 })
  })

  test('nozzles that draw more than the stream gives are told', () => {
    const of = (flow: number) =>
      solveScheme({
        flow: { flow },
        penstock: sorrelthwaite.penstock,
        jet: { velocityCoefficient: 0.97, jetCount: 1, nozzleDiameter: 0.02 },
      }).cautions.map(({ say }) => say)
    expect(of(0.005).join(' ')).toMatch(/draw .*L\/s.*forebay would run down/)
    expect(of(0.02).join(' ')).not.toMatch(/forebay would run down/)
  })

  test('every caution and working says at which station it stands', () => {
    const { cautions, working } = solveScheme(sorrelthwaite)
    expect(new Set(cautions.map(({ station }) => station))).toEqual(
      new Set(stationKeys.filter((key) => key !== 'flow')),
    )
    expect(working.map(({ station }) => station)).toContain('alternator')
    expect(working.every(({ steps }) => steps.length > 0)).toBe(true)
  })
})

describe('what is not known yet', () => {
  test('unknowns stay empty: what can be worked out is, and the rest says what it waits for', () => {
    const { stations, energyBalance, figures } = calculateScheme({
      flow: { flow: 0.0095 },
      penstock: sorrelthwaite.penstock,
      jet: { jetCount: 1 },
      runner: { speedRatio: 0.46, pitchDiameter: 0.21 },
      cable: { system: 'dc', voltage: 48 },
    })
    expect(stations.penstock).toHaveProperty('outputs')
    expect(stations.jet).toEqual({ waitsFor: ['jet.velocityCoefficient'] })
    expect(stations.runner).toEqual({ waitsFor: ['jet.velocityCoefficient'] })
    expect(stations.cable).toEqual({ waitsFor: ['alternator.outputPower', 'cable.length', 'cable.crossSection'] })
    expect(stations.load).toBeUndefined()
    expect(energyBalance!.at(-1)).toMatchObject({ part: 'left', label: 'Left at the nozzle', station: 'penstock' })
    expect(figures).not.toHaveProperty('jetPower')
  })

  test('nothing at all is a scheme too', () => {
    expect(calculateScheme({})).toEqual({ stations: {}, figures: {} })
    expect(calculateScheme({ penstock: {} }).stations.penstock).toEqual({
      waitsFor: ['penstock.grossHead', 'penstock.sections', 'flow.flow'],
    })
  })

  test('an empty list is a list that is still to come', () => {
    const { stations } = calculateScheme({ flow: { flow: 0.01 }, penstock: { grossHead: 48, sections: [] } })
    expect(stations.penstock).toEqual({ waitsFor: ['penstock.sections'] })
  })
})

describe('what is wrong', () => {
  const check = (inputs: unknown) => () => calculateScheme(inputs as SchemeInputs)
  test('numbers out of range and unknown names are refused at their station', () => {
    expectRefusal('out-of-range', 'penstock.grossHead', check({ penstock: { grossHead: -1 } }))
    expectRefusal('not-finite', 'flow.flow', check({ flow: { flow: '9.5' } }))
    expectRefusal(
      'out-of-range',
      'penstock.sections[0].length',
      check({ penstock: { sections: [{ ...sorrelthwaite.penstock.sections[0], length: -3 }] } }),
    )
    expectRefusal('unknown-key', 'jet.colour', check({ jet: { colour: 1 } }))
    expectRefusal('unknown-key', 'wheel', check({ wheel: {} }))
    expectRefusal('not-finite', 'jet', check({ jet: 5 }))
  })

  test('what does not work out is said at its station, and those behind it wait', () => {
    const { stations } = calculateScheme({
      flow: { flow: 0.2 },
      penstock: sorrelthwaite.penstock,
      jet: sorrelthwaite.jet,
    })
    expect(stations.penstock).toMatchObject({ refused: { code: 'no-solution', field: 'penstock.flow' } })
    expect(stations.jet).toEqual({ waitsFor: ['penstock.flow'] })
  })

  test('what comes from the stations before is not given a second time', () => {
    const { stations } = calculateScheme({
      flow: { flow: 0.0095 },
      penstock: sorrelthwaite.penstock,
      jet: { ...sorrelthwaite.jet, flow: 0.008 },
    })
    expect(stations.jet).toMatchObject({ refused: { code: 'inconsistent', field: 'jet.flow' } })
  })
})

describe('how sure the scheme is', () => {
  test('each input’s share, as the law of propagation has it', () => {
    const { outputPower } = schemeUncertainty(sorrelthwaite, sorrelthwaiteUncertainties)
    const { value, standardUncertainty, shares } = outputPower!
    expectNear(
      Object.values(shares).reduce((sum, share) => sum + share, 0),
      1,
      { relative: 1e-12 },
    )
    // The alternator’s efficiency multiplies what the cable then loses a little of: nearly in proportion.
    const alone = schemeUncertainty(sorrelthwaite, { 'alternator.efficiency': 0.04 }).outputPower!
    expectNear(alone.standardUncertainty / alone.value, 0.04 / 0.75, { relative: 0.03 })
    expectNear(shares['alternator.efficiency'], (alone.standardUncertainty / standardUncertainty) ** 2, {
      relative: 1e-6,
    })
    expect(value).toBe(calculateScheme(sorrelthwaite).figures['outputPower'])
  })

  test('names that there are not are refused', () => {
    for (const name of ['flow', 'flow.colour', 'wheel.size', 'penstock.sections[9].length', 'leat'])
      expect(() => schemeUncertainty(sorrelthwaite, { [name]: 1 }), name).toThrow()
    expectRefusal('missing', 'penstock.sections[9].length', () =>
      schemeUncertainty(sorrelthwaite, { 'penstock.sections[9].length': 1 }),
    )
  })
})
