import { describe, expect, it } from 'vitest'
import { calculator, calculators } from '#calc/index.ts'
import { searchOf, textsIn, textsOf } from './address.ts'
import { changeForm, solveForm, startForm, type Form } from './form.ts'

const throughAddress = (definition: Parameters<typeof searchOf>[0], form: Form) =>
  startForm(definition, textsIn(searchOf(definition, form)))

describe('inputs in an address', () => {
  it.each(Object.values(calculators).map((definition) => [definition.id, definition] as const))(
    'of %s come back as they went out',
    (_, definition) => {
      const form = startForm(definition)
      const back = throughAddress(definition, form)
      expect(textsOf(definition, back)).toEqual(textsOf(definition, form))
      expect(solveForm(definition, back)).toEqual(solveForm(definition, form))
    },
  )

  it('read as a person writes them', () => {
    const jet = calculator('jet')
    const search = searchOf(jet, startForm(jet))
    expect(search).toContain('flow=9.5+L/s')
    expect(search).toContain('netHead=45+m')
    expect(search).not.toContain('nozzleDiameter')
    expect(search).not.toContain('waterTemperature')
  })

  it('name the rows', () => {
    const penstock = calculator('penstock')
    expect(searchOf(penstock, startForm(penstock))).toContain('sections.0.length=240+m')
  })

  it('keep a unit that was written, and one that was chosen', () => {
    const jet = calculator('jet')
    const written = changeForm(jet, startForm(jet), { do: 'write', path: 'flow', text: '9,5 l/s' })
    expect(textsOf(jet, written)['flow']).toBe('9,5 l/s')
    const chosen = startForm(jet, { flow: '570 L/min' })
    expect(throughAddress(jet, chosen).fields['flow']).toEqual({ text: '570', unit: 'L/min' })
  })

  it('keep a ±, with its unit', () => {
    const jet = calculator('jet')
    const form = startForm(jet, { netHead: '31.4 ± 0.2 m', flow: '9.5 L/s ± 2 %' })
    expect(textsOf(jet, form)).toMatchObject({ netHead: '31.4 ± 0.2 m', flow: '9.5 L/s ± 2 %' })
    expect(throughAddress(jet, form).fields).toEqual(form.fields)
  })

  it('keep what cannot be read, and what was emptied', () => {
    const jet = calculator('jet')
    const wrong = changeForm(jet, startForm(jet), { do: 'write', path: 'flow', text: 'much & more' })
    expect(throughAddress(jet, wrong).fields['flow']!.text).toBe('much & more')
    const emptied = changeForm(jet, startForm(jet), { do: 'write', path: 'netHead', text: '' })
    expect(throughAddress(jet, emptied).fields['netHead']!.text).toBe('')
  })

  it('keep a list that was emptied empty', () => {
    const fittings = calculator('fittings')
    let form = startForm(fittings)
    while (form.rows['fittings']!.length > 0)
      form = changeForm(fittings, form, { do: 'remove-row', key: 'fittings', number: 0 })
    expect(throughAddress(fittings, form).rows['fittings']).toEqual([])
  })

  it('pass over names that the calculator does not know', () => {
    const jet = calculator('jet')
    expect(solveForm(jet, startForm(jet, textsIn('?utm=1&flow=12+L/s'))).solution?.outputs['flow']).toBe(0.012)
  })
})
