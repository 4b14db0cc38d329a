import { expect, test } from 'vitest'
import { solve } from '#calc/index.ts'
import { lessonInputs } from './lesson-calculation.ts'
import { readLesson } from './lesson-source.ts'

const inputsOf = (mdx: string) => {
  const source = `---\ntitle: Jet\nstation: jet\nminutes: 9\nhazards: []\n---\n\n${mdx}\n`
  return lessonInputs(readLesson(source).components[0]!)
}

test('texts are read, the rest is what the form starts with', () => {
  const inputs = inputsOf('<Calculator id="jet" netHead="37 m" flow="6.3 L/s" show="jetVelocity" />')
  expect(inputs).toMatchObject({ netHead: 37, flow: 0.0063, velocityCoefficient: 0.97, jetCount: 1 })
  expect(() => solve('jet', inputs)).not.toThrow()
})

test('of two alternatives the one that is written stands alone', () => {
  const inputs = inputsOf('<Calculator id="jet" netHead="37 m" nozzleDiameter="18 mm" />')
  expect(inputs).toMatchObject({ nozzleDiameter: 0.018 })
  expect(inputs.flow).toBeUndefined()
  expect(() => solve('jet', inputs)).not.toThrow()
})

test('an optional input that is written empty stays away', () => {
  expect(inputsOf('<Calculator id="runner" jetDiameter="" />').jetDiameter).toBeUndefined()
  expect(inputsOf('<Calculator id="runner" />').jetDiameter).toBeDefined()
})

test('rows and groups', () => {
  const inputs = inputsOf(
    '<Calculator id="penstock" grossHead="40 m">\n<Row of="sections" length="120 m" insideDiameter="96 mm" roughness="0.05 mm" />\n<Row of="sections" length="20 m" insideDiameter="80 mm" roughness="0.05 mm" />\n<Row of="nozzles" count={2} diameter="18 mm" dischargeCoefficient={0.95} />\n</Calculator>',
  )
  expect(inputs).toMatchObject({
    sections: [{ length: 120, insideDiameter: 0.096 }, { length: 20 }],
    nozzles: { count: 2, diameter: 0.018 },
  })
  expect(inputs.flow).toBeUndefined()
  expect(() => solve('penstock', inputs)).not.toThrow()
})

test.each<[string, string, string]>([
  ['a calculator', '<Calculator id="teapot" />', 'There is no calculator “teapot”'],
  ['no calculator', '<Calculator />', 'There is no calculator'],
  ['an input', '<Calculator id="jet" colour="red" />', 'has no single value called “colour”'],
  [
    'a name of the language’s own',
    '<Calculator id="jet" constructor="1" />',
    'has no single value called “constructor”',
  ],
  ['a unit', '<Calculator id="jet" netHead="37 L" />', 'Net head: “L” measures volume; a head is wanted'],
  ['a number without its unit', '<Calculator id="jet" netHead={37} />', 'Net head: Say the unit too'],
  ['an attribute without a value', '<Calculator id="jet" netHead />', 'netHead wants a number or a text'],
  ['a list', '<Calculator id="jet"><Row of="sections" length="1 m" /></Calculator>', 'has no list called “sections”'],
  [
    'a column',
    '<Calculator id="penstock"><Row of="sections" colour="red" /></Calculator>',
    'has no value called “colour”',
  ],
  ['another component’s attribute', '<WorkedExample id="jet" show="flow" />', 'has no single value called “show”'],
])('%s that there is not', (_, mdx, message) => {
  expect(() => inputsOf(mdx)).toThrow(message)
})
