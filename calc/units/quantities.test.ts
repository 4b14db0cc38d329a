import { describe, expect, test } from 'vitest'
import type { Quantity } from '../definition.ts'
import { conversion, isUnit, quantities, quantityOf } from './quantities.ts'

const toSi = (quantity: Quantity, unit: string): number => {
  const { units, si } = quantities[quantity]
  return conversion(
    quantity,
    [...units, si].find(({ name }) => name === unit)!,
  )!.toSi(1)
}

describe('published factors', () => {
  // NIST Special Publication 811 (2008), appendix B.8; psi and ft³/s as reprinted there and read, the others from memory.
  test.each<[Quantity, string, number, number]>([
    ['pressure', 'psi', 6.894757e3, 7],
    ['flow', 'ft³/s', 2.831685e-2, 7],
    ['power', 'hp', 7.456999e2, 7],
    ['velocity', 'km/h', 2.777778e-1, 7],
    ['volume', 'ft³', 2.831685e-2, 7],
    ['angle', 'rad', 57.29578, 7],
  ])('%s: 1 %s', (quantity, unit, factor, figures) => {
    expect(Number(toSi(quantity, unit).toPrecision(figures))).toBe(factor)
  })

  // Exact by definition: the international yard and pound agreement (1959) for foot and inch; the SI Brochure, 9th edition (2019),
  // table 8 for litre, minute and hour; ISO 80000-4 for the bar; from memory.
  test.each<[Quantity, string, number]>([
    ['length', 'ft', 0.3048],
    ['length', 'in', 0.0254],
    ['head', 'ft', 0.3048],
    ['velocity', 'ft/s', 0.3048],
    ['volume', 'L', 1e-3],
    ['flow', 'L/s', 1e-3],
    ['flow', 'L/min', 1e-3 / 60],
    ['flow', 'm³/h', 1 / 3600],
    ['time', 'min', 60],
    ['time', 'h', 3600],
    ['pressure', 'bar', 1e5],
    ['pressure', 'mbar', 100],
    ['pressure', 'MPa', 1e6],
    ['energy', 'kWh', 3.6e6],
    ['energy', 'MJ', 1e6],
    ['power', 'kW', 1000],
    ['area', 'mm²', 1e-6],
    ['dynamicViscosity', 'mPa·s', 1e-3],
    ['kinematicViscosity', 'mm²/s', 1e-6],
    ['rotation', 'rev/s', 60],
    ['fraction', '%', 0.01],
    ['gradient', 'm per 100 m', 0.01],
  ])('%s: 1 %s, exactly', (quantity, unit, factor) => {
    expect(toSi(quantity, unit)).toBeCloseTo(factor, 14)
  })

  // °F = 1.8 · °C + 32: freezing, boiling, and where both scales show the same.
  test.each([
    [32, 0],
    [212, 100],
    [-40, -40],
    [50, 10],
  ])('%d °F is %d °C', (fahrenheit, celsius) => {
    const scale = conversion('temperature', { name: '°F', mathjs: 'degF' })!
    expect(scale.toSi(fahrenheit)).toBeCloseTo(celsius, 9)
    expect(scale.fromSi(celsius)).toBeCloseTo(fahrenheit, 9)
  })
})

describe('conversions', () => {
  test('there and back is the same, in every unit', () => {
    for (const [quantity, { units, si }] of Object.entries(quantities))
      for (const unit of [...units, si]) {
        const { toSi, fromSi } = {
          toSi: (value: number) => conversion(quantity as Quantity, unit)!.toSi(value),
          fromSi: (value: number) => conversion(quantity as Quantity, unit)!.fromSi(value),
        }
        for (const value of [0.37, 1, 12.5, 1450]) expect(fromSi(toSi(value))).toBeCloseTo(value, 9)
      }
  })

  test('the SI unit of a quantity is one to one', () => {
    for (const [quantity, { si }] of Object.entries(quantities))
      expect(conversion(quantity as Quantity, si)!.toSi(7)).toBe(7)
  })

  test('no noise in the last places', () => {
    const litres = conversion('flow', { name: 'L/min', mathjs: 'L/minute' })!
    expect(litres.toSi(600)).toBe(0.01)
    expect(conversion('temperature', { name: 'K', mathjs: 'K' })!.toSi(283)).toBe(9.85)
  })

  test('another dimension has no conversion', () => {
    expect(conversion('flow', { name: 'm', mathjs: 'm' })).toBeUndefined()
    expect(conversion('fraction', { name: 'm', mathjs: 'm' })).toBeUndefined()
    expect(conversion('gradient', { name: 'm', mathjs: 'm' })).toBeUndefined()
  })

  test('a unit tells what it measures', () => {
    expect(quantityOf('bar')).toBe('pressure')
    expect(quantityOf('m^3/s')).toBe('flow')
    expect(quantityOf('cd')).toBeUndefined()
    expect(isUnit('L/s')).toBe(true)
    expect(isUnit('buckets')).toBe(false)
    expect(isUnit('__proto__')).toBe(false)
  })

  test('the names of a quantity’s units differ, and each reads best from one size on', () => {
    for (const { units } of Object.values(quantities)) {
      expect(new Set(units.map(({ name }) => name)).size).toBe(units.length)
      const from = units.flatMap(({ from }) => from ?? [])
      expect(from).toEqual([...from].sort((a, b) => a - b))
    }
  })
})
