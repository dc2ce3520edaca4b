import { Module } from '@nestjs/common';
import { SettingsModule } from '../settings/settings.module.js';
import { BooksController } from './books.controller.js';
import { BooksRepository } from './books.repository.js';
import { BooksService } from './books.service.js';
import { ExportsController } from './exports.controller.js';
import { ExportsRepository } from './exports.repository.js';
import { ExportsService } from './exports.service.js';
import { PeriodsService } from './periods.service.js';

@Module({
  imports: [SettingsModule],
  controllers: [BooksController, ExportsController],
  providers: [BooksRepository, BooksService, ExportsRepository, ExportsService, PeriodsService],
})
export class BooksModule {}
