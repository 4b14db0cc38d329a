/** Head loss in one pipe: the library beside mathjs evaluating the same formulas and a pipe-network solver. */
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
import { calculate } from '../index.ts'
import { failures, row, time } from './measure.ts'

export async function headLossThreeWays(): Promise<void> {
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
}
