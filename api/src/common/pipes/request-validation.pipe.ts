import { type ArgumentMetadata, Injectable, StandardSchemaValidationPipe } from '@nestjs/common'
import { z } from 'zod'
import type { ErrorBody } from '../dto/error.schema.ts'
import { Refusal } from '../refusal.ts'

/**
 * Checks what `@Body({ schema })`, `@Query({ schema })` and `@Param({ schema })` name. A body may hold nothing that
 * was not asked for, so that a misspelt key is told and not lost.
 */
@Injectable()
export class RequestValidationPipe extends StandardSchemaValidationPipe {
  constructor() {
    super({ exceptionFactory: (issues) => invalid(issues as readonly z.core.$ZodIssue[]) })
  }

  override transform<T>(value: T, metadata: ArgumentMetadata): Promise<T> {
    const { schema } = metadata
    const strict = metadata.type === 'body' && schema instanceof z.ZodObject ? schema.strict() : schema
    return super.transform(value, { ...metadata, schema: strict })
  }

  /**
   * Nothing is taken out unseen, not even `constructor` or `__proto__`: read as JSON they are keys like others, of which the schemas keep
   * none, and inputs of a calculator are refused for them by name.
   */
  protected override stripProtoKeys() {}
}

function invalid(issues: readonly z.core.$ZodIssue[]): Refusal {
  return new Refusal('invalid', 'Some of this needs putting right.', issues.flatMap(fieldsOf))
}

export function fieldsOf(issue: z.core.$ZodIssue): ErrorBody['fields'] {
  const at = (path: readonly PropertyKey[]) => path.map(String).join('.')
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      field: at([...issue.path, key]),
      code: 'unknown',
      message: 'Leave this out: nothing here is called that.',
    }))
  }
  return [{ field: at(issue.path), code: issue.code.replaceAll('_', '-'), message: issue.message }]
}
