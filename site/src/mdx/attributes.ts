import { Children, isValidElement, type ReactNode } from 'react'
import type { CalculatorDefinition } from '#calc/index.ts'
import type { Texts } from '../features/calculators/form.ts'

/** What a lesson may write for an input: a quantity as people write it, a plain number, a choice. */
export type Attributes = Readonly<Record<string, string | number | undefined>>

export interface RowProps {
  /** The list or group that the row belongs to. */
  of: string
  [column: string]: string | number | undefined
}

/** One row of a calculator's list, or the values of one of its groups. It stands only inside a calculator or an example, which reads it. */
export const Row = (_: RowProps) => null

/** The inputs that a lesson presets, by path as the calculator's form names them. */
export function textsFrom(definition: CalculatorDefinition, attributes: Attributes, children: ReactNode): Texts {
  const texts: Record<string, string | number | undefined> = { ...attributes }
  const rows = Children.toArray(children).flatMap((child) =>
    isValidElement<RowProps>(child) && child.type === Row ? [child.props] : [],
  )
  const count: Record<string, number> = {}
  for (const { of, ...columns } of rows) {
    const number = count[of] ?? 0
    count[of] = number + 1
    const path = definition.inputs[of]?.kind === 'group' ? of : `${of}.${number}`
    for (const [column, text] of Object.entries(columns)) texts[`${path}.${column}`] = text
  }
  return texts
}
