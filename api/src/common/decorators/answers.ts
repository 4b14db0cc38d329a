import { applyDecorators, HttpCode, SerializeOptions } from '@nestjs/common'
import { ApiResponse } from '@nestjs/swagger'
import type { z } from 'zod'

/** What a route answers: the body is stripped to the schema, and the contract's page shows it. Of a list, give the schema of one. */
export const Answers = (schema: z.ZodType, { status = 200, isArray = false } = {}) =>
  applyDecorators(
    HttpCode(status),
    SerializeOptions({ schema }),
    ApiResponse({ status, standardSchema: schema, isArray }),
  )
