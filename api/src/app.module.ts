import path from 'node:path'
import { type DynamicModule, Module } from '@nestjs/common'
import { ScheduleModule } from '@nestjs/schedule'
import { AuthModule } from './auth/auth.module.ts'
import { AttemptsModule } from './attempts/attempts.module.ts'
import { CoursesModule } from './courses/courses.module.ts'
import { LessonsModule } from './lessons/lessons.module.ts'
import { SchoolModule } from './school/school.module.ts'
import { CalculatorsModule } from './calculators/calculators.module.ts'
import { CommonModule } from './common/common.module.ts'
import { AppConfigModule } from './config/config.module.ts'
import type { Environment } from './config/environment.ts'
import type { DatabaseConnection } from './database/connection.ts'
import { DatabaseModule } from './database/database.module.ts'
import { HealthModule } from './health/health.module.ts'
import { projectRoot } from './project-root.ts'
import { SiteFilesModule } from './site-files/site-files.module.ts'
import { UsersModule } from './users/users.module.ts'

@Module({})
export class AppModule {
  static forRoot(
    environment: Environment,
    connection: DatabaseConnection,
    siteFolder = path.join(projectRoot, 'dist/site'),
  ): DynamicModule {
    return {
      module: AppModule,
      imports: [
        AppConfigModule.forRoot(environment),
        DatabaseModule.forRoot(connection),
        ScheduleModule.forRoot(),
        CommonModule,
        AuthModule,
        UsersModule,
        SchoolModule,
        CoursesModule,
        LessonsModule,
        AttemptsModule,
        CalculatorsModule,
        HealthModule,
        SiteFilesModule.forRoot(siteFolder),
      ],
    }
  }
}
