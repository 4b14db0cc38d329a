import { defineCalculator } from '../definition.ts'
import { waterTemperature } from './inputs.ts'
import {
  kelvin,
  saturationTerms,
  vapourPressure,
  waterDensity,
  waterDynamicViscosity,
  waterKinematicViscosity,
} from './properties.ts'

/**
 * Clean water near one atmosphere at a temperature t of 0 to 40 °C: density ρ (kg/m³; Tanaka 2001), dynamic viscosity μ (Pa·s; IAPWS
 * SR6-08(2011) at 0.1 MPa), kinematic viscosity ν = μ/ρ (m²/s), and the pressure at which it boils (Pa, absolute; IAPWS-IF97, region 4).
 * Refused outside 0–40 °C.
 */
export const water = defineCalculator({
  id: 'water',
  station: 'stream',
  title: 'The water itself',
  summary: 'How heavy water is, how thick, and at what pressure it boils, by its temperature.',
  hazards: [],
  inputs: { waterTemperature: { ...waterTemperature, initial: 10 } },
  outputs: {
    density: { kind: 'scalar', symbol: '\\rho', label: 'Density', quantity: 'density', digits: 5 },
    dynamicViscosity: {
      kind: 'scalar',
      symbol: '\\mu',
      label: 'Dynamic viscosity',
      quantity: 'dynamicViscosity',
      digits: 4,
    },
    kinematicViscosity: {
      kind: 'scalar',
      symbol: '\\nu',
      label: 'Kinematic viscosity',
      quantity: 'kinematicViscosity',
      digits: 4,
    },
    vapourPressure: {
      kind: 'scalar',
      symbol: 'p_v',
      label: 'Vapour pressure',
      help: 'absolute: where the pressure falls to this, water boils',
      quantity: 'pressure',
      digits: 4,
      unit: 'kPa',
    },
  },
  solve: ({ waterTemperature }) => ({
    density: waterDensity(waterTemperature),
    dynamicViscosity: waterDynamicViscosity(waterTemperature),
    kinematicViscosity: waterKinematicViscosity(waterTemperature),
    vapourPressure: vapourPressure(waterTemperature),
  }),
  working(write, { waterTemperature }) {
    const ratio = { symbol: 'T_r', value: kelvin(waterTemperature) / 300, say: 'the temperature ratio', digits: 5 }
    const { theta, a, b, c } = saturationTerms(waterTemperature)
    const [A, B, C] = [
      { symbol: 'A', value: a, say: 'A', digits: 7 },
      { symbol: 'B', value: b, say: 'B', digits: 7 },
      { symbol: 'C', value: c, say: 'C', digits: 7 },
    ]
    const absolute = { symbol: 'T', value: kelvin(waterTemperature), say: 'the absolute temperature', digits: 7 }
    const turned = { symbol: '\\theta', value: theta, say: 'theta', digits: 7 }
    return [
      {
        say: 'Water is heaviest at 4 °C and a little lighter on either side of it.',
        formula: write`${'density'} = 999.97495 \, \left(1 - \frac{(${'waterTemperature'} - 3.983035)^2 \, (${'waterTemperature'} + 301.797)}{522528.9 \, (${'waterTemperature'} + 69.34881)}\right)`,
        gives: 'density',
      },
      { say: 'Viscosity goes with the temperature above absolute zero, taken over 300 kelvin.' },
      {
        say: 'Cold water is thick: at 0 °C it drags nearly three times as much as at 40 °C.',
        formula: write`${'dynamicViscosity'} = \frac{280.68 \, ${ratio}^{-1.9} + 511.45 \, ${ratio}^{-7.7} + 61.131 \, ${ratio}^{-19.6} + 0.45903 \, ${ratio}^{-40}}{10^6}`,
        gives: 'dynamicViscosity',
      },
      {
        say: 'Over its density it is the viscosity that a Reynolds number wants.',
        formula: write`${'kinematicViscosity'} = \frac{${'dynamicViscosity'}}{${'density'}}`,
        gives: 'kinematicViscosity',
      },
      {
        say: 'The boiling pressure takes the temperature above absolute zero, a little turned.',
        formula: write`${turned} = ${absolute} - \frac{0.23855557567849}{${absolute} - 650.17534844798}`,
      },
      {
        say: 'It solves a quadratic; this is its first term.',
        formula: write`${A} = ${turned}^2 + 1167.0521452767 \, ${turned} - 724213.16703206`,
      },
      {
        say: 'Its second term.',
        formula: write`${B} = -17.073846940092 \, ${turned}^2 + 12020.82470247 \, ${turned} - 3232555.0322333`,
      },
      {
        say: 'Its third term.',
        formula: write`${C} = 14.91510861353 \, ${turned}^2 - 4823.2657361591 \, ${turned} + 405113.40542057`,
      },
      {
        say: 'Where the pressure in a pipe falls as low as this, the water turns to vapour.',
        formula: write`${'vapourPressure'} = 10^6 \, \left(\frac{2 \, ${C}}{-${B} + \sqrt{${B}^2 - 4 \, ${A} \, ${C}}}\right)^4`,
        gives: 'vapourPressure',
      },
    ]
  },
  cautions: () => [
    {
      level: 'note',
      about: ['density', 'kinematicViscosity'],
      say: 'These are for clean, air-free water. A stream in flood carries silt and bubbles: it weighs more or less than this, and wears what it passes.',
    },
  ],
  doesNotCheck: ['silt, salt or air in the water', 'pressures far above one atmosphere'],
  example: {
    say: 'The leat at Over Quern under a March sky.',
    inputs: { waterTemperature: 4 },
  },
  sources: [
    {
      author: 'M. Tanaka, G. Girard, R. Davis, A. Peuto, N. Bignell',
      title: 'Recommended table for the density of water between 0 °C and 40 °C, Metrologia 38',
      year: 2001,
      where: 'pp. 301–309',
    },
    {
      author: 'IAPWS',
      title: 'SR6-08(2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa',
      year: 2011,
      where: 'viscosity',
    },
    {
      author: 'IAPWS',
      title: 'R7-97(2012), Industrial Formulation 1997 for the Thermodynamic Properties of Water and Steam',
      year: 2012,
      where: 'region 4, the saturation line',
    },
  ],
})
