/** Arithmetic mean of at least one value. */
export const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length

/** Standard uncertainty of the mean of repeated readings, two at least: JCGM 100:2008, 4.2.3. */
export const uncertaintyOfMean = (values: readonly number[], middle: number): number =>
  Math.sqrt(values.reduce((sum, value) => sum + (value - middle) ** 2, 0) / (values.length - 1) / values.length)
