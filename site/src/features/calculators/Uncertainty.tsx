import { Button } from '@radix-ui/themes'
import { useId, useMemo, useState } from 'react'
import { CalculationError } from '#calc/errors.ts'
import type { CalculatorDefinition, Inputs, StandardUncertainties } from '#calc/index.ts'
import { uncertaintyOf, type Uncertain } from '#calc/uncertainty.ts'
import { format, join, unitFor } from '#calc/units/format.ts'
import { fieldWords } from './field-words.ts'
import type { CellOutput } from './results.ts'
import '../../components/table-box.css'
import './uncertainty.css'
import { useMonteCarlo } from './use-monte-carlo.ts'

type ScalarOutput = Extract<CellOutput, { kind: 'scalar' }>

const trials = 10_000
/** The same numbers give the same draws, today and tomorrow. */
const seed = 'leatwright'

const percent = (share: number) =>
  share > 0 && share < 0.005 ? 'under 1 %' : join(format(share, 'fraction', { digits: 2 }))

/** An uncertainty in the unit of its value, to two digits. */
export const saidUncertainty = (output: ScalarOutput, { value, standardUncertainty }: Uncertain): string => {
  const unit = unitFor(output.quantity, value, output.unit).name
  return `± ${format(standardUncertainty, output.quantity, { digits: 2, unit }).text}`
}

/** The combined uncertainty of every result, or why it cannot be said. */
export const combine = (
  definition: CalculatorDefinition,
  inputs: Inputs,
  uncertainties: StandardUncertainties,
): { outputs?: Readonly<Record<string, Uncertain>>; refused?: string } => {
  if (Object.keys(uncertainties).length === 0) return {}
  try {
    return uncertaintyOf(definition, inputs, uncertainties)
  } catch (error) {
    if (error instanceof CalculationError) return { refused: error.message }
    throw error
  }
}

interface UncertaintyProps {
  definition: CalculatorDefinition
  inputs: Inputs
  uncertainties: StandardUncertainties
  level: 'h2' | 'h3' | 'h4' | 'h5'
}

/** How sure the results are: what each input's uncertainty adds, and the same by drawing the inputs many times. */
export function Uncertainty({ definition, inputs, uncertainties, level: Heading }: UncertaintyProps) {
  const id = useId()
  const { outputs, refused } = useMemo(
    () => combine(definition, inputs, uncertainties),
    [definition, inputs, uncertainties],
  )
  const uncertain = Object.entries(outputs ?? {}).flatMap(([key, found]) => {
    const output = definition.outputs[key]
    return output?.kind === 'scalar' && found.standardUncertainty > 0 ? [{ key, output, found }] : []
  })
  const [chosen, setChosen] = useState<string>()
  const shown = uncertain.find(({ key }) => key === chosen) ?? uncertain[0]
  const { sampling, start, giveUp } = useMonteCarlo()
  const sampled = sampling?.state === 'done' && sampling.order.inputs === inputs ? sampling.sampled : undefined

  if (Object.keys(uncertainties).length === 0) return null
  const shares = shown
    ? Object.entries(shown.found.shares)
        .map(([field, share]) => ({ field, words: fieldWords(definition, field), share }))
        .sort((a, b) => b.share - a.share)
    : []
  return (
    <div className="uncertainty">
      <Heading className="calculator-subheading">How sure the results are</Heading>
      {refused && <p className="field-error">{refused}</p>}
      {!refused && !shown && <p>None of the results changes with what is uncertain here.</p>}
      {shown && (
        <>
          <div className="table-box" role="group" aria-label="Standard uncertainty of each result" tabIndex={0}>
            <table>
              <thead>
                <tr>
                  <th scope="col">Result</th>
                  <th scope="col">Standard uncertainty</th>
                  <th scope="col">Of it</th>
                  {sampled && <th scope="col">95 % of {trials.toLocaleString('en-GB')} draws</th>}
                </tr>
              </thead>
              <tbody>
                {uncertain.map(({ key, output, found }) => {
                  const unit = unitFor(output.quantity, found.value, output.unit).name
                  const interval = sampled?.outputs[key]?.interval95.map(
                    (end) => format(end, output.quantity, { digits: output.digits, unit }).text,
                  )
                  return (
                    <tr key={key}>
                      <th scope="row">{output.label}</th>
                      <td>{join({ text: saidUncertainty(output, found), unit })}</td>
                      <td>
                        {found.value === 0
                          ? '–'
                          : join(format(Math.abs(found.standardUncertainty / found.value), 'fraction', { digits: 2 }))}
                      </td>
                      {sampled && <td>{interval ? join({ text: interval.join(' to '), unit }) : '–'}</td>}
                    </tr>
                  )
                })}
              </tbody>
            </table>
          </div>
          <div className="shares">
            <label htmlFor={`${id}of`}>What makes it uncertain:</label>{' '}
            <select
              id={`${id}of`}
              className="choice"
              value={shown.key}
              onChange={(event) => setChosen(event.target.value)}
            >
              {uncertain.map(({ key, output }) => (
                <option key={key} value={key}>
                  {output.label}
                </option>
              ))}
            </select>
            <ul aria-label={`Share of each input in the uncertainty of ${shown.output.label.toLowerCase()}`}>
              {shares.map(({ field, words, share }) => (
                <li key={field}>
                  <span>{words}</span>
                  <span className="share-figure">{percent(share)}</span>
                  <span className="share-bar" aria-hidden="true" style={{ inlineSize: `${100 * share}%` }} />
                </li>
              ))}
            </ul>
          </div>
          <div className="no-print">
            {sampling?.state === 'running' ? (
              <p className="sampling">
                <progress aria-label="Draws made" max={sampling.of} value={sampling.done} />{' '}
                <Button type="button" size="3" variant="outline" onClick={giveUp}>
                  Stop drawing
                </Button>
              </p>
            ) : (
              <Button
                type="button"
                size="3"
                variant="outline"
                onClick={() => start({ id: definition.id, inputs, uncertainties, trials, seed })}
              >
                Draw the inputs {trials.toLocaleString('en-GB')} times
              </Button>
            )}
            <p role="status" className="copy-note">
              {sampling?.state === 'failed' && sampling.say}
              {sampled &&
                (sampled.redrawn > 0
                  ? `${sampled.redrawn} draws lay outside what can be worked out and were made again.`
                  : 'All draws could be worked out.')}
            </p>
          </div>
          <p className="field-help">
            Standard uncertainties combine by squares (JCGM 100). Of many repeats about two thirds lie within one of
            them. Drawing the inputs (JCGM 101) shows what the squares leave out where a result does not go straight.
          </p>
        </>
      )}
    </div>
  )
}
