import { Button } from '@radix-ui/themes'
import { memo, useId, useState, type DragEvent } from 'react'
import type { Caution } from '#calc/index.ts'
import { CautionList } from './CautionList.tsx'
import type { RecordInput } from './columns.ts'
import type { DailyRecord, FlowUnit, Reading, RecordOptions, RecordProblem } from './daily-record.ts'
import type { DayOrMonthFirst } from './daily-record-dates.ts'
import type { DecimalMark } from './daily-record-numbers.ts'
import { inventedRecord, type FlowRecord, type FormAction } from './form.ts'
import './record-field.css'
import { SparkLine } from './SparkLine.tsx'

interface RecordFieldProps {
  idOf: (path: string) => string
  path: string
  input: RecordInput
  record: FlowRecord
  error: string | undefined
  change: (action: FormAction) => void
  cautions: readonly Caution[] | undefined
}

interface Source {
  name: string
  text: string
  options: RecordOptions
  read: DailyRecord
  /** What was taken of it. */
  record?: FlowRecord
}

/** The list of cells stays short enough to be read. */
const mostShown = 20

function Problems({ problems }: { problems: readonly RecordProblem[] }) {
  if (problems.length === 0) return null
  return (
    <ul className="record-problems">
      {problems.slice(0, mostShown).map(({ row, column, cell, say }) => (
        <li key={`${row} ${column}`}>
          Row {row}, column {column}
          {cell.trim() !== '' && <>, “{cell.slice(0, 40)}”</>}: {say}
        </li>
      ))}
      {problems.length > mostShown && <li>And {problems.length - mostShown} more.</li>}
    </ul>
  )
}

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`

const longDate = (date: string) =>
  new Date(date).toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })

const day = 86_400_000

/** From when to when a record goes, and how many days of that it has not. */
const spanOf = ({ days }: DailyRecord): string => {
  const [first, last] = [days[0]?.date, days.at(-1)?.date]
  if (first === undefined || last === undefined) return ''
  const missing = (Date.parse(last) - Date.parse(first)) / day + 1 - days.length
  return `, ${longDate(first)} to ${longDate(last)}${missing > 0 ? `, ${counted(missing, 'day')} missing` : ''}`
}

/** Years of daily flows: from a file that is chosen or dropped, or pasted. It is read here and goes nowhere. */
export const RecordField = memo(function RecordField({
  idOf,
  path,
  input,
  record,
  error,
  change,
  cautions,
}: RecordFieldProps) {
  const id = useId()
  const [source, setSource] = useState<Source>()
  const [over, setOver] = useState(false)
  const [failed, setFailed] = useState<string>()

  const read = async (name: string, text: string, options: RecordOptions = {}) => {
    setFailed(undefined)
    try {
      const { readDailyRecord } = await import('./daily-record.ts')
      const read = readDailyRecord(text, options)
      const values = read.days.map(({ flow }) => flow)
      const isTooLong = values.length > input.most
      const record = values.length > 0 && !isTooLong ? { values, from: name } : undefined
      setSource({ name, text, options, read, record })
      if (isTooLong) setFailed(`There are more than ${input.most} days: take a part of the record.`)
      if (record) change({ do: 'take-record', key: path, record })
    } catch {
      setFailed('The file could not be read here. Try again, or paste its text.')
    }
  }
  const take = async (file: File | undefined) => {
    if (!file) return
    // Ten years of days are a fifth of a megabyte; what is a hundred times that is no such record.
    if (file.size > 2e7)
      setFailed('This file is too large for a record of daily flows: choose a text file of dates and flows.')
    else await read(file.name, await file.text())
  }
  const drop = (event: DragEvent) => {
    event.preventDefault()
    setOver(false)
    const [file] = event.dataTransfer.files
    if (file) void take(file)
    else void read('Dropped text', event.dataTransfer.getData('text'))
  }
  const again = (options: RecordOptions) => {
    if (source) void read(source.name, source.text, { ...source.options, ...options })
  }
  // Of a record that is no longer there, because the form started again, nothing more is said.
  const taken = source && (source.record === undefined || source.record === record) ? source.read : undefined
  const refused = taken?.problems.filter(({ isRefused }) => isRefused) ?? []
  const gaps = taken?.problems.filter(({ isRefused }) => !isRefused) ?? []

  return (
    <fieldset className="field-list record-field" id={idOf(path)}>
      <legend>{input.label}</legend>
      <p className="field-help">{input.help ? `${input.help}; nothing` : 'Nothing'} leaves this browser.</p>
      <div
        className={over ? 'drop-place drop-place-over' : 'drop-place'}
        onDragOver={(event) => {
          event.preventDefault()
          setOver(true)
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
      >
        <p className="record-name">
          <strong>{record.from}</strong>: {counted(record.values.length, input.row)}
          {source?.record === record && spanOf(source.read)}
        </p>
        <SparkLine values={record.values} />
        <label className="file-choice no-print">
          Choose a file, or drop it here
          <input
            type="file"
            accept=".csv,.txt,.tsv,.tab,.dat,text/csv,text/plain"
            onChange={(event) => {
              void take(event.target.files?.[0])
              // The same file, mended, may be chosen again.
              event.target.value = ''
            }}
          />
        </label>
        <details className="no-print">
          <summary>Paste it instead</summary>
          <label htmlFor={`${id}paste`} className="field-help">
            A date and a flow in each row
          </label>
          <textarea
            id={`${id}paste`}
            rows={4}
            spellCheck={false}
            placeholder={'2025-01-01; 12.4\n2025-01-02; 11.9'}
            onPaste={(event) => {
              const text = event.clipboardData.getData('text')
              if (text.trim() !== '') void read('Pasted record', text)
            }}
            onBlur={(event) => {
              const text = event.target.value
              if (text.trim() !== '' && text !== source?.text) void read('Written record', text)
            }}
          />
        </details>
      </div>
      <div role="status">
        {taken && taken.days.length === 0 && (
          <p className="field-error">
            {refused.length > 0 ? 'It cannot be taken as it stands:' : 'It holds no day with a flow.'} The record before
            stays.
          </p>
        )}
        <Problems problems={refused} />
        {taken && taken.notes.length > 0 && (
          <ul className="record-notes">
            {taken.notes.map((note) => (
              <li key={note}>{note}</li>
            ))}
          </ul>
        )}
        {taken?.reading && <Choices reading={taken.reading} again={again} />}
        {gaps.length > 0 && (
          <details>
            <summary>
              {gaps.length === 1 ? 'One cell holds' : `${gaps.length} cells hold`} no flow: those days are gaps
            </summary>
            <Problems problems={gaps} />
          </details>
        )}
        {failed && <p className="field-error">{failed}</p>}
        {error && <p className="field-error">{error}</p>}
      </div>
      {input.initial && record.values !== input.initial && (
        <Button
          type="button"
          variant="outline"
          size="3"
          className="no-print"
          onClick={() => {
            setSource(undefined)
            change({ do: 'take-record', key: path, record: { values: input.initial!, from: inventedRecord } })
          }}
        >
          Back to the invented year
        </Button>
      )}
      <CautionList cautions={cautions} />
    </fieldset>
  )
})

const units: readonly FlowUnit[] = ['L/s', 'm³/s', 'ft³/s']
const orderWords: Readonly<Record<DayOrMonthFirst, string>> = {
  'd/m/y': 'day, then month',
  'm/d/y': 'month, then day',
}
const markWords: Readonly<Record<DecimalMark, string>> = { '.': 'a point', ',': 'a comma' }

/** What a record leaves open, to be said by its owner. */
function Choices({ reading, again }: { reading: Reading; again: (options: RecordOptions) => void }) {
  const { unit, unitIsNamed, dateOrder, otherDateOrder, flowColumn, flowColumns, decimalMark, otherDecimalMark } =
    reading
  return (
    <div className="record-choices no-print">
      <label>
        Flows are in{' '}
        <select value={unit} onChange={(event) => again({ unit: event.target.value as FlowUnit })}>
          {units.map((unit) => (
            <option key={unit}>{unit}</option>
          ))}
        </select>
        {!unitIsNamed && <span className="field-help"> the file does not say</span>}
      </label>
      {otherDateOrder && dateOrder && dateOrder !== 'y-m-d' && (
        <label>
          Dates are{' '}
          <select value={dateOrder} onChange={(event) => again({ dateOrder: event.target.value as DayOrMonthFirst })}>
            {[dateOrder, otherDateOrder].map((order) => (
              <option key={order} value={order}>
                {orderWords[order]}
              </option>
            ))}
          </select>
          <span className="field-help"> both would do</span>
        </label>
      )}
      {otherDecimalMark && (
        <label>
          Decimals stand behind{' '}
          <select value={decimalMark} onChange={(event) => again({ decimalMark: event.target.value as DecimalMark })}>
            {[decimalMark, otherDecimalMark].map((mark) => (
              <option key={mark} value={mark}>
                {markWords[mark]}
              </option>
            ))}
          </select>
          <span className="field-help"> both would do</span>
        </label>
      )}
      {flowColumns.length > 1 && (
        <label>
          The flow is in{' '}
          <select value={flowColumn} onChange={(event) => again({ flowColumn: Number(event.target.value) })}>
            {flowColumns.map(({ column, name }) => (
              <option key={column} value={column}>
                {name || `column ${column}`}
              </option>
            ))}
          </select>
        </label>
      )}
    </div>
  )
}
