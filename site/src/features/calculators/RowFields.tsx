import { useState, type ClipboardEvent } from 'react'
import { CellField } from './CellField.tsx'
import { columnsOfRow, pathOf } from './columns.ts'
import type { RowTexts } from './form.ts'
import type { ManyProps } from './ListField.tsx'
import { Picker } from './Picker.tsx'

interface RowFieldsProps extends ManyProps {
  row: RowTexts
  number: number
  onPaste?: (event: ClipboardEvent, row: number, column: string) => void
}

/** One row's fields; those that may stay empty and do step back where they are more than one. */
export function RowFields({ input, path, row, number, errors, idOf, change, onPaste }: RowFieldsProps) {
  const [asked, setAsked] = useState(false)
  const columns = columnsOfRow(input, row)
  const pathOfCell = (name: string) => pathOf(input, path, number, name)
  const names = Object.keys(columns)
  const isWanted = (name: string) =>
    !columns[name]!.optional || row[name]!.text !== '' || errors[pathOfCell(name)] !== undefined
  const spare = names.filter((name) => !isWanted(name))
  const stepsBack = asked || spare.length > 1
  return (
    <div className="row-fields">
      {names
        .filter((name) => asked || !stepsBack || isWanted(name))
        .map((name) => (
          <div key={name} onPaste={onPaste && ((event) => onPaste(event, number, name))} className="row-field">
            <CellField
              idOf={idOf}
              path={pathOfCell(name)}
              cell={columns[name]!}
              field={row[name]!}
              error={errors[pathOfCell(name)]}
              change={change}
              after={<Picker cells={columns} name={name} pathOf={pathOfCell} change={change} />}
            />
          </div>
        ))}
      {stepsBack && (
        <button type="button" className="plain-button no-print" aria-expanded={asked} onClick={() => setAsked(!asked)}>
          {asked ? 'Only what is needed' : `More to say (${spare.length})`}
        </button>
      )}
    </div>
  )
}
