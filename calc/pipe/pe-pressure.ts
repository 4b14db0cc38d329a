import { temperatureFactor } from '../tables/temperature-factor.ts'

/** What polyethylene pressure pipe may carry: ISO 4427-2 and EN 12201-2. */

/** Nominal pressure, Pa, by the ring at the middle of the wall: 2·MRS/(C·(SDR − 1)). What is printed on the pipe is rounded. */
export const nominalPressureOf = (minimumRequiredStrength: number, sdr: number, designCoefficient: number): number =>
  (2 * minimumRequiredStrength) / (designCoefficient * (sdr - 1))

const factors = temperatureFactor.rows

/** Share of the nominal pressure left at a wall temperature of 0 to 40 °C: EN 12201-1 Annex A, linear between its points, 1 up to the first. */
export const temperatureFactorAt = (celsius: number): number => {
  for (let i = 1; i < factors.length; i++) {
    const below = factors[i - 1]!
    const above = factors[i]!
    if (celsius <= below.temperature) return below.factor
    if (celsius <= above.temperature)
      return (
        below.factor +
        ((above.factor - below.factor) * (celsius - below.temperature)) / (above.temperature - below.temperature)
      )
  }
  return factors.at(-1)!.factor
}
