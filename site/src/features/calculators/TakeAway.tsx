import { Button } from '@radix-ui/themes'
import { useState } from 'react'
import { saveCsv } from '../../lib/save-csv.ts'
import { asCells, asText, type Report } from './report.ts'

/** The calculation to take along: as text, as a spreadsheet, on paper. */
export function TakeAway({ report }: { report: () => Report }) {
  const [copied, setCopied] = useState<{ text: string; byHand: boolean }>()
  const copy = async () => {
    const text = asText(report())
    try {
      await navigator.clipboard.writeText(text)
      setCopied({ text, byHand: false })
    } catch {
      setCopied({ text, byHand: true })
    }
  }
  return (
    <div className="calculator-actions no-print">
      <Button type="button" size="3" variant="outline" onClick={() => void copy()}>
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
      <p className="copy-note" role="status">
        {copied && (copied.byHand ? 'Copy this text:' : 'The calculation is copied as text.')}
      </p>
      {copied?.byHand && (
        <textarea
          className="copy-by-hand"
          aria-label="The calculation as text"
          readOnly
          rows={8}
          value={copied.text}
          onFocus={(event) => event.target.select()}
        />
      )}
    </div>
  )
}
