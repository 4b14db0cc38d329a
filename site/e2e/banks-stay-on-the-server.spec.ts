import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { expect, test } from '@playwright/test'
import { parseQuestionBank } from '#content/question-bank.ts'

const built = 'dist/site'

const filesBelow = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))

/** Text without what a bundler may change about it: white space, escapes, kinds of quotes. */
const plain = (text: string) => text.replace(/\\[nrt"'`\\]|\\u[0-9a-f]{4}|[^\p{L}\p{N}]/giu, '').toLowerCase()

/** What of a bank may not be known before handing in: its reasons, its ids, and the words of its questions. */
const secretsOf = (file: string): string[] =>
  parseQuestionBank(readFileSync(file, 'utf8'), file).flatMap((question) => {
    const reasons = [...JSON.stringify(question).matchAll(/"because":"((?:[^"\\]|\\.)*)"/g)].map(
      ([, reason]) => JSON.parse(`"${reason}"`) as string,
    )
    return [question.say, ...reasons]
  })

const leaks = (files: ReadonlyMap<string, string>, secrets: readonly string[]) =>
  [...files].flatMap(([name, text]) =>
    secrets.filter((secret) => text.includes(plain(secret))).map((secret) => `${name}: ${secret}`),
  )

test('no bank’s question or reason stands in a chunk, a source map or any built file', () => {
  const banks = filesBelow('content').filter((file) => file.endsWith('.questions.yaml'))
  const secrets = banks.flatMap(secretsOf)
  expect(banks.length).toBeGreaterThanOrEqual(5)
  expect(secrets.length).toBeGreaterThan(150)
  const files = new Map(
    filesBelow(built)
      .filter((file) => /\.(js|map|html|css|json|webmanifest|txt)$/.test(file))
      .map((file) => [file, plain(readFileSync(file, 'utf8'))]),
  )
  expect([...files.keys()].some((file) => file.endsWith('.map'))).toBe(true)
  expect(leaks(files, secrets)).toEqual([])

  // The control: a marker planted into a copy of one chunk is found, and so is a sentence that a lesson does show.
  const [[name, text]] = [...files] as [[string, string], ...unknown[]]
  const marker = secrets[7]!
  expect(leaks(new Map([[name, text + plain(`because:"${marker}"`)]]), secrets)).toEqual([`${name}: ${marker}`])
  expect(
    leaks(files, ['Not all of the stream is yours']).some((leak) => leak.includes('lessons/reading-the-stream')),
  ).toBe(true)
})

test('a paid lesson’s chunk is sent only to who holds a place', async ({ request }) => {
  const folders = ['leat-intake-and-pipe', 'jet-and-runner', 'commission-and-keep']
  for (const folder of folders)
    for (const file of readdirSync(path.join(built, 'lessons', folder))) {
      const answer = await request.get(`/lessons/${folder}/${file}`)
      expect(answer.status(), file).toBe(401)
      expect(((await answer.json()) as { code: string }).code).toBe('not-signed-in')
    }
  const [free] = readdirSync(path.join(built, 'lessons/reading-the-stream'))
  expect((await request.get(`/lessons/reading-the-stream/${free}`)).status()).toBe(200)
})
