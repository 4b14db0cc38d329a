import { type DynamicModule, Module } from '@nestjs/common'
import { ScheduleModule } from '@nestjs/schedule'
import { AuthModule } from './auth/auth.module.ts'
import { CalculatorsModule } from './calculators/calculators.module.ts'
import { CommonModule } from './common/common.module.ts'
import { AppConfigModule } from './config/config.module.ts'
import type { Environment } from './config/environment.ts'
import type { DatabaseConnection } from './database/connection.ts'
import { DatabaseModule } from './database/database.module.ts'
import { HealthModule } from './health/health.module.ts'
import { SiteFilesModule } from './site-files/site-files.module.ts'
import { UsersModule } from './users/users.module.ts'

@Module({})
export class AppModule {
  static forRoot(environment: Environment, connection: DatabaseConnection): DynamicModule {
    return {
      module: AppModule,
      imports: [
        AppConfigModule.forRoot(environment),
        DatabaseModule.forRoot(connection),
        ScheduleModule.forRoot(),
        CommonModule,
        AuthModule,
        UsersModule,
        CalculatorsModule,
        HealthModule,
        SiteFilesModule,
      ],
    }
  }
}
