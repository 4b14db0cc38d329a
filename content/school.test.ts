import { expect, test } from 'vitest'
import { stringify } from 'yaml'
import { readSchool } from './school.ts'

const mdx = (questions: string) =>
  `---\ntitle: The jet\nstation: jet\nminutes: 9\nhazards: []\n---\n\n## Why\n\n<CheckYourself name="end" questions="${questions}" />\n`
const bank = (...ids: string[]) =>
  stringify(ids.map((id) => ({ id, kind: 'order', say: 'In order.', items: ['a', 'b', 'c'], because: 'So.' })))

const jet = '/content/jet-and-runner/01-the-jet'
const runner = '/content/jet-and-runner/04-runner-speed'
const good = {
  [`${runner}.mdx`]: mdx('three'),
  [`${runner}.questions.yaml`]: bank('three'),
  [`${jet}.mdx`]: mdx('one two'),
  [`${jet}.questions.yaml`]: bank('one', 'two', 'spare'),
}

test('lessons by their slug, with course, number, head, blocks and bank', () => {
  const school = readSchool(good)
  expect([...school.keys()]).toEqual(['the-jet', 'runner-speed'])
  expect(school.get('the-jet')).toMatchObject({
    slug: 'the-jet',
    course: 'jet-and-runner',
    number: 1,
    frontmatter: { title: 'The jet' },
    headings: [{ depth: 2, text: 'Why' }],
    blocks: [{ name: 'end', questions: ['one', 'two'] }],
    bank: [{ id: 'one' }, { id: 'two' }, { id: 'spare' }],
  })
})

test.each<[string, Record<string, string>, string]>([
  [
    'a lesson out of its place',
    { '/content/jet-and-runner/02-the-jet.mdx': mdx('one') },
    '02-the-jet.mdx: the list of courses has “needles-and-nozzles” in this place',
  ],
  [
    'a lesson too many',
    { '/content/jet-and-runner/99-more.mdx': mdx('one') },
    'the list of courses has no lesson in this place',
  ],
  ['a course that there is not', { '/content/tea/01-the-jet.mdx': mdx('one') }, 'the list of courses has no lesson'],
  [
    'another kind of file',
    { '/content/jet-and-runner/notes.mdx': '' },
    'notes.mdx: a lesson’s file is called like 04-runner-speed.mdx',
  ],
  [
    'a question that there is not',
    { ...good, [`${jet}.mdx`]: mdx('one four') },
    '01-the-jet.mdx: the questions “end” name “four”, which the bank does not have',
  ],
  ['a missing bank', { [`${jet}.mdx`]: mdx('one') }, 'the questions “end” name “one”'],
  [
    'a question in two banks',
    { ...good, [`${runner}.questions.yaml`]: bank('three', 'two') },
    'the question “two” stands in the bank of “the-jet” too',
  ],
  ['a fault in a lesson', { ...good, [`${jet}.mdx`]: `${mdx('one')}{a}` }, '01-the-jet.mdx: line 11, column 1: Braces'],
  [
    'a fault in a bank',
    { ...good, [`${jet}.questions.yaml`]: '- id: x' },
    '01-the-jet.questions.yaml: question “x”, kind',
  ],
])('%s is named with its file', (_, texts, message) => {
  expect(() => readSchool(texts)).toThrow(message)
})
