import { Module } from '@nestjs/common';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { settingsConstraints } from './settings.constraints.js';
import { ShopController } from './shop.controller.js';
import { ShopRepository } from './shop.repository.js';
import { ShopService } from './shop.service.js';
import { ShopSettingsRepository } from './shop-settings.repository.js';
import { ShopSettingsService } from './shop-settings.service.js';
import { TaxSettingsController } from './tax-settings.controller.js';
import { TaxSettingsRepository } from './tax-settings.repository.js';
import { TaxSettingsService } from './tax-settings.service.js';
import { VatRulesRepository } from './vat-rules.repository.js';
import { VatRulesService } from './vat-rules.service.js';
import { WorkingCalendarService } from './working-calendar.service.js';

@Module({
  controllers: [ShopController, TaxSettingsController],
  providers: [
    ShopRepository,
    ShopService,
    ShopSettingsRepository,
    ShopSettingsService,
    TaxSettingsRepository,
    TaxSettingsService,
    VatRulesRepository,
    VatRulesService,
    WorkingCalendarService,
  ],
  exports: [ShopService, VatRulesService, WorkingCalendarService],
})
export class SettingsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(settingsConstraints);
  }
}
