import { pgEnum, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'

export const role = pgEnum('role', ['learner', 'instructor', 'admin'])

export const users = pgTable('users', {
  id: uuid().primaryKey().defaultRandom(),
  /** Always in lower case. */
  email: text().notNull().unique(),
  name: text().notNull(),
  role: role().notNull().default('learner'),
  passwordHash: text().notNull(),
  /** Until the address is confirmed nobody can sign in. */
  confirmedAt: timestamp({ withTimezone: true }),
  createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
})
export type UserRow = typeof users.$inferSelect
