import type { Cell } from '#calc/index.ts'
import { parse } from '#calc/units/parse.ts'
import { choiceWords } from './CellField.tsx'
import { capital, columnsOf, columnsOfRow, rowWord, type ListInput } from './columns.ts'
import { offeredName } from './field-text.ts'
import { emptyRow, type RowTexts } from './form.ts'

/** The cells of a block that was copied from a spreadsheet or a notebook: rows by lines, cells by tabs, else semicolons, else commas. */
export const blockOf = (text: string, columns: number): string[][] => {
  const lines = text.split(/\r\n?|\n/).filter((line) => line.trim() !== '')
  const by = (mark: string) => lines.map((line) => line.split(mark).map((cell) => cell.trim()))
  if (text.includes('\t')) return by('\t')
  if (text.includes(';')) return by(';')
  // A comma may be the decimal one: it parts cells only where there is a point beside it, or more commas than one number has.
  const beforeNumber = /,\s+(?=[+\-−]?[.,]?\d)/
  if (lines.every((line) => beforeNumber.test(line))) return lines.map((line) => line.trim().split(beforeNumber))
  const partsCells = columns > 1 && lines.every((line) => /,.*[,.]|\..*,/.test(line))
  return partsCells ? by(',') : lines.map((line) => [line.trim()])
}

const choiceOf = (cell: Cell, text: string): string | undefined =>
  cell.kind === 'choice'
    ? cell.of.find((value) => [value, choiceWords(cell, value)].some((w) => w.toLowerCase() === text.toLowerCase()))
    : undefined

/** Words alone, none of which is a choice: what the columns are called. */
const isHeading = (texts: readonly string[], cells: readonly Cell[]) =>
  texts.some((text) => text !== '') &&
  texts.every((text) => !/^[+\-−~≈]?\s*[\d.,]/.test(text) && cells.every((cell) => choiceOf(cell, text) === undefined))

/** The unit that a heading says: "Length (ft)", "Bore, mm". */
const unitInHeading = (cell: Cell, heading: string): string | undefined => {
  const unit = /[([]\s*([^()[\]]+?)\s*[)\]]\s*$|,\s*([^,]+)$/
    .exec(heading)
    ?.slice(1)
    .find((found) => found !== undefined)
  if (cell.kind === 'choice' || unit === undefined) return undefined
  const reading = parse(`1 ${unit}`, cell.quantity)
  return reading.ok ? offeredName(cell, reading.unit) : undefined
}

/** Where a block goes: the row and the column (by its place among those shown) of the field it was pasted into. */
export interface Place {
  row: number
  column: string
}

export interface Pasted {
  rows: readonly RowTexts[]
  /** What came in, and what did not. */
  say: string
}

/** The list with a block written over it from one field on, new rows added; undefined for a text that is one cell, which any field takes. */
export const pasteBlock = (
  before: readonly RowTexts[],
  input: ListInput,
  place: Place,
  text: string,
): Pasted | undefined => {
  const columns = columnsOf(input)
  const names = Object.keys(columns)
  const block = blockOf(text, input.kind === 'runs' ? 1 : names.length)
  if (block.length === 0 || (block.length === 1 && block[0]!.length === 1)) return undefined
  const heading = block.length > 1 && isHeading(block[0]!, Object.values(columns)) ? block[0]! : undefined
  const cells = heading ? block.slice(1) : block
  const { rows, say } =
    input.kind === 'runs'
      ? pasteRuns(before, input, place, cells, heading)
      : pasteCells(before, input, place, cells, heading)
  return { rows, say: heading ? `${say} The first line was taken for a heading.` : say }
}

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`

const pasteCells = (
  before: readonly RowTexts[],
  input: Exclude<ListInput, { kind: 'runs' }>,
  { row, column }: Place,
  block: readonly (readonly string[])[],
  heading: readonly string[] | undefined,
): Pasted => {
  const columns = columnsOf(input)
  const names = Object.keys(columns)
  const from = names.indexOf(column)
  // One line of numbers in a list of one column goes down it.
  const cells = names.length === 1 && block.length === 1 ? block[0]!.map((text) => [text]) : block
  const rows = [...before]
  const room = input.most - row
  const taken = cells.slice(0, room)
  for (const [i, texts] of taken.entries()) {
    let target: RowTexts = rows[row + i] ?? emptyRow(input, rows.at(-1))
    for (const [j, text] of texts.entries()) {
      const name = names[from + j]
      // Which cells a row has may hang on one before.
      if (name === undefined || !Object.hasOwn(columnsOfRow(input, target), name)) continue
      const cell = columns[name]!
      const unit = unitInHeading(cell, heading?.[j] ?? '') ?? target[name]!.unit
      target = { ...target, [name]: { unit, text: choiceOf(cell, text) ?? text } }
    }
    rows[row + i] = target
  }
  const isTooWide = cells.some((texts) => texts.length > names.length - from)
  const lost = [
    ...(cells.length > room
      ? [`${counted(cells.length - room, rowWord(input))} did not fit: there may be ${input.most}`]
      : []),
    ...(isTooWide ? ['columns beyond the last were left out'] : []),
  ]
  return { rows, say: saidOf(counted(taken.length, rowWord(input)), lost) }
}

/** Each column of the block is a run, as a field book has them side by side; a block of one line is one run. */
const pasteRuns = (
  before: readonly RowTexts[],
  input: Extract<ListInput, { kind: 'runs' }>,
  { row }: Place,
  block: readonly (readonly string[])[],
  heading: readonly string[] | undefined,
): Pasted => {
  const cells = block.length === 1 ? block[0]!.map((text) => [text]) : block
  const rows = [...before]
  const count = Math.max(...cells.map((texts) => texts.length))
  const room = input.most - row
  for (let i = 0; i < Math.min(count, room); i++) {
    const line = cells.map((texts) => texts[i] ?? '').filter((text) => text !== '')
    const old = rows[row + i] ?? emptyRow(input, rows.at(-1))
    const unit = unitInHeading(columnsOf(input)['']!, heading?.[i] ?? '') ?? old['']!.unit
    rows[row + i] = { '': { unit, text: line.join('  ') } }
  }
  const lost = count > room ? [`${counted(count - room, input.run)} did not fit: there may be ${input.most}`] : []
  return {
    rows,
    say: saidOf(`${counted(Math.min(count, room), input.run)} of up to ${counted(cells.length, input.row)}`, lost),
  }
}

const saidOf = (taken: string, lost: readonly string[]) =>
  `Pasted: ${taken}.${lost.map((text) => ` ${capital(text)}.`).join('')}`
