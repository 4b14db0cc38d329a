import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Quantity } from '../definition.ts'
import { fieldText, format, formatNumber, join, say, unitFor } from './format.ts'
import { parse } from './parse.ts'
import { quantities } from './quantities.ts'

const space = '\u00a0'

describe('a number to so many digits', () => {
  test.each([
    [3.8412, 3, '3.84'],
    [3.8, 3, '3.80'],
    [0.0095, 3, '0.00950'],
    [999.6, 3, '1000'],
    [1450, 3, '1450'],
    [1456, 3, '1460'],
    [9999, 2, `10${space}000`],
    [95_700, 3, `95${space}700`],
    [1_234_567, 3, `1${space}230${space}000`],
    [-12.34, 3, '−12.3'],
    [0, 3, '0'],
    [0.00123, 2, '0.0012'],
    [1.5e-6, 2, '1.5 × 10⁻⁶'],
    [2.5e9, 2, '2.5 × 10⁹'],
    [-3e12, 2, '−3.0 × 10¹²'],
    [0.000_099_99, 2, '0.00010'],
  ])('%d to %d digits is %s', (value, digits, text) => {
    expect(formatNumber(value, digits)).toBe(text)
  })

  test('it never writes more than it rounds: the text is within half a unit of its last digit', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e7, noNaN: true }), fc.integer({ min: 2, max: 6 }), (value, digits) => {
        const read = Number(formatNumber(value, digits).replaceAll(space, ''))
        expect(Math.abs(read - value) / value).toBeLessThanOrEqual(0.5 * 10 ** (1 - digits) * (1 + 1e-9))
      }),
    )
  })
})

describe('the unit in which a value reads best', () => {
  test.each<[Quantity, number, string]>([
    ['length', 0.11, 'mm'],
    ['length', 120, 'm'],
    ['length', 12_000, 'km'],
    ['flow', 0.0095, 'L/s'],
    ['flow', 1.4, 'm³/s'],
    ['power', 640, 'W'],
    ['power', 1800, 'kW'],
    ['power', 2.4e6, 'MW'],
    ['pressure', 330_000, 'bar'],
    ['energy', 4.32e7, 'kWh'],
    ['area', 0.0074, 'mm²'],
    ['area', 0.4, 'm²'],
    ['power', -1800, 'kW'],
  ])('%s %d in %s', (quantity, value, unit) => {
    expect(unitFor(quantity, value).name).toBe(unit)
  })

  test('the one that is asked for goes first; one that there is not is an error', () => {
    expect(unitFor('power', 640, 'kW').name).toBe('kW')
    expect(() => unitFor('power', 640, 'bar')).toThrow(RangeError)
  })
})

describe('as it is shown', () => {
  test.each<[Quantity, number, Parameters<typeof format>[2], string]>([
    ['flow', 0.0095, {}, `9.50${space}L/s`],
    ['flow', 0.0095, { digits: 2, unit: 'm³/s' }, `0.0095${space}m³/s`],
    ['rotation', 1456, { digits: 4 }, `1456${space}rev/min`],
    ['angle', 45, { digits: 2 }, '45°'],
    ['fraction', 0.5512, {}, `55.1${space}%`],
    ['ratio', 0.97, {}, '0.970'],
    ['count', 12, {}, '12'],
    ['count', 18_000, {}, `18${space}000`],
    ['temperature', 10, { digits: 2, unit: '°F' }, `50${space}°F`],
  ])('%s %d', (quantity, value, how, text) => {
    expect(join(format(value, quantity, how))).toBe(text)
  })
})

describe('as it is said, with every digit that it has and no more', () => {
  test.each<[Quantity, number, string | undefined, string]>([
    ['head', 12, undefined, `12${space}m`],
    ['length', 5e-5, undefined, `0.05${space}mm`],
    ['flow', 0.1 + 0.2, undefined, `300${space}L/s`],
    ['length', 1.1, 'mm', `1100${space}mm`],
    ['angle', 22.5, undefined, '22.5°'],
    ['ratio', 0.97, undefined, '0.97'],
    ['head', 0, undefined, `0${space}m`],
  ])('%s %d', (quantity, value, unit, text) => {
    expect(say(value, quantity, unit)).toBe(text)
  })

  test('very small and very large numbers are written with a power, which can be read again', () => {
    expect(fieldText(1.5e-9, 'head', 'm')).toBe('1.5e-9')
    expect(parse('1.5e-9 m', 'head')).toMatchObject({ value: 1.5e-9 })
  })

  test('what is said can be read again', () => {
    const everyQuantity = Object.keys(quantities) as Quantity[]
    fc.assert(
      fc.property(
        fc.constantFrom(...everyQuantity),
        fc.double({ min: 1e-4, max: 1e6, noNaN: true }),
        (quantity, value) => {
          const reading = parse(say(value, quantity), quantity)
          expect(reading.ok && Math.abs(reading.value - value)).toBeLessThanOrEqual(1e-9 * Math.max(1, value))
        },
      ),
    )
  })
})
