import { Ajv } from 'ajv'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CalculationError, calculators, type CalculatorDefinition, type Inputs, solve } from '#calc/index.ts'
import { initialInputs } from '#calc/initial.ts'
import { anyInputs } from '#calc/testing/any-inputs.ts'
import { calculatorJsonSchemas, schemaName } from './calculator-json-schemas.ts'

const schemas = calculatorJsonSchemas()
// Not strict: examples are OpenAPI's and say nothing of what is valid.
const ajv = new Ajv({ strict: false, allErrors: true })

/** What the schema complains of, once the value has been through JSON. */
const complaints = (name: string, value: unknown) => {
  const validate = ajv.getSchema(name) ?? ajv.compile({ $id: name, ...schemas[name] })
  return validate(JSON.parse(JSON.stringify(value))) ? [] : validate.errors
}

it('names a schema after the calculator', () => {
  expect(schemaName('flow-by-bucket', 'Inputs')).toBe('FlowByBucketInputs')
  expect(Object.keys(schemas)).toContain('FlowByBucketOutputs')
})

it('says that of two alternatives exactly one is given', () => {
  const { flow, nozzleDiameter, ...others } = initialInputs(calculators.jet)
  const either = { flow: flow ?? 0.01, nozzleDiameter: nozzleDiameter ?? 0.02 }
  expect(complaints('JetInputs', { ...others, flow: either.flow })).toEqual([])
  expect(complaints('JetInputs', { ...others, nozzleDiameter: either.nozzleDiameter })).toEqual([])
  expect(complaints('JetInputs', others)).not.toEqual([])
  expect(complaints('JetInputs', { ...others, ...either })).not.toEqual([])
})

describe.each(Object.values<CalculatorDefinition>(calculators).map((one) => [one.id, one] as const))(
  'the schemas of %s',
  (id, definition) => {
    const ofInputs = (inputs: unknown) => complaints(schemaName(id, 'Inputs'), inputs)
    const ofOutputs = (inputs: Inputs) => complaints(schemaName(id, 'Outputs'), solve(id, inputs).outputs)
    const initial = initialInputs(definition)

    it('take what a form starts with, the example and the answers to both', () => {
      for (const inputs of [initial, definition.example.inputs]) {
        expect(ofInputs(inputs)).toEqual([])
        expect(ofOutputs(inputs)).toEqual([])
      }
    })

    it('take whatever the library answers, and the answer', () => {
      fc.assert(
        fc.property(anyInputs(definition), (inputs) => {
          try {
            expect(ofOutputs(inputs)).toEqual([])
          } catch (error) {
            if (!(error instanceof CalculationError)) throw error
            return
          }
          expect(ofInputs(inputs)).toEqual([])
        }),
        { numRuns: 50, seed: 19_700_101 },
      )
    })

    it('refuse a key that there is not, a text for a number, and what is out of range', () => {
      expect(ofInputs({ ...initial, nonsense: 1 })).not.toEqual([])
      expect(complaints(schemaName(id, 'Outputs'), { ...solve(id, initial).outputs, nonsense: 1 })).not.toEqual([])
      for (const [key, input] of Object.entries(definition.inputs)) {
        if (input.kind !== 'scalar') continue
        for (const wrong of ['1', input.range[0] - 1, input.range[1] * 2 + 1])
          expect(ofInputs({ ...initial, [key]: wrong }), `${key} ${wrong}`).not.toEqual([])
      }
    })
  },
)
