import path from 'node:path'
import { Controller, Get, Inject, Param, Req, Res } from '@nestjs/common'
import { ApiExcludeController } from '@nestjs/swagger'
import type { Request, Response } from 'express'
import { z } from 'zod'
import { SessionCookies } from '../auth/session-cookies.ts'
import { SessionsService } from '../auth/sessions.service.ts'
import { Public } from '../common/decorators/access.ts'
import { Refusal } from '../common/refusal.ts'
import { LessonAccessService } from '../lesson-access/lesson-access.service.ts'
import type { User } from '../users/dto/user.schema.ts'
import { immutable } from './site-files.ts'

/** Where the built site is. */
export const SITE_FOLDER = Symbol('site folder')

const lessonFileSchema = z.object({
  course: z.string().regex(/^[a-z0-9-]+$/),
  file: z.string().regex(/^[\w-][\w.-]*$/),
})

/** The built chunks of lessons; everything else of the site is public. */
@ApiExcludeController()
@Controller('lessons')
export class LessonFilesController {
  constructor(
    @Inject(SITE_FOLDER) private readonly siteFolder: string,
    private readonly access: LessonAccessService,
    private readonly sessions: SessionsService,
    private readonly cookies: SessionCookies,
  ) {}

  @Get(':course/:file')
  @Public({ readsSession: false })
  async send(
    @Param({ schema: lessonFileSchema }) { course, file }: z.infer<typeof lessonFileSchema>,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    const { free } = await this.access.check(course, await this.userOf(request))
    response.setHeader('Cache-Control', free ? immutable : 'private, no-store')
    await new Promise<void>((resolve, reject) => {
      response.sendFile(
        file,
        { root: path.join(this.siteFolder, 'lessons', course), cacheControl: false },
        (error?: Error) => {
          if (!error || response.headersSent) resolve()
          else reject(new Refusal('not-found', 'There is no such file of a lesson.'))
        },
      )
    })
  }

  /** Not by the guard: a module that the browser imports can't renew a session, and a free one needs none. */
  private async userOf(request: Request): Promise<User | undefined> {
    const token = this.cookies.accessToken(request)
    const user = token ? await this.sessions.userOf(token) : undefined
    return user === 'expired' ? undefined : user
  }
}
