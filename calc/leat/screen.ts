import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { flow } from '../pipe/inputs.ts'

const sine = (degrees: number) => Math.sin((degrees * Math.PI) / 180)

/**
 * A bar screen before the pipe: the area square to the flow that keeps the water at a quiet speed v when part of it is clogged,
 * Q/(v·(1 − c)); the face that this is on a leaning screen, over sin α; the speed between the bars, v·(s + w)/s; and the head that clean bars
 * take, Kirschmer's β·(w/s)^(4/3)·v²/2g·sin α. SI; s clear gap, w bar width, α from the level ground in degrees. Valid for bars square to the
 * flow with gaps of 5 to 100 mm; good to some tens of per cent for clean bars, and nothing for leaves. Sources below.
 */
export const screen = defineCalculator({
  id: 'screen',
  station: 'intake',
  title: 'The screen',
  summary: 'How large a bar screen must be so that it does not choke, and what clean bars take of the head.',
  hazards: ['stream'],
  inputs: {
    flow: { ...flow, range: [1e-6, 1000], usual: [0.001, 2], initial: 0.0095 },
    barSpacing: {
      kind: 'scalar',
      symbol: 's',
      label: 'Clear gap',
      quantity: 'length',
      help: 'between two bars; less than half of the nozzle',
      range: [1e-4, 1],
      usual: [0.003, 0.05],
      initial: 0.008,
    },
    barWidth: {
      kind: 'scalar',
      symbol: 'w',
      label: 'Bar width',
      quantity: 'length',
      help: 'across the flow',
      range: [1e-4, 1],
      usual: [0.001, 0.02],
      initial: 0.004,
    },
    approachVelocity: {
      kind: 'scalar',
      symbol: 'v',
      label: 'Speed before the screen',
      quantity: 'velocity',
      help: 'slow enough to rake and for fish to leave: 0.1 to 0.3 m/s',
      range: [0.001, 10],
      usual: [0.05, 0.6],
      initial: 0.15,
    },
    cloggedFraction: {
      kind: 'scalar',
      symbol: 'c',
      label: 'Clogged share',
      quantity: 'fraction',
      help: 'of the screen, before somebody comes to rake it',
      range: [0, 0.99],
      usual: [0.2, 0.8],
      initial: 0.5,
    },
    screenAngle: {
      kind: 'scalar',
      symbol: '\\alpha',
      label: 'Lean of the screen',
      quantity: 'angle',
      help: 'from the level ground; 90° stands upright',
      range: [5, 90],
      usual: [30, 75],
      initial: 60,
    },
    barShapeFactor: {
      kind: 'scalar',
      symbol: '\\beta',
      label: 'Shape of the bars',
      quantity: 'ratio',
      help: 'square-edged flat bar 2.42, round bar 1.79',
      range: [0.1, 5],
      usual: [0.7, 2.5],
      initial: 2.42,
    },
  },
  outputs: {
    grossArea: {
      kind: 'scalar',
      symbol: 'A',
      label: 'Area square to the flow',
      quantity: 'area',
      help: 'at the lowest water level',
    },
    faceArea: { kind: 'scalar', symbol: 'A_f', label: 'Face of the screen', quantity: 'area' },
    throughVelocity: { kind: 'scalar', symbol: 'v_s', label: 'Speed between the bars', quantity: 'velocity' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head that clean bars take', quantity: 'head' },
  },
  solve({ flow, barSpacing, barWidth, approachVelocity, cloggedFraction, screenAngle, barShapeFactor }) {
    const lean = sine(screenAngle)
    const grossArea = flow / (approachVelocity * (1 - cloggedFraction))
    return {
      grossArea,
      faceArea: grossArea / lean,
      throughVelocity: (approachVelocity * (barSpacing + barWidth)) / barSpacing,
      headLoss:
        ((barShapeFactor * (barWidth / barSpacing) ** (4 / 3) * approachVelocity * approachVelocity) / (2 * g)) * lean,
    }
  },
  working: (write) => [
    {
      say: 'The part that stays clear must carry the flow at the quiet speed.',
      formula: write`${'grossArea'} = \frac{${'flow'}}{${'approachVelocity'} \, (1 - ${'cloggedFraction'})}`,
      gives: 'grossArea',
    },
    {
      say: 'A leaning screen has a larger face for the same depth.',
      formula: write`${'faceArea'} = \frac{${'grossArea'}}{\sin ${'screenAngle'}}`,
      gives: 'faceArea',
    },
    {
      say: 'The bars take their share of the width, so the water runs faster between them.',
      formula: write`${'throughVelocity'} = ${'approachVelocity'} \, \frac{${'barSpacing'} + ${'barWidth'}}{${'barSpacing'}}`,
      gives: 'throughVelocity',
    },
    {
      say: 'Kirschmer measured what clean bars take.',
      formula: write`${'headLoss'} = ${'barShapeFactor'} \, \left( \frac{${'barWidth'}}{${'barSpacing'}} \right)^{4/3} \, \frac{${'approachVelocity'}^2}{2 \, ${gravity}} \, \sin ${'screenAngle'}`,
      gives: 'headLoss',
    },
  ],
  cautions: (_, { throughVelocity }) => [
    {
      level: 'check',
      about: ['headLoss'],
      say: 'Leaves multiply this loss many times. Make bars and frame strong enough to stand full water on one side and none on the other: a choked screen gets just that (common practice, no source).',
    },
    {
      level: 'check',
      about: ['grossArea'],
      hazard: 'stream',
      say: 'Rake from firm ground with a rail to hold, never alone in a flood, and cover what a child could fall into. Gaps and speeds that fish need are set by local law.',
    },
    ...(throughVelocity > 0.6
      ? [
          {
            level: 'check' as const,
            about: ['throughVelocity' as const],
            say: 'So fast between the bars, leaves and small fish are pressed on and do not come off: take a larger screen (common practice, no source).',
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'how much rubbish the stream brings, and how often it is raked',
    'ice on the bars',
    'whether the bars are strong enough',
  ],
  example: {
    say: 'Over Quern: round bars under ash trees, raked once a day.',
    inputs: {
      flow: 0.0172,
      barSpacing: 0.006,
      barWidth: 0.005,
      approachVelocity: 0.12,
      cloggedFraction: 0.7,
      screenAngle: 45,
      barShapeFactor: 1.79,
    },
  },
  plots: [
    {
      say: 'The more it may clog before it is raked, the larger it must be.',
      of: 'faceArea',
      against: 'cloggedFraction',
      from: 0,
      to: 1.8,
    },
    { say: 'Gaps narrower than the bars cost head.', of: 'headLoss', against: 'barSpacing', from: 0.4, to: 3 },
  ],
  sources: [
    {
      author: 'O. Kirschmer',
      title: 'Untersuchungen über den Gefällsverlust an Rechen',
      year: 1926,
      where: 'from memory',
    },
    {
      author: 'ESHA',
      title: 'Guide on how to develop a small hydropower plant',
      year: 2004,
      where: 'ch. 5, trash racks (from memory)',
    },
  ],
})
