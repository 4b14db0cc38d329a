import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { draw, type Draw } from '#calc/marking/draw.ts'
import { readSchool } from '#content/school.ts'
import { projectRoot } from '../src/project-root.ts'

/** The questions that are drawn, answered and handed in. */
export const course = 'reading-the-stream'
export const lesson = 'power'
export const block = 'end'

const content = path.join(projectRoot, 'content')
const files = readdirSync(content, { recursive: true, encoding: 'utf8' }).filter((file) =>
  /\.(mdx|questions\.yaml)$/.test(file),
)
const { blocks, bank } = readSchool(
  Object.fromEntries(files.map((file) => [file, readFileSync(path.join(content, file), 'utf8')])),
).get(lesson)!
const questions = blocks
  .find(({ name }) => name === block)!
  .questions.map((id) => bank.find((question) => question.id === id)!)

/** What the server draws for this learner under this DRAW_SEED. */
export const drawRound = (fixedSeed: string, email: string, round: number): Draw[] =>
  questions.map((question) => draw(question, [fixedSeed, email, lesson, block, round].join(' ')))
