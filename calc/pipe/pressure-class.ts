import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { nominalPressureOf, temperatureFactorAt } from './pe-pressure.ts'

/** Above this wall temperature the standard's factor counts. */
const fullStrengthTo = 20

/**
 * What a polyethylene pipe of a class may carry: nominal pressure PN = 2·MRS/(C·(SDR − 1)), with the minimum required strength MRS (Pa; PE 80
 * 8 MPa, PE 100 10 MPa), the design coefficient C and SDR = outside diameter ÷ wall; times the temperature factor of EN 12201-1 Annex A for
 * the wall's temperature (°C). Margins in Pa, below zero where it does not hold. Valid for water in PE pipe for 50 years at 0 to 40 °C;
 * the printed PN is rounded and may lie 4 % off. Refused: C under 1.25, strengths that are not polyethylene's (PVC has other factors).
 */
export const pressureClass = defineCalculator({
  id: 'pressure-class',
  station: 'pipe',
  title: 'Pressure class of the pipe',
  summary:
    'What a polyethylene pipe may carry at its temperature, and what is left over after static pressure and surge.',
  hazards: ['pressure'],
  inputs: {
    minimumRequiredStrength: {
      kind: 'scalar',
      symbol: '\\mathrm{MRS}',
      label: 'Minimum required strength',
      quantity: 'pressure',
      help: 'of polyethylene: PE 80 is 8 MPa, PE 100 is 10 MPa; it stands on the pipe',
      range: [3.2e6, 12.5e6],
      usual: [8e6, 10e6],
      unit: 'MPa',
      initial: 10e6,
    },
    sdr: {
      kind: 'scalar',
      symbol: '\\mathrm{SDR}',
      label: 'SDR',
      quantity: 'ratio',
      help: 'outside diameter over wall thickness; it stands on the pipe',
      range: [4, 100],
      usual: [7.4, 33],
      initial: 17,
      pick: { table: 'pe-pipe', column: 'sdr' },
    },
    designCoefficient: {
      kind: 'scalar',
      symbol: 'C',
      label: 'Design coefficient',
      quantity: 'ratio',
      help: '1.25 is the least for water in polyethylene; more where a break would do harm',
      range: [1.25, 5],
      usual: [1.25, 2],
      fallback: 1.25,
      optional: true,
    },
    temperature: {
      kind: 'scalar',
      symbol: 't',
      label: 'Temperature of the pipe wall',
      quantity: 'temperature',
      help: 'the warmest that it gets under pressure; a black pipe in the sun is hotter than the air',
      range: [0, 40],
      initial: 20,
    },
    workingPressure: {
      kind: 'scalar',
      symbol: 'p_w',
      label: 'Working pressure',
      quantity: 'pressure',
      help: 'static, with the valve shut, at the lowest point',
      range: [0, 1e8],
      initial: 4.7e5,
    },
    surgePressure: {
      kind: 'scalar',
      symbol: 'p_s',
      label: 'Surge pressure',
      quantity: 'pressure',
      help: 'what a closing valve or a blocked nozzle adds: see surge',
      range: [0, 1e8],
      initial: 3.3e5,
    },
    surgeFactor: {
      kind: 'scalar',
      symbol: 'k_s',
      label: 'Surge factor',
      quantity: 'ratio',
      help: 'by how much the pipe maker lets a short surge pass the allowed pressure; 1 without such word',
      range: [0.1, 3],
      usual: [1, 2],
      fallback: 1,
      optional: true,
    },
  },
  outputs: {
    nominalPressure: { kind: 'scalar', symbol: '\\mathrm{PN}', label: 'Nominal pressure', quantity: 'pressure' },
    allowedPressure: {
      kind: 'scalar',
      symbol: 'p_a',
      label: 'Allowed pressure',
      quantity: 'pressure',
      help: 'at the temperature of the wall',
    },
    margin: { kind: 'scalar', symbol: 'm', label: 'Left over at rest', quantity: 'pressure' },
    surgeMargin: { kind: 'scalar', symbol: 'm_s', label: 'Left over in a surge', quantity: 'pressure' },
    surgeAllowed: {
      kind: 'scalar',
      symbol: 'p_{s,a}',
      label: 'Largest surge it may carry',
      quantity: 'pressure',
    },
  },
  solve({ minimumRequiredStrength, sdr, designCoefficient, temperature, workingPressure, surgePressure, surgeFactor }) {
    const nominalPressure = nominalPressureOf(minimumRequiredStrength, sdr, designCoefficient)
    const allowedPressure = nominalPressure * temperatureFactorAt(temperature)
    return {
      nominalPressure,
      allowedPressure,
      margin: allowedPressure - workingPressure,
      surgeMargin: allowedPressure * surgeFactor - (workingPressure + surgePressure),
      surgeAllowed: allowedPressure * surgeFactor - workingPressure,
    }
  },
  working(write, { temperature }) {
    const factor = { symbol: 'k_t', value: temperatureFactorAt(temperature), say: 'the temperature factor' }
    return [
      {
        say: 'The strength of the plastic over 50 years, spread over the ring of the wall.',
        formula: write`${'nominalPressure'} = \frac{2 \, ${'minimumRequiredStrength'}}{${'designCoefficient'} \, (${'sdr'} - 1)}`,
        gives: 'nominalPressure',
      },
      {
        say:
          temperature <= fullStrengthTo
            ? `Up to ${fullStrengthTo} °C all of it counts.`
            : 'Warm plastic is weaker: the standard gives 1 at 20 °C, 0.87 at 30 °C and 0.74 at 40 °C, in proportion between.',
        formula: write`${'allowedPressure'} = ${factor} \, ${'nominalPressure'}`,
        gives: 'allowedPressure',
      },
      {
        say: 'What the water at rest leaves over.',
        formula: write`${'margin'} = ${'allowedPressure'} - ${'workingPressure'}`,
        gives: 'margin',
      },
      {
        say: 'What is left over when a surge comes on top.',
        formula: write`${'surgeMargin'} = ${'surgeFactor'} \, ${'allowedPressure'} - (${'workingPressure'} + ${'surgePressure'})`,
        gives: 'surgeMargin',
      },
      {
        say: 'The largest surge that may come on top.',
        formula: write`${'surgeAllowed'} = ${'surgeFactor'} \, ${'allowedPressure'} - ${'workingPressure'}`,
        gives: 'surgeAllowed',
      },
    ]
  },
  cautions({ temperature, surgeFactor }, { allowedPressure, margin, surgeMargin }) {
    const allowed = join(format(allowedPressure, 'pressure'))
    return [
      {
        level: 'check',
        about: ['allowedPressure'],
        hazard: 'pressure',
        say: 'This is the plain pipe. Joints, bends, saddles and valves may be rated lower, and the lowest rules. The pipe maker’s data and local code go before the figures here; test the pipe with water, never with air.',
      },
      ...(margin < 0
        ? [
            {
              level: 'stop' as const,
              about: ['margin' as const, 'workingPressure' as const],
              hazard: 'pressure' as const,
              say: `The pressure at rest alone passes the ${allowed} that this pipe may carry. Take a thicker wall (a smaller SDR) or a stronger class.`,
            },
          ]
        : []),
      ...(surgeMargin < 0
        ? [
            {
              level: 'stop' as const,
              about: ['surgeMargin' as const, 'surgePressure' as const],
              hazard: 'pressure' as const,
              say: `Static pressure and surge together pass what this pipe may carry. Take a thicker wall or slower water, or make sure that nothing can shut fast.`,
            },
          ]
        : []),
      {
        level: 'check',
        about: ['temperature'],
        say: 'A black pipe lying in the sun with still water in it passes 40 °C, where nothing here holds. Bury it, shade it, or keep it running.',
      },
      ...(temperature > fullStrengthTo
        ? [
            {
              level: 'note' as const,
              about: ['allowedPressure' as const],
              say: 'The factor is that of EN 12201-1 and ISO 4427. AS/NZS practice allows more (0.94 at 30 °C, 0.84 at 40 °C); the lower is followed here.',
            },
          ]
        : []),
      ...(surgeFactor > 1
        ? [
            {
              level: 'check' as const,
              about: ['surgeFactor' as const],
              say: 'A surge factor over 1 needs the pipe maker’s word, and counts for surges that are few and short.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['nominalPressure'],
        say: 'The PN printed on the pipe is a round figure near this one: 12.5 for 12.8 bar, 6 for 6.4 bar. Where it is lower, it rules.',
      },
    ]
  },
  doesNotCheck: [
    'joints, fittings, saddles and valves',
    'scratches, heat marks, sun and age; bends that were formed by heat',
    'collapse under a vacuum, soil and traffic',
    'PVC, steel and other materials',
  ],
  example: {
    say: 'Over Quern: thick pipe for the lower half, summer water, and a surge that its maker lets pass by half.',
    inputs: {
      minimumRequiredStrength: 10e6,
      sdr: 11,
      temperature: 24,
      workingPressure: 10.2e5,
      surgePressure: 5.6e5,
      surgeFactor: 1.5,
    },
  },
  plots: [
    {
      say: 'Thin walls carry little: the pressure goes with one over SDR less one.',
      of: 'allowedPressure',
      against: 'sdr',
      from: 0.5,
      to: 2,
    },
  ],
  sources: [
    { author: 'ISO', title: 'ISO 4427-2, polyethylene pipe for water supply: pipes', year: 2007 },
    { author: 'CEN', title: 'EN 12201-1, polyethylene pipe for water supply: general', year: 2011, where: 'Annex A' },
  ],
})
