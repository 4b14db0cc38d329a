import type { Quantity } from '#calc/index.ts'
import type { Table, TableCell, TableColumn } from '#calc/tables/table.ts'
import { fieldText, format, formatNumber, join } from '#calc/units/format.ts'
import { quantities } from '#calc/units/quantities.ts'
import { shownUnit } from '#calc/units/system.ts'

/** A table as it is shown: figures in the units that are shown, sources numbered. */
export interface ShownTable {
  table: Table
  columns: readonly ShownColumn[]
  rows: readonly ShownRow[]
  /** Each source once, in the order in which the rows need them. */
  sources: readonly string[]
}
export interface ShownColumn {
  /** Its key, and which of three figures where it has three. */
  id: string
  label: string
  /** '' for words and plain numbers. */
  unit: string
  isNumber: boolean
}
export interface ShownRow {
  /** Its place in the whole table. */
  number: number
  /** Each one's texts: two are from and to, none is nothing known. */
  cells: readonly (readonly string[])[]
  /** Place in `sources`. */
  source: number
}

export const parts = ['least', 'usual', 'most'] as const
type Row = Table['rows'][number]

const isThree = (cell: TableCell | undefined): cell is readonly [number, number, number] =>
  Array.isArray(cell) && cell.length === 3

interface PartOfColumn {
  key: string
  column: TableColumn
  /** Of three figures. */
  part?: (typeof parts)[number]
}

/** Three figures are three columns; two stay together as "from … to". */
const columnsOf = (table: Table): readonly PartOfColumn[] =>
  Object.entries(table.columns).flatMap(([key, column]): readonly PartOfColumn[] =>
    table.rows.some((row) => isThree(row[key])) ? parts.map((part) => ({ key, column, part })) : [{ key, column }],
  )

/** The unit that a column was printed in, and the one it is shown in. */
const printedUnit = (quantity: Quantity, { unit }: TableColumn): string => unit ?? quantities[quantity].units[0]!.name
const unitOf = (column: TableColumn): string =>
  column.quantity ? shownUnit(column.quantity, printedUnit(column.quantity, column)) : ''

/** Digits of a figure that was turned into other units; in its own it keeps those it was printed with. */
const turnedDigits = 4

const numberText = (value: number, column: TableColumn): string => {
  const quantity = column.quantity!
  const unit = unitOf(column)
  if (column.digits) return format(value, quantity, { digits: column.digits, unit }).text
  const text = fieldText(value, quantity, unit)
  if (unit === printedUnit(quantity, column)) return text
  const turned = Number(Number(text).toPrecision(turnedDigits))
  const size = Math.abs(turned)
  return size !== 0 && (size < 1e-4 || size >= 1e4) ? formatNumber(turned, turnedDigits) : String(turned)
}

/** A figure with its unit. */
export const sayFigure = (value: number, column: TableColumn): string =>
  join({ text: numberText(value, column), unit: unitOf(column) })

const cellTexts = (cell: TableCell | undefined, column: TableColumn): readonly string[] => {
  if (cell === undefined || cell === '') return []
  return typeof cell === 'string' ? [cell] : [cell].flat().map((value) => numberText(value, column))
}

const cellsOf = (table: Table, row: Row) =>
  columnsOf(table).map(({ key, column, part }) => {
    const cell = row[key]
    return cellTexts(part && isThree(cell) ? cell[parts.indexOf(part)] : cell, column)
  })

/** Words and numbers apart: "SDR11" is "sdr" and "11". */
const wordsIn = (text: string): readonly string[] =>
  text
    .toLowerCase()
    .replaceAll('\u00a0', '')
    .match(/\d+(?:[.,]\d+)?|[\p{L}°Ωµ²³]+/gu) ?? []

const isNumeral = (word: string) => /^\d/.test(word)

/** A word is found by its beginning, a number only whole: 11 is not in 110. */
const hasWord = (words: readonly string[], wanted: string) => {
  const word = wanted.replace(',', '.')
  return words.some((one) => (isNumeral(word) ? one === word : one.startsWith(word)))
}

/** The rows that have every word looked for, in the table's name, a column's name or a cell. */
export const showTable = (table: Table, find = ''): ShownTable => {
  const wanted = wordsIn(find)
  const columns = columnsOf(table).map(({ key, column, part }): ShownColumn => ({
    id: part ? `${key} ${part}` : key,
    label: part ? `${column.label}, ${part}` : column.label,
    unit: unitOf(column),
    isNumber: column.quantity !== undefined,
  }))
  const common = wordsIn([table.title, ...columns.flatMap(({ label, unit }) => [label, unit])].join(' '))
  const sources: string[] = []
  const rows = table.rows.flatMap((row, number): ShownRow[] => {
    const cells = cellsOf(table, row)
    const words = [...common, ...cells.flat().flatMap(wordsIn)]
    if (!wanted.every((word) => hasWord(words, word))) return []
    if (!sources.includes(row.source)) sources.push(row.source)
    return [{ number, cells, source: sources.indexOf(row.source) }]
  })
  return { table, columns, rows, sources }
}

export const columnWords = ({ label, unit }: ShownColumn): string => (unit ? `${label}, ${unit}` : label)

export const cellWords = (texts: readonly string[]): string => (texts.length > 0 ? texts.join(' to ') : '–')

/** For a spreadsheet: from and to in columns of their own, each row's source in words. */
export const asCells = ({ columns, rows, sources }: ShownTable): string[][] => {
  const isRange = columns.map((_, place) => rows.some(({ cells }) => cells[place]!.length > 1))
  const heads = columns.flatMap((column, place) =>
    isRange[place] ? [`${columnWords(column)}, from`, `${columnWords(column)}, to`] : [columnWords(column)],
  )
  return [
    [...heads, 'Source'],
    ...rows.map(({ cells, source }) => [
      ...cells.flatMap(([first = '', last = first], place) => (isRange[place] ? [first, last] : [first])),
      sources[source]!,
    ]),
  ]
}
