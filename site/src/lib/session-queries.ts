import { mutationOptions, queryOptions, useQuery, useQueryClient } from '@tanstack/react-query'
import type { Session } from '#api/auth/dto/auth.schema.ts'
import { userSchema } from '#api/users/dto/user.schema.ts'
import { apiClient, nothing } from './api-client.ts'
import { hasCode } from './api-error.ts'

/** The server leaves this cookie beside those of a session, which no script can read. Without it there is nobody to ask for. */
const hasSession = () => document.cookie.split('; ').includes('leatwright_signed_in=1')

export const sessionQueries = {
  /** The person signed in; null when nobody is. */
  me: () =>
    queryOptions({
      queryKey: ['me'],
      queryFn: async () => {
        if (!hasSession()) return null
        try {
          return await apiClient.get('/api/users/me', userSchema)
        } catch (error) {
          if (hasCode(error, 'not-signed-in')) return null
          throw error
        }
      },
    }),
}

export const useMe = () => useQuery(sessionQueries.me())

/** After sign-in everything that was read as a stranger is read again. */
export function useTakeSession() {
  const queryClient = useQueryClient()
  return async ({ user }: Session) => {
    queryClient.setQueryData(sessionQueries.me().queryKey, user)
    await queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'me' })
  }
}

export function useSignOutOptions() {
  const queryClient = useQueryClient()
  return mutationOptions({
    mutationFn: () => apiClient.delete('/api/auth/session', nothing),
    onSuccess: async () => {
      queryClient.setQueryData(sessionQueries.me().queryKey, null)
      await queryClient.resetQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'me' })
    },
  })
}
