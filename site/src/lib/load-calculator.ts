import { use } from 'react'
import { loaders } from 'virtual:calculator-loaders'
import type { CalculatorDefinition } from '#calc/index.ts'
import { loadOnce } from './load-once.ts'

/** The definition of a calculator, from its own chunk; undefined where there is none of this id. */
export const loadCalculator = loadOnce(async (id): Promise<CalculatorDefinition | undefined> =>
  Object.hasOwn(loaders, id) ? loaders[id]!() : undefined,
)

/** The definition, once it is here: until then the nearest Suspense waits. */
export const useCalculator = (id: string): CalculatorDefinition => {
  const definition = use(loadCalculator(id))
  if (!definition) throw new RangeError(`There is no calculator “${id}”.`)
  return definition
}
