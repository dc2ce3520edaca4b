import { Module } from '@nestjs/common';
import { UnitsModule } from '../units/units.module.js';
import { FaultRegister } from './fault-register.service.js';
import { FaultsRepository } from './faults.repository.js';
import { FaultsService } from './faults.service.js';
import { RecordReadingService } from './record-reading.service.js';
import { TestRunsRepository } from './test-runs.repository.js';
import { TestRunsService } from './test-runs.service.js';
import { TestingController } from './testing.controller.js';

@Module({
  imports: [UnitsModule],
  controllers: [TestingController],
  providers: [
    FaultRegister,
    FaultsRepository,
    FaultsService,
    RecordReadingService,
    TestRunsRepository,
    TestRunsService,
  ],
  exports: [FaultRegister, FaultsService, RecordReadingService, TestRunsService],
})
export class TestingModule {}
