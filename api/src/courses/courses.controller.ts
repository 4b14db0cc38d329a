import { Controller, Get, Param, Post } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import { Public, SignedIn } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { CurrentUser } from '../common/decorators/current-user.ts'
import type { User } from '../users/dto/user.schema.ts'
import { CoursesService } from './courses.service.ts'
import { courseSchema } from './dto/course.schema.ts'

@ApiTags('courses')
@Controller('courses')
export class CoursesController {
  constructor(private readonly service: CoursesService) {}

  @Get()
  @Public()
  @Answers(courseSchema, { isArray: true })
  list(@CurrentUser() user: User | undefined) {
    return this.service.list(user)
  }

  @Get(':slug')
  @Public()
  @Answers(courseSchema)
  one(@Param('slug') slug: string, @CurrentUser() user: User | undefined) {
    return this.service.one(slug, user)
  }

  @Post(':slug/enrolment')
  @SignedIn()
  @Answers(courseSchema, { status: 201 })
  enrol(@Param('slug') slug: string, @CurrentUser() user: User) {
    return this.service.enrol(slug, user)
  }
}
