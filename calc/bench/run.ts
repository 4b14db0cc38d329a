/**
 * Speed of the library: each calculator against the figure of its kind, a whole scheme, and head loss in one pipe beside two other ways. Ends with an error
 * where a figure is missed or the three ways disagree.
 */
import { calculatorsInTime } from './calculators.ts'
import { headLossThreeWays } from './head-loss.ts'
import { failures } from './measure.ts'
import { schemeInTime } from './scheme.ts'

calculatorsInTime()
schemeInTime()
await headLossThreeWays()

if (failures.length > 0) {
  console.error(`\nMissed:\n  ${failures.join('\n  ')}`)
  process.exit(1)
}
