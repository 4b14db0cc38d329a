import type { CalculatorDefinition } from '#calc/index.ts'
import type { TableId } from '#calc/tables/table.ts'

/** What a list of calculators shows of each. Read at build from their definitions. */
export type CalculatorIndexEntry = Pick<CalculatorDefinition, 'id' | 'title' | 'summary' | 'station'> & {
  /** The tables of the trade that it can take figures from. */
  tables: readonly TableId[]
}
