import { g } from '../constants.ts'

/** The standard atmosphere, ISO 2533:1975. SI. */

/** Pressure of the air at sea level. */
export const seaLevelPressure = 101_325

const seaLevelKelvin = 288.15
const lapse = 0.0065
/** Of air, J/(kg·K). */
const gasConstant = 287.05287
const exponent = g / (lapse * gasConstant)

/**
 * Pressure of the air at an altitude of up to 11 km: p₀·(1 − βH/T₀)^(g/βR). The altitude is taken for the geopotential one, which it is within
 * 0.05 % to 3 km. Weather moves the real pressure by some 3 % either way.
 */
export const airPressureAt = (altitude: number): number =>
  seaLevelPressure * (1 - (lapse * altitude) / seaLevelKelvin) ** exponent
