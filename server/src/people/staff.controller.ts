import { Body, Controller, Delete, Get, HttpCode, Patch, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { IdParam } from '../platform/validation/id-param.js';
import { InvitationDto, StaffEditDto, StaffMemberDto, StaffPageDto } from './people.dto.js';
import { StaffService } from './staff.service.js';

@Controller()
@Roles('owner')
export class StaffController {
  constructor(private readonly staff: StaffService) {}

  @Get('staff')
  async list(@Query() query: PageQuery): Promise<StaffPageDto> {
    return this.staff.list(query);
  }

  /** Asks somebody to join the staff, by mail. */
  @Post('invitations')
  @Creates()
  async invite(@Body() body: InvitationDto, @CurrentUser() user: SignedInUser): Promise<StaffMemberDto> {
    return this.staff.invite(user, body);
  }

  /** Sends the invitation again; the link before stops working. */
  @Post('staff/:id/invitations')
  @HttpCode(204)
  async inviteAgain(@IdParam() id: number, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.staff.inviteAgain(user, id);
  }

  /** Changes somebody's role, or whether they may sign in. */
  @Patch('staff/:id')
  async edit(
    @IdParam() id: number,
    @Body() body: StaffEditDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<StaffMemberDto> {
    return this.staff.edit(user, id, body);
  }

  /** Signs somebody out everywhere. */
  @Delete('staff/:id/sessions')
  @HttpCode(204)
  async endSessions(@IdParam() id: number, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.staff.endSessions(user, id);
  }
}
