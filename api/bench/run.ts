/**
 * What the framework costs: the built server beside the same work done by hand (`bare.ts`), each a process with a database folder of
 * its own, under the same closed loop of callers. Ends with an error where the two answer differently or leave different rows.
 */
import { type ChildProcess, fork, spawnSync } from 'node:child_process'
import { cpSync, existsSync, mkdtempSync, rmSync } from 'node:fs'
import { cpus, tmpdir } from 'node:os'
import path from 'node:path'
import { isDeepStrictEqual } from 'node:util'
import { sql } from 'drizzle-orm'
import { build } from 'vite'
import { rightAnswer } from '#calc/marking/right-answer.ts'
import { freePort } from '../scripts/free-port.ts'
import { builtServer, ended, startServer } from '../scripts/server-process.ts'
import type { Attempt } from '../src/attempts/dto/attempt.schema.ts'
import { hashPassword } from '../src/auth/passwords.ts'
import { antiForgeryHeader } from '../src/common/guards/access.guard.ts'
import { openDatabase } from '../src/database/connection.ts'
import { courses, enrolments } from '../src/database/schema/courses.ts'
import { users } from '../src/database/schema/users.ts'
import { projectRoot } from '../src/project-root.ts'
import { openConnection, type Send } from './connection.ts'
import { block, course, drawRound, lesson } from './rounds.ts'

const seed = 'bench'
const password = 'bench-password'
/** Each has a connection of its own: rounds of one learner follow each other. */
const emails = Array.from({ length: 8 }, (_, i) => `bench-${i + 1}@leatwright.test`)
/** The two take turns, so that a slow minute of the machine strikes both. */
const turns = 3
const solvesPerTurn = 60
const roundsPerTurn = 3
const warmUp = { solves: 40, rounds: 1 }
const roundsPerLearner = warmUp.rounds + turns * roundsPerTurn

/** Right answers to every second question, by learner and round: some of each kind get marks and some get none. */
const given = new Map(
  emails.flatMap((email) =>
    Array.from({ length: roundsPerLearner }, (_, i) => i + 1).map((round) => [
      `${email} ${round}`,
      drawRound(seed, email, round)
        .filter((_, place) => (place + round) % 2 === 0)
        .map((drawn) => ({ question: drawn.question.id, answer: rightAnswer(drawn) })),
    ]),
  ),
)

const penstock = {
  grossHead: 63,
  sections: [
    { length: 180, insideDiameter: 0.1102, roughness: 5e-5, totalK: 0.9 },
    { length: 42, insideDiameter: 0.0988, roughness: 5e-5, totalK: 0.4 },
  ],
  nozzles: { count: 1, diameter: 0.024, dischargeCoefficient: 0.95 },
}

interface Caller {
  email: string
  send: Send
}
interface Side {
  name: string
  folder: string
  process: ChildProcess
  port: number
  /** What each learner's requests carry, by address. */
  headers: Map<string, Record<string, string>>
  solves: Tally
  rounds: Tally
  /** What was answered to the calculator, and to each hand-in by learner and round; without ids and times. */
  answered: Map<string, unknown>
}
interface Tally {
  count: number
  seconds: number
  milliseconds: number[]
}
const emptyTally = (): Tally => ({ count: 0, seconds: 0, milliseconds: [] })

/** A migrated folder with the learners in it, each with a place in the course. */
async function prepare(folder: string) {
  const connection = await openDatabase({ DATA_DIR: folder })
  const { database } = connection
  const passwordHash = await hashPassword(password)
  const made = await database
    .insert(users)
    .values(emails.map((email) => ({ email, name: email, passwordHash, confirmedAt: new Date() })))
    .returning({ id: users.id })
  // The server writes the other courses, and leaves this one as it is.
  await database.insert(courses).values({ slug: course, priceAmount: 0, priceCurrency: 'GBP' })
  await database.insert(enrolments).values(made.map(({ id }) => ({ userId: id, courseSlug: course })))
  await connection.close()
}

const listening = (start: (whenListening: () => void) => ChildProcess) =>
  new Promise<ChildProcess>((resolve, reject) => {
    const child = start(() => resolve(child))
    child.once('exit', () => reject(new Error('A server ended before it took requests.')))
  })

async function openSide(
  name: string,
  folder: string,
  start: (environment: NodeJS.ProcessEnv, whenListening: () => void) => ChildProcess,
  headersFor: (email: string, port: number) => Promise<Record<string, string>>,
): Promise<Side> {
  const port = await freePort()
  // Nothing of the caller's own settings: a DATABASE_URL among them would be written to.
  const environment = {
    ...{ PATH: process.env.PATH, NODE_ENV: 'test', PORT: String(port), DATA_DIR: folder, DRAW_SEED: seed, DEMO: '0' },
    // Nothing listens there: no mail is sent.
    SMTP_URL: 'smtp://127.0.0.1:9',
    ...{ TRIES_PER_ACCOUNT: '1000', TRIES_PER_ADDRESS: '1000' },
  }
  const child = await listening((whenListening) => start(environment, whenListening))
  const headers = new Map(
    await Promise.all(emails.map(async (email) => [email, await headersFor(email, port)] as const)),
  )
  return {
    ...{ name, folder, process: child, port, headers },
    ...{ solves: emptyTally(), rounds: emptyTally(), answered: new Map<string, unknown>() },
  }
}

/** The server takes the session's cookie, with the header that no other site can send. */
async function signIn(email: string, port: number): Promise<Record<string, string>> {
  const { send, close } = openConnection(port)
  const { headers } = await send('POST', '/api/auth/session', { email, password })
  close()
  const cookie = [headers['set-cookie'] ?? []].flat().map((one) => one.split(';')[0])
  return { cookie: cookie.join('; '), [antiForgeryHeader.name]: antiForgeryHeader.value }
}

/**
 * Every caller does its part, one call after the other; all callers at once. Connections are opened afresh: a server closes one that
 * was idle while the other side had its turn.
 */
async function inClosedLoop(
  side: Side,
  tally: Tally,
  times: number,
  once: (caller: Caller, i: number) => Promise<number>,
) {
  const start = performance.now()
  await Promise.all(
    emails.map(async (email) => {
      const { send, close } = openConnection(side.port)
      for (let i = 0; i < times; i++) tally.milliseconds.push(await once({ email, send }, i))
      close()
    }),
  )
  tally.seconds += (performance.now() - start) / 1000
  tally.count += times * emails.length
}

/** Without a session: the calculators are open to anyone. */
const solveMany = (side: Side, tally: Tally, times: number) =>
  inClosedLoop(side, tally, times, async ({ send }) => {
    const { body, milliseconds } = await send('POST', '/api/calculators/penstock/solve', { inputs: penstock })
    side.answered.set('penstock', body)
    return milliseconds
  })

/** Starts a round, gives the answers, hands it in; the time is that of handing in alone. */
const handInMany = (side: Side, tally: Tally, { from, times }: { from: number; times: number }) =>
  inClosedLoop(side, tally, times, async ({ email, send }, i) => {
    const headers = side.headers.get(email)!
    const round = from + i
    const started = await send('POST', `/api/lessons/${lesson}/attempts`, { block, again: true }, headers)
    const { id } = started.body as Attempt
    for (const { question, answer } of given.get(`${email} ${round}`)!)
      await send('PUT', `/api/attempts/${id}/answers/${question}`, { answer }, headers)
    const { body, milliseconds } = await send('POST', `/api/attempts/${id}/submission`, {}, headers)
    const { questions, answers, result } = body as Attempt
    side.answered.set(`${email} ${round}`, { questions, answers, result })
    return milliseconds
  })

async function stop({ process: child, name }: Side) {
  const end = ended(child)
  child.kill('SIGTERM')
  if ((await end) !== 0) throw new Error(`${name} ended with an error.`)
}

interface RowLeft extends Record<string, unknown> {
  email: string
  round: number
  marks: number
}
async function rowsLeft({ folder }: Side): Promise<RowLeft[]> {
  const connection = await openDatabase({ DATA_DIR: folder })
  const { rows } = (await connection.database.execute(sql`
    select email, lesson, block, round, questions, answers, result, marks, out_of, passed, submitted_at is not null as handed_in
    from attempts join users on users.id = user_id order by email, lesson, block, round`)) as { rows: RowLeft[] }
  await connection.close()
  return rows
}

function differences(nest: Side, bare: Side, nestRows: RowLeft[], bareRows: RowLeft[]): string[] {
  const found: string[] = []
  const expected = emails.length * roundsPerLearner
  for (const [{ name }, rows] of [
    [nest, nestRows],
    [bare, bareRows],
  ] as const) {
    if (rows.length !== expected) found.push(`${name} left ${rows.length} rounds, not ${expected}`)
    // Without marks the comparison would say nothing of marking.
    if (!rows.every(({ marks }) => marks > 0)) found.push(`${name} gave no marks for right answers`)
  }
  const unlike = nestRows.filter((row, i) => !isDeepStrictEqual(row, bareRows[i]))
  if (unlike[0])
    found.push(`${unlike.length} rounds left differ, the first ${unlike[0].email}, round ${unlike[0].round}`)
  const answeredUnlike = [...nest.answered].filter(
    ([what, answer]) => !isDeepStrictEqual(answer, bare.answered.get(what)),
  )
  if (answeredUnlike[0]) found.push(`${answeredUnlike.length} answers differ, the first to ${answeredUnlike[0][0]}`)
  return found
}

const percentile = ({ milliseconds }: Tally, share: number) => {
  const sorted = milliseconds.toSorted((a, b) => a - b)
  return sorted[Math.ceil(share * sorted.length) - 1]!
}

function printTable(nest: Side, bare: Side) {
  const line = (name: string, of: (side: Side) => number, digits: number) => {
    const [a, b] = [of(nest), of(bare)]
    const cells = [a.toFixed(digits), b.toFixed(digits), (a / b).toFixed(2)].map((cell) => cell.padStart(11))
    console.log(name.padEnd(36) + cells.join(''))
  }
  console.log(`${''.padEnd(36)}${['Nest', 'bare', 'Nest/bare'].map((head) => head.padStart(11)).join('')}`)
  line('penstock solved, per second', ({ solves }) => solves.count / solves.seconds, 0)
  line('  p50, ms', ({ solves }) => percentile(solves, 0.5), 2)
  line('  p99, ms', ({ solves }) => percentile(solves, 0.99), 2)
  line('rounds drawn, answered, handed in, /s', ({ rounds }) => rounds.count / rounds.seconds, 1)
  line('  handing in and marking: p50, ms', ({ rounds }) => percentile(rounds, 0.5), 2)
  line('  handing in and marking: p99, ms', ({ rounds }) => percentile(rounds, 0.99), 2)
}

/** Built as the server is, so that only what they do differs. */
async function buildBoth(): Promise<string> {
  if (!existsSync(builtServer))
    spawnSync('npm', ['run', '--silent', 'build:api'], { cwd: projectRoot, stdio: 'inherit' })
  const outDir = path.join(projectRoot, 'dist/bench')
  await build({
    configFile: path.join(projectRoot, 'api/vite.config.ts'),
    logLevel: 'warn',
    build: { ssr: 'bench/bare.ts', outDir },
  })
  return path.join(outDir, 'bare.js')
}

async function bench(scratch: string) {
  const bareServer = await buildBoth()
  const folders = { nest: path.join(scratch, 'nest'), bare: path.join(scratch, 'bare') }
  await prepare(folders.nest)
  cpSync(folders.nest, folders.bare, { recursive: true })

  const nest = await openSide('Nest', folders.nest, startServer, signIn)
  const bare = await openSide(
    'bare',
    folders.bare,
    (env, whenListening) =>
      fork(bareServer, { env, execArgv: ['--enable-source-maps'] }).once('message', whenListening),
    (email) => Promise.resolve({ 'x-learner': email }),
  )
  const sides = [nest, bare]

  for (const side of sides) {
    await solveMany(side, emptyTally(), warmUp.solves)
    await handInMany(side, emptyTally(), { from: 1, times: warmUp.rounds })
  }
  for (let turn = 0; turn < turns; turn++) {
    for (const side of sides) await solveMany(side, side.solves, solvesPerTurn)
    const from = 1 + warmUp.rounds + turn * roundsPerTurn
    for (const side of sides) await handInMany(side, side.rounds, { from, times: roundsPerTurn })
  }
  for (const side of sides) await stop(side)

  const [processor] = cpus()
  console.log(`The server beside the same work by hand: ${emails.length} connections, callers on the same machine`)
  console.log(`${cpus().length} cores (${processor?.model.trim()}), Node ${process.versions.node}\n`)
  printTable(nest, bare)

  const nestRows = await rowsLeft(nest)
  const found = differences(nest, bare, nestRows, await rowsLeft(bare))
  if (found.length > 0) {
    console.error(`\nThe two do not do the same (is dist/api older than its sources?):\n  ${found.join('\n  ')}`)
    return false
  }
  const marks = nestRows.reduce((sum, row) => sum + row.marks, 0)
  console.log(`\nBoth left the same ${nestRows.length} rounds, ${marks} marks in all, and answered alike.`)
  return true
}

const scratch = mkdtempSync(path.join(tmpdir(), 'leatwright-bench-'))
let same = false
try {
  same = await bench(scratch)
} finally {
  rmSync(scratch, { recursive: true, force: true })
}
// Also ends a server that is still running because something went wrong: each stops when this process is gone.
process.exit(same ? 0 : 1)
