import { afterEach, expect, test } from 'vitest'
import { fieldText, format, join, say } from './format.ts'
import { showUnitsOf } from './system.ts'

afterEach(() => showUnitsOf('metric'))

test('results, ranges and cautions are said in the units of the system that is shown', () => {
  expect(say(30.48, 'head')).toBe('30.48\u00a0m')
  showUnitsOf('imperial')
  expect(say(30.48, 'head')).toBe('100\u00a0ft')
  expect(say(0.0254, 'length')).toBe('1\u00a0in')
  expect(say(30.48, 'length', 'm')).toBe('100\u00a0ft')
  expect(join(format(0.0063090196, 'flow'))).toBe('100\u00a0US gal/min')
  expect(join(format(10, 'temperature'))).toBe('50.0\u00a0°F')
})

test('what has no unit of the other system keeps its own', () => {
  showUnitsOf('imperial')
  expect(say(48, 'voltage')).toBe('48\u00a0V')
  expect(say(2000, 'power')).toBe('2\u00a0kW')
  expect(say(16, 'conductorArea')).toBe('16\u00a0mm²')
})

test('a field is written in the unit that it has', () => {
  showUnitsOf('imperial')
  expect(fieldText(0.0968, 'length', 'mm')).toBe('96.8')
})
