import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { format, join } from '../units/format.ts'
import { seaLevelPressure } from '../water/atmosphere.ts'
import { waterTemperature } from '../water/inputs.ts'
import { vapourPressure, waterDensity } from '../water/properties.ts'
import { insideDiameter, pipeLength } from './inputs.ts'

/** Above this closure parameter the steady rise that Michaud's rule supposes is not what a valve makes. */
const steadyRiseTo = 2
/** What every surge has. */
type Always =
  'waveSpeed' | 'criticalTime' | 'surgePressure' | 'worstSurge' | 'peakPressure' | 'minimumPressure' | 'rapid'

/** No metal is as soft as this, no plastic as stiff. */
const softerThanMetal = 2e10

/**
 * Water hammer in one pipe when its water is slowed by Δv (m/s). Wave speed a = √(K/ρ ÷ (1 + c·K·D/(E·e))), D the inside diameter, e the
 * wall (m), E the wall's short-term modulus and K the water's bulk modulus (Pa), c the restraint's factor. Closed within 2L/a (s) the rise
 * is Joukowsky's ρaΔv; slower, Michaud's 2ρLΔv/t with the **effective** closure time t. The same below the static pressure is the low wave.
 * Valid for an even pipe without branches, full of water free of air; air, several sizes and a valve's own law want a simulation. Sources
 * below.
 */
export const surge = defineCalculator({
  id: 'surge',
  station: 'pipe',
  title: 'Surge',
  summary: 'How far the pressure jumps and dips when the water in the pipe is stopped.',
  hazards: ['pressure'],
  inputs: {
    length: { ...pipeLength, help: 'from the valve to open water, along the pipe', initial: 240 },
    insideDiameter: {
      ...insideDiameter,
      initial: 0.0968,
      pick: { table: 'pe-pipe', column: 'insideDiameter' },
    },
    wallThickness: {
      kind: 'scalar',
      symbol: 'e',
      label: 'Wall thickness',
      quantity: 'length',
      range: [1e-5, 5],
      usual: [0.0005, 0.1],
      unit: 'mm',
      initial: 0.0066,
      pick: { table: 'pe-pipe', column: 'wallThickness' },
    },
    pipeModulus: {
      kind: 'scalar',
      symbol: 'E',
      label: 'Modulus of the wall',
      quantity: 'pressure',
      help: 'short-term: a wave is over in seconds. Polyethylene 0.75 to 1.4 GPa, PVC about 3, steel about 207',
      range: [1e7, 1e12],
      usual: [5e8, 2.2e11],
      unit: 'GPa',
      initial: 1e9,
      pick: { table: 'moduli', column: 'shortTerm' },
    },
    bulkModulus: {
      kind: 'scalar',
      symbol: 'K',
      label: 'Bulk modulus of the water',
      quantity: 'pressure',
      range: [1e7, 1e10],
      usual: [2e9, 2.3e9],
      unit: 'GPa',
      fallback: 2.1e9,
      optional: true,
    },
    restraint: {
      kind: 'scalar',
      symbol: 'c',
      label: 'Restraint factor',
      quantity: 'ratio',
      help: '1 for pipe with expansion joints; anchored all along 1 less Poisson’s ratio squared, about 0.8 to 0.9',
      range: [0.5, 1.5],
      usual: [0.75, 1.1],
      fallback: 1,
      optional: true,
    },
    velocityChange: {
      kind: 'scalar',
      symbol: '\\Delta v',
      label: 'Speed taken off the water',
      quantity: 'velocity',
      help: 'all of the water’s speed, where the valve or the nozzle shuts wholly',
      range: [0, 100],
      usual: [0.1, 5],
      initial: 1.29,
    },
    closureTime: {
      kind: 'scalar',
      symbol: 't_c',
      label: 'Effective closure time',
      quantity: 'time',
      help: 'in which the flow really stops: often a fifth to a half of the time that the handle takes',
      range: [0, 1e5],
      usual: [0.01, 600],
      initial: 6,
    },
    staticPressure: {
      kind: 'scalar',
      symbol: 'p_0',
      label: 'Static pressure',
      quantity: 'pressure',
      help: 'at the valve, with it shut',
      range: [0, 1e8],
      initial: 4.7e5,
    },
    waterTemperature,
  },
  outputs: {
    waveSpeed: { kind: 'scalar', symbol: 'a', label: 'Wave speed', quantity: 'velocity' },
    criticalTime: {
      kind: 'scalar',
      symbol: 't_r',
      label: 'Time of the wave, there and back',
      quantity: 'time',
      help: 'closing faster than this makes the full surge',
    },
    surgePressure: { kind: 'scalar', symbol: '\\Delta p', label: 'Surge pressure', quantity: 'pressure' },
    worstSurge: {
      kind: 'scalar',
      symbol: '\\Delta p_J',
      label: 'Worst surge',
      quantity: 'pressure',
      help: 'if the water is stopped at once',
    },
    peakPressure: { kind: 'scalar', symbol: 'p_{max}', label: 'Peak pressure', quantity: 'pressure' },
    minimumPressure: {
      kind: 'scalar',
      symbol: 'p_{min}',
      label: 'Lowest pressure',
      quantity: 'pressure',
      help: 'over the air’s: below zero the pipe is sucked in',
    },
    closureParameter: {
      kind: 'scalar',
      symbol: '\\mathrm{Al}',
      label: 'Closure parameter',
      quantity: 'ratio',
      help: 'full surge over twice the static pressure',
      sometimes: true,
    },
    rapid: { kind: 'scalar', label: 'Closes faster than the wave (1 yes, 0 no)', quantity: 'count' },
  },
  solve({
    length,
    insideDiameter,
    wallThickness,
    pipeModulus,
    bulkModulus,
    restraint,
    velocityChange,
    closureTime,
    staticPressure,
    waterTemperature,
  }) {
    const density = waterDensity(waterTemperature)
    const softness = (restraint * bulkModulus * insideDiameter) / (pipeModulus * wallThickness)
    const waveSpeed = Math.sqrt(bulkModulus / density / (1 + softness))
    const criticalTime = (2 * length) / waveSpeed
    const worstSurge = density * waveSpeed * velocityChange
    const rapid = closureTime <= criticalTime
    const surgePressure = rapid ? worstSurge : (2 * density * length * velocityChange) / closureTime
    const staticHead = staticPressure / (density * g)
    const closureParameter = (waveSpeed * velocityChange) / (2 * g * staticHead)
    const found: Record<Always, number> & { closureParameter?: number } = {
      waveSpeed,
      criticalTime,
      surgePressure,
      worstSurge,
      peakPressure: staticPressure + surgePressure,
      minimumPressure: staticPressure - surgePressure,
      rapid: rapid ? 1 : 0,
    }
    if (Number.isFinite(closureParameter)) found.closureParameter = closureParameter
    return found
  },
  working(write, { waterTemperature, staticPressure }, { rapid, closureParameter }) {
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    const head = { symbol: 'H_0', value: staticPressure / (density.value * g), say: 'the static head' }
    return [
      {
        say: 'The wave runs as fast as the water’s and the wall’s stiffness let it: in soft plastic much slower than in steel.',
        formula: write`${'waveSpeed'} = \sqrt{\frac{${'bulkModulus'} / ${density}}{1 + ${'restraint'} \, \frac{${'bulkModulus'} \, ${'insideDiameter'}}{${'pipeModulus'} \, ${'wallThickness'}}}}`,
        gives: 'waveSpeed',
      },
      {
        say: 'The time it takes to the open end and back.',
        formula: write`${'criticalTime'} = \frac{2 \, ${'length'}}{${'waveSpeed'}}`,
        gives: 'criticalTime',
      },
      {
        say: 'If the water is stopped before the wave is back, the whole of its speed becomes pressure (Joukowsky).',
        formula: write`${'worstSurge'} = ${density} \, ${'waveSpeed'} \, ${'velocityChange'}`,
        gives: 'worstSurge',
      },
      rapid === 1
        ? {
            say: 'It closes within that time (1): the surge is the worst one.',
            formula: write`${'surgePressure'} = ${density} \, ${'waveSpeed'} \, ${'velocityChange'}`,
            gives: 'surgePressure' as const,
          }
        : {
            say: 'It closes slower than that (0): the wave that comes back takes some of the rise away (Michaud).',
            formula: write`${'surgePressure'} = \frac{2 \, ${density} \, ${'length'} \, ${'velocityChange'}}{${'closureTime'}}`,
            gives: 'surgePressure' as const,
          },
      {
        say: 'The closure time beside the time of the wave decides which of the two it is: 1 where it is not longer.',
        gives: 'rapid',
      },
      {
        say: 'On top of the static pressure.',
        formula: write`${'peakPressure'} = ${'staticPressure'} + ${'surgePressure'}`,
        gives: 'peakPressure',
      },
      {
        say: 'Half a swing later it is as far below.',
        formula: write`${'minimumPressure'} = ${'staticPressure'} - ${'surgePressure'}`,
        gives: 'minimumPressure',
      },
      ...(closureParameter === undefined
        ? []
        : [
            {
              say: 'How the full surge stands to the static head: a large figure means that the rise comes early and steep.',
              formula: write`${'closureParameter'} = \frac{${'waveSpeed'} \, ${'velocityChange'}}{2 \, ${gravity} \, ${head}}`,
              gives: 'closureParameter' as const,
            },
          ]),
    ]
  },
  cautions({ pipeModulus, waterTemperature }, { worstSurge, minimumPressure, closureParameter, rapid }) {
    const worst = join(format(worstSurge, 'pressure'))
    const parted = minimumPressure < vapourPressure(waterTemperature) - seaLevelPressure
    return [
      {
        level: 'check',
        about: ['peakPressure', 'worstSurge'],
        hazard: 'pressure',
        say: `A stone or a leaf in a nozzle shuts it at once, however slow the valve: that is the worst surge, ${worst}. Pipe, joints and anchors must stand it by the pipe maker’s data and local code.`,
      },
      {
        level: 'note',
        about: ['closureTime'],
        say: 'Valves throttle late: most of the way hardly slows the water, and the last fifth stops it. Take the effective time, and use valves that cannot be slammed.',
      },
      ...(parted
        ? [
            {
              level: 'stop' as const,
              about: ['minimumPressure' as const],
              hazard: 'pressure' as const,
              say: 'The low wave would pull the water apart: it boils, and slams together again harder than the surge worked out here. Close slower, or take slower water.',
            },
          ]
        : minimumPressure < 0
          ? [
              {
                level: 'check' as const,
                about: ['minimumPressure' as const],
                say: 'The low wave goes below the pressure of the air at the valve: joints draw in dirt and air, and thin pipe can collapse. See collapse.',
              },
            ]
          : []),
      {
        level: 'check',
        about: ['minimumPressure'],
        say: 'Higher up the static pressure is less and the low wave nearly as deep: a hump parts the water long before the valve does.',
      },
      ...(rapid === 0 && closureParameter !== undefined && closureParameter > steadyRiseTo
        ? [
            {
              level: 'check' as const,
              about: ['closureParameter' as const, 'surgePressure' as const],
              say: `With a closure parameter over ${steadyRiseTo} Michaud’s rule may be low, since the pressure does not rise evenly: design on the worst surge, ${worst}.`,
            },
          ]
        : []),
      ...(pipeModulus < softerThanMetal
        ? [
            {
              level: 'check' as const,
              about: ['pipeModulus' as const],
              say: 'Plastic is stiffer in the cold and under a blow, and the surge with it: polyethylene has from 0.75 GPa in summer to 1.4 GPa near freezing. Reckon the worst surge with the stiffest.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'pipe of several sizes, branches, and the wave’s way through them',
    'air in the pipe, which may soften the surge or make it worse',
    'whether the pipe holds it: see pressure class and collapse',
  ],
  example: {
    say: 'Over Quern: a long pipe, a gate valve wound shut, and cold stiff plastic.',
    inputs: {
      length: 730,
      insideDiameter: 0.1322,
      wallThickness: 0.0139,
      pipeModulus: 1.3e9,
      velocityChange: 1.25,
      closureTime: 12,
      staticPressure: 10.2e5,
      waterTemperature: 4,
    },
  },
  plots: [
    {
      say: 'Up to the time of the wave nothing helps; then twice the time halves the surge.',
      of: 'surgePressure',
      against: 'closureTime',
      from: 0.02,
      to: 4,
    },
  ],
  sources: [
    {
      author: 'N. Joukowsky',
      title: 'Über den hydraulischen Stoss in Wasserleitungsröhren',
      year: 1898,
      where: 'from memory',
    },
    {
      author: 'E. B. Wylie, V. L. Streeter',
      title: 'Fluid Transients in Systems',
      year: 1993,
      where: 'wave speed and restraint (from memory)',
    },
    {
      author: 'K. Subramanya',
      title: '1000 Solved Problems in Fluid Mechanics',
      year: 2005,
      where: 'ch. 14 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
