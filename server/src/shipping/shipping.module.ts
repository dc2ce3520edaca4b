import { Module } from '@nestjs/common';
import { JournalModule } from '../journal/journal.module.js';
import { OrdersModule } from '../orders/orders.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { DispatchService } from './dispatch.service.js';
import { LithiumContentsRepository } from './lithium-contents.repository.js';
import { PackingLookupRepository } from './packing-lookup.repository.js';
import { PackingService } from './packing.service.js';
import { ParcelLithiumService } from './parcel-lithium.service.js';
import { ParcelShippedMailTask } from './parcel-shipped-mail.task.js';
import { ParcelsController } from './parcels.controller.js';
import { ParcelsRepository } from './parcels.repository.js';
import { ParcelsService } from './parcels.service.js';
import { ScanReader } from './scan-reader.js';
import { shippingConstraints } from './shipping.constraints.js';

@Module({
  imports: [SettingsModule, StockModule, JournalModule, OrdersModule],
  controllers: [ParcelsController],
  providers: [
    DispatchService,
    LithiumContentsRepository,
    PackingLookupRepository,
    PackingService,
    ParcelLithiumService,
    ParcelShippedMailTask,
    ParcelsRepository,
    ParcelsService,
    ScanReader,
  ],
  exports: [PackingService],
})
export class ShippingModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(shippingConstraints);
  }
}
