import { type DynamicModule, Module } from '@nestjs/common'
import { AuthModule } from '../auth/auth.module.ts'
import { LessonAccessModule } from '../lesson-access/lesson-access.module.ts'
import { LessonFilesController, SITE_FOLDER } from './lesson-files.controller.ts'

@Module({})
export class SiteFilesModule {
  static forRoot(siteFolder: string): DynamicModule {
    return {
      module: SiteFilesModule,
      imports: [AuthModule, LessonAccessModule],
      controllers: [LessonFilesController],
      providers: [{ provide: SITE_FOLDER, useValue: siteFolder }],
    }
  }
}
