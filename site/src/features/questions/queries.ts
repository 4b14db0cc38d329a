import { mutationOptions, queryOptions, useQueryClient } from '@tanstack/react-query'
import {
  attemptSchema,
  type Answer,
  type Attempt,
  type SaveAnswer,
  type StartAttempt,
} from '#api/attempts/dto/attempt.schema.ts'
import { apiClient, nothing } from '../../lib/api-client.ts'
import { courseQueries } from '../../lib/course-queries.ts'

const start = (lesson: string, body: StartAttempt) =>
  apiClient.post(`/api/lessons/${lesson}/attempts`, body, attemptSchema)

export const attemptQueries = {
  all: () => ['attempts'] as const,
  /** The round that stands for a block: drawn the first time it is asked for, the same one afterwards. */
  current: (lesson: string, block: string) =>
    queryOptions({
      queryKey: [...attemptQueries.all(), lesson, block],
      queryFn: () => start(lesson, { block, again: false }),
      // What is written in it is kept here first, and stays here while it cannot be saved.
      staleTime: Infinity,
      gcTime: Infinity,
    }),
}

/** Another round of the same block. */
export function useStartAttemptOptions(lesson: string, block: string) {
  const queryClient = useQueryClient()
  return mutationOptions({
    mutationFn: () => start(lesson, { block, again: true }),
    onSuccess: (attempt) => queryClient.setQueryData(attemptQueries.current(lesson, block).queryKey, attempt),
  })
}

/** Keeps one answer as a draft. Saves of one round go out one after the other, so that the last one written is the one kept. */
export function useSaveAnswerOptions({ id }: Attempt) {
  return mutationOptions({
    scope: { id: `answers of ${id}` },
    mutationFn: ({ question, answer }: { question: string; answer: Answer }) =>
      apiClient.put(`/api/attempts/${id}/answers/${question}`, { answer } satisfies SaveAnswer, nothing),
  })
}

/** Hands a round in; `keepAll` saves first what is not saved yet. */
export function useSubmitAttemptOptions({ id, lesson, block }: Attempt, keepAll: () => Promise<void>) {
  const queryClient = useQueryClient()
  return mutationOptions({
    mutationFn: async () => {
      await keepAll()
      return apiClient.post(`/api/attempts/${id}/submission`, undefined, attemptSchema)
    },
    onSuccess: (attempt) => {
      queryClient.setQueryData(attemptQueries.current(lesson, block).queryKey, attempt)
      // The lesson may count as done now.
      void queryClient.invalidateQueries({ queryKey: courseQueries.all() })
    },
  })
}
