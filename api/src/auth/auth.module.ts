import { Module } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { JwtModule } from '@nestjs/jwt'
import { ThrottlerModule } from '@nestjs/throttler'
import type { Environment } from '../config/environment.ts'
import { MailModule } from '../mail/mail.module.ts'
import { AuthController } from './auth.controller.ts'
import { AuthService } from './auth.service.ts'
import { SessionCookies } from './session-cookies.ts'
import { accessSeconds, SessionsService } from './sessions.service.ts'
import { TriesOptions } from './tries.guard.ts'

@Module({
  imports: [
    MailModule,
    ThrottlerModule.forRootAsync({ useClass: TriesOptions }),
    JwtModule.registerAsync({
      inject: [ConfigService],
      useFactory: (config: ConfigService<Environment, true>) => ({
        secret: config.get('JWT_SECRET', { infer: true }),
        signOptions: { algorithm: 'HS256', expiresIn: accessSeconds },
        verifyOptions: { algorithms: ['HS256'] },
      }),
    }),
  ],
  controllers: [AuthController],
  providers: [AuthService, SessionsService, SessionCookies],
  exports: [SessionsService, SessionCookies],
})
export class AuthModule {}
