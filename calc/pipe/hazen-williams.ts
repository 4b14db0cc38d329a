import { defineCalculator } from '../definition.ts'
import { boreVelocity } from './friction-factor.ts'
import { flow, insideDiameter, pipeLength } from './inputs.ts'

/** The formula's own numbers in SI: reference works pair 10.67 with the exponents 1.852 and 4.8704. */
const [constant, flowPower, borePower] = [10.67, 1.852, 4.8704]
/** Bores and speeds that the formula was fitted to, about: common practice, no source. */
const fittedBore = [0.05, 1.85] as const
const fittedVelocity = [0.3, 3] as const

/**
 * Head lost to friction by A. Hazen and G. S. Williams, h = 10.67·L·Q^1.852/(C^1.852·D^4.8704), with flow Q (m³/s), length L, inside diameter D (m)
 * and the pipe's coefficient C (no unit in SI by convention). Fitted to cold water of about 15 °C, turbulent, bores of 0.05 to 1.85 m, 0.3 to
 * 3 m/s; outside it can be wrong by a fifth and more, where Darcy and Weisbach's formula still holds. Refused outside the ranges.
 */
export const hazenWilliams = defineCalculator({
  id: 'hazen-williams',
  station: 'pipe',
  title: 'Friction by Hazen and Williams',
  summary: 'The head a pipe takes by the old waterworks rule, to check a table or a catalogue that was made with it.',
  hazards: [],
  inputs: {
    flow: { ...flow, initial: 0.0095 },
    insideDiameter: { ...insideDiameter, initial: 0.0968 },
    length: { ...pipeLength, initial: 120 },
    hazenWilliamsC: {
      kind: 'scalar',
      symbol: 'C',
      label: 'Hazen–Williams C',
      quantity: 'ratio',
      help: 'the larger, the smoother: polyethylene 140, old cast iron 65 to 100',
      range: [10, 250],
      usual: [60, 155],
      initial: 140,
      pick: { table: 'hazen-williams', column: 'c' },
    },
  },
  outputs: {
    velocity: { kind: 'scalar', symbol: 'v', label: 'Water speed', quantity: 'velocity' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost', quantity: 'head' },
    gradient: { kind: 'scalar', symbol: 'S', label: 'Head lost along the pipe', quantity: 'gradient' },
  },
  solve({ flow, insideDiameter, length, hazenWilliamsC }) {
    const gradient = (constant * (flow / hazenWilliamsC) ** flowPower) / insideDiameter ** borePower
    return { velocity: boreVelocity(flow, insideDiameter), headLoss: gradient * length, gradient }
  },
  working: (write) => [
    {
      say: 'The flow spread over the bore gives the speed of the water.',
      formula: write`${'velocity'} = \frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2}`,
      gives: 'velocity',
    },
    {
      say: 'The rule takes flow, bore and smoothness by powers that were fitted to measured pipes.',
      formula: write`${'headLoss'} = \frac{10.67 \, ${'length'} \, ${'flow'}^{1.852}}{${'hazenWilliamsC'}^{1.852} \, ${'insideDiameter'}^{4.8704}}`,
      gives: 'headLoss',
    },
    {
      say: 'Spread over the length it is the slope of the hydraulic grade line.',
      formula: write`${'gradient'} = \frac{${'headLoss'}}{${'length'}}`,
      gives: 'gradient',
    },
  ],
  cautions: ({ insideDiameter }, { velocity }) => [
    {
      level: 'note',
      about: ['headLoss'],
      say: 'The rule knows nothing of temperature: it means water of about 15 °C. In a cold stream a smooth pipe loses a few per cent more. Where this and the friction calculator differ, trust the latter.',
    },
    ...(insideDiameter < fittedBore[0] || insideDiameter > fittedBore[1]
      ? [
          {
            level: 'check' as const,
            about: ['insideDiameter' as const, 'headLoss' as const],
            say: 'The rule was fitted to bores of about 0.05 to 1.85 m (common practice, no source). Take the friction calculator for this one.',
          },
        ]
      : []),
    ...(velocity > 0 && (velocity < fittedVelocity[0] || velocity > fittedVelocity[1])
      ? [
          {
            level: 'check' as const,
            about: ['velocity' as const, 'headLoss' as const],
            say: 'The rule holds near 1 m/s, and roughly from 0.3 to 3 m/s (common practice, no source). Take the friction calculator at this speed.',
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'bends, valves and the entrance: see fittings',
    'water colder or warmer than about 15 °C',
    'the pressure in the pipe',
  ],
  example: {
    say: 'Sorrelthwaite: an old main of cast iron, from a waterworks table, that might serve again as a penstock.',
    inputs: { flow: 0.021, insideDiameter: 0.1524, length: 385, hazenWilliamsC: 95 },
  },
  plots: [
    {
      say: 'An old rough pipe takes about twice what it took when it was new.',
      of: 'headLoss',
      against: 'hazenWilliamsC',
      from: 0.5,
      to: 1.1,
    },
  ],
  sources: [
    {
      author: 'N. K. Shammas, L. K. Wang',
      title: 'Water Engineering: Hydraulics, Distribution and Treatment',
      year: 2015,
      where: 'example 5.36; the exponents there are rounded, which gives 3 per cent more',
    },
    { author: 'A. Hazen, G. S. Williams', title: 'Hydraulic Tables', year: 1905, where: '(from memory)' },
  ],
})
