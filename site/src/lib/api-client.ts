import { z } from 'zod'
import { errorSchema } from '#api/common/dto/error.schema.ts'
import { ApiError } from './api-error.ts'

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE'

/** For answers without a body that matters. */
export const nothing = z.unknown()

let refreshing: Promise<boolean> | undefined

/** One renewal at a time: the refresh token is used up by it, and a second use would end every session of its family. */
function refreshSession() {
  refreshing ??= send('POST', '/api/auth/session/refresh')
    .then((response) => response.ok)
    .finally(() => {
      refreshing = undefined
    })
  return refreshing
}

async function send(method: Method, path: string, body?: unknown) {
  try {
    return await fetch(path, {
      method,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        // A page of another site cannot send this header, so a session cookie alone changes nothing.
        'x-leatwright': '1',
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      },
      body: body === undefined ? null : JSON.stringify(body),
    })
  } catch {
    throw new ApiError(0, {
      code: 'no-connection',
      message: 'No answer came from the server. Check the signal, then try again.',
      fields: [],
    })
  }
}

async function errorFrom(response: Response) {
  const body = errorSchema.safeParse(await response.json().catch(() => undefined))
  return new ApiError(
    response.status,
    body.data ?? { code: 'unreadable', message: 'The server could not answer. Try again in a minute.', fields: [] },
  )
}

async function request<T>(method: Method, path: string, body: unknown, schema: z.ZodType<T>): Promise<T> {
  let response = await send(method, path, body)
  // Signing in and out say 401 for reasons of their own; only elsewhere does it mean that the session ran out.
  if (response.status === 401 && !path.startsWith('/api/auth/') && (await refreshSession())) {
    response = await send(method, path, body)
  }
  if (!response.ok) throw await errorFrom(response)
  const text = await response.text()
  const read = schema.safeParse(text === '' ? undefined : JSON.parse(text))
  if (read.success) return read.data
  throw new ApiError(response.status, {
    code: 'unexpected-answer',
    message: 'This page is older than the server. Load it again.',
    fields: [],
  })
}

export const apiClient = {
  get: <T>(path: string, schema: z.ZodType<T>) => request('GET', path, undefined, schema),
  post: <T>(path: string, body: unknown, schema: z.ZodType<T>) => request('POST', path, body, schema),
  put: <T>(path: string, body: unknown, schema: z.ZodType<T>) => request('PUT', path, body, schema),
  delete: <T>(path: string, schema: z.ZodType<T>) => request('DELETE', path, undefined, schema),
}
