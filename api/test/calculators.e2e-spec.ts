import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { calculators, solve as solveByLibrary } from '#calc/index.ts'
import { greatest } from '#api/calculators/calculators.service.ts'
import { createTestApp, type TestApp } from './create-test-app.ts'

let test: TestApp
beforeAll(async () => {
  test = await createTestApp()
})
afterAll(() => test.close())

const solve = (id: string, inputs: unknown) => test.caller().post(`/api/calculators/${id}/solve`).send({ inputs })

describe('GET /api/calculators', () => {
  it('lists every calculator with what it takes and gives', async () => {
    const { body } = await test.caller().get('/api/calculators').expect(200)
    expect((body as { id: string }[]).map(({ id }) => id)).toEqual(Object.keys(calculators))
    expect(body).toContainEqual(
      expect.objectContaining({
        id: 'jet',
        inputs: expect.objectContaining({ netHead: expect.objectContaining({ kind: 'scalar' }) }),
        example: calculators.jet.example,
        plots: calculators.jet.plots,
      }),
    )
  })

  it('refuses an id that there is not', () => test.caller().get('/api/calculators/constructor').expect(404))
})

describe('POST /api/calculators/:id/solve', () => {
  it('answers outputs, working and cautions without a session', async () => {
    const { body } = await solve('jet', { netHead: 45, velocityCoefficient: 1, jetCount: 1, flow: 0.01 }).expect(200)
    const { outputs, working, cautions } = body as {
      outputs: Record<string, number>
      working: { numbers?: string }[]
      cautions: { level: string }[]
    }
    // Torricelli: √(2 · 9.80665 · 45)
    expect(outputs.jetVelocity).toBeCloseTo(29.7086, 4)
    expect(working[0]!.numbers).toContain('45')
    expect(cautions[0]!.level).toBe('stop')
  })

  it.each([
    ['a negative diameter', { insideDiameter: -0.1 }, 'out-of-range', 'sections[0].insideDiameter'],
    ['an unknown key of a row', { width: 1 }, 'unknown-key', 'sections[0].width'],
  ])('refuses %s with field, code and message', async (_, section, code, field) => {
    const pipe = { length: 120, insideDiameter: 0.1, roughness: 0.00005, ...section }
    const { body } = await solve('penstock', { grossHead: 40, flow: 0.01, sections: [pipe] }).expect(422)
    expect(body).toMatchObject({
      code,
      message: expect.any(String),
      fields: [{ field, code, message: expect.any(String) }],
    })
  })

  it('refuses an unknown key, and an unknown calculator', async () => {
    const { body } = await solve('penstock', { grossHead: 40, colour: 1 }).expect(422)
    expect(body).toMatchObject({ code: 'unknown-key', fields: [{ field: 'colour' }] })
    await solve('perpetual-motion', {}).expect(404)
  })

  /** Darcy–Weisbach with Colebrook by plain fixed-point steps, and bisection on the flow; only the viscosity is asked of the server, and held against the published one. */
  it('agrees with an independent solve for three invented pipes', async () => {
    const g = 9.80665
    // Kinematic viscosity at 10 °C: IAPWS SR6-08, 1.3059e-3 Pa·s over 999.702 kg/m³.
    const { body: water } = (await solve('water', { waterTemperature: 10 }).expect(200)) as {
      body: { outputs: { kinematicViscosity: number } }
    }
    expect(water.outputs.kinematicViscosity).toBeCloseTo(1.3063e-6, 9)
    const nu = water.outputs.kinematicViscosity

    interface Pipe {
      length: number
      insideDiameter: number
      roughness: number
      totalK: number
    }
    const lossOf = (flow: number, { length, insideDiameter: d, roughness, totalK }: Pipe) => {
      const v = flow / ((Math.PI * d * d) / 4)
      let f = 0.02
      for (let i = 0; i < 200; i++)
        f = (-2 * Math.log10(roughness / d / 3.7 + 2.51 / (((v * d) / nu) * Math.sqrt(f)))) ** -2
      return (((f * length) / d + totalK) * (v * v)) / (2 * g)
    }
    const schemes: {
      grossHead: number
      sections: Pipe[]
      nozzles: { count: number; diameter: number; dischargeCoefficient: number }
    }[] = [
      {
        grossHead: 27.3,
        sections: [{ length: 184, insideDiameter: 0.0968, roughness: 5e-5, totalK: 1.4 }],
        nozzles: { count: 1, diameter: 0.0237, dischargeCoefficient: 0.96 },
      },
      {
        grossHead: 88.6,
        sections: [
          { length: 410, insideDiameter: 0.1308, roughness: 5e-5, totalK: 2.2 },
          { length: 37, insideDiameter: 0.0792, roughness: 1.5e-4, totalK: 0.6 },
        ],
        nozzles: { count: 2, diameter: 0.0211, dischargeCoefficient: 0.94 },
      },
      {
        grossHead: 14.9,
        sections: [{ length: 96, insideDiameter: 0.1518, roughness: 3e-4, totalK: 0.9 }],
        nozzles: { count: 3, diameter: 0.0318, dischargeCoefficient: 0.93 },
      },
    ]
    for (const scheme of schemes) {
      const { count, diameter, dischargeCoefficient } = scheme.nozzles
      const area = count * dischargeCoefficient * (Math.PI / 4) * diameter ** 2
      let low = 0
      let high = area * Math.sqrt(2 * g * scheme.grossHead)
      for (let i = 0; i < 200; i++) {
        const flow = (low + high) / 2
        const net = scheme.grossHead - scheme.sections.reduce((sum, pipe) => sum + lossOf(flow, pipe), 0)
        if (net > 0 && area * Math.sqrt(2 * g * net) > flow) low = flow
        else high = flow
      }
      const { body } = (await solve('penstock', scheme).expect(200)) as { body: { outputs: Record<string, number> } }
      const loss = scheme.sections.reduce((sum, pipe) => sum + lossOf(low, pipe), 0)
      expect(Math.abs(body.outputs.flow! / low - 1)).toBeLessThan(1e-6)
      expect(Math.abs(body.outputs.headLoss! / loss - 1)).toBeLessThan(1e-6)
      expect(Math.abs(body.outputs.netHead! / (scheme.grossHead - loss) - 1)).toBeLessThan(1e-6)
    }
  })
})

describe('POST /api/calculators/solve', () => {
  const solveAll = (items: unknown) => test.caller().post('/api/calculators/solve').send({ items })
  const jet = { netHead: 45, velocityCoefficient: 1, jetCount: 1, flow: 0.01 }

  it('answers each item in order as the library does; a bad one does not spoil the others', async () => {
    const items = [
      { id: 'jet', inputs: jet },
      { id: 'jet', inputs: { ...jet, flow: -1 } },
      { id: 'perpetual-motion', inputs: {} },
      { id: 'constructor', inputs: {} },
      { id: 'jet', inputs: JSON.parse('{"__proto__": 1}') as unknown },
      { id: 'jet', inputs: [] },
      { id: 'jet' },
      { id: 'jet', inputs: jet, colour: 1 },
      { id: 7, inputs: jet },
      'jet',
      null,
      { id: 'water', inputs: {} },
    ]
    const { body } = await solveAll(items).expect(200)
    const trouble = (field: string, code: string) => ({ error: { field, code, message: expect.any(String) } })
    expect(body).toEqual({
      results: [
        JSON.parse(JSON.stringify(solveByLibrary('jet', jet))),
        trouble('flow', 'out-of-range'),
        trouble('id', 'not-found'),
        trouble('id', 'not-found'),
        trouble('__proto__', 'unknown-key'),
        trouble('netHead', 'missing'),
        trouble('inputs', 'invalid-type'),
        trouble('colour', 'unknown'),
        trouble('id', 'invalid-type'),
        trouble('', 'invalid-type'),
        trouble('', 'invalid-type'),
        JSON.parse(JSON.stringify(solveByLibrary('water', {}))),
      ],
    })
  })

  it('answers nothing to nothing, and refuses what is no list', async () => {
    expect((await solveAll([]).expect(200)).body).toEqual({ results: [] })
    await solveAll({ 0: { id: 'jet', inputs: jet } }).expect(422)
    await test.caller().post('/api/calculators/solve').send({}).expect(422)
  })

  it('takes a thousand items, and says so where there are more', async () => {
    const section = { length: 42, insideDiameter: 0.1102, roughness: 5e-5, totalK: 0.4 }
    const inputs = { grossHead: 63.123456789, flow: 0.0123456789, sections: Array.from({ length: 10 }, () => section) }
    const items = (count: number) => Array.from({ length: count }, () => ({ id: 'penstock', inputs }))
    const { body } = (await solveAll(items(greatest.items)).expect(200)) as { body: { results: unknown[] } }
    expect(body.results).toHaveLength(greatest.items)
    const refused = await solveAll(items(greatest.items + 1)).expect(413)
    expect(refused.body).toMatchObject({ code: 'too-large', message: expect.stringContaining('1000 items') })
  })

  it('refuses more numbers than it may hold others up for', async () => {
    const times = (count: number) => ({ id: 'flow-by-bucket', inputs: { volume: 0.02, times: Array(count).fill(5) } })
    const refused = await solveAll([times(greatest.numbers)]).expect(413)
    expect(refused.body).toMatchObject({ code: 'too-large', message: expect.stringContaining('numbers') })
    // So many are read, and refused by the calculator itself.
    const { body } = await solveAll([times(greatest.numbers - 10)]).expect(200)
    expect(body).toMatchObject({ results: [{ error: { field: 'times', code: 'out-of-range' } }] })
  })
})

describe('the body of a calculation', () => {
  it('may hold a record of 40 000 daily flows to every digit; what is larger is told', async () => {
    const record = (days: number) => ({ dailyFlows: Array.from({ length: days }, (_, i) => 0.1 + (i % 997) / 7e5) })
    const long = record(40_000)
    const { body } = await solve('flow-duration', long).expect(200)
    expect(body).toEqual(JSON.parse(JSON.stringify(solveByLibrary('flow-duration', long))))
    const tooMany = await solve('flow-duration', record(40_001)).expect(422)
    expect(tooMany.body).toMatchObject({ code: 'out-of-range', fields: [{ field: 'dailyFlows' }] })
    const refused = await solve('flow-duration', record(400_000)).expect(413)
    expect(refused.body).toMatchObject({ code: 'too-large' })
    // Other routes keep to what they need.
    const tooLong = { email: 'a'.repeat(300_000), password: 'b' }
    await test.caller().post('/api/auth/session').send(tooLong).expect(413)
  })
})

describe('the contract', () => {
  interface Contract {
    components: { schemas: Record<string, unknown> }
  }

  it('shows what each calculator takes and gives, and names nothing that it does not show', async () => {
    const { body, text } = (await test.caller().get('/api/docs-json').expect(200)) as { body: Contract; text: string }
    const shown = Object.keys(body.components.schemas)
    expect(shown).toEqual(expect.arrayContaining(['FlowByBucketInputs', 'FlowByBucketOutputs']))
    const named = [...text.matchAll(/"#\/components\/schemas\/(\w+)"/g)].map(([, name]) => name!)
    expect(named).toContain('FlowByBucketInputs')
    expect(named).toContain('FlowByBucketOutputs')
    expect(named.filter((name) => !shown.includes(name))).toEqual([])
    expect(text).not.toMatch(/"x-/)
  })
})
