import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { accuracyClasses, gauges, shareOfFullScale } from '../tables/gauges.ts'
import { format, join, say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity } from '../water/properties.ts'

const fullScales = gauges.rows.map(({ fullScale }) => fullScale)
/** A scale that just fits is not passed over for a last bit. */
const justFits = 1 + 1e-9
/** Common practice, no source: readings low on the dial are coarse. */
const lowOnTheDial = 0.25
/** A reading that may be off by more than this share of what is to be read tells little; common practice, no source. */
const tellsLittle = 1 / 3

/**
 * A dial gauge for the foot of the pipe: the least full scale (static + surge) ÷ 0.75 for a steady pressure, ÷ 0.65 for a fluctuating one
 * (EN 837-2), the next of the series of EN 837-1 (0.6 to 400 bar), and how far its class lets it err anywhere on the dial, class % of the
 * full scale, in Pa and as metres of water; as a standard uncertainty that limit ÷ √3 (JCGM 100, 4.3.7). Valid at 20 °C; 0.04 % more for
 * each kelvin off. Refused: pressures over the series (`no-solution`).
 */
export const gaugeRange = defineCalculator({
  id: 'gauge-range',
  station: 'valve',
  title: 'Choosing a gauge',
  summary: 'Which full scale the gauge at the foot of the pipe wants, and how far it may be wrong.',
  hazards: ['pressure'],
  inputs: {
    staticPressure: {
      kind: 'scalar',
      symbol: 'p_0',
      label: 'Static pressure',
      quantity: 'pressure',
      help: 'at the gauge, with the valve shut',
      range: [0, 1e8],
      usual: [5e4, 5e6],
      initial: 4.7e5,
    },
    surgePressure: {
      kind: 'scalar',
      symbol: 'p_s',
      label: 'Surge pressure',
      quantity: 'pressure',
      help: 'that comes on top: see surge',
      range: [0, 1e8],
      initial: 1.2e5,
    },
    service: {
      kind: 'choice',
      label: 'Pressure',
      of: ['steady', 'fluctuating'],
      words: { steady: 'steady', fluctuating: 'fluctuating: pulses, frequent surges' },
      initial: 'steady',
    },
    accuracyClass: {
      kind: 'scalar',
      symbol: 'k',
      label: 'Accuracy class',
      quantity: 'ratio',
      help: `stands on the dial: ${accuracyClasses.join(', ')}`,
      range: [0.05, 10],
      usual: [0.1, 4],
      initial: 1.6,
    },
    predictedLoss: {
      kind: 'scalar',
      symbol: 'h_p',
      label: 'Predicted loss',
      quantity: 'head',
      help: 'what the gauge should fall by when the water runs: to see whether it can be read at all',
      range: [0, 2000],
      initial: 4.1,
      optional: true,
    },
    waterTemperature,
  },
  outputs: {
    minimumFullScale: { kind: 'scalar', symbol: 'p_{fs}', label: 'Least full scale', quantity: 'pressure' },
    chosenFullScale: {
      kind: 'scalar',
      symbol: 'P',
      label: 'Full scale to buy',
      quantity: 'pressure',
      help: 'the next that is made',
    },
    shareOfScale: { kind: 'scalar', symbol: 'r', label: 'Static reading on the dial', quantity: 'fraction' },
    readingUncertainty: {
      kind: 'scalar',
      symbol: '\\delta p',
      label: 'It may err by',
      quantity: 'pressure',
      help: 'either way, anywhere on the dial',
    },
    readingUncertaintyHead: { kind: 'scalar', symbol: '\\delta h', label: 'As metres of water', quantity: 'head' },
    standardUncertainty: {
      kind: 'scalar',
      symbol: 'u',
      label: 'As a standard uncertainty',
      quantity: 'pressure',
    },
  },
  solve({ staticPressure, surgePressure, service, accuracyClass, waterTemperature }) {
    const minimumFullScale = (staticPressure + surgePressure) / shareOfFullScale[service]
    const chosenFullScale = fullScales.find((scale) => scale * justFits >= minimumFullScale)
    if (chosenFullScale === undefined)
      throw new CalculationError(
        'no-solution',
        'staticPressure',
        `The series here ends at ${say(fullScales.at(-1)!, 'pressure')}: static pressure and surge want more. Ask a maker of gauges.`,
      )
    const readingUncertainty = (accuracyClass / 100) * chosenFullScale
    return {
      minimumFullScale,
      chosenFullScale,
      shareOfScale: staticPressure / chosenFullScale,
      readingUncertainty,
      readingUncertaintyHead: readingUncertainty / (waterDensity(waterTemperature) * g),
      standardUncertainty: readingUncertainty / Math.sqrt(3),
    }
  },
  working(write, { service, waterTemperature }) {
    const share = { symbol: 'c', value: shareOfFullScale[service], say: 'the share of the scale that may be used' }
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say:
          service === 'steady'
            ? 'A steady pressure may stand at three quarters of the scale at the most.'
            : 'A fluctuating pressure may stand at 65 % of the scale at the most.',
        formula: write`${'minimumFullScale'} = \frac{${'staticPressure'} + ${'surgePressure'}}{${share}}`,
        gives: 'minimumFullScale',
      },
      { say: 'The next full scale of the series that gauges are made in.', gives: 'chosenFullScale' },
      {
        say: 'Where the needle will stand with the valve shut.',
        formula: write`${'shareOfScale'} = \frac{${'staticPressure'}}{${'chosenFullScale'}}`,
        gives: 'shareOfScale',
      },
      {
        say: 'The class is the greatest error, in per cent of the full scale, wherever the needle stands.',
        formula: write`${'readingUncertainty'} = \frac{${'accuracyClass'}}{100} \, ${'chosenFullScale'}`,
        gives: 'readingUncertainty',
      },
      {
        say: 'As a column of water.',
        formula: write`${'readingUncertaintyHead'} = \frac{${'readingUncertainty'}}{${density} \, ${gravity}}`,
        gives: 'readingUncertaintyHead',
      },
      {
        say: 'Any error within the limit is as likely as another: that has this standard uncertainty.',
        formula: write`${'standardUncertainty'} = \frac{${'readingUncertainty'}}{\sqrt{3}}`,
        gives: 'standardUncertainty',
      },
    ]
  },
  cautions({ accuracyClass, predictedLoss, service }, { shareOfScale, readingUncertaintyHead }) {
    const mayErr = join(format(readingUncertaintyHead, 'head'))
    return [
      {
        level: 'check',
        about: ['chosenFullScale'],
        hazard: 'pressure',
        say: 'Fit the gauge with a cock, so that it can be shut off and let down before it is loosened; never stand before a glass that may burst. Local code and site rules apply.',
      },
      ...(predictedLoss !== undefined && readingUncertaintyHead > tellsLittle * predictedLoss
        ? [
            {
              level: 'check' as const,
              about: ['readingUncertaintyHead' as const, 'predictedLoss' as const],
              say: `The gauge may err by ${mayErr}, over a third of the loss to be read. Take a finer class, or read static and running on the same gauge: most of its error falls out of the difference.`,
            },
          ]
        : []),
      ...(shareOfScale < lowOnTheDial
        ? [
            {
              level: 'note' as const,
              about: ['shareOfScale' as const],
              say: 'The needle will stand in the lowest quarter of the dial, where the error is large beside the reading. A second, finer gauge behind a cock helps, shut off while the valve moves.',
            },
          ]
        : []),
      ...(service === 'fluctuating'
        ? [
            {
              level: 'note' as const,
              about: ['service' as const],
              say: 'A needle that dances wears out: fit a snubber or a filled gauge, and open the cock a little only.',
            },
          ]
        : []),
      ...(accuracyClasses.some((one) => Math.abs(one - accuracyClass) < 1e-9)
        ? []
        : [
            {
              level: 'note' as const,
              about: ['accuracyClass' as const],
              say: `EN 837-1 has the classes ${accuracyClasses.join(', ')}; this is another.`,
            },
          ]),
    ]
  },
  doesNotCheck: [
    'heat and cold: about 0.04 % of the scale for each kelvin off 20 °C',
    'the gauge’s height, zero and age',
    'whether thread, seal and cock suit the pressure',
  ],
  example: {
    say: 'Over Quern: two jets that are opened and shut often, and a good gauge.',
    inputs: {
      staticPressure: 10.2e5,
      surgePressure: 5.6e5,
      service: 'fluctuating',
      accuracyClass: 1,
      predictedLoss: 6.8,
    },
  },
  sources: [
    { author: 'CEN', title: 'EN 837-1, Bourdon tube pressure gauges', year: 1996, where: 'classes, table 11' },
    {
      author: 'CEN',
      title: 'EN 837-2, selection and installation of pressure gauges',
      year: 1997,
      where: 'working range (from memory)',
    },
    { author: 'JCGM', title: 'JCGM 100, Guide to the expression of uncertainty', year: 2008, where: '4.3.7' },
  ],
})
