import type { Rows } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { say } from '../units/format.ts'
import { insideDiameter, pipeLength, roughness } from './inputs.ts'
import type { Section } from './penstock-flow.ts'

/** The pipe of a penstock from the intake down, section after section. */
export const sections = {
  kind: 'rows',
  label: 'Sections of pipe',
  row: 'section',
  help: 'from the intake down',
  columns: {
    length: pipeLength,
    insideDiameter,
    roughness,
    totalK: {
      kind: 'scalar',
      symbol: 'K',
      label: 'Loss coefficients of the fittings',
      quantity: 'ratio',
      help: 'their sum, on this section’s velocity; without exit or nozzle',
      range: [0, 10_000],
      usual: [0, 50],
      fallback: 0,
      optional: true,
    },
    parallel: {
      kind: 'scalar',
      symbol: 'n_p',
      label: 'Pipes side by side',
      quantity: 'count',
      range: [1, 20],
      whole: true,
      fallback: 1,
      optional: true,
    },
  },
  least: 1,
  most: 50,
  initial: [{ length: 240, insideDiameter: 0.0968, roughness: 0.00005, totalK: 1.5, parallel: 1 }],
} as const satisfies Rows

/** Throws where a wall's roughness would fill the bore. */
export const checkSections = (given: readonly Section[]): void =>
  given.forEach(({ roughness, insideDiameter }, i) => {
    if (roughness >= insideDiameter / 2)
      throw new CalculationError(
        'inconsistent',
        `sections[${i}].roughness`,
        `Roughness in section ${i + 1} leaves no pipe: give the height of the grains on the wall, such as ${say(0.00005, 'length')}.`,
      )
  })
