import { signInSchema } from '#api/auth/dto/auth.schema.ts'
import { AccountForm } from './AccountForm.tsx'
import { useSignInOptions } from './queries.ts'

export function SignInForm({ onDone }: { onDone: () => void }) {
  return (
    <AccountForm
      schema={signInSchema}
      initial={{ email: '', password: '' }}
      fields={[
        { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' },
        { name: 'password', label: 'Password', type: 'password', autoComplete: 'current-password' },
      ]}
      submit="Sign in"
      failure="You are not signed in."
      mutation={useSignInOptions()}
      onDone={onDone}
    />
  )
}
