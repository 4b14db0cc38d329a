import { describe, expect, it } from 'vitest'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { unitFor } from '../units/format.ts'
import { bendRadius } from './bend-radius.ts'
import { conductors } from './conductors.ts'
import { expansion } from './expansion.ts'
import { fittings } from './fittings.ts'
import { accuracyClasses, gauges } from './gauges.ts'
import { hazenWilliams } from './hazen-williams.ts'
import { manning } from './manning.ts'
import { moduli } from './moduli.ts'
import { pePipe } from './pe-pipe.ts'
import { roughness } from './roughness.ts'
import { tables } from './tables.ts'
import { temperatureFactor } from './temperature-factor.ts'
import { water } from './water.ts'

describe.each(Object.entries(tables))('table %s', (id, table) => {
  it('is known by its own id', () => expect(table.id).toBe(id))

  it('has a source for every row', () => {
    expect(table.rows.length).toBeGreaterThan(2)
    for (const row of table.rows) expect(row.source).toMatch(/\w{4}/)
  })

  it('says that other data go before it', () => expect(table.say).toMatch(/\brules?\b/))

  it('holds in its rows what its columns say, and nothing else', () => {
    for (const row of table.rows)
      for (const [key, cell] of Object.entries(row)) {
        if (key === 'source' || cell === undefined) continue
        const column = table.columns[key]
        expect(column, `${id} has no column ${key}`).toBeDefined()
        for (const value of Array.isArray(cell) ? (cell as readonly number[]) : [cell])
          expect(typeof value, `${id}.${key}`).toBe(column!.quantity ? 'number' : 'string')
      }
  })

  it('fills each column somewhere, in a unit that its quantity has', () => {
    for (const [key, { quantity, unit }] of Object.entries(table.columns)) {
      expect(table.rows.some((row) => row[key] !== undefined)).toBe(true)
      if (quantity) expect(() => unitFor(quantity, 1, unit)).not.toThrow()
    }
  })

  it('writes ranges from small to large, and numbers that are finite', () => {
    for (const row of table.rows)
      for (const cell of Object.values(row)) {
        const values = Array.isArray(cell) ? (cell as readonly number[]) : typeof cell === 'number' ? [cell] : []
        expect([...values].sort((a, b) => a - b)).toEqual(values)
        for (const value of values) expect(Number.isFinite(value)).toBe(true)
      }
  })

  it('has no row twice', () => {
    const rows = table.rows.map((row) => JSON.stringify(row))
    expect(new Set(rows).size).toBe(rows.length)
  })
})

describe('polyethylene pipe', () => {
  const wall = (dn: number, sdr: number) => pePipe.rows.find((row) => row.nominal === dn && row.sdr === sdr)

  it('has an inside diameter of the outside less two walls', () => {
    for (const row of pePipe.rows)
      expectNear(row.insideDiameter, row.outsideDiameter - 2 * row.wallThickness, { absolute: 1e-9 })
  })

  it('has walls that grow with the size and shrink with the SDR, near OD ÷ SDR', () => {
    for (const row of pePipe.rows) {
      for (const other of pePipe.rows) {
        if (other.sdr === row.sdr && other.nominal > row.nominal)
          expect(other.wallThickness).toBeGreaterThanOrEqual(row.wallThickness)
        if (other.nominal === row.nominal && other.sdr > row.sdr)
          expect(other.wallThickness).toBeLessThan(row.wallThickness)
      }
      // Rounded up to a tenth of a millimetre, and never under 2 mm.
      expectNear(row.wallThickness, row.outsideDiameter / row.sdr, { relative: 0.03, absolute: 0.0003 })
    }
  })

  const vesbo = 'ISO 4427-2:2007 minimum walls, as printed in a maker’s PE 100 brochure'
  outside('published', vesbo, 'dn 110 SDR 11 is 10.0 mm', () => expect(wall(110, 11)?.wallThickness).toBe(0.01))
  outside('published', vesbo, 'dn 250 SDR 17 is 14.8 mm', () => expect(wall(250, 17)?.wallThickness).toBe(0.0148))
  outside('published', vesbo, 'dn 90 SDR 13.6 is 6.7 mm', () => expect(wall(90, 13.6)?.wallThickness).toBe(0.0067))
  const sotici = 'walls to NF EN 12201-2:2003 and ISO 4427:2007 in SOTICI’s documentation of HDPE pipe'
  outside('published', sotici, 'dn 160 SDR 26 is 6.2 mm', () => expect(wall(160, 26)?.wallThickness).toBe(0.0062))
  outside('published', sotici, 'dn 125 SDR 21 is 6.0 mm', () => expect(wall(125, 21)?.wallThickness).toBe(0.006))
  outside('published', sotici, 'dn 75 SDR 9 is 8.4 mm', () => expect(wall(75, 9)?.wallThickness).toBe(0.0084))
})

describe('temperature factor', () => {
  const wavin = 'allowed pressures to EN 12201-1 Annex A in a pipe maker’s manual, p. 7'
  const factor = (celsius: number) => temperatureFactor.rows.find((row) => row.temperature === celsius)!
  // The manual prints pressures to a tenth of a bar.
  for (const [celsius, allowed] of [
    [30, 13.9],
    [40, 11.8],
  ] as const)
    outside('published', wavin, `PE 100 SDR 11 at ${celsius} °C: ${allowed} bar of 16`, () =>
      expectNear(factor(celsius).factor, allowed / 16, { absolute: 0.05 / 16 + 0.001 }),
    )
  const asnzs = 'AS/NZS 2033 and 4130 as tabulated by a pipe maker (enviropipes.com.au)'
  for (const [celsius, head] of [
    [30, 150],
    [40, 135],
  ] as const)
    outside('published', asnzs, `PE 100 PN 16 at ${celsius} °C: ${head} m of 160`, () =>
      expectNear(factor(celsius).otherPractice, head / 160, { absolute: 0.005 }),
    )
})

describe('conductors', () => {
  const at = (area: number) => conductors.rows.find((row) => row.crossSection === area)
  const iec = 'IEC 60228:2004, table 2, as printed by cable makers'
  outside('published', iec, '16 mm² copper 1.15 Ω/km', () => expect(at(16)?.copper).toBe(1.15))
  outside('published', iec, '95 mm² copper 0.193 Ω/km', () => expect(at(95)?.copper).toBe(0.193))
  outside('published', iec, '240 mm² aluminium 0.125 Ω/km', () => expect(at(240)).toMatchObject({ aluminium: 0.125 }))

  it('is near resistivity over area, and falls with the area', () => {
    // 17.241 and 28.264 Ω·mm²/km at 20 °C: IEC 60287-1-1, table 1.
    for (const [index, row] of conductors.rows.entries()) {
      expectNear(row.copper, 17.241 / row.crossSection, { relative: 0.14 })
      if ('aluminium' in row) expectNear(row.aluminium, 28.264 / row.crossSection, { relative: 0.14 })
      if (index > 0) expect(row.copper).toBeLessThan(conductors.rows[index - 1]!.copper)
    }
  })
})

describe('roughness', () => {
  const of = (wall: string, state = 'new') =>
    roughness.rows.find((r) => r.wall === wall && r.state === state)?.roughness
  const binder = 'R. C. Binder, Fluid Mechanics (1973), as tabulated at efunda.com'
  for (const [wall, value] of [
    ['drawn tube: brass, copper, glass', 1.5e-6],
    ['commercial steel or wrought iron', 4.5e-5],
    ['asphalted cast iron', 1.2e-4],
    ['galvanised iron', 1.5e-4],
    ['cast iron', 2.6e-4],
    ['wood stave', [2e-4, 9e-4]],
    ['concrete', [3e-4, 3e-3]],
  ] as const)
    outside('published', binder, wall, () => expect(of(wall)).toEqual(value))
  outside('published', 'documentation of Modelica.Fluid.Types.Roughness, after Miller (1990)', 'heavy rust, 1 mm', () =>
    expect(of('steel, heavy rust', 'in service')).toBe(1e-3),
  )
  const idelchik = 'I. E. Idelchik, Handbook of Hydraulic Resistance (2007), as tabulated in fluids 1.3.1 for Python'
  outside('published', idelchik, 'steel penstock', () =>
    expect(of('steel penstock, seamless, well fitted')).toEqual([1.5e-5, 4e-5]),
  )
  outside('published', idelchik, 'welded steel in good condition', () =>
    expect(of('welded steel, in good condition', 'in service')).toEqual([4e-5, 1e-4]),
  )
  outside('published', idelchik, 'cast iron water pipe, used', () =>
    expect(of('cast iron water pipe', 'in service')).toBe(1.4e-3),
  )
})

describe('channels and pipes', () => {
  const chow = 'V. T. Chow, Open-Channel Hydraulics (1959), table 5-6, as tabulated in fluids 1.3.1 for Python'
  for (const [channel, n] of [
    ['concrete, trowel finish', [0.011, 0.013, 0.015]],
    ['earth, straight, clean, after weathering', [0.018, 0.022, 0.025]],
    ['mountain: cobbles and large boulders', [0.04, 0.05, 0.07]],
  ] as const)
    outside('published', chow, channel, () => expect(manning.rows.find((row) => row.channel === channel)?.n).toEqual(n))
  outside('memory', 'US EPA EPA/600/R-00/057 (2000), table 3.2', 'C of new steel is 140 to 150', () =>
    expect(hazenWilliams.rows.find((row) => row.wall === 'steel, unlined')?.c).toEqual([140, 150]),
  )
})

describe('coefficients of fittings', () => {
  const k = (fitting: string, shape = '') => fittings.rows.find((r) => r.fitting === fitting && r.shape === shape)?.k
  const copied = 'tables of Munson, Young & Okiishi and others, as copied in lecture notes'
  outside('published', copied, 'threaded 90° elbow 1.5', () => expect(k('90° elbow', 'threaded')).toBe(1.5))
  outside('published', copied, 'globe valve 10', () => expect(k('globe valve, open')).toBe(10))
  outside('published', 'books give 1.1 to 1.3', 'mitre of 90°, within 30 %', () =>
    expectNear(k('mitre bend', '90°, one joint'), 1.2, { relative: 0.3 }),
  )
  outside('published', 'Borda and Carnot', 'step from half the bore 0.5625', () =>
    expectNear(k('step to a larger bore', 'bores 0.5 to 1'), 0.5625, { relative: 1e-12 }),
  )
})

describe('gauges', () => {
  outside('published', 'EN 837-1:1996, table 11, as copied at dybbs8.com', 'classes', () =>
    expect(accuracyClasses).toEqual([0.1, 0.25, 0.6, 1, 1.6, 2.5, 4]),
  )
  outside('memory', 'EN 837-2:1997', '10 bar: 7.5 steady, 6.5 fluctuating, 0.16 by class 1.6', () =>
    expect(gauges.rows.find((row) => row.fullScale === 10e5)).toMatchObject({
      steady: 7.5e5,
      fluctuating: 6.5e5,
      error16: 16_000,
    }),
  )
})

describe('water by temperature', () => {
  const at20 = water.rows.find((row) => row.temperature === 20)
  const iapws = 'iapws for Python'
  outside('library', iapws, '998.207 kg/m³ at 20 °C', () => expectNear(at20?.density, 998.207, { relative: 5e-6 }))
  outside('library', iapws, '1.00157 mPa·s at 20 °C', () =>
    expectNear(at20?.dynamicViscosity, 1.00157e-3, { relative: 5e-5 }),
  )
  outside('library', iapws, '2339.2 Pa at 20 °C', () => expectNear(at20?.vapourPressure, 2339.2, { relative: 1e-4 }))
})

describe('materials', () => {
  const alpha = (material: string) => expansion.rows.find((row) => row.material === material)?.coefficient
  const asme = 'ASME B31.9, table 919.3.1, as copied at paperzz.com'
  const perFahrenheit = 1.8
  for (const [material, each] of [
    ['carbon steel', 6.33e-6],
    ['stainless steel, austenitic', 9.27e-6],
    ['ductile iron', 5.97e-6],
    ['cast iron, grey', 5.76e-6],
    ['copper', 9.5e-6],
  ] as const)
    outside('published', asme, `${material} ${each} for each °F`, () =>
      expectNear(alpha(material) as number, each * perFahrenheit, { relative: 0.005 }),
    )
  outside('published', asme, 'PE 3406 60 × 10⁻⁶ for each °F is the least of polyethylene', () =>
    expect(alpha('polyethylene (PE)')).toMatchObject({ 0: 1.08e-4 }),
  )

  const e = (material: string) => moduli.rows.find((row) => row.material === material)
  const psi = 6894.757
  outside('published', asme, 'copper 17 × 10⁶ psi', () =>
    expectNear(e('copper')?.shortTerm as number, 17e6 * psi, { relative: 0.005 }),
  )
  outside('published', asme, 'austenitic stainless steel 29 × 10⁶ psi', () =>
    expectNear(e('stainless steel, austenitic')?.shortTerm as number, 29e6 * psi, { relative: 0.005 }),
  )
  const ppi = 'PPI Handbook of PE Pipe, ch. 3, table B.1.1'
  outside('published', ppi, 'PE4XXX 29 000 psi after 50 years', () =>
    expectNear((e('PE 100') as { longTerm: number }).longTerm, 29_000 * psi, { relative: 0.005 }),
  )

  it('lets no long-term modulus pass the short-term one', () => {
    for (const row of moduli.rows)
      if ('longTerm' in row) {
        const [least] = row.shortTerm
        const most = typeof row.longTerm === 'number' ? row.longTerm : row.longTerm[1]
        expect(most).toBeLessThan(least)
      }
  })

  const pipa = 'Vinidex, allowable bending radius of PE pipe at 20 °C, after PIPA POP202'
  for (const [sdr, times] of [
    [11, 15],
    [17, 25],
    [26, 45],
  ] as const)
    outside('published', pipa, `SDR ${sdr}: ${times} outside diameters lies in the range`, () => {
      const range = bendRadius.rows.find((row) => row.sdr === sdr)?.radiusOverOutside as readonly [number, number]
      expect(times).toBeGreaterThanOrEqual(range[0])
      expect(times).toBeLessThanOrEqual(range[1])
    })
})
