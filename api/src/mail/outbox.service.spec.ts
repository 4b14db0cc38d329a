import { Logger } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { openTestDatabase } from '../../test/create-test-app.ts'
import { readEnvironment } from '../config/environment.ts'
import type { DatabaseConnection } from '../database/connection.ts'
import { mails } from '../database/schema/mails.ts'
import { confirmAddressMail } from './messages.ts'
import { OutboxService, waitMinutes } from './outbox.service.ts'

let connection: DatabaseConnection
Logger.overrideLogger(false)
beforeAll(async () => {
  connection = await openTestDatabase()
})
afterAll(() => connection.close())
beforeEach(() => connection.database.delete(mails))

/** A mail server that takes mail or refuses it, as it is told. */
function serverThat(answer: (to: string) => Promise<void>) {
  const taken: { to: string; messageId: string }[] = []
  const sendMail = async (mail: { to: string; messageId: string }) => {
    await answer(mail.to)
    taken.push(mail)
  }
  const outbox = new OutboxService(
    connection.database,
    { sendMail } as unknown as ConstructorParameters<typeof OutboxService>[1],
    new ConfigService(readEnvironment({})),
  )
  return { outbox, taken }
}
const refuses = () => Promise.reject(new Error('451 try later'))
const takes = () => Promise.resolve()

const message = confirmAddressMail({ link: 'http://localhost:4310/confirm?token=x' })
const write = (outbox: OutboxService, to: string) =>
  connection.database.transaction((transaction) => outbox.add(transaction, to, message))
const kept = async () => (await connection.database.select().from(mails))[0]!
const makeDue = () => connection.database.update(mails).set({ nextTryAt: new Date(Date.now() - 1000) })

describe('the outbox', () => {
  it('sends what is due, once', async () => {
    const { outbox, taken } = serverThat(takes)
    await write(outbox, 'one@leatwright.test')
    await outbox.sendDue()
    await outbox.sendDue()
    expect(taken.map(({ to }) => to)).toEqual(['one@leatwright.test'])
    expect(await kept()).toMatchObject({ tries: 1, sentAt: expect.any(Date) as Date, deadAt: null })
  })

  it('keeps nothing of a transaction that failed', async () => {
    const { outbox } = serverThat(takes)
    const failing = connection.database.transaction(async (transaction) => {
      await outbox.add(transaction, 'one@leatwright.test', message)
      throw new Error('the cause failed')
    })
    await expect(failing).rejects.toThrow('the cause failed')
    expect(await connection.database.$count(mails)).toBe(0)
  })

  it('waits after a refusal, longer each time, and sends the same mail when the server takes it', async () => {
    const refusing = serverThat(refuses)
    await write(refusing.outbox, 'one@leatwright.test')
    const waits: number[] = []
    for (let tries = 0; tries < 3; tries++) {
      await makeDue()
      await refusing.outbox.sendDue()
      waits.push((await kept()).nextTryAt.getTime() - Date.now())
    }
    expect(waits).toEqual(waits.toSorted((a, b) => a - b))
    expect(await kept()).toMatchObject({ tries: 3, sentAt: null, deadAt: null, lastError: '451 try later' })

    const taking = serverThat(takes)
    await taking.outbox.sendDue()
    expect(taking.taken).toEqual([])
    await makeDue()
    await taking.outbox.sendDue()
    expect(taking.taken[0]!.messageId).toBe(`<${(await kept()).id}@leatwright>`)
    expect(await kept()).toMatchObject({ tries: 4, sentAt: expect.any(Date) as Date, lastError: null })
  })

  it('gives a mail up after the last try and never tries it again', async () => {
    const refusing = serverThat(refuses)
    await write(refusing.outbox, 'one@leatwright.test')
    for (let tries = 0; tries <= waitMinutes.length; tries++) {
      await makeDue()
      await refusing.outbox.sendDue()
    }
    expect(await kept()).toMatchObject({ tries: waitMinutes.length + 1, deadAt: expect.any(Date) as Date })
    const taking = serverThat(takes)
    await makeDue()
    await taking.outbox.sendDue()
    expect(taking.taken).toEqual([])
  })

  it('sends the others when one is refused', async () => {
    const { outbox, taken } = serverThat((to) => (to.startsWith('refused') ? refuses() : takes()))
    await write(outbox, 'refused@leatwright.test')
    await write(outbox, 'taken@leatwright.test')
    await outbox.sendDue()
    expect(taken.map(({ to }) => to)).toEqual(['taken@leatwright.test'])
  })

  it('is not sent by two at once', async () => {
    const first = serverThat(takes)
    const second = serverThat(takes)
    for (let n = 0; n < 5; n++) await write(first.outbox, `learner-${n}@leatwright.test`)
    await Promise.all([first.outbox.sendDue(), second.outbox.sendDue()])
    expect(first.taken.length + second.taken.length).toBe(5)
  })

  it('finishes what it is sending before the server stops', async () => {
    let release = () => {}
    const { outbox, taken } = serverThat(() => new Promise((resolve) => (release = resolve)))
    await write(outbox, 'one@leatwright.test')
    outbox.nudge()
    while ((await kept()).tries === 0) await new Promise((resolve) => setTimeout(resolve, 5))
    const stopped = outbox.onModuleDestroy()
    release()
    await stopped
    expect(taken).toHaveLength(1)
    expect((await kept()).sentAt).not.toBeNull()
  })
})

describe('a message', () => {
  it('says the same as text and as HTML', () => {
    expect(message.text).toContain('http://localhost:4310/confirm?token=x')
    expect(message.html).toContain('href="http://localhost:4310/confirm?token=x"')
  })
})
