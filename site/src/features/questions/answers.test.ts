import { expect, test } from 'vitest'
import type { QuestionView } from '#api/attempts/dto/attempt.schema.ts'
import { joinNumber, lack, splitNumber } from './answers.ts'

const flowUnits = ['L/s', 'm³/s', 'L/min']

test('a number and its unit come back as they were written', () => {
  for (const text of ['9,5 L/s', '0.0095 m³/s', '1 450 L/min', ' L/s', '9.5'])
    expect(joinNumber(splitNumber(text, flowUnits))).toBe(text)
})

test('of two units that end alike, the longer is meant', () => {
  expect(splitNumber('3 kN m', ['m', 'N m', 'kN m'])).toEqual({ number: '3', unit: 'kN m' })
})

test('a unit written behind the number goes before the one chosen', () => {
  expect(joinNumber({ number: '0.0095 m3/s', unit: 'L/s' })).toBe('0.0095 m3/s')
  expect(joinNumber({ number: '2e-3', unit: 'm³/s' })).toBe('2e-3 m³/s')
})

const field = { say: 'How much?', quantity: 'flow', units: flowUnits, marks: 1 }
const number: QuestionView = { id: 'q', kind: 'number', ...field }

test('a number without a unit is told from no answer', () => {
  expect(lack(number, undefined)).toBe('has no answer')
  expect(lack(number, { kind: 'number', text: ' L/s' })).toBe('has no answer')
  expect(lack(number, { kind: 'number', text: '9.5' })).toBe('has a number without a unit')
  expect(lack(number, { kind: 'number', text: '9.5 L/s' })).toBeUndefined()
  expect(lack(number, { kind: 'number', text: '150 gal/min' })).toBeUndefined()
})

test('a quantity that needs no unit lacks none', () => {
  expect(lack({ ...number, units: ['%', ''] }, { kind: 'number', text: '0.97' })).toBeUndefined()
})

test('parts, matches and orders say what is open', () => {
  const parts: QuestionView = {
    id: 'p',
    kind: 'parts',
    say: '',
    marks: 2,
    parts: [
      { id: 'a', ...field },
      { id: 'b', ...field },
    ],
  }
  expect(lack(parts, { kind: 'parts', texts: { a: '', b: '' } })).toBe('has no answer')
  expect(lack(parts, { kind: 'parts', texts: { a: '1 L/s' } })).toBe('has a part without an answer')
  expect(lack(parts, { kind: 'parts', texts: { a: '1 L/s', b: '2' } })).toBe('has a number without a unit')
  expect(lack(parts, { kind: 'parts', texts: { a: '1 L/s', b: '2 L/s' } })).toBeUndefined()

  const choices = [
    { id: '1', say: 'one' },
    { id: '2', say: 'two' },
  ]
  const match: QuestionView = { id: 'm', kind: 'match', say: '', marks: 1, left: choices, right: choices }
  expect(lack(match, { kind: 'match', pairs: {} })).toBe('has no answer')
  expect(lack(match, { kind: 'match', pairs: { 1: '2' } })).toBe('has something without a match')
  expect(lack(match, { kind: 'match', pairs: { 1: '2', 2: '1' } })).toBeUndefined()

  const several: QuestionView = { id: 's', kind: 'choose-several', say: '', marks: 1, choices }
  expect(lack(several, { kind: 'choose-several', choices: [] })).toBe('has no answer')
})
