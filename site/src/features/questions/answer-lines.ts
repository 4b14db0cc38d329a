import type { Answer, QuestionView } from '#api/attempts/dto/attempt.schema.ts'

type Thing = { id: string; say: string }

const sayings = (things: readonly Thing[], ids: readonly string[]) =>
  ids.flatMap((id) => things.find((thing) => thing.id === id)?.say ?? [])

/** What a learner answered, in words, a line each. */
export function answerLines(question: QuestionView, answer: Answer | undefined, part: string): string[] {
  if (!answer) return []
  if (question.kind === 'number' && answer.kind === 'number') return answer.text.trim() ? [answer.text.trim()] : []
  if (question.kind === 'parts' && answer.kind === 'parts') {
    const text = answer.texts[part]?.trim()
    return text ? [text] : []
  }
  if (question.kind === 'choose-one' && answer.kind === 'choose-one') return sayings(question.choices, [answer.choice])
  if (question.kind === 'choose-several' && answer.kind === 'choose-several')
    return sayings(question.choices, answer.choices)
  if (question.kind === 'order' && answer.kind === 'order')
    return sayings(question.items, answer.order).map((say, i) => `${i + 1}. ${say}`)
  if (question.kind === 'match' && answer.kind === 'match')
    return question.left.flatMap(({ id, say }) => {
      const [right] = sayings(question.right, [answer.pairs[id] ?? ''])
      return right === undefined ? [] : [`${say}: ${right}`]
    })
  return []
}
