import path from 'node:path'
import { PGlite } from '@electric-sql/pglite'
import { drizzle as drizzleServer } from 'drizzle-orm/node-postgres'
import { migrate as migrateServer } from 'drizzle-orm/node-postgres/migrator'
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core'
import { drizzle as drizzleEmbedded } from 'drizzle-orm/pglite'
import { migrate as migrateEmbedded } from 'drizzle-orm/pglite/migrator'
import { Pool } from 'pg'
import type { Environment } from '../config/environment.ts'
import { projectRoot } from '../project-root.ts'
import { lockFolder } from './folder-lock.ts'

export type Database = PgDatabase<PgQueryResultHKT>
/** What a service takes that writes inside the transaction of another. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]

export interface DatabaseConnection {
  database: Database
  close(): Promise<void>
}

const casing = 'snake_case'
export const migrationsFolder = path.join(projectRoot, 'drizzle')

/** The database of these settings, with every migration run. */
export async function openDatabase(environment: Pick<Environment, 'DATABASE_URL' | 'DATA_DIR'>) {
  return environment.DATABASE_URL ? openServer(environment.DATABASE_URL) : openFolder(environment.DATA_DIR)
}

async function openServer(url: string): Promise<DatabaseConnection> {
  const pool = new Pool({ connectionString: url })
  const database = drizzleServer(pool, { casing })
  await migrateServer(database, { migrationsFolder })
  return { database, close: () => pool.end() }
}

async function openFolder(folder: string): Promise<DatabaseConnection> {
  const lock = await lockFolder(folder)
  const connection = await openEmbedded(await PGlite.create(path.join(folder, 'db')))
  return {
    database: connection.database,
    async close() {
      await connection.close()
      lock.close()
    },
  }
}

export async function openEmbedded(client: PGlite): Promise<DatabaseConnection> {
  const database = drizzleEmbedded(client, { casing })
  await migrateEmbedded(database, { migrationsFolder })
  return { database, close: () => client.close() }
}
