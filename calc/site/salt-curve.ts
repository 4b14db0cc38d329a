/** What the salt of one dose does to a stream's conductivity, over time: excess over the background. */

export interface SaltReading {
  time: number
  conductivity: number
}

export interface SaltCurve {
  /** Place of the largest reading. */
  peak: number
  /** Area under the excess by the trapezium rule; readings under the background count minus. */
  area: number
  /** Share of its height that the falling limb loses in each second, by the line fitted to its logarithms. */
  decay: number
  /** Area that is still to come after the last reading. */
  tail: number
}

/**
 * Area, peak and tail of the curve. The tail is that of an exponential: a straight line fitted by least squares to the logarithm of the
 * excess, over the readings after the peak from half of its height to the last (over all of the falling limb where fewer than two stand
 * so low), and integrated from the last reading on. Nothing is left once the last reading is back at the background. Undefined where there
 * is no peak that rises from the first reading over the background and falls again.
 */
export const saltCurve = (readings: readonly SaltReading[], background: number): SaltCurve | undefined => {
  const excess = (i: number): number => readings[i]!.conductivity - background
  const last = readings.length - 1
  let peak = 0
  let area = 0
  for (let i = 1; i <= last; i++) {
    if (excess(i) > excess(peak)) peak = i
    area += ((excess(i) + excess(i - 1)) / 2) * (readings[i]!.time - readings[i - 1]!.time)
  }
  if (peak === 0 || peak === last || excess(peak) <= 0 || excess(last) >= excess(peak) || area <= 0) return undefined
  if (excess(last) <= 0) return { peak, area, decay: 0, tail: 0 }

  const limb = (highest: number): number[] => {
    const places: number[] = []
    for (let i = peak; i <= last; i++) if (excess(i) > 0 && excess(i) <= highest) places.push(i)
    return places
  }
  const low = limb(excess(peak) / 2)
  const places = low.length < 2 ? limb(excess(peak)) : low
  // Times from the last reading on keep their digits, whatever the clock showed.
  const end = readings[last]!.time
  let [sumT, sumY] = [0, 0]
  for (const i of places) {
    sumT += readings[i]!.time - end
    sumY += Math.log(excess(i))
  }
  const [meanT, meanY] = [sumT / places.length, sumY / places.length]
  let [squares, products] = [0, 0]
  for (const i of places) {
    const t = readings[i]!.time - end - meanT
    squares += t * t
    products += t * (Math.log(excess(i)) - meanY)
  }
  const decay = -products / squares
  const tail = Math.exp(meanY + decay * meanT) / decay
  return decay > 0 && Number.isFinite(tail) ? { peak, area, decay, tail } : undefined
}
