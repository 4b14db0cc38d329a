import { Button } from '@radix-ui/themes'
import { useRef, useState } from 'react'
import type { TableId } from '#calc/tables/table.ts'

interface TablePickerProps {
  table: TableId
  /** The columns whose figures are wanted. */
  columns: readonly string[]
  /** SI, by column; a column of which the row knows nothing is left away. */
  onChoose: (values: Readonly<Record<string, number>>) => void
  words?: string
}

type Dialog = typeof import('./TableDialog.tsx').TableDialog

/** A button that brings a table of the trade, and takes the figures of the row that is chosen there. Nothing of it is loaded before. */
export function TablePicker({ table, columns, onChoose, words = 'From a table' }: TablePickerProps) {
  const [phase, setPhase] = useState<'shut' | 'loading' | 'failed' | 'open'>('shut')
  const [Dialog, setDialog] = useState<Dialog>()
  const button = useRef<HTMLButtonElement>(null)

  const open = async () => {
    setPhase('loading')
    try {
      const { TableDialog } = await import('./TableDialog.tsx')
      setDialog(() => TableDialog)
      setPhase('open')
    } catch {
      setPhase('failed')
    }
  }

  return (
    <div className="table-picker no-print">
      <button ref={button} type="button" className="plain-button" aria-haspopup="dialog" onClick={() => void open()}>
        {words}
      </button>
      <span role="status">{phase === 'loading' && 'The table is on its way.'}</span>
      {phase === 'failed' && (
        <p className="field-error" role="alert">
          The table did not arrive. Check the signal, or write the figure by hand.{' '}
          <Button type="button" size="2" variant="outline" onClick={() => void open()}>
            Try again
          </Button>
        </p>
      )}
      {phase === 'open' && Dialog && (
        <Dialog
          table={table}
          columns={columns}
          onChoose={(values) => {
            onChoose(values)
            setPhase('shut')
          }}
          onShut={() => setPhase('shut')}
          backTo={button}
        />
      )}
    </div>
  )
}
