import { gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { CalculationError } from '../errors.ts'
import { bendRadius as leastRadii } from '../tables/bend-radius.ts'
import { say } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterKinematicViscosity } from '../water/properties.ts'
import { fittingK, sweptBendK, usualFrictionFactor } from './fitting-losses.ts'
import { boreVelocity, frictionFactor, velocityHead } from './friction-factor.ts'
import { flow, roughness } from './inputs.ts'

/** Bought elbows turn by these; between them the loss is taken in proportion. */
const elbows = [45, 90] as const

/** Of a fused elbow of the same angle; absent where none is made. */
const elbowK = (bendAngle: number, f: number): number | undefined => {
  if (bendAngle < elbows[0] || bendAngle > elbows[1]) return undefined
  const half = fittingK({ kind: 'elbow-45', joint: 'fused' }, f)
  const right = fittingK({ kind: 'elbow-90', joint: 'fused' }, f)
  return half + ((right - half) * (bendAngle - elbows[0])) / (elbows[1] - elbows[0])
}

type Geometry =
  | 'arcLength'
  | 'setback'
  | 'outerFibreStrain'
  | 'bendRadiusOverOutside'
  | 'overBendAngle'
  | 'fillVolume'
  | 'thinnedWall'
type Loss = 'headLoss' | 'elbowHeadLoss' | 'saving'

interface Bore {
  outsideDiameter: number
  wallThickness: number
}
const boreOf = ({ outsideDiameter, wallThickness }: Bore): number => outsideDiameter - 2 * wallThickness

const frictionOf = (given: Bore & { flow?: number; roughness?: number; waterTemperature: number }): number => {
  const bore = boreOf(given)
  const { flow = 0, roughness, waterTemperature } = given
  const reynolds = (boreVelocity(flow, bore) * bore) / waterKinematicViscosity(waterTemperature)
  return roughness === undefined || reynolds < 1 ? usualFrictionFactor : frictionFactor(reynolds, roughness / bore)
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180

/**
 * A bend swept from a length of pipe, by angle θ and centre-line radius R (m): the pipe it takes Rθ, the way from the corner to where it
 * starts R·tan(θ/2), the stretch of its outer side D/2R, the angle to bend to θ/(1 − s) where a share s springs back, the fill of its bore,
 * the outer wall left t·R/(R + D/2); and what it loses (Rennels and Hudson) beside a bought elbow (Crane, in proportion between 45 and 90°).
 * Friction factor by the roughness, else 0.018. Valid for bends that stay round. Refused: a radius under half of the pipe, walls that
 * fill it, a roughness of half the bore (`inconsistent`).
 */
export const sweptBend = defineCalculator({
  id: 'swept-bend',
  station: 'pipe',
  title: 'Sweeping a bend',
  summary:
    'The pipe, the room and the fill that a bend swept from straight pipe takes, what it does to the wall, and the head it saves.',
  hazards: ['hot-work', 'pressure'],
  inputs: {
    outsideDiameter: {
      kind: 'scalar',
      symbol: 'D',
      label: 'Outside diameter',
      quantity: 'length',
      range: [0.001, 20],
      usual: [0.016, 0.4],
      initial: 0.11,
      pick: { table: 'pe-pipe', column: 'outsideDiameter' },
    },
    wallThickness: {
      kind: 'scalar',
      symbol: 't',
      label: 'Wall thickness',
      quantity: 'length',
      range: [1e-5, 5],
      usual: [0.001, 0.05],
      unit: 'mm',
      initial: 0.0066,
      pick: { table: 'pe-pipe', column: 'wallThickness' },
    },
    bendAngle: {
      kind: 'scalar',
      symbol: '\\theta',
      label: 'Bend angle',
      quantity: 'angle',
      help: 'by which the pipe turns from straight',
      range: [0, 179],
      usual: [2, 120],
      initial: 60,
    },
    bendRadius: {
      kind: 'scalar',
      symbol: 'R',
      label: 'Bend radius',
      quantity: 'length',
      help: 'of the pipe’s centre line',
      range: [0.001, 10_000],
      usual: [0.05, 50],
      initial: 0.66,
    },
    springBack: {
      kind: 'scalar',
      symbol: 's',
      label: 'Spring-back',
      quantity: 'fraction',
      help: 'the share of the angle that it loses when let go: bend a trial piece and measure it',
      range: [0, 0.9],
      usual: [0, 0.5],
      initial: 0.08,
    },
    flow: { ...flow, initial: 0.0095, optional: true },
    roughness: {
      ...roughness,
      help: 'of the wall in service; without it the friction factor is taken as 0.018',
      initial: 5e-5,
      optional: true,
      needs: 'flow',
    },
    waterTemperature,
  },
  outputs: {
    arcLength: { kind: 'scalar', symbol: 'L', label: 'Pipe in the bend', quantity: 'length' },
    setback: {
      kind: 'scalar',
      symbol: 'T',
      label: 'Setback',
      quantity: 'length',
      help: 'from the corner of the two straight lines to where the bend begins',
    },
    outerFibreStrain: {
      kind: 'scalar',
      symbol: '\\varepsilon_o',
      label: 'Stretch of the outer side',
      quantity: 'fraction',
    },
    bendRadiusOverOutside: {
      kind: 'scalar',
      symbol: 'R/D',
      label: 'Radius over outside diameter',
      quantity: 'ratio',
    },
    overBendAngle: {
      kind: 'scalar',
      symbol: '\\theta_b',
      label: 'Bend it to',
      quantity: 'angle',
      help: 'before it springs back',
    },
    fillVolume: {
      kind: 'scalar',
      symbol: 'V',
      label: 'Dry fill for the bend',
      quantity: 'volume',
      help: 'of the bent length alone; the straight ends take more',
    },
    thinnedWall: {
      kind: 'scalar',
      symbol: 't_o',
      label: 'Wall left on the outer side',
      quantity: 'length',
      unit: 'mm',
    },
    headLoss: { kind: 'scalar', symbol: 'h', label: 'Head lost in this bend', quantity: 'head', sometimes: true },
    elbowHeadLoss: {
      kind: 'scalar',
      symbol: 'h_e',
      label: 'Head lost in a fused elbow',
      quantity: 'head',
      sometimes: true,
    },
    saving: { kind: 'scalar', symbol: '\\Delta h', label: 'Head saved', quantity: 'head', sometimes: true },
  },
  solve(given) {
    const { outsideDiameter, wallThickness, bendAngle, bendRadius, springBack, flow, roughness } = given
    const bore = boreOf(given)
    if (bore <= 0)
      throw new CalculationError(
        'inconsistent',
        'wallThickness',
        'Two walls of this thickness leave no bore: give one wall, less than half of the outside diameter.',
      )
    if (bendRadius < outsideDiameter / 2)
      throw new CalculationError(
        'inconsistent',
        'bendRadius',
        `The inner side would fold: give a radius of the centre line over half of the outside diameter, ${say(outsideDiameter / 2, 'length')}.`,
      )
    if (roughness !== undefined && roughness >= bore / 2)
      throw new CalculationError(
        'inconsistent',
        'roughness',
        'A roughness of half the bore leaves no pipe. Give the height of the grains on the wall, such as 0.05 mm.',
      )
    const turn = radians(bendAngle)
    const arcLength = bendRadius * turn
    const found: Record<Geometry, number> & Partial<Record<Loss, number>> = {
      arcLength,
      setback: bendRadius * Math.tan(turn / 2),
      outerFibreStrain: outsideDiameter / (2 * bendRadius),
      bendRadiusOverOutside: bendRadius / outsideDiameter,
      overBendAngle: bendAngle / (1 - springBack),
      fillVolume: (Math.PI / 4) * bore ** 2 * arcLength,
      thinnedWall: (wallThickness * bendRadius) / (bendRadius + outsideDiameter / 2),
    }
    if (flow === undefined) return found
    const head = velocityHead(boreVelocity(flow, bore))
    const f = frictionOf(given)
    found.headLoss = sweptBendK(bendAngle, bendRadius / bore, f) * head
    const elbow = elbowK(bendAngle, f)
    if (elbow === undefined) return found
    found.elbowHeadLoss = elbow * head
    found.saving = found.elbowHeadLoss - found.headLoss
    return found
  },
  working(write, given, { headLoss, elbowHeadLoss }) {
    const { bendAngle, bendRadius, flow = 0 } = given
    const aside = (symbol: string, value: number, say: string) => ({ symbol, value, say })
    const turn = aside('\\theta_r', radians(bendAngle), 'the bend angle in radians')
    const bore = aside('d', boreOf(given), 'the bore')
    const f = frictionOf(given)
    const k = aside('K', sweptBendK(bendAngle, bendRadius / bore.value, f), 'the loss coefficient of the bend')
    const elbow = aside('K_e', elbowK(bendAngle, f) ?? 0, 'the loss coefficient of the elbow')
    const head = aside('h_v', velocityHead(boreVelocity(flow, bore.value)), 'the velocity head')
    return [
      {
        say: 'The angle as a part of the circle: in radians.',
        formula: write`\frac{\pi}{180} \, ${'bendAngle'} = ${turn}`,
      },
      {
        say: 'Along the centre line the bend takes so much pipe.',
        formula: write`${'arcLength'} = ${'bendRadius'} \, ${turn}`,
        gives: 'arcLength',
      },
      {
        say: 'Mark the start of the bend so far before the corner.',
        formula: write`${'setback'} = ${'bendRadius'} \, \tan \frac{${'bendAngle'}}{2}`,
        gives: 'setback',
      },
      {
        say: 'The outer side is stretched, and the inner side pressed together by as much.',
        formula: write`${'outerFibreStrain'} = \frac{${'outsideDiameter'}}{2 \, ${'bendRadius'}}`,
        gives: 'outerFibreStrain',
      },
      {
        say: 'Makers give the least radius in outside diameters.',
        formula: write`${'bendRadiusOverOutside'} = \frac{${'bendRadius'}}{${'outsideDiameter'}}`,
        gives: 'bendRadiusOverOutside',
      },
      {
        say: 'Bend further, by what will spring back.',
        formula: write`${'overBendAngle'} = \frac{${'bendAngle'}}{1 - ${'springBack'}}`,
        gives: 'overBendAngle',
      },
      {
        say: 'The bore.',
        formula: write`${'outsideDiameter'} - 2 \, ${'wallThickness'} = ${{ ...bore, unit: 'm' }}`,
      },
      {
        say: 'The fill that keeps the bend round.',
        formula: write`${'fillVolume'} = \frac{\pi}{4} \, ${bore}^2 \, ${'arcLength'}`,
        gives: 'fillVolume',
      },
      {
        say: 'The stretched side has as much plastic over a longer way.',
        formula: write`${'thinnedWall'} = \frac{${'wallThickness'} \, ${'bendRadius'}}{${'bendRadius'} + ${'outsideDiameter'} / 2}`,
        gives: 'thinnedWall',
      },
      ...(headLoss === undefined
        ? []
        : [
            {
              say: 'What the speed of the water is worth.',
              formula: write`\frac{1}{2 \, ${gravity}} \, \left(\frac{4 \, ${'flow'}}{\pi \, ${bore}^2}\right)^2 = ${{ ...head, unit: 'm' }}`,
            },
            {
              say: 'A sweep’s K by Rennels and Hudson, with its own length in it.',
              formula: write`${'headLoss'} = ${k} \, ${head}`,
              gives: 'headLoss' as const,
            },
          ]),
      ...(elbowHeadLoss === undefined
        ? []
        : [
            {
              say: `A fused elbow’s K: 16 friction factors at ${elbows[0]}°, 30 at ${elbows[1]}° (Crane), in proportion between.`,
              formula: write`${'elbowHeadLoss'} = ${elbow} \, ${head}`,
              gives: 'elbowHeadLoss' as const,
            },
            {
              say: 'What the sweep saves; below zero its length takes more than the elbow.',
              formula: write`${'saving'} = ${'elbowHeadLoss'} - ${'headLoss'}`,
              gives: 'saving' as const,
            },
          ]),
    ]
  },
  cautions: ({ outsideDiameter, wallThickness, bendAngle, flow }, { saving }) => [
    {
      level: 'stop',
      about: ['fillVolume'],
      hazard: 'hot-work',
      say: 'The fill must be bone-dry. Damp sand in hot pipe makes steam, and steam with plugged ends throws plug, sand and pipe. Dry it in a pan until no steam shows, and plug the ends so that they can breathe.',
    },
    {
      level: 'stop',
      about: ['bendRadius'],
      hazard: 'hot-work',
      say: 'Hot pipe and hot sand burn, and molten plastic sticks to skin: gloves, long sleeves, face shield, water at hand, no flame near what burns. Never leave the heat or the hot pipe unattended. Local code and site rules on hot work apply.',
    },
    {
      level: 'stop',
      about: ['outsideDiameter'],
      hazard: 'hot-work',
      say: 'Heat in the open air. PVC that is scorched gives acid fumes and galvanised steel gives zinc fumes: both harm the lungs. Do not heat either; buy the bend.',
    },
    {
      level: 'check',
      about: ['thinnedWall'],
      hazard: 'pressure',
      say: 'Pipe that was formed by heat loses its rating, on the outer side most. Keep it where the pressure is far below the class of the pipe, test it with water, and ask the maker; local code may forbid it.',
    },
    {
      level: 'check',
      about: ['bendRadiusOverOutside'],
      say: `Pulled cold, pipe wants a far larger radius than formed hot. ${leastRadiusWords(outsideDiameter / wallThickness)} Cold weather wants more, no joint may lie in the bend, and a pipe that is held bent whips when let go.`,
    },
    ...(saving !== undefined && saving < 0
      ? [
          {
            level: 'note' as const,
            about: ['saving' as const],
            say: 'The sweep’s loss has the friction of its own long arc in it. An elbow has two straight legs instead, which rub as well and are not counted here.',
          },
        ]
      : []),
    ...(flow !== undefined && (bendAngle < elbows[0] || bendAngle > elbows[1])
      ? [
          {
            level: 'note' as const,
            about: ['elbowHeadLoss' as const],
            say: `There is no bought elbow to compare with under ${elbows[0]}° or over ${elbows[1]}°.`,
          },
        ]
      : []),
  ],
  doesNotCheck: [
    'whether the wall wrinkles or flattens',
    'at what heat this plastic forms, and for how long',
    'what the formed pipe may carry',
  ],
  example: {
    say: 'Nether Pollow: a quarter turn in the trench, pulled cold in warm weather.',
    inputs: {
      outsideDiameter: 0.2,
      wallThickness: 0.0119,
      bendAngle: 90,
      bendRadius: 5.6,
      springBack: 0.35,
      flow: 0.045,
      roughness: 5e-5,
    },
  },
  plots: [
    {
      say: 'A tight bend loses by its turn, a very wide one by its length.',
      of: 'headLoss',
      against: 'bendRadius',
      from: 0.15,
      to: 3,
    },
  ],
  sources: [
    {
      author: 'D. C. Rennels, H. M. Hudson',
      title: 'Pipe Flow: A Practical and Comprehensive Guide',
      year: 2012,
      where: 'ch. 15',
    },
    { author: 'Crane Co.', title: 'Flow of Fluids through Valves, Fittings and Pipe, TP-410', year: 1982 },
    {
      author: 'Plastics Industry Pipe Association of Australia',
      title: 'POP202, PE pressure pipes: bending radius, as given by a pipe maker',
      year: 2010,
    },
  ],
})

/** The cited range of the next thinner pipe in the table. */
const leastRadiusWords = (sdr: number): string => {
  const row = leastRadii.rows.find((row) => row.sdr >= sdr - 0.5)
  if (!row) return 'For a wall as thin as this no maker’s figure was found; ask for it.'
  const { radiusOverOutside: least } = row
  const range = typeof least === 'number' ? `${least}` : least.join(' to ')
  return `For polyethylene of SDR ${row.sdr} at 20 °C makers and handbooks give ${range} outside diameters at the least (${row.source}).`
}
