import { describe, expect, test } from 'vitest'
import { LessonSourceError, readLesson, type LessonProblem } from './lesson-source.ts'

const head = '---\ntitle: Runner speed\nstation: runner\nminutes: 12\nhazards: [rotating]\n---\n\n'
const lesson = (body: string) => readLesson(head + body)

const problemsOf = (source: string): LessonProblem[] => {
  try {
    readLesson(source)
  } catch (error) {
    if (error instanceof LessonSourceError) return error.problems
    throw error
  }
  return []
}

describe('a lesson', () => {
  test('head, headings, blocks and components', () => {
    expect(
      lesson(
        [
          '## The *idea*',
          'The speed is $v_{j} = \\sqrt{2gH}$.',
          '### In numbers',
          '<Calculator id="penstock" efficiency={0.52} offset={-1} open flow="9.5 L/s">',
          '  <Row of="sections" length="120 m" />',
          '  <Row of="sections" length="40 m" />',
          '</Calculator>',
          'A <Gloss term="bucket">bucket</Gloss> turns.',
          '<Caution level="stop">Local rules apply.</Caution>',
          '<CheckYourself name="middle" questions="one" />',
          '<CheckYourself name="end" questions="  two-a   three\n  four " />',
        ].join('\n\n'),
      ),
    ).toEqual({
      frontmatter: { title: 'Runner speed', station: 'runner', minutes: 12, hazards: ['rotating'] },
      headings: [
        { depth: 2, text: 'The idea' },
        { depth: 3, text: 'In numbers' },
      ],
      blocks: [
        { name: 'middle', questions: ['one'] },
        { name: 'end', questions: ['two-a', 'three', 'four'] },
      ],
      components: [
        {
          name: 'Calculator',
          attributes: { id: 'penstock', efficiency: 0.52, offset: -1, open: true, flow: '9.5 L/s' },
          text: '',
          line: 14,
          children: [
            { name: 'Row', attributes: { of: 'sections', length: '120 m' }, text: '', line: 16, children: [] },
            { name: 'Row', attributes: { of: 'sections', length: '40 m' }, text: '', line: 18, children: [] },
          ],
        },
        { name: 'Row', attributes: { of: 'sections', length: '120 m' }, text: '', line: 16, children: [] },
        { name: 'Row', attributes: { of: 'sections', length: '40 m' }, text: '', line: 18, children: [] },
        { name: 'Gloss', attributes: { term: 'bucket' }, text: 'bucket', line: 22, children: [] },
        { name: 'Caution', attributes: { level: 'stop' }, text: 'Local rules apply.', line: 24, children: [] },
        { name: 'CheckYourself', attributes: { name: 'middle', questions: 'one' }, text: '', line: 26, children: [] },
        {
          name: 'CheckYourself',
          attributes: { name: 'end', questions: '  two-a   three\nfour ' },
          text: '',
          line: 28,
          children: [],
        },
      ],
    })
  })

  test('braces are allowed where they are TeX, code or escaped', () => {
    expect(problemsOf(`${head}$a_{1}$ and \`{x}\` and \\{x}\n\n$$\n\\frac{a}{b}\n$$\n`)).toEqual([])
  })
})

describe('what is not allowed is named with line, column and what to write instead', () => {
  test.each<[string, string, RegExp]>([
    ['an import', "import x from 'y'", /no import and no export/],
    ['an export', 'export const x = 1', /no import and no export/],
    ['an expression', '{1 + 1}', /Braces cannot be worked out/],
    ['an expression in a line', 'It is {window.name}.', /Braces cannot be worked out/],
    ['a comment in braces', '{/* note */}', /Braces cannot be worked out/],
    [
      'a worked-out attribute',
      '<Drawing name={a + b} />',
      /Write name of <Drawing> as a number in braces or as a text in quotes/,
    ],
    ['a function for an attribute', '<Drawing name={() => alert(1)} />', /Write name of <Drawing>/],
    ['a template for an attribute', '<Drawing name={`x`} />', /Write name of <Drawing>/],
    ['an object for an attribute', '<Drawing name={{"a": 1}} />', /Write name of <Drawing>/],
    ['spread attributes', '<Drawing {...props} />', /Write each attribute of <Drawing> by its name/],
    ['an unknown component', '<Teapot />', /<Teapot> cannot be used in a lesson; there are Calculator, /],
    ['plain HTML', '<script>alert(1)</script>', /<script> cannot be used/],
    ['a nameless element', '<>x</>', /<> cannot be used/],
    ['a component of another', '<Drawing.Inner />', /<Drawing\.Inner> cannot be used/],
    ['a link that runs', '[x](javascript:alert(1))', /Begin the link “javascript:alert\(1\)” with https:\/\//],
    ['a link by reference that runs', '[x][y]\n\n[y]: data:text/html,x', /Begin the link/],
    ['questions without a name', '<CheckYourself questions="a b" />', /Write <CheckYourself name="end"/],
    ['no questions', '<CheckYourself name="end" questions=" " />', /Write <CheckYourself name="end"/],
  ])('%s', (_, body, message) => {
    const problems = problemsOf(`${head}Words.\n\n${body}\n`)
    expect(problems).toHaveLength(1)
    expect(problems[0]!.message).toMatch(message)
    expect(problems[0]!.line).toBeGreaterThanOrEqual(10)
    expect(problems[0]!.column).toBeGreaterThanOrEqual(1)
  })

  test('two rounds of one name', () => {
    expect(
      problemsOf(`${head}<CheckYourself name="end" questions="a" />\n\n<CheckYourself name="end" questions="b" />`),
    ).toEqual([{ line: 10, column: 1, message: 'Two <CheckYourself> are called “end”: each wants a name of its own.' }])
  })

  test('what cannot be read at all', () => {
    const [problem, ...others] = problemsOf(`${head}Words.\n\n<Caution level="stop">\n\nMore.\n`)
    expect(problem).toMatchObject({ line: 10, column: 1 })
    expect(problem!.message).toMatch(/Expected a closing tag/)
    expect(others).toEqual([])
  })

  test('every problem at once', () => {
    expect(problemsOf(`${head}{a}\n\n<Teapot />\n\n{b}`).map(({ line }) => line)).toEqual([8, 10, 12])
  })
})

describe('the head', () => {
  test.each<[string, string, RegExp]>([
    ['none', '# Words', /Begin with the head of the lesson/],
    ['not YAML', '---\ntitle: [\n---\n', /cannot be read/],
    ['no hazards', head.replace('hazards: [rotating]\n', ''), /Head of the lesson, hazards/],
    ['an unknown hazard', head.replace('rotating', 'dragons'), /Head of the lesson, hazards 0/],
    ['an unknown station', head.replace('station: runner', 'station: moon'), /station/],
    ['too short a lesson', head.replace('12', '7'), /minutes/],
    ['too long a lesson', head.replace('12', '16'), /minutes/],
    ['half a minute', head.replace('12', '9.5'), /minutes/],
    ['a misspelt key', head.replace('title', 'titel'), /titel/],
  ])('%s', (_, source, message) => {
    expect(
      problemsOf(source)
        .map(({ message }) => message)
        .join('\n'),
    ).toMatch(message)
  })
})
