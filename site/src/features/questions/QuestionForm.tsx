import { Button } from '@radix-ui/themes'
import { useMutation } from '@tanstack/react-query'
import { useId, useState, type FormEvent } from 'react'
import { flushSync } from 'react-dom'
import type { Attempt } from '#api/attempts/dto/attempt.schema.ts'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { lack } from './answers.ts'
import { QuestionFields } from './QuestionFields.tsx'
import { useSubmitAttemptOptions } from './queries.ts'
import { SavedState } from './SavedState.tsx'
import { useDrafts } from './use-drafts.ts'

interface QuestionFormProps {
  attempt: Attempt
  onHandedIn: () => void
}

export function QuestionForm({ attempt, onHandedIn }: QuestionFormProps) {
  const id = useId()
  const { answers, states, write, keepAll } = useDrafts(attempt)
  const submit = useMutation(useSubmitAttemptOptions(attempt, keepAll))
  const [asking, setAsking] = useState(false)

  const questionId = (question: string) => `${id}${question}`
  const open = attempt.questions.flatMap((question, i) => {
    const lacking = lack(question, answers[question.id])
    return lacking === undefined ? [] : [{ id: question.id, number: i + 1, lacking }]
  })

  const handIn = () => submit.mutate(undefined, { onSuccess: onHandedIn })
  const send = (event: FormEvent) => {
    event.preventDefault()
    if (open.length === 0) return handIn()
    flushSync(() => setAsking(true))
    document.getElementById(`${id}open`)?.focus()
  }
  const goTo = (question: string) => {
    const target = document.getElementById(questionId(question))
    target?.scrollIntoView({ block: 'start' })
    target?.querySelector<HTMLElement>('input, select, button')?.focus({ preventScroll: true })
  }

  return (
    <form className="question-form" onSubmit={send} noValidate>
      <ol className="questions">
        {attempt.questions.map((question, i) => (
          <li key={question.id} id={questionId(question.id)}>
            <QuestionFields
              question={question}
              number={i + 1}
              answer={answers[question.id]}
              write={(answer) => write(question.id, answer)}
            />
            <SavedState state={states[question.id]} retry={() => void keepAll().catch(() => undefined)} />
          </li>
        ))}
      </ol>
      {asking && open.length > 0 && (
        <div className="open-questions" id={`${id}open`} tabIndex={-1} role="group" aria-label="Not answered yet">
          <p>
            <strong>Hand in as it stands?</strong> What is not answered earns no marks.
          </p>
          <ul>
            {open.map(({ id, number, lacking }) => (
              <li key={id}>
                <button type="button" className="link-button" onClick={() => goTo(id)}>
                  Question {number} {lacking}
                </button>
              </li>
            ))}
          </ul>
          <div className="actions">
            <Button type="button" size="3" loading={submit.isPending} onClick={handIn}>
              Hand in as it stands
            </Button>
            <Button type="button" size="3" variant="outline" onClick={() => goTo(open[0]!.id)}>
              Go on answering
            </Button>
          </div>
        </div>
      )}
      {submit.isError && (
        <ErrorCallout
          title="It is not handed in yet. Your answers stand here as you wrote them."
          error={submit.error}
        />
      )}
      {!(asking && open.length > 0) && (
        <div className="actions no-print">
          <Button type="submit" size="3" loading={submit.isPending}>
            Hand in
          </Button>
        </div>
      )}
    </form>
  )
}
