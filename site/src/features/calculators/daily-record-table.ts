/** The table in a text: its rows and cells, which column holds the dates, and which can hold the flows. */
import Papa from 'papaparse'
import { readDate, type WrittenDate } from './daily-record-dates.ts'
import { isNumber } from './daily-record-numbers.ts'

/** Between columns, the likeliest first; spaces stand for any run of them. */
const delimiters = ['\t', ';', '|', ',', ' '] as const
type Delimiter = (typeof delimiters)[number]

export interface Row {
  /** Its place in the file, from 1, comments and empty lines counted. */
  number: number
  cells: readonly string[]
}

/** Where a row writes its date: in one cell, or as year, month and day in three. */
export interface DateColumn {
  column: number
  isInThree: boolean
}

export interface Table {
  /** Above the data: names, units, whatever else stands there. */
  head: readonly Row[]
  rows: readonly Row[]
  comments: readonly string[]
  /** From 0. */
  date?: DateColumn
  /** Those that hold numbers, from 0. */
  numbers: readonly number[]
  /** Set where commas seem to stand between columns and in the numbers as well. */
  commasTwice: boolean
}

export interface BadTable {
  row: number
  cell: string
  say: string
}

const cellsOf = (text: string, delimiter: Delimiter): { rows: string[][]; openQuote: number | undefined } => {
  const spaced = delimiter === ' ' ? text.replace(/[ \t]+/g, ' ').replace(/^ | $/gm, '') : text
  const { data, errors } = Papa.parse<string[]>(spaced, { delimiter, skipEmptyLines: false })
  return {
    rows: data.map((cells) => cells.map((cell) => cell.trim())),
    openQuote: errors.find(({ code }) => code === 'MissingQuotes')?.row,
  }
}

export const dateIn = ({ cells }: Row, { column, isInThree }: DateColumn): WrittenDate | undefined =>
  readDate(isInThree ? cells.slice(column, column + 3).join('-') : (cells[column] ?? ''))

/** Marks that stand where a flow is missing. */
const missing = /^(|-+|\*+|\?|x|n\/?a|nan|null|none|nil|ice|m|miss(ing)?|no data|eqp|bkw|dis|mnt|rat|zfl|\.+)$/i

const isDataCell = (cell: string): boolean => missing.test(cell) || isNumber(cell)

const mostOf = (rows: readonly Row[], test: (row: Row) => boolean): number => {
  let count = 0
  for (const row of rows) if (test(row)) count++
  return count
}

const widthOf = (rows: readonly Row[]): number => rows.reduce((widest, { cells }) => Math.max(widest, cells.length), 0)

/** The column with most dates, if most rows from its first date on have one. */
const findDates = (rows: readonly Row[]): { date: DateColumn; from: number; count: number } | undefined => {
  let best: { date: DateColumn; from: number; count: number } | undefined
  const columns = Array.from({ length: widthOf(rows) }, (_, column) => column)
  for (const isInThree of [false, true]) {
    if (best) break
    for (const column of columns) {
      const date = { column, isInThree }
      const has = (row: Row) => dateIn(row, date) !== undefined
      const from = rows.findIndex(has)
      if (from < 0) continue
      const count = mostOf(rows, has)
      if (count * 2 > rows.length - from && count > (best?.count ?? 0)) best = { date, from, count }
    }
  }
  return best
}

const findNumbers = (rows: readonly Row[], date?: DateColumn): number[] => {
  const isDate = (column: number) =>
    date !== undefined && column >= date.column && column < date.column + (date.isInThree ? 3 : 1)
  return Array.from({ length: widthOf(rows) }, (_, column) => column).filter(
    (column) =>
      !isDate(column) &&
      rows.some(({ cells }) => isNumber(cells[column] ?? '')) &&
      mostOf(rows, ({ cells }) => isDataCell(cells[column] ?? '')) * 2 > rows.length,
  )
}

interface Layout {
  head: readonly Row[]
  rows: readonly Row[]
  date?: DateColumn
  numbers: number[]
  score: number
}

/** Without dates so much of a file must be numbers to be a table at all. */
const mostlyNumbers = 0.6

const layOut = (all: readonly Row[]): Layout | undefined => {
  const dates = findDates(all)
  if (dates) {
    const rows = all.slice(dates.from)
    const numbers = findNumbers(rows, dates.date)
    const score = (dates.count + (numbers.length > 0 ? rows.length : 0)) / all.length
    return { head: all.slice(0, dates.from), rows, date: dates.date, numbers, score }
  }
  const from = all.findIndex(({ cells }) => cells.some(isNumber))
  if (from < 0) return undefined
  const rows = all.slice(from)
  // One row is no series of days.
  if (rows.length < 2) return undefined
  const numbers = findNumbers(rows)
  const share = Math.max(
    0,
    ...numbers.map((column) => mostOf(all, ({ cells }) => isNumber(cells[column] ?? '')) / all.length),
  )
  return share < mostlyNumbers ? undefined : { head: all.slice(0, from), rows, numbers, score: share }
}

const isBlank = ({ cells }: Row): boolean => cells.every((cell) => cell === '')
const isComment = (line: string): boolean => line.trimStart().startsWith('#')

const rowsOf = (rows: readonly string[][]): Row[] =>
  rows.map((cells, i) => ({ number: i + 1, cells })).filter((row) => !isBlank(row) && !isComment(row.cells[0] ?? ''))

/** How many lines decide what stands between columns. */
const sampled = 300

const chooseDelimiter = (lines: readonly string[]): Delimiter | undefined => {
  const told = lines.filter((line) => line.trim() !== '' && !isComment(line))
  const every = Math.ceil(told.length / sampled)
  // Neighbours differ less than the whole: lines from all of the file, in their order.
  const sample = told.filter((_, i) => i % every === 0).join('\n')
  let best: { delimiter: Delimiter; score: number } | undefined
  for (const delimiter of delimiters) {
    const layout = layOut(rowsOf(cellsOf(sample, delimiter).rows))
    if (layout && layout.numbers.length > 0 && layout.score > (best?.score ?? 0))
      best = { delimiter, score: layout.score }
  }
  return best?.delimiter
}

const excerptLength = 40
export const excerpt = (text: string): string =>
  text.length > excerptLength ? `${text.slice(0, excerptLength)}…` : text

/** Reads a text as a table of daily flows, or says why it is none. */
export const readTable = (text: string): Table | BadTable => {
  const lines = text.split(/\r\n|\r|\n/)
  const noTable = {
    row: 1,
    cell: excerpt(lines.find((line) => line.trim() !== '') ?? ''),
    say: 'This is no table of daily flows. Give a row for each day with its date and its flow, or the flows alone, one in each row.',
  }
  const delimiter = chooseDelimiter(lines)
  if (delimiter === undefined) return noTable
  const { rows: cells, openQuote } = cellsOf(lines.join('\n'), delimiter)
  if (openQuote !== undefined)
    return {
      row: openQuote + 1,
      cell: excerpt(cells[openQuote]?.[0] ?? ''),
      say: 'A quotation mark opens near here and is not closed, so that the rest cannot be told apart: take it out or close it.',
    }
  const layout = layOut(rowsOf(cells))
  if (layout === undefined || layout.numbers.length === 0) return noTable
  const { head, rows, date, numbers } = layout
  const named = head.at(-1)?.cells.length
  const wholeOnly = (column: number) => rows.every(({ cells }) => /^\d*$/.test(cells[column] ?? ''))
  return {
    head,
    rows,
    comments: lines.filter(isComment),
    numbers,
    commasTwice:
      delimiter === ',' && named !== undefined && named === numbers.at(-1) && numbers.slice(-2).every(wholeOnly),
    ...(date ? { date } : {}),
  }
}
