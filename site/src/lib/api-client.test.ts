import { afterEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { apiClient, nothing } from './api-client.ts'

const refreshPath = '/api/auth/session/refresh'
const refusal = (status: number, code: string, fields: object[] = []) =>
  Response.json({ code, message: 'Said to people.', fields }, { status })

/** A server of one route, whose session runs out and may be renewed. */
function serve({ renewable }: { renewable: boolean }) {
  let session = 'ended'
  const asked: string[] = []
  vi.stubGlobal('fetch', async (path: string) => {
    asked.push(path)
    await Promise.resolve()
    if (path === refreshPath) {
      if (!renewable) return refusal(401, 'not-signed-in')
      session = 'good'
      return Response.json({})
    }
    return session === 'good' ? Response.json({ name: 'Apprentice One' }) : refusal(401, 'not-signed-in')
  })
  return asked
}

const nameSchema = z.object({ name: z.string() })

afterEach(() => vi.unstubAllGlobals())

describe('a session that ran out', () => {
  it('is renewed once, and the request is sent again', async () => {
    const asked = serve({ renewable: true })
    await expect(apiClient.get('/api/users/me', nameSchema)).resolves.toEqual({ name: 'Apprentice One' })
    expect(asked).toEqual(['/api/users/me', refreshPath, '/api/users/me'])
  })

  it('is renewed once for requests that find it so together', async () => {
    const asked = serve({ renewable: true })
    await Promise.all([apiClient.get('/api/users/me', nameSchema), apiClient.get('/api/users/me', nameSchema)])
    expect(asked.filter((path) => path === refreshPath)).toHaveLength(1)
  })

  it('stays a refusal when it cannot be renewed', async () => {
    const asked = serve({ renewable: false })
    await expect(apiClient.get('/api/users/me', nameSchema)).rejects.toMatchObject({
      status: 401,
      code: 'not-signed-in',
    })
    expect(asked).toEqual(['/api/users/me', refreshPath])
  })

  it('is not looked for when a sign-in is refused', async () => {
    const asked = serve({ renewable: true })
    await expect(apiClient.post('/api/auth/session', {}, nothing)).rejects.toMatchObject({ status: 401 })
    expect(asked).toEqual(['/api/auth/session'])
  })
})

describe('what goes wrong', () => {
  it('says which fields the server refused', async () => {
    const field = { field: 'email', code: 'invalid', message: 'Write an address such as name@example.org.' }
    vi.stubGlobal('fetch', () => Promise.resolve(refusal(400, 'invalid-input', [field])))
    await expect(apiClient.post('/api/auth/sign-up', {}, nothing)).rejects.toMatchObject({
      status: 400,
      code: 'invalid-input',
      fields: [field],
    })
  })

  it('tells no answer from a refusal', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('failed')))
    await expect(apiClient.get('/api/courses', nothing)).rejects.toMatchObject({ status: 0, code: 'no-connection' })
  })

  it('reads a refusal that is not the API’s own', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response('<h1>Bad gateway</h1>', { status: 502 })))
    await expect(apiClient.get('/api/courses', nothing)).rejects.toMatchObject({ status: 502, code: 'unreadable' })
  })

  it('refuses an answer of another shape', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(Response.json({ title: 'no name' })))
    await expect(apiClient.get('/api/users/me', nameSchema)).rejects.toMatchObject({ code: 'unexpected-answer' })
  })

  it('takes an empty answer where nothing is awaited', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response(null, { status: 204 })))
    await expect(apiClient.delete('/api/auth/session', nothing)).resolves.toBeUndefined()
  })
})

it('sends the header that a page of another site cannot send', async () => {
  const sent = vi.fn<typeof fetch>(() => Promise.resolve(new Response(null, { status: 202 })))
  vi.stubGlobal('fetch', sent)
  await apiClient.post('/api/auth/sign-up', { name: 'A' }, nothing)
  expect(sent.mock.calls[0]![1]?.headers).toMatchObject({ 'x-leatwright': '1' })
})
