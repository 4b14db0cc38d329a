import { sql } from 'drizzle-orm'
import { index, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'

/** The outbox: a mail is written in the transaction of what caused it, and sent afterwards. */
export const mails = pgTable(
  'mails',
  {
    id: uuid().primaryKey().defaultRandom(),
    recipient: text().notNull(),
    subject: text().notNull(),
    text: text().notNull(),
    html: text().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    tries: integer().notNull().default(0),
    nextTryAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    sentAt: timestamp({ withTimezone: true }),
    /** Given up: every try failed. */
    deadAt: timestamp({ withTimezone: true }),
    lastError: text(),
  },
  (table) => [
    index('mails_due_index')
      .on(table.nextTryAt)
      .where(sql`${table.sentAt} is null and ${table.deadAt} is null`),
  ],
)
