import { describe, expect } from 'vitest'
import { outside } from '../testing/outside-check.ts'
import { wallRoughness } from './tables.ts'

const roughnessOf = (wall: string) => wallRoughness.find((row) => row.wall === wall)?.roughness

describe('roughness of walls', () => {
  const binder = 'R. C. Binder, Fluid Mechanics (1973), as tabulated at efunda.com'
  const idelchik = 'I. E. Idelchik, Handbook of Hydraulic Resistance (2007), as tabulated in fluids 1.3.1 for Python'
  for (const [source, wall, roughness] of [
    [binder, 'drawn tube: brass, copper, glass', [1.5e-6]],
    [binder, 'commercial steel or wrought iron, new', [4.5e-5]],
    [binder, 'asphalted cast iron', [1.2e-4]],
    [binder, 'galvanised iron', [1.5e-4]],
    [binder, 'cast iron, new', [2.6e-4]],
    [binder, 'concrete', [3e-4, 3e-3]],
    [idelchik, 'steel penstock, new, seamless, well fitted', [1.5e-5, 4e-5]],
    [idelchik, 'welded steel, in good condition', [4e-5, 1e-4]],
    [idelchik, 'cast iron water pipe, used', [1.4e-3]],
  ] as const)
    outside('published', source, wall, () => expect(roughnessOf(wall)).toEqual(roughness))
})
