import { g } from '../constants.ts'

/** Friction in a full round pipe: what every calculator of a pipe builds on. SI. */

/** Up to this Reynolds number flow is laminar. */
export const laminarTo = 2000
/** From this Reynolds number on Colebrook and White's formula holds. */
export const turbulentFrom = 4000

export type Regime = 'laminar' | 'transition' | 'turbulent'

export const regimeOf = (reynolds: number): Regime =>
  reynolds <= laminarTo ? 'laminar' : reynolds < turbulentFrom ? 'transition' : 'turbulent'

const perDecade = 2 / Math.LN10

/**
 * Darcy friction factor by C. F. Colebrook, J. Inst. Civ. Eng. 11 (1939) 133: 1/√f = −2·log₁₀(ε/(3.7 D) + 2.51/(Re √f)), solved for 1/√f to
 * 1e-12 by Halley's method from the explicit formula of S. E. Haaland, J. Fluids Eng. 105 (1983) 89.
 */
const colebrook = (reynolds: number, relativeRoughness: number): number => {
  const rough = relativeRoughness / 3.7
  const smooth = 2.51 / reynolds
  let x = -0.9 * perDecade * Math.log(rough ** 1.11 + 6.9 / reynolds)
  for (let i = 0; i < 20; i++) {
    const inside = rough + smooth * x
    const share = smooth / inside
    const value = x + perDecade * Math.log(inside)
    const slope = 1 + perDecade * share
    const step = value / (slope + (value * perDecade * share * share) / (2 * slope))
    x -= step
    if (Math.abs(step) <= 1e-13 * x) break
  }
  return 1 / (x * x)
}

/** How f changes with the Reynolds number by Colebrook and White, on logarithmic scales: d ln f / d ln Re. */
const colebrookSlope = (reynolds: number, relativeRoughness: number, f: number): number => {
  const smooth = 2.51 / (reynolds * Math.sqrt(f))
  const share = smooth / (relativeRoughness / 3.7 + smooth)
  const c = perDecade * Math.sqrt(f) * share
  return (-2 * c) / (1 + c)
}

const lnTransition = Math.log(turbulentFrom / laminarTo)

/**
 * Between laminar and turbulent flow no formula holds. Head loss, which goes with f·Re², is joined there by one cubic of its logarithm
 * in the logarithm of Re that meets both sides in value and in slope. Its end slopes lie between 0 and three times the mean slope, so the
 * head loss rises with the flow all the way (F. N. Fritsch & R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238).
 */
const transition = (reynolds: number, relativeRoughness: number): number => {
  const f = colebrook(turbulentFrom, relativeRoughness)
  const below = Math.log(64 * laminarTo)
  const above = Math.log(f * turbulentFrom ** 2)
  const slopeBelow = lnTransition
  const slopeAbove = lnTransition * (2 + colebrookSlope(turbulentFrom, relativeRoughness, f))
  const s = Math.log(reynolds / laminarTo) / lnTransition
  const r = 1 - s
  const lnLoss = below * r * r * (1 + 2 * s) + above * s * s * (1 + 2 * r) + s * r * (slopeBelow * r - slopeAbove * s)
  return Math.exp(lnLoss) / (reynolds * reynolds)
}

/**
 * Darcy friction factor of a full round pipe for a Reynolds number above 0 and a roughness of 0 to half of the diameter:
 * 64/Re to Re 2000, Colebrook–White from Re 4000, a smooth monotone join between.
 */
export const frictionFactor = (reynolds: number, relativeRoughness: number): number => {
  if (reynolds <= laminarTo) return 64 / reynolds
  if (reynolds < turbulentFrom) return transition(reynolds, relativeRoughness)
  return colebrook(reynolds, relativeRoughness)
}

/** Mean velocity of a flow through a round bore. */
export const boreVelocity = (flow: number, insideDiameter: number): number =>
  (4 * flow) / (Math.PI * insideDiameter ** 2)

/** v²/2g. */
export const velocityHead = (velocity: number): number => velocity ** 2 / (2 * g)

export interface Pipe {
  insideDiameter: number
  length: number
  /** Absolute. */
  roughness: number
}

export interface PipeLoss {
  velocity: number
  reynolds: number
  /** Absent in standing water. */
  frictionFactor?: number
  headLoss: number
}

/** Below this Reynolds number water stands: the squares that follow would leave the range of a number. */
const standingWater = 1e-100

/** Head lost to friction along a pipe by Darcy and Weisbach: f·(L/D)·v²/2g. */
export const pipeLoss = (
  flow: number,
  { insideDiameter, length, roughness }: Pipe,
  kinematicViscosity: number,
): PipeLoss => {
  const velocity = boreVelocity(flow, insideDiameter)
  const reynolds = (velocity * insideDiameter) / kinematicViscosity
  if (reynolds < standingWater) return { velocity, reynolds, headLoss: 0 }
  const f = frictionFactor(reynolds, roughness / insideDiameter)
  return {
    velocity,
    reynolds,
    frictionFactor: f,
    headLoss: ((f * length) / insideDiameter) * velocityHead(velocity),
  }
}
