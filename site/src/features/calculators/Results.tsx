import type { CSSProperties } from 'react'
import type { CalculatorDefinition, Caution as CautionOf, Output, Outputs, PlainRow, PlainValue } from '#calc/index.ts'
import { MathSymbol } from '../../components/Formula.tsx'
import '../../components/table-box.css'
import { CautionList } from './CautionList.tsx'
import { saidOutput, shownOutput, type CellOutput } from './results.ts'

interface ResultsProps {
  definition: CalculatorDefinition
  outputs: Outputs
  /** Which outputs, in this order. */
  keys: readonly string[]
  cautions: ReadonlyMap<string, readonly CautionOf[]>
}

function Figure({ output, value }: { output: CellOutput; value: PlainValue }) {
  const { text, unit } = shownOutput(output, value)
  return (
    <div className={output.kind === 'text' ? 'result result-text' : 'result'}>
      <dt>
        {output.label}
        {output.symbol && (
          <span aria-hidden="true">
            {' '}
            <MathSymbol tex={output.symbol} />
          </span>
        )}
      </dt>
      <dd>
        {text}
        {unit && <small> {unit}</small>}
      </dd>
    </div>
  )
}

type RowsOutput = Extract<Output, { kind: 'rows' }>

/** Columns of words alone read better down the page than across it. */
function Findings({ output, rows }: { output: RowsOutput; rows: readonly PlainRow[] }) {
  const [first, ...others] = Object.entries(output.columns) as [string, CellOutput][]
  return (
    <ul className="findings">
      {rows.map((row, i) => (
        <li key={i}>
          <strong>{saidOutput(first![1], row[first![0]]!)}</strong>
          {others.map(([name, column]) =>
            row[name] === undefined ? null : (
              <p key={name}>
                <span className="field-help">{column.label}: </span>
                {saidOutput(column, row[name])}
              </p>
            ),
          )}
        </li>
      ))}
    </ul>
  )
}

function RowsTable({ output, rows }: { output: RowsOutput; rows: readonly PlainRow[] }) {
  const columns = (Object.entries(output.columns) as [string, CellOutput][]).filter(([name]) =>
    rows.some((row) => row[name] !== undefined),
  )
  return (
    <div className="table-box" role="group" aria-label={output.label} tabIndex={0}>
      <table>
        <thead>
          <tr>
            {columns.map(([name, column]) => (
              <th key={name} scope="col">
                {column.label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, i) => (
            <tr key={i}>
              {columns.map(([name, column]) => (
                <td key={name}>{row[name] === undefined ? '–' : saidOutput(column, row[name])}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

/** A longer list stays shut until it is asked for. */
const longList = 12

function RowsResult({ output, rows }: { output: RowsOutput; rows: readonly PlainRow[] }) {
  if (rows.length === 0) return null
  const areWords = Object.values(output.columns).every(({ kind }) => kind === 'text')
  const list = areWords ? <Findings output={output} rows={rows} /> : <RowsTable output={output} rows={rows} />
  if (rows.length > longList)
    return (
      <details className="rows-result">
        <summary>
          {output.label} ({rows.length} rows)
        </summary>
        {list}
      </details>
    )
  return (
    <div className="rows-result">
      <p className="rows-label">{output.label}</p>
      {list}
    </div>
  )
}

/** Three or four side by side, whichever leaves fewer places empty. */
const columnsFor = (count: number) => (count < 4 ? count : (4 - (count % 4)) % 4 < (3 - (count % 3)) % 3 ? 4 : 3)

/** The figures, and the cautions about them. */
export function Figures({ definition, outputs, keys, cautions }: ResultsProps) {
  const shown = keys.flatMap((key) => {
    const output = definition.outputs[key]!
    const value = outputs[key]
    return output.kind === 'rows' || value === undefined || typeof value === 'object' ? [] : [{ key, output, value }]
  })
  return (
    <>
      <dl className="results" style={{ '--columns': columnsFor(shown.length) } as CSSProperties}>
        {shown.map(({ key, output, value }) => (
          <Figure key={key} output={output} value={value} />
        ))}
      </dl>
      {[...keys.map((key) => `result ${key}`), ''].map((place) => (
        <CautionList key={place} cautions={cautions.get(place)} />
      ))}
    </>
  )
}

/** What is found as a list. */
export function Lists({ definition, outputs, keys }: Omit<ResultsProps, 'cautions'>) {
  return keys.map((key) => {
    const output = definition.outputs[key]!
    const rows = outputs[key]
    return output.kind === 'rows' && typeof rows === 'object' ? (
      <RowsResult key={key} output={output} rows={rows} />
    ) : null
  })
}
