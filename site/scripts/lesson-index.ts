import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import type { Plugin } from 'vite'
import { parse } from 'yaml'
import type { LessonIndexEntry } from '../src/lib/lesson-index.ts'

const name = 'virtual:lesson-index'

/** Reads the head of every lesson, so that lists of lessons need none of their text: a paid lesson's text is not public. */
export function lessonIndex(contentFolder: string): Plugin {
  return {
    name: 'lesson-index',
    resolveId: (id) => (id === name ? `\0${name}` : undefined),
    async load(id) {
      if (id !== `\0${name}`) return
      const files = await readdir(contentFolder, { recursive: true })
      const entries: LessonIndexEntry[] = []
      for (const file of files.sort()) {
        const [, course, number, slug] = file.match(/^([a-z-]+)\/(\d+)-([a-z-]+)\.mdx$/) ?? []
        if (!course || !number || !slug) continue
        const path = join(contentFolder, file)
        this.addWatchFile(path)
        const [, head] = (await readFile(path, 'utf8')).match(/^---\n(.*?)\n---\n/s) ?? []
        if (!head) this.error(`${file} has no frontmatter: begin it with a line of three dashes.`)
        const { title, minutes, station, hazards } = parse(head) as LessonIndexEntry
        entries.push({ course, slug, number: Number(number), title, minutes, station, hazards })
      }
      return `export const lessonIndex = ${JSON.stringify(entries)}`
    },
  }
}
