import { Link, useParams } from 'react-router-dom'
import { calculatorIndex } from 'virtual:calculator-index'
import type { Table, TableId } from '#calc/tables/table.ts'
import { tables } from '#calc/tables/tables.ts'
import { FindField } from '../components/FindField.tsx'
import { Page } from '../components/Page.tsx'
import { NotFound } from '../components/RouteError.tsx'
import { UnitChoice } from '../components/UnitChoice.tsx'
import { TakeTable } from '../features/tables/TakeTable.tsx'
import { TradeTable } from '../features/tables/TradeTable.tsx'
import { useFindInAddress, useFindText } from '../features/tables/use-find.ts'
import '../features/tables/table-list.css'
import { showTable } from '../lib/trade-tables.ts'
import { useUnits } from '../lib/unit-preference.ts'

const isTable = (id: string): id is TableId => Object.hasOwn(tables, id)

export function Component() {
  const { id = '' } = useParams()
  return isTable(id) ? <TablePage table={tables[id]} /> : <NotFound>There is no table here.</NotFound>
}

function TablePage({ table }: { table: Table }) {
  const { key, ...address } = useFindInAddress()
  const users = calculatorIndex.filter(({ tables: used }) => used.includes(table.id))
  return (
    <div className="page">
      <Page title={table.title} description={table.say} />
      <p className="kicker">
        <Link to="/tables">Tables</Link>
      </p>
      <h1>{table.title}</h1>
      <p className="lead">{table.say}</p>
      <Rows key={`${table.id} ${key}`} table={table} {...address} />
      {users.length > 0 && (
        <section className="no-print" aria-labelledby="used-by">
          <h2 id="used-by">Calculators that take figures from it</h2>
          <ul className="table-users">
            {users.map(({ id, title }) => (
              <li key={id}>
                <Link to={`/calculators/${id}`}>{title}</Link>
              </li>
            ))}
          </ul>
        </section>
      )}
    </div>
  )
}

function Rows({ table, ...address }: { table: Table; find: string; write: (text: string) => void }) {
  const [text, change] = useFindText(address)
  const units = useUnits()
  const shown = showTable(table, text)
  return (
    <>
      <FindField
        id="find"
        label="Find in this table"
        help="words and sizes; nothing written shows every row"
        text={text}
        onText={change}
      />
      <UnitChoice chosen={units} />
      {shown.rows.length > 0 ? (
        <>
          <TradeTable shown={shown} />
          <TakeTable shown={shown} />
        </>
      ) : (
        <p role="status">
          No row has all of “{text.trim()}”.{' '}
          <Link to={`/tables?${new URLSearchParams({ find: text.trim() })}`}>Look in all tables</Link>
        </p>
      )}
    </>
  )
}
