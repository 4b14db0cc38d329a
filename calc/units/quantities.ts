import type { Quantity } from '../definition.ts'
import { libraryUnit } from './unit-library.ts'

/** A unit as people write it, and as the unit library knows it. */
export interface UnitName {
  name: string
  /** For the unit library; absent where a plain factor serves. */
  mathjs?: string
  /** SI units in one of these, where it is not in the unit library. */
  factor?: number
  /** The unit that reads best from this SI value upwards. */
  from?: number
}

export interface QuantityInfo {
  /** "a flow", for sentences. */
  words: string
  /** The unit that the library computes in, as printed. */
  si: UnitName
  /** The units offered; the first is what a form starts with. */
  units: readonly UnitName[]
  example: string
}

const metre: UnitName = { name: 'm', mathjs: 'm' }
const plain: UnitName = { name: '', factor: 1 }

export const quantities: Readonly<Record<Quantity, QuantityInfo>> = {
  length: {
    words: 'a length',
    si: metre,
    units: [
      { name: 'mm', mathjs: 'mm' },
      { name: 'm', mathjs: 'm', from: 1 },
      { name: 'cm', mathjs: 'cm' },
      { name: 'in', mathjs: 'in' },
      { name: 'ft', mathjs: 'ft' },
      { name: 'km', mathjs: 'km', from: 10_000 },
    ],
    example: '110 mm',
  },
  volume: {
    words: 'a volume',
    si: { name: 'm³', mathjs: 'm^3' },
    units: [
      { name: 'L', mathjs: 'L' },
      { name: 'm³', mathjs: 'm^3', from: 1 },
      { name: 'ft³', mathjs: 'ft^3' },
      { name: 'US gal', mathjs: 'gal' },
    ],
    example: '80 L',
  },
  time: {
    words: 'a time',
    si: { name: 's', mathjs: 's' },
    units: [
      { name: 's', mathjs: 's' },
      { name: 'min', mathjs: 'minute' },
      { name: 'h', mathjs: 'hour' },
    ],
    example: '12.4 s',
  },
  head: { words: 'a head', si: metre, units: [metre, { name: 'ft', mathjs: 'ft' }], example: '34 m' },
  flow: {
    words: 'a flow',
    si: { name: 'm³/s', mathjs: 'm^3/s' },
    units: [
      { name: 'L/s', mathjs: 'L/s' },
      { name: 'm³/s', mathjs: 'm^3/s', from: 1 },
      { name: 'L/min', mathjs: 'L/minute' },
      { name: 'm³/h', mathjs: 'm^3/hour' },
      { name: 'ft³/s', mathjs: 'ft^3/s' },
      { name: 'US gal/min', mathjs: 'gal/minute' },
    ],
    example: '9.5 L/s',
  },
  velocity: {
    words: 'a speed',
    si: { name: 'm/s', mathjs: 'm/s' },
    units: [
      { name: 'm/s', mathjs: 'm/s' },
      { name: 'ft/s', mathjs: 'ft/s' },
      { name: 'km/h', mathjs: 'km/hour' },
    ],
    example: '26 m/s',
  },
  power: {
    words: 'a power',
    si: { name: 'W', mathjs: 'W' },
    units: [
      { name: 'W', mathjs: 'W' },
      { name: 'kW', mathjs: 'kW', from: 1000 },
      { name: 'MW', mathjs: 'MW', from: 1e6 },
      { name: 'hp', mathjs: 'hp' },
    ],
    example: '1.8 kW',
  },
  energy: {
    words: 'an energy',
    si: { name: 'J', mathjs: 'J' },
    units: [
      { name: 'kWh', mathjs: 'kWh' },
      { name: 'MWh', mathjs: 'MWh', from: 3.6e10 },
      { name: 'GWh', mathjs: 'GWh', from: 3.6e13 },
      { name: 'MJ', mathjs: 'MJ' },
      { name: 'J', mathjs: 'J' },
    ],
    example: '12 kWh',
  },
  pressure: {
    words: 'a pressure',
    si: { name: 'Pa', mathjs: 'Pa' },
    units: [
      { name: 'bar', mathjs: 'bar' },
      { name: 'kPa', mathjs: 'kPa' },
      { name: 'MPa', mathjs: 'MPa' },
      { name: 'psi', mathjs: 'psi' },
      { name: 'GPa', mathjs: 'GPa' },
      { name: 'mbar', mathjs: 'mbar' },
      { name: 'Pa', mathjs: 'Pa' },
    ],
    example: '3.3 bar',
  },
  density: {
    words: 'a density',
    si: { name: 'kg/m³', mathjs: 'kg/m^3' },
    units: [{ name: 'kg/m³', mathjs: 'kg/m^3' }],
    example: '1000 kg/m³',
  },
  dynamicViscosity: {
    words: 'a dynamic viscosity',
    si: { name: 'Pa·s', mathjs: 'Pa s' },
    units: [
      { name: 'mPa·s', mathjs: 'mPa s' },
      { name: 'Pa·s', mathjs: 'Pa s' },
    ],
    example: '1.3 mPa·s',
  },
  kinematicViscosity: {
    words: 'a kinematic viscosity',
    si: { name: 'm²/s', mathjs: 'm^2/s' },
    units: [
      { name: 'mm²/s', mathjs: 'mm^2/s' },
      { name: 'm²/s', mathjs: 'm^2/s' },
    ],
    example: '1.3 mm²/s',
  },
  temperature: {
    words: 'a temperature',
    si: { name: '°C', mathjs: 'degC' },
    units: [
      { name: '°C', mathjs: 'degC' },
      { name: '°F', mathjs: 'degF' },
    ],
    example: '10 °C',
  },
  rotation: {
    words: 'a rotational speed',
    si: { name: 'rev/min', mathjs: 'rpm' },
    units: [
      { name: 'rev/min', mathjs: 'rpm' },
      { name: 'rev/s', mathjs: 'Hz' },
    ],
    example: '1450 rev/min',
  },
  angle: {
    words: 'an angle',
    si: { name: '°', mathjs: 'deg' },
    units: [
      { name: '°', mathjs: 'deg' },
      { name: 'rad', mathjs: 'rad' },
    ],
    example: '45°',
  },
  area: {
    words: 'an area',
    si: { name: 'm²', mathjs: 'm^2' },
    units: [
      { name: 'mm²', mathjs: 'mm^2' },
      { name: 'm²', mathjs: 'm^2', from: 0.01 },
      { name: 'in²', mathjs: 'in^2' },
      { name: 'ft²', mathjs: 'ft^2' },
    ],
    example: '0.4 m²',
  },
  gradient: {
    words: 'a gradient',
    si: { name: 'm/m', factor: 1 },
    units: [
      { name: 'm per 100 m', factor: 0.01 },
      { name: 'm/m', factor: 1 },
      { name: '%', factor: 0.01 },
    ],
    example: '1.6 m per 100 m',
  },
  fraction: {
    words: 'a share',
    si: plain,
    units: [{ name: '%', factor: 0.01 }, plain],
    example: '55 %',
  },
  ratio: { words: 'a number', si: plain, units: [plain], example: '0.97' },
  count: { words: 'a number', si: plain, units: [plain], example: '2' },
  mass: {
    words: 'a mass',
    si: { name: 'kg', mathjs: 'kg' },
    units: [
      { name: 'kg', mathjs: 'kg' },
      { name: 'g', mathjs: 'g' },
      { name: 't', mathjs: 'tonne', from: 1000 },
      { name: 'lb', mathjs: 'lbm' },
    ],
    example: '2.5 kg',
  },
  force: {
    words: 'a force',
    si: { name: 'N', mathjs: 'N' },
    units: [
      { name: 'N', mathjs: 'N' },
      { name: 'kN', mathjs: 'kN', from: 1000 },
      { name: 'lbf', mathjs: 'lbf' },
    ],
    example: '3.1 kN',
  },
  temperatureDifference: {
    words: 'a difference of temperature',
    si: { name: 'K', factor: 1 },
    units: [{ name: 'K', factor: 1 }],
    example: '15 K',
  },
  thermalExpansion: {
    words: 'an expansion of each metre for each kelvin',
    si: { name: '1/K', factor: 1 },
    units: [
      { name: 'mm/(m·K)', factor: 0.001 },
      { name: '1/K', factor: 1 },
    ],
    example: '0.012 mm/(m·K)',
  },
  voltage: { words: 'a voltage', si: { name: 'V', mathjs: 'V' }, units: [{ name: 'V', mathjs: 'V' }], example: '48 V' },
  current: { words: 'a current', si: { name: 'A', mathjs: 'A' }, units: [{ name: 'A', mathjs: 'A' }], example: '16 A' },
  resistance: {
    words: 'a resistance',
    si: { name: 'Ω', mathjs: 'ohm' },
    units: [
      { name: 'Ω', mathjs: 'ohm' },
      { name: 'mΩ', factor: 0.001 },
    ],
    example: '0.4 Ω',
  },
  resistancePerMetre: {
    words: 'a resistance of each metre',
    si: { name: 'Ω/m', factor: 1 },
    units: [
      { name: 'Ω/km', factor: 0.001 },
      { name: 'Ω/m', factor: 1 },
    ],
    example: '1.15 Ω/km',
  },
  /** As cable tables print it: the calculators take it so. */
  resistancePerKm: {
    words: 'a resistance of each kilometre',
    si: { name: 'Ω/km', factor: 1 },
    units: [{ name: 'Ω/km', factor: 1 }],
    example: '1.15 Ω/km',
  },
  /** As cable is sold: the calculators take it so. */
  conductorArea: {
    words: 'a cross-section',
    si: { name: 'mm²', mathjs: 'mm^2' },
    units: [{ name: 'mm²', mathjs: 'mm^2' }],
    example: '16 mm²',
  },
  frequency: {
    words: 'a frequency',
    si: { name: 'Hz', mathjs: 'Hz' },
    units: [{ name: 'Hz', mathjs: 'Hz' }],
    example: '50 Hz',
  },
  voltsPerThousandRpm: {
    words: 'a voltage at 1000 rev/min',
    si: { name: 'V per 1000 rev/min', factor: 1 },
    units: [{ name: 'V per 1000 rev/min', factor: 1 }],
    example: '38 V per 1000 rev/min',
  },
  /** As meters show it: the calculators take it so. */
  conductivity: {
    words: 'a conductivity',
    si: { name: 'µS/cm', factor: 1 },
    units: [
      { name: 'µS/cm', factor: 1 },
      { name: 'mS/cm', factor: 1000 },
    ],
    example: '120 µS/cm',
  },
  saltCalibration: {
    words: 'a calibration',
    si: { name: 'mg/L per µS/cm', factor: 1 },
    units: [{ name: 'mg/L per µS/cm', factor: 1 }],
    example: '0.5 mg/L per µS/cm',
  },
  weirCoefficient: {
    words: 'a weir coefficient',
    si: { name: 'm^½/s', factor: 1 },
    units: [{ name: 'm^½/s', factor: 1 }],
    example: '1.7 m^½/s',
  },
  years: {
    words: 'a number of years',
    si: { name: 'years', factor: 1 },
    units: [{ name: 'years', factor: 1 }],
    example: '20 years',
  },
  /** Hours of a day or a year, as people count them. */
  hours: {
    words: 'a number of hours',
    si: { name: 'h', factor: 1 },
    units: [{ name: 'h', factor: 1 }],
    example: '4 h',
  },
  /** In whatever currency the prices are. */
  money: { words: 'an amount of money', si: plain, units: [plain], example: '2400' },
  pricePerKwh: {
    words: 'a price for each kWh',
    si: { name: 'per kWh', factor: 1 },
    units: [{ name: 'per kWh', factor: 1 }],
    example: '0.24 per kWh',
  },
  pricePerMetre: {
    words: 'a price for each metre',
    si: { name: 'per m', factor: 1 },
    units: [{ name: 'per m', factor: 1 }],
    example: '18 per m',
  },
}

/** The unit library knows turns only as hertz. */
const inLibrary = (value: number, mathjs: string) => libraryUnit(value, mathjs === 'rpm' ? 'Hz' : mathjs)
const turnsPerMinute = 60

/** Base dimensions as one text, to compare. */
const dimensionOf = (mathjs: string): string => inLibrary(1, mathjs).dimensions.join()

/** Multiplies a unit's number to SI (after `offset`), or says why it cannot. */
export interface Conversion {
  toSi(value: number): number
  fromSi(value: number): number
}

/** Takes the last bit of floating noise away: 600 L/min is 0.01 m³/s, not 0.010000000000000002. */
const round = (value: number): number => Number(value.toPrecision(15))

const linear = (factor: number): Conversion => ({
  toSi: (value) => round(value * factor),
  fromSi: (value) => round(value / factor),
})

const cached = new Map<string, Conversion>()

/** The conversion between a unit of the library's own spelling and a quantity's SI unit; undefined for another dimension or an unknown unit. */
export const conversion = (quantity: Quantity, unit: UnitName): Conversion | undefined => {
  const key = `${quantity} ${unit.name} ${unit.mathjs ?? ''}`
  const known = cached.get(key)
  if (known) return known
  const made = make(quantities[quantity].si, unit)
  if (made) cached.set(key, made)
  return made
}

const make = (si: UnitName, unit: UnitName): Conversion | undefined => {
  if (unit.factor !== undefined) return linear(unit.factor)
  if (si.mathjs === undefined || unit.mathjs === undefined) return undefined
  if (dimensionOf(si.mathjs) !== dimensionOf(unit.mathjs)) return undefined
  if (si.mathjs === 'rpm')
    return unit.mathjs === 'rpm' ? linear(1) : linear(turnsPerMinute * inLibrary(1, unit.mathjs).toNumber('Hz'))
  const from = unit.mathjs
  const to = si.mathjs
  const zero = inLibrary(0, from).toNumber(to)
  const one = inLibrary(1, from).toNumber(to)
  if (zero === 0) return linear(one)
  // A scale with another zero: the noise is that of the difference.
  return {
    toSi: (value) => Number(inLibrary(value, from).toNumber(to).toPrecision(12)),
    fromSi: (value) => Number(inLibrary(value, to).toNumber(from).toPrecision(12)),
  }
}

/** Which of the quantities the unit library's spelling measures, if any. */
export const quantityOf = (mathjs: string): Quantity | undefined => {
  const dimension = dimensionOf(mathjs)
  return (Object.keys(quantities) as Quantity[]).find((q) => {
    const si = quantities[q].si.mathjs
    return si !== undefined && dimensionOf(si) === dimension
  })
}

/** Whether the unit library knows this spelling. */
export const isUnit = (mathjs: string): boolean => {
  try {
    inLibrary(1, mathjs)
    return true
  } catch {
    return false
  }
}
