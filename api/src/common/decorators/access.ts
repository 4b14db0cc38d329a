import { SetMetadata } from '@nestjs/common'
import type { Role } from '../../users/dto/user.schema.ts'

export type AccessRule = { who: 'anyone' } | { who: 'signed-in' } | { who: 'roles'; roles: readonly Role[] }

export const ACCESS_RULE = 'access-rule'
export const READS_SESSION = 'reads-session'

/** Every route declares one of these three, on itself or on its controller; the server refuses to start otherwise. */
const access = (rule: AccessRule) => SetMetadata(ACCESS_RULE, rule)

/** Anyone; who is signed in is still known (`@CurrentUser()`), except to a changing request without the anti-forgery header. */
export const Public = () => access({ who: 'anyone' })
export const SignedIn = () => access({ who: 'signed-in' })
export const Roles = (...roles: readonly [Role, ...Role[]]) => access({ who: 'roles', roles })

/** Beside `@Public()`, on a changing route that reads a session cookie by itself: asks for the anti-forgery header. */
export const ReadsSession = () => SetMetadata(READS_SESSION, true)
