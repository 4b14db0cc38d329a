import { lazy, Suspense, useState } from 'react'
import type { Attempt } from '#api/attempts/dto/attempt.schema.ts'
import { QuestionForm } from './QuestionForm.tsx'

/** The working that a result shows brings the arithmetic with it; nobody needs that before handing in. */
const RoundResult = lazy(() => import('./RoundResult.tsx'))

interface RoundProps {
  attempt: Attempt
  /** Another round stands in place of this one. */
  onAgain: () => void
}

/** One round of a block: its questions until it is handed in, its result from then on. */
export function Round({ attempt, onAgain }: RoundProps) {
  const [handedInHere, setHandedInHere] = useState(false)
  if (!attempt.result) return <QuestionForm attempt={attempt} onHandedIn={() => setHandedInHere(true)} />
  return (
    <Suspense fallback={<p role="status">The result is on its way.</p>}>
      <RoundResult attempt={attempt} result={attempt.result} takeFocus={handedInHere} onAgain={onAgain} />
    </Suspense>
  )
}
