import type { Table } from './table.ts'

const pipa = 'Vinidex, allowable bending radius of PE pipe at 20 °C, after PIPA POP202'
const ppi = 'PPI Handbook of PE Pipe, ch. 7, as copied elsewhere'
const firat = 'Firat, PE pipe, technical information (20 at 20 °C, 35 at 10 °C, 50 at 0 °C)'

export const bendRadius = {
  id: 'bend-radius',
  title: 'Least radius of polyethylene (PE) pipe bent cold',
  say: 'Radius of the centre line, in outside diameters, to which cold pipe may be pulled in the trench. Sources differ, so each is a range: the larger figure is the more careful. Cold pipe wants much more, and no joint may lie in the bend. Ask the pipe’s maker: that answer rules.',
  columns: {
    sdr: { label: 'SDR', quantity: 'count' },
    radiusOverOutside: { label: 'At 20 °C, in outside diameters', quantity: 'count' },
    atFreezing: { label: 'At 0 °C, in outside diameters', quantity: 'count' },
  },
  rows: [
    { sdr: 9, radiusOverOutside: [12, 20], atFreezing: 50, source: `${pipa}; ${firat}` },
    { sdr: 11, radiusOverOutside: [15, 25], atFreezing: 50, source: `${pipa}; ${ppi}; ${firat}` },
    { sdr: 13.6, radiusOverOutside: [20, 25], atFreezing: 50, source: `${pipa}; ${ppi}; ${firat}` },
    { sdr: 17, radiusOverOutside: [20, 27], atFreezing: 50, source: `${pipa}; ${ppi}; ${firat}` },
    { sdr: 21, radiusOverOutside: [27, 35], source: `${pipa}; ${ppi}` },
    { sdr: 26, radiusOverOutside: [30, 45], source: `${pipa}; ${ppi}; Firat (30)` },
    { sdr: 33, radiusOverOutside: 65, source: pipa },
  ],
} as const satisfies Table
