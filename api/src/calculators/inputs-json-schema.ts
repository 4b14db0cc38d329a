import type { OpenAPIObject } from '@nestjs/swagger'
import type { CalculatorDefinition, Cell, Columns, Input } from '#calc/index.ts'
import { numberOf } from '#calc/definition.ts'
import { quantities } from '#calc/units/quantities.ts'

type Schemas = NonNullable<NonNullable<OpenAPIObject['components']>['schemas']>
type SchemaObject = Exclude<Schemas[string], { $ref: string }>

const ofCell = (cell: Cell): SchemaObject =>
  cell.kind === 'choice'
    ? { type: 'string', enum: [...cell.of], description: cell.label }
    : {
        type: cell.whole ? 'integer' : 'number',
        minimum: cell.range[0],
        maximum: cell.range[1],
        description: [cell.label, quantities[cell.quantity].si.name, cell.help].filter(Boolean).join('; '),
        ...(cell.initial === undefined ? {} : { example: cell.initial }),
        ...(cell.fallback === undefined ? {} : { default: cell.fallback }),
      }

const mayMiss = ({ optional, or, goesWith, needs, when }: Input | Cell): boolean =>
  Boolean(optional ?? or ?? goesWith ?? needs ?? when)

const ofColumns = (columns: Columns): SchemaObject => ({
  type: 'object',
  additionalProperties: false,
  properties: Object.fromEntries(Object.entries(columns).map(([key, cell]) => [key, ofCell(cell)])),
  required: Object.keys(columns).filter((key) => !mayMiss(columns[key]!)),
})

const ofInput = (input: Input): SchemaObject => {
  if (input.kind === 'rows')
    return {
      type: 'array',
      minItems: input.least,
      maxItems: input.most,
      items: ofColumns(input.columns),
      description: input.label,
    }
  if (input.kind === 'series')
    return {
      type: 'array',
      minItems: input.least,
      maxItems: input.most,
      items: ofCell(numberOf(input, 0)),
      description: input.label,
    }
  if (input.kind === 'runs')
    return {
      type: 'array',
      minItems: input.least,
      maxItems: input.most,
      items: {
        type: 'array',
        minItems: input.leastEach,
        maxItems: input.mostEach,
        items: ofCell(numberOf(input, 0)),
      },
      description: input.label,
    }
  if (input.kind === 'group') return { ...ofColumns(input.columns), description: input.label }
  return ofCell(input)
}

/** A calculator's inputs as the contract's page shows them, made from its definition. */
export const inputsJsonSchema = ({ inputs, title }: CalculatorDefinition): SchemaObject => ({
  title,
  type: 'object',
  additionalProperties: false,
  properties: Object.fromEntries(Object.entries(inputs).map(([key, input]) => [key, ofInput(input)])),
  required: Object.keys(inputs).filter((key) => !mayMiss(inputs[key]!)),
})
