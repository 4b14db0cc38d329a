import remarkFrontmatter from 'remark-frontmatter'
import remarkParse from 'remark-parse'
import { unified } from 'unified'
import { expect, test } from 'vitest'
import { parse } from 'yaml'
import { remarkContents, type ContentsEntry } from './remark-contents.ts'

const read = (source: string) => {
  const processor = unified().use(remarkParse).use(remarkFrontmatter).use(remarkContents)
  const tree = processor.parse(source)
  processor.runSync(tree)
  const head = tree.children.find((node) => node.type === 'yaml')!
  return {
    ids: tree.children.flatMap((node) => (node.type === 'heading' ? [node.data?.hProperties?.id] : [])),
    contents: (parse(head.value) as { contents: ContentsEntry[] }).contents,
  }
}

test('every heading gets an id of its own, and the main ones stand in the frontmatter', () => {
  const { ids, contents } = read(
    '---\ntitle: Runner\n---\n\n## The builder’s rule\n\n### In *numbers*\n\n## The builder’s rule\n\n## Main\n',
  )
  expect(ids).toEqual(['the-builders-rule', 'in-numbers', 'the-builders-rule-2', 'main-2'])
  expect(contents).toEqual([
    { id: 'the-builders-rule', title: 'The builder’s rule' },
    { id: 'the-builders-rule-2', title: 'The builder’s rule' },
    { id: 'main-2', title: 'Main' },
  ])
})

test('a title with signs of YAML in it is kept as it is', () => {
  expect(read('---\ntitle: x\n---\n\n## Friction: "where" the head #1 goes\n').contents).toEqual([
    { id: 'friction-where-the-head-1-goes', title: 'Friction: "where" the head #1 goes' },
  ])
})
