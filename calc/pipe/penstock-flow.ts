import { g } from '../constants.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { pipeLoss, velocityHead } from './friction-factor.ts'

/** Flow and loss in a penstock of sections in series: what every calculator of a whole penstock builds on. SI. */

export interface Section {
  length: number
  insideDiameter: number
  roughness: number
  /** Sum of the fittings' loss coefficients on this section's velocity. */
  totalK: number
  /** Like pipes side by side; the flow is shared equally. */
  parallel: number
}

export interface SectionLoss {
  /** In each pipe. */
  velocity: number
  reynolds: number
  /** Absent in standing water. */
  frictionFactor?: number
  frictionLoss: number
  fittingsLoss: number
}

export const sectionLoss = (flow: number, section: Section, kinematicViscosity: number): SectionLoss => {
  const { headLoss, ...inPipe } = pipeLoss(flow / section.parallel, section, kinematicViscosity)
  return { ...inPipe, frictionLoss: headLoss, fittingsLoss: section.totalK * velocityHead(inPipe.velocity) }
}

const headLoss = (flow: number, sections: readonly Section[], kinematicViscosity: number): number => {
  let sum = 0
  for (const section of sections) {
    const { frictionLoss, fittingsLoss } = sectionLoss(flow, section, kinematicViscosity)
    sum += frictionLoss + fittingsLoss
  }
  return sum
}

/**
 * The flow Q = a·√(2g·(gross head − loss(Q))) that a discharging area a = Σ Cd·A of open nozzles draws through a penstock, to 1e-13. The
 * frictionless flow a·√(2gH) is its upper bound; since the loss goes nearly with Q², one step from there lands close to the root.
 */
export const flowThroughNozzles = (
  grossHead: number,
  sections: readonly Section[],
  dischargingArea: number,
  kinematicViscosity: number,
): number => {
  const perFlowSquared = 1 / (2 * g * dischargingArea ** 2)
  const headLeft = (flow: number) =>
    grossHead - headLoss(flow, sections, kinematicViscosity) - perFlowSquared * flow * flow
  const frictionless = dischargingArea * Math.sqrt(2 * g * grossHead)
  const close = frictionless * Math.sqrt(grossHead / (grossHead - headLeft(frictionless)))
  const [low, high] = headLeft(close) < 0 ? [0, close] : [close, frictionless]
  // The ends bracket a root: head is left over without flow, and none at the frictionless flow.
  return bracketedRoot(headLeft, low, high, { tolerance: 1e-13 })!
}
