import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { ErrorBody } from '#api/common/dto/error.schema.ts'
import { demoAccounts, demoPassword } from '#api/database/seed/demo.ts'
import { createTestApp, type TestApp } from './create-test-app.ts'

let test: TestApp
beforeAll(async () => {
  test = await createTestApp({ settings: { TRIES_PER_ACCOUNT: '3', TRIES_PER_ADDRESS: '12' } })
})
afterAll(() => test.close())

const signIn = (email: string, password: string, from: string) =>
  test.caller().post('/api/auth/session').set('X-Forwarded-For', from).send({ email, password })

describe('tries to sign in', () => {
  it('are limited by account, wherever they come from, and the answer says when to try again', async () => {
    const { email } = demoAccounts.admin
    for (const from of ['192.0.2.1', '192.0.2.2', '192.0.2.3']) await signIn(email, 'wrong', from).expect(401)
    const refused = await signIn(email.toUpperCase(), demoPassword, '192.0.2.4').expect(429)
    const { code, message } = refused.body as ErrorBody
    expect(code).toBe('too-many')
    expect(message).toMatch(/Try again in \d+ minutes/)
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    await signIn(demoAccounts.learner.email, demoPassword, '192.0.2.4').expect(200)
  })

  it('are limited alike for an address that nobody has', async () => {
    const email = 'nobody@leatwright.test'
    for (let tries = 0; tries < 3; tries++) await signIn(email, 'wrong', '192.0.2.5').expect(401)
    await signIn(email, 'wrong', '192.0.2.5').expect(429)
  })

  it('are limited by where they come from, whichever account', async () => {
    for (let n = 0; n < 12; n++) await signIn(`guess-${n}@leatwright.test`, 'wrong', '192.0.2.6').expect(401)
    await signIn('guess-13@leatwright.test', 'wrong', '192.0.2.6').expect(429)
    await signIn('guess-13@leatwright.test', 'wrong', '192.0.2.7').expect(401)
  })

  it('cost mail no more than they may', async () => {
    const ask = () =>
      test.caller().post('/api/auth/password-reset-requests').send({ email: demoAccounts.instructor.email })
    for (let n = 0; n < 3; n++) await ask().expect(202)
    await ask().expect(429)
  })
})
