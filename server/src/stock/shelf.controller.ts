import { Controller, Get, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { CodeParam } from '../platform/validation/codes.js';
import { PartPageDto, PartsQuery } from './part-list.dto.js';
import { PartStoryDto } from './part-story.dto.js';
import { ShelfPartsService } from './shelf-parts.service.js';
import { ShelfQueueDto } from './shelf-queue.dto.js';
import { ShelfQueueService } from './shelf-queue.service.js';
import { StockValueDto, StockValueQuery } from './stock-value.dto.js';
import { StockValueService } from './stock-value.service.js';

@Controller()
@Roles('owner', 'assembler', 'accountant')
export class ShelfController {
  constructor(
    private readonly parts: ShelfPartsService,
    private readonly queue: ShelfQueueService,
    private readonly value: StockValueService,
  ) {}

  @Get('parts')
  async listParts(@Query() query: PartsQuery, @CurrentUser() person: SignedInUser): Promise<PartPageDto> {
    return this.parts.findPage(query, person);
  }

  /** One part's whole story. */
  @Get('parts/:code')
  async getPart(@CodeParam('part') code: string, @CurrentUser() person: SignedInUser): Promise<PartStoryDto> {
    return this.parts.get(code, person);
  }

  @Get('shelf-queue')
  async readQueue(): Promise<ShelfQueueDto> {
    return this.queue.read();
  }

  @Get('stock-value')
  @Roles('owner', 'accountant')
  async readValue(@Query() query: StockValueQuery): Promise<StockValueDto> {
    return this.value.read(query);
  }
}
