import { Button } from '@radix-ui/themes'
import { memo, useState, type ClipboardEvent, type KeyboardEvent, type ReactNode } from 'react'
import { flushSync } from 'react-dom'
import type { Caution } from '#calc/index.ts'
import { useSteady } from '../../lib/use-steady.ts'
import { useUnits } from '../../lib/unit-preference.ts'
import { CautionList } from './CautionList.tsx'
import { capital, columnsOf, isList, pathOf, rowWord, type ListInput, type ManyInput } from './columns.ts'
import type { FormAction, RowTexts } from './form.ts'
import './list-field.css'
import { pasteBlock } from './paste.ts'
import { RowFields } from './RowFields.tsx'
import { RowTable } from './RowTable.tsx'

export interface ManyProps<I extends ManyInput = ManyInput> {
  path: string
  input: I
  /** A group is a list of one. */
  rows: readonly RowTexts[]
  errors: Readonly<Record<string, string>>
  idOf: (path: string) => string
  change: (action: FormAction) => void
  cautions: readonly Caution[] | undefined
}

const article = (word: string) => (/^[aeiou]/.test(word) ? 'an' : 'a')

export function ManyFrame({ path, input, errors, idOf, cautions, children }: ManyProps & { children: ReactNode }) {
  return (
    <fieldset className="field-list" id={idOf(path)}>
      <legend>{input.label}</legend>
      {input.help && <p className="field-help">{input.help}</p>}
      {children}
      {errors[path] && <p className="field-error">{errors[path]}</p>}
      <CautionList cautions={cautions} />
    </fieldset>
  )
}

interface Note {
  say: string
  before: readonly RowTexts[]
}

/** A list of rows: written, pasted from a spreadsheet, taken out and put back. */
export function ListField(props: ManyProps<ListInput>) {
  const { path, input, rows, idOf, change } = props
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
    const pasted = pasteBlock(rows, input, { row, column }, event.clipboardData.getData('text'))
    if (!pasted) return
    event.preventDefault()
    setNote({ say: pasted.say, before: rows })
    change({ do: 'put-rows', key: path, rows: pasted.rows })
  }
  const move = (event: KeyboardEvent, row: number, name: string) => {
    const by = event.key === 'Enter' || event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0
    if (by === 0 || event.target instanceof HTMLSelectElement) return
    // Within a run the arrows go from one of its lines to the other.
    if (event.target instanceof HTMLTextAreaElement && event.key !== 'Enter') return
    if (row + by === rows.length && event.key === 'Enter' && !isFull) add(name)
    else if (!goTo(fieldId(row + by, name))) goTo(fieldId(row + by, names[0]!))
    event.preventDefault()
  }
  const [steadyPaste, steadyMove, steadyRemove] = [useSteady(paste), useSteady(move), useSteady(remove)]

  return (
    <ManyFrame {...props}>
      <RowTable {...props} onPaste={steadyPaste} onMove={steadyMove} mayLose={mayLose} onRemove={steadyRemove} />
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

/** Drawn anew only when something in it is other than it was. */
export const ManyField = memo(function ManyField(props: ManyProps) {
  useUnits()
  const { input } = props
  if (isList(input)) return <ListField {...props} input={input} />
  return (
    <ManyFrame {...props}>
      <RowFields {...props} input={input} />
    </ManyFrame>
  )
})
