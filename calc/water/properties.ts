/**
 * Density of air-free water at one atmosphere, kg/m³, from 0 to 40 °C: M. Tanaka et al., Recommended table for the density of water
 * between 0 °C and 40 °C based on recent experimental reports, Metrologia 38 (2001) 301–309.
 */
export const waterDensity = (celsius: number): number =>
  999.97495 * (1 - ((celsius - 3.983035) ** 2 * (celsius + 301.797)) / (522528.9 * (celsius + 69.34881)))
