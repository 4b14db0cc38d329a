import { expect, test } from 'vitest'
import { fittings } from '#calc/pipe/fittings.ts'
import { penstock } from '#calc/pipe/penstock.ts'
import { flowByBucket } from '#calc/site/flow-by-bucket.ts'
import type { CalculatorDefinition } from '#calc/index.ts'
import type { ListInput } from './columns.ts'
import { readForm, startForm } from './form.ts'
import { blockOf, pasteBlock } from './paste.ts'

const pasted = (definition: CalculatorDefinition, key: string, text: string, row = 0, column = '') => {
  const form = startForm(definition)
  const block = pasteBlock(form.rows[key]!, definition.inputs[key] as ListInput, { row, column }, text)
  if (!block) return undefined
  const next = { ...form, rows: { ...form.rows, [key]: block.rows } }
  return { say: block.say, value: readForm(definition, next).inputs[key], errors: readForm(definition, next).errors }
}

test.each([
  [
    '1\t2\n3\t4',
    2,
    [
      ['1', '2'],
      ['3', '4'],
    ],
  ],
  [
    '1;2\r\n3;4\r\n',
    2,
    [
      ['1', '2'],
      ['3', '4'],
    ],
  ],
  ['1,5\n2,5', 1, [['1,5'], ['2,5']]],
  [
    '1.5,2\n2.5,3',
    2,
    [
      ['1.5', '2'],
      ['2.5', '3'],
    ],
  ],
  ['1,5\n2,5', 2, [['1,5'], ['2,5']]],
  ['12', 3, [['12']]],
])('%j in %i columns', (text, columns, cells) => {
  expect(blockOf(text, columns)).toEqual(cells)
})

test('a column of timings fills the rows from the field on, and adds those that are wanted', () => {
  expect(pasted(flowByBucket, 'times', '8,1\n8,4\n8,2\n8,3\n')).toMatchObject({
    say: 'Pasted: 4 timings.',
    value: [8.1, 8.4, 8.2, 8.3],
    errors: {},
  })
  expect(pasted(flowByBucket, 'times', '9.1\n9.2', 2)?.value).toEqual([8.2, 8.5, 9.1, 9.2])
})

test('rows and columns, a heading left out, units in the cells', () => {
  const text = 'Length\tBore\n120 m\t96,8 mm\n80\t8.1 cm'
  expect(pasted(penstock, 'sections', text, 0, 'length')).toMatchObject({
    value: [
      { length: 120, insideDiameter: 0.0968 },
      { length: 80, insideDiameter: 0.081 },
    ],
  })
})

test('fittings by their words', () => {
  expect(pasted(fittings, 'fittings', 'Gate valve, open\t2\nswept bend\t1\t90\t5', 0, 'kind')?.value).toEqual(
    expect.arrayContaining([
      { kind: 'gate-valve', count: 2 },
      { kind: 'swept-bend', count: 1, bendAngle: 90, radiusRatio: 5 },
    ]),
  )
})

test('what does not fit is told, and nothing else is lost', () => {
  const many = Array.from({ length: 60 }, (_, i) => String(i + 10)).join('\n')
  const { say, value } = pasted(flowByBucket, 'times', many)!
  expect(value).toHaveLength(50)
  expect(say).toBe('Pasted: 50 timings. 10 timings did not fit: there may be 50.')
})

test('one cell is left to the field itself', () => {
  expect(pasted(flowByBucket, 'times', '8.4')).toBeUndefined()
})

test('a comma with a space behind parts cells, one without may be the decimal one', () => {
  expect(blockOf('8.1, 8.4, 8.2', 2)).toEqual([['8.1', '8.4', '8.2']])
  expect(blockOf('8,1, 8,4', 2)).toEqual([['8,1', '8,4']])
})

test('one line goes down a list of one column', () => {
  expect(pasted(flowByBucket, 'times', '8.1\t8.4\t8.2')?.value).toEqual(expect.arrayContaining([8.1, 8.4, 8.2]))
})

test('a heading is told of, its unit is that of the cells, and a choice is none', () => {
  const { say, value } = pasted(penstock, 'sections', 'Length (ft)\tBore, in\n100\t4', 0, 'length')!
  expect(say).toBe('Pasted: 1 section. The first line was taken for a heading.')
  expect(value).toMatchObject([{ length: 30.48, insideDiameter: 0.1016 }])
  expect(
    pasted(fittings, 'fittings', 'gate valve, open\nball valve of full bore, open', 0, 'kind')?.value,
  ).toMatchObject([{ kind: 'gate-valve' }, { kind: 'ball-valve' }, {}, {}])
})

test('a block of runs is a run in each column, one line is one run', () => {
  const levels = {
    ...flowByBucket,
    inputs: {
      rises: {
        kind: 'runs',
        label: 'Rises',
        run: 'run',
        row: 'rise',
        quantity: 'length',
        unit: 'm',
        range: [0, 10],
        least: 1,
        most: 3,
        leastEach: 1,
        mostEach: 50,
      },
    },
  } as unknown as CalculatorDefinition
  expect(pasted(levels, 'rises', 'first\tsecond\n1,42\t1,40\n1,38\t1,39\n\t0,5')).toMatchObject({
    say: 'Pasted: 2 runs of up to 3 rises. The first line was taken for a heading.',
    value: [
      [1.42, 1.38],
      [1.4, 1.39, 0.5],
    ],
  })
  expect(pasted(levels, 'rises', '1.42\t1.38\t0.96 m')?.value).toEqual([[1.42, 1.38, 0.96]])
})
