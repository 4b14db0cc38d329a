import { checkInput, checkInputs, missingInputs } from '../check.ts'
import type { CalculatorDefinition, Caution, Inputs, InputValue, Outputs, PlainRow } from '../definition.ts'
import { CalculationError, type CalculationErrorCode } from '../errors.ts'
import type { PrintedStep } from '../print.ts'
import { solveChecked, solveDefinition } from '../solve-definition.ts'
import { propagate, replaceField, uncertainField, type StandardUncertainties, type Uncertain } from '../uncertainty.ts'
import { energyBalance, schemeCautions, type BalancePart } from './energy-balance.ts'
import { stationKeys, works, type Look, type StationKey, type Value, type Work } from './stations.ts'

/** What is known of each station, under its calculators' own keys, SI; what one hands the next is not given again. */
export type SchemeInputs = { readonly [K in StationKey]?: Inputs }

export type StationResult =
  | { outputs: Outputs }
  /** What is still to be said before it can be worked out: `penstock.sections`. */
  | { waitsFor: readonly string[] }
  | { refused: { code: CalculationErrorCode; field: string; message: string } }

export interface SchemeNumbers {
  stations: { readonly [K in StationKey]?: StationResult }
  /** What the whole scheme gives, as far as it is known: flow, heads, powers from the fall to the load. */
  figures: Outputs
  /** From the gross head to the load; heads and powers sum to the whole. Absent until flow and gross head are known. */
  energyBalance?: readonly BalancePart[]
  gradeLine?: readonly PlainRow[]
}

export interface SchemeSolution extends SchemeNumbers {
  working: { station: StationKey; title: string; steps: readonly PrintedStep[] }[]
  cautions: (Caution & { station: StationKey })[]
}

interface Done {
  work: Work
  inputs: Inputs
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

const worksOf = (station: StationKey) => works.filter((work) => work.station === station)

/** The station's own figures, each in its range. */
const checkOwn = (station: StationKey, raw: unknown): Inputs => {
  if (!isRecord(raw)) throw new CalculationError('not-finite', station, 'Give the station’s values by name.')
  const own: Record<string, InputValue> = {}
  for (const [key, value] of Object.entries(raw)) {
    if (value === undefined) continue
    const asked = worksOf(station).find(({ definition }) => Object.hasOwn(definition.inputs, key))
    if (!asked)
      throw new CalculationError('unknown-key', `${station}.${key}`, `The ${station} has no value called “${key}”.`)
    const isEmptyList = Array.isArray(value) && value.length === 0
    if (isEmptyList) continue
    try {
      own[key] = checkInput(asked.definition.inputs[key]!, key, value)
    } catch (error) {
      throw atStation(station, error)
    }
  }
  return own
}

const atStation = (station: StationKey, error: unknown): unknown =>
  error instanceof CalculationError
    ? new CalculationError(error.code, `${station}.${error.field}`, error.message)
    : error

/** Works a scheme out, station after station; a refusal stays with its station, and those behind it wait. */
const workOut = (given: SchemeInputs): { numbers: SchemeNumbers; done: Done[]; look: Look } => {
  if (!isRecord(given)) throw new CalculationError('not-finite', stationKeys[0], 'Give the stations by name.')
  for (const key of Object.keys(given))
    if (!(stationKeys as readonly string[]).includes(key))
      throw new CalculationError('unknown-key', key, `A scheme has no station called “${key}”.`)

  const known = new Map<string, Value>()
  const look: Look = (path) => known.get(path)
  const put = (station: StationKey, values: Readonly<Record<string, Value | undefined>>) => {
    for (const [key, value] of Object.entries(values)) if (value !== undefined) known.set(`${station}.${key}`, value)
  }
  const own = new Map<StationKey, Inputs>()
  for (const station of stationKeys) {
    const raw = given[station]
    if (raw === undefined) continue
    own.set(station, checkOwn(station, raw))
    put(station, own.get(station)!)
  }

  const stations: { [K in StationKey]?: StationResult } = {}
  const waits = new Map<StationKey, readonly string[]>()
  const done: Done[] = []
  for (const work of works) {
    const { station, definition, handed, leaves, adds } = work
    const mine = own.get(station)
    if (mine === undefined) continue
    const inputs: Record<string, InputValue> = {}
    for (const [key, value] of Object.entries(mine))
      if (value !== undefined && Object.hasOwn(definition.inputs, key) && !leaves?.includes(key)) inputs[key] = value

    const asked = new Map<string, string[]>()
    let refusal: CalculationError | undefined
    for (const [key, { from, yields }] of Object.entries(handed)) {
      if (!Object.hasOwn(definition.inputs, key)) continue
      const missed: string[] = []
      const value = from((path) => {
        const found = known.get(path)
        if (found === undefined) missed.push(path)
        return found
      }, look)
      asked.set(key, missed)
      if (value === undefined) continue
      if (inputs[key] === undefined) inputs[key] = value
      else if (!yields && inputs[key] !== value)
        refusal ??= new CalculationError(
          'inconsistent',
          key,
          `${definition.inputs[key]!.label} comes from the stations before: leave it out here.`,
        )
    }

    const wanted = missingInputs(definition, inputs).flatMap((key) => {
      const other = definition.inputs[key]?.or
      const paths = asked.get(key) ?? (other === undefined ? undefined : asked.get(other))
      if (!paths || paths.length === 0) return [`${station}.${key}`]
      return paths.flatMap((path) => waits.get(path.split('.')[0] as StationKey) ?? [path])
    })
    if (wanted.length > 0) {
      // The runner is worked out without its buckets' losses, where nothing is said of them.
      if (!('outputs' in (stations[station] ?? {})) && work === worksOf(station).at(-1)) {
        waits.set(station, [...new Set(wanted)])
        stations[station] = { waitsFor: waits.get(station)! }
      }
      continue
    }
    try {
      if (refusal) throw refusal
      const checked = checkInputs(definition, inputs)
      const outputs = definition.solve
        ? solveChecked(definition as CalculatorDefinition, checked)
        : (checked as Outputs)
      done.push({ work, inputs })
      put(station, checked)
      put(station, outputs)
      if (station === 'penstock') known.set('penstock.found', outputs['sections']!)
      if (station === 'penstock') known.set('penstock.sections', checked['sections']!)
      if (adds) put(station, adds(look))
      const before = stations[station]
      stations[station] = { outputs: before && 'outputs' in before ? { ...before.outputs, ...outputs } : outputs }
    } catch (error) {
      if (!(error instanceof CalculationError)) throw error
      const { code, field, message } = error
      stations[station] = { refused: { code, field: `${station}.${field}`, message } }
      waits.set(station, [`${station}.${field}`])
    }
  }

  const { figures, parts } = energyBalance(look)
  const gradeLine = known.get('penstock.gradeLine')
  return {
    numbers: {
      stations,
      figures,
      ...(parts === undefined ? {} : { energyBalance: parts }),
      ...(gradeLine === undefined ? {} : { gradeLine: gradeLine as readonly PlainRow[] }),
    },
    done,
    look,
  }
}

/** The scheme's numbers without working or cautions: for drawings that move and for uncertainties. */
export const calculateScheme = (given: SchemeInputs): SchemeNumbers => workOut(given).numbers

/**
 * One stream through the whole chain: each station's result or what it waits for, the energy balance from gross head to load, the grade
 * line, the working and every caution. SI. Throws `CalculationError` (field `station.key`) for a value of the wrong shape or out of range;
 * what cannot be worked out for other reasons is said at its station.
 */
export const solveScheme = (given: SchemeInputs): SchemeSolution => {
  const { numbers, done, look } = workOut(given)
  const working: SchemeSolution['working'] = []
  const cautions: SchemeSolution['cautions'] = schemeCautions(look)
  for (const { work, inputs } of done) {
    if (!work.definition.solve) continue
    const solution = solveDefinition(work.definition as CalculatorDefinition, inputs)
    working.push({ station: work.station, title: work.definition.title, steps: solution.working })
    cautions.push(...solution.cautions.map((caution) => ({ ...caution, station: work.station })))
  }
  return { ...numbers, working, cautions }
}

/**
 * Combined standard uncertainty of the scheme's figures (JCGM 100:2008, 5.1.2) with each input's share. Uncertainties by field:
 * `penstock.sections[0].insideDiameter`. Throws `CalculationError` for fields that are not given.
 */
export const schemeUncertainty = (
  given: SchemeInputs,
  standardUncertainties: StandardUncertainties,
): Record<string, Uncertain> => {
  const stationOf = (name: string) => name.slice(0, Math.max(0, name.indexOf('.'))) as StationKey
  const fields = Object.entries(standardUncertainties).map(([name, uncertainty]) => {
    const station = stationOf(name)
    const rest = name.slice(station.length + 1)
    const asked = worksOf(station).find(({ definition }) =>
      Object.hasOwn(definition.inputs, /^\w+/.exec(rest)?.[0] ?? ''),
    )
    const inputs = given[station]
    if (!asked || !inputs) throw new CalculationError('unknown-key', name, `The scheme has no number called “${name}”.`)
    try {
      return { ...uncertainField(asked.definition, inputs, rest, uncertainty), name }
    } catch (error) {
      throw atStation(station, error)
    }
  })
  return propagate(fields, calculateScheme(given).figures, (field, value) => {
    const station = stationOf(field.name)
    return calculateScheme({ ...given, [station]: replaceField(given[station]!, field, value) }).figures
  })
}
