import { type ExecutionContext, Injectable } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import {
  ThrottlerGuard,
  type ThrottlerLimitDetail,
  type ThrottlerModuleOptions,
  type ThrottlerOptionsFactory,
} from '@nestjs/throttler'
import type { Request, Response } from 'express'
import { Refusal } from '../common/refusal.ts'
import type { Environment } from '../config/environment.ts'

const quarterHour = 15 * 60_000

const accountOf = (request: Pick<Request, 'body'>): string | undefined => {
  const { email } = (request.body ?? {}) as { email?: unknown }
  return typeof email === 'string' ? email.toLowerCase() : undefined
}

/** Each route is limited by the account that the request names, known or not, and by the address it comes from. */
@Injectable()
export class TriesOptions implements ThrottlerOptionsFactory {
  constructor(private readonly config: ConfigService<Environment, true>) {}

  createThrottlerOptions(): ThrottlerModuleOptions {
    return {
      setHeaders: false,
      throttlers: [
        {
          name: 'account',
          limit: this.config.get('TRIES_PER_ACCOUNT', { infer: true }),
          ttl: quarterHour,
          skipIf: (context) => accountOf(context.switchToHttp().getRequest<Request>()) === undefined,
          getTracker: (request) => accountOf(request as Request)!,
        },
        { name: 'address', limit: this.config.get('TRIES_PER_ADDRESS', { infer: true }), ttl: quarterHour },
      ],
    }
  }
}

@Injectable()
export class TriesGuard extends ThrottlerGuard {
  protected override throwThrottlingException(context: ExecutionContext, detail: ThrottlerLimitDetail): Promise<void> {
    const seconds = detail.timeToBlockExpire
    context.switchToHttp().getResponse<Response>().setHeader('Retry-After', seconds)
    const minutes = Math.ceil(seconds / 60)
    throw new Refusal(
      'too-many',
      `That was tried too often. Try again in ${minutes === 1 ? 'a minute' : `${minutes} minutes`}.`,
    )
  }
}
