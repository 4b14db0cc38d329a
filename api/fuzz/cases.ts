import fc from 'fast-check'
import type { CalculatorDefinition } from '#calc/index.ts'
import { initialInputs } from '#calc/initial.ts'
import { seededRandom } from '#calc/numeric/random.ts'
import { anyInputs } from '#calc/testing/any-inputs.ts'
import { atTheEdges, atTheLongest, chanceOf, spoilt } from './hostile.ts'

const casesPerRound = 40

/** One round of inputs for a calculator: most of them in range, the others spoilt. */
export function casesOf(definition: CalculatorDefinition, seed: string): unknown[] {
  const chance = chanceOf(seededRandom(seed))
  const { random, pick } = chance
  const drawn = fc.sample(anyInputs(definition), { numRuns: casesPerRound, seed: Math.floor(random() * 2 ** 31) })
  return drawn.map((inputs) => {
    const start: unknown = random() < 0.85 ? inputs : pick([initialInputs(definition), definition.example.inputs])
    const kind = random()
    if (kind < 0.4) return start
    if (kind < 0.57) return atTheEdges(definition, start, chance)
    if (kind < 0.6) return atTheLongest(definition, start, chance)
    return spoilt(start, chance)
  })
}
