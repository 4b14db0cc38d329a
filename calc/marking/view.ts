import type { Quantity } from '../definition.ts'
import { quantities } from '../units/quantities.ts'
import { askedOutput } from './calculation.ts'
import { rightSides, type Draw } from './draw.ts'
import type { Asked, Question } from './question.ts'

/** One thing to choose, to put in its place or to match: its id tells where it stands on the page and nothing else. */
export interface ShownChoice {
  id: string
  say: string
}

interface ShownNumber {
  say: string
  quantity: Quantity
  units: string[]
  figures?: number
  marks: number
}

/** What a learner may see of a drawn question: no answer, no mistake, no reason. */
export type QuestionView =
  | ({ id: string; kind: 'number' } & ShownNumber)
  | { id: string; kind: 'parts'; say: string; marks: number; parts: ({ id: string } & ShownNumber)[] }
  | { id: string; kind: 'choose-one' | 'choose-several'; say: string; marks: number; choices: ShownChoice[] }
  | { id: string; kind: 'order'; say: string; marks: number; items: ShownChoice[] }
  | { id: string; kind: 'match'; say: string; marks: number; left: ShownChoice[]; right: ShownChoice[] }

/** Puts the drawn and the fixed values into the holes of a text. */
export const fillText = (text: string, { question, values }: Draw): string => {
  const fixed = 'fixed' in question ? (question.fixed ?? {}) : {}
  return text.replace(/\{([^}]*)\}/g, (hole, name: string) => {
    if (Object.hasOwn(values, name)) return values[name]!.text
    const value = Object.hasOwn(fixed, name) ? fixed[name] : undefined
    return value === undefined || typeof value === 'object' ? hole : String(value)
  })
}

export const marksOf = (question: Question): number =>
  question.marks ?? (question.kind === 'parts' ? question.parts.length : 1)

/** The id of what stands in a place: c1, c2, … */
export const placeId = (place: number): string => `c${place + 1}`
/** The id of a left side of a match. */
export const leftId = (pair: number): string => `l${pair + 1}`

const shown = (texts: readonly string[], id: (i: number) => string): ShownChoice[] =>
  texts.map((say, i) => ({ id: id(i), say }))

const numberView = (asked: Asked, draw: Draw, marks: number): ShownNumber => {
  const { quantity } = askedOutput(asked)
  return {
    say: fillText(asked.say, draw),
    quantity,
    units: asked.units ?? quantities[quantity].units.map(({ name }) => name),
    ...(asked.figures === undefined ? {} : { figures: asked.figures }),
    marks,
  }
}

/** What the learner sees. */
export const viewOf = (draw: Draw): QuestionView => {
  const { question, shuffle } = draw
  const { id, say } = question
  const marks = marksOf(question)
  switch (question.kind) {
    case 'number':
      return { id, kind: 'number', ...numberView(question, draw, marks) }
    case 'parts': {
      const { parts } = question
      const each = marks / parts.length
      const views = parts.map((part) => ({ id: part.id, ...numberView(part, draw, each) }))
      return { id, kind: 'parts', say: fillText(say, draw), marks, parts: views }
    }
    case 'choose-one':
    case 'choose-several': {
      const texts = shuffle.map((i) => question.choices[i]!.say)
      return { id, kind: question.kind, say, marks, choices: shown(texts, placeId) }
    }
    case 'order':
      return {
        id,
        kind: 'order',
        say,
        marks,
        items: shown(
          shuffle.map((i) => question.items[i]!),
          placeId,
        ),
      }
    case 'match': {
      const right = rightSides(question.pairs)
      return {
        id,
        kind: 'match',
        say,
        marks,
        left: shown(
          question.pairs.map(({ left }) => left),
          leftId,
        ),
        right: shown(
          shuffle.map((i) => right[i]!),
          placeId,
        ),
      }
    }
  }
}
