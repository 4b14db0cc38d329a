import { describe, expect, it } from 'vitest'
import { calculator } from '#calc/index.ts'
import { uncertaintyOf } from '#calc/uncertainty.ts'
import { showUnitsOf } from '#calc/units/system.ts'
import { unitOf, unitsOf } from './field-text.ts'
import {
  changeForm,
  readForm,
  recordsTaken,
  shownKeys,
  solveForm,
  startAgainUntouched,
  startForm,
  type Form,
  type FormAction,
} from './form.ts'

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

describe('±', () => {
  const write = (path: string, text: string): FormAction => ({ do: 'write', path, text })
  const uncertaintiesOf = (definition: typeof jet, form: Form) => {
    const attempt = solveForm(definition, form)
    return attempt.solution && attempt.uncertainties
  }

  it('is one standard uncertainty, by the name of its field', () => {
    const form = after(
      penstock,
      startForm(penstock),
      write('grossHead', '48 ± 0.2'),
      write('sections.0.length', '240 m ± 1 %'),
    )
    const uncertainties = uncertaintiesOf(penstock, form)!
    expect(Object.keys(uncertainties).sort()).toEqual(['grossHead', 'sections[0].length'])
    expect(uncertainties['grossHead']).toBeCloseTo(0.2, 12)
    expect(uncertainties['sections[0].length']).toBeCloseTo(2.4, 12)
    expect(
      uncertaintyOf(penstock, readForm(penstock, form).inputs, uncertainties).outputs['netHead']!.value,
    ).toBeGreaterThan(40)
  })

  it('belongs to a number of a series as well', () => {
    const bucket = calculator('flow-by-bucket')
    const form = after(bucket, startForm(bucket), write('times.1', '8,4 +/- 0,3'))
    expect(uncertaintiesOf(bucket, form)).toEqual({ 'times[1]': expect.closeTo(0.3, 12) as number })
  })

  it('turns with the number into another unit, and back into what was written', () => {
    const change = (unit: string): FormAction => ({ do: 'change-unit', path: 'netHead', cell: netHead, unit })
    const form = after(jet, startForm(jet, { netHead: '31.4 ± 0.2 m' }))
    expect(form.fields['netHead']).toEqual({ text: '31.4 ± 0.2', unit: 'm' })
    const feet = after(jet, form, change('ft'))
    expect(feet.fields['netHead']).toMatchObject({ text: '103 ± 0.66', unit: 'ft' })
    expect(after(jet, feet, change('m')).fields['netHead']!.text).toBe('31.4 ± 0.2')
  })

  it('is refused where things are counted', () => {
    const form = after(fittings, startForm(fittings), write('fittings.1.count', '2 ± 1'))
    expect(errorsOf(fittings, form)).toEqual({ 'fittings.1.count': expect.stringContaining('counted') as string })
  })
})

describe('a record of years', () => {
  const duration = calculator('flow-duration')
  const values = Array.from({ length: 730 }, (_, i) => 0.01 + i / 1e5)

  it('is taken as a whole, and is named where it is another than at the start', () => {
    const form = startForm(duration)
    expect(form.records['dailyFlows']).toMatchObject({ from: 'An invented year' })
    expect(recordsTaken(duration, form)).toEqual([])
    const taken = after(duration, form, { do: 'take-record', key: 'dailyFlows', record: { values, from: 'weir.csv' } })
    expect(readForm(duration, taken).inputs['dailyFlows']).toBe(values)
    expect(recordsTaken(duration, taken)).toEqual(['daily flows'])
  })

  it('that is empty is asked for', () => {
    const none = after(duration, startForm(duration), {
      do: 'take-record',
      key: 'dailyFlows',
      record: { values: [], from: '' },
    })
    expect(errorsOf(duration, none)['dailyFlows']).toMatch(/choose a file/)
  })
})

describe('what belongs to a choice', () => {
  const thrust = calculator('thrust')

  it('is shown with that choice alone', () => {
    const bend = startForm(thrust, { kind: 'bend', bendAngle: '45°' })
    expect(shownKeys(thrust, bend)).toContain('bendAngle')
    const end = after(thrust, bend, { do: 'write', path: 'kind', text: 'dead-end' })
    expect(shownKeys(thrust, end)).not.toContain('bendAngle')
    expect(readForm(thrust, end).inputs).not.toHaveProperty('bendAngle')
  })
})

it('a figure from a table fills every field that it has', () => {
  const form = after(penstock, startForm(penstock), {
    do: 'fill',
    texts: [{ path: 'grossHead', text: '31.4 m', cell: netHead }],
  })
  expect(form.fields['grossHead']).toEqual({ text: '31.4', unit: 'm' })
})

it('in other units only what nobody wrote in turns', () => {
  const started = startForm(penstock)
  const form = after(penstock, started, { do: 'write', path: 'sections.0.length', text: '200' })
  showUnitsOf('imperial')
  try {
    const turned = startAgainUntouched(form, started, startForm(penstock))
    expect(turned.fields['grossHead']).toEqual({ text: '157.5', unit: 'ft' })
    expect(turned.rows['sections']![0]!['length']).toEqual({ text: '200', unit: 'm' })
    expect(turned.rows['sections']![0]!['insideDiameter']).toEqual({ text: '3.811', unit: 'in' })
  } finally {
    showUnitsOf('metric')
  }
})
