import { memo, type ClipboardEvent, type KeyboardEvent } from 'react'
import type { Cell } from '#calc/index.ts'
import { MathSymbol } from '../../components/Formula.tsx'
import { capital, columnsOf, columnsOfRow, pathOf, rowWord, type ListInput } from './columns.ts'
import { unitOf, type FieldText } from './field-text.ts'
import type { FormAction, RowTexts } from './form.ts'
import { unitOfLine } from './line-text.ts'
import { TableCell } from './TableCell.tsx'

export function CellSymbol({ cell }: { cell: Cell }) {
  return cell.symbol === undefined ? null : (
    <span className="field-symbol" aria-hidden="true">
      <MathSymbol tex={cell.symbol} />
    </span>
  )
}

export const unitIn = (input: ListInput, cell: Cell, field: FieldText): string => {
  if (cell.kind === 'choice') return ''
  return input.kind === 'runs' ? unitOfLine(cell, field) : unitOf(cell, field)
}

interface TableRowProps {
  path: string
  input: ListInput
  row: RowTexts
  number: number
  /** Columns that are not shown, apart by bars. */
  hidden: string
  /** The unit of each column, apart by bars. */
  units: string
  errors: Readonly<Record<string, string>>
  idOf: (path: string) => string
  change: (action: FormAction) => void
  mayLose: boolean
  onRemove: (number: number) => void
  onPaste: (event: ClipboardEvent, row: number, column: string) => void
  onMove: (event: KeyboardEvent, row: number, column: string) => void
  onFocus: (number: number) => void
}

/** One row, and below it what to write instead. Drawn anew only when it is written in: a profile may have hundreds. */
export const TableRow = memo(function TableRow(props: TableRowProps) {
  const { path, input, row, number, hidden, units, errors, idOf, change, mayLose, onRemove, onPaste, onMove } = props
  const word = rowWord(input)
  const isLine = input.kind === 'runs'
  const columns = Object.entries(columnsOf(input))
  const columnUnits = units.split('|')
  const hiddenNames = hidden === '' ? [] : hidden.split('|')
  const shown = columns.filter(([name, { when }]) => when === undefined && !hiddenNames.includes(name))
  const hasDetails = columns.some(([, { when }]) => when !== undefined)
  const details = Object.entries(columnsOfRow(input, row)).filter(([, { when }]) => when !== undefined)
  const at = (name: string) => pathOf(input, path, number, name)
  const wrong = [...shown, ...details].flatMap(([name, { label }]) => {
    const message = errors[at(name)]
    if (message === undefined) return []
    return [{ at: at(name), message: name === '' || message.startsWith(label) ? message : `${label}: ${message}` }]
  })

  const cellOf = ([name, cell]: [string, Cell]) => {
    const field = row[name]!
    const unit = unitIn(input, cell, field)
    const isDetail = cell.when !== undefined
    return (
      <TableCell
        id={idOf(at(name))}
        cell={cell}
        field={field}
        isWrong={errors[at(name)] !== undefined}
        unit={unit}
        isOwn={isDetail || unit !== columnUnits[columns.findIndex(([other]) => other === name)]}
        isLine={isLine}
        onText={(text) => change({ do: 'write', path: at(name), text })}
        onFocus={() => props.onFocus(number)}
        onPaste={(event) => onPaste(event, number, name)}
        onKeyDown={(event) => onMove(event, number, name)}
      />
    )
  }
  const ofRow = <span className="out-of-sight">, {`${word} ${number + 1}`}</span>

  return (
    <>
      <tr>
        <th scope="row">
          <span className="row-word">{capital(word)} </span>
          {number + 1}
        </th>
        {shown.map((column) => (
          <td key={column[0]}>
            <label htmlFor={idOf(at(column[0]))}>
              {column[0] === '' ? `${capital(word)} ${number + 1}` : column[1].label}
              {column[0] !== '' && ofRow}
            </label>
            {cellOf(column)}
          </td>
        ))}
        {hasDetails && (
          <td className="details">
            <div>
              {details.map((column) => (
                <span key={column[0]} className="detail">
                  <label htmlFor={idOf(at(column[0]))}>
                    {column[1].label}
                    {ofRow} <CellSymbol cell={column[1]} />
                  </label>
                  {cellOf(column)}
                </span>
              ))}
            </div>
          </td>
        )}
        {mayLose && (
          <td className="no-print">
            <button
              type="button"
              className="plain-button take-out"
              aria-label={`Take out ${word} ${number + 1}`}
              onClick={() => onRemove(number)}
            >
              <span className="take-out-sign">×</span>
              <span className="take-out-words">Take out</span>
            </button>
          </td>
        )}
      </tr>
      {wrong.length > 0 && (
        <tr className="row-errors">
          <td colSpan={shown.length + 3}>
            {wrong.map(({ at, message }) => (
              <p className="field-error" id={`${idOf(at)}-error`} key={at}>
                {message}
              </p>
            ))}
          </td>
        </tr>
      )}
    </>
  )
})
