import { expect, test } from 'vitest'
import { countChecks, tableOfChecks, type PassedTest } from './count-checks.ts'

const passed = (file: string, suite: string | undefined, reported: Omit<PassedTest, 'file' | 'suite'> = {}) => ({
  file,
  suite,
  ...reported,
})
const from = (provenance: 'published' | 'library' | 'derived' | 'memory', points = 1) => ({
  outside: { provenance, points },
})

const counted = countChecks(
  ['jet', 'friction', 'water'],
  [
    passed('calc/jet/jet.test.ts', 'jet', from('published')),
    passed('calc/jet/jet.test.ts', 'what a jet can do', from('derived')),
    passed('calc/jet/jet.test.ts', undefined, { ...from('library', 40), properties: { held: 2, tries: 400 } }),
    passed('calc/jet/jet.test.ts', 'jet'),
    passed('calc/calculators.test.ts', 'jet', { properties: { held: 1, tries: 200 } }),
    passed('calc/pipe/friction.test.ts', 'water', from('published')),
    passed('calc/pipe/friction.test.ts', 'friction', from('library')),
    passed('calc/pipe/friction.test.ts', 'friction', from('memory')),
    passed('calc/pipe/other.test.ts', 'water', from('published')),
    passed('calc/pipe/other.test.ts', 'jets', from('published')),
    passed('calc/pipe/the-water.test.ts', undefined, from('derived')),
  ],
)
const none = { published: 0, library: 0, derived: 0, memory: 0, oraclePoints: 0, properties: 0, tries: 0 }

test('a test counts for the calculator of its file, or else of its suite', () => {
  expect(counted.byId).toEqual({
    jet: { ...none, published: 1, library: 1, derived: 1, oraclePoints: 40, properties: 3, tries: 600 },
    friction: { ...none, published: 1, library: 1, memory: 1, oraclePoints: 1 },
    water: { ...none, published: 1 },
  })
  expect(counted.rest).toEqual({ ...none, published: 1, derived: 1 })
})

test('the total is of all tests', () => {
  expect(counted.total).toEqual({
    ...{ published: 4, library: 2, derived: 2, memory: 1, oraclePoints: 41, properties: 3, tries: 600 },
  })
})

test('what is from memory does not count towards the three', () => {
  expect(counted.short).toEqual(['friction', 'water'])
})

test('the table has a line for each, in order', () => {
  const [head, ...lines] = tableOfChecks(counted).split('\n')
  expect(head).toMatch(/^calculator +published +library +derived +from memory +oracle points +properties +tries$/)
  expect(lines.map((line) => line.split(/ {2,}/))).toEqual([
    ['jet', '1', '1', '1', '0', '40', '3', '600'],
    ['friction', '1', '1', '0', '1', '1', '0', '0'],
    ['water', '1', '0', '0', '0', '0', '0', '0'],
    ['the rest of the library', '1', '0', '1', '0', '0', '0', '0'],
    ['total', '4', '2', '2', '1', '41', '3', '600'],
  ])
})
