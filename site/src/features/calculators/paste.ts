import type { CalculatorDefinition } from '#calc/index.ts'
import { choiceWords } from './CellField.tsx'
import { capital, columnsOf, columnsOfRow, rowWord, type ListInput } from './columns.ts'
import { emptyRow, type Form, type RowTexts } from './form.ts'

/** The cells of a block that was copied from a spreadsheet or a notebook: rows by lines, cells by tabs, else semicolons, else commas. */
export const blockOf = (text: string, columns: number): string[][] => {
  const lines = text.replace(/\r\n?/g, '\n').replace(/\n+$/, '').split('\n')
  const by = (mark: string) => lines.map((line) => line.split(mark).map((cell) => cell.trim()))
  if (text.includes('\t')) return by('\t')
  if (text.includes(';')) return by(';')
  // A comma may be the decimal one: it parts cells only where there is a point beside it, or more commas than one number has.
  const partsCells = columns > 1 && lines.every((line) => /,.*[,.]|\..*,/.test(line))
  return partsCells ? by(',') : lines.map((line) => [line.trim()])
}

const isHeader = (cells: readonly string[]) => cells.every((cell) => !/\d/.test(cell))

/** Where a block goes: the key of the list, the row and the column (by its place among those shown) of the field it was pasted into. */
export interface Place {
  key: string
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
  definition: CalculatorDefinition,
  form: Form,
  input: ListInput,
  { key, row, column }: Place,
  text: string,
): Pasted | undefined => {
  const names = Object.keys(columnsOf(input))
  const block = blockOf(text, input.kind === 'runs' ? 1 : names.length)
  if (block.length === 1 && block[0]!.length === 1) return undefined
  const cells = block.length > 1 && isHeader(block[0]!) ? block.slice(1) : block
  return input.kind === 'runs'
    ? pasteRuns(form, input, key, row, cells)
    : pasteCells(definition, form, input, { key, row, column }, cells)
}

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`

const pasteCells = (
  { inputs }: CalculatorDefinition,
  form: Form,
  input: Exclude<ListInput, { kind: 'runs' }>,
  { key, row, column }: Place,
  cells: readonly (readonly string[])[],
): Pasted => {
  const rows = [...form.rows[key]!]
  const room = input.most - row
  const taken = cells.slice(0, room)
  let widest = 0
  for (const [i, texts] of taken.entries()) {
    let target: RowTexts = rows[row + i] ?? emptyRow(inputs[key] as ListInput, rows.at(-1))
    // Which columns a row has may hang on its first cell: look anew after each.
    const from = Object.keys(columnsOf(input)).indexOf(column)
    for (const [j, text] of texts.entries()) {
      const name = Object.keys(columnsOf(input))[from + j]
      if (name === undefined) break
      widest = Math.max(widest, j + 1)
      const cell = columnsOf(input)[name]!
      if (!Object.hasOwn(columnsOfRow(input, target), name)) continue
      const choice =
        cell.kind === 'choice'
          ? cell.of.find((value) =>
              [value, choiceWords(cell, value)].some((words) => words.toLowerCase() === text.toLowerCase()),
            )
          : undefined
      target = { ...target, [name]: { unit: target[name]?.unit ?? '', text: choice ?? text } }
    }
    rows[row + i] = target
  }
  const lost = [
    ...(cells.length > room
      ? [`${counted(cells.length - room, rowWord(input))} did not fit: there may be ${input.most}`]
      : []),
    ...(cells.some((texts) => texts.length > widest) ? ['columns beyond the last were left out'] : []),
  ]
  return { rows, say: saidOf(counted(taken.length, rowWord(input)), lost) }
}

/** Each column of the block is a run, as a field book has them side by side. */
const pasteRuns = (
  form: Form,
  input: Extract<ListInput, { kind: 'runs' }>,
  key: string,
  row: number,
  cells: readonly (readonly string[])[],
): Pasted => {
  const rows = [...form.rows[key]!]
  const count = Math.max(...cells.map((texts) => texts.length))
  const room = input.most - row
  for (let i = 0; i < Math.min(count, room); i++) {
    const line = cells.map((texts) => texts[i] ?? '').filter((text) => text !== '')
    const before = rows[row + i] ?? emptyRow(input, rows.at(-1))
    rows[row + i] = { '': { unit: before['']!.unit, text: line.join('  ') } }
  }
  const lost = count > room ? [`${counted(count - room, input.run)} did not fit: there may be ${input.most}`] : []
  return {
    rows,
    say: saidOf(`${counted(Math.min(count, room), input.run)} of up to ${counted(cells.length, input.row)}`, lost),
  }
}

const saidOf = (taken: string, lost: readonly string[]) =>
  `Pasted: ${taken}.${lost.map((text) => ` ${capital(text)}.`).join('')}`
