/**
 * What the server does for one calculator and for one block of questions, by hand on Express and PGlite: the same statements, the
 * same arithmetic, the same answers. It checks neither what it is sent nor who sends it: the header `x-learner` is believed.
 */
import path from 'node:path'
import { PGlite } from '@electric-sql/pglite'
import express, { type Request } from 'express'
import { solve } from '#calc/index.ts'
import { viewOf } from '#calc/marking/view.ts'
import { markRound } from '../src/attempts/mark-round.ts'
import type { AttemptRow } from '../src/database/schema/attempts.ts'
import { block, course, drawRound, lesson } from './rounds.ts'

interface Row extends Pick<AttemptRow, 'id' | 'lesson' | 'block' | 'round' | 'questions' | 'answers' | 'result'> {
  created_at: Date
  submitted_at: Date | null
}
interface Learner {
  id: string
  email: string
}

const { PORT, DATA_DIR, DRAW_SEED } = process.env as Record<string, string>
const database = await PGlite.create(path.join(DATA_DIR!, 'db'))
const learners = new Map(
  (await database.query<Learner>('select id, email from users')).rows.map((learner) => [learner.email, learner]),
)
const learnerOf = (request: Request) => learners.get(request.get('x-learner')!)!

/** A learner never sees which mistakes were recognised. */
const seen = ({ questions, ...sums }: NonNullable<Row['result']>) => ({
  ...sums,
  questions: Object.fromEntries(
    Object.entries(questions).map(([id, { marks, outOf, parts }]) => [id, { marks, outOf, parts }]),
  ),
})
const asAttempt = (row: Row) => ({
  ...{ id: row.id, lesson: row.lesson, block: row.block, answers: row.answers },
  createdAt: row.created_at.toISOString(),
  submittedAt: row.submitted_at?.toISOString() ?? null,
  questions: row.questions.map(viewOf),
  result: row.result && seen(row.result),
})

const lastRound = async (learner: Learner): Promise<Row | undefined> => {
  const { rows } = await database.query<Row>(
    'select * from attempts where user_id = $1 and lesson = $2 and block = $3 order by round desc limit 1',
    [learner.id, lesson, block],
  )
  return rows[0]
}

const app = express()
app.use(express.json({ limit: '256kb' }))

app.post('/api/calculators/penstock/solve', (request, response) => {
  const { inputs } = request.body as { inputs: unknown }
  response.json(solve('penstock', inputs))
})

app.post(`/api/lessons/${lesson}/attempts`, async (request, response) => {
  const learner = learnerOf(request)
  const { rows: places } = await database.query(
    'select course_slug from enrolments where user_id = $1 and course_slug = $2',
    [learner.id, course],
  )
  if (places.length === 0) return void response.sendStatus(403)
  const last = await lastRound(learner)
  if (last && !last.submitted_at) return void response.json(asAttempt(last))
  const round = (last?.round ?? 0) + 1
  await database.query(
    'insert into attempts (user_id, lesson, block, round, questions) values ($1, $2, $3, $4, $5) on conflict do nothing',
    [learner.id, lesson, block, round, drawRound(DRAW_SEED!, learner.email, round)],
  )
  response.json(asAttempt((await lastRound(learner))!))
})

app.put('/api/attempts/:id/answers/:question', async (request, response) => {
  const { id, question } = request.params
  const learner = learnerOf(request)
  const { rows } = await database.query<Row>('select * from attempts where id = $1 and user_id = $2', [id, learner.id])
  if (!rows[0]?.questions.some((one) => one.question.id === question)) return void response.sendStatus(404)
  const { answer } = request.body as { answer: unknown }
  const { rows: saved } = await database.query(
    `update attempts set answers = answers || $1::jsonb
     where id = $2 and user_id = $3 and submitted_at is null returning id`,
    [{ [question]: answer }, id, learner.id],
  )
  response.sendStatus(saved.length === 0 ? 409 : 204)
})

app.post('/api/attempts/:id/submission', async (request, response) => {
  const { id } = request.params
  const attempt = await database.transaction(async (transaction) => {
    const { rows } = await transaction.query<Row>('select * from attempts where id = $1 and user_id = $2 for update', [
      id,
      learnerOf(request).id,
    ])
    const [row] = rows
    if (!row || row.submitted_at) return row
    const result = markRound(row)
    const { rows: marked } = await transaction.query<Row>(
      `update attempts set result = $1, marks = $2, out_of = $3, passed = $4, submitted_at = $5
       where id = $6 returning *`,
      [result, result.marks, result.outOf, result.passed, new Date(), id],
    )
    return marked[0]
  })
  if (attempt) response.json(asAttempt(attempt))
  else response.sendStatus(404)
})

const listening = app.listen(Number(PORT), '127.0.0.1', () => process.send!('listening'))
const stop = () => {
  listening.closeAllConnections()
  listening.close(() => void database.close().then(() => process.exit(0)))
}
process.once('SIGTERM', stop)
process.once('disconnect', stop)
