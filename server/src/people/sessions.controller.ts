import { Body, Controller, Delete, Get, HttpCode, Param, Post, Req, Res } from '@nestjs/common';
import type { Request, Response } from 'express';
import { CurrentUser, MaybeUser, Public, Roles } from '../platform/auth/access.js';
import { sessionCookieName } from '../platform/auth/session.middleware.js';
import { endSession, startSession } from '../platform/auth/sign-in.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { OwnSessionsDto, SessionDto, SignInDto } from './people.dto.js';
import { SessionsService } from './sessions.service.js';
import { SignInService } from './sign-in.service.js';

@Controller()
export class SessionsController {
  constructor(
    private readonly signInService: SignInService,
    private readonly sessions: SessionsService,
    private readonly clock: Clock,
    private readonly config: Config,
  ) {}

  /** Who is signed in, and the token for changes. */
  @Get('session')
  @Public()
  async current(@Req() request: Request, @MaybeUser() user: SignedInUser | null): Promise<SessionDto> {
    return this.sessions.describe(request, user);
  }

  @Post('session')
  @HttpCode(200)
  @Public()
  async signIn(@Body() body: SignInDto, @Req() request: Request): Promise<SessionDto> {
    const user = await this.signInService.signIn(body.email, body.password, request.ip ?? '');
    await startSession(request, user, this.clock);
    return this.sessions.describe(request, user);
  }

  @Delete('session')
  @HttpCode(204)
  @Public()
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await endSession(request, response, sessionCookieName(this.config));
  }

  /** Where one is signed in. */
  @Get('sessions')
  @Roles('owner', 'assembler', 'accountant', 'customer')
  async list(@Req() request: Request, @CurrentUser() user: SignedInUser): Promise<OwnSessionsDto> {
    return { items: await this.sessions.listOwn(user, request.sessionID) };
  }

  /** Signs out everywhere else. */
  @Delete('sessions')
  @HttpCode(204)
  @Roles('owner', 'assembler', 'accountant', 'customer')
  async endOthers(@Req() request: Request, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.sessions.endOwnOthers(user, request.sessionID);
  }

  @Delete('sessions/:key')
  @HttpCode(204)
  @Roles('owner', 'assembler', 'accountant', 'customer')
  async end(@Param('key') key: string, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.sessions.endOwn(user, key);
  }
}
