import { describe, expect, test } from 'vitest'
import { draw } from './draw.ts'
import type { Question } from './question.ts'
import { everyKind, headToTurns, jetSpeed, shutDown, symptoms, whyHalf } from './questions-for-tests.ts'
import { viewOf } from './view.ts'

const seeds = Array.from({ length: 20 }, (_, i) => `seed ${i}`)

/** Every name and every value in a plain object, at any depth. */
const everything = (value: unknown): { keys: string[]; values: unknown[] } => {
  if (typeof value !== 'object' || value === null) return { keys: [], values: [value] }
  const inner = Object.values(value).map(everything)
  return {
    keys: [...(Array.isArray(value) ? [] : Object.keys(value)), ...inner.flatMap(({ keys }) => keys)],
    values: inner.flatMap(({ values }) => values),
  }
}

const reasonsOf = (value: unknown): string[] =>
  typeof value !== 'object' || value === null
    ? []
    : Object.entries(value).flatMap(([key, inner]) => (key === 'because' ? [String(inner)] : reasonsOf(inner)))

describe.each(everyKind.map((question) => [question.id, question] as const))(
  'the view of %s',
  (_, question: Question) => {
    test('holds no key: no answer, reason, mistake, shuffle, seed or mark of what is right', () => {
      for (const seed of seeds) {
        const drawn = draw(question, seed)
        const { keys, values } = everything(viewOf(drawn))
        for (const key of keys)
          expect([
            'id',
            'kind',
            'say',
            'marks',
            'quantity',
            'units',
            'figures',
            'parts',
            'choices',
            'items',
            'left',
            'right',
          ]).toContain(key)
        // A side of a match is a list called right; no truth value says what is.
        expect(values.filter((value) => typeof value === 'boolean')).toEqual([])
        const said = JSON.stringify(viewOf(drawn))
        for (const reason of reasonsOf(question)) expect(said).not.toContain(reason)
        for (const answer of Object.values(drawn.answers)) {
          expect(values).not.toContain(answer)
          expect(said).not.toContain(answer.toPrecision(4))
        }
      }
    })

    test('fills every hole', () => {
      expect(JSON.stringify(viewOf(draw(question, 'one')))).not.toMatch(/\{[a-zA-Z]+\}/)
    })
  },
)

describe('what is shown', () => {
  test('a number: the text with its values, the units of the quantity, figures and marks', () => {
    const drawn = draw(jetSpeed, 'one')
    const { netHead, standing } = drawn.values
    expect(viewOf(drawn)).toEqual({
      id: 'jet-speed',
      kind: 'number',
      say: `At rest ${standing!.text}, running ${netHead!.text}, and 6.5 L/s flows. How fast is the jet?`,
      quantity: 'velocity',
      units: ['m/s', 'ft/s', 'km/h'],
      figures: 3,
      marks: 1,
    })
  })

  test('the units of the bank go before those of the quantity', () => {
    expect(viewOf(draw({ ...jetSpeed, units: ['m/s'] }, 'one'))).toMatchObject({ units: ['m/s'] })
  })

  test('parts count one each, or share the marks that the question has', () => {
    const marks = (question: Question) => {
      const view = viewOf(draw(question, 'one'))
      return view.kind === 'parts' ? [view.marks, view.parts.map((part) => part.marks)] : []
    }
    expect(marks(headToTurns)).toEqual([3, [1, 1, 1]])
    expect(marks({ ...headToTurns, marks: 6 })).toEqual([6, [2, 2, 2]])
  })

  test('ids tell the place on the page, never the place in the bank', () => {
    const rightFirst = seeds.filter((seed) => {
      const view = viewOf(draw(whyHalf, seed))
      return view.kind === 'choose-one' && view.choices[0]!.say === whyHalf.choices[0]!.say
    })
    expect(rightFirst.length).toBeGreaterThan(0)
    expect(rightFirst.length).toBeLessThan(seeds.length)
    for (const seed of seeds) {
      const view = viewOf(draw(shutDown, seed))
      if (view.kind !== 'order') throw new Error('not an order')
      expect(view.items.map(({ id }) => id)).toEqual(['c1', 'c2', 'c3', 'c4', 'c5'])
      expect(view.items.map(({ say }) => say)).not.toEqual(shutDown.items)
    }
  })

  test('a right side of two pairs is shown once', () => {
    const view = viewOf(draw(symptoms, 'one'))
    if (view.kind !== 'match') throw new Error('not a match')
    expect(view.left).toHaveLength(4)
    expect(view.right.map(({ say }) => say).sort()).toEqual([
      'air in the pipe',
      'the nozzle is blocked',
      'the pipe loses more',
    ])
  })

  test('a text may hold signs that mean something elsewhere', () => {
    expect(viewOf(draw({ ...jetSpeed, say: '$& {netHead} $1 {__proto__}' }, 'one')).say).toMatch(
      /^\$& \d+\u00a0m \$1 \{__proto__\}$/,
    )
  })
})
