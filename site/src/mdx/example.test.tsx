import { power } from '#calc/water/power.ts'
import { expect, test } from 'vitest'
import { calculator } from '#calc/index.ts'
import { Row, textsFrom } from './attributes.ts'
import { workOut } from './example.ts'

test('a plain number is plain: an efficiency of 0.52 is not 0.52 %', () => {
  const { inputs, given } = workOut(power, { flow: '6.8 L/s', netHead: '19 m', efficiency: 0.52 }, null)
  expect(inputs).toMatchObject({ flow: 0.0068, netHead: 19, efficiency: 0.52 })
  expect(given.map(({ label, text }) => `${label} ${text.replace(/\s/g, ' ')}`)).toEqual([
    'Flow 6.8 L/s',
    'Net head 19 m',
    'Efficiency 52 %',
  ])
})

test('rows become paths, in the order in which they stand', () => {
  const children = [
    <Row key={1} of="times" value="21.4 s" />,
    'words between',
    <Row key={2} of="times" value="22.0 s" />,
    <Row key={3} of="nothing of this calculator" value="1" />,
  ]
  expect(textsFrom(calculator('flow-by-bucket'), {}, children)).toEqual({
    'times.0': '21.4 s',
    'times.1': '22.0 s',
  })
})

test('an example that does not work out says where', () => {
  expect(() => workOut(power, { flow: '6.8 m', netHead: '19 m', efficiency: 0.52 }, null)).toThrow(/flow/)
})
