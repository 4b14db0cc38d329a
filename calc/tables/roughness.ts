import type { Table } from './table.ts'

const binder = 'L. F. Moody, Trans. ASME 66 (1944), as tabulated by R. C. Binder, Fluid Mechanics (1973)'
const smooth = 'tables after L. F. Moody, Trans. ASME 66 (1944)'
const idelchik = 'I. E. Idelchik, Handbook of Hydraulic Resistance (2007)'
const trade = 'common practice, no source'
const miller =
  'D. S. Miller, Internal Flow Systems (1990), table 8-1, as summarised in the documentation of the Modelica Standard Library'

export const roughness = {
  id: 'roughness',
  title: 'Roughness of pipe walls',
  say: 'Absolute roughness ε of the inside. Size a pipe on the figure in service, with joints, film and rust, not on the new one: it will be in service for far longer than it is new. A roughness measured or printed by the maker rules.',
  columns: {
    wall: { label: 'Wall' },
    state: { label: 'State' },
    roughness: { label: 'Roughness', quantity: 'length', unit: 'mm' },
  },
  rows: [
    { wall: 'polyethylene (PE), with joints and film', state: 'in service', roughness: [1e-5, 1e-4], source: trade },
    { wall: 'polyethylene (PE) or PVC', state: 'new', roughness: [1.5e-6, 7e-6], source: smooth },
    { wall: 'drawn tube: brass, copper, glass', state: 'new', roughness: 1.5e-6, source: binder },
    { wall: 'commercial steel or wrought iron', state: 'new', roughness: 4.5e-5, source: binder },
    { wall: 'steel penstock, seamless, well fitted', state: 'new', roughness: [1.5e-5, 4e-5], source: idelchik },
    { wall: 'welded steel, in good condition', state: 'in service', roughness: [4e-5, 1e-4], source: idelchik },
    { wall: 'welded steel, corroded all over', state: 'in service', roughness: 1.5e-4, source: idelchik },
    {
      wall: 'welded steel conduit, under 2 years of use',
      state: 'in service',
      roughness: [1.2e-4, 2.4e-4],
      source: idelchik,
    },
    {
      wall: 'welded steel conduit, under 20 years, no deposits',
      state: 'in service',
      roughness: [6e-4, 5e-3],
      source: idelchik,
    },
    { wall: 'steel, heavy rust', state: 'in service', roughness: 1e-3, source: miller },
    { wall: 'steel, lined with mortar, average finish', state: 'new', roughness: 1e-4, source: miller },
    {
      wall: 'penstock with a crust of lime',
      state: 'in service',
      roughness: 3e-4,
      source: 'Roughness Coefficient of a Highly Calcinated Penstock (2019), aperta.ulakbim.gov.tr/records/67479',
    },
    { wall: 'galvanised steel tube, bright', state: 'new', roughness: [7e-5, 1e-4], source: idelchik },
    { wall: 'galvanised steel tube, ordinary', state: 'new', roughness: [1e-4, 1.5e-4], source: idelchik },
    { wall: 'galvanised iron', state: 'new', roughness: 1.5e-4, source: binder },
    { wall: 'asphalted cast iron', state: 'new', roughness: 1.2e-4, source: binder },
    { wall: 'cast iron', state: 'new', roughness: 2.6e-4, source: binder },
    { wall: 'cast iron water pipe', state: 'in service', roughness: 1.4e-3, source: idelchik },
    { wall: 'wood stave', state: 'new', roughness: [2e-4, 9e-4], source: binder },
    { wall: 'reinforced concrete tube', state: 'new', roughness: [2.5e-4, 3.4e-4], source: idelchik },
    { wall: 'concrete, steel forms, average work', state: 'new', roughness: 1e-4, source: miller },
    { wall: 'concrete', state: 'new', roughness: [3e-4, 3e-3], source: binder },
    { wall: 'riveted steel', state: 'new', roughness: [9e-4, 9e-3], source: binder },
  ],
} as const satisfies Table
