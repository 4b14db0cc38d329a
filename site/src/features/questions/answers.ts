import type { Answer, QuestionView } from '#api/attempts/dto/attempt.schema.ts'

export interface NumberText {
  number: string
  unit: string
}

/** "9.5 L/s" as a number and one of the units offered; any other text is left whole. */
export function splitNumber(text: string, units: readonly string[]): NumberText {
  const unit = units.filter((unit) => unit !== '' && text.endsWith(` ${unit}`)).sort((a, b) => b.length - a.length)[0]
  return unit === undefined ? { number: text, unit: '' } : { number: text.slice(0, -unit.length - 1), unit }
}

/** A unit written behind the number goes before the one chosen. */
const hasItsUnit = (number: string) => /[^\d\s.,]\s*$/.test(number)

export const joinNumber = ({ number, unit }: NumberText) =>
  unit === '' || hasItsUnit(number) ? number : `${number} ${unit}`

type NumberAnswer = 'whole' | 'no number' | 'no unit'

const stateOfNumber = (text: string | undefined, units: readonly string[]): NumberAnswer => {
  const { number, unit } = splitNumber(text ?? '', units)
  if (number.trim() === '') return 'no number'
  return unit === '' && !hasItsUnit(number) && !units.includes('') ? 'no unit' : 'whole'
}

/** What an answer still lacks, as the end of "question 3 …"; undefined when it is whole. */
export function lack(question: QuestionView, answer: Answer | undefined): string | undefined {
  const none = 'has no answer'
  if (!answer) return none
  switch (question.kind) {
    case 'number': {
      const state = stateOfNumber(answer.kind === 'number' ? answer.text : '', question.units)
      return { whole: undefined, 'no number': none, 'no unit': 'has a number without a unit' }[state]
    }
    case 'parts': {
      const texts = answer.kind === 'parts' ? answer.texts : {}
      const states = question.parts.map(({ id, units }) => stateOfNumber(texts[id], units))
      if (states.every((state) => state === 'no number')) return none
      if (states.includes('no number')) return 'has a part without an answer'
      return states.includes('no unit') ? 'has a number without a unit' : undefined
    }
    case 'choose-one':
      return answer.kind === 'choose-one' ? undefined : none
    case 'choose-several':
      return answer.kind === 'choose-several' && answer.choices.length > 0 ? undefined : none
    case 'order':
      return answer.kind === 'order' ? undefined : 'is in the order it came in'
    case 'match': {
      const pairs = answer.kind === 'match' ? answer.pairs : {}
      const missing = question.left.filter(({ id }) => !pairs[id]).length
      if (missing === 0) return undefined
      return missing === question.left.length ? none : 'has something without a match'
    }
  }
}
