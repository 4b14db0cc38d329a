/**
 * `npm run fuzz -- [seconds] [--seed text] [--only friction,jet]`: inputs in range, at the edges of their ranges and hostile, at every
 * calculator, by the library and by the server. Ends with an error where an answer is not finite, takes over two seconds, is neither answer
 * nor refusal, differs between the two, or where too few inputs get as far as the sums. The same seed brings the same inputs in the same
 * order, however far it gets.
 */
import { parseArgs } from 'node:util'
import { calculator, calculators, type CalculatorDefinition } from '#calc/index.ts'
import { byLibrary, faultOf, passesChecks } from './by-library.ts'
import { compareWithServer, sendStrangeBodies, toJson } from './by-server.ts'
import { casesOf } from './cases.ts'
import { openServer } from './server.ts'
import { watch } from './watch.ts'

/** One calculation may take so long; twice that and it is taken for endless. */
const longest = 2000
/** So many of the inputs are to get past the checks: the sums are what is tried here. */
const leastShare = 0.3

const { values, positionals } = parseArgs({
  options: { seed: { type: 'string' }, only: { type: 'string' } },
  allowPositionals: true,
})
const seconds = Number(positionals[0] ?? 60)
if (!(seconds > 0)) throw new RangeError('Say for how many seconds: npm run fuzz -- 60')
const seed = values.seed ?? String(Date.now())
const definitions = values.only?.split(',').map(calculator) ?? Object.values<CalculatorDefinition>(calculators)

interface Tally {
  tries: number
  reached: number
  answered: number
  refusals: Record<string, number>
  worst: number
  faults: Map<string, string>
}
const tallies = new Map(
  definitions.map(({ id }): [string, Tally] => [
    id,
    { tries: 0, reached: 0, answered: 0, refusals: {}, worst: 0, faults: new Map() },
  ]),
)

const { run, stop } = watch((2 * longest) / 1000)

function tryOut(definition: CalculatorDefinition, inputs: unknown, tally: Tally) {
  const json = toJson(inputs)
  const fault = (say: string) => {
    if (tally.faults.size < 5) tally.faults.set(say, json?.slice(0, 600) ?? String(inputs))
  }
  tally.tries++
  try {
    const started = performance.now()
    const answer = run(`${definition.id} of ${json}`, () => byLibrary(definition, inputs))
    const took = performance.now() - started
    tally.worst = Math.max(tally.worst, took)
    if (took > longest) fault(`took ${(took / 1000).toFixed(1)} s`)
    if (passesChecks(definition, inputs)) tally.reached++
    if ('error' in answer) tally.refusals[answer.error.code] = (tally.refusals[answer.error.code] ?? 0) + 1
    else tally.answered++
    const wrong = faultOf(definition, answer)
    if (wrong) fault(wrong)
    if (json !== toJson(inputs)) fault('changes its inputs')
  } catch (error) {
    fault(`throws ${error instanceof Error ? error.stack?.split('\n').slice(0, 3).join(' ') : String(error)}`)
  }
  return json
}

console.log(`Seed ${seed}, ${seconds} s`)
const server = await openServer()
const strange = await sendStrangeBodies(server.origin)
const end = performance.now() + seconds * 1000
for (let round = 0; performance.now() < end; round++)
  for (const definition of definitions) {
    if (performance.now() > end) break
    const tally = tallies.get(definition.id)!
    const cases = casesOf(definition, `${seed} ${round} ${definition.id}`)
    const sendable = cases.flatMap((inputs) => tryOut(definition, inputs, tally) ?? [])
    for (const { fault, json } of await compareWithServer(server.origin, definition, sendable))
      if (tally.faults.size < 5) tally.faults.set(fault, json.slice(0, 600))
  }
await server.close()
await stop()

let isFaulty = strange.length > 0
for (const { fault, json } of strange) console.error(`FAULT ${fault}\n  of ${json}`)
const wide = Math.max(...definitions.map(({ id }) => id.length), 'calculator'.length)
console.log(`${'calculator'.padEnd(wide)}   tries  to the sums  answered  worst ms  refusals`)
for (const [id, { tries, reached, answered, refusals, worst, faults }] of tallies) {
  const share = reached / tries
  const codes = Object.entries(refusals).sort(([a], [b]) => a.localeCompare(b))
  console.log(
    [
      id.padEnd(wide),
      String(tries).padStart(6),
      `${(100 * share).toFixed(0)} %`.padStart(11),
      String(answered).padStart(8),
      worst.toFixed(1).padStart(8),
      codes.map(([code, count]) => `${code} ${count}`).join(', '),
    ].join('  '),
  )
  if (tries === 0 || share < leastShare) faults.set(`only ${reached} of ${tries} got as far as the sums`, '')
  for (const [fault, json] of faults) console.error(`  FAULT ${fault}\n    of ${json}`)
  isFaulty ||= faults.size > 0
}
console.log(`Seed ${seed}: ${isFaulty ? 'faults, see above' : 'no faults'}`)
process.exit(isFaulty ? 1 : 0)
