/** What people who build small schemes say of them, put through the same arithmetic. Each is common practice, no source. */
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { bracketedRoot } from '../numeric/root.ts'
import { pePipe } from '../tables/pe-pipe.ts'

const bore = (nominal: number, sdr: number): number => {
  const row = pePipe.rows.find((row) => row.sdr === sdr && Math.abs(row.outsideDiameter - nominal) < 1e-9)
  if (!row) throw new RangeError(`no pipe ${nominal} SDR ${sdr}`)
  return row.insideDiameter
}
const main = bore(0.11, 17)
const thin = bore(0.05, 11)
const inService = 5e-5

/** The last metre at the turbine: the taper down from the main, and the thin pipe. */
const lossAtTheTurbine = (flow: number): number => {
  const pipe = calculate('friction', { flow, insideDiameter: thin, length: 1, roughness: inService })
  const taper = calculate('fittings', {
    flow,
    insideDiameter: thin,
    fittings: [{ kind: 'taper-contraction', count: 1, diameterRatio: thin / main, coneAngle: 20 }],
  })
  return (pipe.headLoss as number) + (taper.headLoss as number)
}
const ratedFlow = bracketedRoot((flow) => lossAtTheTurbine(flow) - 0.3, 1e-4, 0.05)!
const twoBar = calculate('head-by-gauge', { staticPressure: 2e5 }).grossHead as number

describe('common practice, no source', () => {
  test('a metre of 50 mm pipe at the turbine, tapering up to a 110 mm main, loses about 0.3 m at the flow of a set of a few hundred watts', () => {
    expect(lossAtTheTurbine(ratedFlow)).toBeCloseTo(0.3, 6)
    expect(ratedFlow * 1000).toBeGreaterThan(3)
    expect(ratedFlow * 1000).toBeLessThan(5)
    const { outputPower } = calculate('power', { flow: ratedFlow, netHead: twoBar, efficiency: 0.5 })
    expect(outputPower).toBeGreaterThan(250)
    expect(outputPower).toBeLessThan(600)
  })

  test('the whole pipe of such a scheme loses about 5 to 6 per cent: that is a couple of hundred metres of the main', () => {
    const lossFraction = (length: number) =>
      calculate('penstock', {
        grossHead: twoBar,
        flow: ratedFlow,
        sections: [
          { length, insideDiameter: main, roughness: inService, totalK: 2 },
          { length: 1, insideDiameter: thin, roughness: inService, totalK: 0.2 },
        ],
      }).lossFraction as number
    expect(lossFraction(200)).toBeGreaterThan(0.05)
    expect(lossFraction(240)).toBeLessThan(0.06)
  })

  test('a small direct-driven set on about two bar turns near 2000 rev/min: its pitch circle suits several thin jets, not one thick one', () => {
    const runner = (jetCount: number) => {
      const { jetDiameter, jetVelocity } = calculate('jet', {
        netHead: twoBar,
        velocityCoefficient: 0.97,
        jetCount,
        flow: ratedFlow,
      })
      return solve('runner', { jetVelocity, speedRatio: 0.46, speed: 2000, jetDiameter })
    }
    const one = runner(1)
    const four = runner(4)
    // A hand's breadth.
    expect(one.outputs.pitchDiameter).toBeGreaterThan(0.075)
    expect(one.outputs.pitchDiameter).toBeLessThan(0.095)
    expect(one.outputs.diameterRatio).toBeLessThan(6)
    expect(four.outputs.diameterRatio).toBeGreaterThan(9)
    const tooThick = ({ cautions }: typeof one) =>
      cautions.some(({ level, about }) => level !== 'note' && about.includes('diameterRatio'))
    expect(tooThick(one)).toBe(true)
    expect(tooThick(four)).toBe(false)
  })

  test('the gauge falls by what the pipe loses: the velocity head that this leaves out is small in the main, and not in the thin pipe', () => {
    const reading = (insideDiameter: number) =>
      calculate('gauge-reading', {
        staticPressure: 2e5,
        runningPressure: 1.88e5,
        insideDiameter,
        flow: ratedFlow,
      }) as Record<'pressureDrop' | 'velocityHead' | 'headLoss', number>
    const inMain = reading(main)
    expect(inMain.velocityHead / inMain.pressureDrop).toBeLessThan(0.02)
    expect(inMain.headLoss + inMain.velocityHead).toBeCloseTo(inMain.pressureDrop, 12)
    const inThin = reading(thin)
    expect(inThin.velocityHead / inThin.pressureDrop).toBeGreaterThan(0.3)
  })
})
