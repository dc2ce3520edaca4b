import { Module } from '@nestjs/common';
import { BuildsModule } from '../builds/builds.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { DeliveryRepository } from './delivery.repository.js';
import { ListingDetailsRepository } from './listing-details.repository.js';
import { ListingsRepository } from './listings.repository.js';
import { PromisesService } from './promises.service.js';
import { QuotesService } from './quotes.service.js';
import { StorefrontController } from './storefront.controller.js';
import { StorefrontService } from './storefront.service.js';

@Module({
  imports: [SettingsModule, StockModule, BuildsModule],
  controllers: [StorefrontController],
  providers: [
    DeliveryRepository,
    ListingDetailsRepository,
    ListingsRepository,
    PromisesService,
    QuotesService,
    StorefrontService,
  ],
  exports: [PromisesService, QuotesService],
})
export class CatalogueModule {}
