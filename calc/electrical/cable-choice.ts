import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import {
  cableInputs,
  cableMaterial,
  checkSystem,
  currentOf,
  dropOf,
  lossOf,
  resistanceOf,
  sizesOf,
} from './cable-inputs.ts'

/**
 * The sizes of cable that IEC 60228 has for a material, each with its drop and loss over this length, and the smallest whose voltage drop is
 * within the target. Formulas, units and limits as those of one cable. Absent when none of them meets it. Sources as there.
 */
export const cableChoice = defineCalculator({
  id: 'cable-choice',
  station: 'cable',
  title: 'Choosing a cable',
  summary: 'Every size side by side: what it loses, and the smallest that keeps the drop within your target.',
  hazards: ['electricity', 'digging'],
  inputs: {
    system: cableInputs.system,
    power: cableInputs.power,
    voltage: cableInputs.voltage,
    powerFactor: cableInputs.powerFactor,
    length: cableInputs.length,
    material: cableMaterial,
    reactancePerKm: cableInputs.reactancePerKm,
    conductorTemperature: cableInputs.conductorTemperature,
    dropTarget: {
      kind: 'scalar',
      symbol: 'u_t',
      label: 'Voltage drop wanted',
      quantity: 'fraction',
      help: 'at most; 3 to 5 % is usual',
      range: [0.0001, 1],
      usual: [0.01, 0.1],
      initial: 0.04,
    },
  },
  outputs: {
    smallestMeeting: {
      kind: 'scalar',
      symbol: 'A',
      label: 'Smallest size that meets it',
      quantity: 'conductorArea',
      sometimes: true,
    },
    rows: {
      kind: 'rows',
      label: 'Sizes of cable',
      columns: {
        crossSection: { kind: 'scalar', label: 'Cross-section', quantity: 'conductorArea' },
        voltageDrop: { kind: 'scalar', label: 'Voltage drop', quantity: 'voltage' },
        voltageDropFraction: { kind: 'scalar', label: 'Drop as a share', quantity: 'fraction' },
        powerLoss: { kind: 'scalar', label: 'Power lost', quantity: 'power' },
        lossFraction: { kind: 'scalar', label: 'Share of the power lost', quantity: 'fraction' },
      },
    },
  },
  solve(given) {
    checkSystem(given)
    const current = currentOf(given)
    const rows = sizesOf(given.material).map((crossSection) => {
      const resistance = resistanceOf(crossSection, given.material, given.conductorTemperature)
      const voltageDrop = dropOf(given, current, resistance)
      const powerLoss = lossOf(given, current, resistance)
      return {
        crossSection,
        voltageDrop,
        voltageDropFraction: voltageDrop / given.voltage,
        powerLoss,
        lossFraction: powerLoss / given.power,
      }
    })
    const smallest = rows.find(({ voltageDropFraction }) => voltageDropFraction <= given.dropTarget)
    return smallest === undefined ? { rows } : { rows, smallestMeeting: smallest.crossSection }
  },
  working: (_, given, { smallestMeeting, rows }) => [
    {
      say: `The current is ${join(format(currentOf(given), 'current'))} whatever the cable; each size is worked out as one cable is, from the thinnest up.`,
    },
    ...(smallestMeeting === undefined
      ? [{ say: `Even ${join(format(rows.at(-1)!.crossSection, 'conductorArea'))} loses more than the target.` }]
      : [
          {
            say: 'The first whose drop is within the target is the smallest that meets it.',
            gives: 'smallestMeeting' as const,
          },
        ]),
  ],
  cautions(_, { smallestMeeting }) {
    return [
      {
        level: 'check',
        about: ['smallestMeeting', 'rows'],
        hazard: 'electricity',
        say: 'The drop alone is compared. What the cable may carry, how a fault is cut off and how it is earthed can ask for a thicker one: that is for local code and a licensed electrician.',
      },
      {
        level: 'check',
        about: ['length'],
        hazard: 'digging',
        say: 'The trench costs the same for a thicker cable, and it is dug once: look for buried services first, and bury it as local code says.',
      },
      ...(smallestMeeting === undefined
        ? [
            {
              level: 'check' as const,
              about: ['dropTarget' as const, 'voltage' as const],
              say: 'No size here keeps the drop within the target. Raise the voltage, lay cables side by side, or accept more loss.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'how much current each size may carry where it lies',
    'prices: the cable’s and that of the power it loses',
    'fault protection, earthing, lightning',
  ],
  example: {
    say: 'Over Quern: aluminium or copper for a long way at three phases; here aluminium.',
    inputs: {
      system: 'three-phase',
      power: 9000,
      voltage: 400,
      powerFactor: 0.9,
      length: 620,
      material: 'aluminium',
      reactancePerKm: 0.08,
      conductorTemperature: 50,
      dropTarget: 0.05,
    },
  },
  plots: [
    {
      say: 'The first steps up save much, the last ones little.',
      rows: 'rows',
      x: 'crossSection',
      y: ['voltageDropFraction'],
    },
  ],
  sources: [
    { author: 'IEC', title: 'IEC 60228, conductors of insulated cables', year: 2004, where: 'table 2, class 2' },
    { author: 'IEC', title: 'IEC 60287-1-1, current rating of cables', year: 2006, where: 'table 1, coefficients' },
  ],
})
