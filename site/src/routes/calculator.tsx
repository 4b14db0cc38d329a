import { Link, useLoaderData, useLocation, useNavigate, type LoaderFunctionArgs } from 'react-router-dom'
import type { CalculatorDefinition } from '#calc/index.ts'
import { Page } from '../components/Page.tsx'
import { NotFound } from '../components/RouteError.tsx'
import { textsIn } from '../features/calculators/address.ts'
import { wordsOfStation } from '../features/calculators/by-station.ts'
import { Calculator } from '../features/calculators/Calculator.tsx'
import { CalculatorPlots } from '../features/calculators/CalculatorPlots.tsx'
import { loadDrawing } from '../features/calculators/load-drawing.ts'
import { loadCalculator } from '../lib/load-calculator.ts'
import { useIsLive } from '../lib/use-is-live.ts'

/** Put into the history beside an address that the form itself wrote, so that it is not taken for a new one. */
interface FormState {
  form?: string
}

export const loader = async ({ params: { id = '' } }: LoaderFunctionArgs) => {
  const [definition] = await Promise.all([loadCalculator(id), loadDrawing(id)])
  return definition
}

export function Component() {
  const definition = useLoaderData<CalculatorDefinition | undefined>()
  return definition ? <CalculatorPage definition={definition} /> : <NotFound>There is no calculator here.</NotFound>
}

function CalculatorPage({ definition }: { definition: CalculatorDefinition }) {
  const { id, title, summary, station } = definition
  const navigate = useNavigate()
  const location = useLocation()
  const isLive = useIsLive()
  const form = (location.state as FormState | null)?.form ?? location.key
  const write = (search: string) =>
    void navigate({ search }, { replace: true, preventScrollReset: true, state: { form } satisfies FormState })

  return (
    <div className="page">
      <Page title={title} description={summary} />
      <p className="kicker">
        <Link to="/calculators">Calculators</Link> · {wordsOfStation(station)}
      </p>
      <h1>{title}</h1>
      <p className="lead">{summary}</p>
      <Calculator
        key={isLive ? `${id} ${form}` : id}
        definition={definition}
        texts={isLive ? textsIn(location.search) : undefined}
        onSettle={write}
        plot={(solved) => <CalculatorPlots definition={definition} {...solved} />}
      />
    </div>
  )
}

/** Writing the address of the same calculator loads nothing. */
export const shouldRevalidate = ({
  currentParams,
  nextParams,
}: {
  currentParams: { id?: string }
  nextParams: { id?: string }
}) => currentParams.id !== nextParams.id
