import { Body, Controller, Get, HttpCode, Post, Put, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { BinDto, BinEditDto, BinInputDto, BinPageDto, BinRetireDto, BinsQuery } from './bin.dto.js';
import { BinsService } from './bins.service.js';

@Controller('bins')
export class BinsController {
  constructor(private readonly bins: BinsService) {}

  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: BinsQuery): Promise<BinPageDto> {
    return this.bins.list(query);
  }

  @Get(':code')
  @Roles('owner', 'assembler', 'accountant')
  async get(@CodeParam('bin') code: string): Promise<BinDto> {
    return this.bins.get(code);
  }

  @Post()
  @Roles('owner')
  @Creates()
  async create(@Body() input: BinInputDto, @CurrentUser() person: SignedInUser): Promise<BinDto> {
    return this.bins.create(input, person);
  }

  @Put(':code')
  @Roles('owner')
  async edit(
    @CodeParam('bin') code: string,
    @Body() input: BinEditDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BinDto> {
    return this.bins.edit(code, input, person);
  }

  @Post(':code/retire')
  @HttpCode(200)
  @Roles('owner')
  async retire(
    @CodeParam('bin') code: string,
    @Body() input: BinRetireDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BinDto> {
    return this.bins.retire(code, input.version, person);
  }

  @Post(':code/bring-back')
  @HttpCode(200)
  @Roles('owner')
  async bringBack(
    @CodeParam('bin') code: string,
    @Body() input: BinRetireDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BinDto> {
    return this.bins.bringBack(code, input.version, person);
  }
}
