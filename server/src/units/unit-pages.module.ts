import { Module } from '@nestjs/common';
import { SettingsModule } from '../settings/settings.module.js';
import { TestingModule } from '../testing/testing.module.js';
import { UnitPagesRepository } from './unit-pages.repository.js';
import { UnitPagesService } from './unit-pages.service.js';
import { UnitsController } from './units.controller.js';

/** What is shown of units; it reads what building and testing keep of them. */
@Module({
  imports: [SettingsModule, TestingModule],
  controllers: [UnitsController],
  providers: [UnitPagesRepository, UnitPagesService],
  exports: [UnitPagesService],
})
export class UnitPagesModule {}
