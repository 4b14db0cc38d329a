import { Button } from '@radix-ui/themes'
import { useId, useState, type ReactNode } from 'react'
import { flushSync } from 'react-dom'
import type { CalculatorDefinition, Caution as CautionOf, Cell, Columns, Input } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'
import { ChoiceField, QuantityField } from '../../components/QuantityField.tsx'
import { CautionList } from './CautionList.tsx'
import { columnsOfRow, isList, isMany, pathOf, type ListInput, type ManyInput } from './columns.ts'
import { shownKeys, unitOf, unitsOf, type FieldText, type Form, type FormAction, type RowTexts } from './form.ts'

interface FieldsProps {
  definition: CalculatorDefinition
  form: Form
  errors: Readonly<Record<string, string>>
  /** Of each input, the cautions that are shown with it. */
  cautions: ReadonlyMap<string, readonly CautionOf[]>
  change: (action: FormAction) => void
}

interface CellFieldProps {
  idOf: (path: string) => string
  path: string
  cell: Cell
  field: FieldText
  error: string | undefined
  change: (action: FormAction) => void
  after?: ReactNode
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

const article = (word: string) => (/^[aeiou]/.test(word) ? 'an' : 'a')

const choiceWords = (cell: Extract<Cell, { kind: 'choice' }>, value: string) =>
  capital(cell.words?.[value] ?? value.replaceAll('-', ' '))

/** What a field left empty counts as. */
const emptyWords = (cell: Cell): string | undefined => {
  if (!cell.optional && cell.fallback === undefined) return undefined
  if (cell.fallback === undefined) return 'may stay empty'
  return cell.kind === 'choice' ? undefined : `empty counts as ${say(cell.fallback, cell.quantity, cell.unit)}`
}

function CellField({ idOf, path, cell, field, error, change, after }: CellFieldProps) {
  const frame = {
    id: idOf(path),
    label: cell.label,
    symbol: cell.symbol,
    help: [cell.help, emptyWords(cell)].filter(Boolean).join('; ') || undefined,
    error,
    after,
  }
  if (cell.kind === 'choice')
    return (
      <ChoiceField
        {...frame}
        value={field.text}
        options={[
          ...(cell.optional && cell.fallback === undefined ? [{ value: '', words: '–' }] : []),
          ...cell.of.map((value) => ({ value, words: choiceWords(cell, value) })),
        ]}
        onChoose={(text) => change({ do: 'write', path, text })}
      />
    )
  return (
    <QuantityField
      {...frame}
      text={field.text}
      unit={unitOf(cell, field)}
      units={unitsOf(cell, field)}
      negative={cell.range[0] < 0}
      onText={(text) => change({ do: 'write', path, text })}
      onUnit={(unit) => change({ do: 'change-unit', path, cell, unit })}
    />
  )
}

interface RowProps {
  columns: Columns
  row: RowTexts
  pathOfCell: (name: string) => string
  errors: Readonly<Record<string, string>>
  idOf: (path: string) => string
  change: (action: FormAction) => void
}

/** One row's fields; those that may stay empty and do step back where they are more than one. */
function RowFields({ columns, row, pathOfCell, errors, idOf, change }: RowProps) {
  const [asked, setAsked] = useState(false)
  const names = Object.keys(columns)
  const isWanted = (name: string) =>
    !columns[name]!.optional || row[name]!.text !== '' || errors[pathOfCell(name)] !== undefined
  const spare = names.filter((name) => !isWanted(name))
  const stepsBack = asked || spare.length > 1
  return (
    <div className="row-fields">
      {names
        .filter((name) => asked || !stepsBack || isWanted(name))
        .map((name) => (
          <CellField
            key={name}
            idOf={idOf}
            path={pathOfCell(name)}
            cell={columns[name]!}
            field={row[name]!}
            error={errors[pathOfCell(name)]}
            change={change}
          />
        ))}
      {stepsBack && (
        <button type="button" className="plain-button no-print" aria-expanded={asked} onClick={() => setAsked(!asked)}>
          {asked ? 'Only what is needed' : `More to say (${spare.length})`}
        </button>
      )}
    </div>
  )
}

interface ManyProps<I extends ManyInput> {
  definition: CalculatorDefinition
  path: string
  input: I
  rows: readonly RowTexts[]
  errors: Readonly<Record<string, string>>
  idOf: (path: string) => string
  change: (action: FormAction) => void
  after: ReactNode
}

function ManyFrame({ path, input, errors, idOf, after, children }: ManyProps<ManyInput> & { children: ReactNode }) {
  return (
    <fieldset className="field-list" id={idOf(path)}>
      <legend>{input.label}</legend>
      {input.help && <p className="field-help">{input.help}</p>}
      {children}
      {errors[path] && <p className="field-error">{errors[path]}</p>}
      {after}
    </fieldset>
  )
}

function rowProps({ definition, path, input, errors, idOf, change }: ManyProps<ManyInput>, row: RowTexts, i: number) {
  return {
    columns: columnsOfRow(definition, input, row),
    row,
    pathOfCell: (name: string) => pathOf(input, path, i, name),
    errors,
    idOf,
    change,
  }
}

function ListField(props: ManyProps<ListInput>) {
  const { path, input, rows, idOf, change } = props
  const addId = idOf(`${path}-add`)
  const isSeries = input.kind === 'series'
  const mayLose = rows.length > (input.optional ? 0 : input.least)
  const isFull = rows.length >= input.most
  const goTo = (id: string) => document.getElementById(id)?.focus()
  const add = () => {
    flushSync(() => change({ do: 'add-row', key: path }))
    goTo(idOf(pathOf(input, path, rows.length, isSeries ? '' : Object.keys(input.columns)[0]!)))
  }
  const remove = (number: number) => {
    flushSync(() => change({ do: 'remove-row', key: path, number }))
    goTo(addId)
  }
  return (
    <ManyFrame {...props}>
      {rows.map((row, i) => (
        <fieldset className={isSeries ? 'row row-of-one' : 'row'} key={i}>
          <legend className={isSeries ? 'out-of-sight' : undefined}>
            {capital(input.row)} {i + 1}
          </legend>
          <RowFields {...rowProps(props, row, i)} />
          {mayLose && (
            <button type="button" className="plain-button no-print" onClick={() => remove(i)}>
              Take out {input.row} {i + 1}
            </button>
          )}
        </fieldset>
      ))}
      <Button type="button" id={addId} variant="outline" size="3" className="no-print" onClick={add} disabled={isFull}>
        Add {article(input.row)} {input.row}
      </Button>
      {isFull && <p className="field-help">No more than {input.most}.</p>}
    </ManyFrame>
  )
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

const manyOptional = 3

/** Optional inputs step back only where they are many. */
const isSpare = (input: Input) =>
  input.optional === true && input.initial === undefined && input.goesWith === undefined && input.or === undefined

/** All fields of a calculator, in the order of its definition. */
export function InputFields({ definition, form, errors, cautions, change }: FieldsProps) {
  const id = useId()
  const [open, setOpen] = useState(false)
  const idOf = (path: string) => `${id}${path}`
  const { inputs } = definition
  const shown = shownKeys(definition, form)
  const spare = shown.filter((key) => isSpare(inputs[key]!))
  const stepsBack = spare.length >= manyOptional
  const isUnder = (key: string) => Object.keys(errors).some((path) => path === key || path.startsWith(`${key}.`))

  const fieldOf = (key: string) => {
    const input = inputs[key]!
    const after = <CautionList cautions={cautions.get(key)} />
    const pair = input.or === undefined ? undefined : inOrder(Object.keys(inputs), key, input.or)
    const field = isMany(input) ? (
      <ManyField
        definition={definition}
        path={key}
        input={input}
        rows={form.rows[key]!}
        errors={errors}
        idOf={idOf}
        change={change}
        after={after}
      />
    ) : (
      <CellField
        path={key}
        cell={input}
        field={form.fields[key]!}
        error={errors[key]}
        idOf={idOf}
        change={change}
        after={after}
      />
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
    </>
  )
}

const inOrder = (keys: readonly string[], a: string, b: string): readonly [string, string] =>
  keys.indexOf(a) < keys.indexOf(b) ? [a, b] : [b, a]

function ManyField(props: ManyProps<ManyInput>) {
  const { input, rows } = props
  if (isList(input)) return <ListField {...props} input={input} />
  return (
    <ManyFrame {...props}>
      <RowFields {...rowProps(props, rows[0]!, 0)} />
    </ManyFrame>
  )
}
