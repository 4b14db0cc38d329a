import { Body, Controller, Get, Param, Post } from '@nestjs/common'
import { ApiBody, ApiTags } from '@nestjs/swagger'
import { calculators } from '#calc/index.ts'
import { Public } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { CalculatorsService } from './calculators.service.ts'
import { calculatorSchema, solutionSchema, solveRequestSchema, type SolveRequest } from './dto/calculator.schema.ts'
import { inputsJsonSchema } from './inputs-json-schema.ts'

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

  @Get(':id')
  @Answers(calculatorSchema)
  one(@Param('id') id: string) {
    return this.service.one(id)
  }

  @Post(':id/solve')
  @Answers(solutionSchema)
  @ApiBody({
    schema: {
      type: 'object',
      required: ['inputs'],
      properties: { inputs: { oneOf: Object.values(calculators).map(inputsJsonSchema) } },
    },
  })
  solve(@Param('id') id: string, @Body({ schema: solveRequestSchema }) { inputs }: SolveRequest) {
    return this.service.solve(id, inputs)
  }
}
