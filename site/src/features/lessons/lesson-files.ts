import type { MDXContent } from 'mdx/types'
import type { ContentsEntry } from '../../mdx/remark-contents.ts'

export interface LessonFile {
  default: MDXContent
  frontmatter: { contents: readonly ContentsEntry[] }
}

const files = import.meta.glob<LessonFile>('../../../../content/*/*.mdx')

const load = new Map(
  Object.entries(files).map(([path, load]) => {
    const [, course, lesson] = path.match(/\/content\/([a-z-]+)\/\d+-([a-z-]+)\.mdx$/) ?? []
    return [`${course}/${lesson}`, load]
  }),
)

/** A lesson's text: a file of its own, which the server hands out only to those who may have it. */
export async function loadLesson(course: string, lesson: string) {
  const file = load.get(`${course}/${lesson}`)
  if (!file) throw new Error('This lesson is not part of the site that was loaded.')
  return file()
}
