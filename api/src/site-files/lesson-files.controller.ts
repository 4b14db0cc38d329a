import path from 'node:path'
import { Controller, Get, Param, Res } from '@nestjs/common'
import { ApiExcludeController } from '@nestjs/swagger'
import type { Response } from 'express'
import { z } from 'zod'
import { Public } from '../common/decorators/access.ts'
import { CurrentUser } from '../common/decorators/current-user.ts'
import { Refusal } from '../common/refusal.ts'
import { LessonAccessService } from '../lesson-access/lesson-access.service.ts'
import { projectRoot } from '../project-root.ts'
import type { User } from '../users/dto/user.schema.ts'
import { immutable } from './site-files.ts'

const lessonFolder = path.join(projectRoot, 'dist/site/lessons')

const lessonFileSchema = z.object({
  course: z.string().regex(/^[a-z0-9-]+$/),
  file: z.string().regex(/^[\w-][\w.-]*$/),
})

/** The built chunks of lessons; everything else of the site is public. */
@ApiExcludeController()
@Controller('lessons')
export class LessonFilesController {
  constructor(private readonly access: LessonAccessService) {}

  @Get(':course/:file')
  @Public()
  async send(
    @Param({ schema: lessonFileSchema }) { course, file }: z.infer<typeof lessonFileSchema>,
    @CurrentUser() user: User | undefined,
    @Res() response: Response,
  ): Promise<void> {
    const { free } = await this.access.check(course, user)
    response.setHeader('Cache-Control', free ? immutable : 'private, no-store')
    await new Promise<void>((resolve, reject) => {
      response.sendFile(file, { root: path.join(lessonFolder, course), cacheControl: false }, (error?: Error) => {
        if (!error || response.headersSent) resolve()
        else reject(new Refusal('not-found', 'There is no such file of a lesson.'))
      })
    })
  }
}
