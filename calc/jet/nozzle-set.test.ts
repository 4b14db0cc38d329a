import { describe, expect, test } from 'vitest'
import { calculate } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { solverHeadLoss } from '../testing/network-solver.ts'
import { outside } from '../testing/outside-check.ts'

interface Row {
  whichOpen: string
  flow: number
  netHead: number
  jetPower: number
}
const rowsOf = (inputs: object) => (calculate('nozzle-set', inputs) as unknown as { rows: Row[] }).rows
const section = { length: 240, insideDiameter: 0.0968, roughness: 5e-5, totalK: 1.5 }
const nozzles = [
  { diameter: 0.0165, dischargeCoefficient: 0.94 },
  { diameter: 0.012, dischargeCoefficient: 0.94 },
]
const inputs = { grossHead: 48, sections: [section], nozzles }

describe('nozzle-set', () => {
  outside(
    'library',
    'npm epanet-js 0.9.0, Darcy–Weisbach head loss of each flow found (within 1.5 % of Colebrook–White)',
    'the heads of every combination close',
    async () => {
      for (const { flow, netHead } of rowsOf(inputs)) {
        const loss = await solverHeadLoss({ ...section, flow, kinematicViscosity: 1.3063e-6 })
        expectNear(48 - netHead, loss, { relative: 0.015, absolute: 1e-3 })
      }
    },
  )
  outside(
    'derived',
    'without a pipe’s loss to speak of, Torricelli: Q = Cd·A·√(2gH), and the flows of nozzles add up',
    'a short wide pipe',
    () => {
      const wide = [{ length: 1, insideDiameter: 2, roughness: 0 }]
      const rows = rowsOf({ grossHead: 20, sections: wide, nozzles })
      const of = (diameter: number) => 0.94 * (Math.PI / 4) * diameter ** 2 * Math.sqrt(2 * 9.80665 * 20)
      const flows = rows.map(({ flow }) => flow).sort((a, b) => a - b)
      const expected = [of(0.012), of(0.0165), of(0.012) + of(0.0165)]
      flows.forEach((flow, i) => expectNear(flow, expected[i]!, { relative: 1e-5 }))
    },
  )
  outside(
    'derived',
    'the penstock’s own root for two like nozzles, which are one group there',
    'like nozzles counted',
    () => {
      const like = [nozzles[1]!, nozzles[1]!]
      const both = rowsOf({ ...inputs, nozzles: like }).find(
        ({ flow }, _, all) => flow === Math.max(...all.map((row) => row.flow)),
      )!
      const { flow, netHead } = calculate('penstock', {
        grossHead: 48,
        sections: [section],
        nozzles: { count: 2, diameter: 0.012, dischargeCoefficient: 0.94 },
      })
      expectNear(both.flow, flow as number, { relative: 1e-9 })
      expectNear(both.netHead, netHead as number, { relative: 1e-9 })
    },
  )

  test('every combination once, and more open nozzles draw more and leave less head', () => {
    const three = rowsOf({ ...inputs, nozzles: [...nozzles, { diameter: 0.008, dischargeCoefficient: 0.94 }] })
    expect(three).toHaveLength(7)
    expect(new Set(three.map(({ whichOpen }) => whichOpen)).size).toBe(7)
    const byFlow = three.toSorted((a, b) => a.flow - b.flow)
    byFlow.slice(1).forEach(({ netHead }, i) => expect(netHead).toBeLessThan(byFlow[i]!.netHead))
  })
})
