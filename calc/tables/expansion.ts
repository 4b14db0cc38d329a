import type { Table } from './table.ts'

const asme = 'ASME B31.9, table 919.3.1, turned from each °F to each K'

export const expansion = {
  id: 'expansion',
  title: 'Expansion of pipe with temperature',
  say: 'Coefficient α: how many millimetres a metre of pipe grows when it warms by one kelvin. Polyethylene moves more than ten times as much as steel, and makers’ figures for it differ widely: the pipe maker’s own rules.',
  columns: {
    material: { label: 'Material' },
    coefficient: { label: 'Coefficient α', quantity: 'thermalExpansion' },
  },
  rows: [
    {
      material: 'polyethylene (PE)',
      coefficient: [1.08e-4, 2.4e-4],
      source: `${asme} (PE 2306 to PE 3406: 108 to 144 × 10⁻⁶); Vinidex, properties of polyethylene (240 × 10⁻⁶)`,
    },
    {
      material: 'PVC-U',
      coefficient: [5.4e-5, 7e-5],
      source: `${asme} (PVC 1120 and 1220); Paling, PVC-U pressure piping, technical manual (70 × 10⁻⁶)`,
    },
    { material: 'carbon steel', coefficient: 1.14e-5, source: asme },
    { material: 'stainless steel, austenitic', coefficient: 1.67e-5, source: asme },
    { material: 'ductile iron', coefficient: 1.07e-5, source: asme },
    { material: 'cast iron, grey', coefficient: 1.04e-5, source: asme },
    { material: 'copper', coefficient: 1.71e-5, source: asme },
  ],
} as const satisfies Table
