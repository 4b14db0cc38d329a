import { Readable } from 'node:stream'
import { setImmediate } from 'node:timers/promises'
import { Injectable, Logger } from '@nestjs/common'
import type { z } from 'zod'
import {
  CalculationError,
  calculator,
  calculators,
  type CalculatorDefinition,
  type SchemeInputs,
  schemeUncertainty,
  solve,
  solveScheme,
  type Solution,
} from '#calc/index.ts'
import type { ErrorBody } from '../common/dto/error.schema.ts'
import { fieldsOf } from '../common/pipes/request-validation.pipe.ts'
import { broken, Refusal } from '../common/refusal.ts'
import { solutionSchema, solveItemSchema, type Trouble } from './dto/calculator.schema.ts'
import type { SchemeRequest } from './dto/scheme.schema.ts'

type SolvedItem = z.infer<typeof solutionSchema> | { error: Trouble }

/** How much one request may ask for: the answers keep everybody else waiting. */
export const greatest = { items: 1000, numbers: 100_000 }

@Injectable()
export class CalculatorsService {
  private readonly logger = new Logger('Calculators')

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
    return refusing(() => solve(known, inputs))
  }

  solveScheme({ inputs, standardUncertainties }: SchemeRequest) {
    return refusing(() => {
      const scheme = (inputs ?? {}) as SchemeInputs
      const solution = solveScheme(scheme)
      return standardUncertainties === undefined
        ? solution
        : { ...solution, uncertainties: schemeUncertainty(scheme, standardUncertainties) }
    })
  }

  /** The answer piece by piece, as JSON: a thousand workings in one text would keep everybody else waiting while it is made. */
  solveAll(items: readonly unknown[]): Readable {
    if (items.length > greatest.items) {
      throw new Refusal('too-large', `Send at most ${greatest.items} items in one go.`)
    }
    if (items.reduce((sum: number, item) => sum + sizeOf(item), 0) > greatest.numbers) {
      throw new Refusal('too-large', `Send at most ${greatest.numbers} numbers in one go, all items together.`)
    }
    return Readable.from(this.resultsOf(items), { objectMode: false })
  }

  private async *resultsOf(items: readonly unknown[]) {
    yield '{"results":['
    for (const [i, item] of items.entries()) {
      yield (i === 0 ? '' : ',') + JSON.stringify(this.solveItem(item))
      // Whoever else waits is answered between two items.
      await setImmediate()
    }
    yield ']}'
  }

  private solveItem(raw: unknown): SolvedItem {
    const item = solveItemSchema.safeParse(raw)
    if (!item.success) return { error: fieldsOf(item.error.issues[0]!)[0]! }
    const { id, inputs } = item.data
    try {
      return solutionSchema.parse(this.solve(id, inputs))
    } catch (error) {
      if (!(error instanceof Refusal)) this.logger.error(error instanceof Error ? error.stack : error)
      const refusal = error instanceof Refusal ? error : broken()
      const { code, message, fields } = refusal.getResponse() as ErrorBody
      return { error: fields[0] ?? { field: 'id', code, message } }
    }
  }
}

/** What the library refuses is the asker's to mend. */
function refusing<T>(calculation: () => T): T {
  try {
    return calculation()
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error
    const { code, field, message } = error
    throw new Refusal(code, message, [{ field, code, message }])
  }
}

/** How many values an item holds, looked at no deeper than any calculator goes: item, inputs, list, row, value. */
const sizeOf = (value: unknown, depth = 4): number =>
  typeof value !== 'object' || value === null || depth === 0
    ? 1
    : Object.values(value).reduce((sum: number, part) => sum + sizeOf(part, depth - 1), 0)
