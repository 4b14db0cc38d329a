import { CalculationError } from '../errors.ts'
import { say } from '../units/format.ts'
import { velocityHead } from './friction-factor.ts'
import type { Section, SectionLoss } from './penstock-flow.ts'

export interface ProfilePoint {
  distance: number
  elevation: number
}

/** What the sum of the sections' lengths may be off by rounding. */
const rounding = 1e-9

/** Throws where a profile does not start at the intake, goes back, or passes the pipe's end. */
export const checkProfile = (profile: readonly ProfilePoint[], pipeLength: number): void =>
  profile.forEach(({ distance }, i) => {
    const refuse = (message: string) => {
      throw new CalculationError('inconsistent', `profile[${i}].distance`, message)
    }
    if (i === 0 && distance !== 0) refuse('The profile starts at the intake: give its first point the distance 0 m.')
    if (i > 0 && !(distance > profile[i - 1]!.distance))
      refuse(`Point ${i + 1} of the profile must lie further down the pipe than the one before it.`)
    if (distance > pipeLength * (1 + rounding))
      refuse(
        `Point ${i + 1} of the profile lies past the end of the pipe, which is ${say(pipeLength, 'length', 'm')} long.`,
      )
  })

/** Elevation at a distance, linear between the points of the profile; undefined past its last one. */
const elevationAt = (profile: readonly ProfilePoint[], distance: number): number | undefined => {
  const i = profile.findIndex((point) => point.distance >= distance * (1 - rounding))
  if (i < 0) return undefined
  const to = profile[i]!
  if (i === 0) return to.elevation
  const from = profile[i - 1]!
  return from.elevation + ((to.elevation - from.elevation) * (distance - from.distance)) / (to.distance - from.distance)
}

interface GradePoint {
  distance: number
  energyHead: number
  hydraulicGrade: number
  pressureHead?: number
}

/**
 * Energy head and hydraulic grade at the ends of the sections and at the points of the profile, above the nozzle. A section's loss is
 * spread evenly over its length; at a joint the velocity is that of the section which ends there.
 */
export const gradeLineOf = (
  grossHead: number,
  pipes: readonly Section[],
  losses: readonly SectionLoss[],
  profile: readonly ProfilePoint[],
): GradePoint[] => {
  const points: GradePoint[] = []
  const add = (distance: number, energyHead: number, velocity: number) => {
    const hydraulicGrade = energyHead - velocityHead(velocity)
    const elevation = elevationAt(profile, distance)
    points.push({
      distance,
      energyHead,
      hydraulicGrade,
      ...(elevation === undefined ? {} : { pressureHead: hydraulicGrade - elevation }),
    })
  }
  let start = 0
  let energyHead = grossHead
  add(0, grossHead, losses[0]!.velocity)
  pipes.forEach(({ length }, i) => {
    const { velocity, frictionLoss, fittingsLoss } = losses[i]!
    const loss = frictionLoss + fittingsLoss
    for (const { distance } of profile)
      if (distance > start && distance < start + length)
        add(distance, energyHead - (loss * (distance - start)) / length, velocity)
    start += length
    energyHead -= loss
    add(start, energyHead, velocity)
  })
  return points
}
