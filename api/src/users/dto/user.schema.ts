import { z } from 'zod'

export const roleSchema = z.enum(['learner', 'instructor', 'admin'])
export type Role = z.infer<typeof roleSchema>

export const userSchema = z.object({
  id: z.uuid(),
  email: z.email(),
  name: z.string(),
  role: roleSchema,
})
export type User = z.infer<typeof userSchema>
