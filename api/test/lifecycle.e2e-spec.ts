import { fork, type ChildProcess } from 'node:child_process'
import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { demoAccounts, demoPassword } from '#api/database/seed/demo.ts'
import { builtServer } from '../scripts/server-process.ts'

/** The built server as its own process; these take a while, and need `npm run build` before them. */
describe.runIf(process.env.DEEP)('the server process', () => {
  let folder: string
  let running: ChildProcess[]
  beforeEach(() => {
    expect(existsSync(builtServer), 'npm run build:api comes first').toBe(true)
    folder = mkdtempSync(path.join(tmpdir(), 'leatwright-'))
    running = []
  })
  afterEach(() => {
    for (const child of running) child.kill('SIGKILL')
    rmSync(folder, { recursive: true, force: true })
  })

  const start = (port: number) => {
    const child = fork(builtServer, {
      env: { ...process.env, NODE_ENV: 'test', PORT: String(port), DATA_DIR: folder, SMTP_URL: 'smtp://127.0.0.1:9' },
      stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    })
    running.push(child)
    let said = ''
    child.stderr!.on('data', (text) => (said += String(text)))
    const listening = new Promise<void>((resolve) => child.once('message', () => resolve()))
    const ended = new Promise<number | null>((resolve) => child.once('exit', (code) => resolve(code)))
    return { child, listening, ended, said: () => said }
  }

  it('refuses a second start on one data folder at once, and says why', async () => {
    const first = start(5731)
    await first.listening
    const second = start(5732)
    expect(await second.ended).not.toBe(0)
    expect(second.said()).toContain(folder)
    expect((await fetch('http://localhost:5731/api/health')).ok).toBe(true)
  })

  it('starts straight after kill -9 with what was acknowledged, and ends cleanly on SIGTERM', async () => {
    const first = start(5733)
    await first.listening
    const { email } = demoAccounts.learner
    const signedIn = await fetch('http://localhost:5733/api/auth/session', {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ email, password: demoPassword }),
    })
    expect(signedIn.status).toBe(200)
    const cookie = signedIn.headers.getSetCookie().map((line) => line.split(';')[0]!)
    first.child.kill('SIGKILL')
    await first.ended

    const second = start(5733)
    await second.listening
    const me = await fetch('http://localhost:5733/api/users/me', { headers: { cookie: cookie.join('; ') } })
    expect(await me.json()).toMatchObject({ email })
    second.child.kill('SIGTERM')
    expect(await second.ended).toBe(0)
  })
})
