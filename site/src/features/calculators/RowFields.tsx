import { useState } from 'react'
import type { Input } from '#calc/index.ts'
import { CellField } from './CellField.tsx'
import { columnsOfRow, pathOf } from './columns.ts'
import type { ManyProps } from './ListField.tsx'
import { Picker } from './Picker.tsx'

/** The fields of a group; those that may stay empty and do step back where they are more than one. */
export function RowFields({ rows, input, path, errors, idOf, change }: ManyProps<Extract<Input, { kind: 'group' }>>) {
  const [asked, setAsked] = useState(false)
  const row = rows[0]!
  const columns = columnsOfRow(input, row)
  const pathOfCell = (name: string) => pathOf(input, path, 0, name)
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
          <div key={name} className="row-field">
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
