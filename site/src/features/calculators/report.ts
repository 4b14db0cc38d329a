import type { CalculatorDefinition, PlainRow, Solution } from '#calc/index.ts'
import { fieldText, unitFor } from '#calc/units/format.ts'
import type { GivenValue } from './given-values.ts'
import { saidOutput, type CellOutput } from './results.ts'

export interface Report {
  definition: CalculatorDefinition
  given: readonly GivenValue[]
  solution: Solution
  /** The address that carries the inputs. */
  link: string
}

type RowsCells = [string, CellOutput][]

const rowsOf = ({ definition, solution: { outputs } }: Report) =>
  Object.entries(definition.outputs).flatMap(([key, output]) => {
    const rows = outputs[key]
    return output.kind === 'rows' && typeof rows === 'object' && rows.length > 0
      ? [{ label: output.label, columns: Object.entries(output.columns), rows }]
      : []
  })

const scalarsOf = ({ definition, solution: { outputs } }: Report) =>
  Object.entries(definition.outputs).flatMap(([key, output]) => {
    const value = outputs[key]
    return output.kind === 'rows' || value === undefined || typeof value === 'object' ? [] : [{ output, value }]
  })

const resultOf = (report: Report, gives: string | undefined) => {
  const output = gives === undefined ? undefined : report.definition.outputs[gives]
  const value = gives === undefined ? undefined : report.solution.outputs[gives]
  return output === undefined || output.kind === 'rows' || value === undefined || typeof value === 'object'
    ? ''
    : `: ${saidOutput(output, value)}`
}

const cautionWords = { stop: 'Stop', check: 'Check', note: 'Note' }

/** A calculation as plain text, for a message or a notebook: what was given, what was found, how, and what to look out for. */
export const asText = (report: Report): string => {
  const { definition, given, solution, link } = report
  const row = (columns: RowsCells, one: PlainRow) =>
    columns.map(([name, column]) => (one[name] === undefined ? '–' : saidOutput(column, one[name]))).join('\t')
  const blocks: [string, string[]][] = [
    ['Given', given.map(({ label, text }) => `${label}: ${text}`)],
    ['Found', scalarsOf(report).map(({ output, value }) => `${output.label}: ${saidOutput(output, value)}`)],
    ...rowsOf(report).map(({ label, columns, rows }): [string, string[]] => [
      label,
      [columns.map(([, column]) => column.label).join('\t'), ...rows.map((one) => row(columns, one))],
    ]),
    [
      'Working',
      solution.working.map(
        ({ say, speech, gives }, i) =>
          `${i + 1}. ${say}${speech === undefined ? '' : `\n   ${speech}${resultOf(report, gives)}`}`,
      ),
    ],
    ['Look out for', solution.cautions.map(({ level, say }) => `${cautionWords[level]}: ${say}`)],
    ['What this does not check', definition.doesNotCheck.map((text) => text)],
    [
      'Sources',
      definition.sources.map(
        ({ author, title, year, where }) => `${author}, ${title} (${year})${where ? `, ${where}` : ''}`,
      ),
    ],
  ]
  const body = blocks.filter(([, lines]) => lines.length > 0).map(([title, lines]) => [title, ...lines].join('\n'))
  return [`${definition.title}\n${link}`, ...body].join('\n\n').replaceAll('\u00a0', ' ') + '\n'
}

/** In one unit, with every digit that matters: a spreadsheet rounds for itself. */
const plainNumber = (output: CellOutput, value: number | string, unit?: string): string =>
  output.kind === 'scalar' && typeof value === 'number'
    ? String(Number(Number(fieldText(value, output.quantity, unit!)).toPrecision(7)))
    : saidOutput(output, value)

const unitOf = (output: CellOutput, largest: number | string): string =>
  output.kind === 'scalar' && typeof largest === 'number' ? unitFor(output.quantity, largest, output.unit).name : ''

const withUnit = (label: string, unit: string) => (unit === '' ? label : `${label} (${unit})`)

const largestIn = (rows: readonly PlainRow[], name: string): number | string =>
  rows.reduce<number | string>((largest, row) => {
    const value = row[name]
    return typeof value === 'number' && Math.abs(value) > Number(largest) ? Math.abs(value) : largest
  }, 0)

/** A calculation as the cells of a spreadsheet. */
export const asCells = (report: Report): string[][] => [
  [report.definition.title, report.link],
  [],
  ['Given', 'Value'],
  ...report.given.map(({ label, text }) => [label, text.replaceAll('\u00a0', ' ')]),
  [],
  ['Found', 'Value', 'Unit'],
  ...scalarsOf(report).map(({ output, value }) => {
    const unit = unitOf(output, value)
    return [output.label, plainNumber(output, value, unit), unit]
  }),
  ...rowsOf(report).flatMap(({ label, columns, rows }) => {
    const units = columns.map(([name, column]) => unitOf(column, largestIn(rows, name)))
    return [
      [],
      [label],
      columns.map(([, column], i) => withUnit(column.label, units[i]!)),
      ...rows.map((row) =>
        columns.map(([name, column], i) => (row[name] === undefined ? '' : plainNumber(column, row[name], units[i]))),
      ),
    ]
  }),
]
