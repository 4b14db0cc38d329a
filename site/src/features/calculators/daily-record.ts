import Papa from 'papaparse'

/** A record of daily flows as a file holds it: a date and a flow in each row, whatever its delimiters, commas, dates and gaps. */

export const flowUnits = ['L/s', 'm³/s', 'ft³/s'] as const
export type FlowUnit = (typeof flowUnits)[number]
export type DateOrder = 'day-first' | 'month-first'

/** What the file does not say clearly, decided by its owner. */
export interface RecordOptions {
  unit?: FlowUnit
  dateOrder?: DateOrder
  /** By its place from 0. */
  flowColumn?: number
}

/** A cell that is no flow of a day. Row and column count from 1, as a spreadsheet shows them. */
export interface RecordProblem {
  row: number
  column: number
  cell: string
  say: string
}

export interface DailyRecord {
  /** In order of their dates; flows in m³/s. */
  days: readonly { date?: string; flow: number }[]
  /** Days between the first and the last of which there is no flow. */
  missing: number
  unit: FlowUnit
  /** The file does not name a unit: that one was taken. */
  isUnitGuessed: boolean
  dateOrder?: DateOrder
  /** The dates can be read in both orders. */
  isOrderGuessed: boolean
  /** Columns that could be the flow, by place and name. */
  flowColumns: readonly { column: number; name: string }[]
  flowColumn: number
  /** What was understood, in sentences. */
  notes: readonly string[]
  /** Cells that were left out: their days are gaps. */
  leftOut: readonly RecordProblem[]
}

export type RecordReading = { record: DailyRecord } | { refused: string; problems: readonly RecordProblem[] }

const toSi: Readonly<Record<FlowUnit, number>> = { 'L/s': 0.001, 'm³/s': 1, 'ft³/s': 0.3048 ** 3 }
const unitWords: readonly (readonly [RegExp, FlowUnit])[] = [
  [/\bft3|\bft³|ft\^3|cfs|cusec/i, 'ft³/s'],
  [/\bm3|\bm³|m\^3|cumec|\bcms\b/i, 'm³/s'],
  [/\bl\s*\/\s*s|\blps\b|\bl\/sec|lit(?:re|er)s? per second/i, 'L/s'],
]

const day = 86_400_000

/** `12,5` and `1.234,5` as well as `12.5` and `1,234.5`; undefined for what is no number. */
const numberIn = (cell: string): number | undefined => {
  const text = cell.trim().replace(/[\u00a0\u202f ']/g, '')
  if (!/^[+\-−]?(?:\d+(?:[.,]\d*)?|[.,]\d+|\d{1,3}(?:[.,]\d{3})+[.,]\d*)(?:e[+-]?\d+)?$/i.test(text)) return undefined
  const mark = Math.max(text.lastIndexOf('.'), text.lastIndexOf(','))
  const plain = mark < 0 ? text : `${text.slice(0, mark).replace(/[.,]/g, '')}.${text.slice(mark + 1)}`
  return Number(plain.replace('−', '-'))
}

interface DateParts {
  year: number
  a: number
  b: number
  isYearFirst: boolean
}

const datePattern = /^(\d{4}|\d{1,2})[-/. ](\d{1,2})[-/. ](\d{4}|\d{2})(?:[T ,].*)?$/
const compactPattern = /^(\d{4})(\d{2})(\d{2})$/

const dateParts = (cell: string): DateParts | undefined => {
  const text = cell.trim()
  const compact = compactPattern.exec(text)
  const [, first, second, third] = compact ?? datePattern.exec(text) ?? []
  if (first === undefined || second === undefined || third === undefined) return undefined
  if (first.length === 4) return { year: Number(first), a: Number(second), b: Number(third), isYearFirst: true }
  const short = Number(third)
  const year = third.length === 4 ? short : short < 70 ? 2000 + short : 1900 + short
  return { year, a: Number(first), b: Number(second), isYearFirst: false }
}

/** Milliseconds of the day in UTC; undefined where there is no such day. */
const timeOf = ({ year, a, b, isYearFirst }: DateParts, order: DateOrder): number | undefined => {
  const [month, date] = isYearFirst || order === 'month-first' ? [a, b] : [b, a]
  const time = Date.UTC(year, month - 1, date)
  const back = new Date(time)
  return back.getUTCMonth() === month - 1 && back.getUTCDate() === date ? time : undefined
}

const isoDate = (time: number) => new Date(time).toISOString().slice(0, 10)
const longDate = (time: number) =>
  new Date(time).toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })

interface Row {
  /** From 1, as in the file. */
  number: number
  cells: readonly string[]
}

const delimiters = ['\t', ';', '|', ','] as const

/** Rows of cells, comments and blank lines left out. A comma is a delimiter only where nothing else is. */
const rowsOf = (text: string): Row[] => {
  const lines = text.replace(/^\ufeff/, '').split(/\r\n?|\n/)
  const kept = lines.flatMap((line, i) => (line.trim() === '' || line.startsWith('#') ? [] : [{ line, number: i + 1 }]))
  const sample = kept.slice(0, 50).map(({ line }) => line)
  const delimiter = delimiters.find((mark) => sample.filter((line) => line.includes(mark)).length > sample.length / 2)
  return kept.map(({ line, number }) => {
    if (delimiter === undefined) return { number, cells: splitAtSpaces(line) }
    const [cells = []] = Papa.parse<string[]>(line, { delimiter }).data
    return { number, cells: joinDecimals(cells, delimiter) }
  })
}

/** A date may be followed by a time: that is no cell of its own. */
const splitAtSpaces = (line: string): string[] =>
  line
    .trim()
    .replace(/(\d[-/.]\d{1,2}[-/.]\d+) \d{1,2}:\d{2}(?::\d{2})?/, '$1')
    .split(/\s+/)

/** `1/10/1999,3,03` with commas both between and inside: the last two are one number. */
const joinDecimals = (cells: readonly string[], delimiter: string): string[] => {
  const [date = '', whole = '', part = '', ...more] = cells
  const isSplit = delimiter === ',' && more.length === 0 && dateParts(date) && /^\d+$/.test(whole) && /^\d+$/.test(part)
  return isSplit ? [date, `${whole},${part}`] : [...cells]
}

const most = <T>(values: readonly T[], weigh: (value: T) => number): T | undefined =>
  values.reduce<T | undefined>(
    (best, value) => (best === undefined || weigh(value) > weigh(best) ? value : best),
    undefined,
  )

/** Which order makes the dates follow each other day by day. */
const orderOf = (parts: readonly DateParts[]): { order: DateOrder; isGuessed: boolean } | undefined => {
  const score = (order: DateOrder) => {
    const times = parts.map((one) => timeOf(one, order))
    if (times.includes(undefined)) return -1
    return times.filter((time, i) => i > 0 && time! - times[i - 1]! === day).length
  }
  const [byDay, byMonth] = [score('day-first'), score('month-first')]
  if (byDay < 0 && byMonth < 0) return undefined
  return {
    order: byMonth > byDay ? 'month-first' : 'day-first',
    isGuessed: byDay === byMonth && !parts[0]!.isYearFirst,
  }
}

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`

/**
 * Reads a text as a record of daily flows. Understood: tab, semicolon, bar, comma or space between cells; decimal comma or point; a heading
 * or none; lines that start with #; dates as y-m-d, d/m/y or m/d/y, with a time or without; flows in L/s, m³/s or ft³/s. Days without a flow
 * and cells that are no number are gaps, told by row and column. Refused, with their rows: a date with two different flows, a flow below
 * zero, dates that are none, and what is no table of flows.
 */
export const readDailyRecord = (text: string, options: RecordOptions = {}): RecordReading => {
  const refuse = (refused: string, problems: readonly RecordProblem[] = []): RecordReading => ({ refused, problems })
  const rows = rowsOf(text)
  const width = Math.max(0, ...rows.slice(0, 200).map(({ cells }) => cells.length))
  const places = Array.from({ length: width }, (_, i) => i)
  const body = rows.filter(({ cells }) =>
    cells.some((cell) => numberIn(cell) !== undefined || dateParts(cell) !== undefined),
  )
  if (body.length === 0) return refuse('There is no row with a number here: give a date and a flow in each row.')
  const share = (column: number, test: (cell: string) => boolean) =>
    body.slice(0, 300).filter(({ cells }) => test(cells[column] ?? '')).length / Math.min(300, body.length)
  const dateColumn = most(places, (column) => share(column, (cell) => dateParts(cell) !== undefined))!
  const hasDates = share(dateColumn, (cell) => dateParts(cell) !== undefined) > 0.5
  const data = hasDates ? body.filter(({ cells }) => dateParts(cells[dateColumn] ?? '') !== undefined) : body
  const firstData = data[0]!.number
  const heading =
    rows.find(({ number, cells }) => number < firstData && cells.length > 1) ??
    rows.find(({ number }) => number < firstData)
  const nameOf = (column: number) => heading?.cells[column]?.trim() || `Column ${column + 1}`

  const numeric = places.filter(
    (column) => (!hasDates || column !== dateColumn) && share(column, (cell) => numberIn(cell) !== undefined) > 0.5,
  )
  if (numeric.length === 0)
    return refuse('No column holds numbers that could be flows: give a date and a flow in each row.')
  const varies = (column: number) => new Set(data.slice(0, 300).map(({ cells }) => cells[column])).size
  const named = numeric.find((column) =>
    /flow|discharge|debit|débit|abfluss|\bq\b|m3|m³|l\/s|cfs/i.test(nameOf(column)),
  )
  const flowColumn =
    options.flowColumn !== undefined && numeric.includes(options.flowColumn)
      ? options.flowColumn
      : (named ?? most(numeric, varies)!)

  const words = heading?.cells.join(' ') ?? ''
  const told =
    unitWords.find(([pattern]) => pattern.test(nameOf(flowColumn)))?.[1] ??
    unitWords.find(([pattern]) => pattern.test(words))?.[1]
  const unit = options.unit ?? told ?? 'm³/s'

  const order = hasDates ? orderOf(data.map(({ cells }) => dateParts(cells[dateColumn]!)!)) : undefined
  const dateOrder = options.dateOrder ?? order?.order ?? 'day-first'
  const problem = ({ number, cells }: Row, column: number, say: string): RecordProblem => ({
    row: number,
    column: column + 1,
    cell: cells[column] ?? '',
    say,
  })

  const refusedCells: RecordProblem[] = []
  const leftOut: RecordProblem[] = []
  const byTime = new Map<number, { flow: number; row: Row }>()
  const plain: number[] = []
  let repeats = 0
  for (const row of data) {
    const time = hasDates ? timeOf(dateParts(row.cells[dateColumn]!)!, dateOrder) : undefined
    if (hasDates && time === undefined) {
      refusedCells.push(problem(row, dateColumn, 'There is no such day in this order of day and month.'))
      continue
    }
    const cell = row.cells[flowColumn] ?? ''
    const number = numberIn(cell)
    if (number === undefined) {
      leftOut.push(problem(row, flowColumn, cell.trim() === '' ? 'Empty: a gap.' : 'No number: a gap.'))
      continue
    }
    if (number < 0) {
      refusedCells.push(problem(row, flowColumn, 'A flow is never below zero.'))
      continue
    }
    const flow = number * toSi[unit]
    if (time === undefined) {
      plain.push(flow)
      continue
    }
    const before = byTime.get(time)
    if (before && before.flow !== flow)
      refusedCells.push(
        problem(
          row,
          flowColumn,
          `${longDate(time)} has another flow in row ${before.row.number}: give one flow for each day.`,
        ),
      )
    else if (before) repeats++
    else byTime.set(time, { flow, row })
  }
  if (refusedCells.length > 0)
    return refuse(
      `${counted(refusedCells.length, 'row')} cannot be taken as they stand: mend them, or take them out.`,
      refusedCells,
    )

  const times = [...byTime.keys()]
  const sorted = times.toSorted((a, b) => a - b)
  const days = hasDates
    ? sorted.map((time) => ({ date: isoDate(time), flow: byTime.get(time)!.flow }))
    : plain.map((flow) => ({ flow }))
  if (days.length === 0) return refuse('No day has a flow that is a number.', leftOut)
  const [first, last] = [sorted[0]!, sorted.at(-1)!]
  const missing = hasDates ? Math.round((last - first) / day) + 1 - days.length : 0
  const isSorted = times.every((time, i) => time === sorted[i])
  const notes = [
    hasDates
      ? `${counted(days.length, 'day')}, ${longDate(first)} to ${longDate(last)}.`
      : `${counted(days.length, 'flow')} without dates, taken as days one after another.`,
    ...(missing > 0 ? [`${counted(missing, 'day')} between them ${missing === 1 ? 'has' : 'have'} no flow.`] : []),
    ...(repeats > 0 ? [`${counted(repeats, 'row')} said the same day and flow again and counted once.`] : []),
    ...(isSorted ? [] : ['The rows were not in the order of their dates; they are now.']),
  ]
  return {
    record: {
      days,
      missing,
      unit,
      isUnitGuessed: told === undefined,
      ...(hasDates && !dateParts(data[0]!.cells[dateColumn]!)!.isYearFirst ? { dateOrder } : {}),
      isOrderGuessed: order?.isGuessed ?? false,
      flowColumns: numeric.map((column) => ({ column, name: nameOf(column) })),
      flowColumn,
      notes,
      leftOut,
    },
  }
}
