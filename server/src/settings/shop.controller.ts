import { Body, Controller, Delete, Get, HttpCode, Param, Post, Put } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import {
  ClosedDayDto,
  ClosedDayInputDto,
  ClosedDaysDto,
  CountriesDto,
  ShopAnswerDto,
  ShopDto,
  ShopEditDto,
  ShopInputDto,
} from './shop.dto.js';
import { ShopSettingsService } from './shop-settings.service.js';

@Controller()
@Roles('owner')
export class ShopController {
  constructor(private readonly settings: ShopSettingsService) {}

  @Get('shop-settings')
  async read(): Promise<ShopAnswerDto> {
    return this.settings.read();
  }

  @Post('shop-settings')
  async setUp(@Body() input: ShopInputDto, @CurrentUser() person: SignedInUser): Promise<ShopDto> {
    return this.settings.setUp(input, person);
  }

  @Put('shop-settings')
  async edit(@Body() input: ShopEditDto, @CurrentUser() person: SignedInUser): Promise<ShopDto> {
    return this.settings.edit(input, person);
  }

  @Get('countries')
  @Roles('owner', 'assembler', 'accountant')
  async countries(): Promise<CountriesDto> {
    return asList(await this.settings.countries());
  }

  @Get('shop/closed-days')
  async closedDays(): Promise<ClosedDaysDto> {
    return asList(await this.settings.closedDays());
  }

  @Post('shop/closed-days')
  async close(@Body() input: ClosedDayInputDto, @CurrentUser() person: SignedInUser): Promise<ClosedDayDto> {
    return this.settings.close(input, person);
  }

  @Delete('shop/closed-days/:day')
  @HttpCode(204)
  async open(@Param('day') day: string, @CurrentUser() person: SignedInUser): Promise<void> {
    await this.settings.open(day, person);
  }
}

export function asList<Item>(items: Item[]): { items: Item[]; total: number } {
  return { items, total: items.length };
}
