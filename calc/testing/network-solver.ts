import { FlowUnits, HeadLossType, LinkType, NodeProperty, NodeType, Option, Project, Workspace } from 'epanet-js'

/** The solver's own viscosity, 1.1·10⁻⁵ ft²/s in m²/s, which its option is a multiple of. */
const solverViscosity = 1.02193e-6
const forebayLevel = 1000

export interface SolverPipe {
  flow: number
  insideDiameter: number
  length: number
  roughness: number
  kinematicViscosity: number
  totalK?: number
}

const workspace = new Workspace()

/**
 * Head lost in one pipe, SI, by the pipe-network solver inside npm's epanet-js (EPANET 2.3): Darcy–Weisbach with the explicit friction factor
 * of Swamee and Jain, within 1.5 % of Colebrook and White's, and g = 32.2 ft/s².
 */
export const solverHeadLoss = async (pipe: SolverPipe): Promise<number> => {
  await workspace.loadModule()
  const network = new Project(workspace)
  network.init('report', 'out', FlowUnits.LPS, HeadLossType.DW)
  // The solver numbers junctions before reservoirs, whenever they were added: ask for each index afresh.
  network.addNode('end', NodeType.Junction)
  network.addNode('forebay', NodeType.Reservoir)
  network.setNodeValue(network.getNodeIndex('forebay'), NodeProperty.Elevation, forebayLevel)
  network.setJunctionData(network.getNodeIndex('end'), 0, pipe.flow * 1000, '')
  const link = network.addLink('pipe', LinkType.Pipe, 'forebay', 'end')
  network.setPipeData(link, pipe.length, pipe.insideDiameter * 1000, pipe.roughness * 1000, pipe.totalK ?? 0)
  network.setOption(Option.SpViscos, pipe.kinematicViscosity / solverViscosity)
  network.setOption(Option.Accuracy, 1e-8)
  network.solveH()
  const head = network.getNodeValue(network.getNodeIndex('end'), NodeProperty.Head)
  network.close()
  return forebayLevel - head
}
