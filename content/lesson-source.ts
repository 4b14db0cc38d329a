import type { Root } from 'mdast'
import { toString } from 'mdast-util-to-string'
import type { MdxJsxAttribute, MdxJsxFlowElement, MdxJsxTextElement } from 'mdast-util-mdx-jsx'
import remarkFrontmatter from 'remark-frontmatter'
import remarkGfm from 'remark-gfm'
import remarkMath from 'remark-math'
import remarkMdx from 'remark-mdx'
import remarkParse from 'remark-parse'
import { unified } from 'unified'
import { visit } from 'unist-util-visit'
import { VFileMessage } from 'vfile-message'
import { parse as parseYaml } from 'yaml'
import { frontmatterSchema, type Frontmatter } from './frontmatter.ts'

/** Every component that a lesson may use. */
export const lessonComponents = [
  'Calculator',
  'WorkedExample',
  'FadedExample',
  'Row',
  'Plot',
  'Drawing',
  'Caution',
  'FromTheTrade',
  'Source',
  'Gloss',
  'CheckYourself',
  'SiteTask',
] as const
export type LessonComponentName = (typeof lessonComponents)[number]

export type LiteralAttribute = string | number | boolean

export interface LessonComponent {
  name: LessonComponentName
  attributes: Record<string, LiteralAttribute>
  /** The words inside it. */
  text: string
  line: number
  /** The components right inside it, such as rows. */
  children: LessonComponent[]
}

/** A `<CheckYourself>`: a round of questions is drawn for each. */
export interface LessonBlock {
  name: string
  questions: string[]
}

export interface LessonSource {
  frontmatter: Frontmatter
  blocks: LessonBlock[]
  headings: { depth: number; text: string }[]
  /** Every component, also those inside others, in the order of the text. */
  components: LessonComponent[]
}

export interface LessonProblem {
  line: number
  column: number
  message: string
}

/** What in a lesson's text is not allowed, and what to write instead. */
export class LessonSourceError extends Error {
  override readonly name = 'LessonSourceError'
  constructor(readonly problems: LessonProblem[]) {
    super(problems.map(({ line, column, message }) => `line ${line}, column ${column}: ${message}`).join('\n'))
  }
}

type Place = { position?: { start: { line: number; column: number } } }
type Report = (node: Place, message: string) => void

/** The same reading as the build's, so that both understand a lesson alike; math first, or its braces would be expressions. */
const parser = unified().use(remarkParse).use(remarkFrontmatter).use(remarkGfm).use(remarkMath).use(remarkMdx).freeze()

const parseLesson = (source: string): Root => {
  try {
    return parser.parse(source)
  } catch (error) {
    if (!(error instanceof VFileMessage)) throw error
    // A tag that is never closed has its place only in the words: "(10:1-10:24)".
    const [, line, column] = /\((\d+):(\d+)/.exec(error.reason) ?? []
    throw new LessonSourceError([
      { line: error.line ?? Number(line ?? 1), column: error.column ?? Number(column ?? 1), message: error.reason },
    ])
  }
}

/** The number, text or truth that stands between braces; undefined for anything that would have to be worked out. */
const literal = (braced: string): LiteralAttribute | undefined => {
  try {
    const value: unknown = JSON.parse(braced)
    return typeof value === 'number' || typeof value === 'string' || typeof value === 'boolean' ? value : undefined
  } catch {
    return undefined
  }
}

const attributeValue = ({ value }: MdxJsxAttribute): LiteralAttribute | undefined =>
  value === null || value === undefined ? true : typeof value === 'string' ? value : literal(value.value)

const isAllowed = (name: string | null): name is LessonComponentName =>
  (lessonComponents as readonly (string | null)[]).includes(name)

const readComponent = (node: MdxJsxFlowElement | MdxJsxTextElement, report: Report): LessonComponent | undefined => {
  if (!isAllowed(node.name)) {
    report(node, `<${node.name ?? ''}> cannot be used in a lesson; there are ${lessonComponents.join(', ')}.`)
    return undefined
  }
  const attributes: [string, LiteralAttribute][] = []
  for (const attribute of node.attributes) {
    if (attribute.type === 'mdxJsxExpressionAttribute') {
      report(node, `Write each attribute of <${node.name}> by its name, not {${attribute.value}}.`)
      continue
    }
    const value = attributeValue(attribute)
    if (value === undefined)
      report(node, `Write ${attribute.name} of <${node.name}> as a number in braces or as a text in quotes.`)
    else attributes.push([attribute.name, value])
  }
  return {
    name: node.name,
    attributes: Object.fromEntries(attributes),
    text: toString(node),
    line: node.position?.start.line ?? 1,
    children: [],
  }
}

const isSafeLink = (url: string): boolean => /^(https?:\/\/|mailto:|\/|#)/.test(url)

const readFrontmatter = (tree: Root, report: Report): Frontmatter | undefined => {
  const head = tree.children[0]
  if (head?.type !== 'yaml') {
    report(
      tree,
      'Begin with the head of the lesson: three dashes, its title, station, minutes and hazards, three dashes.',
    )
    return undefined
  }
  let data: unknown
  try {
    data = parseYaml(head.value)
  } catch (error) {
    report(head, `The head of the lesson cannot be read: ${(error as Error).message}`)
    return undefined
  }
  const read = frontmatterSchema.safeParse(data)
  if (read.success) return read.data
  for (const { path, message } of read.error.issues)
    report(head, `Head of the lesson, ${path.join(' ') || 'as a whole'}: ${message}`)
  return undefined
}

const readBlock = ({ attributes: { name, questions } }: LessonComponent): LessonBlock | undefined =>
  typeof name === 'string' && typeof questions === 'string' && questions.trim() !== ''
    ? { name, questions: questions.trim().split(/\s+/) }
    : undefined

/**
 * Reads a lesson's MDX as data: head, blocks of questions, headings, components with their literal attributes. Throws
 * `LessonSourceError` for imports, exports, expressions and unknown components. Never runs anything of it.
 */
export const readLesson = (source: string): LessonSource => {
  const tree = parseLesson(source)
  const problems: LessonProblem[] = []
  const report: Report = ({ position }, message) =>
    problems.push({ line: position?.start.line ?? 1, column: position?.start.column ?? 1, message })

  const frontmatter = readFrontmatter(tree, report)
  const headings: LessonSource['headings'] = []
  const blocks: LessonBlock[] = []
  const components = new Map<object, LessonComponent>()

  visit(tree, (node, _, parent) => {
    switch (node.type) {
      case 'heading':
        headings.push({ depth: node.depth, text: toString(node) })
        break
      case 'mdxjsEsm':
        report(node, 'A lesson has no import and no export: its components are there already.')
        break
      case 'mdxFlowExpression':
      case 'mdxTextExpression':
        report(
          node,
          'Braces cannot be worked out in a lesson: write the words or the number, or put \\ before the brace.',
        )
        break
      case 'link':
      case 'definition':
        if (!isSafeLink(node.url)) report(node, `Begin the link “${node.url}” with https://, / or #.`)
        break
      case 'mdxJsxFlowElement':
      case 'mdxJsxTextElement': {
        const component = readComponent(node, report)
        if (!component) break
        components.set(node, component)
        if (parent) components.get(parent)?.children.push(component)
        if (component.name !== 'CheckYourself') break
        const block = readBlock(component)
        if (!block) report(node, 'Write <CheckYourself name="end" questions="the ids, with spaces between" />.')
        else if (blocks.some(({ name }) => name === block.name))
          report(node, `Two <CheckYourself> are called “${block.name}”: each wants a name of its own.`)
        else blocks.push(block)
      }
    }
  })
  if (problems.length > 0 || !frontmatter) throw new LessonSourceError(problems)
  return { frontmatter, blocks, headings, components: [...components.values()] }
}
