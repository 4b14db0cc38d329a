/**
 * Loss coefficients K of fittings, on the velocity head of the (smaller) pipe: h = K·v²/2g. Angles in degrees. Books differ by 30 % and
 * more for valves, elbows and tees; the formulas of changed bore and of bends hold better.
 */

const half = (degrees: number): number => (degrees * Math.PI) / 360

/**
 * Bend swept to a centre-line radius, friction of the bend's own length included; 0 to 180°, radius at least half of the bore. D. C. Rennels
 * & H. M. Hudson, Pipe Flow: A Practical and Comprehensive Guide, 2012, ch. 15.
 */
export const sweptBendK = (bendAngle: number, radiusRatio: number, frictionFactor: number): number => {
  const s = Math.sin(half(bendAngle))
  const turn = 2 * half(bendAngle)
  return (
    frictionFactor * turn * radiusRatio +
    (0.1 + 2.4 * frictionFactor) * s +
    (6.6 * frictionFactor * (Math.sqrt(s) + s)) / radiusRatio ** ((4 * turn) / Math.PI)
  )
}

/** Mitre bend of one joint, 0 to 150°: Rennels & Hudson 2012, ch. 15. */
export const mitreBendK = (bendAngle: number): number => {
  const s = Math.sin(half(bendAngle))
  return 0.42 * s + 2.56 * s ** 3
}

/** [rounding radius ÷ bore, K]: Crane TP-410, A-29. */
const roundedEntrances = [
  [0, 0.5],
  [0.02, 0.28],
  [0.04, 0.24],
  [0.06, 0.15],
  [0.1, 0.09],
  [0.15, 0.04],
] as const

/** Flush entrance with a rounded edge, linear between the printed points and flat from 0.15: Crane TP-410, A-29. */
export const roundedEntranceK = (radiusRatio: number): number => {
  const above = roundedEntrances.findIndex(([ratio]) => ratio >= radiusRatio)
  if (above === 0) return roundedEntrances[0][1]
  if (above < 0) return roundedEntrances.at(-1)![1]
  const [r1, k1] = roundedEntrances[above - 1]!
  const [r2, k2] = roundedEntrances[above]!
  return k1 + ((k2 - k1) * (radiusRatio - r1)) / (r2 - r1)
}

/** Step from the smaller bore to the larger, by the balance of momentum (Borda and Carnot); on the smaller pipe. */
export const suddenExpansionK = (diameterRatio: number): number => (1 - diameterRatio ** 2) ** 2

/** Step from the larger bore to the smaller: Crane TP-410, A-26; on the smaller pipe. */
export const suddenContractionK = (diameterRatio: number): number => 0.5 * (1 - diameterRatio ** 2)

/** Total cone angle up to which Crane's tapers are better than a step. */
export const widestTaper = 45

/** Taper opening from the smaller bore, total cone angle 0 to 180°: Crane TP-410, A-26; on the smaller pipe. */
export const taperExpansionK = (diameterRatio: number, coneAngle: number): number =>
  coneAngle <= widestTaper
    ? 2.6 * Math.sin(half(coneAngle)) * suddenExpansionK(diameterRatio)
    : suddenExpansionK(diameterRatio)

/** Taper closing to the smaller bore, total cone angle 0 to 180°: Crane TP-410, A-26; on the smaller pipe. */
export const taperContractionK = (diameterRatio: number, coneAngle: number): number =>
  coneAngle <= widestTaper
    ? 0.8 * Math.sin(half(coneAngle)) * (1 - diameterRatio ** 2)
    : suddenContractionK(diameterRatio) * Math.sqrt(Math.sin(half(coneAngle)))

const munson = 'Munson, Young & Okiishi, Fundamentals of Fluid Mechanics, table 8.2'
const crane = 'Crane TP-410'
const rennels = 'Rennels & Hudson 2012'

export const joints = ['threaded', 'flanged', 'fused'] as const
export type Joint = (typeof joints)[number]

/** What else than its kind describes a fitting. */
export type Shape = 'bendAngle' | 'radiusRatio' | 'diameterRatio' | 'coneAngle' | 'joint'
export interface Fitting {
  kind: FittingKind
  bendAngle?: number
  radiusRatio?: number
  diameterRatio?: number
  coneAngle?: number
  joint?: Joint
}

/** A K from a table, or so many bores of pipe: K = bores·f. */
export type Tabled = ({ k: number } | { bores: number }) & { source: string }

export interface KindOfFitting {
  label: string
  /** What must be said of it. */
  needs: readonly Shape[]
  /** What may be said of it. */
  takes?: readonly Shape[]
  loss:
    | Tabled
    | Record<Joint, Tabled>
    | { formula: (shape: Required<Fitting>, frictionFactor: number) => number; source: string }
}

/** Fused elbows and tees have the full bore of the pipe, as the welded steel ones have to which Crane's figures belong. */
const fusedTee = (bores: number): Tabled => ({ bores, source: crane })

const kinds = {
  'entrance-sharp': { label: 'sharp-edged entrance', needs: [], loss: { k: 0.5, source: crane } },
  'entrance-rounded': {
    label: 'rounded entrance',
    needs: ['radiusRatio'],
    loss: { formula: ({ radiusRatio }) => roundedEntranceK(radiusRatio), source: `${crane}, between printed points` },
  },
  'entrance-projecting': { label: 'entrance projecting inwards', needs: [], loss: { k: 0.8, source: munson } },
  'elbow-90': {
    label: '90° elbow',
    needs: ['joint'],
    loss: {
      threaded: { k: 1.5, source: munson },
      flanged: { k: 0.3, source: munson },
      fused: { bores: 30, source: crane },
    },
  },
  'elbow-45': {
    label: '45° elbow',
    needs: ['joint'],
    loss: {
      threaded: { k: 0.4, source: munson },
      flanged: { k: 0.2, source: `${munson}, from memory` },
      fused: { bores: 16, source: crane },
    },
  },
  'long-elbow-90': {
    label: 'long-radius 90° elbow',
    needs: ['joint'],
    loss: {
      threaded: { k: 0.7, source: munson },
      flanged: { k: 0.2, source: `${munson}, from memory` },
      fused: { bores: 14, source: `${crane}, bend of 1.5 bores` },
    },
  },
  'mitre-bend': {
    label: 'mitre bend',
    needs: ['bendAngle'],
    loss: { formula: ({ bendAngle }) => mitreBendK(bendAngle), source: rennels },
  },
  'swept-bend': {
    label: 'swept bend',
    needs: ['bendAngle', 'radiusRatio'],
    loss: { formula: ({ bendAngle, radiusRatio }, f) => sweptBendK(bendAngle, radiusRatio, f), source: rennels },
  },
  'gate-valve': { label: 'gate valve, open', needs: [], loss: { k: 0.15, source: munson } },
  'ball-valve': { label: 'ball valve of full bore, open', needs: [], loss: { k: 0.05, source: munson } },
  'butterfly-valve': {
    label: 'butterfly valve, open',
    needs: [],
    loss: { k: 0.74, source: `${crane}, for a valve of 100 mm; books give 0.3 to 1.2` },
  },
  'globe-valve': { label: 'globe valve, open', needs: [], loss: { k: 10, source: munson } },
  'check-valve': { label: 'swing check valve', needs: [], loss: { k: 2, source: munson } },
  'tee-through': {
    label: 'tee, straight through',
    needs: [],
    takes: ['joint'],
    loss: { threaded: { k: 0.9, source: munson }, flanged: { k: 0.2, source: munson }, fused: fusedTee(20) },
  },
  'tee-branch': {
    label: 'tee, through the branch',
    needs: [],
    takes: ['joint'],
    loss: { threaded: { k: 2, source: munson }, flanged: { k: 1, source: munson }, fused: fusedTee(60) },
  },
  'sudden-contraction': {
    label: 'step to a smaller bore',
    needs: ['diameterRatio'],
    loss: { formula: ({ diameterRatio }) => suddenContractionK(diameterRatio), source: crane },
  },
  'sudden-expansion': {
    label: 'step to a larger bore',
    needs: ['diameterRatio'],
    loss: { formula: ({ diameterRatio }) => suddenExpansionK(diameterRatio), source: 'Borda and Carnot' },
  },
  'taper-contraction': {
    label: 'taper to a smaller bore',
    needs: ['diameterRatio', 'coneAngle'],
    loss: { formula: ({ diameterRatio, coneAngle }) => taperContractionK(diameterRatio, coneAngle), source: crane },
  },
  'taper-expansion': {
    label: 'taper to a larger bore',
    needs: ['diameterRatio', 'coneAngle'],
    loss: { formula: ({ diameterRatio, coneAngle }) => taperExpansionK(diameterRatio, coneAngle), source: crane },
  },
  exit: { label: 'exit into still water', needs: [], loss: { k: 1, source: munson } },
} as const satisfies Record<string, KindOfFitting>

export type FittingKind = keyof typeof kinds
export const kindsOfFitting: Readonly<Record<FittingKind, KindOfFitting>> = kinds
export const fittingKinds = Object.keys(kinds) as FittingKind[]

/** The way to a fitting's K. Where the joint may stay away, it is a fused one. */
export const lossOf = ({ kind, joint = 'fused' }: Fitting): Exclude<KindOfFitting['loss'], Record<Joint, Tabled>> => {
  const { loss } = kindsOfFitting[kind]
  return 'fused' in loss ? loss[joint] : loss
}

/** Friction factor of a usual pipe, for losses that go with it: common practice, no source. */
export const usualFrictionFactor = 0.018

/** K of one fitting, whose needed shape is given; f is the pipe's friction factor. */
export const fittingK = (fitting: Fitting, frictionFactor: number): number => {
  const loss = lossOf(fitting)
  if ('k' in loss) return loss.k
  if ('bores' in loss) return loss.bores * frictionFactor
  return loss.formula(fitting as Required<Fitting>, frictionFactor)
}
