import { bendRadius } from './bend-radius.ts'
import { conductors } from './conductors.ts'
import { expansion } from './expansion.ts'
import { fittings } from './fittings.ts'
import { gauges } from './gauges.ts'
import { hazenWilliams } from './hazen-williams.ts'
import { manning } from './manning.ts'
import { moduli } from './moduli.ts'
import { pePipe } from './pe-pipe.ts'
import { roughness } from './roughness.ts'
import type { Table, TableId } from './table.ts'
import { temperatureFactor } from './temperature-factor.ts'
import { water } from './water.ts'

/** Every table by its id, in the order of the water. */
export const tables: Readonly<Record<TableId, Table>> = {
  water,
  manning,
  'pe-pipe': pePipe,
  'temperature-factor': temperatureFactor,
  roughness,
  'hazen-williams': hazenWilliams,
  fittings,
  gauges,
  expansion,
  moduli,
  'bend-radius': bendRadius,
  conductors,
}
