import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { format, join } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'
import { boreVelocity, velocityHead as velocityHeadOf } from './friction-factor.ts'
import { findingsFor, readingTolerance } from './gauge-reading-findings.ts'
import { flow, insideDiameter } from './inputs.ts'

/**
 * What a gauge at the foot of the pipe says, read with the valve shut (static) and with the water running. The fall between the two, in
 * metres Δp/(ρg), is the pipe's loss **and** the velocity head v²/2g at the gauge; the flow is estimated from the fall, since loss and
 * velocity head both go nearly with Q²: Q·√(fall/(predicted loss + velocity head)). SI, pressures over the air's. Good to the gauge's own
 * error on both readings, and to a few per cent for the exponent of the flow (about 1.8 to 2). Refused: a running pressure above the static
 * one. The findings follow the trade's usual search (common practice, no source).
 */
export const gaugeReading = defineCalculator({
  id: 'gauge-reading',
  station: 'valve',
  title: 'Reading the gauge',
  summary:
    'What the pipe really loses, from the gauge before and after the valve opens, and what a wrong reading points to.',
  hazards: ['pressure'],
  inputs: {
    staticPressure: {
      kind: 'scalar',
      symbol: 'p_s',
      label: 'Static pressure',
      quantity: 'pressure',
      help: 'with the nozzle valve shut, the gauge being above that valve',
      range: [0, 3e7],
      usual: [5e4, 5e6],
      initial: 4.7e5,
    },
    runningPressure: {
      kind: 'scalar',
      symbol: 'p_r',
      label: 'Running pressure',
      quantity: 'pressure',
      help: 'on the same gauge, with the water running',
      range: [0, 3e7],
      initial: 4.4e5,
    },
    insideDiameter: { ...insideDiameter, label: 'Inside diameter at the gauge', initial: 0.0968 },
    flow: { ...flow, label: 'Predicted flow', initial: 0.0095, optional: true },
    predictedLoss: {
      kind: 'scalar',
      symbol: 'h_p',
      label: 'Predicted loss',
      quantity: 'head',
      help: 'from intake to gauge, at the predicted flow',
      range: [0, 2000],
      initial: 2.8,
      optional: true,
    },
    predictedStatic: {
      kind: 'scalar',
      symbol: 'p_p',
      label: 'Predicted static pressure',
      quantity: 'pressure',
      range: [0, 3e7],
      initial: 4.7e5,
      optional: true,
    },
    expectedPower: {
      kind: 'scalar',
      symbol: 'P_e',
      label: 'Expected power',
      quantity: 'power',
      range: [0, 1e9],
      optional: true,
    },
    measuredPower: {
      kind: 'scalar',
      symbol: 'P_m',
      label: 'Measured power',
      quantity: 'power',
      range: [0, 1e9],
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    pressureDrop: { kind: 'scalar', symbol: '\\Delta h', label: 'Fall of the gauge', quantity: 'head' },
    velocityHead: { kind: 'scalar', symbol: 'h_v', label: 'Velocity head', quantity: 'head', sometimes: true },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost in the pipe', quantity: 'head', sometimes: true },
    lossFraction: {
      kind: 'scalar',
      symbol: 'r',
      label: 'Share of the static head lost',
      quantity: 'fraction',
      sometimes: true,
    },
    flowEstimate: {
      kind: 'scalar',
      symbol: 'Q_e',
      label: 'Flow by the gauge',
      quantity: 'flow',
      help: 'near the predicted flow; a rough figure far from it',
      sometimes: true,
    },
    findings: {
      kind: 'rows',
      label: 'What it may be',
      columns: {
        cause: { kind: 'text', label: 'Cause' },
        why: { kind: 'text', label: 'What points to it' },
        check: { kind: 'text', label: 'How to make sure' },
      },
    },
  },
  solve(given) {
    const { staticPressure, runningPressure, insideDiameter, flow, predictedLoss, waterTemperature } = given
    if (runningPressure > staticPressure)
      throw new CalculationError(
        'inconsistent',
        'runningPressure',
        'Running water cannot read higher than water at rest. Read both on the same gauge, above the valve: below a shut valve a gauge reads nothing. Give a running pressure that is not above the static one.',
      )
    const weight = waterDensity(waterTemperature) * g
    const pressureDrop = (staticPressure - runningPressure) / weight
    const velocityHead = flow === undefined ? undefined : velocityHeadOf(boreVelocity(flow, insideDiameter))
    const loss = velocityHead === undefined ? undefined : pressureDrop - velocityHead
    const headLoss = loss === undefined || loss < 0 ? undefined : loss
    const predictedFall =
      velocityHead === undefined || predictedLoss === undefined ? undefined : predictedLoss + velocityHead
    return {
      pressureDrop,
      ...(velocityHead === undefined ? {} : { velocityHead }),
      ...(headLoss === undefined ? {} : { headLoss }),
      ...(headLoss === undefined || staticPressure === 0 ? {} : { lossFraction: (headLoss * weight) / staticPressure }),
      ...(predictedFall === undefined || predictedFall === 0
        ? {}
        : { flowEstimate: flow! * Math.sqrt(pressureDrop / predictedFall) }),
      findings: findingsFor(
        given,
        predictedLoss === undefined ? undefined : (predictedLoss + (velocityHead ?? 0)) * weight,
      ),
    }
  },
  working(write, { insideDiameter, flow, waterTemperature }, { velocityHead, headLoss, lossFraction, flowEstimate }) {
    const velocity = {
      symbol: 'v',
      value: flow === undefined ? 0 : boreVelocity(flow, insideDiameter),
      say: 'the velocity at the gauge',
    }
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say: 'How far the gauge falls when the water runs, as metres of water.',
        formula: write`${'pressureDrop'} = \frac{${'staticPressure'} - ${'runningPressure'}}{${density} \, ${gravity}}`,
        gives: 'pressureDrop',
      },
      ...(flow === undefined || velocityHead === undefined
        ? []
        : [
            {
              say: 'How fast the water passes the gauge.',
              formula: write`\frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2} = ${{ ...velocity, unit: 'm/s' }}`,
            },
            {
              say: 'Moving water keeps this head as speed; the gauge does not show it, and it is not lost.',
              formula: write`${'velocityHead'} = \frac{${velocity}^2}{2 \, ${gravity}}`,
              gives: 'velocityHead' as const,
            },
          ]),
      ...(headLoss === undefined
        ? []
        : [
            {
              say: 'The rest of the fall the pipe has taken.',
              formula: write`${'headLoss'} = ${'pressureDrop'} - ${'velocityHead'}`,
              gives: 'headLoss' as const,
            },
          ]),
      ...(lossFraction === undefined
        ? []
        : [
            {
              say: 'As a share of the static head.',
              formula: write`${'lossFraction'} = \frac{${'headLoss'} \, ${density} \, ${gravity}}{${'staticPressure'}}`,
              gives: 'lossFraction' as const,
            },
          ]),
      ...(flowEstimate === undefined
        ? []
        : [
            {
              say: 'The fall goes nearly with the square of the flow; beside the fall that was predicted it shows the flow.',
              formula: write`${'flowEstimate'} = ${'flow'} \, \sqrt{\frac{${'pressureDrop'}}{${'predictedLoss'} + ${'velocityHead'}}}`,
              gives: 'flowEstimate' as const,
            },
          ]),
    ]
  },
  cautions({ flow, staticPressure, runningPressure }, { pressureDrop, velocityHead, headLoss }) {
    return [
      {
        level: 'check',
        about: ['staticPressure'],
        hazard: 'pressure',
        say: 'Open and shut the valve slowly, and never loosen a gauge or a fitting under pressure: shut its cock, let the pressure off, then turn the spanner. Local code and site rules apply.',
      },
      {
        level: 'note',
        about: ['staticPressure', 'runningPressure'],
        say: 'Read the same gauge at the same height both times, and let the needle settle. A blocked screen does not lower the static reading, and a gauge below the valve reads nothing with it shut.',
      },
      ...(flow === undefined
        ? [
            {
              level: 'check' as const,
              about: ['pressureDrop' as const, 'flow' as const],
              say: `Without a flow this fall of ${join(format(pressureDrop, 'head'))} is loss and velocity head together, and all of it is judged as loss: give the predicted flow to part them.`,
            },
          ]
        : []),
      ...(velocityHead !== undefined && headLoss === undefined
        ? [
            {
              level: 'check' as const,
              about: ['flow' as const, 'velocityHead' as const],
              say: 'The gauge falls by less than the velocity head of the predicted flow: that flow is not running, or the bore at the gauge is another.',
            },
          ]
        : []),
      ...(staticPressure > 0 && staticPressure - runningPressure < readingTolerance * staticPressure
        ? [
            {
              level: 'check' as const,
              about: ['pressureDrop' as const],
              say: 'The fall is no larger than a gauge’s own error: read it on a finer gauge, or at the full flow.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'the gauge itself: its class, its zero, its height',
    'losses between the gauge and the jet',
    'whether the pipe holds these pressures',
  ],
  example: {
    say: 'Sorrelthwaite after leaf fall: the static reading is right, and less power comes.',
    inputs: {
      staticPressure: 3.29e5,
      runningPressure: 2.71e5,
      insideDiameter: 0.1544,
      flow: 0.021,
      predictedLoss: 2.1,
      predictedStatic: 3.29e5,
      expectedPower: 3900,
      measuredPower: 2900,
    },
  },
  sources: [
    {
      author: 'R. W. Fox, A. T. McDonald',
      title: 'Introduction to Fluid Mechanics',
      year: 2011,
      where: 'energy equation with head loss (from memory)',
    },
  ],
})
