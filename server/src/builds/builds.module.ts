import { Module } from '@nestjs/common';
import { BatchSupplyRepository } from './batch-supply.repository.js';
import { BatchSupplyService } from './batch-supply.service.js';

@Module({
  providers: [BatchSupplyRepository, BatchSupplyService],
  exports: [BatchSupplyService],
})
export class BuildsModule {}
