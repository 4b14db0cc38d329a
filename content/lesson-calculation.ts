import {
  calculator,
  type CalculatorDefinition,
  type Input,
  type Inputs,
  type PlainRow,
  type PlainValue,
} from '#calc/index.ts'
import { readCell } from '#calc/marking/calculation.ts'
import type { LessonComponent, LiteralAttribute } from './lesson-source.ts'

/** Attributes of the components with a calculator that are no inputs of it. */
const ownAttributes: Partial<Record<LessonComponent['name'], readonly string[]>> = {
  Calculator: ['id', 'show', 'plot'],
  WorkedExample: ['id'],
  FadedExample: ['id', 'blank'],
  Plot: ['id', 'output', 'input', 'from', 'to'],
}

export const hasCalculator = ({ name }: LessonComponent): boolean => ownAttributes[name] !== undefined

const written = (value: LiteralAttribute | undefined, name: string): PlainValue => {
  if (typeof value === 'string' || typeof value === 'number') return value
  throw new RangeError(`${name} wants a number or a text.`)
}

const textsOf = (attributes: LessonComponent['attributes'], without: readonly string[]): [string, PlainValue][] =>
  Object.entries(attributes)
    .filter(([name]) => !without.includes(name))
    .map(([name, value]) => [name, written(value, name)])

/** What a field shows that the lesson says nothing of. */
const startOf = (input: Input): Inputs[string] => {
  if (input.initial !== undefined) return input.initial
  return input.kind === 'choice' && !input.optional ? (input.fallback ?? input.of[0]) : undefined
}

const readRow = ({ inputs, title }: CalculatorDefinition, row: LessonComponent): [string, PlainRow] => {
  const of = row.attributes.of
  const input = typeof of === 'string' && Object.hasOwn(inputs, of) ? inputs[of] : undefined
  if (input?.kind !== 'rows' && input?.kind !== 'group')
    throw new RangeError(`${title} has no list called “${String(of)}”.`)
  const cells = textsOf(row.attributes, ['of']).map(([name, value]) => {
    const cell = Object.hasOwn(input.columns, name) ? input.columns[name] : undefined
    if (!cell) throw new RangeError(`${input.label} has no value called “${name}”.`)
    return [name, readCell(cell, value)] as const
  })
  return [of as string, Object.fromEntries(cells)]
}

/**
 * The inputs that a component of a lesson sets, and for the others what the calculator's form starts with, in SI. Throws a RangeError for a
 * calculator, an input or a text that there is not.
 */
export const lessonInputs = (component: LessonComponent): Inputs => {
  const definition = calculator(String(component.attributes.id))
  const given: Record<string, Inputs[string]> = {}
  for (const [name, value] of textsOf(component.attributes, ownAttributes[component.name]!)) {
    const input = Object.hasOwn(definition.inputs, name) ? definition.inputs[name] : undefined
    if (input?.kind !== 'scalar' && input?.kind !== 'choice')
      throw new RangeError(`${definition.title} has no single value called “${name}”.`)
    // Written empty, an optional input stays away.
    given[name] = value === '' ? undefined : readCell(input, value)
  }
  for (const row of component.children) {
    const [of, cells] = readRow(definition, row)
    const before = given[of]
    given[of] =
      definition.inputs[of]!.kind === 'group'
        ? cells
        : [...(Array.isArray(before) ? (before as PlainRow[]) : []), cells]
  }
  const named = new Set(Object.keys(given))
  const inputs: Record<string, Inputs[string]> = { ...given }
  for (const [key, input] of Object.entries(definition.inputs)) {
    const isDecided =
      named.has(key) || (input.or !== undefined && (named.has(input.or) || inputs[input.or] !== undefined))
    const partner = input.goesWith ?? input.needs
    if (!isDecided && (partner === undefined || inputs[partner] !== undefined)) inputs[key] = startOf(input)
  }
  return inputs
}
