import { Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../auth/access.js';
import type { SignedInUser } from '../auth/signed-in-user.js';
import { IdParam } from '../validation/id-param.js';
import { OutboxPageDto, OutboxQuery } from './outbox.dto.js';
import { OutboxService } from './outbox.service.js';

/** Mail that left, waits, or needs a decision. */
@Controller('outbox-mails')
@Roles('owner')
export class OutboxController {
  constructor(private readonly outbox: OutboxService) {}

  @Get()
  async list(@Query() query: OutboxQuery): Promise<OutboxPageDto> {
    return this.outbox.list(query);
  }

  /** Sends again what was given up or may not have left. */
  @Post(':id/retry')
  @HttpCode(204)
  async retry(@IdParam() id: number, @CurrentUser() user: SignedInUser): Promise<void> {
    await this.outbox.retry(id, user);
  }
}
