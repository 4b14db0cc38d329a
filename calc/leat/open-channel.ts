import { g } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { flow } from '../pipe/inputs.ts'
import { format, join } from '../units/format.ts'

/** Leats carry some silt and have soft banks. Common practice, no source. */
const silts = 0.3
const scoursEarth = 0.6
const scoursStone = 1.5
/** Common practice, no source. */
const leastFreeboard = 0.15

interface Channel {
  bottomWidth: number
  sideSlope: number
  bedSlope: number
  manningN: number
}

const areaAt = ({ bottomWidth, sideSlope }: Channel, depth: number) => (bottomWidth + sideSlope * depth) * depth
const perimeterAt = ({ bottomWidth, sideSlope }: Channel, depth: number) =>
  bottomWidth + 2 * depth * Math.sqrt(1 + sideSlope * sideSlope)

/** Manning: Q = A·R^(2/3)·S^(1/2)/n, for even flow at this depth. */
const flowAt = (channel: Channel, depth: number): number => {
  if (depth === 0) return 0
  const area = areaAt(channel, depth)
  return (area * Math.cbrt(area / perimeterAt(channel, depth)) ** 2 * Math.sqrt(channel.bedSlope)) / channel.manningN
}

const normalDepthOf = (channel: Channel, flow: number): number | undefined => {
  let high = 0.1
  while (flowAt(channel, high) < flow) {
    high *= 2
    if (high > 1e6) return undefined
  }
  return bracketedRoot((depth) => flowAt(channel, depth) - flow, 0, high, { tolerance: 1e-11 })
}

/**
 * A leat of trapezoidal, rectangular or triangular section in even flow: the depth y at which Manning's formula Q = A·R^(2/3)·√S/n gives the
 * flow, by a bracketed root; speed, width at the water, wetted perimeter P, hydraulic radius R = A/P, Froude number v/√(g·A/T). SI, slope in
 * m/m, sides horizontal : vertical. Valid for even, fully turbulent flow in a channel of one slope and one lining; n is known to 10 or 20 % at
 * best, the depth to about half of that. Refused: a channel without width and without sloping sides (`inconsistent`). Sources below.
 */
export const openChannel = defineCalculator({
  id: 'open-channel',
  station: 'leat',
  title: 'Water in a leat',
  summary: 'How deep and how fast the water runs in an open channel, and whether it silts or scours.',
  hazards: ['stream', 'digging'],
  inputs: {
    flow: { ...flow, range: [1e-6, 1000], usual: [0.001, 2], initial: 0.02 },
    bottomWidth: {
      kind: 'scalar',
      symbol: 'b',
      label: 'Bottom width',
      quantity: 'length',
      range: [0, 1000],
      usual: [0.1, 5],
      initial: 0.3,
    },
    sideSlope: {
      kind: 'scalar',
      symbol: 'z',
      label: 'Side slope',
      quantity: 'ratio',
      help: 'out for each one up: 0 is a wall, 1.5 stands in firm earth',
      range: [0, 20],
      usual: [0, 3],
      initial: 1,
    },
    bedSlope: {
      kind: 'scalar',
      symbol: 'S',
      label: 'Bed slope',
      quantity: 'gradient',
      help: 'fall over length',
      range: [1e-7, 1],
      usual: [5e-4, 0.02],
      initial: 0.003,
    },
    manningN: {
      kind: 'scalar',
      symbol: 'n',
      label: 'Manning n',
      quantity: 'ratio',
      help: 'of the lining as it will be with moss and silt: earth 0.022 to 0.035',
      range: [0.001, 1],
      usual: [0.009, 0.07],
      initial: 0.025,
      pick: { table: 'manning', column: 'manningN' },
    },
  },
  outputs: {
    normalDepth: { kind: 'scalar', symbol: 'y', label: 'Depth', quantity: 'length' },
    velocity: { kind: 'scalar', symbol: 'v', label: 'Water speed', quantity: 'velocity' },
    topWidth: { kind: 'scalar', symbol: 'T', label: 'Width at the water', quantity: 'length' },
    wettedPerimeter: { kind: 'scalar', symbol: 'P', label: 'Wetted perimeter', quantity: 'length' },
    hydraulicRadius: { kind: 'scalar', symbol: 'R', label: 'Hydraulic radius', quantity: 'length' },
    froude: { kind: 'scalar', symbol: '\\mathrm{Fr}', label: 'Froude number', quantity: 'ratio' },
  },
  solve(given) {
    const { flow, bottomWidth, sideSlope } = given
    if (bottomWidth === 0 && sideSlope === 0)
      throw new CalculationError(
        'inconsistent',
        'sideSlope',
        'A channel without a bottom has sloping sides: give a bottom width, or a side slope above 0.',
      )
    const normalDepth = normalDepthOf(given, flow)
    if (normalDepth === undefined)
      throw new CalculationError(
        'no-solution',
        'flow',
        'This channel cannot carry the flow at any depth that a channel has: give it more fall or more width.',
      )
    const area = areaAt(given, normalDepth)
    const velocity = flow / area
    const topWidth = bottomWidth + 2 * sideSlope * normalDepth
    const wettedPerimeter = perimeterAt(given, normalDepth)
    return {
      normalDepth,
      velocity,
      topWidth,
      wettedPerimeter,
      hydraulicRadius: area / wettedPerimeter,
      froude: velocity / Math.sqrt((g * area) / topWidth),
    }
  },
  working(write, given, { normalDepth }) {
    const area = { symbol: 'A', value: areaAt(given, normalDepth), say: 'the area of the water' }
    return [
      {
        say: 'The depth is tried until the formula of Manning gives the flow.',
        formula: write`${'flow'} = \frac{1}{${'manningN'}} \, ${area} \, ${'hydraulicRadius'}^{2/3} \, ${'bedSlope'}^{1/2}`,
        gives: 'normalDepth',
      },
      {
        say: 'The sides lean out, so the water is wider than the bottom.',
        formula: write`${'topWidth'} = ${'bottomWidth'} + 2 \, ${'sideSlope'} \, ${'normalDepth'}`,
        gives: 'topWidth',
      },
      {
        say: 'Bottom and sides that the water touches.',
        formula: write`${'wettedPerimeter'} = ${'bottomWidth'} + 2 \, ${'normalDepth'} \, \sqrt{1 + ${'sideSlope'}^2}`,
        gives: 'wettedPerimeter',
      },
      {
        say: 'The area of the water over what it touches.',
        formula: write`${'hydraulicRadius'} = \frac{${area}}{${'wettedPerimeter'}}`,
        gives: 'hydraulicRadius',
      },
      {
        say: 'The flow over the area is the speed.',
        formula: write`${'velocity'} = \frac{${'flow'}}{${area}}`,
        gives: 'velocity',
      },
      {
        say: 'Below 1 the water runs calm and waves can travel up; above 1 it shoots.',
        formula: write`${'froude'} = \frac{${'velocity'}}{\sqrt{${{ symbol: 'g', value: g, say: 'gravity', digits: 4 }} \, ${area} / ${'topWidth'}}}`,
        gives: 'froude',
      },
    ]
  },
  cautions(_, { normalDepth, velocity, froude }) {
    const speed = join(format(velocity, 'velocity'))
    return [
      {
        level: 'check',
        about: ['normalDepth'],
        hazard: 'stream',
        say: `Make the banks higher than the water: at least ${join(format(Math.max(leastFreeboard, normalDepth / 3), 'length', { digits: 2 }))} of freeboard, and a spillway for floods and for the pipe shut (common practice, no source). Taking water and work in a stream need the leave that local law asks for.`,
      },
      {
        level: 'check',
        about: ['bottomWidth'],
        hazard: 'digging',
        say: 'Find buried cables and pipes before you dig, shore what is deep, and keep off a bank that moves: local code rules excavations.',
      },
      ...(velocity < silts
        ? [
            {
              level: 'check' as const,
              about: ['velocity' as const],
              say: `At ${speed} silt settles and weed grows: more fall or a narrower bed keeps it clean (common practice, no source).`,
            },
          ]
        : []),
      ...(velocity > scoursEarth
        ? [
            {
              level: 'check' as const,
              about: ['velocity' as const],
              say:
                velocity > scoursStone
                  ? `At ${speed} the water carries stones away: line the leat with concrete or timber, or give it less fall (common practice, no source).`
                  : `At ${speed} the water washes bare earth away: line it with stone, or give it less fall (common practice, no source).`,
            },
          ]
        : []),
      ...(froude > 0.8 && froude < 1.2
        ? [
            {
              level: 'check' as const,
              about: ['froude' as const],
              say: 'So near to a Froude number of 1 the surface stands in waves and the depth changes with every stone: change the slope.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'whether the ground holds the leat, and what seeps away',
    'bends, drops, culverts and ice',
    'how much of the stream may be taken',
  ],
  example: {
    say: 'Sorrelthwaite: an old mill leat, dressed stone below and grass above.',
    inputs: { flow: 0.055, bottomWidth: 0.45, sideSlope: 0.5, bedSlope: 0.002, manningN: 0.03 },
  },
  plots: [
    {
      say: 'A little more fall makes the water shallower and faster.',
      of: 'velocity',
      against: 'bedSlope',
      from: 0.2,
      to: 3,
    },
    { say: 'The depth grows slower than the flow.', of: 'normalDepth', against: 'flow', from: 0.2, to: 2.5 },
  ],
  sources: [
    { author: 'V. T. Chow', title: 'Open-Channel Hydraulics', year: 1959, where: 'ch. 5 and 6' },
    { author: 'R. Manning', title: 'On the flow of water in open channels and pipes', year: 1891 },
  ],
})
