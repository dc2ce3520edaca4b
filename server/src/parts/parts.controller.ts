import { Body, Controller, HttpCode, Post, Put } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { PartDto, PartEditDto, PartInputDto, PartRetireDto } from './part.dto.js';
import { PartsService } from './parts.service.js';

/** Parts as records. Their list and their story show what lies of them, and stand with the stock. */
@Controller('parts')
export class PartsController {
  constructor(private readonly parts: PartsService) {}

  @Post()
  @Roles('owner')
  @Creates()
  async create(@Body() input: PartInputDto, @CurrentUser() person: SignedInUser): Promise<PartDto> {
    return this.parts.create(input, person);
  }

  @Put(':code')
  @Roles('owner')
  async edit(
    @CodeParam('part') code: string,
    @Body() input: PartEditDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<PartDto> {
    return this.parts.edit(code, input, person);
  }

  @Post(':code/retire')
  @HttpCode(200)
  @Roles('owner')
  async retire(
    @CodeParam('part') code: string,
    @Body() input: PartRetireDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<PartDto> {
    return this.parts.retire(code, input.version, person);
  }

  @Post(':code/bring-back')
  @HttpCode(200)
  @Roles('owner')
  async bringBack(
    @CodeParam('part') code: string,
    @Body() input: PartRetireDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<PartDto> {
    return this.parts.bringBack(code, input.version, person);
  }
}
