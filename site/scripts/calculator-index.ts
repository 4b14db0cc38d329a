import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { runnerImport, type Plugin } from 'vite'
import type { CalculatorDefinition } from '../../calc/definition.ts'
import type { CalculatorIndexEntry } from '../src/lib/calculator-index.ts'

const index = 'virtual:calculator-index'
const loaders = 'virtual:calculator-loaders'

/** `import { flowByBucket } from './site/flow-by-bucket.ts'`, of the registry. */
const registered = /^import \{ (\w+) \} from '\.\/([\w/-]+\/([\w-]+))\.ts'$/gm

/**
 * The calculators as the site has them: a list of what they are, small enough for any page, and each one's own chunk, loaded when it is
 * wanted. Both come from the library's registry, which itself would bring all of them at once.
 */
export function calculatorIndex(calcFolder: string): Plugin {
  const registry = join(calcFolder, 'calculators.ts')
  return {
    name: 'calculator-index',
    resolveId: (id) => (id === index || id === loaders ? `\0${id}` : undefined),
    async load(id) {
      if (id !== `\0${index}` && id !== `\0${loaders}`) return
      const { module, dependencies } = await runnerImport<{ calculators: Record<string, CalculatorDefinition> }>(
        registry,
      )
      for (const file of dependencies) this.addWatchFile(file)
      const definitions = Object.values(module.calculators)
      if (id === `\0${index}`) {
        const entries = definitions.map(({ id, title, summary, station, inputs }): CalculatorIndexEntry => {
          const cells = Object.values(inputs).flatMap((input) =>
            'columns' in input ? Object.values(input.columns) : [input],
          )
          const tables = cells.flatMap((cell) => (cell.kind === 'scalar' && cell.pick ? [cell.pick.table] : []))
          return { id, title, summary, station, tables: [...new Set(tables)] }
        })
        return `export const calculatorIndex = ${JSON.stringify(entries)}`
      }
      const text = await readFile(registry, 'utf8')
      const places = new Map([...text.matchAll(registered)].map(([, name, path, file]) => [file!, { name, path }]))
      const lines = definitions.map((definition) => {
        const place = places.get(definition.id)
        if (!place) this.error(`The registry imports no file called ${definition.id}.ts: name the file after the id.`)
        const file = JSON.stringify(join(calcFolder, `${place.path}.ts`))
        return `  ${JSON.stringify(definition.id)}: () => import(${file}).then((module) => module.${place.name}),`
      })
      return `export const loaders = {\n${lines.join('\n')}\n}`
    },
  }
}
