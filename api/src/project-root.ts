import { existsSync } from 'node:fs'
import path from 'node:path'

/** The folder of package.json: `drizzle/` and `dist/site/` stand in it, whether this runs from `dist/api/` or from its source. */
export const projectRoot = find(import.meta.dirname)

function find(folder: string): string {
  if (existsSync(path.join(folder, 'package.json'))) return folder
  const parent = path.dirname(folder)
  if (parent === folder) throw new Error('The project folder (with package.json) is not above this file.')
  return find(parent)
}
