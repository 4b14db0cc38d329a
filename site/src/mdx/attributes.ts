import { Children, isValidElement, type ComponentType, type ReactNode } from 'react'
import type { CalculatorDefinition, Cell, Input } from '#calc/index.ts'
import { say } from '#calc/units/format.ts'
import { columnsOf, isMany, pathOf } from '../features/calculators/columns.ts'
import type { Texts } from '../features/calculators/form.ts'

/** What a lesson may write for an input: a quantity as people write it, a plain number, a choice. */
export type Attributes = Readonly<Record<string, string | number | undefined>>

export interface RowProps {
  /** The list or group that the row belongs to. */
  of: string
  /** Of a list of plain numbers, the number. */
  value?: string | number
  [column: string]: string | number | undefined
}

/** One row of a calculator's list, or the values of one of its groups. It stands only inside a calculator or an example, which reads it. */
export const Row: ComponentType<RowProps> = () => null

/** A number without a unit is a plain one: an efficiency of 0.52 is 52 %, whatever unit a form starts with. */
const asText = (cell: Cell | Input | undefined, value: string | number | undefined) =>
  typeof value === 'number' && cell?.kind === 'scalar' ? say(value, cell.quantity, cell.unit) : value

/** The inputs that a lesson presets, by path as the calculator's form names them. */
export function textsFrom({ inputs }: CalculatorDefinition, attributes: Attributes, children: ReactNode): Texts {
  const texts: Record<string, string | number | undefined> = {}
  for (const [key, value] of Object.entries(attributes)) texts[key] = asText(inputs[key], value)

  const count: Record<string, number> = {}
  for (const child of Children.toArray(children)) {
    if (!isValidElement<RowProps>(child) || child.type !== Row) continue
    const { of, ...values } = child.props
    const input = inputs[of]
    if (!input || !isMany(input)) continue
    const row = count[of] ?? 0
    count[of] = row + 1
    for (const [name, value] of Object.entries(values)) {
      const column = input.kind === 'series' && name === 'value' ? '' : name
      texts[pathOf(input, of, row, column)] = asText(columnsOf(input)[column], value)
    }
  }
  return texts
}
