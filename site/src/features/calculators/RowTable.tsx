import { useState, type ClipboardEvent, type KeyboardEvent } from 'react'
import type { Cell } from '#calc/index.ts'
import { unitWords } from '../../components/QuantityField.tsx'
import { helpOf } from './CellField.tsx'
import { capital, columnsOf, pathOf, rowWord, type ListInput, type ScalarCell } from './columns.ts'
import { errorsUnder } from './errors-under.ts'
import { readField, unitsOf, type FieldText } from './field-text.ts'
import type { ManyProps } from './ListField.tsx'
import { Picker } from './Picker.tsx'
import { CellSymbol, TableRow, unitIn } from './TableRow.tsx'

interface RowTableProps extends ManyProps<ListInput> {
  mayLose: boolean
  onRemove: (number: number) => void
  onPaste: (event: ClipboardEvent, row: number, column: string) => void
  onMove: (event: KeyboardEvent, row: number, column: string) => void
}

/** A cell that says something: not empty, nor what empty counts as. */
const says = (cell: Cell, field: FieldText): boolean => {
  if (field.text.trim() === '') return false
  if (cell.kind === 'choice') return field.text !== cell.fallback
  const reading = readField(cell, field)
  return !reading.ok || reading.value !== cell.fallback
}

/**
 * A list as a table: a unit for each column, a row for each item; below each other where there is no room beside. Cells that come and go with
 * the kind of row share one column.
 */
export function RowTable(props: RowTableProps) {
  const { path, input, rows, errors, idOf, change, mayLose, onRemove, onPaste, onMove } = props
  const [asked, setAsked] = useState(false)
  const columns = Object.entries(columnsOf(input))
  const word = rowWord(input)
  const isUsed = ([name, cell]: [string, Cell]) =>
    !cell.optional ||
    rows.some((row, i) => says(cell, row[name]!) || errors[pathOf(input, path, i, name)] !== undefined)
  // What was there once stays, so that no field goes away while it is written in.
  const [seen, setSeen] = useState<readonly string[]>([])
  const used = columns.filter(isUsed).map(([name]) => name)
  if (used.some((name) => !seen.includes(name))) setSeen([...new Set([...seen, ...used])])
  const always = columns.filter(([, { when }]) => when === undefined)
  const spare = always.filter(([name]) => !seen.includes(name) && !used.includes(name))
  const shown = asked ? always : always.filter((column) => !spare.includes(column))
  const details = columns.filter(([, { when }]) => when !== undefined)
  const first = rows[0]
  /** The row that was last in hand: a figure from a table goes there. */
  const [inHand, setInHand] = useState(0)
  const target = Math.min(inHand, rows.length - 1)
  const hidden = (asked ? [] : spare).map(([name]) => name).join('|')
  const units = columns.map(([name, cell]) => (first ? unitIn(input, cell, first[name]!) : '')).join('|')

  if (!first) return null
  return (
    <>
      <table className={columns.length > 2 ? 'row-table' : 'row-table row-table-slim'}>
        <thead>
          <tr>
            <th scope="col">
              <span className="out-of-sight">{capital(word)}</span>
            </th>
            {shown.map(([name, cell]) => (
              <th key={name} scope="col">
                {cell.label} <CellSymbol cell={cell} />
                {cell.kind === 'scalar' && (
                  <ColumnUnit {...{ cell, name, path, change }} unit={unitIn(input, cell, first[name]!)} />
                )}
              </th>
            ))}
            {details.length > 0 && <th scope="col">Details</th>}
            {mayLose && (
              <th scope="col" className="no-print">
                <span className="out-of-sight">Take out</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, i) => (
            <TableRow
              key={i}
              {...{ path, input, row, hidden, units, idOf, change, mayLose, onRemove, onPaste, onMove }}
              number={i}
              errors={errorsUnder(errors, `${path}.${i}`)}
              onFocus={setInHand}
            />
          ))}
        </tbody>
      </table>
      {input.kind === 'rows' && (
        <div className="row-pickers">
          {shown.map(([name]) => (
            <Picker
              key={name}
              cells={input.columns}
              name={name}
              pathOf={(other) => pathOf(input, path, target, other)}
              change={change}
              words={`${input.columns[name]!.label} from a table, for ${word} ${target + 1}`}
            />
          ))}
        </div>
      )}
      <ColumnHelp cells={[...shown, ...details].map(([, cell]) => cell)} />
      {(asked || spare.length > 0) && (
        <button type="button" className="plain-button no-print" aria-expanded={asked} onClick={() => setAsked(!asked)}>
          {asked ? 'Only what is needed' : `More columns (${spare.length})`}
        </button>
      )}
    </>
  )
}

interface ColumnUnitProps extends Pick<RowTableProps, 'path' | 'change'> {
  cell: ScalarCell
  name: string
  unit: string
}

/** The unit of a whole column; a cell may still be written in its own. */
function ColumnUnit({ cell, name, path, change, unit }: ColumnUnitProps) {
  const units = unitsOf(cell, { text: '', unit })
  if (units.length === 1) return units[0] === '' ? null : <span className="column-unit">{units[0]}</span>
  return (
    <select
      className="column-unit"
      value={unit}
      aria-label={`Unit of ${cell.label.toLowerCase()}`}
      onChange={(event) => change({ do: 'change-column-unit', key: path, name, cell, unit: event.target.value })}
    >
      {units.map((one) => (
        <option key={one} value={one}>
          {unitWords(one)}
        </option>
      ))}
    </select>
  )
}

/** What the columns mean, once below them all. */
function ColumnHelp({ cells }: { cells: readonly Cell[] }) {
  const helped = cells.flatMap((cell) => {
    const help = helpOf(cell)
    return help === undefined ? [] : [`${cell.label}: ${help}.`]
  })
  return helped.length === 0 ? null : <p className="field-help column-help">{helped.join(' ')}</p>
}
