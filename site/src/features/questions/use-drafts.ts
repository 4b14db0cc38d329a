import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useCallback, useEffect, useRef, useState } from 'react'
import type { Answer, Attempt } from '#api/attempts/dto/attempt.schema.ts'
import { hasCode } from '../../lib/api-error.ts'
import { attemptQueries, useSaveAnswerOptions } from './queries.ts'

/** Long enough that a word is not saved letter by letter. */
const pause = 700

export type DraftState = 'waiting' | 'kept' | { failed: Error }

/**
 * The answers of a round while they are written. The form holds them, since a box that is ticked must stay ticked in the same moment and
 * the query cache tells of changes only a moment later; the cache gets them too, so that they outlast the page that shows them. They
 * follow to the server at a short distance.
 */
export function useDrafts(attempt: Attempt) {
  const queryClient = useQueryClient()
  const { queryKey } = attemptQueries.current(attempt.lesson, attempt.block)
  const { mutateAsync: save } = useMutation(useSaveAnswerOptions(attempt))
  const [answers, setAnswers] = useState(attempt.answers)
  const [states, setStates] = useState<Readonly<Record<string, DraftState>>>({})
  const unsaved = useRef(new Map<string, Answer>())
  const timers = useRef(new Map<string, ReturnType<typeof setTimeout>>())

  const keep = useCallback(
    async (question: string) => {
      const answer = unsaved.current.get(question)
      clearTimeout(timers.current.get(question))
      if (!answer) return
      const isNewest = () => unsaved.current.get(question) === answer
      const tell = (state: DraftState) => setStates((states) => ({ ...states, [question]: state }))
      try {
        await save({ question, answer })
        if (!isNewest()) return
        unsaved.current.delete(question)
        tell('kept')
      } catch (error) {
        // Handed in elsewhere: what stands on the server is the result now.
        if (hasCode(error, 'conflict')) void queryClient.invalidateQueries({ queryKey: attemptQueries.all() })
        if (isNewest()) tell({ failed: error as Error })
        throw error
      }
    },
    [save, queryClient],
  )

  const keepAll = useCallback(async () => {
    await Promise.all([...unsaved.current.keys()].map(keep))
  }, [keep])

  const write = (question: string, answer: Answer) => {
    setAnswers((answers) => ({ ...answers, [question]: answer }))
    queryClient.setQueryData(
      queryKey,
      (round) => round && { ...round, answers: { ...round.answers, [question]: answer } },
    )
    unsaved.current.set(question, answer)
    setStates((states) => ({ ...states, [question]: 'waiting' }))
    clearTimeout(timers.current.get(question))
    timers.current.set(
      question,
      setTimeout(() => void keep(question).catch(() => undefined), pause),
    )
  }

  // Whoever leaves the page, or turns to another program, has not to wait for the pause.
  useEffect(() => {
    const keepNow = () => void keepAll().catch(() => undefined)
    const whenHidden = () => document.visibilityState === 'hidden' && keepNow()
    document.addEventListener('visibilitychange', whenHidden)
    return () => {
      document.removeEventListener('visibilitychange', whenHidden)
      keepNow()
    }
  }, [keepAll])

  return { answers, states, write, keepAll }
}
