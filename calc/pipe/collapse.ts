import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { say } from '../units/format.ts'

/** Air at sea level: ISO 2533. All of it presses on a pipe that holds a full vacuum. */
const atmosphere = 101_325

/** The outside pressure at which a long free ring buckles into two lobes, Pa, where it is round. */
const roundCollapse = (modulus: number, poisson: number, sdr: number): number =>
  (2 * modulus) / ((1 - poisson ** 2) * (sdr - 1) ** 3)

/**
 * Where a ring of mean radius R is pressed to half axes R(1 + q) and R(1 − q), its flattest side has the radius R(1 + q)²/(1 − q); and the
 * pressure that buckles a ring goes with 1/R³. ASTM F1216, appendix X1, and handbooks of plastic pipe print this factor.
 */
const ovalityFactor = (q: number): number => ((1 - q) / (1 + q) ** 2) ** 3

/**
 * Outside pressure that collapses a long pipe that nothing holds round: p = 2E/((1 − ν²)(SDR − 1)³) (Timoshenko and Gere), times the factor
 * ((1 − q)/(1 + q)²)³ for an ovality q = (greatest − mean) ÷ mean diameter (ASTM F1216). E Pa, long-term for a load that stays and short-term
 * for one of minutes. The margin over a full vacuum is p ÷ safety factor − 101 325 Pa. Valid for elastic thin walls, SDR over about 10;
 * steel yields first where it is thick. Soil that is well packed helps and is left out. Refused: a short-term modulus under the long-term
 * one (`inconsistent`).
 */
export const collapse = defineCalculator({
  id: 'collapse',
  station: 'pipe',
  title: 'Collapse under a vacuum',
  summary: 'At what outside pressure a pipe is sucked flat, and whether it would stand a full vacuum.',
  hazards: ['pressure'],
  inputs: {
    sdr: {
      kind: 'scalar',
      symbol: '\\mathrm{SDR}',
      label: 'SDR',
      quantity: 'ratio',
      help: 'outside diameter over wall thickness',
      range: [3, 500],
      usual: [7.4, 200],
      initial: 17,
      pick: { table: 'pe-pipe', column: 'sdr' },
    },
    modulus: {
      kind: 'scalar',
      symbol: 'E',
      label: 'Long-term modulus',
      quantity: 'pressure',
      help: 'for a load that stays. Polyethylene about 0.15 to 0.2 GPa, PVC about 1.6, steel 207',
      range: [1e6, 1e12],
      usual: [1e8, 2.2e11],
      unit: 'GPa',
      initial: 0.2e9,
      pick: { table: 'moduli', column: 'longTerm' },
    },
    shortModulus: {
      kind: 'scalar',
      symbol: 'E_s',
      label: 'Short-term modulus',
      quantity: 'pressure',
      help: 'for a vacuum of minutes: polyethylene about 0.75 to 1.2 GPa when cool',
      range: [1e6, 1e12],
      usual: [5e8, 2.2e11],
      unit: 'GPa',
      initial: 1e9,
      optional: true,
      pick: { table: 'moduli', column: 'shortTerm' },
    },
    poisson: {
      kind: 'scalar',
      symbol: '\\nu',
      label: 'Poisson’s ratio',
      quantity: 'ratio',
      help: 'polyethylene 0.45, PVC 0.4, steel 0.3',
      range: [0, 0.5],
      usual: [0.25, 0.5],
      fallback: 0.45,
      optional: true,
    },
    ovality: {
      kind: 'scalar',
      symbol: 'q',
      label: 'Ovality',
      quantity: 'fraction',
      help: 'greatest diameter less the mean one, over the mean; pipe off a coil or under soil has 3 to 6 %',
      range: [0, 0.3],
      usual: [0, 0.1],
      fallback: 0,
      optional: true,
    },
    safetyFactor: {
      kind: 'scalar',
      symbol: 'S',
      label: 'Safety factor',
      quantity: 'ratio',
      range: [1, 20],
      usual: [1.5, 5],
      fallback: 2,
      optional: true,
    },
  },
  outputs: {
    criticalPressure: {
      kind: 'scalar',
      symbol: 'p_c',
      label: 'Collapse pressure, lasting',
      quantity: 'pressure',
      help: 'outside over inside, without the safety factor',
    },
    criticalPressureShort: {
      kind: 'scalar',
      symbol: 'p_{c,s}',
      label: 'Collapse pressure, short',
      quantity: 'pressure',
      sometimes: true,
    },
    fullVacuumMargin: {
      kind: 'scalar',
      symbol: 'm',
      label: 'Left over at a full vacuum',
      quantity: 'pressure',
      help: 'a lasting one, after the safety factor; below zero it is not held',
    },
  },
  solve({ sdr, modulus, shortModulus, poisson, ovality, safetyFactor }) {
    if (shortModulus !== undefined && shortModulus < modulus)
      throw new CalculationError(
        'inconsistent',
        'shortModulus',
        'No pipe is softer for a short load than for a long one: give a short-term modulus that is not under the long-term one.',
      )
    const factor = ovalityFactor(ovality)
    const criticalPressure = factor * roundCollapse(modulus, poisson, sdr)
    const fullVacuumMargin = criticalPressure / safetyFactor - atmosphere
    return shortModulus === undefined
      ? { criticalPressure, fullVacuumMargin }
      : {
          criticalPressure,
          criticalPressureShort: factor * roundCollapse(shortModulus, poisson, sdr),
          fullVacuumMargin,
        }
  },
  working(write, { ovality, shortModulus }) {
    const factor = { symbol: 'k_q', value: ovalityFactor(ovality), say: 'the ovality factor' }
    const air = { symbol: 'p_{atm}', value: atmosphere, say: 'the pressure of the air' }
    return [
      {
        say:
          ovality === 0
            ? 'A round pipe has all of its strength.'
            : 'A pipe out of round buckles at its flattest side, where it is bent to a larger radius.',
        formula: write`\left(\frac{1 - ${'ovality'}}{(1 + ${'ovality'})^2}\right)^3 = ${factor}`,
      },
      {
        say: 'What buckles a free ring of this wall, under a load that stays.',
        formula: write`${'criticalPressure'} = ${factor} \, \frac{2 \, ${'modulus'}}{(1 - ${'poisson'}^2) \, (${'sdr'} - 1)^3}`,
        gives: 'criticalPressure',
      },
      ...(shortModulus === undefined
        ? []
        : [
            {
              say: 'The same for a load of minutes, before the plastic creeps.',
              formula: write`${'criticalPressureShort'} = ${factor} \, \frac{2 \, ${'shortModulus'}}{(1 - ${'poisson'}^2) \, (${'sdr'} - 1)^3}`,
              gives: 'criticalPressureShort' as const,
            },
          ]),
      {
        say: 'With the safety factor taken off, beside the whole pressure of the air.',
        formula: write`${'fullVacuumMargin'} = \frac{${'criticalPressure'}}{${'safetyFactor'}} - ${air}`,
        gives: 'fullVacuumMargin',
      },
    ]
  },
  cautions({ safetyFactor, ovality, sdr }, { criticalPressureShort, fullVacuumMargin }) {
    const holdsShort = criticalPressureShort !== undefined && criticalPressureShort / safetyFactor >= atmosphere
    return [
      {
        level: 'check',
        about: ['fullVacuumMargin'],
        hazard: 'pressure',
        say: 'A valve or a screen shut at the intake with the nozzle open below pulls a vacuum along the whole pipe. Put an open vent or an air valve below every valve that can shut at the top; what an intake must have is for the pipe maker’s data and local code.',
      },
      ...(fullVacuumMargin >= 0
        ? []
        : holdsShort
          ? [
              {
                level: 'check' as const,
                about: ['fullVacuumMargin' as const, 'criticalPressureShort' as const],
                say: 'A full vacuum of minutes is held by these figures, a lasting one is not. Give it air.',
              },
            ]
          : [
              {
                level: 'stop' as const,
                about: ['fullVacuumMargin' as const],
                hazard: 'pressure' as const,
                say: `A full vacuum passes what this pipe stands with a safety factor of ${say(safetyFactor, 'ratio')}. Take a thicker wall, or make sure of air at the top.`,
              },
            ]),
      ...(ovality === 0
        ? [
            {
              level: 'note' as const,
              about: ['ovality' as const],
              say: 'No pipe is quite round: 5 % of ovality takes a third of the strength away.',
            },
          ]
        : []),
      ...(sdr < 10
        ? [
            {
              level: 'note' as const,
              about: ['sdr' as const],
              say: 'The wall is thick: the formula is for thin ones, and the material may give way before it buckles.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'help from packed soil, and its load; ground water; traffic',
    'whether the wall yields before it buckles',
    'warmth: plastic at 40 °C is about half as stiff as at 20 °C',
  ],
  example: {
    say: 'Nether Pollow: a wide thin pipe off the coil, laid above the ground.',
    inputs: { sdr: 26, modulus: 0.19e9, shortModulus: 0.9e9, ovality: 0.04 },
  },
  plots: [
    {
      say: 'A wall a little thinner holds far less: it goes with the third power.',
      of: 'criticalPressure',
      against: 'sdr',
      from: 0.6,
      to: 2,
    },
  ],
  sources: [
    { author: 'S. P. Timoshenko, J. M. Gere', title: 'Theory of Elastic Stability', year: 1961, where: 'ch. 7' },
    {
      author: 'A. P. Moser',
      title: 'Buried Pipe Design',
      year: 2001,
      where: 'eq. 3.14, p. 111',
    },
    {
      author: 'ASTM',
      title: 'F1216, rehabilitation of pipelines by a resin-impregnated tube',
      year: 2016,
      where: 'appendix X1, the ovality factor (from memory)',
    },
  ],
})
