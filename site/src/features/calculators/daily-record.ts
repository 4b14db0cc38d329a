/**
 * A file or a paste of daily flows, read into flows day by day. Nothing is made up and nothing goes silently: what was taken on trust or
 * left out is said.
 */
import { format, join } from '#calc/units/format.ts'
import { conversion, quantities } from '#calc/units/quantities.ts'
import {
  chooseOrder,
  dayOf,
  isoDate,
  type ChosenOrder,
  type DateOrder,
  type DayOrMonthFirst,
} from './daily-record-dates.ts'
import { chooseMark, readNumber, type DecimalMark } from './daily-record-numbers.ts'
import { dateIn, excerpt, readTable, type Row, type Table } from './daily-record-table.ts'

export const flowUnits = ['L/s', 'm³/s', 'ft³/s'] as const
export type FlowUnit = (typeof flowUnits)[number]

/** What the data leave open, or what a person knows better. */
export interface RecordOptions {
  dateOrder?: DayOrMonthFirst
  /** The column with the flows, from 1. */
  flowColumn?: number
  unit?: FlowUnit
  decimalMark?: DecimalMark
}

export interface RecordDay {
  /** ISO 8601; absent where the record has no dates. */
  date?: string
  /** m³/s. */
  flow: number
}

/** A cell that was not taken. Rows and columns count from 1, comments, names and empty lines included. */
export interface RecordProblem {
  row: number
  column: number
  cell: string
  say: string
  /** Whether the record cannot be used before this is put right; otherwise the day is a gap. */
  isRefused: boolean
}

/** How a record was read, with what else there is to choose: for the options of another reading. */
export interface Reading {
  flowColumn: number
  flowColumns: readonly { column: number; name: string }[]
  unit: FlowUnit
  /** Whether the file names it. */
  unitIsNamed: boolean
  dateOrder?: DateOrder
  /** Set where this order fits as well. */
  otherDateOrder?: DayOrMonthFirst
  decimalMark: DecimalMark
  /** Set where the other mark fits as well. */
  otherDecimalMark?: DecimalMark
}

export interface DailyRecord {
  /** In the order of their dates, or of the file where it has none; empty if anything was refused. */
  days: RecordDay[]
  /** What was done with the record, in sentences. */
  notes: string[]
  problems: RecordProblem[]
  /** Absent where the text is no table. */
  reading?: Reading
}

const unitSpellings: Record<FlowUnit, RegExp> = {
  'ft³/s': /ft\s?(3|³|\^3)\s?(\/|per )\s?s|(?<![a-z])(cfs|cusecs?)(?![a-z])|cubic (foot|feet)( per |\/)s/i,
  'm³/s':
    /m\s?(3|³|\^3|\*\*3)\s?(\/|per )\s?s|m(3|³|\^3)[ .·]?s\^?(-1|⁻¹)|(?<![a-z])(cumecs?|cms)(?![a-z])|cubic met(re|er)s?( per |\/)s/i,
  'L/s': /(?<![a-z])(l\s?\/\s?s(ec)?|l[ .·]?s\^?(-1|⁻¹)|lps)(?![a-z])|lit(re|er)s?( per |\/)s/i,
}
/** Other things that daily figures are given in. */
const otherUnit =
  /(m3|m³|m\^3|ml|mgal|gal|gpm|mgd|\bl|mm|in|acre-?f(ee)?t|af)\s*(\/|per )\s*(d|h|min)|\bmgd\b|\bgpm\b|\bml\/d/i
const flowWords = /flow|discharge|débit|debit|abfluss|durchfluss|caudal|portata|\bq\b|m3\/s|m³\/s|l\/s|cfs|cumec/i

const unitsIn = (text: string): FlowUnit[] => flowUnits.filter((unit) => unitSpellings[unit].test(text))

const times = (count: number, one: string): string => `${count} ${one}${count === 1 ? '' : 's'}`

const list = (items: readonly string[]): string =>
  items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} and ${items.at(-1)!}`

/** Formats of columns that some archives write below their names: 14n, 20d. */
const columnFormat = /^\d+[a-z]$/i

const nameOf = ({ head }: Table, column: number): string => {
  const names = head
    .map(({ cells }) => cells[column] ?? '')
    .filter((name) => /\p{L}/u.test(name) && !columnFormat.test(name))
  return names.find((name) => flowWords.test(name)) ?? names.at(-1) ?? ''
}

/** Whether a column's numbers are no readings: all the same, as a station's number, or counting the rows. */
const isLabel = ({ rows }: Table, column: number): boolean => {
  const step = (i: number) => Number(rows[i]!.cells[column]) - Number(rows[i - 1]!.cells[column])
  return rows.length > 2 && [0, 1].some((wanted) => rows.every((_, i) => i === 0 || step(i) === wanted))
}

/** The column whose name speaks of flow, else the first of readings behind the date, else the first. */
const likeliestFlow = (table: Table): number => {
  const { numbers, date } = table
  const named = numbers.find((column) => flowWords.test(nameOf(table, column)))
  if (named !== undefined) return named
  const readings = numbers.filter((column) => !isLabel(table, column))
  return readings.find((column) => column > (date?.column ?? -1)) ?? readings[0] ?? numbers[0]!
}

interface Dated {
  row: Row
  day?: number
  flow: number
}

/** The days between the first and the last that are not there, and the longest run of them. */
const gapsOf = (days: readonly number[]): { missing: number; longest: number; after: number } => {
  const gaps = { missing: 0, longest: 0, after: 0 }
  days.slice(1).forEach((day, i) => {
    const gap = day - days[i]! - 1
    gaps.missing += gap
    if (gap > gaps.longest) {
      gaps.longest = gap
      gaps.after = days[i]!
    }
  })
  return gaps
}

class RecordReader {
  private readonly notes: string[] = []
  private readonly problems: RecordProblem[] = []
  private readonly flowColumn: number
  private readonly unit: FlowUnit
  private readonly unitIsNamed: boolean
  private readonly decimal: { mark: DecimalMark; isOpen: boolean }
  private readonly order?: ChosenOrder

  constructor(
    private readonly table: Table,
    private readonly options: RecordOptions,
  ) {
    const asked = options.flowColumn === undefined ? undefined : options.flowColumn - 1
    this.flowColumn = asked !== undefined && table.numbers.includes(asked) ? asked : likeliestFlow(table)
    const named = this.namedUnit()
    this.unit = options.unit ?? named ?? 'm³/s'
    this.unitIsNamed = named !== undefined
    const cells = table.rows.map(({ cells }) => cells[this.flowColumn] ?? '')
    const chosen = chooseMark(cells)
    this.decimal = { ...chosen, ...(options.decimalMark ? { mark: options.decimalMark } : {}) }
    const { date } = table
    if (date) {
      const chosenOrder = chooseOrder(table.rows.flatMap((row) => dateIn(row, date) ?? []))
      const { dateOrder } = options
      this.order =
        dateOrder === undefined || chosenOrder.order === 'y-m-d'
          ? chosenOrder
          : { order: dateOrder, ...(chosenOrder.other ? { other: dateOrder === 'd/m/y' ? 'm/d/y' : 'd/m/y' } : {}) }
    }
  }

  /** Named over the flows' column, or, if only one is, anywhere above the data. */
  private namedUnit(): FlowUnit | undefined {
    const { head, comments } = this.table
    const over = unitsIn(head.map(({ cells }) => cells[this.flowColumn] ?? '').join(' '))
    const anywhere = unitsIn([...head.map(({ cells }) => cells.join(' ')), ...comments].join(' '))
    return over[0] ?? (anywhere.length === 1 ? anywhere[0] : undefined)
  }

  private refuse(row: Row, column: number, say: string): void {
    this.problems.push(this.problem(row, column, say, true))
  }

  private leaveOut(row: Row, column: number, say: string): void {
    this.problems.push(this.problem(row, column, say, false))
  }

  private problem({ number, cells }: Row, column: number, say: string, isRefused: boolean): RecordProblem {
    return { row: number, column: column + 1, cell: excerpt(cells[column] ?? ''), say, isRefused }
  }

  read(): DailyRecord {
    const named = nameOf(this.table, this.flowColumn)
    if (this.options.unit === undefined && !this.unitIsNamed && otherUnit.test(named))
      this.refuse(
        this.table.head.at(-1)!,
        this.flowColumn,
        `“${excerpt(named)}” names another unit than L/s, m³/s or ft³/s: work the flows over to one of these first, or say which of them it is.`,
      )
    const order = this.order?.order === 'm/d/y' ? 'm/d/y' : 'd/m/y'
    const read = this.table.rows.flatMap((row) => this.readRow(row, order) ?? [])
    const days = this.order ? this.inOrder(read) : read
    this.sayHow(days)
    return {
      days: this.problems.some(({ isRefused }) => isRefused)
        ? []
        : days.map(({ day, flow }) => (day === undefined ? { flow } : { date: isoDate(day), flow })),
      notes: this.notes,
      problems: this.problems,
      reading: this.reading(),
    }
  }

  private readRow(row: Row, order: DayOrMonthFirst): Dated | undefined {
    const cell = row.cells[this.flowColumn] ?? ''
    const flow = readNumber(cell, this.decimal.mark)
    const { date } = this.table
    let day: number | undefined
    if (date) {
      const written = dateIn(row, date)
      day = written && dayOf(written, order)
      if (day === undefined && (written || flow !== undefined)) {
        this.refuse(
          row,
          date.column,
          written
            ? `There is no such day${written.order === 'open' ? `, read as ${order}` : ''}: put the date right.`
            : 'No date can be read here, so that this flow has no day: write it as year-month-day, or take the row out.',
        )
        return undefined
      }
    }
    if (flow === undefined) {
      this.leaveOut(
        row,
        this.flowColumn,
        cell === '' ? 'No flow: left out as a gap.' : `“${excerpt(cell)}” is no flow: left out as a gap.`,
      )
      return undefined
    }
    if (flow < 0) {
      this.refuse(
        row,
        this.flowColumn,
        'A flow below nothing cannot be. If the file marks missing days so, empty the cell: the day is then a gap.',
      )
      return undefined
    }
    return {
      row,
      flow: conversion(
        'flow',
        quantities.flow.units.find(({ name }) => name === this.unit)!,
      )!.toSi(flow),
      day,
    }
  }

  /** By date, one of each; refuses a day with two flows. */
  private inOrder(read: readonly Dated[]): Dated[] {
    const isSorted = read.every(({ day }, i) => i === 0 || day! >= read[i - 1]!.day!)
    if (!isSorted) this.notes.push('The rows do not stand in the order of their dates: they were sorted.')
    const sorted = isSorted ? read : read.toSorted((a, b) => a.day! - b.day! || a.row.number - b.row.number)
    const days: Dated[] = []
    const clashes: [Dated, Dated][] = []
    let same = 0
    for (const next of sorted) {
      const last = days.at(-1)
      if (last?.day !== next.day) days.push(next)
      else if (last!.flow === next.flow) same++
      else clashes.push([last!, next])
    }
    const { column } = this.table.date!
    if (clashes.length > days.length / 2)
      this.refuse(
        clashes[0]![1].row,
        column,
        'Most dates stand here more than once, with other flows: this is no daily record. Make the mean of each day first.',
      )
    else
      for (const [first, again] of clashes)
        this.refuse(
          again.row,
          column,
          `${isoDate(again.day!)} stands in row ${first.row.number} with “${first.row.cells[this.flowColumn]!}” and here in row ${again.row.number} with “${again.row.cells[this.flowColumn]!}”: keep one of them.`,
        )
    if (same > 0) this.notes.push(`${times(same, 'row')} repeated a date with the same flow: one of each was kept.`)
    return days
  }

  private sayHow(days: readonly Dated[]): void {
    const { table, unit, options, order, decimal, notes } = this
    if (order?.other && options.dateOrder === undefined)
      notes.push(
        `The dates can be read as ${order.order} or ${order.other}: ${order.order} was taken. Choose the other if it is wrong.`,
      )
    if (table.numbers.length > 1 && options.flowColumn === undefined)
      notes.push(
        `Columns ${list(table.numbers.map((column) => String(column + 1)))} hold numbers: column ${this.flowColumn + 1}${nameOf(table, this.flowColumn) && ` (“${excerpt(nameOf(table, this.flowColumn))}”)`} was taken for the flow.`,
      )
    if (decimal.isOpen && options.decimalMark === undefined)
      notes.push(`“${decimal.mark}” was taken for the decimal mark; it could part the thousands as well.`)
    if (!this.unitIsNamed && options.unit === undefined && days.length > 0) {
      const mean = days.reduce((sum, { flow }) => sum + flow, 0) / days.length
      notes.push(
        `No unit is named: ${unit} was taken, which makes a mean of ${join(format(mean, 'flow'))}. Choose another if that is not this stream.`,
      )
    }
    if (!order) notes.push('The record has no dates: each row is taken for a day, in the order of the file.')
    const left = this.problems.filter(({ isRefused }) => !isRefused).length
    if (left > 0 && !order) notes.push(`${times(left, 'row')} without a flow ${left === 1 ? 'was' : 'were'} left out.`)
    if (!order) return
    const { missing, longest, after } = gapsOf(days.map(({ day }) => day!))
    if (missing > 0)
      notes.push(
        `${times(missing, 'day')} between the first and the last ${missing === 1 ? 'has' : 'have'} no flow, ${longest === missing ? '' : `the longest run ${times(longest, 'day')} `}from ${isoDate(after + 1)}: left out, not made up.`,
      )
  }

  private reading(): Reading {
    const { table, flowColumn, unit, unitIsNamed, order, decimal } = this
    const other = decimal.mark === '.' ? ',' : '.'
    return {
      flowColumn: flowColumn + 1,
      flowColumns: table.numbers.map((column) => ({ column: column + 1, name: nameOf(table, column) })),
      unit,
      unitIsNamed,
      ...(order ? { dateOrder: order.order, ...(order.other ? { otherDateOrder: order.other } : {}) } : {}),
      decimalMark: decimal.mark,
      ...(decimal.isOpen ? { otherDecimalMark: other } : {}),
    }
  }
}

/**
 * Reads a record of daily flows: columns parted by tabs, semicolons, bars, commas or spaces; with names above or none; comment lines that
 * start with #; dates (with or without a time) in any of the usual orders, or none at all; decimal point or comma. What the data leave open
 * is taken one way, told in `notes` and `reading`, and can be chosen by `options` in another reading. Rows that cannot be used are in
 * `problems`: a flow that is missing leaves a gap; a negative flow, a date that is none, or two flows for one day refuse the record.
 */
export const readDailyRecord = (text: string, options: RecordOptions = {}): DailyRecord => {
  const table = readTable(text.replace(/^\uFEFF/, ''))
  if ('say' in table) return { days: [], notes: [], problems: [{ ...table, column: 1, isRefused: true }] }
  if (table.commasTwice) {
    const { number, cells } = table.rows[0]!
    const say =
      'Commas stand between the columns and in the numbers as well, so that they cannot be told apart: save the file with semicolons or tabs between its columns.'
    return {
      days: [],
      notes: [],
      problems: [{ row: number, column: 1, cell: excerpt(cells.join(',')), say, isRefused: true }],
    }
  }
  return new RecordReader(table, options).read()
}
