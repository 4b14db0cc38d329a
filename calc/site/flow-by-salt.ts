import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { format, join } from '../units/format.ts'
import { saltCurve } from './salt-curve.ts'

/** mg in a kg over L in a m³. */
const milligramsPerLitre = 1000
/** Less than this share of the area read, and the tail that is guessed counts too much. */
const enoughRecovered = 0.97
/** A peak that stands less than this share over the background drowns in the meter's steps; common practice, no source. */
const faintPeak = 0.5
/** Readings that far under the background, as a share of the peak, are more than noise; common practice, no source. */
const underBackground = 0.02

/**
 * Flow by salt dilution, one dose: Q = M/(k·∫(κ − κ₀)dt), M the mass of salt, κ the conductivity downstream over the background κ₀, k the
 * salt in mg/L for each µS/cm. SI but for κ in µS/cm and k in mg/L for each. The integral by the trapezium rule; readings a little under the background
 * count minus, so that the meter's noise cancels. `recovered` is the area read over that area and the tail still to come (an exponential
 * fitted to the falling limb). Valid where the salt is mixed over the whole stream; errors 5 % with care, k alone 1 to 4 %. Refused: times
 * that do not rise (`inconsistent`), readings without a peak over the background (`no-solution`). Sources below.
 */
export const flowBySalt = defineCalculator({
  id: 'flow-by-salt',
  station: 'stream',
  title: 'Flow by salt',
  summary: 'The flow of a rough stream, from how far it dilutes a weighed dose of common salt.',
  hazards: ['stream'],
  inputs: {
    saltMass: {
      kind: 'scalar',
      symbol: 'M',
      label: 'Salt',
      quantity: 'mass',
      help: 'weighed dry, dissolved to the last grain, tipped in at once',
      range: [1e-4, 1000],
      usual: [0.02, 20],
      initial: 0.25,
    },
    readings: {
      kind: 'rows',
      label: 'Readings',
      row: 'reading',
      help: 'from before the salt comes until the meter is back where it was',
      columns: {
        time: { kind: 'scalar', symbol: 't', label: 'Time', quantity: 'time', range: [0, 1e6], initial: 0 },
        conductivity: {
          kind: 'scalar',
          symbol: '\\kappa',
          label: 'Conductivity',
          quantity: 'conductivity',
          range: [0, 1e5],
          initial: 100,
        },
      },
      least: 3,
      most: 2000,
      initial: [
        [0, 84],
        [20, 84],
        [40, 97],
        [60, 224],
        [80, 371],
        [100, 352],
        [120, 268],
        [140, 196],
        [160, 151],
        [180, 123],
        [200, 107],
        [220, 97],
        [240, 92],
        [270, 87],
        [300, 85],
      ].map(([time, conductivity]) => ({ time: time!, conductivity: conductivity! })),
    },
    background: {
      kind: 'scalar',
      symbol: '\\kappa_0',
      label: 'Background',
      quantity: 'conductivity',
      help: 'of the stream before the salt comes',
      range: [0, 1e5],
      usual: [5, 1000],
      initial: 84,
    },
    calibration: {
      kind: 'scalar',
      symbol: 'k',
      label: 'Calibration',
      quantity: 'saltCalibration',
      help: 'salt for each step of the meter, tried in a bucket of this stream; about 0.49 at 25 °C compensation',
      range: [0.01, 10],
      usual: [0.4, 0.7],
      initial: 0.49,
    },
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    peakConductivity: {
      kind: 'scalar',
      symbol: '\\kappa_p',
      label: 'Peak',
      quantity: 'conductivity',
      help: 'as it was read, background and all',
    },
    recovered: {
      kind: 'scalar',
      symbol: 'r',
      label: 'Share of the curve that was read',
      quantity: 'fraction',
      help: 'the rest is the tail after the last reading',
    },
  },
  solve({ saltMass, readings, background, calibration }) {
    for (let i = 1; i < readings.length; i++)
      if (readings[i]!.time <= readings[i - 1]!.time)
        throw new CalculationError(
          'inconsistent',
          `readings[${i}].time`,
          `Reading ${i + 1} is not later than the one before it: give the readings in the order of time.`,
        )
    const curve = saltCurve(readings, background)
    if (!curve)
      throw new CalculationError(
        'no-solution',
        'readings',
        'These readings show no peak that rises over the background and falls again: start before the salt comes, stop when it has passed, and look at the background.',
      )
    return {
      flow: (milligramsPerLitre * saltMass) / (calibration * curve.area),
      peakConductivity: readings[curve.peak]!.conductivity,
      recovered: curve.area / (curve.area + curve.tail),
    }
  },
  working(write, { readings, background }) {
    const curve = saltCurve(readings, background)!
    const area = { symbol: 'A', value: curve.area, say: 'the area over the background' }
    const strips = {
      symbol: '\\textstyle\\sum \\frac{1}{2} (\\Delta\\kappa_1 + \\Delta\\kappa_2) \\, \\Delta t',
      value: curve.area,
      say: 'the sum of all strips',
    }
    const tail = { symbol: 'A_t', value: curve.tail, say: 'the area of the tail', digits: 3 }
    return [
      {
        say: 'The largest reading is the peak.',
        formula: write`${'peakConductivity'} = \text{largest reading}`,
        gives: 'peakConductivity',
      },
      {
        say: 'Strip by strip between the readings: mean height over the background, times the time between.',
        formula: write`${strips} = ${{ ...area, unit: 'µS·s/cm' }}`,
      },
      {
        say: 'The same salt in more water makes a smaller area: the thousand is milligrams in a kilogram over litres in a cubic metre.',
        formula: write`${'flow'} = \frac{1000 \, ${'saltMass'}}{${'calibration'} \, ${area}}`,
        gives: 'flow',
      },
      {
        say:
          curve.tail === 0
            ? 'The last reading is back at the background: no tail is missing.'
            : 'The falling limb is carried on as it falls, by a straight line through its logarithms: so much area still comes after the last reading.',
        formula: write`${'recovered'} = \frac{${area}}{${area} + ${tail}}`,
        gives: 'recovered',
      },
    ]
  },
  cautions({ readings, background, calibration }, { peakConductivity, recovered }) {
    const rise = peakConductivity - background
    const lowest = Math.min(...readings.map(({ conductivity }) => conductivity))
    return [
      {
        level: 'stop',
        about: ['saltMass'],
        hazard: 'stream',
        say: `The dose must be harmless to what lives in the stream and allowed: here it raises the salt to ${join(format(calibration * rise, 'ratio', { digits: 2 }))} mg/L more at the meter, and to far more where it goes in. Ask the authority first; local code rules it. Keep out of fast water.`,
      },
      ...(recovered < enoughRecovered
        ? [
            {
              level: 'check' as const,
              about: ['recovered' as const],
              say: 'The readings stop too soon: more than three per cent of the curve lies after the last one, and the flow found is too large by about as much. Read on until the meter is back.',
            },
          ]
        : []),
      ...(rise < faintPeak * background
        ? [
            {
              level: 'check' as const,
              about: ['peakConductivity' as const],
              say: 'The peak stands less than half over the background: a small drift of the meter then counts much. Measure again nearer, or with more salt where that is allowed.',
            },
          ]
        : []),
      ...(lowest < background - underBackground * rise
        ? [
            {
              level: 'check' as const,
              about: ['readings' as const, 'background' as const],
              say: 'Some readings lie under the background by more than noise; they count minus. Was the background read right, or did it drift?',
            },
          ]
        : []),
      {
        level: 'check',
        about: ['calibration'],
        say: 'Calibrate with this stream’s own water, at its temperature, with the same meter: known grams in known litres.',
      },
      {
        level: 'note',
        about: ['readings'],
        say: 'The salt must be mixed from bank to bank where it is read: at least 25 widths below a tumbling reach, no pools or side streams between (common practice, no source). Readings at both banks that give the same flow prove it.',
      },
    ]
  },
  doesNotCheck: [
    'whether the salt was mixed over the whole stream',
    'whether salt was held back in pools or lost into the ground',
  ],
  example: {
    say: 'Sorrelthwaite in April: a kilogram of salt, read at the bridge.',
    inputs: {
      saltMass: 1,
      readings: [
        [0, 61],
        [30, 61],
        [60, 88],
        [90, 214],
        [120, 243],
        [150, 198],
        [180, 149],
        [210, 115],
        [240, 94],
        [270, 81],
        [300, 73],
        [330, 68],
        [360, 65],
        [420, 62],
      ].map(([time, conductivity]) => ({ time: time!, conductivity: conductivity! })),
      background: 61,
      calibration: 0.486,
    },
  },
  sources: [
    {
      author: 'M. Richardson, G. Sentlinger, R. D. Moore, A. Zimmermann',
      title:
        'Quantifying the relation between electrical conductivity and salt concentration, Confluence J. Watershed Sci. Manag. 1(2)',
      year: 2017,
      where: 'abstract',
    },
    {
      author: 'R. Hudson, J. Fraser',
      title: 'Introduction to salt dilution gauging for streamflow measurement, part IV, Streamline 9(1)',
      year: 2005,
    },
    {
      author: 'J. Merz, G. Doppmann',
      title: 'Measuring mountain stream discharge using the salt dilution method: a practical guide, ICIMOD',
      year: 2006,
    },
  ],
})
