import { describe, expect, it } from 'vitest'
import { calculators, type CalculatorDefinition } from '#calc/index.ts'
import { initialInputs } from '#calc/initial.ts'
import { seededRandom } from '#calc/numeric/random.ts'
import { byLibrary, faultOf, passesChecks } from './by-library.ts'
import { toJson } from './by-server.ts'
import { casesOf } from './cases.ts'
import { atTheEdges, atTheLongest, chanceOf, spoilt } from './hostile.ts'

const { penstock, 'flow-by-bucket': flowByBucket } = calculators as Record<string, CalculatorDefinition>
const jsonOf = (cases: readonly unknown[]) => cases.map(toJson)

describe('the cases of a calculator', () => {
  it('are the same for the same seed, and others for another', () => {
    const cases = jsonOf(casesOf(penstock!, 'one'))
    expect(jsonOf(casesOf(penstock!, 'one'))).toEqual(cases)
    expect(jsonOf(casesOf(penstock!, 'two'))).not.toEqual(cases)
  })

  it('get past the checks more often than not, and are refused for every reason', () => {
    const cases = ['a', 'b', 'c', 'd', 'e', 'f'].flatMap((seed) => casesOf(penstock!, seed))
    expect(cases.filter((inputs) => passesChecks(penstock!, inputs)).length / cases.length).toBeGreaterThan(0.5)
    const codes = cases
      .map((inputs) => byLibrary(penstock!, inputs))
      .map((answer) => ('error' in answer ? answer.error.code : ''))
    expect(codes).toEqual(
      expect.arrayContaining(['', 'missing', 'unknown-key', 'not-finite', 'out-of-range', 'inconsistent']),
    )
  })
})

describe('spoiling', () => {
  it.each(
    Object.entries({
      atTheEdges,
      atTheLongest,
      spoilt: (_: unknown, ...rest: Parameters<typeof spoilt>) => spoilt(...rest),
    }),
  )('%s leaves the inputs themselves as they are', (_, change) => {
    const inputs = initialInputs(penstock!)
    const before = toJson(inputs)
    const chance = chanceOf(seededRandom('spoil'))
    const changed = Array.from({ length: 200 }, () => toJson(change(penstock!, inputs, chance)))
    expect(toJson(inputs)).toBe(before)
    expect(changed.some((json) => json !== before)).toBe(true)
  })

  it('makes a list as long as it may be', () => {
    const { times } = atTheLongest(flowByBucket!, initialInputs(flowByBucket!), chanceOf(seededRandom(''))) as {
      times: number[]
    }
    const { most } = flowByBucket!.inputs['times'] as { most: number }
    expect(times).toHaveLength(most)
  })
})

describe('a fault', () => {
  const answer = byLibrary(penstock!, initialInputs(penstock!))
  const wrong = (outputs: object) => faultOf(penstock!, { ...answer, outputs } as typeof answer)

  it('is none in a right answer or a refusal', () => {
    expect(faultOf(penstock!, answer)).toBeUndefined()
    expect(faultOf(penstock!, byLibrary(penstock!, {}))).toBeUndefined()
  })

  it('is what is not finite, at any depth, what is half said, and a refusal at no input', () => {
    expect(wrong({ flow: NaN })).toContain('flow')
    expect(wrong({ sections: [{ velocity: Infinity }] })).toContain('sections')
    expect(faultOf(penstock!, { outputs: {}, working: [{ say: 'It is NaN m.' }], cautions: [] })).toContain('NaN')
    const error = { field: 'colour', code: 'out-of-range', message: 'No.' }
    expect(faultOf(penstock!, { error })).toContain('colour')
    expect(faultOf(penstock!, { error: { ...error, code: 'unknown-key' } })).toBeUndefined()
  })
})
