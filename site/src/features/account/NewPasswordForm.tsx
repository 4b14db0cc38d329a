import { passwordResetSchema } from '#api/auth/dto/auth.schema.ts'
import { AccountForm } from './AccountForm.tsx'
import { useResetPasswordOptions } from './queries.ts'

export function NewPasswordForm({ token, onDone }: { token: string; onDone: () => void }) {
  return (
    <AccountForm
      schema={passwordResetSchema}
      initial={{ token, password: '' }}
      fields={[
        {
          name: 'password',
          label: 'New password',
          help: 'At least ten characters. A few words in a row do well.',
          type: 'password',
          autoComplete: 'new-password',
        },
      ]}
      submit="Keep this password"
      failure="The password is not changed."
      mutation={useResetPasswordOptions()}
      onDone={onDone}
    />
  )
}
