import { appendFile, mkdir, readFile } from 'node:fs/promises'
import { createServer, type ServerResponse } from 'node:http'
import type { Server } from 'node:net'
import path from 'node:path'
import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { escapeHtml } from '../src/common/escape-html.ts'

export interface FakeMessage {
  id: number
  receivedAt: string
  messageId: string
  from: string
  to: string[]
  subject: string
  text: string
  html: string
}

export interface MailFake {
  smtpPort: number
  inboxPort: number
  close(): Promise<void>
}

/**
 * Stands in for a mail server and for everybody's inbox: takes mail by SMTP, and shows it at a small inbox of its own
 * (`/` to read, `/messages?to=` for programs). Each message is in the file before it is acknowledged, so that a restart
 * loses none. It listens on this machine only. Port 0 takes any that is free.
 */
export async function startMailFake(at: { smtpPort: number; inboxPort: number; file: string }): Promise<MailFake> {
  await mkdir(path.dirname(at.file), { recursive: true })
  const messages = await readMessages(at.file)

  const keep = async (message: Omit<FakeMessage, 'id'>) => {
    const numbered = { id: messages.length + 1, ...message }
    messages.push(numbered)
    await appendFile(at.file, `${JSON.stringify(numbered)}\n`)
  }

  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    onData(stream, session, done) {
      simpleParser(stream)
        .then((mail) =>
          keep({
            receivedAt: new Date().toISOString(),
            messageId: mail.messageId ?? '',
            from: mail.from?.text ?? '',
            to: session.envelope.rcptTo.map(({ address }) => address),
            subject: mail.subject ?? '',
            text: mail.text ?? '',
            html: mail.html || '',
          }),
        )
        .then(
          () => done(),
          (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
        )
    },
  })
  // A connection that breaks off is the sender's to report.
  smtp.on('error', (error: Error) => console.error(`Mail fake: ${error.message}`))

  const inbox = createServer((request, response) => {
    const url = new URL(request.url ?? '/', 'http://localhost')
    const to = url.searchParams.get('to')?.toLowerCase()
    const wanted = messages.filter((message) => !to || message.to.some((address) => address.toLowerCase() === to))
    if (url.pathname === '/messages') answer(response, 'application/json', JSON.stringify(wanted))
    else if (url.pathname === '/') answer(response, 'text/html; charset=utf-8', inboxPage(wanted.toReversed()))
    else response.writeHead(404).end()
  })

  const smtpPort = await listen(smtp.server, at.smtpPort)
  const inboxPort = await listen(inbox, at.inboxPort)
  return {
    smtpPort,
    inboxPort,
    async close() {
      inbox.closeAllConnections()
      await Promise.all([
        new Promise<void>((resolve) => smtp.close(resolve)),
        new Promise((resolve) => inbox.close(resolve)),
      ])
    },
  }
}

async function readMessages(file: string): Promise<FakeMessage[]> {
  const text = await readFile(file, 'utf8').catch((error: NodeJS.ErrnoException) => {
    if (error.code === 'ENOENT') return ''
    throw error
  })
  return text
    .split('\n')
    .filter(Boolean)
    .map((line) => JSON.parse(line) as FakeMessage)
}

function listen(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      const taken = `Port ${port} is taken, and the mail fake needs it: stop what listens there, or set another PORT.`
      reject(error.code === 'EADDRINUSE' ? new Error(taken) : error)
    })
    server.listen(port, '127.0.0.1', () => resolve((server.address() as { port: number }).port))
  })
}

function answer(response: ServerResponse, type: string, body: string) {
  response.writeHead(200, { 'Content-Type': type, 'Cache-Control': 'no-store' }).end(body)
}

const withLinks = (text: string) => escapeHtml(text).replace(/https?:\/\/\S+/g, (url) => `<a href="${url}">${url}</a>`)

const inboxPage = (messages: readonly FakeMessage[]) => `<!doctype html>
<html lang="en">
<meta name="viewport" content="width=device-width">
<title>Mail fake</title>
<style>body{font:16px/1.5 system-ui;max-width:44rem;margin:2rem auto;padding:0 1rem}pre{white-space:pre-wrap;font:inherit}article{border-top:1px solid;padding:1rem 0}</style>
<h1>Mail that was sent</h1>
<p>Nothing leaves this machine: the mail fake keeps it here.</p>
${messages.length === 0 ? '<p>None yet.</p>' : ''}
${messages
  .map(
    (message) => `<article>
<h2>${escapeHtml(message.subject)}</h2>
<p>To ${escapeHtml(message.to.join(', '))}, ${escapeHtml(message.receivedAt)}</p>
<pre>${withLinks(message.text)}</pre>
</article>`,
  )
  .join('\n')}
</html>`
