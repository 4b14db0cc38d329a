import type { CalculatorDefinition, Caution, Output, Outputs, PlainValue } from '#calc/index.ts'
import { format, join, type Shown } from '#calc/units/format.ts'
import type { Form } from './form.ts'
import { shownKeys } from './form.ts'

export type CellOutput = Exclude<Output, { kind: 'rows' }>

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

/** A result as it is shown: digits and unit apart. */
export const shownOutput = (output: CellOutput, value: PlainValue): Shown =>
  output.kind === 'scalar' && typeof value === 'number'
    ? format(value, output.quantity, { digits: output.digits, unit: output.unit })
    : { text: output.kind === 'text' ? capital(output.words?.[value] ?? String(value)) : String(value), unit: '' }

export const saidOutput = (output: CellOutput, value: PlainValue): string => join(shownOutput(output, value))

/** The results as one sentence, for a screen reader. */
export const summaryOf = (definition: CalculatorDefinition, outputs: Outputs, keys: readonly string[]): string =>
  keys
    .flatMap((key) => {
      const output = definition.outputs[key]!
      const value = outputs[key]
      return output.kind === 'rows' || value === undefined || typeof value === 'object'
        ? []
        : [`${output.label} ${saidOutput(output, value)}.`]
    })
    .join(' ')

/** Each caution under the first thing shown that it is about; what is about nothing shown comes under ''. */
export const placeCautions = (
  definition: CalculatorDefinition,
  form: Form,
  cautions: readonly Caution[],
): ReadonlyMap<string, readonly Caution[]> => {
  const fields = shownKeys(definition, form)
  const placed = new Map<string, Caution[]>()
  for (const caution of cautions) {
    const at = caution.about.find((key) => fields.includes(key) || definition.outputs[key]) ?? ''
    const place = fields.includes(at) ? at : definition.outputs[at] ? `result ${at}` : ''
    placed.set(place, [...(placed.get(place) ?? []), caution])
  }
  return placed
}
