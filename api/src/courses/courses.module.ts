import { Module } from '@nestjs/common'
import { CoursesController } from './courses.controller.ts'
import { CoursesService } from './courses.service.ts'

@Module({ controllers: [CoursesController], providers: [CoursesService] })
export class CoursesModule {}
