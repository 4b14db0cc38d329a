import { defineCalculator } from '../definition.ts'
import { expansion } from '../tables/expansion.ts'
import { moduli } from '../tables/moduli.ts'
import { format, join, say } from '../units/format.ts'
import { pipeLength } from './inputs.ts'

type Figure = number | readonly [number, number]
/** The middle of what the table's sources give. */
const middle = (figure: Figure): number => (typeof figure === 'number' ? figure : (figure[0] + figure[1]) / 2)

/** A material's rows in the tables: of expansion, of stiffness. */
const rowsOf = {
  PE: ['polyethylene (PE)', 'PE 100'],
  'PVC-U': ['PVC-U', 'PVC-U'],
  steel: ['carbon steel', 'steel'],
  'stainless-steel': ['stainless steel, austenitic', 'stainless steel, austenitic'],
  'ductile-iron': ['ductile iron', 'ductile iron'],
  'cast-iron': ['cast iron, grey', 'cast iron, grey'],
  copper: ['copper', 'copper'],
} as const satisfies Record<
  string,
  [(typeof expansion.rows)[number]['material'], (typeof moduli.rows)[number]['material']]
>
type Material = keyof typeof rowsOf
const materials = Object.keys(rowsOf) as Material[]

const coefficientRange = (material: Material): Figure =>
  expansion.rows.find((row) => row.material === rowsOf[material][0])!.coefficient
const modulusRange = (material: Material): Figure =>
  moduli.rows.find((row) => row.material === rowsOf[material][1])!.shortTerm

const handbook = Object.fromEntries(
  materials.map((material) => [
    material,
    { coefficient: middle(coefficientRange(material)), modulus: middle(modulusRange(material)) },
  ]),
) as Record<Material, { coefficient: number; modulus: number }>

interface Figures {
  material: Material
  expansionCoefficient?: number
  modulus?: number
}
const coefficientOf = ({ material, expansionCoefficient }: Figures): number =>
  expansionCoefficient ?? handbook[material].coefficient
const modulusOf = ({ material, modulus }: Figures): number => modulus ?? handbook[material].modulus

/**
 * What warmth does to a pipe: free to move it grows by αLΔT; held at both ends it pushes with EAαΔT instead, whatever its length. α (1/K) and
 * the short-term E (Pa) by material from the tables, the middle where sources differ, or the maker's own; A the section of the wall. SI,
 * warming counts plus, and a push plus. Valid for an even temperature through the wall; plastic that is held lets go of most of the
 * force within hours, so this is the first one. Sources stand in the tables.
 */
export const pipeMovement = defineCalculator({
  id: 'pipe-movement',
  station: 'pipe',
  title: 'Movement with temperature',
  summary:
    'How far a pipe grows or shrinks when its temperature changes, or how hard it pushes or pulls where it is held.',
  hazards: ['pressure'],
  inputs: {
    length: { ...pipeLength, help: 'between the points that hold or should not move', initial: 240 },
    temperatureChange: {
      kind: 'scalar',
      symbol: '\\Delta T',
      label: 'Change of temperature',
      quantity: 'temperatureDifference',
      help: 'of the pipe wall; cooling counts minus. Black pipe in the sun, then filled from the stream: 40 K and more',
      range: [-200, 300],
      usual: [-60, 60],
      initial: -25,
    },
    material: {
      kind: 'choice',
      label: 'Material',
      of: materials,
      words: {
        PE: 'polyethylene',
        'PVC-U': 'PVC-U',
        steel: 'steel',
        'stainless-steel': 'stainless steel',
        'ductile-iron': 'ductile iron',
        'cast-iron': 'cast iron',
        copper: 'copper',
      },
      initial: 'PE',
    },
    restrained: {
      kind: 'choice',
      label: 'Held so that it cannot move',
      of: ['no', 'yes'],
      initial: 'no',
      fallback: 'no',
    },
    crossSection: {
      kind: 'scalar',
      symbol: 'A',
      label: 'Section of the wall',
      quantity: 'area',
      help: 'π times the wall times the outside diameter less one wall',
      range: [1e-7, 10],
      usual: [1e-5, 0.2],
      unit: 'mm²',
      when: { key: 'restrained', is: ['yes'] },
    },
    expansionCoefficient: {
      kind: 'scalar',
      symbol: '\\alpha',
      label: 'Coefficient of expansion',
      quantity: 'thermalExpansion',
      help: 'the maker’s own; left empty, the handbooks’',
      range: [0, 0.01],
      usual: [1e-6, 3e-4],
      optional: true,
    },
    modulus: {
      kind: 'scalar',
      symbol: 'E',
      label: 'Modulus of the wall',
      quantity: 'pressure',
      help: 'the maker’s own, short-term; left empty, the handbooks’',
      range: [1e6, 1e12],
      usual: [5e8, 2.2e11],
      unit: 'GPa',
      when: { key: 'restrained', is: ['yes'] },
      optional: true,
    },
  },
  outputs: {
    movement: {
      kind: 'scalar',
      symbol: '\\Delta L',
      label: 'It moves by',
      quantity: 'length',
      help: 'longer counts plus',
      sometimes: true,
    },
    force: {
      kind: 'scalar',
      symbol: 'F',
      label: 'It pushes with',
      quantity: 'force',
      help: 'a pull counts minus',
      sometimes: true,
    },
  },
  solve(given) {
    const strain = coefficientOf(given) * given.temperatureChange
    const found: { movement?: number; force?: number } = {}
    if (given.restrained === 'yes') found.force = modulusOf(given) * given.crossSection! * strain
    else found.movement = strain * given.length
    return found
  },
  working(write, given) {
    const alpha =
      given.expansionCoefficient === undefined
        ? { symbol: '\\alpha', value: coefficientOf(given), say: 'the coefficient of expansion' }
        : ('expansionCoefficient' as const)
    const modulus =
      given.modulus === undefined
        ? { symbol: 'E', value: modulusOf(given), say: 'the modulus of the wall' }
        : ('modulus' as const)
    return given.restrained === 'yes'
      ? [
          {
            say: 'What the pipe would grow is pressed out of it again, and that takes a force. The length does not count.',
            formula: write`${'force'} = ${modulus} \, ${'crossSection'} \, ${alpha} \, ${'temperatureChange'}`,
            gives: 'force' as const,
          },
        ]
      : [
          {
            say: 'Each metre grows by the coefficient for each kelvin.',
            formula: write`${'movement'} = ${alpha} \, ${'length'} \, ${'temperatureChange'}`,
            gives: 'movement' as const,
          },
        ]
  },
  cautions(given, { movement, force }) {
    const range = coefficientRange(given.material)
    const isPlastic = given.material === 'PE' || given.material === 'PVC-U'
    return [
      {
        level: 'check',
        about: ['temperatureChange'],
        hazard: 'pressure',
        say: 'A pipe that shrinks can pull its joints apart while it is under pressure. Fill it and let it take the temperature of the water before the last joint is made and the anchors are set; how it is held is for the pipe maker’s data and local code.',
      },
      ...(given.expansionCoefficient === undefined && typeof range !== 'number'
        ? [
            {
              level: 'check' as const,
              about: ['expansionCoefficient' as const],
              say: `Handbooks and makers differ: ${say(range[0], 'thermalExpansion')} to ${say(range[1], 'thermalExpansion')}. The middle is taken; give the maker’s own figure.`,
            },
          ]
        : []),
      ...(movement !== undefined
        ? [
            {
              level: 'note' as const,
              about: ['movement' as const],
              say: `Leave room for ${join(format(Math.abs(movement), 'length'))}: lay plastic in a gentle wave, so that it never pulls on valves and joints. Buried pipe is held by the ground and hardly moves.`,
            },
          ]
        : []),
      ...(force !== undefined && isPlastic
        ? [
            {
              level: 'note' as const,
              about: ['force' as const],
              say: 'This is the first force. Held plastic creeps, and most of it is gone within hours; cooled again it pulls the other way.',
            },
          ]
        : []),
      ...(force !== undefined
        ? [
            {
              level: 'note' as const,
              about: ['length' as const],
              say: 'Held pipe pushes as hard short as long: the length does not count here. A long pipe above the ground snakes sideways first.',
            },
          ]
        : []),
    ]
  },
  doesNotCheck: [
    'what the anchors and the ground hold; the push of the water at bends: see thrust',
    'whether a held pipe buckles sideways',
    'shortening by the pressure inside',
  ],
  example: {
    say: 'Sorrelthwaite: a steel pipe on piers, fixed at both ends on a cold day and warmed by the sun.',
    inputs: { length: 36, temperatureChange: 30, material: 'steel', restrained: 'yes', crossSection: 0.0023 },
  },
  plots: [
    {
      say: 'Twice the change, twice the way.',
      of: 'movement',
      against: 'temperatureChange',
      from: 0.1,
      to: 2,
    },
  ],
  sources: [
    { author: 'ASME', title: 'B31.9, Building services piping', year: 2014, where: 'table 919.3.1, coefficients' },
    { author: 'Plastics Pipe Institute', title: 'Handbook of PE Pipe', year: 2008, where: 'ch. 3, moduli' },
  ],
})
