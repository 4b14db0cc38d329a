import type { Table } from './table.ts'

const iso = 'ISO 4427-2:2007 and EN 12201-2, least wall'

/** Standard dimension ratio: about the outside diameter over the wall. */
export type Sdr = 9 | 11 | 13.6 | 17 | 21 | 26

/** Outside diameter and least wall e, mm, by SDR; where a wall is missing, the standard has none. */
const walls: readonly (readonly [dn: number, Readonly<Partial<Record<Sdr, number>>>])[] = [
  [20, { 9: 2.3, 11: 2 }],
  [25, { 9: 3, 11: 2.3, 13.6: 2 }],
  [32, { 9: 3.6, 11: 3, 13.6: 2.4, 17: 2 }],
  [40, { 9: 4.5, 11: 3.7, 13.6: 3, 17: 2.4, 21: 2 }],
  [50, { 9: 5.6, 11: 4.6, 13.6: 3.7, 17: 3, 21: 2.4, 26: 2 }],
  [63, { 9: 7.1, 11: 5.8, 13.6: 4.7, 17: 3.8, 21: 3, 26: 2.5 }],
  [75, { 9: 8.4, 11: 6.8, 13.6: 5.6, 17: 4.5, 21: 3.6, 26: 2.9 }],
  [90, { 9: 10.1, 11: 8.2, 13.6: 6.7, 17: 5.4, 21: 4.3, 26: 3.5 }],
  [110, { 9: 12.3, 11: 10, 13.6: 8.1, 17: 6.6, 21: 5.3, 26: 4.2 }],
  [125, { 9: 14, 11: 11.4, 13.6: 9.2, 17: 7.4, 21: 6, 26: 4.8 }],
  [140, { 9: 15.7, 11: 12.7, 13.6: 10.3, 17: 8.3, 21: 6.7, 26: 5.4 }],
  [160, { 9: 17.9, 11: 14.6, 13.6: 11.8, 17: 9.5, 21: 7.7, 26: 6.2 }],
  [180, { 9: 20.1, 11: 16.4, 13.6: 13.3, 17: 10.7, 21: 8.6, 26: 6.9 }],
  [200, { 9: 22.4, 11: 18.2, 13.6: 14.7, 17: 11.9, 21: 9.6, 26: 7.7 }],
  [225, { 9: 25.2, 11: 20.5, 13.6: 16.6, 17: 13.4, 21: 10.8, 26: 8.6 }],
  [250, { 9: 27.9, 11: 22.7, 13.6: 18.4, 17: 14.8, 21: 11.9, 26: 9.6 }],
]

/** Millimetres of a tenth as metres, without floating noise. */
const metres = (mm: number): number => Number((mm / 1000).toFixed(4))

const rows = ([9, 11, 13.6, 17, 21, 26] as const).flatMap((sdr) =>
  walls.flatMap(([nominal, wallBySdr]) => {
    const wall = wallBySdr[sdr]
    return wall === undefined
      ? []
      : [
          {
            nominal,
            sdr,
            outsideDiameter: metres(nominal),
            wallThickness: metres(wall),
            insideDiameter: metres(nominal - 2 * wall),
            source: iso,
          },
        ]
  }),
)

export const pePipe = {
  id: 'pe-pipe',
  title: 'Polyethylene (PE) pressure pipe',
  say: 'Outside diameter, wall and inside diameter of PE 80 and PE 100 pipe for water. The wall is the least that the standard allows, so the inside diameter, the outside less two walls, is the greatest: real pipe is a little narrower. What the maker prints on the pipe and in the data sheet rules.',
  columns: {
    nominal: { label: 'Nominal size dn', quantity: 'count' },
    sdr: { label: 'SDR', quantity: 'count' },
    outsideDiameter: { label: 'Outside diameter', quantity: 'length', unit: 'mm' },
    wallThickness: { label: 'Least wall', quantity: 'length', unit: 'mm' },
    insideDiameter: { label: 'Inside diameter', quantity: 'length', unit: 'mm' },
  },
  rows,
} as const satisfies Table
