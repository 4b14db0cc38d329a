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
  const { velocity, reynolds, frictionFactor, headLoss } = pipeLoss(
    flow / section.parallel,
    section,
    kinematicViscosity,
  )
  return {
    velocity,
    reynolds,
    ...(frictionFactor === undefined ? {} : { frictionFactor }),
    frictionLoss: headLoss,
    fittingsLoss: section.totalK * velocityHead(velocity),
  }
}

/** Without a row for each section: the root below asks this again and again. */
const headLossOf = (flow: number, sections: readonly Section[], kinematicViscosity: number): number => {
  let sum = 0
  for (const section of sections) {
    const { velocity, headLoss } = pipeLoss(flow / section.parallel, section, kinematicViscosity)
    sum += headLoss + section.totalK * velocityHead(velocity)
  }
  return sum
}

/**
 * The flow Q = a·√(2g·(gross head − loss(Q))) that a discharging area a = Σ Cd·A of open nozzles draws through a penstock, to 1e-10. The
 * root is sought over Q², in which the head used up is nearly a straight line.
 */
export const flowThroughNozzles = (
  grossHead: number,
  sections: readonly Section[],
  dischargingArea: number,
  kinematicViscosity: number,
): number => {
  const perSquare = 1 / (2 * g * dischargingArea ** 2)
  const headLeft = (squaredFlow: number) =>
    grossHead - headLossOf(Math.sqrt(squaredFlow), sections, kinematicViscosity) - perSquare * squaredFlow
  // All the head is left over without flow; a hair above the flow without friction there is too little, whatever rounding does.
  const withoutFriction = grossHead / perSquare
  return Math.sqrt(bracketedRoot(headLeft, 0, withoutFriction * (1 + 1e-9), { tolerance: 1e-10 })!)
}
