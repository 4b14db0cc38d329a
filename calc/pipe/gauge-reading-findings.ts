/**
 * Two readings agree within this share of the static pressure: a gauge of class 1.6 read at two thirds of its scale may be wrong by 2.4 % of
 * the reading, and the needle is read to a little less than 1 %. Common practice, no source.
 */
export const readingTolerance = 0.03
/**
 * Two powers agree within this share: through one nozzle power goes with the net head to the power 1.5, so that a head 3 % off makes 4.5 %.
 * Common practice, no source.
 */
const powerTolerance = 0.05

type Against = 'low' | 'right' | 'high'

const against = (read: number, expected: number, tolerance: number): Against =>
  read < expected - tolerance ? 'low' : read > expected + tolerance ? 'high' : 'right'

export interface Finding {
  cause: string
  why: string
  check: string
}

export interface Readings {
  staticPressure: number
  runningPressure: number
  predictedStatic?: number
  expectedPower?: number
  measuredPower?: number
}

const staticLow: Finding[] = [
  { cause: 'Forebay down', why: 'Static low.', check: 'Look whether the forebay stands at its overflow.' },
  {
    cause: 'Leak in the pipe',
    why: 'Static low.',
    check: 'Walk the line for wet ground; shut the foot and see whether the forebay falls.',
  },
  {
    cause: 'Valve passing',
    why: 'Static low: water still runs.',
    check: 'Listen at the shut valve and look for a drip at the nozzle.',
  },
  { cause: 'Air locked in a hump', why: 'Static low.', check: 'Bleed the high points slowly, then read again.' },
  {
    cause: 'The gauge',
    why: 'Static low.',
    check: 'Try a second gauge; look at the first one’s zero with the pressure let off.',
  },
]

const pipeHeldBack = (why: string): Finding[] => [
  { cause: 'Screen blocked', why, check: 'Clean the screen; look whether the water behind it stands lower.' },
  { cause: 'Air in the pipe', why, check: 'Look for air drawn in at the intake; bleed the high points.' },
  { cause: 'Valve part shut', why, check: 'See that every valve on the line is right open.' },
  {
    cause: 'Slime in the pipe',
    why,
    check: 'Flush or swab the pipe, and read again; compare the logbook over months.',
  },
]

const nozzleTooWide = (why: string): Finding[] => [
  { cause: 'Nozzle worn or too large', why, check: 'Shut off, let the pressure off, and measure the nozzle’s bore.' },
]

const nozzleBlocked = (why: string): Finding[] => [
  {
    cause: 'Nozzle blocked',
    why,
    check: 'Shut off, let the pressure off, and look into the nozzle for a stone or leaves.',
  },
]

/** What the needle's own movement tells; no number says it, so it is always listed. */
const whileWatching: Finding[] = [
  {
    cause: 'Air in the pipe',
    why: 'If the needle pulses.',
    check: 'Bleed the high points; see that the intake is deep enough under water.',
  },
  {
    cause: 'Forebay emptying',
    why: 'If the running reading falls slowly.',
    check: 'Compare the flow taken with the flow that comes.',
  },
]

/**
 * Causes by the readings. The running pressure is judged against the static one as read, less the fall predicted (loss and velocity head, Pa):
 * what stands is then not mistaken for what runs. Without a prediction to judge by, a reading counts as neither low nor high; without powers
 * the causes are listed with what would part them.
 */
export const findingsFor = (
  { staticPressure, runningPressure, predictedStatic, expectedPower, measuredPower }: Readings,
  predictedFall: number | undefined,
): Finding[] => {
  const tolerance = readingTolerance * (predictedStatic ?? staticPressure)
  const atRest = predictedStatic === undefined ? undefined : against(staticPressure, predictedStatic, tolerance)
  const running =
    predictedFall === undefined ? undefined : against(runningPressure, staticPressure - predictedFall, tolerance)
  const power =
    expectedPower === undefined || measuredPower === undefined
      ? undefined
      : against(measuredPower, expectedPower, powerTolerance * expectedPower)

  const staticIsRight = atRest === undefined ? '' : 'Static right, '
  const pressure = (word: Against) => (staticIsRight === '' ? `Running ${word}` : `${staticIsRight}running ${word}`)
  return [
    ...(atRest === 'low' ? staticLow : []),
    ...(running === 'low' && atRest !== 'low' && (power === 'low' || power === undefined)
      ? pipeHeldBack(
          power === 'low' ? `${pressure('low')}, power low.` : `${pressure('low')}; if the power is low too.`,
        )
      : []),
    ...(running === 'low' && power !== 'low'
      ? nozzleTooWide(
          power === undefined
            ? 'Running low; if the power is the same or higher.'
            : `Running low, power ${power === 'high' ? 'high' : 'the same'}.`,
        )
      : []),
    ...(running === 'high' && (power === 'low' || power === undefined)
      ? nozzleBlocked(power === 'low' ? 'Running high, power low.' : 'Running high; if the power is low.')
      : []),
    ...whileWatching,
  ]
}
