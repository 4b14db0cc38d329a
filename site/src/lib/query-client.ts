import { QueryClient } from '@tanstack/react-query'
import { ApiError } from './api-error.ts'

/** What a second try may mend: no answer, or a server in trouble. A refusal stays a refusal. */
const mayPass = (error: Error) => error instanceof ApiError && (error.status === 0 || error.status >= 500)

export const createQueryClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: { staleTime: 60_000, retry: (failures, error) => failures < 2 && mayPass(error) },
      mutations: { networkMode: 'always' },
    },
  })
