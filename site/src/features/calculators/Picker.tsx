import type { Cell } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'
import type { FormAction } from './form.ts'
import { TablePicker } from './TablePicker.tsx'

interface PickerProps {
  /** The inputs of a calculator, or the columns of a row. */
  cells: Readonly<Record<string, { kind: string }>>
  name: string
  pathOf: (name: string) => string
  change: (action: FormAction) => void
  /** What the button says. */
  words?: string
}

type Numbers = Extract<Cell, { kind: 'scalar' }>
const isNumber = (cell: { kind: string }): cell is Numbers => cell.kind === 'scalar'

/** At the first field that a table of the trade can fill: the way to that table, which fills them all. */
export function Picker({ cells, name, pathOf, change, words }: PickerProps) {
  const own = cells[name]!
  const table = isNumber(own) ? own.pick?.table : undefined
  const filled = Object.entries(cells).flatMap(([key, cell]) =>
    isNumber(cell) && cell.pick && cell.pick.table === table ? [{ key, cell, column: cell.pick.column }] : [],
  )
  if (table === undefined || filled[0]?.key !== name) return null
  return (
    <TablePicker
      table={table}
      words={words}
      columns={filled.map(({ column }) => column)}
      onChoose={(values) => {
        const texts = filled.flatMap(({ key, cell, column }) => {
          const value = values[column]
          return value === undefined ? [] : [{ path: pathOf(key), text: say(value, cell.quantity, cell.unit), cell }]
        })
        change({ do: 'fill', texts })
      }}
    />
  )
}
