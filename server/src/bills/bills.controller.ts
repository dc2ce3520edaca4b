import { Body, Controller, Get, HttpCode, Post, Put, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { IdParam } from '../platform/validation/id-param.js';
import { BillEditDto, BillRevisionDto, NewDraftDto, RevisionVersionDto } from './bill.dto.js';
import {
  BillComparisonDto,
  BillDto,
  BillListDto,
  BillListQuery,
  BillTreeDto,
  CompareQuery,
  ComponentListDto,
  ComponentQuery,
  TreeQuery,
  WhereUsedDto,
} from './bill-views.dto.js';
import { BillViewsService } from './bill-views.service.js';
import { DraftBillsService } from './draft-bills.service.js';
import { ReleaseBillService } from './release-bill.service.js';

@Controller()
@Roles('owner', 'assembler')
export class BillsController {
  constructor(
    private readonly views: BillViewsService,
    private readonly drafts: DraftBillsService,
    private readonly releases: ReleaseBillService,
  ) {}

  /** Parts with a bill, released or in draft. */
  @Get('bills')
  async list(@Query() query: BillListQuery): Promise<BillListDto> {
    return this.views.list(query);
  }

  /** Parts that can stand in a bill or a kit. */
  @Get('bill-components')
  async components(@Query() query: ComponentQuery): Promise<ComponentListDto> {
    return this.views.components(query);
  }

  /** The revisions of a part's bill. */
  @Get('bills/:code')
  async open(@CodeParam('part') code: string): Promise<BillDto> {
    return this.views.open(code);
  }

  /** What a part is in, at every level. */
  @Get('bills/:code/where-used')
  async whereUsed(@CodeParam('part') code: string): Promise<WhereUsedDto> {
    return this.views.whereUsed(code);
  }

  /** Two revisions, line by line. */
  @Get('bills/:code/comparison')
  async compare(@CodeParam('part') code: string, @Query() query: CompareQuery): Promise<BillComparisonDto> {
    return this.views.compare(code, query.from, query.to);
  }

  @Get('bills/:code/revisions/:number')
  async revision(@CodeParam('part') code: string, @IdParam('number') number: number): Promise<BillRevisionDto> {
    return this.views.revision(code, number);
  }

  /** A revision over all levels: each place, and each part summed. */
  @Get('bills/:code/revisions/:number/tree')
  async tree(
    @CodeParam('part') code: string,
    @IdParam('number') number: number,
    @Query() query: TreeQuery,
  ): Promise<BillTreeDto> {
    return this.views.tree(code, number, query.quantity);
  }

  @Post('bills/:code/revisions')
  @Roles('owner')
  @Creates()
  async create(
    @CodeParam('part') code: string,
    @Body() body: NewDraftDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BillRevisionDto> {
    return this.drafts.create(person, code, body);
  }

  /** Saves a draft whole. */
  @Put('bills/:code/revisions/:number')
  @Roles('owner')
  async edit(
    @CodeParam('part') code: string,
    @IdParam('number') number: number,
    @Body() body: BillEditDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BillRevisionDto> {
    return this.drafts.edit(person, code, number, body);
  }

  /** Puts a draft in force; it cannot change from then on. */
  @Post('bills/:code/revisions/:number/release')
  @HttpCode(200)
  @Roles('owner')
  async release(
    @CodeParam('part') code: string,
    @IdParam('number') number: number,
    @Body() body: RevisionVersionDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BillRevisionDto> {
    return this.releases.release(person, code, number, body.version);
  }

  /** Throws a draft away. */
  @Post('bills/:code/revisions/:number/discard')
  @HttpCode(204)
  @Roles('owner')
  async discard(
    @CodeParam('part') code: string,
    @IdParam('number') number: number,
    @Body() body: RevisionVersionDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.drafts.discard(person, code, number, body.version);
  }
}
