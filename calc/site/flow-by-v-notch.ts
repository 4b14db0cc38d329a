import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { thinPlateCautions } from './thin-plate.ts'

/**
 * Coefficient of a fully contracted notch against its angle: the parabola through three points of the curve in ISO 1438 (USBR, figure
 * 7-6b): least 0.576 at about 72°, 0.578 at 90°, 0.589 at 25°. Within half a unit of rounding of the points that Blevins (1984) prints
 * after Shen.
 */
export const notchCoefficient = (degrees: number): number => 0.576 + 5.965e-6 * (degrees - 71.7) ** 2

/**
 * What surface tension and viscosity add to the head, m: an exponential through the curve in ISO 1438 (USBR, figure 7-6a): 1.67 mm at 40°,
 * 1.16 mm at 60°, 0.85 mm at 90°. Within 0.05 mm of that figure from 25° to 80°, and 0.1 mm up to 100°.
 */
export const notchHeadCorrection = (degrees: number): number => 0.0007 + 0.00097 * Math.exp((40 - degrees) / 26.8)

const radians = (degrees: number): number => (degrees * Math.PI) / 180

/** Limits within which the coefficient of a fully contracted notch holds: USBR Water Measurement Manual, ch. 7, 7; M. G. Bos (1989), 5.2. */
const limits = {
  head: [0.06, 0.38],
  headOverCrestHeight: 0.4,
  headOverWidth: 0.2,
  crestHeight: 0.45,
  approachWidth: 0.9,
} as const

/**
 * Flow over a sharp triangular notch of angle θ, fully contracted: Q = 8/15·Ce·tan(θ/2)·√(2g)·(h + kh)^2.5 (Kindsvater and Shen), h the
 * head over the point of the notch, Ce and kh by the angle alone. SI, degrees. Valid from 25° to 100°, h 60 mm to 0.38 m, h/p up to 0.4,
 * h/B up to 0.2, p at least 0.45 m, B at least 0.9 m (p the height of the point over the bed, B the width of the approach). Errors: 1 to
 * 2 % in Ce, and 2.5 % of flow for each 1 % of head. Sources below.
 */
export const flowByVNotch = defineCalculator({
  id: 'flow-by-v-notch',
  station: 'stream',
  title: 'Flow by V-notch',
  summary: 'What runs over a sharp triangular notch, from the height of the water behind it.',
  hazards: ['stream'],
  inputs: {
    head: {
      kind: 'scalar',
      symbol: 'h',
      label: 'Head over the notch',
      quantity: 'length',
      help: 'from the point of the notch up to still water, read about four heads upstream',
      range: [0.001, 3],
      initial: 0.142,
    },
    notchAngle: {
      kind: 'scalar',
      symbol: '\\theta',
      label: 'Angle of the notch',
      quantity: 'angle',
      help: 'between its two edges; check it with a square or by widths at two heights',
      range: [25, 100],
      initial: 90,
    },
    crestHeight: {
      kind: 'scalar',
      symbol: 'p',
      label: 'Height of the point',
      quantity: 'length',
      help: 'over the bed of the pool behind the plate',
      range: [0.01, 20],
      unit: 'm',
      initial: 0.5,
      optional: true,
    },
    approachWidth: {
      kind: 'scalar',
      symbol: 'B',
      label: 'Width of the approach',
      quantity: 'length',
      help: 'of the pool where the head is read',
      range: [0.05, 100],
      unit: 'm',
      initial: 1.2,
      optional: true,
    },
  },
  outputs: {
    flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
    dischargeCoefficient: {
      kind: 'scalar',
      symbol: 'C_e',
      label: 'Discharge coefficient',
      quantity: 'ratio',
      help: 'goes with the corrected head',
    },
  },
  solve({ head, notchAngle }) {
    const dischargeCoefficient = notchCoefficient(notchAngle)
    return {
      flow:
        (8 / 15) *
        dischargeCoefficient *
        Math.tan(radians(notchAngle) / 2) *
        Math.sqrt(2 * g) *
        (head + notchHeadCorrection(notchAngle)) ** 2.5,
      dischargeCoefficient,
    }
  },
  working(write, { notchAngle }) {
    const correction = {
      symbol: 'k_h',
      value: notchHeadCorrection(notchAngle),
      say: 'the correction of the head',
      digits: 3,
    }
    return [
      {
        say: 'The angle of the notch decides its coefficient, by a curve drawn through the figure of the standard.',
        formula: write`${'dischargeCoefficient'} = 0.576 + 5.965 \times 10^{-6} \, (${'notchAngle'} - 71.7)^2`,
        gives: 'dischargeCoefficient',
      },
      {
        say: 'Surface tension and viscosity act as if the water stood a little higher; this too goes by the angle, in metres.',
        formula: write`0.0007 + 0.00097 \, e^{(40 - ${'notchAngle'}) / 26.8} = ${{ ...correction, unit: 'm' }}`,
      },
      {
        say: 'The deeper the water in the notch, the wider and the faster it runs: the flow goes with the head to the power 2.5.',
        formula: write`${'flow'} = \frac{8}{15} \, ${'dischargeCoefficient'} \, \tan\left(\frac{${'notchAngle'}}{2}\right) \, \sqrt{2 \, ${gravity}} \, (${'head'} + ${correction})^{2.5}`,
        gives: 'flow',
      },
    ]
  },
  cautions({ head, crestHeight, approachWidth }) {
    const outside = [
      head < limits.head[0] ? 'the head is under 60 mm, where water clings to the plate' : '',
      head > limits.head[1] ? 'the head is over 0.38 m' : '',
      crestHeight !== undefined && head > limits.headOverCrestHeight * crestHeight
        ? 'the head is over 0.4 of the height of the point'
        : '',
      crestHeight !== undefined && crestHeight < limits.crestHeight ? 'the point is less than 0.45 m over the bed' : '',
      approachWidth !== undefined && head > limits.headOverWidth * approachWidth
        ? 'the head is over 0.2 of the width of the approach'
        : '',
      approachWidth !== undefined && approachWidth < limits.approachWidth ? 'the approach is narrower than 0.9 m' : '',
    ].filter(Boolean)
    return [
      ...(outside.length > 0
        ? [
            {
              level: 'check' as const,
              about: [
                'head' as const,
                ...(crestHeight === undefined ? [] : ['crestHeight' as const]),
                ...(approachWidth === undefined ? [] : ['approachWidth' as const]),
              ],
              say: `Outside the limits of a fully contracted notch (Bos 1989; USBR 2001): ${outside.join('; ')}. The flow may then be off by more than a few per cent.`,
            },
          ]
        : []),
      ...(crestHeight === undefined || approachWidth === undefined
        ? [
            {
              level: 'note' as const,
              about: ['flow' as const],
              say: 'Without the height of the point and the width of the approach it is not checked whether the notch is fully contracted: a shallow or narrow pool passes more than is found here.',
            },
          ]
        : []),
      {
        level: 'note',
        about: ['head'],
        say: 'One per cent of head is two and a half per cent of flow: read it to the millimetre.',
      },
      ...thinPlateCautions,
    ]
  },
  doesNotCheck: [
    'whether all of the stream runs over the notch, and none under or around it',
    'whether today is like the rest of the year',
  ],
  example: {
    say: 'Over Quern: a narrow notch for the small flow of a dry August.',
    inputs: { head: 0.187, notchAngle: 60, crestHeight: 0.55, approachWidth: 1.1 },
  },
  plots: [
    {
      say: 'Twice the head is more than five times the flow.',
      of: 'flow',
      against: 'head',
      from: 0.3,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'ISO',
      title: 'ISO 1438, Hydrometry: open channel flow measurement using thin-plate weirs',
      year: 2017,
      where: 'triangular-notch weir (points of its curves from memory)',
    },
    {
      author: 'US Bureau of Reclamation',
      title: 'Water Measurement Manual, 3rd ed., revised reprint',
      year: 2001,
      where: 'chapter 7, section 7 and figure 7-6',
    },
    {
      author: 'J. Shen',
      title: 'Discharge characteristics of triangular-notch thin-plate weirs, USGS Water-Supply Paper 1617-B',
      year: 1981,
      where: 'as R. D. Blevins, Applied Fluid Dynamics Handbook, 1984, gives its points',
    },
    {
      author: 'M. G. Bos (ed.)',
      title: 'Discharge Measurement Structures, 3rd ed., ILRI Publication 20',
      year: 1989,
      where: 'V-notch weir, limits of application (from memory)',
    },
  ],
})
