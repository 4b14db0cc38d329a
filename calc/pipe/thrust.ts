import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { format, join } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'
import { boreVelocity } from './friction-factor.ts'
import { flow, insideDiameter } from './inputs.ts'

/** Half of a bend's angle, as its sine. */
const halfSine = (bendAngle: number): number => Math.sin((bendAngle * Math.PI) / 360)

interface Fitting {
  kind: 'bend' | 'dead-end'
  pressure: number
  insideDiameter: number
  jointDiameter?: number
  bendAngle?: number
  flow?: number
  waterTemperature: number
}

const areaOf = ({ jointDiameter, insideDiameter }: Fitting): number =>
  (Math.PI / 4) * (jointDiameter ?? insideDiameter) ** 2

/** What the water gives up by turning, ρQv, N; its speed is that in the bore. */
const momentumOf = ({ kind, flow, insideDiameter, waterTemperature }: Fitting): number =>
  kind === 'bend' && flow !== undefined ? waterDensity(waterTemperature) * flow * boreVelocity(flow, insideDiameter) : 0

/**
 * How hard the water pushes a fitting out of the line: at a bend of angle θ 2(pA + ρQv)·sin(θ/2), at a dead end pA. SI; p over the air's, A
 * at the joint's seal, v in the bore. Against ground of the allowed bearing σ the block needs SF·T/σ; a block that holds by its weight
 * SF·T/(μg) on level ground and SF·T/g where the push lifts, dry. Valid for joints that carry no pull along the pipe; a welded or fused
 * line holds itself, if its straight legs are held. Refused: a joint narrower than the bore (`inconsistent`). Sources below.
 */
export const thrust = defineCalculator({
  id: 'thrust',
  station: 'pipe',
  title: 'Thrust on bends and ends',
  summary: 'How hard the water pushes a bend or a shut end away, and the block or the ground that holds it.',
  hazards: ['pressure', 'digging'],
  inputs: {
    pressure: {
      kind: 'scalar',
      symbol: 'p',
      label: 'Greatest pressure',
      quantity: 'pressure',
      help: 'the greater of static and surge together, and of the test pressure',
      range: [0, 1e8],
      usual: [1e5, 1e7],
      initial: 8e5,
    },
    insideDiameter: {
      ...insideDiameter,
      initial: 0.0968,
      pick: { table: 'pe-pipe', column: 'insideDiameter' },
    },
    jointDiameter: {
      kind: 'scalar',
      symbol: 'D_j',
      label: 'Diameter at the joint',
      quantity: 'length',
      help: 'where the seal sits: mostly the outside diameter of the pipe',
      range: [0.001, 20],
      usual: [0.02, 2.5],
      initial: 0.11,
      optional: true,
      pick: { table: 'pe-pipe', column: 'outsideDiameter' },
    },
    kind: {
      kind: 'choice',
      label: 'Fitting',
      of: ['bend', 'dead-end'],
      words: { bend: 'bend', 'dead-end': 'dead end, shut valve' },
      initial: 'bend',
      fallback: 'bend',
    },
    bendAngle: {
      kind: 'scalar',
      symbol: '\\theta',
      label: 'Bend angle',
      quantity: 'angle',
      help: 'by which the water is turned',
      range: [0, 180],
      initial: 45,
      when: { key: 'kind', is: ['bend'] },
    },
    flow: {
      ...flow,
      help: 'adds the push of the water that turns; little beside the pressure. It counts at bends only',
      optional: true,
    },
    direction: {
      kind: 'choice',
      label: 'It pushes',
      of: ['horizontal', 'up', 'down'],
      words: { horizontal: 'sideways', up: 'upwards: the pipe turns down', down: 'downwards: the pipe turns up' },
      initial: 'horizontal',
      fallback: 'horizontal',
    },
    safetyFactor: {
      kind: 'scalar',
      symbol: 'S',
      label: 'Safety factor',
      quantity: 'ratio',
      range: [1, 10],
      usual: [1.5, 3],
      fallback: 1.5,
      optional: true,
    },
    soilBearing: {
      kind: 'scalar',
      symbol: '\\sigma',
      label: 'Allowed bearing of the ground',
      quantity: 'pressure',
      help: 'sideways, undisturbed: soft clay 25 to 50 kPa, sand and gravel 100 to 200 kPa (common practice)',
      range: [1000, 1e7],
      usual: [2e4, 6e5],
      unit: 'kPa',
      initial: 1e5,
      optional: true,
    },
    frictionFactor: {
      kind: 'scalar',
      symbol: '\\mu',
      label: 'Friction under the block',
      quantity: 'ratio',
      help: 'concrete on clay about 0.3, on gravel about 0.5 (common practice)',
      range: [0.01, 2],
      usual: [0.2, 0.6],
      initial: 0.4,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    thrust: { kind: 'scalar', symbol: 'T', label: 'Thrust', quantity: 'force' },
    bearingArea: {
      kind: 'scalar',
      symbol: 'A_g',
      label: 'Face of the block against the ground',
      quantity: 'area',
      unit: 'm²',
      sometimes: true,
    },
    blockMass: {
      kind: 'scalar',
      symbol: 'm',
      label: 'Block that holds by its weight',
      quantity: 'mass',
      sometimes: true,
    },
  },
  solve(given) {
    const { pressure, insideDiameter, jointDiameter, bendAngle, kind, direction } = given
    const { safetyFactor, soilBearing, frictionFactor } = given
    if (jointDiameter !== undefined && jointDiameter < insideDiameter)
      throw new CalculationError(
        'inconsistent',
        'jointDiameter',
        'A joint cannot be narrower than the bore: give the diameter of its seal, mostly the outside diameter of the pipe.',
      )
    const along = pressure * areaOf(given) + momentumOf(given)
    const thrust = kind === 'bend' ? 2 * along * halfSine(bendAngle!) : along
    const held = safetyFactor * thrust
    const found: { thrust: number; bearingArea?: number; blockMass?: number } = { thrust }
    if (soilBearing !== undefined && direction !== 'up') found.bearingArea = held / soilBearing
    if (direction === 'up') found.blockMass = held / g
    if (direction === 'horizontal' && frictionFactor !== undefined) found.blockMass = held / (frictionFactor * g)
    return found
  },
  working(write, given, { bearingArea, blockMass }) {
    const { kind, jointDiameter, flow, direction } = given
    const area = { symbol: 'A', value: areaOf(given), say: 'the area at the joint' }
    const momentum = { symbol: 'M', value: momentumOf(given), say: 'the push of the turning water' }
    const density = { symbol: '\\rho', value: waterDensity(given.waterTemperature), say: 'the density of water' }
    const hasFlow = kind === 'bend' && flow !== undefined
    return [
      {
        say: 'The pressure presses on all that lies inside the seal of the joint.',
        formula: write`\frac{\pi}{4} \, ${jointDiameter === undefined ? 'insideDiameter' : 'jointDiameter'}^2 = ${{ ...area, unit: 'm²' }}`,
      },
      ...(hasFlow
        ? [
            {
              say: 'Water that is turned pushes too: density, flow and speed in the bore.',
              formula: write`${density} \, ${'flow'} \, \frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2} = ${{ ...momentum, unit: 'N' }}`,
            },
          ]
        : []),
      kind === 'dead-end'
        ? {
            say: 'A shut end takes the whole push.',
            formula: write`${'thrust'} = ${'pressure'} \, ${area}`,
            gives: 'thrust' as const,
          }
        : hasFlow
          ? {
              say: 'Both legs of the bend push; what is left over points outwards, half-way between them.',
              formula: write`${'thrust'} = 2 \, (${'pressure'} \, ${area} + ${momentum}) \, \sin \frac{${'bendAngle'}}{2}`,
              gives: 'thrust' as const,
            }
          : {
              say: 'Both legs of the bend push; what is left over points outwards, half-way between them.',
              formula: write`${'thrust'} = 2 \, ${'pressure'} \, ${area} \, \sin \frac{${'bendAngle'}}{2}`,
              gives: 'thrust' as const,
            },
      ...(bearingArea === undefined
        ? []
        : [
            {
              say: 'Spread over so much of firm ground, the push with its safety factor is borne.',
              formula: write`${'bearingArea'} = \frac{${'safetyFactor'} \, ${'thrust'}}{${'soilBearing'}}`,
              gives: 'bearingArea' as const,
            },
          ]),
      ...(blockMass === undefined
        ? []
        : direction === 'up'
          ? [
              {
                say: 'What lifts must be held down by weight.',
                formula: write`${'blockMass'} = \frac{${'safetyFactor'} \, ${'thrust'}}{${gravity}}`,
                gives: 'blockMass' as const,
              },
            ]
          : [
              {
                say: 'Without ground to lean on, a block stays by the friction of its weight.',
                formula: write`${'blockMass'} = \frac{${'safetyFactor'} \, ${'thrust'}}{${'frictionFactor'} \, ${gravity}}`,
                gives: 'blockMass' as const,
              },
            ]),
    ]
  },
  cautions({ jointDiameter, direction, soilBearing, kind, flow }, { thrust, bearingArea, blockMass }) {
    return [
      {
        level: 'check',
        about: ['thrust'],
        hazard: 'pressure',
        say: `A joint that lets go under ${join(format(thrust, 'force'))} throws pipe and water. Use the greatest pressure that can come, the test included; fill and test only when the blocks are hard and the trench is backfilled beside them; keep clear of bends and ends. Local code and the pipe maker’s data rule how joints are held.`,
      },
      {
        level: 'check',
        about: ['bearingArea'],
        hazard: 'digging',
        say: 'Ask for buried services before digging, and shore or slope a trench that a person goes into: local code says from what depth. Blocks bear on undisturbed ground only.',
      },
      ...(jointDiameter === undefined
        ? [
            {
              level: 'check' as const,
              about: ['jointDiameter' as const, 'insideDiameter' as const],
              say: 'Taken with the inside diameter. At a socket the pressure presses on the larger circle of the seal: the push is up to a third more. Give the diameter there.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['thrust'],
        say: 'A fused, welded or flanged line carries the push along in its wall; a line of sockets needs a block at every bend, branch, taper and end.',
      },
      ...(direction === 'up' && soilBearing !== undefined
        ? [
            {
              level: 'check' as const,
              about: ['direction' as const, 'soilBearing' as const],
              say: 'Ground does not bear upwards: only weight holds this bend down, and the bearing is left out.',
            },
          ]
        : []),
      ...(blockMass !== undefined
        ? [
            {
              level: 'note' as const,
              about: ['blockMass' as const],
              say: 'For dry ground. Under water a block of concrete weighs little more than half, and mud has hardly any friction.',
            },
          ]
        : []),
      ...(bearingArea === undefined && blockMass === undefined
        ? [
            {
              level: 'note' as const,
              about: ['soilBearing' as const, 'frictionFactor' as const],
              say: 'Give the bearing of the ground for the face of a block, or the friction under it for its mass.',
            },
          ]
        : []),
      ...(kind === 'dead-end' && flow !== undefined
        ? [
            {
              level: 'note' as const,
              about: ['flow' as const],
              say: 'At a shut end nothing flows: the flow is left out.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'what the ground really bears, wet, frozen or on a slope',
    'the weight of the pipe, and its slide down a steep hillside',
    'branches and tapers',
  ],
  example: {
    say: 'Sorrelthwaite: a bend of a socketed pipe above the powerhouse, at its test pressure.',
    inputs: {
      pressure: 7.5e5,
      insideDiameter: 0.1544,
      jointDiameter: 0.1683,
      kind: 'bend',
      bendAngle: 60,
      flow: 0.021,
      direction: 'horizontal',
      soilBearing: 75_000,
      frictionFactor: 0.3,
    },
  },
  plots: [{ say: 'The sharper the turn, the harder the push.', of: 'thrust', against: 'bendAngle', from: 0.1, to: 2 }],
  sources: [
    {
      author: 'B. R. Munson, D. F. Young, T. H. Okiishi',
      title: 'Fundamentals of Fluid Mechanics',
      year: 2006,
      where: 'balance of momentum at a bend (from memory)',
    },
    {
      author: 'AWWA',
      title: 'M23, PVC Pipe: Design and Installation',
      year: 2002,
      where: 'thrust blocks (from memory)',
    },
  ],
})
