import { z } from 'zod'
import { userSchema } from '../../users/dto/user.schema.ts'

const email = z.email('Write an address such as name@example.org.').max(254)
const password = z
  .string()
  .min(10, 'Use at least ten characters; a few words in a row are easiest to remember.')
  .max(200, 'Use at most 200 characters.')
const token = z.string().min(1).max(200)

export const signUpSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Write the name you want on your certificate.')
    .max(120, 'Use at most 120 characters.'),
  email,
  password,
})
export type SignUp = z.infer<typeof signUpSchema>

export const signInSchema = z.object({ email, password: z.string().min(1, 'Write your password.').max(200) })
export type SignIn = z.infer<typeof signInSchema>

export const confirmationSchema = z.object({ token })
export type Confirmation = z.infer<typeof confirmationSchema>

export const passwordResetRequestSchema = z.object({ email })
export type PasswordResetRequest = z.infer<typeof passwordResetRequestSchema>

export const passwordResetSchema = z.object({ token, password })
export type PasswordReset = z.infer<typeof passwordResetSchema>

export const sessionSchema = z.object({ user: userSchema })
export type Session = z.infer<typeof sessionSchema>
