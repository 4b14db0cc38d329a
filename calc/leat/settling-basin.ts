import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterKinematicViscosity } from '../water/properties.ts'

/** Quartz in water is heavier than water by this share: R. I. Ferguson and M. Church (2004). */
const submerged = 1.65
/** For natural grains by their sieve size, from the same. */
const viscousDrag = 18
const turbulentDrag = 1

/** Above 0.44·√d (m/s, d in mm) the flow picks grains up again (Camp, in the guidelines below). */
const scourSpeed = (grainDiameter: number): number => 0.44 * Math.sqrt(grainDiameter * 1000)
/** A basin shorter than this many widths mixes instead of settling: L/B 4 to 10, the same guidelines. */
const leastLengthOverWidth = 4

/** Speed, m/s, at which a grain of natural quartz sand falls through still water: R. I. Ferguson and M. Church (2004), eq. (4). */
export const settlingSpeed = (grainDiameter: number, kinematicViscosity: number): number =>
  (submerged * g * grainDiameter ** 2) /
  (viscousDrag * kinematicViscosity + Math.sqrt(0.75 * turbulentDrag * submerged * g * grainDiameter ** 3))

/**
 * A basin long enough for a grain to reach the floor on the way: settling speed w = R·g·d²/(18ν + √(0.75·R·g·d³)), R = 1.65 (Ferguson and
 * Church, natural quartz sand by sieve size), length L = S·Q/(W·w), with S for eddies and uneven inflow; forward speed Q/(W·y). SI. The
 * depth does not enter the length; it keeps the forward speed low and stores what has settled. Valid for single grains from silt to gravel
 * in clean water from 0 to 40 °C; errors about 15 % for w by the grain's shape, more for mica and for clay that flocks. Sources below.
 */
export const settlingBasin = defineCalculator({
  id: 'settling-basin',
  station: 'leat',
  title: 'A settling basin',
  summary: 'How long a basin must be for sand to sink to its floor before it reaches the pipe.',
  hazards: ['stream'],
  inputs: {
    flow: {
      kind: 'scalar',
      symbol: 'Q',
      label: 'Flow',
      quantity: 'flow',
      help: 'that goes through the basin',
      range: [1e-6, 1000],
      initial: 0.0095,
    },
    grainDiameter: {
      kind: 'scalar',
      symbol: 'd',
      label: 'Smallest grain to catch',
      quantity: 'length',
      help: 'by sieve; 0.2 to 0.3 mm for a small impulse runner, finer at high head',
      range: [1e-6, 0.1],
      usual: [1e-4, 2e-3],
      initial: 2.5e-4,
    },
    width: {
      kind: 'scalar',
      symbol: 'W',
      label: 'Width',
      quantity: 'length',
      range: [0.01, 200],
      usual: [0.2, 20],
      unit: 'm',
      initial: 0.4,
    },
    depth: {
      kind: 'scalar',
      symbol: 'y',
      label: 'Depth of flow',
      quantity: 'length',
      help: 'of moving water, over what has settled',
      range: [0.01, 50],
      usual: [0.1, 5],
      unit: 'm',
      initial: 0.35,
    },
    safetyFactor: {
      kind: 'scalar',
      symbol: 'S',
      label: 'Safety factor',
      quantity: 'ratio',
      help: 'for eddies: 1.5 with a gentle widening at the inlet, 2 and more without',
      range: [1, 10],
      usual: [1.5, 3],
      fallback: 1.5,
      initial: 1.5,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    settlingVelocity: { kind: 'scalar', symbol: 'w', label: 'Settling speed', quantity: 'velocity' },
    length: { kind: 'scalar', symbol: 'L', label: 'Length', quantity: 'length', unit: 'm' },
    forwardVelocity: { kind: 'scalar', symbol: 'u', label: 'Forward speed', quantity: 'velocity' },
  },
  solve({ flow, grainDiameter, width, depth, safetyFactor, waterTemperature }) {
    const settlingVelocity = settlingSpeed(grainDiameter, waterKinematicViscosity(waterTemperature))
    return {
      settlingVelocity,
      length: (safetyFactor * flow) / (width * settlingVelocity),
      forwardVelocity: flow / (width * depth),
    }
  },
  working(write, { waterTemperature }) {
    const viscosity = {
      symbol: '\\nu',
      value: waterKinematicViscosity(waterTemperature),
      say: 'the kinematic viscosity of water',
    }
    return [
      {
        say: 'A fine grain is held up by the water’s stickiness, a coarse one by its drag: the formula joins both.',
        formula: write`${'settlingVelocity'} = \frac{1.65 \, ${gravity} \, ${'grainDiameter'}^2}{18 \, ${viscosity} + \sqrt{0.75 \, 1.65 \, ${gravity} \, ${'grainDiameter'}^3}}`,
        gives: 'settlingVelocity',
      },
      {
        say: 'Only the floor counts: the flow over the settling speed is the floor that it wants, and eddies want more.',
        formula: write`${'length'} = ${'safetyFactor'} \, \frac{${'flow'}}{${'width'} \, ${'settlingVelocity'}}`,
        gives: 'length',
      },
      {
        say: 'So fast the water moves on through the basin.',
        formula: write`${'forwardVelocity'} = \frac{${'flow'}}{${'width'} \, ${'depth'}}`,
        gives: 'forwardVelocity',
      },
    ]
  },
  cautions: ({ grainDiameter, width }, { length, forwardVelocity }) => [
    ...(forwardVelocity > scourSpeed(grainDiameter)
      ? [
          {
            level: 'check' as const,
            about: ['forwardVelocity' as const],
            say: 'The water moves on fast enough to pick such grains up from the floor again: make the basin deeper or wider.',
          },
        ]
      : []),
    ...(length < leastLengthOverWidth * width
      ? [
          {
            level: 'check' as const,
            about: ['length' as const],
            say: 'It is shorter than four widths: water then shoots across it and leaves corners still. Make it narrower and longer, four to ten widths, and widen the inlet gently.',
          },
        ]
      : []),
    {
      level: 'note',
      about: ['depth'],
      say: 'Dig deeper than the flow for what settles between two flushings, and give it a flushing gate at its lowest corner; flush little and often, where it may be flushed.',
    },
    {
      level: 'check',
      about: ['depth'],
      hazard: 'stream',
      say: 'Silt under water holds a boot fast: cover or fence the basin against children and stock, and never get into it alone. Digging and flushing by a stream are ruled by local code.',
    },
  ],
  doesNotCheck: [
    'how much sand the stream carries, and how soon the basin is full',
    'whether the inlet spreads the flow over the whole width',
    'mica, clay and leaves, which do not settle so',
  ],
  example: {
    say: 'Over Quern in snow melt: fine sand would wear its two small nozzles, so 0.2 mm is to stay behind.',
    inputs: {
      flow: 0.0136,
      grainDiameter: 2e-4,
      width: 0.5,
      depth: 0.45,
      safetyFactor: 2,
      waterTemperature: 3,
    },
  },
  plots: [
    {
      say: 'Half the grain wants far more than twice the basin.',
      of: 'length',
      against: 'grainDiameter',
      from: 0.4,
      to: 2.5,
    },
  ],
  sources: [
    {
      author: 'R. I. Ferguson, M. Church',
      title: 'A simple universal equation for grain settling velocity, J. Sedimentary Research 74(6)',
      year: 2004,
      where: 'eq. (4), pp. 933–937',
    },
    {
      author: 'Practical Action Nepal, BPC Hydroconsult',
      title: 'Civil Works Guidelines for Micro-Hydropower in Nepal',
      year: 2008,
      where: 'chapter 5, settling basins and example 5.1 (year from memory)',
    },
  ],
})
