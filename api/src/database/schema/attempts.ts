import { boolean, doublePrecision, integer, jsonb, pgTable, text, timestamp, unique, uuid } from 'drizzle-orm/pg-core'
import type { Answer, AttemptResult } from '../../attempts/dto/attempt.schema.ts'
import { users } from './users.ts'

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
    questions: jsonb().$type<unknown[]>().notNull(),
    answers: jsonb().$type<Record<string, Answer>>().notNull().default({}),
    result: jsonb().$type<AttemptResult>(),
    marks: doublePrecision(),
    outOf: doublePrecision(),
    passed: boolean(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    submittedAt: timestamp({ withTimezone: true }),
  },
  (table) => [unique('attempts_round_unique').on(table.userId, table.lesson, table.block, table.round)],
)
