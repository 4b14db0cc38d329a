import type { Table } from './table.ts'

const asme = 'ASME B31.9, table 919.3.1'
const ppi = 'PPI Handbook of PE Pipe, ch. 3, table B.1.1, 23 °C and 50 years'

/** Short-term moduli answer a blow, such as a surge; long-term ones a load that stays, such as soil or a vacuum that lasts. */
export const moduli = {
  id: 'moduli',
  title: 'Stiffness of pipe walls',
  say: 'Young’s modulus E, for surge and for collapse. The short-term figure belongs to a blow such as surge; the long-term one to a load that stays. Plastics creep, so theirs differ by a factor of five and more, and they are stiffer in cold. A dash means that the metal does not creep at these temperatures. The maker’s figures rule.',
  columns: {
    material: { label: 'Material' },
    shortTerm: { label: 'Short term', quantity: 'pressure', unit: 'GPa' },
    longTerm: { label: 'Long term', quantity: 'pressure', unit: 'GPa' },
  },
  rows: [
    {
      material: 'PE 100',
      shortTerm: [0.75e9, 1.25e9],
      longTerm: 0.2e9,
      source: `short: Vesbo, PE 100 brochure, by ISO 527; long: ${ppi} (PE4XXX)`,
    },
    {
      material: 'PE 80',
      shortTerm: [0.7e9, 0.9e9],
      longTerm: [0.152e9, 0.193e9],
      source: `short: makers’ figures, from memory; long: ${ppi} (PE2XXX and PE3XXX)`,
    },
    {
      material: 'PVC-U',
      shortTerm: [2.8e9, 3.3e9],
      longTerm: [1.5e9, 1.75e9],
      source: 'short: makers’ figures at 20 °C, upper end by ISO 1452, from memory; long: from memory',
    },
    { material: 'steel', shortTerm: [200e9, 214e9], source: 'K. Subramanya, 1000 Solved Problems in Fluid Mechanics' },
    { material: 'stainless steel, austenitic', shortTerm: 200e9, source: asme },
    {
      material: 'ductile iron',
      shortTerm: [162e9, 170e9],
      source: 'foundries’ figure for tension, 23.5 to 24.5 × 10⁶ psi; no standard read',
    },
    {
      material: 'cast iron, grey',
      shortTerm: [90e9, 110e9],
      source: `${asme} (90 GPa); K. Subramanya, 1000 Solved Problems in Fluid Mechanics (100 to 104 GPa); 110 GPa from memory`,
    },
    { material: 'copper', shortTerm: 117e9, source: asme },
  ],
} as const satisfies Table
