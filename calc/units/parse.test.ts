import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Quantity } from '../definition.ts'
import { fieldText } from './format.ts'
import { parse } from './parse.ts'
import { quantities } from './quantities.ts'

const everyQuantity = Object.keys(quantities) as Quantity[]

/** What people type for one and the same value, by quantity. */
const spellings: [Quantity, number, string, string[]][] = [
  [
    'flow',
    0.0095,
    'L/s',
    [
      '9.5 L/s',
      '9,5 l/s',
      '9.5l/s',
      '9.5 l / s',
      '9.5 lps',
      '9.5 LPS',
      '9.5 litres/s',
      '9.5 liters/s',
      '9.5 litres per second',
      '9.5 l/sec',
      '9.5 ℓ/s',
      '9.5 L s-1',
      '9.5 L·s⁻¹',
      '9.5 dm3/s',
      '9.50 L/s',
    ],
  ],
  [
    'flow',
    0.0095,
    'm³/s',
    [
      '0.0095 m3/s',
      '0.0095 m³/s',
      '0,0095 m^3/s',
      '9.5e-3 m3/s',
      '9.5E-3 m3/s',
      '9.5×10^-3 m³/s',
      '9.5 x 10-3 m3/s',
      '9.5 × 10⁻³ m³/s',
      '9.5·10⁻³ m³/s',
      '0.0095 cumecs',
      '0.0095 cubic metres per second',
    ],
  ],
  ['flow', 0.0095, 'L/min', ['570 L/min', '570 l/min', '570 lpm', '570 litres per minute', '570 L/mins']],
  ['flow', 0.0095, 'm³/h', ['34.2 m³/h', '34.2 m3/h', '34.2 m3/hr', '34.2 m³/hour']],
  [
    'head',
    34,
    'm',
    [
      '34 m',
      '34m',
      '34 M',
      '34.0 m',
      '34 metres',
      '34 meters',
      '34 mtrs',
      '+34 m',
      '= 34 m',
      '~34 m',
      '34 m.',
      '34. m',
      ' 34  m ',
      '34\u00a0m',
    ],
  ],
  ['head', 30.48, 'ft', ['100 ft', '100 feet', "100'", '100′', '100FT']],
  ['length', 0.11, 'mm', ['110 mm', '110mm', '110 MM', '110 mm.', '110 millimetres', '1.1e2 mm']],
  ['length', 0.1016, 'in', ['4 in', '4"', '4″', '4 inches', '4 inch', '4,0 in']],
  [
    'rotation',
    1450,
    'rev/min',
    [
      '1450 rev/min',
      '1 450 rpm',
      '1\u202f450 rpm',
      "1'450 rpm",
      '1450 RPM',
      '1450 r/min',
      '1450 revs/min',
      '1450 revs per minute',
      '1450 1/min',
      '1450 min-1',
      '1450 min⁻¹',
      '1,450.0 rpm',
      '1.450,0 rpm',
    ],
  ],
  ['rotation', 1500, 'rev/s', ['25 rev/s', '25 Hz', '25 revs per second', '25 1/s', '25 s-1']],
  [
    'pressure',
    330_000,
    'bar',
    ['3.3 bar', '3,3 bar', '3.3 Bar', '3.3BAR', '3.3 bars', '3.3 barg', '3.3 bar(g)', '3.3 bar g'],
  ],
  ['pressure', 330_000, 'kPa', ['330 kPa', '330 kpa', '330 KPA', '330 kilopascals']],
  ['pressure', 330_000, 'MPa', ['0.33 MPa', '.33 MPa', ',33 MPa', '0.33 mpa']],
  ['power', 1800, 'kW', ['1.8 kW', '1,8 kw', '1.8KW', '1.8 kilowatts']],
  ['power', 1800, 'W', ['1800 W', '1800w', '1 800 W', '1800 watts', '1800 J/s']],
  ['energy', 43_200_000, 'kWh', ['12 kWh', '12 kwh', '12 kW h', '12 kW·h', '12 kWhr']],
  ['temperature', 10, '°C', ['10 °C', '10°C', '10 C', '10 ºC', '10 deg C', '10 celsius']],
  ['temperature', -3, '°C', ['-3 °C', '−3 °C', '- 3 C']],
  ['angle', 45, '°', ['45°', '45 °', '45 deg', '45 degrees', '45º']],
  ['area', 0.4, 'm²', ['0.4 m²', '0.4 m2', '0,4 m^2', '0.4 sq m', '0.4 square metres']],
  ['fraction', 0.55, '%', ['55 %', '55%', '55 percent', '55 per cent', '55 pct']],
  ['fraction', 0.55, '', ['0.55', '.55', '0,55']],
  ['ratio', 0.97, '', ['0.97', '0,97']],
  ['count', 2, '', ['2', '2.0']],
  ['gradient', 0.016, 'm per 100 m', ['1.6 m per 100 m', '1.6 m/100m', '1.6 m / 100 m']],
  ['gradient', 0.016, '%', ['1.6 %']],
  [
    'velocity',
    26,
    'm/s',
    ['26 m/s', '26m/s', '26 M/S', '26 m/sec', '26 metres per second', '26 mps', '26 m s-1', '26 m·s⁻¹'],
  ],
  ['velocity', 25, 'km/h', ['90 km/h', '90 kph', '90 kmh', '90 kilometres per hour']],
  ['time', 12.4, 's', ['12.4 s', '12,4 sec', '12.4 secs', '12.4 seconds']],
  ['time', 120, 'min', ['2 min', '2 mins', '2 minutes']],
  ['volume', 0.08, 'L', ['80 L', '80 l', '80 litres', '80 ltr', '80 dm³']],
  ['density', 1000, 'kg/m³', ['1000 kg/m³', '1000 kg/m3', '1 000 kg/m^3']],
  ['dynamicViscosity', 0.0013, 'mPa·s', ['1.3 mPa·s', '1.3 mPa s', '1.3 mPas', '1.3 cP']],
  ['kinematicViscosity', 1.3e-6, 'mm²/s', ['1.3 mm²/s', '1.3 mm2/s', '1.3 cSt']],
  ['flow', 0.00630901964, 'US gal/min', ['100 US gal/min', '100 US gpm', '100 usgpm']],
  ['volume', 0.003785411784, 'US gal', ['1 US gal', '1 us gal']],
  ['area', 0.00064516, 'in²', ['1 in²', '1 sq in']],
  ['mass', 2.5, 'kg', ['2.5 kg', '2,5 kilograms', '2.5 kilos']],
  ['mass', 0.3, 'g', ['300 g', '300 grams']],
  ['force', 3100, 'kN', ['3.1 kN', '3.1 kilonewtons']],
  ['temperatureDifference', 15, 'K', ['15 K', '15 kelvin']],
  ['thermalExpansion', 1.2e-5, 'mm/(m·K)', ['0.012 mm/(m·K)', '0.012 mm/m/K', '0.012 mm/mK']],
  ['thermalExpansion', 1.2e-5, '1/K', ['1.2e-5 1/K']],
  ['voltage', 48, 'V', ['48 V', '48 v', '48 volts']],
  ['current', 16, 'A', ['16 A', '16 amps', '16 ampere']],
  ['resistance', 0.4, 'Ω', ['0.4 Ω', '0.4 ohm', '0.4 ohms']],
  ['resistance', 0.002, 'mΩ', ['2 mΩ', '2 milliohm']],
  ['resistancePerMetre', 0.00115, 'Ω/km', ['1.15 Ω/km', '1.15 ohm/km', '1.15 ohms per km']],
  ['resistancePerKm', 1.15, 'Ω/km', ['1.15 Ω/km', '1.15 ohm per kilometre']],
  ['conductorArea', 16, 'mm²', ['16 mm²', '16 mm2', '16 sq mm']],
  ['frequency', 50, 'Hz', ['50 Hz', '50 hz', '50 hertz']],
  ['voltsPerThousandRpm', 38, 'V per 1000 rev/min', ['38 V per 1000 rev/min', '38 V/1000 rpm', '38 V per 1000 rpm']],
  ['conductivity', 120, 'µS/cm', ['120 µS/cm', '120 μS/cm', '120 uS/cm']],
  ['conductivity', 1200, 'mS/cm', ['1.2 mS/cm']],
  ['saltCalibration', 0.5, 'mg/L per µS/cm', ['0.5 mg/L per µS/cm', '0.5 mg/L per uS/cm']],
  ['weirCoefficient', 1.7, 'm^½/s', ['1.7 m^½/s']],
  ['years', 20, 'years', ['20 years', '20 year', '20 yr']],
  ['hours', 4, 'h', ['4 h', '4 hours']],
  ['money', 2400, '', ['2400', '2 400']],
  ['pricePerKwh', 0.24, 'per kWh', ['0.24 per kWh', '0.24 /kWh']],
  ['pricePerMetre', 18, 'per m', ['18 per m', '18 /m', '18 per metre']],
]

describe('what people type', () => {
  test.each(
    spellings.flatMap(([quantity, value, unit, texts]) => texts.map((text) => [text, quantity, value, unit] as const)),
  )('%s as %s is %d, in %s', (text, quantity, value, unit) => {
    const reading = parse(text, quantity)
    expect(reading).toMatchObject({ ok: true, unit })
    expect(reading.ok && reading.value).toBeCloseTo(value, 12)
  })

  test('there is a spelling for every quantity', () => {
    expect([...new Set(spellings.map(([quantity]) => quantity))].sort()).toEqual([...everyQuantity].sort())
  })

  test('a unit that is not offered is read all the same', () => {
    expect(parse('3 yd', 'length')).toMatchObject({ ok: true, unit: 'yd' })
    expect(parse('283.15 K', 'temperature')).toMatchObject({ ok: true, value: 10 })
    expect(parse('2600 cm/s', 'velocity')).toMatchObject({ ok: true, value: 26 })
  })

  test('capitals tell milli from mega where the writer knows them', () => {
    expect(parse('5 mW', 'power')).toMatchObject({ value: 0.005 })
    expect(parse('5 MW', 'power')).toMatchObject({ value: 5e6 })
  })

  test('a bare number takes the unit that goes with its field; one written goes before it', () => {
    expect(parse('9.5', 'flow', 'L/s')).toMatchObject({ ok: true, value: 0.0095, unit: 'L/s' })
    expect(parse('0.0095 m3/s', 'flow', 'L/s')).toMatchObject({ ok: true, value: 0.0095, unit: 'm³/s' })
  })
})

describe('figures', () => {
  test.each([
    ['9.5 L/s', 2],
    ['9.50 L/s', 3],
    ['0.0095 L/s', 2],
    ['0.00950 L/s', 3],
    ['1450 L/s', 4],
    ['1 450 L/s', 4],
    ['9.5e-3 L/s', 2],
    ['0 L/s', 1],
    ['-12,30 L/s', 4],
  ])('%s has %d', (text, figures) => {
    expect(parse(text, 'flow')).toMatchObject({ ok: true, figures })
  })
})

describe('a number that is not quite known', () => {
  test.each<[string, Quantity, string | undefined, number, number]>([
    ['31.4 ± 0.2 m', 'head', undefined, 31.4, 0.2],
    ['31.4 m ± 0.2 m', 'head', undefined, 31.4, 0.2],
    ['31.4 m ± 0.2', 'head', undefined, 31.4, 0.2],
    ['31.4 ± 0.2', 'head', 'm', 31.4, 0.2],
    ['31.4+/-0.2', 'head', 'm', 31.4, 0.2],
    ['31,4 +- 0,2 m', 'head', undefined, 31.4, 0.2],
    ['50 m ± 2 %', 'head', undefined, 50, 1],
    ['50 ± 2 per cent', 'head', 'm', 50, 1],
    ['1.2 m ± 5 mm', 'length', undefined, 1.2, 0.005],
    ['-0.4 ± 10 % m', 'head', undefined, -0.4, 0.04],
    ['10 ± 0.5 °C', 'temperature', undefined, 10, 0.5],
    ['50 °F ± 0.9 °F', 'temperature', undefined, 10, 0.5],
    ['55 % ± 2 %', 'fraction', undefined, 0.55, 0.02],
    ['0.97 ± 0.01', 'ratio', undefined, 0.97, 0.01],
    ['9.5 L/s ± 0', 'flow', undefined, 0.0095, 0],
  ])('%s', (text, quantity, unit, value, uncertainty) => {
    const reading = parse(text, quantity, unit)
    expect(reading.ok && reading.value).toBeCloseTo(value, 12)
    expect(reading.ok && reading.uncertainty).toBeCloseTo(uncertainty, 12)
  })

  test.each([
    ['31.4 ± m', /After ±/],
    ['31.4 ± ', /After ±/],
    ['31.4 m ± 0.2 ± 0.1', /After ±/],
    ['31.4 m ± -0.2', /never below zero/],
    ['31.4 m ± 0.2 bar', /measures pressure/],
    ['± 0.2 m', /Write a head/],
  ])('%s is refused', (text, message) => {
    const reading = parse(text, 'head')
    expect(!reading.ok && reading.message).toMatch(message)
  })

  test('without one nothing is said of it', () => {
    expect(parse('31.4 m', 'head')).not.toHaveProperty('uncertainty')
  })
})

describe('what is refused, with what to write instead', () => {
  test.each<[string, Quantity, string, RegExp]>([
    ['', 'flow', 'empty', /^Write a flow, for example 9\.5 L\/s\.$/],
    ['  \n', 'head', 'empty', /^Write a head, for example 34 m\.$/],
    ['fast', 'velocity', 'no-number', /^Start with a number, for example 26 m\/s\.$/],
    ['about 34 m', 'head', 'no-number', /Start with a number/],
    ['-', 'head', 'no-number', /Start with a number/],
    ['.', 'head', 'no-number', /Start with a number/],
    ['1,450 rpm', 'rotation', 'two-ways', /^“1,450” can be read as 1\.450 or as 1450: write it without the comma\.$/],
    ['12,500 m', 'head', 'two-ways', /as 12\.500 or as 12500/],
    ['1.2.3 m', 'head', 'no-number', /is not one number: write it like 34 m/],
    ['1,2,3 m', 'head', 'no-number', /is not one number/],
    ['1,45,000 m', 'head', 'no-number', /is not one number/],
    ['3 1/2 in', 'length', 'no-number', /“3 1\/2 in” is not one number: write it like 110 mm/],
    ['1/2', 'fraction', 'no-number', /is not one number/],
    ['1:60', 'gradient', 'no-number', /is not one number/],
    ['2:30 min', 'time', 'no-number', /is not one number/],
    ['5x100 mm', 'length', 'no-number', /is not one number/],
    ['9 5 m', 'head', 'no-number', /is not one number/],
    ['1 45 m', 'head', 'no-number', /is not one number/],
    [`111'6"`, 'head', 'no-number', /is not one number/],
    ['1e999 m', 'head', 'no-number', /too large to work with/],
    ['9.5', 'flow', 'no-unit', /^Say the unit too, for example 9\.5 L\/s\.$/],
    ['45', 'angle', 'no-unit', /for example 45°/],
    ['9.5 buckets', 'flow', 'unknown-unit', /^The unit “buckets” is not known here; write a flow like 9\.5 L\/s\.$/],
    ['111 ft 6 in', 'head', 'unknown-unit', /write a head like 34 m/],
    ['10°', 'temperature', 'unknown-unit', /write a temperature like 10 °C/],
    ['1.3 bar', 'head', 'wrong-quantity', /^“bar” measures pressure; a head is wanted, for example 34 m\.$/],
    ['34 m', 'pressure', 'wrong-quantity', /^“m” measures length; a pressure is wanted, for example 3\.3 bar\.$/],
    ['9.5 l', 'flow', 'wrong-quantity', /“l” measures volume; a flow is wanted/],
    ['1.8 kWh', 'power', 'wrong-quantity', /measures energy; a power is wanted, for example 1\.8 kW/],
    ['1.8 kW', 'energy', 'wrong-quantity', /measures power; an energy is wanted/],
    ['9.5 kg', 'flow', 'wrong-quantity', /“kg” measures mass; a flow is wanted/],
    ['9.5 cd', 'flow', 'wrong-quantity', /“cd” does not measure this; a flow is wanted/],
    ['5 m', 'count', 'wrong-quantity', /a number is wanted, for example 2/],
    ['0.5 m', 'fraction', 'wrong-quantity', /a share is wanted, for example 55 %/],
  ])('%s as %s: %s', (text, quantity, code, message) => {
    const reading = parse(text, quantity)
    expect(reading).toMatchObject({ ok: false, code })
    expect(!reading.ok && reading.message).toMatch(message)
  })

  test.each(['150 gpm', '150 gal/min', '150 gallons per minute', '5 GAL'])(
    '%s: gallons differ from country to country',
    (text) => {
      const reading = parse(text, text.endsWith('GAL') ? 'volume' : 'flow')
      expect(reading).toMatchObject({ ok: false, code: 'unknown-unit' })
      expect(!reading.ok && reading.message).toContain('A gallon is 3.785 L in one country and 4.546 L in another')
    },
  )

  test('a thousand with an unmistakable comma is read', () => {
    expect(parse('1,450,000 Pa', 'pressure')).toMatchObject({ value: 1_450_000 })
    expect(parse('0,450 m', 'head')).toMatchObject({ value: 0.45 })
    expect(parse('1234,567 m', 'head')).toMatchObject({ value: 1234.567 })
  })
})

describe('for any text', () => {
  const runs = { numRuns: process.env.DEEP ? 20_000 : 1000 }

  test('it never throws, and what it reads is a finite number', () => {
    const numberish = fc
      .array(fc.constantFrom(..."0123456789.,- eExX×10^⁻³'/:%°"), { maxLength: 12 })
      .map((c) => c.join(''))
    const unitish = fc.constantFrom(
      'm',
      ' m/s',
      'm^1e9',
      '(m',
      'm)',
      'm m',
      ' __proto__',
      'constructor',
      '/',
      '^',
      '*',
      ' per ',
      'e',
      '\u0000',
    )
    const text = fc.oneof(
      fc.string(),
      fc.string({ unit: 'binary' }),
      fc.tuple(numberish, unitish).map((both) => both.join('')),
    )
    fc.assert(
      fc.property(text, fc.constantFrom(...everyQuantity), (text, quantity) => {
        const reading = parse(text, quantity)
        if (reading.ok) expect(Number.isFinite(reading.value)).toBe(true)
        else expect(reading.message.length).toBeGreaterThan(10)
      }),
      runs,
    )
  })

  test('what a field shows in any offered unit is read back as the same value', () => {
    const cases = fc.constantFrom(...everyQuantity).chain((quantity) =>
      fc.record({
        quantity: fc.constant(quantity),
        unit: fc.constantFrom(...quantities[quantity].units.map(({ name }) => name)),
        value: fc.double({ min: 1e-3, max: 1e5, noNaN: true }),
      }),
    )
    fc.assert(
      fc.property(cases, ({ quantity, unit, value }) => {
        const reading = parse(`${fieldText(value, quantity, unit)} ${unit}`, quantity)
        expect(reading).toMatchObject({ ok: true, unit })
        expect(reading.ok && Math.abs(reading.value - value)).toBeLessThanOrEqual(1e-9 * Math.max(1, value))
      }),
      runs,
    )
  })

  test('the example of every quantity, and its units, can be read', () => {
    for (const quantity of everyQuantity) {
      const { example, units, si } = quantities[quantity]
      expect(parse(example, quantity)).toMatchObject({ ok: true })
      for (const { name } of [...units, si])
        expect(parse(`1 ${name}`, quantity)).toMatchObject({ ok: true, unit: name })
    }
  })
})
