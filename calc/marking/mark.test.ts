import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { mark } from './mark.ts'
import { draw } from './draw.ts'
import type { Question } from './question.ts'
import { everyKind, shutDown, symptoms, whatHurts, whyHalf } from './questions-for-tests.ts'
import { viewOf } from './view.ts'

const shownIds = (question: Question, seed: string): Map<string, string> => {
  const view = viewOf(draw(question, seed))
  const shown = 'choices' in view ? view.choices : 'items' in view ? view.items : 'right' in view ? view.right : []
  return new Map(shown.map(({ id, say }) => [say, id]))
}
/** Marks what is given by its words. */
const markWords = (question: Question, answerOf: (id: (words: string) => string) => unknown, seed = 'one') => {
  const ids = shownIds(question, seed)
  return mark(
    draw(question, seed),
    answerOf((words) => ids.get(words)!),
  )
}

describe('choose one', () => {
  const choose = (words: string) => markWords(whyHalf, (id) => ({ kind: 'choose-one', choice: id(words) }))

  test('the right one', () => {
    expect(choose('There the water leaves with hardly any speed.')).toEqual({
      marks: 1,
      outOf: 1,
      parts: [
        {
          id: 'answer',
          verdict: 'full',
          marks: 1,
          outOf: 1,
          reasons: [],
          notes: [],
          answer: ['There the water leaves with hardly any speed.'],
          working: [],
        },
      ],
      mistakes: [],
    })
  })

  test('a wrong one brings its reason', () => {
    const { marks, parts, mistakes } = choose('There the push is hardest.')
    expect(marks).toBe(0)
    expect(parts[0]).toMatchObject({ verdict: 'none', reasons: ['The push is hardest on a bucket that stands still.'] })
    expect(mistakes).toEqual(['why-half/choice/2'])
  })
})

describe('choose several', () => {
  const choose = (...words: string[]) =>
    markWords(whatHurts, (id) => ({ kind: 'choose-several', choices: words.map(id) }))
  const [jet, stones, colour, hand] = whatHurts.choices.map(({ say }) => say) as [string, string, string, string]

  test.each<[string, string[], number, string]>([
    ['all right ones and no other', [stones, jet], 1, 'full'],
    ['one of two', [jet], 0.5, 'partial'],
    ['a wrong one takes a right one away', [jet, stones, colour], 0.5, 'partial'],
    ['one right and one wrong', [jet, hand], 0, 'none'],
    ['never under nothing', [colour, hand], 0, 'none'],
    ['everything', [jet, stones, colour, hand], 0, 'none'],
    ['the same one twice counts once', [jet, jet], 0.5, 'partial'],
  ])('%s', (_, words, marks, verdict) => {
    const result = choose(...words)
    expect(result.marks).toBe(marks)
    expect(result.parts[0]!.verdict).toBe(verdict)
  })

  test('reasons of the wrong ones, and how many were left out', () => {
    const { parts, mistakes } = choose(jet, colour)
    expect(parts[0]!.reasons).toEqual(['Colour hurts nobody.'])
    expect(parts[0]!.notes).toEqual(['One right choice was left out.'])
    expect(mistakes).toEqual(['what-hurts/choice/2'])
  })
})

describe('put in order', () => {
  const order = (places: number[]) =>
    markWords(shutDown, (id) => ({ kind: 'order', order: places.map((place) => id(shutDown.items[place]!)) }))

  test.each<[string, number[], number, string]>([
    ['right', [0, 1, 2, 3, 4], 1, 'full'],
    ['the first put last: three neighbours of four', [1, 2, 3, 4, 0], 0.7, 'partial'],
    ['two changed: one neighbour of four', [0, 1, 3, 2, 4], 0.2, 'partial'],
    ['turned round', [4, 3, 2, 1, 0], 0, 'none'],
    ['only a piece of it', [0, 1], 0.2, 'partial'],
  ])('%s', (_, places, marks, verdict) => {
    const result = order(places)
    expect(result.marks).toBe(marks)
    expect(result.parts[0]!.verdict).toBe(verdict)
    expect(result.parts[0]!.answer).toEqual(shutDown.items)
    expect(result.parts[0]!.reasons).toEqual(verdict === 'full' ? [] : ['Water goes first, and slowly.'])
    expect(result.mistakes).toEqual(verdict === 'full' ? [] : ['shut-down/order'])
  })
})

describe('match', () => {
  const match = (rights: (string | undefined)[]) =>
    markWords(symptoms, (id) => ({
      kind: 'match',
      pairs: Object.fromEntries(rights.flatMap((words, i) => (words === undefined ? [] : [[`l${i + 1}`, id(words)]]))),
    }))

  test('all right, two lefts having the same right', () => {
    expect(match(symptoms.pairs.map(({ right }) => right))).toMatchObject({
      marks: 3,
      parts: [{ verdict: 'full' }],
      mistakes: [],
    })
  })

  test('each right pair has its share, each wrong one its reason; what is left open has none', () => {
    const { marks, parts, mistakes } = match([
      'the nozzle is blocked',
      'the nozzle is blocked',
      'air in the pipe',
      undefined,
    ])
    expect(marks).toBe(1.5)
    expect(parts[0]).toMatchObject({ verdict: 'partial', reasons: ['Both fall when less head arrives.'] })
    expect(parts[0]!.answer[0]).toBe('running low, power low: the pipe loses more')
    expect(mistakes).toEqual(['symptoms/pair/0'])
  })
})

describe('whatever an answer holds', () => {
  test.each(everyKind.map((question) => [question.id, question] as const))(
    '%s: nothing at all earns nothing and says so',
    (_, question) => {
      for (const nothing of [undefined, null, '', 3, [], {}, { kind: question.kind }, { kind: 'other' }]) {
        const { marks, parts, mistakes } = mark(draw(question, 'one'), nothing)
        expect(marks).toBe(0)
        expect(mistakes).toEqual([])
        for (const part of parts) expect(part).toMatchObject({ verdict: 'none', problem: 'No answer was given.' })
      }
    },
  )

  test.each(everyKind.map((question) => [question.id, question] as const))(
    '%s: an answer of another kind earns nothing',
    (_, question) => {
      const answers = [
        { kind: 'number', text: '27 m/s' },
        { kind: 'parts', texts: { jet: '27 m/s' } },
        { kind: 'choose-one', choice: 'c1' },
        { kind: 'choose-several', choices: ['c1'] },
        { kind: 'order', order: ['c1'] },
        { kind: 'match', pairs: { l1: 'c1' } },
      ]
      for (const answer of answers.filter(({ kind }) => kind !== question.kind))
        expect(mark(draw(question, 'one'), answer).marks).toBe(0)
    },
  )

  test('it never throws, and the marks lie between nothing and all', () => {
    const odd = fc.constantFrom('__proto__', 'constructor', 'toString', 'length', 'c1', 'c2', 'l1', 'answer', 'jet', '')
    const text = fc.oneof(
      odd,
      fc.string(),
      fc.string({ unit: 'binary', maxLength: 300 }),
      fc.constantFrom('1e999 m/s', '-1e308', '0', 'NaN', 'Infinity m/s', '9'.repeat(100_000), '1 m^1e9', '1e-320 m/s'),
    )
    const answer = fc.oneof(
      fc.anything(),
      fc.record({
        kind: fc.constantFrom(...everyKind.map(({ kind }) => kind)),
        text,
        texts: fc.dictionary(odd, fc.oneof(text, fc.anything())),
        choice: fc.oneof(text, fc.anything()),
        choices: fc.array(fc.oneof(text, fc.anything())),
        order: fc.array(odd),
        pairs: fc.dictionary(odd, odd),
      }),
    )
    const drawn = everyKind.map((question) => draw(question, 'one'))
    fc.assert(
      fc.property(fc.constantFrom(...drawn), answer, (one, given) => {
        const { marks, outOf } = mark(one, given)
        expect(marks).toBeGreaterThanOrEqual(0)
        expect(marks).toBeLessThanOrEqual(outOf)
      }),
      { numRuns: process.env.DEEP ? 5000 : 500 },
    )
  })

  test('a draw that was kept in a database marks alike', () => {
    const drawn = draw(whyHalf, 'one')
    const kept = JSON.parse(JSON.stringify(drawn)) as typeof drawn
    const answer = { kind: 'choose-one', choice: 'c2' }
    expect(mark(kept, answer)).toEqual(mark(drawn, answer))
  })
})
