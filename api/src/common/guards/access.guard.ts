import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common'
import { Reflector } from '@nestjs/core'
import { SessionCookies } from '../../auth/session-cookies.ts'
import { SessionsService } from '../../auth/sessions.service.ts'
import { ACCESS_RULE, type AccessRule, ANTI_FORGERY } from '../decorators/access.ts'
import type { RequestWithUser } from '../decorators/current-user.ts'
import { notSignedIn, Refusal } from '../refusal.ts'

/**
 * A page of another site can make a browser send our cookies, but it cannot set a header of its own on such a request
 * without asking this server first, and this server answers no such question (it sends no CORS headers). So a changing
 * request that comes with a session cookie is only believed with this header.
 */
export const antiForgeryHeader = { name: 'x-leatwright', value: '1' } as const

const harmless = new Set(['GET', 'HEAD', 'OPTIONS'])

@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: SessionsService,
    private readonly cookies: SessionCookies,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<RequestWithUser>()
    const where = [context.getHandler(), context.getClass()]
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS_RULE, where)
    if (!rule) throw new Error(`${context.getClass().name}.${context.getHandler().name} declares no access rule.`)

    const mayReadCookies =
      harmless.has(request.method) || request.get(antiForgeryHeader.name) === antiForgeryHeader.value
    const needsHeader = rule.who !== 'anyone' || this.reflector.getAllAndOverride<boolean>(ANTI_FORGERY, where)
    if (needsHeader && !mayReadCookies && this.cookies.areSent(request)) {
      throw new Refusal('anti-forgery', `Send the header ${antiForgeryHeader.name}: ${antiForgeryHeader.value}.`)
    }

    if (rule.who === 'anyone' && !rule.readsSession) return true
    const accessToken = mayReadCookies ? this.cookies.accessToken(request) : undefined
    const user = accessToken ? await this.sessions.userOf(accessToken) : undefined
    // Even where anyone is let in: answering as if nobody were signed in would hide what is theirs until the next renewal.
    if (user === 'expired') throw notSignedIn()
    request.user = user
    if (rule.who === 'anyone') return true
    if (!request.user) throw notSignedIn()
    if (rule.who === 'roles' && !rule.roles.includes(request.user.role)) {
      throw new Refusal('forbidden', 'Your account is not one that may do this.')
    }
    return true
  }
}
