import type { ClipboardEvent, KeyboardEvent } from 'react'
import type { Cell } from '#calc/index.ts'
import { PlusMinus } from '../../components/PlusMinus.tsx'
import { choiceOptions } from './CellField.tsx'
import type { FieldText } from './field-text.ts'

interface TableCellProps {
  id: string
  cell: Cell
  field: FieldText
  isWrong: boolean
  /** The cell's own unit; `isOwn` where it differs from that of its column. */
  unit: string
  isOwn: boolean
  /** Takes a line of numbers, as long as it may be. */
  isLine: boolean
  onText: (text: string) => void
  onFocus: () => void
  onPaste: (event: ClipboardEvent) => void
  onKeyDown: (event: KeyboardEvent) => void
}

/** About as many characters as stand beside each other in a list of runs, where the browser does not make a field as high as its text. */
const lineLength = 26

/** One cell of a list: a number as it is written, or a choice. */
export function TableCell({ id, cell, field, isWrong, unit, isOwn, isLine, onText, ...handlers }: TableCellProps) {
  const common = {
    id,
    value: field.text,
    'aria-invalid': isWrong ? true : undefined,
    'aria-describedby': isWrong ? `${id}-error` : undefined,
    ...handlers,
  } as const
  if (cell.kind === 'choice' && cell.free)
    return (
      <span className={isWrong ? 'cell cell-wrong' : 'cell'}>
        <input {...common} size={1} autoComplete="off" onChange={(event) => onText(event.target.value)} />
      </span>
    )
  if (cell.kind === 'choice')
    return (
      <span className={isWrong ? 'cell cell-wrong' : 'cell'}>
        <select {...common} onChange={(event) => onText(event.target.value)}>
          {choiceOptions(cell).map(({ value, words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      </span>
    )
  if (isLine)
    return (
      <span className={isWrong ? 'cell cell-wrong' : 'cell'}>
        <textarea
          {...common}
          rows={Math.ceil(field.text.length / lineLength) || 1}
          autoComplete="off"
          spellCheck={false}
          onChange={(event) => onText(event.target.value)}
        />
      </span>
    )
  return (
    <span className={isWrong ? 'cell cell-wrong' : 'cell'}>
      <input
        {...common}
        size={1}
        inputMode={cell.range[0] < 0 ? 'text' : 'decimal'}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => onText(event.target.value)}
      />
      {!cell.whole && <PlusMinus fieldId={id} text={field.text} onText={onText} />}
      {unit !== '' && <span className={isOwn ? 'cell-unit cell-unit-own' : 'cell-unit'}>{unit}</span>}
    </span>
  )
}
