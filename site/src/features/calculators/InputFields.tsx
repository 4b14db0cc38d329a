import { memo, useCallback, useId, useState } from 'react'
import type { CalculatorDefinition, Caution as CautionOf, Input } from '#calc/index.ts'
import { useSteady } from '../../lib/use-steady.ts'
import { useUnits } from '../../lib/unit-preference.ts'
import { CautionList } from './CautionList.tsx'
import { CellField, type CellFieldProps } from './CellField.tsx'
import { isMany, isRecord } from './columns.ts'
import { errorsUnder } from './errors-under.ts'
import { shownKeys, type Form, type FormAction } from './form.ts'
import { ManyField } from './ListField.tsx'
import { Picker } from './Picker.tsx'
import { RecordField } from './RecordField.tsx'

interface FieldsProps {
  definition: CalculatorDefinition
  form: Form
  errors: Readonly<Record<string, string>>
  /** Of each input, the cautions that are shown with it. */
  cautions: ReadonlyMap<string, readonly CautionOf[]>
  change: (action: FormAction) => void
}

interface AlternativeProps {
  definition: CalculatorDefinition
  pair: readonly [string, string]
  known: string
  name: string
  change: (action: FormAction) => void
}

/** Which of two values is known: the other is worked out. */
function Alternative({ definition, pair, known, name, change }: AlternativeProps) {
  return (
    <fieldset className="alternative">
      <legend>I know</legend>
      {pair.map((key, i) => (
        <label key={key}>
          <input
            type="radio"
            name={name}
            checked={known === key}
            onChange={() => change({ do: 'know', key, instead: pair[1 - i]! })}
          />
          {definition.inputs[key]!.label.toLowerCase()}
        </label>
      ))}
    </fieldset>
  )
}

const nbsp = '\u00a0'

const manyOptional = 3

/** Optional inputs step back only where they are many. */
const isSpare = (input: Input) =>
  input.optional === true && input.initial === undefined && input.goesWith === undefined && input.or === undefined

const mayBeUncertain = ({ inputs }: CalculatorDefinition) =>
  Object.values(inputs).some((input) =>
    input.kind === 'scalar'
      ? !input.whole
      : input.kind === 'series'
        ? !input.long
        : 'columns' in input && Object.values(input.columns).some((cell) => cell.kind === 'scalar' && !cell.whole),
  )

interface OneFieldProps extends Omit<CellFieldProps, 'after'> {
  inputs: CalculatorDefinition['inputs']
  cautions: readonly CautionOf[] | undefined
}

/** Drawn anew only when it is written in, or something else is said of it. */
const OneField = memo(function OneField({ inputs, cautions, ...props }: OneFieldProps) {
  useUnits()
  return (
    <CellField
      {...props}
      after={
        <>
          <Picker cells={inputs} name={props.path} pathOf={(other) => other} change={props.change} />
          <CautionList cautions={cautions} />
        </>
      }
    />
  )
})

/** All fields of a calculator, in the order of its definition. */
export function InputFields({ definition, form, errors, cautions, change: changeNow }: FieldsProps) {
  const id = useId()
  const [open, setOpen] = useState(false)
  const idOf = useCallback((path: string) => `${id}${path}`, [id])
  const change = useSteady(changeNow)
  const { inputs } = definition
  const shown = shownKeys(definition, form)
  const spare = shown.filter((key) => isSpare(inputs[key]!))
  const stepsBack = spare.length >= manyOptional
  const isUnder = (key: string) => Object.keys(errorsUnder(errors, key)).length > 0

  const fieldOf = (key: string) => {
    const input = inputs[key]!
    const pair = input.or === undefined ? undefined : inOrder(Object.keys(inputs), key, input.or)
    const common = { path: key, idOf, change, cautions: cautions.get(key) }
    const field = isRecord(input) ? (
      <RecordField {...common} input={input} record={form.records[key]!} error={errors[key]} />
    ) : isMany(input) ? (
      <ManyField {...common} input={input} rows={form.rows[key]!} errors={errorsUnder(errors, key)} />
    ) : (
      <OneField {...common} inputs={inputs} cell={input} field={form.fields[key]!} error={errors[key]} />
    )
    return (
      // The switch between two alternatives keeps its place and its focus when it is used.
      <div key={pair ? pair.join() : key}>
        {pair && (
          <Alternative definition={definition} pair={pair} known={key} name={idOf(pair.join('-or-'))} change={change} />
        )}
        {field}
      </div>
    )
  }

  return (
    <>
      {shown.filter((key) => !stepsBack || !spare.includes(key)).map(fieldOf)}
      {stepsBack && (
        <details
          className="more-fields"
          open={open || spare.some(isUnder)}
          onToggle={(event) => setOpen(event.currentTarget.open)}
        >
          <summary>More, where you know it ({spare.length})</summary>
          {spare.map(fieldOf)}
        </details>
      )}
      {mayBeUncertain(definition) && (
        <p className="field-help no-print">
          A number may have a ±, one standard uncertainty: 31.4{nbsp}±{nbsp}0.2{nbsp}m, or 31.4{nbsp}m{nbsp}±{nbsp}2
          {nbsp}%.
        </p>
      )}
    </>
  )
}

const inOrder = (keys: readonly string[], a: string, b: string): readonly [string, string] =>
  keys.indexOf(a) < keys.indexOf(b) ? [a, b] : [b, a]
