import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'

/** Common practice, no source: less wrap slips, more speed throws the belt outwards, less speed wants a wide belt. */
const leastWrap = 120
const usualBeltSpeed = [5, 30] as const

const degrees = (radians: number): number => (radians * 180) / Math.PI

/** The straight parts of an open belt lean by this angle, radians, against the line of the centres. */
const lean = (driverDiameter: number, drivenDiameter: number, centreDistance: number): number =>
  Math.asin(Math.abs(drivenDiameter - driverDiameter) / (2 * centreDistance))

/**
 * An open belt between two pulleys: driven speed N₂ = i·N₁, its pulley d₂ = d₁/i, belt speed v = πd₁N₁/60, and from the lean φ of the
 * straight parts, sin φ = |d₂ − d₁|/(2a): length L = 2a·cos φ + π(d₁ + d₂)/2 + |d₂ − d₁|·φ, exact, and wrap of the smaller pulley 180° − 2φ.
 * SI, rev/min, degrees; diameters are pitch diameters, where the belt's cords run. Valid without slip or creep (1 to 2 % of speed on a flat
 * or V-belt, none on a toothed one). Refused: pulleys that touch, a ≤ (d₁ + d₂)/2 (`inconsistent`). Source: geometry.
 */
export const beltDrive = defineCalculator({
  id: 'belt-drive',
  station: 'runner',
  title: 'A belt drive',
  summary: 'The pulley and the belt that bring a slow runner up to the speed of its alternator.',
  hazards: ['rotating'],
  inputs: {
    driverSpeed: {
      kind: 'scalar',
      symbol: 'N_1',
      label: 'Speed of the driver',
      quantity: 'rotation',
      help: 'of the runner’s shaft',
      range: [1, 30_000],
      usual: [100, 3600],
      initial: 760,
    },
    ratio: {
      kind: 'scalar',
      symbol: 'i',
      label: 'Ratio',
      quantity: 'ratio',
      help: 'driven speed over driver speed: above 1 it speeds up',
      range: [0.05, 20],
      usual: [0.25, 4],
      initial: 2,
    },
    driverDiameter: {
      kind: 'scalar',
      symbol: 'd_1',
      label: 'Pulley of the driver',
      quantity: 'length',
      help: 'pitch diameter, where the belt’s cords run',
      range: [0.005, 10],
      usual: [0.05, 1],
      initial: 0.25,
    },
    centreDistance: {
      kind: 'scalar',
      symbol: 'a',
      label: 'Distance of the shafts',
      quantity: 'length',
      help: 'centre to centre',
      range: [0.01, 50],
      usual: [0.1, 5],
      initial: 0.6,
    },
  },
  outputs: {
    drivenSpeed: { kind: 'scalar', symbol: 'N_2', label: 'Speed of the driven shaft', quantity: 'rotation' },
    drivenDiameter: { kind: 'scalar', symbol: 'd_2', label: 'Driven pulley', quantity: 'length' },
    beltSpeed: { kind: 'scalar', symbol: 'v', label: 'Belt speed', quantity: 'velocity' },
    beltLength: { kind: 'scalar', symbol: 'L', label: 'Length of the belt', quantity: 'length', digits: 4 },
    wrapAngle: {
      kind: 'scalar',
      symbol: '\\theta',
      label: 'Wrap of the smaller pulley',
      quantity: 'angle',
    },
  },
  solve({ driverSpeed, ratio, driverDiameter, centreDistance }) {
    const drivenDiameter = driverDiameter / ratio
    if (2 * centreDistance <= driverDiameter + drivenDiameter)
      throw new CalculationError(
        'inconsistent',
        'centreDistance',
        'At this distance the two pulleys touch: give more than half of both diameters together.',
      )
    const angle = lean(driverDiameter, drivenDiameter, centreDistance)
    return {
      drivenSpeed: driverSpeed * ratio,
      drivenDiameter,
      beltSpeed: (Math.PI * driverDiameter * driverSpeed) / 60,
      beltLength:
        2 * centreDistance * Math.cos(angle) +
        (Math.PI / 2) * (driverDiameter + drivenDiameter) +
        Math.abs(drivenDiameter - driverDiameter) * angle,
      wrapAngle: 180 - 2 * degrees(angle),
    }
  },
  working(write, { driverDiameter, centreDistance }, { drivenDiameter }) {
    const angle = degrees(lean(driverDiameter, drivenDiameter, centreDistance))
    const large = { symbol: 'd_l', value: Math.max(driverDiameter, drivenDiameter), say: 'the larger pulley' }
    const small = { symbol: 'd_s', value: Math.min(driverDiameter, drivenDiameter), say: 'the smaller pulley' }
    const phi = { symbol: '\\varphi', value: angle, say: 'the lean' }
    return [
      {
        say: 'The driven shaft turns so many times as fast as the driver.',
        formula: write`${'drivenSpeed'} = ${'ratio'} \, ${'driverSpeed'}`,
        gives: 'drivenSpeed',
      },
      {
        say: 'The belt runs equally fast over both pulleys, so the faster one is smaller by the ratio.',
        formula: write`${'drivenDiameter'} = \frac{${'driverDiameter'}}{${'ratio'}}`,
        gives: 'drivenDiameter',
      },
      {
        say: 'In each turn the belt moves once around the driver’s pulley.',
        formula: write`${'beltSpeed'} = \frac{\pi \, ${'driverDiameter'} \, ${'driverSpeed'}}{60}`,
        gives: 'beltSpeed',
      },
      {
        say: 'The straight parts of the belt lean from the larger pulley down to the smaller.',
        formula: write`\sin(${{ ...phi, unit: '°' }}) = \frac{${large} - ${small}}{2 \, ${'centreDistance'}}`,
      },
      {
        say: 'The smaller pulley loses that lean twice from its half turn of belt.',
        formula: write`${'wrapAngle'} = 180 - 2 \, ${phi}`,
        gives: 'wrapAngle',
      },
      {
        say: 'Two straight parts, a half turn of each pulley, and a little more around the larger one.',
        formula: write`${'beltLength'} = 2 \, ${'centreDistance'} \, \cos(${{ ...phi, unit: '°' }}) + \frac{\pi}{2} \, (${large} + ${small}) + \frac{\pi \, ${phi}}{180} \, (${large} - ${small})`,
        gives: 'beltLength',
      },
    ]
  },
  cautions: (_, { beltSpeed, wrapAngle }) => [
    {
      level: 'stop',
      about: ['beltSpeed'],
      hazard: 'rotating',
      say: 'A belt draws in fingers, hair and sleeves where it meets the pulley. Guard all of it, for runaway speed too; never touch, dress or put on a running belt; shut and lock the water off before the guard comes off. Local code on guarding applies.',
    },
    ...(wrapAngle < leastWrap
      ? [
          {
            level: 'check' as const,
            about: ['wrapAngle' as const],
            say: `The smaller pulley has less than about ${leastWrap}° of belt and will slip: move the shafts apart, take less ratio, or a toothed belt (common practice, no source).`,
          },
        ]
      : []),
    ...(beltSpeed > usualBeltSpeed[1]
      ? [
          {
            level: 'check' as const,
            about: ['beltSpeed' as const],
            say: `Over about ${usualBeltSpeed[1]} m/s the belt is flung outwards and iron pulleys may burst: take smaller pulleys, or ask the maker. It runs faster yet at runaway.`,
          },
        ]
      : []),
    ...(beltSpeed < usualBeltSpeed[0]
      ? [
          {
            level: 'note' as const,
            about: ['beltSpeed' as const],
            say: `Under about ${usualBeltSpeed[0]} m/s a belt must pull hard for little power: larger pulleys serve it better.`,
          },
        ]
      : []),
    {
      level: 'note',
      about: ['beltLength'],
      say: 'Belts come in set lengths: take the next one and move the shafts to it, and leave a slide to tighten and to change it. Flat and V-belts creep by 1 to 2 per cent; a toothed belt does not.',
    },
  ],
  doesNotCheck: [
    'whether the belt can pass the power: ask its maker’s tables',
    'the pull of the belt on shafts and bearings',
    'speeds at runaway, when the load is lost',
  ],
  example: {
    say: 'Nether Pollow: a slow wheel shaft, sped up to a four-pole alternator.',
    inputs: { driverSpeed: 420, ratio: 3.6, driverDiameter: 0.56, centreDistance: 1.15 },
  },
  plots: [
    {
      say: 'The further apart the shafts, the more belt lies around the smaller pulley.',
      of: 'wrapAngle',
      against: 'centreDistance',
      from: 0.6,
      to: 3,
    },
  ],
  sources: [
    {
      author: 'R. S. Khurmi, J. K. Gupta',
      title: 'Theory of Machines',
      year: 2005,
      where: 'belt, rope and chain drives (from memory); the geometry stands by itself',
    },
  ],
})
