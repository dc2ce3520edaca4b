import { Body, Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { SerialParam } from '../units/serial.js';
import { FaultsService } from './faults.service.js';
import { RecordReadingService } from './record-reading.service.js';
import {
  FaultDto,
  FaultInputDto,
  FaultPageDto,
  FaultsQuery,
  FirstPassListDto,
  NoFaultInputDto,
  ReadingInputDto,
  ReadingResultDto,
  ReworkInputDto,
  UnitRunsDto,
} from './test-run.dto.js';
import { TestRunsService } from './test-runs.service.js';

@Controller()
@Roles('owner', 'assembler')
export class TestingController {
  constructor(
    private readonly runs: TestRunsService,
    private readonly readings: RecordReadingService,
    private readonly faults: FaultsService,
  ) {}

  @Get('units/:serial/test-runs')
  async list(@SerialParam() serial: string): Promise<UnitRunsDto> {
    return this.runs.ofUnit(serial);
  }

  /** One reading, applied once by its key; the run it belongs to begins and ends by itself. */
  @Post('units/:serial/readings')
  @HttpCode(200)
  async record(
    @SerialParam() serial: string,
    @Body() input: ReadingInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<ReadingResultDto> {
    return this.readings.record(serial, input, person);
  }

  @Post('units/:serial/faults')
  @Creates()
  async report(
    @SerialParam() serial: string,
    @Body() input: FaultInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<FaultDto> {
    return this.faults.read(await this.faults.report(serial, input, person));
  }

  @Get('faults')
  async listFaults(@Query() query: FaultsQuery): Promise<FaultPageDto> {
    return this.faults.list(query);
  }

  /** How many units passed the first time they were measured. */
  @Get('first-passes')
  async firstPasses(): Promise<FirstPassListDto> {
    return this.faults.firstPasses();
  }

  @Get('faults/:number')
  async openFault(@CodeParam('document', 'number') number: string): Promise<FaultDto> {
    return this.faults.read(number);
  }

  @Post('faults/:number/rework')
  @HttpCode(200)
  async rework(
    @CodeParam('document', 'number') number: string,
    @Body() input: ReworkInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<FaultDto> {
    await this.faults.rework(number, input, person);
    return this.faults.read(number);
  }

  @Post('faults/:number/no-fault')
  @HttpCode(200)
  async noFault(
    @CodeParam('document', 'number') number: string,
    @Body() input: NoFaultInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<FaultDto> {
    await this.faults.noFault(number, input, person);
    return this.faults.read(number);
  }
}
