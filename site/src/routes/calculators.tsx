import { Link } from 'react-router-dom'
import { calculatorIndex } from 'virtual:calculator-index'
import { Page } from '../components/Page.tsx'
import '../features/calculators/calculator-list.css'
import { byStation } from '../features/calculators/by-station.ts'

export function Component() {
  return (
    <div className="page">
      <Page
        title="Calculators"
        description="The sums of small hydro, from the stream to the load: live results, the working with your numbers, and what to look out for."
      />
      <h1>Calculators</h1>
      <p className="lead">
        Every sum of a small scheme, in the order of the water. Write a number with the unit you have; the working shows
        what was done with it.
      </p>
      <ol className="station-list">
        {byStation(calculatorIndex).map(({ station, words, members }) => (
          <li key={station}>
            <h2>{words}</h2>
            <ul>
              {members.map(({ id, title, summary }) => (
                <li key={id}>
                  <Link to={`/calculators/${id}`}>{title}</Link>
                  <p>{summary}</p>
                </li>
              ))}
            </ul>
          </li>
        ))}
      </ol>
    </div>
  )
}
