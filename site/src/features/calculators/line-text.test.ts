import { describe, expect, test } from 'vitest'
import type { Cell } from '#calc/index.ts'
import { changeLineUnit, lineWithUnit, readLine, splitLine, unitOfLine } from './line-text.ts'

const cell: Extract<Cell, { kind: 'scalar' }> = {
  kind: 'scalar',
  label: 'Run',
  quantity: 'length',
  unit: 'm',
  range: [0, 10],
}
const read = (text: string, unit = 'm') => readLine(cell, 'rise', { text, unit })

describe('a run of numbers', () => {
  test.each([
    ['1.42 1.38 0.96', [1.42, 1.38, 0.96]],
    ['1,42  1,38;0,96', [1.42, 1.38, 0.96]],
    ['1.42, 1.38, 0.96', [1.42, 1.38, 0.96]],
    ['1,42, 1,38, ,96', [1.42, 1.38, 0.96]],
    ['142 cm 1.38 m 0.96 m;', [1.42, 1.38, 0.96]],
    ['', []],
  ])('%j', (text, values) => {
    expect(read(text)).toEqual({ values })
  })

  test('the one unit behind it is that of all its numbers', () => {
    expect(read('142 138 96 cm').values).toEqual([1.42, 1.38, 0.96])
    expect(unitOfLine(cell, { text: '142 138 cm', unit: 'm' })).toBe('cm')
    expect(splitLine('142 138 cm', cell)).toEqual({ text: '142  138', unit: 'cm' })
  })

  test('what cannot be read is told with its place', () => {
    expect(read('1.42 1.3.8 0.96').error).toMatch(/^Rise 2: “1\.3\.8” .*write it like/)
    expect(read('1.42 1.38 ± 0.02').error).toMatch(/^Rise 2.*leave the ± out/)
  })

  test('may go down on the way', () => {
    expect(read('1.42 -0.2 −0,1 0.96').values).toEqual([1.42, -0.2, -0.1, 0.96])
  })

  test('goes through an address with its unit', () => {
    const feet = { text: '4.66 4.53', unit: 'ft' }
    expect(splitLine(lineWithUnit(cell, feet), cell)).toEqual({ text: '4.66  4.53', unit: 'ft' })
    expect(lineWithUnit(cell, { text: '142 138 cm', unit: 'm' })).toBe('142 138 cm')
    expect(lineWithUnit(cell, { text: '', unit: 'm' })).toBe('')
  })

  test('in another unit is the same, and back again what was written', () => {
    const centimetres = changeLineUnit(cell, { text: '1.42 1.38', unit: 'm' }, 'cm')
    expect(centimetres).toMatchObject({ text: '142  138', unit: 'cm' })
    expect(changeLineUnit(cell, centimetres, 'm')).toEqual({ text: '1.42 1.38', unit: 'm' })
  })
})
