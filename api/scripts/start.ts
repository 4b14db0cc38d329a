/** `npm start`: builds what is missing or older than its sources, starts the mail fake unless SMTP_URL is set, and the server. */
import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync, statSync } from 'node:fs'
import path from 'node:path'
import { type MailFake, startMailFake } from '../fakes/mail-fake.ts'
import { type Environment, mailFakePorts, readEnvironment } from '../src/config/environment.ts'
import { demoAccounts, demoPassword } from '../src/database/seed/demo.ts'
import { projectRoot } from '../src/project-root.ts'
import { builtServer, ended, startServer } from './server-process.ts'

const inProject = (name: string) => path.join(projectRoot, name)

/** Each part with what it is built from; everything depends on the packages too. */
const parts = [
  { script: 'build:site', built: inProject('dist/site/shell.html'), sources: ['calc', 'content', 'site', 'api/src'] },
  { script: 'build:api', built: builtServer, sources: ['calc', 'content', 'api/src', 'api/vite.config.ts'] },
]

function newest(source: string): number {
  const { mtimeMs } = statSync(source)
  if (!statSync(source).isDirectory()) return mtimeMs
  return Math.max(mtimeMs, ...readdirSync(source).map((name) => newest(path.join(source, name))))
}

function buildWhatIsOld() {
  for (const { script, built, sources } of parts) {
    const changed = Math.max(
      ...['package.json', 'package-lock.json', ...sources].map((name) => newest(inProject(name))),
    )
    if (existsSync(built) && statSync(built).mtimeMs >= changed) continue
    const { status } = spawnSync('npm', ['run', '--silent', script], {
      cwd: projectRoot,
      stdio: 'inherit',
      // However the server is to run, the site is always built to be served.
      env: { ...process.env, NODE_ENV: 'production' },
    })
    if (status !== 0) throw new Error(`npm run ${script} failed.`)
  }
}

function printAddresses(environment: Environment, mailFake: MailFake | undefined) {
  console.log(`\nLeatwright: ${environment.PUBLIC_URL}`)
  if (mailFake) console.log(`Mail inbox: http://localhost:${mailFake.inboxPort}`)
  if (environment.DEMO) {
    console.log(`Demo accounts (password ${demoPassword}):`)
    for (const { name, email, role } of Object.values(demoAccounts)) console.log(`  ${email}  ${name} (${role})`)
  }
}

async function start() {
  const environment = readEnvironment(process.env)
  buildWhatIsOld()
  const ports = mailFakePorts(environment.PORT)
  const mailFake = process.env.SMTP_URL
    ? undefined
    : await startMailFake({
        smtpPort: ports.smtp,
        inboxPort: ports.inbox,
        file: path.join(environment.DATA_DIR, 'mail-fake.jsonl'),
      })
  const server = startServer(process.env, () => printAddresses(environment, mailFake))
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => server.kill(signal))
  const code = await ended(server)
  await mailFake?.close()
  process.exit(code)
}

start().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error)
  process.exit(1)
})
