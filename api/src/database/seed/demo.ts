import { draw } from '#calc/marking/draw.ts'
import { rightAnswer } from '#calc/marking/right-answer.ts'
import { courseList } from '#content/course-list.ts'
import type { School } from '#content/school.ts'
import { markRound } from '../../attempts/mark-round.ts'
import { hashPassword } from '../../auth/passwords.ts'
import type { Transaction } from '../connection.ts'
import { attempts } from '../schema/attempts.ts'
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
export async function seedDemo(transaction: Transaction, school: School) {
  const passwordHash = await hashPassword(demoPassword)
  const made = await transaction
    .insert(users)
    .values(Object.values(demoAccounts).map((account) => ({ ...account, passwordHash, confirmedAt: new Date() })))
    .returning({ id: users.id, role: users.role })
  const apprentice = made.find((user) => user.role === 'learner')!
  await transaction
    .insert(enrolments)
    .values(courseList.map((course) => ({ userId: apprentice.id, courseSlug: course.slug })))
  await transaction.insert(attempts).values(halfWay(school).map((round) => ({ ...round, userId: apprentice.id })))
}

/** Every second open lesson handed in, all of it right but the last question of each block. */
function halfWay(school: School): Omit<typeof attempts.$inferInsert, 'userId'>[] {
  return [...school.values()]
    .filter((_, i) => i % 2 === 0)
    .flatMap(({ slug, blocks, bank }) =>
      blocks.map(({ name, questions: ids }) => {
        const questions = ids.map((id) =>
          draw(
            bank.find((question) => question.id === id)!,
            `demo ${slug} ${name}`,
          ),
        )
        const answers = Object.fromEntries(questions.slice(0, -1).map((one) => [one.question.id, rightAnswer(one)]))
        const result = markRound({ questions, answers })
        const { marks, outOf, passed } = result
        return {
          lesson: slug,
          block: name,
          round: 1,
          questions,
          answers,
          result,
          marks,
          outOf,
          passed,
          submittedAt: new Date(),
        }
      }),
    )
}
