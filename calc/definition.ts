/** What a calculator is. Every screen, route, question and working reads one of these objects. */
import type { Formula, WriteFormula } from './formula.ts'
import type { TableId } from './tables/table.ts'

export type Quantity =
  | 'head'
  | 'length'
  | 'volume'
  | 'time'
  | 'flow'
  | 'velocity'
  | 'power'
  | 'energy'
  | 'pressure'
  | 'density'
  | 'dynamicViscosity'
  | 'kinematicViscosity'
  | 'temperature'
  | 'rotation'
  | 'angle'
  | 'area'
  | 'gradient'
  | 'fraction'
  | 'ratio'
  | 'count'
  | 'mass'
  | 'force'
  | 'temperatureDifference'
  | 'thermalExpansion'
  | 'voltage'
  | 'current'
  | 'resistance'
  | 'resistancePerMetre'
  | 'resistancePerKm'
  | 'conductorArea'
  | 'frequency'
  | 'voltsPerThousandRpm'
  | 'conductivity'
  | 'saltCalibration'
  | 'weirCoefficient'
  | 'years'
  | 'hours'
  | 'money'
  | 'pricePerKwh'
  | 'pricePerMetre'

export type Hazard = 'pressure' | 'electricity' | 'stream' | 'hot-work' | 'rotating' | 'lifting' | 'digging'

export type Station =
  | 'stream'
  | 'intake'
  | 'leat'
  | 'forebay'
  | 'pipe'
  | 'valve'
  | 'jet'
  | 'runner'
  | 'alternator'
  | 'cable'
  | 'load'
  | 'scheme'

interface Said {
  label: string
  /** TeX. */
  symbol?: string
  help?: string
}

/**
 * When an input may stay away:
 * - `optional`: it may always; `fallback` is what then counts, where there is one.
 * - `or`: exactly one of this key and that one is given.
 * - `goesWith`: given exactly when that key is.
 * - `needs`: optional, and only with that key.
 * - `when`: only where that choice (beside it) has one of these values; there it is wanted, unless it is `optional` as well.
 */
interface Absence {
  optional?: true
  or?: string
  goesWith?: string
  needs?: string
  when?: { key: string; is: readonly string[] }
}

/** A table of the trade, and its column that holds this value: choosing a row there fills every input that names the same table. */
export interface FromTable {
  table: TableId
  column: string
}

export type Scalar = Said &
  Absence & {
    kind: 'scalar'
    quantity: Quantity
    /** SI; refused outside. */
    range: readonly [number, number]
    /** SI; a caution outside. */
    usual?: readonly [number, number]
    /** Whole numbers only. */
    whole?: true
    /** What a form shows first; of an optional input, absent means empty. */
    initial?: number
    /** What counts when it is not given. */
    fallback?: number
    /** The unit a form starts with, where it is not the first of the quantity. */
    unit?: string
    pick?: FromTable
  }
export type Choice<V extends string = string> = Said &
  Absence & {
    kind: 'choice'
    of: readonly V[]
    /** Any words will do, such as the name of a pipe; `of` are suggestions. */
    free?: true
    /** Words for the choices, where the value itself does not read well. */
    words?: Readonly<Record<V, string>>
    initial?: V
    fallback?: V
  }
export type Cell = Scalar | Choice
export type Columns = Record<string, Cell>
/** A list of rows, such as the sections of a pipe. */
export type Rows = Said &
  Absence & {
    kind: 'rows'
    /** What one row is called: "section". */
    row: string
    columns: Columns
    least: number
    most: number
    initial?: readonly Record<string, number | string>[]
  }
/** A few values that are given together, such as the nozzles that are open. */
export type Group = Said & Absence & { kind: 'group'; columns: Columns; initial?: Record<string, number | string> }
/** A list of numbers of one quantity, such as the timings of a bucket. */
export type Series = Said &
  Absence & {
    kind: 'series'
    /** What one number is called: "timing". */
    row: string
    quantity: Quantity
    range: readonly [number, number]
    usual?: readonly [number, number]
    unit?: string
    least: number
    most: number
    initial?: readonly number[]
    /** Too long for a field each, such as a year of flows: a form takes it as a record, from a file or by paste. */
    long?: true
  }
/** Several lists of numbers of one quantity, such as the rises of each run of levels. */
export type Runs = Said &
  Absence & {
    kind: 'runs'
    /** What one list is called: "run". */
    run: string
    /** What one number is called: "rise". */
    row: string
    quantity: Quantity
    range: readonly [number, number]
    usual?: readonly [number, number]
    unit?: string
    /** How many lists. */
    least: number
    most: number
    /** How many numbers in each. */
    leastEach: number
    mostEach: number
    initial?: readonly (readonly number[])[]
  }
/** One number of a series, by its place from 0, as a scalar. */
export const numberOf = ({ label, row, quantity, range, usual, unit }: Series | Runs, place: number): Scalar => ({
  kind: 'scalar',
  label: `${label}, ${row} ${place + 1}`,
  ...{ quantity, range, usual, unit },
})
export type Input = Scalar | Choice | Rows | Group | Series | Runs

interface ScalarOutput extends Said {
  kind: 'scalar'
  quantity: Quantity
  /** Significant digits shown; 3 unless told. */
  digits?: number
  unit?: string
  /** Absent when it cannot be worked out. */
  sometimes?: true
}
interface TextOutput extends Said {
  kind: 'text'
  /** Words for the values, where the value itself does not read well. */
  words?: Readonly<Record<string, string>>
  sometimes?: true
}
interface RowsOutput extends Said {
  kind: 'rows'
  columns: Record<string, ScalarOutput | TextOutput>
  sometimes?: true
}
export type Output = ScalarOutput | TextOutput | RowsOutput

type Spread<T> = { [K in keyof T]: T[K] }
type CellValue<C> = C extends { kind: 'choice'; free: true }
  ? string
  : C extends { kind: 'choice'; of: readonly (infer V)[] }
    ? V
    : number
type MayMiss<I> = I extends { fallback: number | string }
  ? false
  : I extends { optional: true } | { or: string } | { goesWith: string } | { needs: string } | { when: object }
    ? true
    : false
type Record_<C> = Spread<
  { [K in keyof C as MayMiss<C[K]> extends true ? never : K]: CellValue<C[K]> } & {
    [K in keyof C as MayMiss<C[K]> extends true ? K : never]?: CellValue<C[K]>
  }
>
type ValueOf<I> = I extends { kind: 'series' }
  ? readonly number[]
  : I extends { kind: 'runs' }
    ? readonly (readonly number[])[]
    : I extends { kind: 'rows'; columns: infer C }
      ? readonly Record_<C>[]
      : I extends { kind: 'group'; columns: infer C }
        ? Record_<C>
        : CellValue<I>
/** What `solve` is handed: checked, SI, fallbacks filled in. */
export type Given<I> = Spread<
  { [K in keyof I as MayMiss<I[K]> extends true ? never : K]: ValueOf<I[K]> } & {
    [K in keyof I as MayMiss<I[K]> extends true ? K : never]?: ValueOf<I[K]>
  }
>
type OutValue<O> = O extends { kind: 'rows'; columns: infer C }
  ? readonly Found<C>[]
  : O extends { kind: 'text' }
    ? string
    : number
export type Found<O> = Spread<
  { [K in keyof O as O[K] extends { sometimes: true } ? never : K]: OutValue<O[K]> } & {
    [K in keyof O as O[K] extends { sometimes: true } ? K : never]?: OutValue<O[K]>
  }
>

export interface Step<K extends string = string> {
  say: string
  formula?: Formula<K>
  /** The output that this step works out. */
  gives?: K
}
export interface Caution<K extends string = string> {
  level: 'note' | 'check' | 'stop'
  about: readonly K[]
  /** The danger it warns of, where there is one. */
  hazard?: Hazard
  say: string
}
export interface Source {
  author: string
  title: string
  year: number
  where?: string
}

/**
 * A plot whose shape teaches. Either one output over one input, the others staying, from a part to a multiple of the number given; or columns
 * of rows that were found (`curve`), over another column of theirs.
 */
export type PlotShape =
  | { say: string; of: string; against: string; from: number; to: number }
  | { say: string; rows: string; x: string; y: readonly string[] }

/** Numbers to try, other than those a form starts with. */
export interface Example {
  /** Whose numbers they are, in a sentence. */
  say: string
  /** SI. */
  inputs: Inputs
}

type Keys<I, O> = Extract<keyof I | keyof O, string>
export interface Calculator<I extends Record<string, Input>, O extends Record<string, Output>> {
  id: string
  station: Station
  title: string
  summary: string
  hazards: readonly Hazard[]
  inputs: I
  outputs: O
  /** SI in, SI out. Shape, range and finiteness were checked against `inputs` before this is called. */
  solve(given: Given<I>): Found<O>
  working(write: WriteFormula<Keys<I, O>>, given: Given<I>, found: Found<O>): readonly Step<Keys<I, O>>[]
  cautions(given: Given<I>, found: Found<O>): readonly Caution<Keys<I, O>>[]
  doesNotCheck: readonly string[]
  sources: readonly Source[]
  example: Example
  plots?: readonly PlotShape[]
}

/** Lets the compiler check a calculator's keys, choices and rows against its own declaration. */
export const defineCalculator = <const I extends Record<string, Input>, const O extends Record<string, Output>>(
  calculator: Calculator<I, O>,
) => calculator

export type PlainValue = number | string
export type PlainRow = Readonly<Record<string, PlainValue | undefined>>
export type InputValue =
  PlainValue | PlainRow | readonly PlainRow[] | readonly number[] | readonly (readonly number[])[]
export type Inputs = Readonly<Record<string, InputValue | undefined>>
export type OutputValue = PlainValue | readonly PlainRow[]
export type Outputs = Readonly<Record<string, OutputValue | undefined>>

/** A calculator as those see it who read definitions without knowing which one it is. */
export interface CalculatorDefinition extends Omit<
  Calculator<Record<string, Input>, Record<string, Output>>,
  'solve' | 'working' | 'cautions'
> {
  solve(given: Inputs): Outputs
  working(write: WriteFormula<string>, given: Inputs, found: Outputs): readonly Step[]
  cautions(given: Inputs, found: Outputs): readonly Caution[]
}
