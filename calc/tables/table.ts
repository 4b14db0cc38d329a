/** A table of the trade: figures that others published, each row with its source. */
import type { Quantity } from '../definition.ts'

export type TableId =
  | 'pe-pipe'
  | 'temperature-factor'
  | 'conductors'
  | 'roughness'
  | 'manning'
  | 'hazen-williams'
  | 'fittings'
  | 'gauges'
  | 'water'
  | 'expansion'
  | 'moduli'
  | 'bend-radius'

export interface TableColumn {
  label: string
  /** Absent for words. */
  quantity?: Quantity
  /** The unit shown, where it is not the first of the quantity. */
  unit?: string
  /** Significant digits shown. */
  digits?: number
}

/** SI, as inputs take it; two numbers are from and to, three are least, usual and most. */
export type TableCell = string | number | readonly [number, number] | readonly [number, number, number]

export interface Table {
  id: TableId
  title: string
  /** What it is for, and what goes before it: the maker's data. */
  say: string
  columns: Readonly<Record<string, TableColumn>>
  rows: readonly (Readonly<Record<string, TableCell | undefined>> & { source: string })[]
}
