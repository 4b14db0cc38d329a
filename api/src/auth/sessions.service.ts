import { Injectable } from '@nestjs/common'
import { JwtService, TokenExpiredError } from '@nestjs/jwt'
import { Cron, CronExpression } from '@nestjs/schedule'
import { and, eq, gt, inArray, isNull, lt } from 'drizzle-orm'
import type { Database, Transaction } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { oneTimeTokens, refreshTokens, sessions } from '../database/schema/sessions.ts'
import { users } from '../database/schema/users.ts'
import type { User } from '../users/dto/user.schema.ts'
import { hashSecretToken, newSecretToken } from './secret-token.ts'

export const accessSeconds = 15 * 60
/** Counted from the last refresh. */
export const sessionSeconds = 30 * 24 * 3600

export interface SessionTokens {
  access: string
  refresh: string
}
export interface OpenSession {
  user: User
  tokens: SessionTokens
}
interface AccessClaims {
  sub: string
  session: string
}

const userColumns = { id: users.id, email: users.email, name: users.name, role: users.role }
const sessionEnd = () => new Date(Date.now() + sessionSeconds * 1000)
const isLive = () => and(isNull(sessions.revokedAt), gt(sessions.expiresAt, new Date()))

@Injectable()
export class SessionsService {
  constructor(
    @InjectDatabase() private readonly database: Database,
    private readonly jwt: JwtService,
  ) {}

  async start(transaction: Transaction, userId: string): Promise<OpenSession> {
    const [session] = await transaction
      .insert(sessions)
      .values({ userId, expiresAt: sessionEnd() })
      .returning({ id: sessions.id })
    return this.issue(transaction, session!.id)
  }

  /**
   * Gives a new refresh token for an old one, which is spent by that. A token that comes a second time was copied: who
   * has the newer one can't be known, so the whole session ends. Nothing comes back when the session has ended.
   */
  async refresh(refreshToken: string): Promise<OpenSession | undefined> {
    const tokenHash = hashSecretToken(refreshToken)
    return this.database.transaction(async (transaction) => {
      const [spent] = await transaction
        .update(refreshTokens)
        .set({ usedAt: new Date() })
        .where(and(eq(refreshTokens.tokenHash, tokenHash), isNull(refreshTokens.usedAt)))
        .returning({ sessionId: refreshTokens.sessionId })
      if (!spent) {
        await this.revokeSessionOf(transaction, tokenHash)
        return undefined
      }
      const [live] = await transaction
        .update(sessions)
        .set({ expiresAt: sessionEnd() })
        .where(and(eq(sessions.id, spent.sessionId), isLive()))
        .returning({ id: sessions.id })
      return live && this.issue(transaction, live.id)
    })
  }

  async end(refreshToken: string) {
    await this.revokeSessionOf(this.database, hashSecretToken(refreshToken))
  }

  async endAllOf(transaction: Transaction, userId: string) {
    await transaction
      .update(sessions)
      .set({ revokedAt: new Date() })
      .where(and(eq(sessions.userId, userId), isNull(sessions.revokedAt)))
  }

  /** Who holds this access token. The session is looked up, so that one that was ended is refused at once. */
  async userOf(accessToken: string): Promise<User | 'expired' | undefined> {
    const claims = await this.jwt
      .verifyAsync<AccessClaims>(accessToken)
      .catch((error: unknown) => (error instanceof TokenExpiredError ? 'expired' : undefined))
    if (!claims || claims === 'expired') return claims
    const [user] = await this.database
      .select(userColumns)
      .from(sessions)
      .innerJoin(users, eq(users.id, sessions.userId))
      .where(and(eq(sessions.id, claims.session), isLive()))
    return user
  }

  @Cron(CronExpression.EVERY_DAY_AT_3AM)
  async forgetExpired() {
    await this.database.delete(sessions).where(lt(sessions.expiresAt, new Date()))
    await this.database.delete(oneTimeTokens).where(lt(oneTimeTokens.expiresAt, new Date()))
  }

  private async issue(transaction: Transaction, sessionId: string): Promise<OpenSession> {
    const { token, tokenHash } = newSecretToken()
    await transaction.insert(refreshTokens).values({ tokenHash, sessionId })
    const [user] = await transaction
      .select(userColumns)
      .from(users)
      .innerJoin(sessions, eq(sessions.userId, users.id))
      .where(eq(sessions.id, sessionId))
    const claims: AccessClaims = { sub: user!.id, session: sessionId }
    return { user: user!, tokens: { access: await this.jwt.signAsync(claims), refresh: token } }
  }

  private async revokeSessionOf(database: Database, tokenHash: string) {
    const holder = database
      .select({ id: refreshTokens.sessionId })
      .from(refreshTokens)
      .where(eq(refreshTokens.tokenHash, tokenHash))
    await database
      .update(sessions)
      .set({ revokedAt: new Date() })
      .where(and(inArray(sessions.id, holder), isNull(sessions.revokedAt)))
  }
}
