import { Body, Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { CodeParam } from '../platform/validation/codes.js';
import { LotDto, LotPageDto, LotsQuery, LotStatusInputDto } from './lot.dto.js';
import { LotStatusService } from './lot-status.service.js';
import { LotsService } from './lots.service.js';

@Controller('lots')
export class LotsController {
  constructor(
    private readonly lots: LotsService,
    private readonly status: LotStatusService,
  ) {}

  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: LotsQuery): Promise<LotPageDto> {
    return this.lots.list(query);
  }

  @Get(':code')
  @Roles('owner', 'assembler', 'accountant')
  async get(@CodeParam('lot') code: string, @CurrentUser() person: SignedInUser): Promise<LotDto> {
    return this.lots.get(code, person);
  }

  /** Anybody at the bench may hold a lot back; to let it go again is the owner's. */
  @Post(':code/status')
  @HttpCode(200)
  @Roles('owner', 'assembler')
  async changeStatus(
    @CodeParam('lot') code: string,
    @Body() input: LotStatusInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<LotDto> {
    await this.status.change(code, input, person);
    return this.lots.get(code, person);
  }
}
