import { seededRandom } from '../numeric/random.ts'

interface StreamOfItsOwn {
  seed: string
  /** What the springs give in late summer and in late winter, L/s. */
  springs: readonly [number, number]
  /** How likely rain is to start a spate on a day in late summer and in late winter. */
  rain: readonly [number, number]
  /** How high a usual spate stands above the springs, L/s. */
  spate: number
  /** The share of a spate that is left after a day. */
  left: number
}

/** The wettest day of the invented years: 25 January. */
const wettest = 24
const days = 365

/** An invented year of daily flows in m³/s, to a tenth of a litre per second: springs that swing with the season, and spates that fall off. */
const inventedYear = ({ seed, springs, rain, spate, left }: StreamOfItsOwn): readonly number[] => {
  const random = seededRandom(seed)
  let above = 0
  return Array.from({ length: days }, (_, day) => {
    const winter = (1 + Math.cos((2 * Math.PI * (day - wettest)) / days)) / 2
    const between = ([dry, wet]: readonly [number, number]) => dry + (wet - dry) * winter
    above *= left
    if (random() < between(rain)) above -= spate * (0.4 + 0.6 * winter) * Math.log(1 - random())
    return Math.round(10 * (between(springs) + above)) / 1e4
  })
}

/** A year of a small hill stream, invented: fed by springs, low in late summer. */
export const exampleYear = inventedYear({
  seed: 'a year of a hill stream',
  springs: [4, 15],
  rain: [0.1, 0.22],
  spate: 15,
  left: 0.72,
})

/** A year of another stream, invented: wetter, and gone as quickly as it came. */
export const flashyYear = inventedYear({
  seed: 'a wet year below the crags',
  springs: [1.6, 16],
  rain: [0.2, 0.4],
  spate: 42,
  left: 0.5,
})
