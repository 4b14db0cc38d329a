import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { rightAnswer } from '#calc/marking/right-answer.ts'
import type { Answer, Attempt } from '#api/attempts/dto/attempt.schema.ts'
import { attemptSchema } from '#api/attempts/dto/attempt.schema.ts'
import type { Course } from '#api/courses/dto/course.schema.ts'
import { attempts } from '#api/database/schema/attempts.ts'
import { type Agent, createTestApp, type TestApp } from './create-test-app.ts'

let test: TestApp
beforeAll(async () => {
  test = await createTestApp({ settings: { DRAW_SEED: 'rowan' } })
})
afterAll(() => test.close())

const free = 'reading-the-stream'
const lesson = 'power'
const block = 'end'

const start = async (agent: Agent, again = false) => {
  const { body } = await agent.post(`/api/lessons/${lesson}/attempts`).send({ block, again }).expect(200)
  return attemptSchema.strict().parse(body)
}
const keyOf = async (id: string) => (await test.database.select().from(attempts).where(eq(attempts.id, id)))[0]!
const save = (agent: Agent, id: string, question: string, answer: Answer) =>
  agent.put(`/api/attempts/${id}/answers/${question}`).send({ answer })
const submit = async (agent: Agent, id: string) =>
  (await agent.post(`/api/attempts/${id}/submission`).send({}).expect(200)).body as Attempt
const course = async (agent: Agent) => (await agent.get(`/api/courses/${free}`).expect(200)).body as Course

const answerRightly = async (agent: Agent, { id }: Attempt, but: readonly string[] = []) => {
  for (const draw of (await keyOf(id)).questions)
    if (!but.includes(draw.question.id)) await save(agent, id, draw.question.id, rightAnswer(draw)).expect(204)
}

let learner: Agent
beforeEach(async () => {
  learner = await test.signInAsNewLearner([free])
})

describe('a round of questions', () => {
  it('is the same on a reload, and shows no answer, mistake or reason before it is handed in', async () => {
    const first = await start(learner)
    const again = await start(learner)
    expect(again).toEqual(first)
    const { body } = await learner.get(`/api/attempts/${first.id}`).expect(200)
    expect(body).toEqual(first)

    const { questions } = await keyOf(first.id)
    const reasons = questions.flatMap(({ question }) => JSON.stringify(question).match(/"because":"[^"]+"/g) ?? [])
    expect(reasons.length).toBeGreaterThan(10)
    const seen = JSON.stringify(first)
    for (const reason of reasons) expect(seen).not.toContain(reason.slice('"because":"'.length, -1))
    expect(seen).not.toMatch(/"(because|right|mistakes|shuffle|tolerance)":(?!\[\{"id")/)
    for (const { answers } of questions)
      for (const answer of Object.values(answers)) expect(seen).not.toContain(String(answer))
  })

  it('keeps drafts, marks once, and counts the lesson as done', async () => {
    const attempt = await start(learner)
    expect((await course(learner)).lessons[0]).toMatchObject({ slug: lesson, done: false })
    await answerRightly(learner, attempt)
    expect(Object.keys((await start(learner)).answers)).toHaveLength(attempt.questions.length)

    const done = await submit(learner, attempt.id)
    expect(done.result).toMatchObject({ marks: done.result!.outOf, passed: true })
    expect(done.submittedAt).not.toBeNull()
    expect(await submit(learner, attempt.id)).toEqual(done)
    expect((await course(learner)).lessons[0]).toMatchObject({ slug: lesson, done: true })

    const question = attempt.questions[0]!
    const { body } = await save(learner, attempt.id, question.id, done.answers[question.id]!).expect(409)
    expect(body).toMatchObject({ code: 'conflict' })
  })

  it('does not count under 60 %, tells of a usual mistake, and gives another round', async () => {
    const attempt = await start(learner)
    const draw = (await keyOf(attempt.id)).questions.find(({ question }) => question.id === 'water-power-net-head')!
    const { flow, grossHead } = draw.values as Record<string, { value: number }>
    // ρ g Q H with the gross head, in plain arithmetic.
    const mistaken = (999.7 * 9.80665 * flow!.value * grossHead!.value).toFixed(1)
    await save(learner, attempt.id, draw.question.id, { kind: 'number', text: `${mistaken} W` }).expect(204)
    const { result } = await submit(learner, attempt.id)
    expect(result).toMatchObject({ marks: 0, passed: false })
    const [part] = result!.questions[draw.question.id]!.parts
    expect(part!.reasons.join(' ')).toMatch(/gross head/)
    expect(part!.readAs).toContain('read as')
    expect(part!.working.length).toBeGreaterThan(0)
    // Which mistake it was stays with the server.
    expect(JSON.stringify(result)).not.toContain('water-power-net-head/answer')
    expect((await keyOf(attempt.id)).result!.questions[draw.question.id]!.mistakes).toEqual([
      'water-power-net-head/answer/0',
    ])

    const next = await start(learner, true)
    expect(next.id).not.toBe(attempt.id)
    expect(next.submittedAt).toBeNull()
    expect((await start(learner, true)).id).toBe(next.id)
  })

  it('is marked once however often it is handed in at the same time', async () => {
    const attempt = await start(learner)
    await answerRightly(learner, attempt)
    const results = await Promise.all(Array.from({ length: 5 }, () => submit(learner, attempt.id)))
    expect(new Set(results.map((result) => JSON.stringify(result))).size).toBe(1)
  })

  it('belongs to one person', async () => {
    const attempt = await start(learner)
    const stranger = await test.signInAsNewLearner([free])
    await stranger.get(`/api/attempts/${attempt.id}`).expect(404)
    await save(stranger, attempt.id, attempt.questions[0]!.id, { kind: 'number', text: '1 W' }).expect(404)
    await stranger.post(`/api/attempts/${attempt.id}/submission`).send({}).expect(404)
  })

  it('wants a place in the course, a known block, and answers of the right kind', async () => {
    const outsider = await test.signInAsNewLearner()
    const { body } = await outsider.post(`/api/lessons/${lesson}/attempts`).send({ block }).expect(403)
    expect(body).toMatchObject({ code: 'not-enrolled' })
    await test.caller().post(`/api/lessons/${lesson}/attempts`).send({ block }).expect(401)
    await learner.post(`/api/lessons/${lesson}/attempts`).send({ block: 'nowhere' }).expect(404)
    await learner.post('/api/lessons/perpetual-motion/attempts').send({ block }).expect(404)
    const attempt = await start(learner)
    const [question] = attempt.questions
    await save(learner, attempt.id, question!.id, { kind: 'choose-one', choice: 'c1' }).expect(422)
    await save(learner, attempt.id, 'no-such-question', { kind: 'number', text: '1 W' }).expect(404)
    await learner.get('/api/attempts/not-an-id').expect(422)
    await learner
      .put(`/api/attempts/${attempt.id}/answers/${question!.id}`)
      .send({ answer: { kind: 'number', text: 'x'.repeat(500) } })
      .expect(422)
  })
})

describe('courses and lessons', () => {
  it('lists five courses with prices, and what is open', async () => {
    const { body } = (await test.caller().get('/api/courses').expect(200)) as { body: Course[] }
    expect(body.map(({ number, lessons }) => [number, lessons.length])).toEqual([
      [1, 8],
      [2, 11],
      [3, 7],
      [4, 6],
      [5, 7],
    ])
    expect(body[0]).toMatchObject({ slug: free, price: { amount: 0, currency: 'GBP' }, enrolled: false })
    expect(body[1]).toMatchObject({ price: { amount: 3800, currency: 'GBP' } })
    expect(body.flatMap(({ lessons }) => lessons.filter(({ open }) => open).map(({ slug }) => slug))).toEqual([
      'power',
      'friction',
      'the-jet',
      'runner-speed',
      'static-and-running',
    ])
    await test.caller().get('/api/courses/alchemy').expect(404)
  })

  it('enrols in a free course, once, and not in a paid one', async () => {
    const newcomer = await test.signInAsNewLearner()
    const { body } = await newcomer.post(`/api/courses/${free}/enrolment`).send({}).expect(201)
    expect(body).toMatchObject({ enrolled: true })
    await newcomer.post(`/api/courses/${free}/enrolment`).send({}).expect(201)
    const refusal = await newcomer.post('/api/courses/jet-and-runner/enrolment').send({}).expect(402)
    expect(refusal.body).toMatchObject({ code: 'payment-needed' })
    await test.caller().post(`/api/courses/${free}/enrolment`).send({}).expect(401)
  })

  it('opens a free lesson to all, and a paid one to those who hold a place', async () => {
    const { body } = await test.caller().get(`/api/lessons/${lesson}`).expect(200)
    expect(body).toMatchObject({ slug: lesson, course: free, number: 1, blocks: [block] })
    expect((await test.caller().get('/api/lessons/friction').expect(401)).body).toMatchObject({ code: 'not-signed-in' })
    expect((await learner.get('/api/lessons/friction').expect(403)).body).toMatchObject({ code: 'not-enrolled' })
    const demo = await test.signInAs('learner')
    await demo.get('/api/lessons/friction').expect(200)
  })

  it('shows the demo apprentice half way', async () => {
    const demo = await test.signInAs('learner')
    const { body } = (await demo.get('/api/courses').expect(200)) as { body: Course[] }
    const open = body.flatMap(({ lessons }) => lessons.filter((one) => one.open))
    expect(open.filter(({ done }) => done).map(({ slug }) => slug)).toEqual(['power', 'the-jet', 'static-and-running'])
  })
})
