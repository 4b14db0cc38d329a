import { Button, Dialog } from '@radix-ui/themes'
import { useId, useState, type RefObject } from 'react'
import { Link } from 'react-router-dom'
import type { TableId } from '#calc/tables/table.ts'
import { tables } from '#calc/tables/tables.ts'
import { FindField } from '../../components/FindField.tsx'
import { showTable } from '../../lib/trade-tables.ts'
import { useUnits } from '../../lib/unit-preference.ts'
import './table-dialog.css'
import { offersOf, rowWords } from './table-offers.ts'

interface TableDialogProps {
  table: TableId
  columns: readonly string[]
  onChoose: (values: Readonly<Record<string, number>>) => void
  onShut: () => void
  /** What the focus goes back to. */
  backTo: RefObject<HTMLElement | null>
}

/** The rows of a table to choose from. */
export function TableDialog({ table: tableId, columns, onChoose, onShut, backTo }: TableDialogProps) {
  const id = useId()
  useUnits()
  const [find, setFind] = useState('')
  const table = tables[tableId]
  const { rows, sources } = showTable(table, find)
  const others = Object.keys(table.columns).filter((key) => !columns.includes(key))
  const choices = rows.flatMap(({ number, source }) => {
    const row = table.rows[number]!
    const offers = offersOf(table, row, columns)
    return offers.length > 0 ? [{ number, row, source: sources[source]!, offers }] : []
  })

  return (
    <Dialog.Root open onOpenChange={(isOpen) => !isOpen && onShut()}>
      <Dialog.Content className="table-dialog" maxWidth="44rem" onCloseAutoFocus={() => backTo.current?.focus()}>
        <div className="dialog-head">
          <Dialog.Title mb="0">{table.title}</Dialog.Title>
          <Dialog.Close>
            <Button type="button" size="3" variant="outline">
              Take none
            </Button>
          </Dialog.Close>
        </div>
        <Dialog.Description>{table.say}</Dialog.Description>
        <FindField id={`${id}-find`} label="Find" help="words and sizes" text={find} onText={setFind} />
        {choices.length === 0 && <p role="status">No row has all of “{find.trim()}”. Try fewer words.</p>}
        <ul className="table-choices">
          {choices.map(({ number, row, source, offers }) => (
            <li key={number}>
              <div>
                <p>{rowWords(table, row, others)}</p>
                {columns.length > 1 && <p className="quiet">{rowWords(table, row, columns)}</p>}
                {sources.length > 1 && <p className="choice-source">{source}</p>}
              </div>
              <div className="choice-offers">
                {offers.map(({ words, values }) => (
                  <Button
                    key={words}
                    type="button"
                    size="3"
                    variant="outline"
                    aria-label={`${words}, ${rowWords(table, row, others)}`}
                    onClick={() => onChoose(values)}
                  >
                    {words}
                  </Button>
                ))}
              </div>
            </li>
          ))}
        </ul>
        {sources.length === 1 && <p className="choice-source">Source: {sources[0]}</p>}
        <Link to={`/tables/${tableId}`} target="_blank" className="table-itself">
          The whole table, in a new tab
        </Link>
      </Dialog.Content>
    </Dialog.Root>
  )
}
