import type { CalculatorDefinition, Input } from '#calc/index.ts'

/** Chance for one case: the same seed brings the same case. */
export interface Chance {
  random: () => number
  pick: <T>(of: readonly T[]) => T
}
export const chanceOf = (random: () => number): Chance => ({
  random,
  pick: (of) => of[Math.floor(random() * of.length)]!,
})

type Path = readonly (string | number)[]
type Holder = Record<string | number, unknown>

/** So many of a long list are looked into, and so deep: list, row, value, and one more. */
const lookedInto = 12
const deepest = 4

/** The places of all values within a value, but not its own. */
const pathsIn = (value: unknown, at: Path = []): Path[] =>
  typeof value !== 'object' || value === null || at.length === deepest
    ? []
    : Object.keys(value)
        .slice(0, lookedInto)
        .flatMap((name) => {
          const path = [...at, Array.isArray(value) ? Number(name) : name]
          return [path, ...pathsIn((value as Holder)[name], path)]
        })

const holderOf = (value: unknown, path: Path) =>
  path.slice(0, -1).reduce<unknown>((part, name) => (part as Holder)[name], value) as Holder

const at = (value: unknown, path: Path): unknown => holderOf(value, path)[path.at(-1)!]

/** A copy with something else in one place. */
const put = (value: unknown, path: Path, other: unknown): unknown => {
  const copy = structuredClone(value)
  holderOf(copy, path)[path.at(-1)!] = other
  return copy
}

interface Bounds {
  range: readonly [number, number]
  usual?: readonly [number, number]
}
const boundsAt = ({ inputs }: CalculatorDefinition, path: Path): Bounds | undefined => {
  const input: Input | undefined = inputs[path[0]!]
  const cell = input && 'columns' in input ? input.columns[path.at(-1)!] : input
  return cell && 'range' in cell ? cell : undefined
}

const step = (value: number, up: 1 | -1) => value + up * Math.max(Math.abs(value) * Number.EPSILON, Number.MIN_VALUE)

/** Values at the ends of a range, a step inside, and now and then a step outside. */
const nearEdges = ({ range: [low, high], usual = [low, high] }: Bounds, { random }: Chance): number[] => {
  const inside = [low, high, step(low, 1), step(high, -1), ...usual, 0, -0, Number.MIN_VALUE, 1e-308, 1e-30, 1e-9]
  return random() < 0.9 ? inside.filter((n) => n >= low && n <= high) : [step(low, -1), step(high, 1)]
}

/** The same inputs with some numbers at or beside the ends of their ranges. */
export const atTheEdges = (definition: CalculatorDefinition, inputs: unknown, chance: Chance): unknown => {
  const places = pathsIn(inputs).filter((path) => typeof at(inputs, path) === 'number' && boundsAt(definition, path))
  let changed = inputs
  for (let changes = chance.pick([1, 1, 2, 3, places.length]); changes > 0 && places.length > 0; changes--) {
    const path = chance.pick(places)
    changed = put(changed, path, chance.pick(nearEdges(boundsAt(definition, path)!, chance)))
  }
  return changed
}

const longer = (list: readonly unknown[], length: number): unknown[] =>
  Array.from({ length }, (_, i) => list[i % list.length])

/** The same inputs with a list that is as long as it may be; others unchanged. */
export const atTheLongest = ({ inputs }: CalculatorDefinition, given: unknown, { pick }: Chance): unknown => {
  const lists = Object.entries(given as Holder).filter(([, value]) => Array.isArray(value) && value.length > 0)
  if (lists.length === 0) return given
  const [key, list] = pick(lists) as [string, readonly unknown[]]
  const input = inputs[key]!
  return put(given, [key], longer(list, 'most' in input ? input.most : list.length))
}

const nested = (depth: number) => {
  let value: unknown = 1
  for (let i = 0; i < depth; i++) value = i % 2 === 0 ? [value] : { a: value }
  return value
}

const texts = [
  ...[
    '',
    ' ',
    '0',
    '1',
    '-1',
    '1e3',
    'NaN',
    'Infinity',
    '-Infinity',
    'null',
    'undefined',
    'true',
    '0x10',
    '1,5',
    '9.5 L/s',
  ],
  ...[
    'constructor',
    '__proto__',
    'toString',
    'dc',
    '１２',
    '٣',
    '½',
    '\u0000',
    '\ud800',
    '\u202e12',
    '🜄',
    "'; --",
    '<b>',
  ],
]
const numbers = [
  ...[NaN, Infinity, -Infinity, 0, -0, 1, -1, 0.5, 1e308, -1e308, Number.MAX_VALUE, -Number.MAX_VALUE],
  ...[Number.MIN_VALUE, -Number.MIN_VALUE, 2.2e-308, 1e-16, 1e16, 2 ** 53, 2 ** 31, 2 ** 32, 0.1 + 0.2],
]
const others: readonly (() => unknown)[] = [
  ...[
    () => null,
    () => undefined,
    () => true,
    () => false,
    () => [],
    () => ({}),
    () => [[]],
    () => [null],
    () => [[[1]]],
  ],
  ...[() => ({ length: 3 }), () => ({ 0: 1 }), () => ({ valueOf: 1 }), () => new Date(0), () => Object(5) as unknown],
  ...[() => 5n, () => Symbol('five'), () => () => 5, () => Object.create(null) as unknown, () => nested(2000)],
  ...[
    () => Array<number>(5),
    () => [1, , 3],
    () => Object.assign([1, 2], { extra: 1 }),
    () => Array<number>(9).fill(1),
  ],
  ...[
    () => 'x'.repeat(60_000),
    () => '9'.repeat(400),
    () => Array<number>(120_000).fill(0.001),
    () => Array<object>(2000).fill({}),
  ],
]
const anything = ({ pick }: Chance): unknown => pick([() => pick(texts), () => pick(numbers), () => pick(others)()])()

const strangeKeys = [
  ...['__proto__', 'constructor', 'prototype', 'toString', 'valueOf', 'hasOwnProperty', '__defineGetter__'],
  ...['nonsense', '', ' ', '0', '-1', 'a.b', 'a[0]', '\u0000', 'ｆｌｏｗ', 'x'.repeat(5000)],
]

/** With one more key as JSON would bring it: even `__proto__` is a key like another. */
const withKey = (holder: object, key: string, value: unknown): object => {
  const copy: object = Array.isArray(holder) ? [...(holder as unknown[])] : { ...holder }
  Object.defineProperty(copy, key, { value, enumerable: true, configurable: true, writable: true })
  return copy
}

type Change = (inputs: unknown, path: Path, chance: Chance) => unknown

const changes: readonly Change[] = [
  (inputs, path, chance) => put(inputs, path, anything(chance)),
  (inputs, path, chance) => put(inputs, path, anything(chance)),
  (inputs, path) => put(inputs, path, [at(inputs, path)]),
  (inputs, path) => put(inputs, path, { value: at(inputs, path) }),
  (inputs, path) => put(inputs, path, String(at(inputs, path))),
  (inputs, path) => put(inputs, path, -Number(at(inputs, path))),
  (inputs, path, { pick }) => put(inputs, path, Number(at(inputs, path)) * pick([1e-12, 1e-3, 1e3, 1e12])),
  (inputs, path, chance) => {
    const holder = at(inputs, path)
    return typeof holder === 'object' && holder !== null
      ? put(inputs, path, withKey(holder, chance.pick(strangeKeys), anything(chance)))
      : withKey(inputs as object, chance.pick(strangeKeys), anything(chance))
  },
  (inputs, path) => {
    const copy = structuredClone(inputs)
    Reflect.deleteProperty(holderOf(copy, path), path.at(-1)!)
    return copy
  },
  (inputs, path) => {
    const value = at(inputs, path)
    return Array.isArray(value) ? put(inputs, path, [...(value as unknown[]), ...(value as unknown[])]) : inputs
  },
  (inputs, path) => {
    const value = at(inputs, path)
    return Array.isArray(value) ? put(inputs, path, [...(value as unknown[])].reverse()) : inputs
  },
]

/** The same inputs spoilt in a place or two, or something else altogether. */
export const spoilt = (inputs: unknown, chance: Chance): unknown => {
  const { random, pick } = chance
  if (random() < 0.04) return anything(chance)
  let changed = inputs
  for (let times = pick([1, 1, 2]); times > 0; times--) {
    const paths = pathsIn(changed)
    if (paths.length === 0) break
    try {
      changed = pick(changes)(changed, pick(paths), chance)
    } catch (error) {
      // What was put in before can neither be cloned nor turned into a number: it is hostile enough.
      if (!(error instanceof TypeError || error instanceof DOMException)) throw error
    }
  }
  return changed
}
