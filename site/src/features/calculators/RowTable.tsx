import { useState, type ClipboardEvent, type KeyboardEvent, type ReactNode } from 'react'
import type { Cell } from '#calc/index.ts'
import { MathSymbol } from '../../components/Formula.tsx'
import { unitWords } from '../../components/QuantityField.tsx'
import { choiceOptions, helpOf } from './CellField.tsx'
import { capital, columnsOf, pathOf, rowWord, type ListInput } from './columns.ts'
import { unitOf, unitsOf } from './field-text.ts'
import type { RowTexts } from './form.ts'
import type { ManyProps } from './ListField.tsx'
import { Picker } from './Picker.tsx'

interface RowTableProps extends ManyProps<ListInput> {
  rows: readonly RowTexts[]
  mayLose: boolean
  onRemove: (number: number) => void
  onPaste: (event: ClipboardEvent, row: number, column: string) => void
  onMove: (event: KeyboardEvent, row: number, column: string) => void
}

/** A list as a table: a unit for each column, a row for each item; below each other where there is no room beside. */
export function RowTable({
  path,
  input,
  rows,
  errors,
  idOf,
  change,
  mayLose,
  onRemove,
  onPaste,
  onMove,
}: RowTableProps) {
  const [asked, setAsked] = useState(false)
  const columns = Object.entries(columnsOf(input))
  const word = rowWord(input)
  const isUsed = (name: string) =>
    rows.some((row, i) => row[name]!.text !== '' || errors[pathOf(input, path, i, name)] !== undefined)
  const spare = columns.filter(([name, { optional }]) => optional && !isUsed(name))
  const shown = asked ? columns : columns.filter((column) => !spare.includes(column))
  const first = rows[0]
  /** The row that was last in hand: a figure from a table goes there. */
  const [inHand, setInHand] = useState(0)
  const target = Math.min(inHand, rows.length - 1)

  return (
    <>
      <table className={columns.length > 1 ? 'row-table' : 'row-table row-table-one'}>
        <thead>
          <tr>
            <th scope="col">
              <span className="out-of-sight">{capital(word)}</span>
            </th>
            {shown.map(([name, cell]) => (
              <th key={name} scope="col">
                {cell.label}{' '}
                {cell.symbol && (
                  <span className="field-symbol" aria-hidden="true">
                    <MathSymbol tex={cell.symbol} />
                  </span>
                )}
                {cell.kind === 'scalar' && first && <ColumnUnit {...{ cell, first, name, path, change }} />}
              </th>
            ))}
            {mayLose && (
              <th scope="col">
                <span className="out-of-sight">Take out</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, i) => {
            const wrong = shown.flatMap(([name]) => {
              const at = pathOf(input, path, i, name)
              return errors[at] === undefined ? [] : [{ at, message: errors[at] }]
            })
            return (
              <RowOf key={i} wrong={wrong} idOf={idOf} width={shown.length + 2}>
                <th scope="row">
                  <span className="row-word">{capital(word)} </span>
                  {i + 1}
                </th>
                {shown.map(([name, cell]) => {
                  const at = pathOf(input, path, i, name)
                  const field = row[name]!
                  const common = {
                    id: idOf(at),
                    'aria-invalid': errors[at] ? true : undefined,
                    'aria-describedby': errors[at] ? `${idOf(at)}-error` : undefined,
                    onFocus: () => setInHand(i),
                    onPaste: (event: ClipboardEvent) => onPaste(event, i, name),
                    onKeyDown: (event: KeyboardEvent) => onMove(event, i, name),
                  } as const
                  const isOwn = cell.kind === 'scalar' && first && unitOf(cell, field) !== unitOf(cell, first[name]!)
                  return (
                    <td key={name} className={errors[at] ? 'quantity-wrong' : undefined}>
                      <label htmlFor={idOf(at)}>
                        {name === '' ? `${capital(word)} ${i + 1}` : cell.label}
                        <span className="out-of-sight">{name === '' ? '' : `, ${word} ${i + 1}`}</span>
                      </label>
                      <span className="cell">
                        {cell.kind === 'choice' ? (
                          <select
                            {...common}
                            value={field.text}
                            onChange={(event) => change({ do: 'write', path: at, text: event.target.value })}
                          >
                            {choiceOptions(cell).map(({ value, words }) => (
                              <option key={value} value={value}>
                                {words}
                              </option>
                            ))}
                          </select>
                        ) : (
                          <input
                            {...common}
                            value={field.text}
                            size={1}
                            inputMode={cell.range[0] < 0 || input.kind === 'runs' ? 'text' : 'decimal'}
                            autoComplete="off"
                            spellCheck={false}
                            onChange={(event) => change({ do: 'write', path: at, text: event.target.value })}
                          />
                        )}
                        {cell.kind === 'scalar' && unitOf(cell, field) !== '' && (
                          <span className={isOwn ? 'cell-unit cell-unit-own' : 'cell-unit'}>{unitOf(cell, field)}</span>
                        )}
                      </span>
                    </td>
                  )
                })}
                {mayLose && (
                  <td className="no-print">
                    <button
                      type="button"
                      className="plain-button take-out"
                      aria-label={`Take out ${word} ${i + 1}`}
                      onClick={() => onRemove(i)}
                    >
                      Take out
                    </button>
                  </td>
                )}
              </RowOf>
            )
          })}
        </tbody>
      </table>
      {input.kind === 'rows' &&
        target >= 0 &&
        shown.map(([name]) => (
          <Picker
            key={name}
            cells={input.columns}
            name={name}
            pathOf={(other) => pathOf(input, path, target, other)}
            change={change}
            words={`${input.columns[name]!.label} from a table, for ${word} ${target + 1}`}
          />
        ))}
      <ColumnHelp cells={shown.map(([, cell]) => cell)} />
      {(asked || spare.length > 0) && (
        <button type="button" className="plain-button no-print" aria-expanded={asked} onClick={() => setAsked(!asked)}>
          {asked ? 'Only what is needed' : `More columns (${spare.length})`}
        </button>
      )}
    </>
  )
}

interface ColumnUnitProps extends Pick<RowTableProps, 'path' | 'change'> {
  cell: Extract<Cell, { kind: 'scalar' }>
  first: RowTexts
  name: string
}

/** The unit of a whole column; a cell may still be written in its own. */
function ColumnUnit({ cell, first, name, path, change }: ColumnUnitProps) {
  const units = unitsOf(cell, first[name]!)
  const unit = unitOf(cell, first[name]!)
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

interface RowOfProps {
  wrong: readonly { at: string; message: string }[]
  idOf: (path: string) => string
  width: number
  children: ReactNode
}

/** A row, and below it what to write instead. */
function RowOf({ wrong, idOf, width, children }: RowOfProps) {
  return (
    <>
      <tr>{children}</tr>
      {wrong.length > 0 && (
        <tr className="row-errors">
          <td colSpan={width}>
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
}
