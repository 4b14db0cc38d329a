import { signUpSchema } from '#api/auth/dto/auth.schema.ts'
import { AccountForm } from './AccountForm.tsx'
import { signUpOptions } from './queries.ts'

export function SignUpForm({ onDone }: { onDone: (email: string) => void }) {
  return (
    <AccountForm
      schema={signUpSchema}
      initial={{ name: '', email: '', password: '' }}
      fields={[
        { name: 'name', label: 'Name', help: 'As it should stand on a certificate.', autoComplete: 'name' },
        { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' },
        {
          name: 'password',
          label: 'Password',
          help: 'At least ten characters. A few words in a row do well.',
          type: 'password',
          autoComplete: 'new-password',
        },
      ]}
      submit="Sign up"
      failure="The account is not made yet."
      mutation={signUpOptions}
      onDone={(_, { email }) => onDone(email)}
    />
  )
}
