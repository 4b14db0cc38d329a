import type { Quantity } from '../definition.ts'
import { quantities } from './quantities.ts'

export type UnitSystem = 'metric' | 'imperial'

/** The unit of the other system that stands for a metric one. Power stays in watts and kilowatts, as alternators are sold everywhere. */
const imperialFor: Readonly<Record<string, string>> = {
  mm: 'in',
  cm: 'in',
  m: 'ft',
  km: 'ft',
  L: 'US gal',
  'm³': 'ft³',
  'L/s': 'US gal/min',
  'm³/s': 'ft³/s',
  'm/s': 'ft/s',
  bar: 'psi',
  kPa: 'psi',
  MPa: 'psi',
  kg: 'lb',
  t: 'lb',
  N: 'lbf',
  kN: 'lbf',
  '°C': '°F',
  'mm²': 'in²',
  'm²': 'ft²',
}

/** The one piece of state in this library: in which units results, ranges and cautions are said. A server says them in metric ones. */
let shown: UnitSystem = 'metric'

export const showUnitsOf = (system: UnitSystem): void => {
  shown = system
}

export const shownSystem = (): UnitSystem => shown

/** The unit in which one of this name is shown. */
export const shownUnit = (quantity: Quantity, name: string): string => {
  const other = shown === 'imperial' ? imperialFor[name] : undefined
  return other !== undefined && quantities[quantity].units.some((unit) => unit.name === other) ? other : name
}
