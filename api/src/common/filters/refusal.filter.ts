import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common'
import type { Response } from 'express'
import { broken, Refusal } from '../refusal.ts'

/** Gives every error, ours or the framework's, the one shape; what is nobody's doing but ours is written to the log only. */
@Catch()
export class RefusalFilter implements ExceptionFilter {
  private readonly logger = new Logger('Request')

  catch(error: unknown, host: ArgumentsHost) {
    const response = host.switchToHttp().getResponse<Response>()
    if (response.headersSent) {
      response.destroy()
      return
    }
    const refusal = this.asRefusal(error)
    response.status(refusal.getStatus()).json(refusal.getResponse())
  }

  private asRefusal(error: unknown): Refusal {
    if (error instanceof Refusal) return error
    // Express and its parsers throw errors that carry a status; Nest turns some of them into exceptions of its own.
    const status = error instanceof HttpException ? error.getStatus() : (error as { status?: unknown } | null)?.status
    if (status === 404) return new Refusal('not-found', 'There is nothing at this address.')
    if (status === 413) return new Refusal('too-large', 'That is more than is taken in one go.')
    if (typeof status === 'number' && status >= 400 && status < 500) {
      return new Refusal('malformed', 'The request could not be read: send JSON.')
    }
    this.logger.error(error instanceof Error ? error.stack : error)
    return broken()
  }
}
