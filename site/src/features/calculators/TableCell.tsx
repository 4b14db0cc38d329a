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
  /** Takes ± and the like; a run takes several numbers instead. */
  isLine: boolean
  onText: (text: string) => void
  onFocus: () => void
  onPaste: (event: ClipboardEvent) => void
  onKeyDown: (event: KeyboardEvent) => void
}

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
  return (
    <span className={isWrong ? 'cell cell-wrong' : 'cell'}>
      <input
        {...common}
        size={1}
        inputMode={cell.range[0] < 0 || isLine ? 'text' : 'decimal'}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => onText(event.target.value)}
      />
      {!cell.whole && !isLine && <PlusMinus fieldId={id} text={field.text} onText={onText} />}
      {unit !== '' && <span className={isOwn ? 'cell-unit cell-unit-own' : 'cell-unit'}>{unit}</span>}
    </span>
  )
}
