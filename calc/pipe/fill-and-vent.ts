import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { seaLevelPressure as atmosphere } from '../water/atmosphere.ts'

/** Of outside air at sea level, 15 °C: ISO 2533. */
const airDensity = 1.225
/** Ratio of the specific heats of air. */
const gamma = 1.4
/** Discharge coefficient of an air valve's opening: AWWA M51. */
const dischargeCoefficient = 0.7
/** Below this ratio of pressures the air runs at the speed of sound, and more vacuum draws no more. */
const soundAt = (2 / (gamma + 1)) ** (gamma / (gamma - 1))
const mostDrawing = (1 - soundAt) * atmosphere
/** Air that leaves faster than this makes the last water slam: common practice, no source. */
const fastAir = 25

/** Speed of outside air drawn into a vacuum, referred to its own density, m/s: an opening without loss. */
const airSpeed = (vacuum: number): number => {
  const ratio = Math.max((atmosphere - vacuum) / atmosphere, soundAt)
  const expansion = (2 * gamma) / (gamma - 1)
  const drop = ratio ** (2 / gamma) * (1 - ratio ** ((gamma - 1) / gamma))
  return Math.sqrt((expansion * drop * atmosphere) / airDensity)
}

const areaOf = (diameter: number): number => (Math.PI / 4) * diameter ** 2

/**
 * Filling and venting a pipe: time V/Q; the speed of the air that the water pushes out of a vent of diameter d, Q/A (continuity); the flow of
 * outside air that the same vent lets in at the vacuum the pipe may have, as an orifice with C_d 0.7 in compressible air: growing with the
 * root of the vacuum while that is small, and no more beyond 48 kPa, where the air runs at the speed of sound; the time in which a burst
 * empties the pipe. SI, vacuum as Pa under the air's pressure. Valid at sea level, for a short open vent: a long thin one passes much
 * less. Sources below.
 */
export const fillAndVent = defineCalculator({
  id: 'fill-and-vent',
  station: 'pipe',
  title: 'Filling and venting',
  summary:
    'How long the pipe takes to fill, how fast its air leaves, and how much air a vent lets in when the pipe runs empty.',
  hazards: ['pressure'],
  inputs: {
    pipeVolume: {
      kind: 'scalar',
      symbol: 'V',
      label: 'Water in the full pipe',
      quantity: 'volume',
      range: [1e-5, 1e7],
      usual: [0.01, 1e4],
      initial: 1.77,
    },
    fillFlow: {
      kind: 'scalar',
      symbol: 'Q_f',
      label: 'Flow when filling',
      quantity: 'flow',
      help: 'a fifth of the full flow or less: common practice',
      range: [1e-7, 1000],
      initial: 0.0015,
    },
    ventDiameter: {
      kind: 'scalar',
      symbol: 'd',
      label: 'Vent diameter',
      quantity: 'length',
      help: 'of its narrowest opening',
      range: [0.0005, 5],
      usual: [0.005, 0.3],
      initial: 0.025,
    },
    allowedVacuum: {
      kind: 'scalar',
      symbol: 'p_v',
      label: 'Allowed vacuum',
      quantity: 'pressure',
      help: 'how far under the pressure of the air the pipe may be sucked: see collapse, with its safety factor',
      range: [10, 101_000],
      usual: [1000, 50_000],
      unit: 'kPa',
      initial: 15_000,
    },
    burstOutflow: {
      kind: 'scalar',
      symbol: 'Q_b',
      label: 'Flow out of a burst',
      quantity: 'flow',
      help: 'or of an emptying valve: what may run out below',
      range: [0, 1000],
      initial: 0.03,
      optional: true,
    },
  },
  outputs: {
    fillTime: { kind: 'scalar', symbol: 't_f', label: 'Time to fill', quantity: 'time', unit: 'min' },
    fillAirVelocity: { kind: 'scalar', symbol: 'v_a', label: 'Air leaving by the vent', quantity: 'velocity' },
    ventAirFlow: {
      kind: 'scalar',
      symbol: 'Q_a',
      label: 'Air that the vent lets in',
      quantity: 'flow',
      help: 'as outside air, at the allowed vacuum',
    },
    drainTime: {
      kind: 'scalar',
      symbol: 't_b',
      label: 'Time to run empty',
      quantity: 'time',
      unit: 'min',
      sometimes: true,
    },
  },
  solve({ pipeVolume, fillFlow, ventDiameter, allowedVacuum, burstOutflow }) {
    const area = areaOf(ventDiameter)
    const found: { fillTime: number; fillAirVelocity: number; ventAirFlow: number; drainTime?: number } = {
      fillTime: pipeVolume / fillFlow,
      fillAirVelocity: fillFlow / area,
      ventAirFlow: dischargeCoefficient * area * airSpeed(allowedVacuum),
    }
    const drainTime = pipeVolume / (burstOutflow ?? 0)
    if (Number.isFinite(drainTime)) found.drainTime = drainTime
    return found
  },
  working(write, { ventDiameter, allowedVacuum }, { drainTime }) {
    const area = { symbol: 'A', value: areaOf(ventDiameter), say: 'the opening of the vent' }
    const speed = { symbol: 'v_i', value: airSpeed(allowedVacuum), say: 'the speed of the air drawn in' }
    const coefficient = { symbol: 'C_d', value: dischargeCoefficient, say: 'the discharge coefficient' }
    const air = { symbol: 'p_a', value: atmosphere, say: 'the pressure of the air' }
    const density = { symbol: '\\rho_a', value: airDensity, say: 'the density of the air' }
    const ratio = {
      symbol: 'r',
      value: Math.max(1 - allowedVacuum / atmosphere, soundAt),
      say: 'the ratio of pressures',
    }
    return [
      {
        say: 'The volume over the flow that fills it.',
        formula: write`${'fillTime'} = \frac{${'pipeVolume'}}{${'fillFlow'}}`,
        gives: 'fillTime',
      },
      {
        say: 'The opening of the vent.',
        formula: write`\frac{\pi}{4} \, ${'ventDiameter'}^2 = ${{ ...area, unit: 'm²' }}`,
      },
      {
        say: 'As much air leaves as water comes in.',
        formula: write`${'fillAirVelocity'} = \frac{${'fillFlow'}}{${area}}`,
        gives: 'fillAirVelocity',
      },
      allowedVacuum < mostDrawing
        ? {
            say: 'The pressure inside over that outside.',
            formula: write`1 - \frac{${'allowedVacuum'}}{${air}} = ${ratio}`,
          }
        : {
            say: 'At this vacuum the air enters at the speed of sound: a deeper one draws no more than a ratio of pressures of 0.528 does.',
          },
      {
        say: 'The speed of outside air that is drawn in and expands on its way, without losses.',
        formula: write`\sqrt{7 \, \frac{${air}}{${density}} \, ${ratio}^{2 / 1.4} \, (1 - ${ratio}^{0.4 / 1.4})} = ${{ ...speed, unit: 'm/s' }}`,
      },
      {
        say: 'The opening passes a part of that.',
        formula: write`${'ventAirFlow'} = ${coefficient} \, ${area} \, ${speed}`,
        gives: 'ventAirFlow',
      },
      ...(drainTime === undefined
        ? []
        : [
            {
              say: 'If that flow lasts, the pipe is empty after this time.',
              formula: write`${'drainTime'} = \frac{${'pipeVolume'}}{${'burstOutflow'}}`,
              gives: 'drainTime' as const,
            },
          ]),
    ]
  },
  cautions({ allowedVacuum, burstOutflow }, { fillAirVelocity, ventAirFlow }) {
    return [
      {
        level: 'check',
        about: ['fillFlow'],
        hazard: 'pressure',
        say: 'Fill slowly, with every vent and a nozzle open, until no more air comes; then shut the nozzle slowly. Air that is shut in is a spring, and pipe that lets go under it flies: keep people off. Local code and the pipe maker’s data rule tests.',
      },
      ...(burstOutflow !== undefined && burstOutflow > ventAirFlow
        ? [
            {
              level: 'stop' as const,
              about: ['burstOutflow' as const, 'ventAirFlow' as const],
              hazard: 'pressure' as const,
              say: `More water runs out than the vent lets air in (${join(format(ventAirFlow, 'flow'))}): the vacuum goes past the allowed one, and the pipe may be sucked flat. Take a wider vent, or more of them.`,
            },
          ]
        : []),
      ...(fillAirVelocity > fastAir
        ? [
            {
              level: 'check' as const,
              about: ['fillAirVelocity' as const],
              say: `Air over about ${fastAir} m/s in the vent (common practice, no source): when the last of it is out the water slams. Fill slower.`,
            },
          ]
        : []),
      ...(allowedVacuum >= mostDrawing
        ? [
            {
              level: 'note' as const,
              about: ['allowedVacuum' as const],
              say: 'Over 48 kPa of vacuum the vent draws no more air, however deep it gets.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['ventDiameter'],
        say: 'For a short open vent at sea level. A long thin pipe, a grating, frost or a wasps’ nest lets far less in: make it wide, turn it down, keep it clear.',
      },
    ]
  },
  doesNotCheck: [
    'humps, where air stays unless each has its own vent: see pipe profile',
    'friction in the vent’s pipe',
    'how much a burst really lets out',
  ],
  example: {
    say: 'Over Quern: a long pipe filled by hand over the morning, and a burst at the powerhouse.',
    inputs: { pipeVolume: 10, fillFlow: 0.002, ventDiameter: 0.04, allowedVacuum: 20_000, burstOutflow: 0.09 },
  },
  plots: [
    {
      say: 'Half the vent, a quarter of the air.',
      of: 'ventAirFlow',
      against: 'ventDiameter',
      from: 0.3,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'AWWA',
      title: 'M51, Air valves: air-release, air/vacuum and combination',
      year: 2001,
      where: 'ch. 4, inflow of air; discharge coefficient 0.7',
    },
    { author: 'ISO', title: 'ISO 2533, standard atmosphere', year: 1975 },
  ],
})
