import { Button } from '@radix-ui/themes'
import { useState, type ClipboardEvent, type KeyboardEvent, type ReactNode } from 'react'
import { flushSync } from 'react-dom'
import { capital, columnsOf, isList, pathOf, rowWord, type ListInput, type ManyInput } from './columns.ts'
import { type Form, type FormAction, type RowTexts } from './form.ts'
import './list-field.css'
import { pasteBlock } from './paste.ts'
import { RowFields } from './RowFields.tsx'
import { RowTable } from './RowTable.tsx'

export interface ManyProps<I extends ManyInput = ManyInput> {
  form: Form
  path: string
  input: I
  errors: Readonly<Record<string, string>>
  idOf: (path: string) => string
  change: (action: FormAction) => void
  after: ReactNode
}

const article = (word: string) => (/^[aeiou]/.test(word) ? 'an' : 'a')

export function ManyFrame({ path, input, errors, idOf, after, children }: ManyProps & { children: ReactNode }) {
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

interface Note {
  say: string
  before: readonly RowTexts[]
}

/** A list of rows: written, pasted from a spreadsheet, taken out and put back. */
export function ListField(props: ManyProps<ListInput>) {
  const { form, path, input, idOf, change } = props
  const rows = form.rows[path]!
  const [note, setNote] = useState<Note>()
  const word = rowWord(input)
  const addId = idOf(`${path}-add`)
  const mayLose = rows.length > (input.optional ? 0 : input.least)
  const isFull = rows.length >= input.most
  const names = Object.keys(columnsOf(input))
  const fieldId = (row: number, name: string) => idOf(pathOf(input, path, row, name))
  const goTo = (id: string): boolean => {
    const field = document.getElementById(id)
    field?.focus()
    return field !== null
  }

  const add = (name = names[0]!) => {
    flushSync(() => change({ do: 'add-row', key: path }))
    setNote(undefined)
    goTo(fieldId(rows.length, name))
  }
  const remove = (number: number) => {
    flushSync(() => {
      setNote({ say: `${capital(word)} ${number + 1} is out.`, before: rows })
      change({ do: 'remove-row', key: path, number })
    })
    goTo(addId)
  }
  const paste = (event: ClipboardEvent, row: number, column: string) => {
    const pasted = pasteBlock(form, input, { key: path, row, column }, event.clipboardData.getData('text'))
    if (!pasted) return
    event.preventDefault()
    setNote({ say: pasted.say, before: rows })
    change({ do: 'put-rows', key: path, rows: pasted.rows })
  }
  const move = (event: KeyboardEvent, row: number, name: string) => {
    const by = event.key === 'Enter' || event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0
    if (by === 0 || event.target instanceof HTMLSelectElement) return
    if (row + by === rows.length && event.key === 'Enter' && !isFull) add(name)
    else if (!goTo(fieldId(row + by, name))) goTo(fieldId(row + by, names[0]!))
    event.preventDefault()
  }

  return (
    <ManyFrame {...props}>
      <RowTable {...props} rows={rows} onPaste={paste} onMove={move} mayLose={mayLose} onRemove={remove} />
      <div className="list-actions no-print">
        <Button type="button" id={addId} variant="outline" size="3" onClick={() => add()} disabled={isFull}>
          Add {article(word)} {word}
        </Button>
        <p className="field-help" role="status">
          {note?.say ??
            (isFull
              ? `No more than ${input.most}.`
              : input.kind === 'runs'
                ? 'Numbers apart by spaces. A block from a spreadsheet can be pasted: each column is a run.'
                : 'A block from a spreadsheet can be pasted into the first field.')}
        </p>
        {note && (
          <button
            type="button"
            className="plain-button"
            onClick={() => {
              change({ do: 'put-rows', key: path, rows: note.before })
              setNote(undefined)
            }}
          >
            Put back what was there
          </button>
        )}
      </div>
    </ManyFrame>
  )
}

export function ManyField(props: ManyProps) {
  const { input } = props
  if (isList(input)) return <ListField {...props} input={input} />
  return (
    <ManyFrame {...props}>
      <RowFields {...props} input={input} />
    </ManyFrame>
  )
}
