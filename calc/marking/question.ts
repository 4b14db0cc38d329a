/** What a question of each kind is, as a bank holds it. Texts of number and parts questions may hold `{variable}`. */
import type { PlainValue, Quantity } from '../definition.ts'

/** A drawn number: one of the steps from `from` to `to`, or another variable times a drawn factor, rounded to `step`. */
export type Drawn =
  | { from: PlainValue; to: PlainValue; step: PlainValue; quantity?: Quantity }
  | { of: string; times: [number, number]; step: PlainValue; quantity?: Quantity }

/**
 * What a calculator's input, a list, a row or a group gets. A text is a variable's name, an earlier part's id, a quantity as people write it
 * ("9.5 L/s") or a choice; a bare number serves where the quantity has no unit.
 */
export type Literal = PlainValue | PlainValue[] | Record<string, PlainValue> | Record<string, PlainValue>[]

export type Tolerance = { relative: number } | { absolute: PlainValue }

/** A wrong way that is often taken: the same calculation `with` other inputs, `times` a factor (or both), or another `output`. */
export interface Mistake {
  with?: Record<string, Literal>
  times?: number
  output?: string
  because: string
}

/** A calculator's output that is asked for. */
export interface Asked {
  say: string
  calculator: string
  /** The key of the output. */
  ask: string
  /** Which input gets what; without it, each variable whose name is an input of the calculator. */
  inputs?: Record<string, Literal>
  /** The units offered; without it, those of the quantity. */
  units?: string[]
  tolerance: Tolerance
  /** Significant figures wanted; too few cost no marks. */
  figures?: number
  mistakes?: Mistake[]
}

interface Variables {
  draw?: Record<string, Drawn>
  fixed?: Record<string, Literal>
}

export interface NumberQuestion extends Asked, Variables {
  id: string
  kind: 'number'
  marks?: number
}

export interface Part extends Asked {
  id: string
}

/** Several numbers, each of which may rest on those before it. */
export interface PartsQuestion extends Variables {
  id: string
  kind: 'parts'
  say: string
  /** Shared equally by the parts; one each unless told. */
  marks?: number
  parts: Part[]
}

export interface Choice {
  say: string
  right?: true
  /** Why it is wrong: wanted of each wrong choice. */
  because?: string
}

export interface ChoiceQuestion {
  id: string
  kind: 'choose-one' | 'choose-several'
  say: string
  marks?: number
  choices: Choice[]
}

export interface OrderQuestion {
  id: string
  kind: 'order'
  say: string
  marks?: number
  /** In the right order. */
  items: string[]
  because: string
}

export interface MatchQuestion {
  id: string
  kind: 'match'
  say: string
  marks?: number
  pairs: { left: string; right: string; because: string }[]
}

export type Question = NumberQuestion | PartsQuestion | ChoiceQuestion | OrderQuestion | MatchQuestion
