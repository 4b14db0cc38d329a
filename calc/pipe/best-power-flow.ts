import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { bracketedMinimum } from '../numeric/minimum.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { boreVelocity, pipeLoss, regimeOf, type Pipe } from './friction-factor.ts'
import { usualVelocity } from './friction.ts'
import { checkRoughness, grossHead, insideDiameter, pipeLength, roughness } from './inputs.ts'

/** Points of the curve, from standing water to the flow that uses up the head. */
const curveSteps = 24

/**
 * The flow that would use up all of the head. Turbulent or not, it is not more than the laminar flow πgHD⁴/(128νL), for nothing loses less than
 * laminar flow.
 */
const flowWithoutHeadLeft = (grossHead: number, pipe: Pipe, viscosity: number): number => {
  const laminar = (Math.PI * g * grossHead * pipe.insideDiameter ** 4) / (128 * viscosity * pipe.length)
  const used = (logFlow: number) => Math.log(pipeLoss(Math.exp(logFlow), pipe, viscosity).headLoss / grossHead)
  // The loss grows at most with the third power of the flow or so: on logarithmic scales it is nearly a straight line.
  const most = Math.log(laminar) + 1e-9
  let least = most
  while (used(least) > 0) least -= 2
  return Math.exp(bracketedRoot(used, least, most) ?? most)
}

/**
 * The flow Q at which a pipe delivers the most power, P = ρgQ·(H − h(Q)), with the loss h by Darcy–Weisbach and Colebrook–White; found by Brent's
 * method between standing water and the flow that uses up the head H. SI. Where h ∝ Q^m the most is at h = H/(1 + m): a third of the head in
 * rough pipe, a little over in smooth pipe, half in laminar flow. Valid for one bore, full and steady; fittings and nozzle are left out.
 * Refused: a roughness that fills the bore (`inconsistent`).
 */
export const bestPowerFlow = defineCalculator({
  id: 'best-power-flow',
  station: 'pipe',
  title: 'The most a pipe can give',
  summary: 'The flow beyond which more water brings less power, because the pipe eats more head than the water adds.',
  hazards: [],
  inputs: {
    grossHead: { ...grossHead, initial: 48 },
    insideDiameter: { ...insideDiameter, initial: 0.0968 },
    length: { ...pipeLength, initial: 240 },
    roughness: { ...roughness, initial: 5e-5 },
    waterTemperature,
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow for the most power', quantity: 'flow' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost at that flow', quantity: 'head' },
    lossFraction: { kind: 'scalar', symbol: 'r', label: 'Share of the gross head lost', quantity: 'fraction' },
    hydraulicPower: {
      kind: 'scalar',
      symbol: 'P_h',
      label: 'Most power of the water',
      quantity: 'power',
      help: 'before nozzle, runner and alternator',
    },
    curve: {
      kind: 'rows',
      label: 'Power by flow',
      columns: {
        flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
        headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost', quantity: 'head' },
        hydraulicPower: { kind: 'scalar', symbol: 'P_h', label: 'Power of the water', quantity: 'power' },
      },
    },
  },
  solve({ grossHead, insideDiameter, length, roughness, waterTemperature }) {
    checkRoughness(roughness, insideDiameter)
    const pipe = { insideDiameter, length, roughness }
    const viscosity = waterKinematicViscosity(waterTemperature)
    const weight = waterDensity(waterTemperature) * g
    const lossAt = (flow: number) => pipeLoss(flow, pipe, viscosity).headLoss
    const most = flowWithoutHeadLeft(grossHead, pipe, viscosity)
    const flow = most * bracketedMinimum((share) => share * (lossAt(share * most) - grossHead), 0, 1)
    const headLoss = lossAt(flow)
    return {
      flow,
      headLoss,
      lossFraction: headLoss / grossHead,
      hydraulicPower: weight * flow * (grossHead - headLoss),
      curve: Array.from({ length: curveSteps + 1 }, (_, i) => {
        const flow = (most * i) / curveSteps
        const headLoss = i === curveSteps ? grossHead : lossAt(flow)
        return { flow, headLoss, hydraulicPower: weight * flow * (grossHead - headLoss) }
      }),
    }
  },
  working(write, given, { flow, curve }) {
    const viscosity = waterKinematicViscosity(given.waterTemperature)
    const density = { symbol: '\\rho', value: waterDensity(given.waterTemperature), say: 'the density of water' }
    const f = {
      symbol: 'f',
      value: pipeLoss(flow, given, viscosity).frictionFactor ?? 0,
      say: 'the friction factor',
    }
    const most = { symbol: 'Q_0', value: curve.at(-1)!.flow, say: 'the flow that uses up the head' }
    const share = { symbol: 'k', value: flow / most.value, say: 'the share of it' }
    return [
      {
        say: 'So much water would run out of the open pipe, all of the head spent on friction: no power is left.',
        formula: write`${most} = ${{ ...most, unit: 'm³/s' }}`,
      },
      {
        say: 'Without any flow there is no power either. Between the two the flow was tried until flow times head left is greatest.',
        formula: write`${'flow'} = ${share} \, ${most}`,
        gives: 'flow',
      },
      {
        say: 'The pipe takes this at that flow, its friction factor by Colebrook and White.',
        formula: write`${'headLoss'} = ${f} \, \frac{${'length'}}{${'insideDiameter'}} \, \frac{1}{2 \, ${gravity}} \left( \frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2} \right)^2`,
        gives: 'headLoss',
      },
      {
        say: 'As a share of the gross head: a third where the loss goes with the square of the flow.',
        formula: write`${'lossFraction'} = \frac{${'headLoss'}}{${'grossHead'}}`,
        gives: 'lossFraction',
      },
      {
        say: 'What is left of the head, with all that flow.',
        formula: write`${'hydraulicPower'} = ${density} \, ${gravity} \, ${'flow'} \, (${'grossHead'} - ${'headLoss'})`,
        gives: 'hydraulicPower',
      },
    ]
  },
  cautions({ insideDiameter, waterTemperature }, { flow }) {
    const velocity = boreVelocity(flow, insideDiameter)
    const regime = regimeOf((velocity * insideDiameter) / waterKinematicViscosity(waterTemperature))
    return [
      {
        level: 'check',
        about: ['flow', 'lossFraction'],
        say: 'This is the most a pipe can give, never a design loss: a third of the water’s power is gone on the way, and it takes the stream’s water for it. Penstocks are commonly chosen for a loss of 5 to 6 per cent (common practice, no source).',
      },
      ...(velocity > usualVelocity[1]
        ? [
            {
              level: 'check' as const,
              about: ['flow' as const],
              say: `At that flow the water runs faster than ${say(usualVelocity[1], 'velocity')}: a valve that shuts or a nozzle that blocks makes a hard surge.`,
            },
          ]
        : []),
      ...(regime === 'turbulent'
        ? []
        : [
            {
              level: 'note' as const,
              about: ['lossFraction' as const],
              say: 'The flow in this pipe is not turbulent: there the best loss is nearer half of the head than a third.',
            },
          ]),
    ]
  },
  doesNotCheck: [
    'whether the stream has this flow, or how much of it may be taken',
    'bends, valves, the entrance and the nozzle',
    'surge, and whether the pipe holds the pressure',
  ],
  example: {
    say: 'Over Quern: what the long pipe could give at the very most, with every nozzle open.',
    inputs: { grossHead: 104, insideDiameter: 0.1322, length: 730, roughness: 5e-5, waterTemperature: 6 },
  },
  plots: [
    {
      say: 'Power rises with the flow, passes its top, and falls to nothing while the flow still grows.',
      rows: 'curve',
      x: 'flow',
      y: ['hydraulicPower'],
    },
  ],
  sources: [
    {
      author: 'B. R. Munson, D. F. Young, T. H. Okiishi',
      title: 'Fundamentals of Fluid Mechanics',
      year: 2007,
      where: 'example 12.6 and problem 12.56: most power at a third of the head lost',
    },
    { author: 'F. M. White', title: 'Fluid Mechanics', year: 2011, where: 'problem 11.95 (as read on a public page)' },
  ],
})
