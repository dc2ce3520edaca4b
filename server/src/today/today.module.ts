import { Module } from '@nestjs/common';
import { SettingsModule } from '../settings/settings.module.js';
import { TodayController } from './today.controller.js';
import { TodayRepository } from './today.repository.js';
import { TodayService } from './today.service.js';

@Module({
  imports: [SettingsModule],
  controllers: [TodayController],
  providers: [TodayRepository, TodayService],
})
export class TodayModule {}
