import { Injectable } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { and, eq, gt, sql } from 'drizzle-orm'
import { Refusal } from '../common/refusal.ts'
import type { Environment } from '../config/environment.ts'
import type { Database, Transaction } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { oneTimeTokens, type TokenPurpose } from '../database/schema/sessions.ts'
import { users } from '../database/schema/users.ts'
import { accountExistsMail, confirmAddressMail, resetPasswordMail } from '../mail/messages.ts'
import { OutboxService } from '../mail/outbox.service.ts'
import type { PasswordReset, SignIn, SignUp } from './dto/auth.schema.ts'
import { hashPassword, passwordMatches } from './passwords.ts'
import { hashSecretToken, newSecretToken } from './secret-token.ts'
import { type OpenSession, SessionsService } from './sessions.service.ts'

const tokenHours: Record<TokenPurpose, number> = { 'confirm-address': 48, 'reset-password': 1 }

/** Addresses are compared without regard to case. */
const normalised = (email: string) => email.toLowerCase()

@Injectable()
export class AuthService {
  private readonly publicUrl: string

  constructor(
    @InjectDatabase() private readonly database: Database,
    private readonly sessions: SessionsService,
    private readonly outbox: OutboxService,
    config: ConfigService<Environment, true>,
  ) {
    this.publicUrl = config.get('PUBLIC_URL', { infer: true })
  }

  /** Whoever asks gets the same answer; the mail tells the owner of the address how things stand. */
  async signUp({ name, email: typed, password }: SignUp) {
    const email = normalised(typed)
    const passwordHash = await hashPassword(password)
    await this.database.transaction(async (transaction) => {
      // Until the address is confirmed the newest sign-up holds, and the links of earlier ones are dead.
      const [waiting] = await transaction
        .insert(users)
        .values({ name, email, passwordHash })
        .onConflictDoUpdate({
          target: users.email,
          set: { name, passwordHash },
          setWhere: sql`${users.confirmedAt} is null`,
        })
        .returning({ id: users.id })
      if (waiting) {
        const link = await this.newLink(transaction, waiting.id, 'confirm-address', '/confirm')
        await this.outbox.add(transaction, email, confirmAddressMail({ link }))
      } else {
        await this.outbox.add(transaction, email, accountExistsMail({ link: `${this.publicUrl}/sign-in` }))
      }
    })
    this.outbox.nudge()
  }

  async confirm(token: string): Promise<OpenSession> {
    return this.database.transaction(async (transaction) => {
      const userId = await this.spend(transaction, token, 'confirm-address')
      await transaction.update(users).set({ confirmedAt: new Date() }).where(eq(users.id, userId))
      return this.sessions.start(transaction, userId)
    })
  }

  async signIn({ email, password }: SignIn): Promise<OpenSession> {
    const [user] = await this.database
      .select({ id: users.id, passwordHash: users.passwordHash, confirmedAt: users.confirmedAt })
      .from(users)
      .where(eq(users.email, normalised(email)))
    const matches = await passwordMatches(password, user?.passwordHash)
    // An account that waits for its confirmation answers like none, or signing up would tell which addresses are known.
    if (!user?.confirmedAt || !matches) {
      throw new Refusal(
        'wrong-credentials',
        'That address and password do not go together, or the address is not confirmed yet: look for our mail.',
      )
    }
    return this.database.transaction((transaction) => this.sessions.start(transaction, user.id))
  }

  async requestPasswordReset(typed: string) {
    const email = normalised(typed)
    await this.database.transaction(async (transaction) => {
      const [user] = await transaction.select({ id: users.id }).from(users).where(eq(users.email, email))
      if (!user) return
      const link = await this.newLink(transaction, user.id, 'reset-password', '/reset-password')
      await this.outbox.add(transaction, email, resetPasswordMail({ link }))
    })
    this.outbox.nudge()
  }

  /** The link came by mail, so it confirms the address too. Every session that is open ends. */
  async resetPassword({ token, password }: PasswordReset): Promise<OpenSession> {
    const passwordHash = await hashPassword(password)
    return this.database.transaction(async (transaction) => {
      const userId = await this.spend(transaction, token, 'reset-password')
      await transaction
        .update(users)
        .set({ passwordHash, confirmedAt: sql`coalesce(${users.confirmedAt}, now())` })
        .where(eq(users.id, userId))
      await transaction.delete(oneTimeTokens).where(eq(oneTimeTokens.userId, userId))
      await this.sessions.endAllOf(transaction, userId)
      return this.sessions.start(transaction, userId)
    })
  }

  /** Only the newest link of a kind works. */
  private async newLink(transaction: Transaction, userId: string, purpose: TokenPurpose, page: string) {
    const { token, tokenHash } = newSecretToken()
    await transaction
      .delete(oneTimeTokens)
      .where(and(eq(oneTimeTokens.userId, userId), eq(oneTimeTokens.purpose, purpose)))
    const expiresAt = new Date(Date.now() + tokenHours[purpose] * 3_600_000)
    await transaction.insert(oneTimeTokens).values({ tokenHash, userId, purpose, expiresAt })
    return `${this.publicUrl}${page}?token=${token}`
  }

  private async spend(transaction: Transaction, token: string, purpose: TokenPurpose): Promise<string> {
    const [spent] = await transaction
      .delete(oneTimeTokens)
      .where(
        and(
          eq(oneTimeTokens.tokenHash, hashSecretToken(token)),
          eq(oneTimeTokens.purpose, purpose),
          gt(oneTimeTokens.expiresAt, new Date()),
        ),
      )
      .returning({ userId: oneTimeTokens.userId })
    if (!spent) {
      throw new Refusal(
        'link-spent',
        'This link was used already, replaced by a newer one, or is too old. Ask for a new one.',
      )
    }
    return spent.userId
  }
}
