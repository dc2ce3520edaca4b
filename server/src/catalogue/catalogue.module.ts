import { Module } from '@nestjs/common';
import { BuildsModule } from '../builds/builds.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { DeliveryRepository } from './delivery.repository.js';
import { ListingsRepository } from './listings.repository.js';
import { PromisesService } from './promises.service.js';
import { QuotesService } from './quotes.service.js';

@Module({
  imports: [SettingsModule, StockModule, BuildsModule],
  providers: [DeliveryRepository, ListingsRepository, PromisesService, QuotesService],
  exports: [PromisesService, QuotesService],
})
export class CatalogueModule {}
