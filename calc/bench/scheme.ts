/** A whole scheme, from the stream to the load: a drawing moves with it, so that it must keep up with a finger. */
import { sorrelthwaite, sorrelthwaiteUncertainties } from '../scheme/example-scheme.ts'
import { calculateScheme, schemeUncertainty, solveScheme } from '../scheme/scheme.ts'
import { row, time } from './measure.ts'

export function schemeInTime(): void {
  console.log('\nA whole scheme')
  row(
    'scheme, numbers alone',
    time(() => calculateScheme(sorrelthwaite)),
    1000,
  )
  row(
    'scheme, with working and cautions',
    time(() => solveScheme(sorrelthwaite)),
  )
  row(
    'scheme, first-order uncertainty, 12 inputs',
    time(() => schemeUncertainty(sorrelthwaite, sorrelthwaiteUncertainties), { runs: 5, milliseconds: 150 }),
    30_000,
  )
}
