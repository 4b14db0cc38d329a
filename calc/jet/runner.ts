import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { netHead, velocityCoefficient } from './inputs.ts'

/** Below this ratio of pitch circle to jet the buckets crowd and spill; common practice, no source. */
const leastDiameterRatio = 8
/** Specific speed of one jet, with kW and m, between which impulse wheels are built (textbook practice, from memory). */
const usualSpecificSpeed = [8, 30] as const

const secondsPerMinute = 60

/** Turns in a minute of a circle whose rim moves at this speed. */
const turns = (rimSpeed: number, diameter: number): number => (secondsPerMinute * rimSpeed) / (Math.PI * diameter)

/**
 * An impulse runner on one jet: bucket speed u = x·v, with x the bucket's speed over the **jet's** speed (some books take it over √(2gH):
 * divide theirs by Cv first), and the pitch circle D or the speed N, joined by u = πDN/60. SI, N in rev/min. With a jet diameter d the ratio
 * D/d and Tygun's number of buckets 15 + D/(2d); with net head H and the power P of one jet the specific speed N√P/H^1.25 (kW, m, rev/min).
 * `runawaySpeed` is where the bucket keeps up with the jet: loss-free, so an upper bound. Valid for a jet in air on buckets of the split
 * kind. Refused: neither or both of `jetVelocity` and `netHead`, of `pitchDiameter` and `speed`. Sources below.
 */
export const runner = defineCalculator({
  id: 'runner',
  station: 'runner',
  title: 'The runner',
  summary: 'How fast the buckets must run before this jet, and what pitch circle or speed that makes.',
  hazards: ['rotating'],
  inputs: {
    jetVelocity: {
      kind: 'scalar',
      symbol: 'v',
      label: 'Jet speed',
      quantity: 'velocity',
      range: [0.5, 250],
      usual: [8, 100],
      initial: 28.8,
      or: 'netHead',
    },
    netHead: { ...netHead, or: 'jetVelocity' },
    velocityCoefficient: { ...velocityCoefficient, goesWith: 'netHead' },
    speedRatio: {
      kind: 'scalar',
      symbol: 'x',
      label: 'Speed ratio',
      quantity: 'ratio',
      help: 'bucket speed over jet speed',
      range: [0.05, 0.95],
      usual: [0.43, 0.5],
      initial: 0.46,
    },
    pitchDiameter: {
      kind: 'scalar',
      symbol: 'D',
      label: 'Pitch circle diameter',
      quantity: 'length',
      help: 'of the circle that the middle of the jet touches',
      range: [0.02, 10],
      usual: [0.08, 3],
      initial: 0.21,
      or: 'speed',
    },
    speed: {
      kind: 'scalar',
      symbol: 'N',
      label: 'Speed',
      quantity: 'rotation',
      range: [1, 30_000],
      usual: [100, 3600],
      or: 'pitchDiameter',
    },
    jetDiameter: {
      kind: 'scalar',
      symbol: 'd',
      label: 'Jet diameter',
      quantity: 'length',
      range: [0.0005, 2],
      initial: 0.0205,
      optional: true,
    },
    powerPerJet: {
      kind: 'scalar',
      symbol: 'P',
      label: 'Power from one jet',
      quantity: 'power',
      help: 'what the shaft gives, over the number of jets',
      range: [1, 1e9],
      optional: true,
      needs: 'netHead',
    },
  },
  outputs: {
    bucketSpeed: { kind: 'scalar', symbol: 'u', label: 'Bucket speed', quantity: 'velocity' },
    speed: { kind: 'scalar', symbol: 'N', label: 'Speed', quantity: 'rotation' },
    pitchDiameter: { kind: 'scalar', symbol: 'D', label: 'Pitch circle diameter', quantity: 'length' },
    diameterRatio: {
      kind: 'scalar',
      symbol: 'm',
      label: 'Pitch circle over jet',
      quantity: 'ratio',
      sometimes: true,
    },
    bucketCount: { kind: 'scalar', symbol: 'z', label: 'Buckets', quantity: 'count', sometimes: true },
    specificSpeed: {
      kind: 'scalar',
      symbol: 'n_s',
      label: 'Specific speed of one jet',
      quantity: 'ratio',
      help: 'with kW, m and rev/min',
      sometimes: true,
    },
    runawaySpeed: {
      kind: 'scalar',
      symbol: 'N_r',
      label: 'Runaway speed',
      quantity: 'rotation',
      help: 'no bucket can outrun its jet',
    },
  },
  solve(given) {
    const { speedRatio, jetDiameter, powerPerJet } = given
    const jetVelocity = jetVelocityOf(given)
    const bucketSpeed = speedRatio * jetVelocity
    const pitchDiameter = given.pitchDiameter ?? turns(bucketSpeed, given.speed!)
    const speed = given.speed ?? turns(bucketSpeed, pitchDiameter)
    return {
      bucketSpeed,
      speed,
      pitchDiameter,
      ...(jetDiameter === undefined
        ? {}
        : {
            diameterRatio: pitchDiameter / jetDiameter,
            bucketCount: Math.round(15 + pitchDiameter / (2 * jetDiameter)),
          }),
      ...(powerPerJet === undefined
        ? {}
        : { specificSpeed: (speed * Math.sqrt(powerPerJet / 1000)) / given.netHead! ** 1.25 }),
      runawaySpeed: turns(jetVelocity, pitchDiameter),
    }
  },
  working(write, given) {
    const jetSpeed =
      given.netHead === undefined
        ? ('jetVelocity' as const)
        : { symbol: 'v', value: jetVelocityOf(given), say: 'the speed of the jet' }
    return [
      ...(typeof jetSpeed === 'string'
        ? []
        : [
            {
              say: 'The net head gives the jet its speed.',
              formula: write`${'velocityCoefficient'} \, \sqrt{2 \, ${gravity} \, ${'netHead'}} = ${{ ...jetSpeed, unit: 'm/s' }}`,
            },
          ]),
      {
        say: 'The bucket takes most from the jet when it runs at a little under half of its speed.',
        formula: write`${'bucketSpeed'} = ${'speedRatio'} \, ${jetSpeed}`,
        gives: 'bucketSpeed',
      },
      given.speed === undefined
        ? {
            say: 'In one turn a bucket goes once around the pitch circle.',
            formula: write`${'speed'} = \frac{60 \, ${'bucketSpeed'}}{\pi \, ${'pitchDiameter'}}`,
            gives: 'speed' as const,
          }
        : {
            say: 'In one turn a bucket must go this far: once around the pitch circle.',
            formula: write`${'pitchDiameter'} = \frac{60 \, ${'bucketSpeed'}}{\pi \, ${'speed'}}`,
            gives: 'pitchDiameter' as const,
          },
      ...(given.jetDiameter === undefined
        ? []
        : [
            {
              say: 'The pitch circle is so many times as wide as the jet.',
              formula: write`${'diameterRatio'} = \frac{${'pitchDiameter'}}{${'jetDiameter'}}`,
              gives: 'diameterRatio' as const,
            },
            {
              say: 'Tygun’s rule for the number of buckets, to the nearest whole one.',
              formula: write`${'bucketCount'} \approx 15 + \frac{${'pitchDiameter'}}{2 \, ${'jetDiameter'}}`,
              gives: 'bucketCount' as const,
            },
          ]),
      ...(given.powerPerJet === undefined
        ? []
        : [
            {
              say: 'The specific speed, with the power in kilowatts.',
              formula: write`${'specificSpeed'} = \frac{${'speed'} \, \sqrt{${'powerPerJet'} / 1000}}{${'netHead'}^{1.25}}`,
              gives: 'specificSpeed' as const,
            },
          ]),
      {
        say: 'With its load gone the runner speeds up. No bucket can run faster than the jet that drives it.',
        formula: write`${'runawaySpeed'} = \frac{60 \, ${jetSpeed}}{\pi \, ${'pitchDiameter'}}`,
        gives: 'runawaySpeed',
      },
    ]
  },
  cautions: (_, { diameterRatio, specificSpeed }) => [
    {
      level: 'stop',
      about: ['runawaySpeed'],
      hazard: 'rotating',
      say: 'A runner that loses its load runs away. Guard it, and all that turns with it, for the runaway speed; keep out of its plane; take the water off before the load. Local code on guarding applies.',
    },
    {
      level: 'note',
      about: ['runawaySpeed'],
      say: 'Measured runaway is mostly 1.8 to 1.9 times the rated speed; plan bearings, alternator and controller on the figure here, which no runner exceeds.',
    },
    ...(diameterRatio !== undefined && diameterRatio < leastDiameterRatio
      ? [
          {
            level: 'check' as const,
            about: ['diameterRatio' as const],
            say: `The pitch circle is under about ${leastDiameterRatio} jets wide: buckets big enough for this jet crowd on it and spill. Take more jets, or a larger and slower runner.`,
          },
        ]
      : []),
    ...(specificSpeed !== undefined && specificSpeed < usualSpecificSpeed[0]
      ? [
          {
            level: 'check' as const,
            about: ['specificSpeed' as const],
            say: `A specific speed under ${usualSpecificSpeed[0]} makes a large slow wheel for little water; a faster and smaller runner does the same.`,
          },
        ]
      : []),
    ...(specificSpeed !== undefined && specificSpeed > usualSpecificSpeed[1]
      ? [
          {
            level: 'check' as const,
            about: ['specificSpeed' as const],
            say: `A specific speed over ${usualSpecificSpeed[1]} is too much for one jet on this kind of runner: share the water between jets, run slower, or take another kind of turbine.`,
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'whether the hub, the shaft and the buckets hold at runaway speed',
    'whether the alternator gives its voltage at this speed',
    'efficiency',
  ],
  example: {
    say: 'Over Quern: a runner for its jets, turning an alternator of 1500 rev/min by its own shaft.',
    inputs: {
      netHead: 97,
      velocityCoefficient: 0.97,
      speedRatio: 0.46,
      speed: 1500,
      jetDiameter: 0.0142,
      powerPerJet: 5900,
    },
  },
  plots: [
    {
      say: 'Twice the pitch circle, half the turns.',
      of: 'speed',
      against: 'pitchDiameter',
      from: 0.4,
      to: 2.5,
    },
  ],
  sources: [
    {
      author: 'A. V. Arasu',
      title: 'Turbomachines',
      year: 2009,
      where: 'examples 9.2 and 9.6 (as recomputed in a public collection of textbook companions)',
    },
    { author: 'F. M. White', title: 'Fluid Mechanics', year: 2011, where: 'impulse turbines (from memory)' },
  ],
})

const jetVelocityOf = (given: { jetVelocity?: number; netHead?: number; velocityCoefficient?: number }): number =>
  given.jetVelocity ?? given.velocityCoefficient! * Math.sqrt(2 * g * given.netHead!)
