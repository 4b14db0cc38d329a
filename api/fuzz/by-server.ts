import { isDeepStrictEqual } from 'node:util'
import type { CalculatorDefinition } from '#calc/index.ts'
import { byLibrary, type Answer } from './by-library.ts'

/** As JSON carries it. Infinity goes as 1e999, which JSON can hold and readers take for infinite. */
export function toJson(value: unknown): string | undefined {
  try {
    return JSON.stringify(value, (_, part: unknown) => (part === Infinity ? '∞' : part))?.replaceAll('"∞"', '1e999')
  } catch {
    // What JSON cannot hold no caller can send.
    return undefined
  }
}

async function post(address: string, body: string): Promise<{ status: number; text: string }> {
  const response = await fetch(address, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body,
    signal: AbortSignal.timeout(20_000),
  })
  return { status: response.status, text: await response.text() }
}

const asJson = (value: unknown) => JSON.parse(JSON.stringify(value)) as unknown
const shortened = (value: unknown) => JSON.stringify(value).slice(0, 300)

const difference = (library: Answer, server: unknown): string | undefined =>
  isDeepStrictEqual(asJson(library), server)
    ? undefined
    : `the server answers ${shortened(server)}, the library ${shortened(library)}`

export interface Fault {
  fault: string
  json: string
}

/** Sends inputs one by one, where one is large, and all others as one batch; says where the server answers otherwise than the library. */
export async function compareWithServer(
  origin: string,
  definition: CalculatorDefinition,
  cases: readonly string[],
): Promise<Fault[]> {
  const { id } = definition
  const expected = (json: string): Answer => {
    try {
      return byLibrary(definition, JSON.parse(json))
    } catch {
      // Told already where the library was asked; nothing that the server says can be right.
      return { error: { field: '', code: 'thrown', message: 'The library throws.' } }
    }
  }
  const faults: Fault[] = []
  const note = (json: string, fault: string | undefined) => fault && faults.push({ fault, json })

  const small = cases.filter((json) => json.length < 5000)
  const batch = `{"items":[${small.map((json) => `{"id":"${id}","inputs":${json}}`).join(',')}]}`
  const all = await post(`${origin}/api/calculators/solve`, batch)
  if (all.status === 200) {
    const { results } = JSON.parse(all.text) as { results: unknown[] }
    small.forEach((json, i) => note(json, difference(expected(json), results[i])))
  } else note(batch.slice(0, 2000), `a batch was answered ${all.status}: ${all.text.slice(0, 300)}`)

  for (const json of [...small.slice(0, 3), ...cases.filter((json) => json.length >= 5000)]) {
    const { status, text } = await post(`${origin}/api/calculators/${id}/solve`, `{"inputs":${json}}`)
    const library = expected(json)
    if (status === 200) note(json, difference(library, JSON.parse(text)))
    else if (status === 422) {
      const { fields } = JSON.parse(text) as { fields: unknown[] }
      note(json, difference(library, { error: fields[0] }))
    } else note(json, `answered ${status}: ${text.slice(0, 300)}`)
  }
  return faults
}

/** Bodies that no calculator is asked by: each is to be refused, and not as a fault of ours. */
const strangeBodies = [
  ...['', '{', 'null', '5', '"text"', '[]', '{}', '{"inputs":}', '{"inputs":{}', '{"inputs":{},"more":1}', '\u0000'],
  ...['{"items":{}}', '{"items":5}', '{"items":[', '{"__proto__":{"inputs":{}}}', 'NaN', '{"inputs":{"a":1}}garbage'],
  ...[`{"inputs":${'['.repeat(200_000)}${']'.repeat(200_000)}}`, `{"inputs":"${'x'.repeat(5_000_000)}"}`],
  ...[`${'{"inputs":'.repeat(50_000)}1${'}'.repeat(50_000)}`, `{"items":[${'0,'.repeat(2000)}0]}`],
]

export async function sendStrangeBodies(origin: string): Promise<Fault[]> {
  const faults: Fault[] = []
  for (const path of ['jet/solve', 'solve', 'constructor/solve', '__proto__/solve', '%00/solve'])
    for (const json of strangeBodies) {
      const { status, text } = await post(`${origin}/api/calculators/${path}`, json)
      if (status < 400 || status > 499)
        faults.push({ fault: `${path} was answered ${status}: ${text.slice(0, 300)}`, json: json.slice(0, 300) })
    }
  return faults
}
