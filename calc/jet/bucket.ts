import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'

/** x(1 − x) is greatest here, whatever the bucket. */
const bestSpeedRatio = 0.5
const curveSteps = 40
/** Common practice, no source. */
const slowest = 0.4

/** 1 − k·cos β: how much of the water's speed against the bucket is taken and given back, 2 for a full turn without friction. */
const turnOf = (deflectionAngle: number, bucketFriction: number): number =>
  1 - bucketFriction * Math.cos((deflectionAngle * Math.PI) / 180)

/**
 * What a bucket takes from its jet: η = 2x(1 − x)(1 − k·cos β), with x the bucket's speed over the **jet's**, β the angle by which the water is
 * turned (degrees; the side clearance is 180° − β) and k the share of its speed that the water keeps in the bucket; force ρQ(v − u)(1 − k·cos β),
 * u = x·v; torque over that at standstill 1 − x. The efficiency is on the jet's power: times Cv² it is on the water's. SI. Valid for a jet that
 * meets full buckets squarely, all of it caught; splashing, air and bearings are left out. `force` is absent without flow and jet speed. Source:
 * balance of momentum (L. Euler); examples below.
 */
export const bucket = defineCalculator({
  id: 'bucket',
  station: 'runner',
  title: 'Bucket and jet',
  summary: 'What share of the jet’s power a bucket takes, and how hard it is pushed, by how fast it runs.',
  hazards: ['rotating'],
  inputs: {
    speedRatio: {
      kind: 'scalar',
      symbol: 'x',
      label: 'Speed ratio',
      quantity: 'ratio',
      help: 'bucket speed over jet speed: 0 held still, 1 running as fast as the jet',
      range: [0, 1],
      usual: [0.4, 0.5],
      initial: 0.46,
    },
    deflectionAngle: {
      kind: 'scalar',
      symbol: '\\beta',
      label: 'Deflection angle',
      quantity: 'angle',
      help: 'by which the water is turned; 180° would send it straight back into the next bucket',
      range: [0, 180],
      usual: [155, 175],
      initial: 165,
    },
    bucketFriction: {
      kind: 'scalar',
      symbol: 'k',
      label: 'Speed kept in the bucket',
      quantity: 'ratio',
      help: 'speed of the water along the bucket, leaving over entering: 1 without friction',
      range: [0, 1],
      usual: [0.85, 1],
      initial: 0.92,
    },
    flow: {
      kind: 'scalar',
      symbol: 'Q',
      label: 'Flow',
      quantity: 'flow',
      help: 'of one jet, for the push',
      range: [1e-6, 100],
      initial: 0.0095,
      optional: true,
    },
    jetVelocity: {
      kind: 'scalar',
      symbol: 'v',
      label: 'Jet speed',
      quantity: 'velocity',
      help: 'for the push',
      range: [0.5, 250],
      usual: [8, 100],
      initial: 28.8,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    efficiency: {
      kind: 'scalar',
      symbol: '\\eta_b',
      label: 'Share of the jet’s power taken',
      quantity: 'fraction',
      help: 'without the nozzle’s own loss',
    },
    bestSpeedRatio: {
      kind: 'scalar',
      symbol: 'x_b',
      label: 'Best speed ratio',
      quantity: 'ratio',
      help: 'on paper; real wheels do best at 0.43 to 0.48',
    },
    force: { kind: 'scalar', symbol: 'F', label: 'Push on the bucket', quantity: 'force', sometimes: true },
    torqueRatio: {
      kind: 'scalar',
      symbol: 'T/T_0',
      label: 'Torque over torque at standstill',
      quantity: 'ratio',
    },
    curve: {
      kind: 'rows',
      label: 'By speed ratio',
      columns: {
        speedRatio: { kind: 'scalar', symbol: 'x', label: 'Speed ratio', quantity: 'ratio' },
        efficiency: { kind: 'scalar', symbol: '\\eta_b', label: 'Share taken', quantity: 'fraction' },
        torqueRatio: { kind: 'scalar', symbol: 'T/T_0', label: 'Torque over that at standstill', quantity: 'fraction' },
      },
    },
  },
  solve({ speedRatio, deflectionAngle, bucketFriction, flow, jetVelocity, waterTemperature }) {
    const turn = turnOf(deflectionAngle, bucketFriction)
    const efficiencyAt = (x: number) => 2 * x * (1 - x) * turn
    const found = {
      efficiency: efficiencyAt(speedRatio),
      bestSpeedRatio,
      torqueRatio: 1 - speedRatio,
      curve: Array.from({ length: curveSteps + 1 }, (_, i) => {
        const x = i / curveSteps
        return { speedRatio: x, efficiency: efficiencyAt(x), torqueRatio: 1 - x }
      }),
    }
    return flow === undefined || jetVelocity === undefined
      ? found
      : { ...found, force: waterDensity(waterTemperature) * flow * jetVelocity * (1 - speedRatio) * turn }
  },
  working(write, { deflectionAngle, bucketFriction, waterTemperature }, { force }) {
    const turn = { symbol: 'w', value: turnOf(deflectionAngle, bucketFriction), say: 'the turn' }
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say: 'The bucket stops the water’s speed against it and throws part of it back: together so many times that speed.',
        formula: write`1 - ${'bucketFriction'} \, \cos ${'deflectionAngle'} = ${turn}`,
      },
      {
        say: 'The push falls as the bucket runs away from the jet, while the work of each newton grows with its speed.',
        formula: write`${'efficiency'} = 2 \, ${'speedRatio'} \, (1 - ${'speedRatio'}) \, ${turn}`,
        gives: 'efficiency',
      },
      {
        say: 'Speed times what is left of it is greatest in the middle.',
        formula: write`${'bestSpeedRatio'} = \frac{1}{2}`,
        gives: 'bestSpeedRatio',
      },
      {
        say: 'The torque falls in a straight line, from standstill to nothing at runaway.',
        formula: write`${'torqueRatio'} = 1 - ${'speedRatio'}`,
        gives: 'torqueRatio',
      },
      ...(force === undefined
        ? []
        : [
            {
              say: 'The water of a second, times its speed against the bucket, times the turn.',
              formula: write`${'force'} = ${density} \, ${'flow'} \, ${'jetVelocity'} \, (1 - ${'speedRatio'}) \, ${turn}`,
              gives: 'force' as const,
            },
          ]),
    ]
  },
  cautions: ({ speedRatio }, { force, torqueRatio }) => [
    {
      level: 'check',
      about: ['torqueRatio'],
      hazard: 'rotating',
      say: `A bucket that is held still is pushed ${join(format(1 / Math.max(torqueRatio, 0.05), 'ratio', { digits: 2 }))} times as hard as at this speed${torqueRatio < 0.05 ? ' or more' : ''}: key and nut must hold that. Never hold, block or reach into a wheel with water behind the nozzle; guard it for runaway, as local code on guarding asks.`,
    },
    ...(speedRatio > 0 && speedRatio < slowest
      ? [
          {
            level: 'note' as const,
            about: ['speedRatio' as const, 'efficiency' as const],
            say: 'So slow a wheel leaves the water with much of its speed: it splashes, and drags on the backs of the buckets, which is not counted here.',
          },
        ]
      : []),
    {
      level: 'note',
      about: ['efficiency', 'bestSpeedRatio'],
      say: 'Splash, air drag, bearings and the nozzle come on top. Wheels in service do best at 0.43 to 0.48 of the jet’s speed, and turn 70 to 90 per cent of the jet’s power into shaft power (common practice, no source).',
    },
    ...(force === undefined
      ? [
          {
            level: 'note' as const,
            about: ['flow' as const, 'jetVelocity' as const],
            say: 'Give flow and jet speed for the push on the bucket.',
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'whether the bucket is wide enough for the jet, and the jet on its splitter',
    'splash, air drag and bearings',
    'strength of bucket, hub and shaft',
  ],
  example: {
    say: 'Over Quern: cast buckets of one jet, not polished, a little too fast.',
    inputs: { speedRatio: 0.49, deflectionAngle: 162, bucketFriction: 0.88, flow: 0.0068, jetVelocity: 42.3 },
  },
  plots: [
    {
      say: 'The share taken is a hill with a broad top; the torque falls in a straight line.',
      rows: 'curve',
      x: 'speedRatio',
      y: ['efficiency', 'torqueRatio'],
    },
  ],
  sources: [
    {
      author: 'A. V. Arasu',
      title: 'Turbomachines',
      year: 2009,
      where: 'example 9.3 (as recomputed in a public collection of textbook companions)',
    },
    {
      author: 'K. Subramanya',
      title: '1000 Solved Problems in Fluid Mechanics',
      year: 2005,
      where: 'example 16.12 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
