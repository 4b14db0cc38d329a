import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { pePipe } from '../tables/pe-pipe.ts'
import { format, join, say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { pipeLoss } from './friction-factor.ts'
import { flow, grossHead, insideDiameter, pipeLength, roughness } from './inputs.ts'
import { nominalPressureOf, temperatureFactorAt } from './pe-pressure.ts'

interface Pipe {
  label: string
  insideDiameter: number
  pressureRating: number
  pricePerMetre?: number
}

/** PE 100 for water: its strength and its least design coefficient (ISO 4427-1). */
const pe100 = 10e6
const designCoefficient = 1.25
const commonRatios: readonly number[] = [11, 17, 26]

const byBore = (pipes: readonly Pipe[]): Pipe[] => pipes.toSorted((a, b) => a.insideDiameter - b.insideDiameter)

const pe100Pipes: readonly Pipe[] = byBore(
  pePipe.rows
    .filter(({ sdr }) => commonRatios.includes(sdr))
    .map(({ sdr, nominal, insideDiameter }) => ({
      label: `PE100 SDR ${sdr}, ${nominal} mm`,
      insideDiameter,
      pressureRating: nominalPressureOf(pe100, sdr, designCoefficient),
    })),
)

/**
 * Pipes side by side: speed, loss (Darcy–Weisbach, Colebrook–White), net power ρgQ(H − h) and what is left of the pressure rating, rating ×
 * temperature factor − ρgH − surge; and the narrowest that keeps the loss within the target and the rating above nothing. SI. Without a
 * catalogue PE 100 of SDR 11, 17 and 26 by ISO 4427-2 / EN 12201-2, bore = outside diameter − 2 walls, rated by the formula. Valid for one bore
 * all the way; the temperature factor is polyethylene’s. None meets it: no choice is named. Sources below.
 */
export const pipeChoice = defineCalculator({
  id: 'pipe-choice',
  station: 'pipe',
  title: 'Choosing a pipe',
  summary: 'Every pipe side by side: what it loses, what it leaves of its rating, and the narrowest that will do.',
  hazards: ['pressure'],
  inputs: {
    flow: { ...flow, range: [1e-6, 1000], initial: 0.0095 },
    grossHead: { ...grossHead, initial: 48 },
    length: { ...pipeLength, initial: 240 },
    roughness: { ...roughness, initial: 5e-5 },
    lossTarget: {
      kind: 'scalar',
      symbol: 'r_t',
      label: 'Loss wanted',
      quantity: 'fraction',
      help: 'at most; 5 to 6 % is usual',
      range: [1e-4, 1],
      usual: [0.02, 0.15],
      initial: 0.06,
    },
    temperature: {
      kind: 'scalar',
      symbol: 't_w',
      label: 'Temperature of the pipe wall',
      quantity: 'temperature',
      help: 'the warmest under pressure',
      range: [0, 40],
      fallback: 20,
      optional: true,
    },
    surgeAllowance: {
      kind: 'scalar',
      symbol: 'p_s',
      label: 'Kept for surge',
      quantity: 'pressure',
      range: [0, 1e8],
      usual: [0, 1e6],
      fallback: 0,
      optional: true,
    },
    catalogue: {
      kind: 'rows',
      label: 'Your own pipes',
      row: 'pipe',
      help: 'left empty, PE100 of SDR 11, 17 and 26 is compared',
      columns: {
        label: { kind: 'choice', label: 'Name', of: ['pipe A', 'pipe B'], free: true },
        insideDiameter,
        pressureRating: {
          kind: 'scalar',
          symbol: '\\mathrm{PN}',
          label: 'Pressure rating',
          quantity: 'pressure',
          range: [1000, 1e8],
          usual: [2e5, 5e6],
        },
        pricePerMetre: {
          kind: 'scalar',
          label: 'Price of a metre',
          quantity: 'pricePerMetre',
          range: [0, 1e6],
          optional: true,
        },
      },
      least: 1,
      most: 100,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    smallestMeeting: { kind: 'text', label: 'Narrowest that will do', sometimes: true },
    rows: {
      kind: 'rows',
      label: 'Pipes',
      columns: {
        label: { kind: 'text', label: 'Pipe' },
        insideDiameter: { kind: 'scalar', label: 'Inside diameter', quantity: 'length', unit: 'mm' },
        velocity: { kind: 'scalar', label: 'Water speed', quantity: 'velocity' },
        headLoss: { kind: 'scalar', label: 'Head lost', quantity: 'head' },
        lossFraction: { kind: 'scalar', label: 'Share lost', quantity: 'fraction' },
        netPower: { kind: 'scalar', label: 'Power left in the water', quantity: 'power', sometimes: true },
        ratingMargin: { kind: 'scalar', label: 'Left of its rating', quantity: 'pressure' },
        meetsTarget: { kind: 'scalar', label: 'Will do (1 yes, 0 no)', quantity: 'count' },
        price: { kind: 'scalar', label: 'Price of the pipe', quantity: 'money', sometimes: true },
      },
    },
  },
  solve({ flow, grossHead, length, roughness, lossTarget, temperature, surgeAllowance, catalogue, waterTemperature }) {
    const viscosity = waterKinematicViscosity(waterTemperature)
    const weight = waterDensity(waterTemperature) * g
    const factor = temperatureFactorAt(temperature)
    const pipes = catalogue ? byBore(catalogue) : pe100Pipes
    const rows = pipes.map(({ label, insideDiameter, pressureRating, pricePerMetre }) => {
      const { velocity, headLoss } = pipeLoss(flow, { insideDiameter, length, roughness }, viscosity)
      const ratingMargin = pressureRating * factor - weight * grossHead - surgeAllowance
      return {
        label,
        insideDiameter,
        velocity,
        headLoss,
        lossFraction: headLoss / grossHead,
        netPower: headLoss < grossHead ? weight * flow * (grossHead - headLoss) : undefined,
        ratingMargin,
        meetsTarget: headLoss <= lossTarget * grossHead && ratingMargin >= 0 ? 1 : 0,
        price: pricePerMetre === undefined ? undefined : pricePerMetre * length,
      }
    })
    const smallest = rows.find(({ meetsTarget }) => meetsTarget === 1)
    return smallest === undefined ? { rows } : { rows, smallestMeeting: smallest.label }
  },
  working(write, { grossHead, lossTarget, temperature, surgeAllowance, waterTemperature }, { smallestMeeting }) {
    const atRest = waterDensity(waterTemperature) * g * grossHead
    return [
      {
        say: 'Each pipe is worked out by itself: friction by Darcy and Weisbach, and what its rating leaves over.',
        formula: write`${{ symbol: 'p_r', value: atRest, say: 'the pressure at rest', unit: 'Pa' }} = ${{ symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }} \, ${gravity} \, ${'grossHead'}`,
      },
      {
        say: `The loss may be ${join(format(lossTarget * grossHead, 'head'))}; of the rating ${join(format(temperatureFactorAt(temperature), 'fraction'))} counts at this temperature, and ${join(format(surgeAllowance, 'pressure'))} is kept for surge.`,
      },
      smallestMeeting === undefined
        ? { say: 'None of the pipes is within both.' }
        : { say: `The narrowest pipe within both is ${smallestMeeting}.` },
    ]
  },
  cautions: ({ grossHead, surgeAllowance, roughness }, { smallestMeeting }) => [
    {
      level: 'check',
      about: ['rows'],
      hazard: 'pressure',
      say: 'Rating against static pressure and the surge you allowed, nothing else: joints, bends and the lowest-rated part rule. The pipe maker’s data and local code go before this table.',
    },
    ...(surgeAllowance === 0
      ? [
          {
            level: 'check' as const,
            about: ['surgeAllowance' as const],
            say: 'Nothing is kept for surge. Work it out for the pipe you take: a blocked nozzle shuts at once.',
          },
        ]
      : []),
    ...(smallestMeeting === undefined
      ? [
          {
            level: 'stop' as const,
            about: ['rows' as const, 'lossTarget' as const],
            say: `None of these pipes keeps both the loss and the pressure of ${say(grossHead, 'head')} of water within bounds: take wider or stronger pipe, less flow, or accept more loss.`,
          },
        ]
      : []),
    ...(roughness === 0
      ? [{ level: 'note' as const, about: ['roughness' as const], say: 'No pipe in service is quite smooth.' }]
      : []),
  ],
  doesNotCheck: [
    'surge, collapse and the strength of bends and joints',
    'fittings: add what they lose',
    'what is in the makers’ lists and what can be carried up the hill',
  ],
  example: {
    say: 'Over Quern: three pipes on offer, with their prices.',
    inputs: {
      flow: 0.0172,
      grossHead: 104,
      length: 730,
      roughness: 5e-5,
      lossTarget: 0.08,
      temperature: 15,
      surgeAllowance: 3e5,
      catalogue: [
        { label: 'yard stock 140', insideDiameter: 0.1146, pressureRating: 16e5, pricePerMetre: 21 },
        { label: 'maker’s 160', insideDiameter: 0.1308, pressureRating: 16e5, pricePerMetre: 27.5 },
        { label: 'thin 180', insideDiameter: 0.1586, pressureRating: 10e5, pricePerMetre: 24 },
      ],
    },
  },
  plots: [
    { say: 'Bore buys loss: steeply at first, then hardly.', rows: 'rows', x: 'insideDiameter', y: ['lossFraction'] },
  ],
  sources: [
    { author: 'ISO', title: 'ISO 4427-2, polyethylene pipe for water supply: pipes', year: 2007 },
    { author: 'CEN', title: 'EN 12201-1 and -2, polyethylene pipe for water supply', year: 2011 },
    { author: 'C. F. Colebrook', title: 'Turbulent flow in pipes', year: 1939 },
  ],
})
