import { Module, StandardSchemaSerializerInterceptor } from '@nestjs/common'
import { APP_FILTER, APP_GUARD, APP_INTERCEPTOR, APP_PIPE, DiscoveryModule } from '@nestjs/core'
import { AuthModule } from '../auth/auth.module.ts'
import { RefusalFilter } from './filters/refusal.filter.ts'
import { AccessGuard } from './guards/access.guard.ts'
import { AccessRulesService } from './guards/access-rules.service.ts'
import { RequestValidationPipe } from './pipes/request-validation.pipe.ts'

/** What holds for every route: who may call it, what it takes, what it answers, how it says no. */
@Module({
  imports: [DiscoveryModule, AuthModule],
  providers: [
    AccessRulesService,
    { provide: APP_GUARD, useClass: AccessGuard },
    { provide: APP_PIPE, useClass: RequestValidationPipe },
    { provide: APP_INTERCEPTOR, useClass: StandardSchemaSerializerInterceptor },
    { provide: APP_FILTER, useClass: RefusalFilter },
  ],
})
export class CommonModule {}
