import type { CalculatorDefinition, Cell, Columns, Input } from '#calc/index.ts'
import { kindsOfFitting } from '#calc/pipe/fitting-losses.ts'
import type { RowTexts } from './form.ts'

export type ListInput = Extract<Input, { kind: 'rows' | 'series' }>
export type ManyInput = ListInput | Extract<Input, { kind: 'group' }>
export type ScalarCell = Extract<Cell, { kind: 'scalar' }>

export const isMany = (input: Input): input is ManyInput =>
  input.kind === 'rows' || input.kind === 'series' || input.kind === 'group'
export const isList = (input: Input): input is ListInput => input.kind === 'rows' || input.kind === 'series'

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

/** The columns of what is given as several values; a series has one, without a name. */
export const columnsOf = (input: ManyInput): Columns =>
  input.kind === 'series'
    ? {
        '': {
          kind: 'scalar',
          label: capital(input.row),
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

const isFitting = (kind: string): kind is keyof typeof kindsOfFitting => Object.hasOwn(kindsOfFitting, kind)

/** The columns that one row has: a fitting is described by those of its kind. */
export const columnsOfRow = (definition: CalculatorDefinition, input: ManyInput, row: RowTexts): Columns => {
  const columns = columnsOf(input)
  const kind = row['kind']?.text
  if (definition.id !== 'fittings' || kind === undefined || !isFitting(kind)) return columns
  const needs: readonly string[] = ['kind', 'count', ...kindsOfFitting[kind].needs]
  const takes: readonly string[] = kindsOfFitting[kind].takes ?? []
  return Object.fromEntries(
    Object.entries(columns)
      .filter(([name]) => needs.includes(name) || takes.includes(name))
      .map(([name, cell]) => [name, needs.includes(name) ? { ...cell, optional: undefined } : cell]),
  )
}
