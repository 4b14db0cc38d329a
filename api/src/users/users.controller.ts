import { Controller, Get } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import { SignedIn } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { CurrentUser } from '../common/decorators/current-user.ts'
import { type User, userSchema } from './dto/user.schema.ts'

@ApiTags('users')
@Controller('users')
export class UsersController {
  @Get('me')
  @SignedIn()
  @Answers(userSchema)
  me(@CurrentUser() user: User): User {
    return user
  }
}
