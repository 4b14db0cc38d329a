import { gravity, secondsPerYear } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import type { Aside } from '../formula.ts'
import { format, join } from '../units/format.ts'
import {
  curve,
  curveOf,
  dailyFlows,
  flashyBelow,
  flowReached,
  isWholeYears,
  leastDaysForQ95,
  meanOf,
  ranked,
} from './daily-flows.ts'
import { flashyYear } from './example-record.ts'
import { waterTemperature } from './inputs.ts'
import { checkPoints, operation, rising, shareOfPeak } from './plant-operation.ts'
import { waterDensity } from './properties.ts'

/**
 * The energy of a year from daily flows: each day the plant takes min(design flow, share·(stream − residual flow)), nothing where that is
 * less than it can run on, rounded down to what its fixed nozzles pass where these are given; the loss grows with the square of the take;
 * power ρgq(H − h)·η with η by the share of the design flow. SI; the year is the mean day × 365, times the share of the time that the plant
 * is fit to run. `capacityFactor` is over the power at design flow. `curve` is the stream's, as of flow-duration. Refused: a loss at design
 * flow that eats the head, two efficiencies at one flow (`inconsistent`), no efficiency at design flow (`no-solution`). Sources below.
 */
export const annualEnergy = defineCalculator({
  id: 'annual-energy',
  station: 'stream',
  title: 'Energy of a year',
  summary: 'What a plant of this size makes in a year on this stream, once the stream has kept its share.',
  hazards: [],
  inputs: {
    dailyFlows,
    residualFlow: {
      kind: 'scalar',
      symbol: 'Q_r',
      label: 'Residual flow',
      quantity: 'flow',
      help: 'what must stay in the stream first, by the licence',
      range: [0, 10_000],
      initial: 0.003,
    },
    designFlow: {
      kind: 'scalar',
      symbol: 'Q_d',
      label: 'Design flow',
      quantity: 'flow',
      help: 'the most that the plant takes',
      range: [1e-5, 10_000],
      initial: 0.0095,
    },
    minimumFlow: {
      kind: 'scalar',
      symbol: 'Q_n',
      label: 'Least flow to run on',
      quantity: 'flow',
      help: 'below it the plant stands still',
      range: [0, 10_000],
      initial: 0.002,
    },
    grossHead: {
      kind: 'scalar',
      symbol: 'H_g',
      label: 'Gross head',
      quantity: 'head',
      help: 'from the water at the intake to the jet’s centre line',
      range: [0.1, 2000],
      usual: [2, 500],
      initial: 48,
    },
    lossAtDesign: {
      kind: 'scalar',
      symbol: 'h_d',
      label: 'Loss at design flow',
      quantity: 'head',
      help: 'what the whole pipe takes when it runs full: see penstock',
      range: [0, 2000],
      initial: 2.9,
    },
    peakEfficiency: {
      kind: 'scalar',
      symbol: '\\eta_p',
      label: 'Best efficiency',
      quantity: 'fraction',
      help: 'from the net head to where the energy is counted: runner, drive, alternator, cable',
      range: [0.01, 1],
      usual: [0.35, 0.85],
      initial: 0.55,
    },
    partFlowEfficiency: {
      kind: 'rows',
      label: 'Efficiency at part flow',
      row: 'point',
      help: 'shares of the best efficiency; without it the best counts at every flow',
      columns: {
        flowFraction: {
          kind: 'scalar',
          label: 'Share of the design flow',
          quantity: 'fraction',
          range: [0, 1],
        },
        efficiency: {
          kind: 'scalar',
          label: 'Share of the best efficiency',
          quantity: 'fraction',
          range: [0, 1],
          usual: [0.3, 1],
        },
      },
      least: 1,
      most: 30,
      optional: true,
    },
    takeShare: {
      kind: 'scalar',
      symbol: 's',
      label: 'Share that may be taken',
      quantity: 'fraction',
      help: 'of what runs above the residual flow, where the licence lets less than all be taken',
      range: [0, 1],
      fallback: 1,
      optional: true,
    },
    availability: {
      kind: 'scalar',
      symbol: 'A',
      label: 'Availability',
      quantity: 'fraction',
      help: 'the share of the time that nothing is blocked, frozen or broken',
      range: [0, 1],
      usual: [0.7, 1],
      fallback: 1,
      optional: true,
    },
    nozzleSteps: {
      kind: 'series',
      label: 'Flows of the fixed nozzles',
      row: 'step',
      quantity: 'flow',
      help: 'what can be passed with one, two, all of them open; leave it out with a needle',
      range: [1e-6, 10_000],
      least: 1,
      most: 30,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    energyPerYear: { kind: 'scalar', symbol: 'E', label: 'Energy in a year', quantity: 'energy' },
    capacityFactor: {
      kind: 'scalar',
      symbol: 'f_c',
      label: 'Capacity factor',
      quantity: 'fraction',
      help: 'the energy over that of a year at design flow',
    },
    runningFraction: {
      kind: 'scalar',
      symbol: 'f_r',
      label: 'Share of the days it runs',
      quantity: 'fraction',
      help: 'by the water alone',
    },
    curve,
  },
  solve(given) {
    const { dailyFlows, grossHead, lossAtDesign, designFlow, availability, partFlowEfficiency } = given
    if (lossAtDesign >= grossHead)
      throw new CalculationError(
        'inconsistent',
        'lossAtDesign',
        `The loss at design flow must be less than the gross head of ${join(format(grossHead, 'head'))}: take a wider pipe or less water.`,
      )
    checkPoints(partFlowEfficiency)
    const { takeOf, powerOf } = operation(given)
    const designPower = powerOf(designFlow)
    if (designPower === 0)
      throw new CalculationError(
        'no-solution',
        'partFlowEfficiency',
        'At design flow the efficiency must be more than nothing: the capacity factor is over the power there.',
      )
    let total = 0
    let running = 0
    for (const flow of dailyFlows) {
      const take = takeOf(flow)
      if (take === 0) continue
      running++
      total += powerOf(take)
    }
    const meanPower = total / dailyFlows.length
    return {
      energyPerYear: meanPower * secondsPerYear * availability,
      capacityFactor: (meanPower * availability) / designPower,
      runningFraction: running / dailyFlows.length,
      curve: curveOf(ranked(dailyFlows)),
    }
  },
  working(write, given, { runningFraction }) {
    const { dailyFlows, designFlow, minimumFlow, partFlowEfficiency, nozzleSteps } = given
    const { takeOf, powerOf } = operation(given)
    const days = dailyFlows.length
    const flow = (value: number) => join(format(value, 'flow'))
    const middling = flowReached(ranked(dailyFlows), 0.5)
    const taken = takeOf(middling)
    const aside = (symbol: string, value: number, say: string, unit?: string): Aside => ({ symbol, value, say, unit })
    const q = aside('q', taken, 'the take')
    const h = aside('h', given.lossAtDesign * (taken / designFlow) ** 2, 'the loss')
    const density = aside('\\rho', waterDensity(given.waterTemperature), 'the density of water')
    const meanPower = aside('\\bar{P}', meanOf(dailyFlows.map((each) => powerOf(takeOf(each)))), 'the mean power')
    const designPower = aside('P_d', powerOf(designFlow), 'the power at design flow')
    const year = { ...aside('t', secondsPerYear, 'the seconds in a year'), digits: 5 }
    const atDesign = partFlowEfficiency && shareOfPeak(rising(partFlowEfficiency), 1)
    return [
      {
        say: `Each day its own take. On the middling day the stream gives ${flow(middling)}; of what is above the residual flow the plant may have`,
        formula: write`${'takeShare'} \, (${aside('Q_{50}', middling, 'the stream’s flow')} - ${'residualFlow'}) = ${aside('q_m', given.takeShare * (middling - given.residualFlow), 'the flow that may be taken', 'm³/s')}`,
      },
      taken === 0
        ? {
            say: `That is less than it runs on (${flow(nozzleSteps ? Math.max(minimumFlow, Math.min(...nozzleSteps)) : minimumFlow)}): that day it stands still.`,
          }
        : {
            say: `It takes no more than the design flow${nozzleSteps ? ', and of that what its open nozzles pass' : ''}: ${flow(taken)} that day. The loss grows with the square of the take.`,
            formula: write`${'lossAtDesign'} \, (\frac{${q}}{${'designFlow'}})^2 = ${{ ...h, unit: 'm' }}`,
          },
      ...(taken === 0
        ? []
        : [
            {
              say: `That day’s power${partFlowEfficiency ? ', with the efficiency at its part of the design flow' : ''}.`,
              formula: write`${density} \, ${gravity} \, ${q} \, (${'grossHead'} - ${h}) \, ${aside('\\eta', given.peakEfficiency * shareOfPeak(rising(partFlowEfficiency ?? []), taken / designFlow), 'the efficiency')} = ${aside('P', powerOf(taken), 'the power', 'W')}`,
            },
          ]),
      {
        say: `So for all ${days} days; the mean of their powers is ${join(format(meanPower.value, 'power'))}. It counts for a year of 365 days, as long as the plant is fit to run.`,
        formula: write`${'energyPerYear'} = ${meanPower} \, ${year} \, ${'availability'}`,
        gives: 'energyPerYear',
      },
      {
        say: 'Full all year, the plant would give its power at design flow.',
        formula:
          atDesign === undefined
            ? write`${density} \, ${gravity} \, ${'designFlow'} \, (${'grossHead'} - ${'lossAtDesign'}) \, ${'peakEfficiency'} = ${{ ...designPower, unit: 'W' }}`
            : write`${density} \, ${gravity} \, ${'designFlow'} \, (${'grossHead'} - ${'lossAtDesign'}) \, ${'peakEfficiency'} \, ${aside('\\varepsilon_d', atDesign, 'the share of the best efficiency at design flow')} = ${{ ...designPower, unit: 'W' }}`,
      },
      {
        say: 'The year’s energy over that of a full year.',
        formula: write`${'capacityFactor'} = \frac{${'energyPerYear'}}{${designPower} \, ${year}}`,
        gives: 'capacityFactor',
      },
      {
        say: 'The days on which there is water enough to run.',
        formula: write`${'runningFraction'} = \frac{${aside('n_r', Math.round(runningFraction * days), 'the days it runs')}}{${{ ...aside('n', days, 'the number of days'), digits: 5 }}}`,
        gives: 'runningFraction',
      },
    ]
  },
  cautions({ dailyFlows, designFlow, nozzleSteps, grossHead, lossAtDesign }, { runningFraction }) {
    const mean = meanOf(dailyFlows)
    const isFlashy = dailyFlows.length >= leastDaysForQ95 && flowReached(ranked(dailyFlows), 0.95) < flashyBelow * mean
    return [
      ...(runningFraction === 0
        ? [
            {
              level: 'stop' as const,
              about: ['runningFraction' as const, 'minimumFlow' as const],
              say: 'There is never water enough to run. Look at the residual flow, the share that may be taken and the least flow; or the plant is too large for this stream.',
            },
          ]
        : []),
      ...(isWholeYears(dailyFlows.length)
        ? []
        : [
            {
              level: 'check' as const,
              about: ['dailyFlows' as const],
              say: `${dailyFlows.length} days are not whole years: a season counts too much or too little, and the energy is that of these days, not of a year.`,
            },
          ]),
      ...(isFlashy
        ? [
            {
              level: 'check' as const,
              about: ['dailyFlows' as const],
              say: 'A flashy stream: its Q95 is under a tenth of its mean. Within a day its flow swings far, and spates bring leaves and stones onto the screen: expect less than the daily means promise (common practice, no source).',
            },
          ]
        : []),
      // With a loss ∝ q², ρgq(H − h) is greatest at h = H/3.
      ...(lossAtDesign > grossHead / 3
        ? [
            {
              level: 'check' as const,
              about: ['lossAtDesign' as const, 'designFlow' as const],
              say: 'At design flow the pipe takes more than a third of the head: less flow would give more power. Take a wider pipe or a smaller design flow.',
            },
          ]
        : []),
      ...(nozzleSteps && Math.max(...nozzleSteps) < designFlow
        ? [
            {
              level: 'check' as const,
              about: ['nozzleSteps' as const, 'designFlow' as const],
              say: 'All nozzles open pass less than the design flow: the rest of it is never taken.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['residualFlow', 'takeShare'],
        say: 'How much must stay in the stream, and what share of the rest may be taken, is decided by the licence and the local authority, not here.',
      },
      {
        level: 'note',
        about: ['energyPerYear'],
        say: 'A dry year can bring far less: try the driest year on record by itself.',
      },
    ]
  },
  doesNotCheck: [
    'whether the energy can be used when it comes',
    'a head that changes with the stream, as tailwater does on low heads',
    'swings within a day, ice, and leaves on the screen beyond the availability given',
  ],
  example: {
    say: 'Over Quern: two fixed nozzles on a flashy beck, and a licence for four fifths of what runs above the residual flow.',
    inputs: {
      dailyFlows: flashyYear,
      residualFlow: 0.004,
      designFlow: 0.0134,
      minimumFlow: 0.005,
      grossHead: 104,
      lossAtDesign: 6.2,
      peakEfficiency: 0.62,
      partFlowEfficiency: [
        { flowFraction: 0.25, efficiency: 0.86 },
        { flowFraction: 0.5, efficiency: 1 },
        { flowFraction: 1, efficiency: 0.98 },
      ],
      takeShare: 0.8,
      availability: 0.95,
      nozzleSteps: [0.0069, 0.0134],
      waterTemperature: 8,
    },
  },
  plots: [
    {
      say: 'A larger plant finds its water on fewer days: each litre more brings less.',
      of: 'energyPerYear',
      against: 'designFlow',
      from: 0.3,
      to: 3,
    },
    {
      say: 'And it stands below its full power for more of the year.',
      of: 'capacityFactor',
      against: 'designFlow',
      from: 0.3,
      to: 3,
    },
    { say: 'The stream’s own curve.', rows: 'curve', x: 'exceedance', y: ['flow'] },
  ],
  sources: [
    {
      author: 'C. Penche',
      title: 'Guide on How to Develop a Small Hydropower Plant (European Small Hydropower Association)',
      year: 2004,
      where: 'chapter 3, flow-duration curve and energy (from memory)',
    },
    {
      author: 'V. K. Mehta, R. Mehta',
      title: 'Principles of Power System',
      year: 2005,
      where: 'examples 2.7, 2.11 and 2.13 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
