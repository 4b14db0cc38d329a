import type { ReactNode } from 'react'
import type { CalculatorDefinition, Cell } from '#calc/index.ts'
import { columnsOfRow, isMany, pathOf } from '../features/calculators/columns.ts'
import { shownKeys, solveForm, startForm, type FieldText, type Form } from '../features/calculators/form.ts'
import { textsFrom, type Attributes } from './attributes.ts'

export interface GivenValue {
  label: string
  text: string
}

const written = ({ text, unit }: FieldText) => [text, unit].filter(Boolean).join('\u00a0')

/** The values that a calculation starts from: those the lesson names, and those it cannot do without. */
function givenValues(definition: CalculatorDefinition, form: Form, isNamed: (path: string) => boolean): GivenValue[] {
  const value = (label: string, cell: Cell, path: string, field: FieldText): GivenValue[] => {
    if (field.text === '' || (cell.optional && !isNamed(path))) return []
    const text = cell.kind === 'choice' ? (cell.words?.[field.text] ?? field.text.replaceAll('-', ' ')) : written(field)
    return [{ label, text }]
  }
  return shownKeys(definition, form).flatMap((key) => {
    const input = definition.inputs[key]!
    if (!isMany(input)) return value(input.label, input, key, form.fields[key]!)
    return form.rows[key]!.flatMap((row, i) =>
      Object.entries(columnsOfRow(definition, input, row)).flatMap(([name, cell]) => {
        const of = input.kind === 'rows' ? `${input.row} ${i + 1}: ` : ''
        const label = input.kind === 'series' ? `${cell.label} ${i + 1}` : of + cell.label
        return value(label.charAt(0).toUpperCase() + label.slice(1), cell, pathOf(input, key, i, name), row[name]!)
      }),
    )
  })
}

/** A calculation with the numbers of a lesson, worked out; throws where they do not work out, which the content's tests find. */
export function workOut(definition: CalculatorDefinition, attributes: Attributes, children: ReactNode) {
  const texts = textsFrom(definition, attributes, children)
  const form = startForm(definition, texts)
  const solved = solveForm(definition, form)
  if (!solved.solution) {
    const [path, message] = Object.entries(solved.errors)[0]!
    throw new Error(`The example of ${definition.title} does not work out: ${path}: ${message}`)
  }
  const { outputs, working } = solved.solution
  return {
    inputs: solved.inputs,
    given: givenValues(definition, form, (path) => path in texts),
    working,
    outputs,
  }
}
