import { vapourPressure, waterDensity, waterDynamicViscosity, waterKinematicViscosity } from '../water/properties.ts'
import type { Table } from './table.ts'

const source = 'density: Tanaka et al., Metrologia 38 (2001); viscosity: IAPWS SR6-08(2011); boiling: IAPWS R7-97(2012)'

export const water = {
  id: 'water',
  title: 'Clean water',
  say: 'Density, viscosity and the pressure at which it boils, near one atmosphere. Air, silt and salt change them; a temperature measured in the stream, in the season that matters, rules.',
  columns: {
    temperature: { label: 'Temperature', quantity: 'temperature' },
    density: { label: 'Density', quantity: 'density', digits: 5 },
    dynamicViscosity: { label: 'Dynamic viscosity', quantity: 'dynamicViscosity', digits: 4 },
    kinematicViscosity: { label: 'Kinematic viscosity', quantity: 'kinematicViscosity', digits: 4 },
    vapourPressure: { label: 'Boils at (absolute)', quantity: 'pressure', unit: 'kPa', digits: 4 },
  },
  rows: [0, 5, 10, 15, 20, 25, 30, 35, 40].map((celsius) => ({
    temperature: celsius,
    density: waterDensity(celsius),
    dynamicViscosity: waterDynamicViscosity(celsius),
    kinematicViscosity: waterKinematicViscosity(celsius),
    vapourPressure: vapourPressure(celsius),
    source,
  })),
} as const satisfies Table
