import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { format, join } from '../units/format.ts'

/** Where the two formulas differ by more than this, the wall is no thin one. */
const thinWithin = 0.05

/**
 * Stress around a pipe's wall under inside pressure p (Pa), by the outside diameter D_o and the wall t (m): Barlow's p·D_o/(2t), which
 * takes the wall as thin and errs to the careful side; and Lamé's for any wall, greatest at the inside face, p(D_o² + D_i²)/(D_o² − D_i²).
 * Valid for a round elastic pipe far from its ends and fittings. Refused: two walls that fill the pipe (`inconsistent`). Sources below.
 */
export const hoopStress = defineCalculator({
  id: 'hoop-stress',
  station: 'pipe',
  title: 'Stress in the wall',
  summary: 'How hard the pressure pulls around the wall of a pipe, by the thin-wall rule and by the exact one.',
  hazards: ['pressure'],
  inputs: {
    pressure: {
      kind: 'scalar',
      symbol: 'p',
      label: 'Pressure',
      quantity: 'pressure',
      help: 'over the air’s; static and surge together',
      range: [0, 1e9],
      usual: [0, 1e7],
      initial: 8e5,
    },
    outsideDiameter: {
      kind: 'scalar',
      symbol: 'D_o',
      label: 'Outside diameter',
      quantity: 'length',
      range: [0.001, 20],
      usual: [0.02, 2],
      initial: 0.11,
      pick: { table: 'pe-pipe', column: 'outsideDiameter' },
    },
    wallThickness: {
      kind: 'scalar',
      symbol: 't',
      label: 'Wall thickness',
      quantity: 'length',
      help: 'the least wall, less what rust or a scratch has taken',
      range: [1e-5, 5],
      usual: [0.0005, 0.1],
      unit: 'mm',
      initial: 0.0066,
      pick: { table: 'pe-pipe', column: 'wallThickness' },
    },
  },
  outputs: {
    hoopStress: {
      kind: 'scalar',
      symbol: '\\sigma_B',
      label: 'Hoop stress, thin wall',
      quantity: 'pressure',
      unit: 'MPa',
      help: 'by Barlow, on the outside diameter',
    },
    hoopStressThick: {
      kind: 'scalar',
      symbol: '\\sigma_L',
      label: 'Hoop stress at the inside face',
      quantity: 'pressure',
      unit: 'MPa',
      help: 'by Lamé, for any wall',
    },
  },
  solve({ pressure, outsideDiameter, wallThickness }) {
    const insideDiameter = boreOf(outsideDiameter, wallThickness)
    if (insideDiameter <= 0)
      throw new CalculationError(
        'inconsistent',
        'wallThickness',
        'Two walls of this thickness leave no bore: give one wall, less than half of the outside diameter.',
      )
    const ratio = (insideDiameter / outsideDiameter) ** 2
    return {
      hoopStress: (pressure * outsideDiameter) / (2 * wallThickness),
      hoopStressThick: (pressure * (1 + ratio)) / (1 - ratio),
    }
  },
  working(write, { outsideDiameter, wallThickness }) {
    const bore = { symbol: 'D_i', value: boreOf(outsideDiameter, wallThickness), say: 'the inside diameter' }
    return [
      {
        say: 'The pressure on the width of the pipe is held by two walls. Barlow takes the outside width, to be careful.',
        formula: write`${'hoopStress'} = \frac{${'pressure'} \, ${'outsideDiameter'}}{2 \, ${'wallThickness'}}`,
        gives: 'hoopStress',
      },
      {
        say: 'Two walls off the outside diameter.',
        formula: write`${'outsideDiameter'} - 2 \, ${'wallThickness'} = ${{ ...bore, unit: 'm' }}`,
      },
      {
        say: 'The wall is not pulled evenly: its inside face has the most. This holds for thick walls too.',
        formula: write`${'hoopStressThick'} = ${'pressure'} \, \frac{${'outsideDiameter'}^2 + ${bore}^2}{${'outsideDiameter'}^2 - ${bore}^2}`,
        gives: 'hoopStressThick',
      },
    ]
  },
  cautions: (_, { hoopStress, hoopStressThick }) => [
    {
      level: 'check',
      about: ['hoopStress', 'hoopStressThick'],
      hazard: 'pressure',
      say: 'Compare with the stress that the pipe’s maker or local code allows for years, not with the one that breaks it: plastic under a steady pull gives way at well under half of its first strength.',
    },
    ...(Math.abs(hoopStress - hoopStressThick) > thinWithin * hoopStressThick
      ? [
          {
            level: 'note' as const,
            about: ['hoopStress' as const, 'hoopStressThick' as const],
            say: `The two differ by over 5 %: this wall is a thick one. The greatest stress that is really there is ${join(format(hoopStressThick, 'pressure', { unit: 'MPa' }))}; Barlow’s is the more careful.`,
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'what the material may carry: see pressure class for polyethylene',
    'stress along the pipe, at bends, branches, welds and threads',
    'rust, scratches, heat',
  ],
  example: {
    say: 'Over Quern: a steel pipe at the powerhouse, its wall less a millimetre for rust.',
    inputs: { pressure: 1.6e6, outsideDiameter: 0.1143, wallThickness: 0.0026 },
  },
  plots: [
    {
      say: 'Half the wall, twice the stress.',
      of: 'hoopStress',
      against: 'wallThickness',
      from: 0.4,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'A. P. Moser, S. Folkman',
      title: 'Buried Pipe Design',
      year: 2008,
      where: 'design of pressure pipes, eq. 4.1 to 4.3',
    },
    {
      author: 'V. B. Bhandari',
      title: 'Design of Machine Elements',
      year: 2010,
      where: 'ch. 22 (as recomputed in a public collection of textbook companions)',
    },
  ],
})

const boreOf = (outsideDiameter: number, wallThickness: number): number => outsideDiameter - 2 * wallThickness
