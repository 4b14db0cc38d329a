import { expect, test } from 'vitest'
import type { Table } from '#calc/tables/table.ts'
import { conductors } from '#calc/tables/conductors.ts'
import { manning } from '#calc/tables/manning.ts'
import { moduli } from '#calc/tables/moduli.ts'
import { pePipe } from '#calc/tables/pe-pipe.ts'
import { roughness } from '#calc/tables/roughness.ts'
import { offersOf, rowWords } from './table-offers.ts'

const offers = (table: Table, isIt: (row: Table['rows'][number]) => boolean, wanted: string[]) =>
  offersOf(table, table.rows.find(isIt)!, wanted).map(({ words, values }) => ({
    words: words.replaceAll('\u00a0', ' '),
    values,
  }))

test('a single figure is one offer, in SI', () => {
  expect(offers(pePipe, (row) => row.nominal === 110 && row.sdr === 11, ['insideDiameter'])).toEqual([
    { words: 'Use 90 mm', values: { insideDiameter: 0.09 } },
  ])
})

test('several columns are taken together', () => {
  expect(offers(pePipe, (row) => row.nominal === 63 && row.sdr === 17, ['outsideDiameter', 'wallThickness'])).toEqual([
    { words: 'Use these', values: { outsideDiameter: 0.063, wallThickness: 0.0038 } },
  ])
})

test('a range offers its ends, three figures offer each', () => {
  expect(offers(roughness, (row) => row.wall === 'polyethylene (PE), with joints and film', ['roughness'])).toEqual([
    { words: 'Least 0.01 mm', values: { roughness: 1e-5 } },
    { words: 'Most 0.1 mm', values: { roughness: 1e-4 } },
  ])
  expect(offers(manning, (row) => row.channel === 'concrete, float finish', ['n'])).toEqual([
    { words: 'Least 0.013', values: { n: 0.013 } },
    { words: 'Usual 0.015', values: { n: 0.015 } },
    { words: 'Most 0.016', values: { n: 0.016 } },
  ])
})

test('a single figure beside a range goes with both of its ends', () => {
  expect(offers(moduli, (row) => row.material === 'PE 100', ['shortTerm', 'longTerm'])).toEqual([
    { words: 'Use the least', values: { shortTerm: 0.75e9, longTerm: 0.2e9 } },
    { words: 'Use the most', values: { shortTerm: 1.25e9, longTerm: 0.2e9 } },
  ])
})

test('a row that knows nothing of what is wanted offers nothing; what it knows is offered', () => {
  const small = (row: Table['rows'][number]) => row.crossSection === 2.5
  expect(offers(conductors, small, ['aluminium'])).toEqual([])
  expect(offers(conductors, small, ['crossSection', 'aluminium'])).toEqual([
    { words: 'Use 2.5 mm²', values: { crossSection: 2.5 } },
  ])
})

test('a row is named by its words and by its figures with their columns', () => {
  const row = pePipe.rows.find(({ nominal, sdr }) => nominal === 90 && sdr === 13.6)!
  expect(rowWords(pePipe, row, ['nominal', 'sdr'])).toBe('Nominal size dn 90, SDR 13.6')
  expect(rowWords(roughness, roughness.rows[1], ['wall', 'state'])).toBe('polyethylene (PE) or PVC, new')
})
