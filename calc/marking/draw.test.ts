import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { allowance, answerOf, mistakenAnswer } from './calculation.ts'
import { draw, namedBy } from './draw.ts'
import type { NumberQuestion } from './question.ts'
import { everyKind, headToTurns, jetSpeed, shutDown, symptoms, whatHurts, whyHalf } from './questions-for-tests.ts'

const seeds = Array.from({ length: 100 }, (_, i) => `seed ${i}`)

describe('drawing', () => {
  test.each(everyKind.map((question) => [question.id, question] as const))(
    '%s: the same seed, the same draw',
    (_, question) => {
      expect(draw(question, 'one')).toEqual(draw(question, 'one'))
      expect(new Set(seeds.map((seed) => JSON.stringify(draw(question, seed)))).size).toBeGreaterThan(2)
    },
  )

  test.each(everyKind.map((question) => [question.id, question] as const))(
    '%s: a draw is plain data and comes back whole from a database',
    (_, question) => {
      const drawn = draw(question, 'one')
      expect(JSON.parse(JSON.stringify(drawn))).toEqual(drawn)
    },
  )

  test('variables lie on their steps, and reach both ends', () => {
    const heads = Array.from({ length: 2000 }, (_, i) => draw(jetSpeed, `${i}`).values.netHead!.value)
    expect(Math.min(...heads)).toBe(13)
    expect(Math.max(...heads)).toBe(83)
    expect(heads.every(Number.isInteger)).toBe(true)
  })

  test('a variable that hangs on another keeps to its factors and its step', () => {
    for (const seed of seeds) {
      const { netHead, standing } = draw(jetSpeed, seed).values
      expect((standing!.value * 2) % 1).toBe(0)
      expect(standing!.value).toBeGreaterThanOrEqual(1.1 * netHead!.value - 0.25)
      expect(standing!.value).toBeLessThanOrEqual(1.25 * netHead!.value + 0.25)
    }
  })

  test('a drawn value is said in the unit of its bank', () => {
    const { pitchDiameter } = draw(headToTurns, 'one').values
    expect(pitchDiameter!.text).toBe(`${pitchDiameter!.value * 1000}\u00a0mm`.replace(/\.0+(?=\u00a0)/, ''))
    expect(pitchDiameter!.quantity).toBe('length')
  })

  test('the answer of a part feeds the next', () => {
    const { values, answers } = draw(headToTurns, 'one')
    const turns = (60 * 0.46 * answers.jet!) / (Math.PI * values.pitchDiameter!.value)
    expect(answers.turns).toBeCloseTo(turns, 9)
    expect(answers.rim).toBeCloseTo(0.46 * answers.jet!, 9)
  })

  test('no mistake of a draw can be taken for the answer or for another mistake', () => {
    const mistakes = jetSpeed.mistakes!
    for (const seed of seeds) {
      const drawn = draw(jetSpeed, seed)
      const named = namedBy(jetSpeed, drawn.values, {})
      const numbers = [
        answerOf(jetSpeed, jetSpeed, named),
        ...mistakes.map((mistake) => mistakenAnswer(jetSpeed, jetSpeed, mistake, named)),
      ].sort((a, b) => a - b)
      for (let i = 1; i < numbers.length; i++)
        expect(numbers[i]! - numbers[i - 1]!).toBeGreaterThan(
          allowance(jetSpeed.tolerance, numbers[i]!, 'velocity') +
            allowance(jetSpeed.tolerance, numbers[i - 1]!, 'velocity'),
        )
    }
  })

  test('a draw whose mistake falls on the answer is made again', () => {
    // At a factor near 1 the head at rest gives the answer itself.
    const narrow: NumberQuestion = {
      ...jetSpeed,
      draw: { ...jetSpeed.draw, standing: { of: 'netHead', times: [1, 1.25], step: '0.5 m' } },
      mistakes: [jetSpeed.mistakes![0]!],
    }
    for (const seed of seeds) {
      const { values } = draw(narrow, seed)
      expect(values.standing!.value / values.netHead!.value).toBeGreaterThan(1.02)
    }
  })

  test('numbers that a calculator refuses are drawn again', () => {
    // Heads over 2000 m are refused.
    const high: NumberQuestion = {
      ...jetSpeed,
      draw: { netHead: { from: '1900 m', to: '2900 m', step: '100 m' } },
      say: '{netHead}',
      mistakes: [],
    }
    for (const seed of seeds) expect(draw(high, seed).values.netHead!.value).toBeLessThanOrEqual(2000)
  })

  test('shuffles hold every place once, and what is to be ordered never stands in order', () => {
    const sorted = (list: number[]) => [...list].sort((a, b) => a - b)
    for (const seed of seeds) {
      expect(sorted(draw(whyHalf, seed).shuffle)).toEqual([0, 1, 2])
      expect(sorted(draw(whatHurts, seed).shuffle)).toEqual([0, 1, 2, 3])
      // Two lefts share one right.
      expect(sorted(draw(symptoms, seed).shuffle)).toEqual([0, 1, 2])
      const { shuffle } = draw(shutDown, seed)
      expect(sorted(shuffle)).toEqual([0, 1, 2, 3, 4])
      expect(shuffle).not.toEqual([0, 1, 2, 3, 4])
    }
    expect(new Set(seeds.map((seed) => draw(whyHalf, seed).shuffle[0])).size).toBe(3)
  })

  test('any text serves as a seed', () => {
    fc.assert(fc.property(fc.string(), (seed) => draw(jetSpeed, seed).answers.answer! > 0))
  })
})

describe('rows, groups and choices', () => {
  test('a cell of a row may name a variable, and a row may be a fixed value', () => {
    const row = { length: 'run', insideDiameter: '96 mm', roughness: '0.05 mm' }
    const question = (inputs: NumberQuestion['inputs'], fixed: NumberQuestion['fixed']): NumberQuestion => ({
      id: 'net',
      kind: 'number',
      calculator: 'penstock',
      ask: 'netHead',
      draw: { run: { from: '130 m', to: '260 m', step: '10 m' } },
      fixed: { grossHead: '41 m', flow: '7.5 L/s', ...fixed },
      inputs,
      say: '{run}',
      tolerance: { relative: 0.01 },
    })
    const written = draw(question({ grossHead: 'grossHead', flow: 'flow', sections: [row] }, {}), 'one')
    const fixed = draw(question(undefined, { sections: [row] }), 'one')
    expect(written.values.run!.quantity).toBe('length')
    expect(written.answers.answer).toBeLessThan(41)
    expect(fixed.answers).toEqual(written.answers)
  })
})

describe('a bank that asks for what cannot be', () => {
  const broken = (change: Partial<NumberQuestion>) => () => draw({ ...jetSpeed, ...change }, 'one')
  test.each<[string, Partial<NumberQuestion>, string]>([
    ['a calculator', { calculator: 'teapot' }, 'There is no calculator “teapot”'],
    ['an output', { ask: 'colour' }, 'has no number “colour” to ask for'],
    ['a name of the language’s own', { ask: 'constructor' }, 'has no number “constructor”'],
    ['an input', { inputs: { colour: 'netHead' } }, 'has no input called “colour”'],
    ['an input with a wrong unit', { fixed: { ...jetSpeed.fixed, flow: '6 kg' } }, '“kg” measures mass'],
    ['a number without its unit', { fixed: { ...jetSpeed.fixed, flow: 6 } }, 'Say the unit too, for example 9.5 L/s'],
    ['a missing input', { fixed: { velocityCoefficient: 0.97, jetCount: 1 } }, 'Give Flow or Nozzle diameter'],
    ['a list for one value', { fixed: { ...jetSpeed.fixed, flow: ['6 L/s'] } }, 'wants one value, not a list'],
    [
      'another quantity',
      { inputs: { netHead: 'netHead', flow: 'netHead' } },
      '“netHead” is a head and cannot stand for Flow',
    ],
    ['a mistake of another quantity', { mistakes: [{ output: 'jetPower', because: '' }] }, '“jetPower” is a power'],
    ['a unit', { units: ['kg'] }, '“kg” is no unit of speed'],
    [
      'a step of nothing',
      { draw: { netHead: { from: '3 m', to: '9 m', step: '0 m' } } },
      'A step must be more than nothing',
    ],
    [
      'an empty range',
      { draw: { netHead: { from: '9 m', to: '3 m', step: '1 m' } } },
      '“to” must not be less than “from”',
    ],
    [
      'a variable of nothing',
      { draw: { ...jetSpeed.draw, extra: { from: 1, to: 2, step: 1 } } },
      'Nothing says what “extra” measures',
    ],
    [
      'two mistakes alike',
      {
        mistakes: [
          { times: 2, because: '' },
          { times: 2.01, because: '' },
        ],
      },
      'mistake 1 and mistake 2 of part “answer” cannot be told apart',
    ],
    ['a mistake like the answer', { mistakes: [{ times: 1.015, because: '' }] }, 'the answer and mistake 1'],
  ])('%s', (_, change, message) => {
    expect(broken(change)).toThrow(RangeError)
    expect(broken(change)).toThrow(message)
    expect(broken(change)).toThrow('Question “jet-speed”')
  })
})
