import { Module } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { createTransport } from 'nodemailer'
import type { Environment } from '../config/environment.ts'
import { MAIL_TRANSPORT, OutboxService } from './outbox.service.ts'

@Module({
  providers: [
    {
      provide: MAIL_TRANSPORT,
      inject: [ConfigService],
      useFactory: (config: ConfigService<Environment, true>) =>
        createTransport(config.get('SMTP_URL', { infer: true })),
    },
    OutboxService,
  ],
  exports: [OutboxService],
})
export class MailModule {}
