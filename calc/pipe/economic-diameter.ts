import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { bracketedMinimum } from '../numeric/minimum.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { format, join, say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { discountRate, lifeYears, presentWorthOfYearly, price } from '../water/worth-of-money.ts'
import { pipeLoss } from './friction-factor.ts'
import { flow, grossHead, insideDiameter, pipeLength, roughness } from './inputs.ts'

const [narrowest, widest] = insideDiameter.range
/** The curve reaches from so much narrower to so much wider than the best bore. */
const [curveFrom, curveTo] = [0.7, 1.6]
const curveSteps = 18
/** On the logarithm of the bore: nearer than this to the end of the search is at its end. */
const atEnd = 1e-6
const highLoss = 0.1

interface Costs {
  flow: number
  length: number
  roughness: number
  efficiency: number
  hoursPerYear: number
  price: number
  lifeYears: number
  discountRate: number
  costCoefficient: number
  costExponent: number
  waterTemperature: number
}

const headLossOf = ({ flow, length, roughness, waterTemperature }: Costs, insideDiameter: number): number =>
  pipeLoss(flow, { insideDiameter, length, roughness }, waterKinematicViscosity(waterTemperature)).headLoss

const pipeCostOf = (given: Costs, diameter: number): number =>
  (given.costCoefficient * diameter ** given.costExponent * given.length) /
  presentWorthOfYearly(given.discountRate, given.lifeYears)

/** What a year loses with each metre of head, in money. */
const valueOfHead = ({ flow, efficiency, hoursPerYear, price, waterTemperature }: Costs): number =>
  (waterDensity(waterTemperature) * g * flow * efficiency * hoursPerYear * price) / 1000

/**
 * The bore D at which a year's cost of the pipe and the energy that its friction loses are together least: a·D^b·L over the present worth of one
 * paid yearly, and ρgQh·η·hours·price/1000, the loss h by Darcy–Weisbach and Colebrook–White; found by Brent's method. SI; D in m, cost in one
 * currency a metre, hours a year, price per kWh, rate as a share a year. Valid for one bore at one flow all those hours; the sum is flat near its
 * least, so 10 % of bore cost little, and prices decide more than hydraulics. Refused (`no-solution`): no bore to 20 m leaves any head, or the
 * least lies at the end of the search.
 */
export const economicDiameter = defineCalculator({
  id: 'economic-diameter',
  station: 'pipe',
  title: 'The bore that pays best',
  summary: 'Where a wider pipe stops paying: the bore at which pipe and lost energy together cost least in a year.',
  hazards: [],
  inputs: {
    flow: { ...flow, help: 'at which the pipe mostly runs', range: [1e-6, 1000], initial: 0.0095 },
    grossHead: { ...grossHead, initial: 48 },
    length: { ...pipeLength, initial: 240 },
    roughness: { ...roughness, initial: 5e-5 },
    efficiency: {
      kind: 'scalar',
      symbol: '\\eta',
      label: 'Efficiency from water to wire',
      quantity: 'fraction',
      help: 'nozzle, runner, alternator and cable together',
      range: [0.01, 1],
      usual: [0.4, 0.85],
      initial: 0.6,
    },
    hoursPerYear: {
      kind: 'scalar',
      symbol: 't_y',
      label: 'Hours a year at this flow',
      quantity: 'hours',
      help: 'a year has 8760; take off dry weeks and repairs',
      range: [1, 8784],
      usual: [2000, 8760],
      initial: 6800,
    },
    price,
    lifeYears,
    discountRate,
    costCoefficient: {
      kind: 'scalar',
      symbol: 'a',
      label: 'Cost of a metre, if it were 1 m wide',
      quantity: 'pricePerMetre',
      help: 'from two offers for pipe, laid: price of a metre = a × bore in metres to the power b',
      range: [1e-3, 1e9],
      usual: [50, 50_000],
      initial: 900,
    },
    costExponent: {
      kind: 'scalar',
      symbol: 'b',
      label: 'Power of the bore in the cost',
      quantity: 'ratio',
      help: 'the logarithm of the ratio of two prices over that of their bores; mostly 1.2 to 2',
      range: [0.1, 5],
      usual: [1, 2.2],
      initial: 1.5,
    },
    waterTemperature,
  },
  outputs: {
    diameter: { kind: 'scalar', symbol: 'D', label: 'Bore that costs least', quantity: 'length' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost in it', quantity: 'head' },
    yearlyCostOfPipe: { kind: 'scalar', symbol: 'K_p', label: 'A year’s share of the pipe', quantity: 'money' },
    yearlyCostOfLoss: { kind: 'scalar', symbol: 'K_h', label: 'A year’s lost energy', quantity: 'money' },
    curve: {
      kind: 'rows',
      label: 'Yearly cost by bore',
      columns: {
        diameter: { kind: 'scalar', symbol: 'D', label: 'Bore', quantity: 'length' },
        yearlyCostOfPipe: { kind: 'scalar', symbol: 'K_p', label: 'Pipe', quantity: 'money' },
        yearlyCostOfLoss: { kind: 'scalar', symbol: 'K_h', label: 'Lost energy', quantity: 'money' },
        yearlyCost: { kind: 'scalar', symbol: 'K', label: 'Both together', quantity: 'money' },
      },
    },
  },
  solve(given) {
    const { grossHead, roughness } = given
    const perMetre = valueOfHead(given)
    const least = Math.log(Math.max(narrowest, 2.001 * roughness))
    const most = Math.log(widest)
    const headLeft = (logBore: number) => grossHead - headLossOf(given, Math.exp(logBore))
    if (!(headLeft(most) > 0))
      throw new CalculationError(
        'no-solution',
        'flow',
        `No pipe of up to ${say(widest, 'length')} leaves any of the head at this flow: give less flow or a shorter pipe.`,
      )
    const leavesHead = headLeft(least) > 0 ? least : bracketedRoot(headLeft, least, most)!
    const best = bracketedMinimum(
      (logBore) => {
        const bore = Math.exp(logBore)
        return pipeCostOf(given, bore) + perMetre * headLossOf(given, bore)
      },
      leavesHead,
      most,
    )
    if (best - leavesHead < atEnd)
      throw new CalculationError(
        'no-solution',
        'costCoefficient',
        'At this cost no pipe pays: the cheapest would lose all of the head. Check the cost of a metre, the price of energy and the hours.',
      )
    if (most - best < atEnd)
      throw new CalculationError(
        'no-solution',
        'costCoefficient',
        `At this cost the best pipe would be wider than ${say(widest, 'length')}: check the cost of a metre and its power of the bore.`,
      )
    const diameter = Math.exp(best)
    const headLoss = headLossOf(given, diameter)
    return {
      diameter,
      headLoss,
      yearlyCostOfPipe: pipeCostOf(given, diameter),
      yearlyCostOfLoss: perMetre * headLoss,
      curve: Array.from({ length: curveSteps + 1 }, (_, i) => {
        const bore = Math.max(diameter * (curveFrom + ((curveTo - curveFrom) * i) / curveSteps), Math.exp(leavesHead))
        const yearlyCostOfPipe = pipeCostOf(given, bore)
        const yearlyCostOfLoss = perMetre * headLossOf(given, bore)
        return { diameter: bore, yearlyCostOfPipe, yearlyCostOfLoss, yearlyCost: yearlyCostOfPipe + yearlyCostOfLoss }
      }),
    }
  },
  working(write, given, { diameter }) {
    const worth = {
      symbol: 'w',
      value: presentWorthOfYearly(given.discountRate, given.lifeYears),
      say: 'the worth of one paid yearly',
    }
    const density = { symbol: '\\rho', value: waterDensity(given.waterTemperature), say: 'the density of water' }
    const { frictionFactor = 0 } = pipeLoss(
      given.flow,
      { ...given, insideDiameter: diameter },
      waterKinematicViscosity(given.waterTemperature),
    )
    const f = { symbol: 'f', value: frictionFactor, say: 'the friction factor' }
    return [
      given.discountRate === 0
        ? {
            say: 'Without interest one paid each year is worth as many as there are years.',
            formula: write`${'lifeYears'} = ${worth}`,
          }
        : {
            say: 'Money of later years is worth less today: one paid at the end of each year is worth together',
            formula: write`\frac{1 - (1 + ${'discountRate'})^{-${'lifeYears'}}}{${'discountRate'}} = ${worth}`,
          },
      {
        say: 'A narrow pipe is cheap and loses much, a wide one the other way round. The bore was tried until both costs below are together least.',
        gives: 'diameter',
      },
      {
        say: 'What friction takes in that bore, its factor by Colebrook and White.',
        formula: write`${'headLoss'} = ${f} \, \frac{${'length'}}{${'diameter'}} \, \frac{1}{2 \, ${gravity}} \left( \frac{4 \, ${'flow'}}{\pi \, ${'diameter'}^2} \right)^2`,
        gives: 'headLoss',
      },
      {
        say: 'The price of the whole pipe, paid off in equal yearly shares.',
        formula: write`${'yearlyCostOfPipe'} = \frac{${'costCoefficient'} \, ${'diameter'}^{${'costExponent'}} \, ${'length'}}{${worth}}`,
        gives: 'yearlyCostOfPipe',
      },
      {
        say: 'The energy that the lost head would have given in a year, in kilowatt-hours, at their price.',
        formula: write`${'yearlyCostOfLoss'} = \frac{${density} \, ${gravity} \, ${'flow'} \, ${'headLoss'} \, ${'efficiency'} \, ${'hoursPerYear'} \, ${'price'}}{1000}`,
        gives: 'yearlyCostOfLoss',
      },
    ]
  },
  cautions({ grossHead }, { diameter, headLoss }) {
    return [
      {
        level: 'note',
        about: ['diameter'],
        say: `The sum is flat near its least: the next size up or down costs little more. Take the wider one; stream, price and load mostly grow. Bores of real pipe near ${join(format(diameter, 'length', { unit: 'mm' }))} stand in the table of pipe.`,
      },
      {
        level: 'check',
        about: ['costCoefficient', 'price'],
        say: 'The answer is as good as the prices. Count the trench, joints, anchors and carriage with the pipe, and the energy at what it is worth to you: energy that only warms the dump load is worth little.',
      },
      ...(headLoss > highLoss * grossHead
        ? [
            {
              level: 'check' as const,
              about: ['headLoss' as const],
              say: 'The cheapest pipe loses more than a tenth of the head: pipe is dear here, or energy cheap. The power falls by the same share; look whether what is left does the work.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'the pressure that the pipe must bear, which raises the cost of its lower end',
    'flows other than this one through the year: see annual energy',
    'bends, valves and the entrance',
  ],
  example: {
    say: 'Over Quern: a long pipe, energy sold at a low price, an offer for laid pipe by the metre.',
    inputs: {
      flow: 0.0172,
      grossHead: 104,
      length: 730,
      roughness: 5e-5,
      efficiency: 0.64,
      hoursPerYear: 5900,
      price: 0.11,
      lifeYears: 30,
      discountRate: 0.04,
      costCoefficient: 1150,
      costExponent: 1.6,
      waterTemperature: 6,
    },
  },
  plots: [
    {
      say: 'Pipe grows dearer with the bore, lost energy cheaper; their sum has a flat bottom.',
      rows: 'curve',
      x: 'diameter',
      y: ['yearlyCost', 'yearlyCostOfPipe', 'yearlyCostOfLoss'],
    },
  ],
  sources: [
    {
      author: 'E. Mosonyi',
      title: 'Water Power Development',
      year: 1965,
      where: 'ch. 94, the economical penstock diameter (as read on a public page)',
    },
    {
      author: 'B. S. Massey, A. J. Ward-Smith',
      title: 'Mechanics of Fluids',
      year: 2006,
      where: 'example 7.4 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
