import type { CalculatorDefinition, Columns, Inputs, PlainRow, PlainValue } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'
import { columnsOf, isMany, pathOf } from './columns.ts'
import type { Texts } from './form.ts'

/** What a form's fields say for these inputs (SI), each left empty that is not among them. */
export const textsOf = ({ inputs: asked }: CalculatorDefinition, inputs: Inputs): Texts => {
  const texts: Record<string, string> = {}
  const put = (columns: Columns, name: string, path: string, value: PlainValue | undefined) => {
    const cell = columns[name]!
    if (value === undefined) texts[path] = ''
    else texts[path] = cell.kind === 'scalar' ? say(Number(value), cell.quantity, cell.unit) : String(value)
  }
  for (const [key, input] of Object.entries(asked)) {
    const value = inputs[key]
    // Of two alternatives the one that is written is the one that is known.
    if (value === undefined && input.or !== undefined) continue
    if (!isMany(input)) {
      put(asked as Columns, key, key, value as PlainValue | undefined)
      continue
    }
    const columns = columnsOf(input)
    const rows = (value === undefined ? [] : Array.isArray(value) ? value : [value]) as readonly (PlainRow | number)[]
    if (rows.length === 0 && input.kind !== 'group') texts[key] = ''
    rows.forEach((row, i) => {
      for (const name of Object.keys(columns))
        put(columns, name, pathOf(input, key, i, name), typeof row === 'number' ? row : row[name])
    })
  }
  return texts
}
