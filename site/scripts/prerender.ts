import { mkdir, readFile, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { publicPaths as PublicPaths, render as Render } from '../src/entry-server.tsx'

const built = fileURLToPath(new URL('../../dist', import.meta.url))
const bundle = (await import(join(built, 'site-server/entry-server.js'))) as {
  render: typeof Render
  publicPaths: typeof PublicPaths
}

const template = await readFile(join(built, 'site/index.html'), 'utf8')
const emptyRoot = '<div id="root"></div>'
if (!template.includes(emptyRoot)) throw new Error('dist/site is rendered already: build the site first.')
await writeFile(join(built, 'site/shell.html'), template)

/** React writes what belongs in the head before everything else. */
const headTags = /^(?:<title>[^<]*<\/title>|<meta [^>]*>|<link [^>]*>)*/
const paths = bundle.publicPaths()

for (const path of paths) {
  const markup = await bundle.render(path)
  const head = markup.match(headTags)![0]
  const page = template
    .replace('<title>Leatwright</title>', () => head)
    .replace(emptyRoot, () => `<div id="root">${markup.slice(head.length)}</div>`)
  const folder = join(built, 'site', path)
  await mkdir(folder, { recursive: true })
  await writeFile(join(folder, 'index.html'), page)
}
console.log(`${paths.length} public pages rendered, and shell.html for the others.`)
