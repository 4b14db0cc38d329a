import type { ErrorBody } from '#api/common/dto/error.schema.ts'

/** A refusal of the server, or no answer at all (`status` 0). Tell them apart by `code`, never by `message`. */
export class ApiError extends Error {
  readonly status: number
  readonly code: string
  readonly fields: ErrorBody['fields']

  constructor(status: number, { code, message, fields }: ErrorBody) {
    super(message)
    this.name = 'ApiError'
    this.status = status
    this.code = code
    this.fields = fields
  }
}

export const hasCode = (error: unknown, code: string): error is ApiError =>
  error instanceof ApiError && error.code === code
