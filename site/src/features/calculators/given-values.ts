import type { CalculatorDefinition, Cell } from '#calc/index.ts'
import { columnsOfRow, isMany, isRecord, pathOf } from './columns.ts'
import type { FieldText } from './field-text.ts'
import { shownKeys, type Form } from './form.ts'

export interface GivenValue {
  label: string
  text: string
}

const written = ({ text, unit }: FieldText) => [text, unit].filter(Boolean).join('\u00a0')

const everything = () => true

/** What the fields of a form say, in words; fields that may stay empty only where `isTold` speaks for them. */
export function givenValues(
  definition: CalculatorDefinition,
  form: Form,
  isTold: (path: string) => boolean = everything,
): GivenValue[] {
  const value = (label: string, cell: Cell, path: string, field: FieldText): GivenValue[] => {
    if (field.text === '' || (cell.optional && !isTold(path))) return []
    const text =
      cell.kind !== 'choice'
        ? written(field)
        : cell.free
          ? field.text
          : (cell.words?.[field.text] ?? field.text.replaceAll('-', ' '))
    return [{ label, text }]
  }
  return shownKeys(definition, form).flatMap((key) => {
    const input = definition.inputs[key]!
    if (isRecord(input)) {
      const { values, from } = form.records[key]!
      return [{ label: input.label, text: `${values.length} ${input.row}s (${from})` }]
    }
    if (!isMany(input)) return value(input.label, input, key, form.fields[key]!)
    return form.rows[key]!.flatMap((row, i) =>
      Object.entries(columnsOfRow(input, row)).flatMap(([name, cell]) => {
        const of = input.kind === 'rows' ? `${input.row} ${i + 1}: ` : ''
        const label = input.kind === 'series' || input.kind === 'runs' ? `${cell.label} ${i + 1}` : of + cell.label
        return value(label.charAt(0).toUpperCase() + label.slice(1), cell, pathOf(input, key, i, name), row[name]!)
      }),
    )
  })
}
