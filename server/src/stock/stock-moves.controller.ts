import { Body, Controller, Get, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { AdjustStockService } from './adjust-stock.service.js';
import { AdjustmentInputDto, ReversalInputDto, StockDocumentDto, TransferInputDto } from './move-stock.dto.js';
import { MovePageDto, MovesQuery } from './move.dto.js';
import { MovesService } from './moves.service.js';
import { ReverseDocumentService } from './reverse-document.service.js';
import { TransferStockService } from './transfer-stock.service.js';

@Controller()
export class StockMovesController {
  constructor(
    private readonly moves: MovesService,
    private readonly transfers: TransferStockService,
    private readonly adjustments: AdjustStockService,
    private readonly reversals: ReverseDocumentService,
  ) {}

  @Get('stock-moves')
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: MovesQuery, @CurrentUser() person: SignedInUser): Promise<MovePageDto> {
    return this.moves.list(query, person);
  }

  @Post('stock-transfers')
  @Roles('owner', 'assembler')
  @Creates()
  async transfer(@Body() input: TransferInputDto, @CurrentUser() person: SignedInUser): Promise<StockDocumentDto> {
    return { number: await this.transfers.transfer(input, person) };
  }

  @Post('stock-adjustments')
  @Roles('owner', 'assembler')
  @Creates()
  async adjust(@Body() input: AdjustmentInputDto, @CurrentUser() person: SignedInUser): Promise<StockDocumentDto> {
    return { number: await this.adjustments.adjust(input, person) };
  }

  /** Takes back a delivery, transfer or adjustment that was wrong, by a document that does the opposite. */
  @Post('stock-documents/:number/reversal')
  @Roles('owner')
  @Creates()
  async reverse(
    @CodeParam('document', 'number') number: string,
    @Body() input: ReversalInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<StockDocumentDto> {
    return { number: await this.reversals.reverse(number, input, person) };
  }
}
