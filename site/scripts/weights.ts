/** What the built site weighs, gzipped, against its figures. Ends with an error where one is missed. */
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { gzipSync } from 'node:zlib'
import { parseSync } from 'vite'

/** Gzipped, in kB of 1000 bytes. */
const figures = {
  /** Every script that the first page needs: what index.html loads, what that imports, and the page's own route. */
  firstPage: 175,
  /** What a calculator needs on top of the first page: arithmetic, units, fields, drawing. It comes after the first paint. */
  calculator: 110,
  /** One lesson's text, with its formulas as markup. */
  lesson: 5,
}

const built = fileURLToPath(new URL('../../dist/site', import.meta.url))

function stop(why: string): never {
  console.error(why)
  process.exit(1)
}
const index = path.join(built, 'index.html')
if (!existsSync(index)) stop('There is no built site: npm run build:site makes it.')

const textOf = (file: string) => readFileSync(path.join(built, file), 'utf8')
const filesIn = (folder: string, extension: string) =>
  readdirSync(path.join(built, folder), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith(extension))
    .map((file) => path.posix.join(folder, file))
const gzipped = (file: string) => gzipSync(readFileSync(path.join(built, file))).length
const sum = (files: Iterable<string>, weigh = gzipped) => [...files].reduce((total, file) => total + weigh(file), 0)

const importsOf = (file: string): string[] => {
  const { staticImports, staticExports } = parseSync(file, textOf(file)).module
  const requests = [...staticImports, ...staticExports.flatMap(({ entries }) => entries)]
  return requests.flatMap(({ moduleRequest }) =>
    moduleRequest ? [path.posix.join(path.posix.dirname(file), moduleRequest.value)] : [],
  )
}

/** These scripts and all that they import before they run; what they load later is not among them. */
function withImports(files: readonly string[], found = new Set<string>()): Set<string> {
  for (const file of files) {
    if (found.has(file)) continue
    found.add(file)
    withImports(importsOf(file), found)
  }
  return found
}

const chunks = filesIn('assets', '.js')

/** The chunk that this file of ours was built into, as its source map tells. */
function chunkOf(source: string): string {
  return findChunk(source) ?? stop(`No chunk of the built site holds ${source}.`)
}
function findChunk(source: string): string | undefined {
  return chunks.find((chunk) => {
    if (!existsSync(path.join(built, `${chunk}.map`))) return false
    const { sources } = JSON.parse(textOf(`${chunk}.map`)) as { sources: string[] }
    return sources.some((one) => one.endsWith(`/${source}`))
  })
}

let isMissed = false
function row(name: string, bytes: number, figure?: number) {
  const missed = figure !== undefined && bytes > figure * 1000
  isMissed ||= missed
  const want = figure === undefined ? '' : `  figure ${figure} kB${missed ? '  MISSED' : ''}`
  console.log(`${name.padEnd(52)} ${(bytes / 1000).toFixed(1).padStart(7)} kB${want}`)
}

const listed = [...readFileSync(index, 'utf8').matchAll(/<(?:script|link)\b[^>]*\b(?:src|href)="\/([^"]+\.js)"/g)]
const atOnce = withImports(listed.map(([, file]) => file!))
if ([...atOnce].some((file) => textOf(file).includes('jsxDEV')))
  stop('dist/site was built for development (NODE_ENV was set): npm run build:site without NODE_ENV makes it anew.')

const firstPage = withImports([chunkOf('site/src/routes/home.tsx')], new Set(atOnce))
const moreThanFirstPage = (sources: readonly string[]) =>
  [...withImports(sources.flatMap((source) => findChunk(source) ?? []))].filter((file) => !firstPage.has(file))

console.log('Scripts, gzipped')
row('first page', sum(firstPage), figures.firstPage)
row('  of it loaded by index.html itself', sum(atOnce))
const frame = 'site/src/features/calculators/Calculator.tsx'
row('what every calculator needs, more than that', sum(moreThanFirstPage([frame])))
row('  of it checking, units and printing', gzipped(chunkOf('calc/solve-definition.ts')))
const registry = readFileSync(fileURLToPath(new URL('../../calc/calculators.ts', import.meta.url)), 'utf8')
const weighed = [...registry.matchAll(/from '\.\/([\w/-]+\/([\w-]+)\.ts)'/g)].map(([, file, id]) => {
  const drawing = `${id!.replace(/(?:^|-)([a-z])/g, (_, letter: string) => letter.toUpperCase())}Drawing.tsx`
  const parts = [frame, `calc/${file}`, `site/src/features/calculators/drawings/${drawing}`]
  return { id: id!, bytes: sum(moreThanFirstPage(parts)) }
})
const heaviest = weighed.sort((a, b) => b.bytes - a.bytes)[0]!
row(`the heaviest calculator, ${heaviest.id}, drawing and all`, heaviest.bytes, figures.calculator)
row('KaTeX, only where a formula changes', gzipped(chunkOf('katex/dist/katex.mjs')))

console.log('\nLessons, gzipped')
for (const lesson of filesIn('lessons', '.js'))
  row(lesson.replace(/^lessons\/|-.{8}\.js$/g, ''), gzipped(lesson), figures.lesson)

console.log('\nStyles, gzipped, and fonts, as they are')
row('styles', sum(filesIn('assets', '.css')))
const plain = (file: string) => statSync(path.join(built, file)).size
const fonts = filesIn('assets', '.woff2')
const ofFormulas = (file: string) => path.basename(file).startsWith('KaTeX_')
row(
  'fonts of the text',
  sum(
    fonts.filter((file) => !ofFormulas(file)),
    plain,
  ),
)
row('fonts of formulas, each only where it is used', sum(fonts.filter(ofFormulas), plain))

process.exit(isMissed ? 1 : 0)
