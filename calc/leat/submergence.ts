import { gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { flow, insideDiameter } from '../pipe/inputs.ts'
import { velocityHead } from '../pipe/friction-factor.ts'

/** S = k·v·√D in feet: 0.3 for a straight approach, 0.4 for one from the side (J. L. Gordon, 1970); in metres over √0.3048. */
const gordonInFeet = { symmetrical: 0.3, lateral: 0.4 }
const metresInFoot = 0.3048
const gordon = (approach: keyof typeof gordonInFeet) => gordonInFeet[approach] / Math.sqrt(metresInFoot)

/**
 * How far under the lowest water the crown of the pipe’s mouth must lie: the greater of Gordon’s line between intakes that drew vortices and
 * those that did not, S = k·v·√D (k 0.5434 s/√m straight, 0.7245 from the side), and the head that the mouth itself needs, (1 + K)·v²/2g. SI,
 * v in the pipe. Valid for level mouths of quiet forebays; an eddying approach needs more. Sources below.
 */
export const submergence = defineCalculator({
  id: 'submergence',
  station: 'forebay',
  title: 'Depth over the pipe’s mouth',
  summary: 'How deep the mouth of the pipe must lie so that it draws no air.',
  hazards: ['stream'],
  inputs: {
    flow: { ...flow, initial: 0.0095 },
    pipeDiameter: { ...insideDiameter, label: 'Inside diameter at the mouth', initial: 0.0968 },
    approach: {
      kind: 'choice',
      label: 'The water comes',
      of: ['symmetrical', 'lateral'],
      words: { symmetrical: 'straight to the mouth', lateral: 'from the side' },
      initial: 'lateral',
    },
    entranceK: {
      kind: 'scalar',
      symbol: 'K',
      label: 'Loss coefficient of the mouth',
      quantity: 'ratio',
      help: 'sharp edge 0.5, projecting pipe 0.8, rounded 0.05',
      range: [0, 10],
      usual: [0.03, 1],
      fallback: 0.5,
      optional: true,
    },
  },
  outputs: {
    minimumSubmergence: { kind: 'scalar', symbol: 'S', label: 'Least depth over the crown', quantity: 'length' },
    vortexSubmergence: { kind: 'scalar', symbol: 'S_v', label: 'Against vortices', quantity: 'length' },
    entranceSubmergence: { kind: 'scalar', symbol: 'S_e', label: 'To drive the water in', quantity: 'length' },
    velocity: { kind: 'scalar', symbol: 'v', label: 'Speed in the mouth', quantity: 'velocity' },
  },
  solve({ flow, pipeDiameter, approach, entranceK }) {
    const velocity = (4 * flow) / (Math.PI * pipeDiameter * pipeDiameter)
    const vortexSubmergence = gordon(approach) * velocity * Math.sqrt(pipeDiameter)
    const entranceSubmergence = (1 + entranceK) * velocityHead(velocity)
    return {
      minimumSubmergence: Math.max(vortexSubmergence, entranceSubmergence),
      vortexSubmergence,
      entranceSubmergence,
      velocity,
    }
  },
  working: (write, { approach }, { vortexSubmergence, entranceSubmergence }) => [
    {
      say: 'The flow spread over the mouth.',
      formula: write`${'velocity'} = \frac{4 \, ${'flow'}}{\pi \, ${'pipeDiameter'}^2}`,
      gives: 'velocity',
    },
    {
      say: 'Gordon’s line: intakes above it drew no vortices.',
      formula: write`${'vortexSubmergence'} = ${{ symbol: 'k', value: gordon(approach), say: 'the coefficient of the approach' }} \, ${'velocity'} \, \sqrt{${'pipeDiameter'}}`,
      gives: 'vortexSubmergence',
    },
    {
      say: 'The surface must also drive the water in: its velocity head and what the mouth loses.',
      formula: write`${'entranceSubmergence'} = (1 + ${'entranceK'}) \, \frac{${'velocity'}^2}{2 \, ${gravity}}`,
      gives: 'entranceSubmergence',
    },
    {
      say:
        vortexSubmergence >= entranceSubmergence
          ? 'The greater of the two rules: the vortex.'
          : 'The greater of the two rules: driving the water in.',
      gives: 'minimumSubmergence',
    },
  ],
  cautions: ({ pipeDiameter }, { minimumSubmergence, velocity }) => [
    {
      level: 'check',
      about: ['minimumSubmergence'],
      hazard: 'stream',
      say: 'It counts from the lowest water that the forebay ever works at, screen clogged and summer low. A pipe mouth holds what is drawn onto it: grid and cover it as local code asks, and never reach in while it runs.',
    },
    ...(minimumSubmergence < pipeDiameter
      ? [
          {
            level: 'check' as const,
            about: ['minimumSubmergence' as const, 'pipeDiameter' as const],
            say: 'Never put the crown less than one diameter under the lowest water, whatever the formula says (common practice, no source).',
          },
        ]
      : []),
    ...(velocity > 1.5
      ? [
          {
            level: 'check' as const,
            about: ['velocity' as const],
            say: 'A wider mouth with a taper behind it needs less depth: keep the water in it slower than about 1 m/s (common practice, no source).',
          },
        ]
      : []),
  ],
  doesNotCheck: ['swirl that the shape of the forebay makes', 'air that the screen or a fall upstream mixes in', 'ice'],
  example: {
    say: 'Over Quern: a small concrete forebay with the leat coming in beside the pipe.',
    inputs: { flow: 0.0172, pipeDiameter: 0.1322, approach: 'lateral', entranceK: 0.8 },
  },
  plots: [
    {
      say: 'A wider mouth needs less water over it.',
      of: 'minimumSubmergence',
      against: 'pipeDiameter',
      from: 0.6,
      to: 2.5,
    },
  ],
  sources: [
    { author: 'J. L. Gordon', title: 'Vortices at intakes, Water Power 22', year: 1970, where: 'p. 137 (from memory)' },
    {
      author: 'ASCE',
      title: 'Guidelines for Design of Intakes for Hydroelectric Plants',
      year: 1995,
      where: 'which hands Gordon’s line on (from memory)',
    },
  ],
})
