import { Button } from '@radix-ui/themes'
import { CopyNote } from '../../components/CopyNote.tsx'
import { useCopy } from '../../components/use-copy.ts'
import { csvOf, saveCsv } from '../../lib/save-csv.ts'
import { asCells, type ShownTable } from '../../lib/trade-tables.ts'

/** The rows shown, to take along: copied, as a file, on paper. */
export function TakeTable({ shown }: { shown: ShownTable }) {
  const { copied, copy } = useCopy()
  return (
    <div className="actions no-print">
      <Button type="button" size="3" variant="outline" onClick={() => void csvOf(asCells(shown)).then(copy)}>
        Copy as CSV
      </Button>
      <Button
        type="button"
        size="3"
        variant="outline"
        onClick={() => void saveCsv(`${shown.table.id}.csv`, asCells(shown))}
      >
        Save as CSV
      </Button>
      <Button type="button" size="3" variant="outline" onClick={() => window.print()}>
        Print
      </Button>
      <CopyNote
        copied={copied}
        done="The rows shown are copied as CSV, each with its source."
        byHand="Copy this text:"
        label="The rows as CSV"
        lines={8}
      />
    </div>
  )
}
