import { boolean, doublePrecision, integer, jsonb, pgTable, text, timestamp, unique, uuid } from 'drizzle-orm/pg-core'
import type { Draw } from '#calc/marking/draw.ts'
import type { QuestionResult } from '#calc/marking/result.ts'
import type { Answer } from '../../attempts/dto/attempt.schema.ts'
import { users } from './users.ts'

/** The whole result, with the mistakes that were recognised; learners see it without their ids. */
export interface RoundResult {
  marks: number
  outOf: number
  passed: boolean
  questions: Record<string, QuestionResult>
}

/** One round of a `<CheckYourself>` block. A lesson is done when all its blocks have a round that passed. */
export const attempts = pgTable(
  'attempts',
  {
    id: uuid().primaryKey().defaultRandom(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    /** The lesson's slug. */
    lesson: text().notNull(),
    block: text().notNull(),
    /** Counts from 1. */
    round: integer().notNull(),
    /** The drawn questions whole, key and all, so that a bank mended later never alters a round already drawn. */
    questions: jsonb().$type<Draw[]>().notNull(),
    answers: jsonb().$type<Record<string, Answer>>().notNull().default({}),
    result: jsonb().$type<RoundResult>(),
    marks: doublePrecision(),
    outOf: doublePrecision(),
    passed: boolean(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    submittedAt: timestamp({ withTimezone: true }),
  },
  (table) => [unique('attempts_round_unique').on(table.userId, table.lesson, table.block, table.round)],
)
export type AttemptRow = typeof attempts.$inferSelect
