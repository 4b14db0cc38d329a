import { describe, expect, it } from 'vitest'
import { graduations, waterLevel } from './staff-gauge.ts'

describe('the staff gauge', () => {
  it('stands as high as the lessons done', () => {
    expect(waterLevel(4, 11)).toBeCloseTo(4 / 11)
    expect(waterLevel(0, 11)).toBe(0)
    expect(waterLevel(11, 11)).toBe(1)
  })

  it('never overflows, and a course without lessons is dry', () => {
    expect(waterLevel(12, 11)).toBe(1)
    expect(waterLevel(0, 0)).toBe(0)
  })

  it('has a long graduation at zero and at each lesson, evenly, with four short ones between', () => {
    const { long, short } = graduations(2, 100)
    expect(long).toEqual([
      { lesson: 0, at: 0 },
      { lesson: 1, at: 50 },
      { lesson: 2, at: 100 },
    ])
    expect(short).toEqual([10, 20, 30, 40, 60, 70, 80, 90])
  })
})
