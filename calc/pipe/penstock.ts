import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import type { Aside, Formula } from '../formula.ts'
import { dischargeCoefficient, nozzleDiameter } from '../jet/inputs.ts'
import { format, join, say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { laminarTo, turbulentFrom, velocityHead } from './friction-factor.ts'
import { usualVelocity } from './friction.ts'
import { flow, grossHead, profile } from './inputs.ts'
import { flowThroughNozzles, sectionLoss } from './penstock-flow.ts'
import { checkProfile, gradeLineOf } from './penstock-profile.ts'
import { checkSections, sections } from './penstock-sections.ts'

/** Beyond a third of the gross head lost, more flow gives less power: with a loss ∝ Q², ρgQ(H − h) is greatest at h = H/3. */
const mostUsefulLoss = 1 / 3
/** Common practice, no source: penstocks are mostly chosen for a loss of 5 to 6 %. */
const highLoss = 0.1

/**
 * A whole penstock, sections in series, each perhaps of like pipes side by side: the flow, or the flow that given nozzles draw; what friction
 * (Darcy–Weisbach with Colebrook–White) and fittings (K·v²/2g) take; the net head left at the nozzle; the grade line. SI; heads and
 * elevations are above the nozzle. With nozzles Q = n·Cd·A·√(2g·net head). Valid for steady flow in full pipes; the friction factor is good
 * to a few per cent, the roughness mostly decides; between Re 2000 and 4000 nothing is certain. Refused: neither or both of `flow` and
 * `nozzles`; a profile that does not start at 0, goes back or passes the pipe's end; a flow whose loss eats the head (`no-solution`).
 * Sources below.
 */
export const penstock = defineCalculator({
  id: 'penstock',
  station: 'pipe',
  title: 'The penstock',
  summary: 'What the pipe takes from the gross head, what it leaves at the nozzle, and the grade line on the way.',
  hazards: ['pressure'],
  inputs: {
    grossHead: { ...grossHead, initial: 48 },
    sections,
    flow: { ...flow, initial: 0.0095, or: 'nozzles' },
    nozzles: {
      kind: 'group',
      label: 'Open nozzles',
      help: 'like nozzles at the foot of the pipe',
      columns: {
        count: { kind: 'scalar', symbol: 'n', label: 'Nozzles', quantity: 'count', range: [1, 12], whole: true },
        diameter: nozzleDiameter,
        dischargeCoefficient,
      },
      or: 'flow',
    },
    profile: {
      ...profile,
      help: 'from the intake down: distance along the pipe and height of the pipe above the nozzle',
      columns: {
        distance: profile.columns.distance,
        elevation: { ...profile.columns.elevation, label: 'Height above the nozzle' },
      },
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    netHead: { kind: 'scalar', symbol: 'H_n', label: 'Net head', quantity: 'head' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head loss', quantity: 'head' },
    lossFraction: { kind: 'scalar', symbol: 'r', label: 'Share of the gross head lost', quantity: 'fraction' },
    sections: {
      kind: 'rows',
      label: 'Sections of pipe',
      columns: {
        velocity: { kind: 'scalar', symbol: 'v', label: 'Velocity', quantity: 'velocity' },
        reynolds: { kind: 'scalar', symbol: '\\mathrm{Re}', label: 'Reynolds number', quantity: 'ratio' },
        frictionFactor: {
          kind: 'scalar',
          symbol: 'f',
          label: 'Friction factor',
          quantity: 'ratio',
          sometimes: true,
        },
        frictionLoss: { kind: 'scalar', symbol: 'h_f', label: 'Lost to friction', quantity: 'head' },
        fittingsLoss: { kind: 'scalar', symbol: 'h_K', label: 'Lost in fittings', quantity: 'head' },
      },
    },
    gradeLine: {
      kind: 'rows',
      label: 'Grade line',
      help: 'heights above the nozzle',
      columns: {
        distance: { kind: 'scalar', symbol: 's', label: 'Distance', quantity: 'length', unit: 'm' },
        energyHead: { kind: 'scalar', label: 'Energy head', quantity: 'head' },
        hydraulicGrade: { kind: 'scalar', label: 'Hydraulic grade', quantity: 'head' },
        pressureHead: { kind: 'scalar', label: 'Pressure head', quantity: 'head', sometimes: true },
      },
    },
  },
  solve({ grossHead, sections, nozzles, profile = [], waterTemperature, ...given }) {
    checkSections(sections)
    checkProfile(
      profile,
      sections.reduce((sum, { length }) => sum + length, 0),
    )
    const viscosity = waterKinematicViscosity(waterTemperature)
    const dischargingArea =
      nozzles && nozzles.count * nozzles.dischargeCoefficient * (Math.PI / 4) * nozzles.diameter ** 2
    const flow =
      dischargingArea === undefined ? given.flow! : flowThroughNozzles(grossHead, sections, dischargingArea, viscosity)
    const losses = sections.map((section) => sectionLoss(flow, section, viscosity))
    const headLoss = losses.reduce((sum, { frictionLoss, fittingsLoss }) => sum + frictionLoss + fittingsLoss, 0)
    // From the nozzles' own equation, where the difference of two heads could vanish in rounding.
    const netHead = dischargingArea === undefined ? grossHead - headLoss : velocityHead(flow / dischargingArea)
    if (!(netHead > 0))
      throw new CalculationError(
        'no-solution',
        'flow',
        `This flow would lose ${join(format(headLoss, 'head'))} in the pipe, and the gross head is only ${say(grossHead, 'head')}: give less flow or a wider pipe.`,
      )
    return {
      flow,
      netHead,
      headLoss,
      lossFraction: headLoss / grossHead,
      sections: losses,
      gradeLine: gradeLineOf(grossHead, sections, losses, profile),
    }
  },
  working(write, { sections, nozzles }, found) {
    const aside = (symbol: string, value: number, say: string): Aside => ({ symbol, value, say })
    const inUnit = (hole: Aside, unit: string): Aside => ({ ...hole, unit })
    const lossOf = (i: number) => {
      const { frictionLoss, fittingsLoss } = found.sections[i]!
      return aside(`h_{${i + 1}}`, frictionLoss + fittingsLoss, `the loss in section ${i + 1}`)
    }
    const total: Formula<'headLoss'> = {
      parts: ['', ' = ', ...sections.slice(1).map(() => ' + '), ''],
      holes: ['headLoss', ...sections.map((_, i) => lossOf(i))],
    }
    return [
      ...(nozzles
        ? [
            {
              say: 'The nozzles pass what the net head drives through them, and that flow decides the net head: the flow that suits both was found by trial.',
              formula: write`${'flow'} = ${aside('n', nozzles.count, 'the number of nozzles')} \, ${aside('C_d', nozzles.dischargeCoefficient, 'the discharge coefficient')} \, \frac{\pi}{4} \, ${aside('d_n', nozzles.diameter, 'the nozzle diameter')}^2 \, \sqrt{2 \, ${gravity} \, ${'netHead'}}`,
              gives: 'flow' as const,
            },
          ]
        : []),
      ...sections.flatMap(({ length, insideDiameter, totalK, parallel }, i) => {
        const { velocity, frictionFactor } = found.sections[i]!
        const n = i + 1
        const v = aside(`v_{${n}}`, velocity, `the velocity in section ${n}`)
        const D = aside(`D_{${n}}`, insideDiameter, `the inside diameter of section ${n}`)
        const pipes = aside(`n_{p${n}}`, parallel, `the number of pipes in section ${n}`)
        return [
          {
            say: `Section ${n}: the water’s speed${parallel === 1 ? '' : ' in each of its pipes'}.`,
            formula:
              parallel === 1
                ? write`\frac{4 \, ${'flow'}}{\pi \, ${D}^2} = ${inUnit(v, 'm/s')}`
                : write`\frac{4 \, ${'flow'}}{${pipes} \, \pi \, ${D}^2} = ${inUnit(v, 'm/s')}`,
          },
          ...(frictionFactor === undefined
            ? []
            : [
                {
                  say: `Section ${n}: what its wall and its fittings take at that speed.`,
                  formula: write`\left( ${aside(`f_{${n}}`, frictionFactor, `the friction factor of section ${n}`)} \, \frac{${aside(`L_{${n}}`, length, `the length of section ${n}`)}}{${D}} + ${aside(`K_{${n}}`, totalK, `the fittings’ coefficients of section ${n}`)} \right) \, \frac{${v}^2}{2 \, ${gravity}} = ${inUnit(lossOf(i), 'm')}`,
                },
              ]),
        ]
      }),
      { say: 'All that is lost on the way.', formula: total, gives: 'headLoss' },
      {
        say: 'What is left at the nozzle.',
        formula: write`${'netHead'} = ${'grossHead'} - ${'headLoss'}`,
        gives: 'netHead',
      },
      {
        say: 'The loss as a share of the gross head.',
        formula: write`${'lossFraction'} = \frac{${'headLoss'}}{${'grossHead'}}`,
        gives: 'lossFraction',
      },
    ]
  },
  cautions({ grossHead, profile, waterTemperature }, { lossFraction, sections, gradeLine }) {
    const deepest = grossHead - Math.min(0, ...(profile ?? []).map(({ elevation }) => elevation))
    const atRest = join(format(waterDensity(waterTemperature) * g * deepest, 'pressure'))
    const underVacuum = gradeLine.find(({ pressureHead }) => pressureHead !== undefined && pressureHead < 0)
    const fast = sections.findIndex(({ velocity }) => velocity > usualVelocity[1])
    const uncertain = sections.findIndex(({ reynolds }) => reynolds > laminarTo && reynolds < turbulentFrom)
    return [
      {
        level: 'check',
        about: ['grossHead', 'sections'],
        hazard: 'pressure',
        say: `With the valve shut ${atRest} stands at the lowest point, and a closing valve or a blocked nozzle adds to it. Pipe, joints and anchors must be rated for both by the pipe maker’s data and local code.`,
      },
      ...(underVacuum
        ? [
            {
              level: 'stop' as const,
              about: ['gradeLine' as const, 'profile' as const],
              hazard: 'pressure' as const,
              say: `The pipe rises above the grade line ${join(format(underVacuum.distance, 'length', { unit: 'm' }))} from the intake: the pressure there is below that of the air. It draws air in, and thin pipe can collapse. Lay it lower or widen the pipe above it.`,
            },
          ]
        : []),
      ...(lossFraction > mostUsefulLoss
        ? [
            {
              level: 'stop' as const,
              about: ['lossFraction' as const, 'flow' as const],
              say: 'More than a third of the gross head is lost. That is beyond the most a pipe can give: less flow would give more power. Take a wider pipe or less water.',
            },
          ]
        : lossFraction > highLoss
          ? [
              {
                level: 'check' as const,
                about: ['lossFraction' as const],
                say: 'More than a tenth of the gross head is lost. Penstocks are commonly chosen for 5 to 6 per cent (common practice, no source): compare what a wider pipe costs with what it brings.',
              },
            ]
          : []),
      ...(fast >= 0
        ? [
            {
              level: 'check' as const,
              about: ['sections' as const],
              say: `In section ${fast + 1} the water runs faster than ${say(usualVelocity[1], 'velocity')}: surge, wear and loss are all high (common practice, no source).`,
            },
          ]
        : []),
      ...(uncertain >= 0
        ? [
            {
              level: 'check' as const,
              about: ['sections' as const],
              say: `In section ${uncertain + 1} the flow is neither laminar nor turbulent: its friction can be anywhere between the two.`,
            },
          ]
        : []),
      ...(profile
        ? []
        : [
            {
              level: 'note' as const,
              about: ['profile' as const],
              say: 'Without a profile the pressure along the pipe is not worked out: a hump can still rise above the grade line.',
            },
          ]),
    ]
  },
  doesNotCheck: [
    'the pressure of surge, and whether the pipe holds it',
    'whether the stream and the intake can give this flow',
    'whether the intake draws air',
  ],
  example: {
    say: 'Over Quern: two sizes of pipe and two nozzles, the first half of the way nearly flat.',
    inputs: {
      grossHead: 104,
      sections: [
        { length: 420, insideDiameter: 0.1322, roughness: 5e-5, totalK: 1.1, parallel: 1 },
        { length: 310, insideDiameter: 0.1108, roughness: 5e-5, totalK: 0.6, parallel: 1 },
      ],
      nozzles: { count: 2, diameter: 0.0145, dischargeCoefficient: 0.94 },
      profile: [
        { distance: 0, elevation: 103.2 },
        { distance: 420, elevation: 84 },
        { distance: 600, elevation: 22 },
        { distance: 730, elevation: 0 },
      ],
      waterTemperature: 6,
    },
  },
  sources: [
    {
      author: 'C. F. Colebrook',
      title: 'Turbulent flow in pipes, with particular reference to the transition region',
      year: 1939,
      where: 'Journal of the Institution of Civil Engineers 11, 133',
    },
    {
      author: 'B. R. Munson, D. F. Young, T. H. Okiishi',
      title: 'Fundamentals of Fluid Mechanics',
      year: 2007,
      where: 'example 12.6 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
