import { gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { writeFormula, type Aside, type Formula } from '../formula.ts'
import {
  fittingK,
  fittingKinds,
  joints,
  kindsOfFitting,
  lossOf,
  usualFrictionFactor,
  widestTaper,
  type Fitting,
  type FittingKind,
  type Shape,
} from './fitting-losses.ts'
import { boreVelocity, velocityHead } from './friction-factor.ts'
import { flow, insideDiameter } from './inputs.ts'

/** The angles and radii for which Rennels and Hudson give their bends. */
const widestMitre = 150
const tightestSweep = 0.5

/** The kinds that a cell belongs to. */
const of = (shape: Shape) => ({
  key: 'kind',
  is: fittingKinds.filter((kind) => {
    const { needs, takes = [] } = kindsOfFitting[kind]
    return needs.includes(shape) || takes.includes(shape)
  }),
})

const columns = {
  kind: {
    kind: 'choice',
    label: 'Fitting',
    of: fittingKinds,
    words: Object.fromEntries(fittingKinds.map((kind) => [kind, kindsOfFitting[kind].label])) as Record<
      FittingKind,
      string
    >,
  },
  count: { kind: 'scalar', symbol: 'n', label: 'Number', quantity: 'count', range: [0, 1000], whole: true, initial: 1 },
  bendAngle: {
    kind: 'scalar',
    symbol: '\\alpha',
    label: 'Bend angle',
    quantity: 'angle',
    help: 'by which the water is turned',
    range: [0, 180],
    when: of('bendAngle'),
  },
  radiusRatio: {
    kind: 'scalar',
    symbol: 'R/D',
    label: 'Radius over bore',
    quantity: 'ratio',
    help: 'of a bend: centre-line radius over inside diameter; of an entrance: rounding radius over inside diameter',
    range: [0, 1000],
    when: of('radiusRatio'),
  },
  diameterRatio: {
    kind: 'scalar',
    symbol: 'r',
    label: 'Smaller over larger bore',
    quantity: 'ratio',
    range: [0, 1],
    when: of('diameterRatio'),
  },
  coneAngle: {
    kind: 'scalar',
    symbol: '\\theta',
    label: 'Cone angle',
    quantity: 'angle',
    help: 'the whole angle between the two sides',
    range: [1, 180],
    when: of('coneAngle'),
  },
  joint: { kind: 'choice', label: 'Joint', of: joints, when: of('joint'), optional: true },
} as const

/** What a kind has not is refused before; what only some kinds must say is asked here. */
const checkShape = (fitting: Fitting, i: number): void => {
  const { label, needs } = kindsOfFitting[fitting.kind]
  const field = (shape: Shape) => `fittings[${i}].${shape}`
  if (needs.includes('joint') && fitting.joint === undefined)
    throw new CalculationError('missing', field('joint'), `${columns.joint.label} is wanted for a ${label}.`)
  if (fitting.kind === 'mitre-bend' && fitting.bendAngle! > widestMitre)
    throw new CalculationError(
      'out-of-range',
      field('bendAngle'),
      `Bend angle of a mitre bend must lie between 0° and ${widestMitre}°.`,
    )
  if (fitting.kind === 'swept-bend' && fitting.radiusRatio! < tightestSweep)
    throw new CalculationError(
      'out-of-range',
      field('radiusRatio'),
      `Radius over bore of a swept bend must be ${tightestSweep} or more: at ${tightestSweep} its inside is a sharp corner.`,
    )
}

const fittingInWords = ({ kind, joint }: Fitting): string =>
  joint === undefined ? kindsOfFitting[kind].label : `${joint} ${kindsOfFitting[kind].label}`

/** The formula of a K that is not read from a table, where it can be written in one line. */
const formulaOf = (k: Aside, fitting: Fitting, frictionFactor: number): Formula<never> | undefined => {
  const write = writeFormula<never>
  const aside = (symbol: string, value: number, say: string): Aside => ({ symbol, value, say })
  const f = aside('f', frictionFactor, 'the friction factor')
  const halfSine = (angle: number, symbol: string, say: string) =>
    aside(`\\sin\\frac{${symbol}}{2}`, Math.sin((angle * Math.PI) / 360), `the sine of half the ${say}`)
  const bend = () => halfSine(fitting.bendAngle!, '\\alpha', 'bend angle')
  const cone = () => halfSine(fitting.coneAngle!, '\\theta', 'cone angle')
  const ratio = () => aside('r', fitting.diameterRatio!, 'the ratio of the bores')
  const loss = lossOf(fitting)
  if ('bores' in loss) return write`${k} = ${aside('n_D', loss.bores, 'its length in bores')} \, ${f}`
  switch (fitting.kind) {
    case 'mitre-bend':
      return write`${k} = 0.42 \, ${bend()} + 2.56 \, (${bend()})^3`
    case 'swept-bend': {
      const turn = aside('\\alpha', (fitting.bendAngle! * Math.PI) / 180, 'the bend angle in radians')
      const radius = aside('\\frac{R}{D}', fitting.radiusRatio!, 'the radius over the bore')
      return write`${k} = ${f} \, ${turn} \, ${radius} + (0.1 + 2.4 \, ${f}) \, ${bend()} + 6.6 \, ${f} \, \frac{\sqrt{${bend()}} + ${bend()}}{(${radius})^{4 \, ${turn} / \pi}}`
    }
    case 'sudden-contraction':
      return write`${k} = 0.5 \, (1 - ${ratio()}^2)`
    case 'sudden-expansion':
      return write`${k} = (1 - ${ratio()}^2)^2`
    case 'taper-contraction':
      return fitting.coneAngle! <= widestTaper
        ? write`${k} = 0.8 \, ${cone()} \, (1 - ${ratio()}^2)`
        : write`${k} = 0.5 \, (1 - ${ratio()}^2) \, \sqrt{${cone()}}`
    case 'taper-expansion':
      return fitting.coneAngle! <= widestTaper
        ? write`${k} = 2.6 \, ${cone()} \, (1 - ${ratio()}^2)^2`
        : write`${k} = (1 - ${ratio()}^2)^2`
    default:
      return undefined
  }
}

/**
 * Head lost in fittings, h = ΣK·v²/2g, on the velocity v (m/s) of the flow Q (m³/s) in the inside diameter D (m), which at a change of bore is
 * the smaller one's. K by kind from tables (valves, elbows, tees, entrances) or formulas (bends: Rennels & Hudson 2012; tapers and steps: Crane
 * TP-410, Borda–Carnot); `frictionFactor` f serves the bends and `equivalentLength` ΣK·D/f. Tables hold within some 30 %. Refused: a cell that
 * a kind needs and has not (`missing`) or has and needs not (`inconsistent`), a mitre over 150°, a sweep tighter than half the bore. Sources
 * below, and beside each K.
 */
export const fittings = defineCalculator({
  id: 'fittings',
  station: 'pipe',
  title: 'Bends, valves and tapers',
  summary: 'How much of the head the fittings take, each by itself and together.',
  hazards: ['pressure'],
  inputs: {
    flow: { ...flow, initial: 0.0095 },
    insideDiameter: {
      ...insideDiameter,
      help: 'the bore; where it changes, the smaller one',
      initial: 0.0968,
    },
    fittings: {
      kind: 'rows',
      label: 'Fittings',
      row: 'fitting',
      columns,
      least: 0,
      most: 100,
      initial: [
        { kind: 'entrance-sharp', count: 1 },
        { kind: 'swept-bend', count: 2, bendAngle: 45, radiusRatio: 5 },
        { kind: 'elbow-90', count: 1, joint: 'fused' },
        { kind: 'gate-valve', count: 1 },
      ],
    },
    frictionFactor: {
      kind: 'scalar',
      symbol: 'f',
      label: 'Friction factor',
      quantity: 'ratio',
      help: 'of the pipe, from friction; for bends and for the equivalent length',
      range: [0.001, 1],
      usual: [0.008, 0.06],
      fallback: usualFrictionFactor,
      optional: true,
    },
  },
  outputs: {
    velocityHead: { kind: 'scalar', symbol: 'h_v', label: 'Velocity head', quantity: 'head' },
    totalK: { kind: 'scalar', symbol: '\\sum K', label: 'Loss coefficients together', quantity: 'ratio' },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost', quantity: 'head' },
    equivalentLength: {
      kind: 'scalar',
      symbol: 'L_e',
      label: 'Pipe that would lose as much',
      quantity: 'length',
      unit: 'm',
    },
    rows: {
      kind: 'rows',
      label: 'Each fitting',
      columns: {
        kind: { kind: 'text', label: 'Fitting', words: columns.kind.words },
        count: { kind: 'scalar', label: 'Number', quantity: 'count' },
        k: { kind: 'scalar', symbol: 'K', label: 'K of each', quantity: 'ratio' },
        headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost by all of these', quantity: 'head' },
      },
    },
  },
  solve({ flow, insideDiameter, fittings, frictionFactor }) {
    fittings.forEach(checkShape)
    const head = velocityHead(boreVelocity(flow, insideDiameter))
    const rows = fittings.map((fitting) => {
      const k = fittingK(fitting, frictionFactor)
      return { kind: fitting.kind, count: fitting.count, k, headLoss: fitting.count * k * head }
    })
    const totalK = rows.reduce((sum, { count, k }) => sum + count * k, 0)
    return {
      velocityHead: head,
      totalK,
      headLoss: totalK * head,
      equivalentLength: (totalK * insideDiameter) / frictionFactor,
      rows,
    }
  },
  working(write, { fittings, frictionFactor }, { rows }) {
    const coefficients = rows.map(({ k }, i): Aside => ({ symbol: `K_{${i + 1}}`, value: k, say: `K ${i + 1}` }))
    const counts = rows.map(({ count }, i): Aside => ({ symbol: `n_{${i + 1}}`, value: count, say: `${count}` }))
    return [
      {
        say: 'The speed of the water is worth this much head.',
        formula: write`${'velocityHead'} = \frac{1}{2 \, ${gravity}} \, \left(\frac{4 \, ${'flow'}}{\pi \, ${'insideDiameter'}^2}\right)^2`,
        gives: 'velocityHead',
      },
      ...fittings.map((fitting, i) => ({
        say: `Fitting ${i + 1}, ${fittingInWords(fitting)}: each takes ${Number(rows[i]!.k.toPrecision(3))} velocity heads (${lossOf(fitting).source}).`,
        formula: formulaOf(coefficients[i]!, fitting, frictionFactor),
      })),
      fittings.length === 0
        ? { say: 'There are no fittings, so nothing is lost.', gives: 'totalK' as const }
        : {
            say: 'All of them are added up.',
            formula: {
              parts: ['', ...rows.flatMap((_, i) => [i === 0 ? ' = ' : ' + ', ' \\, ']), ''],
              holes: ['totalK' as const, ...rows.flatMap((_, i) => [counts[i]!, coefficients[i]!])],
            },
            gives: 'totalK' as const,
          },
      {
        say: 'Together they lose so many velocity heads.',
        formula: write`${'headLoss'} = ${'totalK'} \, ${'velocityHead'}`,
        gives: 'headLoss',
      },
      {
        say: 'This length of straight pipe would lose as much.',
        formula: write`${'equivalentLength'} = \frac{${'totalK'} \, ${'insideDiameter'}}{${'frictionFactor'}}`,
        gives: 'equivalentLength',
      },
    ]
  },
  cautions({ fittings }) {
    const has = (test: (fitting: Fitting) => boolean) => fittings.some(test)
    const about = ['fittings' as const]
    return [
      ...(has(({ kind }) => kind.endsWith('-valve'))
        ? [
            {
              level: 'check' as const,
              about,
              hazard: 'pressure' as const,
              say: 'A valve that shuts fast can burst the pipe, and a ball or butterfly valve shuts in a quarter turn. Shut it slowly, and work out the surge. Which valves a pressure pipe must have is for local code and the pipe maker.',
            },
          ]
        : []),
      ...(has(({ kind }) => kind.startsWith('tee-'))
        ? [
            {
              level: 'check' as const,
              about,
              say: 'What a tee takes depends on how the flow divides: this is for all of it going one way.',
            },
          ]
        : []),
      ...(has(({ kind, coneAngle = 0 }) => kind === 'taper-expansion' && coneAngle > widestTaper)
        ? [
            {
              level: 'note' as const,
              about,
              say: 'A taper that opens as wide as this takes as much as a plain step: about 10° is good.',
            },
          ]
        : []),
      ...(has(({ diameterRatio }) => diameterRatio !== undefined)
        ? [
            {
              level: 'note' as const,
              about: ['insideDiameter' as const, ...about],
              say: 'Where the bore changes, everything here counts on the smaller pipe: put its inside diameter in, and reckon the larger pipe by itself.',
            },
          ]
        : []),
      ...(has(({ kind }) => kind === 'exit')
        ? [
            {
              level: 'note' as const,
              about,
              say: 'An exit is counted only where the pipe ends in still water. Before a nozzle the speed is not lost: it goes into the jet.',
            },
          ]
        : []),
      ...(has((fitting) => !('formula' in lossOf(fitting)))
        ? [
            {
              level: 'note' as const,
              about: ['totalK' as const],
              say: 'Books differ by a third and more on valves, elbows and tees; the maker of the fitting knows better.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'valves that stand partly open: nearly all of the head can go there',
    'fittings close behind each other, which take more or less than their sum',
    'friction in the straight pipe: see friction',
  ],
  example: {
    say: 'Sorrelthwaite: from the forebay’s sharp mouth to the ball valve at the wall.',
    inputs: {
      flow: 0.021,
      insideDiameter: 0.1544,
      fittings: [
        { kind: 'entrance-sharp', count: 1 },
        { kind: 'swept-bend', count: 2, bendAngle: 30, radiusRatio: 8 },
        { kind: 'elbow-45', count: 1, joint: 'fused' },
        { kind: 'taper-contraction', count: 1, diameterRatio: 0.7, coneAngle: 20 },
        { kind: 'ball-valve', count: 1 },
      ],
      frictionFactor: 0.018,
    },
  },
  sources: [
    { author: 'Crane Co.', title: 'Flow of Fluids through Valves, Fittings and Pipe, TP-410', year: 1982 },
    {
      author: 'D. C. Rennels, H. M. Hudson',
      title: 'Pipe Flow: A Practical and Comprehensive Guide',
      year: 2012,
      where: 'bends',
    },
    {
      author: 'B. R. Munson, D. F. Young, T. H. Okiishi',
      title: 'Fundamentals of Fluid Mechanics',
      year: 2006,
      where: 'table 8.2, as given in lecture notes',
    },
    { author: 'J.-C. de Borda, L. Carnot', title: 'the balance of momentum at a step', year: 1766 },
  ],
})
