import { Body, Controller, Get, HttpCode, Post, Put, Query, Res } from '@nestjs/common';
import { ApiProduces } from '@nestjs/swagger';
import type { Response } from 'express';
import { OrdersService } from '../orders/orders.service.js';
import { CurrentUser, Roles } from '../platform/auth/access.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { attachmentNamed } from '../platform/files/send-file.js';
import { Creates } from '../platform/idempotency/creates.js';
import { CodeParam } from '../platform/validation/codes.js';
import { IdParam } from '../platform/validation/id-param.js';
import { DispatchService } from './dispatch.service.js';
import { PackingService } from './packing.service.js';
import { ParcelLithiumService } from './parcel-lithium.service.js';
import {
  CarrierAnswerInput,
  DispatchInput,
  LithiumInput,
  OpenParcelInput,
  ParcelDto,
  ParcelPageDto,
  ParcelsQuery,
  ParcelVersionInput,
  ScanAnswerDto,
  ScanInput,
} from './parcel.dto.js';
import { ParcelsService } from './parcels.service.js';

/** Parcels: opened for an order, filled by scanning, weighed, sent. */
@Controller('parcels')
@Roles('owner', 'assembler')
export class ParcelsController {
  constructor(
    private readonly parcels: ParcelsService,
    private readonly packing: PackingService,
    private readonly lithium: ParcelLithiumService,
    private readonly dispatching: DispatchService,
    private readonly orders: OrdersService,
  ) {}

  @Get()
  @Roles('owner', 'assembler', 'accountant')
  async list(@Query() query: ParcelsQuery): Promise<ParcelPageDto> {
    return this.parcels.list(query);
  }

  /** Opens a parcel for an order; the one that is open already is given again. */
  @Post()
  @Creates()
  async open(@Body() input: OpenParcelInput, @CurrentUser() person: SignedInUser): Promise<ParcelDto> {
    const orderId = await this.orders.idOf(input.order);
    return this.parcels.get(await this.packing.open(orderId, person));
  }

  @Get(':code')
  @Roles('owner', 'assembler', 'accountant')
  async get(@CodeParam('document') number: string): Promise<ParcelDto> {
    return this.parcels.get(number);
  }

  @Post(':code/scans')
  @HttpCode(200)
  async scan(
    @CodeParam('document') number: string,
    @Body() input: ScanInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ScanAnswerDto> {
    const done = await this.packing.scan(number, input, person);
    return { ...done, parcel: await this.parcels.get(number) };
  }

  @Post(':code/items/:id/taken-out')
  @HttpCode(200)
  async takeOut(
    @CodeParam('document') number: string,
    @IdParam() id: number,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.packing.takeOut(number, id, person);
    return this.parcels.get(number);
  }

  @Post(':code/packed')
  @HttpCode(200)
  async close(
    @CodeParam('document') number: string,
    @Body() input: ParcelVersionInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.packing.close(number, input.version, person);
    return this.parcels.get(number);
  }

  @Post(':code/reopened')
  @HttpCode(200)
  async reopen(
    @CodeParam('document') number: string,
    @Body() input: ParcelVersionInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.packing.reopen(number, input.version, person);
    return this.parcels.get(number);
  }

  /** How it travels and what it weighs: the answer about lithium follows from it. */
  @Put(':code/lithium')
  async sayLithium(
    @CodeParam('document') number: string,
    @Body() input: LithiumInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.lithium.say(number, input, person);
    return this.parcels.get(number);
  }

  /** The owner writes down what the carrier answered. */
  @Post(':code/carrier-answer')
  @HttpCode(200)
  @Roles('owner')
  async carrierAnswer(
    @CodeParam('document') number: string,
    @Body() input: CarrierAnswerInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.lithium.acknowledge(number, input, person);
    return this.parcels.get(number);
  }

  /** Sends it off. */
  @Post(':code/dispatch')
  @HttpCode(200)
  async dispatch(
    @CodeParam('document') number: string,
    @Body() input: DispatchInput,
    @CurrentUser() person: SignedInUser,
  ): Promise<ParcelDto> {
    await this.dispatching.dispatch(number, input, person);
    return this.parcels.get(number);
  }

  @Get(':code/packing-slip')
  @ApiProduces('application/pdf')
  @Roles('owner', 'assembler', 'accountant')
  async slip(@CodeParam('document') number: string, @Res() response: Response): Promise<void> {
    const bytes = await this.parcels.slip(number);
    response.setHeader('Content-Security-Policy', "default-src 'none'; sandbox");
    response.setHeader('Content-Disposition', attachmentNamed(`packing slip ${number}.pdf`));
    response.type('application/pdf').send(bytes);
  }
}
