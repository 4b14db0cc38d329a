import { Module } from '@nestjs/common'
import { LessonAccessModule } from '../lesson-access/lesson-access.module.ts'
import { LessonFilesController } from './lesson-files.controller.ts'

@Module({ imports: [LessonAccessModule], controllers: [LessonFilesController] })
export class SiteFilesModule {}
