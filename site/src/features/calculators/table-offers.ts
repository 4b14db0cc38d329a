import type { Table } from '#calc/tables/table.ts'
import { parts, sayFigure } from '../../lib/trade-tables.ts'

/** What one press takes from a row: a figure of each column wanted. */
export interface Offer {
  words: string
  /** SI, by column. */
  values: Readonly<Record<string, number>>
}

type Row = Table['rows'][number]

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

/** The figures of a row that can be taken: one, or the ends of a range, or least, usual and most; none where the row knows nothing wanted. */
export const offersOf = (table: Table, row: Row, wanted: readonly string[]): readonly Offer[] => {
  const figures = wanted.flatMap((key) => {
    const cell = row[key]
    return cell === undefined || typeof cell === 'string' ? [] : [{ key, values: [cell].flat() }]
  })
  const count = Math.max(0, ...figures.map(({ values }) => values.length))
  return Array.from({ length: count }, (_, place): Offer => {
    // A single figure beside a range goes with each end of it.
    const values = Object.fromEntries(
      figures.map(({ key, values }) => [key, values[Math.min(place, values.length - 1)]!]),
    )
    const part = count === 1 ? undefined : count === 2 ? parts[2 * place] : parts[place]
    const [only, ...others] = figures.map(({ key }) => sayFigure(values[key]!, table.columns[key]!))
    return {
      words: others.length > 0 ? `Use ${part ? `the ${part}` : 'these'}` : `${part ? capital(part) : 'Use'} ${only}`,
      values,
    }
  })
}

/** What a row is of, and its figures: "dn 110, SDR 11". */
export const rowWords = (table: Table, row: Row, keys: readonly string[]): string =>
  keys
    .flatMap((key) => {
      const [cell, column] = [row[key], table.columns[key]!]
      if (cell === undefined || cell === '') return []
      if (typeof cell === 'string') return [cell]
      return [
        `${column.label} ${[cell]
          .flat()
          .map((value) => sayFigure(value, column))
          .join(' to ')}`,
      ]
    })
    .join(', ')
