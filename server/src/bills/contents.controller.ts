import { Body, Controller, Get, Put, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { CodeParam } from '../platform/validation/codes.js';
import { ContentsDto, ContentsEditDto, KitListDto, KitListQuery } from './contents.dto.js';
import { ContentsService } from './contents.service.js';

@Controller('kits')
@Roles('owner', 'assembler')
export class ContentsController {
  constructor(private readonly contents: ContentsService) {}

  /** Parts that have a contents list. */
  @Get()
  async list(@Query() query: KitListQuery): Promise<KitListDto> {
    return this.contents.list(query);
  }

  /** What goes into which bag, and what it should weigh. */
  @Get(':code')
  async open(@CodeParam('part') code: string): Promise<ContentsDto> {
    return this.contents.open(code);
  }

  /** Saves a contents list whole. */
  @Put(':code')
  @Roles('owner')
  async edit(
    @CodeParam('part') code: string,
    @Body() body: ContentsEditDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<ContentsDto> {
    return this.contents.edit(person, code, body);
  }
}
