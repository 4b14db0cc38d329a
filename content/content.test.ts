import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { calculator, solve } from '#calc/index.ts'
import { askedOutput, mistakenAnswer, partsOf, type NumbersQuestion } from '#calc/marking/calculation.ts'
import { draw, namedBy } from '#calc/marking/draw.ts'
import { mark } from '#calc/marking/mark.ts'
import type { ChoiceQuestion, Question } from '#calc/marking/question.ts'
import { rightAnswer } from '#calc/marking/right-answer.ts'
import { fillText, placeId, viewOf } from '#calc/marking/view.ts'
import { fieldText } from '#calc/units/format.ts'
import { parse } from '#calc/units/parse.ts'
import { quantities } from '#calc/units/quantities.ts'
import type { Hazard } from '#calc/index.ts'
import { courseList } from './course-list.ts'
import { glossary } from './glossary.ts'
import { hasCalculator, lessonInputs } from './lesson-calculation.ts'
import { readLesson, type LessonComponent } from './lesson-source.ts'
import { readSchool } from './school.ts'

const draws = 50

const here = new URL('.', import.meta.url)
const paths = courseList.flatMap(({ slug }) => {
  const folder = new URL(`${slug}/`, here)
  try {
    return readdirSync(folder).map((file) => `${slug}/${file}`)
  } catch {
    return []
  }
})
const texts = Object.fromEntries(
  paths.filter((path) => /\.(mdx|yaml)$/.test(path)).map((path) => [path, readFileSync(new URL(path, here), 'utf8')]),
)
const lessonPaths = Object.keys(texts).filter((path) => path.endsWith('.mdx'))

describe('the school', () => {
  test('every course and every lesson has an address of its own', () => {
    const slugs = courseList.flatMap((course) => [course.slug, ...course.lessons.map(({ slug }) => slug)])
    expect(new Set(slugs).size).toBe(slugs.length)
    for (const slug of slugs) expect(slug).toMatch(/^[a-z]+(-[a-z]+)*$/)
  })

  test('every lesson and bank reads, stands where the list has it, and names its questions rightly', () => {
    expect(() => readSchool(texts)).not.toThrow()
    expect(readSchool(texts).size).toBe(lessonPaths.length)
    expect(lessonPaths.length).toBeGreaterThan(0)
  })

  test('every lesson has its bank and every bank its lesson, and nothing else lies about', () => {
    const stems = (ending: RegExp) => paths.filter((path) => ending.test(path)).map((path) => path.replace(ending, ''))
    expect(stems(/\.questions\.yaml$/).sort()).toEqual(stems(/\.mdx$/).sort())
    for (const path of paths) expect(path).toMatch(/\/(\d\d-[a-z-]+\.(mdx|questions\.yaml)|figures)$/)
  })
})

/** Words that a caution about each danger has. */
const dangerWords: Record<Hazard, RegExp> = {
  pressure: /pressure|jet|burst|valve|pipe/i,
  electricity: /electric|volt|current|mains|wiring|terminal|cable|battery|batteries/i,
  stream: /stream|water|weir|flood/i,
  'hot-work': /hot|heat|burn|flame|fume|steam/i,
  rotating: /runner|wheel|shaft|belt|turn|spin|speed/i,
  lifting: /lift|heavy|weight|hoist|crane/i,
  digging: /dig|trench|buried|bury/i,
}
const defers = /\blocal\b|\blicensed\b/i

const keysOf = (words: unknown): string[] => (typeof words === 'string' ? words.trim().split(/\s+/) : [])
const camel = (words: string) => words.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())

/** What is amiss with a component's calculator: its keys, its texts, or that it does not work out. */
const calculatorProblem = (component: LessonComponent): string | undefined => {
  const { id, show, blank, plot, output, input, from, to } = component.attributes
  try {
    const { inputs, outputs } = calculator(String(id))
    const { working } = solve(String(id), lessonInputs(component))
    const [of, against] =
      component.name === 'Plot' ? [output, input] : typeof plot === 'string' ? plot.split('-against-').map(camel) : []
    for (const key of [...keysOf(show), ...keysOf(of)]) if (!Object.hasOwn(outputs, key)) return `no output “${key}”`
    for (const key of keysOf(against)) if (!Object.hasOwn(inputs, key)) return `no input “${key}”`
    for (const key of keysOf(blank)) if (!working.some(({ gives }) => gives === key)) return `no step gives “${key}”`
    const axis = typeof against === 'string' ? inputs[against] : undefined
    for (const end of [from, to])
      if (typeof end === 'string' && !(axis?.kind === 'scalar' && parse(end, axis.quantity).ok))
        return `“${end}” is no ${String(against)}`
    return undefined
  } catch (error) {
    return (error as Error).message
  }
}

describe.each(lessonPaths)('%s', (path) => {
  const { frontmatter, headings, blocks, components } = readLesson(texts[path]!)
  const at = ({ name, line }: LessonComponent) => `${path}:${line} <${name}>`

  test('headings go down one at a time, from the second level', () => {
    expect(headings.length).toBeGreaterThan(2)
    headings.forEach(({ depth, text }, i) => {
      expect([text, depth]).toEqual([text, Math.min(Math.max(depth, 2), (headings[i - 1]?.depth ?? 1) + 1)])
    })
  })

  test('each danger in its head has a caution on the page that defers to local rules or licensed people', () => {
    const cautions = components.filter(({ name, text }) => name === 'Caution' && defers.test(text))
    for (const hazard of frontmatter.hazards)
      expect([hazard, cautions.some(({ text }) => dangerWords[hazard].test(text))]).toEqual([hazard, true])
  })

  test('its components have what they need', () => {
    for (const component of components) {
      const { name, attributes, text } = component
      if (name === 'Caution')
        expect([at(component), attributes.level]).toEqual([at(component), expect.stringMatching(/^(note|check|stop)$/)])
      if (name === 'Source')
        expect(attributes).toMatchObject({ author: expect.any(String) as string, title: expect.any(String) as string })
      if (name === 'Gloss')
        expect([at(component), Object.keys(glossary)]).toEqual([
          at(component),
          expect.arrayContaining([attributes.term]),
        ])
      if (name === 'Drawing') expect([at(component), attributes.name]).toEqual([at(component), expect.any(String)])
      if (['Caution', 'FromTheTrade', 'SiteTask'].includes(name))
        expect([at(component), text]).toEqual([at(component), expect.stringMatching(/\S/)])
      if (name === 'Row') expect([at(component), attributes.of]).toEqual([at(component), expect.any(String)])
    }
  })

  test('its calculators exist, take what the lesson writes, and work out', () => {
    for (const component of components.filter(hasCalculator))
      expect([at(component), calculatorProblem(component)]).toEqual([at(component), undefined])
  })

  test('it ends in marked questions', () => {
    expect(blocks.length).toBeGreaterThan(0)
  })
})

/** A number that is written as a learner would, with digits enough. */
const write = (value: number, part: Parameters<typeof askedOutput>[0] & { units?: string[] }) => {
  const { quantity } = askedOutput(part)
  const unit = part.units?.[0] ?? quantities[quantity].units[0]!.name
  return `${fieldText(value, quantity, unit)} ${unit}`
}

const checkNumbers = (question: NumbersQuestion, seed: string) => {
  const drawn = draw(question, seed)
  const right = rightAnswer(drawn)
  expect([question.id, seed, mark(drawn, right).parts.map(({ verdict }) => verdict)]).toEqual([
    question.id,
    seed,
    partsOf(question).map(() => 'full'),
  ])
  expect(JSON.stringify(viewOf(drawn))).not.toMatch(/\{[A-Za-z]+\}/)
  const named = namedBy(question, drawn.values, drawn.answers)
  for (const part of partsOf(question))
    for (const [i, mistake] of (part.mistakes ?? []).entries()) {
      const text = write(mistakenAnswer(question, part, mistake, named), part)
      const answer =
        right.kind === 'parts' ? { ...right, texts: { ...right.texts, [part.id]: text } } : { kind: 'number', text }
      const { parts, mistakes } = mark(drawn, answer)
      expect([question.id, mistakes]).toEqual([question.id, [`${question.id}/${part.id}/${i}`]])
      expect(parts.find(({ id }) => id === part.id)!.reasons).toEqual([fillText(mistake.because, drawn)])
    }
}

const checkChoices = (question: ChoiceQuestion) => {
  const drawn = draw(question, 'one')
  question.choices.forEach(({ right, because }, i) => {
    if (right) return
    const choice = placeId(drawn.shuffle.indexOf(i))
    const answer =
      question.kind === 'choose-one' ? { kind: question.kind, choice } : { kind: question.kind, choices: [choice] }
    expect(mark(drawn, answer).parts[0]).toMatchObject({ verdict: 'none', reasons: [because] })
  })
}

const checkQuestion = (question: Question) => {
  if (question.kind === 'number' || question.kind === 'parts') {
    for (let i = 0; i < draws; i++) checkNumbers(question, `${i}`)
    return
  }
  if ('choices' in question) checkChoices(question)
  const drawn = draw(question, 'one')
  expect(mark(drawn, rightAnswer(drawn))).toMatchObject({ parts: [{ verdict: 'full' }], mistakes: [] })
}

describe.each([...readSchool(texts).values()].map((lesson) => [lesson.slug, lesson] as const))(
  'the bank of %s',
  (_, { bank, blocks }) => {
    test('holds at least eight questions of at least four kinds', () => {
      expect(bank.length).toBeGreaterThanOrEqual(8)
      expect(new Set(bank.map(({ kind }) => kind)).size).toBeGreaterThanOrEqual(4)
    })

    test('a round has each of its questions once', () => {
      for (const { questions } of blocks) {
        expect(new Set(questions).size).toBe(questions.length)
      }
    })

    test.each(bank.map((question) => [question.id, question] as const))(
      '%s draws, its own answer marks full, and each wrong way brings its reason',
      (_, question) => {
        checkQuestion(question)
      },
    )
  },
)
