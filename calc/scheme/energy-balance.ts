import { g } from '../constants.ts'
import type { Caution, Outputs, PlainRow } from '../definition.ts'
import { format, join, say } from '../units/format.ts'
import { waterDensity } from '../water/properties.ts'
import type { Look, StationKey } from './stations.ts'

/** One part of what the fall is worth: what a station takes, or what is left in the end. */
export interface BalancePart {
  part: 'pipe' | 'fittings' | 'nozzle' | 'runner' | 'alternator' | 'cable' | 'left'
  station: StationKey
  label: string
  /** m of the gross head. */
  head: number
  /** W. */
  power: number
  /** Of the gross power. */
  share: number
}

const sum = (rows: readonly PlainRow[], key: string) => rows.reduce((total, row) => total + Number(row[key]), 0)

/**
 * Where the gross power ρgQH goes: each loss in metres, watts and as a share, as far along the chain as it is known. The parts sum to the
 * whole: what is left is what the last known station passes on.
 */
export const energyBalance = (look: Look): { figures: Outputs; parts?: BalancePart[] } => {
  const number = (path: string) => {
    const value = look(path)
    return typeof value === 'number' ? value : undefined
  }
  const flow = number('penstock.flow')
  const grossHead = number('penstock.grossHead')
  const netHead = number('penstock.netHead')
  const sections = look('penstock.found')
  if (flow === undefined || grossHead === undefined || netHead === undefined || !Array.isArray(sections))
    return { figures: {} }

  const wattsPerMetre = waterDensity(number('penstock.waterTemperature')!) * g * flow
  const grossPower = wattsPerMetre * grossHead
  const part = (name: BalancePart['part'], station: StationKey, label: string, power: number): BalancePart => ({
    part: name,
    station,
    label,
    head: wattsPerMetre === 0 ? 0 : power / wattsPerMetre,
    power,
    share: grossPower === 0 ? 0 : power / grossPower,
  })
  const rows = sections as readonly PlainRow[]
  const inPipe = wattsPerMetre * sum(rows, 'frictionLoss')
  const inFittings = wattsPerMetre * sum(rows, 'fittingsLoss')
  const parts = [
    part('pipe', 'penstock', 'Friction in the pipe', inPipe),
    part('fittings', 'penstock', 'Bends, valves, entrance', inFittings),
  ]
  let left = grossPower - inPipe - inFittings
  let last: StationKey = 'penstock'
  let label = 'Left at the nozzle'
  const chain = [
    ['nozzle', 'jet', 'Lost in the nozzle', 'jet.jetPower', 'Left in the jet'],
    ['runner', 'runner', 'Lost in the runner', 'runner.shaftPower', 'Left on the shaft'],
    ['alternator', 'alternator', 'Lost in alternator and drive', 'alternator.outputPower', 'Left at the alternator'],
    ['cable', 'cable', 'Lost in the cable', 'cable.outputPower', 'Reaches the load'],
  ] as const
  for (const [name, station, lost, path, remains] of chain) {
    const passed = number(path)
    if (passed === undefined) break
    parts.push(part(name, station, lost, left - passed))
    ;[left, last, label] = [passed, station, remains]
  }
  parts.push(part('left', last, label, left))
  const optional = (key: string, path: string) => {
    const value = number(path)
    return value === undefined ? {} : { [key]: value }
  }
  return {
    figures: {
      flow,
      grossHead,
      netHead,
      grossPower,
      ...optional('jetPower', 'jet.jetPower'),
      ...optional('shaftPower', 'runner.shaftPower'),
      ...optional('speed', 'runner.speed'),
      ...optional('alternatorPower', 'alternator.outputPower'),
      outputPower: left,
      efficiency: grossPower === 0 ? 0 : left / grossPower,
    },
    parts,
  }
}

/** What no station can see by itself. */
export const schemeCautions = (look: Look): (Caution & { station: StationKey })[] => {
  const [available, drawn] = [look('flow.flow'), look('penstock.flow')]
  if (typeof available !== 'number' || typeof drawn !== 'number' || drawn <= available * 1.005) return []
  return [
    {
      station: 'jet',
      level: 'check',
      about: ['flow'],
      say: `The nozzles draw ${join(format(drawn, 'flow'))}, and the stream is said to give ${say(available, 'flow')}: the forebay would run down. Take smaller nozzles or fewer.`,
    },
  ]
}
