import { HttpException } from '@nestjs/common'
import type { ErrorBody } from './dto/error.schema.ts'

/** Every code that a refusal can carry, and the status it goes out with. */
const statuses = {
  malformed: 400,
  'not-signed-in': 401,
  'wrong-credentials': 401,
  'session-ended': 401,
  'anti-forgery': 403,
  forbidden: 403,
  'not-enrolled': 403,
  'not-found': 404,
  conflict: 409,
  'link-spent': 410,
  'too-large': 413,
  'payment-needed': 402,
  invalid: 422,
  // Those of a calculation, as `calc/` names them.
  missing: 422,
  'unknown-key': 422,
  'not-finite': 422,
  'out-of-range': 422,
  inconsistent: 422,
  'no-solution': 422,
  'too-many': 429,
  broken: 500,
} as const
export type RefusalCode = keyof typeof statuses

/** What a service throws when the answer is no; the filter turns it into the one error shape. */
export class Refusal extends HttpException {
  constructor(code: RefusalCode, message: string, fields: ErrorBody['fields'] = []) {
    super({ code, message, fields } satisfies ErrorBody, statuses[code])
  }
}

export const notSignedIn = () => new Refusal('not-signed-in', 'Sign in first.')

export const broken = () =>
  new Refusal('broken', 'Something broke on our side; it has been noted. Try again in a while.')
