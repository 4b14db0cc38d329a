import { checkInputs } from '#calc/check.ts'
import { CalculationError, type CalculatorDefinition, type Solution } from '#calc/index.ts'
import { solveDefinition } from '#calc/solve-definition.ts'

export type Answer = Solution | { error: { field: string; code: string; message: string } }

/** What the library says, as JSON would carry it. Whatever else is thrown goes on. */
export function byLibrary(definition: CalculatorDefinition, inputs: unknown): Answer {
  try {
    return solveDefinition(definition, inputs)
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error
    const { field, code, message } = error
    return { error: { field, code, message } }
  }
}

/** Whether the inputs pass the checks that stand before the sums. */
export function passesChecks(definition: CalculatorDefinition, inputs: unknown): boolean {
  try {
    checkInputs(definition, inputs)
    return true
  } catch (error) {
    if (error instanceof CalculationError) return false
    throw error
  }
}

const unfinished = /\bNaN\b|\bInfinity\b|\bundefined\b|\[object/

/** What is wrong with an answer in itself; undefined where nothing is. */
export function faultOf(definition: CalculatorDefinition, answer: Answer): string | undefined {
  if ('error' in answer) {
    const { field, code, message } = answer.error
    if (message === '') return `a refusal without words at ${field}`
    const key = /^[^.[]*/.exec(field)![0]
    const isKnown = Object.hasOwn(definition.inputs, key)
    return isKnown || code === 'unknown-key' ? undefined : `a refusal at “${field}”, which is no input`
  }
  const values = (part: unknown): unknown[] =>
    typeof part === 'object' && part !== null ? Object.values(part).flatMap(values) : [part]
  for (const [key, output] of Object.entries(answer.outputs))
    for (const value of values(output))
      if (value === null || (typeof value === 'number' && !Number.isFinite(value))) return `${key} holds ${value}`
  const said = [
    ...answer.working.flatMap((step) => Object.values(step) as string[]),
    ...answer.cautions.map(({ say }) => say),
  ]
  const half = said.find((text) => unfinished.test(text))
  return half === undefined ? undefined : `it says “${half.slice(0, 200)}”`
}
