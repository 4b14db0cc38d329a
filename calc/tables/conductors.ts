import type { Table } from './table.ts'

const iec = 'IEC 60228:2004, table 2'

/** Aluminium of class 2 begins at 10 mm². */
export const conductors = {
  id: 'conductors',
  title: 'Conductors of cables',
  say: 'The greatest resistance that a stranded conductor (class 2) may have at 20 °C, direct current. A warm conductor has more: about 0.4 % for each degree. Where the cable’s maker prints a resistance, that one rules.',
  columns: {
    crossSection: { label: 'Cross-section', quantity: 'conductorArea' },
    copper: { label: 'Copper, plain', quantity: 'resistancePerKm' },
    aluminium: { label: 'Aluminium', quantity: 'resistancePerKm' },
  },
  rows: [
    { crossSection: 1.5, copper: 12.1, source: iec },
    { crossSection: 2.5, copper: 7.41, source: iec },
    { crossSection: 4, copper: 4.61, source: iec },
    { crossSection: 6, copper: 3.08, source: iec },
    { crossSection: 10, copper: 1.83, aluminium: 3.08, source: iec },
    { crossSection: 16, copper: 1.15, aluminium: 1.91, source: iec },
    { crossSection: 25, copper: 0.727, aluminium: 1.2, source: iec },
    { crossSection: 35, copper: 0.524, aluminium: 0.868, source: iec },
    { crossSection: 50, copper: 0.387, aluminium: 0.641, source: iec },
    { crossSection: 70, copper: 0.268, aluminium: 0.443, source: iec },
    { crossSection: 95, copper: 0.193, aluminium: 0.32, source: iec },
    { crossSection: 120, copper: 0.153, aluminium: 0.253, source: iec },
    { crossSection: 150, copper: 0.124, aluminium: 0.206, source: iec },
    { crossSection: 185, copper: 0.0991, aluminium: 0.164, source: iec },
    { crossSection: 240, copper: 0.0754, aluminium: 0.125, source: iec },
  ],
} as const satisfies Table
