import { expect, test } from 'vitest'
import { penstock } from '#calc/pipe/penstock.ts'
import { flowByBucket } from '#calc/site/flow-by-bucket.ts'
import { fieldWords } from './field-words.ts'

test('a field as people say it', () => {
  expect(fieldWords(penstock, 'grossHead')).toBe('Gross head')
  expect(fieldWords(penstock, 'sections[1].insideDiameter')).toBe('Section 2: inside diameter')
  expect(fieldWords(penstock, 'nozzles.diameter')).toBe('Nozzle diameter')
  expect(fieldWords(flowByBucket, 'times[0]')).toBe('Timing 1')
})
