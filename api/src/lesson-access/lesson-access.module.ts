import { Module } from '@nestjs/common'
import { LessonAccessService } from './lesson-access.service.ts'

@Module({ providers: [LessonAccessService], exports: [LessonAccessService] })
export class LessonAccessModule {}
