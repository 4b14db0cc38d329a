import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import {
  curve,
  curveOf,
  dailyFlows,
  flashyBelow,
  flowReached,
  leastDaysForQ95,
  meanOf,
  rankAt,
  ranked,
} from './daily-flows.ts'
import { flashyYear } from './example-record.ts'

/** A stream's years differ: below so many, one dry or wet year can lead astray (common practice, no source). */
const fewYears = 10
const daysOfYear = 365

const shares = [
  { key: 'q10', share: 0.1, say: 'one day in ten' },
  { key: 'q50', share: 0.5, say: 'half of the days' },
  { key: 'q80', share: 0.8, say: 'four days in five' },
  { key: 'q95', share: 0.95, say: 'all but one day in twenty' },
] as const

/**
 * The flow-duration curve of a record of daily flows: how much of the time each flow is reached or passed. The days are ranked from the
 * greatest; rank m of n days stands at m/(n + 1) (Weibull's plotting position), with straight lines between. Flows in m³/s, shares 0–1.
 * `curve` has a point for each day of a record of up to 99 days; a longer one is read at each whole per cent, with its greatest and its
 * least day at the ends. Refused: fewer than 19 days, whose positions do not reach 95 %; a record without any water (`no-solution`).
 * Sources below.
 */
export const flowDuration = defineCalculator({
  id: 'flow-duration',
  station: 'stream',
  title: 'Flow-duration curve',
  summary: 'How much of the year the stream gives a flow or more, from a record of daily flows.',
  hazards: [],
  inputs: { dailyFlows },
  outputs: {
    meanFlow: { kind: 'scalar', symbol: 'Q_m', label: 'Mean flow', quantity: 'flow' },
    q10: { kind: 'scalar', symbol: 'Q_{10}', label: 'Q10, reached a tenth of the time', quantity: 'flow' },
    q50: { kind: 'scalar', symbol: 'Q_{50}', label: 'Q50, reached half of the time', quantity: 'flow' },
    q80: { kind: 'scalar', symbol: 'Q_{80}', label: 'Q80, reached four fifths of the time', quantity: 'flow' },
    q95: { kind: 'scalar', symbol: 'Q_{95}', label: 'Q95, reached 95 % of the time', quantity: 'flow' },
    q95OverMean: {
      kind: 'scalar',
      symbol: 'r',
      label: 'Q95 over the mean',
      quantity: 'fraction',
      help: 'how well springs hold the stream up: under a tenth it is flashy',
    },
    curve,
  },
  solve({ dailyFlows }) {
    const days = dailyFlows.length
    if (days < leastDaysForQ95)
      throw new CalculationError(
        'no-solution',
        'dailyFlows',
        `${days === 1 ? 'One day has' : `${days} days have`} no flow of 95 % of the time: give at least ${leastDaysForQ95} days, better whole years.`,
      )
    const meanFlow = meanOf(dailyFlows)
    if (meanFlow === 0)
      throw new CalculationError(
        'no-solution',
        'dailyFlows',
        'No water on any day: give a record of a stream that ran.',
      )
    const flows = ranked(dailyFlows)
    const q95 = flowReached(flows, 0.95)
    return {
      meanFlow,
      q10: flowReached(flows, 0.1),
      q50: flowReached(flows, 0.5),
      q80: flowReached(flows, 0.8),
      q95,
      q95OverMean: q95 / meanFlow,
      curve: curveOf(flows),
    }
  },
  working(write, { dailyFlows }, { meanFlow }) {
    const days = dailyFlows.length
    const flows = ranked(dailyFlows)
    const count = { symbol: 'n', value: days, say: 'the number of days', digits: 5 }
    const total = { symbol: '\\textstyle\\sum Q', value: meanFlow * days, say: 'the sum of the daily flows' }
    return [
      {
        say: 'The mean of all days.',
        formula: write`${'meanFlow'} = \frac{${total}}{${count}}`,
        gives: 'meanFlow',
      },
      {
        say: `Write the ${days} days in order from the greatest flow: rank 1 is the highest spate, rank ${days} the driest day. A share of the time stands at the rank of that share of ${days} + 1 (Weibull’s plotting position).`,
      },
      ...shares.map(({ key, share, say }) => {
        const { above, part } = rankAt(share, days)
        const day = (rank: number) => ({
          symbol: `Q_{(${rank})}`,
          value: flows[rank - 1]!,
          say: `the flow of rank ${rank}`,
        })
        const between = { symbol: String(Number(part.toFixed(2))), value: part, say: 'the part between', digits: 2 }
        const stands = `${share} × ${days + 1} = ${Number((above + part).toFixed(2))}`
        return part < 1e-9
          ? {
              say: `Reached or passed on ${say}: rank ${stands}.`,
              formula: write`${key} = ${day(above)}`,
              gives: key,
            }
          : {
              say: `Reached or passed on ${say}: rank ${stands}, that far between two days.`,
              formula: write`${key} = ${day(above)} - ${between} \, (${day(above)} - ${day(above + 1)})`,
              gives: key,
            }
      }),
      {
        say: 'The low flow beside the mean shows how even the stream is.',
        formula: write`${'q95OverMean'} = \frac{${'q95'}}{${'meanFlow'}}`,
        gives: 'q95OverMean',
      },
    ]
  },
  cautions: ({ dailyFlows }, { q95OverMean }) => [
    ...(dailyFlows.length < daysOfYear
      ? [
          {
            level: 'check' as const,
            about: ['dailyFlows' as const],
            say: `${dailyFlows.length} days are less than a year: seasons are missing, and the curve is that of these days alone. Take a whole year or more.`,
          },
        ]
      : dailyFlows.length < fewYears * daysOfYear
        ? [
            {
              level: 'note' as const,
              about: ['dailyFlows' as const],
              say: 'One dry or wet year moves the whole curve. Set it beside a long record of a gauge nearby, ten years or more, before you build on it.',
            },
          ]
        : []),
    ...(q95OverMean < flashyBelow
      ? [
          {
            level: 'check' as const,
            about: ['q95OverMean' as const],
            say: 'The low flow is under a tenth of the mean: a flashy stream, whose mean is made by spates that no pipe can take (common practice, no source). Size for the flows of half of the time and less.',
          },
        ]
      : []),
    {
      level: 'note',
      about: ['q95'],
      say: 'What must stay in the stream, and what may be taken, is for the abstraction licence: it is often told by Q95. Ask the local authority early.',
    },
  ],
  doesNotCheck: [
    'whether the record was read right, or gaps were left out of its dry or wet season',
    'what the residual flow leaves for the pipe: annual-energy takes it off',
    'how high a flood comes within a day',
  ],
  example: {
    say: 'The beck at Over Quern in a wet year: high spates, gone in two days.',
    inputs: { dailyFlows: flashyYear },
  },
  plots: [
    {
      say: 'The steeper the curve falls, the more the stream lives by its spates.',
      rows: 'curve',
      x: 'exceedance',
      y: ['flow'],
    },
  ],
  sources: [
    {
      author: 'W. Weibull',
      title: 'A statistical theory of the strength of materials',
      year: 1939,
      where: 'the plotting position m/(n + 1), as used in hydrology',
    },
    {
      author: 'J. K. Searcy',
      title: 'Flow-duration curves, Manual of hydrology part 2 (U.S. Geological Survey Water-Supply Paper 1542-A)',
      year: 1959,
    },
  ],
})
