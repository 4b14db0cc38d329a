import { fittingK, kindsOfFitting, lossOf, usualFrictionFactor, type Fitting } from '../pipe/fitting-losses.ts'
import type { Table } from './table.ts'

const diameterRatios = [0.5, 0.8]

/** Each kind in the shapes that are met most. */
const shapes: readonly (readonly [shape: string, Fitting])[] = [
  ['', { kind: 'entrance-projecting' }],
  ['', { kind: 'entrance-sharp' }],
  ...[0.02, 0.06, 0.15].map(
    (ratio) => [`radius ${ratio} × bore`, { kind: 'entrance-rounded', radiusRatio: ratio }] as const,
  ),
  ...(['fused', 'flanged', 'threaded'] as const).flatMap((joint) => [
    [joint, { kind: 'elbow-90', joint }] as const,
    [joint, { kind: 'long-elbow-90', joint }] as const,
    [joint, { kind: 'elbow-45', joint }] as const,
    [joint, { kind: 'tee-through', joint }] as const,
    [joint, { kind: 'tee-branch', joint }] as const,
  ]),
  ...[22.5, 45, 90].map((angle) => [`${angle}°, one joint`, { kind: 'mitre-bend', bendAngle: angle }] as const),
  ...[1.5, 3, 5, 10].map(
    (ratio) => [`90°, radius ${ratio} × bore`, { kind: 'swept-bend', bendAngle: 90, radiusRatio: ratio }] as const,
  ),
  ['', { kind: 'gate-valve' }],
  ['', { kind: 'ball-valve' }],
  ['', { kind: 'butterfly-valve' }],
  ['', { kind: 'globe-valve' }],
  ['', { kind: 'check-valve' }],
  ...diameterRatios.flatMap((ratio) => [
    [`bores ${ratio} to 1`, { kind: 'sudden-contraction', diameterRatio: ratio }] as const,
    [`bores ${ratio} to 1`, { kind: 'sudden-expansion', diameterRatio: ratio }] as const,
  ]),
  ...diameterRatios.flatMap((ratio) =>
    [10, 30].flatMap((cone) => [
      [
        `bores ${ratio} to 1, cone of ${cone}°`,
        { kind: 'taper-contraction', diameterRatio: ratio, coneAngle: cone },
      ] as const,
      [
        `bores ${ratio} to 1, cone of ${cone}°`,
        { kind: 'taper-expansion', diameterRatio: ratio, coneAngle: cone },
      ] as const,
    ]),
  ),
  ['', { kind: 'exit' }],
]

export const fittings = {
  id: 'fittings',
  title: 'Losses of fittings',
  say: `Loss coefficient K on the velocity head of the smaller pipe. Books differ by 30 % and more for valves, elbows and tees. What goes with the friction of the pipe is worked out for a friction factor of ${usualFrictionFactor}. The maker’s K, where there is one, rules.`,
  columns: {
    fitting: { label: 'Fitting' },
    shape: { label: 'Shape' },
    k: { label: 'K', quantity: 'ratio', digits: 2 },
  },
  rows: shapes.map(([shape, fitting]) => ({
    fitting: kindsOfFitting[fitting.kind].label,
    shape,
    k: fittingK(fitting, usualFrictionFactor),
    source: lossOf(fitting).source,
  })),
} as const satisfies Table
