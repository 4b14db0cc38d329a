/** `npm run dev`: the server is built and started again at every change, and the site comes from Vite's own server. */
import path from 'node:path'
import { build, createServer } from 'vite'
import { startMailFake } from '../fakes/mail-fake.ts'
import { mailFakePorts, readEnvironment } from '../src/config/environment.ts'
import { demoAccounts, demoPassword } from '../src/database/seed/demo.ts'
import { projectRoot } from '../src/project-root.ts'
import { ended, startServer } from './server-process.ts'

const { PORT } = readEnvironment(process.env)
const target = `http://localhost:${PORT}`
const site = await createServer({
  root: path.join(projectRoot, 'site'),
  server: { proxy: { '/api': { target }, '/lessons': { target } } },
})
await site.listen()
const siteUrl = site.resolvedUrls!.local[0]!.replace(/\/$/, '')

const environment = readEnvironment({ PUBLIC_URL: siteUrl, ...process.env })
const ports = mailFakePorts(PORT)
if (!process.env.SMTP_URL) {
  const file = path.join(environment.DATA_DIR, 'mail-fake.jsonl')
  await startMailFake({ smtpPort: ports.smtp, inboxPort: ports.inbox, file })
}

const serverEnvironment = { ...process.env, PUBLIC_URL: environment.PUBLIC_URL }
const announce = () => {
  console.log(`\nLeatwright: ${siteUrl} (the site; /api and /lessons go to port ${PORT})`)
  if (!process.env.SMTP_URL) console.log(`Mail inbox: http://localhost:${ports.inbox}`)
  console.log(
    `Demo accounts: ${Object.values(demoAccounts)
      .map(({ email }) => email)
      .join(', ')} (${demoPassword})`,
  )
}

const watcher = await build({ root: path.join(projectRoot, 'api'), build: { watch: {} } })
if (!('on' in watcher)) throw new Error('The server is not being watched.')

let server: ReturnType<typeof startServer> | undefined
/** One after the other: the new process may open the data folder only when the old one has let go of it. */
let restarting = Promise.resolve()
watcher.on('event', (event) => {
  if (event.code === 'ERROR') console.error(event.error)
  if (event.code !== 'BUNDLE_END') return
  void event.result.close()
  restarting = restarting.then(async () => {
    await stopServer()
    server = startServer(serverEnvironment, announce)
  })
})

async function stopServer() {
  if (!server || server.exitCode !== null) return
  const stopped = ended(server)
  server.kill('SIGTERM')
  await stopped
}

for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.on(signal, () => {
    void stopServer().then(() => process.exit(0))
  })
}
