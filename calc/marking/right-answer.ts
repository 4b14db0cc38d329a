import { fieldText } from '../units/format.ts'
import { quantities } from '../units/quantities.ts'
import { askedOutput, partsOf } from './calculation.ts'
import { rightSides, type Draw } from './draw.ts'
import type { Answer } from './mark.ts'
import type { Part } from './question.ts'
import { leftId, placeId } from './view.ts'

/** Closer than any tolerance, and as a person would write it. */
const digits = 5

/** The answer that gets full marks, as a learner would give it: for demonstration data, tests and figures. */
export const rightAnswer = ({ question, answers, shuffle }: Draw): Answer => {
  const placeOf = (item: number) => placeId(shuffle.indexOf(item))
  const text = (part: Part) => {
    const { quantity } = askedOutput(part)
    const unit = part.units?.[0] ?? quantities[quantity].units[0]!.name
    return `${fieldText(Number(answers[part.id]!.toPrecision(digits)), quantity, unit)} ${unit}`
  }
  switch (question.kind) {
    case 'number':
      return { kind: 'number', text: text(partsOf(question)[0]!) }
    case 'parts':
      return { kind: 'parts', texts: Object.fromEntries(partsOf(question).map((part) => [part.id, text(part)])) }
    case 'choose-one':
      return { kind: 'choose-one', choice: placeOf(question.choices.findIndex(({ right }) => right)) }
    case 'choose-several':
      return {
        kind: 'choose-several',
        choices: question.choices.flatMap(({ right }, i) => (right ? [placeOf(i)] : [])),
      }
    case 'order':
      return { kind: 'order', order: question.items.map((_, i) => placeOf(i)) }
    case 'match': {
      const sides = rightSides(question.pairs)
      return {
        kind: 'match',
        pairs: Object.fromEntries(question.pairs.map(({ right }, i) => [leftId(i), placeOf(sides.indexOf(right))])),
      }
    }
  }
}
