import { fork } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { build } from 'vite'
import { freePort } from '../scripts/free-port.ts'
import { ended } from '../scripts/server-process.ts'
import { projectRoot } from '../src/project-root.ts'

/** The server, built afresh and started on a free port with a database of its own. */
export async function openServer(): Promise<{ origin: string; close: () => Promise<void> }> {
  const outDir = path.join(projectRoot, 'dist/fuzz')
  await build({ configFile: path.join(projectRoot, 'api/vite.config.ts'), logLevel: 'warn', build: { outDir } })
  const folder = mkdtempSync(path.join(tmpdir(), 'leatwright-fuzz-'))
  const port = await freePort()
  const server = fork(path.join(outDir, 'main.js'), {
    env: {
      ...{ PATH: process.env.PATH, NODE_ENV: 'test', PORT: String(port), DATA_DIR: folder, DEMO: '0' },
      // Nothing listens there: no mail is sent.
      SMTP_URL: 'smtp://127.0.0.1:9',
    },
    execArgv: ['--enable-source-maps'],
  })
  const isOver = ended(server)
  await Promise.race([
    new Promise((resolve) => server.once('message', resolve)),
    isOver.then((code) => Promise.reject(new Error(`The server ended with ${code} before it took requests.`))),
  ])
  return {
    origin: `http://127.0.0.1:${port}`,
    close: async () => {
      server.kill('SIGTERM')
      await isOver
      rmSync(folder, { recursive: true, force: true })
    },
  }
}
