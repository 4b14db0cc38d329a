import { Button } from '@radix-ui/themes'
import { CopyNote } from '../../components/CopyNote.tsx'
import { useCopy } from '../../components/use-copy.ts'
import { saveCsv } from '../../lib/save-csv.ts'
import { asCells, asText, type Report } from './report.ts'

/** The calculation to take along: as text, as a spreadsheet, on paper. */
export function TakeAway({ report }: { report: () => Report }) {
  const { copied, copy } = useCopy()
  return (
    <div className="calculator-actions no-print">
      <Button type="button" size="3" variant="outline" onClick={() => void copy(asText(report()))}>
        Copy as text
      </Button>
      <Button
        type="button"
        size="3"
        variant="outline"
        onClick={() => {
          const taken = report()
          void saveCsv(`${taken.definition.id}.csv`, asCells(taken))
        }}
      >
        Save as CSV
      </Button>
      <Button type="button" size="3" variant="outline" onClick={() => window.print()}>
        Print
      </Button>
      <CopyNote
        copied={copied}
        done="The calculation is copied as text."
        byHand="Copy this text:"
        label="The calculation as text"
        lines={8}
      />
    </div>
  )
}
