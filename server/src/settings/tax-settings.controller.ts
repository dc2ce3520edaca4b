import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { IdParam } from '../platform/validation/id-param.js';
import {
  DeliveryRateDto,
  DeliveryRateInputDto,
  DeliveryRatesDto,
  VatExceptionDto,
  VatExceptionInputDto,
  VatExceptionsDto,
  VatRateDto,
  VatRateInputDto,
  VatRatesDto,
} from './shop.dto.js';
import { asList } from './shop.controller.js';
import { TaxSettingsService } from './tax-settings.service.js';

/** Few rows, read whole: these lists have no pages. */
@Controller()
@Roles('owner')
export class TaxSettingsController {
  constructor(private readonly taxes: TaxSettingsService) {}

  @Get('vat-rates')
  @Roles('owner', 'accountant')
  async vatRates(): Promise<VatRatesDto> {
    return asList(await this.taxes.vatRates());
  }

  @Post('vat-rates')
  async addVatRate(@Body() input: VatRateInputDto, @CurrentUser() person: SignedInUser): Promise<VatRateDto> {
    return this.taxes.addVatRate(input, person);
  }

  @Delete('vat-rates/:id')
  @HttpCode(204)
  async removeVatRate(@IdParam() id: number, @CurrentUser() person: SignedInUser): Promise<void> {
    await this.taxes.removeVatRate(id, person);
  }

  @Get('vat-exceptions')
  @Roles('owner', 'accountant')
  async vatExceptions(): Promise<VatExceptionsDto> {
    return asList(await this.taxes.vatExceptions());
  }

  @Post('vat-exceptions')
  async addVatException(
    @Body() input: VatExceptionInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<VatExceptionDto> {
    return this.taxes.addVatException(input, person);
  }

  @Delete('vat-exceptions/:country/:prefix')
  @HttpCode(204)
  async removeVatException(
    @Param('country') country: string,
    @Param('prefix') prefix: string,
    @CurrentUser() person: SignedInUser,
  ): Promise<void> {
    await this.taxes.removeVatException(country, prefix, person);
  }

  @Get('delivery-rates')
  @Roles('owner', 'accountant')
  async deliveryRates(): Promise<DeliveryRatesDto> {
    return asList(await this.taxes.deliveryRates());
  }

  @Post('delivery-rates')
  async addDeliveryRate(
    @Body() input: DeliveryRateInputDto,
    @CurrentUser() person: SignedInUser,
  ): Promise<DeliveryRateDto> {
    return this.taxes.addDeliveryRate(input, person);
  }

  @Delete('delivery-rates/:id')
  @HttpCode(204)
  async removeDeliveryRate(@IdParam() id: number, @CurrentUser() person: SignedInUser): Promise<void> {
    await this.taxes.removeDeliveryRate(id, person);
  }
}
