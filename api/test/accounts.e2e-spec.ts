import { eq } from 'drizzle-orm'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { ErrorBody } from '#api/common/dto/error.schema.ts'
import { oneTimeTokens, refreshTokens } from '#api/database/schema/sessions.ts'
import { users } from '#api/database/schema/users.ts'
import { demoAccounts, demoPassword } from '#api/database/seed/demo.ts'
import { type Agent, createTestApp, type TestApp } from './create-test-app.ts'

let test: TestApp
beforeAll(async () => {
  test = await createTestApp()
})
afterAll(() => test.close())

const password = 'four words in a row'

/** The token of the link in the newest mail for this address. */
async function mailedToken(email: string, page: string): Promise<string> {
  const mail = await test.newestMail(email)
  const link = new RegExp(`http://localhost:4310${page}\\?token=([\\w-]+)`).exec(mail?.text ?? '')
  expect(mail?.html).toContain(link?.[0])
  return link![1]!
}

async function newAccount(email: string): Promise<Agent> {
  const agent = test.caller()
  await agent.post('/api/auth/sign-up').send({ name: 'Apprentice Two', email, password }).expect(202)
  await agent
    .post('/api/auth/confirmation')
    .send({ token: await mailedToken(email, '/confirm') })
    .expect(200)
  return agent
}

const cookie = (response: { headers: unknown }, name: string): string => {
  const all = (response.headers as { 'set-cookie'?: string[] })['set-cookie'] ?? []
  return all.find((line) => line.startsWith(`${name}=`)) ?? ''
}
const sent = (setCookie: string) => setCookie.split(';')[0]!

const signIn = (email: string, withPassword = password) =>
  test.caller().post('/api/auth/session').send({ email, password: withPassword })

describe('an account', () => {
  it('is made, confirmed, left and entered again', async () => {
    const email = 'life@leatwright.test'
    const agent = test.caller()
    await agent.post('/api/auth/sign-up').send({ name: ' Apprentice Two ', email, password }).expect(202, {})
    await signIn(email).expect(401)

    const token = await mailedToken(email, '/confirm')
    const confirmed = await agent.post('/api/auth/confirmation').send({ token }).expect(200)
    expect(confirmed.body).toEqual({
      user: { id: expect.any(String) as string, email, name: 'Apprentice Two', role: 'learner' },
    })
    await agent.get('/api/users/me').expect(200)

    await agent.delete('/api/auth/session').expect(204)
    await agent.get('/api/users/me').expect(401)

    await agent.post('/api/auth/session').send({ email: 'LIFE@leatwright.test', password }).expect(200)
    await agent.get('/api/users/me').expect(200)
  })

  it('is stored with hashes only', async () => {
    const email = 'hashes@leatwright.test'
    await test.caller().post('/api/auth/sign-up').send({ name: 'A', email, password }).expect(202)
    const token = await mailedToken(email, '/confirm')
    const confirmed = await test.caller().post('/api/auth/confirmation').send({ token }).expect(200)
    const refresh = sent(cookie(confirmed, 'leatwright_refresh')).split('=')[1]!
    const [user] = await test.database.select().from(users).where(eq(users.email, email))
    expect(user!.passwordHash).toMatch(/^\$argon2id\$/)
    const kept = JSON.stringify([
      await test.database.select().from(refreshTokens),
      await test.database.select().from(oneTimeTokens),
    ])
    expect(kept).not.toContain(refresh)
    expect(kept).not.toContain(token)
  })

  it('gives cookies that no script reads and no other site sends with a form', async () => {
    const { email } = demoAccounts.learner
    const response = await signIn(email, demoPassword).expect(200)
    expect(cookie(response, 'leatwright_access')).toMatch(/; Path=\/; .*HttpOnly; SameSite=Lax/)
    expect(cookie(response, 'leatwright_refresh')).toMatch(/; Path=\/api\/auth\/session; .*HttpOnly; SameSite=Lax/)
  })

  it('is confirmed by its newest link only, once', async () => {
    const email = 'twice@leatwright.test'
    const agent = test.caller()
    await agent.post('/api/auth/sign-up').send({ name: 'First', email, password }).expect(202)
    const older = await mailedToken(email, '/confirm')
    await agent.post('/api/auth/sign-up').send({ name: 'Second', email, password: 'another long one' }).expect(202)
    const newer = await mailedToken(email, '/confirm')

    const dead = await agent.post('/api/auth/confirmation').send({ token: older }).expect(410)
    expect(dead.body).toMatchObject({ code: 'link-spent' })
    await agent.post('/api/auth/confirmation').send({ token: newer }).expect(200)
    await agent.post('/api/auth/confirmation').send({ token: newer }).expect(410)
    await signIn(email).expect(401)
    await signIn(email, 'another long one').expect(200)
  })

  it('is not confirmed by a link that is too old', async () => {
    const email = 'late@leatwright.test'
    await test.caller().post('/api/auth/sign-up').send({ name: 'Late', email, password }).expect(202)
    const token = await mailedToken(email, '/confirm')
    await test.database.update(oneTimeTokens).set({ expiresAt: new Date(Date.now() - 1000) })
    await test.caller().post('/api/auth/confirmation').send({ token }).expect(410)
  })
})

describe('a forgotten password', () => {
  it('is replaced by a link from a mail, and every open session ends', async () => {
    const email = 'forgot@leatwright.test'
    const elsewhere = await newAccount(email)
    const agent = test.caller()
    await agent.post('/api/auth/password-reset-requests').send({ email }).expect(202, {})
    const token = await mailedToken(email, '/reset-password')

    await agent.post('/api/auth/confirmation').send({ token }).expect(410)
    await agent.post('/api/auth/password-resets').send({ token, password: 'short' }).expect(422)
    await agent.post('/api/auth/password-resets').send({ token, password: 'a new long one' }).expect(200)
    await agent.get('/api/users/me').expect(200)
    await agent.post('/api/auth/password-resets').send({ token, password: 'one more of them' }).expect(410)

    await elsewhere.get('/api/users/me').expect(401)
    await elsewhere.post('/api/auth/session/refresh').expect(401)
    await signIn(email).expect(401)
    await signIn(email, 'a new long one').expect(200)
  })
})

describe('a session', () => {
  it('goes on with a new refresh token each time', async () => {
    const agent = await newAccount('goes-on@leatwright.test')
    const first = await agent.post('/api/auth/session/refresh').expect(200)
    const second = await agent.post('/api/auth/session/refresh').expect(200)
    expect(sent(cookie(first, 'leatwright_refresh'))).not.toBe(sent(cookie(second, 'leatwright_refresh')))
    expect(second.body).toMatchObject({ user: { email: 'goes-on@leatwright.test' } })
    await agent.get('/api/users/me').expect(200)
  })

  it('ends, with everything that came from it, when a spent refresh token comes again', async () => {
    const agent = await newAccount('reuse@leatwright.test')
    const signedIn = await signIn('reuse@leatwright.test').expect(200)
    const stolen = sent(cookie(signedIn, 'leatwright_refresh'))
    const refresh = (cookies: string) => test.caller().post('/api/auth/session/refresh').set('Cookie', cookies)

    const renewed = await refresh(stolen).expect(200)
    await test
      .caller()
      .get('/api/users/me')
      .set('Cookie', sent(cookie(renewed, 'leatwright_access')))
      .expect(200)

    const again = await refresh(stolen).expect(401)
    expect(again.body).toMatchObject({ code: 'session-ended' })
    await refresh(sent(cookie(renewed, 'leatwright_refresh'))).expect(401)
    await test
      .caller()
      .get('/api/users/me')
      .set('Cookie', sent(cookie(renewed, 'leatwright_access')))
      .expect(401)
    // Another sign-in of the same person is another family.
    await agent.get('/api/users/me').expect(200)
  })

  it('is refused with a signature that is not ours', async () => {
    const signedIn = await signIn(demoAccounts.learner.email, demoPassword).expect(200)
    const access = sent(cookie(signedIn, 'leatwright_access'))
    await test.caller().get('/api/users/me').set('Cookie', access).expect(200)
    const foreign = access.replace(/[^.]+$/, (signature) => [...signature].reverse().join(''))
    await test.caller().get('/api/users/me').set('Cookie', foreign).expect(401)
  })
})

describe('the anti-forgery header', () => {
  it('is needed where a session cookie is read and something changes', async () => {
    const signedIn = await signIn(demoAccounts.learner.email, demoPassword).expect(200)
    const cookies = [sent(cookie(signedIn, 'leatwright_access')), sent(cookie(signedIn, 'leatwright_refresh'))]
    const forged = request(test.app.getHttpServer())

    const refused = await forged.post('/api/auth/session/refresh').set('Cookie', cookies).expect(403)
    expect(refused.body).toMatchObject({ code: 'anti-forgery' })
    await forged.delete('/api/auth/session').set('Cookie', cookies).expect(403)
    // Reading needs no header, and the session is still there.
    await forged.get('/api/users/me').set('Cookie', cookies).expect(200)
    await test.caller().delete('/api/auth/session').set('Cookie', cookies).expect(204)
  })
})

describe('answers do not tell whether an address is known', () => {
  const known = demoAccounts.learner.email
  const unknown = 'nobody@leatwright.test'
  const told = (response: { status: number; body: unknown; headers: unknown }) => {
    const headers = { ...(response.headers as Record<string, string>), date: '', etag: '' }
    return { status: response.status, body: response.body, headers }
  }

  it('at sign-in', async () => {
    const wrong = await signIn(known, 'not the password')
    expect(wrong.status).toBe(401)
    expect(told(await signIn(unknown, 'not the password'))).toEqual(told(wrong))
    // Nor does signing up first open a way to find out.
    const waiting = 'waiting@leatwright.test'
    await test.caller().post('/api/auth/sign-up').send({ name: 'W', email: waiting, password }).expect(202)
    expect(told(await signIn(waiting))).toEqual(told(wrong))
  })

  it('at sign-up, where the owner learns by mail', async () => {
    const signUp = (email: string) => test.caller().post('/api/auth/sign-up').send({ name: 'N', email, password })
    const ofUnknown = await signUp('fresh@leatwright.test').expect(202)
    expect(told(await signUp(known))).toEqual(told(ofUnknown))
    expect((await test.newestMail(known))?.subject).toBe('You have an account already')
    await signIn(known, demoPassword).expect(200)
  })

  it('at a forgotten password', async () => {
    const ask = (email: string) => test.caller().post('/api/auth/password-reset-requests').send({ email })
    expect(told(await ask(unknown))).toEqual(told(await ask(known)))
    expect(await test.newestMail(unknown)).toBeUndefined()
  })
})

describe('what is sent', () => {
  const fieldsOf = (response: { body: unknown }) => (response.body as ErrorBody).fields

  it('is refused field by field', async () => {
    const refused = await test.caller().post('/api/auth/sign-up').send({ email: 'x', password: 'short' }).expect(422)
    expect(refused.body).toMatchObject({ code: 'invalid' })
    expect(fieldsOf(refused).map(({ field }) => field)).toEqual(['name', 'email', 'password'])
    expect(fieldsOf(refused)[2]!.message).toContain('at least ten characters')
  })

  it('may hold nothing that was not asked for', async () => {
    const refused = await test
      .caller()
      .post('/api/auth/session')
      .send({ email: 'a@leatwright.test', password, role: 'admin' })
      .expect(422)
    expect(fieldsOf(refused)).toMatchObject([{ field: 'role', code: 'unknown' }])
  })

  it('is refused in the one shape when it is no JSON, too large, or goes nowhere', async () => {
    const post = () => test.caller().post('/api/auth/session').set('Content-Type', 'application/json')
    expect((await post().send('{"email":').expect(400)).body).toMatchObject({ code: 'malformed', fields: [] })
    const large = JSON.stringify({ email: 'x'.repeat(300_000) })
    expect((await post().send(large).expect(413)).body).toMatchObject({ code: 'too-large', fields: [] })
    expect((await test.caller().get('/api/nowhere').expect(404)).body).toMatchObject({ code: 'not-found', fields: [] })
  })

  it('is not read from a form', async () => {
    await test
      .caller()
      .post('/api/auth/session')
      .type('form')
      .send({ email: demoAccounts.learner.email, password: demoPassword })
      .expect(422)
  })
})
