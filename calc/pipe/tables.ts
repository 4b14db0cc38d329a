/** Roughness of pipe walls, for the tables page and for choosing a figure. */
export interface WallRoughness {
  wall: string
  /** Absolute, m: one figure, or from and to. */
  roughness: readonly [number] | readonly [number, number]
  source: string
}

const moody = 'L. F. Moody, Trans. ASME 66 (1944), as tabulated by R. C. Binder, Fluid Mechanics (1973)'
const idelchik = 'I. E. Idelchik, Handbook of Hydraulic Resistance (2007)'

export const wallRoughness: readonly WallRoughness[] = [
  {
    wall: 'polyethylene in service, with joints and film',
    roughness: [1e-5, 1e-4],
    source: 'common practice, no source',
  },
  { wall: 'polyethylene or PVC, new', roughness: [1.5e-6, 7e-6], source: moody },
  { wall: 'drawn tube: brass, copper, glass', roughness: [1.5e-6], source: moody },
  { wall: 'commercial steel or wrought iron, new', roughness: [4.5e-5], source: moody },
  { wall: 'steel penstock, new, seamless, well fitted', roughness: [1.5e-5, 4e-5], source: idelchik },
  { wall: 'welded steel, in good condition', roughness: [4e-5, 1e-4], source: idelchik },
  { wall: 'welded steel, used, corroded all over', roughness: [1.5e-4], source: idelchik },
  { wall: 'welded steel conduit, under 2 years of use', roughness: [1.2e-4, 2.4e-4], source: idelchik },
  { wall: 'welded steel conduit, under 20 years, no deposits', roughness: [6e-4, 5e-3], source: idelchik },
  { wall: 'galvanised steel tube, bright, new', roughness: [7e-5, 1e-4], source: idelchik },
  { wall: 'galvanised steel tube, ordinary', roughness: [1e-4, 1.5e-4], source: idelchik },
  { wall: 'galvanised iron', roughness: [1.5e-4], source: moody },
  { wall: 'asphalted cast iron', roughness: [1.2e-4], source: moody },
  { wall: 'cast iron, new', roughness: [2.6e-4], source: moody },
  { wall: 'cast iron water pipe, used', roughness: [1.4e-3], source: idelchik },
  { wall: 'reinforced concrete tube, new', roughness: [2.5e-4, 3.4e-4], source: idelchik },
  { wall: 'concrete', roughness: [3e-4, 3e-3], source: moody },
  { wall: 'riveted steel', roughness: [9e-4, 9e-3], source: moody },
]
