import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { writeFormula, type Aside, type Formula } from '../formula.ts'
import { format, join } from '../units/format.ts'
import { alternatorInputs } from './alternator-inputs.ts'

const secondsPerMinute = 60
const thousand = 1000

type Output = (typeof alternatorInputs.output.of)[number]

/** Direct voltage behind the output's rectifier for one volt (rms) before it: at its peak without load, as a mean under load. */
const behindRectifier = {
  dc: { open: 1, loaded: 1, drops: 0 },
  'three-phase-line': { open: Math.SQRT2, loaded: 1.35, drops: 1 },
  'single-phase': { open: Math.SQRT2, loaded: (2 * Math.SQRT2) / Math.PI, drops: 1 },
} as const satisfies Record<Output, { open: number; loaded: number; drops: 0 | 1 }>

/** What a runaway must leave under the controller's absolute limit; common practice, no source. */
const runawayReserve = 1.1

interface Load {
  output: Output
  current?: number
  effectiveResistance?: number
  diodeDrop: number
}

/** Volts that the load takes away, in the diodes and in the windings; unknown without the resistance. */
const takenByLoad = ({ output, current, effectiveResistance, diodeDrop }: Load): number | undefined =>
  current === undefined || effectiveResistance === undefined
    ? undefined
    : behindRectifier[output].drops * diodeDrop + current * effectiveResistance

/**
 * A permanent-magnet alternator turned by the runner: open-circuit volts go with the speed, k·N/1000 with k measured at 1000 rev/min at the
 * `output` (dc as measured behind the set's own rectifier; line to line; or one phase). Behind a bridge of diodes the direct voltage is √2·V
 * open; under a current I (A, direct) with the effective resistance R (Ω, by load test) 1.35·V − U_d − I·R for three phases and
 * (2√2/π)·V − U_d − I·R for one; dc V − I·R. Frequency p·N/60. Volts rms before, direct behind the rectifier; N in rev/min, the runner's. Valid for fixed
 * magnets; hot magnets and saturation take some per cent. Refused: a greatest controller voltage not over the least (`inconsistent`).
 */
export const alternator = defineCalculator({
  id: 'alternator',
  station: 'alternator',
  title: 'The alternator',
  summary:
    'What volts the runner’s speed gives, under load, open, and running away, and at which speeds the controller works.',
  hazards: ['electricity', 'rotating'],
  inputs: alternatorInputs,
  outputs: {
    openCircuitVoltage: {
      kind: 'scalar',
      symbol: 'V',
      label: 'Open-circuit voltage',
      quantity: 'voltage',
      help: 'as it was measured',
    },
    directVoltageOpen: {
      kind: 'scalar',
      symbol: 'U_o',
      label: 'Direct voltage, open',
      quantity: 'voltage',
      help: 'nothing drawing current',
    },
    directVoltageLoaded: {
      kind: 'scalar',
      symbol: 'U',
      label: 'Direct voltage under load',
      quantity: 'voltage',
      sometimes: true,
    },
    frequency: { kind: 'scalar', symbol: 'f', label: 'Frequency', quantity: 'frequency', sometimes: true },
    runawayVoltage: {
      kind: 'scalar',
      symbol: 'U_r',
      label: 'Direct voltage running away',
      quantity: 'voltage',
      help: 'open, at the runaway speed',
      sometimes: true,
    },
    speedAtMinimum: {
      kind: 'scalar',
      symbol: 'N_1',
      label: 'Runner speed where the controller starts',
      quantity: 'rotation',
      sometimes: true,
    },
    speedAtMaximum: {
      kind: 'scalar',
      symbol: 'N_2',
      label: 'Runner speed at the controller’s limit',
      quantity: 'rotation',
      help: 'open: what it must never pass',
      sometimes: true,
    },
  },
  solve(given) {
    const { voltsPerThousandRpm, output, speed, gearRatio, polePairs, runawayRatio } = given
    const { controllerMinimum, controllerMaximum, current } = given
    if (controllerMaximum <= controllerMinimum)
      throw new CalculationError(
        'inconsistent',
        'controllerMaximum',
        'The controller’s greatest voltage must be over its least: look at its plate or data sheet again.',
      )
    const { open, loaded } = behindRectifier[output]
    /** Volts at the output for each rev/min of the runner. */
    const perTurn = (voltsPerThousandRpm * gearRatio) / thousand
    const openCircuitVoltage = perTurn * speed
    const directVoltageOpen = open * openCircuitVoltage
    const found: {
      openCircuitVoltage: number
      directVoltageOpen: number
      directVoltageLoaded?: number
      frequency?: number
      runawayVoltage?: number
      speedAtMinimum?: number
      speedAtMaximum?: number
    } = { openCircuitVoltage, directVoltageOpen, speedAtMaximum: controllerMaximum / (open * perTurn) }
    const taken = takenByLoad(given)
    if (taken !== undefined) {
      const left = loaded * openCircuitVoltage - taken
      if (left >= 0) found.directVoltageLoaded = left
      found.speedAtMinimum = (controllerMinimum + taken) / (loaded * perTurn)
    } else if (current === undefined) found.speedAtMinimum = controllerMinimum / (open * perTurn)
    if (polePairs !== undefined) found.frequency = (polePairs * speed * gearRatio) / secondsPerMinute
    if (runawayRatio !== undefined) found.runawayVoltage = directVoltageOpen * runawayRatio
    return found
  },
  working(write, given, found) {
    const { output, gearRatio } = given
    const { loaded } = behindRectifier[output]
    const mean: Aside = {
      symbol: output === 'single-phase' ? '\\frac{2\\sqrt{2}}{\\pi}' : '1.35',
      value: loaded,
      say: 'the mean behind a bridge',
    }
    const taken = takenByLoad(given)
    return [
      {
        say:
          gearRatio === 1
            ? 'The magnets are fixed: twice the speed, twice the volts.'
            : 'The gear gives the alternator its speed. The magnets are fixed: twice the speed, twice the volts.',
        formula: write`${'openCircuitVoltage'} = \frac{${'voltsPerThousandRpm'} \, ${'gearRatio'} \, ${'speed'}}{1000}`,
        gives: 'openCircuitVoltage',
      },
      output === 'dc'
        ? {
            say: 'Direct volts stay as they are.',
            formula: write`${'directVoltageOpen'} = ${'openCircuitVoltage'}`,
            gives: 'directVoltageOpen' as const,
          }
        : {
            say: 'Without load a rectifier holds the peak of the wave.',
            formula: write`${'directVoltageOpen'} = \sqrt{2} \, ${'openCircuitVoltage'}`,
            gives: 'directVoltageOpen' as const,
          },
      ...(found.directVoltageLoaded === undefined
        ? []
        : [
            {
              say:
                output === 'dc'
                  ? 'Under load the windings take their part.'
                  : 'Under load the rectifier gives the mean of the wave, and diodes and windings take their part.',
              formula:
                output === 'dc'
                  ? write`${'directVoltageLoaded'} = ${'openCircuitVoltage'} - ${'current'} \, ${'effectiveResistance'}`
                  : write`${'directVoltageLoaded'} = ${mean} \, ${'openCircuitVoltage'} - ${'diodeDrop'} - ${'current'} \, ${'effectiveResistance'}`,
              gives: 'directVoltageLoaded' as const,
            },
          ]),
      ...(found.frequency === undefined
        ? []
        : [
            {
              say: 'Each pair of poles makes one wave in a turn.',
              formula: write`${'frequency'} = \frac{${'polePairs'} \, ${'gearRatio'} \, ${'speed'}}{60}`,
              gives: 'frequency' as const,
            },
          ]),
      ...(found.runawayVoltage === undefined
        ? []
        : [
            {
              say: 'Without load the runner runs away, and the volts go up with it.',
              formula: write`${'runawayVoltage'} = ${'directVoltageOpen'} \, ${'runawayRatio'}`,
              gives: 'runawayVoltage' as const,
            },
          ]),
      ...(found.speedAtMinimum === undefined
        ? []
        : [
            {
              say:
                taken === undefined
                  ? 'The same the other way: the speed at which the open volts reach what the controller needs.'
                  : 'The same the other way: the speed at which the volts under load reach what the controller needs.',
              formula: speedAtMinimumFormula(output, mean, taken !== undefined),
              gives: 'speedAtMinimum' as const,
            },
          ]),
      {
        say: 'The speed at which the open volts reach what the controller must never see.',
        formula:
          output === 'dc'
            ? write`${'speedAtMaximum'} = \frac{1000 \, ${'controllerMaximum'}}{${'voltsPerThousandRpm'} \, ${'gearRatio'}}`
            : write`${'speedAtMaximum'} = \frac{1000 \, ${'controllerMaximum'}}{\sqrt{2} \, ${'voltsPerThousandRpm'} \, ${'gearRatio'}}`,
        gives: 'speedAtMaximum',
      },
    ]
  },
  cautions(given, { directVoltageOpen, directVoltageLoaded, runawayVoltage }) {
    const { controllerMinimum, controllerMaximum, current, effectiveResistance } = given
    const taken = takenByLoad(given)
    const limit = join(format(controllerMaximum, 'voltage'))
    return [
      {
        level: 'check',
        about: ['directVoltageOpen'],
        hazard: 'electricity',
        say: 'These volts can kill, and they are there as long as the runner turns: stop the water, wait until it stands, and measure before you touch. Leave mains wiring and grid connection to licensed people; local code rules earthing and protection.',
      },
      {
        level: 'check',
        about: ['speed'],
        hazard: 'rotating',
        say: 'Guard shaft, coupling and belt for the runaway speed, tie hair and sleeves back, and never hold a shaft to stop it. Local code on guarding applies.',
      },
      ...(runawayVoltage === undefined
        ? [
            {
              level: 'check' as const,
              about: ['runawayRatio' as const, 'controllerMaximum' as const],
              say: 'Give the runaway ratio: a load that falls away is what breaks controllers.',
            },
          ]
        : runawayVoltage * runawayReserve > controllerMaximum
          ? [
              {
                level: 'stop' as const,
                about: ['runawayVoltage' as const, 'controllerMaximum' as const],
                hazard: 'electricity' as const,
                say: `Running away it gives ${join(format(runawayVoltage, 'voltage'))}, and with a tenth in reserve that passes the controller’s ${limit}. Take a slower gear, fewer volts for each turn, a higher limit, or a dump load that nothing can cut off.`,
              },
            ]
          : []),
      ...(directVoltageOpen > controllerMaximum
        ? [
            {
              level: 'stop' as const,
              about: ['directVoltageOpen' as const],
              say: `Even at its running speed the open voltage passes the controller’s ${limit}: do not connect it.`,
            },
          ]
        : []),
      ...(current !== undefined && effectiveResistance === undefined
        ? [
            {
              level: 'check' as const,
              about: ['effectiveResistance' as const],
              say: 'Without the effective resistance the voltage under this current is not known: make a load test.',
            },
          ]
        : []),
      ...(taken !== undefined && directVoltageLoaded === undefined
        ? [
            {
              level: 'stop' as const,
              about: ['current' as const],
              say: 'At this speed the alternator cannot drive this current: windings and diodes would take more than all of its volts.',
            },
          ]
        : []),
      ...(directVoltageLoaded !== undefined && directVoltageLoaded < controllerMinimum
        ? [
            {
              level: 'check' as const,
              about: ['directVoltageLoaded' as const, 'controllerMinimum' as const],
              say: 'Under load it stays below what the controller needs: it will not start, or stop again and again.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['directVoltageLoaded'],
        say: 'A battery holds the volts, and with them the speed: straight on a battery the runner cannot turn much faster than the battery lets it. A controller that seeks the best power lets both go up.',
      },
    ]
  },
  doesNotCheck: [
    'how much power the shaft gives, and how much the alternator may give without getting hot',
    'ripple, harmonics and power factor; saturation and hot magnets',
    'the cable between: see cable',
  ],
  example: {
    say: 'Over Quern: a fast alternator on one shaft, its three phases rectified in the powerhouse.',
    inputs: {
      voltsPerThousandRpm: 160,
      output: 'three-phase-line',
      speed: 1500,
      polePairs: 4,
      runawayRatio: 1.95,
      controllerMinimum: 200,
      controllerMaximum: 800,
      current: 17,
      effectiveResistance: 1.1,
    },
  },
  plots: [
    {
      say: 'The volts go with the speed; what diodes and windings take stays the same.',
      of: 'directVoltageLoaded',
      against: 'speed',
      from: 0.5,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'I. L. Kosow',
      title: 'Electric Machinery and Transformers',
      year: 2007,
      where: 'example 2.7 (as recomputed in a public collection of textbook companions)',
    },
    {
      author: 'N. Mohan, T. M. Undeland, W. P. Robbins',
      title: 'Power Electronics',
      year: 2003,
      where: 'ch. 5, diode rectifiers (from memory)',
    },
  ],
})

type Key = keyof typeof alternatorInputs | 'speedAtMinimum'

/** Under load or open, behind a bridge or not. */
const speedAtMinimumFormula = (output: Output, mean: Aside, isLoaded: boolean): Formula<Key> => {
  const write = writeFormula<Key>
  if (output === 'dc')
    return isLoaded
      ? write`${'speedAtMinimum'} = \frac{1000 \, (${'controllerMinimum'} + ${'current'} \, ${'effectiveResistance'})}{${'voltsPerThousandRpm'} \, ${'gearRatio'}}`
      : write`${'speedAtMinimum'} = \frac{1000 \, ${'controllerMinimum'}}{${'voltsPerThousandRpm'} \, ${'gearRatio'}}`
  return isLoaded
    ? write`${'speedAtMinimum'} = \frac{1000 \, (${'controllerMinimum'} + ${'diodeDrop'} + ${'current'} \, ${'effectiveResistance'})}{${mean} \, ${'voltsPerThousandRpm'} \, ${'gearRatio'}}`
    : write`${'speedAtMinimum'} = \frac{1000 \, ${'controllerMinimum'}}{\sqrt{2} \, ${'voltsPerThousandRpm'} \, ${'gearRatio'}}`
}
