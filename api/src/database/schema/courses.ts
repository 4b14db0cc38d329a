import { sql } from 'drizzle-orm'
import { boolean, check, integer, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { users } from './users.ts'

/** What the database rules of a course; its title and lessons stand in `content/`. */
export const courses = pgTable(
  'courses',
  {
    slug: text().primaryKey(),
    /** In minor units; 0 is free. */
    priceAmount: integer().notNull(),
    priceCurrency: text().notNull(),
    open: boolean().notNull().default(true),
  },
  (table) => [check('courses_price_not_negative', sql`${table.priceAmount} >= 0`)],
)

export const enrolments = pgTable(
  'enrolments',
  {
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    courseSlug: text()
      .notNull()
      .references(() => courses.slug),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.courseSlug] })],
)
