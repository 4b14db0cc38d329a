import type { CalculatorDefinition, Cell } from '#calc/index.ts'
import { parse } from '#calc/units/parse.ts'
import { columnsOf, columnsOfRow, isMany, isRecord, pathOf, type ScalarCell } from './columns.ts'
import type { FieldText } from './field-text.ts'
import { shownKeys, startForm, type Form, type Texts } from './form.ts'
import { lineWithUnit } from './line-text.ts'

/** The inputs of a calculator in an address: `?flow=9.5+L/s&sections.0.length=120+m`. Text goes out and comes back as it was written. */

/** A field as one text: with its unit, unless one is written in it. */
const withUnit = (cell: Cell, { text, unit }: FieldText): string => {
  if (cell.kind === 'choice' || unit === '' || text.trim() === '') return text
  const written = parse(text, cell.quantity)
  if (written.ok && written.unit !== '') return text
  const alone = parse(text, cell.quantity, unit)
  const together = parse(`${text} ${unit}`, cell.quantity, unit)
  return alone.ok && together.ok && together.value === alone.value && together.uncertainty === alone.uncertainty
    ? `${text.trim()} ${unit}`
    : text
}

export const textsOf = (definition: CalculatorDefinition, form: Form): Record<string, string> => {
  const texts: Record<string, string> = {}
  const start = startForm(definition)
  const write = (cell: Cell, path: string, field: FieldText, startsBlank: boolean) => {
    const text = withUnit(cell, field)
    // An optional field that starts empty and is empty needs no word.
    if (text !== '' || !cell.optional || !startsBlank) texts[path] = text
  }
  for (const key of shownKeys(definition, form)) {
    const input = definition.inputs[key]!
    // A record of years is too long for an address.
    if (isRecord(input)) continue
    if (!isMany(input)) {
      write(input, key, form.fields[key]!, start.fields[key]!.text === '')
      continue
    }
    const rows = form.rows[key]!
    if (rows.length === 0 && start.rows[key]!.length > 0) texts[key] = ''
    rows.forEach((row, i) => {
      if (input.kind === 'runs') {
        texts[pathOf(input, key, i, '')] = lineWithUnit(columnsOf(input)[''] as ScalarCell, row['']!)
        return
      }
      for (const [name, cell] of Object.entries(columnsOfRow(input, row))) {
        const starting = input.kind === 'group' ? start.rows[key]![0]![name]!.text : cell.initial
        write(cell, pathOf(input, key, i, name), row[name]!, starting === undefined || starting === '')
      }
    })
  }
  return texts
}

export const searchOf = (definition: CalculatorDefinition, form: Form): string =>
  `?${new URLSearchParams(textsOf(definition, form)).toString().replaceAll('%2F', '/')}`

/** The texts in an address; of a name that stands there twice, the last. */
export const textsIn = (search: string): Texts => Object.fromEntries(new URLSearchParams(search))
