import type { OpenAPIObject } from '@nestjs/swagger'
import {
  calculators,
  type CalculatorDefinition,
  type Cell,
  type Columns,
  type Input,
  type Output,
} from '#calc/index.ts'
import { longestWords } from '#calc/check.ts'
import { numberOf } from '#calc/definition.ts'
import { quantities } from '#calc/units/quantities.ts'

type Schemas = NonNullable<NonNullable<OpenAPIObject['components']>['schemas']>
type SchemaObject = Exclude<Schemas[string], { $ref: string }>

const words = (...parts: readonly (string | undefined)[]) => parts.filter(Boolean).join('; ')

const ofCell = (cell: Cell): SchemaObject =>
  cell.kind === 'choice' && cell.free
    ? { type: 'string', minLength: 1, maxLength: longestWords, description: cell.label }
    : cell.kind === 'choice'
      ? {
          type: 'string',
          enum: [...cell.of],
          description: words(cell.label, cell.help),
          ...(cell.initial === undefined ? {} : { example: cell.initial }),
          ...(cell.fallback === undefined ? {} : { default: cell.fallback }),
        }
      : {
          type: cell.whole ? 'integer' : 'number',
          minimum: cell.range[0],
          maximum: cell.range[1],
          description: words(cell.label, quantities[cell.quantity].si.name, cell.help),
          ...(cell.initial === undefined ? {} : { example: cell.initial }),
          ...(cell.fallback === undefined ? {} : { default: cell.fallback }),
        }

const hasFallback = (input: Input | Cell) => 'fallback' in input && input.fallback !== undefined

const mayMiss = (input: Input | Cell): boolean => {
  const { optional, or, goesWith, needs, when } = input
  return Boolean(optional ?? or ?? goesWith ?? needs ?? when) || hasFallback(input)
}

const ofColumns = (columns: Columns): SchemaObject => ({
  type: 'object',
  additionalProperties: false,
  properties: Object.fromEntries(Object.entries(columns).map(([key, cell]) => [key, ofCell(cell)])),
  required: Object.keys(columns).filter((key) => !mayMiss(columns[key]!)),
})

const ofInput = (input: Input): SchemaObject => {
  const description = words(input.label, input.help)
  switch (input.kind) {
    case 'scalar':
    case 'choice':
      return ofCell(input)
    case 'group':
      return { ...ofColumns(input.columns), description }
    case 'rows':
      return {
        ...{ type: 'array', minItems: input.least, maxItems: input.most, description },
        items: ofColumns(input.columns),
      }
    case 'series':
      return {
        ...{ type: 'array', minItems: input.least, maxItems: input.most, description },
        items: ofCell(numberOf(input, 0)),
      }
    case 'runs':
      return {
        ...{ type: 'array', minItems: input.least, maxItems: input.most, description },
        items: {
          ...{ type: 'array', minItems: input.leastEach, maxItems: input.mostEach },
          items: ofCell(numberOf(input, 0)),
        },
      }
  }
}

/** Of two alternatives exactly one is given. */
const alternatives = ({ inputs }: CalculatorDefinition): Pick<SchemaObject, 'allOf'> => {
  const keys = Object.keys(inputs)
  const pairs = keys.flatMap((key, i) => {
    const { or } = inputs[key]!
    return or !== undefined && keys.indexOf(or) > i ? [[key, or]] : []
  })
  if (pairs.length === 0) return {}
  return { allOf: pairs.map((pair) => ({ oneOf: pair.map((key) => ({ required: [key] })) })) }
}

const inputsSchema = (definition: CalculatorDefinition): SchemaObject => ({
  title: `${definition.title}: inputs`,
  description: 'SI',
  type: 'object',
  additionalProperties: false,
  properties: Object.fromEntries(Object.entries(definition.inputs).map(([key, input]) => [key, ofInput(input)])),
  required: Object.keys(definition.inputs).filter((key) => !mayMiss(definition.inputs[key]!)),
  ...alternatives(definition),
  example: definition.example.inputs,
})

const ofOutputs = (outputs: Readonly<Record<string, Output>>): SchemaObject => ({
  type: 'object',
  additionalProperties: false,
  properties: Object.fromEntries(Object.entries(outputs).map(([key, output]) => [key, ofOutput(output)])),
  required: Object.keys(outputs).filter((key) => !outputs[key]!.sometimes),
})

const ofOutput = (output: Output): SchemaObject => {
  switch (output.kind) {
    case 'scalar':
      return { type: 'number', description: words(output.label, quantities[output.quantity].si.name, output.help) }
    case 'text':
      return { type: 'string', description: words(output.label, output.help) }
    case 'rows':
      return { type: 'array', items: ofOutputs(output.columns), description: words(output.label, output.help) }
  }
}

const outputsSchema = ({ title, outputs }: CalculatorDefinition): SchemaObject => ({
  title: `${title}: outputs`,
  description: 'SI; what cannot be worked out is absent',
  ...ofOutputs(outputs),
})

const definitions = Object.values<CalculatorDefinition>(calculators)

/** `flow-by-bucket` and `Inputs` → `FlowByBucketInputs`. */
export const schemaName = (id: string, of: 'Inputs' | 'Outputs'): string =>
  id.replace(/(?:^|-)([a-z])/g, (_, letter: string) => letter.toUpperCase()) + of

/** What each calculator takes and gives, for the components of the contract, made from its definition. */
export const calculatorJsonSchemas = (): Record<string, SchemaObject> =>
  Object.fromEntries(
    definitions.flatMap((definition) => [
      [schemaName(definition.id, 'Inputs'), inputsSchema(definition)],
      [schemaName(definition.id, 'Outputs'), outputsSchema(definition)],
    ]),
  )

/** Those of any calculator, by reference. */
export const anyCalculators = (of: 'Inputs' | 'Outputs'): SchemaObject => ({
  anyOf: definitions.map(({ id }) => ({ $ref: `#/components/schemas/${schemaName(id, of)}` })),
})
