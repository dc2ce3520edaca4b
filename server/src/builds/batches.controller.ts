import { Body, Controller, Get, HttpCode, Post, Put, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { IdParam } from '../platform/validation/id-param.js';
import { SerialParam } from '../units/serial.js';
import {
  BatchDto,
  BatchesQuery,
  BatchInputDto,
  BatchPageDto,
  SubAssemblyInputDto,
  WithdrawalInputDto,
} from './batch.dto.js';
import { BatchesService } from './batches.service.js';
import { BuildBatchService } from './build-batch.service.js';
import { FinishUnitService } from './finish-unit.service.js';
import { GiveBackService } from './give-back.service.js';
import { PickBatchService } from './pick-batch.service.js';
import { PickListService } from './pick-list.service.js';
import {
  BatchDocumentDto,
  CompletionDto,
  FinishedUnitDto,
  FittedLotDto,
  IssueInputDto,
  MadePiecesDto,
  PickListDto,
  ScrapDto,
  StepTickDto,
} from './picking.dto.js';
import { PlanBatchService } from './plan-batch.service.js';

@Controller()
@Roles('owner', 'assembler')
export class BatchesController {
  constructor(
    private readonly batches: BatchesService,
    private readonly planning: PlanBatchService,
    private readonly pickLists: PickListService,
    private readonly picking: PickBatchService,
    private readonly givingBack: GiveBackService,
    private readonly building: BuildBatchService,
    private readonly finishing: FinishUnitService,
  ) {}

  @Get('batches')
  async list(@Query() query: BatchesQuery): Promise<BatchPageDto> {
    return this.batches.list(query);
  }

  @Get('batches/:number')
  async open(@CodeParam('document', 'number') number: string, @CurrentUser() person: SignedInUser): Promise<BatchDto> {
    return this.batches.open(number, person);
  }

  /** Plans a batch and claims for it what is free on the shelf. */
  @Post('batches')
  @Roles('owner')
  @Creates()
  async plan(@Body() input: BatchInputDto, @CurrentUser() person: SignedInUser): Promise<BatchDto> {
    return this.batches.open(await this.planning.plan(input, person), person);
  }

  /** While it is only planned: from the shelf, or built within the batch. */
  @Put('batches/:number/sub-assemblies')
  async choose(
    @CodeParam('document', 'number') number: string,
    @Body() input: SubAssemblyInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDto> {
    await this.planning.chooseSubAssembly(number, input, person);
    return this.batches.open(number, person);
  }

  /** Claims what is missing, as far as it has come onto the shelf. */
  @Post('batches/:number/claims')
  @HttpCode(200)
  async claim(@CodeParam('document', 'number') number: string, @CurrentUser() person: SignedInUser): Promise<BatchDto> {
    await this.planning.claimMissing(number, person);
    return this.batches.open(number, person);
  }

  @Post('batches/:number/withdrawal')
  @HttpCode(200)
  @Roles('owner')
  async withdraw(
    @CodeParam('document', 'number') number: string,
    @Body() input: WithdrawalInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDto> {
    await this.planning.withdraw(number, input, person);
    return this.batches.open(number, person);
  }

  @Get('batches/:number/pick-list')
  async pickList(@CodeParam('document', 'number') number: string): Promise<PickListDto> {
    return this.pickLists.read(number);
  }

  @Post('batches/:number/issues')
  @Creates()
  async issue(
    @CodeParam('document', 'number') number: string,
    @Body() input: IssueInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDocumentDto> {
    return { document: await this.picking.issue(number, input, person) };
  }

  @Post('batches/:number/returns')
  @Creates()
  async giveBack(
    @CodeParam('document', 'number') number: string,
    @Body() input: IssueInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDocumentDto> {
    return { document: await this.givingBack.giveBack(number, input, person) };
  }

  /** Begins building: the units get their serial numbers. */
  @Post('batches/:number/building')
  @HttpCode(200)
  async start(@CodeParam('document', 'number') number: string, @CurrentUser() person: SignedInUser): Promise<BatchDto> {
    await this.building.start(number, person);
    return this.batches.open(number, person);
  }

  @Put('batches/:number/steps/:position')
  async tick(
    @CodeParam('document', 'number') number: string,
    @IdParam('position') position: number,
    @Body() input: StepTickDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDto> {
    await this.building.tick(number, position, input, person);
    return this.batches.open(number, person);
  }

  /** A lot scanned to a unit: the record then says exactly that it is in it. */
  @Post('units/:serial/fitted-lots')
  @HttpCode(204)
  async fitLot(
    @SerialParam() serial: string,
    @Body() input: FittedLotDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.building.fitLot(serial, input, person);
  }

  /** Puts a sound unit on the shelf. */
  @Post('units/:serial/completion')
  @Creates()
  async complete(
    @SerialParam() serial: string,
    @Body() input: CompletionDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<FinishedUnitDto> {
    return this.finishing.complete(serial, input, person);
  }

  /** Gives a unit up for good. */
  @Post('units/:serial/scrapping')
  @HttpCode(204)
  async scrap(
    @SerialParam() serial: string,
    @Body() input: ScrapDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.finishing.scrap(serial, input, person);
  }

  /** Puts made pieces on the shelf, of a part that is not followed one by one. */
  @Post('batches/:number/made-pieces')
  @Creates()
  async completePieces(
    @CodeParam('document', 'number') number: string,
    @Body() input: MadePiecesDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<BatchDocumentDto> {
    return { document: await this.finishing.completePieces(number, input, person) };
  }
}
