import type { CalculatorDefinition, Columns, Inputs, PlainRow, PlainValue } from '#calc/index.ts'
import { fieldText, unitFor } from '#calc/units/format.ts'
import { columnsOf, isMany, isRecord, pathOf, type ScalarCell } from './columns.ts'
import { inventedRecord, startForm, type Form, type Texts } from './form.ts'
import { lineText, lineWithUnit } from './line-text.ts'

const written = (value: PlainValue | undefined, cell: Columns[string]): string => {
  if (value === undefined) return ''
  if (cell.kind === 'choice') return String(value)
  const unit = unitFor(cell.quantity, Number(value), cell.unit).name
  const number = Number(Number(fieldText(Number(value), cell.quantity, unit)).toPrecision(6))
  return `${number} ${unit}`
}

/** What the fields say for these inputs (SI), each left empty that is not among them. */
const textsOf = ({ inputs: asked }: CalculatorDefinition, inputs: Inputs): Texts => {
  const texts: Record<string, string> = {}
  for (const [key, input] of Object.entries(asked)) {
    const value = inputs[key]
    // Of two alternatives the one that is written is the one that is known.
    if ((value === undefined && input.or !== undefined) || isRecord(input)) continue
    if (!isMany(input)) {
      texts[key] = written(value as PlainValue | undefined, input)
      continue
    }
    if (input.kind === 'runs') {
      for (const [i, run] of ((value ?? []) as readonly (readonly number[])[]).entries()) {
        const cell = columnsOf(input)[''] as ScalarCell
        texts[pathOf(input, key, i, '')] = lineWithUnit(cell, lineText(cell, run))
      }
      continue
    }
    const columns = columnsOf(input)
    const rows = (value === undefined ? [] : Array.isArray(value) ? value : [value]) as readonly (PlainRow | number)[]
    if (rows.length === 0 && input.kind !== 'group') texts[key] = ''
    rows.forEach((row, i) => {
      for (const [name, cell] of Object.entries(columns))
        texts[pathOf(input, key, i, name)] = written(typeof row === 'number' ? row : row[name], cell)
    })
  }
  return texts
}

/** The form filled with the calculator's example. */
export const exampleForm = (definition: CalculatorDefinition): Form => {
  const { inputs } = definition.example
  const records = Object.entries(definition.inputs).flatMap(([key, input]) =>
    isRecord(input) && inputs[key] !== undefined
      ? [[key, { values: inputs[key] as readonly number[], from: inventedRecord }] as const]
      : [],
  )
  return startForm(definition, textsOf(definition, inputs), Object.fromEntries(records))
}
