import { gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterKinematicViscosity } from '../water/properties.ts'
import { laminarTo, pipeLoss, regimeOf, turbulentFrom } from './friction-factor.ts'
import { checkRoughness, flow, insideDiameter, pipeLength, roughness } from './inputs.ts'

/** Relative roughness to which Colebrook and White's formula is drawn in L. F. Moody, Trans. ASME 66 (1944). */
const roughestDrawn = 0.05
/** Slower than this silt settles and air stays at humps; faster than this surge and wear grow (common practice, no source). */
export const usualVelocity = [0.5, 3] as const

/**
 * Head lost to friction in a full round pipe, Darcy–Weisbach h = f·(L/D)·v²/2g, with flow Q (m³/s), inside diameter D, length L and absolute
 * roughness ε (m), kinematic viscosity ν by the water's temperature. f = 64/Re to Re 2000, Colebrook–White from Re 4000, a smooth monotone
 * join between. Valid to ε/D = 0.05; a caution above. Refused: a roughness of half the diameter or more (`inconsistent`). Standing water loses
 * nothing and has no f. Sources below.
 */
export const friction = defineCalculator({
  id: 'friction',
  station: 'pipe',
  title: 'Friction in a pipe',
  summary: 'How much of the head a pipe takes for carrying a flow.',
  hazards: [],
  inputs: {
    flow: { ...flow, initial: 0.0095 },
    insideDiameter: { ...insideDiameter, initial: 0.0968 },
    length: { ...pipeLength, initial: 120 },
    roughness: { ...roughness, initial: 5e-5 },
    waterTemperature,
  },
  outputs: {
    velocity: { kind: 'scalar', symbol: 'v', label: 'Water speed', quantity: 'velocity' },
    reynolds: { kind: 'scalar', symbol: '\\mathrm{Re}', label: 'Reynolds number', quantity: 'ratio' },
    frictionFactor: {
      kind: 'scalar',
      symbol: 'f',
      label: 'Friction factor',
      help: 'by Darcy: four times the one by Fanning',
      quantity: 'ratio',
      sometimes: true,
    },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost', quantity: 'head' },
    gradient: { kind: 'scalar', symbol: 'S', label: 'Head lost along the pipe', quantity: 'gradient' },
    regime: {
      kind: 'text',
      label: 'Kind of flow',
      words: { laminar: 'laminar', transition: 'between laminar and turbulent', turbulent: 'turbulent' },
    },
  },
  solve(given) {
    const { flow, insideDiameter, length, roughness, waterTemperature } = given
    checkRoughness(roughness, insideDiameter)
    const viscosity = waterKinematicViscosity(waterTemperature)
    const pipe = { insideDiameter, length, roughness }
    const { velocity, reynolds, frictionFactor, headLoss } = pipeLoss(flow, pipe, viscosity)
    const gradient = headLoss / length
    const regime = regimeOf(reynolds)
    return frictionFactor === undefined
      ? { velocity, reynolds, headLoss, gradient, regime }
      : { velocity, reynolds, frictionFactor, headLoss, gradient, regime }
  },
  working(write, { waterTemperature }, { frictionFactor, reynolds, regime }) {
    const viscosity = {
      symbol: '\\nu',
      value: waterKinematicViscosity(waterTemperature),
      say: 'the kinematic viscosity of water',
    }
    const speed = {
      say: 'The flow spread over the bore gives the speed of the water.',
      formula: write`${'velocity'} = \frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2}`,
      gives: 'velocity' as const,
    }
    const stirring = {
      say: 'The Reynolds number tells smooth flow from turbulent flow.',
      formula: write`${'reynolds'} = \frac{${'velocity'} \, ${'insideDiameter'}}{${viscosity}}`,
      gives: 'reynolds' as const,
    }
    const slope = {
      say: 'Spread over the length it is the slope of the hydraulic grade line.',
      formula: write`${'gradient'} = \frac{${'headLoss'}}{${'length'}}`,
      gives: 'gradient' as const,
    }
    if (frictionFactor === undefined)
      return [speed, stirring, { say: 'Water that stands still loses no head.', gives: 'headLoss' as const }, slope]
    const joined = {
      symbol: '(f\\,\\mathrm{Re}^2)_{\\text{join}}',
      value: frictionFactor * reynolds ** 2,
      say: 'the joined value of f times Reynolds number squared',
    }
    return [
      speed,
      stirring,
      regime === 'laminar'
        ? {
            say: `Up to ${laminarTo} the flow is laminar, and the wall's roughness does not count.`,
            formula: write`${'frictionFactor'} = \frac{64}{${'reynolds'}}`,
            gives: 'frictionFactor' as const,
          }
        : regime === 'transition'
          ? {
              say: `Between ${laminarTo} and ${turbulentFrom} no formula holds. The head loss is joined smoothly from the one to the other, and f follows from the join.`,
              formula: write`${'frictionFactor'} = \frac{${joined}}{${'reynolds'}^2}`,
              gives: 'frictionFactor' as const,
            }
          : {
              say: 'Turbulent flow: f stands on both sides, so it is tried until both agree.',
              formula: write`${'frictionFactor'} = \frac{1}{\left(2 \, \log_{10}\left(\frac{${'roughness'}}{3.7 \, ${'insideDiameter'}} + \frac{2.51}{${'reynolds'} \, \sqrt{${'frictionFactor'}}}\right)\right)^2}`,
              gives: 'frictionFactor' as const,
            },
      {
        say: 'Length over bore, times the head that the speed is worth, times f, is the head lost.',
        formula: write`${'headLoss'} = ${'frictionFactor'} \, \frac{${'length'}}{${'insideDiameter'}} \, \frac{${'velocity'}^2}{2 \, ${gravity}}`,
        gives: 'headLoss',
      },
      slope,
    ]
  },
  cautions: ({ insideDiameter, roughness }, { velocity, frictionFactor, regime }) => [
    {
      level: 'note' as const,
      about: ['insideDiameter' as const],
      say: 'The label on a plastic pipe gives its outside diameter. Take two walls off: a pipe called 110 may have a bore of 90 to 102 mm.',
    },
    ...(regime === 'transition'
      ? [
          {
            level: 'check' as const,
            about: ['frictionFactor' as const, 'headLoss' as const],
            say: 'Between Reynolds numbers of 2000 and 4000 the flow changes its kind to and fro: the real loss may be half or twice this.',
          },
        ]
      : []),
    ...(regime !== 'laminar' && roughness > roughestDrawn * insideDiameter
      ? [
          {
            level: 'check' as const,
            about: ['roughness' as const],
            say: 'The roughness is more than a twentieth of the bore: the friction formula was never tried there. Check the units of both.',
          },
        ]
      : []),
    ...(frictionFactor !== undefined && velocity < usualVelocity[0]
      ? [
          {
            level: 'note' as const,
            about: ['velocity' as const],
            say: 'At under 0.5 m/s silt settles in the low places and air stays in the high ones.',
          },
        ]
      : []),
    ...(velocity > usualVelocity[1]
      ? [
          {
            level: 'check' as const,
            about: ['velocity' as const],
            say: 'At over 3 m/s the loss is high, grit wears the bends, and a valve that shuts quickly makes a hard surge: look at surge.',
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'bends, valves and the entrance: see fittings',
    'the pressure in the pipe, standing or in a surge',
    'air, silt or ice in the pipe',
  ],
  example: {
    say: 'Over Quern: the long upper pipe, some years in service.',
    inputs: { flow: 0.0172, insideDiameter: 0.1322, length: 640, roughness: 1e-4, waterTemperature: 6 },
  },
  plots: [
    {
      say: 'A little more bore saves much: the loss goes with nearly the fifth power of the diameter.',
      of: 'headLoss',
      against: 'insideDiameter',
      from: 0.75,
      to: 1.6,
    },
  ],
  sources: [
    {
      author: 'C. F. Colebrook',
      title: 'Turbulent flow in pipes, J. Inst. Civ. Eng. 11',
      year: 1939,
      where: 'p. 133',
    },
    { author: 'L. F. Moody', title: 'Friction factors for pipe flow, Trans. ASME 66', year: 1944 },
    {
      author: 'F. N. Fritsch, R. E. Carlson',
      title: 'Monotone piecewise cubic interpolation, SIAM J. Numer. Anal. 17',
      year: 1980,
      where: 'the join, p. 238',
    },
  ],
})
