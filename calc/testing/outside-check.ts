import { test } from 'vitest'

/**
 * Where a check's value comes from: `published` in print or in a standard; `library`, computed by a named general-purpose library;
 * `derived` here by a second, independent way; `memory`, recalled and not read anywhere, which never counts towards a calculator's three.
 */
export type Provenance = 'published' | 'library' | 'derived' | 'memory'

/** A test against a value from outside the project. The source stands in its title, so that a report can count such checks. */
export const outside = (
  provenance: Provenance,
  source: string,
  name: string,
  check: () => void | Promise<void>,
): void => test(`[${provenance}] ${source}: ${name}`, check)
