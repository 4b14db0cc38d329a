import { Injectable } from '@nestjs/common'
import {
  CalculationError,
  calculator,
  calculators,
  type CalculatorDefinition,
  solve,
  type Solution,
} from '#calc/index.ts'
import { Refusal } from '../common/refusal.ts'

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
}
