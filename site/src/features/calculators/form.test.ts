import { describe, expect, it } from 'vitest'
import { calculator } from '#calc/index.ts'
import { unitOf, unitsOf } from './field-text.ts'
import { changeForm, shownKeys, solveForm, startForm, type Form, type FormAction } from './form.ts'

const jet = calculator('jet')
const penstock = calculator('penstock')
const runner = calculator('runner')
const fittings = calculator('fittings')

const netHead = jet.inputs['netHead'] as Extract<(typeof jet.inputs)[string], { kind: 'scalar' }>
const flow = jet.inputs['flow'] as typeof netHead

const after = (definition: typeof jet, form: Form, ...actions: FormAction[]) =>
  actions.reduce((form, action) => changeForm(definition, form, action), form)
const errorsOf = (definition: typeof jet, form: Form) => {
  const attempt = solveForm(definition, form)
  return attempt.solution ? {} : attempt.errors
}

describe('a form at its start', () => {
  it('shows what the definition starts with, in its units, and works out', () => {
    const form = startForm(jet)
    expect(form.fields['flow']).toEqual({ text: '9.5', unit: 'L/s' })
    expect(solveForm(jet, form).solution?.outputs['jetVelocity']).toBeCloseTo(28.8, 1)
  })

  it('puts the unit of a preset text where the unit is chosen', () => {
    const form = startForm(jet, { flow: '0.0095 m3/s', netHead: 45, velocityCoefficient: '0,97' })
    expect(form.fields['flow']).toEqual({ text: '0.0095', unit: 'm³/s' })
    expect(form.fields['netHead']).toEqual({ text: '45', unit: 'm' })
    expect(form.fields['velocityCoefficient']!.text).toBe('0,97')
  })

  it('keeps a preset text that cannot be read, with what is wrong with it', () => {
    const form = startForm(jet, { flow: 'plenty' })
    expect(form.fields['flow']!.text).toBe('plenty')
    expect(errorsOf(jet, form)['flow']).toMatch(/for example/)
  })

  it('makes as many rows as a preset speaks of, and no more than the list may have', () => {
    const form = startForm(penstock, { 'sections.1.length': '80 m', 'sections.0.insideDiameter': '110 mm' })
    expect(form.rows['sections']).toHaveLength(2)
    expect(form.rows['sections']![1]!['length']).toEqual({ text: '80', unit: 'm' })
    expect(startForm(penstock, { 'sections.9999.length': '1 m' }).rows['sections']!.length).toBeLessThan(1000)
  })
})

describe('alternatives', () => {
  it('show the one that is preset, and what goes with it', () => {
    const form = startForm(runner, { netHead: '45 m', velocityCoefficient: '0.97' })
    const shown = shownKeys(runner, form)
    expect(shown).toContain('netHead')
    expect(shown).toContain('velocityCoefficient')
    expect(shown).not.toContain('jetVelocity')
    expect(solveForm(runner, form).solution).toBeDefined()
  })

  it('keep the text of the one that is not known', () => {
    const know = (key: string, instead: string): FormAction => ({ do: 'know', key, instead })
    const other = after(jet, startForm(jet, { flow: '12 L/s' }), know('nozzleDiameter', 'flow'))
    expect(shownKeys(jet, other)).not.toContain('flow')
    expect(errorsOf(jet, other)['nozzleDiameter']).toMatch(/for example/)
    const back = after(jet, other, know('flow', 'nozzleDiameter'))
    expect(back.fields['flow']!.text).toBe('12')
    expect(solveForm(jet, back).solution?.outputs['flow']).toBe(0.012)
  })
})

describe('units', () => {
  const write = (text: string): FormAction => ({ do: 'write', path: 'flow', text })
  const change = (unit: string): FormAction => ({ do: 'change-unit', path: 'flow', cell: flow, unit })

  it('written behind the number go before the one chosen, and are shown as chosen', () => {
    const form = after(jet, startForm(jet), write('570 l/min'))
    expect(unitOf(flow, form.fields['flow']!)).toBe('L/min')
    expect(form.fields['flow']!.text).toBe('570 l/min')
    expect(solveForm(jet, form).solution?.outputs['flow']).toBeCloseTo(0.0095, 10)
  })

  it('that are not offered are offered once they are written', () => {
    const form = after(jet, startForm(jet), { do: 'write', path: 'netHead', text: '0.045 km' })
    expect(unitsOf(netHead, form.fields['netHead']!)).toContain('km')
  })

  it('chosen anew convert the number, and back again bring what was written', () => {
    const feet = after(jet, startForm(jet, { netHead: '45.7 m' }), {
      do: 'change-unit',
      path: 'netHead',
      cell: netHead,
      unit: 'ft',
    })
    expect(feet.fields['netHead']).toMatchObject({ text: '149.9', unit: 'ft' })
    const metres = after(jet, feet, { do: 'change-unit', path: 'netHead', cell: netHead, unit: 'm' })
    expect(metres.fields['netHead']).toEqual({ text: '45.7', unit: 'm' })
  })

  it('chosen anew leave a text that cannot be read as it is', () => {
    const form = after(jet, startForm(jet), write('nine'), change('L/min'))
    expect(form.fields['flow']).toEqual({ text: 'nine', unit: 'L/min' })
  })
})

describe('what is wrong', () => {
  it('is told at the field in a row, and every text stays', () => {
    const form = after(penstock, startForm(penstock), {
      do: 'write',
      path: 'sections.0.insideDiameter',
      text: '96.8 km',
    })
    expect(Object.keys(errorsOf(penstock, form))).toEqual(['sections.0.insideDiameter'])
    expect(form.rows['sections']![0]!['insideDiameter']!.text).toBe('96.8 km')
  })

  it('is told at the field in a group', () => {
    const form = after(
      penstock,
      startForm(penstock, { 'nozzles.count': '1', 'nozzles.dischargeCoefficient': '0.95' }),
      {
        do: 'write',
        path: 'nozzles.diameter',
        text: '9 m',
      },
    )
    expect(Object.keys(errorsOf(penstock, form))).toEqual(['nozzles.diameter'])
  })

  it('is not an optional field left empty', () => {
    const form = after(jet, startForm(jet), { do: 'write', path: 'waterTemperature', text: ' ' })
    expect(solveForm(jet, form).solution).toBeDefined()
  })
})

describe('rows', () => {
  it('come like the one before, and go one by one', () => {
    const two = after(penstock, startForm(penstock), { do: 'add-row', key: 'sections' })
    expect(two.rows['sections']![1]).toEqual(two.rows['sections']![0])
    const changed = after(
      penstock,
      two,
      { do: 'write', path: 'sections.1.length', text: '30' },
      { do: 'remove-row', key: 'sections', number: 0 },
    )
    expect(changed.rows['sections']).toHaveLength(1)
    expect(changed.rows['sections']![0]!['length']!.text).toBe('30')
  })

  it('of a series are one number each', () => {
    const bucket = calculator('flow-by-bucket')
    const form = startForm(bucket, { 'times.0': '8.1 s', 'times.1': '8.4', volume: '20 L' })
    expect(solveForm(bucket, form).solution).toBeDefined()
    const wrong = after(bucket, form, { do: 'write', path: 'times.1', text: 'quick' })
    expect(Object.keys(errorsOf(bucket, wrong))).toEqual(['times.1'])
  })

  it('of fittings hand over only what their kind has', () => {
    const bend = startForm(fittings, {
      'fittings.0.kind': 'swept-bend',
      'fittings.0.bendAngle': '45°',
      'fittings.0.radiusRatio': '3',
    })
    expect(solveForm(fittings, bend).solution).toBeDefined()
    const valve = after(fittings, bend, { do: 'write', path: 'fittings.0.kind', text: 'gate-valve' })
    expect(solveForm(fittings, valve).solution).toBeDefined()
    expect(valve.rows['fittings']![0]!['bendAngle']!.text).toBe('45')
  })
})
