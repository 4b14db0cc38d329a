import { describe, expect, test } from 'vitest'
import { checkInputs, missingInputs } from './check.ts'
import { defineCalculator } from './definition.ts'
import { CalculationError } from './errors.ts'
import { expectRefusal } from './testing/refusal.ts'

const definition = defineCalculator({
  id: 'tank',
  station: 'forebay',
  title: 'A tank',
  summary: 'For tests.',
  hazards: [],
  inputs: {
    depth: { kind: 'scalar', label: 'Depth', quantity: 'length', range: [0.1, 5] },
    flow: { kind: 'scalar', label: 'Flow', quantity: 'flow', range: [0, 1], or: 'time' },
    time: { kind: 'scalar', label: 'Time', quantity: 'time', range: [1, 100], or: 'flow' },
    side: { kind: 'scalar', label: 'Side', quantity: 'length', range: [0, 9], goesWith: 'time' },
    note: { kind: 'scalar', label: 'Note', quantity: 'count', range: [0, 9], whole: true, optional: true },
    extra: { kind: 'scalar', label: 'Extra', quantity: 'ratio', range: [0, 1], needs: 'note' },
    shape: { kind: 'choice', label: 'Shape', of: ['round', 'square'], fallback: 'round', optional: true },
    corner: {
      kind: 'scalar',
      label: 'Corner',
      quantity: 'angle',
      range: [0, 90],
      when: { key: 'shape', is: ['square'] },
    },
    levels: {
      kind: 'runs',
      label: 'Levels',
      run: 'run',
      row: 'rise',
      quantity: 'head',
      range: [-9, 9],
      least: 1,
      most: 2,
      leastEach: 1,
      mostEach: 3,
      optional: true,
    },
    walls: {
      kind: 'rows',
      label: 'Walls',
      row: 'wall',
      columns: {
        height: { kind: 'scalar', label: 'Height', quantity: 'length', range: [0, 3] },
        count: { kind: 'scalar', label: 'How many', quantity: 'count', range: [1, 9], fallback: 1, optional: true },
      },
      least: 1,
      most: 2,
      optional: true,
    },
    lid: {
      kind: 'group',
      label: 'Lid',
      columns: { width: { kind: 'scalar', label: 'Width', quantity: 'length', range: [0, 3] } },
      optional: true,
    },
    timings: {
      kind: 'series',
      label: 'Timings',
      row: 'timing',
      quantity: 'time',
      range: [0.1, 100],
      least: 2,
      most: 3,
      optional: true,
    },
  },
  outputs: { level: { kind: 'scalar', label: 'Level', quantity: 'length' } },
  solve: () => ({ level: 0 }),
  working: () => [],
  cautions: () => [],
  doesNotCheck: [],
  sources: [],
  example: { say: 'None.', inputs: {} },
})
const good = { depth: 2, flow: 0.5 }
const check = (raw: unknown) => checkInputs(definition, raw)
const messageOf = (raw: unknown): string => {
  try {
    check(raw)
  } catch (error) {
    if (error instanceof CalculationError) return error.message
  }
  return 'not refused'
}

describe('checking', () => {
  test('fills in fallbacks, also inside rows, and changes nothing', () => {
    const raw = { ...good, walls: [{ height: 0 }, { height: 3, count: 2 }], lid: { width: 1 }, timings: [1, 2] }
    const copy = structuredClone(raw)
    expect(check(raw)).toEqual({
      ...raw,
      shape: 'round',
      walls: [
        { height: 0, count: 1 },
        { height: 3, count: 2 },
      ],
    })
    expect(raw).toEqual(copy)
  })

  test('a key that is undefined counts as absent', () => {
    expect(check({ ...good, time: undefined, note: undefined })).toEqual({ ...good, shape: 'round' })
  })

  test('the ends of a range are in it', () => {
    expect(check({ depth: 0.1, flow: 0 })).toMatchObject({ depth: 0.1, flow: 0 })
    expect(check({ depth: 5, flow: 1 })).toMatchObject({ depth: 5, flow: 1 })
  })

  test('of alternatives exactly one: none is missing at the first named, both at odds at the second', () => {
    expectRefusal('missing', 'flow', () => check({ depth: 2 }))
    expectRefusal('inconsistent', 'time', () => check({ ...good, time: 5, side: 1 }))
    expect(check({ depth: 2, time: 5, side: 1 })).toMatchObject({ time: 5, side: 1 })
  })

  test('what goes with a key is wanted with it and refused without', () => {
    expectRefusal('missing', 'side', () => check({ depth: 2, time: 5 }))
    expectRefusal('inconsistent', 'side', () => check({ ...good, side: 1 }))
  })

  test('what needs a key asks for that key', () => {
    expectRefusal('missing', 'note', () => check({ ...good, extra: 0.5 }))
    expect(check({ ...good, note: 1 })).toMatchObject({ note: 1 })
    expect(check({ ...good, note: 1, extra: 0.5 })).toMatchObject({ extra: 0.5 })
  })

  test('names the row and the column at fault', () => {
    expectRefusal('missing', 'walls', () => check({ ...good, walls: [] }))
    expectRefusal('out-of-range', 'walls', () => check({ ...good, walls: [1, 2, 3].map(() => ({ height: 1 })) }))
    expectRefusal('missing', 'walls[1].height', () => check({ ...good, walls: [{ height: 1 }, {}] }))
    expectRefusal('out-of-range', 'walls[0].height', () => check({ ...good, walls: [{ height: 4 }] }))
    expectRefusal('unknown-key', 'walls[0].width', () => check({ ...good, walls: [{ height: 1, width: 1 }] }))
    expectRefusal('not-finite', 'walls[0]', () => check({ ...good, walls: [1] }))
    expectRefusal('not-finite', 'walls', () => check({ ...good, walls: { height: 1 } }))
    expectRefusal('missing', 'lid.width', () => check({ ...good, lid: {} }))
    expectRefusal('not-finite', 'lid', () => check({ ...good, lid: [1] }))
    expectRefusal('out-of-range', 'timings', () => check({ ...good, timings: [1] }))
    expectRefusal('out-of-range', 'timings[1]', () => check({ ...good, timings: [1, 0] }))
    expectRefusal('not-finite', 'timings[0]', () => check({ ...good, timings: [NaN, 1] }))
  })

  test('a list with holes is one with something missing', () => {
    const holed = <T>(...list: T[]): T[] => {
      const holes = new Array<T>(list.length)
      list.forEach((value, i) => {
        if (i !== 1) holes[i] = value
      })
      return holes
    }
    expectRefusal('not-finite', 'timings[1]', () => check({ ...good, timings: holed(1, 2, 3) }))
    expectRefusal('not-finite', 'walls[1]', () => check({ ...good, walls: holed({ height: 1 }, { height: 1 }) }))
    expectRefusal('not-finite', 'levels[1]', () => check({ ...good, levels: holed([1], [2]) }))
    expectRefusal('not-finite', 'levels[0]', () => check({ ...good, levels: [holed(1, 2, 3)] }))
  })

  test('choices and whole numbers', () => {
    expectRefusal('out-of-range', 'shape', () => check({ ...good, shape: 'oval' }))
    expectRefusal('out-of-range', 'note', () => check({ ...good, note: 1.5 }))
    expect(check({ ...good, shape: 'square', corner: 90 })).toMatchObject({ shape: 'square' })
  })

  test('what belongs to a choice is wanted with it and refused otherwise, also where the choice is its fallback', () => {
    expectRefusal('missing', 'corner', () => check({ ...good, shape: 'square' }))
    expectRefusal('inconsistent', 'corner', () => check({ ...good, shape: 'round', corner: 90 }))
    expectRefusal('inconsistent', 'corner', () => check({ ...good, corner: 90 }))
    expect(messageOf({ ...good, corner: 90 })).toBe('Corner belongs to square: leave it out otherwise.')
  })

  test('runs are lists of lists: what is wrong is told of its run, and the message counts on', () => {
    expect(check({ ...good, levels: [[1.4, -0.2], [3]] })).toMatchObject({ levels: [[1.4, -0.2], [3]] })
    expectRefusal('missing', 'levels', () => check({ ...good, levels: [] }))
    expectRefusal('out-of-range', 'levels', () => check({ ...good, levels: [[1], [2], [3]] }))
    expectRefusal('missing', 'levels[1]', () => check({ ...good, levels: [[1], []] }))
    expectRefusal('not-finite', 'levels[0]', () => check({ ...good, levels: [1] }))
    expectRefusal('not-finite', 'levels[1]', () => check({ ...good, levels: [[1], [2, '3']] }))
    expectRefusal('out-of-range', 'levels[0]', () => check({ ...good, levels: [[1, 10]] }))
    expect(messageOf({ ...good, levels: [[1, 10]] })).toMatch(/^Levels, run 1, rise 2 must lie between/)
  })

  test('tells what is still wanted, of two alternatives the first', () => {
    expect(missingInputs(definition, {})).toEqual(['depth', 'flow'])
    expect(missingInputs(definition, { depth: 1, time: 5 })).toEqual(['side'])
    expect(missingInputs(definition, { ...good, extra: 0.5, shape: 'square' })).toEqual(['note', 'corner'])
    expect(missingInputs(definition, { depth: 2, time: 5, side: 1 })).toEqual([])
  })

  test('says what to write instead, in the units that people use', () => {
    expect(messageOf({ ...good, depth: 9 })).toBe('Depth must lie between 100\u00a0mm and 5\u00a0m.')
    expect(messageOf({ ...good, depth: 'deep' })).toBe('Depth: give a number between 100\u00a0mm and 5\u00a0m.')
    expect(messageOf({ ...good, shape: 'oval' })).toBe('Shape: choose one of round, square.')
    expect(messageOf({ ...good, walls: [] })).toBe('Walls: give at least 1 wall.')
    expect(messageOf({ depth: 2 })).toBe('Give Flow or Time.')
    expect(messageOf({ ...good, bottom: 1 })).toBe('A tank has no input called “bottom”.')
  })
})
