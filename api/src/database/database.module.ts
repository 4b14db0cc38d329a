import { type DynamicModule, Inject, Module, type OnApplicationShutdown } from '@nestjs/common'
import type { DatabaseConnection } from './connection.ts'
import { DATABASE } from './inject-database.ts'
import { SeedService } from './seed/seed.service.ts'

const CONNECTION = Symbol('connection')

@Module({})
export class DatabaseModule implements OnApplicationShutdown {
  constructor(@Inject(CONNECTION) private readonly connection: DatabaseConnection) {}

  /** The connection is opened before the application, so that a locked folder or a bad migration is told by itself. */
  static forRoot(connection: DatabaseConnection): DynamicModule {
    return {
      module: DatabaseModule,
      global: true,
      providers: [
        { provide: CONNECTION, useValue: connection },
        { provide: DATABASE, useValue: connection.database },
        SeedService,
      ],
      exports: [DATABASE],
    }
  }

  async onApplicationShutdown() {
    await this.connection.close()
  }
}
