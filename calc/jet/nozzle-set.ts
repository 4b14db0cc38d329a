import { g, gravity } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { grossHead } from '../pipe/inputs.ts'
import { velocityHead } from '../pipe/friction-factor.ts'
import { flowThroughNozzles } from '../pipe/penstock-flow.ts'
import { checkSections, sections } from '../pipe/penstock-sections.ts'
import { format, join } from '../units/format.ts'
import { waterTemperature } from '../water/inputs.ts'
import { waterDensity, waterKinematicViscosity } from '../water/properties.ts'
import { dischargeCoefficient, nozzleDiameter } from './inputs.ts'

const most = 6
/** Beyond a third of the gross head lost, another nozzle gives more water and less power. */
const mostUsefulLoss = 1 / 3

interface Nozzle {
  diameter: number
  dischargeCoefficient: number
}

const areaOf = (nozzles: readonly Nozzle[]): number =>
  nozzles.reduce(
    (sum, { diameter, dischargeCoefficient }) => sum + dischargeCoefficient * (Math.PI / 4) * diameter ** 2,
    0,
  )

const listed = new Intl.ListFormat('en', { type: 'conjunction' })

/**
 * What a set of fixed nozzles can pass, each that is open or shut: for every combination the flow that the open ones draw through the penstock,
 * Q = Σ(Cd·A)·√(2g·net head), solved with the pipe's loss (see `penstock`), the net head, and the power ρgQ·net head that reaches them. SI. With n
 * nozzles 2ⁿ − 1 combinations, least flow first; at most six nozzles. The power is the jets' but for the nozzles' own loss, 1 − Cv², which a
 * discharge coefficient alone does not tell. Refused: a wall's roughness that fills the bore. Sources: as `penstock`.
 */
export const nozzleSet = defineCalculator({
  id: 'nozzle-set',
  station: 'jet',
  title: 'A set of nozzles',
  summary: 'Which flows and powers a few fixed nozzles give, opened one by one and together.',
  hazards: ['pressure'],
  inputs: {
    grossHead: { ...grossHead, initial: 48 },
    sections,
    nozzles: {
      kind: 'rows',
      label: 'Nozzles',
      row: 'nozzle',
      help: 'each with its own valve, all at the foot of the pipe',
      columns: {
        diameter: nozzleDiameter,
        dischargeCoefficient,
      },
      least: 1,
      most,
      initial: [
        { diameter: 0.0165, dischargeCoefficient: 0.94 },
        { diameter: 0.012, dischargeCoefficient: 0.94 },
        { diameter: 0.0085, dischargeCoefficient: 0.94 },
      ],
    },
    waterTemperature,
  },
  outputs: {
    rows: {
      kind: 'rows',
      label: 'Open nozzles',
      columns: {
        whichOpen: { kind: 'text', label: 'Which open' },
        flow: { kind: 'scalar', symbol: 'Q', label: 'Flow', quantity: 'flow' },
        netHead: { kind: 'scalar', symbol: 'H_n', label: 'Net head', quantity: 'head' },
        jetPower: {
          kind: 'scalar',
          symbol: 'P_j',
          label: 'Power at the jets',
          quantity: 'power',
          help: 'with the nozzles’ own loss still in it, 2 to 10 per cent',
        },
      },
    },
  },
  solve({ grossHead, sections, nozzles, waterTemperature }) {
    checkSections(sections)
    const viscosity = waterKinematicViscosity(waterTemperature)
    const weight = waterDensity(waterTemperature) * g
    const rows = Array.from({ length: 2 ** nozzles.length - 1 }, (_, i) => {
      const open = nozzles.flatMap((nozzle, place) =>
        ((i + 1) >> place) & 1 ? [{ nozzle, name: `${place + 1}` }] : [],
      )
      const area = areaOf(open.map(({ nozzle }) => nozzle))
      const flow = flowThroughNozzles(grossHead, sections, area, viscosity)
      const netHead = velocityHead(flow / area)
      return {
        whichOpen: listed.format(open.map(({ name }) => name)),
        flow,
        netHead,
        jetPower: weight * flow * netHead,
      }
    })
    return { rows: rows.sort((a, b) => a.flow - b.flow) }
  },
  working(write, { nozzles, waterTemperature }, { rows }) {
    const all = rows.at(-1)!
    const area = { symbol: 'a', value: areaOf(nozzles), say: 'the discharging area' }
    const flow = { symbol: 'Q', value: all.flow, say: 'the flow' }
    const netHead = { symbol: 'H_n', value: all.netHead, say: 'the net head' }
    const density = { symbol: '\\rho', value: waterDensity(waterTemperature), say: 'the density of water' }
    return [
      {
        say: `With all ${nozzles.length === 1 ? 'of it' : nozzles.length} open: bore times discharge coefficient of each, added up, is the area that counts. A shut nozzle is left out of the sum.`,
        formula: {
          parts: [
            '',
            ' = \\frac{\\pi}{4} \\, (',
            ...nozzles.flatMap((_, i) => [' \\, ', i < nozzles.length - 1 ? '^2 + ' : '^2)']),
          ],
          holes: [
            { ...area, unit: 'm²' },
            ...nozzles.flatMap(({ diameter, dischargeCoefficient }, i) => [
              {
                symbol: `C_{d${i + 1}}`,
                value: dischargeCoefficient,
                say: `the discharge coefficient of nozzle ${i + 1}`,
              },
              { symbol: `d_{${i + 1}}`, value: diameter, say: `the diameter of nozzle ${i + 1}` },
            ]),
          ],
        },
      },
      {
        say: 'The nozzles pass what the net head drives through them, and that flow decides what the pipe leaves as net head: the flow that suits both was found by trial, for each combination.',
        formula: write`${{ ...flow, unit: 'm³/s' }} = ${area} \, \sqrt{2 \, ${gravity} \, ${netHead}}`,
      },
      {
        say: 'The power that this brings to the nozzles.',
        formula: write`${{ symbol: 'P_j', value: all.jetPower, say: 'the power', unit: 'W' }} = ${density} \, ${gravity} \, ${flow} \, ${netHead}`,
      },
    ]
  },
  cautions({ grossHead, waterTemperature }, { rows }) {
    const atRest = join(format(waterDensity(waterTemperature) * g * grossHead, 'pressure'))
    const tooMany = rows.find(({ netHead }) => netHead < grossHead * (1 - mostUsefulLoss))
    return [
      {
        level: 'stop',
        about: ['nozzles'],
        hazard: 'pressure',
        say: `Behind a shut nozzle stands ${atRest}. A jet cuts skin and throws stones; open and shut the valves slowly, one after the other, and drain the pipe before a nozzle comes off. Pipe and valves must be rated for static pressure and surge by their makers’ data and local code.`,
      },
      ...(tooMany
        ? [
            {
              level: 'check' as const,
              about: ['rows' as const],
              say: `With ${tooMany.whichOpen} open more than a third of the head is lost in the pipe: beyond that another nozzle brings more water and less power.`,
            },
          ]
        : []),
      {
        level: 'note',
        about: ['rows'],
        say: 'A runner is pitched for one jet speed: as more nozzles open, the net head and with it the best speed fall a little.',
      },
    ]
  },
  doesNotCheck: [
    'whether the stream has these flows',
    'whether the runner can pass so many jets, and how they disturb each other',
    'losses in the branches between the pipe’s end and each nozzle',
  ],
  example: {
    say: 'Over Quern: two like nozzles and a small one for the dry months.',
    inputs: {
      grossHead: 104,
      sections: [
        { length: 420, insideDiameter: 0.1322, roughness: 5e-5, totalK: 1.1, parallel: 1 },
        { length: 310, insideDiameter: 0.1108, roughness: 5e-5, totalK: 0.6, parallel: 1 },
      ],
      nozzles: [
        { diameter: 0.0145, dischargeCoefficient: 0.94 },
        { diameter: 0.0145, dischargeCoefficient: 0.94 },
        { diameter: 0.009, dischargeCoefficient: 0.92 },
      ],
      waterTemperature: 6,
    },
  },
  plots: [
    {
      say: 'More water costs head: the power grows less than the flow.',
      rows: 'rows',
      x: 'flow',
      y: ['jetPower'],
    },
  ],
  sources: [
    {
      author: 'B. R. Munson, D. F. Young, T. H. Okiishi',
      title: 'Fundamentals of Fluid Mechanics',
      year: 2007,
      where: 'example 12.6 (as recomputed in a public collection of textbook companions)',
    },
  ],
})
