/**
 * Speed of the library: each calculator checked and solved, without working or cautions, against its figure; and head loss in one pipe
 * beside mathjs evaluating the same formulas and a pipe-network solver. Ends with an error where the three disagree or a figure is missed.
 */
import {
  FlowUnits,
  HeadLossType,
  InitHydOption,
  LinkType,
  NodeProperty,
  NodeType,
  Option,
  Project,
  Workspace,
} from 'epanet-js'
import { compile } from 'mathjs'
import { g } from '../constants.ts'
import { calculate, calculators, monteCarlo, solve, withUncertainty, type Inputs } from '../index.ts'
import { initialInputs } from '../initial.ts'

/** Median over runs of the mean time of one call, in microseconds. */
const time = (call: () => unknown, { runs = 15, milliseconds = 40 } = {}): number => {
  for (let i = 0; i < 200; i++) call()
  const means = Array.from({ length: runs }, () => {
    const end = performance.now() + milliseconds
    const start = performance.now()
    let calls = 0
    do {
      call()
      calls++
    } while (performance.now() < end)
    return ((performance.now() - start) * 1000) / calls
  })
  return means.sort((a, b) => a - b)[Math.floor(runs / 2)]!
}

const failures: string[] = []
const row = (name: string, microseconds: number, figure?: number) => {
  const missed = figure !== undefined && microseconds > figure
  if (missed) failures.push(`${name}: ${microseconds.toFixed(2)} µs, figure ${figure} µs`)
  const want = figure === undefined ? '' : `  figure ${figure} µs${missed ? '  MISSED' : ''}`
  console.log(`${name.padEnd(44)} ${microseconds.toFixed(2).padStart(10)} µs${want}`)
}

console.log('Calculators, checked and solved, without working')
const section = { length: 42, insideDiameter: 0.1102, roughness: 5e-5, totalK: 0.4 }
const tenSections: Inputs = {
  grossHead: 63,
  sections: Array.from({ length: 10 }, (_, i) => ({ ...section, insideDiameter: section.insideDiameter - i * 0.004 })),
  nozzles: { count: 1, diameter: 0.024, dischargeCoefficient: 0.95 },
}
/** Scalar sums within 5 µs, a penstock of ten sections within 100 µs; lists have no figure of their own. */
const scalarFigure = 5
for (const definition of Object.values(calculators)) {
  const isScalar = Object.values({ ...definition.inputs, ...definition.outputs }).every(({ kind }) => kind !== 'rows')
  const inputs = initialInputs(definition)
  row(
    definition.id,
    time(() => calculate(definition.id, inputs)),
    isScalar ? scalarFigure : undefined,
  )
}
row(
  'penstock, 10 sections and nozzles',
  time(() => calculate('penstock', tenSections)),
  100,
)
row(
  'penstock, 10 sections, with working',
  time(() => solve('penstock', tenSections)),
)
row(
  'penstock, first-order uncertainty, 12 inputs',
  time(
    () =>
      withUncertainty('penstock', tenSections, {
        grossHead: 0.2,
        'nozzles.diameter': 1e-4,
        ...Object.fromEntries(Array.from({ length: 10 }, (_, i) => [`sections[${i}].insideDiameter`, 2e-4])),
      }),
    { runs: 5, milliseconds: 100 },
  ),
)
row(
  'penstock, Monte Carlo, 1000 trials',
  time(
    () => monteCarlo('penstock', tenSections, { grossHead: 0.2, 'nozzles.diameter': 1e-4 }, { trials: 1000, seed: 1 }),
    { runs: 3, milliseconds: 300 },
  ),
)

console.log('\nHead loss of one pipe, three ways')
const pipe = { flow: 0.0113, insideDiameter: 0.1012, length: 217, roughness: 5e-5 }
const { kinematicViscosity } = calculate('water', { waterTemperature: 10 }) as { kinematicViscosity: number }

const formulas = compile(`
  v = Q / (pi * D^2 / 4);
  Re = v * D / nu;
  f = (-1.8 * log10((e / D / 3.7)^1.11 + 6.9 / Re))^-2;
  f = (-2 * log10(e / D / 3.7 + 2.51 / (Re * sqrt(f))))^-2;
  f = (-2 * log10(e / D / 3.7 + 2.51 / (Re * sqrt(f))))^-2;
  f = (-2 * log10(e / D / 3.7 + 2.51 / (Re * sqrt(f))))^-2;
  f * L / D * v^2 / (2 * g)
`)
const byMathjs = (): number => {
  const { entries } = formulas.evaluate({
    ...{ Q: pipe.flow, D: pipe.insideDiameter, L: pipe.length, e: pipe.roughness, nu: kinematicViscosity, g },
  }) as { entries: number[] }
  return entries[0]!
}

const workspace = new Workspace()
await workspace.loadModule()
const network = new Project(workspace)
network.init('report', 'out', FlowUnits.LPS, HeadLossType.DW)
// The solver numbers junctions before reservoirs, whenever they were added: ask for each index afresh.
network.addNode('end', NodeType.Junction)
network.addNode('forebay', NodeType.Reservoir)
network.setNodeValue(network.getNodeIndex('forebay'), NodeProperty.Elevation, 1000)
network.setJunctionData(network.getNodeIndex('end'), 0, pipe.flow * 1000, '')
const link = network.addLink('pipe', LinkType.Pipe, 'forebay', 'end')
network.setPipeData(link, pipe.length, pipe.insideDiameter * 1000, pipe.roughness * 1000, 0)
/** The solver's own viscosity, 1.1e-5 ft²/s, which its option is a multiple of. */
const solverViscosity = 1.02193e-6
network.setOption(Option.SpViscos, kinematicViscosity / solverViscosity)
network.setOption(Option.Accuracy, 1e-8)
network.openH()
const byNetwork = (): number => {
  network.initH(InitHydOption.InitFlow)
  network.runH()
  return 1000 - network.getNodeValue(network.getNodeIndex('end'), NodeProperty.Head)
}
const byCalc = (): number => calculate('friction', pipe).headLoss as number

const ways = {
  'calc friction': byCalc,
  'mathjs, the same formulas compiled': byMathjs,
  'pipe-network solver, one pipe': byNetwork,
}
const losses = Object.values(ways).map((way) => way())
for (const [name, way] of Object.entries(ways)) {
  row(`${name}: ${way().toFixed(4)} m`, time(way))
}
const spread = Math.max(...losses) / Math.min(...losses) - 1
console.log(`they agree within ${(100 * spread).toFixed(2)} %`)
if (!(spread < 0.015)) failures.push(`three ways disagree by ${(100 * spread).toFixed(2)} %`)
network.closeH()
network.close()

if (failures.length > 0) {
  console.error(`\nMissed:\n  ${failures.join('\n  ')}`)
  process.exit(1)
}
