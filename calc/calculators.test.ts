import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { calculators } from './calculators.ts'
import { hasPlace } from './check.ts'
import type {
  CalculatorDefinition,
  Caution,
  Cell,
  Columns,
  Input,
  Inputs,
  Output,
  OutputValue,
  PlainRow,
} from './definition.ts'
import { CalculationError } from './errors.ts'
import { initialInputs } from './initial.ts'
import { calculate, solve } from './solve.ts'
import type { Solution } from './solve-definition.ts'
import { anyInputs, choose } from './testing/any-inputs.ts'
import { runs } from './testing/properties.ts'
import { expectRefusal } from './testing/refusal.ts'

const definitions: CalculatorDefinition[] = Object.values(calculators)
const longRun = process.env.DEEP ? 1_800_000 : 60_000

const solved = (id: string, inputs: Inputs): Solution | CalculationError => {
  try {
    return solve(id, inputs)
  } catch (error) {
    if (error instanceof CalculationError) return error
    throw error
  }
}

const numbersIn = (value: OutputValue | undefined): unknown[] =>
  Array.isArray(value) ? (value as readonly PlainRow[]).flatMap((row) => Object.values(row)) : [value]

const columnsOf = (output: Output) => (output.kind === 'rows' ? output.columns : {})

const fieldPattern = /^([A-Za-z]\w*)(\[\d+\])?(\.\w+)?$/
const unfilled = /undefined|null|NaN|Infinity|\[object|[«»]/

/** What every answer must be, whatever the numbers. */
const checkSolution = (definition: CalculatorDefinition, inputs: Inputs, { outputs, working, cautions }: Solution) => {
  const known = { ...definition.inputs, ...definition.outputs }
  for (const [key, value] of Object.entries(outputs)) {
    expect(definition.outputs, `output ${key}`).toHaveProperty(key)
    // One expectation for all rows: a curve has hundreds of numbers.
    const bad = numbersIn(value).filter(
      (number) => !(number === undefined || typeof number === 'string' || Number.isFinite(number)),
    )
    expect(bad, `${key} is a number, all of it`).toEqual([])
  }
  for (const [key, output] of Object.entries(definition.outputs)) {
    if (!output.sometimes) expect(outputs[key], `${key} is always there`).toBeDefined()
    if (output.kind !== 'rows' || outputs[key] === undefined) continue
    const rows = outputs[key] as readonly PlainRow[]
    for (const [column, { sometimes }] of Object.entries(columnsOf(output)))
      if (!sometimes)
        expect(
          rows.filter((row) => row[column] === undefined),
          `${key}.${column} is always there`,
        ).toEqual([])
    for (const column of new Set(rows.flatMap(Object.keys))) expect(columnsOf(output)).toHaveProperty(column)
  }

  const given = new Set<string | undefined>()
  for (const step of working) {
    expect(`${step.say} ${step.symbols ?? ''} ${step.numbers ?? ''} ${step.speech ?? ''}`).not.toMatch(unfilled)
    expect(step.say).not.toBe('')
    if (step.gives !== undefined) {
      expect(definition.outputs).toHaveProperty(step.gives)
      expect(outputs[step.gives], `the working gives ${step.gives}`).toBeDefined()
      given.add(step.gives)
    }
  }
  for (const [key, output] of Object.entries(definition.outputs))
    if (output.kind === 'scalar' && outputs[key] !== undefined && inputs[key] === undefined)
      expect(given, `the working should give ${key}`).toContain(key)

  for (const { about, say } of cautions) {
    expect(about.length).toBeGreaterThan(0)
    for (const key of about) expect(known).toHaveProperty(key)
    expect(say).not.toMatch(unfilled)
  }
}

const deferring = /\blocal\b|\blicensed\b/i
const warnsOf = (cautions: readonly Caution[], hazard: string) =>
  cautions.some((caution) => caution.hazard === hazard && deferring.test(caution.say))

/** A value of the right shape that lies in range. */
const plain = (cell: Cell): number | string =>
  cell.kind === 'choice'
    ? cell.of[0]!
    : cell.whole
      ? cell.range[0]
      : (cell.initial ?? (cell.range[0] + cell.range[1]) / 2)
const plainRow = (columns: Columns) =>
  Object.fromEntries(Object.entries(columns).map(([key, cell]) => [key, plain(cell)]))
const plainValue = (input: Input): Inputs[string] => {
  switch (input.kind) {
    case 'scalar':
    case 'choice':
      return plain(input)
    case 'group':
      return plainRow(input.columns)
    case 'rows':
      return Array.from({ length: input.least }, () => plainRow(input.columns))
    case 'series':
      return Array.from({ length: input.least }, () => (input.range[0] + input.range[1]) / 2)
    case 'runs':
      return Array.from({ length: input.least }, () =>
        Array.from({ length: input.leastEach }, () => (input.range[0] + input.range[1]) / 2),
      )
  }
}

/** Every single number or choice that inputs hold: its field, its cell, and the inputs with another value there. */
const cellsOf = ({ inputs }: CalculatorDefinition, values: Inputs) => {
  const cells: {
    field: string
    cell: Pick<Cell & { kind: 'scalar' }, 'range' | 'whole'> | undefined
    isFree: boolean
    put: (value: unknown) => object
  }[] = []
  const add = (
    field: string,
    cell: Cell | { kind: 'series' | 'runs'; range: readonly [number, number] },
    put: (value: unknown) => object,
  ) =>
    cells.push({
      field,
      cell: cell.kind === 'choice' ? undefined : cell,
      isFree: cell.kind === 'choice' && cell.free === true,
      put,
    })
  for (const [key, value] of Object.entries(values)) {
    const input = inputs[key]!
    if (input.kind === 'scalar' || input.kind === 'choice') add(key, input, (put) => ({ ...values, [key]: put }))
    if (input.kind === 'series')
      add(`${key}[0]`, input, (put) => ({ ...values, [key]: [put, ...(value as readonly number[]).slice(1)] }))
    if (input.kind === 'runs') {
      const [[, ...others] = [], ...runs] = value as readonly (readonly number[])[]
      add(`${key}[0]`, input, (put) => ({ ...values, [key]: [[put, ...others], ...runs] }))
    }
    if (input.kind === 'group')
      for (const [column, cell] of Object.entries(input.columns))
        if (hasPlace(cell, input.columns, value as PlainRow))
          add(`${key}.${column}`, cell, (put) => ({ ...values, [key]: { ...(value as PlainRow), [column]: put } }))
    if (input.kind === 'rows')
      for (const [column, cell] of Object.entries(input.columns)) {
        const rows = value as readonly PlainRow[]
        const place = rows.findIndex((row) => hasPlace(cell, input.columns, row))
        if (place < 0) continue
        add(`${key}[${place}].${column}`, cell, (put) => ({
          ...values,
          [key]: rows.map((row, i) => (i === place ? { ...row, [column]: put } : row)),
        }))
      }
  }
  return cells
}

describe.each(definitions.map((definition) => [definition.id, definition] as const))('%s', (id, definition) => {
  const initial = initialInputs(definition)
  const keys = Object.keys(definition.inputs)
  const values = Object.fromEntries(keys.map((key) => [key, initial[key] ?? plainValue(definition.inputs[key]!)]))
  const withAll = (first: boolean) =>
    choose(
      definition,
      values,
      Object.fromEntries(keys.map((key) => [key, first || definition.inputs[key]!.or === undefined])),
    )
  /** Whatever can be given at once: with the first of each two alternatives, and with the second. */
  const shapes = [withAll(true), withAll(false)]

  test('is known by its own id', () => {
    expect(calculators).toHaveProperty(id, definition)
  })

  test('its inputs name each other as they are', () => {
    for (const [key, { or, goesWith, needs, when }] of Object.entries(definition.inputs)) {
      for (const other of [or, goesWith, needs, when?.key]) if (other !== undefined) expect(keys).toContain(other)
      if (or !== undefined) expect(definition.inputs[or]!.or, `${or} is the alternative of ${key}`).toBe(key)
    }
  })

  test('its form starts with an answer', () => {
    checkSolution(definition, initial, solve(id, initial))
  })

  test('its example has an answer, and is not what the form starts with', () => {
    const { say, inputs } = definition.example
    expect(say).toMatch(/\w.*\.$/)
    expect(inputs).not.toEqual(initial)
    checkSolution(definition, inputs, solve(id, inputs))
  })

  test('its plots name what there is', () => {
    for (const plot of definition.plots ?? []) {
      if ('of' in plot) {
        expect(definition.outputs[plot.of]?.kind).toBe('scalar')
        expect(definition.inputs[plot.against]?.kind).toBe('scalar')
        continue
      }
      const output = definition.outputs[plot.rows]
      const columns = output?.kind === 'rows' ? Object.keys(output.columns) : []
      expect(columns).toEqual(expect.arrayContaining([plot.x, ...plot.y]))
    }
  })

  test('warns of its hazards, and defers to the law', () => {
    const { cautions } = solve(id, initial)
    for (const hazard of definition.hazards)
      expect(warnsOf(cautions, hazard), `a caution of ${hazard} that names local code or a licensed person`).toBe(true)
    for (const { hazard } of cautions) if (hazard) expect(definition.hazards).toContain(hazard)
  })

  test('names its sources and what it does not check', () => {
    expect(definition.sources.length).toBeGreaterThan(0)
    expect(definition.doesNotCheck.length).toBeGreaterThan(0)
  })

  test(
    'any inputs in range are answered whole or refused with a reason',
    () => {
      let answers = 0
      fc.assert(
        fc.property(anyInputs(definition), (inputs) => {
          const result = solved(id, inputs)
          if (result instanceof CalculationError) {
            expect(['inconsistent', 'no-solution', 'missing', 'out-of-range']).toContain(result.code)
            expect(definition.inputs).toHaveProperty(fieldPattern.exec(result.field)?.[1] ?? result.field)
            expect(result.message).not.toMatch(unfilled)
          } else {
            answers++
            checkSolution(definition, inputs, result)
          }
        }),
        runs,
      )
      expect(answers, 'some draws have an answer').toBeGreaterThan(runs.numRuns / 10)
    },
    longRun,
  )

  test('refuses a key that it does not have', () => {
    for (const key of ['nonsense', 'constructor', 'toString', 'hasOwnProperty', '__proto__']) {
      const extra = JSON.parse(`{"${key}": 1}`) as object
      expectRefusal('unknown-key', key, () => calculate(id, { ...initial, ...extra }))
      for (const given of shapes)
        for (const [name, value] of Object.entries(given)) {
          const { kind } = definition.inputs[name]!
          if (kind === 'group')
            expectRefusal('unknown-key', `${name}.${key}`, () =>
              calculate(id, { ...given, [name]: { ...(value as PlainRow), ...extra } }),
            )
          const [first, ...rest] = kind === 'rows' ? (value as readonly PlainRow[]) : []
          if (first)
            expectRefusal('unknown-key', `${name}[0].${key}`, () =>
              calculate(id, { ...given, [name]: [{ ...first, ...extra }, ...rest] }),
            )
        }
    }
  })

  test('refuses what is no number, and numbers out of range', () => {
    for (const { field, cell, isFree, put } of shapes.flatMap((values) => cellsOf(definition, values))) {
      if (!cell) {
        for (const bad of isFree ? ['', ' ', 1, null, 'x'.repeat(81)] : ['nonsense', 1, null, 'constructor'])
          expectRefusal('out-of-range', field, () => calculate(id, put(bad)))
        continue
      }
      for (const bad of [NaN, Infinity, -Infinity, '1', '', null, true, {}, []])
        expectRefusal('not-finite', field, () => calculate(id, put(bad)))
      const [low, high] = cell.range
      const beyond = Math.max(1, Math.abs(high)) * 1e-6
      expectRefusal('out-of-range', field, () => calculate(id, put(low - Math.max(1, Math.abs(low)) * 1e-6)))
      expectRefusal('out-of-range', field, () => calculate(id, put(high + beyond)))
      if (cell.whole) expectRefusal('out-of-range', field, () => calculate(id, put(low + 0.5)))
    }
  })

  test('refuses the wrong shape', () => {
    for (const bad of [undefined, null, 5, 'text', [], true])
      expectRefusal('missing', Object.keys(definition.inputs)[0]!, () => calculate(id, bad))
    for (const given of shapes)
      for (const key of Object.keys(given)) {
        const input = definition.inputs[key]!
        if (input.kind === 'scalar' || input.kind === 'choice') continue
        for (const bad of [5, 'text', null, input.kind === 'group' ? [] : {}])
          expectRefusal('not-finite', key, () => calculate(id, { ...given, [key]: bad }))
        if (input.kind === 'group') continue
        if (input.least <= 1) expectRefusal('not-finite', `${key}[0]`, () => calculate(id, { ...given, [key]: ['5'] }))
        if (input.least > 0) expectRefusal('missing', key, () => calculate(id, { ...given, [key]: [] }))
      }
  })

  test('asks for what is missing, and for one of two alternatives', () => {
    const without = (...missing: string[]) =>
      Object.fromEntries(Object.entries(initial).filter(([key]) => !missing.includes(key)))
    for (const [key, input] of Object.entries(definition.inputs)) {
      const company = keys.filter((other) => {
        const { goesWith, needs } = definition.inputs[other]!
        return goesWith === key || needs === key
      })
      if (input.or !== undefined) {
        const [first, second] = [key, input.or].sort((a, b) => keys.indexOf(a) - keys.indexOf(b)) as [string, string]
        expectRefusal('missing', first, () => calculate(id, without(first, second, ...company)))
        const both = { [first]: values[first], [second]: values[second] }
        expectRefusal('inconsistent', second, () => calculate(id, { ...initial, ...both }))
      } else if (input.goesWith !== undefined && initial[input.goesWith] !== undefined)
        expectRefusal('missing', key, () => calculate(id, without(key, ...company)))
      else if (input.when !== undefined && initial[key] === undefined) continue
      else if (input.goesWith !== undefined || input.needs !== undefined || input.optional)
        expect(() => calculate(id, without(key, ...company))).not.toThrow()
      else if (!('fallback' in input && input.fallback !== undefined))
        expectRefusal('missing', key, () => calculate(id, without(key, ...company)))
    }
  })
})
