import { defineCalculator } from '../definition.ts'
import { waterDensity } from '../water/properties.ts'

/** Specific heat of water, J/(kg·K). */
const specificHeat = 4186
/** A dump load takes all that the set can give, and a fifth more. Common practice, no source. */
const wantedMargin = 1.2
const coldWater = 10

/**
 * The heater that takes what the loads do not: its resistance V²/P and current, what it takes at the highest voltage V_h²/R, how it stands to
 * the most that the generator gives, and how long it warms a tank, ρ·V·c·ΔT/P with c = 4186 J/(kg·K). SI. Valid for plain resistances; a
 * hot element has a few per cent more resistance. Sources below.
 */
export const dumpLoad = defineCalculator({
  id: 'dump-load',
  station: 'load',
  title: 'The dump load',
  summary: 'The heater that takes what nobody uses, so that the set never runs away.',
  hazards: ['electricity'],
  inputs: {
    power: {
      kind: 'scalar',
      symbol: 'P',
      label: 'Power of the heater',
      quantity: 'power',
      help: 'at the voltage below',
      range: [0.1, 1e7],
      usual: [100, 50_000],
      initial: 3000,
    },
    voltage: {
      kind: 'scalar',
      symbol: 'U',
      label: 'Voltage',
      quantity: 'voltage',
      range: [1, 10_000],
      usual: [12, 1000],
      initial: 230,
    },
    highestVoltage: {
      kind: 'scalar',
      symbol: 'U_h',
      label: 'Highest voltage',
      quantity: 'voltage',
      help: 'that it can ever see: a battery being equalised, a set before the governor acts',
      range: [1, 10_000],
      usual: [12, 1000],
      optional: true,
    },
    generatorGreatest: {
      kind: 'scalar',
      symbol: 'P_g',
      label: 'The most that the generator gives',
      quantity: 'power',
      range: [0.1, 1e7],
      usual: [100, 50_000],
      initial: 2300,
      optional: true,
    },
    waterVolume: {
      kind: 'scalar',
      symbol: 'V',
      label: 'Water that it warms',
      quantity: 'volume',
      range: [1e-4, 1000],
      usual: [0.02, 2],
      optional: true,
    },
    temperatureRise: {
      kind: 'scalar',
      symbol: '\\Delta t',
      label: 'By how much it is warmed',
      quantity: 'temperatureDifference',
      range: [0.1, 95],
      usual: [10, 60],
      goesWith: 'waterVolume',
    },
  },
  outputs: {
    resistance: { kind: 'scalar', symbol: 'R', label: 'Resistance', quantity: 'resistance' },
    current: { kind: 'scalar', symbol: 'I', label: 'Current', quantity: 'current' },
    powerAtHighest: {
      kind: 'scalar',
      symbol: 'P_h',
      label: 'Power at the highest voltage',
      quantity: 'power',
      sometimes: true,
    },
    sizeMargin: {
      kind: 'scalar',
      symbol: 'm',
      label: 'Heater over generator',
      quantity: 'ratio',
      help: 'want 1.2 or more',
      sometimes: true,
    },
    heatingTime: {
      kind: 'scalar',
      symbol: 't_w',
      label: 'Time to warm the water',
      quantity: 'time',
      unit: 'h',
      sometimes: true,
    },
  },
  solve({ power, voltage, highestVoltage, generatorGreatest, waterVolume, temperatureRise }) {
    const resistance = (voltage * voltage) / power
    return {
      resistance,
      current: power / voltage,
      powerAtHighest: highestVoltage === undefined ? undefined : (highestVoltage * highestVoltage) / resistance,
      sizeMargin: generatorGreatest === undefined ? undefined : power / generatorGreatest,
      heatingTime:
        waterVolume === undefined
          ? undefined
          : (waterDensity(coldWater) * waterVolume * specificHeat * temperatureRise!) / power,
    }
  },
  working: (write, _, { powerAtHighest, sizeMargin, heatingTime }) => [
    {
      say: 'A heater of this power has this resistance.',
      formula: write`${'resistance'} = \frac{${'voltage'}^2}{${'power'}}`,
      gives: 'resistance',
    },
    { say: 'It draws this current.', formula: write`${'current'} = \frac{${'power'}}{${'voltage'}}`, gives: 'current' },
    ...(powerAtHighest === undefined
      ? []
      : [
          {
            say: 'At a higher voltage it takes more, by the square.',
            formula: write`${'powerAtHighest'} = \frac{${'highestVoltage'}^2}{${'resistance'}}`,
            gives: 'powerAtHighest' as const,
          },
        ]),
    ...(sizeMargin === undefined
      ? []
      : [
          {
            say: 'It must take all that the generator can give, and some more.',
            formula: write`${'sizeMargin'} = \frac{${'power'}}{${'generatorGreatest'}}`,
            gives: 'sizeMargin' as const,
          },
        ]),
    ...(heatingTime === undefined
      ? []
      : [
          {
            say: 'The heat that the water takes, over the power.',
            formula: write`${'heatingTime'} = \frac{${{ symbol: '\\rho', value: waterDensity(coldWater), say: 'the density of water' }} \, ${'waterVolume'} \, ${{ symbol: 'c', value: specificHeat, say: 'the specific heat of water' }} \, ${'temperatureRise'}}{${'power'}}`,
            gives: 'heatingTime' as const,
          },
        ]),
  ],
  cautions: (_, { sizeMargin, heatingTime }) => [
    {
      level: 'check',
      about: ['power'],
      hazard: 'electricity',
      say: 'Nothing may open this circuit by itself: without it the set runs away. Its wiring, fuse and earthing are for local code and a licensed electrician; d.c. needs switchgear rated for d.c.',
    },
    {
      level: 'check',
      about: ['resistance'],
      say: 'Its surface burns, and it sets fire to what lies on it: mount it in the open, on what cannot burn, behind a guard.',
    },
    ...(sizeMargin !== undefined && sizeMargin < wantedMargin
      ? [
          {
            level: sizeMargin < 1 ? ('stop' as const) : ('check' as const),
            about: ['sizeMargin' as const],
            say:
              sizeMargin < 1
                ? 'It cannot take all that the generator gives: with the loads off the set runs away. Take a larger heater.'
                : 'Less than a fifth to spare: heaters fail one by one. Take 1.2 times the generator’s most, better in several elements (common practice, no source).',
          },
        ]
      : []),
    ...(heatingTime === undefined
      ? []
      : [
          {
            level: 'check' as const,
            about: ['heatingTime' as const],
            say: 'A tank boils, and boils dry: give it an overflow, water that comes by itself, and a second heater that takes over when it is hot. Hot water stores want a relief valve, fitted by local code.',
          },
        ]),
  ],
  doesNotCheck: [
    'what happens when it fails: keep a spare element and watch the voltage',
    'how warm the room gets',
    'the controller that feeds it',
  ],
  example: {
    say: 'Over Quern: four elements in a tank that warms the washhouse.',
    inputs: {
      power: 12_000,
      voltage: 400,
      highestVoltage: 440,
      generatorGreatest: 9500,
      waterVolume: 0.3,
      temperatureRise: 45,
    },
  },
  plots: [
    {
      say: 'A little more voltage is much more power.',
      of: 'powerAtHighest',
      against: 'highestVoltage',
      from: 0.6,
      to: 1.3,
    },
  ],
  sources: [
    { author: 'J. P. Joule', title: 'On the heat evolved by metallic conductors of electricity', year: 1841 },
    {
      author: 'NIST',
      title: 'Special Publication 811',
      year: 2008,
      where: 'B.8: the calorie and the kilowatt-hour in joules',
    },
  ],
})
