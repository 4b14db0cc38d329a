/** Properties of clean liquid water near one atmosphere, from 0 to 40 °C. */

/**
 * Density of air-free water at one atmosphere, kg/m³, from 0 to 40 °C: M. Tanaka et al., Recommended table for the density of water
 * between 0 °C and 40 °C based on recent experimental reports, Metrologia 38 (2001) 301–309.
 */
export const waterDensity = (celsius: number): number =>
  999.97495 * (1 - ((celsius - 3.983035) ** 2 * (celsius + 301.797)) / (522528.9 * (celsius + 69.34881)))

export const kelvin = (celsius: number): number => celsius + 273.15

/**
 * Dynamic viscosity of liquid water at 0.1 MPa, Pa·s; uncertainty 1 % from 0 to 110 °C, the correlation itself reaching from 253.15 to
 * 383.15 K: IAPWS SR6-08(2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa, eq. (7).
 */
export const waterDynamicViscosity = (celsius: number): number => {
  const t = kelvin(celsius) / 300
  return 1e-6 * (280.68 * t ** -1.9 + 511.45 * t ** -7.7 + 61.131 * t ** -19.6 + 0.45903 * t ** -40)
}

/** Kinematic viscosity, m²/s: dynamic viscosity over density. */
export const waterKinematicViscosity = (celsius: number): number =>
  waterDynamicViscosity(celsius) / waterDensity(celsius)

/** The terms of the quadratic behind the saturation pressure (IAPWS-IF97, region 4, eq. (30), table 34). */
export const saturationTerms = (celsius: number): { theta: number; a: number; b: number; c: number } => {
  const T = kelvin(celsius)
  const theta = T - 0.23855557567849 / (T - 650.17534844798)
  return {
    theta,
    a: theta ** 2 + 1167.0521452767 * theta - 724213.16703206,
    b: -17.073846940092 * theta ** 2 + 12020.82470247 * theta - 3232555.0322333,
    c: 14.91510861353 * theta ** 2 - 4823.2657361591 * theta + 405113.40542057,
  }
}

/**
 * Pressure at which water boils at this temperature, Pa, from 273.15 to 647.096 K: IAPWS R7-97(2012), Revised Release on the IAPWS
 * Industrial Formulation 1997, region 4.
 */
export const vapourPressure = (celsius: number): number => {
  const { a, b, c } = saturationTerms(celsius)
  return 1e6 * ((2 * c) / (-b + Math.sqrt(b ** 2 - 4 * a * c))) ** 4
}
