import { expect, test } from 'vitest'
import { checkBlank } from './blank.ts'

const hint = (text: string) => {
  const check = checkBlank(text, 'length', 0.187)
  return check.right ? undefined : check.hint
}

test('one per cent either way is right, in any unit', () => {
  for (const text of ['0.187 m', '187 mm', '18,7 cm', '0.1888 m', '185.2mm']) expect(hint(text), text).toBeUndefined()
  for (const text of ['189 mm', '0.185 m']) expect(hint(text), text).toMatch(/^Too (large|small)\. /)
})

test('a number without its unit is asked for the unit', () => {
  expect(hint('187')).toMatch(/unit/)
  expect(checkBlank('0.46', 'ratio', 0.46)).toEqual({ right: true })
})

test('a factor of ten is said', () => {
  expect(hint('187 m')).toMatch(/1\u00a0000 times too large: look at the unit/)
  expect(hint('1.87 mm')).toMatch(/100 times too small/)
})

test('nothing, nought and a wrong sign do not pass', () => {
  expect(hint('')).toMatch(/Write a length/)
  expect(hint('0 m')).toMatch(/sign/)
  expect(hint('-0.187 m')).toMatch(/sign/)
})
