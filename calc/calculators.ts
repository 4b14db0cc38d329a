import type { CalculatorDefinition } from './definition.ts'
import { alternator } from './electrical/alternator.ts'
import { beltDrive } from './jet/belt-drive.ts'
import { jet } from './jet/jet.ts'
import { runner } from './jet/runner.ts'
import { settlingBasin } from './leat/settling-basin.ts'
import { spillway } from './leat/spillway.ts'
import { collapse } from './pipe/collapse.ts'
import { fillAndVent } from './pipe/fill-and-vent.ts'
import { fittings } from './pipe/fittings.ts'
import { friction } from './pipe/friction.ts'
import { gaugeRange } from './pipe/gauge-range.ts'
import { gaugeReading } from './pipe/gauge-reading.ts'
import { hoopStress } from './pipe/hoop-stress.ts'
import { penstock } from './pipe/penstock.ts'
import { pipeMovement } from './pipe/pipe-movement.ts'
import { pressureClass } from './pipe/pressure-class.ts'
import { surge } from './pipe/surge.ts'
import { sweptBend } from './pipe/swept-bend.ts'
import { thrust } from './pipe/thrust.ts'
import { flowByBucket } from './site/flow-by-bucket.ts'
import { flowByFloat } from './site/flow-by-float.ts'
import { flowByRectangularWeir } from './site/flow-by-rectangular-weir.ts'
import { flowBySalt } from './site/flow-by-salt.ts'
import { flowByVNotch } from './site/flow-by-v-notch.ts'
import { headByGauge } from './site/head-by-gauge.ts'
import { headByLevels } from './site/head-by-levels.ts'
import { annualEnergy } from './water/annual-energy.ts'
import { energyValue } from './water/energy-value.ts'
import { flowDuration } from './water/flow-duration.ts'
import { loadDay } from './water/load-day.ts'
import { power } from './water/power.ts'
import { cable } from './electrical/cable.ts'
import { cableChoice } from './electrical/cable-choice.ts'
import { dumpLoad } from './electrical/dump-load.ts'
import { openChannel } from './leat/open-channel.ts'
import { screen } from './leat/screen.ts'
import { submergence } from './leat/submergence.ts'
import { bucket } from './jet/bucket.ts'
import { needle } from './jet/needle.ts'
import { nozzleSet } from './jet/nozzle-set.ts'
import { bestPowerFlow } from './pipe/best-power-flow.ts'
import { economicDiameter } from './pipe/economic-diameter.ts'
import { hazenWilliams } from './pipe/hazen-williams.ts'
import { pipeProfile } from './pipe/pipe-profile.ts'
import { pipeChoice } from './pipe/pipe-choice.ts'
import { water } from './water/water.ts'

/** Every calculator by its id, in the order of the water. */
export const calculators = {
  water,
  power,
  'flow-duration': flowDuration,
  'annual-energy': annualEnergy,
  'energy-value': energyValue,
  'load-day': loadDay,
  'head-by-levels': headByLevels,
  'head-by-gauge': headByGauge,
  'flow-by-bucket': flowByBucket,
  'flow-by-v-notch': flowByVNotch,
  'flow-by-rectangular-weir': flowByRectangularWeir,
  'flow-by-float': flowByFloat,
  'flow-by-salt': flowBySalt,
  'open-channel': openChannel,
  screen,
  submergence,
  'settling-basin': settlingBasin,
  spillway,
  friction,
  'hazen-williams': hazenWilliams,
  fittings,
  penstock,
  'pipe-profile': pipeProfile,
  'pipe-choice': pipeChoice,
  'economic-diameter': economicDiameter,
  'best-power-flow': bestPowerFlow,
  'pressure-class': pressureClass,
  'hoop-stress': hoopStress,
  surge,
  collapse,
  thrust,
  'swept-bend': sweptBend,
  'gauge-range': gaugeRange,
  'gauge-reading': gaugeReading,
  'fill-and-vent': fillAndVent,
  'pipe-movement': pipeMovement,
  jet,
  'nozzle-set': nozzleSet,
  needle,
  runner,
  bucket,
  'belt-drive': beltDrive,
  alternator,
  cable,
  'cable-choice': cableChoice,
  'dump-load': dumpLoad,
} as const satisfies Record<string, CalculatorDefinition>

export type CalculatorId = keyof typeof calculators
