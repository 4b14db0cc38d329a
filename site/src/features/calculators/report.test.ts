import { expect, test } from 'vitest'
import { friction } from '#calc/pipe/friction.ts'
import { penstock } from '#calc/pipe/penstock.ts'
import { solveDefinition } from '#calc/solve-definition.ts'
import type { CalculatorDefinition } from '#calc/index.ts'
import { solveForm } from './form.ts'
import { givenValues } from './given-values.ts'
import { asCells, asText, type Report } from './report.ts'
import { exampleForm } from './example-form.ts'

const reportOf = (definition: CalculatorDefinition): Report => {
  const form = exampleForm(definition)
  return {
    definition,
    given: givenValues(definition, form),
    solution: solveDefinition(definition, definition.example.inputs),
    link: 'http://leatwright.test/calculators/x',
  }
}

test.each([friction, penstock] as CalculatorDefinition[])('the example of $id stands in its form', (definition) => {
  const form = exampleForm(definition)
  expect(solveForm(definition, form)).toMatchObject({
    solution: { outputs: solveDefinition(definition, definition.example.inputs).outputs },
  })
})

test('as text it says what was given, found and done, and what to look out for', () => {
  const text = asText(reportOf(friction))
  expect(text).toMatch(/^Friction in a pipe\nhttp:/)
  expect(text).toContain('Inside diameter: 132.2 mm')
  expect(text).toMatch(/\nFound\nWater speed: 1\.25 m\/s\n/)
  expect(text).toMatch(/\nWorking\n1\. .*\n {3}water speed equals .*: 1\.25 m\/s\n2\. /)
  expect(text).toMatch(/\nSources\n.*Colebrook/)
  expect(text).not.toMatch(/undefined|\u00a0/)
})

test('as cells a column has one unit, and a number all its digits', () => {
  const cells = asCells(reportOf(penstock))
  const start = cells.findIndex(([first]) => first === 'Grade line')
  expect(cells[start + 1]).toEqual(['Distance (m)', 'Energy head (m)', 'Hydraulic grade (m)', 'Pressure head (m)'])
  expect(cells[start + 2]!.slice(0, 2)).toEqual(['0', '104'])
  expect(cells.find(([label]) => label === 'Net head')).toHaveLength(3)
})
