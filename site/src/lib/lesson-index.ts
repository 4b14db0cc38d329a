import type { Hazard } from '#calc/definition.ts'

/** What is public of every lesson that is there, paid ones too. Read at build from the lessons' frontmatter. */
export interface LessonIndexEntry {
  course: string
  slug: string
  number: number
  title: string
  minutes: number
  station: string
  hazards: readonly Hazard[]
}
