import { createParamDecorator, type ExecutionContext } from '@nestjs/common'
import type { Request } from 'express'
import type { User } from '../../users/dto/user.schema.ts'

export interface RequestWithUser extends Request {
  /** Set by the access guard. */
  user?: User
}

/** `@CurrentUser() user: User`; on a public route `User | undefined`. */
export const CurrentUser = createParamDecorator(
  (_: undefined, context: ExecutionContext) => context.switchToHttp().getRequest<RequestWithUser>().user,
)
