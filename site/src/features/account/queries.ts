import { mutationOptions } from '@tanstack/react-query'
import {
  sessionSchema,
  type Confirmation,
  type PasswordReset,
  type PasswordResetRequest,
  type SignIn,
  type SignUp,
} from '#api/auth/dto/auth.schema.ts'
import { apiClient, nothing } from '../../lib/api-client.ts'
import { useTakeSession } from '../../lib/session-queries.ts'

export const signUpOptions = mutationOptions({
  mutationFn: (form: SignUp) => apiClient.post('/api/auth/sign-up', form, nothing),
})

export const requestPasswordResetOptions = mutationOptions({
  mutationFn: (form: PasswordResetRequest) => apiClient.post('/api/auth/password-reset-requests', form, nothing),
})

export function useSignInOptions() {
  const takeSession = useTakeSession()
  return mutationOptions({
    mutationFn: (form: SignIn) => apiClient.post('/api/auth/session', form, sessionSchema),
    onSuccess: takeSession,
  })
}

export function useConfirmationOptions() {
  const takeSession = useTakeSession()
  return mutationOptions({
    mutationFn: (form: Confirmation) => apiClient.post('/api/auth/confirmation', form, sessionSchema),
    onSuccess: takeSession,
  })
}

export function useResetPasswordOptions() {
  const takeSession = useTakeSession()
  return mutationOptions({
    mutationFn: (form: PasswordReset) => apiClient.post('/api/auth/password-resets', form, sessionSchema),
    onSuccess: takeSession,
  })
}
