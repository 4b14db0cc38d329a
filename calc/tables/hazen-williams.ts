import type { Table } from './table.ts'

const tabulated = 'Hazen–Williams coefficients as tabulated at engineeringtoolbox.com'

export const hazenWilliams = {
  id: 'hazen-williams',
  title: 'Hazen–Williams C of pipes',
  say: 'The larger C is, the smoother the pipe. It holds for water at about 15 °C and for pipes over 50 mm; where it and the Darcy–Weisbach equation differ, trust the latter. Books differ; the maker’s C rules.',
  columns: {
    wall: { label: 'Wall' },
    state: { label: 'State' },
    c: { label: 'C', quantity: 'count' },
  },
  rows: [
    { wall: 'polyethylene (PE)', state: 'new', c: 140, source: tabulated },
    { wall: 'PVC', state: 'new', c: 150, source: tabulated },
    { wall: 'plastic in general', state: 'new', c: [130, 150], source: tabulated },
    { wall: 'glass-fibre pipe', state: 'new', c: 150, source: tabulated },
    { wall: 'copper or brass', state: 'new', c: [130, 140], source: tabulated },
    { wall: 'steel, unlined', state: 'new', c: [140, 150], source: tabulated },
    { wall: 'steel, welded and seamless', state: 'in service', c: 100, source: tabulated },
    { wall: 'steel, riveted', state: 'in service', c: [90, 110], source: tabulated },
    { wall: 'galvanised iron', state: 'new', c: 120, source: tabulated },
    { wall: 'ductile iron, cement lined', state: 'in service', c: 120, source: tabulated },
    { wall: 'ductile iron', state: 'new', c: 140, source: tabulated },
    { wall: 'cast iron, unlined', state: 'new', c: 130, source: tabulated },
    { wall: 'cast iron', state: '10 years old', c: [107, 113], source: tabulated },
    { wall: 'cast iron', state: '20 years old', c: [89, 100], source: tabulated },
    { wall: 'cast iron', state: '30 years old', c: [75, 90], source: tabulated },
    { wall: 'cast iron', state: '40 years old', c: [64, 83], source: tabulated },
    { wall: 'asbestos cement', state: 'new', c: 140, source: tabulated },
    { wall: 'concrete', state: 'new', c: [100, 140], source: tabulated },
    { wall: 'concrete', state: 'old', c: [100, 110], source: tabulated },
    { wall: 'clay, vitrified', state: 'new', c: 110, source: tabulated },
    { wall: 'wood stave', state: 'in service', c: [110, 120], source: tabulated },
  ],
} as const satisfies Table
