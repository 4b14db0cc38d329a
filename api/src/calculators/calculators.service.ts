import { setImmediate } from 'node:timers/promises'
import { Injectable } from '@nestjs/common'
import {
  CalculationError,
  calculator,
  calculators,
  type CalculatorDefinition,
  solve,
  type Solution,
} from '#calc/index.ts'
import type { ErrorBody } from '../common/dto/error.schema.ts'
import { fieldsOf } from '../common/pipes/request-validation.pipe.ts'
import { Refusal } from '../common/refusal.ts'
import { solveItemSchema, type Trouble } from './dto/calculator.schema.ts'

type SolvedItem = Solution | { error: Trouble }

/** How much one request may ask for: the answers keep everybody else waiting. */
export const greatest = { items: 1000, numbers: 100_000 }

@Injectable()
export class CalculatorsService {
  list(): CalculatorDefinition[] {
    return Object.values<CalculatorDefinition>(calculators)
  }

  one(id: string): CalculatorDefinition {
    try {
      return calculator(id)
    } catch (error) {
      if (error instanceof RangeError) throw new Refusal('not-found', error.message)
      throw error
    }
  }

  solve(id: string, inputs: unknown): Solution {
    const { id: known } = this.one(id)
    try {
      return solve(known, inputs)
    } catch (error) {
      if (!(error instanceof CalculationError)) throw error
      const { code, field, message } = error
      throw new Refusal(code, message, [{ field, code, message }])
    }
  }

  async solveAll(items: readonly unknown[]): Promise<{ results: SolvedItem[] }> {
    if (items.length > greatest.items) {
      throw new Refusal('too-large', `Send at most ${greatest.items} items in one go.`)
    }
    if (items.reduce((sum: number, item) => sum + sizeOf(item), 0) > greatest.numbers) {
      throw new Refusal('too-large', `Send at most ${greatest.numbers} numbers in one go, all items together.`)
    }
    const results: SolvedItem[] = []
    for (const item of items) {
      results.push(this.solveItem(item))
      // Whoever else waits is answered between two items.
      await setImmediate()
    }
    return { results }
  }

  private solveItem(raw: unknown): SolvedItem {
    const item = solveItemSchema.safeParse(raw)
    if (!item.success) return { error: fieldsOf(item.error.issues[0]!)[0]! }
    const { id, inputs } = item.data
    try {
      return this.solve(id, inputs)
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      const { code, message, fields } = error.getResponse() as ErrorBody
      return { error: fields[0] ?? { field: 'id', code, message } }
    }
  }
}

/** How many values an item holds, looked at no deeper than any calculator goes: item, inputs, list, row, value. */
const sizeOf = (value: unknown, depth = 4): number =>
  typeof value !== 'object' || value === null || depth === 0
    ? 1
    : Object.values(value).reduce((sum: number, part) => sum + sizeOf(part, depth - 1), 0)
