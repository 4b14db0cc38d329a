import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { mean, uncertaintyOfMean } from '../numeric/mean.ts'

const total = (rises: readonly number[]): number => rises.reduce((sum, rise) => sum + rise, 0)

/** Runs that differ by more than this share of the head hide a slip; common practice, no source. */
const wideSpread = 0.02

/**
 * Gross head H by levels: each run from the jet to the water at the intake is the sum of its rises, H the mean of the runs, the spread of
 * the runs their largest less their smallest, and the standard uncertainty of the mean u = s/√n (type A; absent with one run). SI; a fall
 * on the way is a rise below zero. Valid for any level, staff, clear hose or laser: what errs alike in every run, such as a level out of
 * adjustment or a worn staff, does not show. Refused: a run that goes down where the first went up (`inconsistent`). Source: JCGM 100:2008.
 */
export const headByLevels = defineCalculator({
  id: 'head-by-levels',
  station: 'stream',
  title: 'Head by levels',
  summary: 'The gross head, from rises measured one above another up the hill, more than once.',
  hazards: ['stream'],
  inputs: {
    runs: {
      kind: 'runs',
      symbol: 'r',
      label: 'Runs',
      run: 'run',
      row: 'rise',
      quantity: 'head',
      help: 'each from the jet’s centre line up to the water at the intake; a fall on the way counts minus',
      range: [-500, 500],
      usual: [-5, 5],
      least: 1,
      most: 20,
      leastEach: 1,
      mostEach: 500,
      initial: [
        [4.31, 4.46, 3.92, 4.18, 4.05, 4.38, 4.22, 3.87, 4.41, 4.1, 4.27, 1.86],
        [4.12, 4.35, 4.2, 3.98, 4.44, 4.02, 4.3, 4.15, 3.9, 4.36, 4.21, 1.94],
      ],
    },
  },
  outputs: {
    grossHead: { kind: 'scalar', symbol: 'H', label: 'Gross head', quantity: 'head', digits: 4 },
    standardUncertainty: {
      kind: 'scalar',
      symbol: 'u_H',
      label: 'Standard uncertainty',
      quantity: 'head',
      digits: 2,
      sometimes: true,
    },
    misclosure: { kind: 'scalar', symbol: '\\Delta H', label: 'Spread of runs', quantity: 'head', digits: 2 },
  },
  solve({ runs }) {
    const sums = runs.map(total)
    const down = sums.findIndex((sum) => sum * sums[0]! < 0)
    if (down > 0)
      throw new CalculationError(
        'inconsistent',
        `runs[${down}]`,
        `Run ${down + 1} goes ${sums[down]! < 0 ? 'down' : 'up'} where run 1 goes ${sums[0]! < 0 ? 'down' : 'up'}: give every run in the same direction, from the jet to the intake.`,
      )
    const grossHead = mean(sums)
    return {
      grossHead,
      ...(sums.length < 2 ? {} : { standardUncertainty: uncertaintyOfMean(sums, grossHead) }),
      misclosure: Math.max(...sums) - Math.min(...sums),
    }
  },
  working(write, { runs }, { standardUncertainty }) {
    const sums = runs.map(total)
    const aside = (symbol: string, value: number, say: string) => ({ symbol, value, say, digits: 6 })
    const count = aside('n', runs.length, 'the number of runs')
    const all = aside('\\textstyle\\sum H_i', total(sums), 'the sum of all runs')
    const deviation = {
      symbol: 's',
      value: (standardUncertainty ?? 0) * Math.sqrt(runs.length),
      say: 'the standard deviation of the runs',
      digits: 3,
    }
    return [
      ...sums.map((sum, i) => ({
        say: `The rises of run ${i + 1} stand one on another.`,
        formula: write`H_{${{ symbol: String(i + 1), value: i + 1, say: String(i + 1) }}} = ${{ ...aside('\\textstyle\\sum r', sum, 'the sum of its rises'), unit: 'm' }}`,
      })),
      {
        say: 'The mean of the runs counts.',
        formula: write`${'grossHead'} = \frac{${all}}{${count}}`,
        gives: 'grossHead' as const,
      },
      {
        say: 'The spread of the runs, largest less smallest, shows slips.',
        formula: write`${'misclosure'} = ${aside('H_\\text{max}', Math.max(...sums), 'the largest run')} - ${aside('H_\\text{min}', Math.min(...sums), 'the smallest run')}`,
        gives: 'misclosure' as const,
      },
      ...(standardUncertainty === undefined
        ? []
        : [
            {
              say: 'The scatter of the runs, shared among them, is how far their mean may be off.',
              formula: write`${'standardUncertainty'} = \frac{${deviation}}{\sqrt{${count}}}`,
              gives: 'standardUncertainty' as const,
            },
          ]),
    ]
  },
  cautions: ({ runs }, { grossHead, misclosure }) => [
    ...(grossHead <= 0
      ? [
          {
            level: 'stop' as const,
            about: ['runs' as const],
            say: 'These runs do not rise. Rises count from the jet up to the intake: measured the other way, give each with a minus.',
          },
        ]
      : []),
    ...(runs.length < 2
      ? [
          {
            level: 'check' as const,
            about: ['runs' as const],
            say: 'One run cannot show its own slip: measure it again, best by another way and by somebody else.',
          },
        ]
      : []),
    ...(grossHead > 0 && misclosure > wideSpread * grossHead
      ? [
          {
            level: 'check' as const,
            about: ['misclosure' as const],
            say: 'The runs differ by more than two per cent: one of them holds a slip, such as a rise left out or counted twice. Find it; do not average it away.',
          },
        ]
      : []),
    {
      level: 'note',
      about: ['grossHead'],
      say: 'For an impulse runner the head counts down to the jet’s centre line, not to the tailrace: what the jet falls after the runner is lost.',
    },
    {
      level: 'check',
      about: ['runs'],
      hazard: 'stream',
      say: 'A gill is steep and slippery: go two together, keep off wet rock and out of the flow, and keep a metal staff away from overhead lines. Landowner’s leave and local rules come first.',
    },
  ],
  doesNotCheck: [
    'whether the level is in adjustment: try it from both ends of one sight',
    'whether the water at the intake stands this high when the stream is low',
  ],
  example: {
    say: 'Sorrelthwaite: three runs with a level and a staff, one of them by somebody else.',
    inputs: {
      runs: [
        [4.42, 4.9, 4.15, 4.63, 4.48, 4.71, 4.8, 2.2],
        [4.77, 4.31, 4.84, 4.02, 4.19, 4.66, 4.55, 2.84],
        [4.6, 4.6, 4.6, 4.6, 4.6, 4.6, 4.6, 2.14],
      ],
    },
  },
  sources: [
    {
      author: 'JCGM',
      title: 'Evaluation of measurement data: guide to the expression of uncertainty in measurement (JCGM 100)',
      year: 2008,
      where: '4.2',
    },
  ],
})
