import { index, pgEnum, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { users } from './users.ts'

const belongsToUser = () =>
  uuid()
    .notNull()
    .references(() => users.id, { onDelete: 'cascade' })

/** One sign-in on one device: the family of its refresh tokens. */
export const sessions = pgTable(
  'sessions',
  {
    id: uuid().primaryKey().defaultRandom(),
    userId: belongsToUser(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    revokedAt: timestamp({ withTimezone: true }),
  },
  (table) => [index().on(table.userId)],
)

/** Used tokens stay, so that a second use is noticed. */
export const refreshTokens = pgTable(
  'refresh_tokens',
  {
    tokenHash: text().primaryKey(),
    sessionId: uuid()
      .notNull()
      .references(() => sessions.id, { onDelete: 'cascade' }),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    usedAt: timestamp({ withTimezone: true }),
  },
  (table) => [index().on(table.sessionId)],
)

export const tokenPurpose = pgEnum('token_purpose', ['confirm-address', 'reset-password'])

/** What a link in a mail carries. */
export const oneTimeTokens = pgTable(
  'one_time_tokens',
  {
    tokenHash: text().primaryKey(),
    userId: belongsToUser(),
    purpose: tokenPurpose().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
  },
  (table) => [index().on(table.userId, table.purpose)],
)
export type TokenPurpose = (typeof tokenPurpose.enumValues)[number]
