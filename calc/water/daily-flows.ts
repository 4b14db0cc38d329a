import type { Output, Series } from '../definition.ts'
import { exampleYear } from './example-record.ts'

/** A record of the stream, one mean flow for each day, in the order of the days. */
export const dailyFlows = {
  kind: 'series',
  symbol: 'Q',
  label: 'Daily flows',
  row: 'day',
  quantity: 'flow',
  help: 'the mean flow of each day: from the nearest gauging station scaled to this catchment, or read every day on a weir',
  range: [0, 10_000],
  least: 1,
  most: 40_000,
  long: true,
  initial: exampleYear,
} as const satisfies Series

/** The stream's flow-duration curve, as it is drawn. */
export const curve = {
  kind: 'rows',
  label: 'Flow-duration curve',
  columns: {
    exceedance: { kind: 'scalar', symbol: 'p', label: 'Share of the time', quantity: 'fraction' },
    flow: { kind: 'scalar', symbol: 'Q_p', label: 'Flow reached or passed', quantity: 'flow' },
  },
} as const satisfies Output

/** Below this share of the mean the low flow (Q95) is that of a stream that runs off quickly; common practice, no source. */
export const flashyBelow = 0.1

const daysPerYear = 365.25

/** Whether a record holds whole years, give or take the leap days and one day more. */
export const isWholeYears = (days: number): boolean => {
  const years = Math.max(1, Math.round(days / daysPerYear))
  return Math.abs(days - years * daysPerYear) <= 1 + years * (daysPerYear - Math.floor(daysPerYear))
}

export const meanOf = (flows: ArrayLike<number>): number => {
  let sum = 0
  for (let i = 0; i < flows.length; i++) sum += flows[i]!
  return sum / flows.length
}

/** The flows from the greatest to the least. */
export const ranked = (flows: readonly number[]): Float64Array => Float64Array.from(flows).sort().reverse()

/** Where a share of the time falls among ranked days: between rank `above` and the next one, `part` of the way. Ranks count from 1. */
export const rankAt = (exceedance: number, days: number): { above: number; part: number } => {
  const rank = Math.min(Math.max(exceedance * (days + 1), 1), days)
  const above = Math.floor(rank)
  return { above, part: rank - above }
}

/**
 * The flow reached or passed for a share of the time, from ranked flows: rank m of n days stands at m/(n + 1) (Weibull's plotting
 * position), linear between. A share beyond the first or the last rank is answered with that rank's flow: ask only within 1/(n + 1) and
 * n/(n + 1).
 */
export const flowReached = (flows: Float64Array, exceedance: number): number => {
  const { above, part } = rankAt(exceedance, flows.length)
  const flow = flows[above - 1]!
  return part === 0 ? flow : flow + part * (flows[above]! - flow)
}

const wholePerCents = 99

/**
 * The curve from ranked flows. Up to 99 days each day is a point of its own, at m/(n + 1). A longer record is read at each whole per cent,
 * with its greatest and its least day at the ends: a curve of a hundred points says as much as one of ten thousand.
 */
export const curveOf = (flows: Float64Array): { exceedance: number; flow: number }[] => {
  const days = flows.length
  const point = (rank: number) => ({ exceedance: rank / (days + 1), flow: flows[rank - 1]! })
  if (days <= wholePerCents) return Array.from({ length: days }, (_, i) => point(i + 1))
  const perCents = Array.from({ length: wholePerCents }, (_, i) => {
    const exceedance = (i + 1) / 100
    return { exceedance, flow: flowReached(flows, exceedance) }
  })
  return [point(1), ...perCents, point(days)]
}

/** From so many days up the positions m/(n + 1) reach 95 % (19/20): a shorter record has no Q95. */
export const leastDaysForQ95 = 19
