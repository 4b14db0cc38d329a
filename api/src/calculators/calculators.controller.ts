import { Body, Controller, Get, Param, Post, StreamableFile } from '@nestjs/common'
import { ApiParam, ApiTags } from '@nestjs/swagger'
import { z } from 'zod'
import { calculators } from '#calc/index.ts'
import { Public } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { anyCalculators } from './calculator-json-schemas.ts'
import { CalculatorsService, greatest } from './calculators.service.ts'
import {
  calculatorSchema,
  solutionSchema,
  solveBatchSchema,
  solveRequestSchema,
  troubleSchema,
  type SolveBatch,
  type SolveRequest,
} from './dto/calculator.schema.ts'
import { schemeRequestSchema, schemeSolutionSchema, type SchemeRequest } from './dto/scheme.schema.ts'

const ids = Object.keys(calculators)
// The same, and for the contract's page what each calculator takes and gives.
const anyInputs = z.unknown().meta({ ...anyCalculators('Inputs') })
const request = solveRequestSchema.extend({ inputs: anyInputs })
const batch = solveBatchSchema.extend({
  items: solveBatchSchema.shape.items.meta({
    maxItems: greatest.items,
    items: {
      type: 'object',
      required: ['id', 'inputs'],
      properties: { id: { type: 'string', enum: ids }, inputs: anyCalculators('Inputs') },
    },
  }),
})
const solution = solutionSchema.extend({ outputs: solutionSchema.shape.outputs.meta({ ...anyCalculators('Outputs') }) })
const solutions = z.object({ results: z.array(z.union([solution, z.object({ error: troubleSchema })])) })

@ApiTags('calculators')
@Controller('calculators')
@Public({ readsSession: false })
export class CalculatorsController {
  constructor(private readonly service: CalculatorsService) {}

  @Get()
  @Answers(calculatorSchema, { isArray: true })
  list() {
    return this.service.list()
  }

  @Post('solve')
  @Answers(solutions)
  solveAll(@Body({ schema: batch }) { items }: SolveBatch) {
    return new StreamableFile(this.service.solveAll(items), { type: 'application/json; charset=utf-8' })
  }

  @Post('scheme/solve')
  @Answers(schemeSolutionSchema)
  solveScheme(@Body({ schema: schemeRequestSchema }) request: SchemeRequest) {
    return this.service.solveScheme(request)
  }

  @Get(':id')
  @ApiParam({ name: 'id', enum: ids })
  @Answers(calculatorSchema)
  one(@Param('id') id: string) {
    return this.service.one(id)
  }

  @Post(':id/solve')
  @ApiParam({ name: 'id', enum: ids })
  @Answers(solution)
  solve(@Param('id') id: string, @Body({ schema: request }) { inputs }: SolveRequest) {
    return this.service.solve(id, inputs)
  }
}
