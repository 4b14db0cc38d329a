import { Module } from '@nestjs/common'
import { CalculatorsController } from './calculators.controller.ts'
import { CalculatorsService } from './calculators.service.ts'

@Module({ controllers: [CalculatorsController], providers: [CalculatorsService] })
export class CalculatorsModule {}
