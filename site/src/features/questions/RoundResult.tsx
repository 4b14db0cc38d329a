import { Button } from '@radix-ui/themes'
import { useMutation } from '@tanstack/react-query'
import { useEffect, useId, useRef } from 'react'
import type { Attempt, AttemptResult, PartResult, QuestionView } from '#api/attempts/dto/attempt.schema.ts'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { Working } from '../../components/Working.tsx'
import { answerLines } from './answer-lines.ts'
import { useStartAttemptOptions } from './queries.ts'

const number = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 2 })
const share = new Intl.NumberFormat('en-GB', { style: 'percent', maximumFractionDigits: 0 })

interface RoundResultProps {
  attempt: Attempt
  result: AttemptResult
  /** After handing in, the result is where reading goes on. */
  takeFocus: boolean
  onAgain: () => void
}

/** What a round earned, and why, question by question. */
export default function RoundResult({ attempt, result, takeFocus, onAgain }: RoundResultProps) {
  const summary = useRef<HTMLDivElement>(null)
  const again = useMutation(useStartAttemptOptions(attempt.lesson, attempt.block))
  useEffect(() => {
    if (takeFocus) summary.current?.focus()
  }, [takeFocus])

  // The new round takes this result's place: what comes after must not hang on it.
  const drawAgain = () => void again.mutateAsync().then(onAgain, () => undefined)

  return (
    <div className="round-result">
      <div className="result-summary" ref={summary} tabIndex={-1} role="group" aria-label="Result">
        <p className="result-marks">
          {number.format(result.marks)} of {number.format(result.outOf)} marks{' '}
          <small>{share.format(result.outOf === 0 ? 0 : result.marks / result.outOf)}</small>
        </p>
        <p>
          {result.passed
            ? '✓ That is enough: these questions count as done.'
            : 'Not there yet: these questions count as done from 60 %. Read why below, then take another round.'}
        </p>
      </div>
      <ol className="questions">
        {attempt.questions.map((question, i) => (
          <li key={question.id}>
            <QuestionResult question={question} position={i + 1} attempt={attempt} result={result} />
          </li>
        ))}
      </ol>
      {again.isError && <ErrorCallout title="There is no new round yet." error={again.error} retry={drawAgain} />}
      <div className="actions no-print">
        <Button size="3" variant={result.passed ? 'outline' : 'solid'} loading={again.isPending} onClick={drawAgain}>
          Another round, other numbers
        </Button>
      </div>
    </div>
  )
}

interface QuestionResultProps {
  question: QuestionView
  position: number
  attempt: Attempt
  result: AttemptResult
}

function QuestionResult({ question, position, attempt, result }: QuestionResultProps) {
  const marked = result.questions[question.id]
  return (
    <>
      <h4>
        Question {position}{' '}
        {marked && (
          <small>
            {number.format(marked.marks)} of {number.format(marked.outOf)}
          </small>
        )}
      </h4>
      <p className="question-say">{question.say}</p>
      {marked?.parts.map((part) => (
        <PartView
          key={part.id}
          part={part}
          say={question.kind === 'parts' ? question.parts.find(({ id }) => id === part.id)?.say : undefined}
          given={answerLines(question, attempt.answers[question.id], part.id)}
        />
      ))}
    </>
  )
}

const verdictOf = ({ verdict, marks }: PartResult) => {
  if (verdict === 'full') return { className: 'verdict-full', words: '✓ Full marks' }
  if (verdict === 'carried-forward') return { className: 'verdict-carried', words: '✓ Full marks, carried forward' }
  return verdict === 'partial'
    ? { className: 'verdict-part', words: `Partly right: ${number.format(marks)} marks` }
    : { className: 'verdict-none', words: '✗ No marks' }
}

interface PartViewProps {
  part: PartResult
  /** What this part asks, of a question in parts. */
  say: string | undefined
  given: readonly string[]
}

function PartView({ part, say, given }: PartViewProps) {
  const id = useId()
  const { className, words } = verdictOf(part)
  return (
    <div className={`part-result ${className}`} role="group" aria-labelledby={`${id}verdict`}>
      {say && <p className="part-say">{say}</p>}
      <p className="verdict" id={`${id}verdict`}>
        {words}
      </p>
      {part.verdict === 'carried-forward' && (
        <p>The method is right. It worked on a figure from above that was not, and that has cost its marks already.</p>
      )}
      <dl>
        <div>
          <dt>Your answer</dt>
          <dd>
            <Lines lines={given.length > 0 ? given : ['none']} />
            {part.readAs && <span className="quiet">{part.readAs}</span>}
          </dd>
        </div>
        {part.verdict !== 'full' && part.answer.length > 0 && (
          <div>
            <dt>Right answer</dt>
            <dd>
              <Lines lines={part.answer} />
            </dd>
          </div>
        )}
      </dl>
      {part.problem && <p>{part.problem}</p>}
      {part.reasons.map((reason) => (
        <p key={reason} className="reason">
          {reason}
        </p>
      ))}
      {part.notes.map((note) => (
        <p key={note} className="quiet">
          {note}
        </p>
      ))}
      {part.working.length > 0 && (
        <details open={part.verdict === 'none'}>
          <summary>The working, with your numbers</summary>
          <Working steps={part.working} />
        </details>
      )}
    </div>
  )
}

const Lines = ({ lines }: { lines: readonly string[] }) =>
  lines.map((line) => (
    <span key={line} className="answer-line">
      {line}
    </span>
  ))
