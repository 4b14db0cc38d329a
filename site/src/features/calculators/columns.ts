import { hasPlace } from '#calc/check.ts'
import type { Cell, Columns, Input } from '#calc/index.ts'
import type { RowTexts } from './form.ts'

export type ListInput = Extract<Input, { kind: 'rows' | 'series' | 'runs' }>
export type ManyInput = ListInput | Extract<Input, { kind: 'group' }>
export type ScalarCell = Extract<Cell, { kind: 'scalar' }>
/** What is taken as a whole record and not field by field. */
export type RecordInput = Extract<Input, { kind: 'series' }> & { long: true }

export const isRecord = (input: Input): input is RecordInput => input.kind === 'series' && input.long === true
export const isMany = (input: Input): input is ManyInput => input.kind !== 'scalar' && input.kind !== 'choice'
export const isList = (input: Input): input is ListInput =>
  input.kind === 'rows' || input.kind === 'series' || input.kind === 'runs'

export const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

/** What one row of a list is called. */
export const rowWord = (input: ListInput): string => (input.kind === 'runs' ? input.run : input.row)

/** The columns of what is given as several values; a series has one, without a name, and of a run it stands for the whole line. */
export const columnsOf = (input: ManyInput): Columns =>
  input.kind === 'series' || input.kind === 'runs'
    ? {
        '': {
          kind: 'scalar',
          label: capital(rowWord(input)),
          quantity: input.quantity,
          range: input.range,
          usual: input.usual,
          unit: input.unit,
        },
      }
    : input.columns

/** `sections.0.length`, `times.0`, `nozzles.diameter`. */
export const pathOf = (input: ManyInput, key: string, row: number, name: string): string =>
  [key, ...(input.kind === 'group' ? [] : [row]), ...(name === '' ? [] : [name])].join('.')

/** The columns that one row has: a fitting is described by those of its kind. */
export const columnsOfRow = (input: ManyInput, row: RowTexts): Columns => {
  const columns = columnsOf(input)
  const texts = Object.fromEntries(Object.entries(row).map(([name, { text }]) => [name, text]))
  return Object.fromEntries(Object.entries(columns).filter(([, cell]) => hasPlace(cell, columns, texts)))
}
