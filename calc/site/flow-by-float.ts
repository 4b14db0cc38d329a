import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { mean } from '../numeric/mean.ts'

/** Under this depth a rough bed slows the whole stream; the form's factor is meant for it. */
const shallow = 0.3

/**
 * Flow by float: area A = Σ width·depth of strips across the stream, surface speed v = distance over the mean time, Q = k·A·v, with k the
 * mean speed over the surface speed. SI. Valid for a straight even reach; errors about 20 %, mostly in k: 0.85 over a deep smooth bed, down
 * to 0.55 over a shallow rough one. Refused: strips without any depth (`no-solution`). Sources below.
 */
export const flowByFloat = defineCalculator({
  id: 'flow-by-float',
  station: 'stream',
  title: 'Flow by float',
  summary: 'A first idea of the flow, from the size of the stream and how fast a float goes down it.',
  hazards: ['stream'],
  inputs: {
    verticals: {
      kind: 'rows',
      label: 'Strips across the stream',
      row: 'strip',
      help: 'from bank to bank, each with the depth in its middle',
      columns: {
        width: {
          kind: 'scalar',
          symbol: 'b',
          label: 'Width',
          quantity: 'length',
          range: [0.001, 100],
          unit: 'm',
          initial: 0.3,
        },
        depth: {
          kind: 'scalar',
          symbol: 'y',
          label: 'Depth',
          quantity: 'length',
          range: [0, 20],
          unit: 'm',
          initial: 0.1,
        },
      },
      least: 1,
      most: 60,
      initial: [
        { width: 0.3, depth: 0.06 },
        { width: 0.3, depth: 0.14 },
        { width: 0.3, depth: 0.17 },
        { width: 0.3, depth: 0.09 },
      ],
    },
    distance: {
      kind: 'scalar',
      symbol: 'L',
      label: 'Distance',
      quantity: 'length',
      help: 'that the float is timed over; ten metres or more of straight even stream',
      range: [0.1, 1000],
      usual: [5, 100],
      unit: 'm',
      initial: 10,
    },
    times: {
      kind: 'series',
      symbol: 't',
      label: 'Timings',
      row: 'timing',
      quantity: 'time',
      range: [0.1, 86_400],
      usual: [10, 600],
      least: 1,
      most: 50,
      initial: [38, 41, 36, 44, 39],
    },
    surfaceFactor: {
      kind: 'scalar',
      symbol: 'k',
      label: 'Mean speed over surface speed',
      quantity: 'ratio',
      help: '0.85 deep and smooth, 0.66 under 0.3 m, 0.55 shallow over stones',
      range: [0.1, 1.2],
      usual: [0.55, 0.85],
      initial: 0.66,
    },
  },
  outputs: {
    area: { kind: 'scalar', symbol: 'A', label: 'Area of the stream', quantity: 'area', unit: 'm²' },
    meanDepth: { kind: 'scalar', symbol: '\\bar{y}', label: 'Mean depth', quantity: 'length', unit: 'm' },
    surfaceVelocity: { kind: 'scalar', symbol: 'v', label: 'Surface speed', quantity: 'velocity' },
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow', digits: 2 },
  },
  solve({ verticals, distance, times, surfaceFactor }) {
    let area = 0
    let width = 0
    for (const strip of verticals) {
      area += strip.width * strip.depth
      width += strip.width
    }
    if (area === 0)
      throw new CalculationError('no-solution', 'verticals', 'No strip has any depth: give the depth of at least one.')
    const surfaceVelocity = distance / mean(times)
    return { area, meanDepth: area / width, surfaceVelocity, flow: surfaceFactor * area * surfaceVelocity }
  },
  working(write, { verticals, times }) {
    const aside = (symbol: string, value: number, say: string) => ({ symbol, value, say })
    const strips = aside(
      '\\textstyle\\sum b\\,y',
      verticals.reduce((sum, { width, depth }) => sum + width * depth, 0),
      'the sum of each width times its depth',
    )
    const width = aside(
      '\\textstyle\\sum b',
      verticals.reduce((sum, strip) => sum + strip.width, 0),
      'the width of the stream',
    )
    return [
      {
        say: 'Each strip is as wide as it is, and as deep as in its middle.',
        formula: write`${'area'} = ${strips}`,
        gives: 'area',
      },
      {
        say: 'Spread over the width that makes the mean depth.',
        formula: write`${'meanDepth'} = \frac{${'area'}}{${width}}`,
        gives: 'meanDepth',
      },
      {
        say: 'The float goes with the surface; the mean of the timings counts.',
        formula: write`${'surfaceVelocity'} = \frac{${'distance'}}{${aside('\\bar{t}', mean(times), 'the mean of the timings')}}`,
        gives: 'surfaceVelocity',
      },
      {
        say: 'The bed holds the water back: all of the stream together is slower than its surface.',
        formula: write`${'flow'} = ${'surfaceFactor'} \, ${'area'} \, ${'surfaceVelocity'}`,
        gives: 'flow',
      },
    ]
  },
  cautions: ({ times, surfaceFactor }, { meanDepth }) => [
    {
      level: 'check',
      about: ['flow'],
      say: 'Take this flow as good to about 20 per cent (common practice, no source): enough to see whether a scheme is worth measuring properly, not to size one.',
    },
    ...(meanDepth < shallow && surfaceFactor > 0.7
      ? [
          {
            level: 'check' as const,
            about: ['surfaceFactor' as const, 'meanDepth' as const],
            say: 'Under 0.3 m of depth a stony bed holds the whole stream back: a factor of 0.55 to 0.66 is nearer than the one given.',
          },
        ]
      : []),
    ...(times.length < 3
      ? [
          {
            level: 'note' as const,
            about: ['times' as const],
            say: 'Time several floats, left, middle and right, and leave out those that were caught.',
          },
        ]
      : []),
    {
      level: 'stop',
      about: ['verticals'],
      hazard: 'stream',
      say: 'Do not wade where it is deeper than the knee, fast or cold: measure the depths from the bank or from a plank, never alone. Local rules for work in water come first.',
    },
  ],
  doesNotCheck: ['wind on the float', 'whether the depths were taken where the float was timed'],
  example: {
    say: 'Nether Pollow: a broad reach below the old mill, timed with oranges.',
    inputs: {
      verticals: [
        { width: 0.6, depth: 0.18 },
        { width: 0.6, depth: 0.41 },
        { width: 0.6, depth: 0.52 },
        { width: 0.6, depth: 0.47 },
        { width: 0.5, depth: 0.22 },
      ],
      distance: 20,
      times: [47, 51, 44, 49],
      surfaceFactor: 0.75,
    },
  },
  sources: [
    {
      author: 'C. E. Boyd',
      title: 'Measuring water flow, Responsible Seafood Advocate (factors by depth)',
      year: 2008,
      where: 'table 1 (year from memory)',
    },
    {
      author: 'S. E. Rantz and others',
      title: 'Measurement and Computation of Streamflow, USGS Water-Supply Paper 2175',
      year: 1982,
      where: 'vol. 1, pp. 261–262 (from memory)',
    },
  ],
})
