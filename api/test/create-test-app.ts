import { createHash } from 'node:crypto'
import { existsSync, openAsBlob, readdirSync, readFileSync } from 'node:fs'
import { mkdir, rename, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { PGlite } from '@electric-sql/pglite'
import type { Type } from '@nestjs/common'
import type { NestExpressApplication } from '@nestjs/platform-express'
import { desc, eq } from 'drizzle-orm'
import request from 'supertest'
import { AppModule } from '#api/app.module.ts'
import { antiForgeryHeader } from '#api/common/guards/access.guard.ts'
import { readEnvironment } from '#api/config/environment.ts'
import { createApp } from '#api/create-app.ts'
import { type Database, type DatabaseConnection, migrationsFolder, openEmbedded } from '#api/database/connection.ts'
import { enrolments } from '#api/database/schema/courses.ts'
import { mails } from '#api/database/schema/mails.ts'
import { users } from '#api/database/schema/users.ts'
import { demoAccounts, demoPassword } from '#api/database/seed/demo.ts'
import { projectRoot } from '#api/project-root.ts'
import type { Role } from '#api/users/dto/user.schema.ts'

export type Agent = ReturnType<typeof request.agent>

export interface TestApp {
  app: NestExpressApplication
  database: Database
  /** A caller without cookies yet; it keeps those it is given and sends the anti-forgery header, like the site. */
  caller(): Agent
  /** A caller signed in as the demo account of this role. The demo learner is enrolled in every course. */
  signInAs(role: Role): Promise<Agent>
  /** A caller signed in as a new learner, enrolled in these courses only. */
  signInAsNewLearner(courseSlugs?: readonly string[]): Promise<Agent>
  /** The newest mail in the outbox for this address, sent or not. */
  newestMail(recipient: string): Promise<typeof mails.$inferSelect | undefined>
  close(): Promise<void>
}

export interface TestAppOptions {
  /** Settings of the environment. */
  settings?: Readonly<Record<string, string>>
  /** More routes. */
  controllers?: Type[]
  /** A built site other than that in `dist/site/`. */
  siteFolder?: string
}

/** Nothing listens there: mail stays in the outbox, where `newestMail` finds it. */
const noMailServer = 'smtp://127.0.0.1:9'

/** The whole application on an in-memory database with the shipped migrations, the courses and the demo accounts. */
export async function createTestApp({
  settings = {},
  controllers = [],
  siteFolder,
}: TestAppOptions = {}): Promise<TestApp> {
  const environment = readEnvironment({
    NODE_ENV: 'test',
    SMTP_URL: noMailServer,
    TRIES_PER_ACCOUNT: '1000',
    TRIES_PER_ADDRESS: '1000',
    ...settings,
  })
  const connection = await openTestDatabase()
  const app = await createApp({ ...AppModule.forRoot(environment, connection, siteFolder), controllers }, [])
  const { database } = connection
  let learners = 0

  const caller = () => request.agent(app.getHttpServer()).set(antiForgeryHeader.name, antiForgeryHeader.value)
  const signIn = async (email: string) => {
    const agent = caller()
    await agent.post('/api/auth/session').send({ email, password: demoPassword }).expect(200)
    return agent
  }

  return {
    app,
    database,
    caller,
    signInAs: (role) => signIn(demoAccounts[role].email),
    async signInAsNewLearner(courseSlugs = []) {
      learners += 1
      const email = `learner-${learners}@leatwright.test`
      const [demo] = await database
        .select({ passwordHash: users.passwordHash })
        .from(users)
        .where(eq(users.email, demoAccounts.learner.email))
      const [user] = await database
        .insert(users)
        .values({ name: `Learner ${learners}`, email, passwordHash: demo!.passwordHash, confirmedAt: new Date() })
        .returning({ id: users.id })
      if (courseSlugs.length > 0) {
        await database.insert(enrolments).values(courseSlugs.map((courseSlug) => ({ userId: user!.id, courseSlug })))
      }
      return signIn(email)
    },
    async newestMail(recipient) {
      const [mail] = await database
        .select()
        .from(mails)
        .where(eq(mails.recipient, recipient))
        .orderBy(desc(mails.createdAt))
        .limit(1)
      return mail
    },
    close: () => app.close(),
  }
}

/** An in-memory database, loaded from a dump that was migrated once: migrating anew would cost each test file seconds. */
export async function openTestDatabase(): Promise<DatabaseConnection> {
  return openEmbedded(await PGlite.create({ loadDataDir: await migratedDump() }))
}

async function migratedDump(): Promise<Blob> {
  const migrations = createHash('sha256')
  for (const name of readdirSync(migrationsFolder).sort()) {
    if (name.endsWith('.sql')) migrations.update(readFileSync(path.join(migrationsFolder, name)))
  }
  const folder = path.join(projectRoot, '.cache')
  const file = path.join(folder, `test-database-${migrations.digest('hex').slice(0, 16)}.tar`)
  if (!existsSync(file)) {
    const client = await PGlite.create()
    await openEmbedded(client)
    const dump = await client.dumpDataDir('none')
    await client.close()
    await mkdir(folder, { recursive: true })
    // Under another name first: test files run side by side, and none may load half a dump.
    const partial = `${file}.${process.pid}`
    await writeFile(partial, Buffer.from(await dump.arrayBuffer()))
    await rename(partial, file)
  }
  return openAsBlob(file)
}
