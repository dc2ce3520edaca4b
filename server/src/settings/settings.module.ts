import { Module } from '@nestjs/common';
import { ShopRepository } from './shop.repository.js';
import { ShopService } from './shop.service.js';

@Module({ providers: [ShopRepository, ShopService], exports: [ShopService] })
export class SettingsModule {}
