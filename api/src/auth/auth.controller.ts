import { Body, Controller, Delete, HttpCode, Post, Req, Res, UseGuards } from '@nestjs/common'
import { ApiTags } from '@nestjs/swagger'
import type { Request, Response } from 'express'
import { AntiForgery, Public } from '../common/decorators/access.ts'
import { Answers } from '../common/decorators/answers.ts'
import { Refusal } from '../common/refusal.ts'
import { AuthService } from './auth.service.ts'
import {
  type Confirmation,
  confirmationSchema,
  type PasswordReset,
  type PasswordResetRequest,
  passwordResetRequestSchema,
  passwordResetSchema,
  type Session,
  sessionSchema,
  type SignIn,
  signInSchema,
  type SignUp,
  signUpSchema,
} from './dto/auth.schema.ts'
import { SessionCookies } from './session-cookies.ts'
import { type OpenSession, SessionsService } from './sessions.service.ts'
import { TriesGuard } from './tries.guard.ts'

@ApiTags('auth')
@Controller('auth')
@Public({ readsSession: false })
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    private readonly cookies: SessionCookies,
  ) {}

  @Post('sign-up')
  @HttpCode(202)
  @UseGuards(TriesGuard)
  async signUp(@Body({ schema: signUpSchema }) body: SignUp): Promise<void> {
    await this.auth.signUp(body)
  }

  @Post('confirmation')
  @Answers(sessionSchema)
  @UseGuards(TriesGuard)
  async confirm(
    @Body({ schema: confirmationSchema }) { token }: Confirmation,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Session> {
    return this.opened(response, await this.auth.confirm(token))
  }

  @Post('session')
  @Answers(sessionSchema)
  @UseGuards(TriesGuard)
  async signIn(
    @Body({ schema: signInSchema }) body: SignIn,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Session> {
    return this.opened(response, await this.auth.signIn(body))
  }

  @Post('session/refresh')
  @AntiForgery()
  @Answers(sessionSchema)
  async refresh(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<Session> {
    const token = this.cookies.refreshToken(request)
    const session = token && (await this.sessions.refresh(token))
    if (!session) {
      this.cookies.clear(response)
      throw new Refusal('session-ended', 'You are no longer signed in. Sign in again.')
    }
    return this.opened(response, session)
  }

  @Delete('session')
  @AntiForgery()
  @HttpCode(204)
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    const token = this.cookies.refreshToken(request)
    if (token) await this.sessions.end(token)
    this.cookies.clear(response)
  }

  @Post('password-reset-requests')
  @HttpCode(202)
  @UseGuards(TriesGuard)
  async requestPasswordReset(
    @Body({ schema: passwordResetRequestSchema }) { email }: PasswordResetRequest,
  ): Promise<void> {
    await this.auth.requestPasswordReset(email)
  }

  @Post('password-resets')
  @Answers(sessionSchema)
  @UseGuards(TriesGuard)
  async resetPassword(
    @Body({ schema: passwordResetSchema }) body: PasswordReset,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Session> {
    return this.opened(response, await this.auth.resetPassword(body))
  }

  private opened(response: Response, { user, tokens }: OpenSession): Session {
    this.cookies.set(response, tokens)
    return { user }
  }
}
