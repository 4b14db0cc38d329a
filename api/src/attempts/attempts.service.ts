import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { and, desc, eq, isNull, sql } from 'drizzle-orm'
import { draw } from '#calc/marking/draw.ts'
import type { Question } from '#calc/marking/question.ts'
import { viewOf } from '#calc/marking/view.ts'
import type { School } from '#content/school.ts'
import { Refusal } from '../common/refusal.ts'
import type { Environment } from '../config/environment.ts'
import type { Database } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { attempts, type AttemptRow } from '../database/schema/attempts.ts'
import { enrolments } from '../database/schema/courses.ts'
import { InjectSchool } from '../school/school.module.ts'
import type { User } from '../users/dto/user.schema.ts'
import type { Answer, Attempt, StartAttempt } from './dto/attempt.schema.ts'
import { markRound } from './mark-round.ts'

@Injectable()
export class AttemptsService {
  constructor(
    @InjectDatabase() private readonly database: Database,
    @InjectSchool() private readonly school: School,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  /** The round that is going on, or the last one; `again` draws a new one once the last was handed in. */
  async start(slug: string, { block, again }: StartAttempt, user: User): Promise<Attempt> {
    const questions = await this.questionsOf(slug, block, user)
    const last = await this.lastRound(slug, block, user)
    if (last && !(again && last.submittedAt)) return asAttempt(last)
    const round = (last?.round ?? 0) + 1
    await this.database
      .insert(attempts)
      .values({
        userId: user.id,
        lesson: slug,
        block,
        round,
        questions: this.drawRound(questions, { slug, block, round, user }),
      })
      // Two pages that open at once share one round.
      .onConflictDoNothing()
    return asAttempt((await this.lastRound(slug, block, user))!)
  }

  async one(id: string, user: User): Promise<Attempt> {
    return asAttempt(await this.owned(this.database, id, user))
  }

  /** Keeps an answer as it stands; a round that was handed in takes no more. */
  async saveAnswer(id: string, questionId: string, answer: Answer, user: User): Promise<void> {
    const attempt = await this.owned(this.database, id, user)
    const question = attempt.questions.find((one) => one.question.id === questionId)
    if (!question) throw new Refusal('not-found', 'This round has no such question.')
    if (question.question.kind !== answer.kind)
      throw new Refusal('invalid', `An answer of the kind “${question.question.kind}” is wanted.`)
    const saved = await this.database
      .update(attempts)
      .set({ answers: sql`${attempts.answers} || ${JSON.stringify({ [questionId]: answer })}::jsonb` })
      .where(and(eq(attempts.id, id), eq(attempts.userId, user.id), isNull(attempts.submittedAt)))
      .returning({ id: attempts.id })
    if (saved.length === 0) throw new Refusal('conflict', 'This round was handed in already; its answers stand.')
  }

  /** Marks the round, once: a second hand-in gets the first one's result. */
  submit(id: string, user: User): Promise<Attempt> {
    return this.database.transaction(async (transaction) => {
      const attempt = await this.owned(transaction, id, user, 'update')
      if (attempt.submittedAt) return asAttempt(attempt)
      const result = markRound(attempt)
      const [row] = await transaction
        .update(attempts)
        .set({ result, marks: result.marks, outOf: result.outOf, passed: result.passed, submittedAt: new Date() })
        .where(eq(attempts.id, id))
        .returning()
      return asAttempt(row!)
    })
  }

  private async questionsOf(slug: string, block: string, user: User): Promise<Question[]> {
    const lesson = this.school.get(slug)
    const names = lesson?.blocks.find(({ name }) => name === block)?.questions
    if (!lesson || !names) throw new Refusal('not-found', 'There are no such questions.')
    const [place] = await this.database
      .select({ slug: enrolments.courseSlug })
      .from(enrolments)
      .where(and(eq(enrolments.userId, user.id), eq(enrolments.courseSlug, lesson.course)))
    if (!place) throw new Refusal('not-enrolled', 'Enrol in the course to answer its questions.')
    return names.map((name) => lesson.bank.find(({ id }) => id === name)!)
  }

  private drawRound(questions: readonly Question[], of: { slug: string; block: string; round: number; user: User }) {
    const fixed = this.config.get('DRAW_SEED', { infer: true })
    const seed = fixed === undefined ? randomUUID() : [fixed, of.user.email, of.slug, of.block, of.round].join(' ')
    return questions.map((question) => draw(question, seed))
  }

  private async lastRound(slug: string, block: string, user: User): Promise<AttemptRow | undefined> {
    const [row] = await this.database
      .select()
      .from(attempts)
      .where(and(eq(attempts.userId, user.id), eq(attempts.lesson, slug), eq(attempts.block, block)))
      .orderBy(desc(attempts.round))
      .limit(1)
    return row
  }

  private async owned(
    database: Pick<Database, 'select'>,
    id: string,
    user: User,
    lock?: 'update',
  ): Promise<AttemptRow> {
    const query = database
      .select()
      .from(attempts)
      .where(and(eq(attempts.id, id), eq(attempts.userId, user.id)))
    const [row] = lock ? await query.for(lock) : await query
    if (!row) throw new Refusal('not-found', 'There is no such round of yours.')
    return row
  }
}

/** What the learner may see: the views of the questions, never their keys. */
function asAttempt(row: AttemptRow): Attempt {
  const { id, lesson, block, createdAt, submittedAt, questions, answers, result } = row
  return {
    ...{ id, lesson, block, answers, result },
    createdAt: createdAt.toISOString(),
    submittedAt: submittedAt?.toISOString() ?? null,
    questions: questions.map(viewOf),
  }
}
