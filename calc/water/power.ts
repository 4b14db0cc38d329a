import { g, gravity, secondsPerYear } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { waterTemperature } from './inputs.ts'
import { waterDensity } from './properties.ts'

/**
 * Power of falling water P = ρgQH and what comes out of it, P·η, with flow Q (m³/s), net head H (m), efficiency η (0–1, over everything
 * counted in it), density ρ by temperature; powers in W, the energy of 8760 like hours in J. Valid for any head whose losses were taken off
 * before. Refused outside the ranges. Source: any text of hydraulics; the worked check is Y. A. Çengel & J. M. Cimbala, example 5-13.
 */
export const power = defineCalculator({
  id: 'power',
  station: 'stream',
  title: 'Power of a fall of water',
  summary: 'What a flow falling through a head is worth, and what is left of it as useful power.',
  hazards: [],
  inputs: {
    flow: {
      kind: 'scalar',
      symbol: 'Q',
      label: 'Flow',
      quantity: 'flow',
      help: 'what the runner gets, after the stream has its share',
      range: [0, 1000],
      usual: [0.0005, 2],
      initial: 0.0095,
    },
    netHead: {
      kind: 'scalar',
      symbol: 'H',
      label: 'Net head',
      quantity: 'head',
      help: 'the fall less what the pipe takes',
      range: [0, 2000],
      usual: [1, 500],
      initial: 45,
    },
    efficiency: {
      kind: 'scalar',
      symbol: '\\eta',
      label: 'Efficiency',
      quantity: 'fraction',
      help: 'of all that follows: runner, drive, alternator, cable',
      range: [0, 1],
      usual: [0.35, 0.85],
      initial: 0.55,
    },
    waterTemperature,
  },
  outputs: {
    hydraulicPower: { kind: 'scalar', symbol: 'P_h', label: 'Power of the water', quantity: 'power' },
    outputPower: { kind: 'scalar', symbol: 'P', label: 'Power got out', quantity: 'power' },
    energyPerYear: { kind: 'scalar', symbol: 'E', label: 'Energy in a year', quantity: 'energy' },
  },
  solve({ flow, netHead, efficiency, waterTemperature }) {
    const hydraulicPower = waterDensity(waterTemperature) * g * flow * netHead
    const outputPower = hydraulicPower * efficiency
    return { hydraulicPower, outputPower, energyPerYear: outputPower * secondsPerYear }
  },
  working(write, { waterTemperature }) {
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    const year = { symbol: 't', value: secondsPerYear, say: 'the seconds in a year', digits: 5 }
    return [
      {
        say: 'Each second this weight of water falls through the head.',
        formula: write`${'hydraulicPower'} = ${density} \, ${gravity} \, ${'flow'} \, ${'netHead'}`,
        gives: 'hydraulicPower',
      },
      {
        say: 'Machines and wires pass this share of it on.',
        formula: write`${'outputPower'} = ${'efficiency'} \, ${'hydraulicPower'}`,
        gives: 'outputPower',
      },
      {
        say: 'A year has 8760 hours of 3600 seconds, if the water never fails and nothing stops.',
        formula: write`${'energyPerYear'} = ${'outputPower'} \, ${year}`,
        gives: 'energyPerYear',
      },
    ]
  },
  cautions: () => [
    {
      level: 'check',
      about: ['energyPerYear'],
      say: 'The year counts constant flow all year, at full load. No stream gives that: for what a real year brings use annual-energy.',
    },
  ],
  doesNotCheck: [
    'whether the stream can give this flow, or whether you may take it: a licence may be needed',
    'what the pipe takes from the fall: the head is the net head',
  ],
  example: {
    say: 'Sorrelthwaite: a mill leat’s old fall, with the losses of a good small set.',
    inputs: { flow: 0.021, netHead: 31.5, efficiency: 0.62, waterTemperature: 8 },
  },
  plots: [
    { say: 'Power goes straight with the head.', of: 'outputPower', against: 'netHead', from: 0, to: 2 },
    { say: 'And straight with the flow.', of: 'outputPower', against: 'flow', from: 0, to: 2 },
  ],
  sources: [
    {
      author: 'Y. A. Çengel, J. M. Cimbala',
      title: 'Fluid Mechanics: Fundamentals and Applications',
      year: 2010,
      where: 'example 5-13',
    },
  ],
})
