import type { TaskMeta } from 'vitest'
import type { Provenance } from './outside-check.ts'

/** A test that ran and passed: its file below `calc/`, the name of its outermost suite, and what it reported of itself. */
export interface PassedTest extends Pick<TaskMeta, 'outside' | 'properties'> {
  file: string
  suite: string | undefined
}

export interface Checks extends Record<Provenance, number> {
  /** Values compared with a library's. */
  oraclePoints: number
  properties: number
  /** How often the properties were tried in all. */
  tries: number
}

/** How many checks from outside the project a calculator needs. */
export const wanted = 3

const none: Checks = { published: 0, library: 0, derived: 0, memory: 0, oraclePoints: 0, properties: 0, tries: 0 }

const fileName = /([\w-]+)\.test\.ts$/

/** A test belongs to the calculator that its file is named after, and otherwise to the one that its outermost suite is called. */
const calculatorOf = ({ file, suite }: PassedTest, ids: readonly string[]): string | undefined =>
  [fileName.exec(file)?.[1], suite].find((name) => name !== undefined && ids.includes(name))

const add = (sum: Checks, { outside, properties }: PassedTest): Checks => {
  const next = { ...sum }
  if (outside) next[outside.provenance]++
  if (outside?.provenance === 'library') next.oraclePoints += outside.points
  next.properties += properties?.held ?? 0
  next.tries += properties?.tries ?? 0
  return next
}

/** What the tests checked, by calculator; under `rest` what belongs to none, such as the tables. */
export const countChecks = (
  ids: readonly string[],
  tests: readonly PassedTest[],
): { byId: Record<string, Checks>; rest: Checks; total: Checks; short: string[] } => {
  const of = (id: string | undefined) => tests.filter((test) => calculatorOf(test, ids) === id).reduce(add, none)
  const byId = Object.fromEntries(ids.map((id) => [id, of(id)]))
  const short = ids.filter((id) => {
    const { published, library, derived } = byId[id]!
    return published + library + derived < wanted
  })
  return { byId, rest: of(undefined), total: tests.reduce(add, none), short }
}

const heads: Record<keyof Checks, string> = {
  published: 'published',
  library: 'library',
  derived: 'derived',
  memory: 'from memory',
  oraclePoints: 'oracle points',
  properties: 'properties',
  tries: 'tries',
}

export const tableOfChecks = ({ byId, rest, total }: ReturnType<typeof countChecks>): string => {
  const rows = { ...byId, 'the rest of the library': rest, total }
  const wide = Math.max(...Object.keys(rows).map((name) => name.length))
  const columns = Object.keys(heads) as (keyof Checks)[]
  const line = (name: string, cell: (column: keyof Checks) => string) =>
    `${name.padEnd(wide)}  ${columns.map((column) => cell(column).padStart(heads[column].length + 1)).join(' ')}`
  return [
    line('calculator', (column) => heads[column]),
    ...Object.entries(rows).map(([name, checks]) => line(name, (column) => String(checks[column]))),
  ].join('\n')
}
