import { passwordResetRequestSchema } from '#api/auth/dto/auth.schema.ts'
import { AccountForm } from './AccountForm.tsx'
import { requestPasswordResetOptions } from './queries.ts'

export function ForgottenPasswordForm({ onDone }: { onDone: (email: string) => void }) {
  return (
    <AccountForm
      schema={passwordResetRequestSchema}
      initial={{ email: '' }}
      fields={[{ name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' }]}
      submit="Send the mail"
      failure="The mail is not sent yet."
      mutation={requestPasswordResetOptions}
      onDone={(_, { email }) => onDone(email)}
    />
  )
}
