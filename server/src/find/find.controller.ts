import { Controller, Get, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { FindQuery, FoundListDto } from './find.dto.js';
import { FindService } from './find.service.js';

@Controller('find')
export class FindController {
  constructor(private readonly find: FindService) {}

  /** Things whose code, name or serial fits; the very code first. */
  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: FindQuery, @CurrentUser() person: SignedInUser): Promise<FoundListDto> {
    const items = await this.find.find(query, person);
    return { items, total: items.length };
  }
}
