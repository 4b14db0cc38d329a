import { useId } from 'react'
import type { Answer, QuestionView } from '#api/attempts/dto/attempt.schema.ts'
import { ChoiceFields } from './ChoiceFields.tsx'
import { MatchFields } from './MatchFields.tsx'
import { NumberField } from './NumberField.tsx'
import { OrderField } from './OrderField.tsx'

export const marksWords = (marks: number) => `${marks} ${marks === 1 ? 'mark' : 'marks'}`

interface QuestionFieldsProps {
  question: QuestionView
  number: number
  answer: Answer | undefined
  write: (answer: Answer) => void
}

/** One question: what is asked, and the fields of its kind. */
export function QuestionFields({ question, number, answer, write }: QuestionFieldsProps) {
  const id = useId()
  return (
    <div role="group" aria-labelledby={`${id}number ${id}say`}>
      <h4 id={`${id}number`}>
        Question {number} <small>{marksWords(question.marks)}</small>
      </h4>
      <p id={`${id}say`} className="question-say">
        {question.say}
      </p>
      <Fields question={question} answer={answer} write={write} />
    </div>
  )
}

function Fields({ question, answer, write }: Omit<QuestionFieldsProps, 'number'>) {
  switch (question.kind) {
    case 'number':
      return (
        <NumberField
          field={question}
          label="Your answer"
          text={answer?.kind === 'number' ? answer.text : ''}
          write={(text) => write({ kind: 'number', text })}
        />
      )
    case 'parts': {
      const texts = answer?.kind === 'parts' ? answer.texts : {}
      return (
        <ol className="question-parts">
          {question.parts.map((part) => (
            <li key={part.id}>
              <NumberField
                field={part}
                label={part.say}
                text={texts[part.id] ?? ''}
                write={(text) => write({ kind: 'parts', texts: { ...texts, [part.id]: text } })}
              />
            </li>
          ))}
        </ol>
      )
    }
    case 'choose-one':
      return (
        <ChoiceFields
          choices={question.choices}
          chosen={answer?.kind === 'choose-one' ? [answer.choice] : []}
          choose={(choice) => write({ kind: 'choose-one', choice })}
        />
      )
    case 'choose-several': {
      const chosen = answer?.kind === 'choose-several' ? answer.choices : []
      return (
        <ChoiceFields
          several
          choices={question.choices}
          chosen={chosen}
          choose={(choice) =>
            write({
              kind: 'choose-several',
              choices: chosen.includes(choice) ? chosen.filter((id) => id !== choice) : [...chosen, choice],
            })
          }
        />
      )
    }
    case 'order':
      return (
        <OrderField
          items={question.items}
          order={answer?.kind === 'order' ? answer.order : undefined}
          write={(order) => write({ kind: 'order', order })}
        />
      )
    case 'match':
      return (
        <MatchFields
          left={question.left}
          right={question.right}
          pairs={answer?.kind === 'match' ? answer.pairs : {}}
          write={(pairs) => write({ kind: 'match', pairs })}
        />
      )
  }
}
