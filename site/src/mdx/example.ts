import type { ReactNode } from 'react'
import type { CalculatorDefinition } from '#calc/index.ts'
import { givenValues } from '../features/calculators/given-values.ts'
import { solveForm, startForm } from '../features/calculators/form.ts'
import { textsFrom, type Attributes } from './attributes.ts'

/** A calculation with the numbers of a lesson, worked out; throws where they do not work out, which the content's tests find. */
export function workOut(definition: CalculatorDefinition, attributes: Attributes, children: ReactNode) {
  const texts = textsFrom(definition, attributes, children)
  const form = startForm(definition, texts)
  const solved = solveForm(definition, form)
  if (!solved.solution) {
    const [path, message] = Object.entries(solved.errors)[0]!
    throw new Error(`The example of ${definition.title} does not work out: ${path}: ${message}`)
  }
  const { outputs, working } = solved.solution
  return {
    inputs: solved.inputs,
    given: givenValues(definition, form, (path) => path in texts),
    working,
    outputs,
  }
}
