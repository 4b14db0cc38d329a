import { randomUUID } from 'node:crypto'
import { Body, Controller, Get, Post } from '@nestjs/common'
import { JwtService } from '@nestjs/jwt'
import type { Test } from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { Public, Roles, SignedIn } from '#api/common/decorators/access.ts'
import { CurrentUser } from '#api/common/decorators/current-user.ts'
import { antiForgeryHeader } from '#api/common/guards/access.guard.ts'
import { AccessRulesService } from '#api/common/guards/access-rules.service.ts'
import { demoAccounts, demoPassword } from '#api/database/seed/demo.ts'
import type { User } from '#api/users/dto/user.schema.ts'
import { createTestApp, type TestApp } from './create-test-app.ts'

const contentSchema = z.object({ word: z.string() })

@Controller('control')
class DeclaredController {
  @Post('anyone')
  @Public()
  anyone(@CurrentUser() user: User | undefined) {
    return { role: user?.role ?? 'nobody' }
  }

  @Get('anyone')
  @Public()
  read(@CurrentUser() user: User | undefined) {
    return { role: user?.role ?? 'nobody' }
  }

  @Post('signed-in')
  @SignedIn()
  signedIn(@Body({ schema: contentSchema }) { word }: z.infer<typeof contentSchema>) {
    return { word }
  }

  @Get('desk')
  @Roles('instructor', 'admin')
  desk() {
    return {}
  }
}

@Controller('control')
class ForgottenController {
  @Get('forgotten')
  forgotten() {
    return {}
  }
}

describe('every route', () => {
  let test: TestApp
  beforeAll(async () => {
    test = await createTestApp()
  })
  afterAll(() => test.close())

  it('declares who may call it', () => {
    const routes = test.app.get(AccessRulesService).routes()
    expect(routes.map(({ name }) => name)).toContain('AuthController.signIn')
    expect(routes.filter(({ hasRule }) => !hasRule)).toEqual([])
  })

  it('is one of those that were looked at, or a page of the contract', () => {
    const server = test.app.getHttpAdapter().getInstance()
    const served = server.router.stack.flatMap(({ route }) => {
      const methods = Object.keys(route ? (route as unknown as { methods: object }).methods : {})
      // The framework's own answer of "not found" takes every method.
      return methods.length === 1 ? [`${methods[0]} ${route!.path}`] : []
    })
    const pages = served.filter((route) => route.includes(' /api/docs'))
    expect(served).toContain('get /api/users/me')
    expect(served.length - pages.length).toBe(test.app.get(AccessRulesService).routes().length)
  })
})

describe('a route without a declaration', () => {
  it('keeps the server from starting', async () => {
    await expect(createTestApp({ controllers: [ForgottenController] })).rejects.toThrow('ForgottenController.forgotten')
  })
})

describe('a declaration', () => {
  let test: TestApp
  beforeAll(async () => {
    test = await createTestApp({ controllers: [DeclaredController] })
  })
  afterAll(() => test.close())

  it('lets in whom it names', async () => {
    const nobody = test.caller()
    await nobody.get('/api/control/anyone').expect(200, { role: 'nobody' })
    await nobody.post('/api/control/signed-in').send({ word: 'leat' }).expect(401)
    await nobody.get('/api/control/desk').expect(401)

    const learner = await test.signInAs('learner')
    await learner.get('/api/control/anyone').expect(200, { role: 'learner' })
    await learner.post('/api/control/signed-in').send({ word: 'leat' }).expect(201, { word: 'leat' })
    expect((await learner.get('/api/control/desk').expect(403)).body).toMatchObject({ code: 'forbidden' })

    await (await test.signInAs('instructor')).get('/api/control/desk').expect(200)
  })

  it('asks for a renewal of an access token that ran out, even where anyone is let in', async () => {
    const learner = await test.signInAs('learner')
    const { id } = (await learner.get('/api/users/me').expect(200)).body as User
    const stale = await test.app.get(JwtService).signAsync({ sub: id, session: randomUUID() }, { expiresIn: -1 })
    const withStale = (call: Test) => call.set('Cookie', `leatwright_access=${stale}`)
    await withStale(test.caller().get('/api/control/desk')).expect(401)
    await withStale(test.caller().get('/api/control/anyone')).expect(401)
    // What is the same for everybody is answered, and nobody is kept from signing in.
    await withStale(test.caller().get('/api/health')).expect(200)
    const { email } = demoAccounts.learner
    await withStale(test.caller().post('/api/auth/session').send({ email, password: demoPassword })).expect(200)
  })

  it('believes no cookie that comes with a change but without the anti-forgery header', async () => {
    const learner = await test.signInAs('learner')
    const withHeader = (path: string) => learner.post(path).send({ word: 'leat' })
    const withoutHeader = (path: string) => withHeader(path).unset(antiForgeryHeader.name)

    await withHeader('/api/control/anyone').expect(201, { role: 'learner' })
    await withoutHeader('/api/control/anyone').expect(201, { role: 'nobody' })
    const refused = await withoutHeader('/api/control/signed-in').expect(403)
    expect(refused.body).toMatchObject({ code: 'anti-forgery' })
    await learner.get('/api/control/anyone').unset(antiForgeryHeader.name).expect(200, { role: 'learner' })
  })
})
