import { Body, Controller, Get, HttpCode, Patch, Post, Req } from '@nestjs/common';
import type { Request } from 'express';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { EmailChangeDto, PasswordChangeDto, ProfileDto, ProfileEditDto } from './people.dto.js';
import { ProfileService } from './profile.service.js';

/** One's own account. */
@Controller()
@Roles('owner', 'assembler', 'accountant', 'customer')
export class ProfileController {
  constructor(private readonly profile: ProfileService) {}

  @Get('profile')
  async read(@CurrentUser() user: SignedInUser): Promise<ProfileDto> {
    return this.profile.read(user);
  }

  @Patch('profile')
  async edit(@Body() body: ProfileEditDto, @CurrentUser() user: SignedInUser): Promise<ProfileDto> {
    return this.profile.edit(user, body);
  }

  @Post('password-changes')
  @HttpCode(204)
  async changePassword(
    @Body() body: PasswordChangeDto,
    @Req() request: Request,
    @CurrentUser() user: SignedInUser,
  ): Promise<void> {
    await this.profile.changePassword(user, body, request.sessionID);
  }

  /** Sends a link to the new address. */
  @Post('email-changes')
  @HttpCode(202)
  async askForEmail(@Body() body: EmailChangeDto, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.profile.askForEmail(user, body);
  }
}
