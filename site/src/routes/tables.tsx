import { Link } from 'react-router-dom'
import { tables } from '#calc/tables/tables.ts'
import { FindField } from '../components/FindField.tsx'
import { Page } from '../components/Page.tsx'
import { UnitChoice } from '../components/UnitChoice.tsx'
import { TradeTable } from '../features/tables/TradeTable.tsx'
import { useFindInAddress, useFindText } from '../features/tables/use-find.ts'
import '../features/tables/table-list.css'
import { showTable } from '../lib/trade-tables.ts'
import { useUnits } from '../lib/unit-preference.ts'

const all = Object.values(tables)

export function Component() {
  const { key, ...address } = useFindInAddress()
  return (
    <div className="page">
      <Page
        title="Tables"
        description="Figures of the trade for small hydro: pipe, roughness, fittings, channels, cable, gauges and water, each with its source."
      />
      <h1>Tables</h1>
      <p className="lead">
        Figures that others published, each with its source. They are where a size starts; what the maker of your pipe,
        valve, gauge or cable says goes before them.
      </p>
      <Rows key={key} {...address} />
    </div>
  )
}

function Rows(address: { find: string; write: (text: string) => void }) {
  const [text, change] = useFindText(address)
  const units = useUnits()
  const found = text.trim() === '' ? undefined : all.map((table) => showTable(table, text))
  return (
    <>
      <FindField
        id="find"
        label="Find in all tables"
        help="words and sizes, such as: PE pipe 110, concrete, copper 16"
        text={text}
        onText={change}
      />
      {found ? (
        <>
          <UnitChoice chosen={units} />
          <Found found={found.filter(({ rows }) => rows.length > 0)} find={text} />
        </>
      ) : (
        <AllTables />
      )}
    </>
  )
}

function AllTables() {
  return (
    <ul className="table-list">
      {all.map(({ id, title, say, rows }) => (
        <li key={id}>
          <Link to={`/tables/${id}`}>{title}</Link> <span className="quiet">{rows.length} rows</span>
          <p>{say.slice(0, say.indexOf('. ') + 1)}</p>
        </li>
      ))}
    </ul>
  )
}

function Found({ found, find }: { found: ReturnType<typeof showTable>[]; find: string }) {
  const count = found.reduce((sum, { rows }) => sum + rows.length, 0)
  return (
    <>
      <p role="status" className="quiet">
        {count === 0
          ? `No row has all of “${find.trim()}”. Try fewer words, or a size without its unit.`
          : `${count} ${count === 1 ? 'row' : 'rows'} in ${found.length} ${found.length === 1 ? 'table' : 'tables'}`}
      </p>
      {found.map((shown) => (
        <section key={shown.table.id} aria-labelledby={shown.table.id}>
          <h2 id={shown.table.id}>
            <Link to={`/tables/${shown.table.id}`}>{shown.table.title}</Link>
          </h2>
          <p className="quiet">{shown.table.say}</p>
          <TradeTable shown={shown} />
        </section>
      ))}
    </>
  )
}
