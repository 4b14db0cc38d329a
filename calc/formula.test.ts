import { describe, expect, test } from 'vitest'
import { gravity } from './constants.ts'
import { fill, speak, spoken, writeFormula } from './formula.ts'

describe('a formula', () => {
  const formula = writeFormula<'head' | 'speed'>`${'speed'} = \sqrt{2 \, ${gravity} \, ${'head'}}`

  test('keeps its TeX as written, and its holes in order', () => {
    expect(formula.parts).toEqual(['', ' = \\sqrt{2 \\, ', ' \\, ', '}'])
    expect(formula.holes).toEqual(['speed', gravity, 'head'])
  })

  test('is filled hole by hole', () => {
    expect(fill(formula, (hole) => (typeof hole === 'string' ? hole[0]! : hole.symbol))).toBe(
      's = \\sqrt{2 \\, g \\, h}',
    )
  })

  test('without holes it is itself', () => {
    expect(fill(writeFormula`1 + 1 = 2`, () => '?')).toBe('1 + 1 = 2')
  })
})

describe('speech', () => {
  const cases: [string, string][] = [
    ['v = C \\, \\sqrt{2 \\, g \\, H}', 'v equals C times the square root of 2 times g times H'],
    ['\\frac{a + b}{c - d}', 'a plus b, over c minus d'],
    ['\\frac{\\frac{a}{b}}{c}', 'a, over b, over c'],
    ['x^2 + y^3', 'x squared plus y cubed'],
    ['H^{1.25}', 'H to the power 1.25'],
    ['h_{1}', 'h sub 1'],
    ['\\left( a / b \\right)', 'open bracket a over b close bracket'],
    ['\\log_{10}(x)', 'the logarithm to ten of open bracket x close bracket'],
    ['\\pi \\cdot \\rho \\times \\eta', 'pi times rho times eta'],
    ['\\sin\\theta \\approx \\tan\\theta', 'the sine of theta is about the tangent of theta'],
    ['\\mathrm{Re}', 'Re'],
    ['0.06 \\, x', '0.06 times x'],
  ]
  test.each(cases)('%s', (tex, words) => {
    expect(speak(tex)).toBe(words)
  })

  test('says words put in for a hole as they are', () => {
    expect(speak(`${spoken('net head (m), over all')} = 2`)).toBe('net head (m), over all equals 2')
    expect(spoken('a «b» c')).toBe('«a b c»')
  })

  test('ends, even where braces are left open', () => {
    expect(speak('\\frac{a')).toBe('a, over')
    expect(speak('')).toBe('')
  })
})
