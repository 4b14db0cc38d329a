import type { Table } from './table.ts'

const source =
  'EN 12201-1 Annex A and ISO 4427; other practice: from the allowed heads of PE 100 PN 16 to AS/NZS 2033 and 4130, Enviropipes, pressure re-rating'

export const temperatureFactor = {
  id: 'temperature-factor',
  title: 'Temperature factor of polyethylene (PE) pressure pipe',
  say: 'The allowed pressure at 20 °C times this factor is the allowed pressure at the temperature of the pipe wall; between two rows, in proportion. The calculators follow the European and international standard, which is the more careful. AS/NZS practice is shown beside it and is used nowhere here. Black pipe in the sun passes 40 °C. The pipe maker’s own figures rule.',
  columns: {
    temperature: { label: 'Pipe wall', quantity: 'temperature' },
    factor: { label: 'Factor, EN and ISO', quantity: 'ratio', digits: 2 },
    otherPractice: { label: 'AS/NZS practice, not used here', quantity: 'ratio', digits: 2 },
  },
  rows: [
    { temperature: 20, factor: 1, otherPractice: 1, source },
    { temperature: 30, factor: 0.87, otherPractice: 0.94, source },
    { temperature: 40, factor: 0.74, otherPractice: 0.84, source },
  ],
} as const satisfies Table
