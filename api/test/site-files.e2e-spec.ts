import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { request as httpRequest } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { courses } from '#api/database/schema/courses.ts'
import { createTestApp, type TestApp } from './create-test-app.ts'

const built: Record<string, string> = {
  'index.html': '<p>home</p>',
  'shell.html': '<p>shell</p>',
  'courses/index.html': '<p>courses</p>',
  'assets/main-4f2a.js': 'main()',
  'sw.js': 'worker()',
  'lessons/reading-the-stream/power-1a2b.js': 'free()',
  'lessons/jet-and-runner/the-jet-3c4d.js': 'paid()',
  'lessons/jet-and-runner/the-jet-3c4d.js.map': 'paid()',
}
const siteFolder = mkdtempSync(path.join(tmpdir(), 'leatwright-site-'))

let test: TestApp
beforeAll(async () => {
  for (const [name, text] of Object.entries(built)) {
    mkdirSync(path.dirname(path.join(siteFolder, name)), { recursive: true })
    writeFileSync(path.join(siteFolder, name), text)
  }
  test = await createTestApp({ siteFolder })
})
afterAll(async () => {
  await test.close()
  rmSync(siteFolder, { recursive: true })
})

const paidChunk = '/lessons/jet-and-runner/the-jet-3c4d.js'
const page = (address: string) => test.caller().get(address).set('Accept', 'text/html')

/** As it stands, without the tidying that clients do. */
function getRaw(address: string): Promise<{ status: number; text: string }> {
  const server = test.app.getHttpServer()
  if (!server.listening) server.listen(0)
  const { port } = server.address() as AddressInfo
  return new Promise((resolve, reject) => {
    httpRequest({ port, path: address, headers: { accept: 'text/html' } }, (response) => {
      let text = ''
      response.on('data', (chunk) => (text += String(chunk)))
      response.on('end', () => resolve({ status: response.statusCode!, text }))
    })
      .on('error', reject)
      .end()
  })
}

describe('the built site', () => {
  it('gives rendered pages, and the shell for every other', async () => {
    expect((await page('/').expect(200)).text).toBe('<p>home</p>')
    expect((await page('/courses').expect(200)).text).toBe('<p>courses</p>')
    expect((await page('/courses/jet-and-runner/the-jet').expect(200)).text).toBe('<p>shell</p>')
    expect((await page('/courses').expect(200)).headers['cache-control']).toBe('no-cache')
  })

  it('lets hashed files be kept for good, and no other', async () => {
    const asset = await test.caller().get('/assets/main-4f2a.js').expect(200)
    expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable')
    expect((await test.caller().get('/sw.js').expect(200)).headers['cache-control']).toBe('no-cache')
  })

  it('gives no page in place of a file or an answer that is not there', async () => {
    expect((await page('/assets/gone.js').expect(404)).body).toMatchObject({ code: 'not-found' })
    expect((await page('/api/gone').expect(404)).body).toMatchObject({ code: 'not-found' })
    await test.caller().post('/courses').expect(404)
  })

  it('allows no script but its own, on plain http too', async () => {
    const policy = (await page('/').expect(200)).headers['content-security-policy']
    expect(policy).toContain("script-src 'self';")
    expect(policy).not.toContain('upgrade-insecure-requests')
  })
})

describe('a lesson', () => {
  it('that is free goes to everybody', async () => {
    const free = await test.caller().get('/lessons/reading-the-stream/power-1a2b.js').expect(200)
    expect(free.headers['cache-control']).toBe('public, max-age=31536000, immutable')
  })

  it('that is paid for goes to those who are enrolled, and is not kept on the way', async () => {
    expect((await test.caller().get(paidChunk).expect(401)).body).toMatchObject({ code: 'not-signed-in' })

    const other = await test.signInAsNewLearner(['commission-and-keep'])
    const refused = await other.get(paidChunk).expect(403)
    expect(refused.body).toMatchObject({
      code: 'not-enrolled',
      message: expect.stringContaining('Jet and runner') as string,
    })

    const enrolled = await test.signInAsNewLearner(['jet-and-runner'])
    const given = await enrolled.get(paidChunk).expect(200)
    expect(given.text).toBe('paid()')
    expect(given.headers['cache-control']).toBe('private, no-store')
  })

  it('follows the price in the database', async () => {
    const setPrice = (priceAmount: number) =>
      test.database.update(courses).set({ priceAmount }).where(eq(courses.slug, 'jet-and-runner'))
    await setPrice(0)
    await test.caller().get(paidChunk).expect(200)
    await setPrice(3200)
    await test.caller().get(paidChunk).expect(401)
  })

  it.each([
    paidChunk,
    `${paidChunk}.map`,
    paidChunk.replace('lessons', '%6cessons'),
    paidChunk.replace('lessons', 'LESSONS'),
    `/${paidChunk}`,
    `/.${paidChunk}`,
    `/assets/..${paidChunk}`,
    `/assets/%2e%2e${paidChunk}`,
    `/assets/..%2f${paidChunk.slice(1)}`,
    `/assets/..%5c${paidChunk.slice(1)}`,
    paidChunk.replaceAll('/', '%2f').replace('%2f', '/'),
    '/lessons/reading-the-stream/..%2fjet-and-runner%2fthe-jet-3c4d.js',
    '/lessons/reading-the-stream%2f..%2fjet-and-runner/the-jet-3c4d.js',
  ])('that is paid for does not come out at %s', async (address) => {
    const { status, text } = await getRaw(address)
    expect(text).not.toContain('paid()')
    expect([400, 401, 404, 422]).toContain(status)
  })

  it('that is not there is not found', async () => {
    await test.caller().get('/lessons/reading-the-stream/gone.js').expect(404)
    await test.caller().get('/lessons/no-such-course/gone.js').expect(404)
  })
})
