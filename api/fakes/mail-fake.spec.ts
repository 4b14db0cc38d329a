import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { createTransport } from 'nodemailer'
import { afterAll, expect, it } from 'vitest'
import { type FakeMessage, type MailFake, startMailFake } from './mail-fake.ts'

const folder = mkdtempSync(path.join(tmpdir(), 'leatwright-mail-'))
afterAll(() => rmSync(folder, { recursive: true }))

const start = () => startMailFake({ smtpPort: 0, inboxPort: 0, file: path.join(folder, 'mail.jsonl') })

const inbox = async (fake: MailFake, to: string) => {
  const response = await fetch(`http://127.0.0.1:${fake.inboxPort}/messages?to=${to}`)
  return (await response.json()) as FakeMessage[]
}

it('keeps what was sent by SMTP for each recipient, also over a restart, and shows it without running it', async () => {
  const first = await start()
  const transport = createTransport(`smtp://127.0.0.1:${first.smtpPort}`)
  const send = (to: string, text: string) =>
    transport.sendMail({ from: 'office@leatwright.test', to, subject: 'Forebay', text })
  await send('one@leatwright.test', 'See http://localhost:4310/confirm?token=x')
  await send('two@leatwright.test', '<script>alert(1)</script>')
  expect(await inbox(first, 'ONE@leatwright.test')).toMatchObject([{ subject: 'Forebay', to: ['one@leatwright.test'] }])
  const page = await (await fetch(`http://127.0.0.1:${first.inboxPort}/`)).text()
  expect(page).toContain('href="http://localhost:4310/confirm?token=x"')
  expect(page).not.toContain('<script>')
  await first.close()

  const second = await start()
  expect(await inbox(second, 'one@leatwright.test')).toHaveLength(1)
  expect(await inbox(second, 'two@leatwright.test')).toHaveLength(1)
  await second.close()
})
