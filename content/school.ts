import type { Question } from '#calc/marking/question.ts'
import { courseList } from './course-list.ts'
import type { Frontmatter } from './frontmatter.ts'
import { readLesson, type LessonBlock, type LessonSource } from './lesson-source.ts'
import { parseQuestionBank } from './question-bank.ts'

/** A lesson with its bank, as the server knows it. */
export interface SchoolLesson {
  slug: string
  course: string
  /** Its place in the course, from 1. */
  number: number
  frontmatter: Frontmatter
  blocks: LessonBlock[]
  headings: LessonSource['headings']
  bank: Question[]
}

/** Every lesson that is written, by its slug, in the order of the courses. */
export type School = ReadonlyMap<string, SchoolLesson>

/** `…/jet-and-runner/04-runner-speed.mdx` or `.questions.yaml`. */
const filePattern = /([a-z-]+)\/(\d\d)-([a-z-]+)\.(mdx|questions\.yaml)$/

const inFile = <T>(path: string, read: () => T): T => {
  try {
    return read()
  } catch (error) {
    throw new Error(`${path}: ${(error as Error).message}`, { cause: error })
  }
}

const readSchoolLesson = (path: string, texts: Readonly<Record<string, string>>): SchoolLesson => {
  const [, course, number, slug] = filePattern.exec(path)!
  const expected = courseList.find((one) => one.slug === course)?.lessons[Number(number) - 1]?.slug
  if (expected !== slug)
    throw new Error(`${path}: the list of courses has ${expected ? `“${expected}”` : 'no lesson'} in this place.`)
  const { frontmatter, blocks, headings } = inFile(path, () => readLesson(texts[path]!))
  const bankPath = path.replace(/\.mdx$/, '.questions.yaml')
  const bank = texts[bankPath] === undefined ? [] : parseQuestionBank(texts[bankPath], bankPath)
  for (const { name, questions } of blocks)
    for (const id of questions)
      if (!bank.some((question) => question.id === id))
        throw new Error(`${path}: the questions “${name}” name “${id}”, which the bank does not have.`)
  return { slug: slug!, course: course!, number: Number(number), frontmatter, blocks, headings, bank }
}

/**
 * Reads the school from the raw texts of the lessons and their banks, under their paths.
 * Throws an Error naming the file and the place for anything amiss.
 */
export const readSchool = (texts: Readonly<Record<string, string>>): School => {
  const school = new Map<string, SchoolLesson>()
  const bankOf = new Map<string, string>()
  for (const path of Object.keys(texts).sort()) {
    const kind = filePattern.exec(path)?.[4]
    if (kind === undefined) throw new Error(`${path}: a lesson’s file is called like 04-runner-speed.mdx.`)
    if (kind !== 'mdx') continue
    const lesson = readSchoolLesson(path, texts)
    if (school.has(lesson.slug)) throw new Error(`${path}: another lesson is called “${lesson.slug}” too.`)
    for (const { id } of lesson.bank) {
      if (bankOf.has(id))
        throw new Error(`${path}: the question “${id}” stands in the bank of “${bankOf.get(id)}” too.`)
      bankOf.set(id, lesson.slug)
    }
    school.set(lesson.slug, lesson)
  }
  const inOrder = courseList.flatMap(({ lessons }) => lessons.flatMap(({ slug }) => school.get(slug) ?? []))
  return new Map(inOrder.map((lesson) => [lesson.slug, lesson]))
}
