import { describe, expect, onTestFinished, test } from 'vitest'
import { tables } from '#calc/tables/tables.ts'
import { showUnitsOf } from '#calc/units/system.ts'
import { asCells, cellWords, columnWords, showTable, type ShownTable } from './trade-tables.ts'

const found = (find: string) =>
  Object.values(tables)
    .map((table) => showTable(table, find))
    .filter(({ rows }) => rows.length > 0)
const firstCells = ({ rows }: ShownTable) => rows.map(({ cells }) => cellWords(cells[0]!))

describe('looking for rows', () => {
  test('nothing looked for is every row', () => {
    for (const table of Object.values(tables)) expect(showTable(table).rows).toHaveLength(table.rows.length)
  })

  test('a number is found whole, a word by its beginning, and a table by its name', () => {
    const pipe = showTable(tables['pe-pipe'], 'pe 110')
    expect(new Set(firstCells(pipe))).toEqual(new Set(['110']))
    expect(pipe.rows).toHaveLength(6)
    expect(showTable(tables['pe-pipe'], 'SDR11 dn63').rows).toHaveLength(1)
    expect(found('manning').map(({ table }) => table.id)).toEqual(['manning'])
    expect(found('galvan').map(({ table }) => table.id)).toEqual(['manning', 'roughness', 'hazen-williams'])
  })

  test('every word must be there; a comma is a point; capitals and ends of words do not matter', () => {
    expect(found('corroded welded STEEL').flatMap(firstCells)).toEqual(['welded steel, corroded all over'])
    expect(firstCells(showTable(tables.conductors, '1,15'))).toEqual(['16'])
    expect(found('copper unicorn')).toEqual([])
  })
})

describe('figures', () => {
  const row = (id: keyof typeof tables, find: string) => {
    const { columns, rows } = showTable(tables[id], find)
    return rows.map(({ cells }) => cells.map((cell, i) => `${columnWords(columns[i]!)}: ${cellWords(cell)}`))[0]
  }

  test('are shown as they were printed, in the unit of the column', () => {
    expect(row('pe-pipe', '110 13.6')).toEqual([
      'Nominal size dn: 110',
      'SDR: 13.6',
      'Outside diameter, mm: 110',
      'Least wall, mm: 8.1',
      'Inside diameter, mm: 93.8',
    ])
    expect(row('roughness', 'crust of lime')).toContain('Roughness, mm: 0.3')
    expect(row('conductors', '1.5')).toContain('Aluminium, Ω/km: –')
    expect(row('expansion', 'carbon')).toContain('Coefficient α, mm/(m·K): 0.0114')
  })

  test('three are three columns, two are from and to', () => {
    expect(row('manning', 'cobbles and large boulders')).toEqual([
      'Kind: stream',
      'Channel: mountain: cobbles and large boulders',
      'n, least: 0.04',
      'n, usual: 0.05',
      'n, most: 0.07',
    ])
    expect(row('moduli', 'PE 100')).toContain('Short term, GPa: 0.75 to 1.25')
  })

  test('turn into feet, inches, psi and °F where there are such', () => {
    showUnitsOf('imperial')
    onTestFinished(() => showUnitsOf('metric'))
    // 110 mm / 25.4 = 4.3307 in; 10 bar = 145.04 psi; 20 °C = 68 °F.
    expect(showTable(tables['pe-pipe'], '4.331').rows).toHaveLength(6)
    expect(row('gauges', '145')?.[0]).toBe('Full scale, psi: 145')
    expect(row('temperature-factor', '68')?.[0]).toBe('Pipe wall, °F: 68')
    expect(row('conductors', '1.15')).toContain('Copper, plain, Ω/km: 1.15')
  })
})

describe('as a spreadsheet', () => {
  test('from and to have columns of their own, and every row its source', () => {
    const [heads, first] = asCells(showTable(tables.roughness, 'PE film'))
    expect(heads).toEqual(['Wall', 'State', 'Roughness, mm, from', 'Roughness, mm, to', 'Source'])
    expect(first).toEqual([
      'polyethylene (PE), with joints and film',
      'in service',
      '0.01',
      '0.1',
      'common practice, no source',
    ])
  })

  test('what is not known is left empty, and one figure is from and to', () => {
    const cells = asCells(showTable(tables.moduli, 'steel'))
    expect(cells.map((row) => row.slice(0, -1))).toEqual([
      ['Material', 'Short term, GPa, from', 'Short term, GPa, to', 'Long term, GPa'],
      ['steel', '200', '214', ''],
      ['stainless steel, austenitic', '200', '200', ''],
    ])
  })
})

test('each source is told once', () => {
  for (const table of Object.values(tables)) {
    const { rows, sources } = showTable(table)
    expect(new Set(sources).size).toBe(sources.length)
    for (const { number, source } of rows) expect(sources[source]).toBe(table.rows[number]!.source)
  }
})
