import { Module } from '@nestjs/common'
import { AttemptsController } from './attempts.controller.ts'
import { AttemptsService } from './attempts.service.ts'

@Module({ controllers: [AttemptsController], providers: [AttemptsService] })
export class AttemptsModule {}
