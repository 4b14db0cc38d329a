import { SetMetadata } from '@nestjs/common'
import type { Role } from '../../users/dto/user.schema.ts'

export type AccessRule =
  { who: 'anyone'; readsSession: boolean } | { who: 'signed-in' } | { who: 'roles'; roles: readonly Role[] }

export const ACCESS_RULE = 'access-rule'
export const ANTI_FORGERY = 'anti-forgery'

/** Every route declares one of these three, on itself or on its controller; the server refuses to start otherwise. */
const access = (rule: AccessRule) => SetMetadata(ACCESS_RULE, rule)

/**
 * Anyone. Who is signed in is still known (`@CurrentUser()`), except to a changing request without the anti-forgery
 * header. A route that works the same for everybody reads no session.
 */
export const Public = ({ readsSession = true } = {}) => access({ who: 'anyone', readsSession })
export const SignedIn = () => access({ who: 'signed-in' })
export const Roles = (...roles: readonly [Role, ...Role[]]) => access({ who: 'roles', roles })

/** On a public, changing route that reads a session cookie by itself: asks for the anti-forgery header. */
export const AntiForgery = () => SetMetadata(ANTI_FORGERY, true)
