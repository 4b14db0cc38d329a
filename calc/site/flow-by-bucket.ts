import { defineCalculator } from '../definition.ts'
import { mean, uncertaintyOfMean } from '../numeric/mean.ts'

/**
 * A small stream led into a vessel and timed: flow Q = V/t̄, with the standard uncertainty of the timings (type A) joined with the volume's.
 * SI. One timing says nothing about its own spread, so the uncertainty is then absent. Valid for a vessel of 0.1 L to 100 m³ and timings
 * of 0.1 s to a day. Source: JCGM 100:2008 (GUM) for the uncertainty.
 */
export const flowByBucket = defineCalculator({
  id: 'flow-by-bucket',
  station: 'stream',
  title: 'Flow by bucket and stopwatch',
  summary: 'What a small stream gives, from a vessel of known volume and the time it takes to fill.',
  hazards: ['stream'],
  inputs: {
    volume: {
      kind: 'scalar',
      symbol: 'V',
      label: 'Volume',
      quantity: 'volume',
      help: 'to the mark; weigh the water once to be sure: a litre weighs a kilogram',
      range: [1e-4, 100],
      usual: [0.005, 2],
      initial: 0.06,
    },
    times: {
      kind: 'series',
      symbol: 't',
      label: 'Timings',
      row: 'timing',
      quantity: 'time',
      range: [0.1, 86_400],
      usual: [5, 600],
      least: 1,
      most: 50,
      initial: [8.2, 8.5, 8.1],
    },
    volumeUncertainty: {
      kind: 'scalar',
      symbol: 'u_V',
      label: 'Uncertainty of the volume',
      quantity: 'volume',
      help: 'one standard uncertainty',
      range: [0, 10],
      optional: true,
    },
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    standardUncertainty: {
      kind: 'scalar',
      symbol: 'u_Q',
      label: 'Standard uncertainty',
      quantity: 'flow',
      digits: 2,
      sometimes: true,
    },
    meanTime: { kind: 'scalar', symbol: '\\bar{t}', label: 'Mean time', quantity: 'time' },
  },
  solve({ volume, times, volumeUncertainty = 0 }) {
    const meanTime = mean(times)
    const flow = volume / meanTime
    return {
      flow,
      meanTime,
      ...(times.length < 2
        ? {}
        : {
            standardUncertainty:
              flow * Math.hypot(uncertaintyOfMean(times, meanTime) / meanTime, volumeUncertainty / volume),
          }),
    }
  },
  working(write, { volume, times, volumeUncertainty = 0 }, { meanTime, standardUncertainty }) {
    const count = { symbol: 'n', value: times.length, say: 'the number of timings' }
    const total = {
      symbol: '\\textstyle\\sum t',
      value: times.reduce((sum, t) => sum + t, 0),
      say: 'the sum of the timings',
    }
    return [
      {
        say: 'The mean of the timings counts; a single slip of the thumb counts less that way.',
        formula: write`${'meanTime'} = \frac{${total}}{${count}}`,
        gives: 'meanTime',
      },
      {
        say: 'The flow is the volume over the time it takes.',
        formula: write`${'flow'} = \frac{${'volume'}}{${'meanTime'}}`,
        gives: 'flow',
      },
      ...(standardUncertainty === undefined
        ? []
        : [
            {
              say: 'The scatter of the timings, shared among them, and what is not known of the volume are joined as shares.',
              formula: write`${'standardUncertainty'} = ${'flow'} \, \sqrt{${{
                symbol: '\\left(\\frac{u_t}{\\bar{t}}\\right)',
                value: uncertaintyOfMean(times, meanTime) / meanTime,
                say: 'the share of the timings',
                digits: 2,
              }}^2 + ${{
                symbol: '\\left(\\frac{u_V}{V}\\right)',
                value: volumeUncertainty / volume,
                say: 'the share of the volume',
                digits: 2,
              }}^2}`,
              gives: 'standardUncertainty' as const,
            },
          ]),
    ]
  },
  cautions: ({ times }, { meanTime }) => [
    ...(meanTime < 5
      ? [
          {
            level: 'check' as const,
            about: ['times' as const],
            say: 'Under five seconds the thumb on the stopwatch rules the answer: use a larger vessel (common practice, no source).',
          },
        ]
      : []),
    ...(times.length < 3
      ? [
          {
            level: 'note' as const,
            about: ['times' as const],
            say: 'Time it at least three times: one timing cannot show its own error.',
          },
        ]
      : []),
    {
      level: 'check',
      about: ['volume'],
      hazard: 'stream',
      say: 'Stand on firm ground, not in the flow, and do not lift a full vessel: tip it. Local rules for work in and by water come first.',
    },
  ],
  doesNotCheck: ['whether all of the stream runs into the vessel', 'whether today is like the rest of the year'],
  example: {
    say: 'A side stream at Over Quern, led into a barrel of 120 litres.',
    inputs: { volume: 0.12, times: [14.6, 15.1, 14.4, 14.9], volumeUncertainty: 0.002 },
  },
  sources: [
    {
      author: 'JCGM',
      title: 'Evaluation of measurement data: guide to the expression of uncertainty in measurement (JCGM 100)',
      year: 2008,
      where: '4.2 and 5.1',
    },
  ],
})
