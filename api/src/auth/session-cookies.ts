import { Injectable } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import type { CookieOptions, Request, Response } from 'express'
import type { Environment } from '../config/environment.ts'
import { type SessionTokens, sessionSeconds } from './sessions.service.ts'

/** Outlives the token in it: a token that ran out is told from none at all, so that the site renews it. */
const accessCookie = { name: 'leatwright_access', path: '/' }
/** Sent only where it is used: refresh and sign-out. */
const refreshCookie = { name: 'leatwright_refresh', path: '/api/auth/session' }

/** Says to the site's own script only that there is a session here to ask for; it opens nothing. */
const signedInCookie = { name: 'leatwright_signed_in', path: '/' }

@Injectable()
export class SessionCookies {
  private readonly options: CookieOptions

  constructor(config: ConfigService<Environment, true>) {
    const secure = config.get('PUBLIC_URL', { infer: true }).startsWith('https:')
    this.options = { httpOnly: true, sameSite: 'lax', secure }
  }

  set(response: Response, tokens: SessionTokens) {
    const { options } = this
    response.cookie(accessCookie.name, tokens.access, {
      ...options,
      path: accessCookie.path,
      maxAge: sessionSeconds * 1000,
    })
    response.cookie(refreshCookie.name, tokens.refresh, {
      ...options,
      path: refreshCookie.path,
      maxAge: sessionSeconds * 1000,
    })
    response.cookie(signedInCookie.name, '1', {
      ...options,
      httpOnly: false,
      path: signedInCookie.path,
      maxAge: sessionSeconds * 1000,
    })
  }

  clear(response: Response) {
    for (const { name, path } of [accessCookie, refreshCookie, signedInCookie])
      response.clearCookie(name, { ...this.options, path })
  }

  areSent(request: Request): boolean {
    return this.accessToken(request) !== undefined || this.refreshToken(request) !== undefined
  }

  accessToken = (request: Request) => read(request, accessCookie.name)
  refreshToken = (request: Request) => read(request, refreshCookie.name)
}

function read(request: Request, name: string): string | undefined {
  const value = (request.cookies as Record<string, unknown>)[name]
  return typeof value === 'string' ? value : undefined
}
