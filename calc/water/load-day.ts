import { secondsPerHour } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'

const hoursPerDay = 24
const secondsPerDay = hoursPerDay * secondsPerHour

interface Load {
  power: number
  hoursPerDay: number
  surgeFactor: number
}

/** How much the hardest start adds to what runs. */
const hardestStart = (loads: readonly Load[]): number => {
  let most = 0
  for (const { power, surgeFactor } of loads) most = Math.max(most, power * (surgeFactor - 1))
  return most
}

/**
 * A day's loads against a steady generator: energy Σ P·t of the day, its mean over 24 h, everything on at once (`peakPower`), that with the
 * hardest start on top (`surgePower`: the load with the greatest P·(factor − 1) comes on last). SI, hours where a load's are counted.
 * `spareForDump` is the mean that the generator makes beyond the loads and what an inverter loses for them; it is negative where the loads
 * want more than is made. `batteryHours`, with a battery: how long it carries the mean load alone, through the inverter; without a depth of
 * discharge all its energy is counted; absent where nothing is on. Refused outside the ranges. An energy balance: sources below.
 */
export const loadDay = defineCalculator({
  id: 'load-day',
  station: 'load',
  title: 'A day’s loads',
  summary:
    'What the house takes in a day against what the generator makes, the worst start, and what is left for the dump load.',
  hazards: ['electricity'],
  inputs: {
    loads: {
      kind: 'rows',
      label: 'Loads',
      row: 'load',
      help: 'each thing that is switched on, with the hours it runs in a day; of a fridge those its motor runs',
      columns: {
        power: {
          kind: 'scalar',
          symbol: 'P',
          label: 'Power',
          quantity: 'power',
          help: 'by a plug-in meter; the plate mostly says more',
          range: [0, 1e7],
        },
        hoursPerDay: { kind: 'scalar', symbol: 't', label: 'Hours a day', quantity: 'hours', range: [0, hoursPerDay] },
        surgeFactor: {
          kind: 'scalar',
          symbol: 'k',
          label: 'Starting factor',
          quantity: 'ratio',
          help: 'starting power over running power: motors 3 to 7, all else 1 (common practice, no source)',
          range: [1, 20],
          usual: [1, 8],
          fallback: 1,
          optional: true,
        },
      },
      least: 1,
      most: 100,
      initial: [
        { power: 70, hoursPerDay: 5 },
        { power: 90, hoursPerDay: 8, surgeFactor: 5 },
        { power: 25, hoursPerDay: 24 },
        { power: 450, hoursPerDay: 1.5, surgeFactor: 4 },
        { power: 1200, hoursPerDay: 1.2 },
      ],
    },
    generatorPower: {
      kind: 'scalar',
      symbol: 'P_g',
      label: 'Power of the generator',
      quantity: 'power',
      help: 'what reaches the house, day and night',
      range: [0, 1e8],
      initial: 1850,
    },
    batteryEnergy: {
      kind: 'scalar',
      symbol: 'E_b',
      label: 'Energy of the battery',
      quantity: 'energy',
      help: 'the whole of it, as on its plate: volts times ampere-hours',
      range: [0, 1e14],
      optional: true,
      initial: 1.728e7,
    },
    depthOfDischarge: {
      kind: 'scalar',
      symbol: 'd',
      label: 'Depth of discharge',
      quantity: 'fraction',
      help: 'the share of it that its maker lets you draw: lead about half, lithium more',
      range: [0, 1],
      usual: [0.2, 0.95],
      optional: true,
      initial: 0.5,
    },
    inverterEfficiency: {
      kind: 'scalar',
      symbol: '\\eta_i',
      label: 'Efficiency of the inverter',
      quantity: 'fraction',
      help: 'where the loads hang on one',
      range: [0.1, 1],
      usual: [0.75, 0.98],
      optional: true,
      initial: 0.9,
    },
  },
  outputs: {
    dayEnergy: {
      kind: 'scalar',
      symbol: 'E_d',
      label: 'Energy of a day',
      quantity: 'energy',
      help: 'what the loads take',
    },
    averageLoad: { kind: 'scalar', symbol: 'P_m', label: 'Mean load', quantity: 'power' },
    peakPower: { kind: 'scalar', symbol: 'P_{all}', label: 'All on at once', quantity: 'power' },
    surgePower: {
      kind: 'scalar',
      symbol: 'P_s',
      label: 'Worst start',
      quantity: 'power',
      help: 'all on, and the hardest to start comes last',
    },
    spareForDump: {
      kind: 'scalar',
      symbol: 'P_x',
      label: 'Spare for the dump load',
      quantity: 'power',
      help: 'the mean over the day; below nothing, more is used than made',
    },
    batteryHours: {
      kind: 'scalar',
      symbol: 't_b',
      label: 'Battery alone lasts',
      quantity: 'hours',
      help: 'with the mean load and the generator still',
      sometimes: true,
    },
  },
  solve({ loads, generatorPower, batteryEnergy, depthOfDischarge = 1, inverterEfficiency = 1 }) {
    let wattHours = 0
    let peakPower = 0
    for (const { power, hoursPerDay } of loads) {
      wattHours += power * hoursPerDay
      peakPower += power
    }
    const dayEnergy = wattHours * secondsPerHour
    const averageLoad = dayEnergy / secondsPerDay
    const drawn = averageLoad / inverterEfficiency
    const balance = {
      dayEnergy,
      averageLoad,
      peakPower,
      surgePower: peakPower + hardestStart(loads),
      spareForDump: generatorPower - drawn,
    }
    if (batteryEnergy === undefined) return balance
    const batteryHours = (batteryEnergy * depthOfDischarge) / drawn / secondsPerHour
    return Number.isFinite(batteryHours) ? { ...balance, batteryHours } : balance
  },
  working(
    write,
    { loads, batteryEnergy, depthOfDischarge, inverterEfficiency },
    { dayEnergy, averageLoad, peakPower, batteryHours },
  ) {
    const aside = (symbol: string, value: number, say: string, unit?: string) => ({ symbol, value, say, unit })
    const wattHours = aside('\\textstyle\\sum P\\,t', dayEnergy / secondsPerHour, 'the sum of power times hours')
    const perHour = aside('t_h', secondsPerHour, 'the seconds in an hour')
    const day = { ...aside('t_d', secondsPerDay, 'the seconds in a day'), digits: 5 }
    const drawn = aside('P_i', averageLoad / (inverterEfficiency ?? 1), 'what the inverter draws')
    const usable = aside('E_u', (batteryEnergy ?? 0) * (depthOfDischarge ?? 1), 'the energy that may be drawn')
    const mean = inverterEfficiency === undefined ? ('averageLoad' as const) : drawn
    return [
      {
        say: 'Each load takes its power for its hours; a watt-hour is 3600 joules.',
        formula: write`${'dayEnergy'} = ${wattHours} \, ${perHour}`,
        gives: 'dayEnergy',
      },
      {
        say: 'Spread evenly over the day.',
        formula: write`${'averageLoad'} = \frac{${'dayEnergy'}}{${day}}`,
        gives: 'averageLoad',
      },
      {
        say: 'With everything on at once.',
        formula: write`${'peakPower'} = ${aside('\\textstyle\\sum P', peakPower, 'the sum of the powers')}`,
        gives: 'peakPower',
      },
      {
        say: 'The load that is hardest to start comes on last: what its start draws above its running power is added.',
        formula: write`${'surgePower'} = ${'peakPower'} + ${aside('\\Delta P', hardestStart(loads), 'the extra power of the hardest start')}`,
        gives: 'surgePower',
      },
      ...(inverterEfficiency === undefined
        ? []
        : [
            {
              say: 'The inverter draws more than it gives.',
              formula: write`\frac{${'averageLoad'}}{${'inverterEfficiency'}} = ${{ ...drawn, unit: 'W' }}`,
            },
          ]),
      {
        say: 'What the generator makes beyond that.',
        formula: write`${'spareForDump'} = ${'generatorPower'} - ${mean}`,
        gives: 'spareForDump',
      },
      ...(batteryHours === undefined
        ? []
        : [
            depthOfDischarge === undefined
              ? { say: 'Without a depth of discharge all of the battery’s energy is counted.' }
              : {
                  say: 'Of the battery’s energy only this share may be drawn.',
                  formula: write`${'batteryEnergy'} \, ${'depthOfDischarge'} = ${{ ...usable, unit: 'J' }}`,
                },
            {
              say: 'With the generator still it lasts so many hours of 3600 seconds.',
              formula: write`${'batteryHours'} = \frac{${usable}}{${mean} \, ${perHour}}`,
              gives: 'batteryHours' as const,
            },
          ]),
    ]
  },
  cautions({ generatorPower, batteryEnergy, depthOfDischarge }, { peakPower, surgePower, spareForDump }) {
    const power = (value: number) => join(format(value, 'power'))
    return [
      ...(spareForDump < 0
        ? [
            {
              level: 'stop' as const,
              about: ['spareForDump' as const, 'averageLoad' as const],
              say: `The loads want ${power(-spareForDump)} more than the generator makes, day and night: no battery can make that up. Use less, or find more water or head.`,
            },
          ]
        : surgePower > generatorPower
          ? [
              batteryEnergy === undefined
                ? {
                    level: 'check' as const,
                    about: ['surgePower' as const, 'peakPower' as const],
                    say:
                      peakPower > generatorPower
                        ? `All on at once is more than the generator gives (${power(generatorPower)}): voltage and speed fall. Agree what is never on together, or add a battery.`
                        : `The worst start is more than the generator gives (${power(generatorPower)}): lamps dip, and the motor may not come up. Start it with little else on.`,
                  }
                : {
                    level: 'check' as const,
                    about: ['surgePower' as const, 'peakPower' as const],
                    say: `More is wanted at times than the generator gives (${power(generatorPower)}): battery and inverter must be rated for ${power(peakPower)} running and ${power(surgePower)} for a start, by their maker’s data.`,
                  },
            ]
          : []),
      ...(batteryEnergy !== undefined && depthOfDischarge === undefined
        ? [
            {
              level: 'check' as const,
              about: ['batteryHours' as const, 'depthOfDischarge' as const],
              say: 'All of the battery’s energy was counted: a battery emptied so far ages quickly. Give the depth of discharge that its maker allows.',
            },
          ]
        : []),
      {
        level: 'check',
        about: ['spareForDump'],
        say: `The spare is a mean: with everything off the dump load gets all ${power(generatorPower)} of the generator, and must be made for it.`,
      },
      {
        level: 'check',
        about: ['loads'],
        hazard: 'electricity',
        say: 'House wiring, the inverter and the battery’s fuses are for a licensed electrician, by local code. A battery gives thousands of amperes into a dropped spanner: cover its poles, take off rings.',
      },
    ]
  },
  doesNotCheck: [
    'when in the day each load is on: a load that runs by night can be carried by a generator that all together cannot',
    'what a battery loses between charge and discharge, and in the cold',
    'cables, fuses and the inverter’s rating',
  ],
  example: {
    say: 'Nether Pollow: a workshop on a small low-head set, with no battery.',
    inputs: {
      loads: [
        { power: 160, hoursPerDay: 9 },
        { power: 1100, hoursPerDay: 2.5, surgeFactor: 4 },
        { power: 750, hoursPerDay: 1, surgeFactor: 3 },
        { power: 120, hoursPerDay: 10, surgeFactor: 5 },
        { power: 40, hoursPerDay: 24 },
      ],
      generatorPower: 3200,
    },
  },
  plots: [
    {
      say: 'The spare rises with the generator, watt for watt.',
      of: 'spareForDump',
      against: 'generatorPower',
      from: 0,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'V. K. Mehta, R. Mehta',
      title: 'Principles of Power System',
      year: 2005,
      where: 'chapter 3, loads of a day (as recomputed in a public collection of textbook companions)',
    },
    {
      author: 'A. Harvey',
      title: 'Micro-Hydro Design Manual',
      year: 1993,
      where: 'demand of a day and the dump load (from memory)',
    },
  ],
})
