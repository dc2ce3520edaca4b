import { Controller, Get } from '@nestjs/common';
import { Roles } from '../platform/auth/access.js';
import { CodeParam } from '../platform/validation/codes.js';
import { IdParam } from '../platform/validation/id-param.js';
import { BillCostService } from './bill-cost.service.js';
import { BuildableService } from './buildable.service.js';
import { BillCostDto, BuildableDto, DesignQueueDto } from './design-figures.dto.js';
import { DesignQueueService } from './design-queue.service.js';

/** What the shelf says about the designs. */
@Controller()
@Roles('owner', 'assembler')
export class DesignFiguresController {
  constructor(
    private readonly queue: DesignQueueService,
    private readonly buildables: BuildableService,
    private readonly costs: BillCostService,
  ) {}

  /** Drafts that wait for release, and released bills that cannot be built to. */
  @Get('design-queue')
  async designQueue(): Promise<DesignQueueDto> {
    return this.queue.read();
  }

  /** How many could be built now, and what stops the next one. */
  @Get('bills/:code/revisions/:number/buildable')
  async buildable(@CodeParam('part') code: string, @IdParam('number') number: number): Promise<BuildableDto> {
    return this.buildables.of(code, number);
  }

  /** What one costs today. */
  @Get('bills/:code/revisions/:number/cost')
  @Roles('owner')
  async cost(@CodeParam('part') code: string, @IdParam('number') number: number): Promise<BillCostDto> {
    return this.costs.of(code, number);
  }
}
