import { expect, it } from 'vitest'
import { safePath, withReturnPath } from './return-path.ts'

it('takes back to paths of this site only', () => {
  expect(safePath('/courses/reading-the-stream')).toBe('/courses/reading-the-stream')
  for (const elsewhere of [
    'https://elsewhere.example',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'sign-in',
    '',
    null,
  ])
    expect(safePath(elsewhere)).toBeUndefined()
})

it('carries a path whole', () => {
  const url = new URL(withReturnPath('/sign-in', '/calculators/jet?netHead=20 m'), 'http://leatwright.test')
  expect(url.searchParams.get('next')).toBe('/calculators/jet?netHead=20 m')
  expect(withReturnPath('/sign-in', undefined)).toBe('/sign-in')
})
