import type { Station } from '#calc/index.ts'
import type { CalculatorIndexEntry } from '../../lib/calculator-index.ts'

/** The stations of the long section, from the stream to the load, as headings. */
const stationWords: Readonly<Record<Station, string>> = {
  stream: 'Stream',
  intake: 'Intake',
  leat: 'Leat',
  forebay: 'Forebay',
  pipe: 'Pipe',
  valve: 'Valve and gauge',
  jet: 'Jet',
  runner: 'Runner',
  alternator: 'Alternator',
  cable: 'Cable',
  load: 'Load',
  scheme: 'Whole scheme',
}

/** Calculators under their stations, in the order of the water; stations without one are left out. */
export const byStation = (calculators: readonly CalculatorIndexEntry[]) =>
  (Object.keys(stationWords) as Station[])
    .map((station) => ({
      station,
      words: stationWords[station],
      members: calculators.filter((calculator) => calculator.station === station),
    }))
    .filter(({ members }) => members.length > 0)

export const wordsOfStation = (station: Station): string => stationWords[station]
