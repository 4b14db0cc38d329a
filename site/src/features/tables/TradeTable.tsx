import { cellWords, columnWords, type ShownTable } from '../../lib/trade-tables.ts'
import '../../components/table-box.css'
import './trade-table.css'

const rowWords = (count: number) => (count === 1 ? '1 row' : `${count} rows`)

const countWords = ({ table, rows }: ShownTable) =>
  rows.length === table.rows.length ? rowWords(rows.length) : `${rows.length} of ${rowWords(table.rows.length)}`

/** The rows, and below them the sources that they name by number; one source for all rows needs no numbers. */
export function TradeTable({ shown }: { shown: ShownTable }) {
  const { table, columns, rows, sources } = shown
  const isNumbered = sources.length > 1
  const classOf = (place: number) => (columns[place]!.isNumber ? 'figure' : undefined)
  return (
    <div className="trade-table">
      <div className="table-box" role="group" aria-label={table.title} tabIndex={0}>
        <table>
          <caption>
            <span className="out-of-sight">{table.title}: </span>
            {countWords(shown)}
          </caption>
          <thead>
            <tr>
              {columns.map((column, i) => (
                <th key={column.id} scope="col" className={classOf(i)}>
                  {columnWords(column)}
                </th>
              ))}
              {isNumbered && <th scope="col">Source</th>}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ number, cells: [first, ...others], source }) => (
              <tr key={number}>
                <th scope="row" className={classOf(0)}>
                  {cellWords(first!)}
                </th>
                {others.map((cell, i) => (
                  <td key={columns[i + 1]!.id} className={classOf(i + 1)}>
                    {cellWords(cell)}
                  </td>
                ))}
                {isNumbered && <td className="source-number">{source + 1}</td>}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {isNumbered ? (
        <ol className="table-sources" aria-label={`Sources of ${table.title}`}>
          {sources.map((source) => (
            <li key={source}>{source}</li>
          ))}
        </ol>
      ) : (
        <p className="table-sources">Source: {sources[0]}</p>
      )}
    </div>
  )
}
