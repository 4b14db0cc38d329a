import { mean as libraryMean, std } from 'mathjs'
import { expect, test } from 'vitest'
import { mean, uncertaintyOfMean } from './mean.ts'

test('mean and its uncertainty are those of a library', () => {
  const values = [3.1, 2.9, 3.4, 3.0, 2.7]
  expect(mean(values)).toBeCloseTo(libraryMean(values), 12)
  expect(uncertaintyOfMean(values, mean(values))).toBeCloseTo(Number(std(values)) / Math.sqrt(values.length), 12)
})
