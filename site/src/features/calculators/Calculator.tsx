import { Button } from '@radix-ui/themes'
import {
  createElement,
  Fragment,
  memo,
  use,
  useDeferredValue,
  useEffect,
  useId,
  useMemo,
  useRef,
  useState,
  type ReactNode,
} from 'react'
import type { CalculatorDefinition } from '#calc/index.ts'
import { showUnitsOf, type UnitSystem } from '#calc/units/system.ts'
import { UnitChoice } from '../../components/UnitChoice.tsx'
import { UntilReady } from '../../components/UntilReady.tsx'
import { Working } from '../../components/Working.tsx'
import { useUnits } from '../../lib/unit-preference.ts'
import { searchOf } from './address.ts'
import './calculators.css'
import { CopyLink } from './CopyLink.tsx'
import {
  changeForm,
  recordsTaken,
  solveForm,
  startAgainUntouched,
  startForm,
  type Form,
  type FormAction,
  type Solved,
  type Texts,
} from './form.ts'
import { givenValues } from './given-values.ts'
import { InputFields } from './InputFields.tsx'
import { loadDrawing } from './load-drawing.ts'
import { placeCautions, summaryOf } from './results.ts'
import { Figures, Lists } from './Results.tsx'
import { SourcesAndLimits } from './SourcesAndLimits.tsx'
import { TakeAway } from './TakeAway.tsx'
import { exampleForm } from './example-form.ts'
import { Uncertainty } from './Uncertainty.tsx'

export interface CalculatorProps {
  definition: CalculatorDefinition
  /** Texts by path, as people write them: `flow: '9.5 L/s'`, `'sections.0.length': '120 m'`. What "Start again" goes back to. */
  preset?: Texts
  /** Texts that stand there first instead, such as those of an address. */
  texts?: Texts
  /** The outputs shown, apart by spaces; all unless told. */
  show?: string
  /** The level of the calculator's own heading; without one the page's heading names it. */
  headingLevel?: 2 | 3 | 4
  /** Told, a moment after the last key, how the address of these inputs ends. */
  onSettle?: (search: string) => void
  /** What stands under the drawing. */
  plot?: (solved: Solved) => ReactNode
}

/** Its ranges and cautions are said in these units. */
const solveIn = (system: UnitSystem, definition: CalculatorDefinition, form: Form) => {
  showUnitsOf(system)
  return solveForm(definition, form)
}

/** How long after the last key a change is said and written to the address. */
const settleMilliseconds = 700

interface State {
  form: Form
  /** As it started, and how it would start now: in other units. */
  started: Form
  restart: () => Form
  system: UnitSystem
  /** The last form that could be worked out. */
  good: Form | undefined
}

/** Redrawn only when there are other numbers, not with every key. */
const LiveDrawing = memo(function LiveDrawing({ id, solved }: { id: string; solved: Solved }) {
  const Drawing = use(loadDrawing(id))
  return Drawing && createElement(Drawing, { given: solved.inputs, found: solved.solution.outputs })
})

/** A live calculator: the fields keep what is written; everything else is worked out from them as it is drawn. */
export function Calculator({ definition, preset, texts, show, headingLevel, onSettle, plot }: CalculatorProps) {
  const { id } = definition
  const system = useUnits()
  const [state, setState] = useState((): State => {
    const restart = () => startForm(definition, texts ?? preset)
    const form = restart()
    return { form, good: solveForm(definition, form).solution ? form : undefined, started: form, restart, system }
  })
  if (state.system !== system) {
    const started = state.restart()
    const form = startAgainUntouched(state.form, state.started, started)
    setState({ ...state, form, good: solveForm(definition, form).solution ? form : state.good, started, system })
  }
  const { form, good } = state
  const [said, setSaid] = useState('')
  const [example, setExample] = useState<Form>()
  const settling = useRef<number>(undefined)
  const headingId = useId()

  const attempt = useMemo(() => solveIn(system, definition, form), [definition, form, system])
  const kept = useMemo(() => (good ? solveIn(system, definition, good) : undefined), [definition, good, system])
  const solved = attempt.solution ? attempt : kept?.solution ? kept : undefined
  const errors = attempt.solution ? {} : attempt.errors
  const drawn = useDeferredValue(solved)

  useEffect(() => () => window.clearTimeout(settling.current), [])

  const put = (next: Form, restart?: () => Form) => {
    const result = solveForm(definition, next)
    setState({
      ...state,
      ...(restart ? { started: next, restart } : {}),
      form: next,
      good: result.solution ? next : good,
    })
    window.clearTimeout(settling.current)
    settling.current = window.setTimeout(() => {
      setSaid(
        result.solution
          ? summaryOf(definition, result.solution.outputs, keys)
          : `${Object.values(result.errors)[0]} The results are those of the last numbers that could be worked out.`,
      )
      onSettle?.(searchOf(definition, next))
    }, settleMilliseconds)
  }
  const begin = (restart: () => Form) => {
    const next = restart()
    put(next, restart)
    return next
  }
  const change = (action: FormAction) => put(changeForm(definition, form, action))

  const keys = show?.split(/\s+/).filter((key) => definition.outputs[key]) ?? Object.keys(definition.outputs)
  const cautions = useMemo(
    () => placeCautions(definition, form, solved?.solution.cautions ?? []),
    [definition, form, solved],
  )
  /** On a page of its own, with what a lesson has no room for. */
  const isAlone = headingLevel === undefined
  const isStale = !attempt.solution
  const Heading = headingLevel ? (`h${headingLevel}` as const) : undefined
  const Subheading = `h${(headingLevel ?? 1) + 1}` as 'h2' | 'h3' | 'h4' | 'h5'
  const homeless = Object.entries(errors).filter(([path]) => !definition.inputs[path.split('.')[0]!])

  return (
    <section
      className="calculator"
      // In a lesson there may be several of one calculator: groups, not landmarks.
      role={Heading ? 'group' : undefined}
      aria-labelledby={Heading ? headingId : undefined}
      aria-label={Heading ? undefined : definition.title}
    >
      {Heading && (
        <Heading className="calculator-title" id={headingId}>
          {definition.title}
        </Heading>
      )}
      {isAlone && <UnitChoice chosen={system} />}
      <div className="calculator-columns">
        <form className="calculator-fields" onSubmit={(event) => event.preventDefault()} noValidate>
          <UntilReady>
            <InputFields definition={definition} form={form} errors={errors} cautions={cautions} change={change} />
            <div className="calculator-actions no-print">
              <CopyLink
                path={() => `/calculators/${id}${searchOf(definition, form)}`}
                leavesOut={recordsTaken(definition, form)}
              />
              <Button
                type="button"
                size="3"
                variant="outline"
                onClick={() => begin(() => startForm(definition, preset))}
              >
                Start again
              </Button>
              {isAlone && (
                <Button
                  type="button"
                  size="3"
                  variant="outline"
                  onClick={() => setExample(begin(() => exampleForm(definition)))}
                >
                  Try an example
                </Button>
              )}
              {isAlone && form === example && <p className="copy-note">{definition.example.say}</p>}
            </div>
          </UntilReady>
        </form>
        <div className="calculator-answers">
          {homeless.map(([path, message]) => (
            <p className="field-error" key={path}>
              {message}
            </p>
          ))}
          {isStale && (
            <p className="stale-note">
              {solved
                ? 'These results are for the last numbers that could be worked out.'
                : 'Results come when the fields can be worked out.'}
            </p>
          )}
          {solved && (
            <div className={isStale ? 'stale' : undefined}>
              <Figures definition={definition} outputs={solved.solution.outputs} keys={keys} cautions={cautions} />
              {drawn && <LiveDrawing key={system} id={id} solved={drawn} />}
              <Lists definition={definition} outputs={solved.solution.outputs} keys={keys} />
              {drawn && <Uncertainty definition={definition} {...drawn} level={Subheading} />}
              {drawn && <Fragment key={`plots ${system}`}>{plot?.(drawn)}</Fragment>}
              <Subheading className="calculator-subheading">Working</Subheading>
              <Working steps={(drawn ?? solved).solution.working} />
              {isAlone && attempt.solution && (
                <TakeAway
                  report={() => ({
                    definition,
                    given: givenValues(definition, form),
                    solution: attempt.solution,
                    link: new URL(`/calculators/${id}${searchOf(definition, form)}`, window.location.href).href,
                  })}
                />
              )}
            </div>
          )}
        </div>
      </div>
      <p className="out-of-sight" role="status">
        {said}
      </p>
      <SourcesAndLimits definition={definition} level={Subheading} />
    </section>
  )
}
