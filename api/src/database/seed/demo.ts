import { courseList } from '#content/course-list.ts'
import { hashPassword } from '../../auth/passwords.ts'
import type { Transaction } from '../connection.ts'
import { enrolments } from '../schema/courses.ts'
import { users } from '../schema/users.ts'

/** One password for all; a production server refuses to make these accounts. */
export const demoPassword = 'harrowgill-yard'

export const demoAccounts = {
  learner: { name: 'Apprentice One', email: 'apprentice@leatwright.test', role: 'learner' },
  instructor: { name: 'Instructor', email: 'instructor@leatwright.test', role: 'instructor' },
  admin: { name: 'Office', email: 'office@leatwright.test', role: 'admin' },
} as const

/** Harrowgill Training Yard (invented): its people, and the apprentice in every course. */
export async function seedDemo(transaction: Transaction) {
  const passwordHash = await hashPassword(demoPassword)
  const made = await transaction
    .insert(users)
    .values(Object.values(demoAccounts).map((account) => ({ ...account, passwordHash, confirmedAt: new Date() })))
    .returning({ id: users.id, role: users.role })
  const apprentice = made.find((user) => user.role === 'learner')!
  await transaction
    .insert(enrolments)
    .values(courseList.map((course) => ({ userId: apprentice.id, courseSlug: course.slug })))
}
