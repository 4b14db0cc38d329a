import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { netHead, velocityCoefficient } from './inputs.ts'

/** From this share of full flow on the needle hardly throttles (common practice, no source). */
const nearlyOpen = 0.9

interface Needle {
  seatDiameter: number
  needleHalfAngle: number
  stroke: number
}

const boreOf = (seatDiameter: number): number => (Math.PI / 4) * seatDiameter ** 2

/** The gap, square to the needle's cone, from the edge of the seat: the side of a cut cone. */
const gapOf = ({ seatDiameter, needleHalfAngle, stroke }: Needle): number => {
  const angle = (needleHalfAngle * Math.PI) / 180
  const width = stroke * Math.sin(angle)
  return Math.PI * (seatDiameter * width - width ** 2 * Math.cos(angle))
}

/** The stroke at which the gap is as large as the bore. */
const fullStroke = (seatDiameter: number, needleHalfAngle: number): number => {
  const angle = (needleHalfAngle * Math.PI) / 180
  return (seatDiameter * (1 - Math.sqrt(1 - Math.cos(angle)))) / (2 * Math.cos(angle) * Math.sin(angle))
}

/**
 * A needle in its nozzle: drawn back by the stroke s, it opens a ring between the seat's edge (diameter d) and its cone (half angle α), measured
 * square to the cone: A = π(d·s·sin α − s²·sin²α·cos α), until that is as large as the bore πd²/4, which then rules. Flow Q = Cv·Cc·A·√(2gH). SI,
 * degrees. Valid for a straight cone that shuts on the seat's edge; real needles are rounded, and Cc changes with the stroke (0.8 to 0.95), so the
 * maker's curve goes before it. Refused outside the ranges. Source: geometry.
 */
export const needle = defineCalculator({
  id: 'needle',
  station: 'jet',
  title: 'The needle',
  summary: 'How much water a needle lets through at each stroke, and from where on it hardly changes anything.',
  hazards: ['pressure'],
  inputs: {
    seatDiameter: {
      kind: 'scalar',
      symbol: 'd',
      label: 'Seat diameter',
      quantity: 'length',
      help: 'the bore at the nozzle’s mouth, where the needle shuts',
      range: [0.001, 1],
      usual: [0.008, 0.4],
      initial: 0.024,
    },
    needleHalfAngle: {
      kind: 'scalar',
      symbol: '\\alpha',
      label: 'Half angle of the needle',
      quantity: 'angle',
      help: 'between its side and its middle line: half of the angle at its point',
      range: [2, 85],
      usual: [18, 35],
      initial: 25,
    },
    stroke: {
      kind: 'scalar',
      symbol: 's',
      label: 'Stroke',
      quantity: 'length',
      help: 'how far it is drawn back from shut: turns of the wheel times the pitch of its screw',
      range: [0, 5],
      initial: 0.012,
    },
    netHead: { ...netHead, initial: 45 },
    velocityCoefficient: { ...velocityCoefficient, initial: 0.97 },
    contractionCoefficient: {
      kind: 'scalar',
      symbol: 'C_c',
      label: 'Contraction coefficient',
      quantity: 'ratio',
      help: 'jet over opening; behind a needle mostly 0.8 to 0.95',
      range: [0.5, 1],
      usual: [0.8, 1],
      initial: 0.88,
      fallback: 1,
      optional: true,
    },
  },
  outputs: {
    openingArea: { kind: 'scalar', symbol: 'A', label: 'Opening', quantity: 'area', unit: 'mm²' },
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    fullFlowFraction: {
      kind: 'scalar',
      symbol: 'q',
      label: 'Share of full flow',
      quantity: 'fraction',
      help: 'of what the bore passes with the needle out of the way',
    },
  },
  solve(given) {
    const { seatDiameter, needleHalfAngle, stroke, netHead, velocityCoefficient, contractionCoefficient } = given
    const bore = boreOf(seatDiameter)
    const openingArea = stroke < fullStroke(seatDiameter, needleHalfAngle) ? gapOf(given) : bore
    return {
      openingArea,
      flow: velocityCoefficient * contractionCoefficient * openingArea * Math.sqrt(2 * g * netHead),
      fullFlowFraction: openingArea / bore,
    }
  },
  working: (write, given) => [
    given.stroke < fullStroke(given.seatDiameter, given.needleHalfAngle)
      ? {
          say: 'The ring between the edge of the seat and the needle, square to the needle’s side.',
          formula: write`${'openingArea'} = \pi \, (${'seatDiameter'} \, ${'stroke'} \, \sin ${'needleHalfAngle'} - ${'stroke'}^2 \, (\sin ${'needleHalfAngle'})^2 \, \cos ${'needleHalfAngle'})`,
          gives: 'openingArea' as const,
        }
      : {
          say: 'The ring is larger than the bore by now: the bore itself decides.',
          formula: write`${'openingArea'} = \frac{\pi}{4} \, ${'seatDiameter'}^2`,
          gives: 'openingArea' as const,
        },
    {
      say: 'The head drives the water through it; the jet is a little thinner and slower than it might be.',
      formula: write`${'flow'} = ${'velocityCoefficient'} \, ${'contractionCoefficient'} \, ${'openingArea'} \, \sqrt{2 \, ${gravity} \, ${'netHead'}}`,
      gives: 'flow',
    },
    {
      say: 'Against the whole bore.',
      formula: write`${'fullFlowFraction'} = \frac{${'openingArea'}}{\frac{\pi}{4} \, ${'seatDiameter'}^2}`,
      gives: 'fullFlowFraction',
    },
  ],
  cautions: ({ seatDiameter, needleHalfAngle }, { fullFlowFraction }) => {
    const whole = join(format(fullStroke(seatDiameter, needleHalfAngle), 'length'))
    return [
      {
        level: 'stop',
        about: ['stroke'],
        hazard: 'pressure',
        say: 'Turn a needle slowly: the last of its stroke shuts off most of the water, and the column behind it strikes. A stone behind the needle is cleared with the valve shut, locked and the pipe drained; a jet cuts skin. Site rules and local code apply.',
      },
      ...(fullFlowFraction > nearlyOpen
        ? [
            {
              level: 'check' as const,
              about: ['stroke' as const, 'fullFlowFraction' as const],
              say: `Nearly or fully open: from here the needle steers hardly anything, and the jet is rough where its point still sticks into the mouth. This needle is open at a stroke of about ${whole}; plan the full flow for less.`,
            },
          ]
        : []),
      {
        level: 'note',
        about: ['contractionCoefficient', 'flow'],
        say: 'Real needles are rounded and the jet draws in more or less as they move: the maker’s curve goes before this sum. The net head rises, too, as the needle shuts, because the pipe loses less.',
      },
    ]
  },
  doesNotCheck: [
    'the force on the needle, which can drag it shut or open',
    'wear of needle and seat, which ruins the jet first at small strokes',
    'surge from a needle that is turned too fast: see surge',
  ],
  example: {
    say: 'Sorrelthwaite: the wheel screwed out by six turns of 3 mm.',
    inputs: {
      seatDiameter: 0.042,
      needleHalfAngle: 27.5,
      stroke: 0.018,
      netHead: 56,
      velocityCoefficient: 0.97,
      contractionCoefficient: 0.86,
    },
  },
  plots: [
    {
      say: 'Each turn from shut adds less than the one before, until the bore is full.',
      of: 'flow',
      against: 'stroke',
      from: 0,
      to: 2.4,
    },
  ],
  sources: [
    {
      author: 'Z. Zhang',
      title: 'Pelton Turbines',
      year: 2016,
      where: 'injector and needle (from memory); the geometry stands by itself',
    },
  ],
})
