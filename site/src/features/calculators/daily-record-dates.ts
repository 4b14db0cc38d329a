/** Dates of a record as they are written: which day they mean where that is plain, both parts where it is not. */

export type DateOrder = 'y-m-d' | 'd/m/y' | 'm/d/y'
/** The orders between which only the data can decide. */
export type DayOrMonthFirst = Exclude<DateOrder, 'y-m-d'>

export type WrittenDate = { year: number } & (
  | { order: 'plain'; month: number; day: number }
  /** Two numbers that may be day and month, or month and day. */
  | { order: 'open'; first: number; second: number }
)

const months = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec']
const monthOf = (name: string): number => months.indexOf(name.slice(0, 3).toLowerCase()) + 1

/** Years of two digits: 50 to 99 are of the last century. */
const wholeYear = (text: string): number =>
  text.length > 2 ? Number(text) : Number(text) + (Number(text) < 50 ? 2000 : 1900)

const yearFirst = /^(\d{4})([-/. ])(\d{1,2})\2(\d{1,2})$/
const yearLast = /^(\d{1,2})([-/. ])(\d{1,2})\2(\d{4}|\d{2})$/
const compact = /^(1[6-9]\d\d|2[01]\d\d)(\d\d)(\d\d)$/
const named = /^(\d{1,2})[-/. ]+([a-z]{3,9})\.?[-/., ]+(\d{4}|\d{2})$/i
const nameFirst = /^([a-z]{3,9})\.?[- ]+(\d{1,2})[-, ]+(\d{4})$/i
/** Nothing but a time may stand behind a date: with more, columns were not parted. */
const timeOfDay = /[T, ]\s*\d{1,2}:\d{2}(:\d{2}(\.\d+)?)?\s*([ap]\.?m\.?|z|utc|gmt|[+-]\d{2}:?\d{2})?$/i

/** A date as written, its time of day left away; undefined where the text is none. */
export const readDate = (text: string): WrittenDate | undefined => {
  const date = text.includes(':') ? text.replace(timeOfDay, '').trim() : text
  let parts = yearFirst.exec(date)
  if (parts) return { order: 'plain', year: Number(parts[1]), month: Number(parts[3]), day: Number(parts[4]) }
  parts = yearLast.exec(date)
  if (parts) return { order: 'open', year: wholeYear(parts[4]!), first: Number(parts[1]), second: Number(parts[3]) }
  parts = compact.exec(date)
  if (parts) return { order: 'plain', year: Number(parts[1]), month: Number(parts[2]), day: Number(parts[3]) }
  parts = named.exec(date)
  if (parts && monthOf(parts[2]!) > 0)
    return { order: 'plain', year: wholeYear(parts[3]!), month: monthOf(parts[2]!), day: Number(parts[1]) }
  parts = nameFirst.exec(date)
  if (parts && monthOf(parts[1]!) > 0)
    return { order: 'plain', year: Number(parts[3]), month: monthOf(parts[1]!), day: Number(parts[2]) }
  return undefined
}

const millisecondsPerDay = 86_400_000

const dayNumber = (year: number, month: number, day: number): number | undefined => {
  const time = Date.UTC(year, month - 1, day)
  const back = new Date(time)
  return back.getUTCMonth() === month - 1 && back.getUTCDate() === day ? time / millisecondsPerDay : undefined
}

/** Days since 1 January 1970; undefined for a day that no calendar has. */
export const dayOf = (date: WrittenDate, order: DayOrMonthFirst): number | undefined => {
  if (date.order === 'plain') return dayNumber(date.year, date.month, date.day)
  const { year, first, second } = date
  return order === 'd/m/y' ? dayNumber(year, second, first) : dayNumber(year, first, second)
}

/** A day as ISO 8601 writes it. */
export const isoDate = (day: number): string => new Date(day * millisecondsPerDay).toISOString().slice(0, 10)

/** How many dates have a calendar day in an order, and how many follow the one before by a day. */
const fit = (dates: readonly WrittenDate[], order: DayOrMonthFirst) => {
  let real = 0
  let steps = 0
  let last: number | undefined
  for (const date of dates) {
    const day = dayOf(date, order)
    if (day !== undefined) real++
    if (day !== undefined && last !== undefined && Math.abs(day - last) === 1) steps++
    last = day
  }
  return { real, steps }
}

export interface ChosenOrder {
  order: DateOrder
  /** The order that fits as well, where nothing decides between them. */
  other?: DayOrMonthFirst
}

/** The order in which a column writes day and month: the one that makes more real days, then more that follow on; else day first. */
export const chooseOrder = (dates: readonly WrittenDate[]): ChosenOrder => {
  if (!dates.some(({ order }) => order === 'open')) return { order: 'y-m-d' }
  const dayFirst = fit(dates, 'd/m/y')
  const monthFirst = fit(dates, 'm/d/y')
  const better = dayFirst.real - monthFirst.real || dayFirst.steps - monthFirst.steps
  if (better !== 0) return { order: better > 0 ? 'd/m/y' : 'm/d/y' }
  // 5/5/2001 reads the same both ways.
  const isOpen = dates.some((date) => date.order === 'open' && date.first !== date.second)
  return isOpen ? { order: 'd/m/y', other: 'm/d/y' } : { order: 'd/m/y' }
}
