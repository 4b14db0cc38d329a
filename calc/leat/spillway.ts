import { defineCalculator } from '../definition.ts'

/** Of the freeboard no more than this share should be used: Civil Works Guidelines for Micro-Hydropower in Nepal, 4. */
const shareOfFreeboard = 0.5

/**
 * A spillway in the side of a leat or forebay as a level weir: Q = C·b·h^1.5, so the water stands h = (Q/(C·b))^(2/3) over its crest, and
 * the margin is the freeboard, crest to top of bank, less h. SI, C in m^½/s: 1.44 to 1.5 broad and sharp-edged, 1.6 broad and rounded, 1.8 to
 * 1.9 a thin plate, 2.2 a rounded overfall. Valid where the water below does not stand over the crest; along a leat with no pond the head
 * falls along the crest and it passes less (about half). Errors about 10 %, as of C. Sources below.
 */
export const spillway = defineCalculator({
  id: 'spillway',
  station: 'leat',
  title: 'A spillway',
  summary: 'How high the water stands over a spillway when all of the flood must leave by it.',
  hazards: ['stream'],
  inputs: {
    floodFlow: {
      kind: 'scalar',
      symbol: 'Q',
      label: 'Flow to spill',
      quantity: 'flow',
      help: 'all that the leat can bring in a flood, with the pipe shut',
      range: [0, 1000],
      initial: 0.035,
    },
    crestLength: {
      kind: 'scalar',
      symbol: 'b',
      label: 'Length of the crest',
      quantity: 'length',
      help: 'level from end to end',
      range: [0.01, 1000],
      usual: [0.2, 50],
      unit: 'm',
      initial: 0.8,
    },
    coefficient: {
      kind: 'scalar',
      symbol: 'C',
      label: 'Weir coefficient',
      quantity: 'weirCoefficient',
      help: 'broad and sharp 1.45, broad and rounded 1.6, thin plate 1.85',
      range: [0.3, 4],
      usual: [1.4, 2.3],
      initial: 1.6,
    },
    freeboard: {
      kind: 'scalar',
      symbol: 'f',
      label: 'Freeboard',
      quantity: 'length',
      help: 'from the crest up to the top of the lowest bank',
      range: [0.001, 20],
      usual: [0.1, 2],
      unit: 'm',
      initial: 0.25,
    },
  },
  outputs: {
    crestHead: { kind: 'scalar', symbol: 'h', label: 'Water over the crest', quantity: 'length', unit: 'm' },
    margin: {
      kind: 'scalar',
      symbol: 'm',
      label: 'Bank left above the water',
      quantity: 'length',
      unit: 'm',
    },
  },
  solve({ floodFlow, crestLength, coefficient, freeboard }) {
    const crestHead = Math.cbrt((floodFlow / (coefficient * crestLength)) ** 2)
    return { crestHead, margin: freeboard - crestHead }
  },
  working: (write) => [
    {
      say: 'A longer crest, or a smoother one, passes the same flow with less water over it.',
      formula: write`${'crestHead'} = \left(\frac{${'floodFlow'}}{${'coefficient'} \, ${'crestLength'}}\right)^{2/3}`,
      gives: 'crestHead',
    },
    {
      say: 'What the bank still stands above that water.',
      formula: write`${'margin'} = ${'freeboard'} - ${'crestHead'}`,
      gives: 'margin',
    },
  ],
  cautions: ({ freeboard }, { crestHead, margin }) => [
    ...(margin < 0
      ? [
          {
            level: 'stop' as const,
            about: ['margin' as const],
            say: 'The water goes over the bank before the spillway has taken it all: a leat that overtops cuts its own bank away. Make the crest longer or lower.',
          },
        ]
      : []),
    ...(margin >= 0 && crestHead > shareOfFreeboard * freeboard
      ? [
          {
            level: 'check' as const,
            about: ['margin' as const],
            say: 'More than half of the freeboard is used: leaves on the crest, waves and a sunken bank soon take the rest.',
          },
        ]
      : []),
    {
      level: 'check',
      about: ['floodFlow'],
      say: 'Size it for the whole flow of the leat in flood with the pipe shut: that is when the screen is blocked or the valve is closed. A leat without a pond at the crest needs about twice the length found so.',
    },
    {
      level: 'check',
      about: ['floodFlow'],
      hazard: 'stream',
      say: 'Lead what spills back to the stream over rock or stone pitching, never loose onto the hillside: it starts slips and floods neighbours. Keep people out of a spilling channel; works in and by the stream are ruled by local code.',
    },
  ],
  doesNotCheck: [
    'how large the flood is',
    'whether the ground below the crest bears the water',
    'whether the water below stands over the crest and holds it back',
  ],
  example: {
    say: 'Nether Pollow: the whole leat in flood over a rounded stone crest by the forebay.',
    inputs: { floodFlow: 0.42, crestLength: 3.5, coefficient: 1.6, freeboard: 0.4 },
  },
  plots: [
    {
      say: 'Half the crest, and the water stands more than half as high again.',
      of: 'crestHead',
      against: 'crestLength',
      from: 0.25,
      to: 3,
    },
  ],
  sources: [
    {
      author: 'Practical Action Nepal, BPC Hydroconsult',
      title: 'Civil Works Guidelines for Micro-Hydropower in Nepal',
      year: 2008,
      where: 'chapter 4, spillways and example 4.2 (year from memory)',
    },
  ],
})
