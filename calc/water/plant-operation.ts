import { g } from '../constants.ts'
import { CalculationError } from '../errors.ts'
import { waterDensity } from './properties.ts'

interface PartFlowPoint {
  flowFraction: number
  efficiency: number
}

/** The share of the peak efficiency at a share of the design flow: linear between the points, flat outside; all of it without points. */
export const shareOfPeak = (points: readonly PartFlowPoint[], flowFraction: number): number => {
  if (points.length === 0) return 1
  let below = points[0]!
  for (const above of points) {
    if (above.flowFraction >= flowFraction) {
      const width = above.flowFraction - below.flowFraction
      return width === 0
        ? above.efficiency
        : below.efficiency + ((above.efficiency - below.efficiency) * (flowFraction - below.flowFraction)) / width
    }
    below = above
  }
  return below.efficiency
}

export const rising = (points: readonly PartFlowPoint[]): PartFlowPoint[] =>
  points.toSorted((a, b) => a.flowFraction - b.flowFraction)

/** A flow that was worked out misses the one written down by a last bit or two: 0.013 less 0.003 still fills 0.01. */
const fills = (flow: number, wanted: number): boolean => flow >= wanted * (1 - 1e-9)

/** The greatest of rising steps that a flow fills; nothing below the first. */
const stepBelow = (steps: readonly number[], flow: number): number => {
  let step = 0
  for (const next of steps) if (fills(flow, next)) step = next
  return step
}

interface Plant {
  residualFlow: number
  designFlow: number
  minimumFlow: number
  grossHead: number
  lossAtDesign: number
  peakEfficiency: number
  takeShare: number
  waterTemperature: number
  partFlowEfficiency?: readonly PartFlowPoint[]
  nozzleSteps?: readonly number[]
}

/** What the plant takes from a flow of the stream, and the power that this gives. */
export const operation = (plant: Plant) => {
  const { residualFlow, designFlow, minimumFlow, grossHead, lossAtDesign, peakEfficiency, takeShare } = plant
  const points = rising(plant.partFlowEfficiency ?? [])
  const steps = plant.nozzleSteps?.toSorted((a, b) => a - b)
  const weight = waterDensity(plant.waterTemperature) * g
  return {
    takeOf: (flow: number): number => {
      const take = Math.min(designFlow, takeShare * (flow - residualFlow))
      if (take <= 0 || !fills(take, minimumFlow)) return 0
      return steps ? stepBelow(steps, take) : take
    },
    powerOf: (take: number): number => {
      const part = take / designFlow
      return weight * take * (grossHead - lossAtDesign * part ** 2) * peakEfficiency * shareOfPeak(points, part)
    },
  }
}

/** Refuses two efficiencies at one share of the design flow. */
export const checkPoints = (points: readonly PartFlowPoint[] = []): void => {
  const known = new Map<number, number>()
  points.forEach(({ flowFraction, efficiency }, i) => {
    if ((known.get(flowFraction) ?? efficiency) !== efficiency)
      throw new CalculationError(
        'inconsistent',
        `partFlowEfficiency[${i}].flowFraction`,
        'This share of the design flow stands there already with another efficiency: leave one of them out.',
      )
    known.set(flowFraction, efficiency)
  })
}
