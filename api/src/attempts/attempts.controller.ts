import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import { z } from 'zod'
import { SignedIn } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { CurrentUser } from '../common/decorators/current-user.ts'
import type { User } from '../users/dto/user.schema.ts'
import { AttemptsService } from './attempts.service.ts'
import {
  attemptSchema,
  type SaveAnswer,
  saveAnswerSchema,
  type StartAttempt,
  startAttemptSchema,
} from './dto/attempt.schema.ts'

const attemptParams = z.object({ id: z.uuid() })
type AttemptParams = z.infer<typeof attemptParams>
const answerParams = attemptParams.extend({ questionId: z.string() })
type AnswerParams = z.infer<typeof answerParams>

@ApiTags('attempts')
@Controller()
@SignedIn()
export class AttemptsController {
  constructor(private readonly service: AttemptsService) {}

  @Post('lessons/:slug/attempts')
  @Answers(attemptSchema)
  start(
    @Param('slug') slug: string,
    @Body({ schema: startAttemptSchema }) body: StartAttempt,
    @CurrentUser() user: User,
  ) {
    return this.service.start(slug, body, user)
  }

  @Get('attempts/:id')
  @Answers(attemptSchema)
  one(@Param({ schema: attemptParams }) { id }: AttemptParams, @CurrentUser() user: User) {
    return this.service.one(id, user)
  }

  @Put('attempts/:id/answers/:questionId')
  @HttpCode(204)
  saveAnswer(
    @Param({ schema: answerParams }) { id, questionId }: AnswerParams,
    @Body({ schema: saveAnswerSchema }) { answer }: SaveAnswer,
    @CurrentUser() user: User,
  ) {
    return this.service.saveAnswer(id, questionId, answer, user)
  }

  @Post('attempts/:id/submission')
  @Answers(attemptSchema)
  submit(@Param({ schema: attemptParams }) { id }: AttemptParams, @CurrentUser() user: User) {
    return this.service.submit(id, user)
  }
}
