import { describe, expect, expectTypeOf, test } from 'vitest'
import { stringify } from 'yaml'
import type { z } from 'zod'
import type { Question } from '#calc/marking/question.ts'
import { parseQuestionBank, questionSchema } from './question-bank.ts'

const number = {
  id: 'jet-speed',
  kind: 'number',
  calculator: 'jet',
  ask: 'jetVelocity',
  draw: {
    netHead: { from: '13 m', to: '83 m', step: '1 m' },
    standing: { of: 'netHead', times: [1.1, 1.2], step: '1 m' },
  },
  fixed: { velocityCoefficient: 0.97, flow: '6 L/s' },
  say: 'The head is {netHead}. How fast is the jet?',
  tolerance: { relative: 0.01 },
  mistakes: [{ with: { netHead: 'standing' }, because: 'That is {standing}, the head at rest.' }],
}
const part = { id: 'jet', calculator: 'jet', ask: 'jetVelocity', say: 'How fast?', tolerance: { absolute: '1 m/s' } }
const parts = {
  id: 'two',
  kind: 'parts',
  say: 'Twice.',
  parts: [part, { ...part, id: 'again', inputs: { netHead: 'jet' } }],
}
const choose = {
  id: 'which',
  kind: 'choose-one',
  say: 'Which?',
  choices: [
    { say: 'this', right: true },
    { say: 'that', because: 'It is not.' },
  ],
}
const order = { id: 'row', kind: 'order', say: 'In order.', items: ['a', 'b', 'c'], because: 'So it goes.' }
const match = {
  id: 'pair',
  kind: 'match',
  say: 'Match.',
  pairs: [
    { left: 'a', right: 'x', because: 'So.' },
    { left: 'b', right: 'x', because: 'So.' },
  ],
}

const read = (...questions: unknown[]) => parseQuestionBank(stringify(questions), 'jet.questions.yaml')

test('the type that the schema gives is the marker’s own', () => {
  expectTypeOf<z.infer<typeof questionSchema>>().toEqualTypeOf<Question>()
  expectTypeOf<z.input<typeof questionSchema>>().toEqualTypeOf<Question>()
})

test('a bank with a question of each kind reads as it stands', () => {
  const bank = [number, parts, choose, { ...choose, id: 'which-ones', kind: 'choose-several' }, order, match]
  expect(read(...bank)).toEqual(bank)
})

test('fixed values and inputs may be lists, rows and groups', () => {
  const fixed = {
    ...number.fixed,
    times: ['31 s', '32 s'],
    sections: [{ length: '120 m', insideDiameter: '90 mm' }],
    nozzles: { count: 2, diameter: '20 mm' },
  }
  expect(read({ ...number, fixed })).toMatchObject([{ fixed }])
})

describe('a fault is named by bank, question and place, with what to write instead', () => {
  const without = (question: Record<string, unknown>, key: string) =>
    Object.fromEntries(Object.entries(question).filter(([name]) => name !== key))
  test.each<[string, unknown, string]>([
    [
      'an id with capitals',
      { ...number, id: 'JetSpeed' },
      'question “JetSpeed”, id: use small letters, figures and hyphens',
    ],
    ['no id', without(choose, 'id'), 'question 1, id:'],
    ['an unknown kind', { ...number, kind: 'essay' }, 'question “jet-speed”, kind:'],
    ['a misspelt key', { ...number, tolerence: 1 }, 'question “jet-speed”: Unrecognized key: "tolerence"'],
    ['no tolerance', without(number, 'tolerance'), 'tolerance: write { relative: 0.01 } or { absolute: 0.2 m/s }'],
    ['a tolerance as a number', { ...number, tolerance: 0.01 }, 'tolerance: write { relative: 0.01 }'],
    [
      'a hole without a variable',
      { ...number, say: '{head}' },
      'question “jet-speed”, say: there is no variable called “head”',
    ],
    [
      'a hole in a reason',
      { ...number, mistakes: [{ times: 2, because: '{x}' }] },
      'mistakes 1, because: there is no variable called “x”',
    ],
    [
      'a mistake of no kind',
      { ...number, mistakes: [{ because: 'Why.' }] },
      'mistakes 1: write one of with, times or output',
    ],
    [
      'a mistake of two kinds',
      { ...number, mistakes: [{ times: 2, output: 'flow', because: 'Why.' }] },
      'mistakes 1: write one of with, times or output',
    ],
    ['a mistake without its reason', { ...number, mistakes: [{ times: 2 }] }, 'mistakes 1, because:'],
    ['a draw of something', { ...number, draw: { netHead: '3 m' } }, 'draw, netHead: write { from, to, step }'],
    [
      'a draw on a later variable',
      { ...number, draw: { a: { of: 'b', times: [1, 2], step: 1 }, netHead: number.draw.netHead } },
      'draw, a, of: no variable called “b” is drawn before it',
    ],
    ['a variable twice', { ...number, fixed: { netHead: '3 m' } }, 'fixed, netHead: netHead is drawn already'],
    [
      'two right choices in choose-one',
      {
        ...choose,
        choices: [
          { say: 'a', right: true },
          { say: 'b', right: true },
        ],
      },
      'choices: mark exactly one choice “right: true”; 2 are marked',
    ],
    [
      'no right choice',
      {
        ...choose,
        kind: 'choose-several',
        choices: [
          { say: 'a', because: 'x' },
          { say: 'b', because: 'x' },
        ],
      },
      'choices: mark the right choices “right: true”',
    ],
    [
      'a wrong choice without its reason',
      { ...choose, choices: [{ say: 'a', right: true }, { say: 'b' }] },
      'choices 2, because: say why this choice is wrong',
    ],
    ['the same item twice', { ...order, items: ['a', 'b', 'a'] }, 'question “row”, items: two items are the same'],
    [
      'the same left side twice',
      { ...match, pairs: [match.pairs[0], match.pairs[0]] },
      'pairs: two pairs have the same left side',
    ],
    [
      'a part called like another',
      { ...parts, parts: [part, part] },
      'parts 2, id: “jet” is the name of something else already',
    ],
    [
      'a part called like a variable',
      { ...parts, fixed: { jet: 1 } },
      'parts 1, id: “jet” is the name of something else already',
    ],
    ['empty words', { ...choose, say: ' ' }, 'question “which”, say: write some words here'],
  ])('%s', (_, question, message) => {
    expect(() => read(question)).toThrow(`jet.questions.yaml: ${message}`.slice(0, 20))
    expect(() => read(question)).toThrow(message)
  })

  test('two questions of one name', () => {
    expect(() => read(choose, choose)).toThrow('question “which”, id: another question is called “which” too')
  })

  test('an empty bank, and one that is no list', () => {
    expect(() => read()).toThrow('jet.questions.yaml: the bank: a bank holds at least one question')
    expect(() => parseQuestionBank('id: x', 'jet.questions.yaml')).toThrow('jet.questions.yaml: the bank:')
    expect(() => parseQuestionBank('', 'jet.questions.yaml')).toThrow('jet.questions.yaml: the bank:')
  })

  test('what is not YAML, with its line', () => {
    expect(() => parseQuestionBank('- id: a\n  say: b: c', 'jet.questions.yaml')).toThrow(
      /^jet\.questions\.yaml: .* at line 2, column 8/,
    )
  })

  test('every fault at once, a line each', () => {
    expect(() => read({ ...choose, say: '', kind: 'choose-one' }, { ...order, because: '' })).toThrow(
      /question “which”, say: .*\n.*question “row”, because: /,
    )
  })
})
