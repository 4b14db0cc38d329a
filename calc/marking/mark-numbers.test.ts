import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Quantity } from '../definition.ts'
import { fieldText } from '../units/format.ts'
import { parse } from '../units/parse.ts'
import { quantities } from '../units/quantities.ts'
import { allowance, askedOutput, partsOf } from './calculation.ts'
import { draw, type Draw } from './draw.ts'
import { mark } from './mark.ts'
import type { NumberQuestion } from './question.ts'
import { headToTurns, jetSpeed, nozzleShare } from './questions-for-tests.ts'

const number = (drawn: Draw, text: string) => mark(drawn, { kind: 'number', text }).parts[0]!
const answer = (drawn: Draw, part = 'answer') => drawn.answers[part]!

describe('one number', () => {
  const drawn = draw(jetSpeed, 'one')
  const right = answer(drawn)
  const speed = (value: number, digits = 4) => `${value.toPrecision(digits)} m/s`

  test('right, with its working and the answer in words', () => {
    const part = number(drawn, speed(right))
    expect(part).toMatchObject({ id: 'answer', verdict: 'full', marks: 1, outOf: 1, reasons: [], notes: [] })
    expect(part.problem).toBeUndefined()
    expect(part.answer).toEqual([`${right.toPrecision(3)}\u00a0m/s`])
    expect(part.readAs).toBe(`read as ${Number(right.toPrecision(4))}\u00a0m/s`)
    expect(part.working.map(({ gives }) => gives)).toEqual(['jetVelocity'])
    expect(part.working[0]!.numbers).toContain(String(drawn.values.netHead!.value))
  })

  test.each<[string, (right: number) => string]>([
    ['with a comma', (v) => `${v.toFixed(2).replace('.', ',')} m/s`],
    ['without a space', (v) => `${v.toFixed(2)}m/s`],
    ['in feet per second', (v) => `${(v / 0.3048).toFixed(2)} ft/s`],
    ['in kilometres per hour', (v) => `${(v * 3.6).toFixed(1)} km/h`],
    ['in a unit that is not offered', (v) => `${(v * 100).toFixed(0)} cm/s`],
    ['with capitals', (v) => `${v.toFixed(2)} M/S`],
    ['with words', (v) => `${v.toFixed(2)} metres per second`],
    ['with white space about it', (v) => `  ${v.toFixed(2)}   m/s \n`],
  ])('right %s', (_, write) => {
    expect(number(drawn, write(right)).verdict).toBe('full')
  })

  test.each<[string, (right: number) => string, RegExp]>([
    ['without its unit', (v) => v.toFixed(2), /^Say the unit too, for example 26 m\/s\.$/],
    [
      'with a unit of something else',
      (v) => `${v.toFixed(2)} m`,
      /“m” measures .*; a speed is wanted, for example 26 m\/s/,
    ],
    ['with an unknown unit', (v) => `${v.toFixed(2)} furlongs`, /The unit “furlongs” is not known here/],
    ['as words', () => 'quite fast', /^Start with a number, for example 26 m\/s/],
    ['as two numbers', () => '26.1.5.2 m/s', /is not one number/],
    ['as what can be read two ways', () => '1,450 m/s', /can be read as 1.450 or as 1450/],
    ['too large to be a number', () => '1e999 m/s', /too large/],
    ['as a huge text', () => '9'.repeat(10_000), /too long to read/],
    ['as space', () => '   ', /^No answer was given\.$/],
  ])('%s it earns nothing, and the problem says what to write', (_, write, problem) => {
    const part = number(drawn, write(right))
    expect(part).toMatchObject({ verdict: 'none', marks: 0, reasons: [] })
    expect(part.problem).toMatch(problem)
    expect(part.readAs).toBeUndefined()
  })

  test('the problem does not give the answer away by its example', () => {
    expect(number(drawn, 'x').problem).not.toContain(right.toPrecision(3))
  })

  test.each([
    ['10', 10],
    ['100', 100],
    ['1000', 1000],
    ['a million', 1e6],
    ['10', 0.1],
    ['1000', 0.001],
  ])('right but for a factor of %s (%d)', (said, factor) => {
    const result = mark(drawn, { kind: 'number', text: speed(right * factor) })
    expect(result.parts[0]).toMatchObject({
      verdict: 'none',
      marks: 0,
      notes: [`Right but for a factor of ${said}: look at the unit.`],
    })
    expect(result.mistakes).toEqual(['jet-speed/answer/power-of-ten'])
  })

  test('negative, zero and far off: nothing, and nothing is guessed', () => {
    for (const text of [speed(-right), '0 m/s', '123456 m/s', '1e-300 m/s'])
      expect(number(drawn, text)).toMatchObject({ verdict: 'none', marks: 0, reasons: [], notes: [] })
  })

  test('each usual mistake brings its reason with this draw’s values, and its id', () => {
    const { standing } = drawn.values
    const wrong = [right * Math.sqrt(standing!.value / drawn.values.netHead!.value), right / 0.97, right / 2]
    const reasons = [
      `That is the head at rest, ${standing!.text}.`,
      'That leaves the loss of the nozzle out.',
      'That is the speed of the bucket.',
    ]
    wrong.forEach((value, i) => {
      const result = mark(drawn, { kind: 'number', text: speed(value) })
      expect(result.parts[0]).toMatchObject({ verdict: 'none', marks: 0, reasons: [reasons[i]] })
      expect(result.mistakes).toEqual([`jet-speed/answer/${i}`])
    })
  })

  test('too few figures cost nothing but are said', () => {
    // Of one whose two figures are near enough.
    const seed = Array.from({ length: 200 }, (_, i) => `${i}`).find((seed) => {
      const value = answer(draw(jetSpeed, seed))
      return Math.abs(Number(value.toPrecision(2)) - value) < 0.005 * value
    })!
    const drawn = draw(jetSpeed, seed)
    expect(number(drawn, `${answer(drawn).toFixed(0)} m/s`)).toMatchObject({
      verdict: 'full',
      marks: 1,
      notes: ['Give 3 significant figures.'],
    })
    expect(number(drawn, speed(answer(drawn), 3)).notes).toEqual([])
    expect(number(drawn, speed(answer(drawn), 6)).notes).toEqual([])
  })

  test('what was read is said in the unit that the question asks for', () => {
    const kilometres = draw({ ...jetSpeed, units: ['km/h'] }, 'one')
    expect(number(kilometres, '20 m/s').readAs).toBe('read as 72\u00a0km/h')
    expect(number(kilometres, '20 m/s').answer[0]).toMatch(/km\/h$/)
    expect(number(drawn, '72 km/h').readAs).toBe('read as 20\u00a0m/s')
  })

  test('the answer in words is itself near enough, however tight the tolerance', () => {
    for (const relative of [0.05, 0.01, 1e-3, 1e-6]) {
      const tight = draw({ ...jetSpeed, tolerance: { relative }, mistakes: [] }, 'one')
      expect(number(tight, number(tight, '').answer[0]!.replace('\u00a0', ' ')).verdict).toBe('full')
    }
  })
})

describe('a share', () => {
  const drawn = draw(nozzleShare, 'one')
  const right = answer(drawn)

  test('in per cent and from 0 to 1 are the same', () => {
    for (const text of [
      `${(right * 100).toFixed(2)} %`,
      `${(right * 100).toFixed(2)}%`,
      right.toFixed(4),
      `${(right * 100).toFixed(2)} percent`,
    ])
      expect(number(drawn, text)).toMatchObject({ verdict: 'full', marks: 2 })
  })

  test('per cent without the sign is read as it stands, and the factor is said', () => {
    const part = number(drawn, (right * 100).toFixed(2))
    expect(part).toMatchObject({ verdict: 'none', notes: ['Right but for a factor of 100: look at the unit.'] })
    expect(part.readAs).toBe(`read as ${Number((right * 10_000).toPrecision(4))}\u00a0%`)
  })

  test('an absolute tolerance is one in the unit it is written in', () => {
    expect(number(drawn, `${(right + 0.0019).toFixed(6)}`).verdict).toBe('full')
    expect(number(drawn, `${(right + 0.0021).toFixed(6)}`).verdict).toBe('none')
  })
})

describe('several parts', () => {
  const drawn = draw(headToTurns, 'one')
  const { jet, turns, rim } = drawn.answers as { jet: number; turns: number; rim: number }
  const texts = (jet?: number, turns?: number, rim?: number) => ({
    kind: 'parts',
    texts: {
      ...(jet === undefined ? {} : { jet: `${jet.toPrecision(6)} m/s` }),
      ...(turns === undefined ? {} : { turns: `${turns.toPrecision(6)} rev/min` }),
      ...(rim === undefined ? {} : { rim: `${rim.toPrecision(6)} m/s` }),
    },
  })
  const verdicts = (given: unknown) => mark(drawn, given).parts.map(({ verdict }) => verdict)

  test('all right', () => {
    expect(mark(drawn, texts(jet, turns, rim))).toMatchObject({ marks: 3, outOf: 3, mistakes: [] })
    expect(verdicts(texts(jet, turns, rim))).toEqual(['full', 'full', 'full'])
  })

  test('a later part in order on a wrong earlier figure is carried forward, with full marks', () => {
    const result = mark(drawn, texts(1.3 * jet, 1.3 * turns, 1.3 * rim))
    expect(result.parts.map(({ verdict, marks }) => [verdict, marks])).toEqual([
      ['none', 0],
      ['carried-forward', 1],
      ['carried-forward', 1],
    ])
    expect(result.marks).toBe(2)
    // The answer and the working are still the right ones.
    expect(result.parts[1]!.answer[0]).toBe(`${Number(turns.toPrecision(3))}\u00a0rev/min`)
  })

  test('the right figure after a wrong one is right', () => {
    expect(verdicts(texts(1.3 * jet, turns, rim))).toEqual(['none', 'full', 'full'])
  })

  test('a figure that follows from neither earns nothing', () => {
    expect(verdicts(texts(1.3 * jet, 1.7 * turns, 1.9 * rim))).toEqual(['none', 'none', 'none'])
  })

  test('an earlier figure in another unit is carried all the same', () => {
    const given = {
      kind: 'parts',
      texts: { jet: `${((1.3 * jet) / 0.3048).toFixed(3)} ft/s`, turns: `${(1.3 * turns).toFixed(1)} rpm` },
    }
    expect(verdicts(given)).toEqual(['none', 'carried-forward', 'none'])
  })

  test('blank later parts earn nothing and say so; a blank earlier one carries nothing', () => {
    const { parts } = mark(drawn, texts(jet))
    expect(parts.map(({ verdict, problem }) => [verdict, problem])).toEqual([
      ['full', undefined],
      ['none', 'No answer was given.'],
      ['none', 'No answer was given.'],
    ])
    expect(verdicts(texts(undefined, turns, rim))).toEqual(['none', 'full', 'full'])
  })

  test('an earlier text that cannot be read carries nothing', () => {
    const given = { kind: 'parts', texts: { jet: 'fast', turns: `${turns.toFixed(1)} rev/min`, rim: '' } }
    expect(verdicts(given)).toEqual(['none', 'full', 'none'])
  })

  test('a carried figure outside the range of the calculator earns nothing and says why', () => {
    const { parts } = mark(drawn, texts(10_000, 1.3 * turns))
    expect(parts[1]).toMatchObject({ verdict: 'none', marks: 0 })
    expect(parts[1]!.problem).toMatch(/^Your own earlier figure cannot be carried forward: Jet speed must lie between/)
    // The right answer stays right.
    expect(mark(drawn, texts(10_000, turns)).parts[1]).toMatchObject({ verdict: 'full', marks: 1 })
    expect(mark(drawn, texts(10_000, turns)).parts[1]!.problem).toBeUndefined()
  })

  test('a mistake in a first part, and a mistake on a carried figure, are recognised', () => {
    const result = mark(drawn, texts(jet / 2, turns))
    expect(result.parts[0]!.reasons).toEqual(['That is half of it.'])
    expect(result.mistakes).toEqual(['head-to-turns/jet/0'])
    // Twice the speed ratio, on 1.3 times the jet.
    const carried = mark(drawn, texts(1.3 * jet, 2 * 1.3 * turns))
    expect(carried.parts[1]!.reasons).toEqual(['The bucket takes less than half of the jet’s speed.'])
    expect(carried.mistakes).toEqual(['head-to-turns/turns/0'])
  })

  test('a mistake that comes out as the carried figure is carried forward', () => {
    // Half of the jet and the mistaken speed ratio: 0.46 of it again.
    expect(verdicts(texts(2 * jet, 2 * turns))).toEqual(['none', 'carried-forward', 'none'])
  })

  test('marks that do not divide evenly are shared without noise', () => {
    const result = mark(draw({ ...headToTurns, marks: 2 }, 'one'), texts(jet, turns, rim))
    expect(result.marks).toBe(2)
    expect(result.parts.map(({ outOf }) => outOf)).toEqual([0.666667, 0.666667, 0.666667])
  })
})

describe('for every draw, unit and way of writing', () => {
  /** A number that asks for a power in the calculator “power”, to have other quantities than speeds. */
  const power: NumberQuestion = {
    id: 'power-at-the-nozzle',
    kind: 'number',
    calculator: 'power',
    ask: 'hydraulicPower',
    draw: { netHead: { from: '9 m', to: '90 m', step: '1 m' }, flow: { from: '2 L/s', to: '30 L/s', step: '0.5 L/s' } },
    fixed: { efficiency: 0.6 },
    say: '{flow} {netHead}',
    tolerance: { relative: 0.02 },
  }
  const questions = [jetSpeed, nozzleShare, power]
  const unitsOf = (quantity: Quantity) => quantities[quantity].units.map(({ name }) => name)
  const written = (value: number, quantity: Quantity, unit: string) =>
    fc.constantFrom('', ' ', '\u00a0').chain((space) =>
      fc.boolean().map((comma) => {
        const text = fieldText(value, quantity, unit)
        // A comma before three digits can be read two ways and is rightly refused.
        return `${comma && !/\.\d{3}$/.test(text) ? text.replace('.', ',') : text}${unit === '' ? '' : space + unit}`
      }),
    )
  const cases = fc.constantFrom(...questions).chain((question) =>
    fc.record({
      question: fc.constant(question),
      seed: fc.string(),
      unit: fc.constantFrom(...unitsOf(askedOutput(question).quantity)),
    }),
  )
  const runs = { numRuns: process.env.DEEP ? 3000 : 300 }

  test('the right answer with enough digits gets full marks', () => {
    fc.assert(
      fc.property(
        cases.chain(({ question, seed, unit }) => {
          const drawn = draw(question, seed)
          return written(answer(drawn), askedOutput(question).quantity, unit).map((text) => ({ drawn, text }))
        }),
        ({ drawn, text }) => {
          expect([text, number(drawn, text).verdict]).toEqual([text, 'full'])
        },
      ),
      runs,
    )
  })

  test('one that is off by less than the tolerance does too, and one that is off by more never does', () => {
    fc.assert(
      fc.property(
        cases,
        fc.double({ min: 0, max: 0.999, noNaN: true }),
        fc.double({ min: 1.001, max: 50, noNaN: true }),
        fc.constantFrom(-1, 1),
        ({ question, seed, unit }, inside, outside, side) => {
          const drawn = draw(question, seed)
          const { quantity } = askedOutput(question)
          const right = answer(drawn)
          const off = (by: number) => {
            const value = right + side * by * allowance(question.tolerance, right, quantity)
            return number(drawn, `${fieldText(value, quantity, unit)} ${unit}`).verdict
          }
          expect(off(inside)).toBe('full')
          expect(off(outside)).toBe('none')
        },
      ),
      runs,
    )
  })

  test('the answer said after marking is one that would have been marked full', () => {
    fc.assert(
      fc.property(fc.constantFrom(...questions), fc.string(), (question, seed) => {
        const drawn = draw(question, seed)
        const said = number(drawn, '').answer[0]!
        expect(parse(said, askedOutput(question).quantity).ok).toBe(true)
        expect(number(drawn, said).verdict).toBe('full')
      }),
      runs,
    )
  })

  test('a learner who carries their own figure on, however wrong, has the later part’s marks', () => {
    const [, turnsPart] = partsOf(headToTurns)
    fc.assert(
      fc.property(fc.string(), fc.double({ min: 0.2, max: 4, noNaN: true }), (seed, factor) => {
        const drawn = draw(headToTurns, seed)
        const own = Number((drawn.answers.jet! * factor).toPrecision(4))
        const turns = (60 * 0.46 * own) / (Math.PI * drawn.values.pitchDiameter!.value)
        const [, part] = mark(drawn, {
          kind: 'parts',
          texts: { jet: `${own} m/s`, [turnsPart!.id]: `${turns} rev/min` },
        }).parts
        expect(part).toMatchObject({ marks: 1 })
        expect(['full', 'carried-forward']).toContain(part!.verdict)
      }),
      runs,
    )
  })
})
