import type { ReactNode } from 'react'
import type { Cell } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'
import { ChoiceField, QuantityField } from '../../components/QuantityField.tsx'
import { capital } from './columns.ts'
import { unitOf, unitsOf, type FieldText } from './field-text.ts'
import type { FormAction } from './form.ts'

export interface CellFieldProps {
  idOf: (path: string) => string
  path: string
  cell: Cell
  field: FieldText
  error: string | undefined
  change: (action: FormAction) => void
  after?: ReactNode
}

export const choiceWords = (cell: Extract<Cell, { kind: 'choice' }>, value: string) =>
  capital(cell.words?.[value] ?? value.replaceAll('-', ' '))

export const choiceOptions = (cell: Extract<Cell, { kind: 'choice' }>) => [
  ...(cell.optional && cell.fallback === undefined ? [{ value: '', words: '–' }] : []),
  ...cell.of.map((value) => ({ value, words: choiceWords(cell, value) })),
]

/** What a field left empty counts as. */
const emptyWords = (cell: Cell): string | undefined => {
  if (!cell.optional && cell.fallback === undefined) return undefined
  if (cell.fallback === undefined) return 'may stay empty'
  return cell.kind === 'choice' ? undefined : `empty counts as ${say(cell.fallback, cell.quantity, cell.unit)}`
}

export const helpOf = (cell: Cell): string | undefined =>
  [cell.help, emptyWords(cell)].filter(Boolean).join('; ') || undefined

/** The field of one number or choice. */
export function CellField({ idOf, path, cell, field, error, change, after }: CellFieldProps) {
  const frame = { id: idOf(path), label: cell.label, symbol: cell.symbol, help: helpOf(cell), error, after }
  if (cell.kind === 'choice')
    return (
      <ChoiceField
        {...frame}
        value={field.text}
        options={choiceOptions(cell)}
        onChoose={(text) => change({ do: 'write', path, text })}
      />
    )
  return (
    <QuantityField
      {...frame}
      text={field.text}
      unit={unitOf(cell, field)}
      units={unitsOf(cell, field)}
      negative={cell.range[0] < 0}
      uncertain={!cell.whole}
      onText={(text) => change({ do: 'write', path, text })}
      onUnit={(unit) => change({ do: 'change-unit', path, cell, unit })}
    />
  )
}
