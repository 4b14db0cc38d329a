import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { airPressureAt } from '../water/atmosphere.ts'
import { waterTemperature } from '../water/inputs.ts'
import { vapourPressure, waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { velocityHead } from './friction-factor.ts'
import { flow, profile } from './inputs.ts'
import { sectionLoss, type Section, type SectionLoss } from './penstock-flow.ts'
import { checkProfile, gradeLineOf, type ProfilePoint } from './penstock-profile.ts'
import { checkSections, sections } from './penstock-sections.ts'

const lengthOf = (pipes: readonly Section[]): number => pipes.reduce((sum, { length }) => sum + length, 0)

/** The greatest velocity at a distance: at a joint that of the narrower pipe, where the pressure is least. */
const velocityAt = (distance: number, pipes: readonly Section[], losses: readonly SectionLoss[]): number => {
  let start = 0
  let velocity = 0
  pipes.forEach(({ length }, i) => {
    const end = start + length
    if (distance >= start && distance <= end) velocity = Math.max(velocity, losses[i]!.velocity)
    start = end
  })
  return velocity
}

/** High points between both ends: the last point of each stretch that the pipe climbs to and falls from, for the water carries the air along. */
const highPointsOf = (points: readonly ProfilePoint[]): readonly number[] => {
  const found: number[] = []
  let hasClimbed = false
  for (let i = 1; i < points.length; i++) {
    const rise = points[i]!.elevation - points[i - 1]!.elevation
    if (rise < 0 && hasClimbed) found.push(i - 1)
    if (rise !== 0) hasClimbed = rise > 0
  }
  return found
}

/** How far the pressure may fall under that of the air before the water boils, as a head. */
const suctionLimit = (altitude: number, celsius: number): number =>
  (airPressureAt(altitude) - vapourPressure(celsius)) / (waterDensity(celsius) * g)

/**
 * Pressure along a pipe that lies as its profile says, as head of water over the air's: at rest, intake level − z, and running, intake level −
 * losses up to there − v²/2g − z (the energy equation). Heights z are above any one level. SI. A section's loss, fittings included, is spread
 * evenly over its length; at a joint the faster water counts. The pressure cannot fall under the water's vapour pressure (IAPWS-IF97) in the
 * standard atmosphere at the altitude (ISO 2533). Valid for full pipes and steady flow, siphons included. Refused: a profile that does not
 * start at 0, goes back or passes the pipe's end.
 */
export const pipeProfile = defineCalculator({
  id: 'pipe-profile',
  station: 'pipe',
  title: 'Pressure along the pipe',
  summary: 'Where on the hillside the pressure is least and greatest, at rest and running, and where air gathers.',
  hazards: ['pressure'],
  inputs: {
    profile: {
      ...profile,
      help: 'from the intake down: distance along the pipe and height of the pipe’s middle, all heights above the same level',
      initial: [
        { distance: 0, elevation: 47.2 },
        { distance: 45, elevation: 41 },
        { distance: 90, elevation: 43.5 },
        { distance: 160, elevation: 19 },
        { distance: 240, elevation: 0 },
      ],
    },
    sections,
    flow: { ...flow, initial: 0.0095 },
    intakeLevel: {
      kind: 'scalar',
      symbol: 'z_0',
      label: 'Water level at the intake',
      quantity: 'head',
      help: 'the lowest at which the plant works, above the same level as the profile',
      range: [-2000, 9000],
      initial: 48,
    },
    altitude: {
      kind: 'scalar',
      symbol: 'H_a',
      label: 'Altitude',
      quantity: 'head',
      help: 'of the site above the sea; the air is thinner higher up, and a siphon can lift less',
      range: [-500, 9000],
      usual: [0, 4500],
      fallback: 0,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    minimumRunningHead: {
      kind: 'scalar',
      symbol: 'p_m',
      label: 'Least pressure head, running',
      quantity: 'head',
      help: 'over the pressure of the air',
    },
    itsDistance: { kind: 'scalar', symbol: 's_m', label: 'Where it is', quantity: 'length', unit: 'm' },
    points: {
      kind: 'rows',
      label: 'Pressure heads',
      columns: {
        distance: { kind: 'scalar', symbol: 's', label: 'Distance', quantity: 'length', unit: 'm' },
        staticHead: { kind: 'scalar', label: 'At rest', quantity: 'head' },
        runningHead: { kind: 'scalar', label: 'Running', quantity: 'head' },
      },
    },
    highestStaticHead: {
      kind: 'rows',
      label: 'Greatest pressure head at rest in each section',
      columns: {
        section: { kind: 'scalar', label: 'Section', quantity: 'count' },
        highestStaticHead: { kind: 'scalar', label: 'Pressure head', quantity: 'head' },
        distance: { kind: 'scalar', symbol: 's', label: 'Distance', quantity: 'length', unit: 'm' },
      },
    },
    airValvePoints: {
      kind: 'rows',
      label: 'High points, where air gathers',
      columns: {
        distance: { kind: 'scalar', symbol: 's', label: 'Distance', quantity: 'length', unit: 'm' },
        elevation: { kind: 'scalar', symbol: 'z', label: 'Height of the pipe', quantity: 'head' },
        runningHead: { kind: 'scalar', label: 'Pressure head, running', quantity: 'head' },
      },
    },
  },
  solve({ profile, sections, flow, intakeLevel, waterTemperature }) {
    checkSections(sections)
    checkProfile(profile, lengthOf(sections))
    const viscosity = waterKinematicViscosity(waterTemperature)
    const losses = sections.map((section) => sectionLoss(flow, section, viscosity))
    const points = gradeLineOf(intakeLevel, sections, losses, profile).flatMap(
      ({ distance, energyHead, hydraulicGrade, pressureHead }) => {
        if (pressureHead === undefined) return []
        const elevation = hydraulicGrade - pressureHead
        return [
          {
            distance,
            staticHead: intakeLevel - elevation,
            runningHead: energyHead - velocityHead(velocityAt(distance, sections, losses)) - elevation,
          },
        ]
      },
    )
    const least = points.reduce((least, point) => (point.runningHead < least.runningHead ? point : least))
    let end = 0
    const highestStaticHead = sections.flatMap(({ length }, i) => {
      const start = end
      end += length
      const within = points.filter(({ distance }) => distance >= start && distance <= end)
      if (within.length === 0) return []
      const { distance, staticHead } = within.reduce((most, point) =>
        point.staticHead > most.staticHead ? point : most,
      )
      return [{ section: i + 1, highestStaticHead: staticHead, distance }]
    })
    return {
      minimumRunningHead: least.runningHead,
      itsDistance: least.distance,
      points,
      highestStaticHead,
      airValvePoints: highPointsOf(profile).map((i) => {
        const { distance, elevation } = profile[i]!
        return { distance, elevation, runningHead: points.findLast((point) => point.distance <= distance)!.runningHead }
      }),
    }
  },
  working(write, given, { points, minimumRunningHead, itsDistance }) {
    const { sections, flow, intakeLevel, waterTemperature } = given
    const losses = sections.map((section) => sectionLoss(flow, section, waterKinematicViscosity(waterTemperature)))
    const velocity = velocityAt(itsDistance, sections, losses)
    const atRest = points.find(({ distance }) => distance === itsDistance)!.staticHead
    const v = { symbol: 'v', value: velocity, say: 'the water’s speed there' }
    const z = { symbol: 'z', value: intakeLevel - atRest, say: 'the height of the pipe there' }
    const lost = {
      symbol: 'h',
      value: atRest - velocityHead(velocity) - minimumRunningHead,
      say: 'the head lost up to there',
    }
    const head = {
      symbol: 'p_0',
      value: atRest,
      say: 'the pressure head at rest there',
    }
    return [
      {
        say: 'At every point the water at rest presses by its height up to the level at the intake. Running, the head lost on the way and the head of its speed are missing. The least of all points lies here.',
        gives: 'itsDistance',
      },
      { say: 'At rest, there.', formula: write`${'intakeLevel'} - ${z} = ${{ ...head, unit: 'm' }}` },
      {
        say: 'Running, there.',
        formula: write`${'minimumRunningHead'} = ${head} - ${lost} - \frac{${v}^2}{2 \, ${gravity}}`,
        gives: 'minimumRunningHead',
      },
      {
        say: 'The water boils, and its column parts, where the pressure falls so far under that of the air.',
        formula: write`\frac{${{ symbol: 'p_a', value: airPressureAt(given.altitude), say: 'the pressure of the air' }} - ${{ symbol: 'p_v', value: vapourPressure(waterTemperature), say: 'the vapour pressure' }}}{${{ symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }} \, ${gravity}} = ${{ symbol: 'p_l', value: suctionLimit(given.altitude, waterTemperature), say: 'the suction limit', unit: 'm' }}`,
      },
    ]
  },
  cautions(
    { profile, sections, altitude, waterTemperature },
    { points, minimumRunningHead, itsDistance, airValvePoints },
  ) {
    const where = `${join(format(itsDistance, 'length', { unit: 'm' }))} from the intake`
    const limit = suctionLimit(altitude, waterTemperature)
    const atRest = Math.max(...points.map(({ staticHead }) => staticHead))
    const overIntake = points.some(({ staticHead }) => staticHead < 0)
    return [
      {
        level: 'check',
        about: ['highestStaticHead'],
        hazard: 'pressure',
        say: `With the valve shut ${join(format(Math.max(0, atRest) * waterDensity(waterTemperature) * g, 'pressure'))} stands at the lowest point, and a closing valve or a blocked nozzle adds to it. Pipe, joints and anchors must be rated for both by the pipe maker’s data and local code.`,
      },
      ...(minimumRunningHead < 0
        ? [
            {
              level: 'stop' as const,
              about: ['minimumRunningHead' as const, 'profile' as const],
              hazard: 'pressure' as const,
              say: `Running, the pressure ${where} is below that of the air: joints draw air in, and a thin pipe can collapse. Lay it lower there, or widen the pipe above it; a siphon needs a wall that stands the vacuum, joints that hold it, and a way to prime it.`,
            },
          ]
        : []),
      ...(minimumRunningHead <= -limit
        ? [
            {
              level: 'stop' as const,
              about: ['minimumRunningHead' as const, 'flow' as const],
              say: `The pressure ${where} would fall by more than the ${join(format(limit, 'head'))} at which this water boils there: the column parts, and this flow cannot run. Weather lowers the limit by up to 0.3 m more.`,
            },
          ]
        : []),
      ...(overIntake
        ? [
            {
              level: 'check' as const,
              about: ['profile' as const, 'intakeLevel' as const],
              say: 'The pipe rises over the water at the intake: a siphon. It must be primed, it draws air as soon as the level falls to its mouth, and it breaks when the flow stops unless both ends stay under water. Keep the lift well under the limit in the working.',
            },
          ]
        : []),
      ...(airValvePoints.length > 0
        ? [
            airValvePoints.every(({ runningHead }) => runningHead > 0)
              ? {
                  level: 'check' as const,
                  about: ['airValvePoints' as const],
                  say: 'Air gathers at the high points and chokes the flow: fit an air valve or a riser at each, or lay the pipe so that it falls all the way.',
                }
              : {
                  level: 'check' as const,
                  about: ['airValvePoints' as const],
                  say: 'Air gathers at the high points. Where the running pressure is below that of the air, an ordinary air valve lets air in instead of out: such a summit needs a vacuum pump or a priming pot.',
                },
          ]
        : []),
      ...(profile.at(-1)!.distance < lengthOf(sections) * (1 - 1e-9)
        ? [
            {
              level: 'check' as const,
              about: ['profile' as const],
              say: 'The profile ends before the pipe does: nothing is said about the rest of it.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'the pressure of surge, which goes below the running pressure as well as above the static one',
    'heights between the points of the profile, where the ground may do otherwise',
    'steep falls after flat stretches, where air valves may be wanted too',
    'how the loss lies within a section: an entrance or a valve takes its part at its own place',
  ],
  example: {
    say: 'Over Quern: a siphon over the dam, a flat bench, then down steeply in narrower pipe.',
    inputs: {
      profile: [
        { distance: 0, elevation: 211.4 },
        { distance: 9, elevation: 214.1 },
        { distance: 60, elevation: 205 },
        { distance: 310, elevation: 196 },
        { distance: 420, elevation: 199.5 },
        { distance: 600, elevation: 138 },
        { distance: 730, elevation: 109 },
      ],
      sections: [
        { length: 420, insideDiameter: 0.1322, roughness: 5e-5, totalK: 1.6, parallel: 1 },
        { length: 310, insideDiameter: 0.1108, roughness: 5e-5, totalK: 0.6, parallel: 1 },
      ],
      flow: 0.0136,
      intakeLevel: 213,
      altitude: 640,
      waterTemperature: 6,
    },
  },
  plots: [
    {
      say: 'The pressure at rest follows the ground; running, the pipe has taken its share.',
      rows: 'points',
      x: 'distance',
      y: ['staticHead', 'runningHead'],
    },
  ],
  sources: [
    { author: 'ISO', title: 'ISO 2533, Standard Atmosphere', year: 1975 },
    { author: 'IAPWS', title: 'R7-97, Industrial Formulation 1997, region 4', year: 2012 },
    {
      author: 'AWWA',
      title: 'M51, Air Valves: Air-Release, Air/Vacuum and Combination',
      year: 2016,
      where: 'valves at high points (from memory)',
    },
  ],
})
