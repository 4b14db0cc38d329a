import { Controller, Get, Res } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import { sql } from 'drizzle-orm'
import type { Response } from 'express'
import { Public } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import type { Database } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { version } from '../../../package.json'
import { type Health, healthSchema } from './dto/health.schema.ts'

@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(@InjectDatabase() private readonly database: Database) {}

  /** 503 while the database does not answer. */
  @Get()
  @Public({ readsSession: false })
  @Answers(healthSchema)
  async health(@Res({ passthrough: true }) response: Response): Promise<Health> {
    const ready = await this.database.execute(sql`select 1`).then(
      () => true,
      () => false,
    )
    if (!ready) response.status(503)
    return { status: ready ? 'ok' : 'unready', live: true, ready, version }
  }
}
