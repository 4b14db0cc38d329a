import { Controller, Get, Param } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import { Public } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { CurrentUser } from '../common/decorators/current-user.ts'
import type { User } from '../users/dto/user.schema.ts'
import { lessonSchema } from './dto/lesson.schema.ts'
import { LessonsService } from './lessons.service.ts'

@ApiTags('lessons')
@Controller('lessons')
export class LessonsController {
  constructor(private readonly service: LessonsService) {}

  @Get(':slug')
  @Public()
  @Answers(lessonSchema)
  one(@Param('slug') slug: string, @CurrentUser() user: User | undefined) {
    return this.service.one(slug, user)
  }
}
