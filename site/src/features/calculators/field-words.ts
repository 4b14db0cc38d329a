import type { CalculatorDefinition } from '#calc/index.ts'

const pattern = /^(\w+)(?:\[(\d+)\])?(?:\.(\w+))?$/

/** `sections[0].length` as people say it: "Section 1: length". */
export const fieldWords = ({ inputs }: CalculatorDefinition, field: string): string => {
  const [, key = '', index, column] = pattern.exec(field) ?? []
  const input = inputs[key]
  if (!input) return field
  const place = index === undefined ? '' : ` ${Number(index) + 1}`
  const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
  if (input.kind === 'series') return capital(input.row) + place
  if (column === undefined || !('columns' in input)) return input.label
  const label = input.columns[column]?.label ?? column
  return input.kind === 'rows' ? `${capital(input.row)}${place}: ${label.toLowerCase()}` : label
}
