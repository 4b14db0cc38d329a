import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'
import { netHead, nozzleDiameter, velocityCoefficient } from './inputs.ts'

/** Common practice, no source. */
const thickJet = 0.15

/**
 * The free jet from one or more like nozzles: its speed v = Cv·√(2gH), its thickness, the nozzle that gives it (d_n = d_j/√Cc), and the
 * power ρQv²/2 that it carries. SI; `flow` and `jetPower` are those of all jets. Valid for a jet in air from 0.1 m to 2000 m of head.
 * The formulas are exact; the coefficients decide: 0.01 in Cv is 1 % of the speed and 3 % of the power through a given nozzle.
 * Refused: neither or both of `flow` and `nozzleDiameter`. Sources as below; Cc of a hole in a flat plate 0.611 (free-streamline
 * theory, two-dimensional) to 0.64.
 */
export const jet = defineCalculator({
  id: 'jet',
  station: 'jet',
  title: 'The jet',
  summary: 'How fast the water leaves the nozzle, and how thick the jet must be to carry the flow.',
  hazards: ['pressure'],
  inputs: {
    netHead: { ...netHead, initial: 45 },
    velocityCoefficient: { ...velocityCoefficient, initial: 0.97 },
    contractionCoefficient: {
      kind: 'scalar',
      symbol: 'C_c',
      label: 'Contraction coefficient',
      quantity: 'ratio',
      help: '1 for a tapered nozzle; 0.61 to 0.64 for a hole in a flat plate',
      range: [0.5, 1],
      usual: [0.6, 1],
      initial: 1,
      fallback: 1,
      optional: true,
    },
    jetCount: { kind: 'scalar', symbol: 'n', label: 'Jets', quantity: 'count', range: [1, 6], whole: true, initial: 1 },
    flow: {
      kind: 'scalar',
      symbol: 'Q',
      label: 'Flow',
      quantity: 'flow',
      help: 'through all jets together',
      range: [1e-6, 100],
      initial: 0.0095,
      or: 'nozzleDiameter',
    },
    nozzleDiameter: { ...nozzleDiameter, help: 'the bore at its mouth', or: 'flow' },
    waterTemperature,
  },
  outputs: {
    jetVelocity: { kind: 'scalar', symbol: 'v', label: 'Jet speed', quantity: 'velocity' },
    jetDiameter: { kind: 'scalar', symbol: 'd_j', label: 'Jet diameter', quantity: 'length' },
    nozzleDiameter: { kind: 'scalar', symbol: 'd_n', label: 'Nozzle diameter', quantity: 'length' },
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow of all jets', quantity: 'flow' },
    jetPower: { kind: 'scalar', symbol: 'P_j', label: 'Power of all jets', quantity: 'power' },
    nozzleEfficiency: { kind: 'scalar', symbol: '\\eta_n', label: 'Nozzle efficiency', quantity: 'fraction' },
  },
  solve(given) {
    const { netHead, velocityCoefficient, contractionCoefficient, jetCount, waterTemperature } = given
    const jetVelocity = velocityCoefficient * Math.sqrt(2 * g * netHead)
    const jetDiameter =
      given.flow === undefined
        ? given.nozzleDiameter! * Math.sqrt(contractionCoefficient)
        : Math.sqrt((4 * given.flow) / (jetCount * Math.PI * jetVelocity))
    const flow = given.flow ?? jetCount * (Math.PI / 4) * jetDiameter ** 2 * jetVelocity
    return {
      jetVelocity,
      jetDiameter,
      nozzleDiameter: given.nozzleDiameter ?? jetDiameter / Math.sqrt(contractionCoefficient),
      flow,
      jetPower: (waterDensity(waterTemperature) * flow * jetVelocity ** 2) / 2,
      nozzleEfficiency: velocityCoefficient ** 2,
    }
  },
  working(write, { flow, waterTemperature }) {
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say: 'Falling through the net head gives the water its speed; the nozzle keeps nearly all of it.',
        formula: write`${'jetVelocity'} = ${'velocityCoefficient'} \, \sqrt{2 \, ${gravity} \, ${'netHead'}}`,
        gives: 'jetVelocity',
      },
      ...(flow === undefined
        ? [
            {
              say: 'Past the mouth the jet draws in a little; from a tapered nozzle it does not.',
              formula: write`${'jetDiameter'} = ${'nozzleDiameter'} \, \sqrt{${'contractionCoefficient'}}`,
              gives: 'jetDiameter' as const,
            },
            {
              say: 'Jets, area and speed together make the flow.',
              formula: write`${'flow'} = ${'jetCount'} \, \frac{\pi}{4} \, ${'jetDiameter'}^2 \, ${'jetVelocity'}`,
              gives: 'flow' as const,
            },
          ]
        : [
            {
              say: 'Each jet must be thick enough to carry its share of the flow.',
              formula: write`${'jetDiameter'} = \sqrt{\frac{4 \, ${'flow'}}{${'jetCount'} \, \pi \, ${'jetVelocity'}}}`,
              gives: 'jetDiameter' as const,
            },
            {
              say: 'The bore of the nozzle is larger than the jet where the jet draws in.',
              formula: write`${'nozzleDiameter'} = \frac{${'jetDiameter'}}{\sqrt{${'contractionCoefficient'}}}`,
              gives: 'nozzleDiameter' as const,
            },
          ]),
      {
        say: 'The moving water carries this power to the runner.',
        formula: write`${'jetPower'} = \frac{1}{2} \, ${density} \, ${'flow'} \, ${'jetVelocity'}^2`,
        gives: 'jetPower',
      },
      {
        say: 'The nozzle passes on this share of the power that reaches it.',
        formula: write`${'nozzleEfficiency'} = ${'velocityCoefficient'}^2`,
        gives: 'nozzleEfficiency',
      },
    ]
  },
  cautions: ({ jetCount, contractionCoefficient, velocityCoefficient }, { jetDiameter }) => [
    {
      level: 'stop',
      about: ['netHead'],
      hazard: 'pressure',
      say: 'A jet at this pressure cuts skin and throws stones. Shut the valve slowly and let the pipe drain before a hand goes near the nozzle; local code and site rules apply.',
    },
    ...(contractionCoefficient < 1 && velocityCoefficient > 0.985
      ? [
          {
            level: 'note' as const,
            about: ['velocityCoefficient' as const, 'contractionCoefficient' as const],
            say: 'A maker’s discharge coefficient is the product of both: do not put it in for one of them and count the other again.',
          },
        ]
      : []),
    ...(jetDiameter > thickJet && jetCount === 1
      ? [
          {
            level: 'note' as const,
            about: ['jetDiameter' as const],
            say: 'A jet this thick is usually split between two or more nozzles.',
          },
        ]
      : []),
  ],
  doesNotCheck: ['whether the runner can pass a jet this thick', 'whether the stream and the pipe can give this flow'],
  example: {
    say: 'Over Quern: two jets share the water.',
    inputs: {
      netHead: 97,
      velocityCoefficient: 0.97,
      contractionCoefficient: 1,
      jetCount: 2,
      flow: 0.0136,
      waterTemperature: 6,
    },
  },
  plots: [
    {
      say: 'The higher the head, the thinner the jet for the same flow.',
      of: 'jetDiameter',
      against: 'netHead',
      from: 0.2,
      to: 2.5,
    },
    {
      say: 'Through one nozzle the flow goes with the root of the head.',
      of: 'flow',
      against: 'netHead',
      from: 0.2,
      to: 2.5,
    },
  ],
  sources: [
    {
      author: 'K. Subramanya',
      title: '1000 Solved Problems in Fluid Mechanics',
      year: 2005,
      where: 'examples 13.1 and 13.2 (as recomputed in a public collection of textbook companions)',
    },
    { author: 'F. M. White', title: 'Fluid Mechanics', year: 2011, where: 'impulse turbines (from memory)' },
  ],
})
