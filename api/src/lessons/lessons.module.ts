import { Module } from '@nestjs/common'
import { LessonAccessModule } from '../lesson-access/lesson-access.module.ts'
import { LessonsController } from './lessons.controller.ts'
import { LessonsService } from './lessons.service.ts'

@Module({ imports: [LessonAccessModule], controllers: [LessonsController], providers: [LessonsService] })
export class LessonsModule {}
