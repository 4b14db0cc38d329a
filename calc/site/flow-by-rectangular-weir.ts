import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { thinPlateCautions } from './thin-plate.ts'

/**
 * Coefficient Ce = α + β·h/p against the share b/B of the channel that the crest takes: Kindsvater and Carter, as M. G. Bos (1989) and
 * ISO 1438 tabulate it (from memory; checked against the Bureau of Reclamation's figures, which were read, within 0.4 %).
 */
const coefficients: readonly (readonly [share: number, alpha: number, beta: number])[] = [
  [0, 0.587, -0.0023],
  [0.1, 0.588, -0.0021],
  [0.2, 0.589, -0.0018],
  [0.3, 0.59, 0.002],
  [0.4, 0.591, 0.0058],
  [0.5, 0.592, 0.011],
  [0.6, 0.593, 0.018],
  [0.7, 0.595, 0.03],
  [0.8, 0.597, 0.045],
  [0.9, 0.599, 0.064],
  [1, 0.602, 0.075],
]
/** What is added to the width, m, against b/B: points of the figure of ISO 1438 (from memory; 2.4 mm at 0 and −0.9 mm at 1 are printed). */
const widthCorrections: readonly (readonly [share: number, metres: number])[] = [
  [0, 0.0024],
  [0.2, 0.0024],
  [0.4, 0.0027],
  [0.6, 0.0036],
  [0.8, 0.0043],
  [0.9, 0.0034],
  [1, -0.0009],
]
/** What is added to the head, m. */
const headCorrection = 0.001

/** A column of a table at a share, linear between its rows; the first row stands at 0, the last at 1. */
const between = (table: readonly (readonly number[])[], column: number, share: number): number => {
  let i = 1
  while (i < table.length - 1 && table[i]![0]! < share) i++
  const [low, high] = [table[i - 1]!, table[i]!]
  return low[column]! + ((high[column]! - low[column]!) * (share - low[0]!)) / (high[0]! - low[0]!)
}

/** The limits of ISO 1438 for the formula of Kindsvater and Carter (from memory). */
const limits = { head: 0.03, headOverCrestHeight: 2.5, crestWidth: 0.15, crestHeight: 0.1, sides: 0.1 } as const

/**
 * Flow over a sharp level crest of width b in a channel of width B, its crest p over the bed: Q = 2/3·Ce·√(2g)·(b + kb)·(h + kh)^1.5
 * (Kindsvater and Carter), Ce = α + β·h/p and kb by b/B, kh = 1 mm. SI. Valid for h at least 30 mm, h/p up to 2.5, b at least 0.15 m, p at
 * least 0.1 m, and sides (B − b)/2 of none or at least 0.1 m. Errors: 1.5 to 3 % in Ce, and 1.5 % of flow for each 1 % of head. Refused: a
 * crest wider than its channel (`inconsistent`). Sources below.
 */
export const flowByRectangularWeir = defineCalculator({
  id: 'flow-by-rectangular-weir',
  station: 'stream',
  title: 'Flow by rectangular weir',
  summary: 'What runs over a sharp level crest, from the height of the water behind it.',
  hazards: ['stream'],
  inputs: {
    head: {
      kind: 'scalar',
      symbol: 'h',
      label: 'Head over the crest',
      quantity: 'length',
      help: 'from the crest up to still water, read about four heads upstream',
      range: [0.001, 5],
      initial: 0.062,
    },
    crestWidth: {
      kind: 'scalar',
      symbol: 'b',
      label: 'Width of the crest',
      quantity: 'length',
      help: 'of the notch, side to side',
      range: [0.01, 100],
      unit: 'm',
      initial: 0.45,
    },
    channelWidth: {
      kind: 'scalar',
      symbol: 'B',
      label: 'Width of the channel',
      quantity: 'length',
      help: 'of the pool behind the plate; as wide as the crest where the crest takes all of it',
      range: [0.01, 200],
      unit: 'm',
      initial: 1,
    },
    crestHeight: {
      kind: 'scalar',
      symbol: 'p',
      label: 'Height of the crest',
      quantity: 'length',
      help: 'over the bed of the pool',
      range: [0.01, 20],
      unit: 'm',
      initial: 0.3,
    },
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    effectiveCoefficient: {
      kind: 'scalar',
      symbol: 'C_e',
      label: 'Discharge coefficient',
      quantity: 'ratio',
      help: 'goes with the corrected width and head',
    },
  },
  solve({ head, crestWidth, channelWidth, crestHeight }) {
    if (crestWidth > channelWidth)
      throw new CalculationError(
        'inconsistent',
        'channelWidth',
        'The channel cannot be narrower than the crest in it: give at least the width of the crest.',
      )
    const share = crestWidth / channelWidth
    const effectiveCoefficient =
      between(coefficients, 1, share) + (between(coefficients, 2, share) * head) / crestHeight
    return {
      flow:
        (2 / 3) *
        effectiveCoefficient *
        Math.sqrt(2 * g) *
        (crestWidth + between(widthCorrections, 1, share)) *
        (head + headCorrection) ** 1.5,
      effectiveCoefficient,
    }
  },
  working(write, { crestWidth, channelWidth }) {
    const share = crestWidth / channelWidth
    const alpha = { symbol: '\\alpha', value: between(coefficients, 1, share), say: 'alpha' }
    const beta = { symbol: '\\beta', value: between(coefficients, 2, share), say: 'beta', digits: 3 }
    const width = {
      symbol: 'k_b',
      value: between(widthCorrections, 1, share),
      say: 'the correction of the width',
      digits: 2,
    }
    const head = { symbol: 'k_h', value: headCorrection, say: 'the correction of the head' }
    return [
      {
        say: 'How much of the channel the crest takes decides three figures of the standard’s table and curve: alpha, beta, and what is added to the width.',
        formula: write`\frac{${'crestWidth'}}{${'channelWidth'}} = ${{ symbol: 'b/B', value: share, say: 'the share of the channel', digits: 3 }}`,
      },
      {
        say: 'A low crest lets the water come on fast: the coefficient rises with the head over the height of the crest.',
        formula: write`${'effectiveCoefficient'} = ${alpha} + ${beta} \, \frac{${'head'}}{${'crestHeight'}}`,
        gives: 'effectiveCoefficient',
      },
      {
        say: 'Width, and head to the power 1.5, each with its small correction, make the flow.',
        formula: write`${'flow'} = \frac{2}{3} \, ${'effectiveCoefficient'} \, \sqrt{2 \, ${gravity}} \, (${'crestWidth'} + ${width}) \, (${'head'} + ${head})^{1.5}`,
        gives: 'flow',
      },
    ]
  },
  cautions({ head, crestWidth, channelWidth, crestHeight }) {
    const side = (channelWidth - crestWidth) / 2
    const outside = [
      head < limits.head ? 'the head is under 30 mm, where water clings to the plate' : '',
      head > limits.headOverCrestHeight * crestHeight ? 'the head is over 2.5 times the height of the crest' : '',
      crestWidth < limits.crestWidth ? 'the crest is narrower than 0.15 m' : '',
      crestHeight < limits.crestHeight ? 'the crest is less than 0.1 m over the bed' : '',
      side > 0 && side < limits.sides ? 'the plate stands out less than 0.1 m at each side' : '',
    ].filter(Boolean)
    return [
      ...(outside.length > 0
        ? [
            {
              level: 'check' as const,
              about: ['head' as const, 'crestWidth' as const, 'channelWidth' as const, 'crestHeight' as const],
              say: `Outside the limits of ISO 1438 for this formula: ${outside.join('; ')}. The flow may then be off by more than a few per cent.`,
            },
          ]
        : []),
      ...(side === 0
        ? [
            {
              level: 'note' as const,
              about: ['crestWidth' as const],
              say: 'Where the crest takes the whole channel no air comes in from the sides: let it in below the sheet of water by a pipe.',
            },
          ]
        : []),
      ...thinPlateCautions,
    ]
  },
  doesNotCheck: [
    'whether all of the stream runs over the crest, and none under or around it',
    'whether the crest is level from side to side',
  ],
  example: {
    say: 'Nether Pollow: a plate across the tail of a pool, for a broad and gentle stream.',
    inputs: { head: 0.114, crestWidth: 1.2, channelWidth: 2, crestHeight: 0.4 },
  },
  plots: [
    {
      say: 'Twice the head is not quite three times the flow.',
      of: 'flow',
      against: 'head',
      from: 0.3,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'ISO',
      title: 'ISO 1438, Hydrometry: open channel flow measurement using thin-plate weirs',
      year: 2017,
      where: 'formula of Kindsvater and Carter, its table and limits (from memory)',
    },
    {
      author: 'US Bureau of Reclamation',
      title: 'Water Measurement Manual, 3rd ed., revised reprint',
      year: 2001,
      where: 'chapter 7, section 6',
    },
    {
      author: 'M. G. Bos (ed.)',
      title: 'Discharge Measurement Structures, 3rd ed., ILRI Publication 20',
      year: 1989,
      where: 'rectangular sharp-crested weirs (from memory)',
    },
  ],
})
