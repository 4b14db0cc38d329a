import { Agent, request } from 'node:http'

export interface Reply {
  body: unknown
  headers: Record<string, string | string[] | undefined>
  milliseconds: number
}
export type Send = (
  method: 'POST' | 'PUT',
  path: string,
  body: unknown,
  headers?: Record<string, string>,
) => Promise<Reply>

/** One connection to this machine that stays open and carries one request after the other. Anything but success throws. */
export function openConnection(port: number): { send: Send; close: () => void } {
  const agent = new Agent({ keepAlive: true, maxSockets: 1 })
  const send: Send = (method, path, body, headers = {}) =>
    new Promise((resolve, reject) => {
      const text = JSON.stringify(body)
      const start = performance.now()
      const sent = request(
        {
          ...{ agent, port, method, path, host: '127.0.0.1' },
          headers: { ...headers, 'content-type': 'application/json', 'content-length': Buffer.byteLength(text) },
        },
        (response) => {
          const pieces: Buffer[] = []
          response.on('data', (piece: Buffer) => pieces.push(piece))
          response.on('error', reject)
          response.on('end', () => {
            const milliseconds = performance.now() - start
            const answer = Buffer.concat(pieces).toString()
            const { statusCode = 0 } = response
            if (statusCode < 200 || statusCode > 299) {
              reject(new Error(`${method} ${path} answered ${statusCode}: ${answer}`))
              return
            }
            resolve({ body: answer && JSON.parse(answer), headers: response.headers, milliseconds })
          })
        },
      )
      sent.on('error', reject)
      sent.end(text)
    })
  return { send, close: () => agent.destroy() }
}
