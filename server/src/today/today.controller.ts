import { Controller, Get } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { TodayDto } from './today.dto.js';
import { TodayService } from './today.service.js';

@Controller('today')
@Roles('owner', 'assembler', 'accountant')
export class TodayController {
  constructor(private readonly today: TodayService) {}

  @Get()
  async get(@CurrentUser() person: SignedInUser): Promise<TodayDto> {
    return this.today.get(person);
  }
}
