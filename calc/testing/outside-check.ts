import { test } from 'vitest'

/**
 * Where a check's value comes from: `published` in print or in a standard; `library`, computed by a named general-purpose library;
 * `derived` here by a second, independent way; `memory`, recalled and not read anywhere, which never counts towards a calculator's three.
 */
export type Provenance = 'published' | 'library' | 'derived' | 'memory'

declare module 'vitest' {
  interface TaskMeta {
    /** Of a check against a value from outside: where the value is from, and how many were compared. */
    outside?: { provenance: Provenance; points: number }
  }
}

/** A test against a value from outside the project; `npm run outside-checks` counts those that ran and passed. */
export const outside = (
  provenance: Provenance,
  source: string,
  name: string,
  check: () => void | Promise<void>,
  points = 1,
): void => test(`[${provenance}] ${source}: ${name}`, { meta: { outside: { provenance, points } } }, check)

/** One check against a library at many points, such as `fc.sample(pipes, 50)`. */
export const oracle = <Point>(
  source: string,
  name: string,
  points: readonly Point[],
  compare: (point: Point) => void | Promise<void>,
): void =>
  outside(
    'library',
    source,
    `${name}, ${points.length} points`,
    async () => {
      for (const point of points) await compare(point)
    },
    points.length,
  )
