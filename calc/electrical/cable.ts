import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import {
  cableInputs,
  cableMaterial,
  checkSystem,
  crossSection,
  currentOf,
  dropOf,
  lossOf,
  resistanceOf,
} from './cable-inputs.ts'

/** Common practice, no source: cables of small schemes are mostly chosen for a drop of up to 5 %. */
const usualDrop = 0.05
const hopelessDrop = 0.25

/**
 * A cable from generator to load: the current I = P/(U·cos φ), over √3 for three phases; what it loses on the way, 2IRL (d.c.),
 * 2IL(R·cos φ + X·sin φ) or √3·IL(R·cos φ + X·sin φ); and the power that warms it, 2I²RL or 3I²RL. SI, cross-section in mm², resistances in Ω/km as
 * cable is sold. R is the greatest of IEC 60228 class 2 at 20 °C, warmed by IEC 60287’s coefficient; or as given, at the conductor’s temperature.
 * Valid for short lines (no capacitance), power and voltage at one end. Refused: a size that is not made, a power factor with d.c. Sources below.
 */
export const cable = defineCalculator({
  id: 'cable',
  station: 'cable',
  title: 'The cable',
  summary: 'What a cable loses between the powerhouse and the load, in volts and in watts.',
  hazards: ['electricity', 'digging'],
  inputs: {
    system: cableInputs.system,
    power: cableInputs.power,
    voltage: cableInputs.voltage,
    powerFactor: cableInputs.powerFactor,
    length: cableInputs.length,
    crossSection: { ...crossSection, initial: 10, or: 'resistancePerKm' },
    resistancePerKm: {
      kind: 'scalar',
      symbol: 'R',
      label: 'Resistance',
      quantity: 'resistancePerKm',
      help: 'of one conductor, warm as it works, by the maker’s data',
      range: [1e-4, 1000],
      usual: [0.05, 25],
      or: 'crossSection',
    },
    material: { ...cableMaterial, goesWith: 'crossSection' },
    reactancePerKm: cableInputs.reactancePerKm,
    conductorTemperature: cableInputs.conductorTemperature,
  },
  outputs: {
    current: { kind: 'scalar', symbol: 'I', label: 'Current', quantity: 'current' },
    resistancePerMetre: {
      kind: 'scalar',
      symbol: 'R',
      label: 'Resistance of one conductor',
      quantity: 'resistancePerMetre',
    },
    voltageDrop: { kind: 'scalar', symbol: '\\Delta U', label: 'Voltage drop', quantity: 'voltage' },
    voltageDropFraction: { kind: 'scalar', symbol: 'u', label: 'Drop as a share', quantity: 'fraction' },
    powerLoss: { kind: 'scalar', symbol: 'P_v', label: 'Power lost', quantity: 'power' },
    lossFraction: { kind: 'scalar', symbol: 'p', label: 'Share of the power lost', quantity: 'fraction' },
  },
  solve(given) {
    checkSystem(given)
    const resistancePerMetre =
      given.crossSection === undefined
        ? given.resistancePerKm! / 1000
        : resistanceOf(given.crossSection, given.material!, given.conductorTemperature)
    const current = currentOf(given)
    const voltageDrop = dropOf(given, current, resistancePerMetre)
    const powerLoss = lossOf(given, current, resistancePerMetre)
    return {
      current,
      resistancePerMetre,
      voltageDrop,
      voltageDropFraction: voltageDrop / given.voltage,
      powerLoss,
      lossFraction: powerLoss / given.power,
    }
  },
  working(write, given, { resistancePerMetre }) {
    const { system, powerFactor, reactancePerKm, conductorTemperature } = given
    const isThree = system === 'three-phase'
    const R = { symbol: 'R', value: resistancePerMetre, say: 'the resistance of a metre' }
    const X = { symbol: 'X', value: reactancePerKm / 1000, say: 'the reactance of a metre' }
    const sine = { symbol: '\\sin\\varphi', value: Math.sqrt(1 - powerFactor ** 2), say: 'the sine of its angle' }
    return [
      {
        say:
          given.crossSection === undefined
            ? 'The resistance of a kilometre, for a metre.'
            : `A conductor of this size and class has at most this resistance, warmed to ${join(format(conductorTemperature, 'temperature'))}.`,
        gives: 'resistancePerMetre',
      },
      {
        say: 'Power over voltage is the current.',
        formula: isThree
          ? write`${'current'} = \frac{${'power'}}{\sqrt{3} \, ${'voltage'} \, ${'powerFactor'}}`
          : system === 'dc'
            ? write`${'current'} = \frac{${'power'}}{${'voltage'}}`
            : write`${'current'} = \frac{${'power'}}{${'voltage'} \, ${'powerFactor'}}`,
        gives: 'current',
      },
      {
        say: isThree
          ? 'Between two lines, the drop of one conductor counts √3 times.'
          : 'There and back: two conductors.',
        formula: isThree
          ? write`${'voltageDrop'} = \sqrt{3} \, ${'current'} \, ${'length'} \, (${R} \, ${'powerFactor'} + ${X} \, ${sine})`
          : system === 'dc'
            ? write`${'voltageDrop'} = 2 \, ${'current'} \, ${R} \, ${'length'}`
            : write`${'voltageDrop'} = 2 \, ${'current'} \, ${'length'} \, (${R} \, ${'powerFactor'} + ${X} \, ${sine})`,
        gives: 'voltageDrop',
      },
      {
        say: 'As a share of the voltage.',
        formula: write`${'voltageDropFraction'} = \frac{${'voltageDrop'}}{${'voltage'}}`,
        gives: 'voltageDropFraction',
      },
      {
        say: isThree ? 'Three conductors are warmed.' : 'Two conductors are warmed.',
        formula: isThree
          ? write`${'powerLoss'} = 3 \, ${'current'}^2 \, ${R} \, ${'length'}`
          : write`${'powerLoss'} = 2 \, ${'current'}^2 \, ${R} \, ${'length'}`,
        gives: 'powerLoss',
      },
      {
        say: 'As a share of the power.',
        formula: write`${'lossFraction'} = \frac{${'powerLoss'}}{${'power'}}`,
        gives: 'lossFraction',
      },
    ]
  },
  cautions({ system }, { current, voltageDropFraction }) {
    return [
      {
        level: 'check',
        about: ['current'],
        hazard: 'electricity',
        say: `Whether the cable may carry ${join(format(current, 'current'))} where it lies, how a fault is cut off and how it is earthed is for local code and a licensed electrician; none of that is checked here.`,
      },
      {
        level: 'check',
        about: ['length'],
        hazard: 'digging',
        say: 'Lay it as deep as local code says, in sand, with warning tape over it, and draw where it runs. Look for other cables and pipes before you dig.',
      },
      ...(system === 'dc'
        ? [
            {
              level: 'check' as const,
              about: ['system' as const],
              hazard: 'electricity' as const,
              say: 'Direct current does not let go: its arc burns on. Use switches and fuses that are rated for direct current at this voltage, by local code.',
            },
          ]
        : []),
      ...(voltageDropFraction > hopelessDrop
        ? [
            {
              level: 'stop' as const,
              about: ['voltageDropFraction' as const],
              say: 'More than a quarter of the voltage stays in the cable: nothing at its end works so. Raise the voltage first: twice the volts lose a quarter.',
            },
          ]
        : voltageDropFraction > usualDrop
          ? [
              {
                level: 'check' as const,
                about: ['voltageDropFraction' as const],
                say: 'More than 5 per cent of the voltage is lost on the way (common practice, no source). Compare a thicker cable, or a higher voltage: twice the volts lose a quarter.',
              },
            ]
          : []),
    ]
  },
  doesNotCheck: [
    'how much current the cable may carry in its ground, conduit or bundle',
    'fault protection, earthing, lightning',
    'inrush of motors; loads that are not the same on the three phases',
  ],
  example: {
    say: 'Over Quern: a long three-phase cable in aluminium up to the farm.',
    inputs: {
      system: 'three-phase',
      power: 9000,
      voltage: 400,
      powerFactor: 0.9,
      length: 620,
      crossSection: 25,
      material: 'aluminium',
      reactancePerKm: 0.08,
      conductorTemperature: 50,
    },
  },
  plots: [
    { say: 'Twice the voltage, a quarter of the loss.', of: 'lossFraction', against: 'voltage', from: 0.4, to: 2 },
  ],
  sources: [
    { author: 'IEC', title: 'IEC 60228, conductors of insulated cables', year: 2004, where: 'table 2, class 2' },
    { author: 'IEC', title: 'IEC 60287-1-1, current rating of cables', year: 2006, where: 'table 1, coefficients' },
    {
      author: 'V. K. Mehta, R. Mehta',
      title: 'Principles of Power System',
      year: 2005,
      where: 'ch. 13 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
