import type { Choice, Scalar } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { pipeLength } from '../pipe/inputs.ts'
import { conductors } from '../tables/conductors.ts'

/** What a cable is asked, whether its size is known or looked for. */

export const systems = ['dc', 'single-phase', 'three-phase'] as const
export type System = (typeof systems)[number]
export const materials = ['copper', 'aluminium'] as const
export type Material = (typeof materials)[number]

const material = {
  kind: 'choice',
  label: 'Conductor',
  of: materials,
} as const satisfies Choice

export const cableInputs = {
  system: {
    kind: 'choice',
    label: 'System',
    of: systems,
    words: { dc: 'direct current', 'single-phase': 'one phase', 'three-phase': 'three phases' },
    initial: 'single-phase',
  },
  power: {
    kind: 'scalar',
    symbol: 'P',
    label: 'Power',
    quantity: 'power',
    help: 'at the same end as the voltage',
    range: [0.01, 1e8],
    usual: [50, 1e5],
    initial: 2000,
  },
  voltage: {
    kind: 'scalar',
    symbol: 'U',
    label: 'Voltage',
    quantity: 'voltage',
    help: 'three phases: between two lines',
    range: [1, 100_000],
    usual: [12, 1000],
    initial: 230,
  },
  powerFactor: {
    kind: 'scalar',
    symbol: '\\cos\\varphi',
    label: 'Power factor',
    quantity: 'ratio',
    range: [0.1, 1],
    usual: [0.7, 1],
    fallback: 1,
    optional: true,
  },
  length: { ...pipeLength, label: 'Length', help: 'one way, along the trench', initial: 180 },
  reactancePerKm: {
    kind: 'scalar',
    symbol: 'X',
    label: 'Reactance',
    quantity: 'resistancePerKm',
    help: 'of one conductor; about 0.08 Ω/km, and it counts in thick cable only',
    range: [0, 10],
    usual: [0, 0.4],
    fallback: 0,
    optional: true,
  },
  conductorTemperature: {
    kind: 'scalar',
    symbol: 't',
    label: 'Conductor temperature',
    quantity: 'temperature',
    help: 'warm when it works: 50 °C, up to 70 °C when it works hard',
    range: [-40, 120],
    usual: [10, 90],
    fallback: 50,
    optional: true,
  },
} as const

export const cableMaterial = { ...material, initial: 'copper' } as const satisfies Choice

export const crossSection = {
  kind: 'scalar',
  symbol: 'A',
  label: 'Cross-section',
  quantity: 'conductorArea',
  help: 'of one conductor: 1.5, 2.5, 4, 6, 10, 16 … 240 mm²',
  range: [1.5, 240],
  pick: { table: 'conductors', column: 'crossSection' },
} as const satisfies Scalar

/** Change of resistance with temperature, 1/K from 20 °C: IEC 60287-1-1, table 1. */
const temperatureCoefficient: Readonly<Record<Material, number>> = { copper: 0.00393, aluminium: 0.00403 }

/** Greatest resistance of each size, class 2 of IEC 60228 at 20 °C; Ω/m by mm². */
const at20: Readonly<Record<Material, ReadonlyMap<number, number>>> = {
  copper: new Map(conductors.rows.map(({ crossSection, copper }) => [crossSection, copper / 1000])),
  aluminium: new Map(
    conductors.rows.flatMap((row) => ('aluminium' in row ? [[row.crossSection, row.aluminium / 1000]] : [])),
  ),
}

/** Sizes of IEC 60228 that a material has, mm². */
export const sizesOf = (material: Material): number[] => [...at20[material].keys()]

/** Greatest resistance of a size at a temperature; Ω/m. Refuses sizes that there are not. */
export const resistanceOf = (crossSection: number, material: Material, temperature: number): number => {
  const cold = at20[material].get(crossSection)
  if (cold === undefined)
    throw new CalculationError(
      'out-of-range',
      'crossSection',
      `Cable of ${material} is not made in this size: take one of ${sizesOf(material).join(', ')} mm², or give the resistance.`,
    )
  return cold * (1 + temperatureCoefficient[material] * (temperature - 20))
}

export interface Line {
  system: System
  power: number
  voltage: number
  powerFactor: number
  length: number
  reactancePerKm: number
}

/** Direct current knows no power factor and no reactance. */
export const checkSystem = ({ system, powerFactor, reactancePerKm }: Line): void => {
  if (system !== 'dc') return
  if (powerFactor !== 1)
    throw new CalculationError('inconsistent', 'powerFactor', 'Direct current has no power factor: leave it empty.')
  if (reactancePerKm !== 0)
    throw new CalculationError('inconsistent', 'reactancePerKm', 'Direct current meets no reactance: leave it empty.')
}

export const currentOf = ({ system, power, voltage, powerFactor }: Line): number =>
  power / (voltage * powerFactor * (system === 'three-phase' ? Math.sqrt(3) : 1))

/** Volts lost on the way, at the load’s own angle; resistance in Ω/m. */
export const dropOf = (line: Line, current: number, resistance: number): number => {
  const { system, powerFactor, length, reactancePerKm } = line
  const sine = Math.sqrt(Math.max(0, 1 - powerFactor * powerFactor))
  const perAmpere = length * (resistance * powerFactor + (reactancePerKm / 1000) * sine)
  return (system === 'three-phase' ? Math.sqrt(3) : 2) * current * perAmpere
}

/** Watts that warm the cable: two loaded conductors, or three. */
export const lossOf = ({ system, length }: Line, current: number, resistance: number): number =>
  (system === 'three-phase' ? 3 : 2) * current * current * resistance * length
