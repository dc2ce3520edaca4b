import { Body, Controller, HttpCode, Post, Req } from '@nestjs/common';
import type { Request } from 'express';
import { Public } from '../platform/auth/access.js';
import { startSession } from '../platform/auth/sign-in.js';
import { Clock } from '../platform/clock/clock.js';
import { Limited } from '../platform/limits/limited.js';
import { AccountRequestsService } from './account-requests.service.js';
import { FirstOwnerService } from './first-owner.service.js';
import { peopleLimits } from './limits.js';
import { LinkCompletionsService } from './link-completions.service.js';
import type { LinkPurpose } from './links.js';
import { EmailOnlyDto, FirstOwnerDto, LinkDto, LinkWithPasswordDto, SessionDto, SignUpDto } from './people.dto.js';
import { SessionsService } from './sessions.service.js';

/** How people come in: by signing up, by a link from a mail, or as the first owner. */
@Controller()
@Public()
export class AccountsController {
  constructor(
    private readonly requests: AccountRequestsService,
    private readonly completions: LinkCompletionsService,
    private readonly firstOwner: FirstOwnerService,
    private readonly sessions: SessionsService,
    private readonly clock: Clock,
  ) {}

  /** Asks for an account; the mail that follows says what happened. */
  @Post('sign-ups')
  @HttpCode(202)
  @Limited(peopleLimits.signUpFromAddress)
  async signUp(@Body() body: SignUpDto): Promise<void> {
    await this.requests.askForAccount(body.name, body.email);
  }

  /** Confirms the address by choosing a password. */
  @Post('sign-up-completions')
  @HttpCode(200)
  @Limited(peopleLimits.linkFromAddress)
  async completeSignUp(@Body() body: LinkWithPasswordDto, @Req() request: Request): Promise<SessionDto> {
    return this.#choosePassword('sign_up', body, request);
  }

  /** Asks for a new password; the mail that follows says what happened. */
  @Post('password-resets')
  @HttpCode(202)
  @Limited(peopleLimits.resetFromAddress)
  async askForPassword(@Body() body: EmailOnlyDto): Promise<void> {
    await this.requests.askForPassword(body.email);
  }

  @Post('password-reset-completions')
  @HttpCode(200)
  @Limited(peopleLimits.linkFromAddress)
  async completeReset(@Body() body: LinkWithPasswordDto, @Req() request: Request): Promise<SessionDto> {
    return this.#choosePassword('password_reset', body, request);
  }

  /** Joins the staff by choosing a password. */
  @Post('invitation-completions')
  @HttpCode(200)
  @Limited(peopleLimits.linkFromAddress)
  async completeInvitation(@Body() body: LinkWithPasswordDto, @Req() request: Request): Promise<SessionDto> {
    return this.#choosePassword('invitation', body, request);
  }

  /** Takes over the new address of an account. */
  @Post('email-change-completions')
  @HttpCode(204)
  @Limited(peopleLimits.linkFromAddress)
  async completeEmailChange(@Body() body: LinkDto): Promise<void> {
    await this.completions.confirmNewEmail(body.token);
  }

  /** Makes the first owner, while there is nobody yet. */
  @Post('first-owner')
  @HttpCode(200)
  @Limited(peopleLimits.setupCodeFromAddress)
  async makeFirstOwner(@Body() body: FirstOwnerDto, @Req() request: Request): Promise<SessionDto> {
    const user = await this.firstOwner.make(body, request.ip ?? '');
    await startSession(request, user, this.clock);
    return this.sessions.describe(request, user);
  }

  async #choosePassword(
    purpose: Exclude<LinkPurpose, 'email_change'>,
    body: LinkWithPasswordDto,
    request: Request,
  ): Promise<SessionDto> {
    const user = await this.completions.choosePassword(purpose, body.token, body.password, request.ip ?? '');
    await startSession(request, user, this.clock);
    return this.sessions.describe(request, user);
  }
}
