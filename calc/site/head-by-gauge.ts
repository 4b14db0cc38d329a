import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'

/**
 * Gross head from the pressure of still water: H = p/(ρg) + z, p the gauge pressure and z the gauge's height above the datum (the jet's
 * centre line). SI. Valid for still water in an unbroken hose or pipe, full of water and free of air, from 0 to 1000 m. Source: hydrostatics
 * (F. M. White, Fluid Mechanics, pressure distribution; from memory).
 */
export const headByGauge = defineCalculator({
  id: 'head-by-gauge',
  station: 'stream',
  title: 'Head by gauge',
  summary: 'The gross head, from the pressure of still water in a hose or pipe.',
  hazards: ['pressure'],
  inputs: {
    staticPressure: {
      kind: 'scalar',
      symbol: 'p',
      label: 'Static pressure',
      quantity: 'pressure',
      help: 'by the gauge, nothing flowing',
      range: [0, 1e7],
      usual: [1e4, 3e6],
      initial: 2.4e5,
    },
    gaugeHeightAboveDatum: {
      kind: 'scalar',
      symbol: 'z',
      label: 'Height of the gauge',
      quantity: 'head',
      help: 'above the jet’s centre line; below it counts minus',
      range: [-100, 100],
      usual: [-5, 5],
      fallback: 0,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    grossHead: { kind: 'scalar', symbol: 'H', label: 'Gross head', quantity: 'head' },
  },
  solve: ({ staticPressure, gaugeHeightAboveDatum, waterTemperature }) => ({
    grossHead: staticPressure / (waterDensity(waterTemperature) * g) + gaugeHeightAboveDatum,
  }),
  working(write, { waterTemperature }) {
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say: 'The pressure tells how tall the water stands above the gauge; the gauge’s own height comes on top.',
        formula: write`${'grossHead'} = \frac{${'staticPressure'}}{${density} \, ${gravity}} + ${'gaugeHeightAboveDatum'}`,
        gives: 'grossHead',
      },
    ]
  },
  cautions: (_, { grossHead }) => [
    {
      level: 'check',
      about: ['staticPressure'],
      hazard: 'pressure',
      say: 'Let pressure off before a joint or the gauge is undone, and never go over what the hose and its fittings are rated for; local code applies to fixed pipe.',
    },
    ...(grossHead <= 0
      ? [
          {
            level: 'stop' as const,
            about: ['gaugeHeightAboveDatum' as const],
            say: 'The water stands no higher than the jet: look at the height of the gauge again.',
          },
        ]
      : []),
  ],
  doesNotCheck: ['whether air is locked in a hump of the hose: it reads low', 'whether the gauge reads true'],
  example: {
    say: 'Over Quern: a hose laid down the gill, its gauge read a metre and a half over the jet.',
    inputs: { staticPressure: 9.86e5, gaugeHeightAboveDatum: 1.5, waterTemperature: 6 },
  },
  sources: [
    { author: 'F. M. White', title: 'Fluid Mechanics', year: 2011, where: 'hydrostatic pressure (from memory)' },
  ],
})
