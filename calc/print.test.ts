import { describe, expect, test } from 'vitest'
import { defineCalculator, type Step } from './definition.ts'
import { writeFormula as write } from './formula.ts'
import { printWorking } from './print.ts'
import { solve } from './solve.ts'

const definition = defineCalculator({
  id: 'weir',
  station: 'stream',
  title: 'A weir',
  summary: 'For tests.',
  hazards: [],
  inputs: {
    head: { kind: 'scalar', symbol: 'h', label: 'Head', quantity: 'head', range: [-10, 10] },
    PEPressure: { kind: 'scalar', label: 'PE pressure', quantity: 'pressure', range: [0, 1e9] },
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow over it', quantity: 'flow' },
    share: { kind: 'scalar', symbol: 'r', label: 'Share', quantity: 'fraction', digits: 2 },
    turns: { kind: 'scalar', symbol: 'N', label: 'Turns', quantity: 'rotation' },
    pieces: { kind: 'scalar', symbol: 'z', label: 'Pieces', quantity: 'count' },
    viscosity: { kind: 'scalar', symbol: '\\mu', label: 'Viscosity', quantity: 'dynamicViscosity' },
    angle: { kind: 'scalar', symbol: '\\theta', label: 'Angle', quantity: 'angle' },
    kind: { kind: 'text', label: 'Kind' },
  },
  solve: () => ({ flow: 0, share: 0, turns: 0, pieces: 0, viscosity: 0, angle: 0, kind: '' }),
  working: () => [],
  cautions: () => [],
  doesNotCheck: [],
  sources: [],
  example: { say: 'None.', inputs: {} },
})
const found = {
  flow: 0.00954,
  share: 0.0621,
  turns: 12_345,
  pieces: 24,
  viscosity: 1.3e-3,
  angle: 45,
  kind: 'calm',
}
const given = { head: 0.25, PEPressure: 470_000 }
const print = (step: Step, more: object = {}) => printWorking(definition, [step], { ...given, ...more }, found)[0]!

describe('a working, printed', () => {
  test('with symbols, with numbers and a result in SI and as people say it, and as speech', () => {
    expect(print({ say: 'It flows.', formula: write`${'flow'} = 2 \, ${'head'}^{1.5}`, gives: 'flow' })).toEqual({
      say: 'It flows.',
      symbols: 'Q = 2 \\, h^{1.5}',
      numbers: 'Q = 2 \\times  0.25^{1.5} = 0.00954\\;\\mathrm{m^3/s} = 9.54\\;\\mathrm{L/s}',
      speech: 'flow over it equals 2 times head to the power 1.5',
      gives: 'flow',
    })
  })

  test('a step without a formula is its sentence', () => {
    expect(print({ say: 'By trial.', gives: 'flow' })).toEqual({ say: 'By trial.', gives: 'flow' })
    expect(print({ say: 'Mind the gap.' })).toEqual({ say: 'Mind the gap.' })
  })

  const result = (gives: string) => print({ say: '', formula: write`${gives} = ${'head'}`, gives }).numbers
  test('results carry their digits and units; thousands are grouped; a count is whole', () => {
    expect(result('share')).toBe('r = 0.25 = 0.062 = 6.2\\;\\mathrm{\\%}')
    expect(result('turns')).toBe('N = 0.25 = 12{\\,}300\\;\\mathrm{rev/min}')
    expect(result('pieces')).toBe('z = 0.25 = 24')
    expect(result('viscosity')).toBe('\\mu = 0.25 = 0.00130\\;\\mathrm{Pa\\,s} = 1.30\\;\\mathrm{mPa\\,s}')
    expect(result('angle')).toBe('\\theta = 0.25 = 45.0^\\circ')
  })

  const put = (head: number) => print({ say: '', formula: write`x = ${'head'}` }, { head }).numbers
  test('numbers put in are short, and stand in brackets where they would not stand alone', () => {
    expect(put(45)).toBe('x = 45')
    expect(put(28.81730259)).toBe('x = 28.82')
    expect(put(-3)).toBe('x = (-3)')
    expect(put(0)).toBe('x = 0')
    expect(put(12_345.6)).toBe('x = 12{\\,}350')
    expect(put(-12_345.6)).toBe('x = (-12{\\,}350)')
    expect(put(1.5e-6)).toBe('x = (1.5\\times 10^{-6})')
    expect(put(-1.5e-6)).toBe('x = (-1.5\\times 10^{-6})')
  })

  test('a thousand’s space in a number is no product', () => {
    const { numbers } = print({ say: '', formula: write`x = ${'PEPressure'} \, ${'head'}` })
    expect(numbers).toBe('x = 470{\\,}000 \\times  0.25')
  })

  test('an aside prints its own number, with its digits and unit', () => {
    const aside = { symbol: 'v_{1}', value: 1.29087, say: 'the velocity', digits: 3, unit: 'm/s' }
    expect(print({ say: '', formula: write`${'head'} = ${aside}` })).toEqual({
      say: '',
      symbols: 'h = v_{1}',
      numbers: '0.25 = 1.29\\;\\mathrm{m/s}',
      speech: 'head equals the velocity',
    })
  })

  test('without a symbol the label stands; initials in it keep their capitals', () => {
    const printed = print({ say: '', formula: write`x = ${'PEPressure'}` })
    expect(printed.symbols).toBe('x = \\text{PE pressure}')
    expect(printed.speech).toBe('x equals PE pressure')
  })

  test('the jet’s whole working', () => {
    const { working } = solve('jet', { netHead: 45, velocityCoefficient: 0.97, jetCount: 1, flow: 0.0095 })
    expect(working[0]).toEqual({
      say: 'Falling through the net head gives the water its speed; the nozzle keeps nearly all of it.',
      symbols: 'v = C_v \\, \\sqrt{2 \\, g \\, H}',
      numbers: 'v = 0.97 \\times  \\sqrt{2 \\times  9.807 \\times  45} = 28.8\\;\\mathrm{m/s}',
      speech: 'jet speed equals velocity coefficient times the square root of 2 times gravity times net head',
      gives: 'jetVelocity',
    })
    expect(working.map(({ gives }) => gives)).toEqual([
      'jetVelocity',
      'jetDiameter',
      'nozzleDiameter',
      'jetPower',
      'nozzleEfficiency',
    ])
  })
})
