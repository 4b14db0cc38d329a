import type { Root } from 'mdast'
import { toString } from 'mdast-util-to-string'

export interface ContentsEntry {
  id: string
  title: string
}

/** Ids of the page around a lesson, which its headings must not take. */
const taken = ['main', 'root']

const slug = (title: string) =>
  title
    .toLowerCase()
    .normalize('NFKD')
    .replace(/\p{M}|['’]/gu, '')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/g, '')

/**
 * Gives every heading an id, and writes the list of the main ones into the lesson's frontmatter as `contents`, so that it is part
 * of the lesson's own file. Stands between remark-frontmatter and remark-mdx-frontmatter.
 */
export const remarkContents = () => (tree: Root) => {
  const used = new Set(taken)
  const contents: ContentsEntry[] = []
  for (const node of tree.children) {
    if (node.type !== 'heading') continue
    const title = toString(node)
    const start = slug(title)
    let id = start
    for (let again = 2; used.has(id); again++) id = `${start}-${again}`
    used.add(id)
    node.data = { ...node.data, hProperties: { id } }
    if (node.depth === 2) contents.push({ id, title })
  }
  const head = tree.children.find((node) => node.type === 'yaml')
  // JSON is YAML too.
  if (head) head.value += `\ncontents: ${JSON.stringify(contents)}`
}
