import { zodResolver } from '@hookform/resolvers/zod'
import { Button, TextField } from '@radix-ui/themes'
import { useMutation, type UseMutationOptions } from '@tanstack/react-query'
import { useId } from 'react'
import { useForm, type DefaultValues, type FieldErrors, type FieldValues, type Path } from 'react-hook-form'
import type { z } from 'zod'
import { UntilReady } from '../../components/UntilReady.tsx'
import { ErrorCallout } from '../../components/ErrorCallout.tsx'
import { ApiError } from '../../lib/api-error.ts'
import './account.css'

export interface AccountField<T extends FieldValues> {
  name: Path<T>
  label: string
  help?: string
  type?: 'text' | 'email' | 'password'
  autoComplete: string
}

interface AccountFormProps<T extends FieldValues, Answer> {
  schema: z.ZodType<T, T>
  fields: readonly AccountField<T>[]
  initial: DefaultValues<T>
  submit: string
  failure: string
  mutation: UseMutationOptions<Answer, Error, T>
  onDone: (answer: Answer, form: T) => void
}

/** A form whose rules are the server's own schema. What is wrong is said beside its field, whoever found it. */
export function AccountForm<T extends FieldValues, Answer>(props: AccountFormProps<T, Answer>) {
  const { schema, fields, initial, submit, failure, mutation: options, onDone } = props
  const mutation = useMutation(options)
  const { register, handleSubmit, setError, formState } = useForm<T>({
    resolver: zodResolver(schema),
    defaultValues: initial,
  })

  const send = (form: T) =>
    mutation.mutate(form, {
      onSuccess: (answer) => onDone(answer, form),
      onError: (error) => {
        if (!(error instanceof ApiError)) return
        error.fields
          .filter(({ field }) => fields.some(({ name }) => name === field))
          .forEach(({ field, message }, position) =>
            setError(field as Path<T>, { type: 'server', message }, { shouldFocus: position === 0 }),
          )
      },
    })

  return (
    <form className="account-form" noValidate onSubmit={(event) => void handleSubmit(send)(event)}>
      <UntilReady>
        {fields.map((field) => (
          <Field key={field.name} field={field} errors={formState.errors} input={register(field.name)} />
        ))}
        {mutation.isError && <ErrorCallout title={failure} error={mutation.error} />}
        <Button type="submit" size="3" loading={mutation.isPending}>
          {submit}
        </Button>
      </UntilReady>
    </form>
  )
}

interface FieldProps<T extends FieldValues> {
  field: AccountField<T>
  errors: FieldErrors<T>
  input: ReturnType<ReturnType<typeof useForm<T>>['register']>
}

function Field<T extends FieldValues>({ field, errors, input }: FieldProps<T>) {
  const id = useId()
  const error = errors[field.name]?.message as string | undefined
  return (
    <div className="account-field">
      <label htmlFor={id}>{field.label}</label>
      {field.help && <p id={`${id}-help`}>{field.help}</p>}
      <TextField.Root
        id={id}
        size="3"
        type={field.type ?? 'text'}
        autoComplete={field.autoComplete}
        aria-invalid={error ? true : undefined}
        aria-describedby={[field.help && `${id}-help`, error && `${id}-error`].filter(Boolean).join(' ') || undefined}
        {...input}
      />
      {error && (
        <p id={`${id}-error`} className="account-field-error" role="alert">
          {error}
        </p>
      )}
    </div>
  )
}
