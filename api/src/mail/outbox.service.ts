import { Inject, Injectable, Logger, type OnModuleDestroy } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { Interval } from '@nestjs/schedule'
import { and, eq, inArray, isNull, lte, sql } from 'drizzle-orm'
import type { Transporter } from 'nodemailer'
import type { Environment } from '../config/environment.ts'
import type { Database, Transaction } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { mails } from '../database/schema/mails.ts'
import type { Message } from './messages.ts'

export const MAIL_TRANSPORT = Symbol('mail transport')

/** Minutes to wait after the first, second … failed try; after the last the mail is given up. */
export const waitMinutes = [1, 5, 30, 120, 480, 1440] as const
/** A mail that is being sent is left alone this long; if the process dies meanwhile it is tried again then. */
const claimMinutes = 5
const batch = 20

const minutesFromNow = (minutes: number) => new Date(Date.now() + minutes * 60_000)

@Injectable()
export class OutboxService implements OnModuleDestroy {
  private readonly logger = new Logger('Mail')
  private readonly from: string
  private sending: Promise<void> | undefined
  private isNudged = false
  private isStopping = false

  constructor(
    @InjectDatabase() private readonly database: Database,
    @Inject(MAIL_TRANSPORT) private readonly transport: Pick<Transporter, 'sendMail'>,
    config: ConfigService<Environment, true>,
  ) {
    this.from = config.get('MAIL_FROM', { infer: true })
  }

  /** Part of the transaction of what causes the mail: either both happen or neither. Call `nudge` after it. */
  async add(transaction: Transaction, recipient: string, message: Message) {
    await transaction.insert(mails).values({ recipient, ...message })
  }

  /** Sends what is due now; without it the mail waits for the next round. */
  @Interval(15_000)
  nudge() {
    if (this.isStopping) return
    this.isNudged = true
    this.sending ??= this.sendWhileNudged().finally(() => {
      this.sending = undefined
    })
  }

  async onModuleDestroy() {
    this.isStopping = true
    await this.sending
  }

  private async sendWhileNudged() {
    while (this.isNudged && !this.isStopping) {
      this.isNudged = false
      await this.sendDue().catch((error: unknown) => this.logger.error(error))
    }
  }

  async sendDue() {
    for (let claimed = await this.claim(); claimed.length > 0; claimed = await this.claim()) {
      for (const mail of claimed) await this.send(mail)
    }
  }

  /** Takes some mails that are due, so that no other process takes them; a try is counted when it begins. */
  private async claim() {
    const isDue = and(isNull(mails.sentAt), isNull(mails.deadAt), lte(mails.nextTryAt, new Date()))
    const due = this.database
      .select({ id: mails.id })
      .from(mails)
      .where(isDue)
      .orderBy(mails.nextTryAt)
      .limit(batch)
      .for('update', { skipLocked: true })
    return this.database
      .update(mails)
      .set({ tries: sql`${mails.tries} + 1`, nextTryAt: minutesFromNow(claimMinutes) })
      .where(inArray(mails.id, due))
      .returning()
  }

  private async send(mail: typeof mails.$inferSelect) {
    const outcome = await this.transport
      .sendMail({
        from: this.from,
        to: mail.recipient,
        subject: mail.subject,
        text: mail.text,
        html: mail.html,
        // The same at every try, so that a mail sent twice can be known as one.
        messageId: `<${mail.id}@leatwright>`,
      })
      .then(
        () => ({ sentAt: new Date(), lastError: null }),
        (error: unknown) => this.afterFailure(mail, error),
      )
    await this.database.update(mails).set(outcome).where(eq(mails.id, mail.id))
  }

  private afterFailure(mail: typeof mails.$inferSelect, error: unknown) {
    const lastError = error instanceof Error ? error.message : String(error)
    const wait = waitMinutes[mail.tries - 1]
    if (wait === undefined) {
      this.logger.error(`Mail ${mail.id} is given up after ${mail.tries} tries: ${lastError}`)
      return { lastError, deadAt: new Date() }
    }
    this.logger.warn(`Mail ${mail.id} could not be sent and is tried again in ${wait} min: ${lastError}`)
    return { lastError, nextTryAt: minutesFromNow(wait) }
  }
}
