import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { solveScheme } from '#calc/index.ts'
import { sorrelthwaite } from '#calc/scheme/example-scheme.ts'
import { createTestApp, type TestApp } from './create-test-app.ts'

let test: TestApp
beforeAll(async () => {
  test = await createTestApp()
})
afterAll(() => test.close())

const solve = (body: object) => test.caller().post('/api/calculators/scheme/solve').send(body)

describe('POST /api/calculators/scheme/solve', () => {
  it('answers the whole chain, as the library does', async () => {
    const { body } = await solve({ inputs: sorrelthwaite }).expect(200)
    expect(body).toEqual(JSON.parse(JSON.stringify(solveScheme(sorrelthwaite))))
  })

  it('says what a part of a scheme waits for', async () => {
    const { body } = await solve({ inputs: { penstock: { grossHead: 48 } } }).expect(200)
    expect(body).toMatchObject({
      stations: { penstock: { waitsFor: ['penstock.sections', 'flow.flow'] } },
      figures: {},
    })
  })

  it('tells how sure the output is, with each share', async () => {
    const { body } = await solve({
      inputs: sorrelthwaite,
      standardUncertainties: { 'flow.flow': 2e-4, 'alternator.efficiency': 0.04 },
    }).expect(200)
    const { shares } = (body as { uncertainties: { outputPower: { shares: Record<string, number> } } }).uncertainties
      .outputPower
    expect(shares['flow.flow']! + shares['alternator.efficiency']!).toBeCloseTo(1, 12)
  })

  it.each([
    [{ penstock: { grossHead: -1 } }, 'penstock.grossHead', 'out-of-range'],
    [{ wheel: {} }, 'wheel', 'unknown-key'],
    [{ jet: 7 }, 'jet', 'not-finite'],
    [[], 'flow', 'not-finite'],
  ])('refuses %j at %s', async (inputs, field, code) => {
    const { body } = await solve({ inputs }).expect(422)
    expect((body as { fields: unknown[] }).fields).toMatchObject([{ field, code }])
  })

  it('refuses an uncertainty of what is not there', async () => {
    const { body } = await solve({ inputs: sorrelthwaite, standardUncertainties: { 'wheel.size': 1 } }).expect(422)
    expect((body as { fields: unknown[] }).fields).toMatchObject([{ field: 'wheel.size', code: 'unknown-key' }])
  })
})
