/** Each calculator checked and solved, without working or cautions, against the figure of its kind. */
import type { CalculatorDefinition, Input, Inputs, Output } from '../definition.ts'
import { calculate, calculators, monteCarlo, solve, withUncertainty } from '../index.ts'
import { initialInputs } from '../initial.ts'
import { row, time } from './measure.ts'

/** In microseconds: sums of single numbers; those with lists, such as a penstock of ten sections; ten years of daily flows. */
const figures = { numbers: 5, lists: 100, record: 5000 }

const tenYears = 3652

const isList = ({ kind }: Input | Output) => kind === 'rows' || kind === 'series' || kind === 'runs'

/** The same inputs with each long record filled up to ten years of days; undefined where there is none. */
const withTenYears = (definition: CalculatorDefinition, inputs: Inputs): Inputs | undefined => {
  const records = Object.entries(definition.inputs).flatMap(([key, input]) => {
    const given = inputs[key]
    return input.kind === 'series' && input.long && Array.isArray(given)
      ? [[key, given as readonly number[]] as const]
      : []
  })
  if (records.length === 0) return undefined
  const filled = records.map(([key, given]) => [
    key,
    Array.from({ length: tenYears }, (_, i) => given[i % given.length]!),
  ])
  return { ...inputs, ...(Object.fromEntries(filled) as Inputs) }
}

const section = { length: 42, insideDiameter: 0.1102, roughness: 5e-5, totalK: 0.4 }
const tenSections: Inputs = {
  grossHead: 63,
  sections: Array.from({ length: 10 }, (_, i) => ({ ...section, insideDiameter: section.insideDiameter - i * 0.004 })),
  nozzles: { count: 1, diameter: 0.024, dischargeCoefficient: 0.95 },
}
export function calculatorsInTime(): void {
  console.log('Calculators, checked and solved, without working')
  for (const definition of Object.values<CalculatorDefinition>(calculators)) {
    const { id, inputs: asked, outputs } = definition
    const inputs = initialInputs(definition)
    const record = withTenYears(definition, inputs)
    const kind = record
      ? 'record'
      : [...Object.values(asked), ...Object.values(outputs)].some(isList)
        ? 'lists'
        : 'numbers'
    row(
      id,
      time(() => calculate(id, inputs), { milliseconds: 20 }),
      figures[kind],
    )
    if (record)
      row(
        `${id}, ten years of days`,
        time(() => calculate(id, record)),
        figures.record,
      )
  }
  row(
    'penstock, 10 sections and nozzles',
    time(() => calculate('penstock', tenSections)),
    figures.lists,
  )
  row(
    'penstock, 10 sections, with working',
    time(() => solve('penstock', tenSections)),
  )
  row(
    'penstock, first-order uncertainty, 12 inputs',
    time(
      () =>
        withUncertainty('penstock', tenSections, {
          grossHead: 0.2,
          'nozzles.diameter': 1e-4,
          ...Object.fromEntries(Array.from({ length: 10 }, (_, i) => [`sections[${i}].insideDiameter`, 2e-4])),
        }),
      { runs: 5, milliseconds: 100 },
    ),
  )
  row(
    'penstock, Monte Carlo, 1000 trials',
    time(
      () =>
        monteCarlo('penstock', tenSections, { grossHead: 0.2, 'nozzles.diameter': 1e-4 }, { trials: 1000, seed: 1 }),
      { runs: 3, milliseconds: 300 },
    ),
  )
}
