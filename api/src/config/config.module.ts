import { type DynamicModule, Module } from '@nestjs/common'
import { ConfigModule } from '@nestjs/config'
import type { Environment } from './environment.ts'

/** Services ask for `ConfigService<Environment, true>`; the values were checked before anything else was made. */
@Module({})
export class AppConfigModule {
  static forRoot(environment: Environment): DynamicModule {
    return {
      module: AppConfigModule,
      imports: [
        // The values come from `readEnvironment` alone: neither a file nor process.env may slip past its checks.
        ConfigModule.forRoot({
          isGlobal: true,
          load: [() => environment],
          ignoreEnvFile: true,
          validatePredefined: false,
          skipProcessEnv: true,
        }),
      ],
    }
  }
}
